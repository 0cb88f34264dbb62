import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { SUFFIXES, makeInchClass } from "./inchClass.js";
import type { InchBasis, InchClass } from "./inchClass.js";
import { USUAL_READING, inchFitReadings } from "./inchFitReadings.js";
import type { InchFitReading } from "./inchFitReadings.js";
import { parseInchClass } from "./parseInchClass.js";

/** Options of `inchFit`. */
export interface InchFitOptions {
  /**
   * `"hole"` (as the tables have it), `"shaft"` (suffix S: the largest shaft is the basic size) or `"bilateral hole"`
   * (suffix B). What the class says unless said otherwise.
   */
  readonly basis?: InchBasis;
  /** Which published table to follow where they differ, see {@link inchFitReadings}; `"handbook"` unless said otherwise. */
  readonly reading?: InchFitReading;
}

/** The class with the basis that the options ask for; one that says otherwise itself is refused. */
export function withBasis(cls: InchClass, options: InchFitOptions | undefined): InchClass {
  const basis = ownValue(options, "basis");
  if (basis === undefined || basis === cls.basis) return cls;
  if (!SUFFIXES.has(basis)) {
    throw new LimitsError("OPTION_INVALID", "not a basis of inch fits", {
      value: basis,
      allowed: [...SUFFIXES.keys()].join(", "),
      path: ["basis"],
    });
  }
  if (cls.basis !== "hole") {
    throw new LimitsError("OPTION_INVALID", `${cls.text} and the basis asked for contradict each other`, {
      value: basis,
      allowed: `${cls.basis}, or the class without its suffix`,
      path: ["basis"],
    });
  }
  return parseInchClass(makeInchClass(cls.letters, cls.number, basis));
}

/** The reading that the options ask for. */
export function readingOf(options: InchFitOptions | undefined): InchFitReading {
  const reading = ownValue(options, "reading");
  if (reading === undefined) return USUAL_READING;
  if (!inchFitReadings().some((one) => one.name === reading)) {
    throw new LimitsError("OPTION_INVALID", "not a reading of the tables", {
      value: reading,
      allowed: inchFitReadings()
        .map((one) => one.name)
        .join(", "),
      path: ["reading"],
    });
  }
  return reading;
}
