import { LimitsError } from "../errors.js";
import type { Length } from "./length.js";
import { decimalMarkOf, lengthFrom } from "./lengthFrom.js";
import type { ReadOptions } from "./lengthFrom.js";
import { lengthText } from "./lengthText.js";
import { splitUnit } from "./splitUnit.js";

/**
 * Reads a length from a text that carries its unit.
 *
 * @param text - a decimal, inch fraction or mixed number and a unit: `mm`, `µm` (either µ, or `um`), `in`,
 *   `inch`, `"`, `thou`, `µin` (or `uin`); up to 100 characters, within ±9 × 10¹¹ mm
 * @param options - `decimalMark`: `"."` unless said otherwise
 * @returns the exact length, in the unit that was written
 * @throws `UNIT_MISSING`, `UNIT_UNKNOWN`, `UNIT_AMBIGUOUS` (`mil`), `TEXT_EMPTY`, `TEXT_TOO_LONG`,
 *   `NUMBER_MALFORMED`, `DECIMAL_MARK_MIXED`, `FRACTION_NOT_INCH`, `FRACTION_ZERO_DENOMINATOR`,
 *   `LENGTH_TOO_FINE`, `LENGTH_OUT_OF_RANGE`, `OPTION_INVALID`
 * @example
 * ```ts
 * import { readLength } from "limitsmith";
 *
 * readLength('1 1/4"').toString(); // → "1.25 in"
 * readLength("63 µin").to("um"); // → 1.6002
 * readLength("25"); // throws UNIT_MISSING
 * ```
 * @reference 1 in = 25.4 mm exactly: the international yard and pound agreement of 1959
 */
export function readLength(text: string, options?: ReadOptions): Length {
  const { number, unit } = splitUnit(lengthText(text));
  if (number === "") throw new LimitsError("TEXT_EMPTY", "there is no number here", { value: text });
  if (unit === null) {
    throw new LimitsError("UNIT_MISSING", "a number without a unit is not a length", {
      value: text,
      allowed: 'a unit behind the number: mm, µm, in, ", thou, µin',
    });
  }
  return lengthFrom(number, unit, { decimalMark: decimalMarkOf(options) });
}
