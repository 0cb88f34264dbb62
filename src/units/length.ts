import { exactText } from "./exactText.js";
import { ticksPerUnit } from "./ticksPerUnit.js";
import { LimitsError } from "../errors.js";

/** The units a length can be written in: `um` is µm, `uin` is µin, `thou` is a thousandth of an inch. */
export type LengthUnit = "mm" | "um" | "in" | "thou" | "uin";

/** A length as bare data, for instance after `structuredClone`. */
export interface LengthData {
  /** Whole number of ticks; a tick is 0.1 nm, so 1 mm is 10 000 000 and 1 in is 254 000 000. */
  readonly ticks: number;
  /** How the length was written; for display only, equality ignores it. */
  readonly unit: LengthUnit;
}

/** An exact length: a whole number of ticks of 0.1 nm and the unit that it was written in. */
export interface Length extends LengthData {
  /** The nearest double in the given unit. */
  to(unit: LengthUnit): number;
  /** Exact text with its unit, such as `"40.025 mm"`. */
  toString(): string;
  /** The same text: JSON holds a length as `"40.025 mm"`, and every function reads it back. */
  toJSON(): string;
}

/**
 * What every function takes for a length: a {@link Length}, its bare data, or its text with a unit.
 * A bare number is never a length.
 */
export type LengthLike = LengthData | string;

class LengthValue implements Length {
  // a brand that cannot be copied: a prototype alone makes no length
  readonly #made = true;
  readonly ticks: number;
  readonly unit: LengthUnit;

  constructor(ticks: number, unit: LengthUnit) {
    this.ticks = ticks;
    this.unit = unit;
    Object.freeze(this);
  }

  static made(value: object): value is LengthValue {
    return #made in value;
  }

  to(unit: LengthUnit): number {
    return this.ticks / ticksPerUnit(unit);
  }

  toString(): string {
    return exactText(this.ticks, this.unit);
  }

  toJSON(): string {
    return exactText(this.ticks, this.unit);
  }
}

/**
 * Makes a length from whole ticks of 0.1 nm.
 *
 * @param ticks - a whole number of ticks, safe in a double: 1 mm is 10 000 000, 1 in is 254 000 000
 * @param unit - the unit to show it in: `mm`, `um`, `in`, `thou`, `uin`
 * @returns the length; every {@link Length} comes into being here
 * @throws `LENGTH_OUT_OF_RANGE` for what is not a safe whole number, `UNIT_UNKNOWN`
 * @example
 * ```ts
 * import { lengthOfTicks } from "limitsmith";
 *
 * lengthOfTicks(3_968_750, "in").toString(); // → "0.015625 in"
 * ```
 * @reference none: the ground of this library's exactness
 */
export function lengthOfTicks(ticks: number, unit: LengthUnit): Length {
  if (!Number.isSafeInteger(ticks)) {
    throw new LimitsError("LENGTH_OUT_OF_RANGE", "the length is beyond what can be held exactly", {
      value: ticks,
      allowed: "up to 900 719 925 474.0991 mm (about 900 000 km) either way",
    });
  }
  ticksPerUnit(unit);
  // -0 would show as "-0 mm" and fail an identity test
  return new LengthValue(ticks === 0 ? 0 : ticks, unit);
}

/** True for a value made by {@link lengthOfTicks}; saves a copy, decides nothing. */
export function isMadeLength(value: LengthData): value is Length {
  return LengthValue.made(value);
}
