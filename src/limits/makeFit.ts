import type { Basis, Caution } from "../basis.js";
import { lengthOfTicks } from "../units/index.js";
import type { Fit, FitKind, FitSystem } from "./fitValue.js";
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
export function makeFit(hole: Limits, shaft: Limits, cautions: readonly Caution[] = NO_CAUTIONS): Fit {
  const unit = hole.tolerance.unit;
  const most = hole.max.ticks - shaft.min.ticks;
  const least = hole.min.ticks - shaft.max.ticks;
  const kind: FitKind = least >= 0 ? "clearance" : most <= 0 ? "interference" : "transition";
  const own = kind === "clearance" ? NO_CAUTIONS : PRESS_CAUTIONS;
  return Object.freeze({
    hole,
    shaft,
    nominal: hole.nominal,
    kind,
    system: systemOf(hole, shaft),
    maxClearance: lengthOfTicks(most, unit),
    minClearance: lengthOfTicks(least, unit),
    maxInterference: lengthOfTicks(-least, unit),
    minInterference: lengthOfTicks(-most, unit),
    variation: lengthOfTicks(most - least, unit),
    designation:
      hole.designation === null || shaft.designation === null ? null : `${hole.designation}/${shaft.designation}`,
    basis: FIT_BASIS,
    cautions: cautions.length === 0 ? own : Object.freeze([...own, ...cautions]),
  });
}

function systemOf(hole: Limits, shaft: Limits): FitSystem {
  const holeBasis = hole.lowerDeviation.ticks === 0;
  const shaftBasis = shaft.upperDeviation.ticks === 0;
  if (holeBasis && shaftBasis) return "hole and shaft basis";
  return holeBasis ? "hole basis" : shaftBasis ? "shaft basis" : "neither";
}
