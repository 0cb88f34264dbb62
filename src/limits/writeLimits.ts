import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { compareLengths, lengthOfTicks, multiply, roundLength, subtract, writeLength } from "../units/index.js";
import type { DecimalMark, Length, LengthUnit, NumberStyle, Rounding } from "../units/index.js";
import { asLimits } from "./asLimits.js";
import type { Limits, LimitsLike } from "./limitsValue.js";
import { placesToWrite } from "./placesToWrite.js";

/** How limits stand on the drawing. */
export type LimitsForm = "deviations" | "plus-minus" | "limits" | "class";

/**
 * What rounding does to the limits: `"inside"` never accepts a part that the exact limits reject,
 * `"outside"` never rejects one that they accept, `"nearest"` does neither.
 */
export type LimitsRounding = "inside" | "outside" | "nearest";

/** Options of {@link writeLimits}. */
export interface WriteLimitsStyle {
  /** `"deviations"` `40 +0.025/+0.009`, `"plus-minus"`, `"limits"` (max first), or `"class"` with the limits in brackets. */
  readonly form: LimitsForm;
  /** Unit to write in; the nominal's own unit unless said otherwise. */
  readonly unit?: LengthUnit;
  /** Decimals of every size; as many as are needed to be exact unless said otherwise. */
  readonly places?: number;
  /** `"inside"` unless said otherwise. */
  readonly rounding?: LimitsRounding;
  /** `"inch"` for inch units and `"metric"` for the others unless said otherwise. */
  readonly numbers?: NumberStyle;
  /** The decimal mark; `"."` unless said otherwise. */
  readonly decimalMark?: DecimalMark;
}

/** Limits as text, and what writing them has cost. */
export interface WrittenLimits {
  /** The limits in one line. */
  readonly text: string;
  /** The same in the lines that a drawing stacks; one line where nothing is stacked. */
  readonly lines: readonly string[];
  /** True where the text says exactly the limits. */
  readonly exact: boolean;
  /** How they were rounded where the text is not exact. */
  readonly rounding: LimitsRounding;
  /** Written max minus exact max: negative where part of the tolerance was given up there. */
  readonly maxShift: Length;
  /** Written min minus exact min: positive where part of the tolerance was given up there. */
  readonly minShift: Length;
  /** What was done to the limits, in words; `null` where the text is exact. */
  readonly note: string | null;
}

/** What was chosen for one piece of writing. */
interface Style {
  readonly unit: LengthUnit;
  readonly places: number;
  readonly decimalMark: DecimalMark;
  readonly up: Rounding;
  readonly down: Rounding;
  readonly write: (length: Length, signed?: boolean) => string;
}

interface Written {
  readonly lines: readonly string[];
  readonly text: string;
  readonly max: Length;
  readonly min: Length;
}

/**
 * Writes limits as a drawing does, rounding inside where the exact limits have more decimals.
 *
 * @param given - limits, any unit
 * @param style - `form`, `unit`, `places`, `rounding`, `numbers`, see {@link WriteLimitsStyle}
 * @returns the text and its lines, whether it is exact, and the shift of each limit in `unit`
 * @throws `LENGTH_NOT_EXACT` where no `places` are given and the limits do not end in that unit,
 *   `ROUNDING_COLLAPSES` where inside rounding leaves no tolerance, `LIMITS_NOT_SYMMETRIC` for
 *   `"plus-minus"`, `LIMITS_NO_DESIGNATION` for `"class"`, `OPTION_INVALID`, and what {@link asLimits} throws
 * @example
 * ```ts
 * import { limits, writeLimits } from "limitsmith";
 *
 * const seat = limits({ nominal: "32 mm", upper: "18 µm", lower: "2 µm", designation: "k6" });
 * writeLimits(seat, { form: "deviations" }).text; // → "32 +0.018/+0.002"
 * writeLimits(seat, { form: "class" }).text; // → "32 k6 (32.018/32.002)"
 * const inches = writeLimits(seat, { form: "limits", unit: "in", places: 4 });
 * inches.text; // → "1.2605/1.2600"
 * inches.note; // → "rounded inside to 4 decimals of in: max lowered by 51.2 µin, min raised by 78.7 µin"
 * ```
 * @reference ASME Y14.5-2018, 4.3 and 5.2 (number styles, limit and plus-minus dimensioning), from memory;
 *   ISO 129-1:2018 for metric deviations, from memory
 */
