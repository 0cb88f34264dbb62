import type { Basis } from "../basis.js";
import { LimitsError } from "../errors.js";
import { asLength, lengthOfTicks } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { gradeStep, gradeValue } from "./gradeValue.js";
import { stepAt, stepIndexOf } from "./sizeStep.js";
import { GRADES } from "./toleranceClass.js";
import type { GradeName } from "./toleranceClass.js";

/** A standard tolerance and where it stands. */
export interface StandardTolerance {
  /** The grade that was asked for. */
  readonly grade: GradeName;
  /** The tolerance, in µm. */
  readonly tolerance: Length;
  /** Where the value stands. */
  readonly basis: Basis;
}

/**
 * The standard tolerance of a grade at a nominal size.
 *
 * @param size - nominal size, over 0 up to 3150 mm, in any unit
 * @param grade - `"IT01"`, `"IT0"`, `"IT1"` to `"IT18"`
 * @returns frozen `{ grade, tolerance, basis }`, the tolerance as a length in µm
 * @throws `CLASS_GRADE_UNKNOWN`, `ISO_GRADE_NOT_DEFINED` (IT01 and IT0 over 500 mm, IT14 and coarser up to 1 mm),
 *   `ISO_SIZE_OUT_OF_RANGE`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { mm, standardTolerance } from "limitsmith";
 *
 * standardTolerance(mm(35), "IT7").tolerance.toString(); // → "25 µm"
 * ```
 * @reference ISO 286-1:2010, Table 1
 */
export function standardTolerance(size: LengthLike, grade: GradeName): StandardTolerance {
  if (!GRADES.includes(grade)) {
    throw new LimitsError("CLASS_GRADE_UNKNOWN", "there is no such standard tolerance grade", {
      value: grade,
      allowed: GRADES.join(", "),
    });
  }
  const step = stepAt(stepIndexOf(asLength(size).ticks));
  // thousandths of a µm suffice for every cell; rounding removes what a double adds to 0.3 µm
  const ticks = Math.round(gradeValue(grade, step) * 10_000);
  return Object.freeze({
    grade,
    tolerance: lengthOfTicks(ticks, "um"),
    basis: Object.freeze([gradeStep(grade, step)]),
  });
}
