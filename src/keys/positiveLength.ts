import { LimitsError } from "../errors.js";
import { asLength } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";

/** Takes a length that is over zero. */
export function positiveLength(
  value: LengthLike | undefined,
  what: string,
  path: readonly (string | number)[],
): Length {
  if (value === undefined) {
    throw new LimitsError("KEYED_JOINT_INVALID", `${what} is missing`, { allowed: "a length with its unit", path });
  }
  const length = asLength(value, path);
  if (length.ticks <= 0) {
    throw new LimitsError("KEYED_JOINT_INVALID", `${what} is over zero`, { value: length.toString(), path });
  }
  return length;
}
