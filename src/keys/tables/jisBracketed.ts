// JIS B 1301:1996, bracketed parallel keys: not in ISO, not for new design, mm as printed, depth deviations 0/+ in
// micrometres. Their shaft ranges overlap those of the other sizes. 7 x 7 is square: height h9, the others h11.

/** Over, to, width, height, t1, t2, upper deviation of both depths, marks of t1 and t2. */
export type JisBracketedRow = readonly [
  over: string,
  to: string,
  width: string,
  height: string,
  t1: string,
  t2: string,
  upperUm: number,
  marks: string,
];

/** Six sections. */
export const JIS_BRACKETED: readonly JisBracketedRow[] = [
  ["20", "25", "7", "7", "4.0", "3.3", 200, "22"],
  ["50", "55", "15", "10", "5.0", "5.3", 200, "21"],
  ["80", "90", "24", "16", "8.0", "8.4", 200, "21"],
  ["125", "140", "35", "22", "11.0", "11.4", 300, "2m"],
  ["140", "160", "38", "24", "12.0", "12.4", 300, "2m"],
  ["160", "180", "42", "26", "13.0", "13.4", 300, "2m"],
];
