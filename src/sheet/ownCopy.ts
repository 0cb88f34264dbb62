import { LimitsError } from "../errors.js";

const DEEPEST = 12;

/**
 * Copies JSON data by own keys into objects without a prototype, so that nothing inherited is ever read.
 * What JSON cannot hold is refused.
 */
export function ownCopy(value: unknown, path: readonly (string | number)[] = []): unknown {
  if (value === null || typeof value === "string" || typeof value === "boolean") return value;
  if (typeof value === "number" && Number.isFinite(value)) return value;
  if (typeof value !== "object") throw invalid("JSON data is needed here", value, path);
  if (path.length > DEEPEST) throw invalid("the data is nested too deep for a drawing", value, path);
  if (Array.isArray(value)) return value.map((item: unknown, index) => ownCopy(item, [...path, index]));
  const copy = Object.create(null) as Record<string, unknown>;
  for (const [key, item] of Object.entries(value)) {
    if (item !== undefined) copy[key] = ownCopy(item, [...path, key]);
  }
  return copy;
}

function invalid(message: string, value: unknown, path: readonly (string | number)[]): LimitsError {
  return new LimitsError("SHEET_INVALID", message, { value, path, allowed: "what JSON.parse gives" });
}
