import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { preferredInchTolerances } from "./preferredInchTolerances.js";

/**
 * Tells whether a tolerance or an allowance is of the preferred series of the inch system.
 *
 * @param tolerance - a tolerance or an allowance, in any unit; only an exact match counts
 * @returns true where it stands in the series (no unit)
 * @throws `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { isPreferredInchTolerance, thou } from "limitsmith";
 *
 * isPreferredInchTolerance(thou("1.4")); // → true
 * isPreferredInchTolerance(thou("1.5")); // → false
 * ```
 * @reference ANSI B4.1-1967, preferred series of tolerances and allowances, from memory
 */
export function isPreferredInchTolerance(tolerance: LengthLike): boolean {
  const { ticks } = asLength(tolerance);
  return preferredInchTolerances().some((one) => one.ticks === ticks);
}
