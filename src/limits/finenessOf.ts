import type { BasisStep } from "../basis.js";
import { LimitsError } from "../errors.js";
import { inch, mm } from "../units/index.js";
import type { Length } from "../units/index.js";
import { INCH_TO_MM_FINENESS } from "./tables/conversionFineness.js";

/** Fineness of rounding, as decimals of the new unit, and whose rule gave it. */
export interface Fineness {
  readonly places: number;
  readonly step: BasisStep;
}

const TABLE_END: Length = inch(1);
const COARSEST_PLACES = 0;
const FINEST_INCH_PLACES = 6;

/** Decimals that a converted limit keeps, from the original total tolerance. */
export function finenessOf(tolerance: Length, unit: "mm" | "in"): Fineness {
  return unit === "mm" ? inchToMm(tolerance) : mmToInch(tolerance);
}

function inchToMm(tolerance: Length): Fineness {
  const row = [...INCH_TO_MM_FINENESS].reverse().find(({ atLeastInch }) => tolerance.ticks >= inch(atLeastInch).ticks);
  if (row === undefined || tolerance.ticks >= TABLE_END.ticks) {
    throw noFineness(tolerance, "a total tolerance from .00001 in to less than 1 in");
  }
  return {
    places: row.millimetrePlaces,
    step: Object.freeze({
      standard: "ISO 370:1975",
      place: "table of fineness, inches to millimetres",
      says: `total tolerance ${tolerance.toString()}, at least ${row.atLeastInch} in: ${row.millimetrePlaces} decimals of mm`,
      how: "tabulated" as const,
      mark: "memory" as const,
    }),
  };
}

/** The coarsest power of ten r with r/2 within 2 per cent of the tolerance: r <= 0.04 T. */
function mmToInch(tolerance: Length): Fineness {
  for (let places = COARSEST_PLACES; places <= FINEST_INCH_PLACES; places++) {
    if (inch(1).ticks / 10 ** places <= 0.04 * tolerance.ticks) {
      return {
        places,
        step: Object.freeze({
          standard: "ISO 370:1975",
          place: "bound of 2 per cent; the printed table from millimetres to inches could not be confirmed",
          says: `total tolerance ${tolerance.toString()}: ${places} decimals of in move no limit by more than 2 % of it`,
          how: "derived" as const,
        }),
      };
    }
  }
  throw noFineness(tolerance, `a total tolerance from ${mm("0.000635").toString()}`);
}

function noFineness(tolerance: Length, allowed: string): LimitsError {
  return new LimitsError("CONVERSION_NO_FINENESS", "the rule has no fineness for this total tolerance", {
    value: tolerance.toString(),
    allowed: `${allowed}; else say the places`,
  });
}
