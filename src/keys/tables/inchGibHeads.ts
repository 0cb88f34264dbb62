// ANSI/ASME B17.1-1967, gib-head keys: size of the head by key height, in inches as printed; memory.
// The printed table lists square and rectangular keys apart: A and B of one height are the same in both.

/** Key height H, overall height A and length B of the head. */
export type InchGibHeadRow = readonly [height: string, headHeight: string, headLength: string];

/** One row a height; beyond it A = 1.8 H and B = 1.2 H are suggested. */
export const INCH_GIB_HEADS: readonly InchGibHeadRow[] = [
  ["3/32", "3/16", "1/8"],
  ["1/8", "1/4", "1/4"],
  ["3/16", "5/16", "5/16"],
  ["1/4", "7/16", "3/8"],
  ["5/16", "1/2", "7/16"],
  ["3/8", "5/8", "1/2"],
  ["7/16", "3/4", "9/16"],
  ["1/2", "7/8", "5/8"],
  ["5/8", "1", "3/4"],
  ["3/4", "1 1/4", "7/8"],
  ["7/8", "1 3/8", "1"],
  ["1", "1 5/8", "1 1/8"],
  ["1 1/4", "2", "1 7/16"],
  ["1 1/2", "2 3/8", "1 3/4"],
  ["1 3/4", "2 3/4", "2"],
  ["2", "3 1/2", "2 1/4"],
  ["2 1/2", "4", "3"],
  ["3", "5", "3 1/2"],
  ["3 1/2", "6", "4"],
];
