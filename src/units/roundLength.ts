import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "./asLength.js";
import { lengthOfTicks } from "./length.js";
import type { Length, LengthLike, LengthUnit } from "./length.js";
import { roundedToPlaces } from "./roundedToPlaces.js";
import type { Rounding } from "./rounding.js";
import { ticksPerUnit } from "./ticksPerUnit.js";

/** Options of {@link roundLength}. */
export interface RoundLengthOptions {
  /** Decimals to keep; to 7 in mm, 4 in µm, 6 in inches, 3 in thou, 0 in µin; in inch units one more where the length ends there. */
  readonly places: number;
  /** Unit of those decimals; the length's own unit unless said otherwise. */
  readonly unit?: LengthUnit;
  /** `"nearest"` unless said otherwise. */
  readonly rounding?: Rounding;
}

/**
 * Rounds a length to a number of decimals of a unit, once and from the exact value.
 *
 * @param length - any length, in any unit
 * @param options - `places` in `unit`, and the `rounding`
 * @returns the rounded length, in that unit
 * @throws `OPTION_INVALID` for places that no whole tick fits, `UNIT_UNKNOWN`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { mm, roundLength } from "limitsmith";
 *
 * roundLength(mm("25.015"), { unit: "in", places: 4 }).toString(); // → "0.9848 in"
 * roundLength(mm("25.015"), { unit: "in", places: 4, rounding: "up" }).toString(); // → "0.9849 in"
 * ```
 * @reference ISO 80000-1:2009, B.3
 */
export function roundLength(length: LengthLike, options: RoundLengthOptions): Length {
  const value = asLength(length);
  const unit = ownValue(options, "unit") ?? value.unit;
  const places = ownValue(options, "places") ?? NaN;
  const rounding = ownValue(options, "rounding") ?? "nearest";
  if (!Number.isInteger(places) || places < 0 || places > mostPlaces(unit)) throw tooFine(places);
  const steps = roundedToPlaces(value.ticks, unit, places, rounding);
  // the last decimal of an inch unit is a whole number of ticks only now and then: .0078125 in
  const scaled = steps * BigInt(ticksPerUnit(unit));
  const perStep = 10n ** BigInt(places);
  if (scaled % perStep !== 0n) throw tooFine(places);
  return lengthOfTicks(Number(scaled / perStep), unit);
}

function mostPlaces(unit: LengthUnit): number {
  switch (unit) {
    case "um":
    case "thou":
      return 4;
    case "uin":
      return 1;
    default:
      return 7;
  }
}

function tooFine(places: number): LimitsError {
  return new LimitsError("OPTION_INVALID", "a length cannot be rounded to that many decimals of that unit", {
    value: places,
    allowed:
      "0 to 7 decimals of mm, 4 of µm, 6 of inches, 3 of thou, 0 of µin; in inch units one more where it ends there",
  });
}
