import { lengthOfTicks } from "../units/index.js";
import type { FitKind, FitSystem, Fit } from "./fitValue.js";
import type { DeviationSet } from "./deviationSet.js";

/** What follows from two sets of deviations on one nominal, whatever the nominal is. */
export type FitClearances = Pick<
  Fit,
  "kind" | "system" | "maxClearance" | "minClearance" | "maxInterference" | "minInterference" | "variation"
>;

/**
 * Extreme clearances, kind and system of two sets of deviations on one nominal size.
 *
 * @param hole - deviations of the hole, any unit
 * @param shaft - deviations of the shaft, any unit
 * @returns the frozen clearances in the unit of the hole's tolerance, signed (negative is interference)
 * @throws `LENGTH_OUT_OF_RANGE`
 * @example
 * ```ts
 * import { deviationSet, fitClearances, um } from "limitsmith";
 *
 * const hole = deviationSet(um(25), um(0), [], "H7");
 * const shaft = deviationSet(um(25), um(9), [], "m6");
 * fitClearances(hole, shaft).maxClearance.toString(); // → "16 µm"
 * ```
 * @reference ISO 286-1:2010, 3.3: max clearance = hole max − shaft min, min clearance = hole min − shaft max
 */
export function fitClearances(hole: DeviationSet, shaft: DeviationSet): FitClearances {
  const { unit } = hole.tolerance;
  const most = hole.upper.ticks - shaft.lower.ticks;
  const least = hole.lower.ticks - shaft.upper.ticks;
  const kind: FitKind = least >= 0 ? "clearance" : most <= 0 ? "interference" : "transition";
  return Object.freeze({
    kind,
    system: systemOf(hole, shaft),
    maxClearance: lengthOfTicks(most, unit),
    minClearance: lengthOfTicks(least, unit),
    maxInterference: lengthOfTicks(-least, unit),
    minInterference: lengthOfTicks(-most, unit),
    variation: lengthOfTicks(most - least, unit),
  });
}

function systemOf(hole: DeviationSet, shaft: DeviationSet): FitSystem {
  const holeBasis = hole.lower.ticks === 0;
  const shaftBasis = shaft.upper.ticks === 0;
  if (holeBasis && shaftBasis) return "hole and shaft basis";
  return holeBasis ? "hole basis" : shaftBasis ? "shaft basis" : "neither";
}
