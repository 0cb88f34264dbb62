import type { Basis, Caution } from "../basis.js";
import type { Length } from "../units/index.js";
import type { Limits } from "./limitsValue.js";

/** The three kinds of fit, in the words of ISO 286-1. */
export type FitKind = "clearance" | "transition" | "interference";

/**
 * Which member has its limit on the nominal size: `"hole basis"` (lower deviation of the hole is zero),
 * `"shaft basis"` (upper deviation of the shaft is zero), both at once, or neither.
 */
export type FitSystem = "hole basis" | "shaft basis" | "hole and shaft basis" | "neither";

/** A hole and a shaft that are to go together: plain frozen data. */
export interface Fit {
  /** Limits of the hole. */
  readonly hole: Limits;
  /** Limits of the shaft. */
  readonly shaft: Limits;
  /** Nominal size, that of the hole. */
  readonly nominal: Length;
  /** Clearance, transition or interference fit. */
  readonly kind: FitKind;
  /** Hole basis, shaft basis, both or neither. */
  readonly system: FitSystem;
  /** `hole.max - shaft.min`; positive is clearance, negative is interference. */
  readonly maxClearance: Length;
  /** `hole.min - shaft.max`; positive is clearance, negative is interference. */
  readonly minClearance: Length;
  /** `shaft.max - hole.min`, the negative of `minClearance`. */
  readonly maxInterference: Length;
  /** `shaft.min - hole.max`, the negative of `maxClearance`. */
  readonly minInterference: Length;
  /** Variation of the fit (tolerance of fit): the sum of both tolerances. */
  readonly variation: Length;
  /** Such as `"H7/m6"`; `null` where hole or shaft has no class. */
  readonly designation: string | null;
  /** The rule behind the clearances; where the limits come from stands in theirs. */
  readonly basis: Basis;
  /** What to weigh before relying on the fit; empty where there is nothing. */
  readonly cautions: readonly Caution[];
}
