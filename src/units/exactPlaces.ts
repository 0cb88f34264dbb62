import { asLength } from "./asLength.js";
import type { LengthLike, LengthUnit } from "./length.js";
import { ticksPerUnit } from "./ticksPerUnit.js";

// 254 000 000 ticks to the inch: seven decimals hold every inch value that ends at all
const MOST_EXACT_PLACES = 7;

/**
 * The fewest decimals that write a length exactly in a unit.
 *
 * @param length - any length, in any unit
 * @param unit - the unit to write in: `mm`, `um`, `in`, `thou`, `uin`
 * @returns a whole number from 0 to 7, or `null` where the decimals do not end in that unit
 * @throws `UNIT_UNKNOWN`, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { exactPlaces, inch, mm } from "limitsmith";
 *
 * exactPlaces(inch("1/64"), "in"); // → 6
 * exactPlaces(mm(40), "in"); // → null
 * ```
 * @reference 1 in = 25.4 mm exactly: the international yard and pound agreement of 1959
 */
export function exactPlaces(length: LengthLike, unit: LengthUnit): number | null {
  const perUnit = BigInt(ticksPerUnit(unit));
  let scaled = BigInt(asLength(length).ticks);
  for (let places = 0; places <= MOST_EXACT_PLACES; places++) {
    if (scaled % perUnit === 0n) return places;
    scaled *= 10n;
  }
  return null;
}
