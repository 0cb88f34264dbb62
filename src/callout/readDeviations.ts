import { LimitsError } from "../errors.js";
import type { TextSpan } from "../errors.js";
import { compareLengths, multiply } from "../units/index.js";
import type { Length, WrittenDimension } from "../units/index.js";
import { readSize } from "./readSize.js";
import type { CalloutOptions } from "./readSize.js";
import type { Token } from "./scan.js";
import type { TokenReader } from "./tokenReader.js";

/** Two deviations as they were read. */
export interface ReadDeviations {
  readonly upper: Length;
  readonly lower: Length;
  readonly form: "plus-minus" | "two";
}

/** Reads `±.005`, `+.002/-.004` or `0/-0.02` behind a size; `null` where no deviation starts. */
export function readDeviations(
  reader: TokenReader,
  nominal: WrittenDimension,
  options: CalloutOptions,
): ReadDeviations | null {
  const ahead = reader.peek()?.kind === "line end" ? 1 : 0;
  const next = reader.peek(ahead);
  if (next === undefined) return null;
  const plusMinus = next.text === "±" || next.text === "+/-";
  if (!plusMinus && !isSign(next.text) && !isUnsignedZero(reader, ahead)) return null;
  reader.skipLineEnd();
  return reader.part("tolerance", () => {
    const start = reader.from;
    const read = plusMinus ? readPlusMinus(reader, nominal, options) : readTwo(reader, nominal, options);
    refuseBad(reader, read, start);
    return read;
  });
}

/** Reads one deviation with its sign, in the unit of its size: `+.002`; a zero may go without a sign. */
export function readSigned(
  reader: TokenReader,
  unit: WrittenDimension["length"]["unit"] | undefined,
  options: CalloutOptions,
): Length {
  const sign = reader.takeIf("+", "-", "\u2212", "\u2013");
  const { length } = readSize(reader, unit === undefined ? options : { ...options, unit });
  if (sign === undefined && length.ticks !== 0) throw reader.refuse("a deviation other than zero needs its sign");
  return sign === undefined || sign.text === "+" ? length : multiply(length, -1);
}

/** One callout is in one unit; a tolerance without one follows its size: `25 mm ±0.02` on an inch drawing. */
export function refuseOtherUnit(reader: TokenReader, first: Length, second: Length): void {
  if (first.unit === second.unit) return;
  throw new LimitsError("CALLOUT_UNIT_CONFLICT", "one callout is in two units", {
    value: reader.text,
    allowed: `all of it in ${first.unit}`,
    position: { start: 0, end: reader.takenTo },
  });
}

export function isSign(text: string): boolean {
  return text === "+" || text === "-" || text === "\u2212" || text === "\u2013";
}

/** Refuses deviations that are upside down or leave no tolerance at all. */
export function refuseBad(
  reader: TokenReader,
  { upper, lower }: { upper: Length; lower: Length },
  start: number,
): void {
  refuseOrder(reader, compareLengths(upper, lower), { start, end: reader.takenTo });
}

/** The same by the sign of upper minus lower, for angles too. */
export function refuseOrder(reader: TokenReader, order: number, position: TextSpan): void {
  if (order < 0) {
    throw new LimitsError("LIMITS_UPSIDE_DOWN", "the upper deviation stands first and is the larger one", {
      value: reader.text,
      allowed: "upper deviation, then lower deviation",
      position,
    });
  }
  if (order === 0) {
    throw new LimitsError("CALLOUT_ZERO_TOLERANCE", "a tolerance of zero contradicts itself", {
      value: reader.text,
      allowed: "a tolerance over zero, or BASIC for a theoretically exact size",
      position,
    });
  }
}

function readPlusMinus(reader: TokenReader, nominal: WrittenDimension, options: CalloutOptions): ReadDeviations {
  reader.take();
  const { length } = readSize(reader, { ...options, unit: nominal.length.unit });
  refuseOtherUnit(reader, nominal.length, length);
  return { upper: length, lower: multiply(length, -1), form: "plus-minus" };
}

function readTwo(reader: TokenReader, nominal: WrittenDimension, options: CalloutOptions): ReadDeviations {
  const { unit } = nominal.length;
  const upper = readSigned(reader, unit, options);
  refuseOtherUnit(reader, nominal.length, upper);
  if (reader.takeIf("/") === undefined) reader.skipLineEnd();
  const lower = readSigned(reader, unit, options);
  refuseOtherUnit(reader, nominal.length, lower);
  return { upper, lower, form: "two" };
}

/** `0/-0.02`, `.000 +.002`: a zero that a sign or a slash with a sign follows. */
function isUnsignedZero(reader: TokenReader, ahead: number): boolean {
  const zero: Token | undefined = reader.peek(ahead);
  if (zero?.kind !== "number" || Number(zero.text.replace(",", ".")) !== 0) return false;
  const next = reader.peekText(ahead + 1);
  const further = reader.peekText(ahead + 2);
  if (next === "/" || next === "\n") return further !== undefined && isSign(further);
  return next !== undefined && isSign(next);
}
