import type { Basis, Caution } from "../basis.js";
import type { Force, Length, Stress, Torque } from "../units/index.js";

/**
 * Rival forms of the pressure on the flanks, which differ by a third and more for one joint:
 *
 * - `"half height"`: p = 4T / (D h l), on half the height of the key (US, Chinese and general texts)
 * - `"h - t1"`: p = 2T / (D l (h − t1)), on the hub flank (DIN 6892 method C in its simple form; Russian texts)
 * - `"0.45 h"`: p = 2T / (D l 0.45 h) (Roloff/Matek Maschinenelemente)
 * - `"t1 or t2"`: p = 2T / (D l t), t the smaller of t1 and t2 (a text after Dasar Perencanaan dan Pemilihan Elemen Mesin)
 */
export type PressureForm = "half height" | "h - t1" | "0.45 h" | "t1 or t2";

/** The ends of a key: a round end does not bear over half the width. */
export type KeyEnds = "square" | "round" | "one round";

/**
 * How much of the torque several keys are taken to carry: `"two count as 1.5"` for two keys 180° apart. B17.1 itself
 * is for one key only.
 */
export type SeveralKeysRule = "two count as 1.5";

/** Shear stress a strength in tension is taken to allow: half of it, or 0.577 of it by distortion energy. */
export type ShearRule = "0.5" | "0.577";

/** Stress allowed on the parts that meet at the flanks. */
export interface BearingAllowables<S> {
  /** Of the key. */
  readonly key: S;
  /** Of the shaft. */
  readonly shaft: S;
  /** Of the hub. */
  readonly hub: S;
}

/** Length that is needed, by what asks for it. */
export interface NeededLength {
  /** Overall length for shear of the key, its round ends added; `null` without an allowable shear stress. */
  readonly shear: Length | null;
  /** Overall length for pressure on the flanks; `null` without an allowable pressure. */
  readonly bearing: Length | null;
  /** The longer of the two. */
  readonly governing: Length | null;
}

/** Torque that can be carried, by what limits it. */
export interface TorqueCapacity {
  /** By shear of the key; `null` without an allowable or a length. */
  readonly shear: Torque | null;
  /** By pressure on the flanks; `null` without an allowable or a length. */
  readonly bearing: Torque | null;
  /** The smaller of the two. */
  readonly governing: Torque | null;
}

/** Load on a keyed joint by named formulas: plain frozen data; numbers are right to 12 figures. */
export interface KeyLoad {
  /** Force at the surface of the shaft; `null` where no torque is given. */
  readonly force: Force | null;
  /** Length over which the key bears: less its round ends; `null` where no length is given. */
  readonly bearingLength: Length | null;
  /** Height on which the pressure is taken, by the form. */
  readonly bearingHeight: Length;
  /** The form of the pressure formula, by name. */
  readonly pressureForm: PressureForm;
  /** How many keys the joint counts as: 1, or 1.5 for two. */
  readonly countsAs: number;
  /** Shear stress across the key; `null` where torque or length is not given. */
  readonly shearStress: Stress | null;
  /** Pressure on the flanks by the form; `null` where torque or length is not given. */
  readonly pressure: Stress | null;
  /** Shear stress that is allowed, the safety factor taken out; `null` where none is given. */
  readonly allowedShear: Stress | null;
  /** Pressure that is allowed on the weakest part, the safety factor taken out; `null` where none is given. */
  readonly allowedPressure: Stress | null;
  /** Length that is needed for the allowables. */
  readonly neededLength: NeededLength;
  /** Torque that the allowables let through at the given length. */
  readonly capacity: TorqueCapacity;
  /**
   * Strength of the shaft with the keyway over that of the plain shaft, in static torsion; `null` where the depth of
   * the shaft keyway is not given.
   */
  readonly shaftStrengthFactor: number | null;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}
