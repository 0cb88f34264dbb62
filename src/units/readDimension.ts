import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import type { Length, LengthLike, LengthUnit } from "./length.js";
import { decimalMarkOf, lengthOfNumber } from "./lengthFrom.js";
import type { ReadOptions } from "./lengthFrom.js";
import { readNumber } from "./readNumber.js";
import { lengthText } from "./lengthText.js";
import { splitUnit } from "./splitUnit.js";

/** A size as it stands on a drawing: its exact length, and how it was written. */
export interface WrittenDimension {
  /** The exact length, in its unit. */
  readonly length: Length;
  /** The number as it was written, without its unit. */
  readonly text: string;
  /** Whether it stood as a decimal or as an inch fraction. */
  readonly form: "decimal" | "fraction";
  /** How many decimals were written; 0 for a whole number and for a fraction. */
  readonly places: number;
  /** True where the unit stood in the text itself. */
  readonly unitWritten: boolean;
}

/** The same, where its length may have travelled through JSON. */
export type WrittenDimensionLike = Omit<WrittenDimension, "length"> & { readonly length: LengthLike };

/** Options of {@link readDimension}. */
export interface ReadDimensionOptions extends ReadOptions {
  /** The drawing's unit, for numbers that stand without one. */
  readonly unit?: LengthUnit;
}

/**
 * Reads a size as a drawing writes it, and keeps how many decimals were written.
 *
 * `2.5`, `2.50` and `2.500` are one length but three statements: a title block gives each its own tolerance.
 *
 * @param text - a decimal, or an inch fraction or mixed number, with or without a unit; up to 100 characters
 * @param options - `unit` of the drawing (mm, in …) for a bare number, `decimalMark`
 * @returns the exact length with its unit, and the form in which it was written
 * @throws `UNIT_MISSING` where neither the text nor the options have a unit, and what `readLength` throws
 * @example
 * ```ts
 * import { readDimension } from "limitsmith";
 *
 * readDimension("2.500", { unit: "in" }).places; // → 3
 * readDimension("1 3/4", { unit: "in" }).length.toString(); // → "1.75 in"
 * ```
 * @reference ASME Y14.5-2018, 4.3, for the meaning of written decimals, from memory
 */
export function readDimension(text: string, options?: ReadDimensionOptions): WrittenDimension {
  const { number, unit: writtenUnit } = splitUnit(lengthText(text));
  const unit = writtenUnit ?? ownValue(options, "unit");
  const read = readNumber(number, decimalMarkOf(options));
  if (unit === undefined) {
    throw new LimitsError("UNIT_MISSING", "a number without a unit is not a length", {
      value: text,
      allowed: "a unit behind the number, or the drawing's unit as an option",
    });
  }
  return Object.freeze({
    length: lengthOfNumber(read, unit, number),
    text: number,
    form: read.form,
    places: read.places,
    unitWritten: writtenUnit !== null,
  });
}
