import type { Basis } from "../basis.js";
import type { Length } from "../units/index.js";

/** Which way an edge faces. */
export type EdgeSide = "external" | "internal";

/**
 * What state an edge may have: material may stand proud (`"burr"` on an external edge, `"passing"` on an internal
 * one), must be missing (`"undercut"`), either, or next to nothing of both (`"sharp"`).
 */
export type EdgeState = "burr" | "passing" | "undercut" | "sharp" | "burr or undercut" | "passing or undercut";

/** An edge indication in the manner of ISO 13715: plain frozen data. */
export interface EdgeIndication {
  /** External or internal edge. */
  readonly side: EdgeSide;
  /** The value as it was written. */
  readonly text: string;
  /** The state that the values allow. */
  readonly state: EdgeState;
  /** Upper limit: how far material may stand proud, or, below zero, must at least be missing; `null` if left open. */
  readonly upper: Length | null;
  /** Lower limit: how far material may be missing, as a value below zero; `null` if left open. */
  readonly lower: Length | null;
  /** True where each size is one of the series that the standard recommends; others are allowed too. */
  readonly recommended: boolean;
  /** Where the rules come from. */
  readonly basis: Basis;
}
