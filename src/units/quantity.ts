import { LimitsError } from "../errors.js";
import { atPath } from "../located.js";
import { hasOwn } from "../ownValue.js";
import { decimalText } from "./decimalText.js";
import type { DecimalLike } from "./decimalText.js";

/** A quantity as bare data, for instance after `structuredClone`. */
export interface QuantityData<Unit extends string> {
  /** The number as it was given, in `unit`; finite, at most 10¹⁵ either way. */
  readonly value: number;
  /** How the quantity was written. */
  readonly unit: Unit;
}

/**
 * A stress, torque or force: the number as it was given and its unit, frozen.
 *
 * Unlike a length it is a plain double: psi and lbf·in are no whole numbers of any metric step that a double
 * could count. What was written stays as written; turned into another unit it is right to 15 figures.
 */
export interface Quantity<Unit extends string> extends QuantityData<Unit> {
  /** The value in the given unit: the number itself in its own unit, else right to 15 figures. */
  to(unit: Unit): number;
  /** Text with its unit, such as `"250 MPa"`. */
  toString(): string;
  /** The same text: JSON holds a quantity so, and it reads back to the same number and unit. */
  toJSON(): string;
}

/** What a quantity is made from: a number, the text of a decimal, or a decimal object. */
export type QuantitySource = number | string | DecimalLike;

/** A unit of a kind: how it is written, its texts, and its size in the smallest unit of its system. */
export interface UnitRow {
  readonly symbol: string;
  readonly texts: readonly string[];
  readonly system: "metric" | "inch";
  readonly size: number;
}

/** All that one kind of quantity needs to be read, written and converted. */
export interface QuantityKind<Unit extends string> {
  readonly name: string;
  readonly units: ReadonlyMap<Unit, UnitRow>;
  /** The metric unit of size 1 in one inch unit of size 1, as a ratio. */
  readonly bridge: { readonly numerator: number; readonly denominator: number };
}

const MOST = 1e15;
const LONGEST_TEXT = 60;
const NUMBER = /^[+\-\u2212]?(?:\d+(?:\.\d*)?|\.\d+)(?:e[+-]?\d{1,3})?/i;

class QuantityValue<Unit extends string> implements Quantity<Unit> {
  readonly value: number;
  readonly unit: Unit;
  // not a field: the value is plain data, { value, unit }
  readonly #kind: QuantityKind<Unit>;

  constructor(value: number, unit: Unit, kind: QuantityKind<Unit>) {
    this.value = value;
    this.unit = unit;
    this.#kind = kind;
    Object.freeze(this);
  }

