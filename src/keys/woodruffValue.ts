import type { Basis, Caution } from "../basis.js";
import type { KeyLimits } from "./keyValue.js";
import type { Limits } from "../limits/index.js";
import type { Length } from "../units/index.js";

/** What a Woodruff number of ANSI/ASME B17.2 says by its digits. */
export interface WoodruffNumber {
  /** The number as the standard writes it. */
  readonly number: string;
  /** Nominal width W. */
  readonly width: Length;
  /** Nominal diameter B of the circle that the key is cut from. */
  readonly diameter: Length;
  /** True for the suffix -1: same W and B, flat farther below the centre, so a lower key. */
  readonly low: boolean;
  /** True where the standard lists a key of this number. */
  readonly listed: boolean;
}

/** Woodruff key of ANSI/ASME B17.2: plain frozen data. */
export interface WoodruffKey {
  readonly standard: string;
  readonly number: string;
  readonly width: Limits;
  /** Diameter B of the circle. */
  readonly diameter: Limits;
  /** Actual length F at the top. */
  readonly length: Limits;
  /** Height C of the full-radius form. */
  readonly fullRadius: Limits;
  /** Height D of the form with a flat bottom. */
  readonly flatBottom: Limits;
  /** Distance E of the flat top below the centre of the circle. */
  readonly belowCentre: Length;
  /** Largest radius that may break the corners. */
  readonly cornerMax: Length;
  /** Limits of the section with the full-radius height, as {@link keyedAssembly} takes them. */
  readonly limits: KeyLimits;
  readonly basis: Basis;
}

/** Keyseats of ANSI/ASME B17.2 in shaft and hub: plain frozen data. */
export interface WoodruffKeyseat {
  readonly standard: string;
  readonly number: string;
  readonly shaft: {
    readonly width: Limits;
    /** Depth at the side of the seat. */
    readonly sideDepth: Limits;
    /** Diameter of the seat, which the cutter makes: nominal to nominal with its allowance. */
    readonly cutterDiameter: Limits;
    /** S, from the deepest point of the seat to the opposite side of the shaft; `null` without a shaft diameter. */
    readonly control: Limits | null;
  };
  readonly hub: {
    readonly width: Limits;
    /** Depth at the side of the seat. */
    readonly sideDepth: Limits;
    /** T, from the bottom of the seat to the opposite side of the bore; `null` without a shaft diameter. */
    readonly control: Limits | null;
  };
  /** How high the key stands over the side of the shaft keyseat. */
  readonly keyAboveShaft: Limits;
  readonly basis: Basis;
  readonly cautions: readonly Caution[];
}
