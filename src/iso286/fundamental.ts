import { markOf } from "../basis.js";
import type { BasisStep } from "../basis.js";
import { LimitsError } from "../errors.js";
import type { DeviationColumn } from "./deviationColumn.js";
import type { IsoEdition } from "./isoOptions.js";
import { stepText } from "./sizeStep.js";
import type { SizeStep } from "./sizeStep.js";
import { DELTAS_UM } from "./tables/deltas.js";
import { HOLES_J, K_OVER_400_TO_500_MARK, M6_OVER_250_TO_315_MARK, M6_OVER_250_TO_315_UM } from "./tables/holesAToM.js";
import { SHAFTS_A_TO_H, SHAFTS_J } from "./tables/shaftsAToJ.js";
import { SHAFTS_K_TO_ZC } from "./tables/shaftsKToZc.js";
import { INTERMEDIATE_STEP_ENDS_MM, MAIN_STEP_ENDS_MM } from "./tables/sizeSteps.js";
import { gradeNumber } from "./toleranceClass.js";
import type { ToleranceClass } from "./toleranceClass.js";

/** A fundamental deviation in µm and where it stands. */
export interface Fundamental {
  /** The limit deviation that it fixes; `both` for js and JS. */
  readonly limit: "upper" | "lower" | "both";
  readonly um: number;
  /** The delta that is part of it; 0 where none applies. */
  readonly deltaUm: number;
  readonly basis: readonly BasisStep[];
}

const toH: ReadonlyMap<string, DeviationColumn> = new Map(Object.entries(SHAFTS_A_TO_H));
const fromK: ReadonlyMap<string, DeviationColumn> = new Map(Object.entries(SHAFTS_K_TO_ZC));
const ofJ: ReadonlyMap<string, DeviationColumn> = new Map(Object.entries({ ...SHAFTS_J, ...HOLES_J }));

// main steps 0 (to 3 mm) to 12 (400 to 500 mm): delta applies between them
const FIRST_DELTA_STEP = 1;
const LAST_DELTA_STEP = 12;
const STEP_250_TO_315 = 10;
const STEP_400_TO_500 = LAST_DELTA_STEP;
// main steps to 10 mm: all that the 1988 edition gives for cd, ef and fg
const STEPS_TO_10_MM = 3;

/** What practice takes where a letter has no value yet: common practice, from memory. */
const PRACTICE: ReadonlyMap<string, string> = new Map([
  ["t", "u"],
  ["v", "x"],
  ["y", "z"],
]);

/** The fundamental deviation of a class at a size step; `gradeUm` is its standard tolerance there. */
export function fundamental(cls: ToleranceClass, step: SizeStep, gradeUm: number, edition: IsoEdition): Fundamental {
  const { letter, kind } = cls;
  const small = letter.toLowerCase();
  if (small === "js") return halfGrade(cls, gradeUm);
  if (small === "j") return jDeviation(cls, step);
  const column = toH.get(small);
  if (column === undefined) return kind === "shaft" ? shaftFromK(cls, step) : holeFromK(cls, step);
  return toHDeviation(cls, column, step, edition);
}

/** a to h give es; A to H give EI = -es. */
function toHDeviation(cls: ToleranceClass, column: DeviationColumn, step: SizeStep, edition: IsoEdition): Fundamental {
  const small = cls.letter.toLowerCase();
  if (step.tiny && (small === "a" || small === "b")) {
    throw notDefined(cls, step, "is not defined up to 1 mm in any grade", `${cls.letter} over 1 up to 500 mm`);
  }
  if (edition === "1988" && small.length === 2 && step.main >= STEPS_TO_10_MM) {
    throw notDefined(
      cls,
      step,
      "ends at 10 mm in the 1988 edition",
      `${cls.letter} up to 10 mm; to 50 mm in edition 2010`,
    );
  }
  const { um, mark } = columnValue(cls, column, step);
  const place = `Table ${cls.kind === "shaft" ? 4 : 2}, ${stepText(step, column.steps)}`;
  return cls.kind === "shaft"
    ? tabulated("upper", um, place, `${cls.letter}: es = ${signed(um)} µm`, mark)
    : tabulated("lower", mirror(um), place, `${cls.letter}: EI = ${signed(mirror(um))} µm`, mark);
}

/** js and JS lie evenly about the nominal: ±IT/2. */
function halfGrade(cls: ToleranceClass, gradeUm: number): Fundamental {
  return {
    limit: "both",
    um: gradeUm / 2,
    deltaUm: 0,
    basis: [
      Object.freeze({
        standard: "ISO 286-1:2010",
        place: `Table ${cls.kind === "shaft" ? 4 : 2}, column ${cls.letter}`,
        says: `${cls.letter}: ±${cls.grade}/2`,
        how: "tabulated" as const,
        mark: "two-sources" as const,
      }),
    ],
  };
}

/** j and J have values of their own in a few grades only. */
function jDeviation(cls: ToleranceClass, step: SizeStep): Fundamental {
  const column = ofJ.get(cls.text);
  const shaft = cls.kind === "shaft";
  if (column === undefined) {
    throw new LimitsError("ISO_CLASS_NOT_DEFINED", `${cls.text} has no values`, {
      value: cls.text,
      allowed: shaft
        ? "j5, j6, j7 up to 500 mm, j8 up to 3 mm; js in any grade"
        : "J6, J7, J8 up to 500 mm; JS in any grade",
    });
  }
  const { um, mark } = columnValue(cls, column, step);
  const place = `Table ${shaft ? 4 : 2}, ${stepText(step, column.steps)}`;
  return tabulated(
    shaft ? "lower" : "upper",
    um,
    place,
    `${cls.text}: ${shaft ? "ei" : "ES"} = ${signed(um)} µm`,
    mark,
  );
}

