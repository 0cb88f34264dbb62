import { LimitsError } from "../errors.js";
import { atPosition } from "../located.js";
import { ownValue } from "../ownValue.js";
import { compareLengths, multiply, readAngle } from "../units/index.js";
import type { Length, WrittenDimension } from "../units/index.js";
import { parseToleranceClass } from "../iso286/index.js";
import { readSize } from "./readSize.js";
import type { CalloutOptions } from "./readSize.js";
import type {
  BasicRequest,
  CalloutRequest,
  ClassRequest,
  DeviationsRequest,
  FitRequest,
  LimitsRequest,
  PlainRequest,
  ReferenceRequest,
  SingleLimitRequest,
} from "./request.js";
import { scan } from "./scan.js";
import { TokenReader } from "./tokenReader.js";

/** A request without what all requests have. */
type Bare<Request> = Request extends CalloutRequest ? Omit<Request, "text" | "shape"> : never;

type Form = (reader: TokenReader, size: WrittenDimension, options: CalloutOptions) => Bare<CalloutRequest> | null;

/** What may stand behind a size, tried in this order; a new form is one more function here. */
const FORMS: readonly Form[] = [plainForm, classForm, plusMinusForm, twoDeviationsForm, limitsForm, wordForm];

/**
 * Reads what a drafter wrote for one size and gives it as a typed request.
 *
 * Understood are sizes with an ISO class or fit, with deviations, ±, two limits or one limit, plain sizes, reference
 * and basic dimensions, and angles; ⌀ before the size. Anything else is refused with its place, never half-read.
 *
 * @param text - the callout, up to 200 characters
 * @param options - `unit` of the drawing for sizes without one (mm, in …), `decimalMark`
 * @returns the frozen request, told apart by `kind`; sizes keep their unit and how many decimals were written
 * @throws `CALLOUT_NOT_UNDERSTOOD` with the position, `TEXT_EMPTY`, `TEXT_TOO_LONG`, `UNIT_MISSING`,
 *   `LIMITS_UPSIDE_DOWN`, `CALLOUT_UNIT_CONFLICT`, `CLASS_LETTER_UNKNOWN`, `CLASS_GRADE_UNKNOWN`, and what
 *   {@link readDimension} throws
 * @example
 * ```ts
 * import { readCallout } from "limitsmith";
 *
 * const request = readCallout("⌀35 k6", { unit: "mm" });
 * request.kind; // → "class"
 * request.shape; // → "diameter"
 * readCallout("35 k6 and some", { unit: "mm" }); // throws CALLOUT_NOT_UNDERSTOOD
 * ```
 * @reference ISO 129-1:2018 and ASME Y14.5-2018, 5.2, for the forms, from memory; ISO 286-1:2010, 4.2 for classes
 */
export function readCallout(text: string, options: CalloutOptions = {}): CalloutRequest {
  const given: unknown = text;
  if (typeof given !== "string") {
    throw new LimitsError("CALLOUT_NOT_UNDERSTOOD", "a callout is a text", { value: given });
  }
  const reader = new TokenReader(text, scan(text));
  const opening = reader.takeIf("(", "[");
  const shape = reader.takeIf("⌀", "Ø") === undefined ? "unmarked" : "diameter";
  const bare =
    opening === undefined
      ? (readWholeAngle(reader, options) ?? readForm(reader, options))
      : readEnclosed(reader, opening.text, options);
  if (!reader.done) throw reader.refuse("this does not belong to the callout before it");
  return Object.freeze({ ...bare, text, shape } as CalloutRequest);
}

function readForm(reader: TokenReader, options: CalloutOptions): Bare<CalloutRequest> {
  const size = readSize(reader, options);
  for (const form of FORMS) {
    const bare = form(reader, size, options);
    if (bare !== null) return bare;
  }
  throw reader.refuse("this is not a tolerance that is known here");
}

function readEnclosed(
  reader: TokenReader,
  opening: string,
  options: CalloutOptions,
): Bare<ReferenceRequest> | Bare<BasicRequest> {
  const nominal = readSize(reader, options);
  const reference = opening === "(";
  if (reader.takeIf(reference ? ")" : "]") === undefined) {
    throw reader.refuse(`the bracket is not closed, or more than a size stands in it`);
  }
  return { kind: reference ? "reference" : "basic", nominal };
}

/** `45°`, `0°30'`: everything up to the end is the angle. */
function readWholeAngle(reader: TokenReader, options: CalloutOptions): Bare<CalloutRequest> | null {
  const sign = reader.peek(1)?.text;
  const first = reader.peek();
  if (first?.kind !== "number" || sign !== "°") return null;
  const angle = readAngle(
    reader.text.slice(first.start),
    { decimalMark: ownValue(options, "decimalMark") ?? "." },
  );
  while (!reader.done) reader.take();
  return { kind: "angle", angle };
}

