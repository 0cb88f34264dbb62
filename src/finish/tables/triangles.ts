// DIN 3141 (withdrawn): Rz and Ra in µm behind the surface triangles, series R1 to R4. One source, a published summary.
// null: no value.

/** One number of triangles over the four series. */
export interface TriangleRow {
  readonly triangles: number;
  readonly rz: readonly (number | null)[];
  readonly ra: readonly (number | null)[];
}

/** One to four triangles. */
export const TRIANGLES: readonly TriangleRow[] = [
  { triangles: 1, rz: [160, 100, 63, 25], ra: [25, 12.5, 6.3, 3.2] },
  { triangles: 2, rz: [40, 25, 16, 10], ra: [6.3, 3.2, 1.6, 1.6] },
  { triangles: 3, rz: [16, 6.3, 4, 2.5], ra: [1.6, 0.8, 0.4, 0.2] },
  { triangles: 4, rz: [null, 1, 1, 0.4], ra: [null, 0.1, 0.1, 0.025] },
];
