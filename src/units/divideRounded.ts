import { LimitsError } from "../errors.js";
import type { Rounding } from "./rounding.js";

/** Whole-number division `numerator / denominator` with a named rounding; the denominator is positive. */
export function divideRounded(numerator: bigint, denominator: bigint, rounding: Rounding): bigint {
  const quotient = numerator / denominator;
  const remainder = numerator % denominator;
  const negative = numerator < 0n;
  switch (rounding) {
    case "toward-zero":
      return quotient;
    case "down":
      return remainder !== 0n && negative ? quotient - 1n : quotient;
    case "up":
      return remainder !== 0n && !negative ? quotient + 1n : quotient;
    case "nearest":
    case "nearest-away": {
      const twice = 2n * (remainder < 0n ? -remainder : remainder);
      const away =
        twice > denominator || (twice === denominator && (rounding === "nearest-away" || quotient % 2n !== 0n));
      return away ? quotient + (negative ? -1n : 1n) : quotient;
    }
    default:
      throw new LimitsError("OPTION_INVALID", "not a way of rounding", {
        value: rounding,
        allowed: "nearest, nearest-away, toward-zero, up, down",
      });
  }
}
