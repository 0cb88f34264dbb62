import { LimitsError } from "../errors.js";
import { atPosition } from "../located.js";
import { ownValue } from "../ownValue.js";
import { readAngle } from "../units/index.js";
import type { Angle } from "../units/index.js";
import type { CalloutOptions } from "./readSize.js";
import type { TokenReader } from "./tokenReader.js";

const MINUTES: readonly string[] = ["'", "′"];
const SECONDS: readonly string[] = ['"', "″"];

/** True where an angle starts `ahead` tokens on. */
export function isAngle(reader: TokenReader, ahead = 0): boolean {
  const text = reader.peekText(ahead + 1);
  return reader.peek(ahead)?.kind === "number" && (text === "°" || text === "DEG");
}

/** Reads one angle: degrees, with minutes and seconds where they follow. */
export function readAngleTokens(reader: TokenReader, options: CalloutOptions): Angle {
  if (!isAngle(reader)) throw reader.refuse("an angle is expected here", "such as 45° or 0°30'");
  const { start, text } = reader.take();
  refuseOtherMark(text, start, options);
  reader.take();
  takeDivision(reader, MINUTES);
  takeDivision(reader, SECONDS);
  return angleBetween(reader, start, "", options);
}

/** Reads the tolerance of an angle, which may be minutes alone: `±30'`. */
export function readSmallAngle(reader: TokenReader, options: CalloutOptions): Angle {
  if (isAngle(reader)) return readAngleTokens(reader, options);
  const start = reader.from;
  if (!takeDivision(reader, MINUTES)) throw reader.refuse("an angle is expected here", "such as 1°, 0.5° or 30'");
  takeDivision(reader, SECONDS);
  return angleBetween(reader, start, "0°", options);
}

function takeDivision(reader: TokenReader, marks: readonly string[]): boolean {
  const mark = reader.peekText(1);
  if (reader.peek()?.kind !== "number" || mark === undefined || !marks.includes(mark)) return false;
  reader.take();
  reader.take();
  return true;
}

function angleBetween(reader: TokenReader, start: number, before: string, options: CalloutOptions): Angle {
  const position = { start, end: reader.takenTo };
  const text = before + reader.text.slice(start, position.end);
  return atPosition(position, () => readAngle(text, { decimalMark: ownValue(options, "decimalMark") ?? "." }));
}

function refuseOtherMark(text: string, start: number, options: CalloutOptions): void {
  const mark = ownValue(options, "decimalMark") ?? ".";
  if (!text.includes(mark === "." ? "," : ".")) return;
  throw new LimitsError("DECIMAL_MARK_MIXED", `the decimal mark here is "${mark}"`, {
    value: text,
    allowed: `decimals with "${mark}"; say decimalMark to change it`,
    position: { start, end: start + text.length },
  });
}
