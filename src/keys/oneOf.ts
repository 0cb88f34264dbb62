import { LimitsError } from "../errors.js";

/** Takes a choice that is among the allowed ones; anything else is refused. */
export function oneOf<T extends string | number>(
  value: unknown,
  allowed: readonly T[],
  what: string,
  path: readonly (string | number)[] = [],
): T {
  const found = allowed.find((one) => one === value);
  if (found === undefined) {
    throw new LimitsError("OPTION_INVALID", value === undefined ? `say ${what}` : `not ${what}`, {
      value,
      allowed: allowed.join(", "),
      path,
    });
  }
  return found;
}
