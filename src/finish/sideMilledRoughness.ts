import type { Basis, Caution } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import type { Length, LengthLike } from "../units/index.js";
import { PARABOLA_RA, THEORETICAL_CAUTION, formStep, geometryError, rounded, toolLength } from "./arcRoughness.js";
import { unitFor } from "./buildRoughness.js";
import { teethOf } from "./faceMilledRoughness.js";

/** Feed and cutter of side (peripheral) milling. */
export interface SideMillingCut {
  /** Feed per tooth, over 0 up to the cutter diameter. */
  readonly feedPerTooth: LengthLike;
  /** Cutter diameter, over 0 up to 1 m. */
  readonly cutterDiameter: LengthLike;
  /** `"up"` (conventional) or `"down"` (climb): with `teeth` it gives the form of the true tooth path. */
  readonly direction?: "up" | "down";
  /** Number of teeth, 1 to 1000; needed with `direction`. */
  readonly teeth?: number;
}

/** Heights of a side-milled surface. */
export interface SideMilledRoughness {
  /** Theoretical total height. */
  readonly rt: Length;
  /** Ra of a row of such arcs: Rt × 4/(9 √3). */
  readonly ra: Length;
  /** Which form was used. */
  readonly form: "arc" | "tooth path, up milling" | "tooth path, down milling";
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * The theoretical roughness of a side-milled surface.
 *
 * Arc: Rt = fz²/(4 D). True tooth path: Rt = fz²/(8 (R ± fz z/π)), plus for up milling, minus for down milling.
 *
 * @param cut - `feedPerTooth` and `cutterDiameter` in any unit; `direction` and `teeth` for the true tooth path
 * @returns the frozen heights in µm (µin for a feed in inches), rounded to the tick of 0.1 nm, with the form's name
 * @throws `FINISH_GEOMETRY_INVALID`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { sideMilledRoughness } from "limitsmith";
 *
 * sideMilledRoughness({ feedPerTooth: "0.2 mm", cutterDiameter: "16 mm" }).rt.toString(); // → "0.625 µm"
 * ```
 * @reference arc: a milling-tool catalogue, 2021-22; tooth path: curvature of the trochoid at its lowest point
 */
export function sideMilledRoughness(cut: SideMillingCut): SideMilledRoughness {
  const feed = toolLength(ownValue(cut, "feedPerTooth"), "feedPerTooth");
  const diameter = toolLength(ownValue(cut, "cutterDiameter"), "cutterDiameter");
  if (feed.ticks > diameter.ticks) {
    throw geometryError("the feed per tooth is wider than the cutter", feed, "up to the cutter diameter");
  }
  const direction: unknown = ownValue(cut, "direction");
  if (direction !== undefined && direction !== "up" && direction !== "down") {
    throw new LimitsError("OPTION_INVALID", "not a direction of milling", { value: direction, allowed: "up, down" });
  }
  const drift = direction === undefined ? 0 : (feed.ticks * teethOf(ownValue(cut, "teeth"))) / Math.PI;
  const radius = diameter.ticks / 2 + (direction === "down" ? -drift : drift);
  if (radius < feed.ticks / 2) {
    throw geometryError("at this feed the tooth path has no arc as wide as the feed", feed, "a smaller feed");
  }
  const square = feed.ticks * feed.ticks;
  const unit = unitFor(feed);
  return Object.freeze({
    rt: rounded(square / radius / 8, unit),
    ra: rounded((square / radius) * PARABOLA_RA, unit),
    form: direction === undefined ? "arc" : `tooth path, ${direction} milling`,
    basis: Object.freeze([
      direction === undefined
        ? formStep("arc", "Rt = fz²/(4 D)")
        : formStep(`tooth path, ${direction} milling`, `Rt = fz²/(8 (R ${direction === "up" ? "+" : "-"} fz z/π))`),
    ]),
    cautions: Object.freeze([THEORETICAL_CAUTION]),
  });
}
