import { asLength } from "../units/index.js";
import type { AngleLike, LengthLike } from "../units/index.js";
import { angleByStandard } from "./angleByStandard.js";
import type { DefaultAngleLimits } from "./defaultValue.js";
import { generalTolerance } from "./generalTolerance.js";
import type { GeneralToleranceLike } from "./generalToleranceValue.js";

/**
 * The limits of an angle by a general tolerance standard.
 *
 * The tables go by the length of the shorter leg, not by the angle.
 *
 * @param angle - nominal angle, in degrees
 * @param shorterLeg - length of the shorter leg, over 0, any unit
 * @param standard - the indication, see {@link generalTolerance}: ISO 2768 with f, m, c, v or ISO 13920
 * @returns frozen limits of the angle, in degrees, the standard that applied, and cautions
 * @throws `GENERAL_TOLERANCE_OUT_OF_RANGE`, `GENERAL_TOLERANCE_NOT_CALLED` where the indication has no class for
 *   angles, `LENGTH_INVALID`, and what {@link generalTolerance} and `readAngle` throw
 * @example
 * ```ts
 * import { generalAngleLimits, mm } from "limitsmith";
 *
 * const found = generalAngleLimits("45°", mm(50), "ISO 2768-c");
 * found.limits.min.toString(); // → "44°"
 * found.limits.basis[1]?.place; // → "Table 3, shorter leg over 10 up to 50 mm"
 * generalAngleLimits("45°", mm(50), "DCTG 8"); // throws GENERAL_TOLERANCE_NOT_CALLED
 * ```
 * @reference ISO 2768-1:1989, Table 3; ISO 13920:2023, Table 2
 */
export function generalAngleLimits(
  angle: AngleLike,
  shorterLeg: LengthLike,
  standard: GeneralToleranceLike,
): DefaultAngleLimits {
  const called = generalTolerance(standard);
  return angleByStandard(angle, called, asLength(shorterLeg, ["shorterLeg"]), {
    standard: "the caller",
    place: "general tolerance",
    says: called.text,
    how: "caller",
  });
}
