// ANSI B4.1-1967, table of locational interference fits, LN1 to LN3.
// Each row in thousandths of an inch: hole upper limit (its lower limit is 0), shaft upper limit, shaft lower limit,
// least and greatest interference.
// LN1 over 0.40 up to 1.97 in is no true n5; the printed interference agrees with the printed shafts.
// Marks, one a row: 2 two sources, 1 one source, f formula, m memory, c published tables differ,
// - the standard gives no values, ? not found in any published table.

import type { InchColumn } from "../inchColumn.js";

/** Locational interference fits by class. */
export const LOCATIONAL_INTERFERENCE_FITS: Readonly<Record<string, InchColumn>> = {
  LN1: {
    steps: "general",
    thou: [
      [0.25, 0.45, 0.25, 0, 0.45], [0.3, 0.5, 0.3, 0, 0.5], [0.4, 0.65, 0.4, 0, 0.65], [0.4, 0.8, 0.4, 0, 0.8],
      [0.5, 1, 0.5, 0, 1], [0.6, 1.1, 0.6, 0, 1.1], [0.7, 1.3, 0.8, 0.1, 1.3], [0.9, 1.6, 1, 0.1, 1.6],
      [1, 1.9, 1.2, 0.2, 1.9], [1.2, 2.2, 1.4, 0.2, 2.2], [1.2, 2.3, 1.4, 0.2, 2.3], [1.4, 2.6, 1.6, 0.2, 2.6],
      [1.6, 2.8, 1.8, 0.2, 2.8],
    ],
    marks: "1111111111111",
  },
  LN2: {
    steps: "general",
    thou: [
      [0.4, 0.65, 0.4, 0, 0.65], [0.5, 0.8, 0.5, 0, 0.8], [0.6, 1, 0.6, 0, 1], [0.7, 1.1, 0.7, 0, 1.1],
      [0.8, 1.3, 0.8, 0, 1.3], [1, 1.6, 1, 0, 1.6], [1.2, 2.1, 1.4, 0.2, 2.1], [1.4, 2.5, 1.6, 0.2, 2.5],
      [1.6, 2.8, 1.8, 0.2, 2.8], [1.8, 3.2, 2, 0.2, 3.2], [2, 3.4, 2.2, 0.2, 3.4], [2.2, 3.9, 2.5, 0.3, 3.9],
      [2.5, 4.4, 2.8, 0.3, 4.4],
    ],
    marks: "1111111111111",
  },
  LN3: {
    steps: "general",
    thou: [
      [0.4, 0.75, 0.5, 0.1, 0.75], [0.5, 0.9, 0.6, 0.1, 0.9], [0.6, 1.2, 0.8, 0.2, 1.2], [0.7, 1.4, 1, 0.3, 1.4],
      [0.8, 1.7, 1.2, 0.4, 1.7], [1, 2, 1.4, 0.4, 2], [1.2, 2.3, 1.6, 0.4, 2.3], [1.4, 2.9, 2, 0.6, 2.9],
      [1.6, 3.5, 2.5, 0.9, 3.5], [1.8, 4.2, 3, 1.2, 4.2], [2, 4.7, 3.5, 1.5, 4.7], [2.2, 5.9, 4.5, 2.3, 5.9],
      [2.5, 6.6, 5, 2.5, 6.6],
    ],
    marks: "1111111111111",
  },
};
