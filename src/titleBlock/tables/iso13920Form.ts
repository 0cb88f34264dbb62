// ISO 13920:2023, Table 3: total tolerances of straightness, flatness and parallelism of welded constructions, in µm.
// Ranges in mm of the longer side: over the end before, up to and including their own; the last is open.
// Marks, one a cell: 2 two sources, 1 one source, m memory, - no value.

import type { Iso13920Form } from "../generalToleranceValue.js";
import type { RangeTable } from "../rangeTable.js";

/** Total tolerances of straightness, flatness and parallelism of welded constructions, in µm. */
export const ISO_13920_FORM: RangeTable<Iso13920Form> = {
  standard: "ISO 13920:2023",
  table: "Table 3",
  by: "longer side",
  unit: "um",
  overMm: 30,
  overIncluded: false,
  endsMm: [120, 400, 1000, 2000, 4000, 8000, 12000, 16000, 20000, null],
  columns: {
    E: { values: [500, 1000, 1500, 2000, 3000, 4000, 5000, 6000, 7000, 8000], marks: "1111111111" },
    F: { values: [1000, 1500, 3000, 4500, 6000, 8000, 10000, 12000, 14000, 16000], marks: "1111111111" },
    G: { values: [1500, 3000, 5500, 9000, 11000, 16000, 20000, 22000, 25000, 25000], marks: "1mmmmmmmmm" },
    H: { values: [2500, 5000, 9000, 14000, 18000, 26000, 32000, 36000, 40000, 40000], marks: "mmmmmmmmmm" },
  },
};
