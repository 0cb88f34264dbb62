// ISO 2768-2:1989, Table 2: total tolerances of perpendicularity, in µm. Withdrawn in 2021.
// Ranges in mm of the shorter side: over the end before, up to and including their own.
// Marks, one a cell: 2 two sources, 1 one source, m memory, - no value.

import type { Iso2768Geometry } from "../generalToleranceValue.js";
import type { RangeTable } from "../rangeTable.js";

/** Total tolerances of perpendicularity, in µm. */
export const ISO_2768_PERPENDICULARITY: RangeTable<Iso2768Geometry> = {
  standard: "ISO 2768-2:1989",
  table: "Table 2",
  by: "shorter side",
  unit: "um",
  overMm: 0,
  overIncluded: false,
  endsMm: [100, 300, 1000, 3000],
  columns: {
    H: { values: [200, 300, 400, 500], marks: "2222" },
    K: { values: [400, 600, 800, 1000], marks: "2222" },
    L: { values: [600, 1000, 1500, 2000], marks: "2222" },
  },
};
