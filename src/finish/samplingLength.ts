import type { Basis } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLength, inch, mm } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { asRoughness } from "./asRoughness.js";
import { unitFor } from "./buildRoughness.js";
import { umLength, uinLength } from "./preferredValues.js";
import type { RoughnessLike } from "./roughnessValue.js";
import {
  ASME_RA_UIN,
  ASME_RSM_IN,
  ISO21920_RA,
  ISO21920_RZ,
  ISO4288_RA,
  ISO4288_RSM,
  ISO4288_RZ,
} from "./tables/samplingLengths.js";
import type { SamplingRow, SamplingTable } from "./tables/samplingLengths.js";

/** Standards that set sampling lengths, by edition. */
export type SamplingStandard = "ISO 4288:1996" | "ISO 21920-3:2021" | "ASME B46.1";

/** By what the sampling length is chosen: exactly one of `ra`, `rz` and `rsm`. */
export interface SamplingQuestion {
  /** Standard with its edition. */
  readonly standard: SamplingStandard;
  /** Ra of a surface without periodic marks, specified or measured. */
  readonly ra?: RoughnessLike;
  /** Rz, likewise. */
  readonly rz?: LengthLike;
  /** Mean spacing of the grooves of a periodic surface; for a clean turned surface that is the feed. */
  readonly rsm?: LengthLike;
}

/** Lengths for measuring. */
export interface SamplingLengths {
  /** Sampling length, the same as the cut-off (in ISO 21920: section length and nesting index). */
  readonly samplingLength: Length;
  /** Evaluation length, as the table has it: about five sampling lengths. */
  readonly evaluationLength: Length;
  /** Where it comes from. */
  readonly basis: Basis;
}

/** A table with the units of its columns. */
interface Choice {
  readonly table: SamplingTable;
  /** Standard with its edition. */
  readonly standard: string;
  readonly bound: (value: number) => Length;
  readonly length: (value: number) => Length;
  readonly what: string;
}

/**
 * The sampling length (cut-off) and evaluation length for a roughness, or for a groove spacing, by the edition asked for.
 *
 * An upper bound belongs to its class: Ra 2 µm takes 0.8 mm. ASME on an inch drawing (values in µin or inches) goes by
 * the inch table, on a metric one by the steps of ISO 4288 with open ends.
 *
 * @param question - `standard`, and one of `ra`, `rz`, `rsm`, each a length with its unit
 * @returns the frozen lengths, in mm or, by the inch table, in inches
 * @throws `FINISH_NOT_TABULATED` where the edition has no such table or row, `OPTION_INVALID` for another standard or not
 *   exactly one value, `LENGTH_INVALID`, and what {@link asRoughness} throws
 * @example
 * ```ts
 * import { samplingLength } from "limitsmith";
 *
 * samplingLength({ standard: "ISO 4288:1996", ra: "3.2 µm" }).samplingLength.toString(); // → "2.5 mm"
 * samplingLength({ standard: "ISO 4288:1996", rz: "12.5 µm" }).samplingLength.toString(); // → "2.5 mm"
 * samplingLength({ standard: "ISO 21920-3:2021", rz: "12.5 µm" }).samplingLength.toString(); // → "0.8 mm"
 * samplingLength({ standard: "ASME B46.1", ra: "63 µin" }).samplingLength.toString(); // → "0.03 in"
 * ```
 * @reference ISO 4288:1996, Tables 1 to 3; ISO 21920-3:2021, default settings; ASME B46.1 as an instrument maker's manual
 *   sets it
 */
