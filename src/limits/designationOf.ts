import { LimitsError } from "../errors.js";

/** A class designation from a caller's data: a text, or `null` where there is none. */
export function designationOf(value: unknown): string | null {
  if (value === undefined || value === null) return null;
  if (typeof value === "string") return value;
  throw new LimitsError("LIMITS_INVALID", "a designation is a text", {
    value,
    allowed: 'such as "m6", or null',
    path: ["designation"],
  });
}
