import type { Basis, Caution } from "../basis.js";
import type { Length, LengthLike } from "../units/index.js";

/** Characteristics of geometry that a general tolerance may limit. */
export type FormCharacteristic =
  | "straightness"
  | "flatness"
  | "roundness"
  | "cylindricity"
  | "parallelism"
  | "perpendicularity"
  | "symmetry"
  | "coaxiality"
  | "circular run-out";

/** What to look up, told apart by `characteristic`. */
export type FormQuestion =
  | {
      readonly characteristic: "straightness" | "flatness";
      /** Of a line its own length, of a surface its longer side or its diameter. */
      readonly length: LengthLike;
    }
  | {
      readonly characteristic: "perpendicularity";
      /** The shorter side of the right angle. */
      readonly shorterSide: LengthLike;
    }
  | {
      readonly characteristic: "symmetry";
      /** Nominal length. */
      readonly length: LengthLike;
    }
  | { readonly characteristic: "circular run-out" }
  | {
      readonly characteristic: "roundness";
      /** The diameter, where it has the general tolerance of part 1 in the same indication. */
      readonly diameter?: LengthLike;
      /** The diameter's tolerance in all, where it has one of its own. */
      readonly sizeTolerance?: LengthLike;
    }
  | {
      readonly characteristic: "parallelism";
      /** Length of the longer of the two features. */
      readonly length: LengthLike;
      /** The size between them, where it has the general tolerance of part 1 in the same indication. */
      readonly distance?: LengthLike;
      /** The tolerance in all of the size between them, where it has one of its own. */
      readonly sizeTolerance?: LengthLike;
    }
  | { readonly characteristic: "cylindricity" | "coaxiality" };

/** A general tolerance of geometry: plain frozen data. */
export interface FormTolerance {
  /** What is limited. */
  readonly characteristic: FormCharacteristic;
  /** The width of the zone, in all. */
  readonly tolerance: Length;
  /** Which feature is the datum; `null` where the characteristic has none or the standard leaves it open. */
  readonly datum: string | null;
  /** Where the value comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it; empty where there is nothing. */
  readonly cautions: readonly Caution[];
}
