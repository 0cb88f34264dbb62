import { LimitsError } from "../errors.js";

/** How many fits serve, and the best of them. */
export interface TakenFits<Found> {
  /** How many fits serve in all. */
  readonly found: number;
  /** The best of them, best first. */
  readonly fits: readonly Found[];
}

const USUAL_MOST = 20;

/**
 * Works out the first fits of a ranked list and counts them all.
 *
 * @param ranked - candidates, best first (no unit)
 * @param most - how many to work out (no unit); 20 where it is `undefined`
 * @param workOut - makes a found fit of a candidate
 * @returns frozen `{ found, fits }`: the number of candidates, and the first of them worked out (in their own units)
 * @throws `OPTION_INVALID` for a `most` that is no whole number from 0, and what `workOut` throws
 * @example
 * ```ts
 * import { takeFits } from "limitsmith";
 *
 * takeFits(["H7/g6", "G7/h6"], 1, (name) => name); // → { found: 2, fits: ["H7/g6"] }
 * ```
 * @reference none: a convenience of this library, the same for ISO and inch fits
 */
export function takeFits<Candidate, Found>(
  ranked: readonly Candidate[],
  most: number | undefined,
  workOut: (candidate: Candidate) => Found,
): TakenFits<Found> {
  const count = most ?? USUAL_MOST;
  if (!Number.isInteger(count) || count < 0) {
    throw new LimitsError("OPTION_INVALID", "not a number of fits", { value: count, allowed: "a whole number from 0" });
  }
  return Object.freeze({ found: ranked.length, fits: Object.freeze(ranked.slice(0, count).map(workOut)) });
}
