import type { Basis, Caution } from "../basis.js";
import { ownValue } from "../ownValue.js";
import type { Length, LengthLike } from "../units/index.js";
import { THEORETICAL_CAUTION, arcRoughness, formStep, toolLength } from "./arcRoughness.js";

/** Cutter and line spacing of ball-nose milling on a flat surface. */
export interface BallNoseCut {
  /** Radius of the ball, over 0 up to 1 m. */
  readonly ballRadius: LengthLike;
  /** Spacing of the lines, over 0 up to twice the radius. */
  readonly lineSpacing: LengthLike;
}

/** Height of the cusps between two lines. */
export interface BallNoseCusp {
  /** By the circle: R − √(R² − ae²/4). */
  readonly cusp: Length;
  /** By the common short form: ae²/(8 R). */
  readonly cuspShortForm: Length;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * The height of the cusps that a ball-nose cutter leaves on a flat surface.
 *
 * @param cut - `ballRadius` and `lineSpacing`, any unit
 * @returns the frozen heights in µm (µin for a spacing in inches), rounded to the tick of 0.1 nm
 * @throws `FINISH_GEOMETRY_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { ballNoseCusp } from "limitsmith";
 *
 * const { cusp, cuspShortForm } = ballNoseCusp({ ballRadius: "4 mm", lineSpacing: "0.4 mm" });
 * cusp.toString(); // → "5.0031 µm"
 * cuspShortForm.toString(); // → "5 µm"
 * ```
 * @reference geometry: R − √(R² − ae²/4), nearly ae²/(8 R)
 */
export function ballNoseCusp(cut: BallNoseCut): BallNoseCusp {
  const spacing = toolLength(ownValue(cut, "lineSpacing"), "lineSpacing");
  const radius = toolLength(ownValue(cut, "ballRadius"), "ballRadius");
  const { rtOfCircle, rt } = arcRoughness(spacing, radius);
  return Object.freeze({
    cusp: rtOfCircle,
    cuspShortForm: rt,
    basis: Object.freeze([formStep("circle", "R - √(R² - ae²/4)"), formStep("short form", "ae²/(8 R)")]),
    cautions: Object.freeze([THEORETICAL_CAUTION]),
  });
}
