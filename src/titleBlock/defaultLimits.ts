import { ownValue } from "../ownValue.js";
import type { AngleData, WrittenDimensionLike } from "../units/index.js";
import { defaultAngle } from "./defaultAngle.js";
import { defaultLength } from "./defaultLength.js";
import type {
  DefaultAngleLimits,
  DefaultLengthLimits,
  DefaultLimits,
  DefaultLimitsOptions,
  OtherRequestLike,
  PlainAngleLike,
  PlainSizeLike,
} from "./defaultValue.js";
import { waysOf } from "./defaultWays.js";
import { readDefaultSize } from "./readDefaultSize.js";
import type { DefaultSizeLike } from "./readDefaultSize.js";
import { featureOf } from "./sizeFeature.js";
import { titleBlock } from "./titleBlock.js";
import type { TitleBlock, TitleBlockSpec } from "./titleBlockValue.js";

/**
 * Gives a bare size the default tolerance that the title block has for the way it is written.
 *
 * The number of decimals decides, so the text goes in: `2.5` and `2.500` are different sizes to a title block. A line
 * of the block goes before its general standard: first the lines for diameters or lengths, then those for all sizes,
 * then `general`. `castings` and `weldments` apply where `process` says so, or where the block has nothing else; where
 * more than one could apply, the process has to be said.
 *
 * @param block - the title block, or what {@link titleBlock} takes
 * @param size - the text as written (a decimal, an inch fraction, or an angle in degrees; ⌀ or R before it allowed),
 *   what `readDimension` or `readAngle` made of it, or a request of a callout
 * @param options - what the text cannot say: `feature`, `shorterLeg` of an angle (any unit), `process`, see
 *   {@link DefaultLimitsOptions}
 * @returns frozen limits in the unit of the size (or of the angle, in degrees), with the line that applied and cautions
 * @throws `TITLE_BLOCK_NO_LINE` where the block has no line for it, `TITLE_BLOCK_NOT_APPLICABLE` for reference, basic
 *   and stock dimensions, single limits, threads, sizes with a tolerance of their own, and sizes in another unit than
 *   the lines, `TITLE_BLOCK_OPTION_NEEDED` where the text is not enough, `GENERAL_TOLERANCE_OUT_OF_RANGE` and
 *   `GENERAL_TOLERANCE_NOT_DEFINED` where the standard has no value, `OPTION_INVALID`, and what `readDimension`
 *   and {@link titleBlock} throw
 * @example
 * ```ts
 * import { defaultLimits, mm } from "limitsmith";
 *
 * const block = { unit: "in", decimals: { 2: "±.01", 3: "±.005" } } as const;
 * const found = defaultLimits(block, "3.125");
 * found.line; // → "3 decimals: ±0.005 in"
 * found.limits.max.toString(); // → "3.13 in"
 * defaultLimits(block, "(3.125)"); // throws TITLE_BLOCK_NOT_APPLICABLE
 *
 * const metric = { unit: "mm", general: "ISO 2768-mK" } as const;
 * defaultLimits(metric, "⌀25").line; // → "ISO 2768-mK: ±0.2 mm"
 * defaultLimits(metric, "45°", { shorterLeg: mm(50) }).limits.min.toString(); // → "44.5°"
 * defaultLimits(metric, "R2"); // throws TITLE_BLOCK_OPTION_NEEDED
 * ```
 * @reference ASME Y14.5-2018, 5.1.1 (general tolerances in a note or title block), from memory; ISO 2768-1:1989,
 *   ISO 8062-3:2007 and ISO 13920:2023 where the block calls them; the order of the lines is this library's choice
 */
export function defaultLimits(
  block: TitleBlock | TitleBlockSpec,
  size: WrittenDimensionLike | PlainSizeLike,
  options?: DefaultLimitsOptions,
): DefaultLengthLimits;
export function defaultLimits(
  block: TitleBlock | TitleBlockSpec,
  size: AngleData | PlainAngleLike,
  options?: DefaultLimitsOptions,
): DefaultAngleLimits;
export function defaultLimits(
  block: TitleBlock | TitleBlockSpec,
  size: string | OtherRequestLike,
  options?: DefaultLimitsOptions,
): DefaultLimits;
export function defaultLimits(
  block: TitleBlock | TitleBlockSpec,
  size: DefaultSizeLike,
  options?: DefaultLimitsOptions,
): DefaultLimits {
  const checked = titleBlock(block);
  const feature = featureOf(options);
  const ways = waysOf(options);
  const asked = readDefaultSize(checked, size);
  if (asked.kind === "angle") return defaultAngle(checked, asked.angle, ways, ownValue(options, "shorterLeg"));
  return defaultLength(checked, asked, feature, ways);
}
