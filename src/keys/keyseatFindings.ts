import { asLimits } from "../limits/index.js";
import type { Limits, LimitsLike } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import type { KeyseatRow, KeyseatRows } from "./keyseatRows.js";

/** Dimensions of a keyseat as a drawing prints them. */
export interface PrintedKeyseat {
  /** S, T, d − t1 or d + t2. */
  readonly control?: LimitsLike;
  /** Width of the seat. */
  readonly width?: LimitsLike;
}

/** A printed dimension that is not the standard's. */
export interface KeyseatFinding {
  /** Stable code; it never changes its meaning. */
  readonly code: "KEYSEAT_NOT_STANDARD";
  /** Which dimension. */
  readonly name: KeyseatRow["name"];
  /** How the standard writes it. */
  readonly symbol: KeyseatRow["symbol"];
  /** What the drawing prints. */
  readonly printed: Limits;
  /** What the standard gives; `null` where it gives none. */
  readonly standard: Limits | null;
  /** In words, with sizes. */
  readonly says: string;
}

/**
 * Compares the printed dimensions of a keyseat with the standard's.
 *
 * @param seat - what {@link keyseatRows} gives
 * @param printed - `control` and `width` as `Limits`, where the drawing has them, any unit
 * @returns a frozen list with one finding for each printed dimension whose limits are not the standard's, holding both
 *   (no unit of its own)
 * @throws `LIMITS_INVALID`, `LIMITS_CONTRADICT`, `LIMITS_UPSIDE_DOWN`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { keyseatFindings, keyseatRows, limits } from "limitsmith";
 *
 * const seat = keyseatRows("1 1/2 in", { standard: "B17.1", member: "shaft", class: 1 });
 * const printed = { control: limits({ nominal: "1.289 in", upper: "0 thou", lower: "-5 thou" }) };
 * keyseatFindings(seat, printed)[0]?.says; // → "S is printed 1.289 in / 1.284 in; the standard has 1.289 in / 1.274 in"
 * ```
 * @reference none of its own: the standard is named in the rows
 */
export function keyseatFindings(seat: KeyseatRows, printed: PrintedKeyseat): readonly KeyseatFinding[] {
  const found: KeyseatFinding[] = [];
  for (const { name, symbol, limits } of seat.rows) {
    const given = ownValue(printed, name);
    if (given === undefined) continue;
    const read = asLimits(given, [name]);
    if (limits !== null && read.max.ticks === limits.max.ticks && read.min.ticks === limits.min.ticks) continue;
    const text = (one: Limits): string => `${one.max.toString()} / ${one.min.toString()}`;
    const has = limits === null ? "no limits for it" : text(limits);
    found.push(
      Object.freeze({
        code: "KEYSEAT_NOT_STANDARD",
        name,
        symbol,
        printed: read,
        standard: limits,
        says: `${symbol} is printed ${text(read)}; the standard has ${has}`,
      }),
    );
  }
  return Object.freeze(found);
}