export function samplingLength(question: SamplingQuestion): SamplingLengths {
  const asked = (["ra", "rz", "rsm"] as const).filter((name) => ownValue(question, name) !== undefined);
  const [by] = asked;
  if (by === undefined || asked.length > 1) {
    throw new LimitsError("OPTION_INVALID", "a sampling length is chosen by one value", {
      value: asked.join(", "),
      allowed: "exactly one of ra, rz, rsm",
    });
  }
  const value = valueOf(question, by);
  const choice = choiceFor(ownValue(question, "standard"), by, unitFor(value) === "uin");
  const row = choice.table.rows.find(
    ({ over, to }) =>
      (over === null || value.ticks > choice.bound(over).ticks) &&
      (to === null || value.ticks <= choice.bound(to).ticks),
  );
  if (row === undefined || value.ticks <= 0) throw notTabulated(`${by} ${value.toString()}`, choice.standard);
  return Object.freeze({
    samplingLength: choice.length(row.cutoff),
    evaluationLength: choice.length(row.evaluation),
    basis: Object.freeze([
      Object.freeze({
        standard: choice.standard,
        place: choice.table.place,
        says: `${rangeText(row, choice.what)}: ${choice.length(row.cutoff).toString()}, evaluated over ${choice.length(row.evaluation).toString()}`,
        how: "tabulated" as const,
        mark: choice.table.mark,
      }),
    ]),
  });
}

function valueOf(question: SamplingQuestion, by: "ra" | "rz" | "rsm"): Length {
  if (by === "ra") return asRoughness(ownValue(question, "ra") as RoughnessLike, ["ra"]).ra;
  return asLength(ownValue(question, by) as LengthLike, [by]);
}

function choiceFor(standard: unknown, by: "ra" | "rz" | "rsm", inches: boolean): Choice {
  const micrometres = (table: SamplingTable, name: string): Choice => ({
    table,
    standard: name,
    bound: umLength,
    length: mm,
    what: `${by === "ra" ? "Ra" : "Rz"} in µm`,
  });
  switch (standard) {
    case "ISO 4288:1996":
      if (by === "rsm") return { table: ISO4288_RSM, standard, bound: mm, length: mm, what: "RSm in mm" };
      return micrometres(by === "ra" ? ISO4288_RA : ISO4288_RZ, standard);
    case "ISO 21920-3:2021":
      if (by === "rsm") throw notTabulated("rsm", standard);
      return micrometres(by === "ra" ? ISO21920_RA : ISO21920_RZ, standard);
    case "ASME B46.1":
      return asmeChoice(by, inches);
    default:
      throw new LimitsError("OPTION_INVALID", "not a standard of sampling lengths that is known here", {
        value: standard,
        allowed: "ISO 4288:1996, ISO 21920-3:2021, ASME B46.1",
      });
  }
}

/** ASME uses the steps of ISO 4288 in metric; the instrument's first and last class are open. */
function asmeChoice(by: "ra" | "rz" | "rsm", inches: boolean): Choice {
  const standard = "ASME B46.1";
  if (by === "rz") throw notTabulated("rz", standard);
  if (inches) {
    return by === "ra"
      ? { table: ASME_RA_UIN, standard, bound: uinLength, length: inch, what: "Ra in µin" }
      : { table: ASME_RSM_IN, standard, bound: inch, length: inch, what: "RSm in inches" };
  }
  if (by === "rsm") return { table: ISO4288_RSM, standard, bound: mm, length: mm, what: "RSm in mm" };
  const last = ISO4288_RA.rows.length - 1;
  const rows = ISO4288_RA.rows.map((row, index) => ({
    ...row,
    over: index === 0 ? null : row.over,
    to: index === last ? null : row.to,
  }));
  const table = { place: "the steps of ISO 4288:1996, Table 1, open at both ends", mark: ISO4288_RA.mark, rows };
  return { table, standard, bound: umLength, length: mm, what: "Ra in µm" };
}

function rangeText({ over, to }: SamplingRow, what: string): string {
  const from = over === null ? "" : `over ${over} `;
  return `${what} ${from}${to === null ? "" : `up to ${to}`}`.trimEnd();
}

function notTabulated(value: string, standard: string): LimitsError {
  return new LimitsError("FINISH_NOT_TABULATED", `${standard} has no sampling length here, or it was not read`, {
    value,
    allowed: "Ra, Rz (ISO) or RSm within the table of that edition",
  });
}
