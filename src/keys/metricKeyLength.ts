import { markOf } from "../basis.js";
import type { Basis, BasisStep, Caution } from "../basis.js";
import { makeLimits } from "../limits/index.js";
import type { Limits } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { multiply, um } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { DOUBTFUL, isDoubtful } from "./keyCautions.js";
import { keyStep } from "./keyStep.js";
import type { KeySectionLike } from "./keyValue.js";
import { METRIC_FAMILIES } from "./metricFamily.js";
import { classLimits, rangeOf } from "./metricKey.js";
import { metricStandard, rowsOf, sectionRow } from "./metricKeySize.js";
import type { MetricKeyStandard, SizeRange } from "./metricValue.js";
import { positiveLength } from "./positiveLength.js";
import { tableMm } from "./tableLength.js";
import { DIN_LENGTH_TOLERANCES, KEY_LENGTHS, KEY_LENGTHS_EXTENDED } from "./tables/keyLengths.js";

/** Options of {@link metricKeyLength}. */
export interface MetricKeyLengthOptions {
  /** `"ISO/R 773"` unless said otherwise. */
  readonly standard?: MetricKeyStandard;
  /** The section, for its range of lengths. */
  readonly key?: KeySectionLike;
}

/** A key length judged by a standard: plain frozen data. */
export interface MetricKeyLength {
  /** Standard with its edition. */
  readonly standard: string;
  /** The length that was asked about. */
  readonly length: Length;
  /** True where it is a length of the series. */
  readonly inSeries: boolean;
  /** Range of the section; `null` where none was given or its range is not known here. */
  readonly range: SizeRange | null;
  /** True where the length is of the series and, if the range is known, within it. */
  readonly valid: boolean;
  /** The nearest standard length, within the range where it is known; of two as near the shorter. */
  readonly nearest: Length;
  /** The next standard length below; `null` where there is none. */
  readonly shorter: Length | null;
  /** The next standard length above; `null` where there is none. */
  readonly longer: Length | null;
  /** Limits of the key's length; `null` where the standard's are not known here, or the length is not standard. */
  readonly keyLimits: Limits | null;
  /** Limits of the length of a round-ended keyway; `null` likewise. */
  readonly keywayLimits: Limits | null;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * Judges the length of a metric key: is it of the series and the section's range, what is nearest, what are its limits.
 *
 * @param length - overall length of the key, over zero, any unit
 * @param options - `standard` (ISO/R 773 unless said otherwise) and the `key` section, any unit
 * @returns the frozen judgement, lengths in mm; limits where the standard's are known: DIN 6885-1 (doubtful from 90 mm)
 *   and JIS B 1301 (h12)
 * @throws `KEY_SIZE_NOT_DEFINED`, `KEYED_JOINT_INVALID`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { metricKeyLength } from "limitsmith";
 *
 * const asked = metricKeyLength("48 mm", { key: { width: "8 mm", height: "7 mm" } });
 * asked.valid; // → false
 * [asked.shorter, asked.nearest, asked.longer]; // → ["45 mm", "50 mm", "50 mm"]
 * metricKeyLength("25 mm", { standard: "DIN 6885-1" }).keyLimits?.min.toString(); // → "24.8 mm"
 * ```
 * @reference ISO/R 773:1969, JIS B 1301:1996, DIN 6885-1:1968: lengths; series two sources
 */
export function metricKeyLength(length: LengthLike, options?: MetricKeyLengthOptions): MetricKeyLength {
  const given = positiveLength(length, "the length of the key", ["length"]);
  const standard = metricStandard(ownValue(options, "standard"));
  const family = METRIC_FAMILIES[standard];
  const section = ownValue(options, "key");
  const row = section === undefined ? null : sectionRow(section, rowsOf(standard, false), family);
  const range = rangeOf(row?.lengths ?? null);
  const names = standard === "ISO/R 773" ? [...KEY_LENGTHS, ...KEY_LENGTHS_EXTENDED] : KEY_LENGTHS;
  const series = names.map(tableMm);
  const within = range === null ? series : series.filter((one) => isWithin(one, range));
  const inSeries = series.some((one) => one.ticks === given.ticks);
  const limits = inSeries ? lengthLimits(standard, family.edition, given) : NO_LIMITS;
  const steps = [
    keyStep(
      family.edition,
      "key lengths",
      inSeries ? "of the series" : "not of the series",
      "tabulated",
      "two-sources",
    ),
    ...(row?.lengths === undefined || row.lengths === null
      ? []
      : [
          keyStep(
            family.edition,
            `key lengths, ${row.width} x ${row.height}`,
            `${row.lengths.join(" to ")} mm`,
            "tabulated",
            row.lengthsMark,
          ),
        ]),
    ...(limits.step === null ? [] : [limits.step]),
  ];
  return Object.freeze({
    standard: family.edition,
    length: given,
    inSeries,
    range,
    valid: inSeries && (range === null || isWithin(given, range)),
    nearest: nearestOf(within, given),
    shorter: series.filter((one) => one.ticks < given.ticks).at(-1) ?? null,
    longer: series.find((one) => one.ticks > given.ticks) ?? null,
    keyLimits: limits.key,
    keywayLimits: limits.keyway,
    basis: Object.freeze(steps),
    cautions: Object.freeze(steps.some(isDoubtful) ? [DOUBTFUL] : []),
  });
}

const NO_LIMITS = { key: null, keyway: null, step: null } as const;

function lengthLimits(
  standard: MetricKeyStandard,
  edition: string,
  length: Length,
): { readonly key: Limits | null; readonly keyway: Limits | null; readonly step: BasisStep | null } {
  if (standard === "JIS B 1301") {
    const step = keyStep(edition, "key length", "h12", "tabulated", "one-source");
    return { key: classLimits(length, "h12", step), keyway: null, step };
  }
  const row = DIN_LENGTH_TOLERANCES.find(([to]) => length.ticks <= tableMm(to).ticks);
  if (standard !== "DIN 6885-1" || row === undefined) return NO_LIMITS;
  const [to, deviationUm, mark] = row;
  const doubt = mark === "c" ? "; a textbook prints 400: unresolved, not for acceptance" : "";
  const says = `key 0 / -${deviationUm} µm, round-ended keyway +${deviationUm} / 0 µm${doubt}`;
  const step = keyStep(edition, `length tolerances, up to ${to} mm`, says, "tabulated", markOf(mark));
  const basis = Object.freeze([step]);
  const deviation = um(deviationUm);
  return {
    key: makeLimits(length, um(0), multiply(deviation, -1), basis, null),
    keyway: makeLimits(length, deviation, um(0), basis, null),
    step,
  };
}

function isWithin(length: Length, { min, max }: SizeRange): boolean {
  return length.ticks >= min.ticks && length.ticks <= max.ticks;
}

function nearestOf(lengths: readonly Length[], wanted: Length): Length {
  return lengths.reduce((best, one) =>
    Math.abs(one.ticks - wanted.ticks) < Math.abs(best.ticks - wanted.ticks) ? one : best,
  );
}
