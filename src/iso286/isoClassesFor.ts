import { LimitsError } from "../errors.js";
import { asLimits, makeLimits } from "../limits/index.js";
import type { Limits, LimitsLike } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { asLength, lengthOfTicks, roundLength, writeLength } from "../units/index.js";
import type { Length, LengthLike, LengthUnit, Rounding } from "../units/index.js";
import { allClasses } from "./allClasses.js";
import { classIfDefined } from "./classIfDefined.js";
import { preferredIsoClasses } from "./preferredIsoClasses.js";
import { isInPrintedSpan } from "./printedSpan.js";
import { stepAt, stepIndexOf } from "./sizeStep.js";
import type { ToleranceClass } from "./toleranceClass.js";

/** How the printed limits may have been rounded. */
export interface PrintedRounding {
  readonly unit: LengthUnit;
  /** Decimals printed. */
  readonly places: number;
}

/** Options of {@link isoClassesFor}. */
export interface ClassesForOptions {
  /** Nominal size that the class is looked up by; that of the limits unless said otherwise. */
  readonly size?: LengthLike;
  /** The decimals that the limits were printed with; only exact matches count unless it is given. */
  readonly printed?: PrintedRounding;
  /** Look among holes or shafts only. */
  readonly kind?: "hole" | "shaft";
}

/** How exact limits turn into the printed ones. */
export type LimitsMatch = "exact" | "nearest" | "inside" | "outside";

/** A class whose limits are the ones given. */
export interface ClassMatch {
  readonly toleranceClass: ToleranceClass;
  /** `"exact"`, or the rounding that gives the printed limits. */
  readonly match: LimitsMatch;
  /** The exact limits of the class. */
  readonly limits: Limits;
  /** Given max minus exact max. */
  readonly maxDifference: Length;
  /** Given min minus exact min. */
  readonly minDifference: Length;
  /** Why it matches, in words and figures. */
  readonly why: string;
}

const ROUNDINGS: readonly { match: LimitsMatch; max: Rounding; min: Rounding }[] = [
  { match: "nearest", max: "nearest", min: "nearest" },
  { match: "inside", max: "down", min: "up" },
  { match: "outside", max: "up", min: "down" },
];

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
  const printed = printedOf(ownValue(options, "printed"));
  const preferred = new Set(preferredIsoClasses().map((one) => one.text));
  const standing = (cls: ToleranceClass): number =>
    preferred.has(cls.text) ? 0 : isInPrintedSpan(cls, stepAt(stepIndex)) ? 1 : 2;

  const found = kindsOf(ownValue(options, "kind")).flatMap(allClasses).flatMap((cls) => {
    const worked = classIfDefined(cls, stepIndex);
    if (worked === null) return [];
    const exact = makeLimits(size, worked.upper, worked.lower, worked.basis, cls.text);
    const match = matchOf(given, exact, printed);
    return match === null ? [] : [describe(cls, given, exact, match, printed)];
  });
  // a stable sort: equals stay in the order of the letters
  found.sort(
    (left, right) =>
      matchOrder(left.match) - matchOrder(right.match) || standing(left.toleranceClass) - standing(right.toleranceClass),
  );
  return Object.freeze(found);
}

function printedOf(given: unknown): PrintedRounding | undefined {
  if (given === undefined) return undefined;
  if (typeof given !== "object" || given === null) {
    throw new LimitsError("OPTION_INVALID", "printed says how the limits were rounded", {
      value: given,
      allowed: "{ unit, places }",
    });
  }
  return given as PrintedRounding;
}

function matchOf(given: Limits, exact: Limits, printed: PrintedRounding | undefined): LimitsMatch | null {
  if (given.max.ticks === exact.max.ticks && given.min.ticks === exact.min.ticks) return "exact";
  if (printed === undefined) return null;
  const { unit, places } = printed;
  for (const { match, max, min } of ROUNDINGS) {
    if (
      roundLength(exact.max, { unit, places, rounding: max }).ticks === given.max.ticks &&
      roundLength(exact.min, { unit, places, rounding: min }).ticks === given.min.ticks
    ) {
      return match;
    }
  }
  return null;
}

function describe(
  cls: ToleranceClass,
  given: Limits,
  exact: Limits,
  match: LimitsMatch,
  printed: PrintedRounding | undefined,
): ClassMatch {
  const { unit } = exact.nominal;
  return Object.freeze({
    toleranceClass: cls,
    match,
    limits: exact,
    maxDifference: lengthOfTicks(given.max.ticks - exact.max.ticks, unit),
    minDifference: lengthOfTicks(given.min.ticks - exact.min.ticks, unit),
    why: whyText(cls, exact, match, printed),
  });
}

function whyText(cls: ToleranceClass, exact: Limits, match: LimitsMatch, printed: PrintedRounding | undefined): string {
  const sizes = `${cls.text} on ${exact.nominal.toString()} is ${exact.max.toString()} / ${exact.min.toString()}`;
  if (match === "exact" || printed === undefined) return `${sizes}, exactly the limits given`;
  const { unit, places } = printed;
  const show = (length: Length, rounding: Rounding, more: number): string =>
    writeLength(length, { unit, places: places + more, rounding, symbol: false });
  const rule = ROUNDINGS.find((one) => one.match === match);
  const finer = `${show(exact.max, "nearest", 2)} / ${show(exact.min, "nearest", 2)} ${unit}`;
  const rounded = `${show(exact.max, rule?.max ?? "nearest", 0)} / ${show(exact.min, rule?.min ?? "nearest", 0)}`;
  return `${sizes}, that is ${finer}; rounded ${match} to ${places} decimals of ${unit} it reads ${rounded}`;
}

function matchOrder(match: LimitsMatch): number {
  return match === "exact" ? 0 : 1 + ROUNDINGS.findIndex((one) => one.match === match);
}

function kindsOf(kind: "hole" | "shaft" | undefined): ("hole" | "shaft")[] {
  if (kind === undefined) return ["hole", "shaft"];
  const given: unknown = kind;
  if (given !== "hole" && given !== "shaft") {
    throw new LimitsError("OPTION_INVALID", "a class is of a hole or a shaft", { value: given, allowed: "hole, shaft" });
  }
  return [given];
}
