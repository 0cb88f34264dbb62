import { atPath } from "../located.js";
import { ownValue } from "../ownValue.js";
import { asLength, readDimension } from "../units/index.js";
import type { DecimalMark, Length, LengthLike, LengthUnit } from "../units/index.js";
import { invalidBlock } from "./invalidBlock.js";
import type { TitleBlockLines, TitleBlockLinesSpec } from "./titleBlockValue.js";

/** How the texts of a block are read. */
export interface BlockReading {
  readonly unit: LengthUnit;
  readonly decimalMark: DecimalMark;
}

const MOST_PLACES = 7;
export const PLUS_MINUS: RegExp = /^(?:±|\+\/-)\s?/;

/** Reads the lines for decimals and fractions at one place of a block. */
export function readLines(spec: TitleBlockLinesSpec, reading: BlockReading, path: readonly string[]): TitleBlockLines {
  const fractions = ownValue(spec, "fractions") ?? null;
  if (fractions !== null && reading.unit !== "in") {
    throw invalidBlock("only an inch block has a line for fractions", fractions, [...path, "fractions"]);
  }
  return Object.freeze({
    decimals: decimalsOf(ownValue(spec, "decimals") ?? {}, reading, [...path, "decimals"]),
    fractions: fractions === null ? null : toleranceOf(fractions, reading, [...path, "fractions"]),
  });
}

function decimalsOf(
  given: Readonly<Record<string, LengthLike>>,
  reading: BlockReading,
  path: readonly string[],
): Readonly<Record<string, Length>> {
  const value: unknown = given;
  if (typeof value !== "object" || value === null) throw invalidBlock("decimals is an object", value, path);
  const lines: Record<string, Length> = {};
  for (const [places, tolerance] of Object.entries(given)) {
    if (places !== "any" && (!/^\d$/.test(places) || Number(places) > MOST_PLACES)) {
      const allowed = `0 to ${MOST_PLACES}, or any`;
      throw invalidBlock("a line is kept by its number of decimals", places, [...path, places], allowed);
    }
    lines[places] = toleranceOf(tolerance, reading, [...path, places]);
  }
  return Object.freeze(lines);
}

function toleranceOf(given: LengthLike, reading: BlockReading, path: readonly string[]): Length {
  const tolerance =
    typeof given === "string"
      ? atPath(path, () => readDimension(given.trim().replace(PLUS_MINUS, ""), reading).length)
      : asLength(given, path);
  if (tolerance.ticks <= 0) throw invalidBlock("a default tolerance is over zero", tolerance.toString(), path);
  return tolerance;
}
