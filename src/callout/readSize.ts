import { atPosition } from "../located.js";
import { readDimension } from "../units/index.js";
import type { DecimalMark, LengthUnit, WrittenDimension } from "../units/index.js";
import type { Token } from "./scan.js";
import type { TokenReader } from "./tokenReader.js";

/** How the numbers of one drawing are read. */
export interface CalloutOptions {
  /** Unit of the drawing, for sizes that stand without one. */
  readonly unit?: LengthUnit;
  readonly decimalMark?: DecimalMark;
}

const UNIT_WORDS: ReadonlySet<string> = new Set(["mm", "um", "\u00b5m", "\u03bcm", "in", "inch", "inches", "thou"]);

/** Reads one size: a decimal, a fraction or a mixed number, with its unit where one stands behind it. */
export function readSize(reader: TokenReader, options: CalloutOptions): WrittenDimension {
  const first = reader.peek();
  if (first?.kind !== "number") throw reader.refuse("a size is expected here");
  const parts = [reader.take()];
  if (isFraction(reader, 0)) parts.push(reader.take(), reader.take());
  else if (isWhole(first) && isWholeToken(reader.peek()) && isFraction(reader, 1)) {
    parts.push(reader.take(), reader.take(), reader.take());
  } else if (isWhole(first) && reader.peek()?.text === "-" && isWholeToken(reader.peek(1)) && isFraction(reader, 2)) {
    parts.push(reader.take(), reader.take(), reader.take(), reader.take());
  }
  const unit = takeUnit(reader);
  const last = parts.at(-1) ?? first;
  const position = { start: first.start, end: last.end };
  return atPosition(position, () => readDimension(`${reader.text.slice(first.start, last.end)}${unit}`, options));
}

/** `/ n` follows `ahead` tokens on, and both sides are whole: then it is a fraction, not two limits. */
function isFraction(reader: TokenReader, ahead: number): boolean {
  const numerator = reader.peek(ahead - 1);
  return (
    (numerator === undefined || isWholeToken(numerator)) &&
    reader.peek(ahead)?.text === "/" &&
    isWholeToken(reader.peek(ahead + 1))
  );
}

function takeUnit(reader: TokenReader): string {
  const token = reader.peek();
  if (token?.text === '"' || token?.text === "″") return reader.take().text;
  if (token?.kind === "word" && UNIT_WORDS.has(token.text.toLowerCase())) return ` ${reader.take().text}`;
  return "";
}

function isWholeToken(token: Token | undefined): boolean {
  return token?.kind === "number" && isWhole(token);
}

function isWhole(token: Token): boolean {
  return /^\d+$/.test(token.text);
}
