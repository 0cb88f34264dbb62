import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { angleOfMicroarcseconds } from "./angle.js";
import type { Angle, AngleLike } from "./angle.js";
import { decimalMarkOf } from "./lengthFrom.js";
import type { ReadOptions } from "./lengthFrom.js";

const LONGEST_ANGLE_TEXT = 60;
const ANGLE =
  /^([+\-\u2212]?)(?=\.?\d)(\d{0,7})(?:\.(\d{0,12}))?\s?(?:°|deg)(?:\s?(\d{1,2})\s?['′])?(?:\s?(\d{1,2})(?:\.(\d{0,6}))?\s?["″])?$/i;

/**
 * Reads an angle from a text with its sign of degree.
 *
 * @param text - decimal degrees (`45°`, `0.5°`, `45 deg`), or degrees with minutes and seconds under 60
 *   (`0°30'`, `12°15'30"`); an {@link Angle} or its data is given back as an angle
 * @param options - `decimalMark`: `"."` unless said otherwise
 * @returns the exact angle, in millionths of an arc second
 * @throws `ANGLE_INVALID`, `ANGLE_TOO_FINE`, `ANGLE_OUT_OF_RANGE`, `TEXT_TOO_LONG`, `OPTION_INVALID`
 * @example
 * ```ts
 * import { readAngle } from "limitsmith";
 *
 * readAngle("0°30'").toDegrees(); // → 0.5
 * readAngle("12.25°").toString(); // → "12.25°"
 * ```
 * @reference 1° = 60' = 3600": ISO 80000-3:2019, table 2
 */
export function readAngle(text: AngleLike, options?: ReadOptions): Angle {
  const given: unknown = text;
  if (typeof given === "object" && given !== null) return angleOfData(given);
  if (typeof given !== "string") throw notAnAngle(given);
  if (given.length > LONGEST_ANGLE_TEXT) {
    throw new LimitsError("TEXT_TOO_LONG", "the text is too long to be an angle", {
      value: given,
      allowed: `up to ${LONGEST_ANGLE_TEXT} characters`,
    });
  }
  const pointed = decimalMarkOf(options) === "," ? given.replace(/[.,]/g, (mark) => (mark === "," ? "." : ",")) : given;
  const match = ANGLE.exec(pointed.trim());
  if (match === null) throw notAnAngle(given);
  const [, sign, degrees = "", decimals = "", minutes, seconds, fraction = ""] = match;
  const divided = minutes !== undefined || seconds !== undefined;
  if ((divided && decimals !== "") || Number(minutes ?? 0) >= 60 || Number(seconds ?? 0) >= 60) throw notAnAngle(given);
  const scaledDegrees = BigInt(degrees + decimals) * 3_600_000_000n;
  const scale = 10n ** BigInt(decimals.length);
  if (scaledDegrees % scale !== 0n) {
    throw new LimitsError("ANGLE_TOO_FINE", "the angle is not a whole number of millionths of a second", {
      value: given,
      allowed: "decimal degrees to 8 places (some to 11), or seconds to 6",
    });
  }
  const magnitude =
    Number(scaledDegrees / scale) +
    Number(minutes ?? 0) * 60_000_000 +
    Number((seconds ?? "0") + fraction.padEnd(6, "0"));
  return angleOfMicroarcseconds(
    sign === "-" || sign === "\u2212" ? -magnitude : magnitude,
    divided ? "dms" : "decimal",
  );
}

function angleOfData(given: object): Angle {
  const data = given as { readonly microarcseconds?: unknown; readonly style?: unknown };
  const microarcseconds = ownValue(data, "microarcseconds");
  const style = ownValue(data, "style");
  if (typeof microarcseconds !== "number" || (style !== "decimal" && style !== "dms")) throw notAnAngle(given);
  return angleOfMicroarcseconds(microarcseconds, style);
}

function notAnAngle(value: unknown): LimitsError {
  return new LimitsError("ANGLE_INVALID", "this is not an angle as drawings write it", {
    value,
    allowed: "decimal degrees such as 45° or 0.5°, or degrees, minutes and seconds such as 0°30' or 12°15'30\"",
  });
}
