import { rankFits, takeFits } from "../limits/index.js";
import type { Fit, TakenFits, WantedClearance } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { isoFit } from "./isoFit.js";
import { isoFitCandidates } from "./isoFitCandidates.js";
import type { PreferredFit } from "./preferredIsoFits.js";
import { stepIndexOf } from "./sizeStep.js";

/** What {@link isoFitsFor} is asked. */
export interface FitQuestion {
  /** Nominal size. */
  readonly size: LengthLike;
  /** Range that the clearance must always lie in; negative is interference. */
  readonly clearance: WantedClearance;
  /** How many fits to work out; 20 unless said otherwise. */
  readonly most?: number;
}

/** A fit that serves, with its standing. */
export interface FoundFit {
  /** The fit, worked out. */
  readonly fit: Fit;
  /** The standard that prefers it; `null` where none does. */
  readonly preferred: PreferredFit | null;
}

/** How many fits serve in all, and the best of them, best first. */
export type FoundFits = TakenFits<FoundFit>;

/**
 * Finds the hole-basis and shaft-basis fits whose clearance always lies in a wanted range, best first.
 *
 * Order: the named pairs of ANSI B4.2, then the other preferred fits of ISO 286-1, then fits of classes that
 * ISO 286-2 prints, then all others; within each group as {@link rankFits} says: more of the range used, nearer
 * its middle, hole basis first, name.
 *
 * @param question - `size` (over 0 up to 3150 mm, any unit), `clearance` `{ min, max }` (signed, any unit), and
 *   `most`: how many to work out (20 unless said otherwise)
 * @returns frozen `{ found, fits }`: the number that serve, and the best of them with limits in the unit of
 *   `size` and clearances in µm
 * @throws `ISO_SIZE_OUT_OF_RANGE`, `LIMITS_INVALID`, `LIMITS_UPSIDE_DOWN`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { isoFitsFor, mm, um } from "limitsmith";
 *
 * const answer = isoFitsFor({ size: mm(35), clearance: { min: um(5), max: um(60) } });
 * answer.fits[0]?.fit.designation; // → "H7/g6"
 * answer.fits[0]?.preferred?.name; // → "sliding"
 * ```
 * @reference ISO 286-1:2010, 3.4 (fit systems) and Tables 1 to 5; ANSI B4.2-1978 for the named pairs; the order is
 *   a rule of this library
 */
export function isoFitsFor(question: FitQuestion): FoundFits {
  const size = asLength(ownValue(question, "size") as LengthLike, ["size"]);
  const candidates = isoFitCandidates(stepIndexOf(size.ticks));
  return takeFits(
    rankFits(candidates, ownValue(question, "clearance") as WantedClearance),
    ownValue(question, "most"),
    ({ designation, preferred }) => Object.freeze({ fit: isoFit(size, designation), preferred }),
  );
}
