import type { Length } from "../units/index.js";
import { umLength } from "./preferredValues.js";
import { RZ_GUIDE } from "./tables/roughnessFactors.js";

/** An Rz to start from where a surface has none. */
export interface RzGuideValue {
  /** What surface it is. */
  readonly surface: string;
  /** In µm. */
  readonly rz: Length;
}

/**
 * Guide values of Rz for `roughnessFactor` where the drawing gives none. They are far coarser than real machined
 * surfaces: use the drawing's value where there is one.
 *
 * @returns a frozen list, Rz in µm
 * @throws nothing
 * @example
 * ```ts
 * import { rzGuide } from "limitsmith";
 *
 * rzGuide().find((one) => one.surface === "ground")?.rz.toString(); // → "12.5 µm"
 * ```
 * @reference an engineering article summarising the FKM guideline (one source); 200 µm for rolling, forging and casting
 *   skin is the guideline's own, from memory
 */
export function rzGuide(): readonly RzGuideValue[] {
  return Object.freeze(RZ_GUIDE.map(({ surface, rz }) => Object.freeze({ surface, rz: umLength(rz) })));
}
