import { LimitsError } from "../errors.js";
import type { Basis, Caution } from "../basis.js";
import { makeLimits } from "../limits/index.js";
import type { Limits } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { lengthOfTicks, multiply } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { inchKeyseat } from "./inchKeyseat.js";
import type { InchKeyseatOptions } from "./inchKeyseat.js";
import type { KeyseatMember } from "./keyseatValue.js";
import { keyStep } from "./keyStep.js";
import { metricKeyseat } from "./metricKeyseat.js";
import type { MetricKeyseatOptions } from "./metricKeyseat.js";
import type { MetricKeyStandard } from "./metricValue.js";
import { metricWoodruffKeyseat } from "./metricWoodruffKeyseat.js";
import type { MetricWoodruffKeyseatOptions, MetricWoodruffMember } from "./metricWoodruffKeyseat.js";
import { oneOf } from "./oneOf.js";
import { positiveLength } from "./positiveLength.js";
import { woodruffKeyseat } from "./woodruffKeyseat.js";

/** Which member of the joint has the keyseat. */
export interface KeyseatPlace {
  /** `"shaft"` or `"hub"`. */
  readonly member: KeyseatMember;
}

/** A keyseat of ANSI/ASME B17.1 on a drawing. */
export interface InchKeyseatSpec extends InchKeyseatOptions, KeyseatPlace {
  /** ANSI/ASME B17.1. */
  readonly standard: "B17.1";
}

/** A Woodruff keyseat of ANSI/ASME B17.2 on a drawing. */
export interface WoodruffKeyseatSpec extends KeyseatPlace {
  /** ANSI/ASME B17.2. */
  readonly standard: "B17.2";
  /** Number of the key, such as `"404"`. */
  readonly number: string;
}

/** A metric keyway on a drawing. */
export interface MetricKeyseatSpec extends MetricKeyseatOptions, KeyseatPlace {
  /** The standard; it must be said. */
  readonly standard: MetricKeyStandard;
}

/** A metric Woodruff keyway on a drawing. */
export interface MetricWoodruffKeyseatSpec extends MetricWoodruffKeyseatOptions, KeyseatPlace {}

/** A keyseat as a drawing calls for it, by any of the standards. */
export type KeyseatSpec = InchKeyseatSpec | WoodruffKeyseatSpec | MetricKeyseatSpec | MetricWoodruffKeyseatSpec;

/** One dimension of a keyseat on a drawing. */
export interface KeyseatRow {
  /** What is dimensioned: across to the opposite side, or the width. */
  readonly name: "control" | "width";
  /** How the standard writes it: S, T and W in inches, d - t1, d + t2 and b in metric standards. */
  readonly symbol: "S" | "T" | "W" | "d - t1" | "d + t2" | "b";
  /** The limits; `null` where the standard gives none, or none that are known here. */
  readonly limits: Limits | null;
}

