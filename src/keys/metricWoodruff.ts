import { LimitsError } from "../errors.js";
import { markOf } from "../basis.js";
import type { Mark } from "../basis.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { oneOf } from "./oneOf.js";
import { positiveLength } from "./positiveLength.js";
import { tableMm } from "./tableLength.js";
import { WOODRUFF_DIN, WOODRUFF_DIN_LOCATING, WOODRUFF_DIN_TORQUE } from "./tables/woodruffDin.js";
import { WOODRUFF_ISO } from "./tables/woodruffIso.js";

/** The standards of metric Woodruff keys; their tables differ and are never mixed. */
export type MetricWoodruffStandard = "ISO 3912" | "DIN 6888";

/** Hub depth of DIN 6888: A deep, preferred; B shallow, for machine tools. */
export type DinWoodruffSeries = "A" | "B";

/** What the key does: carries the torque, or only holds the position. */
export type WoodruffDuty = "torque" | "locating";

/** Which metric Woodruff key is meant. */
export interface MetricWoodruffChoice {
  /** There is no default: the same size has other depths in the other standard. */
  readonly standard: MetricWoodruffStandard;
  /** Width b of the key. */
  readonly width: LengthLike;
  /** Diameter of the circle that the key is cut from: D of ISO 3912, d2 of DIN 6888. */
  readonly diameter: LengthLike;
  /** Height, to make sure; it follows from width and diameter. */
  readonly height?: LengthLike;
}

/** One key of either table, in mm as printed, deviations in µm. */
export interface MetricWoodruffRow {
  readonly standard: MetricWoodruffStandard;
  readonly edition: string;
  readonly width: string;
  readonly height: string;
  readonly diameter: string;
  readonly flatBottom: string | null;
  readonly flatBottomMark: Mark;
  readonly chamfer: readonly [string, string] | null;
  readonly chamferMark: Mark;
  readonly radius: readonly [string, string] | null;
  readonly depths: Partial<Record<DinWoodruffSeries, readonly [t1: string, t2: string]>>;
  readonly t1UpperUm: number | null;
  readonly t2UpperUm: number | null;
  readonly depthMark: Mark;
  readonly torque: readonly [over: string, to: string] | null;
  readonly locating: readonly [over: string, to: string] | null;
  readonly shaftMark: Mark;
}

const STANDARDS: readonly MetricWoodruffStandard[] = ["ISO 3912", "DIN 6888"];
const built = new Map<MetricWoodruffStandard, readonly MetricWoodruffRow[]>();

/** The rows of a standard, built once. */
export function woodruffRows(standard: MetricWoodruffStandard): readonly MetricWoodruffRow[] {
  let rows = built.get(standard);
  if (rows === undefined) {
    rows = standard === "ISO 3912" ? isoRows() : dinRows();
    built.set(standard, rows);
  }
  return rows;
}

/** The standard that is meant. */
export function woodruffStandard(value: unknown): MetricWoodruffStandard {
  return oneOf(value, STANDARDS, "a standard of metric Woodruff keys", ["standard"]);
}

/** The row of the key that is meant. */
export function chooseWoodruff(choice: MetricWoodruffChoice): MetricWoodruffRow {
  const standard = woodruffStandard(ownValue(choice, "standard"));
  const width = positiveLength(ownValue(choice, "width"), "the width of the key", ["width"]);
  const diameter = positiveLength(ownValue(choice, "diameter"), "the diameter of the key", ["diameter"]);
  const asked = ownValue(choice, "height");
  const height: Length | null = asked === undefined ? null : asLength(asked, ["height"]);
  const rows = woodruffRows(standard);
  const row = rows.find(
    (one) =>
      tableMm(one.width).ticks === width.ticks &&
      tableMm(one.diameter).ticks === diameter.ticks &&
      (height === null || tableMm(one.height).ticks === height.ticks),
  );
  if (row === undefined) {
    throw new LimitsError("KEY_SIZE_NOT_DEFINED", `${standard} lists no such Woodruff key`, {
      value: [width, ...(height === null ? [] : [height]), diameter].map((one) => one.toString()).join(" x "),
      allowed: rows.map((one) => `${one.width}x${one.height}x${one.diameter}`).join(", "),
    });
  }
  return row;
}

function isoRows(): readonly MetricWoodruffRow[] {
  let torqueFrom = "3";
  let locatingFrom = "3";
  return WOODRUFF_ISO.map((row): MetricWoodruffRow => {
    const [width, height, diameter, flat, c1, c2, t1, t2, t1UpperUm, t2UpperUm, r1, r2, torqueTo, locatingTo, marks] =
      row;
    const torque = [torqueFrom, torqueTo] as const;
    const locating = locatingTo === null ? null : ([locatingFrom, locatingTo] as const);
    torqueFrom = torqueTo;
    locatingFrom = locatingTo ?? locatingFrom;
    return {
      standard: "ISO 3912",
      edition: "ISO 3912:1977",
      width,
      height,
      diameter,
      flatBottom: flat,
      flatBottomMark: markOf(marks[0]),
      chamfer: [c1, c2],
      chamferMark: markOf(marks[1]),
      radius: [r1, r2],
      depths: { A: [t1, t2] },
      t1UpperUm,
      t2UpperUm,
      depthMark: "one-source",
      torque,
      locating,
      shaftMark: "memory",
    };
  });
}

function dinRows(): readonly MetricWoodruffRow[] {
  const rangeIn = (rows: typeof WOODRUFF_DIN_TORQUE, width: string): readonly [string, string] | null => {
    const row = rows.find(([listed]) => listed === width);
    return row === undefined ? null : [row[1], row[2]];
  };
  return WOODRUFF_DIN.map(
    ([width, height, diameter, aT1, aT2, bT1, bT2, t1UpperUm, t2UpperUm, mark]): MetricWoodruffRow => ({
      standard: "DIN 6888",
      edition: "DIN 6888:1956",
      width,
      height,
      diameter,
      flatBottom: null,
      flatBottomMark: "memory",
      chamfer: null,
      chamferMark: "memory",
      radius: null,
      depths: { A: [aT1, aT2], ...(bT1 === null || bT2 === null ? {} : { B: [bT1, bT2] as const }) },
      t1UpperUm,
      t2UpperUm,
      depthMark: markOf(mark),
      torque: rangeIn(WOODRUFF_DIN_TORQUE, width),
      locating: rangeIn(WOODRUFF_DIN_LOCATING, width),
      shaftMark: Number(width) <= 4 ? "one-source" : "memory",
    }),
  );
}
