import { LimitsError } from "../errors.js";
import type { Basis, BasisStep, Caution } from "../basis.js";
import { makeLimits } from "../limits/index.js";
import type { Limits } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { um } from "../units/index.js";
import type { Length } from "../units/index.js";
import { DOUBTFUL, isDoubtful } from "./keyCautions.js";
import { keyStep } from "./keyStep.js";
import type { KeyseatMember } from "./keyseatValue.js";
import { classLimits, rangeOf } from "./metricKey.js";
import { chooseWoodruff } from "./metricWoodruff.js";
import type { DinWoodruffSeries, MetricWoodruffChoice, MetricWoodruffRow } from "./metricWoodruff.js";
import type { SizeRange } from "./metricValue.js";
import { oneOf } from "./oneOf.js";
import { tableMm } from "./tableLength.js";

/** Which keyways of a metric Woodruff key are meant. */
export interface MetricWoodruffKeyseatOptions extends MetricWoodruffChoice {
  /** `"normal"` N9 shaft and JS9 hub, `"close"` P9 in both, by the words of ISO 3912; no default. */
  readonly fit?: "normal" | "close";
  /** Hub depth of DIN 6888: `"A"` (preferred) unless said otherwise. ISO 3912 has one depth. */
  readonly series?: DinWoodruffSeries;
}

/** One keyway of a metric Woodruff key. */
export interface MetricWoodruffMember {
  /** Width; `null` where no fit is given, and for N9 at 1 mm, which ISO 286 does not define. */
  readonly width: Limits | null;
  /** Nominal depth from the crown: t1 of the shaft, t2 of the hub. */
  readonly nominalDepth: Length;
  /** Depth with its deviations; `null` where those are not known here. */
  readonly depth: Limits | null;
}

