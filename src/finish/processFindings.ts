import { asRoughness } from "./asRoughness.js";
import { finding } from "./finding.js";
import type { FinishFinding } from "./finding.js";
import { processReach } from "./processReach.js";
import type { RoughnessLike } from "./roughnessValue.js";

/**
 * Finds a process that does not usually give a roughness, or is finer than it needs. The chart is informative: each
 * finding is a warning.
 *
 * @param roughness - Ra with its unit, as an upper limit
 * @param process - trade name, see `processNames`
 * @returns a frozen list of one finding or none (no unit)
 * @throws `PROCESS_UNKNOWN`, and what {@link asRoughness} throws
 * @example
 * ```ts
 * import { processFindings } from "limitsmith";
 *
 * processFindings("0.4 µm", "drilling")[0]?.code; // → "PROCESS_DOES_NOT_REACH_FINISH"
 * processFindings("0.8 µm", "drilling")[0]?.code; // → "PROCESS_SELDOM_REACHES_FINISH"
 * processFindings("12.5 µm", "grinding")[0]?.code; // → "PROCESS_FINER_THAN_FINISH_NEEDS"
 * processFindings("63 µin", "turning"); // → []
 * ```
 * @reference ASME B46.1, informative appendix: roughness average by common production methods
 */
export function processFindings(roughness: RoughnessLike, process: string): readonly FinishFinding[] {
  const asked = asRoughness(roughness, ["roughness"]);
  const { process: name, reach, side, basis } = processReach(process, asked);
  const ra = `Ra ${asked.ra.toString()}`;
  const found: FinishFinding[] = [];
  if (side === "finer" && reach === "outside") {
    found.push(finding("PROCESS_DOES_NOT_REACH_FINISH", `${name} does not usually reach ${ra}`, basis));
  } else if (side === "finer") {
    const how =
      reach === "less frequent" ? "reaches it less frequently" : "may or may not reach it: the sources differ";
    found.push(
      finding("PROCESS_SELDOM_REACHES_FINISH", `${ra} is finer than the average range of ${name}; it ${how}`, basis),
    );
  } else if (side === "coarser" && reach === "outside") {
    found.push(
      finding("PROCESS_FINER_THAN_FINISH_NEEDS", `${name} is finer than ${ra} needs and may cost more`, basis),
    );
  }
  return Object.freeze(found);
}
