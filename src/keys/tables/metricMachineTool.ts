// DIN 6885-2, parallel keys for machine tools (deep shaft keyway, shallow hub keyway), withdrawn in 2008; one source,
// read to 14 x 9, mm, depth deviations 0/+ in micrometres. The hub deviation of 8 x 7 is printed two ways: none is given.

/** Over, to, width, height, t1, t2, upper deviations of t1 and t2. */
export type MetricMachineToolRow = readonly [
  over: string,
  to: string,
  width: string,
  height: string,
  t1: string,
  t2: string,
  t1UpperUm: number,
  t2UpperUm: number | null,
];

/** Seven sections. */
export const METRIC_MACHINE_TOOL: readonly MetricMachineToolRow[] = [
  ["10", "12", "4", "4", "3.0", "1.1", 100, 100],
  ["12", "17", "5", "5", "3.8", "1.3", 100, 100],
  ["17", "22", "6", "6", "4.4", "1.7", 100, 100],
  ["22", "30", "8", "7", "5.4", "1.7", 200, null],
  ["30", "38", "10", "8", "6.0", "2.1", 200, 200],
  ["38", "44", "12", "8", "6.0", "2.1", 200, 200],
  ["44", "50", "14", "9", "6.5", "2.6", 200, 200],
];
