// ISO 286-1:2010, Tables 1 to 5, size columns: upper ends of the steps in mm.
// A step takes sizes over the end before it, up to and including its own; the first one starts at 0.

/** Main steps: standard tolerances, and the letters cd to p with j, js and k. */
export const MAIN_STEP_ENDS_MM: readonly number[] = [3, 6, 10, 18, 30, 50, 80, 120, 180, 250, 315, 400, 500, 630, 800, 1000, 1250, 1600, 2000, 2500, 3150];

/** Intermediate steps: the letters a, b, c and r to zc. */
export const INTERMEDIATE_STEP_ENDS_MM: readonly number[] = [
  3, 6, 10, 14, 18, 24, 30, 40, 50, 65, 80, 100, 120, 140, 160, 180, 200, 225, 250, 280, 315, 355, 400, 450, 500, 560, 630, 710, 800, 900, 1000, 1120, 1250, 1400, 1600, 1800, 2000, 2240, 2500, 2800, 3150,
];
