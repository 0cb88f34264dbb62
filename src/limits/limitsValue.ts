import type { Basis, BasisStep } from "../basis.js";
import type { Length, LengthLike } from "../units/index.js";

/** A toleranced size: plain frozen data, the one value that every room yields and every judge takes. */
export interface Limits {
  /** Nominal (basic) size that the deviations count from. */
  readonly nominal: Length;
  /** Upper limit deviation: `max - nominal`. */
  readonly upperDeviation: Length;
  /** Lower limit deviation: `min - nominal`. */
  readonly lowerDeviation: Length;
  /** Upper limit of size. */
  readonly max: Length;
  /** Lower limit of size. */
  readonly min: Length;
  /** `max - min`. */
  readonly tolerance: Length;
  /** Middle of the two limits; an odd sum of ticks goes to the even tick of 0.1 nm (ISO 80000-1 rule A). */
  readonly mean: Length;
  /** Tolerance class or fit class behind the limits, such as `"m6"`; `null` where there is none. */
  readonly designation: string | null;
  /** Where the numbers come from. */
  readonly basis: Basis;
}

/**
 * What every function takes for limits: {@link Limits} as made here, or as they come back from JSON,
 * `structuredClone` or a worker. The nominal and its two deviations count; the other sizes, where they
 * are present, must agree with them.
 */
export interface LimitsLike {
  /** Nominal size. */
  readonly nominal: LengthLike;
  /** Upper limit deviation, signed. */
  readonly upperDeviation: LengthLike;
  /** Lower limit deviation, signed. */
  readonly lowerDeviation: LengthLike;
  /** Upper limit of size; must agree with nominal and deviation. */
  readonly max?: LengthLike;
  /** Lower limit of size; must agree with nominal and deviation. */
  readonly min?: LengthLike;
  /** Must be `max - min`. */
  readonly tolerance?: LengthLike;
  /** Must be the middle of the limits. */
  readonly mean?: LengthLike;
  /** Class behind the limits, if there is one. */
  readonly designation?: string | null;
  /** Where the numbers come from. */
  readonly basis?: readonly BasisStep[];
}

/** A size with one limit only, such as `R .015 MAX`: the other side is for the function to bound. */
export interface SingleLimit {
  /** Which limit is given. */
  readonly kind: "max" | "min";
  /** The limit of size. */
  readonly limit: Length;
  /** Where the number comes from. */
  readonly basis: Basis;
}
