import { LimitsError } from "../errors.js";
import { markOf } from "../basis.js";
import type { Mark } from "../basis.js";
import { limitsFromMaxMin } from "../limits/index.js";
import type { Limits } from "../limits/index.js";
import { thou } from "../units/index.js";
import { decodeWoodruffNumber } from "./decodeWoodruffNumber.js";
import { tolerancedInch } from "./tolerancedInch.js";
import { B17_2, keyStep } from "./keyStep.js";
import { tableInch } from "./tableLength.js";
import { WOODRUFF_KEY_DEVIATIONS, WOODRUFF_KEYS } from "./tables/woodruffKeys.js";
import type { WoodruffKeyRow } from "./tables/woodruffKeys.js";
import type { WoodruffKey } from "./woodruffValue.js";

/**
 * The Woodruff key of a number: width, diameter, length and both forms of height with their limits.
 *
 * @param number - a number that ANSI/ASME B17.2 lists, such as `"404"` (no unit)
 * @returns the frozen key, sizes in inches
 * @throws `WOODRUFF_NUMBER_UNKNOWN`
 * @example
 * ```ts
 * import { woodruffKey } from "limitsmith";
 *
 * const key = woodruffKey("404");
 * [key.width.max, key.width.min]; // → ["0.126 in", "0.125 in"]
 * [key.fullRadius.max, key.fullRadius.min]; // → ["0.203 in", "0.198 in"]
 * ```
 * @reference ANSI/ASME B17.2-1967, Woodruff keys; heights D min and most of keys 617-1 to 2428 from memory
 */
export function woodruffKey(number: string): WoodruffKey {
  const [no, w, b, f, cMax, cMin, dMax, dMin, e, marks] = listedRow(WOODRUFF_KEYS, number);
  const { width, diameter, length, cornerMax } = WOODRUFF_KEY_DEVIATIONS;
  // keys over 1 1/2 in diameter are remembered but for a few cells
  const marked = marks.split("").map((sign) => markOf(sign));
  const [markC = "memory", markF = "memory", markD = "memory", markE = "memory"] = marked;
  const widthLimits = tolerancedInch(`Woodruff keys, ${no}`, "width W", w, width, markC);
  const fullRadius = heightLimits(no, "C", cMax, cMin, markC);
  return Object.freeze({
    standard: B17_2,
    number: no,
    width: widthLimits,
    diameter: tolerancedInch(`Woodruff keys, ${no}`, "diameter B", b, diameter, markC),
    length: tolerancedInch(`Woodruff keys, ${no}`, "length F", f, length, markF),
    fullRadius,
    // D min is remembered in every row
    flatBottom: heightLimits(no, "D", dMax, dMin, "memory"),
    belowCentre: tableInch(e),
    cornerMax: thou(cornerMax),
    limits: Object.freeze({ width: widthLimits, height: fullRadius, taper: null }),
    basis: Object.freeze([
      keyStep(B17_2, `Woodruff keys, ${no}`, `C max ${cMax}, C min ${cMin} in, full radius`, "tabulated", markC),
      keyStep(B17_2, `Woodruff keys, ${no}`, `D max ${dMax} in, flat bottom`, "tabulated", markD),
      keyStep(B17_2, `Woodruff keys, ${no}`, `D min ${dMin} in, flat bottom`, "tabulated", "memory"),
      keyStep(B17_2, `Woodruff keys, ${no}`, `E ${e} in below the centre`, "tabulated", markE),
    ]),
  });
}

/** The row of a listed number; a number that is not listed is refused with those that share its width or diameter. */
export function listedRow<Row extends readonly [string, ...unknown[]]>(rows: readonly Row[], number: string): Row {
  const decoded = decodeWoodruffNumber(number);
  const row = rows.find(([listed]) => listed === decoded.number);
  if (row !== undefined) return row;
  const sameDiameter = WOODRUFF_KEYS.filter(([, , b]) => tableInch(b).ticks === decoded.diameter.ticks);
  throw new LimitsError("WOODRUFF_NUMBER_UNKNOWN", "ANSI/ASME B17.2 lists no key of this number", {
    value: decoded.number,
    allowed:
      sameDiameter.length === 0
        ? "keys 202 (1/16 x 1/4 in) to 2428 (3/4 x 3 1/2 in)"
        : `of this diameter: ${sameDiameter.map(([listed]) => listed).join(", ")}`,
  });
}

function heightLimits(no: string, what: "C" | "D", max: WoodruffKeyRow[4], min: string, mark: Mark): Limits {
  const says = `height ${what} max ${max}, min ${min} in`;
  return limitsFromMaxMin({
    max: tableInch(max),
    min: tableInch(min),
    basis: Object.freeze([keyStep(B17_2, `Woodruff keys, ${no}`, says, "tabulated", mark)]),
  });
}
