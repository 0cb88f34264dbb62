import type { BasisStep, Caution } from "../basis.js";
import { LimitsError } from "../errors.js";
import { lengthOfTicks, multiply, writeLength } from "../units/index.js";
import type { Length } from "../units/index.js";
import { allPreferredValues, firstChoiceValues, gradeRowOf, lengthIn, secondChoicePairOf } from "./preferredValues.js";
import type { PreferredNeighbour, Roughness, RoughnessParameter, RoughnessUnit } from "./roughnessValue.js";
import { ROUGHNESS_GRADES } from "./tables/roughnessGrades.js";

const MOST_TICKS = 10_000_000;

/** What one reading of a roughness has found. */
export interface ReadRoughness {
  readonly value: Length;
  readonly parameter: RoughnessParameter;
  readonly max: boolean;
  /** The grade number that was written, if it was one. */
  readonly grade: string | null;
}

/** Builds a roughness from what was read: the one place where a {@link Roughness} comes into being. */
export function buildRoughness(read: ReadRoughness): Roughness {
  const unit = unitFor(read.value);
  const value = lengthOfTicks(read.value.ticks, unit);
  checkRange(value);
  const ra = read.parameter === "Ra" ? value : multiply(value, { numerator: 100, denominator: 111 });
  const row = gradeRowOf(ra.ticks, unit);
  const other = unit === "um" ? "uin" : "um";
  const partner = row === null ? null : row[other];
  const pair = partner === null ? null : lengthIn(partner, other);
  const second = secondChoicePairOf(ra.ticks, unit);
  return Object.freeze({
    value,
    unit,
    parameter: read.parameter,
    max: read.max,
    ra,
    converted: lengthOfTicks(ra.ticks, other),
    pair,
    secondChoicePair: second?.value ?? null,
    grade: row?.grade ?? null,
    finer: neighbour(ra, unit, -1),
    coarser: neighbour(ra, unit, 1),
    basis: Object.freeze(basisSteps(read, ra, pair, second?.value ?? null)),
    cautions: Object.freeze(cautionsOf(read, value)),
  });
}

/** Metric lengths are compared in µm, inch lengths in µin. */
export function unitFor(length: Length): RoughnessUnit {
  return length.unit === "mm" || length.unit === "um" ? "um" : "uin";
}

function checkRange(value: Length): void {
  if (value.ticks <= 0 || value.ticks > MOST_TICKS) {
    throw new LimitsError("ROUGHNESS_INVALID", "no surface has this roughness", {
      value: value.toString(),
      allowed: "over 0 up to 1 mm; Ra is written in µm or µin",
    });
  }
}

function neighbour(ra: Length, unit: RoughnessUnit, side: -1 | 1): PreferredNeighbour {
  const nearest = (values: readonly Length[]): Length | null => {
    const beyond = values.filter((one) => (one.ticks - ra.ticks) * side > 0);
    return (side < 0 ? beyond.at(-1) : beyond[0]) ?? null;
  };
  return Object.freeze({
    firstChoice: nearest(firstChoiceValues(unit)),
    anyChoice: nearest(allPreferredValues(unit)),
  });
}

function basisSteps(read: ReadRoughness, ra: Length, pair: Length | null, second: Length | null): BasisStep[] {
  const written = `${read.grade ?? `${read.parameter} ${read.value.toString()}`}${read.max ? " max" : ""}`;
  const steps: BasisStep[] = [{ standard: "the caller", place: "as given", says: written, how: "caller" }];
  if (read.grade !== null) {
    steps.push({
      standard: "roughness grade numbers, in use before ISO 1302:2002",
      place: read.grade,
      says: `${read.grade} means Ra ${ra.toString()}`,
      how: "tabulated",
      mark: markOfGrade(read.grade),
    });
  }
  if (read.parameter === "RMS") {
    steps.push({
      standard: "common practice",
      place: "instruments calibrated in RMS, sine-wave value",
      says: `RMS reads about 1.11 times Ra: Ra about ${about(ra)}`,
      how: "common practice",
      mark: "two-sources",
    });
  }
  if (pair !== null || second !== null) {
    const partner = (pair ?? second)?.toString() ?? "";
    steps.push({
      standard: pair === null ? "ASME B46.1, recommended Ra series" : "preferred Ra values in both units",
      place:
        pair === null ? "second choice" : `first choice or grade, ${gradeRowOf(ra.ticks, unitFor(ra))?.grade ?? ""}`,
      says: `${ra.toString()} stands beside ${partner}; exactly it is ${shown(lengthOfTicks(ra.ticks, unitFor(ra) === "um" ? "uin" : "um"))}`,
      how: "tabulated",
      mark: pair === null ? "memory" : "two-sources",
    });
  }
  return steps.map((step) => Object.freeze(step));
}

function markOfGrade(grade: string): "two-sources" | "memory" {
  return ROUGHNESS_GRADES.some((row) => row.grade === grade && row.mark === "two-sources") ? "two-sources" : "memory";
}

function cautionsOf(read: ReadRoughness, value: Length): Caution[] {
  const cautions: Caution[] = [];
  if (read.parameter === "RMS") {
    const least = about(multiply(value, { numerator: 10, denominator: 13 }));
    const most = about(multiply(value, { numerator: 10, denominator: 11 }));
    cautions.push({
      code: "FINISH_RMS",
      says:
        `an old RMS note: 1.11 is the sine-wave value, real surfaces run from 1.1 to 1.3, so Ra lies between ${least} ` +
        `and ${most}; many shops took the figure for Ra itself: ask`,
    });
  }
  if (read.grade !== null) {
    cautions.push({
      code: "FINISH_OLD_GRADE",
      says: "grade numbers are not in ISO 1302:2002 or later; write the Ra value on a new drawing",
    });
  }
  if (looksLikeOtherUnit(value)) {
    cautions.push({
      code: "FINISH_UNIT_DOUBTFUL",
      says: `${value.toString()}: the figure belongs to the series of the other unit; check the unit`,
    });
  }
  return cautions.map((caution) => Object.freeze(caution));
}

/** 63 µm and 1.6 µin are possible, but the figure is a first-choice one of the other unit and far out in its own. */
function looksLikeOtherUnit(value: Length): boolean {
  const figure = (unit: RoughnessUnit, other: RoughnessUnit): boolean =>
    firstChoiceValues(other).some((one) => lengthIn(one.to(other), unit).ticks === value.ticks) &&
    !firstChoiceValues(unit).some((one) => one.ticks === value.ticks);
  return unitFor(value) === "um" ? value.to("um") >= 16 && figure("um", "uin") : figure("uin", "um");
}

/** A length for reading: exact where it ends, else to four decimals. */
function shown(length: Length): string {
  return writeLength(length, { places: 4, style: "metric" });
}

/** A length that is an estimate anyway: three decimals of µm, one of µin. */
function about(length: Length): string {
  return writeLength(length, { places: length.unit === "um" ? 3 : 1, style: "metric" });
}
