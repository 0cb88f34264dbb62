import type { Basis } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import type { Length } from "../units/index.js";
import { RULE_TEXTS, acceptanceRule } from "./acceptanceRule.js";
import type { RoughnessRule, TextureStandard } from "./acceptanceRule.js";
import { asRoughness } from "./asRoughness.js";
import type { Roughness, RoughnessLike } from "./roughnessValue.js";

/** Limits, measured values, and the rule. */
export interface AcceptanceQuestion {
  /** Upper limit; a single value on a drawing is one. */
  readonly upper?: RoughnessLike;
  /** Lower limit, where the drawing has two values. */
  readonly lower?: RoughnessLike;
  /** Measured values, 1 to 10 000, in any unit. */
  readonly values: readonly RoughnessLike[];
  /** The rule by name; by `standard` unless given. */
  readonly rule?: RoughnessRule;
  /** Standard of the drawing, for its default rule. */
  readonly standard?: TextureStandard;
}

/** Whether measured values keep a limit. */
export interface RoughnessAcceptance {
  /** True where the surface passes. */
  readonly accepted: boolean;
  /** The rule of acceptance. */
  readonly rule: RoughnessRule;
  /** The limits in the drawing's own unit, exactly. */
  readonly upper: Length | null;
  /** Lower limit of roughness, where there is one. */
  readonly lower: Length | null;
  /** Number of measured values. */
  readonly measured: number;
  /** How many of them lie over the upper limit. */
  readonly over: number;
  /** How many of them lie under the lower limit. */
  readonly under: number;
  /** The rule and the count, in words. */
  readonly says: string;
  /** Where it comes from. */
  readonly basis: Basis;
}

const MOST_VALUES = 10_000;

/**
 * Judges measured roughness values against the limits of a drawing, in the drawing's own unit, by the 16 % rule or the
 * maximum rule.
 *
 * @param question - `upper`, `lower` or both, `values`, and `rule` or `standard`; lengths with their units
 * @returns the frozen verdict with the counts; limits in µm or µin as the drawing has them, a value on a limit passes
 * @throws `OPTION_INVALID` where no limit, no rule or no value is given, `LIMITS_UPSIDE_DOWN`, and what {@link asRoughness}
 *   throws
 * @example
 * ```ts
 * import { acceptRoughness } from "limitsmith";
 *
 * const values = ["1.4 µm", "1.5 µm", "1.3 µm", "1.7 µm", "1.5 µm", "1.4 µm", "1.2 µm"];
 * acceptRoughness({ upper: "1.6 µm", values, standard: "ISO 1302:2002" }).accepted; // → true
 * acceptRoughness({ upper: "1.6 µm max", values, standard: "ISO 1302:2002" }).accepted; // → false
 * acceptRoughness({ upper: "32 µin", values: ["0.81 µm"], rule: "maximum" }).accepted; // → true
 * ```
 * @reference ISO 4288:1996 and ISO 1302:2002, 6.4 (16 % and max rule); ISO 21920-1:2021
 */
export function acceptRoughness(question: AcceptanceQuestion): RoughnessAcceptance {
  const upper = limitOf(question, "upper");
  const lower = limitOf(question, "lower");
  if (upper === null && lower === null) {
    throw new LimitsError("OPTION_INVALID", "there is no limit to judge by", { allowed: "upper, lower, or both" });
  }
  if (upper !== null && lower !== null && upper.ra.ticks < lower.ra.ticks) {
    throw new LimitsError("LIMITS_UPSIDE_DOWN", "the upper limit lies below the lower one", {
      value: `${upper.ra.toString()} / ${lower.ra.toString()}`,
    });
  }
  const { rule, basis } = ruleOf(question, upper?.max === true || lower?.max === true);
  const values = valuesOf(ownValue(question, "values"));
  const over = upper === null ? 0 : values.filter((one) => one > upper.ra.ticks).length;
  const under = lower === null ? 0 : values.filter((one) => one < lower.ra.ticks).length;
  const most = rule === "maximum" ? 0 : Math.floor((16 * values.length) / 100);
  return Object.freeze({
    accepted: over <= most && under <= most,
    rule,
    upper: upper?.ra ?? null,
    lower: lower?.ra ?? null,
    measured: values.length,
    over,
    under,
    says: `${RULE_TEXTS[rule]}; of ${values.length} values ${most} may pass a limit, ${over} lie over and ${under} under`,
    basis,
  });
}

function limitOf(question: AcceptanceQuestion, side: "upper" | "lower"): Roughness | null {
  const given = ownValue(question, side);
  return given === undefined ? null : asRoughness(given, [side]);
}

function ruleOf(question: AcceptanceQuestion, max: boolean): { rule: RoughnessRule; basis: Basis } {
  const rule: unknown = ownValue(question, "rule");
  const standard = ownValue(question, "standard");
  if (rule === undefined && standard !== undefined) return acceptanceRule(standard, { max });
  if (rule !== "16 %" && rule !== "maximum") {
    throw new LimitsError("OPTION_INVALID", "which rule holds depends on the drawing's standard and date", {
      value: rule,
      allowed: 'rule: "16 %" or "maximum", or the standard of the drawing',
    });
  }
  const says = `the ${rule} rule`;
  const step = Object.freeze({ standard: "the caller", place: "as given", says, how: "caller" as const });
  return { rule, basis: Object.freeze([step]) };
}

function valuesOf(given: unknown): readonly number[] {
  if (!Array.isArray(given) || given.length === 0 || given.length > MOST_VALUES) {
    throw new LimitsError("OPTION_INVALID", "measured values are needed, as a list", {
      value: given,
      allowed: `1 to ${MOST_VALUES} values, each with its unit`,
      path: ["values"],
    });
  }
  return given.map((one, index) => asRoughness(one as RoughnessLike, ["values", index]).ra.ticks);
}
