import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLimits } from "./asLimits.js";
import type { Fit } from "./fitValue.js";
import type { LimitsLike } from "./limitsValue.js";
import { makeFit } from "./makeFit.js";

/** Options of {@link fitOf}. */
export interface FitOptions {
  /**
   * `"same"` refuses two nominals that differ; `"any"` takes them as they are, which limit dimensions
   * without a nominal need. `"same"` unless said otherwise.
   */
  readonly nominals?: "same" | "any";
}

/**
 * Judges a hole and a shaft together: clearances, interferences, kind of fit.
 *
 * @param hole - limits of the hole (internal size), any unit
 * @param shaft - limits of the shaft (external size), any unit
 * @param options - `nominals`: `"same"` (refuse different nominals) or `"any"`
 * @returns the frozen fit: signed clearances (positive is clearance, negative is interference) in the unit of
 *   the hole's tolerance, kind, variation, cautions where parts can interfere
 * @throws `NOMINALS_DIFFER`, `OPTION_INVALID`, and what {@link asLimits} throws
 * @example
 * ```ts
 * import { fitOf, limits } from "limitsmith";
 *
 * const hole = limits({ nominal: "1.5 in", upper: "1 thou", lower: "0 thou" });
 * const shaft = limits({ nominal: "1.5 in", upper: "-1 thou", lower: "-1.6 thou" });
 * const fit = fitOf(hole, shaft);
 * fit.kind; // → "clearance"
 * fit.maxClearance.toString(); // → "2.6 thou"
 * ```
 * @reference ISO 286-1:2010, 3.3: max clearance = hole max − shaft min, min clearance = hole min − shaft max
 */
export function fitOf(hole: LimitsLike, shaft: LimitsLike, options?: FitOptions): Fit {
  const holeLimits = asLimits(hole, ["hole"]);
  const shaftLimits = asLimits(shaft, ["shaft"]);
  const nominals: unknown = ownValue(options, "nominals") ?? "same";
  if (nominals !== "same" && nominals !== "any") {
    throw new LimitsError("OPTION_INVALID", "not a rule for nominals", { value: nominals, allowed: "same, any" });
  }
  if (nominals === "same" && holeLimits.nominal.ticks !== shaftLimits.nominal.ticks) {
    throw new LimitsError("NOMINALS_DIFFER", "hole and shaft of a fit share one nominal size", {
      value: `hole ${holeLimits.nominal.toString()}, shaft ${shaftLimits.nominal.toString()}`,
      allowed: 'equal nominals, or the option nominals: "any"',
    });
  }
  return makeFit(holeLimits, shaftLimits);
}
