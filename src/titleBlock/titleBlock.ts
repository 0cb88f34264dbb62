import { atPath } from "../located.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLength, readAngle, readDimension } from "../units/index.js";
import type { Angle, AngleLike, DecimalMark, Length, LengthLike, LengthUnit } from "../units/index.js";
import type { TitleBlock, TitleBlockSpec } from "./titleBlockValue.js";

const MOST_PLACES = 7;
const PLUS_MINUS = /^(?:±|\+\/-)\s?/;

/**
 * Checks the default tolerances of a title block and makes them ready for use.
 *
 * Nothing is assumed: a line that the block does not have stays absent, and sizes that would need it are refused.
 *
 * @param spec - the block: `unit` (mm, in …), `decimals` (± by number of decimals), `fractions`, `angles` (degrees)
 * @returns the frozen block, its tolerances as lengths; taken by this function again unchanged
 * @throws `TITLE_BLOCK_INVALID`, and what {@link readDimension} and {@link readAngle} throw, with the path
 * @example
 * ```ts
 * import { titleBlock } from "limitsmith";
 *
 * const block = titleBlock({
 *   unit: "in",
 *   decimals: { 2: "±.01", 3: "±.005" },
 *   fractions: "±1/64",
 *   angles: "±0.5°",
 * });
 * block.decimals[3]?.toString(); // → "0.005 in"
 * ```
 * @reference common practice of inch and metric title blocks: there is no standard default
 */
export function titleBlock(spec: TitleBlockSpec): TitleBlock {
  const given: unknown = spec;
  if (typeof given !== "object" || given === null) throw invalid("a title block is an object", given, []);
  const unit = unitOf(ownValue(spec, "unit"));
  const mark: unknown = ownValue(spec, "decimalMark") ?? ".";
  if (mark !== "." && mark !== ",") throw invalid("the decimal mark is a point or a comma", mark, ["decimalMark"]);
  const fractions = ownValue(spec, "fractions") ?? null;
  const angles = ownValue(spec, "angles") ?? null;
  if (fractions !== null && unit !== "in") {
    throw invalid("only an inch block has a line for fractions", fractions, ["fractions"]);
  }
  return Object.freeze({
    unit,
    decimalMark: mark,
    decimals: decimalsOf(ownValue(spec, "decimals") ?? {}, unit, mark),
    fractions: fractions === null ? null : toleranceOf(fractions, unit, mark, ["fractions"]),
    angles: angles === null ? null : angleToleranceOf(angles, mark),
  });
}

function unitOf(unit: unknown): LengthUnit {
  if (unit === "mm" || unit === "in" || unit === "um" || unit === "thou" || unit === "uin") return unit;
  throw invalid("a title block states its unit", unit, ["unit"], "mm, in, um, thou, uin");
}

function decimalsOf(
  given: Readonly<Record<string, LengthLike>>,
  unit: LengthUnit,
  mark: DecimalMark,
): Readonly<Record<string, Length>> {
  const value: unknown = given;
  if (typeof value !== "object" || value === null) throw invalid("decimals is an object", value, ["decimals"]);
  const lines: Record<string, Length> = {};
  for (const [places, tolerance] of Object.entries(given)) {
    if (!/^\d$/.test(places) || Number(places) > MOST_PLACES) {
      throw invalid("a line is kept by its number of decimals", places, ["decimals", places], `0 to ${MOST_PLACES}`);
    }
    lines[places] = toleranceOf(tolerance, unit, mark, ["decimals", places]);
  }
  return Object.freeze(lines);
}

function toleranceOf(given: LengthLike, unit: LengthUnit, decimalMark: DecimalMark, path: string[]): Length {
  const tolerance =
    typeof given === "string"
      ? atPath(path, () => readDimension(given.trim().replace(PLUS_MINUS, ""), { unit, decimalMark }).length)
      : asLength(given, path);
  if (tolerance.ticks <= 0) throw invalid("a default tolerance is over zero", tolerance.toString(), path);
  return tolerance;
}

function angleToleranceOf(given: AngleLike, decimalMark: DecimalMark): Angle {
  const path = ["angles"];
  const text = typeof given === "string" ? given.trim().replace(PLUS_MINUS, "") : given;
  const tolerance = atPath(path, () => readAngle(text, { decimalMark }));
  if (tolerance.microarcseconds <= 0) throw invalid("a default tolerance is over zero", tolerance.toString(), path);
  return tolerance;
}

function invalid(message: string, value: unknown, path: string[], allowed?: string): LimitsError {
  return new LimitsError("TITLE_BLOCK_INVALID", message, {
    value,
    path,
    ...(allowed === undefined ? {} : { allowed }),
  });
}
