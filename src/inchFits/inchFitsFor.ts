import { LimitsError } from "../errors.js";
import { rankFits, takeFits } from "../limits/index.js";
import type { TakenFits, WantedClearance } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { inchCandidates } from "./inchCandidates.js";
import { inchFit } from "./inchFit.js";
import type { InchFit } from "./inchFitValue.js";

/** What {@link inchFitsFor} and `inchFitsNear` are asked. */
export interface InchFitQuestion {
  /** Basic size. */
  readonly size: LengthLike;
  /** Clearance range; negative is interference. */
  readonly clearance: WantedClearance;
  /** How many fits to work out; 20 unless said otherwise. */
  readonly most?: number;
  /** `"hole"` or `"shaft"` basis; `"hole"` unless said otherwise. Both have the same clearances. */
  readonly basis?: "hole" | "shaft";
}

/** A fit that serves, in the shape of the ISO answer. */
export interface FoundInchFit {
  /** The fit, worked out. */
  readonly fit: InchFit;
  /** Always `null`: the standard prefers no class to another. */
  readonly preferred: null;
}

/** How many fits serve in all, and the best of them, best first. */
export type FoundInchFits = TakenFits<FoundInchFit>;

/**
 * Finds the classes of inch fits whose clearance always lies in a wanted range, best first.
 *
 * Order: as {@link rankFits} says, the same as for ISO fits: more of the range used, nearer its middle, name. Rows that
 * carry a caution (from memory, or printed differently in two tables) come after all others.
 *
 * @param question - `size` (over 0 up to 19.69 in, any unit), `clearance` `{ min, max }` (signed, any unit), `most` (20
 *   unless said otherwise) and `basis`, see {@link InchFitQuestion}
 * @returns frozen `{ found, fits }`: the number that serve, and the best of them with limits in the unit of `size` and
 *   clearances in thou
 * @throws `INCH_SIZE_OUT_OF_RANGE`, `LIMITS_INVALID`, `LIMITS_UPSIDE_DOWN`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { inch, inchFitsFor, thou } from "limitsmith";
 *
 * const answer = inchFitsFor({ size: inch("1.25"), clearance: { min: thou(1), max: thou(4) } });
 * answer.found; // → 2
 * answer.fits.map((one) => one.fit.designation); // → ["RC4", "RC3"]
 * ```
 * @reference ANSI B4.1-1967, all classes searched; the order is a rule of this library
 */
export function inchFitsFor(question: InchFitQuestion): FoundInchFits {
  const size = asLength(ownValue(question, "size") as LengthLike, ["size"]);
  const candidates = inchCandidates(size.ticks, basisOf(question));
  return takeFits(
    rankFits(candidates, ownValue(question, "clearance") as WantedClearance),
    ownValue(question, "most"),
    ({ designation }) => Object.freeze({ fit: inchFit(size, designation), preferred: null }),
  );
}

/** The basis that the question asks for. */
export function basisOf(question: InchFitQuestion): "hole" | "shaft" {
  const basis: unknown = ownValue(question, "basis");
  if (basis === undefined) return "hole";
  if (basis !== "hole" && basis !== "shaft") {
    throw new LimitsError("OPTION_INVALID", "not a basis to look among", {
      value: basis,
      allowed: "hole, shaft",
      path: ["basis"],
    });
  }
  return basis;
}
