import { ROUNDINGS } from "./limitsMatch.js";
import type { LimitsMatch, MatchedLimits } from "./limitsMatch.js";

/**
 * Orders matches for a sort: exact ones first, then nearest, inside and outside rounding.
 *
 * @param left - a match of `matchLimits` (no unit)
 * @param right - another one (no unit)
 * @returns a bare number (no unit), negative where `left` comes first, zero where they are equals
 * @throws nothing
 * @example
 * ```ts
 * import { compareMatches, limits, matchLimits } from "limitsmith";
 *
 * const seat = limits({ nominal: "35 mm", upper: "18 µm", lower: "2 µm" });
 * const exact = matchLimits(seat, seat);
 * exact === null ? null : compareMatches(exact, exact); // → 0
 * ```
 * @reference none: a rule of this library, the same for ISO and inch classes
 */
export function compareMatches(left: MatchedLimits, right: MatchedLimits): number {
  return matchOrder(left.match) - matchOrder(right.match);
}

function matchOrder(match: LimitsMatch): number {
  return match === "exact" ? 0 : 1 + ROUNDINGS.findIndex((one) => one.match === match);
}
