// ISO 2768-1:1989, Table 1: deviations of linear sizes except broken edges, plus and minus, in µm.
// Ranges in mm: over the end before, up to and including their own; only the first takes its lower end, 0.5 mm, too.
// null: the class has no value there (v up to 3 mm, f over 2000 mm).
// Marks, one a cell: 2 two sources, 1 one source, m memory, - no value.

import type { Iso2768Linear } from "../generalToleranceValue.js";
import type { RangeTable } from "../rangeTable.js";

/** Deviations of linear sizes except broken edges, plus and minus, in µm. */
export const ISO_2768_LINEAR: RangeTable<Iso2768Linear> = {
  standard: "ISO 2768-1:1989",
  table: "Table 1",
  by: "",
  unit: "um",
  overMm: 0.5,
  overIncluded: true,
  endsMm: [3, 6, 30, 120, 400, 1000, 2000, 4000],
  columns: {
    f: { values: [50, 50, 100, 150, 200, 300, 500, null], marks: "2222222-" },
    m: { values: [100, 100, 200, 300, 500, 800, 1200, 2000], marks: "22222222" },
    c: { values: [200, 300, 500, 800, 1200, 2000, 3000, 4000], marks: "22222222" },
    v: { values: [null, 500, 1000, 1500, 2500, 4000, 6000, 8000], marks: "-2222222" },
  },
};
