import type { Basis, Caution } from "../basis.js";
import type { Limits } from "../limits/index.js";
import type { Length, LengthLike, Ratio } from "../units/index.js";

/** Square or rectangular section. */
export type KeyShape = "square" | "rectangular";

/** A key with equal height all along, a taper key, or a taper key with a head to draw it. */
export type InchKeyKind = "parallel" | "taper" | "gib-head";

/** The section of a key. */
export interface KeySection {
  /** Nominal width. */
  readonly width: Length;
  /** Nominal height; of a taper key at its thick end. */
  readonly height: Length;
}

/** The section of a key as a caller gives it. */
export interface KeySectionLike {
  /** Width of the key, over zero. */
  readonly width: LengthLike;
  /** Height of the key, over zero; of a taper key at its thick end. */
  readonly height: LengthLike;
}

/** Size of a gib head. */
export interface GibHead {
  /** Overall height A. */
  readonly height: Length;
  /** Length B along the key. */
  readonly length: Length;
}

/** The limits of a key's section: what `keyedAssembly` takes. */
export interface KeyLimits {
  /** Width. */
  readonly width: Limits;
  /** Height; of a taper key at its thick end. */
  readonly height: Limits;
  /** Rise over run of a taper key's back; `null` for a parallel key. */
  readonly taper: Ratio | null;
}

/** Key of ANSI/ASME B17.1 for a shaft: plain frozen data. */
export interface InchKey {
  /** Standard with its edition. */
  readonly standard: string;
  /** Nominal diameter of the shaft where the key sits. */
  readonly shaftDiameter: Length;
  /** Square or rectangular section. */
  readonly shape: KeyShape;
  /** Parallel, taper or gib-head. */
  readonly kind: InchKeyKind;
  /** Nominal width W. */
  readonly width: Length;
  /** Nominal height H; of a taper key at its thick end. */
  readonly height: Length;
  /** True where the standard lists this key for this shaft. */
  readonly standardForShaft: boolean;
  /** The shape that the standard prefers for this shaft. */
  readonly preferredShape: KeyShape;
  /** Limits of bar stock, which gives a Class 1 fit; `null` for taper keys. */
  readonly barStock: KeyLimits | null;
  /** Limits of keystock, which gives a Class 2 fit; for taper keys those of the finished key. */
  readonly keystock: KeyLimits;
  /** Head of a gib-head key: overall height A and length B; `null` for the other kinds. */
  readonly gibHead: GibHead | null;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}
