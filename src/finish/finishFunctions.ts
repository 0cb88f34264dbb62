import { FUNCTION_FINISHES } from "./tables/functionFinishes.js";

/**
 * The functions of a surface for which a usual roughness is known here.
 *
 * @returns a frozen list of names (no unit), as the sources write them
 * @throws nothing
 * @example
 * ```ts
 * import { finishFunctions } from "limitsmith";
 *
 * finishFunctions().includes("keyway sides"); // → true
 * ```
 * @reference common practice: seal, bearing and pump-parts makers' pages; Marks' Standard Handbook for Mechanical
 *   Engineers, Table 13.5.1, values from memory
 */
export function finishFunctions(): readonly string[] {
  return Object.freeze(FUNCTION_FINISHES.flatMap((row) => row.names));
}
