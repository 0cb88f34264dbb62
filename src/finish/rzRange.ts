import type { Basis, BasisStep, Caution, Mark } from "../basis.js";
import { LimitsError } from "../errors.js";
import type { Length } from "../units/index.js";
import { asRoughness } from "./asRoughness.js";
import { gradeRowOf, umLength } from "./preferredValues.js";
import { unitFor } from "./buildRoughness.js";
import type { RoughnessLike } from "./roughnessValue.js";
import { RZ_SERIES_UM } from "./tables/preferredRoughness.js";
import { RZ_RANGES, RZ_VALUES } from "./tables/rzRanges.js";

/** A range of lengths. */
export interface LengthRange {
  /** The least. */
  readonly least: Length;
  /** The most. */
  readonly most: Length;
}

/** What one published set gives beside an Ra. */
export interface RzEstimate {
  /** Whose figures they are. */
  readonly source: string;
  /** The Rz that belongs to it. */
  readonly rz: LengthRange;
  /** How sure the value is. */
  readonly mark: Mark;
}

/** Rz and Rt beside an Ra: ranges only. */
export interface RzRange {
  /** The first-choice Ra that was looked up, in µm. */
  readonly ra: Length;
  /** Range of Rz of the one table that gives ranges. */
  readonly rz: LengthRange;
  /** Range of Rt of the same table. */
  readonly rt: LengthRange;
  /** What each published set gives; they contradict each other. */
  readonly estimates: readonly RzEstimate[];
  /** All sets together. */
  readonly widest: LengthRange;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/** Sets that are a plain factor: least and most Rz in tenths of Ra. */
const FACTORS: readonly { source: string; tenths: readonly [number, number]; mark: Mark }[] = [
  { source: "a blog table of rule-of-thumb multipliers: Rz = 7.6 Ra", tenths: [76, 76], mark: "one-source" },
  { source: "textbook range for machined surfaces: Rz = 4 to 7 Ra", tenths: [40, 70], mark: "memory" },
];

/**
 * Published ranges of Rz and Rt beside a first-choice Ra. There is no fixed ratio: these are estimates, never a
 * conversion.
 *
 * @param roughness - one of the twelve first-choice values of Ra (N1 to N12), in µm or as its partner in µin
 * @returns the frozen ranges in µm, set by set, with a caution
 * @throws `FINISH_NOT_TABULATED` for another Ra, and what {@link asRoughness} throws
 * @example
 * ```ts
 * import { rzRange } from "limitsmith";
 *
 * const { rz, widest } = rzRange("1.6 µm");
 * [rz.least.toString(), rz.most.toString()]; // → ["5.9 µm", "8 µm"]
 * [widest.least.toString(), widest.most.toString()]; // → ["5.9 µm", "12.16 µm"]
 * ```
 * @reference a foundry's published table to DIN ISO 1302, which itself says that forming ratios is not permitted; other
 *   published sets as named in the result
 */
export function rzRange(roughness: RoughnessLike): RzRange {
  const asked = asRoughness(roughness, ["roughness"]);
  const um = gradeRowOf(asked.ra.ticks, unitFor(asked.ra))?.um;
  const row = RZ_RANGES.find((one) => one.ra === um);
  if (row === undefined) {
    throw new LimitsError("FINISH_NOT_TABULATED", "ranges of Rz are published beside the first-choice values only", {
      value: asked.ra.toString(),
      allowed: RZ_RANGES.map((one) => `${one.ra}`).join(", ") + " µm, or their partners in µin",
    });
  }
  const estimates = Object.freeze([
    estimate("a foundry's published table to DIN ISO 1302", row.rz, "one-source"),
    ...toolMakerEstimate(row.ra),
    ...jisEstimate(row.ra),
    ...FACTORS.map(({ source, tenths: [least, most], mark }) =>
      estimate(source, [(row.ra * least) / 10, (row.ra * most) / 10], mark),
    ),
  ]);
  const least = Math.min(...estimates.map((one) => one.rz.least.ticks));
  const most = Math.max(...estimates.map((one) => one.rz.most.ticks));
  return Object.freeze({
    ra: umLength(row.ra),
    rz: range(row.rz),
    rt: range(row.rt),
    estimates,
    widest: range([least / 10_000, most / 10_000]),
    basis: Object.freeze(estimates.map(estimateStep)),
    cautions: Object.freeze([RATIO_CAUTION]),
  });
}

function toolMakerEstimate(ra: number): readonly RzEstimate[] {
  const values = RZ_VALUES.find((one) => one.ra === ra)?.rz ?? [];
  const [first, last = first] = values;
  return first === undefined || last === undefined
    ? []
    : [estimate("a cutting-tool maker's published surface-quality table", [first, last], "one-source")];
}

/** JIS sets Ra beside the Rz two steps up the same series, read from 0.1 to 25 µm. */
function jisEstimate(ra: number): readonly RzEstimate[] {
  const rz = RZ_SERIES_UM[RZ_SERIES_UM.indexOf(ra) + 2];
  if (rz === undefined || ra < 0.1 || ra > 25) return [];
  return [estimate("reference columns of JIS B 0601: Ra to Rz about 1 to 4", [rz, rz], "two-sources")];
}

function estimate(source: string, [least, most]: readonly [number, number], mark: Mark): RzEstimate {
  return Object.freeze({ source, rz: range([least, most]), mark });
}

function range([least, most]: readonly [number, number]): LengthRange {
  return Object.freeze({ least: umLength(least), most: umLength(most) });
}

function estimateStep({ source, rz, mark }: RzEstimate): BasisStep {
  return Object.freeze({
    standard: source,
    place: "Rz beside Ra",
    says: `Rz ${rz.least.toString()} to ${rz.most.toString()}`,
    how: "common practice" as const,
    mark,
  });
}

const RATIO_CAUTION: Caution = Object.freeze({
  code: "FINISH_RATIO_ESTIMATE",
  says:
    "an estimate: Rz over Ra runs from 3.6 on coarse surfaces to 12 on very fine ones and no ratio is fixed; an old " +
    "drawing's Rz may be the ten-point height (ISO 4287:1984) and not the maximum height",
});
