// ISO 2768-2:1989, Table 1: total tolerances of straightness and flatness, in µm. Withdrawn in 2021.
// Ranges in mm of the length: over the end before, up to and including their own.
// Marks, one a cell: 2 two sources, 1 one source, m memory, - no value.

import type { Iso2768Geometry } from "../generalToleranceValue.js";
import type { RangeTable } from "../rangeTable.js";

/** Total tolerances of straightness and flatness, in µm. */
export const ISO_2768_STRAIGHTNESS: RangeTable<Iso2768Geometry> = {
  standard: "ISO 2768-2:1989",
  table: "Table 1",
  by: "length",
  unit: "um",
  overMm: 0,
  overIncluded: false,
  endsMm: [10, 30, 100, 300, 1000, 3000],
  columns: {
    H: { values: [20, 50, 100, 200, 300, 400], marks: "222222" },
    K: { values: [50, 100, 200, 400, 600, 800], marks: "222222" },
    L: { values: [100, 200, 400, 800, 1200, 1600], marks: "222222" },
  },
};
