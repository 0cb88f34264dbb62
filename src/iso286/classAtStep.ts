import type { BasisStep } from "../basis.js";
import { deviationSet } from "../limits/index.js";
import type { DeviationSet } from "../limits/index.js";
import { lengthOfTicks } from "../units/index.js";
import { fundamental } from "./fundamental.js";
import type { Fundamental } from "./fundamental.js";
import { gradeStep, gradeValue } from "./gradeValue.js";
import { DEFAULT_ISO_OPTIONS } from "./isoOptions.js";
import type { ChosenIsoOptions } from "./isoOptions.js";
import type { ParsedClass } from "./parsedClass.js";
import { spanStep } from "./printedSpan.js";
import { stepAt } from "./sizeStep.js";
import { gradeNumber } from "./toleranceClass.js";
import type { ToleranceClass } from "./toleranceClass.js";

/** Limit deviations of a class, in µm. */
export interface DeviationsUm {
  /** es or ES, in µm. */
  readonly upperDeviationUm: number;
  /** ei or EI, in µm. */
  readonly lowerDeviationUm: number;
}

/** A class worked out for one size step. */
export interface ClassAtStep {
  readonly um: DeviationsUm;
  readonly set: DeviationSet;
}

const TICKS_PER_UM = 10_000;

/** Works a class out for a step; the class remembers the answer, which depends on nothing else. */
export function classAtStep(cls: ParsedClass, stepIndex: number, options: ChosenIsoOptions): ClassAtStep {
  if (options !== DEFAULT_ISO_OPTIONS) return workOut(cls, stepIndex, options);
  return cls.atStep(stepIndex) ?? cls.keep(stepIndex, workOut(cls, stepIndex, options));
}

function workOut(cls: ToleranceClass, stepIndex: number, options: ChosenIsoOptions): ClassAtStep {
  const step = stepAt(stepIndex);
  const tabulatedUm = gradeValue(cls.grade, step);
  const rounded = options.jsRounding === "even" ? evenGrade(cls, tabulatedUm) : null;
  const gradeUm = rounded ?? tabulatedUm;
  const deviation = fundamental(cls, step, gradeUm, options.edition);
  const gradeTicks = ticksOf(gradeUm);
  const ticks = ticksOf(deviation.um);
  const upperTicks = deviation.limit === "lower" ? ticks + gradeTicks : ticks;
  const lowerTicks = deviation.limit === "lower" ? ticks : ticks - gradeTicks;

  const basis: BasisStep[] = [spanStep(cls, step), gradeStep(cls.grade, step)];
  if (rounded !== null) basis.push(evenGradeStep(cls, rounded));
  basis.push(...deviation.basis, otherLimitStep(cls, deviation, upperTicks, lowerTicks));
  return {
    um: Object.freeze({
      upperDeviationUm: upperTicks / TICKS_PER_UM,
      lowerDeviationUm: lowerTicks / TICKS_PER_UM,
    }),
    set: deviationSet(lengthOfTicks(upperTicks, "um"), lengthOfTicks(lowerTicks, "um"), Object.freeze(basis), cls.text),
  };
}

/** ISO 286-1:1988, note to js: an odd IT7 to IT11 may drop to the even number below; `null` where it does not. */
function evenGrade(cls: ToleranceClass, gradeUm: number): number | null {
  const grade = gradeNumber(cls.grade);
  const applies = cls.letter.toLowerCase() === "js" && grade >= 7 && grade <= 11 && gradeUm % 2 === 1;
  return applies ? gradeUm - 1 : null;
}

function evenGradeStep(cls: ToleranceClass, evenUm: number): BasisStep {
  return Object.freeze({
    standard: "ISO 286-1:1988",
    place: "note to js and JS",
    says: `${cls.grade} of ${cls.text} dropped to the even number below, ${evenUm} µm, at the caller's wish`,
    how: "derived" as const,
    mark: "one-source" as const,
  });
}

function otherLimitStep(
  cls: ToleranceClass,
  deviation: Fundamental,
  upperTicks: number,
  lowerTicks: number,
): BasisStep {
  const shaft = cls.kind === "shaft";
  const [upperName, lowerName] = shaft ? ["es", "ei"] : ["ES", "EI"];
  const upper = `${upperTicks / TICKS_PER_UM} µm`;
  const lower = `${lowerTicks / TICKS_PER_UM} µm`;
  const says =
    deviation.limit === "both"
      ? `${upperName} = ${upper}, ${lowerName} = ${lower}`
      : deviation.limit === "upper"
        ? `${lowerName} = ${upperName} - ${cls.grade} = ${lower}`
        : `${upperName} = ${lowerName} + ${cls.grade} = ${upper}`;
  return Object.freeze({
    standard: "ISO 286-1:2010",
    place: "4.3 (limit deviations)",
    says,
    how: "derived" as const,
  });
}

function ticksOf(um: number): number {
  return Math.round(um * TICKS_PER_UM);
}
