/** Standard tolerance grades, IT01 to IT18. */
export type GradeName =
  | "IT01"
  | "IT0"
  | "IT1"
  | "IT2"
  | "IT3"
  | "IT4"
  | "IT5"
  | "IT6"
  | "IT7"
  | "IT8"
  | "IT9"
  | "IT10"
  | "IT11"
  | "IT12"
  | "IT13"
  | "IT14"
  | "IT15"
  | "IT16"
  | "IT17"
  | "IT18";

/** A tolerance class such as m6 or H7, taken apart. */
export interface ToleranceClass {
  /** As it is written: `"m6"`. */
  readonly text: string;
  /** Fundamental deviation: small letters for shafts, capitals for holes. */
  readonly letter: string;
  /** Standard tolerance grade: its width. */
  readonly grade: GradeName;
  /** What the class is for, by the case of its letter. */
  readonly kind: "hole" | "shaft";
}

/** All grades, finest first. */
// prettier-ignore
export const GRADES: readonly GradeName[] = [
  "IT01", "IT0", "IT1", "IT2", "IT3", "IT4", "IT5", "IT6", "IT7", "IT8",
  "IT9", "IT10", "IT11", "IT12", "IT13", "IT14", "IT15", "IT16", "IT17", "IT18",
];

/** All letters of shafts, loosest first. */
// prettier-ignore
export const SHAFT_LETTERS: readonly string[] = [
  "a", "b", "c", "cd", "d", "e", "ef", "f", "fg", "g", "h", "js", "j", "k",
  "m", "n", "p", "r", "s", "t", "u", "v", "x", "y", "z", "za", "zb", "zc",
];

/** Number of a grade for comparison: IT01 is -1, IT0 is 0, IT7 is 7. */
export function gradeNumber(grade: GradeName): number {
  return grade === "IT01" ? -1 : Number(grade.slice(2));
}
