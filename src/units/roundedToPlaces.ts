import { divideRounded } from "./divideRounded.js";
import type { LengthUnit } from "./length.js";
import type { Rounding } from "./rounding.js";
import { ticksPerUnit } from "./ticksPerUnit.js";

/** A number of ticks in a unit, times ten to the places, rounded once from the exact value. */
export function roundedToPlaces(ticks: number, unit: LengthUnit, places: number, rounding: Rounding): bigint {
  return divideRounded(BigInt(ticks) * 10n ** BigInt(places), BigInt(ticksPerUnit(unit)), rounding);
}
