import { LimitsError, attempt } from "../errors.js";
import { inchFit, inchFitsNear, parseInchClass } from "../inchFits/index.js";
import type { InchClass } from "../inchFits/index.js";
import { isoFit, isoFitsNear } from "../iso286/index.js";
import type { FitClassesLike, FoundFit } from "../iso286/index.js";
import type { Fit } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { asLength, lengthOfTicks } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import type { CompareOptions, FitComparison, FitDifferences, JointFit, NearFit } from "./fitComparison.js";

const USUAL_MOST = 3;

/**
 * Sets a fit of one system beside the fits of the other that come nearest to it on the same nominal size.
 *
 * Nearest goes by the clearance range, within the same basis: hole basis beside hole basis, shaft basis beside shaft
 * basis. The two systems have no equal fits by rule; the differences say how far apart each limit is.
 *
 * @param size - nominal size, over 0 up to 19.69 in, in any unit
 * @param fit - a class of inch fits such as `"LN2"`, or an ISO fit such as `"H7/p6"`
 * @param options - `most`, `among`, `basis` and `reading`, see {@link CompareOptions}
 * @returns frozen `{ system, given, nearest }`: limits in the unit of `size`, differences (other minus given) in µm
 * @throws `FIT_MALFORMED` for what is a fit of neither system, `OPTION_INVALID`, and what {@link inchFit} and
 *   {@link isoFit} throw
 * @example
 * ```ts
 * import { compareFits, inch } from "limitsmith";
 *
 * const [near] = compareFits(inch("1.25"), "LN2").nearest;
 * near?.fit.designation; // → "H7/p6"
 * near?.differences.holeMax.toString(); // → "-0.4 µm"
 * near?.equal; // → false
 * compareFits(inch("1.25"), "H8/f7").nearest[0]?.fit.designation; // → "RC4"
 * ```
 * @reference ANSI B4.1-1967 and ISO 286-1:2010; the order is a rule of this library
 */
export function compareFits(size: LengthLike, fit: JointFit, options?: CompareOptions): FitComparison {
  const nominal = asLength(size);
  const inchClass = inchClassOf(fit);
  const most = ownValue(options, "most") ?? USUAL_MOST;
  if (inchClass === null) {
    const given = isoFitOf(nominal, fit as FitClassesLike);
    const basis = given.system === "shaft basis" ? "shaft" : "hole";
    const found = inchFitsNear({ size: nominal, clearance: clearanceOf(given), most, basis });
    return sideBySide("ISO", given, found.fits);
  }
  const basis = ownValue(options, "basis");
  const reading = ownValue(options, "reading");
  const among = ownValue(options, "among");
  const given = inchFit(nominal, inchClass, {
    ...(basis === undefined ? {} : { basis }),
    ...(reading === undefined ? {} : { reading }),
  });
  const system = systemOf(given.system);
  const found = isoFitsNear({
    size: nominal,
    clearance: clearanceOf(given),
    most,
    ...(among === undefined ? {} : { among }),
    ...(system === null ? {} : { system }),
  });
  return sideBySide("inch", given, found.fits);
}

/** The class of inch fits that is meant; `null` where it is none at all. A class that does not exist is refused. */
function inchClassOf(fit: JointFit): InchClass | null {
  const read = attempt(() => parseInchClass(fit as InchClass));
  if (read.ok) return read.value;
  return read.error.code === "INCH_CLASS_MALFORMED" ? null : parseInchClass(fit as InchClass);
}

function isoFitOf(nominal: Length, fit: FitClassesLike): Fit {
  const read = attempt(() => isoFit(nominal, fit));
  if (read.ok) return read.value;
  if (read.error.code !== "FIT_MALFORMED") return isoFit(nominal, fit);
  throw new LimitsError("FIT_MALFORMED", "this is a fit of neither system", {
    value: fit,
    allowed: "a class of inch fits such as LN2, or an ISO fit such as H7/p6",
  });
}

function systemOf(system: Fit["system"]): "hole basis" | "shaft basis" | null {
  if (system === "neither") return null;
  return system === "hole and shaft basis" ? "hole basis" : system;
}

function clearanceOf({ minClearance, maxClearance }: Fit): { min: Length; max: Length } {
  return { min: minClearance, max: maxClearance };
}

function sideBySide(
  system: "inch" | "ISO",
  given: Fit,
  found: readonly Pick<FoundFit, "fit" | "preferred">[],
): FitComparison {
  const nearest = found.map(({ fit, preferred }): NearFit => {
    const differences = differencesOf(fit, given);
    const { holeMax, holeMin, shaftMax, shaftMin } = differences;
    const equal = [holeMax, holeMin, shaftMax, shaftMin].every((one) => one.ticks === 0);
    return Object.freeze({ fit, preferred, differences, equal });
  });
  return Object.freeze({ system, given, nearest: Object.freeze(nearest) });
}

function differencesOf(other: Fit, given: Fit): FitDifferences {
  // every difference ends in µm; in thou most do not
  const between = (left: Length, right: Length): Length => lengthOfTicks(left.ticks - right.ticks, "um");
  return Object.freeze({
    minClearance: between(other.minClearance, given.minClearance),
    maxClearance: between(other.maxClearance, given.maxClearance),
    holeMax: between(other.hole.max, given.hole.max),
    holeMin: between(other.hole.min, given.hole.min),
    shaftMax: between(other.shaft.max, given.shaft.max),
    shaftMin: between(other.shaft.min, given.shaft.min),
  });
}
