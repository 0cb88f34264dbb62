import { symmetricLimits } from "../limits/index.js";
import { readDimension } from "../units/index.js";
import type { Length, ReadDimensionOptions, WrittenDimension } from "../units/index.js";
import type { DefaultLengthLimits } from "./defaultValue.js";
import { COMMON_PRACTICE } from "./generalCautions.js";

/**
 * The limits of a bare size by an old workshop saying: half of the last place written, or half of the fraction's
 * division. It is no standard and no default: use it only where a drawing says so.
 *
 * @param text - the size as written: a decimal, or an inch fraction or mixed number
 * @param options - `unit` of the drawing (mm, in …) for a bare number, `decimalMark`
 * @returns frozen limits in the unit of the size, marked as common practice
 * @throws `LENGTH_TOO_FINE` where the half is not a whole number of ticks of 0.1 nm, and what {@link readDimension}
 *   throws
 * @example
 * ```ts
 * import { halfPlaceLimits } from "limitsmith";
 *
 * halfPlaceLimits("1.23", { unit: "in" }).line; // → "half of the last place: ±0.005 in"
 * halfPlaceLimits("5/32", { unit: "in" }).line; // → "half of the fraction's division: ±0.015625 in"
 * ```
 * @reference common practice: a workshop saying from a trade discussion
 */
export function halfPlaceLimits(text: string, options?: ReadDimensionOptions): DefaultLengthLimits {
  const written = readDimension(text, options);
  const deviation = halfPlace(written);
  const place = written.form === "fraction" ? "half of the fraction's division" : "half of the last place";
  const line = `${place}: ±${deviation.toString()}`;
  const basis = [
    { standard: "a workshop saying", place, says: line, how: "common practice", mark: "one-source" } as const,
  ];
  return Object.freeze({
    kind: "length" as const,
    limits: symmetricLimits(written.length, deviation, { basis }),
    line,
    cautions: Object.freeze([COMMON_PRACTICE]),
  });
}

function halfPlace({ form, text, places, length }: WrittenDimension): Length {
  const { unit } = length;
  if (form === "decimal") return readDimension(`0.${"0".repeat(places)}5`, { unit }).length;
  const denominator = BigInt(text.slice(text.lastIndexOf("/") + 1).trim());
  return readDimension(`1/${denominator * 2n}`, { unit }).length;
}
