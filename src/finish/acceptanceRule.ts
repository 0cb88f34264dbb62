import type { Basis } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";

/** The two rules for accepting a surface. */
export type RoughnessRule = "16 %" | "maximum";

/** The standards whose default is known here. */
export type TextureStandard = "ISO 1302:2002" | "ISO 21920-1:2021";

/** Which rule a drawing means. */
export interface AcceptanceRule {
  /** The rule, by its name. */
  readonly rule: RoughnessRule;
  /** The rule in words. */
  readonly says: string;
  /** Where it comes from. */
  readonly basis: Basis;
}

/** The rules in words. */
export const RULE_TEXTS: Readonly<Record<RoughnessRule, string>> = {
  "16 %":
    "accepted when not more than 16 % of the measured values pass the limit: a share of the values, not an excess over " +
    "the limit",
  maximum: "no measured value on the whole surface may pass the limit",
};

/**
 * Which acceptance rule a roughness on a drawing means, by the drawing's standard and its date.
 *
 * @param standard - `"ISO 1302:2002"` (16 % rule unless the note says max) or `"ISO 21920-1:2021"` (maximum rule, from
 *   memory, reviewed once); no unit
 * @param options - `max`: true where the note says max
 * @returns the frozen rule with its meaning in words
 * @throws `OPTION_INVALID` for another standard
 * @example
 * ```ts
 * import { acceptanceRule } from "limitsmith";
 *
 * acceptanceRule("ISO 1302:2002").rule; // → "16 %"
 * acceptanceRule("ISO 1302:2002", { max: true }).rule; // → "maximum"
 * acceptanceRule("ISO 21920-1:2021").basis[0]?.mark; // → "memory"
 * ```
 * @reference ISO 1302:2002, 6.4; ISO 21920-1:2021, clause 4.2 and 4.3 (which is the default: from memory)
 */
export function acceptanceRule(standard: TextureStandard, options?: { readonly max?: boolean }): AcceptanceRule {
  const given: unknown = standard;
  if (given !== "ISO 1302:2002" && given !== "ISO 21920-1:2021") {
    throw new LimitsError("OPTION_INVALID", "the default rule of this standard is not known here", {
      value: given,
      allowed: "ISO 1302:2002, ISO 21920-1:2021; else name the rule: 16 % or maximum",
    });
  }
  const max = ownValue(options, "max") === true;
  const old = given === "ISO 1302:2002";
  const rule = old && !max ? "16 %" : "maximum";
  return Object.freeze({
    rule,
    says: RULE_TEXTS[rule],
    basis: Object.freeze([
      Object.freeze({
        standard: given,
        place: old ? "6.4" : "4.2 and 4.3",
        says: max ? "max behind the parameter: maximum rule" : `nothing marked: ${rule} rule`,
        how: "tabulated" as const,
        mark: old ? ("one-source" as const) : ("memory" as const),
      }),
    ]),
  });
}
