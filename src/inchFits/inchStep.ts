import { LimitsError } from "../errors.js";
import { lengthOfTicks } from "../units/index.js";
import { FORCE_STEP_ENDS_IN, GENERAL_STEP_ENDS_IN, TOLERANCE_STEP_ENDS_IN } from "./tables/sizeSteps.js";

/** A row of size steps. */
export interface InchSteps {
  /** Upper ends, in ticks of 0.1 nm. */
  readonly ends: readonly number[];
  /** Upper ends as the standard prints them, in inches. */
  readonly printed: readonly string[];
  /** What lies beyond, for the error. */
  readonly allowed: string;
}

const TICKS_PER_INCH = 254_000_000;
const FITS_ALLOWED =
  "over 0 up to 19.69 in: the limits that the standard has beyond were not found in any published table";

export const GENERAL_STEPS: InchSteps = stepsOf(GENERAL_STEP_ENDS_IN, FITS_ALLOWED);
export const FORCE_STEPS: InchSteps = stepsOf(FORCE_STEP_ENDS_IN, FITS_ALLOWED);
export const TOLERANCE_STEPS: InchSteps = stepsOf(TOLERANCE_STEP_ENDS_IN, "over 0 up to 200 in");

/** Index of the step that a size belongs to; sizes outside the table are refused. */
export function inchStepIndex(steps: InchSteps, ticks: number): number {
  const { ends } = steps;
  // an end belongs to the step below it: 1.19 is in 0.71 to 1.19
  for (let index = 0; index < ends.length; index++) {
    if (ticks <= (ends[index] ?? 0) && ticks > 0) return index;
  }
  throw new LimitsError("INCH_SIZE_OUT_OF_RANGE", "the inch system has no values for this basic size", {
    value: lengthOfTicks(ticks, "in").toString(),
    allowed: steps.allowed,
  });
}

/** "over 0.71 up to 1.19 in". */
export function inchStepText(steps: InchSteps, index: number): string {
  return inchSpanText(steps, index, index);
}

/** "over 0.71 up to 19.69 in": from the start of one step to the end of another. */
export function inchSpanText(steps: InchSteps, first: number, last: number): string {
  const end = steps.printed[last] ?? "";
  return first === 0 ? `up to ${end} in` : `over ${steps.printed[first - 1] ?? ""} up to ${end} in`;
}

function stepsOf(ends: readonly number[], allowed: string): InchSteps {
  return {
    ends: ends.map((end) => Math.round(end * TICKS_PER_INCH)),
    // the standard prints two decimals, and one over 100 in
    printed: ends.map((end) => (end > 100 ? String(end) : end.toFixed(2))),
    allowed,
  };
}
