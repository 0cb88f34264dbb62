import type { Basis, BasisStep } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { angleOfMicroarcseconds, readAngle } from "../units/index.js";
import type { Angle, AngleLike } from "../units/index.js";
import { callerStep } from "./callerStep.js";
import { freezeBasis } from "./freezeBasis.js";

/** A toleranced angle: plain frozen data. */
export interface AngleLimits {
  /** Nominal angle that the deviations count from. */
  readonly nominal: Angle;
  /** Upper limit deviation: `max - nominal`. */
  readonly upperDeviation: Angle;
  /** Lower limit deviation: `min - nominal`. */
  readonly lowerDeviation: Angle;
  /** Largest angle allowed. */
  readonly max: Angle;
  /** Smallest angle allowed. */
  readonly min: Angle;
  /** `max - min`. */
  readonly tolerance: Angle;
  /** Where the numbers come from. */
  readonly basis: Basis;
}

/** A nominal angle with its two deviations. */
export interface AngleLimitsParts {
  /** Nominal angle. */
  readonly nominal: AngleLike;
  /** Upper limit deviation, signed. */
  readonly upper: AngleLike;
  /** Lower limit deviation, signed; not over the upper one. */
  readonly lower: AngleLike;
  /** Where the numbers come from; "the caller" unless said otherwise. */
  readonly basis?: readonly BasisStep[];
}

/**
 * Makes limits of an angle from its nominal and its two deviations.
 *
 * @param parts - `nominal`, `upper` and `lower` as angles in degrees, the deviations signed; `basis` where known
 * @returns frozen limits of the angle, all in degrees
 * @throws `LIMITS_UPSIDE_DOWN` where upper is below lower, and what {@link readAngle} throws
 * @example
 * ```ts
 * import { angleLimits } from "limitsmith";
 *
 * angleLimits({ nominal: "45°", upper: "0°30'", lower: "-0°30'" }).min.toString(); // → "44.5°"
 * ```
 * @reference ISO 14405-3:2016, angular sizes, from memory; 1° = 60'
 */
export function angleLimits(parts: AngleLimitsParts): AngleLimits {
  const nominal = readAngle(ownValue(parts, "nominal") as AngleLike);
  const upper = readAngle(ownValue(parts, "upper") as AngleLike);
  const lower = readAngle(ownValue(parts, "lower") as AngleLike);
  if (upper.microarcseconds < lower.microarcseconds) {
    throw new LimitsError("LIMITS_UPSIDE_DOWN", "the upper limit lies below the lower one", {
      value: `${upper.toString()} / ${lower.toString()}`,
      allowed: "an upper deviation that is not less than the lower one",
    });
  }
  const basis = ownValue(parts, "basis");
  const at = (microarcseconds: number): Angle => angleOfMicroarcseconds(microarcseconds, nominal.style);
  return Object.freeze({
    nominal,
    upperDeviation: upper,
    lowerDeviation: lower,
    max: at(nominal.microarcseconds + upper.microarcseconds),
    min: at(nominal.microarcseconds + lower.microarcseconds),
    tolerance: at(upper.microarcseconds - lower.microarcseconds),
    basis: basis === undefined ? callerStep("nominal angle and deviations") : freezeBasis(basis),
  });
}
