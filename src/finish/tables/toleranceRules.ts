// Published rules between a tolerance of width T and the roughness of its surface, weakest first. Shares as ratios of
// whole numbers. Sources: a measuring-technique page (Rz < T/2); Machinery's Handbook, relation of surface roughness to
// tolerances, from memory (Ra < T/8: peak to valley taken as 4 Ra, two surfaces to a diameter); a mechanical engineer's
// design handbook, four lines by form tolerance with Ra and Rz twins.

import type { Mark } from "../../basis.js";

/** Names of the rules. */
export type ToleranceRuleName =
  | "Rz < T/2"
  | "Ra < T/8"
  | "form within 60 % of T"
  | "form within 40 % of T"
  | "form within 25 % of T"
  | "form under 25 % of T";

/** A share as numerator and denominator. */
export type Share = readonly [numerator: number, denominator: number];

/** One rule. */
export interface ToleranceRuleRow {
  readonly name: ToleranceRuleName;
  /** What the shares are taken of. */
  readonly of: "T" | "form";
  readonly ra: Share | null;
  readonly rz: Share | null;
  /** True for "less than", false for "not more than". */
  readonly below: boolean;
  readonly source: string;
  readonly mark: Mark;
  readonly says: string;
}

const HANDBOOK = "a mechanical engineer's design handbook, roughness for common tolerance classes";

/** All rules. */
export const TOLERANCE_RULES: readonly ToleranceRuleRow[] = [
  { name: "Rz < T/2", of: "T", ra: null, rz: [1, 2], below: true, source: "a measuring-technique page", mark: "one-source", says: "Rz stays below half of the tolerance" },
  { name: "Ra < T/8", of: "T", ra: [1, 8], rz: null, below: true, source: "Machinery's Handbook, relation of surface roughness to tolerances", mark: "memory", says: "from T/8 on the roughness alone fills the tolerance: peak to valley taken as 4 Ra, two surfaces to a diameter" },
  { name: "form within 60 % of T", of: "T", ra: [5, 100], rz: [2, 10], below: false, source: HANDBOOK, mark: "one-source", says: "Ra at most 0.05 T, Rz at most 0.2 T" },
  { name: "form within 40 % of T", of: "T", ra: [25, 1000], rz: [1, 10], below: false, source: HANDBOOK, mark: "one-source", says: "Ra at most 0.025 T, Rz at most 0.1 T" },
  { name: "form within 25 % of T", of: "T", ra: [12, 1000], rz: [5, 100], below: false, source: HANDBOOK, mark: "one-source", says: "Ra at most 0.012 T, Rz at most 0.05 T" },
  { name: "form under 25 % of T", of: "form", ra: [15, 100], rz: [6, 10], below: false, source: HANDBOOK, mark: "one-source", says: "Ra at most 0.15, Rz at most 0.6 times the form tolerance" },
];
