import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { exactPlaces, lengthOfTicks, writeLength } from "../units/index.js";
import type { DecimalMark, Length, LengthUnit, NumberStyle, WrittenDimension } from "../units/index.js";
import { asRequest } from "./asRequest.js";
import type { CalloutRequest, CalloutShape, DualSize } from "./request.js";

/** How a callout is written. */
export interface CalloutStyle {
  /**
   * `"inch"`: no zero before the point, a zero deviation with its sign and decimals, `DEEP`; `"metric"`: a zero
   * before the point, a plain 0.
   */
  readonly numbers: NumberStyle;
  /** The decimal mark; `"."` unless said otherwise. */
  readonly decimalMark?: DecimalMark;
}

interface Writer {
  readonly numbers: NumberStyle;
  /** The decimal mark; `"."` unless said otherwise. */
  readonly decimalMark: DecimalMark;
}

const SHAPES: Readonly<Record<CalloutShape, string>> = {
  unmarked: "",
  diameter: "⌀",
  radius: "R",
  "spherical diameter": "S⌀",
  "spherical radius": "SR",
  square: "□",
};

/**
 * Writes a request as a callout in one line, in inch or metric style; reading it back gives the same request.
 *
 * The decimals stay as they were written, for a title block goes by them; the style decides on everything else.
 *
 * @param request - what `readCallout` gave, also after JSON or `structuredClone`
 * @param style - `numbers`: `"inch"` or `"metric"`, and the `decimalMark`
 * @returns the text; a size shows its unit (mm, in …) only where the drafter wrote it
 * @throws `OPTION_INVALID`, `CALLOUT_NOT_UNDERSTOOD` for what is no request
 * @example
 * ```ts
 * import { readCallout, writeCallout } from "limitsmith";
 *
 * const bore = readCallout("2x Ø 0.875 +0.002 0 DEPTH 1.50", { unit: "in" });
 * writeCallout(bore, { numbers: "inch" }); // → "2X ⌀.875 +.002/-.000 ↧1.50"
 * writeCallout(bore, { numbers: "metric" }); // → "2X ⌀0.875 +0.002/0 ↧1.50"
 * ```
 * @reference ASME Y14.5-2018, 4.3 (number styles), from memory; ISO 129-1:2018, from memory
 */
export function writeCallout(request: CalloutRequest, style: CalloutStyle): string {
  const numbers: unknown = ownValue(style, "numbers");
  const decimalMark: unknown = ownValue(style, "decimalMark") ?? ".";
  if ((numbers !== "inch" && numbers !== "metric") || (decimalMark !== "." && decimalMark !== ",")) {
    throw new LimitsError("OPTION_INVALID", "a callout is written in inch or metric style", {
      value: numbers,
      allowed: 'numbers: "inch" or "metric"; decimalMark: "." or ","',
    });
  }
  const writer: Writer = { numbers, decimalMark };
  const checked = asRequest(request);
  return [
    checked.count === null ? "" : `${checked.count}X`,
    bodyText(checked, writer),
    checked.depth === null ? "" : `↧${sizeText(checked.depth, writer)}`,
    checked.through ? "THRU" : "",
    checked.typical ? "TYP" : "",
    checked.dual === null ? "" : dualText(checked.dual, writer),
  ]
    .filter((piece) => piece !== "")
    .join(" ");
}

