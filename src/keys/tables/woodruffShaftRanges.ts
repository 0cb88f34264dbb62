// Suitable shaft diameters by Woodruff key width, in inches: Shigley's Mechanical Engineering Design, 9th edition,
// Table 7-8; one source. A textbook recommendation, no rule of B17.2.

/** Width, from and to, both included. */
export type WoodruffShaftRangeRow = readonly [width: string, from: string, to: string];

/** Widths to 3/8 in. */
export const WOODRUFF_SHAFT_RANGES: readonly WoodruffShaftRangeRow[] = [
  ["1/16", "5/16", "1/2"],
  ["3/32", "3/8", "7/8"],
  ["1/8", "3/8", "1 1/2"],
  ["5/32", "1/2", "1 5/8"],
  ["3/16", "9/16", "2"],
  ["1/4", "11/16", "2 1/4"],
  ["5/16", "3/4", "2 3/8"],
  ["3/8", "1", "2 5/8"],
];
