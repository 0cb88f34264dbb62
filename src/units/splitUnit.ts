import { LimitsError } from "../errors.js";
import type { LengthUnit } from "./length.js";

const UNITS: ReadonlyMap<string, LengthUnit> = new Map<string, LengthUnit>([
  ["mm", "mm"],
  ["um", "um"],
  ["\u00b5m", "um"],
  ["\u03bcm", "um"],
  ["in", "in"],
  ["in.", "in"],
  ["inch", "in"],
  ["inches", "in"],
  ['"', "in"],
  ["\u2033", "in"],
  ["thou", "thou"],
  ["uin", "uin"],
  ["\u00b5in", "uin"],
  ["\u03bcin", "uin"],
]);

/** Splits a text into its number and its unit; the unit is `null` where the number is all there is. */
export function splitUnit(text: string): { readonly number: string; readonly unit: LengthUnit | null } {
  const start = text.search(/[^\d.,+\-\u2212/ ]/);
  if (start < 0) return { number: text.trim(), unit: null };
  const word = text.slice(start).trim();
  const unit = UNITS.get(word.toLowerCase());
  if (unit !== undefined) return { number: text.slice(0, start).trim(), unit };
  if (/^mils?$/i.test(word)) {
    throw new LimitsError("UNIT_AMBIGUOUS", "mil is a thousandth of an inch to some and a millimetre to others", {
      value: text,
      allowed: "thou for a thousandth of an inch, mm for a millimetre",
    });
  }
  throw new LimitsError("UNIT_UNKNOWN", "not a unit of length that is known here", {
    value: word,
    allowed: 'mm, µm (um), in, inch, ", thou, µin (uin)',
  });
}
