// ISO 286-1:2010, figures of preferred tolerance classes; first choice: the selection of ISO 1829:1975 taken
// over in 2010. All of it is from memory: the figures were not seen.

/** Preferred classes of holes. */
export const PREFERRED_HOLE_CLASSES: readonly string[] = [
  "G6", "H6", "JS6", "K6", "M6", "N6", "P6", "R6", "S6", "T6", "F7", "G7", "H7", "JS7", "K7", "M7",
  "N7", "P7", "R7", "S7", "T7", "U7", "X7", "E8", "F8", "H8", "JS8", "K8", "M8", "N8", "P8", "R8",
  "D9", "E9", "F9", "H9", "C10", "D10", "E10", "H10", "A11", "B11", "C11", "D11", "H11",
];

/** Preferred classes of shafts. */
export const PREFERRED_SHAFT_CLASSES: readonly string[] = [
  "g5", "h5", "js5", "k5", "m5", "n5", "p5", "r5", "s5", "t5", "f6", "g6", "h6", "js6", "k6", "m6",
  "n6", "p6", "r6", "s6", "t6", "u6", "x6", "e7", "f7", "h7", "js7", "k7", "m7", "n7", "p7", "r7",
  "s7", "t7", "u7", "d8", "e8", "f8", "h8", "d9", "e9", "h9", "d10", "a11", "b11", "c11", "h11",
];

/** The classes to try first. */
export const FIRST_CHOICE_CLASSES: readonly string[] = [
  "A11", "B11", "C11", "D10", "E9", "F8", "G7", "H7", "H8", "H9", "H11", "JS7", "K7", "N7", "P7",
  "R7", "S7", "a11", "b11", "c11", "d9", "e8", "f7", "g6", "h6", "h7", "h9", "h11", "js6", "k6",
  "n6", "p6", "r6", "s6",
];
