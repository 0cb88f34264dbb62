/** How a value came about. */
export type BasisHow = "tabulated" | "derived" | "common practice" | "caller";

/**
 * How sure a tabulated value is: how many published tables it was read in, whether
 * the standard's formula confirms it, or whether it is only remembered.
 */
export type Mark = "two-sources" | "one-source+formula" | "one-source" | "formula" | "memory" | "conflict";

/** The mark behind its sign in a table. */
export function markOf(sign: string | undefined): Mark {
  switch (sign) {
    case "2":
      return "two-sources";
    case "+":
      return "one-source+formula";
    case "1":
      return "one-source";
    case "f":
      return "formula";
    case "c":
      return "conflict";
    default:
      return "memory";
  }
}

/** One step of the reasons for a result: which document, where in it, what it says. */
export interface BasisStep {
  /** Standard with its edition, such as `ISO 286-1:2010`, or whose rule it is. */
  readonly standard: string;
  /** Table, row or clause. */
  readonly place: string;
  /** What stands there, in words and figures. */
  readonly says: string;
  /** Whether the value was tabulated, derived by the standard's rule, common practice, or the caller's own. */
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
  /** What to weigh, in words. */
  readonly says: string;
}
