import type { BasisStep, Caution } from "../basis.js";
import { ownValue } from "../ownValue.js";

/** What goes with every result about the strength of a keyed joint. */
export const CARRIES_LOAD: Caution = Object.freeze({
  code: "KEY_CARRIES_LOAD",
  says:
    "A keyed joint carries load, and a key that fails can hurt someone. These are textbook checks of static torque: " +
    "shock, reversal, fatigue and stress concentration at the keyseat, uneven bearing and temperature are not in them. " +
    "Local codes and the judgement of a licensed engineer decide.",
});

/** A key that the standard does not list for this shaft. */
export const NOT_STANDARD: Caution = Object.freeze({
  code: "KEY_NOT_STANDARD",
  says:
    "The standard lists another key for this shaft diameter. A smaller key carries less torque, a larger one weakens " +
    "the shaft more: a licensed engineer decides.",
});

/** Values that rest on memory or contradict another print. */
export const DOUBTFUL: Caution = Object.freeze({
  code: "KEY_VALUE_DOUBTFUL",
  says: "A value here is remembered or printed in two ways, see the basis: check it against the standard before acceptance.",
});

/** True for a step that rests on memory or contradicts another print. */
export function isDoubtful(step: BasisStep): boolean {
  const mark = ownValue(step, "mark");
  return mark === "memory" || mark === "conflict";
}
