import type { BasisStep } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { lineNames } from "./blockLine.js";
import type { DefaultLimits, DefaultLimitsOptions, DefaultProcess } from "./defaultValue.js";
import { FROM_MEMORY, cautionsFor } from "./generalCautions.js";
import type { GeneralTolerance, Iso2768Indication } from "./generalToleranceValue.js";
import type { TitleBlock } from "./titleBlockValue.js";

/** One way in which a surface comes about. */
export type Way = "machined" | "cast" | "welded";

const PROCESSES: ReadonlyMap<unknown, readonly Way[]> = new Map<DefaultProcess, readonly Way[]>([
  ["machined", ["machined"]],
  ["cast", ["cast"]],
  ["welded", ["welded"]],
  ["cast to machined", ["cast", "machined"]],
  ["welded to machined", ["welded", "machined"]],
]);

/** The one way or the two ways that the options name; `null` where they name none. */
export function waysOf(options: DefaultLimitsOptions | undefined): readonly Way[] | null {
  const process: unknown = ownValue(options, "process") ?? null;
  if (process === null) return null;
  const ways = PROCESSES.get(process);
  if (ways !== undefined) return ways;
  throw new LimitsError("OPTION_INVALID", "not a process that is told apart here", {
    value: process,
    allowed: [...PROCESSES.keys()].join(", "),
  });
}

/** The only way that a block can mean; where it can mean more than one, the process has to be said. */
export function onlyWay(block: TitleBlock, value: string, possible: readonly Way[]): readonly Way[] {
  if (possible.length <= 1) return possible.length === 0 ? ["machined"] : possible;
  throw new LimitsError("TITLE_BLOCK_OPTION_NEEDED", "the block has general tolerances of more than one process", {
    value,
    allowed: `the option process: ${possible.join(", ")}; the block has: ${lineNames(block).join(", ")}`,
  });
}

/** The general tolerance of machined sizes and angles; `null` where the block has none. */
export function machinedStandard(block: TitleBlock): Iso2768Indication | null {
  const { general } = block;
  return general?.linear == null ? null : general;
}

/** The standard that one way falls to; `null` where the block has none. */
export function standardOfWay(block: TitleBlock, way: Way): GeneralTolerance | null {
  return way === "machined" ? machinedStandard(block) : way === "cast" ? block.castings : block.weldments;
}

/** Where a standard stands in the block. */
export function standardStep(called: GeneralTolerance): BasisStep {
  const place =
    called.standard === "ISO 2768" ? "general" : called.standard === "ISO 8062-3" ? "castings" : "weldments";
  return { standard: "title block of the drawing", place, says: called.text, how: "caller" };
}

/** The error for a size or an angle that no line fits. */
export function noLine(block: TitleBlock, value: string, line: string): LimitsError {
  const lines = lineNames(block);
  return new LimitsError("TITLE_BLOCK_NO_LINE", `the title block has no line for ${line}`, {
    value,
    allowed: lines.length === 0 ? "the block has no lines" : `the block has: ${lines.join(", ")}`,
  });
}

/**
 * ISO 2768-1, from memory: between a raw and a machined surface the larger of the two general tolerances applies.
 * Gives the reason and the cautions for the one chosen out of both.
 */
export function largerRule<Chosen extends DefaultLimits>(
  chosen: Chosen,
  both: readonly [DefaultLimits, DefaultLimits],
): { readonly basis: readonly BasisStep[]; readonly cautions: Chosen["cautions"] } {
  const step: BasisStep = {
    standard: "ISO 2768-1:1989",
    place: "between a raw and a machined surface",
    says: `the larger of ${both[0].line} and ${both[1].line}`,
    how: "derived",
    mark: "memory",
  };
  const basis = [...chosen.limits.basis, step];
  const others = chosen.cautions.filter((caution) => caution !== FROM_MEMORY);
  return { basis, cautions: cautionsFor(basis, others) };
}