export function writeLimits(given: LimitsLike, style: WriteLimitsStyle): WrittenLimits {
  const limits = asLimits(given);
  const rounding = roundingOf(ownValue(style, "rounding"));
  const chosen = styleOf(limits, style, rounding);
  const written = writeForm(limits, ownValue(style, "form"), chosen);
  if (compareLengths(written.max, written.min) < 0) {
    throw new LimitsError("ROUNDING_COLLAPSES", "rounded inside, the limits leave no size between them", {
      value: `${chosen.places} decimals`,
      allowed: "more decimals, or another rounding",
    });
  }
  const maxShift = subtract(written.max, limits.max);
  const minShift = subtract(written.min, limits.min);
  const exact = maxShift.ticks === 0 && minShift.ticks === 0;
  return Object.freeze({
    text: written.text,
    lines: Object.freeze(written.lines),
    exact,
    rounding,
    maxShift,
    minShift,
    note: exact
      ? null
      : `rounded ${rounding} to ${chosen.places} decimals of ${chosen.unit}: ` +
        `max ${shiftText(maxShift)}, min ${shiftText(minShift)}`,
  });
}

function writeForm(limits: Limits, form: unknown, style: Style): Written {
  switch (form) {
    case "limits":
      return limitsForm(limits, style);
    case "deviations":
      return deviationsForm(limits, style);
    case "plus-minus":
      return plusMinusForm(limits, style);
    case "class":
      return classForm(limits, style);
    default:
      throw new LimitsError("OPTION_INVALID", "not a form of writing limits", {
        value: form,
        allowed: "deviations, plus-minus, limits, class",
      });
  }
}

function limitsForm(limits: Limits, style: Style): Written {
  const max = roundLength(limits.max, { unit: style.unit, places: style.places, rounding: style.down });
  const min = roundLength(limits.min, { unit: style.unit, places: style.places, rounding: style.up });
  const [high, low] = alignDecimals(style, style.write(max), style.write(min));
  return { lines: [high, low], text: `${high}/${low}`, max, min };
}

function deviationsForm(limits: Limits, style: Style): Written {
  const { nominal, upper, lower } = roundedDeviations(limits, style);
  const [high, low] = alignDecimals(
    style,
    signedZero("+", style.write(upper, true)),
    signedZero("-", style.write(lower, true)),
  );
  return {
    lines: [high, `${style.write(nominal)} ${low}`],
    text: `${style.write(nominal)} ${high}/${low}`,
    max: sum(nominal, upper),
    min: sum(nominal, lower),
  };
}

function plusMinusForm(limits: Limits, style: Style): Written {
  if (limits.upperDeviation.ticks !== -limits.lowerDeviation.ticks) {
    throw new LimitsError("LIMITS_NOT_SYMMETRIC", "± needs deviations that are equal to both sides", {
      value: `${limits.upperDeviation.toString()} / ${limits.lowerDeviation.toString()}`,
      allowed: 'the form "deviations" or "limits"',
    });
  }
  const { nominal, upper, lower } = roundedDeviations(limits, style);
  // a rounded nominal can leave two values: the smaller one is inside, the larger one outside
  const below = multiply(lower, -1);
  const smaller = compareLengths(upper, below) < 0 ? upper : below;
  const larger = smaller === upper ? below : upper;
  const deviation = style.down === "up" ? larger : smaller;
  const text = `${style.write(nominal)} ±${style.write(deviation)}`;
  return { lines: [text], text, max: sum(nominal, deviation), min: subtract(nominal, deviation) };
}

