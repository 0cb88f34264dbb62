import { LimitsError } from "../errors.js";
import { exactPlaces } from "../units/index.js";
import type { LengthUnit } from "../units/index.js";
import type { Limits } from "./limitsValue.js";

/** The fewest decimals that write nominal, max and min exactly in a unit; refused where one does not end. */
export function placesToWrite(limits: Limits, unit: LengthUnit): number {
  let most = 0;
  for (const size of [limits.nominal, limits.max, limits.min]) {
    const places = exactPlaces(size, unit);
    if (places === null) {
      throw new LimitsError("LENGTH_NOT_EXACT", "these limits do not end in decimals of that unit", {
        value: `${size.toString()}, to be written in ${unit}`,
        allowed: "say how many places; they are rounded inside unless said otherwise",
      });
    }
    most = Math.max(most, places);
  }
  return most;
}
