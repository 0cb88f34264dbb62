import { asLimits, compareMatches, limitsAt, matchLimits, memberKinds } from "../limits/index.js";
import type { ClassesForOptions, LimitsLike, MatchedLimits } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import { allClasses } from "./allClasses.js";
import { classIfDefined } from "./classIfDefined.js";
import { preferredIsoClasses } from "./preferredIsoClasses.js";
import { isInPrintedSpan } from "./printedSpan.js";
import { stepAt, stepIndexOf } from "./sizeStep.js";
import type { ToleranceClass } from "./toleranceClass.js";

/** A class whose limits are the ones given. */
export interface ClassMatch extends MatchedLimits {
  /** The class, taken apart. */
  readonly toleranceClass: ToleranceClass;
}

/**
 * Finds the tolerance classes whose limits are exactly, or rounded as printed, the ones given.
 *
 * Order: exact matches first, then nearest, inside and outside rounding; within each the preferred classes, then
 * those that ISO 286-2 prints, then the others; then in the order of the letters.
 *
 * @param limits - limits as printed, any unit; the class is looked up by their nominal unless `size` is given
 * @param options - `size`, `printed` `{ unit, places }`, `kind`, see {@link ClassesForOptions}
 * @returns a frozen list, empty where no class has these limits; limits and differences in the unit of the size
 * @throws `ISO_SIZE_OUT_OF_RANGE`, `OPTION_INVALID`, and what {@link asLimits} throws
 * @example
 * ```ts
 * import { inch, isoClassesFor, limitsFromMaxMin, mm } from "limitsmith";
 *
 * const printed = limitsFromMaxMin({ max: inch("1.3787"), min: inch("1.3780"), nominal: mm(35) });
 * const [first] = isoClassesFor(printed, { printed: { unit: "in", places: 4 }, kind: "shaft" });
 * first?.toleranceClass.text; // → "k6"
 * first?.match; // → "nearest"
 * ```
 * @reference ISO 286-1:2010, Tables 1 to 5, searched over all classes
 */
export function isoClassesFor(limits: LimitsLike, options?: ClassesForOptions): readonly ClassMatch[] {
  const given = asLimits(limits);
  const sizeGiven = ownValue(options, "size");
  const size = sizeGiven === undefined ? given.nominal : asLength(sizeGiven, ["size"]);
  const stepIndex = stepIndexOf(size.ticks);
  const printed = ownValue(options, "printed");
  const preferred = new Set(preferredIsoClasses().map((one) => one.text));
  const standing = (cls: ToleranceClass): number =>
    preferred.has(cls.text) ? 0 : isInPrintedSpan(cls, stepAt(stepIndex)) ? 1 : 2;

  const found = memberKinds(ownValue(options, "kind"))
    .flatMap(allClasses)
    .flatMap((toleranceClass) => {
      const worked = classIfDefined(toleranceClass, stepIndex);
      if (worked === null) return [];
      const exact = limitsAt(size, worked.set);
      const match = matchLimits(given, exact, printed);
      return match === null ? [] : [Object.freeze({ toleranceClass, ...match })];
    });
  // a stable sort: equals stay in the order of the letters
  found.sort(
    (left, right) => compareMatches(left, right) || standing(left.toleranceClass) - standing(right.toleranceClass),
  );
  return Object.freeze(found);
}
