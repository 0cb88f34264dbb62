import type { Basis, Caution } from "../basis.js";
import { deviationSet, fitClearances } from "../limits/index.js";
import type { DeviationSet, FitClearances } from "../limits/index.js";
import { lengthOfTicks } from "../units/index.js";
import type { Length } from "../units/index.js";
import type { InchClass } from "./inchClass.js";
import { USUAL_READING } from "./inchFitReadings.js";
import type { InchFitReading } from "./inchFitReadings.js";
import type { InchSymbols, PrintedLimitsOfFit } from "./inchFitValue.js";
import { inchStepIndex } from "./inchStep.js";
import { shiftOf } from "./modifiedFit.js";
import { rowBasis, rowCautions } from "./rowBasis.js";
import { stepsOf, tableRow } from "./tableRow.js";
import type { TableRow } from "./tableRow.js";
import { thouTicks } from "./thouTicks.js";

/** A class worked out for one size step; lengths in thou. */
export interface FitAtSize {
  readonly hole: DeviationSet;
  readonly shaft: DeviationSet;
  readonly clearances: FitClearances;
  readonly cautions: readonly Caution[];
  readonly symbols: InchSymbols;
  readonly printedLimits: PrintedLimitsOfFit;
  readonly purpose: string;
  readonly reading: InchFitReading | null;
}

// no more entries than classes with their suffixes, each with one place a step: the whole system worked out once
const cache: Map<InchClass, (FitAtSize | undefined)[]> = new Map<InchClass, (FitAtSize | undefined)[]>();

/** Works a class out for a size; remembers the answer of its step, which depends on nothing else. */
export function fitAtSize(cls: InchClass, ticks: number, reading: InchFitReading): FitAtSize {
  const steps = stepsOf(cls);
  const index = inchStepIndex(steps, ticks);
  if (reading !== USUAL_READING) return workOut(tableRow(cls, index, reading), reading);
  let row = cache.get(cls);
  if (row === undefined) {
    row = new Array<FitAtSize | undefined>(steps.ends.length).fill(undefined);
    cache.set(cls, row);
  }
  return (row[index] ??= workOut(tableRow(cls, index, reading), reading));
}

function workOut(from: TableRow, asked: InchFitReading): FitAtSize {
  const { cls, facts, row, readings } = from;
  const reading = readings === null ? null : asked;
  const shift = shiftOf(from);
  const [holeUpper, shaftUpper, shaftLower] = row;
  const at = (thou: number): Length => lengthOfTicks(thouTicks(thou) + shift.ticks, "thou");
  const asPrinted = shift.ticks === 0;
  const basis: Basis = Object.freeze([...rowBasis(from, reading), ...shift.basis]);
  const hole = deviationSet(at(holeUpper), at(0), basis, `${cls.text} hole`);
  const shaft = deviationSet(at(shaftUpper), at(shaftLower), basis, `${cls.text} shaft`);
  return Object.freeze({
    hole,
    shaft,
    clearances: fitClearances(hole, shaft),
    cautions: Object.freeze([...rowCautions(from, reading), ...shift.cautions]),
    symbols: Object.freeze({ hole: asPrinted ? facts.hole : null, shaft: asPrinted ? facts.shaft : null }),
    printedLimits: printedLimitsOf(from),
    purpose: facts.purpose,
    reading,
  });
}

function printedLimitsOf({ cls, row }: TableRow): PrintedLimitsOfFit {
  // transition fits are printed as minus the interference, plus the clearance
  const first = lengthOfTicks(Math.abs(thouTicks(row[3])), "thou");
  const second = lengthOfTicks(thouTicks(row[4]), "thou");
  const none = { minClearance: null, maxClearance: null, minInterference: null, maxInterference: null };
  switch (cls.letters) {
    case "RC":
    case "LC":
      return Object.freeze({ ...none, minClearance: first, maxClearance: second });
    case "LT":
      return Object.freeze({ ...none, maxInterference: first, maxClearance: second });
    case "LN":
    case "FN":
      return Object.freeze({ ...none, minInterference: first, maxInterference: second });
  }
}
