import { ownValue } from "../ownValue.js";
import type { Length } from "../units/index.js";
import { edgeAngle, largestArcFeed, toolLength } from "./arcRoughness.js";
import type { TurningCut } from "./turnedRoughness.js";

/**
 * The largest feed at which only the round nose cuts the finished surface: 2 r sin Ce.
 *
 * @param tool - `noseRadius` in any unit and `endCuttingEdgeAngle`, over 0 to below 90 degrees
 * @returns the feed per revolution in the unit of the radius, rounded down to the tick of 0.1 nm
 * @throws `FINISH_GEOMETRY_INVALID`, `LENGTH_INVALID`, `ANGLE_INVALID`
 * @example
 * ```ts
 * import { largestNoseFeed, writeLength } from "limitsmith";
 *
 * const feed = largestNoseFeed({ noseRadius: "0.8 mm", endCuttingEdgeAngle: "10°" });
 * writeLength(feed, { places: 3 }); // → "0.278 mm"
 * ```
 * @reference geometry: the arc ends where its slope meets the end cutting edge
 */
export function largestNoseFeed(tool: Required<Pick<TurningCut, "noseRadius" | "endCuttingEdgeAngle">>): Length {
  const radius = toolLength(ownValue(tool, "noseRadius"), "noseRadius");
  return largestArcFeed(radius, edgeAngle(ownValue(tool, "endCuttingEdgeAngle"), "endCuttingEdgeAngle", "over 0"));
}
