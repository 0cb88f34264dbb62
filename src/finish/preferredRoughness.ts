import { LimitsError } from "../errors.js";
import type { Length } from "../units/index.js";
import { allPreferredValues, firstChoiceValues, umLength } from "./preferredValues.js";
import type { RoughnessUnit } from "./roughnessValue.js";
import { RZ_SERIES_UM } from "./tables/preferredRoughness.js";

/** The preferred values of one unit. */
export interface PreferredRoughness {
  /** The twelve values N1 to N12, finest first. */
  readonly firstChoice: readonly Length[];
  /** All preferred values of Ra, finest first: R10 in µm; in µin the series of ASME B46.1, from memory. */
  readonly all: readonly Length[];
  /** First-choice values of Rz, from memory; an empty list for µin. */
  readonly rz: readonly Length[];
}

/**
 * The preferred roughness values of a unit.
 *
 * @param unit - `"um"` or `"uin"`
 * @returns frozen lists of lengths in that unit, finest first
 * @throws `OPTION_INVALID` for another unit
 * @example
 * ```ts
 * import { preferredRoughness } from "limitsmith";
 *
 * preferredRoughness("uin").firstChoice.map((one) => one.to("uin")).slice(4, 8); // → [16, 32, 63, 125]
 * ```
 * @reference ISO 468:1982 (R10, every third term first choice); ASME B46.1, recommended Ra values, from memory
 */
export function preferredRoughness(unit: RoughnessUnit): PreferredRoughness {
  const given: unknown = unit;
  if (given !== "um" && given !== "uin") {
    throw new LimitsError("OPTION_INVALID", "not a unit of roughness", { value: given, allowed: "um, uin" });
  }
  return Object.freeze({
    firstChoice: Object.freeze(firstChoiceValues(given)),
    all: Object.freeze(allPreferredValues(given)),
    rz: Object.freeze(given === "um" ? RZ_SERIES_UM.map(umLength) : []),
  });
}
