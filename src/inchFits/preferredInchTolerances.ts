import { lengthOfTicks } from "../units/index.js";
import type { Length } from "../units/index.js";
import { PREFERRED_TOLERANCES_THOU } from "./tables/preferredTolerances.js";
import { thouTicks } from "./thouTicks.js";

let list: readonly Length[] | undefined;

/**
 * The preferred series of tolerances and allowances of the inch system.
 *
 * @returns a frozen list of lengths in thou (thousandths of an inch), smallest first; from memory
 * @throws nothing
 * @example
 * ```ts
 * import { preferredInchTolerances } from "limitsmith";
 *
 * preferredInchTolerances()[3]?.toString(); // → "0.25 thou"
 * ```
 * @reference ANSI B4.1-1967, preferred series of tolerances and allowances, from memory
 */
export function preferredInchTolerances(): readonly Length[] {
  return (list ??= Object.freeze(PREFERRED_TOLERANCES_THOU.map((thou) => lengthOfTicks(thouTicks(thou), "thou"))));
}
