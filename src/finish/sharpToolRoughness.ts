import type { Basis, Caution } from "../basis.js";
import { ownValue } from "../ownValue.js";
import type { AngleLike, Length, LengthLike } from "../units/index.js";
import { THEORETICAL_CAUTION, edgeAngle, formStep, rounded, toolLength } from "./arcRoughness.js";
import { unitFor } from "./buildRoughness.js";

/** Feed and edges of a tool with a sharp nose. */
export interface SharpToolCut {
  /** Feed per revolution, over 0 up to 1 m. */
  readonly feed: LengthLike;
  /** Side cutting edge angle Cs, from 0 to below 90°. */
  readonly sideCuttingEdgeAngle: AngleLike;
  /** End cutting edge angle Ce, over 0 to below 90°. */
  readonly endCuttingEdgeAngle: AngleLike;
}

/** Heights of a surface of straight flanks. */
export interface SharpToolRoughness {
  /** Theoretical total height. */
  readonly rt: Length;
  /** Theoretical Ra. */
  readonly ra: Length;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * The theoretical roughness of a surface turned with a sharp nose: Rt = f / (tan Cs + cot Ce), Ra = Rt/4.
 *
 * @param cut - `feed` in any unit, `sideCuttingEdgeAngle` and `endCuttingEdgeAngle` in degrees
 * @returns the frozen heights in µm (µin for a feed in inches), rounded to the tick of 0.1 nm
 * @throws `FINISH_GEOMETRY_INVALID`, `LENGTH_INVALID`, `ANGLE_INVALID`
 * @example
 * ```ts
 * import { sharpToolRoughness, writeLength } from "limitsmith";
 *
 * const cut = { feed: "0.15 mm", sideCuttingEdgeAngle: "15°", endCuttingEdgeAngle: "8°" };
 * writeLength(sharpToolRoughness(cut).rt, { places: 2 }); // → "20.32 µm"
 * ```
 * @reference geometry: triangle between two straight edges
 */
export function sharpToolRoughness(cut: SharpToolCut): SharpToolRoughness {
  const feed = toolLength(ownValue(cut, "feed"), "feed");
  const side = edgeAngle(ownValue(cut, "sideCuttingEdgeAngle"), "sideCuttingEdgeAngle", "from 0");
  const end = edgeAngle(ownValue(cut, "endCuttingEdgeAngle"), "endCuttingEdgeAngle", "over 0");
  const height = feed.ticks / (Math.tan(side) + 1 / Math.tan(end));
  return Object.freeze({
    rt: rounded(height, unitFor(feed)),
    ra: rounded(height / 4, unitFor(feed)),
    basis: Object.freeze([formStep("sharp nose", "Rt = f / (tan Cs + cot Ce), Ra = Rt/4")]),
    cautions: Object.freeze([THEORETICAL_CAUTION]),
  });
}
