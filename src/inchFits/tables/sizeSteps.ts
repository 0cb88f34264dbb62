// ANSI B4.1-1967, size columns of the fit tables and of the table of standard tolerances: upper ends in inches.
// A step takes sizes over the end before it, up to and including its own; the first one starts at 0.
// Two ends of the force fits, 13.98 and 17.72, were not read in print; like all others they are metric ends
// (355 and 450 mm) in inches, rounded up to two places.

/** Steps of the RC, LC, LT and LN classes. */
export const GENERAL_STEP_ENDS_IN: readonly number[] = [0.12, 0.24, 0.4, 0.71, 1.19, 1.97, 3.15, 4.73, 7.09, 9.85, 12.41, 15.75, 19.69];

/** Steps of the FN classes. */
export const FORCE_STEP_ENDS_IN: readonly number[] = [
  0.12, 0.24, 0.4, 0.56, 0.71, 0.95, 1.19, 1.58, 1.97, 2.56, 3.15, 3.94, 4.73, 5.52, 6.3, 7.09, 7.88, 8.86, 9.85, 11.03, 12.41, 13.98, 15.75, 17.72, 19.69,
];

/** Steps of the standard tolerances; those over 19.69 in lie outside the ABC agreements. */
export const TOLERANCE_STEP_ENDS_IN: readonly number[] = [
  0.12, 0.24, 0.4, 0.71, 1.19, 1.97, 3.15, 4.73, 7.09, 9.85, 12.41, 15.75, 19.69, 30.09, 41.49, 56.19, 76.39, 100.9, 131.9, 171.9, 200,
];
