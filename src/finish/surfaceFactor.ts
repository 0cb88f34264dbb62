import type { Basis, Caution } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asStress } from "../units/index.js";
import type { Stress, StressLike } from "../units/index.js";
import { SURFACE_FACTORS } from "./tables/surfaceFactors.js";
import type { SurfaceCondition, SurfaceFactorSet } from "./tables/surfaceFactors.js";

/** What the surface factor needs. */
export interface SurfaceFactorQuestion {
  /** The finish of the surface. */
  readonly finish: SurfaceCondition;
  /** The minimum ultimate tensile strength that the certificate or the order promises; over 0 up to 4000 MPa. */
  readonly minimumUltimateStrength: StressLike;
  /** Coefficient set by edition; `"8th to 10th edition"` unless said otherwise. */
  readonly set?: SurfaceFactorSet;
}

/** A surface factor and what it was worked out with. */
export interface SurfaceFactor {
  /** k_a, a plain number, to four decimals, never over 1. */
  readonly factor: number;
  /** True where the formula gives more than 1 and the cap holds. */
  readonly capped: boolean;
  /** The set of coefficients, by its name. */
  readonly set: SurfaceFactorSet;
  /** The finish of the surface. */
  readonly finish: SurfaceCondition;
  /** Ultimate strength of the material. */
  readonly strength: Stress;
  /** Coefficient a, for the unit beside it. */
  readonly a: number;
  /** The unit of strength that `a` belongs to. */
  readonly aUnit: "MPa" | "ksi";
  /** Exponent of the set. */
  readonly b: number;
  /** Coefficient of variation; stochastic set only, `null` elsewhere. */
  readonly variation: number | null;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

/**
 * The fatigue surface factor by the textbook power form: k_a = a Sut^b, at most 1.
 *
 * A strength in MPa goes with the coefficients for MPa, one in ksi or psi with those for ksi; the two differ by up to
 * 0.3 %, as printed.
 *
 * @param question - `finish`, `minimumUltimateStrength` in MPa, ksi or psi, `set`
 * @returns the frozen factor (a plain number to four decimals), the set by its name, coefficients and their unit
 * @throws `OPTION_INVALID` for another finish, set or a strength outside the range, `QUANTITY_INVALID`, `UNIT_MISSING`,
 *   `UNIT_UNKNOWN`
 * @example
 * ```ts
 * import { surfaceFactor } from "limitsmith";
 *
 * const question = { finish: "machined or cold-drawn", minimumUltimateStrength: "90 ksi" } as const;
 * surfaceFactor(question).factor; // → 0.8194
 * surfaceFactor({ ...question, set: "11th edition" }).factor; // → 0.7533
 * surfaceFactor({ finish: "ground", minimumUltimateStrength: "200 MPa" }).capped; // → true
 * ```
 * @reference Shigley's Mechanical Engineering Design: 8th to 10th ed., Table 6-2; 11th ed. (2020), Table 6-2, from memory;
 *   9th ed., Table 6-10 (stochastic method, mean values)
 */
export function surfaceFactor(question: SurfaceFactorQuestion): SurfaceFactor {
  const strength = strengthOf(ownValue(question, "minimumUltimateStrength"));
  const name: unknown = ownValue(question, "set") ?? "8th to 10th edition";
  const table = SURFACE_FACTORS.find((one) => one.set === name);
  const finish: unknown = ownValue(question, "finish");
  const row = table?.rows.find((one) => one.finish === finish);
  if (table === undefined || row === undefined) {
    throw new LimitsError("OPTION_INVALID", "no coefficients of this finish and set", {
      value: `${String(finish)}, ${String(name)}`,
      allowed: `finish ground, machined or cold-drawn, hot-rolled, as-forged; set ${SURFACE_FACTORS.map((one) => one.set).join("; ")}`,
    });
  }
  const aUnit = strength.unit === "MPa" ? "MPa" : "ksi";
  const a = aUnit === "MPa" ? row.aMpa : row.aKsi;
  const uncapped = a * Math.pow(strength.to(aUnit), row.b);
  return Object.freeze({
    factor: toFour(Math.min(1, uncapped)),
    capped: uncapped > 1,
    set: table.set,
    finish: row.finish,
    strength,
    a,
    aUnit,
    b: row.b,
    variation: row.variation,
    basis: Object.freeze([
      Object.freeze({
        standard: table.standard,
        place: `${table.place}, ${row.finish}`,
        says: `k_a = ${a} Sut^${row.b} with Sut in ${aUnit}, at most 1`,
        how: "tabulated" as const,
        mark: table.mark,
      }),
    ]),
    cautions: Object.freeze([FATIGUE_CAUTION, STRENGTH_CAUTION]),
  });
}

/** A strength that steels and irons can have. */
export function strengthOf(value: StressLike | undefined): Stress {
  const strength = asStress(value as StressLike, ["minimumUltimateStrength"]);
  const inMpa = strength.to("MPa");
  if (!(inMpa > 0 && inMpa <= 4000)) {
    throw new LimitsError("OPTION_INVALID", "no material has this ultimate tensile strength", {
      value: strength.toString(),
      allowed: "over 0 up to 4000 MPa (580 ksi)",
      path: ["minimumUltimateStrength"],
    });
  }
  return strength;
}

/** A factor without the noise of a double: four decimals are more than the fit is worth. */
export function toFour(value: number): number {
  return Math.round(value * 10_000) / 10_000;
}

export const FATIGUE_CAUTION: Caution = Object.freeze({
  code: "FATIGUE_ESTIMATE",
  says:
    "an estimate fitted to old tests: parts in fatigue can hurt people; the engineer of record decides, by local codes " +
    "and by tests",
});

export const STRENGTH_CAUTION: Caution = Object.freeze({
  code: "FATIGUE_MINIMUM_STRENGTH",
  says:
    "worked out with the minimum strength that is promised; a stronger delivery has a smaller factor, so do not pair this " +
    "factor with a higher strength",
});
