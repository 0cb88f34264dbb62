// ANSI/ASME B17.1-1967, Tables 2 (Class 1) and 3 (Class 2): keyseat width, upper deviation in thousandths of an inch
// (the lower one is zero), the same for shaft and hub, by nominal key width up to and including the first column.
// Class 2 widths are memory; S and T deviations and all fit ranges agree with them by identity.

/** To and including this width, upper deviation in thousandths, mark. */
export type InchKeyseatWidthRow = readonly [to: string, upper: number, mark: string];

/** The tables by class and key. */
export const INCH_KEYSEAT_WIDTHS: Readonly<
  Record<
    "class1Square" | "class1Rectangular" | "class2Square" | "class2Rectangular" | "class2Taper",
    readonly InchKeyseatWidthRow[]
  >
> = {
  class1Square: [
    ["1/2", 2, "2"],
    ["3/4", 3, "2"],
    ["1", 3, "2"],
    ["1 1/2", 4, "1"],
    ["2 1/2", 4, "1"],
    ["3 1/2", 4, "1"],
  ],
  class1Rectangular: [
    ["1/2", 2, "1"],
    ["3/4", 3, "1"],
    ["1", 3, "1"],
    ["1 1/2", 4, "1"],
    ["3", 4, "1"],
    ["4", 4, "1"],
    ["6", 4, "1"],
    ["7", 4, "m"],
  ],
  class2Square: [
    ["1 1/4", 2, "m"],
    ["3", 2, "m"],
    ["3 1/2", 2, "m"],
  ],
  class2Rectangular: [
    ["1 1/4", 2, "m"],
    ["3", 2, "m"],
    ["7", 2, "m"],
  ],
  class2Taper: [
    ["1 1/4", 2, "m"],
    ["3", 2, "m"],
    ["7", 2, "m"],
  ],
};

/** Depth control deviations in thousandths: S on the shaft, T in the hub; both only deepen the keyseat. */
export const INCH_DEPTH_DEVIATIONS = { S: { upper: 0, lower: -15 }, T: { upper: 10, lower: 0 } } as const;

/** Constant C of T in thousandths: clearance over a parallel key, interference over a taper key. */
export const INCH_DEPTH_ALLOWANCES = { parallel: 5, taper: -20 } as const;
