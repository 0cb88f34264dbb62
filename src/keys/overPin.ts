import { LimitsError } from "../errors.js";
import { makeLimits } from "../limits/index.js";
import type { Limits, LimitsLike } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { lengthOfTicks } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { keyStep } from "./keyStep.js";
import type { KeyseatMember } from "./keyseatValue.js";
import { oneOf } from "./oneOf.js";
import { positiveLimits } from "./overKey.js";
import { positiveLength } from "./positiveLength.js";

/** A pin that lies along a keyseat on its floor. */
export interface PinInSeat {
  /** Shaft or hub. */
  readonly member: KeyseatMember;
  /** S or d − t1 of the shaft, T or d + t2 of the hub, as limits. */
  readonly control: LimitsLike;
  /** Width of the seat, as limits: the pin must go in at the least. */
  readonly width: LimitsLike;
  /** Diameter of the shaft or bore, as limits: the pin must stand out of the seat at the worst. */
  readonly diameter: LimitsLike;
  /** Diameter of the gauge pin. */
  readonly pin: LengthLike;
}

/**
 * What is read over a gauge pin on the floor of a keyseat: outside over the pin of a shaft, inside from the pin of a
 * hub to the opposite side of the bore.
 *
 * @param parts - `member`, `control`, `width` and `diameter` as `Limits`, and the `pin` diameter; any unit
 * @returns the check value as frozen `Limits`, in the unit of `control`: S + pin, or T − pin
 * @throws `GAUGE_PIN_INVALID` for a pin that does not go in, or does not stand out, at every corner,
 *   `KEYED_JOINT_INVALID`, `OPTION_INVALID`, `LIMITS_INVALID`, `LIMITS_CONTRADICT`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { inchKeyseat, limits, overPin } from "limitsmith";
 *
 * const { shaft } = inchKeyseat("1 1/2 in", { class: 2 });
 * const diameter = limits({ nominal: "1.5 in", upper: "0 thou", lower: "-1 thou" });
 * const width = shaft.width ?? diameter;
 * const check = overPin({ member: "shaft", control: shaft.control, width, diameter, pin: "3/8 in" });
 * [check.max, check.min]; // → ["1.664 in", "1.649 in"]
 * overPin({ member: "shaft", control: shaft.control, width, diameter, pin: "1/8 in" }); // throws GAUGE_PIN_INVALID
 * ```
 * @reference none: geometry
 */
export function overPin(parts: PinInSeat): Limits {
  const member = oneOf(ownValue(parts, "member"), ["shaft", "hub"] as const, "shaft or hub", ["member"]);
  const control = positiveLimits(ownValue(parts, "control"), "control");
  const width = positiveLimits(ownValue(parts, "width"), "width");
  const diameter = positiveLimits(ownValue(parts, "diameter"), "diameter");
  const pin = positiveLength(ownValue(parts, "pin"), "the pin", ["pin"]);
  if (pin.ticks > width.min.ticks) {
    throw badPin("the pin does not go into the narrowest seat", pin.toString(), `up to ${width.min.toString()}`);
  }
  const inShaft = member === "shaft";
  // how deep the seat can be from the crown, which the pin must be thicker than
  const deepest = inShaft ? diameter.max.ticks - control.min.ticks : control.max.ticks - diameter.min.ticks;
  if (pin.ticks <= deepest) {
    const depth = lengthOfTicks(deepest, pin.unit).toString();
    throw badPin("the pin does not stand out of the deepest seat", pin.toString(), `over ${depth}`);
  }
  const step = keyStep("geometry", "over a pin", inShaft ? "S + pin diameter" : "T - pin diameter", "derived");
  const { nominal, upperDeviation, lowerDeviation, basis } = control;
  const ticks = inShaft ? nominal.ticks + pin.ticks : nominal.ticks - pin.ticks;
  return makeLimits(
    lengthOfTicks(ticks, nominal.unit),
    upperDeviation,
    lowerDeviation,
    Object.freeze([...basis, step]),
    null,
  );
}

function badPin(says: string, value: string, allowed: string): LimitsError {
  return new LimitsError("GAUGE_PIN_INVALID", says, { value, allowed, path: ["pin"] });
}
