import { attempt } from "../errors.js";
import type { LimitsProblem } from "../errors.js";
import { finishForFunction, processGrades, roughness } from "../finish/index.js";
import type { Roughness } from "../finish/index.js";
import { atPath } from "../located.js";
import type { DecimalMark, LengthUnit } from "../units/index.js";
import type { SizeFeatureSpec } from "./sheetSpec.js";
import type { SheetSurface } from "./sheetValue.js";

/** How roughness is read on one drawing. */
export interface FinishContext {
  readonly unit: LengthUnit;
  readonly decimalMark: DecimalMark;
  /** Finish all over except as noted; `null` where the title block has none. */
  readonly allOver: Roughness | null;
}

/** Reads a finish in the unit of the drawing: a bare `Ra 32` is in µin on an inch drawing, in µm on a metric one. */
export function readFinish(
  text: string,
  { unit, decimalMark }: Pick<FinishContext, "unit" | "decimalMark">,
): Roughness {
  return roughness(text, { unit: unit === "in" ? "uin" : "um", decimalMark });
}

/** The surface of a feature, its own or that of the title block; what cannot be read is a problem of its own. */
export function surfaceOf(
  spec: SizeFeatureSpec,
  index: number,
  context: FinishContext,
  problems: LimitsProblem[],
): SheetSurface | null {
  const read = <T>(key: "finish" | "process" | "function", task: () => T): T | null => {
    const done = attempt(() => atPath(["features", index, key], task));
    if (done.ok) return done.value;
    problems.push(done.error);
    return null;
  };
  const { finish: text, process, function: use } = spec;
  const own = text === undefined ? null : read("finish", () => readFinish(text, context));
  const knownProcess = process === undefined ? null : read("process", () => processGrades(process).process);
  const knownUse = use === undefined ? null : read("function", () => finishForFunction(use).function);
  // a finish that cannot be read is not replaced by that of the title block
  const finish = text === undefined ? context.allOver : own;
  if (finish === null && knownProcess === null && knownUse === null) return null;
  const from = finish === null ? null : own === null ? "title block" : "feature";
  return Object.freeze({ finish, from, process: knownProcess, function: knownUse });
}
