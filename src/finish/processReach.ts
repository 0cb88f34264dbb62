import type { Basis, Caution } from "../basis.js";
import { asRoughness } from "./asRoughness.js";
import { CHART_CAUTION, MEMORY_CAUTION, OPEN_END_CAUTION, bandSteps, finishRowOf, reachOf } from "./processRow.js";
import type { BandSide, FinishReach } from "./processRow.js";
import type { RoughnessLike } from "./roughnessValue.js";

/** How a process stands to a roughness. */
export interface ProcessReach {
  /** Trade name. */
  readonly process: string;
  /** Line of the chart that was read. */
  readonly row: string;
  /** One of three classes, or `"not known"` where the sources leave the end of the band open. */
  readonly reach: FinishReach;
  /** On which side of the average band the roughness lies; `null` within it. */
  readonly side: BandSide;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * In which band of a process a roughness lies. There is no yes or no: the chart is informative.
 *
 * @param process - trade name, see `processNames`
 * @param roughness - Ra with its unit, over 0 up to 1 mm; compared in its own unit, 63 µin with the 63 µin of the chart
 * @returns the frozen class: `"average"`, `"less frequent"`, `"outside"` or `"not known"` (no unit), and its cautions
 * @throws `PROCESS_UNKNOWN`, and what {@link asRoughness} throws
 * @example
 * ```ts
 * import { processReach } from "limitsmith";
 *
 * processReach("turning", "63 µin").reach; // → "average"
 * processReach("turning", "0.1 µm").reach; // → "less frequent"
 * processReach("drilling", "0.4 µm").reach; // → "outside"
 * ```
 * @reference ASME B46.1, informative appendix: roughness average by common production methods
 */
export function processReach(process: string, roughness: RoughnessLike): ProcessReach {
  const { name, row } = finishRowOf(process);
  const { reach, side } = reachOf(row, asRoughness(roughness, ["roughness"]));
  const cautions: Caution[] = [CHART_CAUTION];
  if (reach !== "average" && row.overallMark === "memory") cautions.push(MEMORY_CAUTION);
  if (reach === "not known") cautions.push(OPEN_END_CAUTION);
  return Object.freeze({
    process: name,
    row: row.row,
    reach,
    side,
    basis: Object.freeze(bandSteps(row)),
    cautions: Object.freeze(cautions),
  });
}
