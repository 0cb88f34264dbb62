import { LimitsError } from "../errors.js";
import { compareLengths, lengthOfTicks } from "../units/index.js";
import type { WrittenDimension } from "../units/index.js";
import { takeLimitsMark } from "./limitsMark.js";
import { PLACES } from "./places.js";
import { refuseOtherUnit } from "./readDeviations.js";
import { SHAPES } from "./readPrefix.js";
import type { Prefix } from "./readPrefix.js";
import { isWhole, readSize } from "./readSize.js";
import type { CalloutOptions } from "./readSize.js";
import type { BareRequest, CalloutShape, DualSize, RequestBase } from "./request.js";
import type { TokenReader } from "./tokenReader.js";

/** Shapes that may stand behind a size. */
const SHAPE_WORDS_BEHIND: readonly string[] = ["DIA", "SQ", "R", "SR"];

/** What every request has but its text, with the request it belongs to. */
export interface Suffixed {
  readonly bare: BareRequest;
  readonly common: Omit<RequestBase, "text" | "parts">;
}

/** Reads what may stand behind size and tolerance, in any order, each once. */
export function readSuffix(reader: TokenReader, options: CalloutOptions, given: BareRequest, prefix: Prefix): Suffixed {
  let bare = given;
  let { count, shape } = prefix;
  let typical = false;
  let through = false;
  let depth: WrittenDimension | null = null;
  let dual: DualSize | null = null;
  for (let from = -1; from !== reader.from && !reader.done;) {
    from = reader.from;
    reader.skipLineEnd();
    if (!typical) typical = takeWord(reader, "TYP");
    if (!through) through = takeWord(reader, "THRU", "THROUGH");
    depth ??= readDepth(reader, options);
    count ??= readPlaces(reader);
    dual ??= readDual(reader, bare, options);
    if (shape === "unmarked") shape = shapeBehind(reader, bare);
    bare = markPlain(reader, bare);
  }
  if (through && depth !== null) {
    throw new LimitsError("CALLOUT_NOT_UNDERSTOOD", "a hole that goes through has no depth", {
      value: reader.text,
      allowed: "THRU, or a depth",
      position: { start: 0, end: reader.takenTo },
    });
  }
  const shown = shape === "unmarked" ? shapeTaken(reader) : shape;
  return { bare, common: { shape: shown, count, typical, through, depth, dual } };
}

function takeWord(reader: TokenReader, ...words: readonly string[]): boolean {
  return reader.part("word", () => reader.takeIf(...words)) !== undefined;
}

/** `REF` and `BASIC` turn a plain size into what they say; behind a tolerance they contradict it. */
function markPlain(reader: TokenReader, bare: BareRequest): BareRequest {
  const text = reader.peekText() ?? "";
  if (!["REF", "BASIC", "BSC"].includes(text)) return bare;
  if (bare.kind !== "plain") {
    throw reader.refuse("a reference or basic dimension has no tolerance of its own", "the word, or the tolerance");
  }
  reader.part("word", () => reader.take());
  return { kind: text === "REF" ? "reference" : "basic", nominal: bare.nominal };
}

/** A shape behind the size or its tolerance: `.500 ±.001 DIA`, `.25 R`. */
function shapeBehind(reader: TokenReader, bare: BareRequest): CalloutShape {
  if (bare.kind === "angle" || bare.kind === "chamfer" || bare.kind === "thread") return "unmarked";
  const word = reader.part("shape", () => reader.takeIf(...SHAPE_WORDS_BEHIND));
  return word === undefined ? "unmarked" : shapeOf(word.text);
}

/** The shape that stood between size and tolerance or on the second line, where the reader noted one. */
function shapeTaken(reader: TokenReader): CalloutShape {
  const part = reader.parts.find((one) => one.part === "shape");
  return part === undefined ? "unmarked" : shapeOf(reader.text.slice(part.start, part.end));
}

function shapeOf(text: string): CalloutShape {
  return (
    SHAPES.get(text.toUpperCase().replace(".", "")) ?? (/^S\s*[⌀Ø]$/i.test(text) ? "spherical diameter" : "unmarked")
  );
}

/** `↧.50`, `DEPTH .50`, `.50 DEEP`, `X .50 DEEP`. */
function readDepth(reader: TokenReader, options: CalloutOptions): WrittenDimension | null {
  const text = reader.peekText();
  if (text === "↧" || text === "DEPTH") {
    return reader.part("depth", () => {
      reader.take();
      return readSize(reader, options);
    });
  }
  return reader.try(() =>
    reader.part("depth", () => {
      reader.takeIf("X", "×");
      if (reader.peek()?.kind !== "number") return null;
      const size = readSize(reader, options);
      return reader.takeIf("DEEP", "DEPTH") === undefined ? null : size;
    }),
  );
}

/** `4 PLACES`, `4 PL`. */
function readPlaces(reader: TokenReader): number | null {
  const number = reader.peek();
  const word = reader.peekText(1);
  if (number?.kind !== "number" || !isWhole(number) || !PLACES.includes(word ?? "")) return null;
  return reader.part("count", () => {
    reader.take();
    reader.take();
    return Number(number.text);
  });
}

/** `[9.525]`, `[.9843/.9847]`: the same in the other unit system. */
function readDual(reader: TokenReader, bare: BareRequest, given: CalloutOptions): DualSize | null {
  const size = sizeOf(bare);
  if (size === null || reader.takeIf("[") === undefined) return null;
  const { unit } = size.length;
  const metric = unit === "mm" || unit === "um";
  return reader.part("other unit", () => {
    const options: CalloutOptions = { ...given, unit: metric ? "in" : "mm" };
    const first = readSize(reader, options);
    const second = takeLimitsMark(reader, first.length.unit) ? readSize(reader, options) : first;
    if (reader.takeIf("]") === undefined) throw reader.refuse("the bracket is not closed");
    const [max, min] = compareLengths(first.length, second.length) < 0 ? [second, first] : [first, second];
    refuseOtherUnit(reader, lengthOfTicks(0, metric ? "in" : "mm"), max.length);
    refuseOtherUnit(reader, max.length, min.length);
    return Object.freeze({ max, min });
  });
}

function sizeOf(bare: BareRequest): WrittenDimension | null {
  switch (bare.kind) {
    case "limits":
      return bare.max;
    case "single limit":
      return bare.size;
    case "angle":
    case "thread":
      return null;
    case "chamfer":
      return bare.length;
    default:
      return bare.nominal;
  }
}
