import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { preferredInchSizes } from "./preferredInchSizes.js";
import type { InchSizeSeries } from "./preferredInchSizes.js";
import { nearestInSeries } from "./series.js";
import type { NearestPreferred } from "./series.js";

/**
 * The preferred basic size of the inch system that is nearest to a size.
 *
 * @param size - a length within the series (0.01 to 20 in; the fractional one starts at 1/64 in), in any unit
 * @param series - `"decimal"` or `"fractional"` (no unit); both together unless said otherwise
 * @returns frozen `{ nearest, difference, below, above, basis }`, lengths in inches; half way, the smaller is nearest
 * @throws `INCH_SERIES_OUT_OF_RANGE`, `OPTION_INVALID`, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { inch, nearestPreferredInchSize } from "limitsmith";
 *
 * nearestPreferredInchSize(inch("1.31"), "fractional").nearest.toString(); // → "1.25 in"
 * nearestPreferredInchSize(inch("1.31"), "decimal").nearest.toString(); // → "1.4 in"
 * ```
 * @reference ANSI B4.1-1967, preferred basic sizes, from memory
 */
export function nearestPreferredInchSize(size: LengthLike, series?: InchSizeSeries): NearestPreferred {
  const list = preferredInchSizes(series);
  return nearestInSeries(list, asLength(size), `preferred basic sizes${series === undefined ? "" : `, ${series}`}`);
}
