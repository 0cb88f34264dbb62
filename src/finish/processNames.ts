import { allProcesses } from "./processes.js";

/** A process by its trade name, and what is charted for it. */
export interface KnownProcess {
  /** Its name. */
  readonly name: string;
  /** Other names that mean the same. */
  readonly also: readonly string[];
  /** True where `processFinish` has a line for it. */
  readonly hasFinish: boolean;
  /** True where `processGrades` has a tolerance grade for it. */
  readonly hasGrades: boolean;
}

/**
 * The processes that the charts of this room know, by their trade names.
 *
 * @returns a frozen list (no unit), in the order of the roughness chart, then those that only a grade chart has
 * @throws nothing
 * @example
 * ```ts
 * import { processNames } from "limitsmith";
 *
 * processNames().find((one) => one.name === "turning")?.hasFinish; // → true
 * ```
 * @reference ASME B46.1, informative appendix; ANSI B4.1-1967 (R1987), Table 2; the grade chart of the BS 4500 and
 *   ISO/R 286 family; which line a trade name reads is this library's own list
 */
export function processNames(): readonly KnownProcess[] {
  return Object.freeze(
    allProcesses().map(({ name, also, roughness, ansi, iso }) =>
      Object.freeze({
        name,
        also: Object.freeze([...also]),
        hasFinish: roughness !== null,
        hasGrades: ansi.length + iso.length > 0,
      }),
    ),
  );
}
