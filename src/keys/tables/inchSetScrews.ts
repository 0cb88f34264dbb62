// ANSI/ASME B17.1-1967, set screws for use over keys: suggested sizes by shaft diameter; memory.
// Diameters only; a number size is not a fraction of an inch.

/** Over and up to and including this shaft diameter, key width, screw size. */
export type InchSetScrewRow = readonly [over: string, to: string, width: string, screw: string];

/** Ends at 6 1/2 in. */
export const INCH_SET_SCREWS: readonly InchSetScrewRow[] = [
  ["5/16", "7/16", "3/32", "No. 10"],
  ["7/16", "9/16", "1/8", "No. 10"],
  ["9/16", "7/8", "3/16", "1/4"],
  ["7/8", "1 1/4", "1/4", "5/16"],
  ["1 1/4", "1 3/8", "5/16", "3/8"],
  ["1 3/8", "1 3/4", "3/8", "3/8"],
  ["1 3/4", "2 1/4", "1/2", "1/2"],
  ["2 1/4", "2 3/4", "5/8", "1/2"],
  ["2 3/4", "3 1/4", "3/4", "5/8"],
  ["3 1/4", "3 3/4", "7/8", "3/4"],
  ["3 3/4", "4 1/2", "1", "3/4"],
  ["4 1/2", "5 1/2", "1 1/4", "7/8"],
  ["5 1/2", "6 1/2", "1 1/2", "1"],
];
