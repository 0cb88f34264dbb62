import { readQuantity } from "./quantity.js";
import { FORCE_KIND } from "./force.js";
import type { Force, ForceLike } from "./force.js";

/**
 * Takes a force in any shape it can travel in.
 *
 * @param value - a {@link Force}, its bare `{ value, unit }`, or its text: `N`, `kN`, `lbf`
 * @param path - keys that lead to the value in the caller's data, for the error
 * @returns the same force, in its own unit
 * @throws `QUANTITY_INVALID`, `QUANTITY_OUT_OF_RANGE`, `UNIT_UNKNOWN`, `UNIT_MISSING`, `NUMBER_MALFORMED`,
 *   `NUMBER_NOT_FINITE`, `TEXT_EMPTY`, `TEXT_TOO_LONG`
 * @example
 * ```ts
 * import { asForce } from "limitsmith";
 *
 * asForce("300 lbf").unit; // → "lbf"
 * asForce("300 kg"); // throws UNIT_UNKNOWN
 * ```
 * @reference none: a convenience of this library
 */
export function asForce(value: ForceLike, path: readonly (string | number)[] = []): Force {
  return readQuantity(FORCE_KIND, value, path);
}
