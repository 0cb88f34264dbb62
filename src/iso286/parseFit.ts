import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { parsedClass } from "./parseToleranceClass.js";
import type { ToleranceClassLike } from "./parseToleranceClass.js";
import type { ParsedClass } from "./parsedClass.js";

/** Hole class and shaft class given apart. */
export interface FitClasses {
  /** Such as `"H7"`. */
  readonly hole: ToleranceClassLike;
  /** Such as `"m6"`. */
  readonly shaft: ToleranceClassLike;
}

/** What functions take for a fit: its text such as `"H7/m6"` or `"H7-m6"`, or the two classes. */
export type FitClassesLike = string | FitClasses;

/** Both classes of a fit, taken apart. */
export interface ParsedFit {
  readonly hole: ParsedClass;
  readonly shaft: ParsedClass;
}

const LONGEST_FIT = 80;

/** Takes a fit apart; two holes or two shafts are refused. */
export function parseFit(fit: FitClassesLike): ParsedFit {
  const { hole, shaft } = typeof fit === "string" ? splitFit(fit) : givenApart(fit);
  const first = parsedClass(hole);
  const second = parsedClass(shaft);
  if (first.kind !== "hole" || second.kind !== "shaft") {
    throw new LimitsError("FIT_NOT_HOLE_AND_SHAFT", "a fit is a hole class and a shaft class, in this order", {
      value: `${first.text}/${second.text}`,
      allowed: "a capital letter for the hole, then a small one for the shaft, such as H7/m6",
    });
  }
  return { hole: first, shaft: second };
}

function splitFit(text: string): FitClasses {
  if (text.length > LONGEST_FIT) throw malformed(text);
  let mark = text.indexOf("/");
  if (mark < 0) mark = text.indexOf("-");
  if (mark < 0) throw malformed(text);
  return { hole: text.slice(0, mark), shaft: text.slice(mark + 1) };
}

function givenApart(fit: FitClasses): FitClasses {
  const given: unknown = fit;
  const hole = typeof given === "object" && given !== null ? ownValue(fit, "hole") : undefined;
  const shaft = typeof given === "object" && given !== null ? ownValue(fit, "shaft") : undefined;
  if (hole === undefined || shaft === undefined) throw malformed(given);
  return { hole, shaft };
}

function malformed(value: unknown): LimitsError {
  return new LimitsError("FIT_MALFORMED", "this is not a fit", {
    value,
    allowed: "a hole class and a shaft class: H7/m6, H7-m6, or { hole, shaft }",
  });
}
