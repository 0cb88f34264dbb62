import type { Basis, Caution } from "../basis.js";
import { ownValue } from "../ownValue.js";
import type { AngleLike, Length, LengthLike } from "../units/index.js";
import {
  ARC_STEPS,
  THEORETICAL_CAUTION,
  arcRoughness,
  edgeAngle,
  formStep,
  geometryError,
  largestArcFeed,
  toolLength,
} from "./arcRoughness.js";

/** Feed and tool of a turning cut. */
export interface TurningCut {
  /** Feed per revolution, over 0 up to twice the nose radius. */
  readonly feed: LengthLike;
  /** Nose radius, over 0 up to 1 m. */
  readonly noseRadius: LengthLike;
  /** End (minor) cutting edge angle, over 0 to below 90°: where given, the feed is checked against its limit. */
  readonly endCuttingEdgeAngle?: AngleLike;
}

/** The roughness that geometry alone gives, each form by its name. */
export interface TheoreticalRoughness {
  /** Peak to valley by the parabola: f²/(8 r). */
  readonly rt: Length;
  /** Peak to valley by the circle itself: r − √(r² − f²/4). */
  readonly rtOfCircle: Length;
  /** Ra by the parabola, exactly: f²/(18 √3 r). */
  readonly ra: Length;
  /** Ra by the common short form: f²/(32 r). */
  readonly raShortForm: Length;
  /** Rq by the parabola: f²/(12 √5 r). */
  readonly rq: Length;
  /** Up to this feed only the nose cuts: 2 r sin Ce; `null` where no angle was given. */
  readonly largestFeed: Length | null;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * The theoretical roughness of a turned surface: the marks of a round nose, one to a revolution.
 *
 * Rt = f²/(8 r); Ra = f²/(18 √3 r) = 0.032075 f²/r; the popular short form is Ra = f²/(32 r).
 *
 * @param cut - `feed` per revolution and `noseRadius`, any unit; `endCuttingEdgeAngle` in degrees where known
 * @returns the frozen heights in µm (µin for a feed in inches), each rounded to the tick of 0.1 nm
 * @throws `FINISH_GEOMETRY_INVALID` for a feed over twice the radius or over the limit of the end cutting edge,
 *   `LENGTH_INVALID`, `ANGLE_INVALID`
 * @example
 * ```ts
 * import { turnedRoughness } from "limitsmith";
 *
 * const finish = turnedRoughness({ feed: "0.2 mm", noseRadius: "0.8 mm" });
 * finish.rt.toString(); // → "6.25 µm"
 * finish.ra.toString(); // → "1.6038 µm"
 * finish.raShortForm.toString(); // → "1.5625 µm"
 * turnedRoughness({ feed: "0.2 mm", noseRadius: "0.8 mm", endCuttingEdgeAngle: "5°" }); // throws FINISH_GEOMETRY_INVALID
 * ```
 * @reference geometry: z = x²/(2 r) over one feed; Rt as tool makers' formula pages print it
 */
export function turnedRoughness(cut: TurningCut): TheoreticalRoughness {
  const feed = toolLength(ownValue(cut, "feed"), "feed");
  const radius = toolLength(ownValue(cut, "noseRadius"), "noseRadius");
  const angle = ownValue(cut, "endCuttingEdgeAngle");
  const heights = arcRoughness(feed, radius);
  const largestFeed =
    angle === undefined ? null : largestArcFeed(radius, edgeAngle(angle, "endCuttingEdgeAngle", "over 0"));
  if (largestFeed !== null && feed.ticks > largestFeed.ticks) {
    throw geometryError(
      "at this feed the end cutting edge cuts too, and the form of the nose alone does not hold",
      feed,
      `up to ${largestFeed.toString()}; turnedRoughnessWithEndEdge gives Rt beyond it`,
    );
  }
  const limit = formStep("validity", "only the nose cuts while f <= 2 r sin Ce");
  return Object.freeze({
    ...heights,
    largestFeed,
    basis: Object.freeze([...ARC_STEPS, limit]),
    cautions: Object.freeze([THEORETICAL_CAUTION]),
  });
}
