// Preferred roughness values. µm: ISO 468:1982, series R10 of ISO 3 (3.15, 31.5, 0.0125 written 3.2, 32, 0.012).
// Pairs: recommended Ra values of ASME B46.1 as a handbook lists them, from memory, without those that are a roughness
// grade's (N0 to N11: see roughnessGrades.ts); 3, 6 and 600 µin are no R10 values.
// Rz: ISO 468:1982, first choice, from memory.

/** Ra in µm, finest first. */
export const R10_SERIES_UM: readonly number[] = [
  0.008, 0.01, 0.012, 0.016, 0.02, 0.025, 0.032, 0.04, 0.05, 0.063, 0.08, 0.1,
  0.125, 0.16, 0.2, 0.25, 0.32, 0.4, 0.5, 0.63, 0.8, 1, 1.25, 1.6,
  2, 2.5, 3.2, 4, 5, 6.3, 8, 10, 12.5, 16, 20, 25,
  32, 40, 50, 63, 80, 100,
];

/** Second-choice Ra pairs of the inch series, finest first. */
export const ASME_SECOND_CHOICE: readonly { readonly um: number; readonly uin: number }[] = [
  { um: 0.075, uin: 3 },
  { um: 0.125, uin: 5 },
  { um: 0.15, uin: 6 },
  { um: 0.25, uin: 10 },
  { um: 0.32, uin: 13 },
  { um: 0.5, uin: 20 },
  { um: 0.63, uin: 25 },
  { um: 1, uin: 40 },
  { um: 1.25, uin: 50 },
  { um: 2, uin: 80 },
  { um: 2.5, uin: 100 },
  { um: 4, uin: 160 },
  { um: 5, uin: 200 },
  { um: 8, uin: 320 },
  { um: 10, uin: 400 },
  { um: 15, uin: 600 },
  { um: 20, uin: 800 },
];

/** Rz in µm, finest first. */
export const RZ_SERIES_UM: readonly number[] = [
  0.025, 0.05, 0.1, 0.2, 0.4, 0.8, 1.6, 3.2, 6.3, 12.5, 25, 50,
  100, 200, 400, 800, 1600,
];
