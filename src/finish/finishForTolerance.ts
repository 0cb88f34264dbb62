import type { Basis } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLength, lengthOfTicks, multiply } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { unitFor } from "./buildRoughness.js";
import { firstChoiceValues } from "./preferredValues.js";
import { TOLERANCE_RULES } from "./tables/toleranceRules.js";
import type { Share, ToleranceRuleName, ToleranceRuleRow } from "./tables/toleranceRules.js";

/** Options of {@link finishForTolerance}. */
export interface FinishForToleranceOptions {
  /** One rule by its name; unless said otherwise the two general ones and, with `form`, the line of that form tolerance. */
  readonly rule?: ToleranceRuleName;
  /** Form tolerance of the surface. */
  readonly form?: LengthLike;
}

/** What one rule allows. */
export interface AllowedFinish {
  /** The rule, by its name. */
  readonly rule: ToleranceRuleName;
  /** Limit of Ra in µm or µin; `null` where the rule speaks of Rz only. */
  readonly ra: Length | null;
  /** The largest first-choice Ra that keeps the rule; `null` where there is none. */
  readonly preferredRa: Length | null;
  /** Limit of Rz; `null` where the rule speaks of Ra only. */
  readonly rz: Length | null;
  /** True where the roughness must stay below the limit, false where it may equal it. */
  readonly below: boolean;
  /** Where it comes from. */
  readonly basis: Basis;
}

/**
 * The roughness that published rules allow beside a tolerance, each rule by its name.
 *
 * @param tolerance - the full width of the tolerance, over 0, any unit
 * @param options - `rule`: one of them by name; `form`: the form tolerance of the surface, any unit
 * @returns a frozen list, weakest rule first, with the limits in µm (µin for an inch tolerance)
 * @throws `OPTION_INVALID`, `LENGTH_INVALID`, `ROUGHNESS_INVALID` where the tolerance or form tolerance is not over 0
 * @example
 * ```ts
 * import { finishForTolerance } from "limitsmith";
 *
 * const [byRz, byRa] = finishForTolerance("21 µm");
 * byRz?.rz?.toString(); // → "10.5 µm"
 * [byRa?.rule, byRa?.ra?.toString(), byRa?.preferredRa?.toString()]; // → ["Ra < T/8", "2.625 µm", "1.6 µm"]
 * finishForTolerance("21 µm", { form: "8 µm" }).at(-1)?.rule; // → "form within 40 % of T"
 * ```
 * @reference Rz < T/2: a measuring-technique page; Ra < T/8: Machinery's Handbook, relation of surface roughness to
 *   tolerances, from memory; by form tolerance: a mechanical engineer's design handbook
 */
export function finishForTolerance(
  tolerance: LengthLike,
  options?: FinishForToleranceOptions,
): readonly AllowedFinish[] {
  const width = positive(tolerance, "tolerance");
  const formGiven = ownValue(options, "form");
  const form = formGiven === undefined ? null : positive(formGiven, "form");
  const named: unknown = ownValue(options, "rule");
  if (named !== undefined && !TOLERANCE_RULES.some((row) => row.name === named)) {
    throw new LimitsError("OPTION_INVALID", "not a rule between tolerance and roughness", {
      value: named,
      allowed: TOLERANCE_RULES.map((row) => row.name).join("; "),
    });
  }
  const names =
    named === undefined ? ["Rz < T/2", "Ra < T/8", ...(form === null ? [] : [lineFor(form, width)])] : [named];
  const rows = TOLERANCE_RULES.filter((row) => names.includes(row.name));
  return Object.freeze(rows.map((row) => allowed(row, width, form)));
}

/** The line of the rules by form tolerance that a form tolerance falls into, the ends as printed. */
function lineFor(form: Length, width: Length): ToleranceRuleName {
  const hundredfold = form.ticks * 100;
  if (hundredfold < 25 * width.ticks) return "form under 25 % of T";
  if (hundredfold === 25 * width.ticks) return "form within 25 % of T";
  return hundredfold <= 40 * width.ticks ? "form within 40 % of T" : "form within 60 % of T";
}

function allowed(row: ToleranceRuleRow, width: Length, form: Length | null): AllowedFinish {
  const base = row.of === "form" ? form : width;
  if (base === null) {
    throw new LimitsError("OPTION_INVALID", "this rule needs the form tolerance", {
      value: row.name,
      allowed: "the option form, a length with its unit",
    });
  }
  const limit = (share: Share | null): Length | null =>
    share === null ? null : inRoughnessUnit(multiply(base, { numerator: share[0], denominator: share[1] }));
  const ra = limit(row.ra);
  return Object.freeze({
    rule: row.name,
    ra,
    preferredRa: ra === null ? null : preferredUnder(ra, row.below),
    rz: limit(row.rz),
    below: row.below,
    basis: Object.freeze([
      Object.freeze({
        standard: row.source,
        place: row.name,
        says: row.says,
        how: "common practice" as const,
        mark: row.mark,
      }),
    ]),
  });
}

function preferredUnder(ra: Length, below: boolean): Length | null {
  const fits = (one: Length): boolean => (below ? one.ticks < ra.ticks : one.ticks <= ra.ticks);
  return firstChoiceValues(unitFor(ra)).filter(fits).at(-1) ?? null;
}

function inRoughnessUnit(length: Length): Length {
  return lengthOfTicks(length.ticks, unitFor(length));
}

function positive(value: LengthLike, name: string): Length {
  const length = asLength(value, [name]);
  if (length.ticks <= 0) {
    throw new LimitsError("ROUGHNESS_INVALID", "a tolerance beside a roughness is over zero", {
      value: length.toString(),
      path: [name],
    });
  }
  return length;
}
