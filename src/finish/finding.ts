import type { Basis, BasisStep } from "../basis.js";

/** What a finding about a finish can be; a code never changes its meaning. */
export type FinishFindingCode =
  | "FINISH_TOO_COARSE_FOR_TOLERANCE"
  | "FINISH_TOO_COARSE_FOR_FUNCTION"
  | "FINISH_TOO_FINE_FOR_FUNCTION"
  | "FINISH_NEEDS_LOWER_LIMIT"
  | "FINISH_FINER_THAN_NEEDED"
  | "PROCESS_DOES_NOT_REACH_FINISH"
  | "PROCESS_SELDOM_REACHES_FINISH"
  | "PROCESS_FINER_THAN_FINISH_NEEDS"
  | "PROCESS_DOES_NOT_REACH_GRADE"
  | "PROCESS_GRADE_DISPUTED"
  | "PROCESS_FINER_THAN_GRADE_NEEDS";

/** Something about a finish, its tolerance, function or process that a person should look at. */
export interface FinishFinding {
  /** Stable code; never changes its meaning. */
  readonly code: FinishFindingCode;
  /** The finding in words and figures. */
  readonly says: string;
  /** Where it comes from. */
  readonly basis: Basis;
}

/** Makes a finding. */
export function finding(code: FinishFindingCode, says: string, basis: readonly BasisStep[]): FinishFinding {
  return Object.freeze({ code, says, basis: Object.freeze([...basis]) });
}
