import { ownValue } from "../ownValue.js";
import type { LengthLike } from "../units/index.js";
import { asRoughness } from "./asRoughness.js";
import type { FinishFinding } from "./finding.js";
import type { FinishForToleranceOptions } from "./finishForTolerance.js";
import { functionFindings } from "./functionFindings.js";
import { gradeFindings } from "./gradeFindings.js";
import type { ToleranceGradeLike } from "./gradeRows.js";
import { processFindings } from "./processFindings.js";
import { processOf } from "./processes.js";
import type { RoughnessLike } from "./roughnessValue.js";
import { toleranceFindings } from "./toleranceFindings.js";

/** A finish with what is known around it; only `roughness` is needed. */
export interface FinishQuestion {
  /** Ra with its unit, as an upper limit. */
  readonly roughness: RoughnessLike;
  /** Lower limit of Ra, where the drawing has two values. */
  readonly lower?: RoughnessLike;
  /** The full width of the size tolerance, any unit. */
  readonly tolerance?: LengthLike;
  /** Rule and form tolerance for the tolerance; `"Ra < T/8"` unless more is said. */
  readonly toleranceRule?: FinishForToleranceOptions;
  /** Function of the surface, see `finishFunctions`. */
  readonly function?: string;
  /** Trade name of the last process, see `processNames`. */
  readonly process?: string;
  /** Tolerance grade that the process must hold. */
  readonly grade?: ToleranceGradeLike;
}

/**
 * Looks at a finish together with its tolerance, function, process and grade, and lists what does not agree.
 *
 * @param question - `roughness` and what is known around it, lengths with their units
 * @returns a frozen list of findings: tolerance, function, process against finish, process against grade (no unit)
 * @throws `PROCESS_UNKNOWN`, `FINISH_FUNCTION_UNKNOWN`, `CLASS_GRADE_UNKNOWN`, and what {@link asRoughness} and
 *   {@link finishForTolerance} throw
 * @example
 * ```ts
 * import { checkFinish } from "limitsmith";
 *
 * const found = checkFinish({ roughness: "3.2 µm", tolerance: "16 µm", function: "bearing seat", process: "drilling", grade: "IT6" });
 * found.map((one) => one.code); // → ["FINISH_TOO_COARSE_FOR_TOLERANCE", "FINISH_TOO_COARSE_FOR_FUNCTION", "PROCESS_DOES_NOT_REACH_GRADE"]
 * checkFinish({ roughness: "0.8 µm", tolerance: "16 µm", function: "bearing seat", process: "grinding", grade: "IT6" }); // → []
 * ```
 * @reference as {@link finishForTolerance}, `finishForFunction`, `processFinish` and `processGrades`
 */
export function checkFinish(question: FinishQuestion): readonly FinishFinding[] {
  const roughness = asRoughness(ownValue(question, "roughness") as RoughnessLike, ["roughness"]);
  const tolerance = ownValue(question, "tolerance");
  const functionName = ownValue(question, "function");
  const process = ownValue(question, "process");
  const grade = ownValue(question, "grade");
  const lower = ownValue(question, "lower");
  const found: FinishFinding[] = [];
  if (tolerance !== undefined)
    found.push(...toleranceFindings(roughness, tolerance, ownValue(question, "toleranceRule")));
  if (functionName !== undefined) {
    found.push(...functionFindings(roughness, functionName, lower === undefined ? undefined : { lower }));
  }
  if (process !== undefined) {
    // a process that only a grade chart has says nothing about the finish
    if (processOf(process).roughness !== null) found.push(...processFindings(roughness, process));
    if (grade !== undefined) found.push(...gradeFindings(grade, process));
  }
  return Object.freeze(found);
}
