// Roughness factor K_R = 1 - a_R log10(Rz) log10(2 Rm / Rm,N,min) of the FKM guideline Analytical Strength Assessment:
// constants and guide values of Rz as an engineering article prints them (one source).

/** Constants of one group of materials; strength in MPa. */
export interface RoughnessFactorRow {
  readonly material: string;
  readonly aR: number;
  readonly leastStrengthMpa: number;
}

/** Constants by material. */
export const ROUGHNESS_FACTORS: readonly RoughnessFactorRow[] = [
  { material: "steel", aR: 0.22, leastStrengthMpa: 400 },
  { material: "cast steel", aR: 0.2, leastStrengthMpa: 400 },
  { material: "nodular cast iron", aR: 0.16, leastStrengthMpa: 400 },
  { material: "malleable cast iron", aR: 0.12, leastStrengthMpa: 350 },
  { material: "grey cast iron", aR: 0.06, leastStrengthMpa: 100 },
  { material: "wrought aluminium", aR: 0.22, leastStrengthMpa: 133 },
  { material: "cast aluminium", aR: 0.2, leastStrengthMpa: 133 },
];

/** Guide values of Rz in µm, much coarser than real machined surfaces. */
export const RZ_GUIDE: readonly { readonly surface: string; readonly rz: number }[] = [
  { surface: "ground", rz: 12.5 },
  { surface: "machined", rz: 100 },
  { surface: "poorly machined", rz: 200 },
  { surface: "rolled", rz: 200 },
  { surface: "cast", rz: 200 },
];
