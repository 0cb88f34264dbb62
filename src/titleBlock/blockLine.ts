import { markOf } from "../basis.js";
import type { BasisStep } from "../basis.js";
import { ownValue } from "../ownValue.js";
import type { Length, WrittenDimensionLike } from "../units/index.js";
import { INCH_PRESETS } from "./tables/inchPresets.js";
import { titleBlock } from "./titleBlock.js";
import type { TitleBlock, TitleBlockLines } from "./titleBlockValue.js";

/** Where lines stand in a block: among those for all sizes, or among those for one kind of size. */
export type LineGroup = "" | "diameters" | "lengths";

/** A line of a block that fits a size. */
export interface BlockLine {
  readonly group: LineGroup;
  /** `"fractions"`, a number of decimals, or `"any"`. */
  readonly key: string;
  readonly tolerance: Length;
}

/** The line for a size: that of its own kind first, and the exact number of decimals before `any`. */
export function blockLine(block: TitleBlock, kind: LineGroup, written: WrittenDimensionLike): BlockLine | null {
  const groups: readonly LineGroup[] = kind === "" ? [""] : [kind, ""];
  const keys = written.form === "fraction" ? ["fractions"] : [`${written.places}`, "any"];
  for (const group of groups) {
    const lines = linesOf(block, group);
    for (const key of keys) {
      const tolerance = lines === null ? null : toleranceIn(lines, key);
      if (tolerance !== null) return { group, key, tolerance };
    }
  }
  return null;
}

/** How a line is spoken of: `3 decimals`, `fractions`, `diameters, any decimals`. */
export function lineName(group: LineGroup, key: string): string {
  const name = key === "fractions" ? key : key === "any" ? "any decimals" : decimalsName(key);
  return group === "" ? name : `${group}, ${name}`;
}

/** The names of all lines that a block has, angles and standards with them. */
export function lineNames(block: TitleBlock): readonly string[] {
  const groups = ["", "diameters", "lengths"] as const;
  const lines = groups.flatMap((group) => {
    const found = linesOf(block, group);
    if (found === null) return [];
    const keys = [...Object.keys(found.decimals), ...(found.fractions === null ? [] : ["fractions"])];
    return keys.map((key) => lineName(group, key));
  });
  const standards = [block.general, block.castings, block.weldments].flatMap((called) =>
    called === null ? [] : [called.text],
  );
  return [...lines, ...(block.angles === null ? [] : ["angles"]), ...standards];
}

/** True where a block has lines for lengths of any kind. */
export function hasLines(block: TitleBlock): boolean {
  return [block, block.diameters, block.lengths].some(
    (lines) => lines !== null && (lines.fractions !== null || Object.keys(lines.decimals).length > 0),
  );
}

/** The reason for a line: the block's own, or common practice where the line still has the value of a preset. */
export function lineStep(block: TitleBlock, group: LineGroup, key: string, says: string): BasisStep {
  const place = key === "angles" ? key : lineName(group, key);
  const sign = presetMark(block, group, key);
  if (sign === null) return { standard: "title block of the drawing", place, says, how: "caller" };
  return {
    standard: `preset "${block.preset ?? ""}"`,
    place,
    says,
    how: "common practice",
    mark: markOf(sign),
  };
}

/** The mark of a line that still has the value of the block's preset; `null` where it is the block's own. */
function presetMark(block: TitleBlock, group: LineGroup, key: string): string | null {
  if (block.preset === null) return null;
  const { spec, marks } = INCH_PRESETS[block.preset];
  const preset = titleBlock(spec);
  const [own, common] = [block, preset].map((one) => {
    if (key === "angles") return one.angles?.microarcseconds;
    const lines = linesOf(one, group);
    return lines === null ? undefined : toleranceIn(lines, key)?.ticks;
  });
  if (own !== common) return null;
  const name = key === "angles" || key === "fractions" ? key : `decimals.${key}`;
  return marks.get(group === "" ? name : `${group}.${name}`) ?? null;
}

function linesOf(block: TitleBlock, group: LineGroup): TitleBlockLines | null {
  return group === "" ? block : block[group];
}

function toleranceIn(lines: TitleBlockLines, key: string): Length | null {
  return key === "fractions" ? lines.fractions : (ownValue(lines.decimals, key) ?? null);
}

function decimalsName(places: string): string {
  return places === "1" ? "1 decimal" : `${places} decimals`;
}
