import { finding } from "./finding.js";
import type { FinishFinding } from "./finding.js";
import { gradeNumberOf, spanStep } from "./gradeRows.js";
import type { GradeSpan, ToleranceGradeLike } from "./gradeRows.js";
import { processGrades } from "./processGrades.js";

/**
 * Finds a process that does not usually reach a tolerance grade, or is finer than the grade needs. Both charts are older
 * than present machines: each finding is a warning.
 *
 * @param grade - `"IT01"` to `"IT18"`, or the number of a grade (no unit)
 * @param process - trade name, see `processNames`
 * @returns a frozen list of one finding or none; an empty list where no chart has the process
 * @throws `PROCESS_UNKNOWN`, `CLASS_GRADE_UNKNOWN`
 * @example
 * ```ts
 * import { gradeFindings } from "limitsmith";
 *
 * gradeFindings("IT7", "milling")[0]?.code; // → "PROCESS_DOES_NOT_REACH_GRADE"
 * gradeFindings("IT5", "honing")[0]?.code; // → "PROCESS_GRADE_DISPUTED"
 * gradeFindings("IT11", "lapping")[0]?.code; // → "PROCESS_FINER_THAN_GRADE_NEEDS"
 * gradeFindings("IT8", "turning"); // → []
 * ```
 * @reference ANSI B4.1-1967 (R1987), Table 2; grade chart of the BS 4500 and ISO/R 286 family
 */
export function gradeFindings(grade: ToleranceGradeLike, process: string): readonly FinishFinding[] {
  const number = gradeNumberOf(grade);
  const { process: name, spans } = processGrades(process);
  if (spans.length === 0) return Object.freeze([]);
  const charts = [...new Set(spans.map((span) => span.chart))];
  const reaching = charts.filter((chart) => number >= finestOf(spans.filter((span) => span.chart === chart)));
  const basis = spans.map(spanStep);
  const text = spans.map(spanText).join("; ");
  const found: FinishFinding[] = [];
  if (reaching.length === 0) {
    found.push(
      finding("PROCESS_DOES_NOT_REACH_GRADE", `${name} does not usually reach grade ${number}; ${text}`, basis),
    );
  } else if (reaching.length < charts.length) {
    found.push(finding("PROCESS_GRADE_DISPUTED", `the charts differ on ${name} at grade ${number}; ${text}`, basis));
  } else if (spans.every((span) => number > span.coarsest)) {
    found.push(
      finding("PROCESS_FINER_THAN_GRADE_NEEDS", `${name} is finer than grade ${number} needs; ${text}`, basis),
    );
  }
  return Object.freeze(found);
}

function finestOf(spans: readonly GradeSpan[]): number {
  return Math.min(...spans.map((span) => span.finest));
}

function spanText({ chart, row, finest, coarsest }: GradeSpan): string {
  return `${chart}, ${row}: ${finest === coarsest ? `grade ${finest}` : `grades ${finest} to ${coarsest}`}`;
}
