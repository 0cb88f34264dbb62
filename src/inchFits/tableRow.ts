import { LimitsError } from "../errors.js";
import { parentOf } from "./inchClass.js";
import type { InchClass } from "./inchClass.js";
import type { InchColumn, InchRow } from "./inchColumn.js";
import type { InchFitReading } from "./inchFitReadings.js";
import { FORCE_STEPS, GENERAL_STEPS, inchSpanText, inchStepText } from "./inchStep.js";
import type { InchSteps } from "./inchStep.js";
import { CLASS_FACTS } from "./tables/classes.js";
import type { ClassFacts } from "./tables/classes.js";
import { FORCE_FITS } from "./tables/forceFits.js";
import { LOCATIONAL_CLEARANCE_FITS } from "./tables/locationalClearanceFits.js";
import { LOCATIONAL_INTERFERENCE_FITS } from "./tables/locationalInterferenceFits.js";
import { LOCATIONAL_TRANSITION_FITS } from "./tables/locationalTransitionFits.js";
import { RUNNING_FITS, RUNNING_FITS_IN_APPENDIX } from "./tables/runningFits.js";

/** One row of a class with all that is printed about it. */
export interface TableRow {
  readonly cls: InchClass;
  /** The class of the tables: `"RC5"` for `"RC5S"`. */
  readonly name: string;
  readonly facts: ClassFacts;
  readonly row: InchRow;
  /** How sure the row is, as a sign of the table. */
  readonly mark: string;
  readonly steps: InchSteps;
  readonly index: number;
  /** "over 0.71 up to 1.19 in". */
  readonly where: string;
  /** What each reading has, where published tables differ. */
  readonly readings: Readonly<Record<InchFitReading, InchRow>> | null;
}

const columns: ReadonlyMap<string, InchColumn> = new Map(
  [
    RUNNING_FITS,
    LOCATIONAL_CLEARANCE_FITS,
    LOCATIONAL_TRANSITION_FITS,
    LOCATIONAL_INTERFERENCE_FITS,
    FORCE_FITS,
  ].flatMap((table) => Object.entries(table)),
);
const factsOf: ReadonlyMap<string, ClassFacts> = new Map(Object.entries(CLASS_FACTS));
const inAppendix: ReadonlyMap<string, readonly InchRow[]> = new Map(Object.entries(RUNNING_FITS_IN_APPENDIX));

/** The size steps that a class goes by. */
export function stepsOf(cls: InchClass): InchSteps {
  return cls.letters === "FN" ? FORCE_STEPS : GENERAL_STEPS;
}

/** The row of a class at a step; where it has none, says what is defined. */
export function tableRow(cls: InchClass, index: number, reading: InchFitReading): TableRow {
  const name = parentOf(cls);
  const column = columns.get(name);
  const facts = factsOf.get(name);
  if (column === undefined || facts === undefined) {
    throw new LimitsError("INCH_CLASS_UNKNOWN", `there is no class ${name} of inch fits`, { value: name });
  }
  const steps = stepsOf(cls);
  const handbook = column.thou[index] ?? null;
  if (handbook === null) throw noRow(name, column, steps, index);
  const variants = inAppendix.get(name) ?? [];
  // the appendix differs in the last steps of its classes
  const appendix = variants[index - (steps.ends.length - variants.length)];
  const readings = appendix === undefined ? null : { handbook, "textbook appendix": appendix };
  return {
    cls,
    name,
    facts,
    row: readings === null ? handbook : readings[reading],
    mark: column.marks[index] ?? "",
    steps,
    index,
    where: inchStepText(steps, index),
    readings,
  };
}

function noRow(name: string, column: InchColumn, steps: InchSteps, index: number): LimitsError {
  const defined = column.thou.flatMap((row, at) => (row === null ? [] : [at]));
  const where = inchStepText(steps, index);
  const details = {
    value: `${name}, ${where}`,
    allowed: `${name} ${inchSpanText(steps, defined[0] ?? 0, defined.at(-1) ?? 0)}`,
  };
  return column.marks[index] === "-"
    ? new LimitsError("INCH_ROW_NOT_DEFINED", `the standard gives no values for ${name} ${where}`, details)
    : new LimitsError("INCH_ROW_MISSING", `the row of ${name} ${where} was not found in any published table`, details);
}
