import type { Fit } from "../limits/index.js";
import type { Length } from "../units/index.js";
import type { InchClass } from "./inchClass.js";
import type { InchFitReading } from "./inchFitReadings.js";

/** Hole and shaft symbols by the American-British-Canadian (ABC) agreements: labels, never a formula. */
export interface InchSymbols {
  /** Such as `"H7"`; `null` where the hole is not the one of the table (suffixes S and B). */
  readonly hole: string | null;
  /** Such as `"p6"`; `null` where the standard gives none (RC9, LC10, LC11, FN1) or the fit has a suffix. */
  readonly shaft: string | null;
}

/** The limits of fit that the table of the class prints; none is negative, and `null` stands for what it prints not. */
export interface PrintedLimitsOfFit {
  /** Least clearance, of clearance fits. */
  readonly minClearance: Length | null;
  /** Greatest clearance, of clearance and transition fits. */
  readonly maxClearance: Length | null;
  /** Least interference, of interference fits. */
  readonly minInterference: Length | null;
  /** Greatest interference, of transition and interference fits. */
  readonly maxInterference: Length | null;
}

/** An inch fit: a {@link Fit} with what the standard says of its class. */
export interface InchFit extends Fit {
  /** The class as a drawing writes it: `"LN2"`, `"RC5S"`. */
  readonly designation: string;
  /** The class, taken apart. */
  readonly fitClass: InchClass;
  /** ABC symbols of hole and shaft. */
  readonly symbols: InchSymbols;
  /** Limits of fit as printed, in thou; they agree with the clearances of the fit. */
  readonly printedLimits: PrintedLimitsOfFit;
  /** What the class is for, in our words. */
  readonly purpose: string;
  /** Which published table was followed where they differ; `null` where there is one reading only. */
  readonly reading: InchFitReading | null;
}
