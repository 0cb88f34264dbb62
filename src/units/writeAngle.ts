import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { angleOfMicroarcseconds } from "./angle.js";
import type { AngleLike, AngleStyle } from "./angle.js";
import { readAngle } from "./readAngle.js";

/** Options of {@link writeAngle}. */
export interface WriteAngleOptions {
  /** As it was written unless said otherwise. */
  readonly style?: AngleStyle;
}

/**
 * Writes an angle as drawings do, exactly.
 *
 * @param angle - an angle in degrees: an `Angle`, its data or its text
 * @param options - `style`: `"decimal"` or `"dms"`; as it was written unless said otherwise
 * @returns the text in degrees; a decimal that would not end is written in degrees, minutes and seconds
 * @throws `OPTION_INVALID`, and what {@link readAngle} throws
 * @example
 * ```ts
 * import { degrees, writeAngle } from "limitsmith";
 *
 * writeAngle(degrees(0.5), { style: "dms" }); // → "0°30'"
 * writeAngle("7°7'30\"", { style: "decimal" }); // → "7.125°"
 * ```
 * @reference 1° = 60' = 3600": ISO 80000-3:2019, table 2
 */
export function writeAngle(angle: AngleLike, options?: WriteAngleOptions): string {
  const value = readAngle(angle);
  const style: unknown = ownValue(options, "style") ?? value.style;
  if (style !== "decimal" && style !== "dms") {
    throw new LimitsError("OPTION_INVALID", "not a style of angle", { value: style, allowed: "decimal, dms" });
  }
  return angleOfMicroarcseconds(value.microarcseconds, style).toString();
}
