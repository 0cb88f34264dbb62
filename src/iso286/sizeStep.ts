import { LimitsError } from "../errors.js";
import { lengthOfTicks } from "../units/index.js";
import { INTERMEDIATE_STEP_ENDS_MM, MAIN_STEP_ENDS_MM } from "./tables/sizeSteps.js";

const TICKS_PER_MM = 10_000_000;
const ends: Float64Array = Float64Array.from(INTERMEDIATE_STEP_ENDS_MM, (end) => end * TICKS_PER_MM);
const mainOf: Uint8Array = Uint8Array.from(INTERMEDIATE_STEP_ENDS_MM, (end) =>
  MAIN_STEP_ENDS_MM.findIndex((mainEnd) => end <= mainEnd),
);

/** The size step that a nominal size belongs to. */
export interface SizeStep {
  /** Index among the intermediate steps. */
  readonly intermediate: number;
  /** Index among the main steps. */
  readonly main: number;
  /** True at or below 1 mm, where some classes and grades are not defined. */
  readonly tiny: boolean;
}

/** Number of different {@link SizeStep}s: each intermediate step, and the first one again up to 1 mm. */
export const STEP_COUNT: number = INTERMEDIATE_STEP_ENDS_MM.length + 1;

/** Index of a size's step: the steps of the table, the last index for sizes up to 1 mm. */
export function stepIndexOf(ticks: number): number {
  if (ticks <= TICKS_PER_MM) {
    if (ticks <= 0) throw outOfRange(ticks);
    return ends.length;
  }
  let low = 0;
  let high = ends.length;
  while (low < high) {
    const middle = (low + high) >>> 1;
    // an end belongs to the step below it: 50 mm is in 30 to 50
    if (ticks > (ends[middle] ?? 0)) low = middle + 1;
    else high = middle;
  }
  if (low === ends.length) throw outOfRange(ticks);
  return low;
}

/** The step behind an index of {@link stepIndexOf}. */
export function stepAt(index: number): SizeStep {
  const tiny = index === ends.length;
  const intermediate = tiny ? 0 : index;
  return { intermediate, main: mainOf[intermediate] ?? 0, tiny };
}

/** "over 30 up to 50 mm" for a main or intermediate step. */
export function stepText(step: SizeStep, kind: "main" | "intermediate"): string {
  const list = kind === "main" ? MAIN_STEP_ENDS_MM : INTERMEDIATE_STEP_ENDS_MM;
  const index = step[kind];
  return index === 0 ? `up to ${list[0] ?? 0} mm` : `over ${list[index - 1] ?? 0} up to ${list[index] ?? 0} mm`;
}

function outOfRange(ticks: number): LimitsError {
  return new LimitsError("ISO_SIZE_OUT_OF_RANGE", "the ISO system has no values for this nominal size", {
    value: lengthOfTicks(ticks, "mm").toString(),
    allowed: "over 0 up to 3150 mm",
  });
}
