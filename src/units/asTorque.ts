import { readQuantity } from "./quantity.js";
import { TORQUE_KIND } from "./torque.js";
import type { Torque, TorqueLike } from "./torque.js";

/**
 * Takes a torque in any shape it can travel in.
 *
 * @param value - a {@link Torque}, its bare `{ value, unit }`, or its text: `N·m` (or `N m`, `Nm`), `lbf·in`, `lbf·ft`
 *   (or with a blank or hyphen, or as `in·lbf`)
 * @param path - keys that lead to the value in the caller's data, for the error
 * @returns the same torque, in its own unit
 * @throws `QUANTITY_INVALID`, `QUANTITY_OUT_OF_RANGE`, `UNIT_UNKNOWN`, `UNIT_MISSING`, `NUMBER_MALFORMED`,
 *   `NUMBER_NOT_FINITE`, `TEXT_EMPTY`, `TEXT_TOO_LONG`
 * @example
 * ```ts
 * import { asTorque } from "limitsmith";
 *
 * asTorque("1200 in-lbf").toString(); // → "1200 lbf·in"
 * asTorque("80 N·m").to("Nm"); // → 80
 * ```
 * @reference none: a convenience of this library
 */
export function asTorque(value: TorqueLike, path: readonly (string | number)[] = []): Torque {
  return readQuantity(TORQUE_KIND, value, path);
}
