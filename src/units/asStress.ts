import { readQuantity } from "./quantity.js";
import { STRESS_KIND } from "./stress.js";
import type { Stress, StressLike } from "./stress.js";

/**
 * Takes a stress in any shape it can travel in.
 *
 * @param value - a {@link Stress}, its bare `{ value, unit }`, or its text: `MPa` (or `N/mm²`), `psi` (or `lbf/in²`),
 *   `ksi`
 * @param path - keys that lead to the value in the caller's data, for the error
 * @returns the same stress, in its own unit
 * @throws `QUANTITY_INVALID`, `QUANTITY_OUT_OF_RANGE`, `UNIT_UNKNOWN`, `UNIT_MISSING`, `NUMBER_MALFORMED`,
 *   `NUMBER_NOT_FINITE`, `TEXT_EMPTY`, `TEXT_TOO_LONG`
 * @example
 * ```ts
 * import { asStress } from "limitsmith";
 *
 * asStress("100 N/mm²").toString(); // → "100 MPa"
 * asStress("30"); // throws UNIT_MISSING
 * ```
 * @reference none: a convenience of this library
 */
export function asStress(value: StressLike, path: readonly (string | number)[] = []): Stress {
  return readQuantity(STRESS_KIND, value, path);
}
