import type { Basis } from "../basis.js";

/** The basis of limits that the caller or the drawing gave as numbers. */
export function callerStep(says: string): Basis {
  return Object.freeze([Object.freeze({ standard: "the caller", place: "as given", says, how: "caller" as const })]);
}
