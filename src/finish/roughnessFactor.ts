import type { Basis, BasisStep, Caution } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import type { Length, LengthLike, Stress, StressLike } from "../units/index.js";
import { FATIGUE_CAUTION, STRENGTH_CAUTION, strengthOf, toFour } from "./surfaceFactor.js";
import { ROUGHNESS_FACTORS } from "./tables/roughnessFactors.js";
import type { RoughnessFactorRow } from "./tables/roughnessFactors.js";

/** What the roughness factor needs. */
export interface RoughnessFactorQuestion {
  /** Such as `"steel"`, `"cast steel"`, `"grey cast iron"`, `"wrought aluminium"`. */
  readonly material: string;
  /** The minimum ultimate tensile strength that the certificate or the order promises; over 0 up to 4000 MPa. */
  readonly minimumUltimateStrength: StressLike;
  /** Rz of the drawing, not Ra; over 0 up to 1 mm. */
  readonly rz: LengthLike;
}

/** Factors for shear or torsion; steel only. */
export interface ShearFactors {
  /** By the FKM guideline with f = 0.577, from memory. */
  readonly fkm: number;
  /** By DIN 743: 0.575 K + 0.425, from memory. */
  readonly din743: number;
}

/** A roughness factor and what it was worked out with. */
export interface RoughnessFactor {
  /** K_R for normal stress, a plain number to four decimals, never over 1. For steel also the bending factor of DIN 743. */
  readonly factor: number;
  /** True where the surface counts as polished (Rz up to 1 µm) or the formula gives more than 1. */
  readonly capped: boolean;
  /** `null` for materials other than steel. */
  readonly shear: ShearFactors | null;
  /** Group of materials that the form is for. */
  readonly material: string;
  /** Ultimate strength of the material. */
  readonly strength: Stress;
  /** The Rz that belongs to it. */
  readonly rz: Length;
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

const MOST_RZ_TICKS = 10_000_000;
const POLISHED_TICKS = 10_000;

/**
 * The fatigue roughness factor by the roughness itself: K_R = 1 − a_R log10(Rz) log10(2 Rm / Rm,N,min), Rz in µm and
 * Rm in MPa, at most 1.
 *
 * @param question - `material`, `minimumUltimateStrength` in MPa, ksi or psi, `rz` as a length in any unit
 * @returns the frozen factor (a plain number to four decimals), 1 for Rz up to 1 µm, with the constants in the basis
 * @throws `OPTION_INVALID` for another material or a strength outside the range, `ROUGHNESS_INVALID` for an Rz outside over
 *   0 up to 1 mm, `QUANTITY_INVALID`, `UNIT_MISSING`, `UNIT_UNKNOWN`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { roughnessFactor } from "limitsmith";
 *
 * const steel = { material: "steel", minimumUltimateStrength: "800 MPa" };
 * roughnessFactor({ ...steel, rz: "16 µm" }).factor; // → 0.8405
 * roughnessFactor({ ...steel, rz: "1 µm" }).factor; // → 1
 * ```
 * @reference FKM guideline Analytical Strength Assessment, as an engineering article prints it; DIN 743, from memory
 */
export function roughnessFactor(question: RoughnessFactorQuestion): RoughnessFactor {
  const strength = strengthOf(ownValue(question, "minimumUltimateStrength"));
  const material: unknown = ownValue(question, "material");
  const row = ROUGHNESS_FACTORS.find((one) => one.material === material);
  if (row === undefined) {
    throw new LimitsError("OPTION_INVALID", "no constants of this material", {
      value: material,
      allowed: ROUGHNESS_FACTORS.map((one) => one.material).join(", "),
    });
  }
  const rz = asLength(ownValue(question, "rz") as LengthLike, ["rz"]);
  if (rz.ticks <= 0 || rz.ticks > MOST_RZ_TICKS) {
    throw new LimitsError("ROUGHNESS_INVALID", "no surface has this Rz", {
      value: rz.toString(),
      allowed: "over 0 up to 1 mm",
      path: ["rz"],
    });
  }
  const loss = rz.ticks <= POLISHED_TICKS ? 0 : lossOf(row, rz.to("um"), strength.to("MPa"));
  const steel = row.material === "steel";
  return Object.freeze({
    factor: toFour(1 - Math.max(0, loss)),
    capped: loss <= 0,
    shear: steel ? shearOf(Math.max(0, loss)) : null,
    material: row.material,
    strength,
    rz,
    basis: Object.freeze(steps(row, steel)),
    cautions: Object.freeze([FATIGUE_CAUTION, STRENGTH_CAUTION, ...rangeCaution(row, strength)]),
  });
}

function lossOf(row: RoughnessFactorRow, rzUm: number, strengthMpa: number): number {
  return row.aR * Math.log10(rzUm) * Math.log10((2 * strengthMpa) / row.leastStrengthMpa);
}

function shearOf(loss: number): ShearFactors {
  return Object.freeze({ fkm: toFour(1 - 0.577 * loss), din743: toFour(0.575 * (1 - loss) + 0.425) });
}

function steps(row: RoughnessFactorRow, steel: boolean): BasisStep[] {
  const guideline = Object.freeze({
    standard: "FKM guideline Analytical Strength Assessment",
    place: `roughness factor, ${row.material}`,
    says: `K_R = 1 - ${row.aR} log10(Rz) log10(2 Rm / ${row.leastStrengthMpa}), Rz in µm, Rm in MPa; 1 for Rz up to 1 µm`,
    how: "tabulated" as const,
    mark: "one-source" as const,
  });
  if (!steel) return [guideline];
  const shear = Object.freeze({
    standard: "FKM guideline; DIN 743",
    place: "shear and torsion, steel",
    says: "FKM: 1 - 0.577 (1 - K_R); DIN 743: 0.575 K + 0.425, its K for bending the same as K_R",
    how: "tabulated" as const,
    mark: "memory" as const,
  });
  return [guideline, shear];
}

function rangeCaution({ leastStrengthMpa }: RoughnessFactorRow, strength: Stress): Caution[] {
  if (strength.to("MPa") >= leastStrengthMpa) return [];
  const says = `the constants are meant for ${leastStrengthMpa} MPa and more; below, the factor comes out too high`;
  return [Object.freeze({ code: "FATIGUE_STRENGTH_BELOW_RANGE", says })];
}