/** k to zc give ei. */
function shaftFromK(cls: ToleranceClass, step: SizeStep): Fundamental {
  const column = columnFromK(cls);
  const { um, mark } = columnValue(cls, column, step);
  const grade = gradeNumber(cls.grade);
  // k: the printed value is for IT4 to IT7, zero for all other grades
  const value = cls.letter === "k" && (grade < 4 || grade > 7) ? 0 : um;
  const place = `Table 5, ${stepText(step, column.steps)}`;
  return tabulated("lower", value, place, `${cls.text}: ei = ${signed(value)} µm`, mark);
}

/** K to ZC give ES: the mirrored shaft value, with delta in the finer grades over 3 up to 500 mm. */
function holeFromK(cls: ToleranceClass, step: SizeStep): Fundamental {
  const column = columnFromK(cls);
  const { um, mark: shaftMark } = columnValue(cls, column, step);
  const grade = gradeNumber(cls.grade);
  const { letter } = cls;
  const mark = letter === "K" && step.main === STEP_400_TO_500 ? K_OVER_400_TO_500_MARK : shaftMark;
  const early = letter === "K" || letter === "M" || letter === "N";
  const place = `Table ${letter === "K" || letter === "M" ? 2 : 3}, ${stepText(step, column.steps)}`;
  const mirrored = (es: number, sure = mark): Fundamental =>
    tabulated("upper", es, place, `${cls.text}: ES = ${signed(es)} µm`, sure);

  if (step.main < FIRST_DELTA_STEP || step.main > LAST_DELTA_STEP) {
    if (letter === "N" && step.tiny && grade > 8) {
      throw notDefined(cls, step, "is not defined in grades above IT8 up to 1 mm", "N to IT8 up to 1 mm");
    }
    return mirrored(mirror(um));
  }
  if (grade < 3) {
    throw new LimitsError("ISO_CLASS_NOT_DEFINED", `${cls.text} is not defined over 3 up to 500 mm`, {
      value: cls.text,
      allowed: `${letter} in IT3 and coarser there: no delta is given for finer grades`,
    });
  }
  if (grade > (early ? 8 : 7)) {
    if (letter === "K") {
      throw notDefined(cls, step, "is not defined in grades above IT8 over 3 up to 500 mm", "K3 to K8 there");
    }
    return mirrored(letter === "N" ? 0 : mirror(um));
  }
  if (cls.text === "M6" && step.main === STEP_250_TO_315) {
    return mirrored(M6_OVER_250_TO_315_UM, M6_OVER_250_TO_315_MARK);
  }
  return withDelta(cls, mirror(um), deltaOf(grade, step), place, mark);
}

function deltaOf(grade: number, step: SizeStep): number {
  const column = DELTAS_UM[grade as 3 | 4 | 5 | 6 | 7 | 8];
  return column[step.main - FIRST_DELTA_STEP] ?? 0;
}

function withDelta(cls: ToleranceClass, um: number, deltaUm: number, place: string, mark: string): Fundamental {
  const says = `${cls.text}: ES = ${signed(um)} + delta ${deltaUm} = ${signed(um + deltaUm)} µm`;
  return { ...tabulated("upper", um + deltaUm, `${place}, with delta for ${cls.grade}`, says, mark), deltaUm };
}

function columnFromK(cls: ToleranceClass): DeviationColumn {
  const column = fromK.get(cls.letter.toLowerCase());
  if (column === undefined) {
    throw new LimitsError("CLASS_LETTER_UNKNOWN", "no fundamental deviation has this letter", { value: cls.text });
  }
  return column;
}

function columnValue(cls: ToleranceClass, column: DeviationColumn, step: SizeStep): { um: number; mark: string } {
  const index = step[column.steps] - column.first;
  const um = column.um[index];
  if (um === undefined) {
    const ends = column.steps === "main" ? MAIN_STEP_ENDS_MM : INTERMEDIATE_STEP_ENDS_MM;
    const over = column.first === 0 ? "" : `over ${ends[column.first - 1] ?? 0} `;
    const range = `${cls.letter} ${over}up to ${ends[column.first + column.um.length - 1] ?? 0} mm`;
    const instead = index < 0 ? PRACTICE.get(cls.letter.toLowerCase()) : undefined;
    const practice =
      instead === undefined
        ? ""
        : `; practice takes ${cls.kind === "shaft" ? instead : instead.toUpperCase()} here (common practice, from memory)`;
    throw notDefined(cls, step, "is not defined for this size", range + practice);
  }
  return { um, mark: column.marks[index] ?? "" };
}

function tabulated(limit: "upper" | "lower", um: number, place: string, says: string, mark: string): Fundamental {
  return {
    limit,
    um,
    deltaUm: 0,
    basis: [
      Object.freeze({
        standard: "ISO 286-1:2010",
        place,
        says,
        how: "tabulated" as const,
        mark: markOf(mark),
      }),
    ],
  };
}

function notDefined(cls: ToleranceClass, step: SizeStep, why: string, allowed: string): LimitsError {
  const where = step.tiny ? "up to 1 mm" : stepText(step, "intermediate");
  return new LimitsError("ISO_DEVIATION_NOT_DEFINED", `${cls.letter} ${why}`, {
    value: `${cls.text}, ${where}`,
    allowed,
  });
}

/** The value of the other side of the zero line; never a negative zero. */
function mirror(um: number): number {
  return 0 - um;
}

function signed(um: number): string {
  return um > 0 ? `+${um}` : um < 0 ? `-${-um}` : "0";
}
