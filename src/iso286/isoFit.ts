import { fitClearances, limitsAt, makeFit } from "../limits/index.js";
import type { Fit, FitClearances } from "../limits/index.js";
import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { classAtStep } from "./classAtStep.js";
import type { ClassAtStep } from "./classAtStep.js";
import { isoOptions } from "./isoOptions.js";
import type { IsoOptions } from "./isoOptions.js";
import { parseFit } from "./parseFit.js";
import type { FitClassesLike } from "./parseFit.js";
import { stepIndexOf } from "./sizeStep.js";

// goes with its hole class: what nobody holds any more can be collected
const clearances: WeakMap<ClassAtStep, Map<ClassAtStep, FitClearances>> = new WeakMap<
  ClassAtStep,
  Map<ClassAtStep, FitClearances>
>();

/**
 * An ISO fit: limits of hole and shaft, clearances, kind.
 *
 * @param size - nominal size of both, over 0 up to 3150 mm, in any unit
 * @param fit - `"H7/m6"`, `"H7-m6"`, or `{ hole, shaft }`: one hole class and one shaft class
 * @param options - `edition` and `jsRounding`, see {@link IsoOptions}
 * @returns the frozen fit: limits in the unit of `size`, clearances in µm, signed (negative is interference)
 * @throws `FIT_MALFORMED`, `FIT_NOT_HOLE_AND_SHAFT`, and what `isoLimits` throws
 * @example
 * ```ts
 * import { isoFit, mm } from "limitsmith";
 *
 * const fit = isoFit(mm(35), "H7/k6");
 * fit.kind; // → "transition"
 * fit.maxClearance.toString(); // → "23 µm"
 * fit.maxInterference.toString(); // → "18 µm"
 * fit.system; // → "hole basis"
 * ```
 * @reference ISO 286-1:2010, 3.3 and Tables 1 to 5
 */
export function isoFit(size: LengthLike, fit: FitClassesLike, options?: IsoOptions): Fit {
  const { hole, shaft } = parseFit(fit);
  const nominal = asLength(size);
  const chosen = isoOptions(options);
  const step = stepIndexOf(nominal.ticks);
  const forHole = classAtStep(hole, step, chosen);
  const forShaft = classAtStep(shaft, step, chosen);
  return makeFit(
    limitsAt(nominal, forHole.set),
    limitsAt(nominal, forShaft.set),
    undefined,
    clearancesOf(forHole, forShaft),
  );
}

/** Clearances of two classes at one step, worked out once: they are alike for every size of the step. */
function clearancesOf(hole: ClassAtStep, shaft: ClassAtStep): FitClearances {
  let withHole = clearances.get(hole);
  if (withHole === undefined) clearances.set(hole, (withHole = new Map<ClassAtStep, FitClearances>()));
  let found = withHole.get(shaft);
  if (found === undefined) withHole.set(shaft, (found = fitClearances(hole.set, shaft.set)));
  return found;
}
