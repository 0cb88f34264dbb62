import type { BasisStep } from "../basis.js";
import { lengthOfTicks } from "../units/index.js";
import type { Length } from "../units/index.js";
import { cellAt, cellStep } from "./rangeTable.js";
import type { RangeTable } from "./rangeTable.js";

/** A total tolerance and why. */
export interface FoundForm {
  readonly tolerance: Length;
  readonly steps: readonly BasisStep[];
}

const TICKS_PER_UM = 10_000;

/** The total tolerance of a class at a length. */
export function formInTable<Class extends string>(table: RangeTable<Class>, cls: Class, length: Length): FoundForm {
  const cell = cellAt(table, cls, `class ${cls}`, length);
  const tolerance = lengthOfTicks(cell.value * TICKS_PER_UM, "mm");
  return { tolerance, steps: [cellStep(table.standard, cell, `class ${cls}: ${tolerance.toString()} in all`)] };
}
