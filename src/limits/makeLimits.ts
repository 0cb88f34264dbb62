import type { Basis } from "../basis.js";
import type { Length } from "../units/index.js";
import { deviationSet } from "./deviationSet.js";
import { limitsAt } from "./limitsAt.js";
import type { Limits } from "./limitsValue.js";

/**
 * Builds limits from lengths that are already lengths.
 *
 * @param nominal - nominal size, any unit
 * @param upperDeviation - upper limit deviation, any unit
 * @param lowerDeviation - lower limit deviation, any unit; not over the upper one
 * @param basis - a frozen list of the reasons
 * @param designation - the class behind the limits, or `null`
 * @returns frozen limits, the sizes in the unit of the nominal, the tolerance in that of the upper deviation
 * @throws `LIMITS_UPSIDE_DOWN`, `LENGTH_OUT_OF_RANGE`
 * @example
 * ```ts
 * import { makeLimits, mm, um } from "limitsmith";
 *
 * makeLimits(mm(40), um(25), um(9), [], "m6").min.toString(); // → "40.009 mm"
 * ```
 * @reference ISO 286-1:2010, 3.2 (limits of size, limit deviations)
 */
export function makeLimits(
  nominal: Length,
  upperDeviation: Length,
  lowerDeviation: Length,
  basis: Basis,
  designation: string | null,
): Limits {
  return limitsAt(nominal, deviationSet(upperDeviation, lowerDeviation, basis, designation));
}
