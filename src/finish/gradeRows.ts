import type { BasisStep, Caution } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ANSI_PROCESS_GRADES } from "./tables/processGradesAnsi.js";
import { ISO_PROCESS_GRADES } from "./tables/processGradesIso.js";

/** The two published charts of grades by process. */
export type GradeChart = "ANSI B4.1-1967 (R1987)" | "BS 4500 and ISO/R 286 family";

/** What one line of a chart says. */
export interface GradeSpan {
  /** The chart that it stands in. */
  readonly chart: GradeChart;
  /** Line of the chart. */
  readonly row: string;
  /** Finest grade of the line, as a number: 7 is IT7, or grade 7 of ANSI B4.1. */
  readonly finest: number;
  /** Coarsest grade of the line; the second chart has one grade a line. */
  readonly coarsest: number;
}

/** A tolerance grade: `"IT7"`, or the number 7 for grade 7 of ANSI B4.1 or of ISO. */
export type ToleranceGradeLike = string | number;

const FINEST = -1;
const COARSEST = 18;

let spans: readonly GradeSpan[] | undefined;

/** Every line of both charts. */
export function allGradeSpans(): readonly GradeSpan[] {
  return (spans ??= [
    ...ANSI_PROCESS_GRADES.map((bar) => Object.freeze({ chart: "ANSI B4.1-1967 (R1987)" as const, ...bar })),
    ...ISO_PROCESS_GRADES.flatMap(({ grade, rows }) =>
      rows.map((row) =>
        Object.freeze({ chart: "BS 4500 and ISO/R 286 family" as const, row, finest: grade, coarsest: grade }),
      ),
    ),
  ]);
}

/** Where a line stands. */
export function spanStep({ chart, row, finest, coarsest }: GradeSpan): BasisStep {
  return Object.freeze({
    standard: chart,
    place: chart === "ANSI B4.1-1967 (R1987)" ? `Table 2, ${row}` : `accuracy expected of processes, ${row}`,
    says: finest === coarsest ? `grade ${finest}` : `grades ${finest} to ${coarsest}`,
    how: "tabulated" as const,
    // where a bar of the ANSI chart starts is memory of the chart
    mark: chart === "ANSI B4.1-1967 (R1987)" ? ("memory" as const) : ("one-source" as const),
  });
}

/** The number of a grade: IT01 is -1, IT0 is 0. */
export function gradeNumberOf(grade: ToleranceGradeLike): number {
  const given: unknown = grade;
  const text = typeof given === "string" ? given.trim() : "";
  const number =
    typeof given === "number"
      ? given
      : text === "IT01"
        ? FINEST
        : /^IT(?:0|[1-9]\d?)$/.test(text)
          ? Number(text.slice(2))
          : NaN;
  if (!Number.isInteger(number) || number < FINEST || number > COARSEST) {
    throw new LimitsError("CLASS_GRADE_UNKNOWN", "there is no such tolerance grade", {
      value: given,
      allowed: "IT01, IT0, IT1 to IT18, or the number of the grade",
    });
  }
  return number;
}

export const GRADE_CHART_CAUTION: Caution = Object.freeze({
  code: "FINISH_GRADE_CHART_OLD",
  says: "both grade charts are older than present machine tools and disagree in places: a warning, not a refusal",
});
