import { NAMED_FITS } from "./tables/namedFits.js";
import { PREFERRED_HOLE_BASIS_FITS, PREFERRED_SHAFT_BASIS_FITS } from "./tables/preferredFits.js";

/** A fit that a standard prefers. */
export interface PreferredFit {
  /** Such as `"H7/g6"`. */
  readonly fit: string;
  /** Which member keeps its limit on the nominal size. */
  readonly system: "hole basis" | "shaft basis";
  /** `ANSI B4.2` for its ten named pairs, `ISO 286-1:2010` for the other fits of its figures. */
  readonly standard: "ANSI B4.2" | "ISO 286-1:2010";
  /** Name in the standard, such as `"sliding"`; `null` where it has none. */
  readonly name: string | null;
  /** What it is for, in our words; `null` where the standard does not say. */
  readonly use: string | null;
}

let list: readonly PreferredFit[] | undefined;

/**
 * The preferred fits: the ten named pairs of ANSI B4.2 first, then the others of the ISO figures.
 *
 * @returns a frozen list (no unit), each fit once in each system; B4.2 pairs from loosest to tightest
 * @throws nothing
 * @example
 * ```ts
 * import { preferredIsoFits } from "limitsmith";
 *
 * preferredIsoFits().find((one) => one.name === "sliding")?.fit; // → "H7/g6"
 * ```
 * @reference ANSI B4.2-1978 (R2004), preferred fits; ISO 286-1:2010, figures of preferred fits (shaft basis from memory)
 */
export function preferredIsoFits(): readonly PreferredFit[] {
  return (list ??= build());
}

function build(): readonly PreferredFit[] {
  const found: PreferredFit[] = [];
  for (const { name, use, holeBasis, shaftBasis } of NAMED_FITS) {
    found.push({ fit: holeBasis, system: "hole basis", standard: "ANSI B4.2", name, use });
    found.push({ fit: shaftBasis, system: "shaft basis", standard: "ANSI B4.2", name, use });
  }
  const figures = [
    ["hole basis", PREFERRED_HOLE_BASIS_FITS],
    ["shaft basis", PREFERRED_SHAFT_BASIS_FITS],
  ] as const;
  for (const [system, fits] of figures) {
    for (const fit of fits) {
      if (found.some((one) => one.fit === fit && one.system === system)) continue;
      found.push({ fit, system, standard: "ISO 286-1:2010", name: null, use: null });
    }
  }
  return Object.freeze(found.map((one) => Object.freeze(one)));
}
