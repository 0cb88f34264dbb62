import { FIRST_CHOICE_CLASSES, PREFERRED_HOLE_CLASSES, PREFERRED_SHAFT_CLASSES } from "./tables/preferredClasses.js";

/** A tolerance class that the standard prefers. */
export interface PreferredClass {
  /** Such as `"H7"`. */
  readonly text: string;
  /** What the class is for: capitals are holes. */
  readonly kind: "hole" | "shaft";
  /** True for the narrower selection to try first. */
  readonly firstChoice: boolean;
}

let list: readonly PreferredClass[] | undefined;

/**
 * The preferred tolerance classes of holes and shafts.
 *
 * @returns a frozen list (no unit), holes first; the figures were not seen, so all of it is from memory
 * @throws nothing
 * @example
 * ```ts
 * import { preferredIsoClasses } from "limitsmith";
 *
 * preferredIsoClasses().filter((one) => one.kind === "shaft" && one.firstChoice).length; // → 17
 * ```
 * @reference ISO 286-1:2010, figures of preferred tolerance classes; first choice: ISO 1829:1975 (all from memory)
 */
export function preferredIsoClasses(): readonly PreferredClass[] {
  return (list ??= Object.freeze([
    ...PREFERRED_HOLE_CLASSES.map((text) => entry(text, "hole")),
    ...PREFERRED_SHAFT_CLASSES.map((text) => entry(text, "shaft")),
  ]));
}

function entry(text: string, kind: "hole" | "shaft"): PreferredClass {
  return Object.freeze({ text, kind, firstChoice: FIRST_CHOICE_CLASSES.includes(text) });
}
