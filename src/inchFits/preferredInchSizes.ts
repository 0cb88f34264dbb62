import { LimitsError } from "../errors.js";
import { compareLengths, inch } from "../units/index.js";
import type { Length } from "../units/index.js";
import { DECIMAL_BASIC_SIZES_IN, FRACTIONAL_BASIC_SIZES_IN } from "./tables/preferredBasicSizes.js";

/** The two series of preferred basic sizes; sizes are best taken from one of them. */
export type InchSizeSeries = "decimal" | "fractional";

let lists: ReadonlyMap<InchSizeSeries | undefined, readonly Length[]> | undefined;

/**
 * The preferred basic sizes of the inch system.
 *
 * @param series - `"decimal"` or `"fractional"` (no unit); both together unless said otherwise
 * @returns a frozen list of lengths in inches, smallest first, each once; from memory
 * @throws `OPTION_INVALID`
 * @example
 * ```ts
 * import { preferredInchSizes } from "limitsmith";
 *
 * preferredInchSizes("fractional")[3]?.toString(); // → "0.09375 in"
 * preferredInchSizes("decimal").length; // → 74
 * ```
 * @reference ANSI B4.1-1967, preferred basic sizes, from memory
 */
export function preferredInchSizes(series?: InchSizeSeries): readonly Length[] {
  const list = (lists ??= build()).get(series);
  if (list === undefined) {
    throw new LimitsError("OPTION_INVALID", "not a series of basic sizes", {
      value: series,
      allowed: "decimal, fractional",
    });
  }
  return list;
}

function build(): ReadonlyMap<InchSizeSeries | undefined, readonly Length[]> {
  const decimal = DECIMAL_BASIC_SIZES_IN.map((size) => inch(size));
  const fractional = FRACTIONAL_BASIC_SIZES_IN.map((size) => inch(size));
  const more = fractional.filter((size) => !decimal.some((one) => one.ticks === size.ticks));
  return new Map<InchSizeSeries | undefined, readonly Length[]>([
    ["decimal", Object.freeze(decimal)],
    ["fractional", Object.freeze(fractional)],
    [undefined, Object.freeze([...decimal, ...more].sort(compareLengths))],
  ]);
}
