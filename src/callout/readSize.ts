import { atPosition } from "../located.js";
import { ownValue } from "../ownValue.js";
import { readDimension } from "../units/index.js";
import type { DecimalMark, LengthUnit, WrittenDimension } from "../units/index.js";
import type { Token } from "./scan.js";
import type { TokenReader } from "./tokenReader.js";

/** How the numbers of one drawing are read. */
export interface CalloutOptions {
  /** Unit of the drawing, for sizes that stand without one. */
  readonly unit?: LengthUnit;
  /** The decimal mark; `"."` unless said otherwise. */
  readonly decimalMark?: DecimalMark;
}

const INCH_MARKS: ReadonlySet<string> = new Set(['"', "″", "IN", "INCH", "INCHES"]);
const UNIT_WORDS: ReadonlySet<string> = new Set(["MM", "UM", "\u00b5M", "\u039cM", "IN", "INCH", "INCHES", "THOU"]);

/** Reads one size: a decimal, a fraction or a mixed number, with its unit where one stands behind it. */
export function readSize(reader: TokenReader, options: CalloutOptions): WrittenDimension {
  const first = reader.peek();
  if (first?.kind !== "number") throw reader.refuse("a size is expected here");
  reader.take();
  if (areMetricLimits(reader, options)) return whole(reader, first, options);
  if (isFraction(reader, 0)) takeMany(reader, 2);
  else if (isWhole(first) && isWholeToken(reader.peek()) && isFraction(reader, 1)) takeMany(reader, 3);
  else if (isWhole(first) && reader.peek()?.text === "-" && isWholeToken(reader.peek(1)) && isFraction(reader, 2)) {
    takeMany(reader, 4);
  }
  return whole(reader, first, options);
}

/** The size from its first token to the last one taken, with its unit. */
function whole(reader: TokenReader, first: Token, options: CalloutOptions): WrittenDimension {
  const position = { start: first.start, end: reader.takenTo };
  const unit = takeUnit(reader);
  const decimalMark = ownValue(options, "decimalMark");
  const drawingUnit = ownValue(options, "unit");
  return atPosition(position, () =>
    readDimension(`${reader.text.slice(position.start, position.end)}${unit}`, {
      ...(drawingUnit === undefined ? {} : { unit: drawingUnit }),
      ...(decimalMark === undefined ? {} : { decimalMark }),
    }),
  );
}

/** `26/24` on a metric drawing: there are no fractions of a millimetre, so the larger number first means limits. */
function areMetricLimits(reader: TokenReader, options: CalloutOptions): boolean {
  const unit = ownValue(options, "unit");
  if ((unit !== "mm" && unit !== "um") || !isFraction(reader, 0)) return false;
  const inchBehind = INCH_MARKS.has(reader.peekText(2) ?? "");
  return !inchBehind && Number(reader.peek(-1)?.text) > Number(reader.peek(1)?.text);
}

/** `/ n` follows `ahead` tokens on, and both sides are whole: then it is a fraction, not two limits. */
function isFraction(reader: TokenReader, ahead: number): boolean {
  return (
    isWholeToken(reader.peek(ahead - 1)) && reader.peek(ahead)?.text === "/" && isWholeToken(reader.peek(ahead + 1))
  );
}

function takeMany(reader: TokenReader, count: number): void {
  for (let taken = 0; taken < count; taken++) reader.take();
}

function takeUnit(reader: TokenReader): string {
  const text = reader.peekText();
  if (text === '"' || text === "″") return reader.take().text;
  // mil is taken too, so that it is refused as what it is
  const isUnit = text !== undefined && (UNIT_WORDS.has(text) || text === "MIL" || text === "MILS");
  return isUnit ? ` ${reader.take().text}` : "";
}

function isWholeToken(token: Token | undefined): boolean {
  return token?.kind === "number" && isWhole(token);
}

/** True for a number without a decimal mark. */
export function isWhole(token: Token): boolean {
  return /^\d+$/.test(token.text);
}
