// ANSI/ASME B17.1-1967, Table 1: key size versus nominal shaft diameter, in inches as printed.
// Ranges are over the first, up to and including the second diameter. Square keys are preferred to 6 1/2 in,
// rectangular ones above. Handbook reprints end at 11 in; width and heights of the rows above 13 in are memory.

/** Over, to and including, width, square height, rectangular height, preferred shape, marks of the three sizes. */
export type InchKeySizeRow = readonly [
  over: string,
  to: string,
  width: string,
  square: string | null,
  rectangular: string | null,
  preferred: "square" | "rectangular",
  marks: string,
];

/** Marks: `2` two sources, `1` one source, `m` memory. */
export const INCH_KEY_SIZES: readonly InchKeySizeRow[] = [
  ["5/16", "7/16", "3/32", "3/32", null, "square", "222"],
  ["7/16", "9/16", "1/8", "1/8", "3/32", "square", "222"],
  ["9/16", "7/8", "3/16", "3/16", "1/8", "square", "222"],
  ["7/8", "1 1/4", "1/4", "1/4", "3/16", "square", "222"],
  ["1 1/4", "1 3/8", "5/16", "5/16", "1/4", "square", "222"],
  ["1 3/8", "1 3/4", "3/8", "3/8", "1/4", "square", "222"],
  ["1 3/4", "2 1/4", "1/2", "1/2", "3/8", "square", "222"],
  ["2 1/4", "2 3/4", "5/8", "5/8", "7/16", "square", "222"],
  ["2 3/4", "3 1/4", "3/4", "3/4", "1/2", "square", "222"],
  ["3 1/4", "3 3/4", "7/8", "7/8", "5/8", "square", "221"],
  ["3 3/4", "4 1/2", "1", "1", "3/4", "square", "221"],
  ["4 1/2", "5 1/2", "1 1/4", "1 1/4", "7/8", "square", "221"],
  ["5 1/2", "6 1/2", "1 1/2", "1 1/2", "1", "square", "221"],
  ["6 1/2", "7 1/2", "1 3/4", "1 3/4", "1 1/2", "rectangular", "212"],
  ["7 1/2", "9", "2", "2", "1 1/2", "rectangular", "212"],
  ["9", "11", "2 1/2", "2 1/2", "1 3/4", "rectangular", "212"],
  ["11", "13", "3", "3", "2", "rectangular", "1m1"],
  ["13", "15", "3 1/2", "3 1/2", "2 1/2", "rectangular", "mmm"],
  ["15", "18", "4", null, "3", "rectangular", "mmm"],
  ["18", "22", "5", null, "3 1/2", "rectangular", "mmm"],
  ["22", "26", "6", null, "4", "rectangular", "mmm"],
  ["26", "30", "7", null, "5", "rectangular", "mmm"],
];
