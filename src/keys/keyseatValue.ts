import type { Basis, Caution } from "../basis.js";
import type { Limits } from "../limits/index.js";
import type { Length } from "../units/index.js";
import type { InchKeyKind, KeySection, KeyShape } from "./keyValue.js";

/** The keyseat in the shaft or in the hub. */
export type KeyseatMember = "shaft" | "hub";

/** Fit classes of ANSI/ASME B17.1. */
export type InchKeyClass = 1 | 2 | 3;

/** One keyseat of ANSI/ASME B17.1. */
export interface InchKeyseatMember {
  /** Width; `null` in Class 3, whose side fit is not standardised. */
  readonly width: Limits | null;
  /**
   * What is dimensioned and measured: S, bottom of the seat to the opposite side of the shaft; T, to the opposite
   * side of the bore, of a taper key at the deep end.
   */
  readonly control: Limits;
  /** Nominal depth at the side of the seat: half the height of the key. */
  readonly nominalSideDepth: Length;
}

/** Corners of a keyseat that are not left sharp. */
export interface KeyseatCorners {
  /** Fillet radius of the seat. */
  readonly radius: Length;
  /** Chamfer of the key at 45°. */
  readonly chamfer: Length;
}

/** Keyseats of ANSI/ASME B17.1 in shaft and hub: plain frozen data. */
export interface InchKeyseat {
  /** Standard with its edition. */
  readonly standard: string;
  /** Nominal diameter of the shaft where the key sits. */
  readonly shaftDiameter: Length;
  /** Class of fit. */
  readonly class: InchKeyClass;
  /** Square or rectangular section. */
  readonly shape: KeyShape;
  /** Parallel, taper or gib-head. */
  readonly kind: InchKeyKind;
  /** Nominal section of the key. */
  readonly key: KeySection;
  /** True where the standard lists this key for this shaft. */
  readonly standardForShaft: boolean;
  /** The seat in the shaft. */
  readonly shaft: InchKeyseatMember;
  /** The seat in the hub. */
  readonly hub: InchKeyseatMember;
  /** Height of the crown Y over the seat. */
  readonly crown: Length;
  /** Depth of cut from the full diameter of the shaft: Y + H/2. */
  readonly cutDepth: Length;
  /** Suggested fillet and key chamfer where corners are not left sharp; `null` for shallow seats. */
  readonly corners: KeyseatCorners | null;
  /** How far the centreline of the seat may lie beside that of the shaft or bore. */
  readonly offset: Length;
  /** How far the seat may run out of true over its length; `null` where no `length` was given. */
  readonly lead: Length | null;
  /** Suggested set screw over the key, such as `"1/4"` in or `"No. 10"`; `null` where none is suggested. */
  readonly setScrew: string | null;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}
