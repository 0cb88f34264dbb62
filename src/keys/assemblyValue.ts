import type { Basis, Caution } from "../basis.js";
import type { Fit } from "../limits/index.js";
import type { Length } from "../units/index.js";

/** One term of a chain of sizes. */
export interface StackTerm {
  /** What it is, such as `"T of the hub keyseat, min"`. */
  readonly name: string;
  /** Whether it adds to the sum or takes away. */
  readonly sign: "+" | "-";
  /** The size. */
  readonly value: Length;
}

/** A gap or height at its two limits, each with the chain of terms that made it; the signed terms add up to it. */
export interface StackRange {
  /** Upper limit. */
  readonly max: Length;
  /** Lower limit. */
  readonly min: Length;
  /** The terms that add up to the upper limit. */
  readonly maxChain: readonly StackTerm[];
  /** The terms that add up to the lower limit. */
  readonly minChain: readonly StackTerm[];
}

/** Whether the parts go together at every corner of their tolerances, at some, or at none. */
export type AssemblyVerdict = "always assembles" | "may need fitting" | "cannot assemble";

/** Whether the flanks of the key find a wall in shaft and hub at every corner, at some, or at none. */
export type BearingVerdict = "always bears" | "may not bear" | "cannot bear";

/** One thing that was found about a keyed joint. */
export interface AssemblyFinding {
  /** Stable code; it never changes its meaning. */
  readonly code:
    | "SIDE_INTERFERES"
    | "SIDE_NOT_GIVEN"
    | "TOP_PINCHED"
    | "KEY_TAKES_PLAY"
    | "KEY_CAN_LIFT"
    | "KEY_CANNOT_BEAR"
    | "TAPER_TAKES_UP"
    | "SHAFT_PRESSES";
  /** Where: the sides in shaft or hub, the top, the shaft in its bore. */
  readonly place: "shaft" | "hub" | "top" | "bore";
  /** In words, with sizes. */
  readonly says: string;
}

/** How far a taper key stops short of its full depth. */
export interface TakeUp {
  /** At the most. */
  readonly max: Length;
  /** At the least; negative where it goes past it. */
  readonly min: Length;
}

/** The room over a key, by where the shaft is in its bore. */
export interface TopClearance {
  /** Shaft pushed away from the key: it touches the bore on the opposite side. */
  readonly away: StackRange;
  /** Shaft in the middle of the bore. */
  readonly centred: StackRange;
  /** Shaft pushed toward the key by all its play. */
  readonly toward: StackRange;
}

/** How a key, its shaft and its hub go together: plain frozen data; clearance is positive, interference negative. */
export interface KeyedAssembly {
  /** Fit of the shaft in the bore. */
  readonly fit: Fit;
  /** Clearance at the sides of the key in the shaft; `null` where the width of the seat is not given. */
  readonly sideInShaft: StackRange | null;
  /** Clearance at the sides of the key in the hub; `null` where the width of the seat is not given. */
  readonly sideInHub: StackRange | null;
  /** Clearance over the key, which lies on the floor of the shaft keyseat. */
  readonly top: TopClearance;
  /** From the opposite side of the shaft over the key: what a micrometer reads. */
  readonly overKey: StackRange;
  /** How high the key stands over the crown of the shaft. */
  readonly aboveShaft: StackRange;
  /** Height of the wall that the key bears on in the shaft. */
  readonly flankInShaft: StackRange;
  /** Height of the wall that the key bears on in the hub, the shaft pushed away. */
  readonly flankInHub: StackRange;
  /** What is left of the wall in the shaft where the key has lifted to the floor of the hub keyseat. */
  readonly flankLifted: StackRange;
  /**
   * For a taper key: how far it stops short of its full depth when driven home, negative where it goes past it;
   * `null` for a parallel key.
   */
  readonly takeUp: TakeUp | null;
  /** On the key in its seats; whether the shaft must be pressed into the bore is in `fit`. */
  readonly assembles: AssemblyVerdict;
  /** True where the key is loose in the shaft at some corner and has room to rise. */
  readonly canLift: boolean;
  /** Whether the flanks of the key find a wall. */
  readonly bears: BearingVerdict;
  /** What was found, with sizes, in words. */
  readonly findings: readonly AssemblyFinding[];
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}
