/** How a value came about. */
export type BasisHow = "tabulated" | "derived" | "common practice" | "caller";

/**
 * How sure the transcription of a tabulated value is: how many published tables it was read in, whether
 * the standard's formula confirms it, or whether it is only remembered.
 */
export type Mark = "two-sources" | "one-source+formula" | "one-source" | "formula" | "memory" | "conflict";

/** One step of the reasons for a result: which document, where in it, what it says. */
export interface BasisStep {
  /** Standard with its edition, such as `ISO 286-1:2010`, or whose rule it is. */
  readonly standard: string;
  /** Table, row or clause. */
  readonly place: string;
  /** What stands there, in words and figures. */
  readonly says: string;
  readonly how: BasisHow;
  /** How sure a tabulated value is; absent where nothing was read from a table. */
  readonly mark?: Mark;
}

/** A list of steps; part of the result, not a log. */
export type Basis = readonly BasisStep[];

/** Something a person should weigh before relying on a result. */
export interface Caution {
  /** Stable code; never changes its meaning. */
  readonly code: string;
  readonly says: string;
}
