import { isWhole } from "./readSize.js";
import type { CalloutShape } from "./request.js";
import type { TokenReader } from "./tokenReader.js";

/** What stands before the size. */
export interface Prefix {
  readonly count: number | null;
  readonly shape: CalloutShape;
}

/** Shapes by their marks and words. */
export const SHAPES: ReadonlyMap<string, CalloutShape> = new Map<string, CalloutShape>([
  ["⌀", "diameter"],
  ["Ø", "diameter"],
  ["DIA", "diameter"],
  ["R", "radius"],
  ["SR", "spherical radius"],
  ["SQ", "square"],
  ["□", "square"],
]);

/** Reads the count and the shape that stand before a size. */
export function readPrefix(reader: TokenReader): Prefix {
  return { count: readCount(reader), shape: readShape(reader) };
}

/**
 * `2X` with the X touching its number is a count (ASME Y14.5); `2 X 45°` and the ISO way `2x45°` are chamfers, so a
 * number that touches the X on its other side is none; `4x⌀6` is a count, for the mark behind it.
 */
function readCount(reader: TokenReader): number | null {
  const number = reader.peek();
  const by = reader.peekText(1);
  if (number?.kind !== "number" || !isWhole(number) || (by !== "X" && by !== "×")) return null;
  const touchesNext = reader.touches(2) && reader.peek(2)?.kind === "number";
  // "2 x ⌀6": a mark behind the X makes it a count, touching or not
  const markFollows = SHAPES.has(reader.peekText(2) ?? "") || reader.peekText(2) === "S";
  if (!markFollows && (!reader.touches(1) || touchesNext)) return null;
  const count = Number(number.text);
  if (count < 1 || count > MOST_COUNT) throw reader.refuse("a count is at least one", `1 to ${MOST_COUNT}`);
  return reader.part("count", () => {
    reader.take();
    reader.take();
    return count;
  });
}

const MOST_COUNT = 9999;

/** Reads the shape that stands before a size. */
export function readShape(reader: TokenReader): CalloutShape {
  return reader.part("shape", () => {
    if (reader.peekText() === "S" && (reader.peekText(1) === "⌀" || reader.peekText(1) === "Ø")) {
      reader.take();
      reader.take();
      return "spherical diameter";
    }
    const shape = SHAPES.get(reader.peekText() ?? "");
    if (shape === undefined) return "unmarked";
    reader.take();
    return shape;
  });
}
