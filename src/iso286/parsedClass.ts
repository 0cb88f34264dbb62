import type { ClassAtStep } from "./classAtStep.js";
import { STEP_COUNT } from "./sizeStep.js";
import type { GradeName, ToleranceClass } from "./toleranceClass.js";

/** A class that keeps, out of sight, what was worked out for it: one place for each size step of the tables. */
export class ParsedClass implements ToleranceClass {
  readonly text: string;
  readonly letter: string;
  readonly grade: GradeName;
  readonly kind: "hole" | "shaft";
  readonly #atSteps: (ClassAtStep | undefined)[] = new Array<ClassAtStep | undefined>(STEP_COUNT).fill(undefined);

  constructor(text: string, letter: string, grade: GradeName, kind: "hole" | "shaft") {
    this.text = text;
    this.letter = letter;
    this.grade = grade;
    this.kind = kind;
    Object.freeze(this);
  }

  /** True for a class made here; what travelled has its data only and is looked up by its text. */
  static made(value: object): value is ParsedClass {
    return #atSteps in value;
  }

  /** What was worked out for a step before. */
  atStep(index: number): ClassAtStep | undefined {
    return this.#atSteps[index];
  }

  /** Keeps what was worked out for a step; it depends on nothing else. */
  keep(index: number, found: ClassAtStep): ClassAtStep {
    this.#atSteps[index] = found;
    return found;
  }
}
