import { LimitsError } from "../errors.js";
import type { BasisStep } from "../basis.js";
import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { keyStep } from "./keyStep.js";
import { woodruffRows, woodruffStandard } from "./metricWoodruff.js";
import type { MetricWoodruffRow, MetricWoodruffStandard, WoodruffDuty } from "./metricWoodruff.js";
import { ownValue } from "../ownValue.js";
import { oneOf } from "./oneOf.js";
import { tableMm } from "./tableLength.js";

/** What a Woodruff key is to do, and by which standard. */
export interface MetricWoodruffQuestion {
  /** The standard; it must be said. */
  readonly standard: MetricWoodruffStandard;
  /** `"torque"` where the key carries the torque, `"locating"` where it only holds the position; no default. */
  readonly duty: WoodruffDuty;
}

/** Metric Woodruff keys that go with a shaft. */
export interface MetricWoodruffKeys {
  /** Sizes b x h x D, in the order of the table. */
  readonly designations: readonly string[];
  /** Where it comes from. */
  readonly basis: readonly BasisStep[];
}

/**
 * The metric Woodruff keys that a standard allots to a shaft, by what the key is to do.
 *
 * @param shaftDiameter - diameter where the key sits, any unit
 * @param question - `standard` and `duty` (`"torque"` or `"locating"`)
 * @returns the frozen list of sizes in mm
 * @throws `KEY_SHAFT_OUT_OF_RANGE`, `OPTION_INVALID`, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { metricWoodruffKeysFor } from "limitsmith";
 *
 * metricWoodruffKeysFor("17 mm", { standard: "ISO 3912", duty: "torque" }).designations; // → ["5x6.5x16"]
 * metricWoodruffKeysFor("11 mm", { standard: "DIN 6888", duty: "torque" }).designations.length; // → 3
 * ```
 * @reference ISO 3912:1977, series 1 and 2 (from memory); DIN 6888:1956, allocation I and II (b 1 to 4 one source)
 */
export function metricWoodruffKeysFor(shaftDiameter: LengthLike, question: MetricWoodruffQuestion): MetricWoodruffKeys {
  const shaft = asLength(shaftDiameter, ["shaftDiameter"]);
  const standard = woodruffStandard(ownValue(question, "standard"));
  const duty = oneOf(ownValue(question, "duty"), DUTIES, "what the key is to do", ["duty"]);
  const rows = woodruffRows(standard);
  const ranges = rows.map((row) => row[duty]);
  const first = ranges.find((range) => range !== null)?.[0];
  const suited = rows.filter((row) => suits(row, duty, shaft.ticks, first));
  if (suited.length === 0) {
    const last = ranges.filter((range) => range !== null).at(-1)?.[1] ?? "";
    throw new LimitsError("KEY_SHAFT_OUT_OF_RANGE", `${standard} allots no Woodruff key to this shaft diameter`, {
      value: shaft.toString(),
      allowed: `from ${first ?? ""} mm up to and including ${last} mm`,
    });
  }
  return Object.freeze({
    designations: Object.freeze(suited.map((row) => `${row.width}x${row.height}x${row.diameter}`)),
    basis: Object.freeze(
      suited.map((row) =>
        keyStep(
          row.edition,
          `shafts, ${duty}`,
          `${row.width}x${row.height}x${row.diameter}: over ${row[duty]?.join(" to ") ?? ""} mm`,
          "tabulated",
          row.shaftMark,
        ),
      ),
    ),
  });
}

const DUTIES: readonly WoodruffDuty[] = ["torque", "locating"];

function suits(row: MetricWoodruffRow, duty: WoodruffDuty, ticks: number, first: string | undefined): boolean {
  const range = row[duty];
  if (range === null) return false;
  const [over, to] = range;
  const from = tableMm(over).ticks;
  // 3 mm itself belongs to the first row of ISO 3912
  const included = row.standard === "ISO 3912" && over === first;
  return (ticks > from || (included && ticks === from)) && ticks <= tableMm(to).ticks;
}