/** The dimensions of a keyseat on a drawing: plain frozen data. */
export interface KeyseatRows {
  /** Standard with its edition. */
  readonly standard: string;
  /** Shaft or hub. */
  readonly member: KeyseatMember;
  /** The dimensions, control dimension first. */
  readonly rows: readonly KeyseatRow[];
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * The dimensions that a drawing gives a keyseat: S of the shaft or T of the hub (d − t1, d + t2), and the width.
 *
 * @param shaftDiameter - nominal diameter of shaft and bore, any unit
 * @param spec - `standard` (`"B17.1"`, `"B17.2"`, a metric one), `member` (`"shaft"` or `"hub"`), and the options of the
 *   function behind it: {@link inchKeyseat}, {@link woodruffKeyseat}, {@link metricKeyseat}, {@link metricWoodruffKeyseat}
 * @returns the frozen rows, control dimension first, as `Limits` in inches or mm; `null` limits where there are none
 * @throws `OPTION_INVALID`, and what the function behind it throws
 * @example
 * ```ts
 * import { keyseatRows, writeLimits } from "limitsmith";
 *
 * const { rows } = keyseatRows("1 1/2 in", { standard: "B17.1", member: "hub", class: 2 });
 * rows.map(({ symbol }) => symbol); // → ["T", "W"]
 * rows.map(({ limits }) => (limits === null ? "" : writeLimits(limits, { form: "limits" }).text)); // → ["1.679/1.669", ".377/.375"]
 * ```
 * @reference ANSI/ASME B17.1-1967, ANSI/ASME B17.2-1967, ISO/R 773:1969, ISO 3912:1977 and the others
 */
export function keyseatRows(shaftDiameter: LengthLike, spec: KeyseatSpec): KeyseatRows {
  const member = oneOf(ownValue(spec, "member"), MEMBERS, "shaft or hub", ["member"]);
  const standard: unknown = ownValue(spec, "standard");
  if (typeof standard !== "string") {
    throw new LimitsError("OPTION_INVALID", "say the standard of the keyseat", {
      value: standard,
      allowed: 'such as "B17.1", "B17.2", "ISO/R 773", "ISO 3912"',
      path: ["standard"],
    });
  }
  const symbols =
    member === "shaft" ? ({ inch: "S", metric: "d - t1" } as const) : ({ inch: "T", metric: "d + t2" } as const);
  switch (spec.standard) {
    case "B17.1": {
      const seat = inchKeyseat(shaftDiameter, spec);
      const { control, width } = seat[member];
      return rowsOf(seat, member, symbols.inch, control, "W", width);
    }
    case "B17.2": {
      const seat = woodruffKeyseat(ownValue(spec, "number") ?? "", { shaftDiameter });
      const { control, width } = seat[member];
      return rowsOf(seat, member, symbols.inch, control, "W", width);
    }
    case "ISO 3912":
    case "DIN 6888": {
      const seat = metricWoodruffKeyseat(spec);
      const shaft = positiveLength(shaftDiameter, "the shaft diameter", ["shaftDiameter"]);
      return rowsOf(seat, member, symbols.metric, controlOf(shaft, member, seat[member]), "b", seat[member].width);
    }
    default: {
      const seat = metricKeyseat(shaftDiameter, spec);
      const { control, width } = seat[member];
      return rowsOf(seat, member, symbols.metric, control, "b", width);
    }
  }
}

const MEMBERS: readonly KeyseatMember[] = ["shaft", "hub"];

function rowsOf(
  seat: { readonly standard: string; readonly basis: Basis; readonly cautions: readonly Caution[] },
  member: KeyseatMember,
  controlSymbol: KeyseatRow["symbol"],
  control: Limits | null,
  widthSymbol: KeyseatRow["symbol"],
  width: Limits | null,
): KeyseatRows {
  return Object.freeze({
    standard: seat.standard,
    member,
    rows: Object.freeze([
      Object.freeze({ name: "control", symbol: controlSymbol, limits: control }),
      Object.freeze({ name: "width", symbol: widthSymbol, limits: width }),
    ] as const),
    basis: seat.basis,
    cautions: seat.cautions,
  });
}

/** Control dimension of a metric Woodruff keyway, at nominal diameter. */
function controlOf(shaft: Length, member: KeyseatMember, { depth }: MetricWoodruffMember): Limits | null {
  if (depth === null) return null;
  const { nominal, upperDeviation, lowerDeviation, basis } = depth;
  const inShaft = member === "shaft";
  const ticks = inShaft ? shaft.ticks - nominal.ticks : shaft.ticks + nominal.ticks;
  if (ticks - (inShaft ? upperDeviation.ticks : 0) <= 0) {
    throw new LimitsError("KEYSEAT_DEPTH_IMPOSSIBLE", "a keyway so deep leaves no shaft under it", {
      value: nominal.toString(),
      allowed: `less than ${shaft.toString()}`,
    });
  }
  const step = keyStep("geometry", "control dimensions", inShaft ? "d - t1, sign reversed" : "d + t2", "derived");
  const made = Object.freeze([...basis, step]);
  return inShaft
    ? makeLimits(lengthOfTicks(ticks, "mm"), multiply(lowerDeviation, -1), multiply(upperDeviation, -1), made, null)
    : makeLimits(lengthOfTicks(ticks, "mm"), upperDeviation, lowerDeviation, made, null);
}
