import { Decimal } from "decimal.js";
import { asLength } from "./asLength.js";
import type { LengthLike, LengthUnit } from "./length.js";
import { ticksPerUnit } from "./ticksPerUnit.js";

const PRECISION = 40;
let PrivateDecimal: typeof Decimal | undefined;

/**
 * Gives a length as a decimal object in a unit.
 *
 * The decimal comes from a private clone of decimal.js with 40 significant figures, so that a caller's
 * own `Decimal.set` has no effect here, nor the other way round.
 *
 * @param length - any length, in any unit
 * @param unit - the unit of the result: `mm`, `um`, `in`, `thou`, `uin`
 * @returns the value in `unit`: exact in mm and µm; in inch units exact where it ends, else to 40 figures
 * @throws `UNIT_UNKNOWN`, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { inch, mm, toDecimal } from "limitsmith";
 *
 * toDecimal(inch("1.2516"), "mm").toString(); // → "31.79064"
 * toDecimal(mm(1), "in").toFixed(8); // → "0.03937008"
 * ```
 * @reference 1 in = 25.4 mm exactly: the international yard and pound agreement of 1959
 */
export function toDecimal(length: LengthLike, unit: LengthUnit): Decimal {
  // without a prototype: Decimal would read the other settings from a polluted one
  PrivateDecimal ??= Decimal.clone(
    Object.assign(Object.create(null), { precision: PRECISION, defaults: true }) as Decimal.Config,
  );
  return new PrivateDecimal(asLength(length).ticks).div(ticksPerUnit(unit));
}
