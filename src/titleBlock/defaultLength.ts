import { LimitsError } from "../errors.js";
import { symmetricLimits } from "../limits/index.js";
import { asLength, compareLengths } from "../units/index.js";
import type { Length, WrittenDimensionLike } from "../units/index.js";
import { blockLine, hasLines, lineName, lineStep } from "./blockLine.js";
import type { LineGroup } from "./blockLine.js";
import type { DefaultLengthLimits, SizeFeature } from "./defaultValue.js";
import { largerRule, machinedStandard, noLine, onlyWay, standardOfWay, standardStep } from "./defaultWays.js";
import type { Way } from "./defaultWays.js";
import { lineCautions } from "./generalCautions.js";
import type { SizeMark } from "./readDefaultSize.js";
import { sizeByStandard } from "./sizeByStandard.js";
import type { KnownFeature } from "./sizeFeature.js";
import type { TitleBlock } from "./titleBlockValue.js";

/** A size with all that its default hangs on. */
interface Size {
  readonly written: WrittenDimensionLike;
  readonly length: Length;
  readonly feature: KnownFeature;
  /** Which lines it falls to; `null` where it may be a diameter or not. */
  readonly group: Exclude<LineGroup, ""> | null;
}

/** Gives a length its default, by the ways that were asked for or by the only one that the block can mean. */
export function defaultLength(
  block: TitleBlock,
  { written, mark }: { readonly written: WrittenDimensionLike; readonly mark: SizeMark },
  feature: SizeFeature,
  asked: readonly Way[] | null,
): DefaultLengthLimits {
  const size = sizeOf(written, mark, feature);
  const possible: Way[] = [];
  if (hasLines(block) || machinedStandard(block) !== null) possible.push("machined");
  if (block.castings !== null) possible.push("cast");
  if (block.weldments !== null) possible.push("welded");
  const ways = asked ?? onlyWay(block, size.length.toString(), possible);
  const [first, second] = ways.map((way) => byWay(block, size, way)) as [DefaultLengthLimits, DefaultLengthLimits?];
  return second === undefined ? first : larger(first, second);
}

/** Puts the mark of the text and the feature of the options together; where they contradict, refuses. */
function sizeOf(written: WrittenDimensionLike, mark: SizeMark, feature: SizeFeature): Size {
  const length = asLength(written.length);
  const known = feature === "size" && (mark === "diameter" || mark === "radius") ? mark : feature;
  const isRadius = known === "radius" || known === "internal radius" || known === "external radius or chamfer";
  if ((mark === "diameter" && known !== "diameter") || (mark === "radius" && !isRadius)) {
    throw new LimitsError("OPTION_INVALID", `the size is marked as a ${mark}`, {
      value: feature,
      allowed: "a feature that agrees with the mark",
      path: ["feature"],
    });
  }
  const group = known === "diameter" ? "diameters" : known === "size" && mark === null ? null : "lengths";
  return { written, length, feature: known, group };
}

function byWay(block: TitleBlock, size: Size, way: Way): DefaultLengthLimits {
  const line = way === "machined" ? byLine(block, size) : null;
  if (line !== null) return line;
  const called = standardOfWay(block, way);
  if (called !== null) return sizeByStandard(size.length, called, size.feature, standardStep(called));
  const { written, length } = size;
  if (way !== "machined") throw noLine(block, written.text, way === "cast" ? "castings" : "weldments");
  if (length.unit === block.unit) {
    throw noLine(block, written.text, lineName("", written.form === "fraction" ? "fractions" : `${written.places}`));
  }
  throw new LimitsError("TITLE_BLOCK_NOT_APPLICABLE", "the size is in another unit than the title block", {
    value: length.toString(),
    allowed: `sizes in ${block.unit}, or a tolerance of its own`,
  });
}

/** By a line of the block; `null` where it has none for such a size. Lines are for sizes in the block's unit only. */
function byLine(block: TitleBlock, size: Size): DefaultLengthLimits | null {
  const { length, written } = size;
  const line = length.unit === block.unit ? blockLine(block, groupOf(block, size), written) : null;
  if (line === null) return null;
  const says = `${lineName(line.group, line.key)}: ±${line.tolerance.toString()}`;
  const basis = [lineStep(block, line.group, line.key, says)];
  return Object.freeze({
    kind: "length" as const,
    limits: symmetricLimits(length, line.tolerance, { basis }),
    line: says,
    cautions: lineCautions(basis),
  });
}

/** Which lines a size falls to; where the block tells diameters from lengths, the size must too. */
function groupOf(block: TitleBlock, { group, written }: Size): LineGroup {
  if (block.diameters === null && block.lengths === null) return "";
  if (group !== null) return group;
  throw new LimitsError("TITLE_BLOCK_OPTION_NEEDED", "the block tells diameters from lengths, and the size does not", {
    value: written.text,
    allowed: 'the option feature: "diameter" or "length"; or the text with its mark',
  });
}

function larger(raw: DefaultLengthLimits, machined: DefaultLengthLimits): DefaultLengthLimits {
  const chosen = compareLengths(raw.limits.tolerance, machined.limits.tolerance) < 0 ? machined : raw;
  const { basis, cautions } = largerRule(chosen, [raw, machined]);
  const { nominal, upperDeviation } = chosen.limits;
  return Object.freeze({ ...chosen, limits: symmetricLimits(nominal, upperDeviation, { basis }), cautions });
}
