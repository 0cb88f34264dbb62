import type { BasisStep } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { exactPlaces, lengthOfTicks, roundLength, subtract } from "../units/index.js";
import type { DecimalMark, Length, Rounding } from "../units/index.js";
import { asLimits } from "./asLimits.js";
import { finenessOf } from "./finenessOf.js";
import { limitsFromMaxMin } from "./limitsFromMaxMin.js";
import type { Limits, LimitsLike } from "./limitsValue.js";
import { placesToWrite } from "./placesToWrite.js";
import { writeLimits } from "./writeLimits.js";

/** `"A"` rounds each limit to the nearest, `"B"` rounds both to the inside of the original limits. */
export type ConversionMethod = "A" | "B";

/** Options of {@link convertLimits}. */
export interface ConvertOptions {
  /** Method A (nearest) or B (inside). */
  readonly method: ConversionMethod;
  /** Decimals of the new unit; by the rule of fineness unless said otherwise. */
  readonly places?: number;
  /** The decimal mark; `"."` unless said otherwise. */
  readonly decimalMark?: DecimalMark;
}

/** Limits in the other system, and what the conversion did to them. */
export interface ConvertedLimits {
  /** The converted, rounded limits. */
  readonly limits: Limits;
  /** Method A (nearest) or B (inside). */
  readonly method: ConversionMethod;
  /** Decimals of the new unit that were kept. */
  readonly places: number;
  /** Converted max minus original max: positive oversteps the original limit, negative gives up tolerance. */
  readonly maxShift: Length;
  /** Converted min minus original min: negative oversteps the original limit, positive gives up tolerance. */
  readonly minShift: Length;
  /** Part of the original tolerance given up, over both limits; negative where more is overstepped than given up. */
  readonly lost: Length;
  /** True where a converted limit lies outside the original one. */
  readonly oversteps: boolean;
  /** Both in one line, the original first: `25.002/25.011 [.9844/.9846]`. */
  readonly dualText: string;
}

/**
 * Converts limits between inch and metric by the published rules: limits, not deviations, exactly by 25.4, rounded
 * once to a fineness that follows from the original total tolerance. Limits that are in the system of `unit` already are
 * not rounded; an inch size with an ISO class is of the metric system, for its limits do not end in inches.
 *
 * @param given - limits, any unit
 * @param unit - `"mm"` or `"in"`
 * @param options - `method`: `"A"` nearest (a limit may move by up to 2 % of the tolerance, ties to even) or `"B"`
 *   inside (the original limits are never passed, as gauging needs); `places` to overrule the fineness
 * @returns the frozen converted limits in `unit`, the shift of each limit exact to the tick, and the dual text
 * @throws `ROUNDING_COLLAPSES` where method B leaves nothing between the limits, `CONVERSION_NO_FINENESS` where the
 *   rule has none for the tolerance, `LENGTH_NOT_EXACT`, `OPTION_INVALID`, and what {@link asLimits} throws
 * @example
 * ```ts
 * import { convertLimits, symmetricLimits } from "limitsmith";
 *
 * const size = symmetricLimits("1.850 in", "0.012 in");
 * const nearest = convertLimits(size, "mm", { method: "A" });
 * nearest.limits.max.toString(); // → "47.29 mm"
 * nearest.maxShift.toString(); // → "-0.0048 mm"
 * const inside = convertLimits(size, "mm", { method: "B" });
 * inside.limits.min.toString(); // → "46.69 mm"
 * inside.dualText; // → "1.838/1.862 [46.69/47.29]"
 * ```
 * @reference ISO 370:1975, methods A and B and the table of fineness (from memory, see the basis); ties: ISO
 *   80000-1:2009, B.3, rule A
 */
