import { limitsAt } from "../limits/index.js";
import type { Limits } from "../limits/index.js";
import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { classAtStep } from "./classAtStep.js";
import { isoOptions } from "./isoOptions.js";
import type { IsoOptions } from "./isoOptions.js";
import { parsedClass } from "./parseToleranceClass.js";
import type { ToleranceClassLike } from "./parseToleranceClass.js";
import { stepIndexOf } from "./sizeStep.js";

/**
 * The limits of a nominal size with an ISO tolerance class.
 *
 * @param size - nominal size, over 0 up to 3150 mm, in any unit; an inch size is looked up by its exact mm
 * @param toleranceClass - such as `"m6"` (shaft) or `"H7"` (hole); the case of the letter decides
 * @param options - `edition` and `jsRounding`, see {@link IsoOptions}
 * @returns frozen limits: sizes in the unit of `size`, deviations and tolerance in µm, each with its reasons
 * @throws `ISO_SIZE_OUT_OF_RANGE`, `ISO_GRADE_NOT_DEFINED`, `ISO_DEVIATION_NOT_DEFINED`, `ISO_CLASS_NOT_DEFINED`,
 *   `CLASS_MALFORMED`, `CLASS_LETTER_UNKNOWN`, `CLASS_GRADE_UNKNOWN`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { isoLimits, mm } from "limitsmith";
 *
 * const seat = isoLimits(mm(35), "k6");
 * seat.max.toString(); // → "35.018 mm"
 * seat.min.toString(); // → "35.002 mm"
 * seat.basis[1]?.place; // → "Table 1, over 30 up to 50 mm"
 * ```
 * @reference ISO 286-1:2010, Tables 1 to 5 and 4.3; ISO 286-2:2010 for what is printed there
 */
export function isoLimits(size: LengthLike, toleranceClass: ToleranceClassLike, options?: IsoOptions): Limits {
  const cls = parsedClass(toleranceClass);
  const nominal = asLength(size);
  return limitsAt(nominal, classAtStep(cls, stepIndexOf(nominal.ticks), isoOptions(options)).set);
}
