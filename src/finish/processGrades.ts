import type { Basis, BasisStep, Caution } from "../basis.js";
import { mm } from "../units/index.js";
import type { Length } from "../units/index.js";
import { GRADE_CHART_CAUTION, allGradeSpans, spanStep } from "./gradeRows.js";
import type { GradeSpan } from "./gradeRows.js";
import { processOf } from "./processes.js";
import { PROCESS_TOLERANCES_MM } from "./tables/processTolerances.js";

/** A total tolerance that a table gives for a process, whatever the size. */
export interface ReachedTolerance {
  /** Line of the table. */
  readonly row: string;
  /** Smallest tolerance reached; `null` where the printed figure is damaged. */
  readonly least: Length | null;
  /** Largest tolerance printed. */
  readonly most: Length;
}

/** Which tolerance grades a process reaches. */
export interface ProcessGrades {
  /** Trade name. */
  readonly process: string;
  /** What each chart says, chart by chart; an empty list where no chart has the process. */
  readonly spans: readonly GradeSpan[];
  /** Tolerances in mm that one more table gives, without regard to size. */
  readonly tolerances: readonly ReachedTolerance[];
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * The tolerance grades that a process reaches, by each published chart; the charts are never merged.
 *
 * @param process - trade name, see `processNames`: `"turning"`, `"honing"`, `"die casting"`
 * @returns the frozen lines of each chart as grade numbers (7 is IT7), and tolerances as lengths in mm
 * @throws `PROCESS_UNKNOWN`
 * @example
 * ```ts
 * import { processGrades } from "limitsmith";
 *
 * const [ansi] = processGrades("reaming").spans;
 * [ansi?.finest, ansi?.coarsest]; // → [6, 10]
 * processGrades("reaming").spans[1]?.finest; // → 8
 * ```
 * @reference ANSI B4.1-1967 (R1987), Table 2 (where a bar starts is from memory); grade chart of the BS 4500 and
 *   ISO/R 286 family
 */
export function processGrades(process: string): ProcessGrades {
  const { name, ansi, iso, tolerance } = processOf(process);
  const spans = allGradeSpans().filter(({ chart, row }) =>
    (chart === "ANSI B4.1-1967 (R1987)" ? ansi : iso).includes(row),
  );
  const tolerances = PROCESS_TOLERANCES_MM.filter((one) => tolerance.includes(one.row)).map(({ row, least, most }) =>
    Object.freeze({ row, least: least === null ? null : mm(least), most: mm(most) }),
  );
  return Object.freeze({
    process: name,
    spans: Object.freeze(spans),
    tolerances: Object.freeze(tolerances),
    basis: Object.freeze([...spans.map(spanStep), ...tolerances.map(toleranceStep)]),
    cautions: Object.freeze([GRADE_CHART_CAUTION]),
  });
}

function toleranceStep({ row, least, most }: ReachedTolerance): BasisStep {
  return Object.freeze({
    standard: "an engineering article's table of tolerance and roughness reached by material-removal processes",
    place: row,
    says: `total tolerance ${least === null ? "not legible" : least.toString()} to ${most.toString()}`,
    how: "common practice" as const,
    mark: "one-source" as const,
  });
}
