import type { BasisStep } from "../basis.js";
import { LimitsError } from "../errors.js";
import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { callerStep } from "./callerStep.js";
import { freezeBasis } from "./freezeBasis.js";
import type { SingleLimit } from "./limitsValue.js";

/**
 * Makes a single limit: a size marked MAX or MIN, with no limit on its other side.
 *
 * @param kind - `"max"` or `"min"`
 * @param limit - the limit of size, any unit
 * @param basis - where it comes from; "the caller" unless said otherwise
 * @returns the frozen single limit, in its own unit
 * @throws `LIMITS_INVALID` for another kind, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { inch, singleLimit } from "limitsmith";
 *
 * singleLimit("max", inch(".015")).limit.toString(); // → "0.015 in"
 * ```
 * @reference ASME Y14.5-2018, 5.9 (single limits), from memory
 */
export function singleLimit(kind: "max" | "min", limit: LengthLike, basis?: readonly BasisStep[]): SingleLimit {
  const given: unknown = kind;
  if (given !== "max" && given !== "min") {
    throw new LimitsError("LIMITS_INVALID", "a single limit is a maximum or a minimum", {
      value: given,
      allowed: "max, min",
    });
  }
  return Object.freeze({
    kind: given,
    limit: asLength(limit, ["limit"]),
    basis: basis === undefined ? callerStep(`a single limit, ${given}`) : freezeBasis(basis),
  });
}
