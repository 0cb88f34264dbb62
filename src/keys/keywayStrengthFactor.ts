import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import type { Length, LengthLike } from "../units/index.js";
import { figures } from "./figures.js";
import { positiveLength } from "./positiveLength.js";

/** A shaft with a keyway. */
export interface KeyedShaft {
  /** Diameter d of the shaft. */
  readonly shaftDiameter: LengthLike;
  /** Width w of the keyway. */
  readonly width: LengthLike;
  /** Depth h of the keyway. */
  readonly depth: LengthLike;
}

/**
 * How much of the static torsional strength a shaft keeps where a keyway is cut: no fatigue factor.
 *
 * @param shaft - `shaftDiameter` d, `width` w and `depth` h of the keyway, over zero, any unit
 * @returns the ratio e, over 0 and under 1 (no unit)
 * @throws `KEY_WIDER_THAN_SHAFT`, `KEYSEAT_DEPTH_IMPOSSIBLE` where the formula leaves nothing, `KEYED_JOINT_INVALID`,
 *   `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { keywayStrengthFactor } from "limitsmith";
 *
 * keywayStrengthFactor({ shaftDiameter: "40 mm", width: "10 mm", depth: "5 mm" }); // → 0.8125
 * ```
 * @reference e = 1 − 0.2 w/d − 1.1 h/d: University of Illinois Engineering Experiment Station Bulletin 42, quoted in
 *   Machinery's Handbook, 31st edition, p. 301; from memory
 */
export function keywayStrengthFactor(shaft: KeyedShaft): number {
  const diameter = positiveLength(ownValue(shaft, "shaftDiameter"), "the shaft diameter", ["shaftDiameter"]);
  const width = positiveLength(ownValue(shaft, "width"), "the width of the keyway", ["width"]);
  const depth = positiveLength(ownValue(shaft, "depth"), "the depth of the keyway", ["depth"]);
  if (width.ticks >= diameter.ticks) {
    throw new LimitsError("KEY_WIDER_THAN_SHAFT", "the keyway is as wide as the shaft, or wider", {
      value: width.toString(),
      allowed: `less than ${diameter.toString()}`,
      path: ["width"],
    });
  }
  return strengthFactor(diameter, width, depth, "depth");
}

/** The same of lengths that were read; `name` is that of the depth in the caller's data. */
export function strengthFactor(diameter: Length, width: Length, depth: Length, name: string): number {
  // in tenths, so that the division is the only rounding
  const factor = (10 * diameter.ticks - 2 * width.ticks - 11 * depth.ticks) / (10 * diameter.ticks);
  if (factor <= 0) {
    throw new LimitsError("KEYSEAT_DEPTH_IMPOSSIBLE", "by the formula nothing of the shaft is left", {
      value: depth.toString(),
      allowed: "a keyway about as wide as a quarter of the shaft and half as deep",
      path: [name],
    });
  }
  return figures(factor);
}
