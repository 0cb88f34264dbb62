import { markOf } from "../basis.js";
import type { BasisStep } from "../basis.js";
import { LimitsError } from "../errors.js";
import { stepText } from "./sizeStep.js";
import type { SizeStep } from "./sizeStep.js";
import { STANDARD_TOLERANCES } from "./tables/standardTolerances.js";
import { gradeNumber } from "./toleranceClass.js";
import type { GradeName } from "./toleranceClass.js";

/** A standard tolerance in µm; grades that the size does not have are refused. */
export function gradeValue(grade: GradeName, step: SizeStep): number {
  const um = STANDARD_TOLERANCES[grade].um[step.main] ?? null;
  if (um === null) {
    throw new LimitsError("ISO_GRADE_NOT_DEFINED", `${grade} is not defined over 500 mm`, {
      value: `${grade}, ${stepText(step, "main")}`,
      allowed: "IT1 to IT18 over 500 mm",
    });
  }
  // ISO 286-1:1988, Table 1, note: whether 2010 repeats it was not seen; the restriction is kept
  if (step.tiny && gradeNumber(grade) >= 14) {
    throw new LimitsError("ISO_GRADE_NOT_DEFINED", `${grade} is not used for sizes up to 1 mm`, {
      value: `${grade}, up to 1 mm`,
      allowed: "IT01 to IT13 up to 1 mm",
    });
  }
  return um;
}

/** Where a standard tolerance stands. */
export function gradeStep(grade: GradeName, step: SizeStep): BasisStep {
  const column = STANDARD_TOLERANCES[grade];
  return Object.freeze({
    standard: "ISO 286-1:2010",
    place: `Table 1, ${stepText(step, "main")}`,
    says: `${grade} = ${column.um[step.main] ?? 0} µm`,
    how: "tabulated" as const,
    mark: markOf(column.marks[step.main]),
  });
}