function plainForm(reader: TokenReader, nominal: WrittenDimension): Bare<PlainRequest> | null {
  return reader.done ? { kind: "plain", nominal } : null;
}

function classForm(
  reader: TokenReader,
  nominal: WrittenDimension,
): Bare<ClassRequest> | Bare<FitRequest> | null {
  if (reader.peek()?.kind !== "word" || reader.peek(1)?.kind !== "number") return null;
  const first = takeClass(reader);
  if (reader.takeIf("/", "-") === undefined) return { kind: "class", nominal, toleranceClass: first };
  return { kind: "fit", nominal, fit: `${first}/${takeClass(reader)}` };
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

function plusMinusForm(
  reader: TokenReader,
  nominal: WrittenDimension,
  options: CalloutOptions,
): Bare<DeviationsRequest> | null {
  if (reader.takeIf("±", "+/-") === undefined) return null;
  const upper = readTolerance(reader, nominal, options);
  return { kind: "deviations", nominal, upper, lower: multiply(upper, -1), form: "plus-minus" };
}

function twoDeviationsForm(
  reader: TokenReader,
  nominal: WrittenDimension,
  options: CalloutOptions,
): Bare<DeviationsRequest> | null {
  const next = reader.peek();
  // a zero may stand without a sign: 32 0/-0.02
  const startsUnsigned = next?.kind === "number" && Number(next.text.replace(",", ".")) === 0;
  if (next === undefined || (!startsUnsigned && !isSign(next.text))) return null;
  const start = next.start;
  const first = signedSize(reader, nominal, options);
  reader.takeIf("/");
  const second = signedSize(reader, nominal, options);
  if (compareLengths(first, second) < 0) {
    throw new LimitsError("LIMITS_UPSIDE_DOWN", "the upper deviation stands first and is the larger one", {
      value: reader.text,
      allowed: "upper deviation, then lower deviation",
      position: { start, end: reader.takenTo },
    });
  }
  return { kind: "deviations", nominal, upper: first, lower: second, form: "two" };
}

function limitsForm(
  reader: TokenReader,
  size: WrittenDimension,
  options: CalloutOptions,
): Bare<LimitsRequest> | null {
  if (reader.takeIf("/") === undefined) return null;
  const other = readSize(reader, { ...options, unit: size.length.unit });
  refuseOtherUnit(reader, size, other);
  // old prints put the maximum-material limit first: the larger one is the maximum
  const [max, min] = compareLengths(size.length, other.length) < 0 ? [other, size] : [size, other];
  return { kind: "limits", max, min };
}

function wordForm(
  reader: TokenReader,
  nominal: WrittenDimension,
): Bare<SingleLimitRequest> | Bare<ReferenceRequest> | Bare<BasicRequest> | null {
  const side = reader.takeIf("MAX", "MIN");
  if (side !== undefined) {
    return { kind: "single limit", size: nominal, side: side.text.toUpperCase() === "MAX" ? "max" : "min" };
  }
  if (reader.takeIf("REF") !== undefined) return { kind: "reference", nominal };
  if (reader.takeIf("BASIC", "BSC") !== undefined) return { kind: "basic", nominal };
  return null;
}

function signedSize(reader: TokenReader, nominal: WrittenDimension, options: CalloutOptions): Length {
  const sign = reader.takeIf("+", "-", "\u2212");
  const unsignedZero = sign === undefined;
  const size = readTolerance(reader, nominal, options);
  if (unsignedZero && size.ticks !== 0) throw reader.refuse("a deviation other than zero needs its sign");
  return sign === undefined || sign.text === "+" ? size : multiply(size, -1);
}

/** A tolerance stands in the unit of its size, on an inch drawing too: `25 mm ±0.02`. */
function readTolerance(reader: TokenReader, nominal: WrittenDimension, options: CalloutOptions): Length {
  const size = readSize(reader, { ...options, unit: nominal.length.unit });
  refuseOtherUnit(reader, nominal, size);
  return size.length;
}

function refuseOtherUnit(reader: TokenReader, first: WrittenDimension, second: WrittenDimension): void {
  if (first.length.unit === second.length.unit) return;
  throw new LimitsError("CALLOUT_UNIT_CONFLICT", "one callout is in two units", {
    value: reader.text,
    allowed: `all of it in ${first.length.unit}`,
  });
}

function isSign(text: string): boolean {
  return text === "+" || text === "-" || text === "\u2212";
}
