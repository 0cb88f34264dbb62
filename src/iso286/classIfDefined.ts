import { attempt } from "../errors.js";
import { classAtStep } from "./classAtStep.js";
import type { ClassAtStep } from "./classAtStep.js";
import { DEFAULT_ISO_OPTIONS } from "./isoOptions.js";
import type { ParsedClass } from "./parsedClass.js";

/** A class worked out for a step; `null` where the standard does not define it there. */
export function classIfDefined(cls: ParsedClass, stepIndex: number): ClassAtStep | null {
  const found = attempt(() => classAtStep(cls, stepIndex, DEFAULT_ISO_OPTIONS));
  return found.ok ? found.value : null;
}
