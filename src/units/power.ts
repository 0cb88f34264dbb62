import { makeQuantity } from "./quantity.js";
import type { Quantity, QuantityData, QuantityKind, QuantitySource } from "./quantity.js";

/** The units of power: `hp` is 550 lbf·ft/s. */
export type PowerUnit = "W" | "kW" | "hp";

/** A power with its unit: frozen `{ value, unit }` and `to`, `toString`, `toJSON`. */
export type Power = Quantity<PowerUnit>;

/** What functions take for a power: a {@link Power}, its bare data, or its text with a unit. */
export type PowerLike = QuantityData<PowerUnit> | string;

/** How a power is read, written and converted. */
export const POWER_KIND: QuantityKind<PowerUnit> = {
  name: "power",
  units: new Map([
    ["W", { symbol: "W", texts: [], system: "metric", size: 1 }],
    ["kW", { symbol: "kW", texts: [], system: "metric", size: 1000 }],
    ["hp", { symbol: "hp", texts: ["HP"], system: "inch", size: 1 }],
  ]),
  bridge: { numerator: 4.4482216152605 * 0.3048 * 550, denominator: 1 },
};

/**
 * Makes a power from a number in a unit.
 *
 * @param value - a finite number, the text of a decimal or a decimal object, at most 10¹⁵ either way
 * @param unit - `"W"`, `"kW"` or `"hp"`
 * @returns the frozen power, holding the number as given, in that unit
 * @throws `UNIT_UNKNOWN`, `NUMBER_NOT_FINITE`, `NUMBER_MALFORMED`, `QUANTITY_OUT_OF_RANGE`
 * @example
 * ```ts
 * import { power } from "limitsmith";
 *
 * power("2.2", "kW").to("W"); // → 2200
 * power(1, "hp").to("W").toPrecision(12); // → "745.699871582"
 * ```
 * @reference 1 hp = 550 lbf·ft/s (mechanical horsepower): common definition, from memory
 */
export function power(value: QuantitySource, unit: PowerUnit): Power {
  return makeQuantity(POWER_KIND, value, unit);
}
