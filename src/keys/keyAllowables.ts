import { LimitsError } from "../errors.js";
import type { BasisStep } from "../basis.js";
import { ownValue } from "../ownValue.js";
import { asStress, stress } from "../units/index.js";
import type { Stress, StressLike } from "../units/index.js";
import { figures } from "./figures.js";
import type { KeyLoadParts } from "./keyLoad.js";
import type { BearingAllowables } from "./keyLoadValue.js";
import { keyStep } from "./keyStep.js";
import { oneOf } from "./oneOf.js";

/** The stresses that are allowed, the safety factor taken out. */
export interface Allowed {
  readonly shear: Stress | null;
  readonly bearing: Stress | null;
  readonly step: BasisStep | null;
}

/** Reads what the caller allows; there is no default. */
export function allowedStresses(parts: KeyLoadParts): Allowed {
  const allowables = ownValue(parts, "allowables");
  const materials = ownValue(parts, "materials");
  const factor: unknown = ownValue(parts, "safetyFactor");
  if (allowables !== undefined && materials !== undefined) {
    throw new LimitsError("KEY_LOAD_INVALID", "stresses come from allowables or from materials, not from both", {
      allowed: "allowables, or materials",
      path: ["materials"],
    });
  }
  if (factor === undefined && materials !== undefined) throw badFactor(factor);
  const divisor = factor ?? 1;
  if (typeof divisor !== "number" || !Number.isFinite(divisor) || divisor < 1) throw badFactor(divisor);
  if (materials !== undefined) {
    const rule = oneOf(ownValue(materials, "shearRule"), ["0.5", "0.577"] as const, "a rule for shear", [
      "materials",
      "shearRule",
    ]);
    const strengths = ownValue(materials, "yield");
    const ofPart = (name: "key" | "shaft" | "hub"): Stress =>
      positiveStress(ownValue(strengths, name), ["materials", "yield", name]);
    const key = ofPart("key");
    return {
      shear: scaled(key, Number(rule) / divisor),
      bearing: scaled(weakest([key, ofPart("shaft"), ofPart("hub")]), 1 / divisor),
      step: keyStep(
        "the caller",
        "materials",
        `shear ${rule} of the key's yield strength, bearing the least yield strength, both over a safety factor of ${divisor}`,
        "caller",
      ),
    };
  }
  if (allowables === undefined) return { shear: null, bearing: null, step: null };
  const shear = ownValue(allowables, "shear");
  const bearing = ownValue(allowables, "bearing");
  return {
    shear: shear === undefined ? null : scaled(positiveStress(shear, ["allowables", "shear"]), 1 / divisor),
    bearing: bearing === undefined ? null : scaled(leastBearing(bearing), 1 / divisor),
    step: keyStep("the caller", "allowables", `stresses as given, over a safety factor of ${divisor}`, "caller"),
  };
}

function badFactor(value: unknown): LimitsError {
  return new LimitsError(
    "KEY_LOAD_INVALID",
    "a safety factor is a number from 1 up; with yield strengths it must be said",
    {
      value,
      allowed: "such as 3",
      path: ["safetyFactor"],
    },
  );
}

function leastBearing(bearing: StressLike | BearingAllowables<StressLike>): Stress {
  const path = ["allowables", "bearing"];
  if (typeof bearing === "string" || ownValue(bearing as { readonly unit?: unknown }, "unit") !== undefined) {
    return positiveStress(bearing as StressLike, path);
  }
  const parts = bearing as BearingAllowables<StressLike>;
  return weakest(
    (["key", "shaft", "hub"] as const).map((name) => positiveStress(ownValue(parts, name), [...path, name])),
  );
}

function positiveStress(value: StressLike | undefined, path: readonly string[]): Stress {
  if (value === undefined) {
    throw new LimitsError("KEY_LOAD_INVALID", "a stress is missing", { allowed: 'such as "100 MPa"', path });
  }
  const given = asStress(value, path);
  if (given.value > 0) return given;
  throw new LimitsError("KEY_LOAD_INVALID", "a stress is over zero here", { value: given.toString(), path });
}

function weakest(stresses: readonly Stress[]): Stress {
  return stresses.reduce((least, one) => (one.to("MPa") < least.to("MPa") ? one : least));
}

function scaled(given: Stress, factor: number): Stress {
  return stress(figures(given.value * factor), given.unit);
}
