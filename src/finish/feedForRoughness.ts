import type { Basis, Caution } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { lengthOfTicks } from "../units/index.js";
import type { AngleLike, Length, LengthLike } from "../units/index.js";
import {
  ARC_STEPS,
  PARABOLA_RA,
  THEORETICAL_CAUTION,
  edgeAngle,
  geometryError,
  largestArcFeed,
  toolLength,
} from "./arcRoughness.js";
import { asRoughness } from "./asRoughness.js";
import type { RoughnessLike } from "./roughnessValue.js";

/** The form that gives Ra: the exact value of the parabola, or the common short form. */
export type RaForm = "parabola" | "short form";

/** The Ra that is wanted of a turned surface, and the tool. */
export interface WantedRoughness {
  /** Wanted Ra, with its unit. */
  readonly ra: RoughnessLike;
  /** Nose radius, over 0 up to 1 m. */
  readonly noseRadius: LengthLike;
  /** `"parabola"` unless said otherwise: Ra = f²/(18 √3 r); `"short form"`: Ra = f²/(32 r). */
  readonly form?: RaForm;
  /** End cutting edge angle, over 0 to below 90°, where known. */
  readonly endCuttingEdgeAngle?: AngleLike;
}

/** A feed for a wanted roughness. */
export interface FeedForRoughness {
  /** Largest feed per revolution by the form, rounded down to the tick of 0.1 nm. */
  readonly feed: Length;
  /** Which form was used. */
  readonly form: RaForm;
  /** Up to this feed only the nose cuts; `null` where no angle was given. */
  readonly largestFeed: Length | null;
  /** False where `feed` is over `largestFeed`: the form does not hold there; `null` where no angle was given. */
  readonly formHolds: boolean | null;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * The largest feed whose theoretical Ra is not over the wanted one.
 *
 * @param wanted - `ra` and `noseRadius` with their units, `form`, `endCuttingEdgeAngle` in degrees
 * @returns the frozen feed per revolution, in mm or inches as the radius is written
 * @throws `FINISH_GEOMETRY_INVALID` where the feed comes out wider than twice the radius, `OPTION_INVALID`,
 *   `LENGTH_INVALID`, `ANGLE_INVALID`, and what {@link asRoughness} throws
 * @example
 * ```ts
 * import { feedForRoughness, writeLength } from "limitsmith";
 *
 * const { feed } = feedForRoughness({ ra: "3.2 µm", noseRadius: "1.2 mm" });
 * writeLength(feed, { places: 3, rounding: "down" }); // → "0.346 mm"
 * ```
 * @reference geometry: f = √(18 √3 r Ra), or √(32 r Ra) by the short form
 */
export function feedForRoughness(wanted: WantedRoughness): FeedForRoughness {
  const { ra } = asRoughness(ownValue(wanted, "ra") as RoughnessLike, ["ra"]);
  const radius = toolLength(ownValue(wanted, "noseRadius"), "noseRadius");
  const form: unknown = ownValue(wanted, "form") ?? "parabola";
  if (form !== "parabola" && form !== "short form") {
    throw new LimitsError("OPTION_INVALID", "not a form of Ra", { value: form, allowed: "parabola, short form" });
  }
  const coefficient = form === "parabola" ? PARABOLA_RA : 1 / 32;
  const metric = radius.unit === "mm" || radius.unit === "um";
  const feed = lengthOfTicks(Math.floor(Math.sqrt((ra.ticks * radius.ticks) / coefficient)), metric ? "mm" : "in");
  if (feed.ticks > 2 * radius.ticks) {
    throw geometryError("so rough a surface is not made by this nose alone", feed, "a feed up to twice the radius");
  }
  const angle = ownValue(wanted, "endCuttingEdgeAngle");
  const largestFeed =
    angle === undefined ? null : largestArcFeed(radius, edgeAngle(angle, "endCuttingEdgeAngle", "over 0"));
  return Object.freeze({
    feed,
    form,
    largestFeed,
    formHolds: largestFeed === null ? null : feed.ticks <= largestFeed.ticks,
    basis: Object.freeze([...ARC_STEPS]),
    cautions: Object.freeze([THEORETICAL_CAUTION]),
  });
}
