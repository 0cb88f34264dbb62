import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { preferredInchSizes } from "./preferredInchSizes.js";
import type { InchSizeSeries } from "./preferredInchSizes.js";

/**
 * Tells whether a size is a preferred basic size of the inch system.
 *
 * @param size - any length, in any unit; only an exact match counts
 * @param series - `"decimal"` or `"fractional"` (no unit); either one unless said otherwise
 * @returns true where the size stands in the series (no unit)
 * @throws `OPTION_INVALID`, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { inch, isPreferredInchSize } from "limitsmith";
 *
 * isPreferredInchSize(inch("1 1/4")); // → true
 * isPreferredInchSize(inch("1 1/4"), "decimal"); // → false
 * ```
 * @reference ANSI B4.1-1967, preferred basic sizes, from memory
 */
export function isPreferredInchSize(size: LengthLike, series?: InchSizeSeries): boolean {
  const { ticks } = asLength(size);
  return preferredInchSizes(series).some((one) => one.ticks === ticks);
}
