import { makeQuantity } from "./quantity.js";
import type { Quantity, QuantityData, QuantityKind, QuantitySource } from "./quantity.js";

/** The units of torque: `Nm` is written N·m, `lbf-in` lbf·in, `lbf-ft` lbf·ft. */
export type TorqueUnit = "Nm" | "lbf-in" | "lbf-ft";

/** A torque with its unit: frozen `{ value, unit }` and `to`, `toString`, `toJSON`. */
export type Torque = Quantity<TorqueUnit>;

/** What functions take for a torque: a {@link Torque}, its bare data, or its text with a unit. */
export type TorqueLike = QuantityData<TorqueUnit> | string;

/** How a torque is read, written and converted. */
export const TORQUE_KIND: QuantityKind<TorqueUnit> = {
  name: "torque",
  units: new Map([
    ["Nm", { symbol: "N·m", texts: ["N m", "Nm", "N\u22c5m"], system: "metric", size: 1 }],
    ["lbf-in", { symbol: "lbf·in", texts: textsOf("in"), system: "inch", size: 1 }],
    ["lbf-ft", { symbol: "lbf·ft", texts: textsOf("ft"), system: "inch", size: 12 }],
  ]),
  bridge: { numerator: 4.4482216152605 * 25.4, denominator: 1000 },
};

/**
 * Makes a torque from a number in a unit.
 *
 * @param value - a finite number, the text of a decimal or a decimal object, at most 10¹⁵ either way
 * @param unit - `"Nm"`, `"lbf-in"` or `"lbf-ft"`
 * @returns the frozen torque, holding the number as given, in that unit
 * @throws `UNIT_UNKNOWN`, `NUMBER_NOT_FINITE`, `NUMBER_MALFORMED`, `QUANTITY_OUT_OF_RANGE`
 * @example
 * ```ts
 * import { torque } from "limitsmith";
 *
 * torque(75, "lbf-ft").to("lbf-in"); // → 900
 * torque(1, "lbf-ft").to("Nm").toPrecision(12); // → "1.35581794833"
 * torque(47.5, "Nm").toString(); // → "47.5 N·m"
 * ```
 * @reference 1 lbf·in = 4.4482216152605 N × 0.0254 m: international yard and pound agreement of 1959 and the standard
 *   gravity of ISO 80000-4:2019
 */
export function torque(value: QuantitySource, unit: TorqueUnit): Torque {
  return makeQuantity(TORQUE_KIND, value, unit);
}

function textsOf(arm: "in" | "ft"): readonly string[] {
  return ["\u00b7", "\u22c5", "-", " "].flatMap((dot) => [`lbf${dot}${arm}`, `${arm}${dot}lbf`]);
}
