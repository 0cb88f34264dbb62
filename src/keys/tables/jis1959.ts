// JIS B 1301-1959, parallel keys of older Japanese drawings; one source, mm. t1 + t2 = h. Deviation of t1 in class 1
// 0/+50 micrometres; of t2 not known here. Class 1: key p7, shaft H8, hub F7; class 2: key h8, shaft H9, hub E9.

/** Over (10 itself is in the first row), to, width, height, t1, t2. */
export type Jis1959Row = readonly [over: string, to: string, width: string, height: string, t1: string, t2: string];

/** Eleven sections. */
export const JIS_1959: readonly Jis1959Row[] = [
  ["10", "13", "4", "4", "2.5", "1.5"],
  ["13", "20", "5", "5", "3.0", "2.0"],
  ["20", "30", "7", "7", "4.0", "3.0"],
  ["30", "40", "10", "8", "4.5", "3.5"],
  ["40", "50", "12", "8", "4.5", "3.5"],
  ["50", "60", "15", "10", "5.0", "5.0"],
  ["60", "70", "18", "12", "6.0", "6.0"],
  ["70", "80", "20", "13", "7.0", "6.0"],
  ["80", "95", "24", "16", "8.0", "8.0"],
  ["95", "110", "28", "18", "9.0", "9.0"],
  ["110", "125", "32", "20", "10.0", "10.0"],
];
