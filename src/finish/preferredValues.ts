import type { Mark } from "../basis.js";
import { lengthOfTicks } from "../units/index.js";
import type { Length } from "../units/index.js";
import type { RoughnessUnit } from "./roughnessValue.js";
import { ASME_SECOND_CHOICE, R10_SERIES_UM } from "./tables/preferredRoughness.js";
import { ROUGHNESS_GRADES } from "./tables/roughnessGrades.js";
import type { GradeRow } from "./tables/roughnessGrades.js";

const TICKS = { um: 10_000, uin: 254 } as const;

/** A table's number of µm as a length; rounding removes what a double adds to 0.3. */
export function umLength(value: number): Length {
  return lengthOfTicks(Math.round(value * TICKS.um), "um");
}

/** A table's number of µin as a length. */
export function uinLength(value: number): Length {
  return lengthOfTicks(Math.round(value * TICKS.uin), "uin");
}

/** A table's number of a unit as a length. */
export function lengthIn(value: number, unit: RoughnessUnit): Length {
  return unit === "um" ? umLength(value) : uinLength(value);
}

/** The grade whose value, in the unit given, is exactly this one. */
export function gradeRowOf(ticks: number, unit: RoughnessUnit): GradeRow | null {
  return ROUGHNESS_GRADES.find((row) => row[unit] !== null && lengthIn(row[unit], unit).ticks === ticks) ?? null;
}

/** The partner of a second-choice value in the other unit: the inch series of ASME B46.1, from memory. */
export function secondChoicePairOf(ticks: number, unit: RoughnessUnit): { value: Length; mark: Mark } | null {
  const row = ASME_SECOND_CHOICE.find((one) => lengthIn(one[unit], unit).ticks === ticks);
  if (row === undefined) return null;
  return { value: unit === "um" ? uinLength(row.uin) : umLength(row.um), mark: "memory" };
}

/** First-choice values of a unit, finest first. */
export function firstChoiceValues(unit: RoughnessUnit): readonly Length[] {
  return ROUGHNESS_GRADES.flatMap((row) => {
    const value = row.firstChoice ? row[unit] : null;
    return value === null ? [] : [lengthIn(value, unit)];
  });
}

/** All preferred values of a unit, finest first: first choice together with the longer series. */
export function allPreferredValues(unit: RoughnessUnit): readonly Length[] {
  const longer = unit === "um" ? R10_SERIES_UM.map(umLength) : longerInchSeries();
  const all = new Map([...firstChoiceValues(unit), ...longer].map((one) => [one.ticks, one]));
  return [...all.values()].sort((left, right) => left.ticks - right.ticks);
}

/** The inch series of ASME B46.1 starts at 0.5 µin: the grades from N0, and the second choice between them. */
function longerInchSeries(): readonly Length[] {
  const finest = ROUGHNESS_GRADES.find((row) => row.uin !== null)?.uin ?? null;
  const values = ASME_SECOND_CHOICE.map((row) => row.uin);
  return (finest === null ? values : [finest, ...values]).map(uinLength);
}

/**
 * A published limit of so many µm as a drawing in the given unit understands it: the paired value in µin where tables
 * pair the two, else the exact length. 63 µin on an inch drawing is the 1.6 µm of the chart, though 0.0002 µm wider.
 */
export function limitInUnit(um: number, unit: RoughnessUnit): Length {
  const exact = umLength(um);
  return unit === "um" ? exact : (pairedUin(um) ?? exact);
}

/** The µin value that tables set beside so many µm, of first or second choice; `null` where they have none. */
export function pairedUin(um: number): Length | null {
  const row = ROUGHNESS_GRADES.find((one) => one.um === um) ?? ASME_SECOND_CHOICE.find((one) => one.um === um);
  return row?.uin === undefined || row.uin === null ? null : uinLength(row.uin);
}
