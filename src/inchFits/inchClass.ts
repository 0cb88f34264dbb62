import { CLASS_FACTS } from "./tables/classes.js";

/** The letters of the five groups of classes. */
export type InchClassLetters = "RC" | "LC" | "LT" | "LN" | "FN";

/** Which member keeps its limit on the basic size; `"bilateral hole"` is neither (suffix B). */
export type InchBasis = "hole" | "shaft" | "bilateral hole";

/** A class of inch fits, taken apart. */
export interface InchClass {
  /** As a drawing writes it: `"LN2"`, `"RC5S"`. */
  readonly text: string;
  /** Letters of its group. */
  readonly letters: InchClassLetters;
  /** Number within the group: 2 in `"LN2"`. */
  readonly number: number;
  /** `"shaft"` for suffix S, `"bilateral hole"` for suffix B, else `"hole"`. */
  readonly basis: InchBasis;
}

/** What the classes of a group are for. */
export const GROUPS: ReadonlyMap<InchClassLetters, string> = new Map([
  ["RC", "running and sliding fits"],
  ["LC", "locational clearance fits"],
  ["LT", "locational transition fits"],
  ["LN", "locational interference fits"],
  ["FN", "force and shrink fits"],
]);

/** Suffix of each basis. */
export const SUFFIXES: ReadonlyMap<InchBasis, string> = new Map([
  ["hole", ""],
  ["shaft", "S"],
  ["bilateral hole", "B"],
]);

/** Every class without suffix, in the order of the standard: `"RC1"` to `"FN5"`. */
export const CLASS_NAMES: readonly string[] = Object.keys(CLASS_FACTS);

/** A class by its parts; no check whether it exists. */
export function makeInchClass(letters: InchClassLetters, number: number, basis: InchBasis): InchClass {
  return Object.freeze({ text: `${letters}${number}${SUFFIXES.get(basis) ?? ""}`, letters, number, basis });
}

/** The class of the tables that a class with a suffix comes from: `"RC5"` for `"RC5S"`. */
export function parentOf(cls: InchClass): string {
  return `${cls.letters}${cls.number}`;
}
