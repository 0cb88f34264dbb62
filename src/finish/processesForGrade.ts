import type { Caution } from "../basis.js";
import { GRADE_CHART_CAUTION, allGradeSpans, gradeNumberOf } from "./gradeRows.js";
import type { GradeSpan, ToleranceGradeLike } from "./gradeRows.js";

/**
 * How a line of a chart stands to a grade: the grade is within its span, or the process is finer than the grade
 * needs, or the line does not go as fine as that.
 */
export type GradeReach = "usual" | "finer than needed" | "not usual";

/** Every line of both charts, by how it stands to a grade. */
export interface ProcessesForGrade {
  /** Number of the grade: 7 for IT7. */
  readonly grade: number;
  /** Processes that usually hold it. */
  readonly usual: readonly GradeSpan[];
  /** Processes that are finer than the grade needs. */
  readonly finerThanNeeded: readonly GradeSpan[];
  /** Processes that do not usually hold it. */
  readonly notUsual: readonly GradeSpan[];
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * Sorts the processes of both grade charts by how they stand to a tolerance grade.
 *
 * @param grade - `"IT01"` to `"IT18"`, or the number of a grade: the grades 4 to 13 of ANSI B4.1 and of ISO go by the
 *   same numbers (no unit)
 * @returns frozen lists that together hold every line of both charts once (grade numbers, no unit)
 * @throws `CLASS_GRADE_UNKNOWN`
 * @example
 * ```ts
 * import { processesForGrade } from "limitsmith";
 *
 * const { usual } = processesForGrade("IT9");
 * usual.map((one) => one.row).slice(0, 3); // → ["reaming", "turning", "boring"]
 * ```
 * @reference ANSI B4.1-1967 (R1987), Table 2; grade chart of the BS 4500 and ISO/R 286 family
 */
export function processesForGrade(grade: ToleranceGradeLike): ProcessesForGrade {
  const number = gradeNumberOf(grade);
  const having = (reach: GradeReach): readonly GradeSpan[] =>
    Object.freeze(allGradeSpans().filter((span) => gradeReachOf(span, number) === reach));
  return Object.freeze({
    grade: number,
    usual: having("usual"),
    finerThanNeeded: having("finer than needed"),
    notUsual: having("not usual"),
    cautions: Object.freeze([GRADE_CHART_CAUTION]),
  });
}

/** How one line stands to a grade. */
function gradeReachOf(span: GradeSpan, grade: number): GradeReach {
  if (grade < span.finest) return "not usual";
  return grade > span.coarsest ? "finer than needed" : "usual";
}
