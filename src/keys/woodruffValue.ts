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
  /** Standard with its edition. */
  readonly standard: string;
  /** Number of the key. */
  readonly number: string;
  /** Width W. */
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
  /** Limits of the section with the full-radius height, as `keyedAssembly` takes them. */
  readonly limits: KeyLimits;
  /** Where it comes from. */
  readonly basis: Basis;
}

/** A Woodruff keyseat in a shaft. */
export interface WoodruffShaftSeat {
  /** Width: the key is held in it. */
  readonly width: Limits;
  /** Depth at the side of the seat. */
  readonly sideDepth: Limits;
  /** Diameter of the seat, which the cutter makes: nominal to nominal with its allowance. */
  readonly cutterDiameter: Limits;
  /** S, from the deepest point of the seat to the opposite side of the shaft; `null` without a shaft diameter. */
  readonly control: Limits | null;
}

/** A Woodruff keyseat in a hub. */
export interface WoodruffHubSeat {
  /** Width: the key has clearance in it. */
  readonly width: Limits;
  /** Depth at the side of the seat. */
  readonly sideDepth: Limits;
  /** T, from the bottom of the seat to the opposite side of the bore; `null` without a shaft diameter. */
  readonly control: Limits | null;
}

/** Keyseats of ANSI/ASME B17.2 in shaft and hub: plain frozen data. */
export interface WoodruffKeyseat {
  /** Standard with its edition. */
  readonly standard: string;
  /** Number of the key. */
  readonly number: string;
  /** The seat in the shaft. */
  readonly shaft: WoodruffShaftSeat;
  /** The seat in the hub. */
  readonly hub: WoodruffHubSeat;
  /** How high the key stands over the side of the shaft keyseat. */
  readonly keyAboveShaft: Limits;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}
