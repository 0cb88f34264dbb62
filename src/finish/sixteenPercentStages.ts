import type { Basis } from "../basis.js";
import { LimitsError } from "../errors.js";
import { asRoughness } from "./asRoughness.js";
import type { RoughnessLike } from "./roughnessValue.js";

/** How far the short procedure has come. */
export interface StagedAcceptance {
  /** What the stage decides. */
  readonly decision: "accepted" | "rejected" | "measure more";
  /** Number of values that the decision rests on. */
  readonly after: number;
  /** The stage that decided, in words. */
  readonly says: string;
  /** Where it comes from. */
  readonly basis: Basis;
}

/**
 * The short procedure of the 16 % rule on an upper limit: measuring stops at the first stage that is kept.
 *
 * Stages: the first value at or under 70 % of the limit; the first three all within; at most one of six outside; at
 * most two of twelve outside. All from memory.
 *
 * @param upper - upper limit of Ra with its unit
 * @param values - measured values in the order of measuring, with their units; more than twelve are not looked at
 * @returns the frozen decision (no unit)
 * @throws `OPTION_INVALID` without a value, and what {@link asRoughness} throws
 * @example
 * ```ts
 * import { sixteenPercentStages } from "limitsmith";
 *
 * sixteenPercentStages("0.8 µm", ["0.5 µm"]).after; // → 1
 * sixteenPercentStages("0.8 µm", ["0.7 µm", "0.75 µm"]).decision; // → "measure more"
 * sixteenPercentStages("0.8 µm", ["0.7 µm", "0.82 µm", "0.7 µm", "0.7 µm", "0.7 µm", "0.7 µm"]).decision; // → "accepted"
 * ```
 * @reference ISO 4288:1996, annex, from memory
 */
export function sixteenPercentStages(upper: RoughnessLike, values: readonly RoughnessLike[]): StagedAcceptance {
  const limit = asRoughness(upper, ["upper"]).ra.ticks;
  const given: unknown = values;
  if (!Array.isArray(given) || given.length === 0) {
    throw new LimitsError("OPTION_INVALID", "measured values are needed, as a list", {
      value: given,
      path: ["values"],
    });
  }
  const measured = given
    .slice(0, 12)
    .map((one, index) => asRoughness(one as RoughnessLike, ["values", index]).ra.ticks);
  const outside = (count: number): number => measured.slice(0, count).filter((one) => one > limit).length;
  const has = (count: number): boolean => measured.length >= count;

  if ((measured[0] ?? Infinity) * 10 <= limit * 7)
    return decided("accepted", 1, "first value at or under 70 % of the limit");
  if (has(3) && outside(3) === 0) return decided("accepted", 3, "first three values within the limit");
  if (has(6) && outside(6) <= 1) return decided("accepted", 6, "at most one of six values outside");
  if (has(12) && outside(12) <= 2) return decided("accepted", 12, "at most two of twelve values outside");
  if (outside(12) > 2)
    return decided("rejected", measured.length, "more than two values outside: no stage can be kept");
  return decided("measure more", measured.length, "no stage is kept yet");
}

function decided(decision: StagedAcceptance["decision"], after: number, says: string): StagedAcceptance {
  const step = Object.freeze({
    standard: "ISO 4288:1996",
    place: "annex, short procedure of the 16 % rule",
    says,
    how: "tabulated" as const,
    mark: "memory" as const,
  });
  return Object.freeze({ decision, after, says, basis: Object.freeze([step]) });
}
