import type { BasisStep } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLength, subtract } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { callerStep } from "./callerStep.js";
import { designationOf } from "./designationOf.js";
import { freezeBasis } from "./freezeBasis.js";
import type { Limits } from "./limitsValue.js";
import { makeLimits } from "./makeLimits.js";

/** Two limits of size, with the nominal where one is known. */
export interface MaxMin {
  /** Upper limit of size. */
  readonly max: LengthLike;
  /** Lower limit of size; not over the upper one. */
  readonly min: LengthLike;
  /** Nominal size; the maximum where none is given, as limit dimensions have none. */
  readonly nominal?: LengthLike;
  /** Where the numbers come from; "the caller" unless said otherwise. */
  readonly basis?: readonly BasisStep[];
  /** Class behind the limits, if there is one. */
  readonly designation?: string | null;
}

/**
 * Makes limits from two limits of size, as limit dimensioning writes them.
 *
 * @param sizes - `max` and `min`, each with its unit; `nominal` where one is known (the maximum stands in for
 *   it otherwise, and the basis says so)
 * @returns frozen limits in the unit of the nominal
 * @throws `LIMITS_UPSIDE_DOWN` where max is below min, `LIMITS_INVALID`, `LENGTH_INVALID`, and what
 *   `readLength` throws for a text
 * @example
 * ```ts
 * import { inch, limitsFromMaxMin } from "limitsmith";
 *
 * const bore = limitsFromMaxMin({ max: inch(".7530"), min: inch(".7500"), nominal: inch(".75") });
 * bore.upperDeviation.to("thou"); // → 3
 * ```
 * @reference ASME Y14.5-2018, 5.2 (limit dimensioning), from memory
 */
export function limitsFromMaxMin(sizes: MaxMin): Limits {
  const given: unknown = sizes;
  if (typeof given !== "object" || given === null) {
    throw new LimitsError("LIMITS_INVALID", "limits are made from { max, min }", { value: given });
  }
  const max = asLength(size(sizes, "max"), ["max"]);
  const min = asLength(size(sizes, "min"), ["min"]);
  const nominalGiven = ownValue(sizes, "nominal");
  const nominal = nominalGiven === undefined ? max : asLength(nominalGiven, ["nominal"]);
  const basis = ownValue(sizes, "basis");
  const says =
    nominalGiven === undefined ? "two limits of size; the maximum stands in for the nominal" : "two limits of size";
  return makeLimits(
    nominal,
    subtract(max, nominal),
    subtract(min, nominal),
    basis === undefined ? callerStep(says) : freezeBasis(basis),
    designationOf(ownValue(sizes, "designation")),
  );
}

function size(sizes: MaxMin, name: "max" | "min"): LengthLike {
  const value = ownValue(sizes, name);
  if (value === undefined) {
    throw new LimitsError("LIMITS_INVALID", `${name} is missing`, { allowed: "{ max, min }", path: [name] });
  }
  return value;
}
