// Ra in µm of ground rolling-bearing seats by diameter in mm and grade of the diameter tolerance. Two bearing makers'
// published tables: one prints the column heads as IT1, IT2, IT3, a slip for IT7, IT6, IT5 (N7, N6, N5 stand beside the
// values); the second confirms IT6. Row over 500 mm: memory.

import type { Mark } from "../../basis.js";

/** One range of diameters. */
export interface SeatRow {
  readonly over: number;
  readonly to: number;
  readonly IT7: number;
  readonly IT6: number;
  readonly IT5: number;
  readonly mark: Mark;
  readonly markIT6: Mark;
}

/** The table, smallest diameters first. */
export const BEARING_SEATS: readonly SeatRow[] = [
  { over: 3, to: 80, IT7: 1.6, IT6: 0.8, IT5: 0.4, mark: "one-source", markIT6: "two-sources" },
  { over: 80, to: 500, IT7: 1.6, IT6: 1.6, IT5: 0.8, mark: "one-source", markIT6: "two-sources" },
  { over: 500, to: 1250, IT7: 3.2, IT6: 1.6, IT5: 1.6, mark: "memory", markIT6: "memory" },
];
