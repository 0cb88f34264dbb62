import { markOf } from "../basis.js";
import type { BasisStep, Mark } from "../basis.js";
import { LimitsError } from "../errors.js";
import type { Length } from "../units/index.js";

/** A printed table of general tolerances: ranges down, classes across. */
export interface RangeTable<Class extends string | number> {
  readonly standard: string;
  readonly table: string;
  /** What the ranges are ranges of; empty where it is the size itself. */
  readonly by: string;
  /** Unit of the values. */
  readonly unit: "um" | "arcmin";
  /** Lower end of the first range. */
  readonly overMm: number;
  /** True where the first range takes its lower end too. */
  readonly overIncluded: boolean;
  /** Upper ends, each part of its range; `null` where the last range is open. */
  readonly endsMm: readonly (number | null)[];
  readonly columns: Readonly<Record<Class, RangeColumn>>;
}

/** One class: its value in each range, and how sure each one is. */
export interface RangeColumn {
  readonly values: readonly (number | null)[];
  readonly marks: string;
}

/** One cell of a table. */
export interface RangeCell {
  readonly value: number;
  /** Table and range, such as `"Table 1, over 6 up to 30 mm"`. */
  readonly place: string;
  readonly mark: Mark;
}

const TICKS_PER_MM = 10_000_000;

/**
 * The cell of a class at a size; a size outside the table and a cell without a value are refused.
 * `name` is how the standard speaks of the class: `class m`, `DCTG 8`.
 */
export function cellAt<Class extends string | number>(
  table: RangeTable<Class>,
  cls: Class,
  name: string,
  size: Length,
): RangeCell {
  const column: RangeColumn = table.columns[cls];
  const row = rowAt(table, size.ticks);
  if (row < 0) {
    throw new LimitsError(
      "GENERAL_TOLERANCE_OUT_OF_RANGE",
      `${table.standard}, ${table.table}, ends before this size`,
      {
        value: size.toString(),
        allowed: `${sizeName(table)}${spanText(table, 0, table.endsMm.length - 1)}; else a tolerance at the dimension`,
      },
    );
  }
  const value = column.values[row] ?? null;
  if (value === null) {
    const defined = column.values.flatMap((cell, index) => (cell === null ? [] : [index]));
    throw new LimitsError(
      "GENERAL_TOLERANCE_NOT_DEFINED",
      `${table.standard}, ${table.table}, has no value for ${name} here`,
      {
        value: `${size.toString()}, ${spanText(table, row, row)}`,
        allowed: `${name}: ${sizeName(table)}${spanText(table, defined[0] ?? 0, defined.at(-1) ?? 0)}`,
      },
    );
  }
  return {
    value,
    place: `${table.table}, ${sizeName(table)}${spanText(table, row, row)}`,
    mark: markOf(column.marks[row]),
  };
}

/** The reason for a value that stands in a table. */
export function cellStep(standard: string, cell: RangeCell, says: string): BasisStep {
  return Object.freeze({ standard, place: cell.place, says, how: "tabulated" as const, mark: cell.mark });
}

function rowAt(table: RangeTable<never>, ticks: number): number {
  const lowest = table.overMm * TICKS_PER_MM;
  if (ticks < lowest || (ticks === lowest && !table.overIncluded)) return -1;
  // an end belongs to the range below it: 30 mm is in 6 to 30
  return table.endsMm.findIndex((end) => end === null || ticks <= end * TICKS_PER_MM);
}

function sizeName(table: RangeTable<never>): string {
  return table.by === "" ? "" : `${table.by} `;
}

/** "over 6 up to 30 mm" for the ranges from the first row to the last one. */
function spanText(table: RangeTable<never>, first: number, last: number): string {
  const below = first === 0 ? table.overMm : (table.endsMm[first - 1] ?? 0);
  const end = table.endsMm[last] ?? null;
  const from = first === 0 && table.overIncluded ? `${below}` : `over ${below}`;
  return end === null ? `${from} mm` : `${from} up to ${end} mm`;
}
