import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { ParsedClass } from "./parsedClass.js";
import { GRADES, SHAFT_LETTERS } from "./toleranceClass.js";
import type { GradeName, ToleranceClass } from "./toleranceClass.js";

/** What functions take for a class: its text, or a class taken apart before. */
export type ToleranceClassLike = string | ToleranceClass;

const known: Map<string, ParsedClass> = new Map<string, ParsedClass>();
const gradeNames: ReadonlySet<string> = new Set(GRADES);
const letters: ReadonlySet<string> = new Set([
  ...SHAFT_LETTERS,
  ...SHAFT_LETTERS.map((letter) => letter.toUpperCase()),
]);
const LONGEST_CLASS = 40;
const CLASS = /^([a-z]{1,2})(\d{1,2})$/i;

/**
 * Takes a tolerance class apart; the case of its letter decides between hole and shaft.
 *
 * @param text - such as `"m6"` (shaft), `"H7"` (hole) or `"js01"`, blanks around it allowed
 * @returns the frozen class: text, letter, grade, kind (no unit)
 * @throws `CLASS_MALFORMED`, `CLASS_LETTER_UNKNOWN`, `CLASS_GRADE_UNKNOWN`
 * @example
 * ```ts
 * import { parseToleranceClass } from "limitsmith";
 *
 * parseToleranceClass("K5").kind; // → "hole"
 * parseToleranceClass("k5").kind; // → "shaft"
 * ```
 * @reference ISO 286-1:2010, 4.2.2 (tolerance class designation)
 */
export function parseToleranceClass(text: ToleranceClassLike): ToleranceClass {
  return parsedClass(text);
}

/** The same for this room: a class that keeps what was worked out for it. */
export function parsedClass(text: ToleranceClassLike): ParsedClass {
  if (typeof text === "object" && isObject(text) && ParsedClass.made(text)) return text;
  const given = textOf(text);
  const before = known.get(given);
  if (before !== undefined) return before;
  if (given.length > LONGEST_CLASS) throw malformed(given);
  const trimmed = given.trim();
  const parsed = known.get(trimmed) ?? parse(trimmed);
  // no more of these than classes: blanks are gone and what is no class was refused
  known.set(parsed.text, parsed);
  return parsed;
}

/** The type says that it is one; what arrives from JavaScript may be null. */
function isObject(value: unknown): value is object {
  return value !== null;
}

function textOf(value: ToleranceClassLike): string {
  if (typeof value === "string") return value;
  const given: unknown = value;
  const text = typeof given === "object" && given !== null ? ownValue(value, "text") : undefined;
  if (typeof text !== "string") throw malformed(given);
  return text;
}

function parse(text: string): ParsedClass {
  const match = CLASS.exec(text);
  const letter = match?.[1];
  const number = match?.[2];
  if (letter === undefined || number === undefined) throw malformed(text);
  if (!letters.has(letter)) {
    throw new LimitsError("CLASS_LETTER_UNKNOWN", "no fundamental deviation has this letter", {
      value: text,
      allowed: `${SHAFT_LETTERS.join(" ")} for shafts, the same in capitals for holes (both letters alike)`,
    });
  }
  const grade = `IT${number}`;
  if (!isGrade(grade)) {
    throw new LimitsError("CLASS_GRADE_UNKNOWN", "there is no such standard tolerance grade", {
      value: text,
      allowed: "01, 0, 1 to 18, without a leading zero",
    });
  }
  return new ParsedClass(text, letter, grade, letter === letter.toLowerCase() ? "shaft" : "hole");
}

function isGrade(text: string): text is GradeName {
  return gradeNames.has(text);
}

function malformed(value: unknown): LimitsError {
  return new LimitsError("CLASS_MALFORMED", "this is not a tolerance class", {
    value,
    allowed: "one or two letters and a grade, such as m6, H7, js9",
  });
}
