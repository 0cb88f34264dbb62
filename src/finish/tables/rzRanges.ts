// Rz and Rt that published tables set beside Ra, in µm. There is no fixed ratio: these are estimates only.
// Ranges: a foundry's table to DIN ISO 1302, which itself says that forming ratios is not permitted (one source).
// Values: a cutting-tool maker's table (one source).

/** Ranges beside one Ra. */
export interface RzRow {
  readonly ra: number;
  readonly rz: readonly [least: number, most: number];
  readonly rt: readonly [least: number, most: number];
}

/** The foundry's table, finest first. */
export const RZ_RANGES: readonly RzRow[] = [
  { ra: 0.025, rz: [0.22, 0.3], rt: [0.24, 0.4] },
  { ra: 0.05, rz: [0.45, 0.6], rt: [0.49, 0.9] },
  { ra: 0.1, rz: [0.8, 1.1], rt: [0.85, 1.45] },
  { ra: 0.2, rz: [1, 1.8], rt: [1.1, 2.4] },
  { ra: 0.4, rz: [1.6, 2.8], rt: [1.75, 3.6] },
  { ra: 0.8, rz: [3, 4.8], rt: [3.2, 6] },
  { ra: 1.6, rz: [5.9, 8], rt: [6.3, 10] },
  { ra: 3.2, rz: [12, 16], rt: [13, 19.5] },
  { ra: 6.3, rz: [23, 32], rt: [25, 38] },
  { ra: 12.5, rz: [46, 57], rt: [48, 68] },
  { ra: 25, rz: [90, 110], rt: [95, 130] },
  { ra: 50, rz: [180, 220], rt: [190, 250] },
];

/** The cutting-tool maker's table: one Rz or two beside each Ra. */
export const RZ_VALUES: readonly { readonly ra: number; readonly rz: readonly number[] }[] = [
  { ra: 0.025, rz: [0.25] },
  { ra: 0.05, rz: [0.63] },
  { ra: 0.1, rz: [1] },
  { ra: 0.2, rz: [1.6] },
  { ra: 0.4, rz: [2.5] },
  { ra: 0.8, rz: [4, 6.3] },
  { ra: 1.6, rz: [10] },
  { ra: 3.2, rz: [16, 25] },
  { ra: 6.3, rz: [40] },
  { ra: 12.5, rz: [63] },
  { ra: 25, rz: [100] },
  { ra: 50, rz: [160] },
];
