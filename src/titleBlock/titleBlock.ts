import { hasOwn } from "../ownValue.js";
import { atPath } from "../located.js";
import { ownValue } from "../ownValue.js";
import { readAngle } from "../units/index.js";
import type { Angle, AngleLike, DecimalMark, LengthUnit } from "../units/index.js";
import { generalTolerance } from "./generalTolerance.js";
import type { GeneralTolerance, GeneralToleranceLike } from "./generalToleranceValue.js";
import { invalidBlock } from "./invalidBlock.js";
import { PLUS_MINUS, readLines } from "./readLines.js";
import type { BlockReading } from "./readLines.js";
import { readEdges, readNote } from "./readNotes.js";
import { INCH_PRESETS } from "./tables/inchPresets.js";
import type {
  Projection,
  TitleBlock,
  TitleBlockLines,
  TitleBlockPresetName,
  TitleBlockSpec,
} from "./titleBlockValue.js";

/**
 * Checks the default tolerances of a title block and makes them ready for use.
 *
 * Nothing is assumed: a line that the block does not have stays absent, and sizes that would need it are refused.
 *
 * @param spec - the block, see {@link TitleBlockSpec}: `unit` (mm, in …), `decimals` (± by number of decimals),
 *   `fractions`, `angles` (degrees), the same lines for `diameters` and `lengths`, standards (`general`, `castings`,
 *   `weldments`), and the notes `finish`, `edges` and `projection`
 * @returns the frozen block, its tolerances as lengths; taken by this function again unchanged
 * @throws `TITLE_BLOCK_INVALID`, and what `readDimension`, {@link readAngle}, {@link generalTolerance} and
 *   `readEdge` throw, with the path
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
 * titleBlock({ unit: "mm", general: "ISO 2768-mK" }).general?.geometry; // → "K"
 * ```
 * @reference common practice of inch and metric title blocks: there is no standard default; ISO 2768, ISO 8062-3 and
 *   ISO 13920 where the block calls them
 */
export function titleBlock(spec: TitleBlockSpec): TitleBlock {
  const given: unknown = spec;
  if (typeof given !== "object" || given === null) throw invalidBlock("a title block is an object", given, []);
  const unit = unitOf(ownValue(spec, "unit"));
  const mark: unknown = ownValue(spec, "decimalMark") ?? ".";
  if (mark !== "." && mark !== ",") throw invalidBlock("the decimal mark is a point or a comma", mark, ["decimalMark"]);
  const reading: BlockReading = { unit, decimalMark: mark };
  const angles = ownValue(spec, "angles") ?? null;
  return Object.freeze({
    unit,
    decimalMark: mark,
    ...readLines(spec, reading, []),
    angles: angles === null ? null : angleToleranceOf(angles, mark),
    diameters: linesOf(spec, "diameters", reading),
    lengths: linesOf(spec, "lengths", reading),
    general: standardOf(spec, "general", "ISO 2768"),
    castings: standardOf(spec, "castings", "ISO 8062-3"),
    weldments: standardOf(spec, "weldments", "ISO 13920"),
    finish: readNote(ownValue(spec, "finish"), "finish"),
    edges: readEdges(ownValue(spec, "edges"), reading),
    projection: projectionOf(ownValue(spec, "projection") ?? null),
    preset: presetOf(ownValue(spec, "preset") ?? null),
  });
}

function unitOf(unit: unknown): LengthUnit {
  if (unit === "mm" || unit === "in" || unit === "um" || unit === "thou" || unit === "uin") return unit;
  throw invalidBlock("a title block states its unit", unit, ["unit"], "mm, in, um, thou, uin");
}

function linesOf(spec: TitleBlockSpec, name: "diameters" | "lengths", reading: BlockReading): TitleBlockLines | null {
  const lines = ownValue(spec, name) ?? null;
  const given: unknown = lines;
  if (lines === null) return null;
  if (typeof given !== "object") throw invalidBlock(`${name} is an object`, given, [name], "decimals, fractions");
  return readLines(lines, reading, [name]);
}

function angleToleranceOf(given: AngleLike, decimalMark: DecimalMark): Angle {
  const path = ["angles"];
  const text = typeof given === "string" ? given.trim().replace(PLUS_MINUS, "") : given;
  const tolerance = atPath(path, () => readAngle(text, { decimalMark }));
  if (tolerance.microarcseconds <= 0)
    throw invalidBlock("a default tolerance is over zero", tolerance.toString(), path);
  return tolerance;
}

/** The indication under one key of a block; one of another standard belongs under another key. */
function standardOf<Standard extends GeneralTolerance["standard"]>(
  spec: TitleBlockSpec,
  name: "general" | "castings" | "weldments",
  standard: Standard,
): Extract<GeneralTolerance, { readonly standard: Standard }> | null {
  const given: GeneralToleranceLike | null = ownValue(spec, name) ?? null;
  if (given === null) return null;
  const called = atPath([name], () => generalTolerance(given));
  if (isOf(called, standard)) return called;
  const allowed = "general: ISO 2768; castings: ISO 8062-3; weldments: ISO 13920";
  throw invalidBlock(`${name} is for ${standard}`, called.text, [name], allowed);
}

function isOf<Standard extends GeneralTolerance["standard"]>(
  called: GeneralTolerance,
  standard: Standard,
): called is Extract<GeneralTolerance, { readonly standard: Standard }> {
  return called.standard === standard;
}

function projectionOf(value: unknown): Projection | null {
  if (value === null || value === "first angle" || value === "third angle") return value;
  throw invalidBlock("not an angle of projection", value, ["projection"], "first angle, third angle");
}

function presetOf(value: unknown): TitleBlockPresetName | null {
  if (value === null) return null;
  if (typeof value === "string" && hasOwn(INCH_PRESETS, value)) return value as TitleBlockPresetName;
  throw invalidBlock("there is no such preset", value, ["preset"], Object.keys(INCH_PRESETS).join(", "));
}
