import type { BasisStep, Caution } from "../basis.js";
import { LimitsError } from "../errors.js";
import { asLength, lengthOfTicks, multiply, readAngle } from "../units/index.js";
import type { AngleLike, Length, LengthLike } from "../units/index.js";
import { unitFor } from "./buildRoughness.js";

/** One metre: no tool or feed is larger, and squares of ticks stay well inside what a double holds. */
const MOST_TICKS = 10_000_000_000;

/** Ra of a row of parabolas in units of f²/r: 1 / (18 √3). */
export const PARABOLA_RA: number = 1 / (18 * Math.sqrt(3));

/** Rq of a row of parabolas in units of f²/r: 1 / (12 √5). */
const PARABOLA_RQ: number = 1 / (12 * Math.sqrt(5));

/** The heights of a surface made of equal arcs of radius r, spaced f apart. */
export interface ArcRoughness {
  readonly rt: Length;
  readonly rtOfCircle: Length;
  readonly ra: Length;
  readonly raShortForm: Length;
  readonly rq: Length;
}

/** Heights of a row of arcs; each is rounded to the tick of 0.1 nm. */
export function arcRoughness(feed: Length, radius: Length): ArcRoughness {
  if (feed.ticks > 2 * radius.ticks) {
    throw geometryError(
      "the feed is wider than the round: neighbouring arcs do not meet",
      feed,
      "up to twice the radius",
    );
  }
  const unit = unitFor(feed);
  const square = feed.ticks * feed.ticks;
  const r = radius.ticks;
  const inFeed = lengthOfTicks(feed.ticks, unit);
  return {
    rt: multiply(inFeed, { numerator: feed.ticks, denominator: 8 * r }),
    // r - sqrt(r² - f²/4) without the loss of two near numbers
    rtOfCircle: rounded(square / 4 / (r + Math.sqrt(r * r - square / 4)), unit),
    ra: rounded((square / r) * PARABOLA_RA, unit),
    raShortForm: multiply(inFeed, { numerator: feed.ticks, denominator: 32 * r }),
    rq: rounded((square / r) * PARABOLA_RQ, unit),
  };
}

/** A number of ticks rounded to a length. */
export function rounded(ticks: number, unit: Length["unit"]): Length {
  return lengthOfTicks(Math.round(ticks), unit);
}

/** A feed, radius or diameter of the caller: over 0 up to 1 m. */
export function toolLength(value: LengthLike | undefined, name: string): Length {
  const length = asLength(value as LengthLike, [name]);
  if (length.ticks <= 0 || length.ticks > MOST_TICKS) {
    throw geometryError(`${name} is no size of a tool or feed`, length, "over 0 up to 1 m");
  }
  return length;
}

/** An angle of a cutting edge in radians; `least` is in degrees. */
export function edgeAngle(value: AngleLike | undefined, name: string, least: "over 0" | "from 0"): number {
  const degrees = readAngle(value as AngleLike).toDegrees();
  if (degrees < 0 || degrees >= 90 || (least === "over 0" && degrees === 0)) {
    throw new LimitsError("FINISH_GEOMETRY_INVALID", `${name} is no angle of a cutting edge`, {
      value: `${degrees}°`,
      allowed: `${least} to below 90°`,
      path: [name],
    });
  }
  return (degrees * Math.PI) / 180;
}

/** The end cutting edge cuts too beyond this feed: 2 r sin Ce, rounded down to the tick. */
export function largestArcFeed(radius: Length, endAngle: number): Length {
  return lengthOfTicks(Math.floor(2 * radius.ticks * Math.sin(endAngle)), radius.unit);
}

export function geometryError(message: string, value: Length, allowed: string): LimitsError {
  return new LimitsError("FINISH_GEOMETRY_INVALID", message, { value: value.toString(), allowed });
}

/** A form of the geometry, by name. */
export function formStep(place: string, says: string): BasisStep {
  return Object.freeze({
    standard: "geometry of the tool",
    place,
    says,
    how: "derived" as const,
    mark: "formula" as const,
  });
}

export const ARC_STEPS: readonly BasisStep[] = [
  formStep("parabola", "Rt = f²/(8 r), Ra = f²/(18 √3 r), Rq = f²/(12 √5 r)"),
  formStep("circle", "Rt = r - √(r² - f²/4)"),
  formStep("short form", "Ra = f²/(32 r), a quarter of Rt, 2.6 % below the parabola"),
];

export const THEORETICAL_CAUTION: Caution = Object.freeze({
  code: "FINISH_THEORETICAL",
  says:
    "geometry is a floor, not a forecast: built-up edge, side flow, wear and vibration add to it, most at small feeds; " +
    "wiper inserts do not obey it",
});
