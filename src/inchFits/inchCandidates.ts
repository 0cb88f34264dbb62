import { attempt } from "../errors.js";
import type { FitCandidate } from "../limits/index.js";
import { fitAtSize } from "./fitAtSize.js";
import type { FitAtSize } from "./fitAtSize.js";
import { CLASS_NAMES, SUFFIXES } from "./inchClass.js";
import type { InchClass } from "./inchClass.js";
import { USUAL_READING } from "./inchFitReadings.js";
import { inchStepIndex } from "./inchStep.js";
import { parseInchClass } from "./parseInchClass.js";
import { stepsOf } from "./tableRow.js";

/** A class that has a row at a size. */
export interface ClassAtSize {
  readonly cls: InchClass;
  readonly at: FitAtSize;
  /** True where no caution is on the row. */
  readonly sure: boolean;
}

/** Every class that has a row at a size, in the order of the standard. */
export function classesAtSize(ticks: number, basis: "hole" | "shaft"): readonly ClassAtSize[] {
  return CLASS_NAMES.flatMap((name) => {
    const cls = parseInchClass(name + (SUFFIXES.get(basis) ?? ""));
    // a size outside the tables is the caller's to hear of; a class without a row there is passed over
    inchStepIndex(stepsOf(cls), ticks);
    const found = attempt(() => fitAtSize(cls, ticks, USUAL_READING));
    return found.ok ? [{ cls, at: found.value, sure: found.value.cautions.length === 0 }] : [];
  });
}

/** The same as candidates for a ranking: rows that carry a caution stand behind all others. */
export function inchCandidates(ticks: number, basis: "hole" | "shaft"): readonly FitCandidate[] {
  return classesAtSize(ticks, basis).map(({ cls, at, sure }) => ({
    designation: cls.text,
    minClearanceTicks: at.hole.lower.ticks - at.shaft.upper.ticks,
    maxClearanceTicks: at.hole.upper.ticks - at.shaft.lower.ticks,
    tier: sure ? 0 : 1,
    system: basis === "hole" ? 0 : 1,
  }));
}
