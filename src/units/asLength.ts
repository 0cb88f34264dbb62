import { atPath } from "../located.js";
import { LimitsError } from "../errors.js";
import { hasOwn } from "../ownValue.js";
import { isMadeLength, lengthOfTicks } from "./length.js";
import type { Length, LengthLike } from "./length.js";
import { readLength } from "./readLength.js";

/**
 * Takes a length in any shape it can travel in and gives a {@link Length} with its methods.
 *
 * A length is known by its data: what comes back from JSON, `structuredClone`, a worker or another copy
 * of the package is still a length.
 *
 * @param value - a length, its bare `{ ticks, unit }`, or its text with a unit
 * @param path - keys that lead to the value in the caller's data, for the error
 * @returns the same length, in its own unit
 * @throws `LENGTH_INVALID`, `UNIT_UNKNOWN`, `LENGTH_OUT_OF_RANGE`, and what {@link readLength} throws for a text
 * @example
 * ```ts
 * import { asLength, mm } from "limitsmith";
 *
 * const sent = structuredClone(mm("40.025")); // → { ticks: 400250000, unit: "mm" }
 * asLength(sent).to("um"); // → 40025
 * asLength("1 1/4 in").toString(); // → "1.25 in"
 * ```
 * @reference none: a convenience of this library
 */
export function asLength(value: LengthLike, path: readonly (string | number)[] = []): Length {
  if (typeof value === "string") return atPath(path, () => readLength(value));
  // the type says it cannot be anything else; what arrives from JavaScript can
  const given: unknown = value;
  if (typeof given !== "object" || given === null || !hasOwn(given, "ticks") || !hasOwn(given, "unit")) {
    throw new LimitsError("LENGTH_INVALID", "a length is needed here, with its unit", {
      value: given,
      allowed: 'a Length such as mm(40), its data { ticks, unit }, or a text with its unit such as "40 mm"',
      path,
    });
  }
  if (isMadeLength(value)) return value;
  if (!Number.isSafeInteger(value.ticks)) {
    throw new LimitsError("LENGTH_INVALID", "the ticks of a length are a whole number", { value: value.ticks, path });
  }
  return atPath(path, () => lengthOfTicks(value.ticks, value.unit));
}
