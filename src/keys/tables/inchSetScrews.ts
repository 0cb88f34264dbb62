// ANSI/ASME B17.1-1967, set screws for use over keys: suggested sizes by shaft diameter; memory.
// Diameters only; a number size is not a fraction of an inch. The rows are those of the key sizes, from over 5/16 in on.

/** Up to and including this shaft diameter, screw size. */
export type InchSetScrewRow = readonly [to: string, screw: string];

/** Ends at 6 1/2 in. */
export const INCH_SET_SCREWS: readonly InchSetScrewRow[] = [
  ["7/16", "No. 10"],
  ["9/16", "No. 10"],
  ["7/8", "1/4"],
  ["1 1/4", "5/16"],
  ["1 3/8", "3/8"],
  ["1 3/4", "3/8"],
  ["2 1/4", "1/2"],
  ["2 3/4", "1/2"],
  ["3 1/4", "5/8"],
  ["3 3/4", "3/4"],
  ["4 1/2", "3/4"],
  ["5 1/2", "7/8"],
  ["6 1/2", "1"],
];
