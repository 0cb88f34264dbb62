import { asLength } from "./asLength.js";
import type { LengthLike } from "./length.js";

/**
 * Tells whether two lengths are the same to the tick; their units do not matter.
 *
 * @param left - any length, in any unit
 * @param right - any length, in any unit
 * @returns true where both are equal
 * @throws `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { equalLengths, inch, mm } from "limitsmith";
 *
 * equalLengths(inch(1), mm("25.4")); // → true
 * ```
 * @reference none: exact integer comparison
 */
export function equalLengths(left: LengthLike, right: LengthLike): boolean {
  return asLength(left).ticks === asLength(right).ticks;
}
