import { compareNames } from "./rankFits.js";
import type { FitCandidate, WantedClearance } from "./rankFits.js";
import { wantedTicks } from "./wantedTicks.js";

/**
 * Puts the candidates in the order of how near their clearance range is to a given one.
 *
 * The rule: the larger of the two differences, at the least and at the greatest clearance, counts first; then the sum
 * of both; then the lower tier; then hole basis before shaft basis; then the name.
 *
 * @param candidates - fits with their extreme clearances in ticks of 0.1 nm
 * @param clearance - the range to come near to: `min` and `max` clearance, signed, any unit
 * @returns a frozen list of all candidates, nearest first
 * @throws `LIMITS_INVALID` where min or max is missing, `LIMITS_UPSIDE_DOWN` where max is below min, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { nearestFits } from "limitsmith";
 *
 * const candidates = [
 *   { designation: "A", minClearanceTicks: 0, maxClearanceTicks: 100_000, tier: 0, system: 0 },
 *   { designation: "B", minClearanceTicks: 50_000, maxClearanceTicks: 400_000, tier: 0, system: 0 },
 * ];
 * nearestFits(candidates, { min: "0 µm", max: "30 µm" }).map((one) => one.designation); // → ["B", "A"]
 * ```
 * @reference none: a rule of this library, the same for ISO and inch fits
 */
export function nearestFits<Candidate extends FitCandidate>(
  candidates: readonly Candidate[],
  clearance: WantedClearance,
): readonly Candidate[] {
  const { min, max } = wantedTicks(clearance);
  const measured = candidates.map((candidate) => {
    const atMin = Math.abs(candidate.minClearanceTicks - min);
    const atMax = Math.abs(candidate.maxClearanceTicks - max);
    return { candidate, larger: Math.max(atMin, atMax), sum: atMin + atMax };
  });
  measured.sort(
    (left, right) =>
      left.larger - right.larger ||
      left.sum - right.sum ||
      left.candidate.tier - right.candidate.tier ||
      left.candidate.system - right.candidate.system ||
      compareNames(left.candidate.designation, right.candidate.designation),
  );
  return Object.freeze(measured.map(({ candidate }) => candidate));
}
