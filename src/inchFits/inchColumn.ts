/**
 * One row of a fit table in thousandths of an inch: hole upper limit, shaft upper limit, shaft lower limit, and the
 * two limits of fit as printed. The lower limit of the hole is 0 in every row.
 */
export type InchRow = readonly [
  holeUpper: number,
  shaftUpper: number,
  shaftLower: number,
  firstLimitOfFit: number,
  secondLimitOfFit: number,
];

/** One class of a fit table: a row for each size step, `null` where it has none. */
export interface InchColumn {
  /** Which size steps the class goes by. */
  readonly steps: "general" | "force";
  readonly thou: readonly (InchRow | null)[];
  /** How sure each row is, one sign a row; `-` no values in the standard, `?` not found in print. */
  readonly marks: string;
}
