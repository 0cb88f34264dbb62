import type { Basis } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { compareLengths, lengthOfTicks, multiply, readDimension } from "../units/index.js";
import type { DecimalMark, Length, LengthUnit } from "../units/index.js";
import type { EdgeIndication, EdgeSide, EdgeState } from "./edgeValue.js";
import { BURR_OR_PASSING_UM, SHARP_UM, UNDERCUT_UM } from "./tables/edgeSizes.js";

/** Options of {@link readEdge}. */
export interface EdgeOptions {
  /** Whether the edge is an external or an internal one. */
  readonly side: EdgeSide;
  /** Unit of numbers that stand without one; mm unless said otherwise. */
  readonly unit?: LengthUnit;
  /** `"."` unless said otherwise. */
  readonly decimalMark?: DecimalMark;
}

/** The limits of an edge; `null` where its size is left open. */
interface EdgeLimits {
  readonly upper: Length | null;
  readonly lower: Length | null;
}

const LONGEST_EDGE = 40;
const TICKS_PER_UM = 10_000;
// read between -0.05 and +0.05 mm as sharp
const SHARP_TICKS = 50 * TICKS_PER_UM;
const SERIES: ReadonlySet<number> = new Set([...BURR_OR_PASSING_UM, ...SHARP_UM, ...UNDERCUT_UM]);
const BASIS: Basis = Object.freeze([
  Object.freeze({
    standard: "ISO 13715:2017",
    place: "signs and sizes of edges",
    says: "plus: material may stand proud; minus: material must be missing; a single value runs from zero",
    how: "derived" as const,
    mark: "one-source" as const,
  }),
]);

/**
 * Reads the value of an edge indication in the manner of ISO 13715.
 *
 * The value is a limit that must not be passed; shape and direction stay open. Without any indication an edge stays
 * as the process leaves it.
 *
 * @param text - `-0.3`, `+0.3`, `±0.05`, two values such as `-0.1/-0.5` (the upper one first), or a sign alone, `+` or
 *   `-`, which leaves the size open; up to 40 characters
 * @param options - `side` of the edge; `unit` of bare numbers (mm unless said otherwise), `decimalMark`
 * @returns the frozen indication: limits in the unit of the text, and the state that they allow
 * @throws `TITLE_BLOCK_EDGE_INVALID`, `LIMITS_UPSIDE_DOWN`, `OPTION_INVALID`, and what {@link readDimension} throws
 * @example
 * ```ts
 * import { readEdge } from "limitsmith";
 *
 * const edge = readEdge("-0.3", { side: "external" });
 * edge.state; // → "undercut"
 * [edge.upper, edge.lower].join(" to "); // → "0 mm to -0.3 mm"
 * readEdge("0.3", { side: "external" }); // throws TITLE_BLOCK_EDGE_INVALID
 * ```
 * @reference ISO 13715:2000 and 2017: signs as reprinted, the series of sizes and the band of sharp edges as in
 *   textbooks
 */
export function readEdge(text: string, options: EdgeOptions): EdgeIndication {
  const side: unknown = ownValue(options, "side");
  if (side !== "external" && side !== "internal") {
    throw new LimitsError("OPTION_INVALID", "an edge is an external or an internal one", {
      value: side,
      allowed: "external, internal",
      path: ["side"],
    });
  }
  const given: unknown = text;
  if (typeof given !== "string" || given.length > LONGEST_EDGE) throw notAnEdge(given);
  const edge = limitsOf(given, options);
  return Object.freeze({
    side,
    text: given,
    state: stateOf(edge, side),
    upper: edge.upper,
    lower: edge.lower,
    recommended: isRecommended(edge.upper) && isRecommended(edge.lower),
    basis: BASIS,
  });
}

function limitsOf(text: string, options: EdgeOptions): EdgeLimits {
  const plain = text
    .trim()
    .replace(/\u2212/g, "-")
    .replace("+/-", "±");
  const zero = lengthOfTicks(0, ownValue(options, "unit") ?? "mm");
  if (plain === "+") return { upper: null, lower: zero };
  if (plain === "-") return { upper: zero, lower: null };
  if (plain.startsWith("±")) {
    const size = sizeOf(plain.slice(1), text, options);
    return { upper: size, lower: multiply(size, -1) };
  }
  const [first = "", second, ...more] = plain.split("/");
  if (more.length > 0) throw notAnEdge(text);
  const value = signed(first, text, options);
  if (second !== undefined) return twoValues(value, signed(second, text, options), text);
  if (value.ticks === 0) throw notAnEdge(text);
  return value.ticks > 0 ? { upper: value, lower: zero } : { upper: zero, lower: value };
}

function twoValues(upper: Length, lower: Length, text: string): EdgeLimits {
  if (compareLengths(upper, lower) > 0) return { upper, lower };
  throw new LimitsError("LIMITS_UPSIDE_DOWN", "the upper limit of an edge stands first", {
    value: text,
    allowed: "the larger value, then the smaller one, such as -0.1/-0.5",
  });
}

function signed(part: string, text: string, options: EdgeOptions): Length {
  const plain = part.trim();
  if (plain === "0") return lengthOfTicks(0, ownValue(options, "unit") ?? "mm");
  const sign = plain[0];
  if (sign !== "+" && sign !== "-") throw notAnEdge(text);
  return multiply(sizeOf(plain.slice(1), text, options), sign === "-" ? -1 : 1);
}

function sizeOf(number: string, text: string, options: EdgeOptions): Length {
  const plain = number.trim();
  if (!/^[\d.,]/.test(plain)) throw notAnEdge(text);
  const { length } = readDimension(plain, {
    unit: ownValue(options, "unit") ?? "mm",
    decimalMark: ownValue(options, "decimalMark") ?? ".",
  });
  if (length.ticks === 0) throw notAnEdge(text);
  return length;
}

function stateOf({ upper, lower }: EdgeLimits, side: EdgeSide): EdgeState {
  const proud = side === "external" ? ("burr" as const) : ("passing" as const);
  const high = upper?.ticks ?? Infinity;
  const low = lower?.ticks ?? -Infinity;
  if (high <= SHARP_TICKS && low >= -SHARP_TICKS) return "sharp";
  if (low >= 0) return proud;
  return high <= 0 ? "undercut" : `${proud} or undercut`;
}

function isRecommended(limit: Length | null): boolean {
  return limit === null || limit.ticks === 0 || SERIES.has(limit.ticks / TICKS_PER_UM);
}

function notAnEdge(value: unknown): LimitsError {
  return new LimitsError("TITLE_BLOCK_EDGE_INVALID", "this is not the value of an edge", {
    value,
    allowed: "a sign and a size such as -0.3, +0.3 or ±0.05, two values such as -0.1/-0.5, or + or - alone",
  });
}
