import { LimitsError } from "../errors.js";
import { markOf } from "../basis.js";
import type { Mark } from "../basis.js";
import { ownValue } from "../ownValue.js";
import type { Length } from "../units/index.js";
import type { InchKeyKind, KeySectionLike, KeyShape } from "./keyValue.js";
import { oneOf } from "./oneOf.js";
import { positiveLength } from "./positiveLength.js";
import { tableInch } from "./tableLength.js";
import { INCH_KEY_SIZES } from "./tables/inchKeySizes.js";

/** Which key of ANSI/ASME B17.1 is meant. */
export interface InchKeyChoice {
  /** The shape that the standard prefers for the shaft unless said otherwise. */
  readonly shape?: KeyShape;
  /** `"parallel"` unless said otherwise. */
  readonly kind?: InchKeyKind;
  /** A key of your own in place of the listed one; it is computed and marked as not standard. */
  readonly key?: KeySectionLike;
}

/** A choice with everything decided. */
export interface ChosenInchKey {
  readonly shape: KeyShape;
  readonly kind: InchKeyKind;
  readonly width: Length;
  readonly height: Length;
  readonly standardForShaft: boolean;
  readonly preferredShape: KeyShape;
  /** Row of the table in words, such as `shaft over 9/16 up to and including 7/8 in`. */
  readonly row: string;
  /** What the row lists. */
  readonly listed: string;
  /** Mark of the listed section; `null` for a key that is not listed. */
  readonly mark: Mark | null;
}

/** Reads the choice of key for a shaft of a size that the table covers. */
export function chooseInchKey(shaft: Length, options: InchKeyChoice | undefined): ChosenInchKey {
  const row = INCH_KEY_SIZES.find(([over, to]) => shaft.ticks > ticks(over) && shaft.ticks <= ticks(to));
  if (row === undefined) {
    throw new LimitsError("KEY_SHAFT_OUT_OF_RANGE", "ANSI/ASME B17.1 lists no key for this shaft diameter", {
      value: shaft.toString(),
      allowed: "over 5/16 in up to and including 30 in",
    });
  }
  const [over, to, width, square, rectangular, preferredShape, marks] = row;
  const kind = oneOf(ownValue(options, "kind") ?? "parallel", KINDS, "a kind of key", ["kind"]);
  const asked = ownValue(options, "shape");
  const wanted = asked === undefined ? undefined : oneOf(asked, SHAPES, "a shape of key", ["shape"]);
  const text = {
    row: `shaft over ${over} up to and including ${to} in`,
    listed: [square, rectangular].flatMap((height) => (height === null ? [] : [`${width} x ${height}`])).join(" or "),
  };
  const own = ownValue(options, "key");
  if (own !== undefined) {
    const section = sectionOf(own, wanted);
    const height = section.shape === "square" ? square : rectangular;
    const standardForShaft =
      height !== null && section.width.ticks === ticks(width) && section.height.ticks === ticks(height);
    const mark = standardForShaft ? markOfShape(marks, section.shape) : null;
    return { ...section, kind, standardForShaft, preferredShape, mark, ...text };
  }
  const shape = wanted ?? preferredShape;
  const height = shape === "square" ? square : rectangular;
  if (height === null) {
    throw new LimitsError("KEY_SIZE_NOT_DEFINED", `ANSI/ASME B17.1 lists no ${shape} key for this shaft diameter`, {
      value: shaft.toString(),
      allowed: `${preferredShape} ${text.listed}`,
      path: ["shape"],
    });
  }
  return {
    shape,
    kind,
    width: tableInch(width),
    height: tableInch(height),
    standardForShaft: true,
    preferredShape,
    mark: markOfShape(marks, shape),
    ...text,
  };
}

const KINDS: readonly InchKeyKind[] = ["parallel", "taper", "gib-head"];
const SHAPES: readonly KeyShape[] = ["square", "rectangular"];

function sectionOf(
  own: KeySectionLike,
  wanted: KeyShape | undefined,
): { readonly shape: KeyShape; readonly width: Length; readonly height: Length } {
  const width = positiveLength(ownValue(own, "width"), "the width of the key", ["key", "width"]);
  const height = positiveLength(ownValue(own, "height"), "the height of the key", ["key", "height"]);
  const shape = width.ticks === height.ticks ? "square" : "rectangular";
  if (height.ticks > width.ticks || (wanted !== undefined && wanted !== shape)) {
    throw new LimitsError("KEY_SIZE_NOT_DEFINED", "the section is not of that shape", {
      value: `${width.toString()} wide, ${height.toString()} high`,
      allowed: "square: height equal to width; rectangular: height less than width",
      path: ["key"],
    });
  }
  return { shape, width, height };
}

/** The mark of the less sure one of width and height. */
function markOfShape(marks: string, shape: KeyShape): Mark {
  const width = marks[0] ?? "";
  const height = marks[shape === "square" ? 1 : 2] ?? "";
  return markOf(ORDER.indexOf(width) > ORDER.indexOf(height) ? width : height);
}

const ORDER = "21m";

function ticks(text: string): number {
  return tableInch(text).ticks;
}