function classForm(limits: Limits, style: Style): Written {
  if (limits.designation === null) {
    throw new LimitsError("LIMITS_NO_DESIGNATION", "these limits carry no class to write", {
      allowed: 'another form, or limits with a designation such as "m6"',
    });
  }
  const inner = limitsForm(limits, style);
  const nominal = roundLength(limits.nominal, { unit: style.unit, places: style.places });
  const text = `${style.write(nominal)} ${limits.designation} (${inner.text})`;
  return { lines: [text], text, max: inner.max, min: inner.min };
}

/** Deviations from the nominal as it will stand there, so that the sum stays on the right side of the limit. */
function roundedDeviations(limits: Limits, style: Style): { nominal: Length; upper: Length; lower: Length } {
  const { unit, places } = style;
  const nominal = roundLength(limits.nominal, { unit, places });
  return {
    nominal,
    upper: roundLength(subtract(limits.max, nominal), { unit, places, rounding: style.down }),
    lower: roundLength(subtract(limits.min, nominal), { unit, places, rounding: style.up }),
  };
}

function styleOf(limits: Limits, style: WriteLimitsStyle, rounding: LimitsRounding): Style {
  const unit = ownValue(style, "unit") ?? limits.nominal.unit;
  const places = ownValue(style, "places") ?? placesToWrite(limits, unit);
  const numbers = ownValue(style, "numbers");
  const decimalMark = ownValue(style, "decimalMark") ?? ".";
  return {
    unit,
    places,
    decimalMark,
    // what brings an upper limit inside brings it down; outside is the reverse
    down: rounding === "inside" ? "down" : rounding === "outside" ? "up" : "nearest",
    up: rounding === "inside" ? "up" : rounding === "outside" ? "down" : "nearest",
    write: (length, signed = false) =>
      writeLength(length, {
        unit,
        places,
        symbol: false,
        sign: signed ? "always" : "negative",
        ...(numbers === undefined ? {} : { style: numbers }),
        decimalMark,
      }),
  };
}

function roundingOf(asked: LimitsRounding | undefined): LimitsRounding {
  const rounding: unknown = asked ?? "inside";
  if (rounding !== "inside" && rounding !== "outside" && rounding !== "nearest") {
    throw new LimitsError("OPTION_INVALID", "not a rounding of limits", {
      value: rounding,
      allowed: "inside, outside, nearest",
    });
  }
  return rounding;
}

/** Gives two numbers the same number of decimals; a plain zero stays plain. */
function alignDecimals(style: Style, high: string, low: string): [string, string] {
  const places = Math.max(decimalsOf(high), decimalsOf(low));
  const align = (text: string): string => {
    const missing = places - decimalsOf(text);
    if (text === "0" || missing === 0) return text;
    return `${decimalsOf(text) === 0 ? text + style.decimalMark : text}${"0".repeat(missing)}`;
  };
  return [align(high), align(low)];
}

/** Inch practice signs a zero deviation and keeps its decimals; metric practice writes a plain 0. */
function signedZero(sign: "+" | "-", text: string): string {
  return /^[.,]0+$/.test(text) ? sign + text : text;
}

function decimalsOf(text: string): number {
  const mark = text.search(/[.,]/);
  return mark < 0 ? 0 : text.length - mark - 1;
}

function sum(nominal: Length, deviation: Length): Length {
  return lengthOfTicks(nominal.ticks + deviation.ticks, nominal.unit);
}

function shiftText(shift: Length): string {
  if (shift.ticks === 0) return "unchanged";
  const inch = shift.unit === "mm" || shift.unit === "um" ? ("um" as const) : ("uin" as const);
  const size = writeLength(lengthOfTicks(Math.abs(shift.ticks), inch), {
    places: inch === "um" ? 4 : 1,
    style: "metric",
  });
  return `${shift.ticks > 0 ? "raised" : "lowered"} by ${size}`;
}
