import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { decimalText } from "./decimalText.js";
import type { DecimalLike } from "./decimalText.js";
import { lengthOfTicks } from "./length.js";
import type { Length, LengthUnit } from "./length.js";
import { lengthText } from "./lengthText.js";
import { readNumber } from "./readNumber.js";
import type { DecimalMark, WrittenNumber } from "./readNumber.js";
import { ticksPerUnit } from "./ticksPerUnit.js";

/** What a unit function takes: a number (rounded to the nearest tick), a text or a decimal (both exact). */
export type LengthSource = number | string | DecimalLike;

/** Options for reading numbers. */
export interface ReadOptions {
  /** The decimal mark of texts; `"."` unless said otherwise. */
  readonly decimalMark?: DecimalMark;
}

/** Makes a length in a known unit from a number, a text without a unit, or a decimal. */
export function lengthFrom(value: LengthSource, unit: LengthUnit, options?: ReadOptions): Length {
  if (typeof value === "number") return fromDouble(value, unit);
  const decimalMark = typeof value === "string" ? decimalMarkOf(options) : ".";
  const text = typeof value === "string" ? lengthText(value) : decimalText(value);
  if (typeof value !== "string" && /^-?(?:NaN|Infinity)$/.test(text)) {
    throw new LimitsError("NUMBER_NOT_FINITE", "a length must be a finite number", { value: text });
  }
  const read = readNumber(text, decimalMark);
  return lengthOfNumber(read, unit, text);
}

/** The exact length of a number that was read; refused unless it is a whole number of ticks. */
export function lengthOfNumber(read: WrittenNumber, unit: LengthUnit, text: string): Length {
  if (read.form === "fraction" && unit !== "in") {
    throw new LimitsError("FRACTION_NOT_INCH", "fractions are read in inches only", {
      value: text,
      allowed: "decimals in this unit, or an inch fraction with its unit",
    });
  }
  const scaled = read.numerator * BigInt(ticksPerUnit(unit));
  if (scaled % read.denominator !== 0n) {
    throw new LimitsError("LENGTH_TOO_FINE", "the length is not a whole number of 0.1 nm ticks", {
      value: text,
      allowed: "mm to 7 decimals, inches to 6 (some to 7), fractions down to 1/128",
    });
  }
  return lengthOfTicks(Number(scaled / read.denominator), unit);
}

/** The decimal mark that the options ask for; anything but a point or a comma is refused. */
export function decimalMarkOf(options: ReadOptions | undefined): DecimalMark {
  const mark: unknown = ownValue(options, "decimalMark") ?? ".";
  if (mark !== "." && mark !== ",") {
    throw new LimitsError("OPTION_INVALID", "not a decimal mark", { value: mark, allowed: '"." or ","' });
  }
  return mark;
}

function fromDouble(value: number, unit: LengthUnit): Length {
  if (!Number.isFinite(value)) {
    throw new LimitsError("NUMBER_NOT_FINITE", "a length must be a finite number", { value });
  }
  // a half tick goes away from zero, alike on both sides
  const ticks = Math.round(Math.abs(value) * ticksPerUnit(unit));
  return lengthOfTicks(value < 0 ? -ticks : ticks, unit);
}
