import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { multiply } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { ARC_STEPS, THEORETICAL_CAUTION, arcRoughness, formStep, toolLength } from "./arcRoughness.js";
import type { TheoreticalRoughness } from "./turnedRoughness.js";

/** Feed and cutter of face milling. */
export interface FaceMillingCut {
  /** Feed per tooth, over 0. */
  readonly feedPerTooth: LengthLike;
  /** Number of teeth, 1 to 1000. */
  readonly teeth: number;
  /** Corner radius of the inserts, over 0 up to 1 m. */
  readonly cornerRadius: LengthLike;
  /** True where all teeth are level; false where one stands proud, so that only the feed per revolution counts. */
  readonly teethLevel: boolean;
}

/**
 * The theoretical roughness of a face-milled surface with round corners: the form of turning, by the feed per tooth
 * where all teeth are level, else by the feed per revolution.
 *
 * @param cut - `feedPerTooth` and `cornerRadius` in any unit, `teeth`, `teethLevel`
 * @returns the frozen heights in µm (µin for a feed in inches), each rounded to the tick of 0.1 nm
 * @throws `FINISH_GEOMETRY_INVALID`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { faceMilledRoughness } from "limitsmith";
 *
 * const cut = { feedPerTooth: "0.1 mm", teeth: 4, cornerRadius: "0.8 mm" };
 * faceMilledRoughness({ ...cut, teethLevel: true }).rt.toString(); // → "1.5625 µm"
 * faceMilledRoughness({ ...cut, teethLevel: false }).rt.toString(); // → "25 µm"
 * ```
 * @reference geometry: Rt = f²/(8 r), Ra = f²/(18 √3 r)
 */
export function faceMilledRoughness(cut: FaceMillingCut): TheoreticalRoughness {
  const perTooth = toolLength(ownValue(cut, "feedPerTooth"), "feedPerTooth");
  const radius = toolLength(ownValue(cut, "cornerRadius"), "cornerRadius");
  const level: unknown = ownValue(cut, "teethLevel");
  if (typeof level !== "boolean") {
    throw new LimitsError("OPTION_INVALID", "teethLevel is true or false", { value: level, allowed: "true, false" });
  }
  const teeth = teethOf(ownValue(cut, "teeth"));
  const place = level ? "feed per tooth, all teeth level" : "feed per revolution, one tooth stands proud";
  return Object.freeze({
    ...arcRoughness(level ? perTooth : multiply(perTooth, teeth), radius),
    largestFeed: null,
    basis: Object.freeze([formStep(place, "f of the forms below"), ...ARC_STEPS]),
    cautions: Object.freeze([THEORETICAL_CAUTION]),
  });
}

/** A number of teeth. */
export function teethOf(teeth: unknown): number {
  if (typeof teeth !== "number" || !Number.isInteger(teeth) || teeth < 1 || teeth > 1000) {
    throw new LimitsError("OPTION_INVALID", "not a number of teeth", { value: teeth, allowed: "1 to 1000" });
  }
  return teeth;
}
