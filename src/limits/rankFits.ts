import type { LengthLike } from "../units/index.js";
import { wantedTicks } from "./wantedTicks.js";

/** The clearance that is wanted, both ends signed: negative is interference. */
export interface WantedClearance {
  /** Least clearance that is wanted. */
  readonly min: LengthLike;
  /** Most clearance that is wanted; not under the least. */
  readonly max: LengthLike;
}

/** A fit that might serve: its extreme clearances in ticks, and what the ranking asks of it. */
export interface FitCandidate {
  /** Such as `"H7/m6"`; the last word among equals. */
  readonly designation: string;
  /** Min clearance in ticks of 0.1 nm, signed. */
  readonly minClearanceTicks: number;
  /** Max clearance in ticks of 0.1 nm, signed. */
  readonly maxClearanceTicks: number;
  /** Preference, 0 first: for instance preferred fits of a standard before all others. */
  readonly tier: number;
  /** Order within equals: hole basis 0, shaft basis 1. */
  readonly system: number;
}

/**
 * Picks the candidates whose clearance always lies within the wanted range, and puts the best first.
 *
 * The rule: lower tier first; then the one that uses more of the wanted range (wider tolerances are cheaper to
 * make); then the one nearer to its middle; then hole basis before shaft basis; then by name.
 *
 * @param candidates - fits with their extreme clearances in ticks of 0.1 nm
 * @param wanted - `min` and `max` clearance, signed, any unit
 * @returns a frozen list of the candidates that fit, best first
 * @throws `LIMITS_INVALID` where min or max is missing, `LIMITS_UPSIDE_DOWN` where max is below min, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { rankFits } from "limitsmith";
 *
 * const candidates = [
 *   { designation: "A", minClearanceTicks: 0, maxClearanceTicks: 100_000, tier: 0, system: 0 },
 *   { designation: "B", minClearanceTicks: 50_000, maxClearanceTicks: 400_000, tier: 0, system: 0 },
 * ];
 * rankFits(candidates, { min: "0 µm", max: "30 µm" }).map((one) => one.designation); // → ["A"]
 * ```
 * @reference none: a rule of this library, the same for ISO and inch fits
 */
export function rankFits<Candidate extends FitCandidate>(
  candidates: readonly Candidate[],
  wanted: WantedClearance,
): readonly Candidate[] {
  const { min, max } = wantedTicks(wanted);
  const middle = min + max;
  return Object.freeze(
    candidates
      .filter((one) => one.minClearanceTicks >= min && one.maxClearanceTicks <= max)
      .sort(
        (left, right) =>
          left.tier - right.tier ||
          width(right) - width(left) ||
          offset(left, middle) - offset(right, middle) ||
          left.system - right.system ||
          compareNames(left.designation, right.designation),
      ),
  );
}

function width(one: FitCandidate): number {
  return one.maxClearanceTicks - one.minClearanceTicks;
}

function offset(one: FitCandidate, middle: number): number {
  return Math.abs(one.maxClearanceTicks + one.minClearanceTicks - middle);
}

/** By code units, the same in every language; numbers as they are written. */
export function compareNames(left: string, right: string): number {
  return left < right ? -1 : left > right ? 1 : 0;
}
