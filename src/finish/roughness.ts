import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import type { DecimalMark } from "../units/index.js";
import { asRoughness } from "./asRoughness.js";
import { buildRoughness } from "./buildRoughness.js";
import { readRoughness } from "./readRoughness.js";
import type { Roughness, RoughnessLike, RoughnessUnit } from "./roughnessValue.js";

/** Options of {@link roughness}. */
export interface RoughnessOptions {
  /** The unit of a number that carries none, as a drawing's general note gives it; refused without it. */
  readonly unit?: RoughnessUnit;
  /** The decimal mark of the text; `"."` unless said otherwise. */
  readonly decimalMark?: DecimalMark;
}

/**
 * Reads a surface roughness as drawings write it.
 *
 * @param text - `"63 µin"`, `"1.6 µm"`, `"Ra 63"` with the option `unit`, `"N7"`, `"AA"` and `"CLA"` for Ra,
 *   `"63 µin RMS"` for old notes, `"… max"` for the maximum rule; or what {@link asRoughness} takes; over 0 up to 1 mm
 * @param options - `unit`: `"um"` or `"uin"`, for numbers that carry no unit; `decimalMark`
 * @returns the frozen roughness: Ra as an exact length in its own unit, the exact conversion and the preferred partner
 *   in the other unit kept apart, grade, neighbours in the preferred series, cautions
 * @throws `ROUGHNESS_INVALID`, `ROUGHNESS_PARAMETER_UNKNOWN`, `ROUGHNESS_GRADE_UNKNOWN`, `UNIT_MISSING`, `OPTION_INVALID`,
 *   `TEXT_TOO_LONG`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { roughness } from "limitsmith";
 *
 * const finish = roughness("63 µin");
 * finish.converted.toString(); // → "1.6002 µm"
 * finish.pair?.toString(); // → "1.6 µm"
 * finish.grade; // → "N7"
 * finish.finer.firstChoice?.toString(); // → "32 µin"
 * roughness("Ra 63", { unit: "uin" }).ra.to("uin"); // → 63
 * roughness("Ra 63"); // throws UNIT_MISSING
 * ```
 * @reference 1 µin = 0.0254 µm exactly; ISO 468:1982 (R10 series) and ASME B46.1 (inch series) for preferred values;
 *   grade numbers as in use before ISO 1302:2002
 */
export function roughness(text: RoughnessLike, options?: RoughnessOptions): Roughness {
  const unit: unknown = ownValue(options, "unit");
  if (unit !== undefined && unit !== "um" && unit !== "uin") {
    throw new LimitsError("OPTION_INVALID", "not a unit of roughness", { value: unit, allowed: "um, uin" });
  }
  if (typeof text !== "string") return asRoughness(text);
  return buildRoughness(readRoughness(text, unit, ownValue(options, "decimalMark")));
}
