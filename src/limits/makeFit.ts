import type { Basis, Caution } from "../basis.js";
import { lengthOfTicks } from "../units/index.js";
import type { DeviationSet } from "./deviationSet.js";
import { fitClearances } from "./fitClearances.js";
import type { FitClearances } from "./fitClearances.js";
import type { Fit } from "./fitValue.js";
import type { Limits } from "./limitsValue.js";

const NO_CAUTIONS: readonly Caution[] = Object.freeze([]);

const PRESS_CAUTIONS: readonly Caution[] = Object.freeze([
  Object.freeze({
    code: "FIT_MAY_PRESS",
    says:
      "Parts can interfere: pressing or shrinking stresses both of them, and a joint that carries load may need " +
      "stress, slip and temperature checks by a qualified engineer under the codes that apply.",
  }),
]);

const FIT_BASIS: Basis = Object.freeze([
  Object.freeze({
    standard: "ISO 286-1:2010",
    place: "3.3 (terms of fits)",
    says: "max clearance = hole max - shaft min; min clearance = hole min - shaft max",
    how: "derived" as const,
  }),
]);

/**
 * Builds the fit of two limits that are already limits; extreme clearances as ISO 286-1 defines them.
 *
 * @param hole - limits of the hole, any unit
 * @param shaft - limits of the shaft, any unit
 * @param cautions - what to add to the cautions of the fit itself
 * @param clearances - what {@link fitClearances} gives for the two, where it is at hand
 * @returns the frozen fit; clearances in the unit of the hole's tolerance, signed
 * @throws `LENGTH_OUT_OF_RANGE`
 * @example
 * ```ts
 * import { limits, makeFit } from "limitsmith";
 *
 * const hole = limits({ nominal: "40 mm", upper: "25 µm", lower: "0 µm" });
 * const shaft = limits({ nominal: "40 mm", upper: "25 µm", lower: "9 µm" });
 * makeFit(hole, shaft).maxClearance.toString(); // → "16 µm"
 * ```
 * @reference ISO 286-1:2010, 3.3 (clearance, interference and transition fit, extreme clearances)
 */
export function makeFit(
  hole: Limits,
  shaft: Limits,
  cautions: readonly Caution[] = NO_CAUTIONS,
  clearances: FitClearances = fitClearances(deviationsOf(hole, hole), deviationsOf(shaft, hole)),
): Fit {
  const { kind } = clearances;
  const own = kind === "clearance" ? NO_CAUTIONS : PRESS_CAUTIONS;
  // written out: spreading one object into another costs more than all the rest
  return Object.freeze({
    hole,
    shaft,
    nominal: hole.nominal,
    kind,
    system: clearances.system,
    maxClearance: clearances.maxClearance,
    minClearance: clearances.minClearance,
    maxInterference: clearances.maxInterference,
    minInterference: clearances.minInterference,
    variation: clearances.variation,
    designation:
      hole.designation === null || shaft.designation === null ? null : `${hole.designation}/${shaft.designation}`,
    basis: FIT_BASIS,
    cautions: cautions.length === 0 ? own : Object.freeze([...own, ...cautions]),
  });
}

/** Deviations of limits counted from the nominal of the hole: two limit dimensions need not share theirs. */
function deviationsOf(limits: Limits, hole: Limits): DeviationSet {
  const { upperDeviation, lowerDeviation, nominal, tolerance, designation, basis } = limits;
  const offset = nominal.ticks - hole.nominal.ticks;
  if (offset === 0) return { upper: upperDeviation, lower: lowerDeviation, tolerance, designation, basis };
  return {
    upper: lengthOfTicks(upperDeviation.ticks + offset, upperDeviation.unit),
    lower: lengthOfTicks(lowerDeviation.ticks + offset, lowerDeviation.unit),
    tolerance,
    designation,
    basis,
  };
}
