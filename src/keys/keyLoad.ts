import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLength, asTorque, force, lengthOfTicks, multiply, stress, torque } from "../units/index.js";
import type { Length, LengthLike, Stress, StressLike, Torque, TorqueLike } from "../units/index.js";
import { allowedStresses } from "./keyAllowables.js";
import type { Allowed } from "./keyAllowables.js";
import { figures } from "./figures.js";
import { loadBasis, loadCautions } from "./keyLoadBasis.js";
import type { BearingAllowables, KeyEnds, KeyLoad, PressureForm, SeveralKeysRule, ShearRule } from "./keyLoadValue.js";
import { strengthFactor } from "./keywayStrengthFactor.js";
import type { KeySectionLike } from "./keyValue.js";
import { oneOf } from "./oneOf.js";
import { positiveLength } from "./positiveLength.js";

/** Allowable stresses of the caller's own. */
export interface KeyAllowables {
  /** Shear stress of the key. */
  readonly shear?: StressLike;
  /** Pressure on the flanks, for all parts or for key, shaft and hub apart. */
  readonly bearing?: StressLike | BearingAllowables<StressLike>;
}

/** Yield strengths in place of allowables. */
export interface KeyMaterials {
  /** Yield strengths of key, shaft and hub. */
  readonly yield: BearingAllowables<StressLike>;
  /** How much of the key's strength counts in shear. */
  readonly shearRule: ShearRule;
}

/** A keyed joint and its load. */
export interface KeyLoadParts {
  /** Torque that the joint carries; without it there is a capacity only. */
  readonly torque?: TorqueLike;
  /** Diameter of the shaft. */
  readonly shaftDiameter: LengthLike;
  /** Nominal section of the key. */
  readonly key: KeySectionLike;
  /** Overall length of the key; without it there is a needed length only. */
  readonly length?: LengthLike;
  /** There is no default: standards differ in what a bare designation means. */
  readonly ends: KeyEnds;
  /** The form of the pressure formula, by name; there is no default, see {@link PressureForm}. */
  readonly pressure: PressureForm;
  /** Depth of the shaft keyway from the crown, t1, for the forms that ask for it and for the strength of the shaft. */
  readonly shaftDepth?: LengthLike;
  /** Depth of the hub keyway from the crown, t2, for the form that asks for it. */
  readonly hubDepth?: LengthLike;
  /** Allowable stresses of your own: `shear` of the key, `bearing` for all parts or for key, shaft and hub apart. */
  readonly allowables?: KeyAllowables;
  /** Yield strengths in place of allowables, and how much of the key's counts in shear. */
  readonly materials?: KeyMaterials;
  /** What the stresses are divided by: 1 unless said otherwise with `allowables`, to be said with `materials`. */
  readonly safetyFactor?: number;
  /** Number of keys, 1 unless said otherwise; two keys need `severalKeys`. */
  readonly keys?: 1 | 2;
  /** The rule by which two keys share the torque. */
  readonly severalKeys?: SeveralKeysRule;
}

/**
 * The load on a keyed joint by named formulas: force, shear stress, pressure, needed length, torque capacity.
 *
 * There is no hidden allowable and no hidden formula: what is not given is not computed, and the form of the pressure
 * formula stands beside the number, for the forms differ by a third and more.
 *
 * @param parts - `shaftDiameter`, `key`, `ends`, the `pressure` form, and what is known of `torque`, `length`,
 *   `allowables` or `materials`, see {@link KeyLoadParts}; lengths in any unit, stresses in MPa, psi or ksi
 * @returns the frozen result, in lbf, psi, lbf·in and inches where the torque (or, without one, the shaft diameter) is
 *   in inch units, in N, MPa, N·m and mm otherwise; numbers right to 12 figures; with the caution that goes with it
 * @throws `KEY_LOAD_INVALID`, `KEY_LENGTH_INVALID`, `KEY_WIDER_THAN_SHAFT`, `KEYSEAT_DEPTH_IMPOSSIBLE`,
 *   `KEYED_JOINT_INVALID`, `OPTION_INVALID`, `QUANTITY_INVALID`, `LENGTH_INVALID`, `UNIT_UNKNOWN`, `UNIT_MISSING`
 * @example
 * ```ts
 * import { keyLoad } from "limitsmith";
 *
 * const load = keyLoad({
 *   torque: "150 N·m",
 *   shaftDiameter: "30 mm",
 *   key: { width: "8 mm", height: "7 mm" },
 *   length: "40 mm",
 *   ends: "round",
 *   pressure: "half height",
 *   allowables: { bearing: "100 MPa" },
 * });
 * load.force?.toString(); // → "10000 N"
 * load.bearingLength?.toString(); // → "32 mm"
 * load.pressure?.value.toFixed(2); // → "89.29"
 * load.neededLength.bearing?.to("mm").toFixed(2); // → "36.57"
 * load.capacity.bearing?.toString(); // → "168 N·m"
 * load.cautions[0]?.code; // → "KEY_CARRIES_LOAD"
 * ```
 * @reference F = 2T/D, τ = F/(b l), p = F/(l × bearing height): Machine Elements in Mechanical Design, 4th edition,
 *   pp. 499-500, and the texts named at `PressureForm`; keyway factor: Machinery's Handbook, 31st edition, from memory
 */
