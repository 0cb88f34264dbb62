import { lengthOfTicks } from "../units/index.js";
import type { Length } from "../units/index.js";
import type { DeviationSet } from "./deviationSet.js";
import type { Limits } from "./limitsValue.js";

/**
 * Puts a set of deviations on a nominal size: the one place where a {@link Limits} comes into being.
 *
 * @param nominal - nominal size, any unit
 * @param set - what {@link deviationSet} made
 * @returns frozen limits, the sizes in the unit of the nominal, deviations and tolerance in their own
 * @throws `LENGTH_OUT_OF_RANGE`
 * @example
 * ```ts
 * import { deviationSet, limitsAt, mm, um } from "limitsmith";
 *
 * const m6 = deviationSet(um(25), um(9), [], "m6");
 * limitsAt(mm(32), m6).max.toString(); // → "32.025 mm"
 * limitsAt(mm(45), m6).max.toString(); // → "45.025 mm"
 * ```
 * @reference ISO 286-1:2010, 3.2: max = nominal + upper deviation, min = nominal + lower deviation
 */
export function limitsAt(nominal: Length, set: DeviationSet): Limits {
  const { ticks, unit } = nominal;
  const { upper, lower } = set;
  return Object.freeze({
    nominal,
    upperDeviation: upper,
    lowerDeviation: lower,
    max: lengthOfTicks(ticks + upper.ticks, unit),
    min: lengthOfTicks(ticks + lower.ticks, unit),
    tolerance: set.tolerance,
    mean: lengthOfTicks(ticks + evenHalf(upper.ticks + lower.ticks, ticks), unit),
    designation: set.designation,
    basis: set.basis,
  });
}

/** Half of a sum of ticks, such that `offset` plus the half is even where the sum is odd. */
function evenHalf(sum: number, offset: number): number {
  const below = Math.floor(sum / 2);
  if (sum % 2 === 0) return below;
  return (offset + below) % 2 === 0 ? below : below + 1;
}
