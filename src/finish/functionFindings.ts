import { ownValue } from "../ownValue.js";
import { unitFor } from "./buildRoughness.js";
import { asRoughness } from "./asRoughness.js";
import { finding } from "./finding.js";
import type { FinishFinding } from "./finding.js";
import { finishForFunction } from "./finishForFunction.js";
import { limitInUnit } from "./preferredValues.js";
import type { RoughnessLike } from "./roughnessValue.js";

/** Options of {@link functionFindings}. */
export interface FunctionFindingsOptions {
  /** Lower limit of Ra, where the drawing has two values. */
  readonly lower?: RoughnessLike;
}

/**
 * Finds a roughness that does not suit the function of its surface: too coarse, finer than needed, or without the lower
 * limit that the function needs. Compared in the drawing's own unit.
 *
 * @param roughness - Ra with its unit, as an upper limit
 * @param name - function of the surface, see `finishFunctions`
 * @param options - `lower`: the lower limit, where the drawing has one
 * @returns a frozen list, empty where nothing is to be said (no unit)
 * @throws `FINISH_FUNCTION_UNKNOWN`, and what {@link asRoughness} throws
 * @example
 * ```ts
 * import { functionFindings } from "limitsmith";
 *
 * functionFindings("125 µin", "bearing seat").map((one) => one.code); // → ["FINISH_TOO_COARSE_FOR_FUNCTION"]
 * functionFindings("32 µin", "bearing seat"); // → []
 * functionFindings("0.2 µm", "bearing seat").map((one) => one.code); // → ["FINISH_FINER_THAN_NEEDED"]
 * functionFindings("0.4 µm", "seal lip").map((one) => one.code); // → ["FINISH_NEEDS_LOWER_LIMIT"]
 * ```
 * @reference as {@link finishForFunction}: common practice
 */
export function functionFindings(
  roughness: RoughnessLike,
  name: string,
  options?: FunctionFindingsOptions,
): readonly FinishFinding[] {
  const { ra } = asRoughness(roughness, ["roughness"]);
  const usual = finishForFunction(name);
  const unit = unitFor(ra);
  const coarsest = limitInUnit(usual.coarsest.to("um"), unit);
  const finest = usual.finest === null ? null : limitInUnit(usual.finest.to("um"), unit);
  const asks = `${usual.function}: usual Ra ${finest === null ? "up to" : `${finest.toString()} to`} ${coarsest.toString()}`;
  const found: FinishFinding[] = [];
  if (ra.ticks > coarsest.ticks) {
    found.push(finding("FINISH_TOO_COARSE_FOR_FUNCTION", `Ra ${ra.toString()} is too coarse; ${asks}`, usual.basis));
  }
  if (finest !== null && ra.ticks < finest.ticks) {
    found.push(
      usual.finestIsLimit
        ? finding("FINISH_TOO_FINE_FOR_FUNCTION", `Ra ${ra.toString()} is too smooth to work; ${asks}`, usual.basis)
        : finding(
            "FINISH_FINER_THAN_NEEDED",
            `Ra ${ra.toString()} is finer than needed and costs more; ${asks}`,
            usual.basis,
          ),
    );
  }
  const lower = ownValue(options, "lower");
  if (lower !== undefined) {
    const low = asRoughness(lower, ["lower"]).ra;
    if (usual.finestIsLimit && finest !== null && low.ticks < limitInUnit(finest.to("um"), unitFor(low)).ticks) {
      found.push(
        finding(
          "FINISH_TOO_FINE_FOR_FUNCTION",
          `a lower limit of Ra ${low.toString()} lets in too smooth a surface; ${asks}`,
          usual.basis,
        ),
      );
    }
  } else if (usual.finestIsLimit) {
    found.push(
      finding(
        "FINISH_NEEDS_LOWER_LIMIT",
        `a single Ra has no lower limit, and this function needs one; ${asks}`,
        usual.basis,
      ),
    );
  }
  return Object.freeze(found);
}
