import { LimitsError } from "../errors.js";
import { readAngleTokens, isAngle } from "./readAngleTokens.js";
import { readChamfer, startsChamfer } from "./readChamfer.js";
import { readPrefix } from "./readPrefix.js";
import type { Prefix } from "./readPrefix.js";
import { readSize } from "./readSize.js";
import type { CalloutOptions } from "./readSize.js";
import { readSuffix } from "./readSuffix.js";
import { readThread } from "./readThread.js";
import { readAngleTolerance, readTolerance } from "./readTolerance.js";
import { readStackedDeviations } from "./readStacked.js";
import type { BareRequest, CalloutRequest } from "./request.js";
import { scan } from "./scan.js";
import { TokenReader } from "./tokenReader.js";

/**
 * Reads what a drafter wrote for one size and gives it as a typed request.
 *
 * Understood are, in inch and metric habit: counts (`2X`, `4 PLACES`); `⌀`, `DIA`, `R`, `SR`, `S⌀`, `SQ`; sizes with an
 * ISO class or fit, an inch fit class, deviations, ±, two limits or one, in one line or stacked; plain, reference and
 * basic sizes; chamfers; angles; threads; `TYP`, `THRU` and depths; limits printed behind a class, and a second unit in
 * brackets. Anything else is refused with its place, never half-read.
 *
 * @param text - the callout, up to 200 characters, in one line or several
 * @param options - `unit` of the drawing for sizes without one (mm, in …), `decimalMark`
 * @returns the frozen request, told apart by `kind`; sizes keep their unit and how many decimals were written, `parts`
 *   says where each part stood
 * @throws `CALLOUT_NOT_UNDERSTOOD` with the position, `CALLOUT_TWO_TOLERANCES`, `CALLOUT_ZERO_TOLERANCE`,
 *   `CALLOUT_UNIT_CONFLICT`, `CONTROL_CHARACTER`, `TEXT_EMPTY`, `TEXT_TOO_LONG`, `UNIT_MISSING`, `LIMITS_UPSIDE_DOWN`,
 *   `CLASS_LETTER_UNKNOWN`, `CLASS_GRADE_UNKNOWN`, and what `readDimension` and `readAngle` throw
 * @example
 * ```ts
 * import { readCallout } from "limitsmith";
 *
 * const request = readCallout("2X ⌀35 k6", { unit: "mm" });
 * request.kind; // → "class"
 * request.count; // → 2
 * request.parts.map(({ part }) => part); // → ["count", "shape", "size", "class"]
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
  const outer = readPrefix(reader);
  const enclosed = reader.takeIf("(", "[");
  const prefix = enclosed === undefined ? outer : innerPrefix(outer, readPrefix(reader));
  const bare =
    enclosed === undefined ? readBody(reader, options, prefix) : readEnclosed(reader, enclosed.text, options);
  const suffix = readSuffix(reader, options, bare, prefix);
  if (!reader.done) throw reader.refuse("this does not belong to the callout before it");
  return Object.freeze({ ...suffix.bare, ...suffix.common, text, parts: reader.parts } as CalloutRequest);
}

/** Count and shape may stand before the bracket or in it: `2X (.50)`, `(⌀.50)`. */
function innerPrefix(outer: Prefix, inner: Prefix): Prefix {
  return {
    count: inner.count ?? outer.count,
    shape: inner.shape === "unmarked" ? outer.shape : inner.shape,
  };
}

function readBody(reader: TokenReader, options: CalloutOptions, prefix: Prefix): BareRequest {
  if (prefix.shape === "unmarked") {
    const thread = readThread(reader);
    if (thread !== null) return thread;
    if (startsChamfer(reader)) return readChamfer(reader, options);
    if (isAngle(reader)) {
      const angle = reader.part("angle", () => readAngleTokens(reader, options));
      return { kind: "angle", angle, deviations: readAngleTolerance(reader, options) };
    }
  }
  const stacked = readStackedDeviations(reader, options);
  if (stacked !== null) return stacked;
  const size = reader.part("size", () => readSize(reader, options));
  return readTolerance(reader, size, options, prefix);
}

/** What stands in round brackets is for reference, what stands in square ones is basic. */
function readEnclosed(reader: TokenReader, opening: string, options: CalloutOptions): BareRequest {
  const reference = opening === "(";
  if (isAngle(reader)) throw reader.refuse("an angle for reference has no form here yet", "a size in the brackets");
  const nominal = reader.part("size", () => readSize(reader, options));
  reader.takeIf("DIA", "SQ");
  if (reader.takeIf(reference ? ")" : "]") === undefined) {
    throw reader.refuse("the bracket is not closed, or more than a size stands in it");
  }
  return { kind: reference ? "reference" : "basic", nominal };
}
