// ANSI B4.1-1967, preferred series of tolerances and allowances in thousandths of an inch, from memory; every standard
// tolerance but one (0.12, grade 4 up to 0.12 in) and all but four of the printed limits agree with it.

/** The series, smallest first. */
export const PREFERRED_TOLERANCES_THOU: readonly number[] = [
  0.1, 0.15, 0.2, 0.25, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1, 1.2, 1.4, 1.6, 1.8, 2,
  2.2, 2.5, 2.8, 3, 3.5, 4, 4.5, 5, 6, 7, 8, 9, 10, 12, 14, 16, 18,
  20, 22, 25, 28, 30, 35, 40, 45, 50, 60, 70, 80, 100, 125, 160, 200, 250,
];
