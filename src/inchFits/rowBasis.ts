import { markOf } from "../basis.js";
import type { BasisStep, Caution } from "../basis.js";
import { GROUPS } from "./inchClass.js";
import type { InchFitReading } from "./inchFitReadings.js";
import type { InchRow } from "./inchColumn.js";
import type { TableRow } from "./tableRow.js";
import { plainThou, signedThou } from "./thouTicks.js";

/** Where a row stands and what it says: limits first, then the symbols. */
export function rowBasis(from: TableRow, reading: InchFitReading | null): readonly BasisStep[] {
  const { cls, name, facts, row, mark, where } = from;
  const built = mark === "f";
  const says = `hole ${signedThou(row[0])} / 0, shaft ${shaftText(row)}, ${limitsOfFitText(from)}, in thou`;
  return [
    Object.freeze({
      standard: "ANSI B4.1-1967",
      place: `${GROUPS.get(cls.letters) ?? ""}, ${name}, ${where}`,
      says: built
        ? `not read in print; built from symbol, standard tolerance and letter deviation: ${says}`
        : reading === null
          ? says
          : `${says} (${reading})`,
      how: built ? ("derived" as const) : ("tabulated" as const),
      mark: markOf(mark),
    }),
    Object.freeze({
      standard: "ANSI B4.1-1967",
      place: `hole and shaft symbols (ABC agreements), ${name}`,
      says: `hole ${facts.hole}, ${facts.shaft === null ? "no symbol for the shaft" : `shaft ${facts.shaft}`}`,
      how: "tabulated" as const,
      mark: facts.symbolMark,
    }),
  ];
}

/** What to weigh before relying on a row. */
export function rowCautions(
  { name, mark, where, readings }: TableRow,
  reading: InchFitReading | null,
): readonly Caution[] {
  if (mark === "m") {
    return [
      Object.freeze({
        code: "INCH_ROW_FROM_MEMORY",
        says:
          `The limits of ${name} ${where} were not read in a published table, only remembered; ` +
          "confirm them before relying on them.",
      }),
    ];
  }
  if (readings === null || reading === null) return [];
  return [
    Object.freeze({
      code: "INCH_ROW_CONFLICT",
      says:
        `Published tables differ for the shaft of ${name} ${where}: ${shaftText(readings.handbook)} thou in a handbook, ` +
        `${shaftText(readings["textbook appendix"])} thou in a textbook appendix. Followed here: ${reading}. ` +
        "Confirm it before relying on it.",
    }),
  ];
}

function limitsOfFitText({ cls, row: [, , , first, second] }: TableRow): string {
  switch (cls.letters) {
    case "RC":
    case "LC":
      return `clearance ${plainThou(first)} to ${plainThou(second)}`;
    case "LT":
      return `interference to ${plainThou(-first)}, clearance to ${plainThou(second)}`;
    case "LN":
    case "FN":
      return `interference ${plainThou(first)} to ${plainThou(second)}`;
  }
}

function shaftText(row: InchRow): string {
  return `${signedThou(row[1])} / ${signedThou(row[2])}`;
}
