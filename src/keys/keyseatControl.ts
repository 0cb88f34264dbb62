import { ownValue } from "../ownValue.js";
import type { Length, LengthLike } from "../units/index.js";
import { readSeat, soundDepth } from "./measuredDepth.js";
import type { MeasuredSeat } from "./measuredDepth.js";
import { positiveLength } from "./positiveLength.js";

/**
 * What a keyseat measures across to the opposite side, from its depth along the side wall.
 *
 * @param seat - real `diameter` of shaft or bore, `width` of the seat, `member` and its `sideDepth`; any unit
 * @returns S of a shaft, T of a hub, to the tick, in the unit of `sideDepth`
 * @throws `KEYSEAT_DEPTH_IMPOSSIBLE`, `KEY_WIDER_THAN_SHAFT`, `KEYED_JOINT_INVALID`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { keyseatControl, writeLength } from "limitsmith";
 *
 * const seat = { diameter: "1.4992 in", width: "3/8 in", member: "shaft", sideDepth: "3/16 in" } as const;
 * writeLength(keyseatControl(seat), { places: 4 }); // → "1.2879 in"
 * ```
 * @reference ANSI/ASME B17.1-1967, depth control: S = D − Y − side depth, T = D − Y + side depth
 */
export function keyseatControl(seat: MeasuredSeat & { readonly sideDepth: LengthLike }): Length {
  const { inShaft, edge } = readSeat(seat);
  const depth = positiveLength(ownValue(seat, "sideDepth"), "the side depth", ["sideDepth"]);
  return soundDepth(inShaft ? edge - depth.ticks : edge + depth.ticks, inShaft ? "S" : "T", depth, depth);
}
