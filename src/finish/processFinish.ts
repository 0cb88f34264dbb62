import type { Basis, Caution, Mark } from "../basis.js";
import type { Length } from "../units/index.js";
import { pairedUin, umLength } from "./preferredValues.js";
import { CHART_CAUTION, MEMORY_CAUTION, OPEN_END_CAUTION, bandSteps, finishRowOf } from "./processRow.js";

/** One end of a band. */
export interface BandEnd {
  /** Ra in µm, as the chart has it. */
  readonly um: Length;
  /** The preferred partner in µin; `null` where the end is no preferred value. */
  readonly uin: Length | null;
}

/** The band of ordinary use. */
export interface AverageBand {
  /** Finest roughness of the range. */
  readonly finest: BandEnd;
  /** Coarsest roughness of the range. */
  readonly coarsest: BandEnd;
  /** How sure the value is. */
  readonly mark: Mark;
}

/** Ordinary and less frequent use together; `null` where the sources leave an end open. */
export interface OverallBand {
  /** Finest roughness of the range. */
  readonly finest: BandEnd | null;
  /** Coarsest roughness of the range. */
  readonly coarsest: BandEnd | null;
  /** How sure the value is. */
  readonly mark: Mark;
}

/** What roughness a process gives. */
export interface ProcessFinish {
  /** Trade name. */
  readonly process: string;
  /** Line of the chart that was read: turning reads `"boring, turning"`. */
  readonly row: string;
  /** Group of processes in the chart. */
  readonly group: "removal" | "finishing" | "forming";
  /** Range of average application. */
  readonly average: AverageBand;
  /** The less frequent bands are what lies in here and outside the average band, on both sides. */
  readonly overall: OverallBand;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * What roughness average a process gives: the average band and, around it, the less frequent ones.
 *
 * @param process - trade name, see `processNames`: `"turning"`, `"milling"`, `"grinding"`; case does not matter
 * @returns the frozen bands, each end in µm with its partner in µin, each band with its mark
 * @throws `PROCESS_UNKNOWN`
 * @example
 * ```ts
 * import { processFinish } from "limitsmith";
 *
 * const { average, overall } = processFinish("reaming");
 * [average.finest.um.to("um"), average.coarsest.um.to("um")]; // → [0.8, 3.2]
 * [overall.finest?.uin?.to("uin"), overall.coarsest?.uin?.to("uin")]; // → [16, 250]
 * ```
 * @reference ASME B46.1, informative appendix: roughness average by common production methods
 */
export function processFinish(process: string): ProcessFinish {
  const { name, row } = finishRowOf(process);
  const [finest, coarsest] = row.overall;
  const cautions = [CHART_CAUTION];
  if (row.overallMark === "memory") cautions.push(MEMORY_CAUTION);
  if (finest === null || coarsest === null) cautions.push(OPEN_END_CAUTION);
  return Object.freeze({
    process: name,
    row: row.row,
    group: row.group,
    average: Object.freeze({ finest: end(row.average[0]), coarsest: end(row.average[1]), mark: row.averageMark }),
    overall: Object.freeze({
      finest: finest === null ? null : end(finest),
      coarsest: coarsest === null ? null : end(coarsest),
      mark: row.overallMark,
    }),
    basis: Object.freeze(bandSteps(row)),
    cautions: Object.freeze(cautions),
  });
}

function end(um: number): BandEnd {
  return Object.freeze({ um: umLength(um), uin: pairedUin(um) });
}
