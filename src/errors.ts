import { ownValue } from "./ownValue.js";

/**
 * Every code a {@link LimitsError} can carry. A code never changes its meaning; messages may.
 * The table in docs/errors.md says what each one means, and a test holds the two together.
 */
export type ErrorCode =
  // text and numbers
  | "TEXT_EMPTY"
  | "TEXT_TOO_LONG"
  | "NUMBER_NOT_FINITE"
  | "NUMBER_MALFORMED"
  | "DECIMAL_MARK_MIXED"
  | "FRACTION_NOT_INCH"
  | "FRACTION_ZERO_DENOMINATOR"
  | "OPTION_INVALID"
  // lengths and angles
  | "UNIT_MISSING"
  | "UNIT_UNKNOWN"
  | "UNIT_AMBIGUOUS"
  | "LENGTH_INVALID"
  | "LENGTH_TOO_FINE"
  | "LENGTH_OUT_OF_RANGE"
  | "LENGTH_NOT_EXACT"
  | "ANGLE_INVALID"
  | "ANGLE_TOO_FINE"
  | "ANGLE_OUT_OF_RANGE"
  // limits and fits
  | "LIMITS_INVALID"
  | "LIMITS_UPSIDE_DOWN"
  | "LIMITS_CONTRADICT"
  | "LIMITS_NOT_SYMMETRIC"
  | "LIMITS_NO_DESIGNATION"
  | "ROUNDING_COLLAPSES"
  | "NOMINALS_DIFFER"
  // ISO 286
  | "CLASS_MALFORMED"
  | "CLASS_LETTER_UNKNOWN"
  | "CLASS_GRADE_UNKNOWN"
  | "FIT_MALFORMED"
  | "FIT_NOT_HOLE_AND_SHAFT"
  | "ISO_SIZE_OUT_OF_RANGE"
  | "ISO_GRADE_NOT_DEFINED"
  | "ISO_DEVIATION_NOT_DEFINED"
  | "ISO_CLASS_NOT_DEFINED"
  // title block, callout, sheet
  | "TITLE_BLOCK_INVALID"
  | "TITLE_BLOCK_NO_LINE"
  | "TITLE_BLOCK_NOT_APPLICABLE"
  | "TITLE_BLOCK_MISSING"
  | "CALLOUT_NOT_UNDERSTOOD"
  | "CALLOUT_UNIT_CONFLICT"
  | "CALLOUT_KIND_MISMATCH"
  | "SHEET_INVALID"
  | "FEATURE_INVALID"
  | "FEATURE_ID_REPEATED"
  | "MATE_UNKNOWN"
  | "MATE_KIND_INVALID"
  | "MATE_UNRESOLVED";

/** Where in a text something stood: character offsets, `end` excluded. */
export interface TextSpan {
  readonly start: number;
  readonly end: number;
}

/** An error as plain data: survives JSON, `structuredClone` and a worker. */
export interface LimitsProblem {
  readonly code: ErrorCode;
  readonly message: string;
  /** The offending value as text, shortened when it is very long; `null` where there is none. */
  readonly value: string | null;
  /** What is allowed or defined instead. */
  readonly allowed: string | null;
  /** Keys that lead to the value inside the caller's data; empty at the top. */
  readonly path: readonly (string | number)[];
  readonly position: TextSpan | null;
}

/** What may be said about an error besides its code and message. */
export interface LimitsErrorDetails {
  readonly value?: unknown;
  readonly allowed?: string;
  readonly path?: readonly (string | number)[];
  readonly position?: TextSpan;
}

const LONGEST_SHOWN_VALUE = 80;

function showValue(value: unknown): string | null {
  if (value === undefined) return null;
  let text: string;
  if (typeof value === "string") text = value;
  else if (typeof value === "number" || typeof value === "bigint" || typeof value === "boolean") text = `${value}`;
  else if (value === null) text = "null";
  else text = typeof value === "object" ? (Array.isArray(value) ? "an array" : "an object") : `a ${typeof value}`;
  return text.length > LONGEST_SHOWN_VALUE ? `${text.slice(0, LONGEST_SHOWN_VALUE)}…` : text;
}

/**
 * The one error type that this library throws for bad input.
 *
 * Recognise it by `code` (or by `name === "LimitsError"`), not by `instanceof`: two copies of the
 * package may meet in one program.
 */
export class LimitsError extends Error {
  readonly code: ErrorCode;
  readonly value: string | null;
  readonly allowed: string | null;
  readonly path: readonly (string | number)[];
  readonly position: TextSpan | null;

  constructor(code: ErrorCode, message: string, details: LimitsErrorDetails = {}) {
    super(message);
    this.name = "LimitsError";
    this.code = code;
    this.value = showValue(ownValue(details, "value"));
    this.allowed = ownValue(details, "allowed") ?? null;
    this.path = Object.freeze([...(ownValue(details, "path") ?? [])]);
    const position = ownValue(details, "position");
    this.position = position === undefined ? null : Object.freeze({ start: position.start, end: position.end });
  }

  /** The same error as plain frozen data. */
  toJSON(): LimitsProblem {
    return Object.freeze({
      code: this.code,
      message: this.message,
      value: this.value,
      allowed: this.allowed,
      path: this.path,
      position: this.position,
    });
  }
}

/** What {@link attempt} gives: the value, or the error as plain data. */
export type Attempt<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly error: LimitsProblem };

function isLimitsError(error: unknown): error is LimitsError {
  return error instanceof Error && error.name === "LimitsError" && typeof (error as LimitsError).toJSON === "function";
}

/**
 * Calls a function and gives its result, or the {@link LimitsError} that it threw, as plain data.
 *
 * Errors of any other kind are bugs and are thrown on.
 *
 * @param task - the call to make
 * @returns `{ ok: true, value }` or `{ ok: false, error }`; both survive `structuredClone`
 * @throws nothing of its own; errors that are not a `LimitsError` pass through
 * @example
 * ```ts
 * import { attempt, readLength } from "limitsmith";
 *
 * const read = attempt(() => readLength("5 mil"));
 * read.ok; // → false
 * read.ok ? "" : read.error.code; // → "UNIT_AMBIGUOUS"
 * ```
 * @reference none: a convenience of this library
 */
export function attempt<T>(task: () => T): Attempt<T> {
  try {
    return Object.freeze({ ok: true, value: task() });
  } catch (error) {
    if (isLimitsError(error)) return Object.freeze({ ok: false, error: error.toJSON() });
    throw error;
  }
}
