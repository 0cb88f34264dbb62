import type { Basis } from "../basis.js";
import { asLength, lengthOfTicks } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { fundamental } from "./fundamental.js";
import { gradeValue } from "./gradeValue.js";
import { isoOptions } from "./isoOptions.js";
import type { IsoOptions } from "./isoOptions.js";
import { parseToleranceClass } from "./parseToleranceClass.js";
import type { ToleranceClassLike } from "./parseToleranceClass.js";
import { stepAt, stepIndexOf } from "./sizeStep.js";

/** A fundamental deviation and where it stands. */
export interface FundamentalDeviation {
  /** The limit deviation that it fixes: es or ES, ei or EI, or both for js and JS. */
  readonly limit: "upper" | "lower" | "both";
  /** Its signed value in µm; for js and JS the ± value. */
  readonly deviation: Length;
  /** The delta that is part of it, in µm; zero where none applies. */
  readonly delta: Length;
  /** Where the value stands. */
  readonly basis: Basis;
}

/**
 * The fundamental deviation of a tolerance class at a nominal size.
 *
 * It takes a whole class, not a letter alone: k, K to ZC, j and js depend on the grade.
 *
 * @param size - nominal size, over 0 up to 3150 mm, in any unit
 * @param toleranceClass - such as `"m6"` or `"P7"`
 * @param options - `edition`, see {@link IsoOptions}
 * @returns frozen `{ limit, deviation, delta, basis }`, both lengths in µm
 * @throws what `isoLimits` throws
 * @example
 * ```ts
 * import { fundamentalDeviation, mm } from "limitsmith";
 *
 * const p7 = fundamentalDeviation(mm(35), "P7");
 * p7.limit; // → "upper"
 * p7.deviation.toString(); // → "-17 µm"
 * p7.delta.toString(); // → "9 µm"
 * ```
 * @reference ISO 286-1:2010, Tables 2 to 5: ES = −ei + delta for K to ZC over 3 up to 500 mm
 */
export function fundamentalDeviation(
  size: LengthLike,
  toleranceClass: ToleranceClassLike,
  options?: IsoOptions,
): FundamentalDeviation {
  const cls = parseToleranceClass(toleranceClass);
  const step = stepAt(stepIndexOf(asLength(size).ticks));
  const found = fundamental(cls, step, gradeValue(cls.grade, step), isoOptions(options).edition);
  return Object.freeze({
    limit: found.limit,
    deviation: lengthOfTicks(Math.round(found.um * 10_000), "um"),
    delta: lengthOfTicks(Math.round(found.deltaUm * 10_000), "um"),
    basis: Object.freeze([...found.basis]),
  });
}
