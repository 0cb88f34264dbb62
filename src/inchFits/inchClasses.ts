import { GROUPS } from "./inchClass.js";
import type { InchClass } from "./inchClass.js";
import type { InchSymbols } from "./inchFitValue.js";
import { parseInchClass } from "./parseInchClass.js";
import { CLASS_FACTS } from "./tables/classes.js";

/** A class of inch fits and what it is for. */
export interface InchClassFacts {
  /** The class, taken apart. */
  readonly fitClass: InchClass;
  /** Its group, such as `"locational interference fits"`. */
  readonly group: string;
  /** ABC symbols of hole and shaft. */
  readonly symbols: InchSymbols;
  /** What the class is for, in our words. */
  readonly purpose: string;
}

let list: readonly InchClassFacts[] | undefined;

/**
 * The 34 classes of inch fits, with what each is for.
 *
 * @returns a frozen list in the order of the standard (no unit), RC1 to FN5, without suffixes
 * @throws nothing
 * @example
 * ```ts
 * import { inchClasses } from "limitsmith";
 *
 * inchClasses().length; // → 34
 * inchClasses().find((one) => one.fitClass.text === "LN2")?.group; // → "locational interference fits"
 * ```
 * @reference ANSI B4.1-1967, description of fits; the symbols of LC1 to LC5 are from memory
 */
export function inchClasses(): readonly InchClassFacts[] {
  return (list ??= Object.freeze(
    Object.entries(CLASS_FACTS).map(([name, { hole, shaft, purpose }]) => {
      const fitClass = parseInchClass(name);
      const group = GROUPS.get(fitClass.letters) ?? "";
      return Object.freeze({ fitClass, group, symbols: Object.freeze({ hole, shaft }), purpose });
    }),
  ));
}
