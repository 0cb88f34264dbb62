import { LimitsError } from "../errors.js";
import { asLimits } from "../limits/index.js";
import type { Limits, LimitsLike } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import type { Length, Ratio } from "../units/index.js";

/** A keyseat as a standard function gives it, or as measured or printed: one statement of depth is needed. */
export interface KeyseatLike {
  /** Width of the seat; `null` or absent where it is not known. */
  readonly width?: LimitsLike | null;
  /** From the floor to the opposite side: S or d − t1 of the shaft, T or d + t2 of the hub. It goes before the others. */
  readonly control?: LimitsLike | null;
  /** From the crown on the centre line: t1, t2. It goes before `sideDepth`. */
  readonly depth?: LimitsLike | null;
  /** Along the side wall, as Woodruff seats are given. */
  readonly sideDepth?: LimitsLike | null;
}

/** The limits of a key as a caller gives them. */
export interface KeyLimitsLike {
  /** Width of the key. */
  readonly width: LimitsLike;
  /** Height of the key; of a taper key at its thick end. */
  readonly height: LimitsLike;
  /** Rise over run of a taper key; `null` or absent for a parallel one. */
  readonly taper?: Ratio | null;
}

/** The parts of a keyed joint. */
export interface KeyedParts {
  /** Diameter of the shaft. */
  readonly shaft: LimitsLike;
  /** Diameter of the bore. */
  readonly bore: LimitsLike;
  /** Limits of the key, such as `inchKey(…).barStock` or `metricKey(…).limits`. */
  readonly key: KeyLimitsLike;
  /** The keyseat in the shaft. */
  readonly shaftKeyseat: KeyseatLike;
  /** The keyseat in the hub. */
  readonly hubKeyseat: KeyseatLike;
}

/** The statement of depth that is used. */
export type DepthForm = "control" | "depth" | "sideDepth";

/** A keyseat read. */
export interface ReadKeyseat {
  readonly width: Limits | null;
  readonly form: DepthForm;
  readonly depth: Limits;
}

/** All parts read. */
export interface ReadParts {
  readonly shaft: Limits;
  readonly bore: Limits;
  readonly keyWidth: Limits;
  readonly keyHeight: Limits;
  readonly taper: Ratio | null;
  readonly shaftKeyseat: ReadKeyseat;
  readonly hubKeyseat: ReadKeyseat;
}

const FORMS: readonly DepthForm[] = ["control", "depth", "sideDepth"];

/** Reads and checks the parts of a keyed joint. */
export function readParts(parts: KeyedParts): ReadParts {
  const key = ownValue(parts, "key");
  const shaft = positive(ownValue(parts, "shaft"), ["shaft"]);
  const bore = positive(ownValue(parts, "bore"), ["bore"]);
  const keyWidth = positive(ownValue(key, "width"), ["key", "width"]);
  const keyHeight = positive(ownValue(key, "height"), ["key", "height"]);
  if (keyWidth.max.ticks >= shaft.min.ticks) {
    throw new LimitsError("KEY_WIDER_THAN_SHAFT", "the key is as wide as the shaft, or wider", {
      value: keyWidth.max.toString(),
      allowed: `less than ${shaft.min.toString()}`,
      path: ["key", "width"],
    });
  }
  const shaftKeyseat = readKeyseat(ownValue(parts, "shaftKeyseat"), "shaftKeyseat", shaft);
  const hubKeyseat = readKeyseat(ownValue(parts, "hubKeyseat"), "hubKeyseat", shaft);
  refuseImpossible(shaftKeyseat, hubKeyseat, shaft, bore);
  return { shaft, bore, keyWidth, keyHeight, taper: taperOf(ownValue(key, "taper")), shaftKeyseat, hubKeyseat };
}

function readKeyseat(given: KeyseatLike | undefined, name: "shaftKeyseat" | "hubKeyseat", shaft: Limits): ReadKeyseat {
  const form = FORMS.find((one) => isGiven(ownValue(given, one)));
  if (form === undefined) {
    throw new LimitsError("KEYED_JOINT_INVALID", "the depth of a keyseat is missing", {
      allowed: "control (S or T), depth (t1 or t2), or sideDepth, as limits",
      path: [name],
    });
  }
  const width = ownValue(given, "width") ?? null;
  const read = width === null ? null : positive(width, [name, "width"]);
  if (read !== null && read.max.ticks >= shaft.min.ticks) {
    throw new LimitsError("KEY_WIDER_THAN_SHAFT", "the keyseat is as wide as the shaft, or wider", {
      value: read.max.toString(),
      allowed: `less than ${shaft.min.toString()}`,
      path: [name, "width"],
    });
  }
  return { width: read, form, depth: positive(ownValue(given, form) ?? undefined, [name, form]) };
}

function isGiven(value: unknown): boolean {
  return value !== undefined && value !== null;
}

function positive(value: LimitsLike | undefined, path: readonly string[]): Limits {
  if (value === undefined) {
    throw new LimitsError("KEYED_JOINT_INVALID", `${path.join(" ")} is missing`, {
      allowed: "shaft, bore, key { width, height }, shaftKeyseat, hubKeyseat, each size as limits",
      path,
    });
  }
  const limits = asLimits(value, path);
  if (limits.min.ticks <= 0) {
    throw new LimitsError("KEYED_JOINT_INVALID", "a size of a keyed joint is over zero", {
      value: limits.min.toString(),
      path,
    });
  }
  return limits;
}

function refuseImpossible(shaftSeat: ReadKeyseat, hubSeat: ReadKeyseat, shaft: Limits, bore: Limits): void {
  const { depth, form } = shaftSeat;
  // as much of the shaft as is left at the worst, and the seat as shallow as it may be
  const deepest: Length = form === "control" ? depth.min : depth.max;
  const noShaft = form !== "control" && deepest.ticks >= shaft.min.ticks;
  const noSeat = form === "control" && depth.min.ticks >= shaft.max.ticks;
  if (noShaft || noSeat) {
    throw impossible(
      noSeat ? "S is as large as the shaft: there is no keyseat" : "a keyseat so deep leaves no shaft under it",
      depth,
      `less than ${(noSeat ? shaft.max : shaft.min).toString()}`,
      ["shaftKeyseat", form],
    );
  }
  if (hubSeat.form === "control" && hubSeat.depth.max.ticks <= bore.min.ticks) {
    throw impossible("T is as small as the bore: there is no keyseat", hubSeat.depth, `over ${bore.min.toString()}`, [
      "hubKeyseat",
      "control",
    ]);
  }
}

function impossible(says: string, depth: Limits, allowed: string, path: readonly string[]): LimitsError {
  return new LimitsError("KEYSEAT_DEPTH_IMPOSSIBLE", says, {
    value: `${depth.max.toString()} / ${depth.min.toString()}`,
    allowed,
    path,
  });
}

function taperOf(value: Ratio | null | undefined): Ratio | null {
  if (value === undefined || value === null) return null;
  const numerator = ownValue(value, "numerator") ?? NaN;
  const denominator = ownValue(value, "denominator") ?? NaN;
  if (!(Number.isSafeInteger(numerator) && Number.isSafeInteger(denominator) && numerator > 0 && denominator > 0)) {
    throw new LimitsError("KEYED_JOINT_INVALID", "a taper is a ratio of whole numbers over zero", {
      value: `${numerator}:${denominator}`,
      allowed: "such as { numerator: 1, denominator: 96 }",
      path: ["key", "taper"],
    });
  }
  return { numerator, denominator };
}
