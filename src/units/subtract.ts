import { asLength } from "./asLength.js";
import { lengthOfTicks } from "./length.js";
import type { Length, LengthLike } from "./length.js";

/**
 * Subtracts one length from another, exactly.
 *
 * @param left - any length, in any unit
 * @param right - what is taken away, in any unit
 * @returns the difference, in the unit of `left`; negative where `right` is larger
 * @throws `LENGTH_OUT_OF_RANGE`, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { mm, subtract, um } from "limitsmith";
 *
 * subtract(mm(40), um(25)).toString(); // → "39.975 mm"
 * ```
 * @reference none: exact integer arithmetic
 */
export function subtract(left: LengthLike, right: LengthLike): Length {
  const from = asLength(left);
  return lengthOfTicks(from.ticks - asLength(right).ticks, from.unit);
}
