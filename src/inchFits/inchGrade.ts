import { markOf } from "../basis.js";
import type { BasisStep } from "../basis.js";
import { LimitsError } from "../errors.js";
import { TOLERANCE_STEPS, inchStepIndex, inchStepText } from "./inchStep.js";
import { INCH_STANDARD_TOLERANCES_THOU } from "./tables/standardTolerances.js";
import { plainThou } from "./thouTicks.js";

const columns: ReadonlyMap<unknown, readonly number[]> = new Map(
  Object.entries(INCH_STANDARD_TOLERANCES_THOU).map(([grade, column]) => [Number(grade), column]),
);
// index of the last step by the ABC agreements, which ends at 19.69 in
const LAST_ABC_STEP = 12;

/** A standard tolerance in thou at a size in ticks. */
export function inchGradeThou(grade: number, ticks: number): number {
  const value = columnOf(grade)[inchStepIndex(TOLERANCE_STEPS, ticks)];
  if (value === undefined) throw unknownGrade(grade);
  return value;
}

/** Where a standard tolerance stands. */
export function inchGradeStep(grade: number, ticks: number): BasisStep {
  const index = inchStepIndex(TOLERANCE_STEPS, ticks);
  return Object.freeze({
    standard: "ANSI B4.1-1967",
    place: `standard tolerances, ${inchStepText(TOLERANCE_STEPS, index)}`,
    says:
      `grade ${grade} = ${plainThou(inchGradeThou(grade, ticks))} thou` +
      (index > LAST_ABC_STEP ? ", outside the ABC agreements" : ""),
    how: "tabulated" as const,
    mark: markOf("1"),
  });
}

function columnOf(grade: number): readonly number[] {
  const column = columns.get(grade);
  if (column === undefined) throw unknownGrade(grade);
  return column;
}

function unknownGrade(grade: unknown): LimitsError {
  return new LimitsError("INCH_GRADE_UNKNOWN", "there is no such inch tolerance grade", {
    value: grade,
    allowed: "4 to 13",
  });
}
