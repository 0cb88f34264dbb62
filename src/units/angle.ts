import { LimitsError } from "../errors.js";
import { scaledText } from "./scaledText.js";

/** How an angle was written: as decimal degrees, or in degrees, minutes and seconds. */
export type AngleStyle = "decimal" | "dms";

/** An angle as bare data. */
export interface AngleData {
  /** Whole number of millionths of an arc second; one degree is 3 600 000 000. */
  readonly microarcseconds: number;
  /** How the angle was written; for display only. */
  readonly style: AngleStyle;
}

/** An exact angle: a whole number of millionths of an arc second, and how it was written. */
export interface Angle extends AngleData {
  /** The nearest double, in degrees. */
  toDegrees(): number;
  /** Exact text in decimal degrees or, where those do not end, in degrees, minutes and seconds. */
  toString(): string;
  /** The same text: JSON holds an angle so, and every function reads it back. */
  toJSON(): string;
}

/** What every function takes for an angle: an {@link Angle}, its bare data, or its text with a sign of degree. */
export type AngleLike = AngleData | string;

const PER_DEGREE = 3_600_000_000;
const PER_MINUTE = 60_000_000;

class AngleValue implements Angle {
  readonly microarcseconds: number;
  readonly style: AngleStyle;

  constructor(microarcseconds: number, style: AngleStyle) {
    this.microarcseconds = microarcseconds;
    this.style = style;
    Object.freeze(this);
  }

  toDegrees(): number {
    return this.microarcseconds / PER_DEGREE;
  }

  toString(): string {
    return angleText(this.microarcseconds, this.style);
  }

  toJSON(): string {
    return angleText(this.microarcseconds, this.style);
  }
}

/**
 * Makes an angle from whole millionths of an arc second.
 *
 * @param microarcseconds - a whole number, safe in a double; one degree is 3 600 000 000
 * @param style - `"decimal"` or `"dms"`: how to show it, in degrees
 * @returns the angle; every {@link Angle} comes into being here
 * @throws `ANGLE_OUT_OF_RANGE` for what is not a safe whole number
 * @example
 * ```ts
 * import { angleOfMicroarcseconds } from "limitsmith";
 *
 * angleOfMicroarcseconds(1_800_000_000, "dms").toString(); // → "0°30'"
 * ```
 * @reference 1° = 60' = 3600": ISO 80000-3:2019, table 2
 */
export function angleOfMicroarcseconds(microarcseconds: number, style: AngleStyle): Angle {
  if (!Number.isSafeInteger(microarcseconds)) {
    throw new LimitsError("ANGLE_OUT_OF_RANGE", "the angle is beyond what can be held exactly", {
      value: microarcseconds,
      allowed: "up to about 2 500 000° either way",
    });
  }
  return new AngleValue(microarcseconds === 0 ? 0 : microarcseconds, style);
}

function angleText(microarcseconds: number, style: AngleStyle): string {
  // a degree is 2^10 * 3^2 * 5^8 units: decimals end only where the threes are used up
  const scaled = BigInt(microarcseconds) * 10n ** 11n;
  if (style === "decimal" && scaled % BigInt(PER_DEGREE) === 0n) {
    return `${scaledText(scaled / BigInt(PER_DEGREE), 11)}°`;
  }
  const magnitude = Math.abs(microarcseconds);
  const degrees = Math.floor(magnitude / PER_DEGREE);
  const minutes = Math.floor((magnitude % PER_DEGREE) / PER_MINUTE);
  const seconds = magnitude % PER_MINUTE;
  const tail = seconds === 0 ? "" : `${scaledText(BigInt(seconds), 6)}"`;
  return `${microarcseconds < 0 ? "-" : ""}${degrees}°${minutes}'${tail}`;
}
