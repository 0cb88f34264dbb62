import { LimitsError } from "../errors.js";
import { parseInchClass } from "../inchFits/index.js";
import { parseToleranceClass } from "../iso286/index.js";
import { atPosition } from "../located.js";
import { add, angleOfMicroarcseconds, compareLengths, exactPlaces, writeLength } from "../units/index.js";
import type { Angle, Length, WrittenDimension } from "../units/index.js";
import { readSmallAngle } from "./readAngleTokens.js";
import { readChamferAngle } from "./readChamfer.js";
import { isSign, readDeviations, refuseOrder, refuseOtherUnit } from "./readDeviations.js";
import { takeLimitsMark } from "./limitsMark.js";
import { isWhole, readSize } from "./readSize.js";
import type { CalloutOptions } from "./readSize.js";
import type { Prefix } from "./readPrefix.js";
import type {
  BareRequest,
  ChamferRequest,
  ClassRequest,
  FitRequest,
  InchClassRequest,
  LimitsRequest,
  PrintedLimits,
  SingleLimitRequest,
} from "./request.js";
import type { TokenReader } from "./tokenReader.js";

type Form = (reader: TokenReader, size: WrittenDimension, options: CalloutOptions) => BareRequest | null;

/** What may stand behind a size, tried in this order; a new form is one more function here. */
const FORMS: readonly Form[] = [limitsForm, chamferForm, inchClassForm, classForm, deviationsForm, singleLimitForm];

/** Reads the tolerance behind a size; without one the size is plain. */
export function readTolerance(
  reader: TokenReader,
  size: WrittenDimension,
  options: CalloutOptions,
  prefix: Prefix,
): BareRequest {
  if (prefix.shape === "unmarked") reader.part("shape", () => reader.takeIf("DIA", "SQ"));
  for (const form of FORMS) {
    const bare = form(reader, size, options);
    if (bare === null) continue;
    if (bare.kind !== "chamfer") refuseSecond(reader);
    return bare;
  }
  return { kind: "plain", nominal: size };
}

/** Reads `±1°`, `+1°/-0°` behind an angle; `null` where none follows. */
export function readAngleTolerance(
  reader: TokenReader,
  options: CalloutOptions,
): { readonly upper: Angle; readonly lower: Angle } | null {
  const text = reader.peekText() ?? "";
  const plusMinus = text === "±" || text === "+/-";
  if (!plusMinus && !isSign(text)) return null;
  return reader.part("tolerance", () => {
    const start = reader.from;
    const signed = (): Angle => {
      const sign = isSign(reader.peekText() ?? "") ? reader.take().text : "";
      const angle = readSmallAngle(reader, options);
      if (sign === "" && angle.microarcseconds !== 0) throw reader.refuse("a deviation other than zero needs its sign");
      return sign === "" || sign === "+" ? angle : opposite(angle);
    };
    if (plusMinus) reader.take();
    const upper = plusMinus ? readSmallAngle(reader, options) : signed();
    if (!plusMinus) reader.takeIf("/");
    const lower = plusMinus ? opposite(upper) : signed();
    const position = { start, end: reader.takenTo };
    refuseOrder(reader, Math.sign(upper.microarcseconds - lower.microarcseconds), position);
    refuseSecond(reader);
    return { upper, lower };
  });
}

function opposite(angle: Angle): Angle {
  return angleOfMicroarcseconds(-angle.microarcseconds, angle.style);
}

function chamferForm(
  reader: TokenReader,
  length: WrittenDimension,
  options: CalloutOptions,
): BareRequest<ChamferRequest> | null {
  return reader.try(() => {
    const deviations = readDeviations(reader, length, options);
    const angle = readChamferAngle(reader, options);
    return angle === null ? null : { kind: "chamfer", length, deviations, angle };
  });
}

/** `LN2`, `LN 2`, `lt2s hole`: letters, number, an S or B that touches it, and the member. */
function inchClassForm(reader: TokenReader, nominal: WrittenDimension): BareRequest<InchClassRequest> | null {
  const letters = reader.peekText() ?? "";
  const number = reader.peek(1);
  if (!["RC", "LC", "LT", "LN", "FN"].includes(letters) || number?.kind !== "number") return null;
  const inchClass = reader.part("class", () => {
    const { start } = reader.take();
    reader.take();
    const basis = reader.touches(0) ? reader.takeIf("S", "B") : undefined;
    const text = `${letters}${number.text}${basis?.text.toUpperCase() ?? ""}`;
    return atPosition({ start, end: reader.takenTo }, () => parseInchClass(text).text);
  });
  const member = reader.part("member", () => reader.takeIf("HOLE", "SHAFT"));
  return {
    kind: "inch class",
    nominal,
    inchClass,
    member: member === undefined ? null : /^hole/i.test(member.text) ? "hole" : "shaft",
  };
}

function classForm(
  reader: TokenReader,
  nominal: WrittenDimension,
  options: CalloutOptions,
): BareRequest<ClassRequest> | BareRequest<FitRequest> | null {
  const grade = reader.peek(1);
  if (reader.peek()?.kind !== "word" || grade?.kind !== "number" || !isWhole(grade) || !reader.touches(1)) return null;
  const first = reader.part("class", () => takeClass(reader));
  if (reader.takeIf("/", "-", "\u2013") !== undefined) {
    const second = reader.part("class", () => takeClass(reader));
    refuseNoFit(reader, first, second);
    return { kind: "fit", nominal, fit: `${first}/${second}` };
  }
  return { kind: "class", nominal, toleranceClass: first, printed: printedLimits(reader, nominal, options) };
}

