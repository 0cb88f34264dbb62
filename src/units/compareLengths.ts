import { asLength } from "./asLength.js";
import type { LengthLike } from "./length.js";

/**
 * Compares two lengths by size; their units do not matter.
 *
 * @param left - any length, in any unit
 * @param right - any length, in any unit
 * @returns −1 where `left` is shorter, 1 where it is longer, 0 where both are equal: an order for `sort`
 *   (a plain number without a unit)
 * @throws `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { compareLengths, inch, mm } from "limitsmith";
 *
 * compareLengths(inch(1), mm(25)); // → 1
 * [mm(3), inch("1/8"), mm(1)].sort(compareLengths).join(", "); // → "1 mm, 3 mm, 0.125 in"
 * ```
 * @reference none: exact integer comparison
 */
export function compareLengths(left: LengthLike, right: LengthLike): -1 | 0 | 1 {
  const difference = asLength(left).ticks - asLength(right).ticks;
  return difference < 0 ? -1 : difference > 0 ? 1 : 0;
}
