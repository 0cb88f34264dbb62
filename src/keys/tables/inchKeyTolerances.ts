// ANSI/ASME B17.1-1967, key dimensions and tolerances: deviations of width and height in thousandths of an inch,
// by nominal key width up to and including the first column (inches as printed).
// Square keystock and bar stock have the same tolerance on width and height; rectangular keystock has ±5 on height.

/** To and including this width; upper and lower deviation of width, then of height, in thousandths; mark. */
export type InchKeyToleranceRow = readonly [
  to: string,
  widthUpper: number,
  widthLower: number,
  heightUpper: number,
  heightLower: number,
  mark: string,
];

/** The five tables by stock and shape. */
export const INCH_KEY_TOLERANCES: Readonly<
  Record<
    "squareBarStock" | "rectangularBarStock" | "squareKeystock" | "rectangularKeystock" | "taper",
    readonly InchKeyToleranceRow[]
  >
> = {
  squareBarStock: [
    ["3/4", 0, -2, 0, -2, "2"],
    ["1 1/2", 0, -3, 0, -3, "1"],
    ["2 1/2", 0, -4, 0, -4, "1"],
    ["3 1/2", 0, -6, 0, -6, "1"],
  ],
  rectangularBarStock: [
    ["3/4", 0, -3, 0, -3, "1"],
    ["1 1/2", 0, -4, 0, -4, "1"],
    ["3", 0, -5, 0, -5, "1"],
    ["4", 0, -6, 0, -6, "1"],
    ["6", 0, -8, 0, -8, "1"],
    ["7", 0, -13, 0, -13, "1"],
  ],
  squareKeystock: [
    ["1 1/4", 1, 0, 1, 0, "1"],
    ["3", 2, 0, 2, 0, "1"],
    ["3 1/2", 3, 0, 3, 0, "1"],
  ],
  rectangularKeystock: [
    ["1 1/4", 1, 0, 5, -5, "1"],
    ["3", 2, 0, 5, -5, "1"],
    ["7", 3, 0, 5, -5, "1"],
  ],
  taper: [
    ["1 1/4", 1, 0, 5, 0, "1"],
    ["3", 2, 0, 5, 0, "1"],
    ["7", 3, 0, 5, 0, "1"],
  ],
};
