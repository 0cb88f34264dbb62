import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLength, subtract } from "../units/index.js";
import type { WantedClearance } from "./rankFits.js";

/** Both ends of a clearance range in ticks; checked. */
export function wantedTicks(wanted: WantedClearance): { min: number; max: number } {
  const given: unknown = wanted;
  const least = typeof given === "object" && given !== null ? ownValue(wanted, "min") : undefined;
  const most = typeof given === "object" && given !== null ? ownValue(wanted, "max") : undefined;
  if (least === undefined || most === undefined) {
    throw new LimitsError("LIMITS_INVALID", "the wanted clearance has a min and a max", {
      value: given,
      allowed: "{ min, max }, each a length with its unit; negative is interference",
      path: ["clearance"],
    });
  }
  const min = asLength(least, ["clearance", "min"]);
  const max = asLength(most, ["clearance", "max"]);
  if (subtract(max, min).ticks < 0) {
    throw new LimitsError("LIMITS_UPSIDE_DOWN", "the wanted max clearance lies below the min", {
      value: `${min.toString()} to ${max.toString()}`,
      path: ["clearance"],
    });
  }
  return { min: min.ticks, max: max.ticks };
}
