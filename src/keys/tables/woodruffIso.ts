// ISO 3912:1977 (BS 4235-2:1977, JIS B 1301): metric Woodruff keys b x h x D and keyways, mm as printed, depth deviations
// 0/+ in micrometres. Key width h9, height h11, diameter h12; keyway N9 shaft and JS9 hub (normal) or P9 in both (close).
// Sections two sources; depths one source; shaft ranges memory: series 1 carries the torque, series 2 only locates.

/** One key: marks of the flat-bottom height and of the chamfer. A shaft range starts where that of the row above ends. */
export type WoodruffIsoRow = readonly [
  width: string,
  height: string,
  diameter: string,
  flatBottomHeight: string,
  chamferMin: string,
  chamferMax: string,
  t1: string,
  t2: string,
  t1UpperUm: number,
  t2UpperUm: number,
  radiusMin: string,
  radiusMax: string,
  torqueShaftTo: string,
  locatingShaftTo: string | null,
  marks: string,
];

/** Sixteen keys; the first shaft range starts at 3 mm, included. */
export const WOODRUFF_ISO: readonly WoodruffIsoRow[] = [
  ["1", "1.4", "4", "1.1", "0.16", "0.25", "1.0", "0.6", 100, 100, "0.08", "0.16", "4", "4", "22"],
  ["1.5", "2.6", "7", "2.1", "0.16", "0.25", "2.0", "0.8", 100, 100, "0.08", "0.16", "5", "6", "22"],
  ["2", "2.6", "7", "2.1", "0.16", "0.25", "1.8", "1.0", 100, 100, "0.08", "0.16", "6", "8", "22"],
  ["2", "3.7", "10", "3.0", "0.16", "0.25", "2.9", "1.0", 100, 100, "0.08", "0.16", "7", "10", "22"],
  ["2.5", "3.7", "10", "3.0", "0.16", "0.25", "2.7", "1.2", 100, 100, "0.08", "0.16", "8", "12", "22"],
  ["3", "5", "13", "4.0", "0.16", "0.25", "3.8", "1.4", 200, 100, "0.08", "0.16", "10", "15", "22"],
  ["3", "6.5", "16", "5.2", "0.16", "0.25", "5.3", "1.4", 200, 100, "0.08", "0.16", "12", "18", "22"],
  ["4", "6.5", "16", "5.2", "0.25", "0.40", "5.0", "1.8", 200, 100, "0.16", "0.25", "14", "20", "22"],
  ["4", "7.5", "19", "6.0", "0.25", "0.40", "6.0", "1.8", 200, 100, "0.16", "0.25", "16", "22", "22"],
  ["5", "6.5", "16", "5.2", "0.25", "0.40", "4.5", "2.3", 200, 100, "0.16", "0.25", "18", "25", "22"],
  ["5", "7.5", "19", "6.0", "0.25", "0.40", "5.5", "2.3", 200, 100, "0.16", "0.25", "20", "28", "22"],
  ["5", "9", "22", "7.2", "0.25", "0.40", "7.0", "2.3", 300, 100, "0.16", "0.25", "22", "32", "22"],
  ["6", "9", "22", "7.2", "0.25", "0.40", "6.5", "2.8", 300, 100, "0.16", "0.25", "25", "36", "22"],
  ["6", "10", "25", "8.0", "0.25", "0.40", "7.5", "2.8", 300, 200, "0.16", "0.25", "28", "40", "22"],
  ["8", "11", "28", "8.8", "0.40", "0.60", "8.0", "3.3", 300, 200, "0.25", "0.40", "32", null, "11"],
  ["10", "13", "32", "10.4", "0.40", "0.60", "10.0", "3.3", 300, 200, "0.25", "0.40", "38", null, "11"],
];
