// ISO 13920:2023, Table 2: deviations of angles of welded constructions, plus and minus, in minutes of arc.
// Ranges in mm of the shorter leg: over the end before, up to and including their own; the last is open.
// Marks, one a cell: 2 two sources, 1 one source, m memory, - no value.

import type { Iso13920Linear } from "../generalToleranceValue.js";
import type { RangeTable } from "../rangeTable.js";

/** Deviations of angles of welded constructions, plus and minus, in minutes of arc. */
export const ISO_13920_ANGULAR: RangeTable<Iso13920Linear> = {
  standard: "ISO 13920:2023",
  table: "Table 2",
  by: "shorter leg",
  unit: "arcmin",
  overMm: 0,
  overIncluded: false,
  endsMm: [400, 1000, null],
  columns: {
    A: { values: [20, 15, 10], marks: "111" },
    B: { values: [45, 30, 20], marks: "111" },
    C: { values: [60, 45, 30], marks: "111" },
    D: { values: [90, 75, 60], marks: "111" },
  },
};
