/** Published tables that differ in the rows of RC2 and RC4 over 9.85 in. */
export type InchFitReading = "handbook" | "textbook appendix";

/** A reading with what speaks for it. */
export interface InchFitReadingFacts {
  /** Name to choose it by. */
  readonly name: InchFitReading;
  /** Where it was read, and what speaks for it. */
  readonly says: string;
}

/** Name of the reading that counts unless said otherwise. */
export const USUAL_READING: InchFitReading = "handbook";

const READINGS: readonly InchFitReadingFacts[] = Object.freeze(
  (
    [
      {
        name: "handbook",
        says:
          "Two editions of a machinist's handbook, RC2 and RC4 over 9.85 in: the least clearance is that of RC1 and RC3, " +
          "as in all smaller sizes.",
      },
      {
        name: "textbook appendix",
        says:
          "An engineering text's appendix to ANSI/ASME B4.1-1967 (R2004), RC2 and RC4 over 9.85 in: the shafts keep the " +
          "letter of their symbol, g and f, as in the LC classes.",
      },
    ] as const
  ).map((one) => Object.freeze(one)),
);

/**
 * The readings to choose from where published tables differ: RC2 and RC4 over 9.85 in. It is not settled which is right.
 *
 * @returns a frozen list (no unit); the first one counts unless another is asked for
 * @throws nothing
 * @example
 * ```ts
 * import { inch, inchFit, inchFitReadings } from "limitsmith";
 *
 * inchFitReadings().map((one) => one.name); // → ["handbook", "textbook appendix"]
 * inchFit(inch(12), "RC4").shaft.max.toString(); // → "11.9975 in"
 * inchFit(inch(12), "RC4", { reading: "textbook appendix" }).shaft.max.toString(); // → "11.9978 in"
 * ```
 * @reference ANSI B4.1-1967, running and sliding fits, as two handbook editions and one textbook appendix print them
 */
export function inchFitReadings(): readonly InchFitReadingFacts[] {
  return READINGS;
}
