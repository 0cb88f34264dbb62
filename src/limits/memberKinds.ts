import { LimitsError } from "../errors.js";

/**
 * The kinds of member to look among: the one asked for, or both.
 *
 * @param kind - `"hole"`, `"shaft"`, or `undefined` for both (no unit)
 * @returns a list of one or two kinds, holes first (no unit)
 * @throws `OPTION_INVALID` for anything else
 * @example
 * ```ts
 * import { memberKinds } from "limitsmith";
 *
 * memberKinds(undefined); // → ["hole", "shaft"]
 * memberKinds("shaft"); // → ["shaft"]
 * ```
 * @reference none: a convenience of this library, the same for ISO and inch classes
 */
export function memberKinds(kind: "hole" | "shaft" | undefined): readonly ("hole" | "shaft")[] {
  if (kind === undefined) return ["hole", "shaft"];
  const given: unknown = kind;
  if (given !== "hole" && given !== "shaft") {
    throw new LimitsError("OPTION_INVALID", "a class is of a hole or a shaft", {
      value: given,
      allowed: "hole, shaft",
    });
  }
  return [given];
}
