import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { classAtStep } from "./classAtStep.js";
import type { DeviationsUm } from "./classAtStep.js";
import { isoOptions } from "./isoOptions.js";
import type { IsoOptions } from "./isoOptions.js";
import { parsedClass } from "./parseToleranceClass.js";
import type { ToleranceClassLike } from "./parseToleranceClass.js";
import { stepIndexOf } from "./sizeStep.js";

/**
 * The limit deviations of a class as bare numbers of µm: the low-level, fast way.
 *
 * @param size - nominal size, over 0 up to 3150 mm, in any unit
 * @param toleranceClass - such as `"m6"`, or a class that {@link parseToleranceClass} took apart
 * @param options - `edition` and `jsRounding`, see {@link IsoOptions}
 * @returns frozen `{ upperDeviationUm, lowerDeviationUm }`, both in µm
 * @throws `ISO_SIZE_OUT_OF_RANGE`, `ISO_GRADE_NOT_DEFINED`, `ISO_DEVIATION_NOT_DEFINED`, `ISO_CLASS_NOT_DEFINED`,
 *   `CLASS_MALFORMED`, `CLASS_LETTER_UNKNOWN`, `CLASS_GRADE_UNKNOWN`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { isoDeviations, mm } from "limitsmith";
 *
 * isoDeviations(mm(35), "k6"); // → { upperDeviationUm: 18, lowerDeviationUm: 2 }
 * ```
 * @reference ISO 286-1:2010, Tables 1 to 5 and 4.3: a to h: ei = es − IT; k to zc: es = ei + IT; js: ±IT/2;
 *   holes mirror the shaft, K to ZC with delta over 3 up to 500 mm
 */
export function isoDeviations(
  size: LengthLike,
  toleranceClass: ToleranceClassLike,
  options?: IsoOptions,
): DeviationsUm {
  const cls = parsedClass(toleranceClass);
  return classAtStep(cls, stepIndexOf(asLength(size).ticks), isoOptions(options)).um;
}
