import type { Basis, BasisHow, BasisStep, Mark } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";

const HOWS: readonly BasisHow[] = ["tabulated", "derived", "common practice", "caller"];
const MARKS: readonly Mark[] = ["two-sources", "one-source+formula", "one-source", "formula", "memory", "conflict"];

/** Copies a caller's basis into a frozen one, checked field by field. */
export function freezeBasis(steps: readonly BasisStep[]): Basis {
  const given: unknown = steps;
  if (!Array.isArray(given)) {
    throw new LimitsError("LIMITS_INVALID", "a basis is a list of steps", { value: given, path: ["basis"] });
  }
  return Object.freeze(steps.map(freezeStep));
}

function freezeStep(step: BasisStep, index: number): BasisStep {
  const standard: unknown = ownValue(step, "standard");
  const place: unknown = ownValue(step, "place");
  const says: unknown = ownValue(step, "says");
  const how = ownValue(step, "how");
  const mark = ownValue(step, "mark");
  if (
    typeof standard !== "string" ||
    typeof place !== "string" ||
    typeof says !== "string" ||
    how === undefined ||
    !HOWS.includes(how) ||
    (mark !== undefined && !MARKS.includes(mark))
  ) {
    throw new LimitsError("LIMITS_INVALID", "a step of the basis needs standard, place, says and how", {
      value: step,
      allowed: `how: ${HOWS.join(", ")}; mark, if any: ${MARKS.join(", ")}`,
      path: ["basis", index],
    });
  }
  return Object.freeze(mark === undefined ? { standard, place, says, how } : { standard, place, says, how, mark });
}
