import { LimitsError } from "../errors.js";
import { atPath } from "../located.js";
import { ownValue } from "../ownValue.js";
import { asLength, lengthOfTicks } from "../units/index.js";
import type { LengthData, LengthLike } from "../units/index.js";
import { buildRoughness, unitFor } from "./buildRoughness.js";
import { readRoughness } from "./readRoughness.js";
import type { Roughness, RoughnessData, RoughnessLike } from "./roughnessValue.js";

/**
 * Takes a roughness in any shape it can travel in.
 *
 * @param value - a {@link Roughness}, its data, a length in any unit, or a text with its unit such as `"Ra 1.6 µm"`;
 *   over 0 up to 1 mm
 * @param path - keys that lead to the value in the caller's data, for the error
 * @returns the frozen roughness, in µm or µin as it was written
 * @throws `ROUGHNESS_INVALID`, `ROUGHNESS_PARAMETER_UNKNOWN`, `ROUGHNESS_GRADE_UNKNOWN`, `UNIT_MISSING`, and what
 *   `readLength` throws for a text
 * @example
 * ```ts
 * import { asRoughness, microinch, roughness } from "limitsmith";
 *
 * const sent = JSON.parse(JSON.stringify(roughness("Ra 32 µin max")));
 * asRoughness(sent).max; // → true
 * asRoughness(microinch(32)).grade; // → "N6"
 * ```
 * @reference none: a convenience of this library
 */
export function asRoughness(value: RoughnessLike, path: readonly (string | number)[] = []): Roughness {
  return atPath(path, () => {
    if (typeof value === "string") return buildRoughness(readRoughness(value, undefined, undefined));
    const given: unknown = value;
    if (typeof given !== "object" || given === null) throw invalid(given);
    if (ownValue(value as RoughnessData, "value") !== undefined) return fromData(value as RoughnessData);
    if (ownValue(value as LengthData, "ticks") === undefined) throw invalid(given);
    return buildRoughness({ value: asLength(value as LengthData), parameter: "Ra", max: false, grade: null });
  });
}

function fromData(data: RoughnessData): Roughness {
  const value = asLength(ownValue(data, "value") as LengthLike, ["value"]);
  const unit: unknown = ownValue(data, "unit") ?? unitFor(value);
  const parameter: unknown = ownValue(data, "parameter") ?? "Ra";
  const max: unknown = ownValue(data, "max") ?? false;
  if (unit !== "um" && unit !== "uin") {
    throw new LimitsError("UNIT_UNKNOWN", "not a unit of roughness", {
      value: unit,
      allowed: "um, uin",
      path: ["unit"],
    });
  }
  if (parameter !== "Ra" && parameter !== "RMS") {
    throw new LimitsError("ROUGHNESS_PARAMETER_UNKNOWN", "not a parameter that gives an Ra", {
      value: parameter,
      allowed: "Ra, RMS",
      path: ["parameter"],
    });
  }
  if (typeof max !== "boolean") {
    throw new LimitsError("ROUGHNESS_INVALID", "max is true or false", { value: max, path: ["max"] });
  }
  return buildRoughness({ value: lengthOfTicks(value.ticks, unit), parameter, max, grade: null });
}

function invalid(value: unknown): LimitsError {
  return new LimitsError("ROUGHNESS_INVALID", "a roughness is needed here", {
    value,
    allowed: 'a text with its unit such as "Ra 1.6 µm", "63 µin" or "N7", a length, or a Roughness',
  });
}
