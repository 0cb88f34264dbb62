import { ownValue } from "./ownValue.js";

/**
 * Every code a {@link LimitsError} can carry. A code never changes its meaning; messages may.
 * The table in docs/errors.md says what each one means, and a test holds the two together.
 */
export type ErrorCode =
  // text and numbers
  | "TEXT_EMPTY"
  | "TEXT_TOO_LONG"
  | "CONTROL_CHARACTER"
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
  // stress, torque, force
  | "QUANTITY_INVALID"
  | "QUANTITY_OUT_OF_RANGE"
  // limits and fits
  | "LIMITS_INVALID"
  | "LIMITS_UPSIDE_DOWN"
  | "LIMITS_CONTRADICT"
  | "LIMITS_NOT_SYMMETRIC"
  | "LIMITS_NO_DESIGNATION"
  | "ROUNDING_COLLAPSES"
  | "NOMINALS_DIFFER"
  | "CONVERSION_NO_FINENESS"
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
  // inch fits
  | "INCH_CLASS_MALFORMED"
  | "INCH_CLASS_UNKNOWN"
  | "INCH_SIZE_OUT_OF_RANGE"
  | "INCH_ROW_NOT_DEFINED"
  | "INCH_ROW_MISSING"
  | "INCH_GRADE_UNKNOWN"
  | "INCH_SERIES_OUT_OF_RANGE"
  // keys
  | "KEY_SHAFT_OUT_OF_RANGE"
  | "KEY_SIZE_NOT_DEFINED"
  | "KEY_CLASS_NOT_DEFINED"
  | "KEY_WIDER_THAN_SHAFT"
  | "KEYSEAT_DEPTH_IMPOSSIBLE"
  | "KEY_LENGTH_INVALID"
  | "WOODRUFF_NUMBER_UNKNOWN"
  | "KEYED_JOINT_INVALID"
  | "KEY_LOAD_INVALID"
  | "GAUGE_PIN_INVALID"
  // surface finish
  | "ROUGHNESS_INVALID"
  | "ROUGHNESS_PARAMETER_UNKNOWN"
  | "ROUGHNESS_GRADE_UNKNOWN"
  | "PROCESS_UNKNOWN"
  | "FINISH_FUNCTION_UNKNOWN"
  | "FINISH_NOT_TABULATED"
  | "FINISH_GEOMETRY_INVALID"
  // title block, callout, sheet
  | "TITLE_BLOCK_INVALID"
  | "TITLE_BLOCK_NO_LINE"
  | "TITLE_BLOCK_NOT_APPLICABLE"
  | "TITLE_BLOCK_MISSING"
  | "TITLE_BLOCK_OPTION_NEEDED"
  | "TITLE_BLOCK_EDGE_INVALID"
  | "GENERAL_TOLERANCE_UNKNOWN"
  | "GENERAL_TOLERANCE_NO_TABLE"
  | "GENERAL_TOLERANCE_NOT_CALLED"
  | "GENERAL_TOLERANCE_NOT_DEFINED"
  | "GENERAL_TOLERANCE_OUT_OF_RANGE"
  | "CALLOUT_NOT_UNDERSTOOD"
  | "CALLOUT_UNIT_CONFLICT"
  | "CALLOUT_TWO_TOLERANCES"
  | "CALLOUT_ZERO_TOLERANCE"
  | "CALLOUT_KIND_MISMATCH"
  | "SHEET_INVALID"
  | "FEATURE_INVALID"
  | "FEATURE_ID_REPEATED"
  | "MATE_UNKNOWN"
  | "MATE_KIND_INVALID"
  | "MATE_UNRESOLVED"
  | "KEYSEAT_ON_UNKNOWN"
  | "READING_NOT_JUDGED";

/** Where in a text something stood: character offsets, `end` excluded. */
export interface TextSpan {
  /** Offset of the first character. */
  readonly start: number;
  /** Offset behind the last character. */
  readonly end: number;
}

/** An error as plain data: survives JSON, `structuredClone` and a worker. */
export interface LimitsProblem {
  /** Stable code; its meaning never changes. */
  readonly code: ErrorCode;
  /** One line for a person; may change. */
  readonly message: string;
  /** The offending value as text, shortened when it is very long; `null` where there is none. */
  readonly value: string | null;
  /** What is allowed or defined instead. */
  readonly allowed: string | null;
  /** Keys that lead to the value inside the caller's data; empty at the top. */
  readonly path: readonly (string | number)[];
  /** Where in the text it stood; `null` where that is not known. */
  readonly position: TextSpan | null;
}

/** What may be said about an error besides its code and message. */
export interface LimitsErrorDetails {
  /** The offending value, of any kind; shown as text. */
  readonly value?: unknown;
  /** What is allowed or defined instead. */
  readonly allowed?: string;
  /** Keys that lead to the value inside the caller's data. */
  readonly path?: readonly (string | number)[];
  /** Where in the text it stood. */
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
  /** Stable code; its meaning never changes. */
  readonly code: ErrorCode;
  /** The offending value as text, shortened when it is very long; `null` where there is none. */
  readonly value: string | null;
  /** What is allowed or defined instead; `null` where that goes without saying. */
  readonly allowed: string | null;
  /** Keys that lead to the value inside the caller's data; empty at the top. */
  readonly path: readonly (string | number)[];
  /** Where in the text it stood; `null` where that is not known. */
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
  { readonly ok: true; readonly value: T } | { readonly ok: false; readonly error: LimitsProblem };

/** By name, not by `instanceof`: the error may come from another copy of the package. */
function isLimitsError(error: unknown): error is Pick<LimitsError, "toJSON"> {
  return error instanceof Error && error.name === "LimitsError" && "toJSON" in error;
}

/**
 * Calls a function and gives its result, or the {@link LimitsError} that it threw, as plain data.
 *
 * Errors of any other kind are bugs and are thrown on.
 *
 * @param task - the call to make
 * @returns `{ ok: true, value }` with the value in its own unit, or `{ ok: false, error }`; both survive
 *   `structuredClone` where the value does
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
