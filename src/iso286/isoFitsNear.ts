import { LimitsError } from "../errors.js";
import { nearestFits, takeFits } from "../limits/index.js";
import type { WantedClearance } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { isoFit } from "./isoFit.js";
import { isoFitCandidates, preferredFitCandidates } from "./isoFitCandidates.js";
import type { IsoFitCandidate } from "./isoFitCandidates.js";
import type { FitQuestion, FoundFits } from "./isoFitsFor.js";
import { stepIndexOf } from "./sizeStep.js";

/** What {@link isoFitsNear} is asked. */
export interface NearFitQuestion extends FitQuestion {
  /** The clearance range to come near to; negative is interference. */
  readonly clearance: WantedClearance;
  /**
   * `"preferred"` (fits that ANSI B4.2 or ISO 286-1 prefers), `"printed"` (also those of classes that ISO 286-2
   * prints) or `"all"`. `"preferred"` unless said otherwise.
   */
  readonly among?: "preferred" | "printed" | "all";
  /** One system only; both unless said otherwise. */
  readonly system?: "hole basis" | "shaft basis";
}

// preferred fits, then fits of classes that ISO 286-2 prints
const LAST_PRINTED_TIER = 2;

/**
 * Finds the ISO fits whose clearance range is nearest to a given one, nearest first.
 *
 * Order: as {@link nearestFits} says; among equals the named pairs of ANSI B4.2 come first, then the other preferred
 * fits, then fits of classes that ISO 286-2 prints.
 *
 * @param question - `size` (over 0 up to 3150 mm, any unit), `clearance` `{ min, max }` (signed, any unit), `most`,
 *   `among` and `system`, see {@link NearFitQuestion}
 * @returns frozen `{ found, fits }`: how many were looked at, and the nearest of them with limits in the unit of
 *   `size` and clearances in µm
 * @throws `ISO_SIZE_OUT_OF_RANGE`, `LIMITS_INVALID`, `LIMITS_UPSIDE_DOWN`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { inch, isoFitsNear, thou } from "limitsmith";
 *
 * const answer = isoFitsNear({ size: inch("1.25"), clearance: { min: thou("-1.6"), max: thou(0) }, most: 1 });
 * answer.fits[0]?.fit.designation; // → "H7/p6"
 * ```
 * @reference ISO 286-1:2010, 3.4 and Tables 1 to 5; the order is a rule of this library
 */
export function isoFitsNear(question: NearFitQuestion): FoundFits {
  const size = asLength(ownValue(question, "size") as LengthLike, ["size"]);
  const candidates = candidatesOf(question, stepIndexOf(size.ticks));
  return takeFits(
    nearestFits(candidates, ownValue(question, "clearance") as WantedClearance),
    ownValue(question, "most"),
    ({ designation, preferred }) => Object.freeze({ fit: isoFit(size, designation), preferred }),
  );
}

function candidatesOf(question: NearFitQuestion, stepIndex: number): readonly IsoFitCandidate[] {
  const system: unknown = ownValue(question, "system");
  if (system !== undefined && system !== "hole basis" && system !== "shaft basis") {
    throw new LimitsError("OPTION_INVALID", "not a system of fits", {
      value: system,
      allowed: "hole basis, shaft basis",
      path: ["system"],
    });
  }
  const wanted = system === "hole basis" ? 0 : 1;
  return candidatesAmong(ownValue(question, "among"), stepIndex).filter(
    (one) => system === undefined || one.both || one.system === wanted,
  );
}

function candidatesAmong(among: unknown, stepIndex: number): readonly IsoFitCandidate[] {
  switch (among) {
    case undefined:
    case "preferred":
      return preferredFitCandidates(stepIndex);
    case "printed":
      return isoFitCandidates(stepIndex).filter((one) => one.tier <= LAST_PRINTED_TIER);
    case "all":
      return isoFitCandidates(stepIndex);
    default:
      throw new LimitsError("OPTION_INVALID", "not a group of fits", {
        value: among,
        allowed: "preferred, printed, all",
        path: ["among"],
      });
  }
}