function refuseNoFit(reader: TokenReader, first: string, second: string): void {
  if (parseToleranceClass(first).kind === "hole" && parseToleranceClass(second).kind === "shaft") return;
  const end = reader.takenTo;
  throw new LimitsError("FIT_NOT_HOLE_AND_SHAFT", "a fit is a hole class and a shaft class, in this order", {
    value: `${first}/${second}`,
    allowed: "a capital letter for the hole, then a small one for the shaft, such as H7/m6",
    position: { start: end - first.length - second.length - 1, end },
  });
}

/** A letter and a grade that touch; the class itself is checked here, so that its place is known. */
function takeClass(reader: TokenReader): string {
  const letter = reader.peek();
  const grade = reader.peek(1);
  if (letter?.kind !== "word" || grade?.kind !== "number" || letter.end !== grade.start) {
    throw reader.refuse("a tolerance class is expected here", "letters and a grade without a gap, such as m6 or H7");
  }
  const { start } = letter;
  const { end } = grade;
  const text = reader.text.slice(start, end);
  atPosition({ start, end }, () => parseToleranceClass(text));
  reader.take();
  reader.take();
  return text;
}

/** `(35.018/35.002)` or `(+0.018/+0.002)` behind a class. */
function printedLimits(reader: TokenReader, nominal: WrittenDimension, options: CalloutOptions): PrintedLimits | null {
  if (reader.peekText() !== "(") return null;
  return reader.part("tolerance", () => {
    reader.take();
    const sizeOptions = { ...options, unit: nominal.length.unit };
    const deviations = readDeviations(reader, nominal, options);
    const first = deviations === null ? readSize(reader, sizeOptions) : sizeAt(nominal, deviations.upper);
    const second =
      deviations !== null
        ? sizeAt(nominal, deviations.lower)
        : takeLimitsMark(reader, first.length.unit)
          ? readSize(reader, sizeOptions)
          : null;
    if (second === null || reader.takeIf(")") === undefined) {
      throw reader.refuse(
        "limits in brackets are two sizes or two deviations",
        "such as (35.018/35.002) or (+0.018/+0.002)",
      );
    }
    const { max, min } = orderedLimits(reader, first, second);
    return Object.freeze({ max, min });
  });
}

function deviationsForm(reader: TokenReader, nominal: WrittenDimension, options: CalloutOptions): BareRequest | null {
  const read = readDeviations(reader, nominal, options);
  return read === null ? null : { kind: "deviations", nominal, ...read };
}

function limitsForm(
  reader: TokenReader,
  size: WrittenDimension,
  options: CalloutOptions,
): BareRequest<LimitsRequest> | null {
  if (reader.peek()?.kind === "line end" && reader.peek(1)?.kind === "number")
    return stackedLimits(reader, size, options);
  if (!takeLimitsMark(reader, size.length.unit)) return null;
  return orderedLimits(
    reader,
    size,
    reader.part("size", () => readSize(reader, { ...options, unit: size.length.unit })),
  );
}

/** A limit that stands as a deviation from the nominal, as a size: `35 k6 (+0.018/+0.002)`. */
function sizeAt(nominal: WrittenDimension, deviation: Length): WrittenDimension {
  const length = add(nominal.length, deviation);
  const places = Math.max(nominal.places, exactPlaces(deviation, nominal.length.unit) ?? 0);
  const text = writeLength(length, { places, style: "inch", symbol: false });
  return Object.freeze({ length, text, form: "decimal", places, unitWritten: false });
}

/** Two sizes on two lines are limits only where nothing stands behind them. */
function stackedLimits(
  reader: TokenReader,
  size: WrittenDimension,
  options: CalloutOptions,
): BareRequest<LimitsRequest> | null {
  return reader.try(() => {
    reader.skipLineEnd();
    const other = reader.part("size", () => readSize(reader, { ...options, unit: size.length.unit }));
    return reader.done ? orderedLimits(reader, size, other) : null;
  });
}

function orderedLimits(
  reader: TokenReader,
  size: WrittenDimension,
  other: WrittenDimension,
): BareRequest<LimitsRequest> {
  refuseOtherUnit(reader, size.length, other.length);
  const order = compareLengths(size.length, other.length);
  if (order === 0) {
    throw new LimitsError("CALLOUT_ZERO_TOLERANCE", "two equal limits leave no tolerance", {
      value: reader.text,
      allowed: "two different limits, or BASIC for a theoretically exact size",
      position: { start: reader.text.indexOf(size.text), end: reader.takenTo },
    });
  }
  // old prints put the maximum-material limit first: the larger one is the maximum
  return order < 0 ? { kind: "limits", max: other, min: size } : { kind: "limits", max: size, min: other };
}

function singleLimitForm(reader: TokenReader, size: WrittenDimension): BareRequest<SingleLimitRequest> | null {
  const side = reader.part("word", () => reader.takeIf("MAX", "MIN"));
  if (side === undefined) return null;
  return { kind: "single limit", size, side: /^max/i.test(side.text) ? "max" : "min" };
}

/** A second tolerance behind the first is a contradiction, not a rest. */
function refuseSecond(reader: TokenReader): void {
  const start = reader.from;
  const next = reader.peekText() ?? "";
  const isClass = reader.peek()?.kind === "word" && reader.peek(1)?.kind === "number" && reader.touches(1);
  if (!["±", "+/-", "MAX", "MIN", "+", "-", "\u2212"].includes(next) && !isClass) return;
  throw new LimitsError("CALLOUT_TWO_TOLERANCES", "a second tolerance stands behind the first", {
    value: reader.text,
    allowed: "one tolerance for one size",
    position: { start, end: reader.peek()?.end ?? start },
  });
}
