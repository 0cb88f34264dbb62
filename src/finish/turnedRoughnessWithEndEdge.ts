import type { Basis, Caution } from "../basis.js";
import { ownValue } from "../ownValue.js";
import type { AngleLike, Length, LengthLike } from "../units/index.js";
import {
  THEORETICAL_CAUTION,
  arcRoughness,
  edgeAngle,
  formStep,
  geometryError,
  largestArcFeed,
  rounded,
  toolLength,
} from "./arcRoughness.js";
import { unitFor } from "./buildRoughness.js";

/** Feed, nose radius and both edges of a turning tool. */
export interface EndEdgeCut {
  /** Feed per revolution, over 0. */
  readonly feed: LengthLike;
  /** Nose radius, over 0 up to 1 m. */
  readonly noseRadius: LengthLike;
  /** End (minor) cutting edge angle, over 0 to below 90°. */
  readonly endCuttingEdgeAngle: AngleLike;
  /** Side cutting edge angle, from 0 to below 90°: how far the nose reaches on the leading side; 0° unless said otherwise. */
  readonly sideCuttingEdgeAngle?: AngleLike;
}

/** Peak to valley of a nose with its end cutting edge. */
export interface EndEdgeRoughness {
  /** Theoretical total height. */
  readonly rt: Length;
  /** What cuts: the nose alone, or the nose and the straight end edge behind it. */
  readonly form: "circle" | "circle and end cutting edge";
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * Theoretical Rt of a turned surface where the end cutting edge may cut too.
 *
 * Up to f = 2 r sin Ce the nose alone: r − √(r² − f²/4). Beyond:
 * (1 − cos Ce) r + f sin Ce cos Ce − √(2 f r sin³Ce − f² sin⁴Ce). No form of Ra is given for that.
 *
 * @param cut - `feed`, `noseRadius` in any unit; `endCuttingEdgeAngle`, `sideCuttingEdgeAngle` in degrees
 * @returns the frozen height in µm (µin for a feed in inches), rounded to the tick of 0.1 nm, with the form's name
 * @throws `FINISH_GEOMETRY_INVALID` where the peak would rise above the nose on the leading side, `LENGTH_INVALID`,
 *   `ANGLE_INVALID`
 * @example
 * ```ts
 * import { turnedRoughnessWithEndEdge, writeLength } from "limitsmith";
 *
 * const cut = { feed: "0.3 mm", noseRadius: "0.4 mm", endCuttingEdgeAngle: "5°" };
 * writeLength(turnedRoughnessWithEndEdge(cut).rt, { places: 2 }); // → "15.17 µm"
 * ```
 * @reference geometry: envelope of an arc and the straight edge behind it
 */
export function turnedRoughnessWithEndEdge(cut: EndEdgeCut): EndEdgeRoughness {
  const feed = toolLength(ownValue(cut, "feed"), "feed");
  const radius = toolLength(ownValue(cut, "noseRadius"), "noseRadius");
  const end = edgeAngle(ownValue(cut, "endCuttingEdgeAngle"), "endCuttingEdgeAngle", "over 0");
  const side = edgeAngle(ownValue(cut, "sideCuttingEdgeAngle") ?? "0°", "sideCuttingEdgeAngle", "from 0");
  const alone = feed.ticks <= largestArcFeed(radius, end).ticks;
  const rt = alone ? arcRoughness(feed, radius).rtOfCircle : endEdgeHeight(feed, radius, end);
  // the nose ends on the leading side where the side cutting edge touches it
  if (!(rt.ticks <= radius.ticks * (1 - Math.sin(side)))) {
    throw geometryError("at this feed the side cutting edge cuts too: no form is known here", feed, "a smaller feed");
  }
  const says = "Rt = (1 - cos Ce) r + f sin Ce cos Ce - √(2 f r sin³ Ce - f² sin⁴ Ce) for f > 2 r sin Ce";
  return Object.freeze({
    rt,
    form: alone ? "circle" : "circle and end cutting edge",
    basis: Object.freeze([
      alone ? formStep("circle", "Rt = r - √(r² - f²/4)") : formStep("circle and end cutting edge", says),
    ]),
    cautions: Object.freeze([THEORETICAL_CAUTION]),
  });
}

function endEdgeHeight(feed: Length, radius: Length, end: number): Length {
  const [f, r, sin, cos] = [feed.ticks, radius.ticks, Math.sin(end), Math.cos(end)];
  const root = 2 * f * r * sin ** 3 - f * f * sin ** 4;
  if (root < 0) throw geometryError("at this feed the nose leaves no arc at all", feed, "a smaller feed");
  return rounded((1 - cos) * r + f * sin * cos - Math.sqrt(root), unitFor(feed));
}
