import type { BasisStep, Caution } from "../basis.js";
import { LimitsError } from "../errors.js";
import { unitFor } from "./buildRoughness.js";
import { limitInUnit } from "./preferredValues.js";
import { processOf } from "./processes.js";
import type { Roughness } from "./roughnessValue.js";
import { PROCESS_ROUGHNESS } from "./tables/processRoughness.js";
import type { ProcessRow } from "./tables/processRoughness.js";

/**
 * Where a roughness stands in the chart's bands for a process; `"not known"` where the sources leave the end of the
 * less frequent band open on that side.
 */
export type FinishReach = "average" | "less frequent" | "outside" | "not known";

/** On which side of the average band a roughness lies; `null` within it. */
export type BandSide = "finer" | "coarser" | null;

/** The chart's line for a trade name. */
export function finishRowOf(process: string): { readonly name: string; readonly row: ProcessRow } {
  const { name, roughness } = processOf(process);
  const row = PROCESS_ROUGHNESS.find((one) => one.row === roughness);
  if (row === undefined) {
    throw new LimitsError("PROCESS_UNKNOWN", "the roughness chart has no line for this process", {
      value: process,
      allowed: PROCESS_ROUGHNESS.map((one) => one.row).join("; "),
    });
  }
  return { name, row };
}

/** Places a roughness in a line of the chart; compared in the drawing's own unit. */
export function reachOf(row: ProcessRow, { ra }: Roughness): { reach: FinishReach; side: BandSide } {
  const unit = unitFor(ra);
  const at = (um: number): number => limitInUnit(um, unit).ticks;
  const side = ra.ticks < at(row.average[0]) ? "finer" : ra.ticks > at(row.average[1]) ? "coarser" : null;
  if (side === null) return { reach: "average", side };
  const end = side === "finer" ? row.overall[0] : row.overall[1];
  if (end === null) return { reach: "not known", side };
  const beyond = side === "finer" ? ra.ticks < at(end) : ra.ticks > at(end);
  return { reach: beyond ? "outside" : "less frequent", side };
}

/** Where the bands of a line come from: the average band, then the overall one. */
export function bandSteps(row: ProcessRow): readonly BasisStep[] {
  const step = (says: string, mark: ProcessRow["averageMark"]): BasisStep =>
    Object.freeze({
      standard: "ASME B46.1, informative appendix",
      place: `chart of roughness average by production method, ${row.row}`,
      says,
      how: "tabulated" as const,
      mark,
    });
  const [fine, coarse] = row.overall.map((end) => (end === null ? "left open" : `${end}`));
  const note = row.note === null ? "" : `; ${row.note}`;
  return [
    step(`average application Ra ${row.average[0]} to ${row.average[1]} µm`, row.averageMark),
    step(`with less frequent application Ra ${fine ?? ""} to ${coarse ?? ""} µm${note}`, row.overallMark),
  ];
}

export const CHART_CAUTION: Caution = Object.freeze({
  code: "FINISH_CHART_INFORMATIVE",
  says:
    "the chart is informative and older than present machines: values outside its bands occur under special " +
    "conditions, and material, tool and machine decide",
});

export const OPEN_END_CAUTION: Caution = Object.freeze({
  code: "FINISH_BAND_OPEN",
  says: "the sources differ about this end of the less frequent band, so it is left open",
});

export const MEMORY_CAUTION: Caution = Object.freeze({
  code: "FINISH_BAND_FROM_MEMORY",
  says: "the ends of the less frequent band are from memory of the chart; no readable copy confirmed them",
});