export function convertLimits(given: LimitsLike, unit: "mm" | "in", options: ConvertOptions): ConvertedLimits {
  const original = asLimits(given);
  const method: unknown = ownValue(options, "method");
  if (method !== "A" && method !== "B") {
    throw new LimitsError("OPTION_INVALID", "say how to round", { value: method, allowed: 'method "A" or "B"' });
  }
  const target: unknown = unit;
  if (target !== "mm" && target !== "in") {
    throw new LimitsError("OPTION_INVALID", "limits convert to mm or to in", { value: target, allowed: "mm, in" });
  }
  const { places, step } = placesOf(original, unit, ownValue(options, "places"));
  const at = (length: Length, rounding: Rounding): Length => roundLength(length, { unit, places, rounding });
  const max = at(original.max, method === "A" ? "nearest" : "down");
  const min = at(original.min, method === "A" ? "nearest" : "up");
  if (max.ticks < min.ticks) {
    throw new LimitsError("ROUNDING_COLLAPSES", "rounded inside, the limits leave no size between them", {
      value: `${places} decimals of ${unit}`,
      allowed: "more decimals, or method A",
    });
  }
  const converted = limitsFromMaxMin({
    max,
    min,
    nominal: at(original.nominal, "nearest"),
    basis: [...original.basis, step, methodStep(method)],
    designation: original.designation,
  });
  const maxShift = subtract(max, original.max);
  const minShift = subtract(min, original.min);
  const decimalMark = ownValue(options, "decimalMark") ?? ".";
  return Object.freeze({
    limits: converted,
    method,
    places,
    maxShift,
    minShift,
    lost: lengthOfTicks(minShift.ticks - maxShift.ticks, unit),
    oversteps: maxShift.ticks > 0 || minShift.ticks < 0,
    dualText: `${lowHigh(original, systemOf(original), undefined, decimalMark)} [${lowHigh(converted, unit, places, decimalMark)}]`,
  });
}

/** Limits that the new unit writes exactly need no rounding; else the caller's places, or the rule's. */
function placesOf(
  original: Limits,
  unit: "mm" | "in",
  asked: number | undefined,
): { readonly places: number; readonly step: BasisStep } {
  if (asked !== undefined) return { places: asked, step: callerPlaces(asked, unit) };
  if (systemOf(original) === unit) {
    return { places: placesToWrite(original, unit), step: sameSystem(unit) };
  }
  return finenessOf(original.tolerance, unit);
}

/** One line of limits, the low one first as the one-line form has it. */
function lowHigh(limits: Limits, unit: "mm" | "in", places: number | undefined, decimalMark: DecimalMark): string {
  const shown = places ?? Math.max(...[limits.max, limits.min].map((size) => exactPlaces(size, unit) ?? 4));
  const { lines } = writeLimits(limits, { form: "limits", unit, places: shown, decimalMark });
  // whole numbers with a slash would read as a fraction
  const mark = lines.every((line) => /^\d+$/.test(line)) ? "-" : "/";
  return [...lines].reverse().join(mark);
}

/** The system that the limits were made in: an inch size with an ISO class has limits that end in mm only. */
function systemOf({ nominal, max, min }: Limits): "mm" | "in" {
  const metric = nominal.unit === "mm" || nominal.unit === "um";
  return metric || exactPlaces(max, "in") === null || exactPlaces(min, "in") === null ? "mm" : "in";
}

function callerPlaces(places: number, unit: string): BasisStep {
  return Object.freeze({
    standard: "the caller",
    place: "as given",
    says: `${places} decimals of ${unit}`,
    how: "caller" as const,
  });
}

function sameSystem(unit: string): BasisStep {
  return Object.freeze({
    standard: "ISO 370:1975",
    place: "not needed",
    says: `the limits are in the system of ${unit} already; nothing is rounded`,
    how: "derived" as const,
  });
}

function methodStep(method: ConversionMethod): BasisStep {
  return Object.freeze({
    standard: "ISO 370:1975",
    place: `method ${method}`,
    says:
      method === "A"
        ? "each limit to the nearest, an exact half to the even last figure"
        : "upper limit down, lower limit up: never outside the original limits",
    how: "derived" as const,
    mark: "memory" as const,
  });
}
