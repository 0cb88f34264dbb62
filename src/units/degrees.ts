import { LimitsError } from "../errors.js";
import { angleOfMicroarcseconds } from "./angle.js";
import type { Angle } from "./angle.js";

/**
 * Makes an angle from decimal degrees.
 *
 * @param value - degrees, a finite number within ±2 500 000; rounded to the nearest millionth of an arc second
 * @returns the angle
 * @throws `NUMBER_NOT_FINITE`, `ANGLE_INVALID` for what is not a number, `ANGLE_OUT_OF_RANGE`
 * @example
 * ```ts
 * import { degrees } from "limitsmith";
 *
 * degrees(0.5).toString(); // → "0.5°"
 * ```
 * @reference 1° = 60' = 3600": ISO 80000-3:2019, table 2
 */
export function degrees(value: number): Angle {
  const given: unknown = value;
  if (typeof given !== "number") {
    throw new LimitsError("ANGLE_INVALID", "degrees are a number here", { value: given, allowed: "such as 0.5" });
  }
  if (!Number.isFinite(given)) {
    throw new LimitsError("NUMBER_NOT_FINITE", "an angle must be a finite number", { value: given });
  }
  const magnitude = Math.round(Math.abs(given) * 3_600_000_000);
  return angleOfMicroarcseconds(given < 0 ? -magnitude : magnitude, "decimal");
}
