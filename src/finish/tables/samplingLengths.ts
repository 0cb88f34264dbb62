// Sampling length (cut-off) and evaluation length by roughness or by groove spacing; an upper bound belongs to its row.
// null: open end.

import type { Mark } from "../../basis.js";

/** One row: the value measured or specified, and the lengths in mm or inches. */
export interface SamplingRow {
  readonly over: number | null;
  readonly to: number | null;
  readonly cutoff: number;
  readonly evaluation: number;
}

/** A table of rows, and how sure it is. */
export interface SamplingTable {
  readonly place: string;
  readonly mark: Mark;
  readonly rows: readonly SamplingRow[];
}

/** ISO 4288:1996, Ra in µm, lengths in mm; the outer bounds are from memory. */
export const ISO4288_RA: SamplingTable = {
  place: "Table 1, non-periodic profiles",
  mark: "two-sources",
  rows: [
    { over: 0.006, to: 0.02, cutoff: 0.08, evaluation: 0.4 },
    { over: 0.02, to: 0.1, cutoff: 0.25, evaluation: 1.25 },
    { over: 0.1, to: 2, cutoff: 0.8, evaluation: 4 },
    { over: 2, to: 10, cutoff: 2.5, evaluation: 12.5 },
    { over: 10, to: 80, cutoff: 8, evaluation: 40 },
  ],
};

/** ISO 4288:1996, Rz in µm, lengths in mm; from memory but the first two rows, reviewed once. */
export const ISO4288_RZ: SamplingTable = {
  place: "Table 2, non-periodic profiles",
  mark: "memory",
  rows: [
    { over: 0.025, to: 0.1, cutoff: 0.08, evaluation: 0.4 },
    { over: 0.1, to: 0.5, cutoff: 0.25, evaluation: 1.25 },
    { over: 0.5, to: 10, cutoff: 0.8, evaluation: 4 },
    { over: 10, to: 50, cutoff: 2.5, evaluation: 12.5 },
    { over: 50, to: 200, cutoff: 8, evaluation: 40 },
  ],
};

/** ISO 4288:1996, RSm in mm, lengths in mm. */
export const ISO4288_RSM: SamplingTable = {
  place: "Table 3, periodic profiles",
  mark: "two-sources",
  rows: [
    { over: 0.013, to: 0.04, cutoff: 0.08, evaluation: 0.4 },
    { over: 0.04, to: 0.13, cutoff: 0.25, evaluation: 1.25 },
    { over: 0.13, to: 0.4, cutoff: 0.8, evaluation: 4 },
    { over: 0.4, to: 1.3, cutoff: 2.5, evaluation: 12.5 },
    { over: 1.3, to: 4, cutoff: 8, evaluation: 40 },
  ],
};

/** ISO 21920-3:2021, Ra in µm, lengths in mm: nesting index and section length are the sampling length. */
export const ISO21920_RA: SamplingTable = {
  place: "default settings by the specified Ra",
  mark: "one-source",
  rows: [
    { over: null, to: 0.02, cutoff: 0.08, evaluation: 0.4 },
    { over: 0.02, to: 0.1, cutoff: 0.25, evaluation: 1.25 },
    { over: 0.1, to: 2, cutoff: 0.8, evaluation: 4 },
    { over: 2, to: 10, cutoff: 2.5, evaluation: 12.5 },
    { over: 10, to: null, cutoff: 8, evaluation: 40 },
  ],
};

/** ISO 21920-3:2021, Rz in µm, lengths in mm. */
export const ISO21920_RZ: SamplingTable = {
  place: "default settings by the specified Rz",
  mark: "one-source",
  rows: [
    { over: null, to: 0.16, cutoff: 0.08, evaluation: 0.4 },
    { over: 0.16, to: 0.8, cutoff: 0.25, evaluation: 1.25 },
    { over: 0.8, to: 16, cutoff: 0.8, evaluation: 4 },
    { over: 16, to: 80, cutoff: 2.5, evaluation: 12.5 },
    { over: 80, to: null, cutoff: 8, evaluation: 40 },
  ],
};

/** ASME B46.1 as an instrument maker's manual sets it, Ra in µin, lengths in inches. */
export const ASME_RA_UIN: SamplingTable = {
  place: "cut-off by Ra in µin",
  mark: "one-source",
  rows: [
    { over: null, to: 0.8, cutoff: 0.003, evaluation: 0.016 },
    { over: 0.8, to: 4, cutoff: 0.01, evaluation: 0.05 },
    { over: 4, to: 80, cutoff: 0.03, evaluation: 0.16 },
    { over: 80, to: 400, cutoff: 0.1, evaluation: 0.5 },
    { over: 400, to: null, cutoff: 0.3, evaluation: 1.6 },
  ],
};

/** ASME B46.1 as an instrument maker's manual sets it, RSm in inches, lengths in inches. */
export const ASME_RSM_IN: SamplingTable = {
  place: "cut-off by RSm in inches",
  mark: "one-source",
  rows: [
    { over: 0.0005, to: 0.0016, cutoff: 0.003, evaluation: 0.016 },
    { over: 0.0016, to: 0.005, cutoff: 0.01, evaluation: 0.05 },
    { over: 0.005, to: 0.016, cutoff: 0.03, evaluation: 0.16 },
    { over: 0.016, to: 0.05, cutoff: 0.1, evaluation: 0.5 },
    { over: 0.05, to: 0.16, cutoff: 0.3, evaluation: 1.6 },
  ],
};
