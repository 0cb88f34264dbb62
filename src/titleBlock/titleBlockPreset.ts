import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { INCH_PRESETS } from "./tables/inchPresets.js";
import { titleBlock } from "./titleBlock.js";
import type { TitleBlock, TitleBlockPresetName } from "./titleBlockValue.js";

/**
 * A title block of common practice, by its name. It is no standard and never a default: the block of the drawing
 * itself governs, and where it is missing the drafter has to be asked.
 *
 * Limits from its lines carry `common practice` in their basis and a caution. Lines of your own go in by
 * `{ ...titleBlockPreset("common inch"), angles: "±1°" }`.
 *
 * @param name - `"common inch"`: .1, .01, .005, .0005 in for one to four decimals, 1/64 in for fractions, no line for
 *   angles (±1° and ±0°30' are equally common); `"inch by diameter and length"`: one shop's published standard
 * @returns the frozen block, in inches
 * @throws `OPTION_INVALID` for a name that is not known
 * @example
 * ```ts
 * import { defaultLimits, titleBlockPreset } from "limitsmith";
 *
 * const block = titleBlockPreset("common inch");
 * const found = defaultLimits(block, "2.188");
 * found.limits.max.toString(); // → "2.193 in"
 * found.limits.basis[0]?.how; // → "common practice"
 * defaultLimits(block, "45°"); // throws TITLE_BLOCK_NO_LINE
 * ```
 * @reference common practice of inch title blocks, from trade discussions and from memory; a shop's published
 *   machining standard
 */
export function titleBlockPreset(name: TitleBlockPresetName): TitleBlock {
  const preset = ownValue(INCH_PRESETS, name);
  if (preset === undefined) {
    throw new LimitsError("OPTION_INVALID", "there is no such preset", {
      value: name,
      allowed: Object.keys(INCH_PRESETS).join(", "),
    });
  }
  return titleBlock({ ...preset.spec, preset: name });
}
