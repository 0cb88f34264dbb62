// Surface factor k_a = a Sut^b: coefficients as a mechanical-design textbook prints them, by edition. a belongs to the
// unit of the ultimate tensile strength, b is the same for both.

import type { Mark } from "../../basis.js";

/** The finishes that the sets tell apart. */
export type SurfaceCondition = "ground" | "machined or cold-drawn" | "hot-rolled" | "as-forged";

/** Names of the coefficient sets. */
export type SurfaceFactorSet = "8th to 10th edition" | "11th edition" | "9th edition, stochastic";

/** Coefficients of one finish. */
export interface SurfaceFactorRow {
  readonly finish: SurfaceCondition;
  readonly aKsi: number;
  readonly aMpa: number;
  readonly b: number;
  /** Coefficient of variation; stochastic set only. */
  readonly variation: number | null;
}

/** One coefficient set. */
export interface SurfaceFactorTable {
  readonly set: SurfaceFactorSet;
  readonly standard: string;
  readonly place: string;
  readonly mark: Mark;
  readonly rows: readonly SurfaceFactorRow[];
}

/** All sets; the last one gives the mean values of the stochastic method. */
export const SURFACE_FACTORS: readonly SurfaceFactorTable[] = [
  {
    set: "8th to 10th edition",
    standard: "Shigley's Mechanical Engineering Design, 8th to 10th ed.",
    place: "Table 6-2",
    mark: "two-sources",
    rows: [
      { finish: "ground", aKsi: 1.34, aMpa: 1.58, b: -0.085, variation: null },
      { finish: "machined or cold-drawn", aKsi: 2.7, aMpa: 4.51, b: -0.265, variation: null },
      { finish: "hot-rolled", aKsi: 14.4, aMpa: 57.7, b: -0.718, variation: null },
      { finish: "as-forged", aKsi: 39.9, aMpa: 272, b: -0.995, variation: null },
    ],
  },
  {
    set: "11th edition",
    standard: "Shigley's Mechanical Engineering Design, 11th ed. (2020)",
    place: "Table 6-2",
    mark: "memory",
    rows: [
      { finish: "ground", aKsi: 1.21, aMpa: 1.38, b: -0.067, variation: null },
      { finish: "machined or cold-drawn", aKsi: 2, aMpa: 3.04, b: -0.217, variation: null },
      { finish: "hot-rolled", aKsi: 11, aMpa: 38.6, b: -0.65, variation: null },
      { finish: "as-forged", aKsi: 12.7, aMpa: 54.9, b: -0.758, variation: null },
    ],
  },
  {
    set: "9th edition, stochastic",
    standard: "Shigley's Mechanical Engineering Design, 9th ed.",
    place: "Table 6-10 (mean values for the stochastic method)",
    mark: "one-source",
    rows: [
      { finish: "ground", aKsi: 1.34, aMpa: 1.58, b: -0.086, variation: 0.12 },
      { finish: "machined or cold-drawn", aKsi: 2.67, aMpa: 4.45, b: -0.265, variation: 0.058 },
      { finish: "hot-rolled", aKsi: 14.5, aMpa: 58.1, b: -0.719, variation: 0.11 },
      { finish: "as-forged", aKsi: 39.8, aMpa: 271, b: -0.995, variation: 0.145 },
    ],
  },
];
