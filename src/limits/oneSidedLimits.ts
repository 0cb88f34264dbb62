import { asLength, lengthOfTicks } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { limits } from "./limits.js";
import type { LimitsParts } from "./limits.js";
import type { Limits } from "./limitsValue.js";

/**
 * Makes limits from a nominal size and one deviation; the other one is zero.
 *
 * @param nominal - nominal size, any unit
 * @param deviation - the signed deviation, any unit: above zero it is the upper one, below zero the lower one
 * @param options - `basis` and `designation` where you know them
 * @returns frozen limits in the nominal's unit
 * @throws `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { mm, oneSidedLimits, um } from "limitsmith";
 *
 * const shaft = oneSidedLimits(mm(32), um(-20));
 * shaft.max.toString(); // → "32 mm"
 * shaft.min.toString(); // → "31.98 mm"
 * ```
 * @reference ASME Y14.5-2018, 5.2 (unilateral tolerance), from memory
 */
export function oneSidedLimits(
  nominal: LengthLike,
  deviation: LengthLike,
  options?: Pick<LimitsParts, "basis" | "designation">,
): Limits {
  const given = asLength(deviation, ["deviation"]);
  const zero = lengthOfTicks(0, given.unit);
  const above = given.ticks > 0;
  return limits({ ...options, nominal, upper: above ? given : zero, lower: above ? zero : given });
}
