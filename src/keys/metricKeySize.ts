import { LimitsError } from "../errors.js";
import type { BasisStep } from "../basis.js";
import { ownValue } from "../ownValue.js";
import type { Length } from "../units/index.js";
import { keyStep } from "./keyStep.js";
import type { KeySectionLike } from "./keyValue.js";
import { METRIC_FAMILIES, bracketedRows } from "./metricFamily.js";
import type { MetricFamily, MetricRow } from "./metricFamily.js";
import type { MetricKeyStandard } from "./metricValue.js";
import { oneOf } from "./oneOf.js";
import { positiveLength } from "./positiveLength.js";
import { tableMm } from "./tableLength.js";

/** Which metric key is meant. */
export interface MetricKeyChoice {
  /** `"ISO/R 773"` unless said otherwise. */
  readonly standard?: MetricKeyStandard;
  /** A section b x h of the same standard in place of the one listed for the shaft; it is marked as off its row. */
  readonly key?: KeySectionLike;
  /** True takes the bracketed sizes of JIS B 1301, which are not for new design; false unless said otherwise. */
  readonly bracketed?: boolean;
}

/** A choice with everything decided. */
export interface ChosenMetricKey {
  readonly standard: MetricKeyStandard;
  readonly family: MetricFamily;
  readonly row: MetricRow;
  readonly bracketed: boolean;
  readonly width: Length;
  readonly height: Length;
  readonly standardForShaft: boolean;
  readonly step: BasisStep;
}

const STANDARDS = Object.keys(METRIC_FAMILIES) as readonly MetricKeyStandard[];
const built = new Map<string, readonly MetricRow[]>();

/** Reads the choice of key for a shaft that the table covers. */
export function chooseMetricKey(shaft: Length, options: MetricKeyChoice | undefined): ChosenMetricKey {
  const standard = metricStandard(ownValue(options, "standard"));
  const family = METRIC_FAMILIES[standard];
  const bracketed = ownValue(options, "bracketed") ?? false;
  if (bracketed && standard !== "JIS B 1301") {
    throw new LimitsError("OPTION_INVALID", "bracketed sizes are of JIS B 1301 only", {
      value: standard,
      allowed: 'standard: "JIS B 1301"',
      path: ["bracketed"],
    });
  }
  const rows = rowsOf(standard, bracketed);
  const ofShaft = rows.find((row, index) => covers(row, shaft, family.firstIncluded && !bracketed && index === 0));
  if (ofShaft === undefined) throw noRow(shaft, family, rows, bracketed);
  const own = ownValue(options, "key");
  const row = own === undefined ? ofShaft : sectionRow(own, rows, family);
  const standardForShaft = row === ofShaft;
  const section = `${row.width} x ${row.height} mm`;
  const place = `${family.what}${bracketed ? ", bracketed sizes" : ""}, shaft over ${ofShaft.over} to ${ofShaft.to} mm`;
  return {
    standard,
    family,
    row,
    bracketed,
    width: tableMm(row.width),
    height: tableMm(row.height),
    standardForShaft,
    step: standardForShaft
      ? keyStep(family.edition, place, `b x h = ${section}`, "tabulated", row.t1Mark)
      : keyStep(
          "the caller",
          `${family.edition}, ${place}`,
          `b x h = ${section}; the row lists ${ofShaft.width} x ${ofShaft.height}: off its row`,
          "caller",
        ),
  };
}

/** The standard that is meant. */
export function metricStandard(value: unknown): MetricKeyStandard {
  return oneOf(value ?? "ISO/R 773", STANDARDS, "a standard of metric keys", ["standard"]);
}

/** The rows of a standard, built once. */
export function rowsOf(standard: MetricKeyStandard, bracketed: boolean): readonly MetricRow[] {
  const name = bracketed ? "bracketed" : standard;
  let rows = built.get(name);
  if (rows === undefined) {
    rows = bracketed ? bracketedRows() : METRIC_FAMILIES[standard].rows();
    built.set(name, rows);
  }
  return rows;
}

/** The row of a section that the standard lists. */
export function sectionRow(own: KeySectionLike, rows: readonly MetricRow[], family: MetricFamily): MetricRow {
  const width = positiveLength(ownValue(own, "width"), "the width of the key", ["key", "width"]);
  const height = positiveLength(ownValue(own, "height"), "the height of the key", ["key", "height"]);
  const row = rows.find(
    (one) => tableMm(one.width).ticks === width.ticks && tableMm(one.height).ticks === height.ticks,
  );
  if (row === undefined) {
    throw new LimitsError("KEY_SIZE_NOT_DEFINED", `${family.edition} lists no such section`, {
      value: `${width.toString()} x ${height.toString()}`,
      allowed: rows.map((one) => `${one.width} x ${one.height}`).join(", "),
      path: ["key"],
    });
  }
  return row;
}

function covers(row: MetricRow, shaft: Length, included: boolean): boolean {
  const over = tableMm(row.over).ticks;
  return (shaft.ticks > over || (included && shaft.ticks === over)) && shaft.ticks <= tableMm(row.to).ticks;
}

function noRow(shaft: Length, family: MetricFamily, rows: readonly MetricRow[], bracketed: boolean): LimitsError {
  const first = `${family.firstIncluded && !bracketed ? "from" : "over"} ${rows[0]?.over ?? ""} mm`;
  return new LimitsError("KEY_SHAFT_OUT_OF_RANGE", `${family.edition} lists no key for this shaft diameter`, {
    value: shaft.toString(),
    allowed: bracketed
      ? rows.map((row) => `over ${row.over} to ${row.to} mm`).join(", ")
      : `${first} up to and including ${rows.at(-1)?.to ?? ""} mm`,
  });
}
