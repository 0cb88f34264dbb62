import { LimitsError } from "../errors.js";
import type { LengthUnit } from "./length.js";

/** Ticks of 0.1 nm in one unit; 1 in is exactly 25.4 mm. */
export function ticksPerUnit(unit: LengthUnit): number {
  switch (unit) {
    case "mm":
      return 10_000_000;
    case "um":
      return 10_000;
    case "in":
      return 254_000_000;
    case "thou":
      return 254_000;
    case "uin":
      return 254;
    default:
      throw new LimitsError("UNIT_UNKNOWN", "not a unit of length", {
        value: unit,
        allowed: "mm, um, in, thou, uin",
      });
  }
}