  to(unit: Unit): number {
    const from = rowOf(this.#kind, this.unit);
    const into = rowOf(this.#kind, unit);
    if (unit === this.unit) return this.value;
    if (from.system === into.system) return (this.value * from.size) / into.size;
    const { numerator, denominator } = this.#kind.bridge;
    return from.system === "inch"
      ? (this.value * from.size * numerator) / denominator / into.size
      : (this.value * from.size * denominator) / numerator / into.size;
  }

  toString(): string {
    return `${this.value} ${rowOf(this.#kind, this.unit).symbol}`;
  }

  toJSON(): string {
    return this.toString();
  }
}

/** Makes a quantity of a kind; every quantity comes into being here. */
export function makeQuantity<Unit extends string>(
  kind: QuantityKind<Unit>,
  source: QuantitySource,
  unit: Unit,
): Quantity<Unit> {
  rowOf(kind, unit);
  const value = numberOf(kind, source);
  if (!Number.isFinite(value)) {
    throw new LimitsError("NUMBER_NOT_FINITE", `a ${kind.name} must be a finite number`, { value: source });
  }
  if (Math.abs(value) > MOST) {
    throw new LimitsError("QUANTITY_OUT_OF_RANGE", `the ${kind.name} is beyond what can be meant`, {
      value: source,
      allowed: "up to 1 000 000 000 000 000 either way",
    });
  }
  // -0 would show as "0" and yet fail an identity test
  return new QuantityValue(value === 0 ? 0 : value, unit, kind);
}

/** Takes a quantity in any shape it can travel in: made here, bare data, or text with a unit. */
export function readQuantity<Unit extends string>(
  kind: QuantityKind<Unit>,
  given: unknown,
  path: readonly (string | number)[],
): Quantity<Unit> {
  return atPath(path, () => {
    if (typeof given === "string") return readText(kind, given);
    if (typeof given === "object" && given !== null && hasOwn(given, "value") && hasOwn(given, "unit")) {
      const { value, unit } = given as { readonly value: unknown; readonly unit: unknown };
      if (typeof value === "number") return makeQuantity(kind, value, unit as Unit);
    }
    throw new LimitsError("QUANTITY_INVALID", `a ${kind.name} is needed here, with its unit`, {
      value: given,
      allowed: `a ${kind.name}, its data { value, unit }, or a text with its unit: ${symbolsOf(kind)}`,
    });
  });
}

function readText<Unit extends string>(kind: QuantityKind<Unit>, given: string): Quantity<Unit> {
  if (given.length > LONGEST_TEXT) {
    throw new LimitsError("TEXT_TOO_LONG", `the text is too long to be a ${kind.name}`, {
      value: given,
      allowed: `up to ${LONGEST_TEXT} characters`,
    });
  }
  const text = given.trim();
  if (text === "") throw new LimitsError("TEXT_EMPTY", "there is no number here", { value: given });
  const number = NUMBER.exec(text)?.[0];
  if (number === undefined) {
    throw new LimitsError("NUMBER_MALFORMED", "there is no number at the start of this text", {
      value: given,
      allowed: "decimals such as 250 or .5, without digit grouping",
    });
  }
  const word = text.slice(number.length).trim();
  if (word === "") {
    throw new LimitsError("UNIT_MISSING", `a number without a unit is not a ${kind.name}`, {
      value: given,
      allowed: symbolsOf(kind),
    });
  }
  if (/^[\d,./]/.test(word)) {
    throw new LimitsError("NUMBER_MALFORMED", "this number is not understood", {
      value: given,
      allowed: "decimals such as 250 or .5, without digit grouping",
    });
  }
  for (const [unit, row] of kind.units) {
    if (row.symbol === word || row.texts.includes(word)) return makeQuantity(kind, number, unit);
  }
  throw new LimitsError("UNIT_UNKNOWN", `not a unit of ${kind.name} that is known here`, {
    value: word,
    allowed: symbolsOf(kind),
  });
}

function numberOf<Unit extends string>(kind: QuantityKind<Unit>, source: QuantitySource): number {
  if (typeof source === "number") return source;
  const given: unknown = source;
  const text = typeof given === "string" ? given.trim() : decimalText(given, kind.name);
  if (typeof given === "object" && (text === "NaN" || text.endsWith("Infinity"))) return NaN;
  if (text.length <= LONGEST_TEXT && NUMBER.exec(text)?.[0] === text) return Number(text.replace("\u2212", "-"));
  throw new LimitsError("NUMBER_MALFORMED", `a ${kind.name} is made from a number, a decimal text or a decimal`, {
    value: given,
    allowed: "decimals such as 250 or .5, without digit grouping",
  });
}

function rowOf<Unit extends string>(kind: QuantityKind<Unit>, unit: Unit): UnitRow {
  const row = kind.units.get(unit);
  if (row === undefined) {
    throw new LimitsError("UNIT_UNKNOWN", `not a unit of ${kind.name}`, {
      value: unit,
      allowed: [...kind.units.keys()].join(", "),
    });
  }
  return row;
}

function symbolsOf<Unit extends string>(kind: QuantityKind<Unit>): string {
  return [...kind.units.values()].map(({ symbol }) => symbol).join(", ");
}
