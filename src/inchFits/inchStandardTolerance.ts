import type { Basis } from "../basis.js";
import { asLength, lengthOfTicks } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { inchGradeStep, inchGradeThou } from "./inchGrade.js";
import { thouTicks } from "./thouTicks.js";

/** The grades of the inch system. */
export type InchGrade = 4 | 5 | 6 | 7 | 8 | 9 | 10 | 11 | 12 | 13;

/** A standard tolerance of the inch system and where it stands. */
export interface InchStandardTolerance {
  /** The grade asked for. */
  readonly grade: InchGrade;
  /** The tolerance, in thou. */
  readonly tolerance: Length;
  /** The row of the table. */
  readonly basis: Basis;
}

/**
 * The standard tolerance of an inch grade at a basic size.
 *
 * @param size - basic size, over 0 up to 200 in, in any unit
 * @param grade - a whole number from 4 to 13 (no unit)
 * @returns frozen `{ grade, tolerance, basis }`, the tolerance as a length in thou
 * @throws `INCH_GRADE_UNKNOWN`, `INCH_SIZE_OUT_OF_RANGE`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { inch, inchStandardTolerance } from "limitsmith";
 *
 * inchStandardTolerance(inch("1 1/4"), 7).tolerance.toString(); // → "1 thou"
 * ```
 * @reference ANSI B4.1-1967, standard tolerances; rows over 19.69 in lie outside the ABC agreements
 */
export function inchStandardTolerance(size: LengthLike, grade: InchGrade): InchStandardTolerance {
  const { ticks } = asLength(size);
  return Object.freeze({
    grade,
    tolerance: lengthOfTicks(thouTicks(inchGradeThou(grade, ticks)), "thou"),
    basis: Object.freeze([inchGradeStep(grade, ticks)]),
  });
}
