import { LimitsError } from "../errors.js";

/** A decimal object of any decimal library: known by how it writes itself, not by its class. */
export interface DecimalLike {
  /** The number in plain notation, with all its figures. */
  toFixed(): string;
}

/** A decimal object as text; a boxed number has a `toFixed` too, but one that drops its decimals. */
export function decimalText(value: unknown, name = "length"): string {
  const text: unknown =
    typeof value === "object" && value !== null && !(value instanceof Number) && isDecimalLike(value)
      ? value.toFixed()
      : undefined;
  if (typeof text === "string") return text;
  throw new LimitsError("NUMBER_MALFORMED", `a ${name} is made from a number, a text or a decimal`, {
    value,
    allowed: "a finite number, a text such as 40.025, or a decimal object",
  });
}

function isDecimalLike(value: object): value is DecimalLike {
  return "toFixed" in value && typeof value.toFixed === "function";
}
