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

/** Keyseats of ANSI/ASME B17.1 in shaft and hub: plain frozen data. */
export interface InchKeyseat {
  readonly standard: string;
  readonly shaftDiameter: Length;
  readonly class: InchKeyClass;
  readonly shape: KeyShape;
  readonly kind: InchKeyKind;
  /** Nominal section of the key. */
  readonly key: KeySection;
  /** True where the standard lists this key for this shaft. */
  readonly standardForShaft: boolean;
  readonly shaft: InchKeyseatMember;
  readonly hub: InchKeyseatMember;
  /** Height of the crown Y over the seat. */
  readonly crown: Length;
  /** Depth of cut from the full diameter of the shaft: Y + H/2. */
  readonly cutDepth: Length;
  /** Suggested fillet and key chamfer where corners are not left sharp; `null` for shallow seats. */
  readonly corners: { readonly radius: Length; readonly chamfer: Length } | null;
  /** How far the centreline of the seat may lie beside that of the shaft or bore. */
  readonly offset: Length;
  /** How far the seat may run out of true over its length; `null` where no `length` was given. */
  readonly lead: Length | null;
  /** Suggested set screw over the key, such as `"1/4"` in or `"No. 10"`; `null` where none is suggested. */
  readonly setScrew: string | null;
  readonly basis: Basis;
  readonly cautions: readonly Caution[];
}
