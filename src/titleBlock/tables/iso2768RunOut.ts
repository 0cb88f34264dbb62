// ISO 2768-2:1989, Table 4: total tolerances of circular run-out, in µm. Withdrawn in 2021.
// One value for all sizes.
// Marks, one a cell: 2 two sources, 1 one source, m memory, - no value.

import type { Iso2768Geometry } from "../generalToleranceValue.js";
import type { RangeTable } from "../rangeTable.js";

/** Total tolerances of circular run-out, in µm. */
export const ISO_2768_RUN_OUT: RangeTable<Iso2768Geometry> = {
  standard: "ISO 2768-2:1989",
  table: "Table 4",
  by: "",
  unit: "um",
  overMm: 0,
  overIncluded: false,
  endsMm: [null],
  columns: {
    H: { values: [100], marks: "2" },
    K: { values: [200], marks: "2" },
    L: { values: [500], marks: "2" },
  },
};
