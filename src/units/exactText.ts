import type { LengthUnit } from "./length.js";
import { scaledText } from "./scaledText.js";
import { unitSymbol } from "./unitSymbol.js";

// 1 tick is 1/254 µin and 254 = 2 * 127: a length ends in inch decimals only if 127 divides its ticks.
const INCH_PRIME = 127;

/**
 * A number of ticks written exactly in a unit, or in mm where inches would not end: what stands in JSON
 * must read back to the very same length.
 */
export function exactText(ticks: number, unit: LengthUnit): string {
  switch (unit) {
    case "um":
      return `${scaledText(BigInt(ticks), 4)} ${unitSymbol(unit)}`;
    case "in":
    case "thou":
    case "uin":
      if (ticks % INCH_PRIME === 0) {
        // ticks / 127 counts halves of a µin; five of those in tenths
        const places = unit === "in" ? 7 : unit === "thou" ? 4 : 1;
        return `${scaledText(BigInt(ticks / INCH_PRIME) * 5n, places)} ${unitSymbol(unit)}`;
      }
      return `${scaledText(BigInt(ticks), 7)} mm`;
    default:
      return `${scaledText(BigInt(ticks), 7)} mm`;
  }
}
