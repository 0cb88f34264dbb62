import type { LengthUnit } from "../units/index.js";
import { isSign } from "./readDeviations.js";
import { isWhole } from "./readSize.js";
import type { TokenReader } from "./tokenReader.js";

/**
 * Takes what stands between two limits on one line: a slash, or a dash as in `3.49-3.53`.
 *
 * A dash is one only between numbers of like size, and with the same gap on both sides: `.50 -.02` is a deviation.
 */
export function takeLimitsMark(reader: TokenReader, unit: LengthUnit): boolean {
  if (reader.peekText() !== "/" && !isDashBetweenLimits(reader, unit)) return false;
  reader.take();
  return true;
}

function isDashBetweenLimits(reader: TokenReader, unit: LengthUnit): boolean {
  const [before, dash, after] = [reader.peek(-1), reader.peek(), reader.peek(1)];
  if (before?.kind !== "number" || after?.kind !== "number" || dash === undefined) return false;
  if (!isSign(dash.text) || dash.text === "+") return false;
  // 1-1/4 is a mixed number in inches; in millimetres 24-26 can only be limits
  const metric = unit === "mm" || unit === "um";
  if (!metric && (isWhole(before) || isWhole(after))) return false;
  const [low, high] = [valueOf(before.text), valueOf(after.text)].sort((left, right) => left - right);
  return reader.touches(0) === reader.touches(1) && low !== undefined && high !== undefined && low > high / 2;
}

function valueOf(text: string): number {
  return Number(text.replace(",", "."));
}
