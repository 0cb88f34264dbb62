import { POWER_KIND } from "./power.js";
import type { Power, PowerLike } from "./power.js";
import { readQuantity } from "./quantity.js";

/**
 * Takes a power in any shape it can travel in.
 *
 * @param value - a {@link Power}, its bare `{ value, unit }`, or its text: `W`, `kW`, `hp`
 * @param path - keys that lead to the value in the caller's data, for the error
 * @returns the same power, in its own unit
 * @throws `QUANTITY_INVALID`, `QUANTITY_OUT_OF_RANGE`, `UNIT_UNKNOWN`, `UNIT_MISSING`, `NUMBER_MALFORMED`,
 *   `NUMBER_NOT_FINITE`, `TEXT_EMPTY`, `TEXT_TOO_LONG`
 * @example
 * ```ts
 * import { asPower } from "limitsmith";
 *
 * asPower("7.5 kW").to("W"); // → 7500
 * asPower("7.5 PS"); // throws UNIT_UNKNOWN
 * ```
 * @reference none: a convenience of this library
 */
export function asPower(value: PowerLike, path: readonly (string | number)[] = []): Power {
  return readQuantity(POWER_KIND, value, path);
}
