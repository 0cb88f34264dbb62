// ISO 2768-1:1989, Table 3: deviations of angles, plus and minus, in minutes of arc.
// Ranges in mm of the shorter leg: over the end before, up to and including their own; the last is open.
// Marks, one a cell: 2 two sources, 1 one source, m memory, - no value.

import type { Iso2768Linear } from "../generalToleranceValue.js";
import type { RangeTable } from "../rangeTable.js";

/** Deviations of angles, plus and minus, in minutes of arc. */
export const ISO_2768_ANGULAR: RangeTable<Iso2768Linear> = {
  standard: "ISO 2768-1:1989",
  table: "Table 3",
  by: "shorter leg",
  unit: "arcmin",
  overMm: 0,
  overIncluded: false,
  endsMm: [10, 50, 120, 400, null],
  columns: {
    f: { values: [60, 30, 20, 10, 5], marks: "22222" },
    m: { values: [60, 30, 20, 10, 5], marks: "22222" },
    c: { values: [90, 60, 30, 15, 10], marks: "22222" },
    v: { values: [180, 120, 60, 30, 20], marks: "22222" },
  },
};
