import { LimitsError } from "../errors.js";
import { asLength, multiply } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { limits } from "./limits.js";
import type { LimitsParts } from "./limits.js";
import type { Limits } from "./limitsValue.js";

/**
 * Makes limits from a nominal size and an equal deviation to both sides.
 *
 * @param nominal - nominal size, any unit
 * @param deviation - the ± value, any unit, not negative
 * @param options - `basis` and `designation` where you know them
 * @returns frozen limits in the nominal's unit
 * @throws `LIMITS_UPSIDE_DOWN` for a negative deviation, `LENGTH_INVALID`, and what `readLength` throws
 * @example
 * ```ts
 * import { inch, symmetricLimits, thou } from "limitsmith";
 *
 * symmetricLimits(inch("2.188"), thou(5)).min.toString(); // → "2.183 in"
 * ```
 * @reference ASME Y14.5-2018, 5.2 (equal bilateral tolerance), from memory
 */
export function symmetricLimits(
  nominal: LengthLike,
  deviation: LengthLike,
  options?: Pick<LimitsParts, "basis" | "designation">,
): Limits {
  const upper = asLength(deviation, ["deviation"]);
  if (upper.ticks < 0) {
    throw new LimitsError("LIMITS_UPSIDE_DOWN", "a ± value is not negative", { value: upper.toString() });
  }
  return limits({ ...options, nominal, upper, lower: multiply(upper, -1) });
}
