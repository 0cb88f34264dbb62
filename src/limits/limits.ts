import type { BasisStep } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { callerStep } from "./callerStep.js";
import { designationOf } from "./designationOf.js";
import { freezeBasis } from "./freezeBasis.js";
import type { Limits } from "./limitsValue.js";
import { makeLimits } from "./makeLimits.js";

/** A nominal size with its two limit deviations. */
export interface LimitsParts {
  /** Nominal size. */
  readonly nominal: LengthLike;
  /** Upper limit deviation, signed. */
  readonly upper: LengthLike;
  /** Lower limit deviation, signed; not over the upper one. */
  readonly lower: LengthLike;
  /** Where the numbers come from; "the caller" unless said otherwise. */
  readonly basis?: readonly BasisStep[];
  /** Class behind the limits, if there is one. */
  readonly designation?: string | null;
}

/**
 * Makes limits from a nominal size and its two limit deviations.
 *
 * @param parts - `nominal` size and the `upper` and `lower` limit deviations, signed, each with its unit;
 *   `basis` and `designation` where you know them
 * @returns frozen limits with max, min, tolerance and mean, in the nominal's unit
 * @throws `LIMITS_UPSIDE_DOWN` where upper is below lower, `LIMITS_INVALID`, `LENGTH_INVALID`,
 *   and what `readLength` throws for a text
 * @example
 * ```ts
 * import { inch, limits, thou } from "limitsmith";
 *
 * const seat = limits({ nominal: inch("1.375"), upper: thou(2), lower: thou("1.4") });
 * seat.max.toString(); // → "1.377 in"
 * seat.tolerance.toString(); // → "0.6 thou"
 * ```
 * @reference ISO 286-1:2010, 3.2: max = nominal + upper deviation, min = nominal + lower deviation
 */
export function limits(parts: LimitsParts): Limits {
  const given: unknown = parts;
  if (typeof given !== "object" || given === null) {
    throw new LimitsError("LIMITS_INVALID", "limits are made from { nominal, upper, lower }", { value: given });
  }
  const nominal = asLength(part(parts, "nominal"), ["nominal"]);
  const upper = asLength(part(parts, "upper"), ["upper"]);
  const lower = asLength(part(parts, "lower"), ["lower"]);
  const basis = ownValue(parts, "basis");
  return makeLimits(
    nominal,
    upper,
    lower,
    basis === undefined ? callerStep("nominal size and deviations") : freezeBasis(basis),
    designationOf(ownValue(parts, "designation")),
  );
}

function part(parts: LimitsParts, name: "nominal" | "upper" | "lower"): LengthLike {
  const value = ownValue(parts, name);
  if (value === undefined) {
    throw new LimitsError("LIMITS_INVALID", `${name} is missing`, {
      allowed: "{ nominal, upper, lower }",
      path: [name],
    });
  }
  return value;
}
