import { LimitsError } from "../errors.js";
import { asLimits, makeLimits } from "../limits/index.js";
import type { Limits, LimitsLike } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { lengthOfTicks } from "../units/index.js";
import { keyStep } from "./keyStep.js";

/** A key in its seat in the shaft. */
export interface KeyInShaft {
  /** S or d − t1, as limits. */
  readonly control: LimitsLike;
  /** Height of the key, as limits. */
  readonly keyHeight: LimitsLike;
}

/**
 * What a micrometer reads from the opposite side of the shaft over the key in its seat.
 *
 * @param parts - `control` (S or d − t1) and `keyHeight` as `Limits`, any unit
 * @returns the check value as frozen `Limits`, in the unit of `control`
 * @throws `KEYED_JOINT_INVALID`, `LIMITS_INVALID`, `LIMITS_CONTRADICT`, `LIMITS_UPSIDE_DOWN`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { inchKey, inchKeyseat, overKey } from "limitsmith";
 *
 * const seat = inchKeyseat("1 1/2 in", { class: 1 });
 * const stock = inchKey("1 1/2 in").barStock;
 * const check = stock === null ? null : overKey({ control: seat.shaft.control, keyHeight: stock.height });
 * [check?.max, check?.min]; // → ["1.664 in", "1.647 in"]
 * ```
 * @reference S + H of ANSI/ASME B17.1; d − t1 + h, symbol GA of motor shaft ends in IEC 60072-1 (from memory)
 */
export function overKey(parts: KeyInShaft): Limits {
  const control = positiveLimits(ownValue(parts, "control"), "control");
  const height = positiveLimits(ownValue(parts, "keyHeight"), "keyHeight");
  const step = keyStep("geometry", "over the key", "S + H, each at its own limit", "derived");
  return makeLimits(
    lengthOfTicks(control.nominal.ticks + height.nominal.ticks, control.nominal.unit),
    lengthOfTicks(control.upperDeviation.ticks + height.upperDeviation.ticks, control.upperDeviation.unit),
    lengthOfTicks(control.lowerDeviation.ticks + height.lowerDeviation.ticks, control.lowerDeviation.unit),
    Object.freeze([...control.basis, ...height.basis, step]),
    null,
  );
}

/** Takes limits whose sizes are over zero. */
export function positiveLimits(value: LimitsLike | undefined, name: string): Limits {
  if (value === undefined) {
    throw new LimitsError("KEYED_JOINT_INVALID", `${name} is missing`, { allowed: "limits", path: [name] });
  }
  const limits = asLimits(value, [name]);
  if (limits.min.ticks <= 0) {
    throw new LimitsError("KEYED_JOINT_INVALID", "a size of a keyed joint is over zero", {
      value: limits.min.toString(),
      path: [name],
    });
  }
  return limits;
}
