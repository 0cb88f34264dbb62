// DIN 6885-3:1956, thin (low) parallel keys, mm. The sections of ISO 2491 with other depths: t1 + t2 - h = 0.1.
// The tolerances were not read: none are given.

/** Over, to, width, height, t1, t2, marks of height, t1, t2. */
export type MetricThinDinRow = readonly [
  over: string,
  to: string,
  width: string,
  height: string,
  t1: string,
  t2: string,
  marks: string,
];

/** Fourteen sections. */
export const METRIC_THIN_DIN: readonly MetricThinDinRow[] = [
  ["12", "17", "5", "3", "1.9", "1.2", "2m1"],
  ["17", "22", "6", "4", "2.5", "1.6", "1mm"],
  ["22", "30", "8", "5", "3.1", "2.0", "1mm"],
  ["30", "38", "10", "6", "3.7", "2.4", "1mm"],
  ["38", "44", "12", "6", "3.9", "2.2", "1mm"],
  ["44", "50", "14", "6", "4.0", "2.1", "1mm"],
  ["50", "58", "16", "7", "4.7", "2.4", "mmm"],
  ["58", "65", "18", "7", "4.8", "2.3", "mmm"],
  ["65", "75", "20", "8", "5.4", "2.7", "mmm"],
  ["75", "85", "22", "9", "6.0", "3.1", "mmm"],
  ["85", "95", "25", "9", "6.2", "2.9", "mmm"],
  ["95", "110", "28", "10", "6.9", "3.2", "mmm"],
  ["110", "130", "32", "11", "7.6", "3.5", "mmm"],
  ["130", "150", "36", "12", "8.3", "3.8", "mmm"],
];
