import { parsedClass } from "./parseToleranceClass.js";
import { GRADES, SHAFT_LETTERS } from "./toleranceClass.js";
import type { ParsedClass } from "./parsedClass.js";

/** Every letter with every grade, on one side; many are not defined at a given size. */
export function allClasses(kind: "hole" | "shaft"): readonly ParsedClass[] {
  return SHAFT_LETTERS.flatMap((letter) =>
    GRADES.map((grade) => parsedClass((kind === "hole" ? letter.toUpperCase() : letter) + grade.slice(2))),
  );
}
