// Signs of surface-texture symbols: lay, removal of material, and what stands where. ISO 1302:2002,
// ASME Y14.36M-1996 and Y14.36-2018, as drawing textbooks and training pages show them.

import type { Mark } from "../../basis.js";

/** A sign and its meaning. */
export interface SymbolRow {
  readonly symbol: string;
  readonly text: string | null;
  readonly meaning: string;
  readonly mark: Mark;
}

/** Signs for the lay. `text`: how the text form of ASME Y14.36-2018 writes it, where it differs. */
export const LAY_SYMBOLS: readonly SymbolRow[] = [
  { symbol: "=", text: null, meaning: "lay parallel to the line that represents the surface in the view", mark: "one-source" },
  { symbol: "⊥", text: null, meaning: "lay perpendicular to that line", mark: "one-source" },
  { symbol: "X", text: null, meaning: "lay crossed in two slanting directions", mark: "one-source" },
  { symbol: "M", text: "MULTD", meaning: "lay in many directions", mark: "two-sources" },
  { symbol: "C", text: null, meaning: "lay roughly circular about the centre of the surface", mark: "one-source" },
  { symbol: "R", text: null, meaning: "lay roughly radial to the centre of the surface", mark: "two-sources" },
  { symbol: "P", text: null, meaning: "particulate, no direction or protuberant, as a cast surface", mark: "one-source" },
];

/** Forms of the check mark. `text`: the text form. */
export const REMOVAL_SYMBOLS: readonly SymbolRow[] = [
  { symbol: "basic open check mark", text: "APA", meaning: "any process allowed", mark: "one-source" },
  { symbol: "check mark closed by a bar", text: "MRR", meaning: "material must be removed", mark: "one-source" },
  { symbol: "check mark with a circle in the vee", text: "NMR", meaning: "material must not be removed; the surface stays as the earlier process left it", mark: "one-source" },
  { symbol: "any of these with a horizontal line at the long leg", text: null, meaning: "carries the parameters and values", mark: "one-source" },
  { symbol: "circle at the corner of long leg and line", text: null, meaning: "all surfaces round the outline of the view (ISO 1302)", mark: "memory" },
];

/** What stands at a letter of the symbol, by standard. */
export const SYMBOL_POSITIONS: readonly {
  readonly standard: "ISO 1302:2002" | "ASME Y14.36M-1996";
  readonly mark: Mark;
  readonly positions: readonly { readonly position: string; readonly meaning: string }[];
}[] = [
  {
    standard: "ISO 1302:2002",
    mark: "one-source",
    positions: [
      { position: "a", meaning: "first parameter with transmission band and limit" },
      { position: "b", meaning: "second and further parameters" },
      { position: "c", meaning: "production method" },
      { position: "d", meaning: "lay" },
      { position: "e", meaning: "machining allowance" },
    ],
  },
  {
    standard: "ASME Y14.36M-1996",
    mark: "one-source",
    positions: [
      { position: "a", meaning: "Ra value(s)" },
      { position: "b", meaning: "production method or note" },
      { position: "c", meaning: "cut-off or sampling length" },
      { position: "d", meaning: "lay" },
      { position: "e", meaning: "material removal allowance" },
      { position: "f", meaning: "parameter other than Ra" },
    ],
  },
];
