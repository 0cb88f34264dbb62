import { asLimits, compareMatches, limitsAt, matchLimits, memberKinds } from "../limits/index.js";
import type { ClassesForOptions, LimitsLike, MatchedLimits } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import { classesAtSize } from "./inchCandidates.js";
import type { InchClass } from "./inchClass.js";

/** A class of inch fits whose hole or shaft has the limits given. */
export interface InchClassMatch extends MatchedLimits {
  /** The class, taken apart. */
  readonly fitClass: InchClass;
  /** Which of its members has these limits. */
  readonly kind: "hole" | "shaft";
}

/**
 * Finds the classes of inch fits whose hole or shaft has exactly, or rounded as printed, the limits given.
 *
 * Order: exact matches first, then nearest, inside and outside rounding; within each hole basis before shaft basis, then
 * rows without caution, then the order of the standard. Many classes share a hole: say which kind the limits are of.
 *
 * @param limits - limits as printed, any unit; the class is looked up by their nominal unless `size` is given
 * @param options - `size`, `printed` `{ unit, places }`, `kind`, see {@link ClassesForOptions}
 * @returns a frozen list, empty where no class has these limits; limits and differences in the unit of the size
 * @throws `INCH_SIZE_OUT_OF_RANGE`, `OPTION_INVALID`, and what {@link asLimits} throws
 * @example
 * ```ts
 * import { inch, inchClassesFor, limitsFromMaxMin } from "limitsmith";
 *
 * const seat = limitsFromMaxMin({ max: inch("1.2516"), min: inch("1.2510"), nominal: inch("1.25") });
 * const [first] = inchClassesFor(seat, { kind: "shaft" });
 * first?.fitClass.text; // → "LN2"
 * first?.match; // → "exact"
 * ```
 * @reference ANSI B4.1-1967, all classes searched on hole basis and shaft basis
 */
export function inchClassesFor(limits: LimitsLike, options?: ClassesForOptions): readonly InchClassMatch[] {
  const given = asLimits(limits);
  const sizeGiven = ownValue(options, "size");
  const size = sizeGiven === undefined ? given.nominal : asLength(sizeGiven, ["size"]);
  const printed = ownValue(options, "printed");
  const kinds = memberKinds(ownValue(options, "kind"));

  const holeBasis = classesAtSize(size.ticks, "hole");
  // h shafts (LC1 to LC4) stay where they are, and need no second mention
  const shaftBasis = classesAtSize(size.ticks, "shaft").filter(({ at }) => at.hole.lower.ticks !== 0);
  const found = [holeBasis, shaftBasis].flatMap((classes, order) =>
    classes.flatMap(({ cls, at, sure }) =>
      kinds.flatMap((kind) => {
        const exact = kind === "hole" ? limitsAt(size, at.hole) : limitsAt(size, at.shaft);
        const match = matchLimits(given, exact, printed);
        const standing = 2 * order + (sure ? 0 : 1);
        return match === null ? [] : [{ standing, match: Object.freeze({ fitClass: cls, kind, ...match }) }];
      }),
    ),
  );
  // a stable sort: equals stay in the order of the standard
  found.sort((left, right) => compareMatches(left.match, right.match) || left.standing - right.standing);
  return Object.freeze(found.map(({ match }) => match));
}
