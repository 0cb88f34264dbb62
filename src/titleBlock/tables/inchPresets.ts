// Title blocks as they are often met on inch drawings. Common practice, no standard: there is no default where the
// block is missing. The values by decimals: the most common ones of two trade discussions; four decimals and the
// fraction are from memory. Angles are left out, for ±1° and ±0°30' are equally common. The values by diameter and
// length: one shop's published machining standard. Marks: 1 one source, m memory.

import type { TitleBlockPresetName, TitleBlockSpec } from "../titleBlockValue.js";

/** A block, and how sure each of its lines is. */
export interface Preset {
  readonly spec: TitleBlockSpec;
  readonly marks: ReadonlyMap<string, string>;
}

/** Inch blocks by the name of their preset. */
export const INCH_PRESETS: Readonly<Record<TitleBlockPresetName, Preset>> = {
  "common inch": {
    spec: {
      unit: "in",
      decimals: { 1: "±.1", 2: "±.01", 3: "±.005", 4: "±.0005" },
      fractions: "±1/64",
    },
    marks: new Map([
      ["decimals.1", "1"],
      ["decimals.2", "1"],
      ["decimals.3", "1"],
      ["decimals.4", "m"],
      ["fractions", "m"],
    ]),
  },
  "inch by diameter and length": {
    spec: {
      unit: "in",
      diameters: { decimals: { any: "±.005" }, fractions: "±.010" },
      lengths: { decimals: { any: "±.015" }, fractions: "±.020" },
      angles: "±2°",
      edges: "fillets and corners .030 maximum",
      finish: "finish not over 150 microinches",
    },
    marks: new Map([
      ["diameters.decimals.any", "1"],
      ["diameters.fractions", "1"],
      ["lengths.decimals.any", "1"],
      ["lengths.fractions", "1"],
      ["angles", "1"],
    ]),
  },
};
