// ISO 8062-3:2007, Table 2: total linear tolerances of castings by grade DCTG 1 to 16, in µm.
// The figures are those of CT 1 to 16 of ISO 8062:1994 too. The table of ISO 8062-3:2023 was not read.
// Ranges in mm: over the end before, up to and including their own. null: the grade has no value there (a dash).
// Marks, one a cell: 2 two sources, 1 one source, m memory, - no value.

import type { CastingGrade } from "../generalToleranceValue.js";
import type { RangeTable } from "../rangeTable.js";

/** Total linear tolerances of castings by grade DCTG 1 to 16, in µm. */
export const ISO_8062_CASTINGS: RangeTable<CastingGrade> = {
  standard: "ISO 8062-3:2007",
  table: "Table 2",
  by: "",
  unit: "um",
  overMm: 0,
  overIncluded: false,
  endsMm: [10, 16, 25, 40, 63, 100, 160, 250, 400, 630, 1000, 1600, 2500, 4000, 6300, 10000],
  columns: {
    1: { values: [90, 100, 110, 120, 130, 140, 150, null, null, null, null, null, null, null, null, null], marks: "2222221---------" },
    2: { values: [130, 140, 150, 170, 180, 200, 220, 240, null, null, null, null, null, null, null, null], marks: "22222211--------" },
    3: { values: [180, 200, 220, 240, 260, 280, 300, 340, 400, null, null, null, null, null, null, null], marks: "222222111-------" },
    4: { values: [260, 280, 300, 320, 360, 400, 440, 500, 560, 640, null, null, null, null, null, null], marks: "2222221111------" },
    5: { values: [360, 380, 420, 460, 500, 560, 620, 700, 780, 900, 1000, null, null, null, null, null], marks: "2222221111m-----" },
    6: { values: [520, 540, 580, 640, 700, 780, 880, 1000, 1100, 1200, 1400, 1600, null, null, null, null], marks: "2222221111mm----" },
    7: { values: [740, 780, 820, 900, 1000, 1100, 1200, 1400, 1600, 1800, 2000, 2200, 2600, null, null, null], marks: "2222222111mmm---" },
    8: { values: [1000, 1100, 1200, 1300, 1400, 1600, 1800, 2000, 2200, 2600, 2800, 3200, 3800, 4400, null, null], marks: "2222222211mmmm--" },
    9: { values: [1500, 1600, 1700, 1800, 2000, 2200, 2500, 2800, 3200, 3600, 4000, 4600, 5400, 6200, 7000, null], marks: "222222222211111-" },
    10: { values: [2000, 2200, 2400, 2600, 2800, 3200, 3600, 4000, 4400, 5000, 6000, 7000, 8000, 9000, 10000, 11000], marks: "2222221121mmmmmm" },
    11: { values: [2800, 3000, 3200, 3600, 4000, 4400, 5000, 5600, 6200, 7000, 8000, 9000, 10000, 12000, 14000, 16000], marks: "2222221111mmmmmm" },
    12: { values: [4200, 4400, 4600, 5000, 5600, 6000, 7000, 8000, 9000, 10000, 11000, 13000, 15000, 17000, 20000, 23000], marks: "2222221111mmmmmm" },
    13: { values: [null, null, 6000, 7000, 8000, 9000, 10000, 11000, 12000, 14000, 16000, 18000, 21000, 24000, 28000, 32000], marks: "--22221111mmmmmm" },
    14: { values: [null, null, 8000, 9000, 10000, 11000, 12000, 14000, 16000, 18000, 20000, 23000, 26000, 30000, 35000, 40000], marks: "--2222111mmmmmmm" },
    15: { values: [null, null, 10000, 11000, 12000, 14000, 16000, 18000, 20000, 22000, 25000, 29000, 33000, 38000, 44000, 50000], marks: "--2222111mmmmmmm" },
    16: { values: [null, null, 12000, 14000, 16000, 18000, 20000, 22000, 25000, 28000, 32000, 37000, 42000, 49000, 56000, 64000], marks: "--2222111mmmmmmm" },
  },
};
