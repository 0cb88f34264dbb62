import type { LengthLike } from "../units/index.js";
import { asRoughness } from "./asRoughness.js";
import { finding } from "./finding.js";
import type { FinishFinding } from "./finding.js";
import { finishForTolerance } from "./finishForTolerance.js";
import type { FinishForToleranceOptions } from "./finishForTolerance.js";
import type { RoughnessLike } from "./roughnessValue.js";

/**
 * Finds a roughness that is too coarse for a tolerance: one finding for each rule of Ra that it breaks.
 *
 * @param roughness - Ra with its unit, as an upper limit
 * @param tolerance - the full width of the tolerance, over 0, any unit
 * @param options - `rule` and `form`, see {@link FinishForToleranceOptions}; `"Ra < T/8"` unless more is said
 * @returns a frozen list, empty where all rules are kept; codes `FINISH_TOO_COARSE_FOR_TOLERANCE`
 * @throws what {@link asRoughness} and {@link finishForTolerance} throw
 * @example
 * ```ts
 * import { toleranceFindings } from "limitsmith";
 *
 * toleranceFindings("3.2 µm", "13 µm")[0]?.code; // → "FINISH_TOO_COARSE_FOR_TOLERANCE"
 * toleranceFindings("1.6 µm", "13 µm"); // → []
 * ```
 * @reference as {@link finishForTolerance}
 */
export function toleranceFindings(
  roughness: RoughnessLike,
  tolerance: LengthLike,
  options?: FinishForToleranceOptions,
): readonly FinishFinding[] {
  const { ra } = asRoughness(roughness, ["roughness"]);
  const broken = finishForTolerance(tolerance, options).flatMap((allowed) => {
    if (allowed.ra === null) return [];
    const kept = allowed.below ? ra.ticks < allowed.ra.ticks : ra.ticks <= allowed.ra.ticks;
    if (kept) return [];
    const limit = `${allowed.below ? "below" : "at most"} ${allowed.ra.toString()}`;
    const preferred = allowed.preferredRa === null ? "" : `, preferred ${allowed.preferredRa.toString()}`;
    return [
      finding(
        "FINISH_TOO_COARSE_FOR_TOLERANCE",
        `Ra ${ra.toString()} is too coarse for the tolerance: ${allowed.rule} asks for Ra ${limit}${preferred}`,
        allowed.basis,
      ),
    ];
  });
  return Object.freeze(broken);
}
