// ISO 13715:2017: sizes of edges that the standard recommends, in µm (read in two textbooks). The series is a
// recommendation and open at both ends. Plus: material may stand proud; minus: material must be missing.

/** Sizes for edges with burr or passing. */
export const BURR_OR_PASSING_UM: readonly number[] = [2500, 1000, 500, 300, 100];

/** Sizes for sharp edges. */
export const SHARP_UM: readonly number[] = [50, 20, -20, -50];

/** Sizes for edges with undercut. */
export const UNDERCUT_UM: readonly number[] = [-100, -300, -500, -1000, -2500];