export function keyLoad(parts: KeyLoadParts): KeyLoad {
  const shaft = positiveLength(ownValue(parts, "shaftDiameter"), "the shaft diameter", ["shaftDiameter"]);
  const key = ownValue(parts, "key");
  const width = positiveLength(ownValue(key, "width"), "the width of the key", ["key", "width"]);
  const height = positiveLength(ownValue(key, "height"), "the height of the key", ["key", "height"]);
  if (width.ticks >= shaft.ticks) {
    throw new LimitsError("KEY_WIDER_THAN_SHAFT", "the key is as wide as the shaft, or wider", {
      value: width.toString(),
      allowed: `less than ${shaft.toString()}`,
      path: ["key", "width"],
    });
  }
  const given = ownValue(parts, "torque");
  const load = given === undefined ? null : positiveTorque(given);
  const system = systemOf(load, shaft);
  const ends = oneOf(ownValue(parts, "ends"), ENDS, "the ends of the key", ["ends"]);
  const lost = lostLength(ends, width);
  const bearingLength = bearingLengthOf(ownValue(parts, "length"), lost, ends);
  const form = oneOf(ownValue(parts, "pressure"), FORMS, "a form of the pressure formula", ["pressure"]);
  const shaftDepth = optionalLength(ownValue(parts, "shaftDepth"), "the depth of the shaft keyway", "shaftDepth");
  const hubDepth = optionalLength(ownValue(parts, "hubDepth"), "the depth of the hub keyway", "hubDepth");
  const bearingHeight = bearingHeightOf(form, height, shaftDepth, hubDepth);
  const countsAs = countOf(parts);
  const allowed = allowedStresses(parts);
  const geometry = { shaft, width, bearingLength, bearingHeight, countsAs };
  const factor = shaftDepth === null ? null : strengthFactor(shaft, width, shaftDepth, "shaftDepth");
  return Object.freeze({
    force: load === null ? null : force(figures(forceOf(load, geometry, system)), system.force),
    bearingLength: bearingLength === null ? null : shownIn(bearingLength, system),
    bearingHeight: shownIn(bearingHeight, system),
    pressureForm: form,
    countsAs,
    shearStress: stressOf(load, geometry, system, width),
    pressure: stressOf(load, geometry, system, bearingHeight),
    allowedShear: allowed.shear,
    allowedPressure: allowed.bearing,
    neededLength: neededLength(load, geometry, system, allowed, lost),
    capacity: capacityOf(geometry, system, allowed),
    shaftStrengthFactor: factor,
    basis: loadBasis(form, ends, countsAs, allowed.step, factor),
    cautions: loadCautions(bearingLength, shaft),
  });
}

const ENDS: readonly KeyEnds[] = ["square", "round", "one round"];
const FORMS: readonly PressureForm[] = ["half height", "h - t1", "0.45 h", "t1 or t2"];

/** The units that a result is worked out in. */
interface System {
  readonly length: "mm" | "in";
  readonly force: "N" | "lbf";
  readonly stress: "MPa" | "psi";
  readonly torque: "Nm" | "lbf-in";
  /** Lengths of the torque's own arm in `length`: 1 N·m is 1000 N·mm. */
  readonly perTorque: number;
  /** Ticks in one unit of `length`. */
  readonly ticks: number;
}

const METRIC: System = { length: "mm", force: "N", stress: "MPa", torque: "Nm", perTorque: 1000, ticks: 10_000_000 };
const INCH: System = { length: "in", force: "lbf", stress: "psi", torque: "lbf-in", perTorque: 1, ticks: 254_000_000 };

interface Geometry {
  readonly shaft: Length;
  readonly width: Length;
  readonly bearingLength: Length | null;
  readonly bearingHeight: Length;
  readonly countsAs: number;
}

function systemOf(load: Torque | null, shaft: Length): System {
  if (load !== null) return load.unit === "Nm" ? METRIC : INCH;
  return shaft.unit === "mm" || shaft.unit === "um" ? METRIC : INCH;
}

function positiveTorque(value: TorqueLike): Torque {
  const load = asTorque(value, ["torque"]);
  if (load.value > 0) return load;
  throw new LimitsError("KEY_LOAD_INVALID", "the torque is over zero; its direction does not matter here", {
    value: load.toString(),
    path: ["torque"],
  });
}

function optionalLength(value: LengthLike | undefined, what: string, name: string): Length | null {
  return value === undefined ? null : positiveLength(value, what, [name]);
}

