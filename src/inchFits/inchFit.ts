import { limitsAt, makeFit } from "../limits/index.js";
import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { fitAtSize } from "./fitAtSize.js";
import type { InchFit } from "./inchFitValue.js";
import { readingOf, withBasis } from "./inchOptions.js";
import type { InchFitOptions } from "./inchOptions.js";
import { parseInchClass } from "./parseInchClass.js";
import type { InchClassLike } from "./parseInchClass.js";

/**
 * An inch fit of a standard class: limits of hole and shaft, clearances, purpose.
 *
 * Rows are read, never computed from the symbols. Rows that published tables print differently (RC2 and RC4 over
 * 9.85 in) or that are only remembered stay usable, and carry a caution.
 *
 * @param size - basic size of both, over 0 up to 19.69 in, in any unit; a step takes its upper end
 * @param fitClass - such as `"LN2"`, `"LN 2"`, `"ln2"`; with suffix S for shaft basis, B for a bilateral hole
 * @param options - `basis` (`"hole"`, `"shaft"`, `"bilateral hole"`) and `reading`, see {@link InchFitOptions}
 * @returns the frozen fit: limits in the unit of `size`, deviations and clearances in thou, signed (negative is
 *   interference), with the printed limits of fit, symbols, purpose, basis and cautions
 * @throws `INCH_CLASS_MALFORMED`, `INCH_CLASS_UNKNOWN`, `INCH_SIZE_OUT_OF_RANGE`, `INCH_ROW_NOT_DEFINED` (FN3 up to
 *   0.95 in, LT3 and LT4 up to 0.24 in, RC1B up to 0.12 in), `INCH_ROW_MISSING` (LC9 over 9.85 in),
 *   `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { inch, inchFit } from "limitsmith";
 *
 * const fit = inchFit(inch("1.250"), "LN2");
 * fit.shaft.max.toString(); // → "1.2516 in"
 * fit.shaft.min.toString(); // → "1.251 in"
 * fit.maxInterference.toString(); // → "1.6 thou"
 * fit.symbols; // → { hole: "H7", shaft: "p6" }
 * inchFit(inch("1.250"), "LN2", { basis: "shaft" }).hole.max.toString(); // → "1.2494 in"
 * ```
 * @reference ANSI B4.1-1967, tables of RC, LC, LT, LN and FN fits; modified fits: suffix S moves all four limits by
 *   minus the upper limit of the shaft; suffix B (from memory) takes the plus limit of the hole one grade finer
 */
export function inchFit(size: LengthLike, fitClass: InchClassLike, options?: InchFitOptions): InchFit {
  const cls = withBasis(parseInchClass(fitClass), options);
  const nominal = asLength(size);
  const at = fitAtSize(cls, nominal.ticks, readingOf(options));
  const fit = makeFit(limitsAt(nominal, at.hole), limitsAt(nominal, at.shaft), at.cautions, at.clearances);
  const { symbols, printedLimits, purpose, reading } = at;
  // written out: spreading one object into another costs more than the rest of the fit
  return Object.freeze({
    hole: fit.hole,
    shaft: fit.shaft,
    nominal,
    kind: fit.kind,
    system: fit.system,
    maxClearance: fit.maxClearance,
    minClearance: fit.minClearance,
    maxInterference: fit.maxInterference,
    minInterference: fit.minInterference,
    variation: fit.variation,
    designation: cls.text,
    basis: at.hole.basis,
    cautions: fit.cautions,
    fitClass: cls,
    symbols,
    printedLimits,
    purpose,
    reading,
  });
}
