import { LimitsError } from "../errors.js";
import { hasOwn } from "../ownValue.js";
import { asLength } from "./asLength.js";
import { divideRounded } from "./divideRounded.js";
import { lengthOfTicks } from "./length.js";
import type { Length, LengthLike } from "./length.js";

/** A ratio of two whole numbers. */
export interface Ratio {
  /** Any whole number. */
  readonly numerator: number;
  /** Over zero. */
  readonly denominator: number;
}

/**
 * Multiplies a length by a whole number or by a ratio of whole numbers.
 *
 * @param length - any length, in any unit
 * @param factor - a whole number, or `{ numerator, denominator }` of whole numbers with the denominator over zero
 * @returns the product, in the unit of `length`; where it falls between two ticks of 0.1 nm it goes to the
 *   nearest, a half to the even one (ISO 80000-1 rule A)
 * @throws `OPTION_INVALID` for a factor that is not whole, `LENGTH_OUT_OF_RANGE`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { mm, multiply } from "limitsmith";
 *
 * multiply(mm("0.021"), { numerator: 1, denominator: 2 }).toString(); // → "0.0105 mm"
 * multiply(mm(7), 3).toString(); // → "21 mm"
 * ```
 * @reference ISO 80000-1:2009, B.3, rule A, for the half tick
 */
export function multiply(length: LengthLike, factor: number | Ratio): Length {
  const from = asLength(length);
  const given: unknown = factor;
  const numerator = typeof factor === "number" ? factor : isRatio(given) ? given.numerator : NaN;
  const denominator = isRatio(given) ? given.denominator : 1;
  if (!Number.isSafeInteger(numerator) || !Number.isSafeInteger(denominator) || denominator <= 0) {
    throw new LimitsError("OPTION_INVALID", "a length is multiplied by a whole number or a ratio of whole numbers", {
      value: factor,
      allowed: "a whole number, or { numerator, denominator } with the denominator over zero",
    });
  }
  const ticks = divideRounded(BigInt(from.ticks) * BigInt(numerator), BigInt(denominator), "nearest");
  return lengthOfTicks(Number(ticks), from.unit);
}

function isRatio(value: unknown): value is Ratio {
  return typeof value === "object" && value !== null && hasOwn(value, "numerator") && hasOwn(value, "denominator");
}