function bodyText(request: CalloutRequest, writer: Writer): string {
  const marked = (size: WrittenDimension): string => SHAPES[request.shape] + sizeText(size, writer);
  switch (request.kind) {
    case "class":
      return `${marked(request.nominal)} ${request.toleranceClass}${
        request.printed === null ? "" : ` (${pairText(request.printed, writer)})`
      }`;
    case "fit":
      return `${marked(request.nominal)} ${request.fit}`;
    case "inch class":
      return `${marked(request.nominal)} ${request.inchClass}${request.member === null ? "" : ` ${request.member.toUpperCase()}`}`;
    case "deviations": {
      const { nominal, upper, lower, form } = request;
      return `${marked(nominal)} ${deviationsText(nominal, upper, lower, form === "plus-minus", writer)}`;
    }
    case "limits":
      return SHAPES[request.shape] + pairText(request, writer);
    case "single limit":
      return `${marked(request.size)} ${request.side.toUpperCase()}`;
    case "plain":
      return marked(request.nominal);
    case "reference":
      return `(${marked(request.nominal)})`;
    case "basic":
      return `[${marked(request.nominal)}]`;
    case "chamfer": {
      const { length, deviations, angle } = request;
      const tolerance =
        deviations === null
          ? ""
          : ` ${deviationsText(length, deviations.upper, deviations.lower, isEven(deviations), writer)}`;
      return `${marked(length)}${tolerance} X ${marks(angle.toString(), writer)}`;
    }
    case "angle": {
      const { angle, deviations } = request;
      if (deviations === null) return marks(angle.toString(), writer);
      const { upper, lower } = deviations;
      const even = upper.microarcseconds === -lower.microarcseconds;
      const signed = (text: string): string => (text.startsWith("-") ? text : `+${text}`);
      const tolerance = even ? `±${upper.toString()}` : `${signed(upper.toString())}/${signed(lower.toString())}`;
      return marks(`${angle.toString()} ${tolerance}`, writer);
    }
    case "thread":
      return request.designation;
  }
}

function isEven({ upper, lower }: { readonly upper: Length; readonly lower: Length }): boolean {
  return upper.ticks === -lower.ticks;
}

/** The number with the decimals it was written with, or its fraction; its unit where it was written. */
function sizeText({ length, text, form, places, unitWritten }: WrittenDimension, writer: Writer): string {
  const unit = unitWritten ? unitText(length.unit) : "";
  if (form === "fraction") return `${fractionText(text)}${unit}`;
  return `${decimalText(length, places, writer, writer.numbers)}${unit}`;
}

/** `7-3/8` and `7 3 / 8` are written `7 3/8`. */
function fractionText(text: string): string {
  const [first = "", second = "", third] = text.match(/\d+/g) ?? [];
  return third === undefined ? `${first}/${second}` : `${first} ${second}/${third}`;
}

function unitText(unit: LengthUnit): string {
  return unit === "um" ? " µm" : ` ${unit}`;
}

function decimalText(length: Length, places: number, { decimalMark }: Writer, numbers: NumberStyle): string {
  // inch numbers keep their decimals; a leading zero is put back for the metric style
  const text = writeLength(length, { places, style: "inch", symbol: false, decimalMark });
  return numbers === "inch" ? text : text.replace(/^(-?)([.,])/, "$10$2");
}

function deviationsText(
  nominal: WrittenDimension,
  upper: Length,
  lower: Length,
  plusMinus: boolean,
  writer: Writer,
): string {
  const { unit } = nominal.length;
  const needed = Math.max(exactPlaces(upper, unit) ?? 0, exactPlaces(lower, unit) ?? 0);
  const places = writer.numbers === "inch" ? Math.max(needed, nominal.places) : needed;
  const magnitude = (length: Length): string => {
    const positive = lengthOfTicks(Math.abs(length.ticks), unit);
    if (positive.ticks === 0 && writer.numbers === "metric") return "0";
    return decimalText(positive, places, writer, writer.numbers);
  };
  if (plusMinus) return `±${magnitude(upper)}`;
  const sign = (length: Length, zero: string): string => {
    if (length.ticks !== 0) return length.ticks > 0 ? "+" : "-";
    return writer.numbers === "metric" ? "" : zero;
  };
  return `${sign(upper, "+")}${magnitude(upper)}/${sign(lower, "-")}${magnitude(lower)}`;
}

/** Two sizes, the larger one first; equal sizes stand once. */
function pairText(
  { max, min }: { readonly max: WrittenDimension; readonly min: WrittenDimension },
  writer: Writer,
): string {
  return `${sizeText(max, writer)}/${sizeText(min, writer)}`;
}

function dualText(dual: DualSize, writer: Writer): string {
  const { max, min } = dual;
  return max.length.ticks === min.length.ticks ? `[${sizeText(max, writer)}]` : `[${pairText(dual, writer)}]`;
}

function marks(text: string, { decimalMark }: Writer): string {
  return decimalMark === "," ? text.replace(/\./g, ",") : text;
}
