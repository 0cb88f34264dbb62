import type { Basis, Caution } from "../basis.js";
import type { Length, LengthData, LengthLike } from "../units/index.js";

/** The two units that roughness is written in: `um` is µm, `uin` is µin. */
export type RoughnessUnit = "um" | "uin";

/** What a drawing states: the arithmetic average (Ra, AA, CLA), or an old root-mean-square note (RMS, Rq). */
export type RoughnessParameter = "Ra" | "RMS";

/** The nearest preferred values on one side of a roughness, in its own unit; `null` at the end of the series. */
export interface PreferredNeighbour {
  /** Among the twelve first-choice values, N1 to N12. */
  readonly firstChoice: Length | null;
  /** Among all preferred values: R10 in µm, the series of ASME B46.1 in µin. */
  readonly anyChoice: Length | null;
}

/** A roughness as a drawing states it, with what belongs to it: plain frozen data. */
export interface Roughness {
  /** As it was written, in µm or µin. */
  readonly value: Length;
  /** The drawing's own unit, in which it is compared; JSON of a length may lose it. */
  readonly unit: RoughnessUnit;
  /** The roughness parameter. */
  readonly parameter: RoughnessParameter;
  /** True where the note says max: the maximum rule holds. */
  readonly max: boolean;
  /** Ra in the drawing's own unit: `value` itself, or for an RMS note `value / 1.11`. */
  readonly ra: Length;
  /** The very same Ra in the other unit: exact, never a rounded partner. */
  readonly converted: Length;
  /** The first-choice partner in the other unit; `null` where the value is no first-choice value of its own unit. */
  readonly pair: Length | null;
  /** The partner of a second-choice value in the inch series; `null` elsewhere. */
  readonly secondChoicePair: Length | null;
  /** Roughness grade number such as `"N7"`; `null` where the value has none. */
  readonly grade: string | null;
  /** The next smoother preferred values. */
  readonly finer: PreferredNeighbour;
  /** The next rougher preferred values. */
  readonly coarser: PreferredNeighbour;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/** A roughness as bare data: what comes back from JSON or a worker. */
export interface RoughnessData {
  /** The number as it stands, with its unit. */
  readonly value: LengthLike;
  /** That of `value` unless said otherwise: metric lengths go by µm, inch lengths by µin. */
  readonly unit?: RoughnessUnit;
  /** The roughness parameter. */
  readonly parameter?: RoughnessParameter;
  /** True for the maximum rule. */
  readonly max?: boolean;
}

/** What functions take for a roughness: a {@link Roughness}, its data, a length, or a text with its unit. */
export type RoughnessLike = RoughnessData | LengthData | string;
