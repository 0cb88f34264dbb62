import type { BasisStep, Mark } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLength, lengthOfTicks, multiply } from "../units/index.js";
import type { Length, LengthLike, Ratio } from "../units/index.js";
import { asLimits } from "./asLimits.js";
import type { LimitsLike } from "./limitsValue.js";

/**
 * Decision rules by name:
 *
 * - `"simple acceptance"`: no guard band, two verdicts; the uncertainty is not used
 * - `"ISO 14253-1:2013"`: guard band of the expanded uncertainty U (k = 2)
 * - `"ISO 14253-1:2017"`: guard band of 0.83 U (1.65 u), a conformance probability of 95 %
 */
export type DecisionRule = "simple acceptance" | "ISO 14253-1:2013" | "ISO 14253-1:2017";

/** `"not proven"`: within the guard band of a limit, neither conformity nor nonconformity is proved. */
export type Verdict = "pass" | "fail" | "not proven";

/** Options of {@link judgeMeasurement}. */
export interface JudgeOptions {
  /** The rule, by its name. */
  readonly rule: DecisionRule;
  /** Expanded uncertainty U (k = 2), any unit; needed by the rules with a guard band. */
  readonly uncertainty?: LengthLike;
}

/** A reading judged against limits. */
export interface Judgement {
  /** The verdict by the rule. */
  readonly verdict: Verdict;
  /** The rule, by its name. */
  readonly rule: DecisionRule;
  /** The reading as it was given. */
  readonly reading: Length;
  /** Guard band at each limit. */
  readonly guardBand: Length;
  /** Readings in here pass; `null` where the guard bands leave none. */
  readonly acceptance: { readonly max: Length; readonly min: Length } | null;
  /** Readings outside of this fail. */
  readonly rejection: { readonly max: Length; readonly min: Length };
  /** Room to the nearer limit: positive inside the limits, negative outside. */
  readonly margin: Length;
  /** Where it comes from. */
  readonly basis: readonly BasisStep[];
}

interface Rule {
  readonly factor: Ratio;
  readonly place: string;
  readonly mark: Mark;
}

const RULES: ReadonlyMap<string, Rule> = new Map<string, Rule>([
  ["simple acceptance", { factor: { numerator: 0, denominator: 1 }, place: "guard band 0", mark: "two-sources" }],
  ["ISO 14253-1:2013", { factor: { numerator: 1, denominator: 1 }, place: "guard band U (k = 2)", mark: "memory" }],
  ["ISO 14253-1:2017", { factor: { numerator: 83, denominator: 100 }, place: "guard band 0.83 U", mark: "memory" }],
]);

/**
 * Judges a reading against limits by a named decision rule; the reading is compared as it is, never rounded.
 *
 * Drawing limits are absolute: the guard band is a decision of the inspection and does not change them.
 *
 * @param limits - limits of the size, any unit
 * @param reading - what was measured, any unit
 * @param options - `rule` by name, and `uncertainty` U (k = 2, any unit) where the rule has a guard band
 * @returns the frozen judgement: verdict, acceptance and rejection limits, guard band and margin in the limits' unit
 * @throws `OPTION_INVALID` for an unknown rule, or a missing or negative uncertainty, `LENGTH_INVALID`, and what
 *   {@link asLimits} throws
 * @example
 * ```ts
 * import { judgeMeasurement, limits } from "limitsmith";
 *
 * const seat = limits({ nominal: "35 mm", upper: "18 µm", lower: "2 µm" });
 * judgeMeasurement(seat, "35.019 mm", { rule: "simple acceptance" }).verdict; // → "fail"
 * const near = judgeMeasurement(seat, "35.017 mm", { rule: "ISO 14253-1:2013", uncertainty: "2 µm" });
 * near.verdict; // → "not proven"
 * near.acceptance?.max.toString(); // → "35.016 mm"
 * ```
 * @reference ISO 14253-1:2013 and 2017 (guard bands from memory); ASME Y14.5-2018, 5.4 (limits are absolute), from memory
 */
export function judgeMeasurement(limits: LimitsLike, reading: LengthLike, options: JudgeOptions): Judgement {
  const { max, min } = asLimits(limits);
  const measured = asLength(reading, ["reading"]);
  const name = ownValue(options, "rule");
  const rule = RULES.get(name ?? "");
  if (name === undefined || rule === undefined) {
    throw new LimitsError("OPTION_INVALID", "a decision rule is chosen by name", {
      value: name,
      allowed: [...RULES.keys()].join(", "),
    });
  }
  const guard = guardBand(rule, ownValue(options, "uncertainty"), max.unit);
  const at = (ticks: number): Length => lengthOfTicks(ticks, max.unit);
  const inner = { max: max.ticks - guard.ticks, min: min.ticks + guard.ticks };
  const outer = { max: max.ticks + guard.ticks, min: min.ticks - guard.ticks };
  const { ticks } = measured;
  const verdict: Verdict =
    ticks >= inner.min && ticks <= inner.max ? "pass" : isOutside(ticks, outer, guard.ticks) ? "fail" : "not proven";
  return Object.freeze({
    verdict,
    rule: name,
    reading: measured,
    guardBand: guard,
    acceptance: inner.max < inner.min ? null : Object.freeze({ max: at(inner.max), min: at(inner.min) }),
    rejection: Object.freeze({ max: at(outer.max), min: at(outer.min) }),
    margin: at(Math.min(max.ticks - ticks, ticks - min.ticks)),
    basis: Object.freeze([
      Object.freeze({
        standard: name === "simple acceptance" ? "ILAC-G8:09/2019" : name,
        place: rule.place,
        says: `guard band ${guard.toString()} at each limit`,
        how: "tabulated" as const,
        mark: rule.mark,
      }),
    ]),
  });
}

/** "Outside by at least U" proves nonconformity; without a guard band the limit itself still passes. */
function isOutside(ticks: number, outer: { readonly max: number; readonly min: number }, guard: number): boolean {
  return guard === 0 ? ticks > outer.max || ticks < outer.min : ticks >= outer.max || ticks <= outer.min;
}

function guardBand(rule: Rule, uncertainty: LengthLike | undefined, unit: Length["unit"]): Length {
  if (rule.factor.numerator === 0) return lengthOfTicks(0, unit);
  if (uncertainty === undefined) {
    throw new LimitsError("OPTION_INVALID", "this rule needs the expanded uncertainty", {
      allowed: "uncertainty: U at k = 2, a length",
      path: ["uncertainty"],
    });
  }
  const value = asLength(uncertainty, ["uncertainty"]);
  if (value.ticks < 0) {
    throw new LimitsError("OPTION_INVALID", "an uncertainty is not negative", {
      value: value.toString(),
      path: ["uncertainty"],
    });
  }
  return multiply(lengthOfTicks(value.ticks, unit), rule.factor);
}
