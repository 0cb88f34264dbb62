import { markOf } from "../basis.js";
import type { BasisStep } from "../basis.js";
import type { SizeStep } from "./sizeStep.js";
import { PRINTED_SPANS } from "./tables/printedSpans.js";
import { INTERMEDIATE_STEP_ENDS_MM } from "./tables/sizeSteps.js";
import { gradeNumber } from "./toleranceClass.js";
import type { ToleranceClass } from "./toleranceClass.js";

/** True where ISO 286-2 prints the letter in this grade and size range. */
export function isInPrintedSpan(cls: ToleranceClass, step: SizeStep): boolean {
  const span = PRINTED_SPANS.get(cls.letter);
  if (span === undefined) return false;
  const [, finest, coarsest, over, to] = span;
  const grade = gradeNumber(cls.grade);
  const end = INTERMEDIATE_STEP_ENDS_MM[step.intermediate] ?? Infinity;
  return grade >= finest && grade <= coarsest && end > over && end <= to;
}

/** Whether the class comes from Part 2's span or is derived by Part 1's rule. */
export function spanStep(cls: ToleranceClass, step: SizeStep): BasisStep {
  const span = PRINTED_SPANS.get(cls.letter);
  if (span !== undefined && isInPrintedSpan(cls, step)) {
    const [table, finest, coarsest, over, to, mark] = span;
    return Object.freeze({
      standard: "ISO 286-2:2010",
      place: `Table ${table}`,
      says:
        `${cls.text} lies in the span ${cls.letter}${finest} to ${cls.letter}${coarsest}, ` +
        `${over === 0 ? "" : `over ${over} `}up to ${to} mm, that Part 2 prints`,
      how: "tabulated" as const,
      mark: markOf(mark),
    });
  }
  return Object.freeze({
    standard: "ISO 286-1:2010",
    place: "fundamental deviation and grade",
    says: `${cls.text} lies outside the span that ISO 286-2:2010 prints here; derived by the rule of Part 1`,
    how: "derived" as const,
  });
}
