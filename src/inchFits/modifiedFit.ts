import type { BasisStep, Caution } from "../basis.js";
import { LimitsError } from "../errors.js";
import { inchGradeStep, inchGradeThou } from "./inchGrade.js";
import type { TableRow } from "./tableRow.js";
import { signedThouOfTicks, thouTicks } from "./thouTicks.js";

/** How far all four limits move from the row of the table; clearance and tolerances stay. */
export interface Shift {
  readonly ticks: number;
  readonly basis: readonly BasisStep[];
  readonly cautions: readonly Caution[];
}

const NO_SHIFT: Shift = { ticks: 0, basis: [], cautions: [] };

const FROM_MEMORY: Caution = Object.freeze({
  code: "INCH_RULE_FROM_MEMORY",
  says:
    "The rule of suffix B was not read in print, only remembered with one example that the standard tolerances bear " +
    "out; confirm it before relying on the limits.",
});

/** The move that the basis of the class asks for. */
export function shiftOf(from: TableRow): Shift {
  switch (from.cls.basis) {
    case "hole":
      return NO_SHIFT;
    case "shaft":
      return shaftBasis(from);
    case "bilateral hole":
      return bilateralHole(from);
  }
}

/** Suffix S: the largest shaft becomes the basic size. */
function shaftBasis({ row }: TableRow): Shift {
  const ticks = thouTicks(-row[1]);
  return {
    ticks,
    basis: [
      Object.freeze({
        standard: "ANSI B4.1-1967",
        place: "modified standard fits, suffix S (basic shaft)",
        says: `all four limits moved by ${signedThouOfTicks(ticks)} thou: the largest shaft is the basic size`,
        how: "derived" as const,
        mark: "one-source" as const,
      }),
    ],
    cautions: [],
  };
}

/** Suffix B: the plus limit of the hole becomes one grade finer, and all limits drop by what it lost. */
function bilateralHole({ name, facts, row, steps, index, where }: TableRow): Shift {
  const grade = Number(facts.hole.slice(1));
  const end = steps.ends[index] ?? 0;
  const plusLimit = thouTicks(row[0]);
  if (thouTicks(inchGradeThou(grade, end)) !== plusLimit) {
    throw new LimitsError("INCH_ROW_NOT_DEFINED", `suffix B has no rule for ${name} ${where}`, {
      value: `${name}B, ${where}`,
      allowed: `${name} without suffix: its hole there is of no grade, so there is none one finer`,
    });
  }
  const ticks = thouTicks(inchGradeThou(grade - 1, end)) - plusLimit;
  return {
    ticks,
    basis: [
      inchGradeStep(grade - 1, end),
      Object.freeze({
        standard: "ANSI B4.1-1967",
        place: "modified standard fits, suffix B (bilateral hole)",
        says:
          `plus limit of the hole one grade finer than grade ${grade}, ` +
          `all four limits moved by ${signedThouOfTicks(ticks)} thou with it`,
        how: "derived" as const,
        mark: "memory" as const,
      }),
    ],
    cautions: [FROM_MEMORY],
  };
}
