// ISO 13920:2023, Table 1: deviations of linear sizes of welded constructions, plus and minus, in µm.
// Ranges in mm: over the end before, up to and including their own; the last is open. Over 2 up to 30 mm all classes
// share one printed cell. The figures of 1996 are the same; its first range is headed 2 to 30 (from memory).
// Marks, one a cell: 2 two sources, 1 one source, m memory, - no value.

import type { Iso13920Linear } from "../generalToleranceValue.js";
import type { RangeTable } from "../rangeTable.js";

/** Deviations of linear sizes of welded constructions, plus and minus, in µm. */
export const ISO_13920_LINEAR: RangeTable<Iso13920Linear> = {
  standard: "ISO 13920:2023",
  table: "Table 1",
  by: "",
  unit: "um",
  overMm: 2,
  overIncluded: false,
  endsMm: [30, 120, 400, 1000, 2000, 4000, 8000, 12000, 16000, 20000, null],
  columns: {
    A: { values: [1000, 1000, 1000, 2000, 3000, 4000, 5000, 6000, 7000, 8000, 9000], marks: "11111111111" },
    B: { values: [1000, 2000, 2000, 3000, 4000, 6000, 8000, 10000, 12000, 14000, 16000], marks: "11111111111" },
    C: { values: [1000, 3000, 4000, 6000, 8000, 11000, 14000, 18000, 21000, 24000, 27000], marks: "11111111111" },
    D: { values: [1000, 4000, 7000, 9000, 12000, 16000, 21000, 27000, 32000, 36000, 40000], marks: "11111111111" },
  },
};
