import { LimitsError } from "../errors.js";
import { asLength, subtract } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { ownValue } from "../ownValue.js";

/** The clearance that is wanted, both ends signed: negative is interference. */
export interface WantedClearance {
  readonly min: LengthLike;
  readonly max: LengthLike;
}

/** A fit that might serve: its extreme clearances in ticks, and what the ranking asks of it. */
export interface FitCandidate {
  readonly designation: string;
  readonly minClearanceTicks: number;
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
          (left.designation < right.designation ? -1 : left.designation > right.designation ? 1 : 0),
      ),
  );
}

function wantedTicks(wanted: WantedClearance): { min: number; max: number } {
  const given: unknown = wanted;
  const least = typeof given === "object" && given !== null ? ownValue(wanted, "min") : undefined;
  const most = typeof given === "object" && given !== null ? ownValue(wanted, "max") : undefined;
  if (least === undefined || most === undefined) {
    throw new LimitsError("LIMITS_INVALID", "the wanted clearance has a min and a max", {
      value: given,
      allowed: "{ min, max }, each a length with its unit; negative is interference",
      path: ["clearance"],
    });
  }
  const min = asLength(least, ["clearance", "min"]);
  const max = asLength(most, ["clearance", "max"]);
  if (subtract(max, min).ticks < 0) {
    throw new LimitsError("LIMITS_UPSIDE_DOWN", "the wanted max clearance lies below the min", {
      value: `${min.toString()} to ${max.toString()}`,
      path: ["clearance"],
    });
  }
  return { min: min.ticks, max: max.ticks };
}

function width(one: FitCandidate): number {
  return one.maxClearanceTicks - one.minClearanceTicks;
}

function offset(one: FitCandidate, middle: number): number {
  return Math.abs(one.maxClearanceTicks + one.minClearanceTicks - middle);
}
