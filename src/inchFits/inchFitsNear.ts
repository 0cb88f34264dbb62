import { nearestFits, takeFits } from "../limits/index.js";
import type { WantedClearance } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { inchCandidates } from "./inchCandidates.js";
import { inchFit } from "./inchFit.js";
import { basisOf } from "./inchFitsFor.js";
import type { FoundInchFits, InchFitQuestion } from "./inchFitsFor.js";

/**
 * Finds the classes of inch fits whose clearance range is nearest to a given one, nearest first.
 *
 * Order: as {@link nearestFits} says, the same as for ISO fits; among equals a row without caution comes first.
 *
 * @param question - `size` (over 0 up to 19.69 in, any unit), `clearance` `{ min, max }` (signed, any unit), `most` (20
 *   unless said otherwise) and `basis`, see {@link InchFitQuestion}
 * @returns frozen `{ found, fits }`: how many were looked at, and the nearest of them with limits in the unit of `size`
 *   and clearances in thou
 * @throws `INCH_SIZE_OUT_OF_RANGE`, `LIMITS_INVALID`, `LIMITS_UPSIDE_DOWN`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { inchFitsNear, mm, um } from "limitsmith";
 *
 * const answer = inchFitsNear({ size: mm(35), clearance: { min: um(9), max: um(50) }, most: 1 });
 * answer.fits[0]?.fit.designation; // → "LC5"
 * ```
 * @reference ANSI B4.1-1967, all classes searched; the order is a rule of this library
 */
export function inchFitsNear(question: InchFitQuestion): FoundInchFits {
  const size = asLength(ownValue(question, "size") as LengthLike, ["size"]);
  const candidates = inchCandidates(size.ticks, basisOf(question));
  return takeFits(
    nearestFits(candidates, ownValue(question, "clearance") as WantedClearance),
    ownValue(question, "most"),
    ({ designation }) => Object.freeze({ fit: inchFit(size, designation), preferred: null }),
  );
}
