import { lengthFrom } from "./lengthFrom.js";
import type { LengthSource, ReadOptions } from "./lengthFrom.js";
import type { Length } from "./length.js";

/**
 * Makes a length from millimetres.
 *
 * @param value - millimetres, within ±9 × 10¹¹ mm: a number is rounded to the nearest tick of
 *   0.1 nm (a half away from zero); a text or a decimal object must be exact
 * @param options - `decimalMark` for texts, `"."` unless said otherwise
 * @returns the length, remembering mm as its unit for display
 * @throws `NUMBER_NOT_FINITE`, `NUMBER_MALFORMED`, `DECIMAL_MARK_MIXED`, `TEXT_EMPTY`, `TEXT_TOO_LONG`,
 *   `LENGTH_TOO_FINE`, `LENGTH_OUT_OF_RANGE`, `FRACTION_NOT_INCH`
 * @example
 * ```ts
 * import { mm } from "limitsmith";
 *
 * mm(24.999999999999996).toString(); // → "25 mm"
 * mm("40,025", { decimalMark: "," }).toString(); // → "40.025 mm"
 * ```
 * @reference 1 in = 25.4 mm exactly: ISO 80000-3:2006 and the international yard and pound agreement of 1959
 */
export function mm(value: LengthSource, options?: ReadOptions): Length {
  return lengthFrom(value, "mm", options);
}
