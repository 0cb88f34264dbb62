import { ownValue } from "../ownValue.js";
import type { Length, LengthLike } from "../units/index.js";
import { readSeat, soundDepth } from "./measuredDepth.js";
import type { MeasuredSeat } from "./measuredDepth.js";
import { positiveLength } from "./positiveLength.js";

/**
 * Depth of a keyseat along its side wall, from what is measured across to the opposite side.
 *
 * @param seat - real `diameter` of shaft or bore, `width` of the seat, `member`, and the measured `control`: S or
 *   d − t1 of a shaft, T or d + t2 of a hub; any unit
 * @returns the side depth, to the tick, in the unit of `control`: S + side depth + crown is the diameter
 * @throws `KEYSEAT_DEPTH_IMPOSSIBLE`, `KEY_WIDER_THAN_SHAFT`, `KEYED_JOINT_INVALID`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { keyseatSideDepth } from "limitsmith";
 *
 * const seat = { diameter: "50 mm", width: "14 mm", member: "shaft", control: "44.5 mm" } as const;
 * keyseatSideDepth(seat).toString(); // → "4.5 mm"
 * ```
 * @reference ANSI/ASME B17.1-1967, depth control: side depth = D − Y − S in the shaft, T − (D − Y) in the hub
 */
export function keyseatSideDepth(seat: MeasuredSeat & { readonly control: LengthLike }): Length {
  const { inShaft, edge } = readSeat(seat);
  const control = positiveLength(ownValue(seat, "control"), "the measured control dimension", ["control"]);
  const ticks = inShaft ? edge - control.ticks : control.ticks - edge;
  return soundDepth(ticks, "the side depth", control, control);
}
