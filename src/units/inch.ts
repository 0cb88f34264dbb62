import { lengthFrom } from "./lengthFrom.js";
import type { LengthSource, ReadOptions } from "./lengthFrom.js";
import type { Length } from "./length.js";

/**
 * Makes a length from inches.
 *
 * @param value - inches, within ±9 × 10¹¹ mm: a number is rounded to the nearest tick of
 *   0.1 nm (a half away from zero); a text (fractions and mixed numbers too) or a decimal object must be exact
 * @param options - `decimalMark` for texts, `"."` unless said otherwise
 * @returns the length, remembering inch as its unit for display
 * @throws `NUMBER_NOT_FINITE`, `NUMBER_MALFORMED`, `DECIMAL_MARK_MIXED`, `TEXT_EMPTY`, `TEXT_TOO_LONG`,
 *   `LENGTH_TOO_FINE`, `LENGTH_OUT_OF_RANGE`, `FRACTION_ZERO_DENOMINATOR`
 * @example
 * ```ts
 * import { inch } from "limitsmith";
 *
 * inch("1 3/16").toString(); // → "1.1875 in"
 * inch(".62535").to("mm"); // → 15.88389
 * ```
 * @reference 1 in = 25.4 mm exactly: ISO 80000-3:2006 and the international yard and pound agreement of 1959
 */
export function inch(value: LengthSource, options?: ReadOptions): Length {
  return lengthFrom(value, "in", options);
}
