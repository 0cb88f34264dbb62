import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "./asLength.js";
import type { Length, LengthLike, LengthUnit } from "./length.js";
import { decimalMarkOf } from "./lengthFrom.js";
import type { DecimalMark } from "./readNumber.js";
import { roundedToPlaces } from "./roundedToPlaces.js";
import type { Rounding } from "./rounding.js";
import { exactPlaces } from "./exactPlaces.js";
import { paddedText, scaledText } from "./scaledText.js";
import { unitSymbol } from "./unitSymbol.js";

/**
 * How numbers look: `"metric"` has a zero before the point and no needless zeros behind (`0.5`);
 * `"inch"` has no zero before the point and keeps all its places (`.500`).
 */
export type NumberStyle = "metric" | "inch";

/** Options of {@link writeLength}. */
export interface WriteLengthOptions {
  /** Unit to write in; the length's own unit unless said otherwise. */
  readonly unit?: LengthUnit;
  /** Decimals, 0 to 12; as many as are needed to be exact unless said otherwise. */
  readonly places?: number;
  /** Rounding where the places do not suffice; `"nearest"` unless said otherwise. */
  readonly rounding?: Rounding;
  /** `"inch"` for inch units and `"metric"` for the others unless said otherwise. */
  readonly style?: NumberStyle;
  /** Write the unit behind the number; true unless said otherwise. */
  readonly symbol?: boolean;
  /** `"always"` writes a plus before positive numbers; `"negative"` unless said otherwise. */
  readonly sign?: "negative" | "always";
  /** The decimal mark; `"."` unless said otherwise. */
  readonly decimalMark?: DecimalMark;
}

const MOST_PLACES = 12;

/**
 * Writes a length as drawings do.
 *
 * @param length - any length, in any unit
 * @param options - unit, places, rounding and looks, see {@link WriteLengthOptions}
 * @returns the text, with its unit unless `symbol` is false
 * @throws `LENGTH_NOT_EXACT` where no `places` are given and the number does not end in that unit,
 *   `OPTION_INVALID`, `UNIT_UNKNOWN`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { inch, mm, writeLength } from "limitsmith";
 *
 * writeLength(inch("1/2"), { places: 3 }); // → ".500 in"
 * writeLength(mm("40.0250")); // → "40.025 mm"
 * writeLength(mm(40), { unit: "in", places: 4, symbol: false }); // → "1.5748"
 * writeLength(mm("0.0025"), { places: 3, rounding: "nearest" }); // → "0.002 mm"
 * ```
 * @reference number styles: ASME Y14.5-2018, 4.3 (inch and millimetre dimensioning), from memory; rounding: ISO 80000-1:2009, B.3
 */
export function writeLength(length: LengthLike, options?: WriteLengthOptions): string {
  const value = asLength(length);
  const unit = ownValue(options, "unit") ?? value.unit;
  const places = placesOf(value, unit, ownValue(options, "places"));
  const rounded = roundedToPlaces(value.ticks, unit, places, ownValue(options, "rounding") ?? "nearest");
  const style = styleOf(ownValue(options, "style"), unit);

  const { sign, symbol } = looksOf(options);

  let text = style === "inch" ? paddedText(rounded, places).replace(/^(-?)0\./, "$1.") : scaledText(rounded, places);
  if (sign === "always" && rounded > 0n) text = `+${text}`;
  if (decimalMarkOf(options) === ",") text = text.replace(".", ",");
  return symbol ? `${text} ${unitSymbol(unit)}` : text;
}

function placesOf(value: Length, unit: LengthUnit, asked: number | undefined): number {
  if (asked !== undefined) {
    if (!Number.isInteger(asked) || asked < 0 || asked > MOST_PLACES) {
      throw new LimitsError("OPTION_INVALID", "not a number of decimals", {
        value: asked,
        allowed: `a whole number from 0 to ${MOST_PLACES}`,
      });
    }
    return asked;
  }
  const exact = exactPlaces(value, unit);
  if (exact === null) {
    throw new LimitsError("LENGTH_NOT_EXACT", "this length does not end in decimals of that unit", {
      value: `${value.toString()}, to be written in ${unitSymbol(unit)}`,
      allowed: "say how many places, and how to round",
    });
  }
  return exact;
}

function looksOf(options: WriteLengthOptions | undefined): { sign: "negative" | "always"; symbol: boolean } {
  const sign: unknown = ownValue(options, "sign") ?? "negative";
  const symbol: unknown = ownValue(options, "symbol") ?? true;
  if (sign !== "negative" && sign !== "always") {
    throw new LimitsError("OPTION_INVALID", "not a rule for signs", { value: sign, allowed: "negative, always" });
  }
  if (typeof symbol !== "boolean") {
    throw new LimitsError("OPTION_INVALID", "symbol is true or false", { value: symbol, allowed: "true, false" });
  }
  return { sign, symbol };
}

function styleOf(asked: NumberStyle | undefined, unit: LengthUnit): NumberStyle {
  if (asked === undefined) return unit === "mm" || unit === "um" ? "metric" : "inch";
  const style: unknown = asked;
  if (style !== "metric" && style !== "inch") {
    throw new LimitsError("OPTION_INVALID", "not a number style", { value: style, allowed: "metric, inch" });
  }
  return style;
}
