import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { lengthOfTicks, roundLength, writeLength } from "../units/index.js";
import type { Length, LengthUnit, Rounding } from "../units/index.js";
import { ROUNDINGS } from "./limitsMatch.js";
import type { LimitsMatch, MatchedLimits, PrintedRounding } from "./limitsMatch.js";
import type { Limits } from "./limitsValue.js";

/**
 * Tells whether limits are exactly, or rounded as printed, those of a class, and says why.
 *
 * @param given - limits as printed, any unit
 * @param exact - the exact limits of a class, whose designation names it in the text
 * @param printed - unit and decimals of the print; only an exact match counts without it
 * @returns the frozen match, differences in the unit of `exact`; `null` where there is none
 * @throws `OPTION_INVALID` for a unit or decimals that cannot be
 * @example
 * ```ts
 * import { inch, limits, limitsFromMaxMin, matchLimits, mm } from "limitsmith";
 *
 * const exact = limits({ nominal: "35 mm", upper: "18 µm", lower: "2 µm", designation: "k6" });
 * const printed = limitsFromMaxMin({ max: inch("1.3787"), min: inch("1.3780"), nominal: mm(35) });
 * matchLimits(printed, exact); // → null
 * matchLimits(printed, exact, { unit: "in", places: 4 })?.match; // → "nearest"
 * ```
 * @reference none: a rule of this library, the same for ISO and inch classes
 */
export function matchLimits(given: Limits, exact: Limits, printed?: PrintedRounding): MatchedLimits | null {
  const rounding = printed === undefined ? undefined : checked(printed);
  const match = matchOf(given, exact, rounding);
  if (match === null) return null;
  const { unit } = exact.nominal;
  return Object.freeze({
    match,
    limits: exact,
    maxDifference: lengthOfTicks(given.max.ticks - exact.max.ticks, unit),
    minDifference: lengthOfTicks(given.min.ticks - exact.min.ticks, unit),
    why: whyText(exact, match, rounding),
  });
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

function whyText(exact: Limits, match: LimitsMatch, printed: PrintedRounding | undefined): string {
  const name = exact.designation ?? "the class";
  const sizes = `${name} on ${exact.nominal.toString()} is ${exact.max.toString()} / ${exact.min.toString()}`;
  if (match === "exact" || printed === undefined) return `${sizes}, exactly the limits given`;
  const { unit, places } = printed;
  const show = (length: Length, rounding: Rounding, more: number): string =>
    writeLength(length, { unit, places: places + more, rounding, symbol: false });
  const rule = ROUNDINGS.find((one) => one.match === match);
  const finer = `${show(exact.max, "nearest", 2)} / ${show(exact.min, "nearest", 2)} ${unit}`;
  const rounded = `${show(exact.max, rule?.max ?? "nearest", 0)} / ${show(exact.min, rule?.min ?? "nearest", 0)}`;
  return `${sizes}, that is ${finer}; rounded ${match} to ${places} decimals of ${unit} it reads ${rounded}`;
}

/** What is missing stays undefined, and the rounding refuses it. */
function checked(printed: PrintedRounding): PrintedRounding {
  const given: unknown = printed;
  if (typeof given !== "object" || given === null) {
    throw new LimitsError("OPTION_INVALID", "printed says how the limits were rounded", {
      value: given,
      allowed: "{ unit, places }",
    });
  }
  return { unit: ownValue(printed, "unit") as LengthUnit, places: ownValue(printed, "places") as number };
}