function lostLength(ends: KeyEnds, width: Length): Length {
  if (ends === "square") return lengthOfTicks(0, width.unit);
  return ends === "round" ? width : multiply(width, { numerator: 1, denominator: 2 });
}

function bearingLengthOf(value: LengthLike | undefined, lost: Length, ends: KeyEnds): Length | null {
  if (value === undefined) return null;
  const length = asLength(value, ["length"]);
  const left = length.ticks - lost.ticks;
  if (left <= 0) {
    throw new LimitsError("KEY_LENGTH_INVALID", "a key so short does not bear", {
      value: length.toString(),
      allowed:
        ends === "square"
          ? "over zero"
          : `over ${lost.toString()}, which its ${ends === "round" ? "round ends take" : "round end takes"}`,
      path: ["length"],
    });
  }
  return lengthOfTicks(left, length.unit);
}

function bearingHeightOf(form: PressureForm, height: Length, t1: Length | null, t2: Length | null): Length {
  if (form === "half height") return multiply(height, { numerator: 1, denominator: 2 });
  if (form === "0.45 h") return multiply(height, { numerator: 9, denominator: 20 });
  if (t1 === null) throw missingDepth(form, "shaftDepth");
  if (form === "h - t1") {
    const left = height.ticks - t1.ticks;
    if (left <= 0) {
      throw new LimitsError("KEYSEAT_DEPTH_IMPOSSIBLE", "the key does not stand out of a keyway so deep", {
        value: t1.toString(),
        allowed: `less than ${height.toString()}`,
        path: ["shaftDepth"],
      });
    }
    return lengthOfTicks(left, height.unit);
  }
  if (t2 === null) throw missingDepth(form, "hubDepth");
  return t1.ticks < t2.ticks ? t1 : t2;
}

function missingDepth(form: PressureForm, name: "shaftDepth" | "hubDepth"): LimitsError {
  return new LimitsError("KEY_LOAD_INVALID", `the form "${form}" needs the ${name}`, {
    allowed: "the depth from the crown, t1 or t2, with its unit",
    path: [name],
  });
}

function countOf(parts: KeyLoadParts): number {
  const keys = oneOf(ownValue(parts, "keys") ?? 1, [1, 2] as const, "a number of keys", ["keys"]);
  if (keys === 1) return 1;
  oneOf(ownValue(parts, "severalKeys"), ["two count as 1.5"] as const, "the rule for two keys", ["severalKeys"]);
  return 1.5;
}

/** Force at the surface of the shaft, F = 2T/D. */
function forceOf(load: Torque, { shaft }: Geometry, system: System): number {
  return (2 * load.to(system.torque) * system.perTorque) / shaft.to(system.length);
}

/** Stress on an area of the bearing length times a width or height. */
function stressOf(load: Torque | null, geometry: Geometry, system: System, across: Length): Stress | null {
  const { bearingLength, countsAs } = geometry;
  if (load === null || bearingLength === null) return null;
  const area = bearingLength.to(system.length) * across.to(system.length) * countsAs;
  return stress(figures(forceOf(load, geometry, system) / area), system.stress);
}

function neededLength(
  load: Torque | null,
  geometry: Geometry,
  system: System,
  allowed: Allowed,
  lost: Length,
): KeyLoad["neededLength"] {
  const needed = (limit: Stress | null, across: Length): Length | null => {
    if (load === null || limit === null) return null;
    const bearing =
      forceOf(load, geometry, system) / (limit.to(system.stress) * across.to(system.length) * geometry.countsAs);
    return lengthOfTicks(Math.round(figures(bearing) * system.ticks) + lost.ticks, system.length);
  };
  const shear = needed(allowed.shear, geometry.width);
  const bearing = needed(allowed.bearing, geometry.bearingHeight);
  return Object.freeze({ shear, bearing, governing: longer(shear, bearing) });
}

function longer(one: Length | null, other: Length | null): Length | null {
  if (one === null || other === null) return one ?? other;
  return one.ticks > other.ticks ? one : other;
}

function capacityOf(geometry: Geometry, system: System, allowed: Allowed): KeyLoad["capacity"] {
  const { shaft, bearingLength, countsAs } = geometry;
  const carried = (limit: Stress | null, across: Length): Torque | null => {
    if (limit === null || bearingLength === null) return null;
    const area = bearingLength.to(system.length) * across.to(system.length) * countsAs;
    const moment = (limit.to(system.stress) * area * shaft.to(system.length)) / 2;
    return torque(figures(moment / system.perTorque), system.torque);
  };
  const shear = carried(allowed.shear, geometry.width);
  const bearing = carried(allowed.bearing, geometry.bearingHeight);
  const governing =
    shear === null || bearing === null ? (shear ?? bearing) : shear.value < bearing.value ? shear : bearing;
  return Object.freeze({ shear, bearing, governing });
}

function shownIn(length: Length, system: System): Length {
  return lengthOfTicks(length.ticks, system.length);
}
