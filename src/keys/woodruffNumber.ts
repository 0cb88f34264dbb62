import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { equalLengths } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { positiveLength } from "./positiveLength.js";
import { tableInch } from "./tableLength.js";
import { WOODRUFF_KEYS } from "./tables/woodruffKeys.js";

/** A Woodruff key by its size. */
export interface WoodruffSize {
  /** Width W of the key. */
  readonly width: LengthLike;
  /** Diameter B of the key. */
  readonly diameter: LengthLike;
  /** True for the lower key of two that share width and diameter; false unless said otherwise. */
  readonly low?: boolean;
}

/**
 * The number of the Woodruff key that ANSI/ASME B17.2 lists for a width and diameter.
 *
 * @param size - `width` W and `diameter` B, any unit; `low` for the lower key of the two that share them
 * @returns the number as the standard writes it (no unit)
 * @throws `WOODRUFF_NUMBER_UNKNOWN` where no such key is listed, `KEYED_JOINT_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { woodruffNumber } from "limitsmith";
 *
 * woodruffNumber({ width: "1/4 in", diameter: "1 3/8 in" }); // → "811"
 * woodruffNumber({ width: "1/4 in", diameter: "2 3/4 in", low: true }); // → "822-1"
 * ```
 * @reference ANSI/ASME B17.2-1967, key numbers
 */
export function woodruffNumber(size: WoodruffSize): string {
  const width = positiveLength(ownValue(size, "width"), "the width of the key", ["width"]);
  const diameter = positiveLength(ownValue(size, "diameter"), "the diameter of the key", ["diameter"]);
  const low = ownValue(size, "low") ?? false;
  const row = WOODRUFF_KEYS.find(
    ([number, w, b]) =>
      number.endsWith("-1") === low && equalLengths(tableInch(w), width) && equalLengths(tableInch(b), diameter),
  );
  if (row === undefined) {
    throw new LimitsError("WOODRUFF_NUMBER_UNKNOWN", "ANSI/ASME B17.2 lists no Woodruff key of this size", {
      value: `${width.toString()} x ${diameter.toString()}${low ? ", low" : ""}`,
      allowed: "keys 202 (1/16 x 1/4 in) to 2428 (3/4 x 3 1/2 in)",
    });
  }
  return row[0];
}
