/** Ratios of an ideal profile: plain numbers, to four decimals. */
export interface IdealProfile {
  /** The profile. */
  readonly profile: "sine" | "triangle" | "parabolic feed marks" | "square" | "Gaussian heights";
  /** Rq over Ra. */
  readonly rqOverRa: number;
  /** Rt over Ra; `null` where the profile has no largest height. */
  readonly rtOverRa: number | null;
}

/**
 * What ideal profiles have for Rq/Ra and Rt/Ra: why no single factor turns one into the other.
 *
 * @returns a frozen list of ratios (no unit), rounded to four decimals
 * @throws nothing
 * @example
 * ```ts
 * import { idealProfiles } from "limitsmith";
 *
 * idealProfiles().map((one) => one.rqOverRa); // → [1.1107, 1.1547, 1.1619, 1, 1.2533]
 * ```
 * @reference integrals over one period: sine π/(2√2) and π, triangle 2/√3 and 4, parabola 3√3/(2√5) and 9√3/4,
 *   square 1 and 2, Gaussian √(π/2)
 */
export function idealProfiles(): readonly IdealProfile[] {
  return Object.freeze([
    ratios("sine", Math.PI / Math.sqrt(8), Math.PI),
    ratios("triangle", 2 / Math.sqrt(3), 4),
    ratios("parabolic feed marks", (3 * Math.sqrt(3)) / (2 * Math.sqrt(5)), (9 * Math.sqrt(3)) / 4),
    ratios("square", 1, 2),
    ratios("Gaussian heights", Math.sqrt(Math.PI / 2), null),
  ]);
}

function ratios(profile: IdealProfile["profile"], rqOverRa: number, rtOverRa: number | null): IdealProfile {
  const toFour = (value: number): number => Math.round(value * 10_000) / 10_000;
  return Object.freeze({ profile, rqOverRa: toFour(rqOverRa), rtOverRa: rtOverRa === null ? null : toFour(rtOverRa) });
}
