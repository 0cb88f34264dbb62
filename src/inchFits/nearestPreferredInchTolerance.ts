import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { preferredInchTolerances } from "./preferredInchTolerances.js";
import { nearestInSeries } from "./series.js";
import type { NearestPreferred } from "./series.js";

/**
 * The tolerance or allowance of the preferred series of the inch system that is nearest to a given one.
 *
 * @param tolerance - a tolerance or an allowance from 0.1 to 250 thou, in any unit
 * @returns frozen `{ nearest, difference, below, above, basis }`, lengths in thou; half way, the smaller is nearest
 * @throws `INCH_SERIES_OUT_OF_RANGE`, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { nearestPreferredInchTolerance, thou } from "limitsmith";
 *
 * nearestPreferredInchTolerance(thou("3.3")).nearest.toString(); // → "3.5 thou"
 * nearestPreferredInchTolerance(thou("3.3")).below.toString(); // → "3 thou"
 * ```
 * @reference ANSI B4.1-1967, preferred series of tolerances and allowances, from memory
 */
export function nearestPreferredInchTolerance(tolerance: LengthLike): NearestPreferred {
  return nearestInSeries(
    preferredInchTolerances(),
    asLength(tolerance),
    "preferred series of tolerances and allowances",
  );
}
