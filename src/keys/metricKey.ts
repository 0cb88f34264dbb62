import type { BasisStep, Caution, Mark } from "../basis.js";
import { isoLimits } from "../iso286/index.js";
import { makeLimits } from "../limits/index.js";
import type { Limits } from "../limits/index.js";
import { LimitsError } from "../errors.js";
import { asLength, stress } from "../units/index.js";
import type { Length, LengthLike, Ratio } from "../units/index.js";
import { DOUBTFUL, NOT_STANDARD, isDoubtful } from "./keyCautions.js";
import { keyStep } from "./keyStep.js";
import type { KeyLimits } from "./keyValue.js";
import { chooseMetricKey } from "./metricKeySize.js";
import type { ChosenMetricKey, MetricKeyChoice } from "./metricKeySize.js";
import type { MetricKey, SizeRange } from "./metricValue.js";
import { tableMm } from "./tableLength.js";

/** 1:100. */
const TAPER: Ratio = Object.freeze({ numerator: 1, denominator: 100 });

/**
 * The metric key for a shaft, by the standard that is named.
 *
 * @param shaftDiameter - nominal diameter where the key sits, for ISO/R 773 from 6 mm up to and including 500 mm, any
 *   unit
 * @param options - `standard` (ISO/R 773 unless said otherwise), a `key` section of your own, `bracketed` sizes of
 *   JIS B 1301, see {@link MetricKeyChoice}
 * @returns the frozen key, sizes in mm: section, limits of width (h9) and height (h9 or h11) in µm, chamfer, lengths;
 *   what is not known of a standard is `null`
 * @throws `KEY_SHAFT_OUT_OF_RANGE`, `KEY_SIZE_NOT_DEFINED`, `KEY_WIDER_THAN_SHAFT`, `KEYED_JOINT_INVALID`,
 *   `OPTION_INVALID`, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { metricKey } from "limitsmith";
 *
 * const key = metricKey("27 mm");
 * [key.width, key.height]; // → ["8 mm", "7 mm"]
 * key.limits?.height.min.toString(); // → "6.91 mm"
 * metricKey("20 mm", { standard: "ISO 2491" }).height.toString(); // → "4 mm"
 * metricKey("5 mm"); // throws KEY_SHAFT_OUT_OF_RANGE
 * ```
 * @reference ISO/R 773:1969, DIN 6885-1:1968, BS 4235-1:1972, JIS B 1301:1996 (parallel); ISO 2491:1974 and
 *   DIN 6885-3:1956 (thin); ISO/R 774:1969, DIN 6886, DIN 6887 (taper); DIN 6885-2 (machine tools); classes: ISO 286
 */
export function metricKey(shaftDiameter: LengthLike, options?: MetricKeyChoice): MetricKey {
  const shaft = asLength(shaftDiameter, ["shaftDiameter"]);
  const chosen = chooseMetricKey(shaft, options);
  refuseWideKey(chosen.width, shaft);
  const { family, row } = chosen;
  const { edition } = family;
  const steps: BasisStep[] = [chosen.step];
  const note = (place: string, says: string, mark: Mark): void => {
    steps.push(keyStep(edition, place, says, "tabulated", mark));
  };
  if (row.heightClass === null) {
    note("key tolerances", `the class of the height of ${row.width} x ${row.height} is not known here`, row.heightMark);
  }
  if (row.chamfer !== null) note("key chamfer", `${row.chamfer.join(" to ")} mm`, row.chamferMark);
  if (row.lengths !== null) note("key lengths", `${row.lengths.join(" to ")} mm`, row.lengthsMark);
  if (row.gibHeadHeight !== null) note("gib head", `h1 = ${row.gibHeadHeight} mm`, row.gibHeadMark);
  if (family.taper) note("taper", "1:100 on the back; h at the thick end", "two-sources");
  if (family.strengthMPa !== null) {
    note("key material", `tensile strength of the finished key at least ${family.strengthMPa} MPa`, "one-source");
  }
  return Object.freeze({
    standard: edition,
    shaftDiameter: shaft,
    width: chosen.width,
    height: chosen.height,
    standardForShaft: chosen.standardForShaft,
    limits: limitsOf(chosen),
    taper: family.taper ? TAPER : null,
    gibHeadHeight: row.gibHeadHeight === null ? null : tableMm(row.gibHeadHeight),
    chamfer: rangeOf(row.chamfer),
    lengths: rangeOf(row.lengths),
    leastStrength: family.strengthMPa === null ? null : stress(family.strengthMPa, "MPa"),
    basis: Object.freeze(steps),
    cautions: metricCautions(chosen, steps),
  });
}

/** Refuses a key that is as wide as the shaft. */
export function refuseWideKey(width: Length, shaft: Length): void {
  if (width.ticks < shaft.ticks) return;
  throw new LimitsError("KEY_WIDER_THAN_SHAFT", "the key is as wide as the shaft, or wider", {
    value: width.toString(),
    allowed: `less than ${shaft.toString()}`,
    path: ["key", "width"],
  });
}

/** The cautions that go with a choice. */
export function metricCautions(chosen: ChosenMetricKey, steps: readonly BasisStep[]): readonly Caution[] {
  const doubtful = steps.some(isDoubtful);
  return Object.freeze([...(chosen.standardForShaft ? [] : [NOT_STANDARD]), ...(doubtful ? [DOUBTFUL] : [])]);
}

/** Two sizes of a table. */
export function rangeOf(range: readonly [string, string] | null): SizeRange | null {
  return range === null ? null : Object.freeze({ min: tableMm(range[0]), max: tableMm(range[1]) });
}

/** Limits of an ISO class whose use a key standard prescribes. */
export function classLimits(size: Length, toleranceClass: string, step: BasisStep): Limits {
  const made = isoLimits(size, toleranceClass);
  const basis = Object.freeze([step, ...made.basis]);
  return makeLimits(made.nominal, made.upperDeviation, made.lowerDeviation, basis, made.designation);
}

function limitsOf({ family, row, width, height }: ChosenMetricKey): KeyLimits | null {
  if (row.heightClass === null) return null;
  const step = (what: string, cls: string): BasisStep =>
    keyStep(
      family.edition,
      `key tolerances, ${row.width} x ${row.height}`,
      `${what} ${cls}`,
      "tabulated",
      row.heightMark,
    );
  return Object.freeze({
    width: classLimits(width, "h9", step("width", "h9")),
    height: classLimits(height, row.heightClass, step("height", row.heightClass)),
    taper: family.taper ? TAPER : null,
  });
}
