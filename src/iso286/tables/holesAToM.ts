// ISO 286-1:2010, Table 2: what the table of holes A to M prints beside the mirrored values of Table 4 and 5.
// J has upper limit deviations ES of its own in three grades; M6 over 250 to 315 mm departs from the rule.

import type { DeviationColumn } from "../deviationColumn.js";

/** Upper limit deviations ES of J, which has values in these grades only. */
export const HOLES_J: Readonly<Record<string, DeviationColumn>> = {
  J6: {
    steps: "main",
    first: 0,
    um: [2, 5, 5, 6, 8, 10, 13, 16, 18, 22, 25, 29, 33],
    marks: "2222222222221",
  },
  J7: {
    steps: "main",
    first: 0,
    um: [4, 6, 8, 10, 12, 14, 18, 22, 26, 30, 36, 39, 43],
    marks: "2222222222221",
  },
  J8: {
    steps: "main",
    first: 0,
    um: [6, 10, 12, 15, 20, 24, 28, 34, 41, 47, 55, 60, 66],
    marks: "2222222222221",
  },
};

/** How sure K is over 400 to 500 mm: the mark of Table 2, which is not that of the mirrored shaft value. */
export const K_OVER_400_TO_500_MARK = "1";

/** How sure the departing value of M6 is. */
export const M6_OVER_250_TO_315_MARK = "1";

/** ES of M6 over 250 to 315 mm, in µm, printed where the rule would give -11. */
export const M6_OVER_250_TO_315_UM = -9;
