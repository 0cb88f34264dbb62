import type { FitClasses, PreferredFit } from "../iso286/index.js";
import type { InchBasis, InchClass, InchFitReading } from "../inchFits/index.js";
import type { Fit } from "../limits/index.js";
import type { Length } from "../units/index.js";

/** What `compareFits` takes for a fit: a class of inch fits such as `"LN2"`, or an ISO fit such as `"H7/p6"`. */
export type JointFit = string | InchClass | FitClasses;

/** Options of `compareFits`. */
export interface CompareOptions {
  /** How many fits of the other system to set beside it; 3 unless said otherwise. */
  readonly most?: number;
  /**
   * Which ISO fits to look among, for an inch class: `"preferred"` (by ANSI B4.2 or ISO 286-1), `"printed"` (also of
   * classes that ISO 286-2 prints) or `"all"`. `"preferred"` unless said otherwise.
   */
  readonly among?: "preferred" | "printed" | "all";
  /** Basis of an inch class; what the class says unless said otherwise. */
  readonly basis?: InchBasis;
  /** Which published table of inch fits to follow where they differ; `"handbook"` unless said otherwise. */
  readonly reading?: InchFitReading;
}

/** Other minus given, for each limit of size and both ends of the clearance; negative is smaller. */
export interface FitDifferences {
  /** Difference of the least clearances. */
  readonly minClearance: Length;
  /** Difference of the greatest clearances. */
  readonly maxClearance: Length;
  /** Difference of the upper limits of the hole. */
  readonly holeMax: Length;
  /** Difference of the lower limits of the hole. */
  readonly holeMin: Length;
  /** Difference of the upper limits of the shaft. */
  readonly shaftMax: Length;
  /** Difference of the lower limits of the shaft. */
  readonly shaftMin: Length;
}

/** A fit of the other system beside the given one. */
export interface NearFit {
  /** The fit of the other system, on the same nominal size. */
  readonly fit: Fit;
  /** The standard that prefers it; `null` where none does. */
  readonly preferred: PreferredFit | null;
  /** How much each limit differs, in µm. */
  readonly differences: FitDifferences;
  /** True only where all four limits of size are the same to the tick of 0.1 nm. */
  readonly equal: boolean;
}

/** One joint in both systems, side by side. */
export interface FitComparison {
  /** The system of the given fit. */
  readonly system: "inch" | "ISO";
  /** The given fit, worked out. */
  readonly given: Fit;
  /** Fits of the other system, nearest by clearance range first. */
  readonly nearest: readonly NearFit[];
}
