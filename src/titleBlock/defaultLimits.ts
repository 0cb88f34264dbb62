import type { BasisStep } from "../basis.js";
import { LimitsError } from "../errors.js";
import { angleLimits, symmetricLimits } from "../limits/index.js";
import type { AngleLimits, Limits } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { angleOfMicroarcseconds, asLength, readAngle, readDimension } from "../units/index.js";
import type { AngleData, AngleLike, WrittenDimensionLike } from "../units/index.js";
import { titleBlock } from "./titleBlock.js";
import type { TitleBlock, TitleBlockSpec } from "./titleBlockValue.js";

/** A default tolerance applied to a length, and the line of the block that gave it. */
export interface DefaultLengthLimits {
  readonly kind: "length";
  readonly limits: Limits;
  readonly line: string;
}

/** A default tolerance applied to an angle, and the line of the block that gave it. */
export interface DefaultAngleLimits {
  readonly kind: "angle";
  readonly limits: AngleLimits;
  readonly line: string;
}

/** A default tolerance applied: limits of a length or of an angle. */
export type DefaultLimits = DefaultLengthLimits | DefaultAngleLimits;

const DIAMETER_MARK = /^[⌀Ø]\s?/;
const REFERENCE = /^\(|\bREF\.?$/i;
const BASIC = /^\[|\b(?:BASIC|BSC)\.?$/i;

/**
 * Gives a bare size the default tolerance that the title block has for the way it is written.
 *
 * The number of decimals decides, so the text goes in: `2.5` and `2.500` are different sizes to a title block.
 *
 * @param block - the title block, or what {@link titleBlock} takes
 * @param size - the text as written (a decimal, an inch fraction, or an angle in degrees; ⌀ before it allowed), or
 *   what {@link readDimension} or {@link readAngle} made of it
 * @returns frozen limits in the block's unit (or of the angle, in degrees), with the line that applied
 * @throws `TITLE_BLOCK_NO_LINE` where the block has no line for it, `TITLE_BLOCK_NOT_APPLICABLE` for reference and
 *   basic dimensions and for a size in another unit, and what {@link readDimension} and {@link titleBlock} throw
 * @example
 * ```ts
 * import { defaultLimits } from "limitsmith";
 *
 * const block = { unit: "in", decimals: { 2: "±.01", 3: "±.005" } } as const;
 * const found = defaultLimits(block, "3.125");
 * found.line; // → "3 decimals: ±0.005 in"
 * found.limits.max.toString(); // → "3.13 in"
 * defaultLimits(block, "(3.125)"); // throws TITLE_BLOCK_NOT_APPLICABLE
 * ```
 * @reference ASME Y14.5-2018, 5.1.1 (general tolerances in a note or title block), from memory
 */
export function defaultLimits(block: TitleBlock | TitleBlockSpec, size: WrittenDimensionLike): DefaultLengthLimits;
export function defaultLimits(block: TitleBlock | TitleBlockSpec, size: AngleData): DefaultAngleLimits;
export function defaultLimits(block: TitleBlock | TitleBlockSpec, size: string): DefaultLimits;
export function defaultLimits(
  block: TitleBlock | TitleBlockSpec,
  size: string | WrittenDimensionLike | AngleData,
): DefaultLimits {
  const checked = titleBlock(block);
  const given: unknown = size;
  if (typeof given === "string") return textDefault(checked, given);
  if (typeof given === "object" && given !== null) {
    if (Object.hasOwn(given, "microarcseconds")) return angleDefault(checked, given as AngleData);
    if (Object.hasOwn(given, "form")) return lengthDefault(checked, given as WrittenDimensionLike);
  }
  throw new LimitsError("TITLE_BLOCK_NOT_APPLICABLE", "a default goes by how the size was written", {
    value: given,
    allowed: "its text, or what readDimension or readAngle made of it",
  });
}

function textDefault(block: TitleBlock, text: string): DefaultLimits {
  const size = text.trim().replace(DIAMETER_MARK, "");
  refuseReferenceAndBasic(size);
  const { unit, decimalMark } = block;
  if (/°|deg/i.test(size)) return angleDefault(block, readAngle(size, { decimalMark }));
  return lengthDefault(block, readDimension(size, { unit, decimalMark }));
}

function lengthDefault(block: TitleBlock, written: WrittenDimensionLike): DefaultLengthLimits {
  const length = asLength(written.length);
  if (length.unit !== block.unit) {
    throw new LimitsError("TITLE_BLOCK_NOT_APPLICABLE", "the size is in another unit than the title block", {
      value: length.toString(),
      allowed: `sizes in ${block.unit}, or a tolerance of its own`,
    });
  }
  const line = written.form === "fraction" ? "fractions" : decimalsLine(written.places);
  const tolerance =
    written.form === "fraction" ? block.fractions : (ownValue(block.decimals, `${written.places}`) ?? null);
  if (tolerance === null) throw noLine(block, written.text, line);
  const says = `${line}: ±${tolerance.toString()}`;
  return Object.freeze({
    kind: "length" as const,
    limits: symmetricLimits(length, tolerance, { basis: blockStep(line, says) }),
    line: says,
  });
}

function refuseReferenceAndBasic(size: string): void {
  const kind = REFERENCE.test(size) ? "reference" : BASIC.test(size) ? "basic" : null;
  if (kind === null) return;
  throw new LimitsError("TITLE_BLOCK_NOT_APPLICABLE", `a ${kind} dimension takes no default tolerance`, {
    value: size,
    allowed: "sizes that stand without a tolerance of their own",
  });
}

function angleDefault(block: TitleBlock, nominal: AngleLike): DefaultAngleLimits {
  const { angles } = block;
  if (angles === null) throw noLine(block, readAngle(nominal).toString(), "angles");
  const says = `angles: ±${angles.toString()}`;
  return Object.freeze({
    kind: "angle" as const,
    limits: angleLimits({
      nominal,
      upper: angles,
      lower: angleOfMicroarcseconds(-angles.microarcseconds, angles.style),
      basis: blockStep("angles", says),
    }),
    line: says,
  });
}

function noLine(block: TitleBlock, value: string, line: string): LimitsError {
  const lines = [
    ...Object.keys(block.decimals).map((places) => decimalsLine(Number(places))),
    ...(block.fractions === null ? [] : ["fractions"]),
    ...(block.angles === null ? [] : ["angles"]),
  ];
  return new LimitsError("TITLE_BLOCK_NO_LINE", `the title block has no line for ${line}`, {
    value,
    allowed: lines.length === 0 ? "the block has no lines" : `the block has: ${lines.join(", ")}`,
  });
}

function decimalsLine(places: number): string {
  return places === 1 ? "1 decimal" : `${places} decimals`;
}

function blockStep(place: string, says: string): readonly BasisStep[] {
  return Object.freeze([
    Object.freeze({ standard: "title block of the drawing", place, says, how: "caller" as const }),
  ]);
}
