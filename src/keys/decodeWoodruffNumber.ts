import { LimitsError } from "../errors.js";
import { lengthOfTicks } from "../units/index.js";
import { WOODRUFF_KEYS } from "./tables/woodruffKeys.js";
import type { WoodruffNumber } from "./woodruffValue.js";

const NUMBER = /^([1-9]\d?)(\d{2})(\.5)?(-1)?$/;
// ticks of 0.1 nm
const THIRTY_SECOND = 7_937_500;
const SIXTEENTH = 15_875_000;
const LONGEST = 20;

/**
 * Takes a Woodruff number of ANSI/ASME B17.2 apart.
 *
 * The last two digits are the diameter in eighths of an inch, those before them the width in thirty-seconds; `.5`
 * adds a sixteenth to the diameter, `-1` marks a lower key. The older numbers 1 to 34 and letters are another series
 * and are refused.
 *
 * @param number - such as `"404"`, `"202.5"` or `"822-1"` (no unit)
 * @returns the frozen width and diameter in inches, and whether the standard lists such a key
 * @throws `WOODRUFF_NUMBER_UNKNOWN`
 * @example
 * ```ts
 * import { decodeWoodruffNumber } from "limitsmith";
 *
 * const decoded = decodeWoodruffNumber("1210");
 * [decoded.width, decoded.diameter]; // → ["0.375 in", "1.25 in"]
 * decodeWoodruffNumber("15"); // throws WOODRUFF_NUMBER_UNKNOWN
 * ```
 * @reference ANSI/ASME B17.2-1967, key numbers; `.5` and `-1` from memory, agreeing with every listed key
 */
export function decodeWoodruffNumber(number: string): WoodruffNumber {
  const given: unknown = number;
  const match = typeof given === "string" && given.length <= LONGEST ? NUMBER.exec(given.trim()) : null;
  const width = Number(match?.[1] ?? 0);
  const diameter = 2 * Number(match?.[2] ?? 0) + (match?.[3] === undefined ? 0 : 1);
  if (match === null || width === 0 || diameter === 0) {
    throw new LimitsError("WOODRUFF_NUMBER_UNKNOWN", "not a Woodruff number of ANSI/ASME B17.2", {
      value: given,
      allowed:
        "width in 32nds and two digits of diameter in 8ths, such as 404, 202.5 or 822-1; " +
        "the older numbers 1 to 34 and letters are another series",
    });
  }
  const text = match[0];
  return Object.freeze({
    number: text,
    width: lengthOfTicks(width * THIRTY_SECOND, "in"),
    diameter: lengthOfTicks(diameter * SIXTEENTH, "in"),
    low: match[4] !== undefined,
    listed: WOODRUFF_KEYS.some(([listed]) => listed === text),
  });
}
