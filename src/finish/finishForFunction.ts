import type { Basis, Caution, Mark } from "../basis.js";
import { LimitsError } from "../errors.js";
import type { Length } from "../units/index.js";
import { umLength } from "./preferredValues.js";
import { FUNCTION_FINISHES } from "./tables/functionFinishes.js";
import type { FunctionRow } from "./tables/functionFinishes.js";
import { FUNCTION_ALIASES } from "./tables/functionAliases.js";

/** The roughness that is usual for a function. */
export interface FunctionFinish {
  /** The function as the source names it. */
  readonly function: string;
  /** Smoothest usual Ra, in µm; `null` where the source gives none. */
  readonly finest: Length | null;
  /** Roughest usual Ra, in µm: the value to put on the drawing as upper limit. */
  readonly coarsest: Length;
  /** True where `finest` is a limit of its own: a smoother surface fails too, as under a lip seal. */
  readonly finestIsLimit: boolean;
  /** How sure the value is. */
  readonly mark: Mark;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

const LONGEST_NAME = 120;

/**
 * The roughness that is usual for the function of a surface: common practice, with whose it is.
 *
 * @param name - a name of {@link finishFunctions}, or a short one such as `"bearing seat"`, `"press fit"`, `"seal lip"`,
 *   `"keyway side"`; case does not matter
 * @returns the frozen usual range of Ra, in µm
 * @throws `FINISH_FUNCTION_UNKNOWN`
 * @example
 * ```ts
 * import { finishForFunction } from "limitsmith";
 *
 * const lip = finishForFunction("seal lip");
 * [lip.finest?.toString(), lip.coarsest.toString(), lip.finestIsLimit]; // → ["0.2 µm", "0.8 µm", true]
 * finishForFunction("press fit").coarsest.toString(); // → "0.8 µm"
 * ```
 * @reference common practice: seal, bearing and pump-parts makers' pages; Marks' Standard Handbook for Mechanical
 *   Engineers, Table 13.5.1, values from memory
 */
export function finishForFunction(name: string): FunctionFinish {
  const given: unknown = name;
  const asked = typeof given === "string" && given.length <= LONGEST_NAME ? key(given) : "";
  const wanted = key(FUNCTION_ALIASES.get(asked) ?? asked);
  for (const row of FUNCTION_FINISHES) {
    const found = row.names.find((one) => key(one) === wanted);
    if (found !== undefined) return describe(row, found);
  }
  throw new LimitsError("FINISH_FUNCTION_UNKNOWN", "no usual roughness is known here for this function", {
    value: given,
    allowed: "a name of finishFunctions(), such as bearing seat, press fit, seal lip, keyway side",
  });
}

function describe(row: FunctionRow, name: string): FunctionFinish {
  const range = row.finest === null ? `up to ${row.coarsest}` : `${row.finest} to ${row.coarsest}`;
  return Object.freeze({
    function: name,
    finest: row.finest === null ? null : umLength(row.finest),
    coarsest: umLength(row.coarsest),
    finestIsLimit: row.finestIsLimit,
    mark: row.mark,
    basis: Object.freeze([
      Object.freeze({
        standard: row.source,
        place: name,
        says: `Ra ${range} µm${row.note === null ? "" : `; ${row.note}`}`,
        how: "common practice" as const,
        mark: row.mark,
      }),
    ]),
    cautions: Object.freeze([PRACTICE]),
  });
}

function key(name: string): string {
  return name.trim().toLowerCase().split(/\s+/).join(" ");
}

const PRACTICE: Caution = Object.freeze({
  code: "FINISH_COMMON_PRACTICE",
  says: "common practice, no standard; sources differ: the maker of the mating part has the last word",
});
