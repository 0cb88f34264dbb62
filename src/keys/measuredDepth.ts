import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { lengthOfTicks } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { chordTicks } from "./crown.js";
import type { KeyseatMember } from "./keyseatValue.js";
import { oneOf } from "./oneOf.js";
import { positiveLength } from "./positiveLength.js";

/** The circle and the width of a keyseat whose depth is turned from one statement into another. */
export interface MeasuredSeat {
  /** Real diameter of the shaft or bore. */
  readonly diameter: LengthLike;
  /** Width of the seat. */
  readonly width: LengthLike;
  /** Shaft or hub. */
  readonly member: KeyseatMember;
}

interface ReadSeat {
  readonly inShaft: boolean;
  readonly diameter: Length;
  /** Ticks from the opposite side to the edges of the seat. */
  readonly edge: number;
}

/** Reads the circle, the width and the member. */
export function readSeat(seat: MeasuredSeat): ReadSeat {
  const diameter = positiveLength(ownValue(seat, "diameter"), "the diameter", ["diameter"]);
  const width = positiveLength(ownValue(seat, "width"), "the width", ["width"]);
  const member = oneOf(ownValue(seat, "member"), ["shaft", "hub"] as const, "shaft or hub", ["member"]);
  return { inShaft: member === "shaft", diameter, edge: chordTicks(diameter, width) };
}

/** A depth that came out of a measurement; it must be over zero and leave something of the shaft. */
export function soundDepth(ticks: number, name: string, given: Length, from: Length): Length {
  if (ticks <= 0) {
    throw new LimitsError("KEYSEAT_DEPTH_IMPOSSIBLE", `${name} would not be over zero`, {
      value: given.toString(),
      allowed: "a measurement that leaves both a keyseat and a shaft",
    });
  }
  return lengthOfTicks(ticks, from.unit);
}
