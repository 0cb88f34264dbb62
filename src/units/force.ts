import { makeQuantity } from "./quantity.js";
import type { Quantity, QuantityData, QuantityKind, QuantitySource } from "./quantity.js";

/** The units of force. */
export type ForceUnit = "N" | "kN" | "lbf";

/** A force with its unit: frozen `{ value, unit }` and `to`, `toString`, `toJSON`. */
export type Force = Quantity<ForceUnit>;

/** What functions take for a force: a {@link Force}, its bare data, or its text with a unit. */
export type ForceLike = QuantityData<ForceUnit> | string;

/** How a force is read, written and converted. */
export const FORCE_KIND: QuantityKind<ForceUnit> = {
  name: "force",
  units: new Map([
    ["N", { symbol: "N", texts: [], system: "metric", size: 1 }],
    ["kN", { symbol: "kN", texts: [], system: "metric", size: 1000 }],
    ["lbf", { symbol: "lbf", texts: [], system: "inch", size: 1 }],
  ]),
  bridge: { numerator: 4.4482216152605, denominator: 1 },
};

/**
 * Makes a force from a number in a unit.
 *
 * @param value - a finite number, the text of a decimal or a decimal object, at most 10¹⁵ either way
 * @param unit - `"N"`, `"kN"` or `"lbf"`
 * @returns the frozen force, holding the number as given, in that unit
 * @throws `UNIT_UNKNOWN`, `NUMBER_NOT_FINITE`, `NUMBER_MALFORMED`, `QUANTITY_OUT_OF_RANGE`
 * @example
 * ```ts
 * import { force } from "limitsmith";
 *
 * force(1, "lbf").to("N"); // → 4.4482216152605
 * force("2.5", "kN").to("N"); // → 2500
 * ```
 * @reference 1 lbf = 4.4482216152605 N exactly: the pound as 0.45359237 kg (international yard and pound agreement of
 *   1959) times the standard gravity of 9.80665 m/s² (ISO 80000-4:2019)
 */
export function force(value: QuantitySource, unit: ForceUnit): Force {
  return makeQuantity(FORCE_KIND, value, unit);
}
