// DIN 6888:1956, Woodruff keys b x h x d2 and keyways, mm as printed, depth deviations 0/+ in micrometres. Key width h9,
// height h12, d2 -0.1 for b to 4. Series A: deep hub keyway; series B: machine tools. Columns b 1 to 4 were read; the
// depths for b 5 to 10 are memory held by t1 + t2 - h = 0.2, their deviations and series B were not read: none are given.

/** Width, height, diameter d2, series A t1 and t2, series B t1 and t2, upper deviations of t1 and t2, mark of the depths. */
export type WoodruffDinRow = readonly [
  width: string,
  height: string,
  diameter: string,
  aT1: string,
  aT2: string,
  bT1: string | null,
  bT2: string | null,
  t1UpperUm: number | null,
  t2UpperUm: number | null,
  mark: string,
];

/** Twenty-four keys. */
export const WOODRUFF_DIN: readonly WoodruffDinRow[] = [
  ["1", "1.4", "4", "1.0", "0.6", "1.0", "0.6", 100, 100, "+"],
  ["1.5", "2.6", "7", "2.0", "0.8", "2.0", "0.8", 100, 100, "+"],
  ["2", "2.6", "7", "1.8", "1.0", "1.8", "1.0", 100, 100, "+"],
  ["2", "3.7", "10", "2.9", "1.0", "2.9", "1.0", 100, 100, "+"],
  ["2.5", "3.7", "10", "2.9", "1.0", "2.9", "1.0", 100, 100, "+"],
  ["3", "3.7", "10", "2.5", "1.4", "2.8", "1.1", 100, 100, "+"],
  ["3", "5", "13", "3.8", "1.4", "4.1", "1.1", 100, 100, "+"],
  ["3", "6.5", "16", "5.3", "1.4", "5.6", "1.1", 100, 100, "+"],
  ["4", "5", "13", "3.5", "1.7", "4.1", "1.1", 100, 100, "+"],
  ["4", "6.5", "16", "5.0", "1.7", "5.6", "1.1", 100, 100, "+"],
  ["4", "7.5", "19", "6.0", "1.7", "6.6", "1.1", 100, 100, "+"],
  ["5", "6.5", "16", "4.5", "2.2", null, null, null, null, "m"],
  ["5", "7.5", "19", "5.5", "2.2", null, null, null, null, "m"],
  ["5", "9", "22", "7.0", "2.2", null, null, null, null, "m"],
  ["6", "7.5", "19", "5.1", "2.6", null, null, null, null, "m"],
  ["6", "9", "22", "6.6", "2.6", null, null, null, null, "m"],
  ["6", "10", "25", "7.6", "2.6", null, null, null, null, "m"],
  ["6", "11", "28", "8.6", "2.6", null, null, null, null, "m"],
  ["8", "9", "22", "6.2", "3.0", null, null, null, null, "m"],
  ["8", "11", "28", "8.2", "3.0", null, null, null, null, "m"],
  ["8", "13", "32", "10.2", "3.0", null, null, null, null, "m"],
  ["10", "11", "28", "7.8", "3.4", null, null, null, null, "m"],
  ["10", "13", "32", "9.8", "3.4", null, null, null, null, "m"],
  ["10", "16", "45", "12.8", "3.4", null, null, null, null, "m"],
];

/** Width, shaft over, shaft to; b 1 to 4 one source, above memory. */
export type WoodruffDinShaftRow = readonly [width: string, over: string, to: string];

/** Allocation I: the key carries the whole torque. */
export const WOODRUFF_DIN_TORQUE: readonly WoodruffDinShaftRow[] = [
  ["1", "3", "4"],
  ["1.5", "4", "6"],
  ["2", "6", "8"],
  ["3", "8", "10"],
  ["4", "10", "12"],
  ["5", "12", "17"],
  ["6", "17", "22"],
  ["8", "22", "30"],
  ["10", "30", "38"],
];

/** Allocation II: the key only locates. */
export const WOODRUFF_DIN_LOCATING: readonly WoodruffDinShaftRow[] = [
  ["1", "6", "8"],
  ["1.5", "8", "10"],
  ["2", "10", "12"],
  ["3", "12", "17"],
  ["4", "17", "22"],
  ["5", "22", "30"],
  ["6", "30", "38"],
];