/** Keyways of a metric Woodruff key: plain frozen data. */
export interface MetricWoodruffKeyseat {
  /** Standard with its edition. */
  readonly standard: string;
  /** Size of the key, b x h x D. */
  readonly designation: string;
  /** The keyway in the shaft. */
  readonly shaft: MetricWoodruffMember;
  /** The keyway in the hub. */
  readonly hub: MetricWoodruffMember;
  /** Radius of the keyway corners; `null` where it is not known here. */
  readonly radius: SizeRange | null;
  /** Diameter of the cutter, at most 0.5 mm over that of the key. */
  readonly cutterDiameter: Limits;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

const FITS = {
  "ISO 3912": { normal: { shaft: "N9", hub: "JS9" }, close: { shaft: "P9", hub: "P9" } },
  // DIN writes J9, which ISO 286 defines up to IT8 only: its sliding seat is left to the caller
  "DIN 6888": { close: { shaft: "P9", hub: "P9" } },
} as const;

/**
 * The keyways of a metric Woodruff key, by the standard that is named.
 *
 * @param options - `standard`, `width` and `diameter` of the key in any unit, `fit`, `series` (DIN 6888)
 * @returns the frozen keyways, sizes in mm and deviations in µm; what is not known of a standard is `null`
 * @throws `KEY_SIZE_NOT_DEFINED`, `KEY_CLASS_NOT_DEFINED`, `KEYED_JOINT_INVALID`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { metricWoodruffKeyseat } from "limitsmith";
 *
 * const iso = metricWoodruffKeyseat({ standard: "ISO 3912", width: "5 mm", diameter: "19 mm", fit: "normal" });
 * [iso.shaft.nominalDepth, iso.hub.nominalDepth]; // → ["5.5 mm", "2.3 mm"]
 * const din = metricWoodruffKeyseat({ standard: "DIN 6888", width: "5 mm", diameter: "19 mm" });
 * [din.hub.nominalDepth, din.hub.depth]; // → ["2.2 mm", null]
 * ```
 * @reference ISO 3912:1977 (depths one source); DIN 6888:1956 (b 1 to 4 one source, b 5 to 10 from memory)
 */
export function metricWoodruffKeyseat(options: MetricWoodruffKeyseatOptions): MetricWoodruffKeyseat {
  const row = chooseWoodruff(options);
  const { edition } = row;
  const size = `${row.width}x${row.height}x${row.diameter}`;
  const series = oneOf(ownValue(options, "series") ?? "A", SERIES, "a series of DIN 6888", ["series"]);
  const depths = row.depths[series];
  if (depths === undefined) {
    throw new LimitsError("KEY_CLASS_NOT_DEFINED", `no depths of series ${series} are known for this key`, {
      value: `${row.standard} ${size}, series ${series}`,
      allowed: row.standard === "DIN 6888" ? "series A" : "no series: ISO 3912 has one depth",
      path: ["series"],
    });
  }
  const fit = ownValue(options, "fit");
  const classes = fit === undefined ? null : fitClasses(row.standard, fit);
  const shaft = memberOf(row, "shaft", depths[0], row.t1UpperUm, classes?.shaft ?? null, series);
  const hub = memberOf(row, "hub", depths[1], row.t2UpperUm, classes?.hub ?? null, series);
  const steps = [...shaft.steps, ...hub.steps, CUTTER_STEP];
  if (row.radius !== null) {
    steps.push(keyStep(edition, `keyways, ${size}`, `radius ${row.radius.join(" to ")} mm`, "tabulated", "one-source"));
  }
  return Object.freeze({
    standard: edition,
    designation: size,
    shaft: shaft.member,
    hub: hub.member,
    radius: rangeOf(row.radius),
    cutterDiameter: makeLimits(tableMm(row.diameter), um(500), um(0), Object.freeze([CUTTER_STEP]), null),
    basis: Object.freeze(steps),
    cautions: Object.freeze(steps.some(isDoubtful) ? [DOUBTFUL] : []),
  });
}

function memberOf(
  row: MetricWoodruffRow,
  name: KeyseatMember,
  text: string,
  upperUm: number | null,
  cls: string | null,
  series: DinWoodruffSeries,
): { readonly member: MetricWoodruffMember; readonly steps: readonly BasisStep[] } {
  const { edition } = row;
  const place = `keyways, ${row.width}x${row.height}x${row.diameter}`;
  const named = row.standard === "DIN 6888" ? `${place}, series ${series}` : place;
  const deviation = upperUm === null ? "its deviations are not known here" : `+${upperUm} / 0 µm`;
  const says = `${name === "shaft" ? "t1" : "t2"} = ${text} mm, ${deviation}`;
  const depthStep = keyStep(edition, named, says, "tabulated", row.depthMark);
  const nominalDepth = tableMm(text);
  const depth =
    upperUm === null ? null : makeLimits(nominalDepth, um(upperUm), um(0), Object.freeze([depthStep]), null);
  // the key standard prints N9 at 1 mm too, where ISO 286 does not define it
  const undefinedClass = cls === "N9" && row.width === "1";
  const widthSays = undefinedClass
    ? "shaft N9, which ISO 286 does not define up to 1 mm: no limits are given"
    : `${name} ${cls ?? ""}, with a key h9`;
  const widthStep = keyStep(edition, "keyway width", widthSays, "tabulated", "one-source");
  const width = cls === null || undefinedClass ? null : classLimits(tableMm(row.width), cls, widthStep);
  return {
    member: Object.freeze({ width, nominalDepth, depth }),
    steps: cls === null ? [depthStep] : [depthStep, widthStep],
  };
}

const SERIES: readonly DinWoodruffSeries[] = ["A", "B"];
const CUTTER_STEP = keyStep(
  "DIN 6888:1956",
  "cutter",
  "d2 +0.5 / 0 mm; ISO 3912 about the same",
  "tabulated",
  "one-source",
);

function fitClasses(standard: keyof typeof FITS, fit: unknown): Readonly<Record<KeyseatMember, string>> {
  const name = oneOf(fit, ["normal", "close"] as const, "a fit of a Woodruff key", ["fit"]);
  if (standard === "DIN 6888" && name === "normal") {
    throw new LimitsError(
      "KEY_CLASS_NOT_DEFINED",
      "the sliding seat of DIN 6888 has hub class J9, which ISO 286 does not define",
      {
        value: name,
        allowed: 'fit: "close" (P9 in both), or no fit and limits of your own',
        path: ["fit"],
      },
    );
  }
  return standard === "DIN 6888" ? FITS["DIN 6888"].close : FITS["ISO 3912"][name];
}
