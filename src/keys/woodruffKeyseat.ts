import { LimitsError } from "../errors.js";
import { markOf } from "../basis.js";
import type { Basis } from "../basis.js";
import { limitsFromMaxMin, makeLimits } from "../limits/index.js";
import type { Limits } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { lengthOfTicks, multiply } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { chordTicks } from "./crown.js";
import { decodeWoodruffNumber } from "./decodeWoodruffNumber.js";
import { DOUBTFUL } from "./keyCautions.js";
import { tolerancedInch } from "./tolerancedInch.js";
import { B17_2, keyStep } from "./keyStep.js";
import { positiveLength } from "./positiveLength.js";
import { tableInch } from "./tableLength.js";
import { WOODRUFF_KEYSEAT_DEVIATIONS, WOODRUFF_KEYSEATS } from "./tables/woodruffKeyseats.js";
import { listedRow } from "./woodruffKey.js";
import type { WoodruffKeyseat } from "./woodruffValue.js";

/** Options of {@link woodruffKeyseat}. */
export interface WoodruffKeyseatOptions {
  /** Nominal diameter of shaft and bore, for what is measured from the opposite side. */
  readonly shaftDiameter?: LengthLike;
}

/**
 * The keyseats of a Woodruff key in shaft and hub.
 *
 * The depths are at the side of the seat. The widths are not the classes of B17.1: the key is held in the shaft and
 * has clearance in the hub.
 *
 * @param number - a number that ANSI/ASME B17.2 lists, such as `"404"` (no unit)
 * @param options - `shaftDiameter` for the depth control S and T, any unit
 * @returns the frozen keyseats, sizes in inches: widths, depths, cutter diameter, key above the shaft, and S and T
 *   where a shaft diameter is given
 * @throws `WOODRUFF_NUMBER_UNKNOWN`, `KEY_WIDER_THAN_SHAFT`, `KEYSEAT_DEPTH_IMPOSSIBLE`, `KEYED_JOINT_INVALID`,
 *   `LENGTH_INVALID`
 * @example
 * ```ts
 * import { woodruffKeyseat } from "limitsmith";
 *
 * const seat = woodruffKeyseat("404");
 * [seat.shaft.sideDepth.max, seat.shaft.sideDepth.min]; // → ["0.1405 in", "0.1355 in"]
 * seat.hub.width.min.toString(); // → "0.126 in"
 * ```
 * @reference ANSI/ASME B17.2-1967, keyseats: shaft depth = C min − key above shaft, hub depth = key above shaft
 *   + 0.006 in; widths and cutter diameters from memory
 */
export function woodruffKeyseat(number: string, options?: WoodruffKeyseatOptions): WoodruffKeyseat {
  const row = listedRow(WOODRUFF_KEYSEATS, number);
  const [no, wMin, wMax, depth, bMin, bMax, above, hubWidth, hubDepth, marks] = row;
  const given = ownValue(options, "shaftDiameter");
  const diameter = given === undefined ? null : positiveLength(given, "the shaft diameter", ["shaftDiameter"]);
  const deviations = WOODRUFF_KEYSEAT_DEVIATIONS;
  const keyWidth = decodeWoodruffNumber(no).width;
  const shaftWidth = fromMaxMin(no, "shaft width", wMax, wMin, keyWidth);
  const shaftDepth = tolerancedInch(`keyseats, ${no}`, "shaft depth", depth, deviations.shaftDepth, markOf(marks[0]));
  const hubWidthLimits = tolerancedInch(`keyseats, ${no}`, "hub width", hubWidth, deviations.hubWidth, "memory");
  const hubDepthLimits = tolerancedInch(
    `keyseats, ${no}`,
    "hub depth",
    hubDepth,
    deviations.hubDepth,
    markOf(marks[1]),
  );
  return Object.freeze({
    standard: B17_2,
    number: no,
    shaft: Object.freeze({
      width: shaftWidth,
      sideDepth: shaftDepth,
      cutterDiameter: fromMaxMin(no, "keyseat diameter", bMax, bMin, tableInch(bMin)),
      control: diameter === null ? null : shaftControl(diameter, keyWidth, shaftDepth),
    }),
    hub: Object.freeze({
      width: hubWidthLimits,
      sideDepth: hubDepthLimits,
      control: diameter === null ? null : hubControl(diameter, keyWidth, hubDepthLimits),
    }),
    keyAboveShaft: tolerancedInch(`keyseats, ${no}`, "key above shaft", above, deviations.keyAboveShaft, "memory"),
    basis: Object.freeze([
      keyStep(
        B17_2,
        `keyseats, ${no}`,
        "depths at the side of the seat; width and cutter limits are remembered",
        "tabulated",
        "memory",
      ),
    ]),
    cautions: Object.freeze([DOUBTFUL]),
  });
}

function fromMaxMin(no: string, what: string, max: string, min: string, nominal: Length): Limits {
  const basis: Basis = Object.freeze([
    keyStep(B17_2, `keyseats, ${no}`, `${what} max ${max}, min ${min} in`, "tabulated", "memory"),
  ]);
  return limitsFromMaxMin({ max: tableInch(max), min: tableInch(min), nominal, basis });
}

function shaftControl(diameter: Length, keyWidth: Length, depth: Limits): Limits {
  const nominal = lengthOfTicks(chordTicks(diameter, keyWidth) - depth.nominal.ticks, "in");
  const made = makeLimits(
    nominal,
    multiply(depth.lowerDeviation, -1),
    multiply(depth.upperDeviation, -1),
    Object.freeze([...depth.basis, keyStep(B17_2, "geometry", "S = D - Y - shaft depth", "derived", "formula")]),
    null,
  );
  if (made.min.ticks <= 0) {
    throw new LimitsError("KEYSEAT_DEPTH_IMPOSSIBLE", "a keyseat so deep leaves no shaft under it", {
      value: diameter.toString(),
      allowed: "a larger shaft, or a smaller key",
      path: ["shaftDiameter"],
    });
  }
  return made;
}

function hubControl(diameter: Length, keyWidth: Length, depth: Limits): Limits {
  return makeLimits(
    lengthOfTicks(chordTicks(diameter, keyWidth) + depth.nominal.ticks, "in"),
    depth.upperDeviation,
    depth.lowerDeviation,
    Object.freeze([...depth.basis, keyStep(B17_2, "geometry", "T = D - Y + hub depth", "derived", "formula")]),
    null,
  );
}
