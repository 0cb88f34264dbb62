import type { Basis } from "../basis.js";
import { LimitsError } from "../errors.js";
import { lengthOfTicks } from "../units/index.js";
import type { Length } from "../units/index.js";
import type { Limits } from "./limitsValue.js";

/**
 * Builds limits from lengths that are already lengths: the one place where a {@link Limits} comes into being.
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
  const { ticks, unit } = nominal;
  const upper = upperDeviation.ticks;
  const lower = lowerDeviation.ticks;
  if (upper < lower) {
    throw new LimitsError("LIMITS_UPSIDE_DOWN", "the upper limit lies below the lower one", {
      value: `${upperDeviation.toString()} / ${lowerDeviation.toString()}`,
      allowed: "an upper deviation that is not less than the lower one",
    });
  }
  return Object.freeze({
    nominal,
    upperDeviation,
    lowerDeviation,
    max: lengthOfTicks(ticks + upper, unit),
    min: lengthOfTicks(ticks + lower, unit),
    tolerance: lengthOfTicks(upper - lower, upperDeviation.unit),
    mean: lengthOfTicks(ticks + evenHalf(upper + lower, ticks), unit),
    designation,
    basis,
  });
}

/** Half of a sum of ticks, such that `offset` plus the half is even where the sum is odd. */
function evenHalf(sum: number, offset: number): number {
  const below = Math.floor(sum / 2);
  if (sum % 2 === 0) return below;
  return (offset + below) % 2 === 0 ? below : below + 1;
}
