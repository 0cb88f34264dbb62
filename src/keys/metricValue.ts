import type { Basis, Caution } from "../basis.js";
import type { KeyLimits, KeySection } from "./keyValue.js";
import type { Limits } from "../limits/index.js";
import type { Length, Ratio, Stress } from "../units/index.js";

/**
 * The standards of metric keys in prismatic form. The first four share sections and depths of parallel keys; the
 * others have tables of their own, which are never mixed. `"older depth series"` is what was in use before 1968.
 */
export type MetricKeyStandard =
  | "ISO/R 773"
  | "DIN 6885-1"
  | "BS 4235-1"
  | "JIS B 1301"
  | "ISO 2491"
  | "DIN 6885-3"
  | "DIN 6885-2"
  | "ISO/R 774"
  | "DIN 6886"
  | "DIN 6887"
  | "older depth series"
  | "JIS B 1301-1959";

/** Which of two hub depths: room over the key, or a key that bears on its back. */
export type MetricHubDepth = "back clearance" | "back interference";

/** Two sizes, least and greatest. */
export interface SizeRange {
  /** Least. */
  readonly min: Length;
  /** Greatest. */
  readonly max: Length;
}

/** Metric key for a shaft: plain frozen data. */
export interface MetricKey {
  /** Standard with its edition. */
  readonly standard: string;
  /** Nominal diameter of the shaft where the key sits. */
  readonly shaftDiameter: Length;
  /** Nominal width b. */
  readonly width: Length;
  /** Nominal height h; of a taper key at its thick end. */
  readonly height: Length;
  /** True where the standard lists this section for this shaft. */
  readonly standardForShaft: boolean;
  /** Limits of width and height; `null` where the classes of this standard are not known here. */
  readonly limits: KeyLimits | null;
  /** Rise over run of a taper key's back; `null` for a parallel key. */
  readonly taper: Ratio | null;
  /** Height of a gib head; `null` where there is none or its size is not stated. */
  readonly gibHeadHeight: Length | null;
  /** Edge chamfer; `null` where it is not known here. */
  readonly chamfer: SizeRange | null;
  /** Range of lengths; `null` where it is not known here. */
  readonly lengths: SizeRange | null;
  /** Least tensile strength of the finished key that the standard asks; `null` where it is not known here. */
  readonly leastStrength: Stress | null;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/** One keyway of a metric key. */
export interface MetricKeywayMember {
  /** Width b; `null` where no class is given. */
  readonly width: Limits | null;
  /** Nominal depth from the crown on the centre line: t1 of the shaft, t2 of the hub (deep end of a taper keyway). */
  readonly nominalDepth: Length;
  /** Depth with its deviations; `null` where those are not known here. */
  readonly depth: Limits | null;
  /** d − t1 of the shaft, d + t2 of the hub, at nominal d. */
  readonly nominalControl: Length;
  /** The same with its deviations, on the shaft with reversed sign; `null` where those are not known here. */
  readonly control: Limits | null;
}

/** Keyways of a metric key in shaft and hub: plain frozen data. */
export interface MetricKeyseat {
  /** Standard with its edition. */
  readonly standard: string;
  /** Nominal diameter of the shaft where the key sits. */
  readonly shaftDiameter: Length;
  /** Nominal section of the key. */
  readonly key: KeySection;
  /** True where the standard lists this section for this shaft. */
  readonly standardForShaft: boolean;
  /** The keyway in the shaft. */
  readonly shaft: MetricKeywayMember;
  /** The keyway in the hub. */
  readonly hub: MetricKeywayMember;
  /** Radius of the keyway corners; `null` where it is not known here. */
  readonly radius: SizeRange | null;
  /** Edge chamfer of the key; `null` where it is not known here. */
  readonly chamfer: SizeRange | null;
  /** Smallest bore of a part that must pass over the fitted key, in DIN 6885-1; `null` elsewhere. */
  readonly passOverBore: Length | null;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}
