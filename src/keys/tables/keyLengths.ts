// Lengths of metric keys, mm: the series of ISO/R 773, JIS B 1301 and DIN 6885-1 (two sources), its extension in ISO/R 773
// (one source), and the length tolerances of DIN 6885-1 in micrometres. From 90 mm the DIN tolerance is doubtful: memory has
// 0.5, one textbook prints 0.4.

/** The series. */
export const KEY_LENGTHS: readonly string[] = [
  "6", "8", "10", "12", "14", "16", "18", "20", "22", "25", "28", "32", "36", "40", "45", "50", "56", "63", "70", "80", "90", "100", "110", "125", "140", "160", "180", "200", "220", "250", "280", "320", "360", "400",
];

/** The series goes on so for ordinary parallel keys. */
export const KEY_LENGTHS_EXTENDED: readonly string[] = ["450", "500"];

/** Up to this length; key minus, round-ended keyway plus, in micrometres; mark. */
export type DinLengthToleranceRow = readonly [to: string, um: number, mark: string];

/** DIN 6885-1. */
export const DIN_LENGTH_TOLERANCES: readonly DinLengthToleranceRow[] = [
  ["28", 200, "1"],
  ["80", 300, "1"],
  ["400", 500, "c"],
];
