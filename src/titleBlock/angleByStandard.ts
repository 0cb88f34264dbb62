import type { BasisStep } from "../basis.js";
import { LimitsError } from "../errors.js";
import { angleLimits } from "../limits/index.js";
import { angleOfMicroarcseconds } from "../units/index.js";
import type { AngleLike, Length } from "../units/index.js";
import type { DefaultAngleLimits } from "./defaultValue.js";
import { NOT_A_REJECT, cautionsFor } from "./generalCautions.js";
import type { GeneralTolerance } from "./generalToleranceValue.js";
import { cellAt, cellStep } from "./rangeTable.js";
import type { RangeCell } from "./rangeTable.js";
import { ISO_13920_ANGULAR } from "./tables/iso13920Angular.js";
import { ISO_2768_ANGULAR } from "./tables/iso2768Angular.js";

const MICROARCSECONDS_PER_MINUTE = 60_000_000;

/** Gives an angle the general tolerance of a standard; `first` is the step that says who called it. */
export function angleByStandard(
  nominal: AngleLike,
  called: GeneralTolerance,
  shorterLeg: Length,
  first: BasisStep,
): DefaultAngleLimits {
  const { cell, cls, standard } = angleCell(called, shorterLeg);
  const deviation = angleOfMicroarcseconds(cell.value * MICROARCSECONDS_PER_MINUTE, "dms");
  const basis = [first, cellStep(standard, cell, `class ${cls}: ±${deviation.toString()}`)];
  return Object.freeze({
    kind: "angle" as const,
    limits: angleLimits({
      nominal,
      upper: deviation,
      lower: angleOfMicroarcseconds(-deviation.microarcseconds, "dms"),
      basis,
    }),
    line: `${called.text}: ±${deviation.toString()}`,
    cautions: cautionsFor(basis, called.standard === "ISO 2768" ? [NOT_A_REJECT] : []),
  });
}

/** True where an indication has a class for angles. */
export function callsAngles(called: GeneralTolerance): boolean {
  return called.standard === "ISO 13920" || (called.standard === "ISO 2768" && called.linear !== null);
}

function angleCell(
  called: GeneralTolerance,
  shorterLeg: Length,
): { readonly cell: RangeCell; readonly cls: string; readonly standard: string } {
  if (called.standard === "ISO 13920") {
    const cls = called.linear;
    const cell = cellAt(ISO_13920_ANGULAR, cls, `class ${cls}`, shorterLeg);
    return { cell, cls, standard: called.edition === "1996" ? "ISO 13920:1996" : ISO_13920_ANGULAR.standard };
  }
  if (called.standard === "ISO 2768" && called.linear !== null) {
    const cls = called.linear;
    const cell = cellAt(ISO_2768_ANGULAR, cls, `class ${cls}`, shorterLeg);
    return { cell, cls, standard: ISO_2768_ANGULAR.standard };
  }
  throw new LimitsError("GENERAL_TOLERANCE_NOT_CALLED", "the indication has no class for angles", {
    value: called.text,
    allowed: "ISO 2768 with f, m, c or v; ISO 13920 with A to D; castings have none",
  });
}
