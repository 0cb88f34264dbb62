import type { Length, LengthLike, LengthUnit, Rounding } from "../units/index.js";
import type { Limits } from "./limitsValue.js";

/** How the printed limits may have been rounded. */
export interface PrintedRounding {
  /** Unit printed in. */
  readonly unit: LengthUnit;
  /** Decimals printed. */
  readonly places: number;
}

/** How exact limits turn into the printed ones. */
export type LimitsMatch = "exact" | "nearest" | "inside" | "outside";

/** Options of the functions that find the classes behind limits. */
export interface ClassesForOptions {
  /** Nominal size that the class is looked up by; that of the limits unless said otherwise. */
  readonly size?: LengthLike;
  /** The decimals that the limits were printed with; only exact matches count unless it is given. */
  readonly printed?: PrintedRounding;
  /** Look among holes or shafts only. */
  readonly kind?: "hole" | "shaft";
}

/** Exact limits that are the ones given, and how. */
export interface MatchedLimits {
  /** `"exact"`, or the rounding that gives the printed limits. */
  readonly match: LimitsMatch;
  /** The exact limits of the class. */
  readonly limits: Limits;
  /** Given max minus exact max. */
  readonly maxDifference: Length;
  /** Given min minus exact min. */
  readonly minDifference: Length;
  /** Why it matches, in words and figures. */
  readonly why: string;
}

/** The roundings in the order they are tried; `"exact"` goes before them. */
export const ROUNDINGS: readonly { match: LimitsMatch; max: Rounding; min: Rounding }[] = [
  { match: "nearest", max: "nearest", min: "nearest" },
  { match: "inside", max: "down", min: "up" },
  { match: "outside", max: "up", min: "down" },
];
