import { LimitsError } from "../errors.js";
import { hasOwn, ownValue } from "../ownValue.js";
import { readAngle, readDimension } from "../units/index.js";
import type { AngleData, AngleLike, WrittenDimensionLike } from "../units/index.js";
import type { OtherRequestLike, PlainAngleLike, PlainSizeLike } from "./defaultValue.js";
import type { TitleBlock } from "./titleBlockValue.js";

/** What `defaultLimits` takes for a size. */
export type DefaultSizeLike =
  string | WrittenDimensionLike | AngleData | PlainSizeLike | PlainAngleLike | OtherRequestLike;

/** The mark before a size; `null` where it cannot be known. */
export type SizeMark = "diameter" | "radius" | "none" | null;

/** A size that wants a default. */
export type DefaultSize =
  | { readonly kind: "length"; readonly written: WrittenDimensionLike; readonly mark: SizeMark }
  | { readonly kind: "angle"; readonly angle: AngleLike };

/** A request whose fields are not known to be right yet. */
interface RequestFields {
  readonly kind?: unknown;
  readonly nominal?: unknown;
  readonly shape?: unknown;
  readonly angle?: unknown;
  readonly deviations?: unknown;
}

const OWN_TOLERANCE = "a size with a tolerance of its own takes no default tolerance";
const DIAMETER_MARK = /^S?[⌀Ø]\s?|\s?\bDIA\.?$/i;
const RADIUS_MARK = /^S?R\s?(?=[\d.,])/;

/** Texts that take no default, and why, tried in this order. */
const WITHOUT_DEFAULT: readonly (readonly [sign: RegExp, why: string])[] = [
  [/^\(|\bREF\.?$/i, "a reference dimension takes no default tolerance"],
  [/^\[|\b(?:BASIC|BSC)\.?$/i, "a basic dimension takes no default tolerance"],
  [/\b(?:MAX|MIN)\.?$/i, "a single limit takes no default tolerance"],
  [/\b(?:STOCK|STK)\.?$/i, "a stock size takes no default tolerance"],
  [/^(?:M|Tr|G)\s?\d|\b(?:UN[A-Z]{0,3}|NPTF?|ACME|BSP[PT]?)\b/, "a thread is governed by its own standard"],
  [/±|.\+|\d\s?[A-Z]{1,2}\d/i, OWN_TOLERANCE],
];

/** Requests of a callout that take no default, and why. */
const KINDS_WITHOUT_DEFAULT: ReadonlyMap<string, string> = new Map([
  ["reference", "a reference dimension takes no default tolerance"],
  ["basic", "a basic dimension takes no default tolerance"],
  ["single limit", "a single limit takes no default tolerance"],
  ["thread", "a thread is governed by its own standard"],
  ["chamfer", "a chamfer is a length and an angle, and each takes its own default"],
]);

/** Reads what wants a default; what takes none is refused with the reason. */
export function readDefaultSize(block: TitleBlock, size: DefaultSizeLike): DefaultSize {
  const given: unknown = size;
  if (typeof given === "string") return ofText(block, given);
  if (typeof given === "object" && given !== null) {
    if (hasOwn(given, "microarcseconds")) return { kind: "angle", angle: given as AngleData };
    // a request with deviations has a form too
    if (hasOwn(given, "kind")) return ofRequest(given);
    if (hasOwn(given, "form")) {
      return { kind: "length", written: given as WrittenDimensionLike, mark: null };
    }
  }
  throw notApplicable("a default goes by how the size was written", given, "its text, or what a reader made of it");
}

function ofText(block: TitleBlock, text: string): DefaultSize {
  const trimmed = text.trim();
  const size = trimmed.replace(DIAMETER_MARK, "");
  const diameter = size !== trimmed;
  for (const [sign, why] of WITHOUT_DEFAULT) {
    if (sign.test(size)) throw notApplicable(why, size);
  }
  const { unit, decimalMark } = block;
  if (/°|deg/i.test(size)) return { kind: "angle", angle: readAngle(size, { decimalMark }) };
  const bare = size.replace(RADIUS_MARK, "");
  const mark = diameter ? "diameter" : bare === size ? "none" : "radius";
  return { kind: "length", written: readDimension(bare, { unit, decimalMark }), mark };
}

function ofRequest(request: RequestFields): DefaultSize {
  const kind = ownValue(request, "kind");
  const nominal = ownValue(request, "nominal");
  const angle = ownValue(request, "angle");
  if (kind === "plain" && isObject(nominal)) {
    return { kind: "length", written: nominal as WrittenDimensionLike, mark: markOfShape(ownValue(request, "shape")) };
  }
  if (isObject(ownValue(request, "deviations"))) throw notApplicable(OWN_TOLERANCE, kind);
  if (kind === "angle" && isObject(angle)) return { kind: "angle", angle: angle as AngleData };
  const why =
    typeof kind === "string" && kind !== "plain" && kind !== "angle"
      ? (KINDS_WITHOUT_DEFAULT.get(kind) ?? OWN_TOLERANCE)
      : "a default goes by how the size was written";
  throw notApplicable(why, kind);
}

function markOfShape(shape: unknown): SizeMark {
  if (typeof shape !== "string") return null;
  return shape.includes("diameter") ? "diameter" : shape.includes("radius") ? "radius" : "none";
}

function isObject(value: unknown): boolean {
  return typeof value === "object" && value !== null;
}

function notApplicable(
  message: string,
  value: unknown,
  allowed: string = "sizes that stand without a tolerance of their own",
): LimitsError {
  return new LimitsError("TITLE_BLOCK_NOT_APPLICABLE", message, { value, allowed });
}
