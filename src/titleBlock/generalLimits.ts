import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import type { DefaultLengthLimits, SizeFeature } from "./defaultValue.js";
import { generalTolerance } from "./generalTolerance.js";
import type { GeneralToleranceLike } from "./generalToleranceValue.js";
import { sizeByStandard } from "./sizeByStandard.js";
import { featureOf } from "./sizeFeature.js";

/** Options of {@link generalLimits}. */
export interface GeneralLimitsOptions {
  /** `"size"` unless said otherwise. */
  readonly feature?: SizeFeature;
}

/**
 * The limits of a linear size by a general tolerance standard.
 *
 * The nominal size picks the range: over, up to and including. What the table does not have is refused, never
 * interpolated. Castings have a total tolerance, half of it to each side.
 *
 * @param size - nominal size, any unit; an inch size is looked up by its exact mm. ISO 2768-1: 0.5 up to 4000 mm,
 *   external radii and chamfers from 0.5 mm; ISO 8062-3: up to 10 000 mm; ISO 13920: over 2 mm
 * @param standard - the indication, see {@link generalTolerance}
 * @param options - `feature`: `"external radius or chamfer"` takes Table 2 of ISO 2768-1, `"wall thickness"` of a
 *   casting one grade coarser (from memory)
 * @returns frozen limits in the unit of the size, deviations in mm, the standard that applied, and cautions
 * @throws `GENERAL_TOLERANCE_OUT_OF_RANGE`, `GENERAL_TOLERANCE_NOT_DEFINED`, `GENERAL_TOLERANCE_NOT_CALLED` where
 *   the indication has no class for sizes, `OPTION_INVALID`, `LENGTH_INVALID`, and what {@link generalTolerance} throws
 * @example
 * ```ts
 * import { generalLimits, mm } from "limitsmith";
 *
 * const step = generalLimits(mm(30), "ISO 2768-m");
 * step.limits.max.toString(); // → "30.2 mm"
 * step.limits.basis[1]?.place; // → "Table 1, over 6 up to 30 mm"
 * generalLimits(mm(45), "DCTG 6").line; // → "DCTG 6: ±0.35 mm"
 * generalLimits(mm("2.5"), "ISO 2768-v"); // throws GENERAL_TOLERANCE_NOT_DEFINED
 * ```
 * @reference ISO 2768-1:1989, Tables 1 and 2; ISO 8062-3:2007, Table 2; ISO 13920:2023, Table 1
 */
export function generalLimits(
  size: LengthLike,
  standard: GeneralToleranceLike,
  options?: GeneralLimitsOptions,
): DefaultLengthLimits {
  const called = generalTolerance(standard);
  return sizeByStandard(asLength(size), called, featureOf(options), {
    standard: "the caller",
    place: "general tolerance",
    says: called.text,
    how: "caller",
  });
}
