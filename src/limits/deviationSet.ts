import type { Basis } from "../basis.js";
import { LimitsError } from "../errors.js";
import { lengthOfTicks } from "../units/index.js";
import type { Length } from "../units/index.js";

/** Two limit deviations without their nominal: what one row of a table gives, for any size that it covers. */
export interface DeviationSet {
  /** Upper limit deviation. */
  readonly upper: Length;
  /** Lower limit deviation. */
  readonly lower: Length;
  /** `upper - lower`. */
  readonly tolerance: Length;
  /** Class behind the deviations; `null` where there is none. */
  readonly designation: string | null;
  /** Where they come from. */
  readonly basis: Basis;
}

/**
 * Checks two limit deviations and keeps them with what follows from them, to be put on many nominal sizes.
 *
 * @param upper - upper limit deviation, any unit
 * @param lower - lower limit deviation, any unit; not over the upper one
 * @param basis - a frozen list of the reasons
 * @param designation - the class behind them, or `null`
 * @returns the frozen set, the tolerance in the unit of the upper deviation
 * @throws `LIMITS_UPSIDE_DOWN`, `LENGTH_OUT_OF_RANGE`
 * @example
 * ```ts
 * import { deviationSet, um } from "limitsmith";
 *
 * deviationSet(um(25), um(9), [], "m6").tolerance.toString(); // → "16 µm"
 * ```
 * @reference ISO 286-1:2010, 3.2 (limit deviations)
 */
export function deviationSet(upper: Length, lower: Length, basis: Basis, designation: string | null): DeviationSet {
  if (upper.ticks < lower.ticks) {
    throw new LimitsError("LIMITS_UPSIDE_DOWN", "the upper limit lies below the lower one", {
      value: `${upper.toString()} / ${lower.toString()}`,
      allowed: "an upper deviation that is not less than the lower one",
    });
  }
  return Object.freeze({
    upper,
    lower,
    tolerance: lengthOfTicks(upper.ticks - lower.ticks, upper.unit),
    designation,
    basis,
  });
}
