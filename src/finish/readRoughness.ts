import { LimitsError } from "../errors.js";
import { microinch, readLength, um } from "../units/index.js";
import type { DecimalMark, Length } from "../units/index.js";
import type { ReadRoughness } from "./buildRoughness.js";
import { umLength } from "./preferredValues.js";
import type { RoughnessUnit } from "./roughnessValue.js";
import { ROUGHNESS_GRADES } from "./tables/roughnessGrades.js";

const LONGEST_TEXT = 100;
const LEADING_WORD = /^([a-z]{1,6})( max)?[ :=]*(?=[\d.])/i;
const TRAILING_WORD = /(?<=[ \d])(?:Ra|AA|CLA|RMS|Rq)$/i;
const MAX = / max\.?$/i;
const AVERAGE_WORDS = ["RA", "AA", "CLA"];
const RMS_WORDS = ["RMS", "RQ"];

/** Reads a roughness note; `unit` serves a number that carries none. */
export function readRoughness(
  text: string,
  unit: RoughnessUnit | undefined,
  decimalMark: DecimalMark | undefined,
): ReadRoughness {
  if (text.length > LONGEST_TEXT) {
    throw new LimitsError("TEXT_TOO_LONG", "the text is too long to be a roughness", {
      value: text,
      allowed: `up to ${LONGEST_TEXT} characters`,
    });
  }
  const trimmed = text.trim();
  if (trimmed === "") throw new LimitsError("TEXT_EMPTY", "there is no roughness here", { value: text });
  if (/^N ?\d/i.test(trimmed)) return readGrade(trimmed);

  let rest = trimmed.replace(MAX, "").trimEnd();
  let max = rest !== trimmed;
  const words: string[] = [];
  const leading = LEADING_WORD.exec(rest);
  if (leading?.[1] !== undefined) {
    const word = withoutMax(leading[1].toUpperCase());
    max ||= leading[2] !== undefined || word.length < leading[1].length;
    words.push(word);
    rest = rest.slice(leading[0].length);
  }
  const trailing = TRAILING_WORD.exec(rest);
  if (trailing !== null) {
    words.push(trailing[0].toUpperCase());
    rest = rest.slice(0, trailing.index).trimEnd();
  }
  return { value: readValue(rest, unit, decimalMark, text), parameter: parameterOf(words, text), max, grade: null };
}

/** ISO 1302:2002 writes max behind the parameter: Ramax 0.8. Rmax is a parameter of its own. */
function withoutMax(word: string): string {
  const parameter = word.endsWith("MAX") ? word.slice(0, -3) : word;
  return AVERAGE_WORDS.includes(parameter) || RMS_WORDS.includes(parameter) ? parameter : word;
}

function parameterOf(words: readonly string[], text: string): "Ra" | "RMS" {
  if (words.length > 1) {
    throw new LimitsError("ROUGHNESS_INVALID", "a roughness names its parameter once", { value: text });
  }
  const [word = "RA"] = words;
  if (AVERAGE_WORDS.includes(word)) return "Ra";
  if (RMS_WORDS.includes(word)) return "RMS";
  throw new LimitsError("ROUGHNESS_PARAMETER_UNKNOWN", "this parameter gives no Ra: there is no fixed ratio", {
    value: text,
    allowed: "Ra, AA, CLA, RMS, Rq; rzRange gives published ranges of Rz beside Ra",
  });
}

function readValue(
  text: string,
  unit: RoughnessUnit | undefined,
  decimalMark: DecimalMark | undefined,
  whole: string,
): Length {
  const options = decimalMark === undefined ? undefined : { decimalMark };
  if (!/^[\d.,/ ]+$/.test(text)) return readLength(text, options);
  if (unit === "um") return um(text, options);
  if (unit === "uin") return microinch(text, options);
  throw new LimitsError("UNIT_MISSING", "a roughness without a unit means nothing: 63 is rough in µm and fine in µin", {
    value: whole,
    allowed: 'a unit in the text, µm or µin, or the option unit: "um" or "uin"',
  });
}

function readGrade(text: string): ReadRoughness {
  const name = text.toUpperCase().replace(" ", "");
  const row = ROUGHNESS_GRADES.find((one) => one.grade === name);
  if (row === undefined) {
    throw new LimitsError("ROUGHNESS_GRADE_UNKNOWN", "there is no such roughness grade", {
      value: text,
      allowed: ROUGHNESS_GRADES.map((one) => one.grade).join(", "),
    });
  }
  return { value: umLength(row.um), parameter: "Ra", max: false, grade: row.grade };
}
