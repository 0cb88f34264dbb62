import type { LengthUnit } from "./length.js";

/** The symbol that follows a number on paper. */
export function unitSymbol(unit: LengthUnit): string {
  if (unit === "um") return "µm";
  if (unit === "uin") return "µin";
  return unit;
}
