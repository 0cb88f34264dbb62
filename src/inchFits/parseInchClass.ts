import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { CLASS_NAMES, GROUPS, SUFFIXES, makeInchClass } from "./inchClass.js";
import type { InchClass, InchClassLetters } from "./inchClass.js";

/** What functions take for a class: its text, or a class taken apart before. */
export type InchClassLike = string | InchClass;

const CLASS = /^([a-z]{2})\s*(\d{1,2})\s*([bs])?$/i;

// every class with every suffix, by its plain text: most calls end here
const known: ReadonlyMap<string, InchClass> = new Map(
  CLASS_NAMES.flatMap((name) =>
    [...SUFFIXES.keys()].map((basis) => {
      const cls = makeInchClass(name.slice(0, 2) as InchClassLetters, Number(name.slice(2)), basis);
      return [cls.text, cls] as const;
    }),
  ),
);

/**
 * Takes the text of a class of inch fits apart; capitals and blanks do not matter.
 *
 * @param text - such as `"LN2"`, `"LN 2"`, `"ln2"`, or with a suffix: `"RC5S"` (shaft basis), `"LC 4B"` (bilateral hole)
 * @returns the frozen class: text, letters, number, basis (no unit)
 * @throws `INCH_CLASS_MALFORMED` for what is no class at all, `INCH_CLASS_UNKNOWN` for a number that its group has not
 * @example
 * ```ts
 * import { parseInchClass } from "limitsmith";
 *
 * parseInchClass("rc 5s"); // → { text: "RC5S", letters: "RC", number: 5, basis: "shaft" }
 * parseInchClass("LC12"); // throws INCH_CLASS_UNKNOWN
 * ```
 * @reference ANSI B4.1-1967, designation of standard fits; suffixes S and B of modified fits (naming from memory)
 */
export function parseInchClass(text: InchClassLike): InchClass {
  const given = textOf(text);
  return known.get(given) ?? parse(given.trim());
}

function textOf(value: InchClassLike): string {
  if (typeof value === "string") return value;
  const text: unknown = ownValue(value, "text");
  if (typeof text !== "string") throw malformed(value);
  return text;
}

function parse(text: string): InchClass {
  const match = CLASS.exec(text);
  const letters = match?.[1]?.toUpperCase() as InchClassLetters | undefined;
  const number = match?.[2];
  if (letters === undefined || number === undefined || !GROUPS.has(letters)) throw malformed(text);
  const suffix = match?.[3]?.toUpperCase() ?? "";
  // a leading zero is no number of a class
  const cls = known.get(`${letters}${number}${suffix}`);
  if (cls === undefined) {
    const count = CLASS_NAMES.filter((name) => name.startsWith(letters)).length;
    throw new LimitsError("INCH_CLASS_UNKNOWN", `there is no class ${letters}${number} of inch fits`, {
      value: text,
      allowed: `${letters}1 to ${letters}${count}`,
    });
  }
  return cls;
}

function malformed(value: unknown): LimitsError {
  return new LimitsError("INCH_CLASS_MALFORMED", "this is not a class of inch fits", {
    value,
    allowed:
      "RC1 to RC9, LC1 to LC11, LT1 to LT6, LN1 to LN3, FN1 to FN5, with suffix S (shaft basis) or B (bilateral hole)",
  });
}
