// ISO 370:1975, table for conversion from inches into millimetres: fineness of rounding by the original total
// tolerance, "at least" to "less than". From memory, recalled twice with the same rows; each row keeps the shift of a
// limit within 2 per cent of its smallest tolerance (1.97). Which row owns a tolerance of exactly a power of ten is a
// choice ("at least"): both readings keep that bound.

/** One row: a tolerance of at least this many inches is rounded to this many decimals of a millimetre. */
export interface FinenessRow {
  readonly atLeastInch: string;
  readonly millimetrePlaces: number;
}

/** Rows from the finest tolerance on; the last one ends at 1 in. */
export const INCH_TO_MM_FINENESS: readonly FinenessRow[] = [
  { atLeastInch: "0.00001", millimetrePlaces: 5 },
  { atLeastInch: "0.0001", millimetrePlaces: 4 },
  { atLeastInch: "0.001", millimetrePlaces: 3 },
  { atLeastInch: "0.01", millimetrePlaces: 2 },
  { atLeastInch: "0.1", millimetrePlaces: 1 },
];
