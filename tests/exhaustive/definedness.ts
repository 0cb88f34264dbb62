/**
 * What the standard defines, written from its rules (ISO 286-1:2010 and the notes of 1988 where they are
 * kept) and not from the code under test: for each reason the words and the code that tells it.
 */
export interface Refusal {
  readonly code:
    "ISO_SIZE_OUT_OF_RANGE" | "ISO_GRADE_NOT_DEFINED" | "ISO_DEVIATION_NOT_DEFINED" | "ISO_CLASS_NOT_DEFINED";
  readonly why: string;
}

/** All shaft letters, from the largest clearance to the largest interference. */
export const LETTERS: readonly string[] = "a b c cd d e ef f fg g h js j k m n p r s t u v x y z za zb zc".split(" ");

/** Grades by number; IT01 is -1. */
export const GRADES: readonly number[] = Array.from({ length: 20 }, (_, index) => index - 1);

/** Upper ends of the intermediate size steps, in mm. */
export const STEP_ENDS_MM: readonly number[] =
  "3 6 10 14 18 24 30 40 50 65 80 100 120 140 160 180 200 225 250 280 315 355 400 450 500 560 630 710 800 900 1000 1120 1250 1400 1600 1800 2000 2240 2500 2800 3150"
    .split(" ")
    .map(Number);

/** Upper ends of the main size steps, in mm. */
export const MAIN_ENDS_MM: readonly number[] =
  "3 6 10 18 30 50 80 120 180 250 315 400 500 630 800 1000 1250 1600 2000 2500 3150".split(" ").map(Number);

/** Writes a class: letter, hole or shaft, grade number. */
export function classText(letter: string, hole: boolean, grade: number): string {
  return (hole ? letter.toUpperCase() : letter) + (grade === -1 ? "01" : String(grade));
}

const FROM_P: readonly string[] = LETTERS.slice(LETTERS.indexOf("p"));
const OVER_500: readonly string[] = "d e f g h js k m n p r s t u".split(" ");

/** Every reason why a class does not exist at a size in mm; empty where it does. */
export function refusals(
  letter: string,
  hole: boolean,
  grade: number,
  mm: number,
  edition: "2010" | "1988",
): Refusal[] {
  const found: Refusal[] = [];
  const refuse = (code: Refusal["code"], why: string): void => void found.push({ code, why });
  const over3to500 = mm > 3 && mm <= 500;

  if (mm <= 0 || mm > 3150) refuse("ISO_SIZE_OUT_OF_RANGE", "the system is for sizes over 0 up to 3150 mm");

  // grades
  if (grade <= 0 && mm > 500) refuse("ISO_GRADE_NOT_DEFINED", "IT01 and IT0 end at 500 mm");
  if (grade >= 14 && mm <= 1) refuse("ISO_GRADE_NOT_DEFINED", "IT14 to IT18 are not for sizes up to 1 mm");

  // letters by size
  if ((letter === "a" || letter === "b") && mm <= 1) {
    refuse("ISO_DEVIATION_NOT_DEFINED", "a, b, A, B are not for sizes up to 1 mm");
  }
  if (letter === "t" && mm <= 24) refuse("ISO_DEVIATION_NOT_DEFINED", "t and T begin over 24 mm");
  if (letter === "v" && mm <= 14) refuse("ISO_DEVIATION_NOT_DEFINED", "v and V begin over 14 mm");
  if (letter === "y" && mm <= 18) refuse("ISO_DEVIATION_NOT_DEFINED", "y and Y begin over 18 mm");
  if (letter === "cd" || letter === "ef" || letter === "fg") {
    if (mm > (edition === "1988" ? 10 : 50)) {
      refuse("ISO_DEVIATION_NOT_DEFINED", "cd, ef, fg end at 10 mm in 1988 and at 50 mm in 2010");
    }
  } else if (mm > 500 && !OVER_500.includes(letter)) {
    refuse("ISO_DEVIATION_NOT_DEFINED", "over 500 mm there are the letters d to u only, without j");
  }

  // letters by grade
  if (letter === "j") {
    if (hole && (grade < 6 || grade > 8)) refuse("ISO_CLASS_NOT_DEFINED", "J has grades 6, 7, 8 only");
    if (!hole && (grade < 5 || grade > 8)) refuse("ISO_CLASS_NOT_DEFINED", "j has grades 5, 6, 7, 8 only");
    if (!hole && grade === 8 && mm > 3) refuse("ISO_DEVIATION_NOT_DEFINED", "j8 ends at 3 mm");
  }
  if (hole && letter === "n" && grade > 8 && mm <= 1) {
    refuse("ISO_DEVIATION_NOT_DEFINED", "N above IT8 is not for sizes up to 1 mm");
  }
  if (hole && letter === "k" && grade > 8 && over3to500) {
    refuse("ISO_DEVIATION_NOT_DEFINED", "K above IT8 is not defined over 3 up to 500 mm");
  }
  const withDelta = letter === "k" || letter === "m" || letter === "n" || FROM_P.includes(letter);
  if (hole && withDelta && grade < 3 && over3to500) {
    refuse("ISO_CLASS_NOT_DEFINED", "holes K to ZC finer than IT3 have no delta over 3 up to 500 mm");
  }
  return found;
}
