import { LimitsError } from "../errors.js";
import { atPath } from "../located.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import { limits } from "./limits.js";
import type { Limits, LimitsLike } from "./limitsValue.js";

const DERIVED = ["max", "min", "tolerance", "mean"] as const;

/**
 * Takes limits in any shape they can travel in and gives {@link Limits}.
 *
 * Limits are known by their data: what comes back from JSON, `structuredClone`, a worker or another copy of
 * the package is still limits. Sizes that contradict the nominal and its deviations are refused.
 *
 * @param value - limits as made here, or as data whose lengths carry their units
 * @param path - keys that lead to the value in the caller's data, for the error
 * @returns frozen limits, each length in its own unit
 * @throws `LIMITS_INVALID`, `LIMITS_CONTRADICT`, `LIMITS_UPSIDE_DOWN`, `LENGTH_INVALID`, and what
 *   `readLength` throws for a text
 * @example
 * ```ts
 * import { asLimits, limits } from "limitsmith";
 *
 * const sent = JSON.stringify(limits({ nominal: "40 mm", upper: "25 µm", lower: "9 µm" }));
 * asLimits(JSON.parse(sent)).max.toString(); // → "40.025 mm"
 * ```
 * @reference none: a convenience of this library
 */
export function asLimits(value: LimitsLike, path: readonly (string | number)[] = []): Limits {
  const given: unknown = value;
  if (typeof given !== "object" || given === null) {
    throw new LimitsError("LIMITS_INVALID", "limits are needed here", {
      value: given,
      allowed: "Limits, or their data { nominal, upperDeviation, lowerDeviation }",
      path,
    });
  }
  const upper = ownValue(value, "upperDeviation");
  const lower = ownValue(value, "lowerDeviation");
  const nominal = ownValue(value, "nominal");
  if (nominal === undefined || upper === undefined || lower === undefined) {
    throw new LimitsError("LIMITS_INVALID", "limits are needed here", {
      value: given,
      allowed: "nominal, upperDeviation and lowerDeviation, each a length with its unit",
      path,
    });
  }
  const basis = ownValue(value, "basis");
  const parts = {
    nominal: asLength(nominal, [...path, "nominal"]),
    upper: asLength(upper, [...path, "upperDeviation"]),
    lower: asLength(lower, [...path, "lowerDeviation"]),
    designation: ownValue(value, "designation") ?? null,
    ...(basis === undefined ? {} : { basis }),
  };
  const made = atPath(path, () => limits(parts));
  for (const name of DERIVED) {
    const stated = ownValue(value, name);
    if (stated !== undefined && asLength(stated, [...path, name]).ticks !== made[name].ticks) {
      throw new LimitsError("LIMITS_CONTRADICT", `${name} does not follow from the nominal and its deviations`, {
        value: asLength(stated).toString(),
        allowed: made[name].toString(),
        path: [...path, name],
      });
    }
  }
  return made;
}
