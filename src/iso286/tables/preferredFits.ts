// ISO 286-1:2010, figures of preferred fits. Hole basis: one source (a published reproduction of the figure);
// shaft basis: memory. Which of them are framed as first choice was not seen and is left out.

/** Hole-basis fits of the figure. */
export const PREFERRED_HOLE_BASIS_FITS: readonly string[] = [
  "H6/g5", "H6/h5", "H6/js5", "H6/k5", "H6/m5", "H6/n5", "H6/p5", "H7/f6", "H7/g6", "H7/h6",
  "H7/js6", "H7/k6", "H7/m6", "H7/n6", "H7/p6", "H7/r6", "H7/s6", "H7/t6", "H7/u6", "H7/x6",
  "H8/e7", "H8/f7", "H8/h7", "H8/js7", "H8/k7", "H8/m7", "H8/s7", "H8/u7", "H8/d8", "H8/e8",
  "H8/f8", "H8/h8", "H9/d8", "H9/e8", "H9/f8", "H9/h8", "H10/b9", "H10/c9", "H10/d9", "H10/e9",
  "H10/h9", "H11/b11", "H11/c11", "H11/d10", "H11/h10",
];

/** Shaft-basis fits of the figure. */
export const PREFERRED_SHAFT_BASIS_FITS: readonly string[] = [
  "G6/h5", "H6/h5", "JS6/h5", "K6/h5", "M6/h5", "N6/h5", "P6/h5", "F7/h6", "G7/h6", "H7/h6",
  "JS7/h6", "K7/h6", "M7/h6", "N7/h6", "P7/h6", "R7/h6", "S7/h6", "T7/h6", "U7/h6", "X7/h6",
  "E8/h7", "F8/h7", "H8/h7", "D9/h8", "E9/h8", "F9/h8", "H9/h8", "E8/h9", "F8/h9", "H8/h9",
  "D9/h9", "E9/h9", "F9/h9", "H9/h9", "B11/h9", "C10/h9", "D10/h9", "H10/h9",
];
