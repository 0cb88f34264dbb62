// ISO 2768-1:1989, Table 2: deviations of external radii and chamfer heights, plus and minus, in µm.
// Ranges in mm: over the end before, up to and including their own; the first takes 0.5 mm too; the last is open.
// Marks, one a cell: 2 two sources, 1 one source, m memory, - no value.

import type { Iso2768Linear } from "../generalToleranceValue.js";
import type { RangeTable } from "../rangeTable.js";

/** Deviations of external radii and chamfer heights, plus and minus, in µm. */
export const ISO_2768_BROKEN_EDGES: RangeTable<Iso2768Linear> = {
  standard: "ISO 2768-1:1989",
  table: "Table 2",
  by: "",
  unit: "um",
  overMm: 0.5,
  overIncluded: true,
  endsMm: [3, 6, null],
  columns: {
    f: { values: [200, 500, 1000], marks: "222" },
    m: { values: [200, 500, 1000], marks: "222" },
    c: { values: [400, 1000, 2000], marks: "222" },
    v: { values: [400, 1000, 2000], marks: "222" },
  },
};
