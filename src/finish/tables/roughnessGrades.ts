// Roughness grade numbers N01 to N14 with their Ra in µm and the paired value in µin, as drawings had them before
// ISO 1302:2002, which has no grade numbers. N1 to N12: five published tables; N01, N0, N13, N14: two, their µin one.
// N1 to N12 are the first-choice values (R10/3 steps).
// N01 pairs with 0.25 µin, which is no whole number of 0.1 nm and therefore left out here.

import type { Mark } from "../../basis.js";

/** One roughness grade: the pair of values that tables print side by side. */
export interface GradeRow {
  readonly grade: string;
  readonly um: number;
  readonly uin: number | null;
  readonly firstChoice: boolean;
  readonly mark: Mark;
}

/** All grades, finest first. */
export const ROUGHNESS_GRADES: readonly GradeRow[] = [
  { grade: "N01", um: 0.006, uin: null, firstChoice: false, mark: "two-sources" },
  { grade: "N0", um: 0.012, uin: 0.5, firstChoice: false, mark: "two-sources" },
  { grade: "N1", um: 0.025, uin: 1, firstChoice: true, mark: "two-sources" },
  { grade: "N2", um: 0.05, uin: 2, firstChoice: true, mark: "two-sources" },
  { grade: "N3", um: 0.1, uin: 4, firstChoice: true, mark: "two-sources" },
  { grade: "N4", um: 0.2, uin: 8, firstChoice: true, mark: "two-sources" },
  { grade: "N5", um: 0.4, uin: 16, firstChoice: true, mark: "two-sources" },
  { grade: "N6", um: 0.8, uin: 32, firstChoice: true, mark: "two-sources" },
  { grade: "N7", um: 1.6, uin: 63, firstChoice: true, mark: "two-sources" },
  { grade: "N8", um: 3.2, uin: 125, firstChoice: true, mark: "two-sources" },
  { grade: "N9", um: 6.3, uin: 250, firstChoice: true, mark: "two-sources" },
  { grade: "N10", um: 12.5, uin: 500, firstChoice: true, mark: "two-sources" },
  { grade: "N11", um: 25, uin: 1000, firstChoice: true, mark: "two-sources" },
  { grade: "N12", um: 50, uin: 2000, firstChoice: true, mark: "two-sources" },
  { grade: "N13", um: 100, uin: 4000, firstChoice: false, mark: "two-sources" },
  { grade: "N14", um: 200, uin: 8000, firstChoice: false, mark: "two-sources" },
];
