import { LimitsError } from "../errors.js";
import { lengthOfTicks, toDecimal } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { positiveLength } from "./positiveLength.js";

/**
 * Height of the crown over a keyseat: from the full circle to the line that joins the two edges of the seat.
 *
 * @param diameter - diameter of shaft or bore, over zero, any unit
 * @param width - width of the keyseat, over zero and less than the diameter, any unit
 * @returns the height Y (sagitta), rounded to the nearest tick of 0.1 nm, in the unit of `diameter`
 * @throws `KEY_WIDER_THAN_SHAFT`, `KEYED_JOINT_INVALID`, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { keyseatCrown, writeLength } from "limitsmith";
 *
 * keyseatCrown("50 mm", "14 mm").toString(); // → "1 mm"
 * writeLength(keyseatCrown("1 in", "1/4 in"), { places: 4 }); // → ".0159 in"
 * ```
 * @reference ANSI/ASME B17.1-1967, depth control: Y = (D − √(D² − W²)) / 2
 */
export function keyseatCrown(diameter: LengthLike, width: LengthLike): Length {
  const circle = positiveLength(diameter, "the diameter", ["diameter"]);
  const seat = positiveLength(width, "the width", ["width"]);
  return lengthOfTicks(circle.ticks - chordTicks(circle, seat), circle.unit);
}

/**
 * Ticks from the line through the edges of a keyseat to the opposite side, D − Y = (D + √(D² − W²)) / 2, to the
 * nearest tick.
 */
export function chordTicks(diameter: Length, width: Length): number {
  if (width.ticks >= diameter.ticks) {
    throw new LimitsError("KEY_WIDER_THAN_SHAFT", "the key is as wide as the shaft, or wider", {
      value: `key ${width.toString()}, shaft ${diameter.toString()}`,
      allowed: "a key narrower than the shaft; the standards take about a quarter of it",
    });
  }
  const d = toDecimal(diameter, "um");
  const w = toDecimal(width, "um");
  const chord = d.plus(d.times(d).minus(w.times(w)).sqrt()).times(5000);
  return chord.toDecimalPlaces(0).toNumber();
}
