import type { Basis, BasisStep } from "../basis.js";
import { LimitsError, attempt } from "../errors.js";
import { processesForGrade } from "../finish/index.js";
import type { ProcessesForGrade } from "../finish/index.js";
import { inchStandardTolerance } from "../inchFits/index.js";
import type { InchGrade } from "../inchFits/index.js";
import { standardTolerance } from "../iso286/index.js";
import type { GradeName } from "../iso286/index.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";

/** A size and the full width of its tolerance. */
export interface GradeQuestion {
  /** Nominal size, over 0, any unit. */
  readonly size: LengthLike;
  /** Full width of the tolerance, over 0, any unit. */
  readonly tolerance: LengthLike;
}

/** One grade with its tolerance at the size. */
export interface GradeAtSize<Grade> {
  /** The grade. */
  readonly grade: Grade;
  /** The tolerance. */
  readonly tolerance: Length;
}

/** Where a tolerance stands among the grades of one system. */
export interface GradeMatch<Grade> {
  /** The grade that the tolerance amounts to: the nearest one by ratio, the finer of two that are equally near. */
  readonly nearest: GradeAtSize<Grade>;
  /** True where the tolerance is exactly that of `nearest`. */
  readonly exact: boolean;
  /** The coarsest grade that lies wholly within the tolerance; `null` where even the finest is wider. */
  readonly within: GradeAtSize<Grade> | null;
  /** The next coarser grade; `null` where the tolerance is wider than the coarsest. */
  readonly beyond: GradeAtSize<Grade> | null;
  /** Which processes reach the nearest grade, by both charts. */
  readonly processes: ProcessesForGrade;
  /** Where it comes from. */
  readonly basis: Basis;
}

/** The grade of a tolerance in both systems. */
export interface GradeOfTolerance {
  /** ISO 286 grades; `null` where the size is outside the system. */
  readonly iso: GradeMatch<GradeName> | null;
  /** Grades 4 to 13 of ANSI B4.1; `null` where the size is outside the system. */
  readonly inch: GradeMatch<InchGrade> | null;
}

const INCH_GRADES: readonly InchGrade[] = [4, 5, 6, 7, 8, 9, 10, 11, 12, 13];

/**
 * Which grade a tolerance amounts to at a size, by ISO 286 and by ANSI B4.1, and which processes reach it.
 *
 * A tolerance seldom equals a grade; what counts is the grade that is nearest by ratio. `within` and `beyond` are the two
 * grades around it.
 *
 * @param question - `size` and `tolerance`, any units
 * @returns the frozen matches of both systems: tolerances in µm (ISO) and thou (inch), processes by both charts
 * @throws `OPTION_INVALID` where size or tolerance is not over 0, `LENGTH_INVALID`, and what `readLength` throws
 * @example
 * ```ts
 * import { gradeOfTolerance } from "limitsmith";
 *
 * const { iso, inch } = gradeOfTolerance({ size: "1.125 in", tolerance: "0.0008 in" });
 * [iso?.nearest.grade, iso?.exact, iso?.within?.grade, iso?.beyond?.grade]; // → ["IT7", false, "IT6", "IT7"]
 * [inch?.nearest.grade, inch?.exact]; // → [7, true]
 * iso?.processes.usual.some((one) => one.row === "reaming"); // → true
 * ```
 * @reference ISO 286-1:2010, Table 1; ANSI B4.1-1967, standard tolerances; process charts as {@link processesForGrade}
 */
export function gradeOfTolerance(question: GradeQuestion): GradeOfTolerance {
  const size = positive(ownValue(question, "size"), "size");
  const tolerance = positive(ownValue(question, "tolerance"), "tolerance");
  const isoGrades = ISO_GRADES.flatMap((grade) => {
    const found = attempt(() => standardTolerance(size, grade));
    return found.ok ? [{ ...found.value, number: numberOf(grade) }] : [];
  });
  const inchGrades = INCH_GRADES.flatMap((grade) => {
    const found = attempt(() => inchStandardTolerance(size, grade));
    return found.ok ? [{ ...found.value, number: grade }] : [];
  });
  return Object.freeze({ iso: matchOf(isoGrades, tolerance), inch: matchOf(inchGrades, tolerance) });
}

const ISO_GRADES: readonly GradeName[] = [
  "IT01",
  "IT0",
  "IT1",
  "IT2",
  "IT3",
  "IT4",
  "IT5",
  "IT6",
  "IT7",
  "IT8",
  "IT9",
  "IT10",
  "IT11",
  "IT12",
  "IT13",
  "IT14",
  "IT15",
  "IT16",
  "IT17",
  "IT18",
];

function numberOf(grade: GradeName): number {
  return grade === "IT01" ? -1 : Number(grade.slice(2));
}

interface Candidate<Grade> extends GradeAtSize<Grade> {
  readonly number: number;
  /** Where it comes from. */
  readonly basis: readonly BasisStep[];
}

function matchOf<Grade>(grades: readonly Candidate<Grade>[], { ticks }: Length): GradeMatch<Grade> | null {
  const within = grades.filter((one) => one.tolerance.ticks <= ticks).at(-1) ?? null;
  const beyond = grades.find((one) => one.tolerance.ticks > ticks) ?? null;
  const nearest = nearer(within, beyond, ticks);
  if (nearest === null) return null;
  return Object.freeze({
    nearest: plain(nearest),
    exact: nearest.tolerance.ticks === ticks,
    within: within === null ? null : plain(within),
    beyond: beyond === null ? null : plain(beyond),
    processes: processesForGrade(nearest.number),
    basis: Object.freeze([within, beyond].flatMap((one) => one?.basis ?? [])),
  });
}

/** By ratio: the geometric mean of two grades is the border between them. */
function nearer<Grade>(
  within: Candidate<Grade> | null,
  beyond: Candidate<Grade> | null,
  ticks: number,
): Candidate<Grade> | null {
  if (within === null || beyond === null) return within ?? beyond;
  return ticks * ticks <= within.tolerance.ticks * beyond.tolerance.ticks ? within : beyond;
}

function plain<Grade>({ grade, tolerance }: Candidate<Grade>): GradeAtSize<Grade> {
  return Object.freeze({ grade, tolerance });
}

function positive(value: LengthLike | undefined, name: string): Length {
  const length = asLength(value as LengthLike, [name]);
  if (length.ticks <= 0) {
    throw new LimitsError("OPTION_INVALID", `the ${name} is over zero`, { value: length.toString(), path: [name] });
  }
  return length;
}
