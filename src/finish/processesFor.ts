import { asRoughness } from "./asRoughness.js";
import { reachOf } from "./processRow.js";
import { processReach } from "./processReach.js";
import type { ProcessReach } from "./processReach.js";
import type { FinishReach } from "./processRow.js";
import type { RoughnessLike } from "./roughnessValue.js";
import { PROCESS_ROUGHNESS } from "./tables/processRoughness.js";

/** Every line of the chart, by the class that a roughness has in it. */
export interface ProcessesFor {
  /** Within the average band. */
  readonly average: readonly ProcessReach[];
  /** Within a less frequent band. */
  readonly lessFrequent: readonly ProcessReach[];
  /** Beyond an end that the sources leave open. */
  readonly notKnown: readonly ProcessReach[];
  /** Beyond all bands; `side` says on which side. */
  readonly outside: readonly ProcessReach[];
}

/**
 * Sorts the processes of the chart by how a roughness stands in their bands.
 *
 * @param roughness - Ra with its unit, over 0 up to 1 mm; compared in its own unit
 * @returns frozen lists (no unit) that together hold every line of the chart once, each in the order of the chart
 * @throws what {@link asRoughness} throws
 * @example
 * ```ts
 * import { processesFor } from "limitsmith";
 *
 * processesFor("N4").average.map((one) => one.process).slice(0, 3); // → ["electrochemical", "barrel finishing", "electrolytic grinding"]
 * ```
 * @reference ASME B46.1, informative appendix: roughness average by common production methods
 */
export function processesFor(roughness: RoughnessLike): ProcessesFor {
  const asked = asRoughness(roughness, ["roughness"]);
  const having = (reach: FinishReach): readonly ProcessReach[] =>
    Object.freeze(
      PROCESS_ROUGHNESS.filter((row) => reachOf(row, asked).reach === reach).map((row) => processReach(row.row, asked)),
    );
  return Object.freeze({
    average: having("average"),
    lessFrequent: having("less frequent"),
    notKnown: having("not known"),
    outside: having("outside"),
  });
}
