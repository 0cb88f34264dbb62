import { makeQuantity } from "./quantity.js";
import type { Quantity, QuantityData, QuantityKind, QuantitySource } from "./quantity.js";

/** The units of stress and pressure: `psi` is lbf/in², `ksi` a thousand of them; 1 MPa is 1 N/mm². */
export type StressUnit = "MPa" | "psi" | "ksi";

/** A stress or pressure with its unit: frozen `{ value, unit }` and `to`, `toString`, `toJSON`. */
export type Stress = Quantity<StressUnit>;

/** What functions take for a stress: a {@link Stress}, its bare data, or its text with a unit. */
export type StressLike = QuantityData<StressUnit> | string;

/** How a stress is read, written and converted. */
export const STRESS_KIND: QuantityKind<StressUnit> = {
  name: "stress",
  units: new Map([
    ["MPa", { symbol: "MPa", texts: ["N/mm²", "N/mm2"], system: "metric", size: 1 }],
    ["psi", { symbol: "psi", texts: ["lbf/in²", "lbf/in2"], system: "inch", size: 1 }],
    ["ksi", { symbol: "ksi", texts: [], system: "inch", size: 1000 }],
  ]),
  bridge: { numerator: 4.4482216152605, denominator: 645.16 },
};

/**
 * Makes a stress or pressure from a number in a unit.
 *
 * @param value - a finite number, the text of a decimal or a decimal object, at most 10¹⁵ either way
 * @param unit - `"MPa"`, `"psi"` or `"ksi"`
 * @returns the frozen stress, holding the number as given, in that unit
 * @throws `UNIT_UNKNOWN`, `NUMBER_NOT_FINITE`, `NUMBER_MALFORMED`, `QUANTITY_OUT_OF_RANGE`
 * @example
 * ```ts
 * import { stress } from "limitsmith";
 *
 * stress(36, "ksi").to("psi"); // → 36000
 * stress(1, "psi").to("MPa").toPrecision(12); // → "0.00689475729317"
 * JSON.stringify(stress("250", "MPa")); // → '"250 MPa"'
 * ```
 * @reference 1 psi = 4.4482216152605 N / 645.16 mm²: the pound as 0.45359237 kg (international yard and pound
 *   agreement of 1959) times the standard gravity of 9.80665 m/s² (ISO 80000-4:2019)
 */
export function stress(value: QuantitySource, unit: StressUnit): Stress {
  return makeQuantity(STRESS_KIND, value, unit);
}
