// ISO 2768-2:1989, Table 3: total tolerances of symmetry, in µm. Withdrawn in 2021.
// Ranges in mm of the length: over the end before, up to and including their own.
// Marks, one a cell: 2 two sources, 1 one source, m memory, - no value.

import type { Iso2768Geometry } from "../generalToleranceValue.js";
import type { RangeTable } from "../rangeTable.js";

/** Total tolerances of symmetry, in µm. */
export const ISO_2768_SYMMETRY: RangeTable<Iso2768Geometry> = {
  standard: "ISO 2768-2:1989",
  table: "Table 3",
  by: "length",
  unit: "um",
  overMm: 0,
  overIncluded: false,
  endsMm: [100, 300, 1000, 3000],
  columns: {
    H: { values: [500, 500, 500, 500], marks: "2222" },
    K: { values: [600, 600, 800, 1000], marks: "2222" },
    L: { values: [600, 1000, 1500, 2000], marks: "2222" },
  },
};
