// ISO 286-1:2010, Tables 2 and 3, columns of delta, in µm: added to the upper limit deviation ES of holes
// K, M, N to IT8 and P to ZC to IT7, over 3 to 500 mm. One value for each main step from 3 to 500 mm.

/** Delta by grade number. */
export const DELTAS_UM: Readonly<Record<3 | 4 | 5 | 6 | 7 | 8, readonly number[]>> = {
  3: [1, 1, 1, 1.5, 1.5, 2, 2, 3, 3, 4, 4, 5],
  4: [1.5, 1.5, 2, 2, 3, 3, 4, 4, 4, 4, 5, 5],
  5: [1, 2, 3, 3, 4, 5, 5, 6, 6, 7, 7, 7],
  6: [3, 3, 3, 4, 5, 6, 7, 7, 9, 9, 11, 13],
  7: [4, 6, 7, 8, 9, 11, 13, 15, 17, 20, 21, 23],
  8: [6, 7, 9, 12, 14, 16, 19, 23, 26, 29, 32, 34],
};
