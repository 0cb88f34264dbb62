import { asLength } from "./asLength.js";
import { lengthOfTicks } from "./length.js";
import type { Length, LengthLike } from "./length.js";

/**
 * Adds two lengths, exactly.
 *
 * @param left - any length, in any unit
 * @param right - any length, in any unit
 * @returns the sum, in the unit of `left`
 * @throws `LENGTH_OUT_OF_RANGE`, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { add, inch, um } from "limitsmith";
 *
 * add(inch("1"), um(18)).to("mm"); // → 25.418
 * ```
 * @reference none: exact integer arithmetic
 */
export function add(left: LengthLike, right: LengthLike): Length {
  const from = asLength(left);
  return lengthOfTicks(from.ticks + asLength(right).ticks, from.unit);
}
