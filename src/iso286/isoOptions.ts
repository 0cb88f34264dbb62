import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";

/** Editions of ISO 286-1 that differ in what they define: cd, ef, fg end at 10 mm in 1988 and at 50 mm in 2010. */
export type IsoEdition = "2010" | "1988";

/** Options of the functions that work out a class. */
export interface IsoOptions {
  /** `"2010"` unless said otherwise. */
  readonly edition?: IsoEdition;
  /**
   * What becomes of an odd grade in js7 to js11 and JS7 to JS11: `"exact"` keeps the half micrometre,
   * `"even"` drops the grade to the even number below, as a note of the 1988 edition allows. `"exact"` unless
   * said otherwise.
   */
  readonly jsRounding?: "exact" | "even";
}

/** Options with every choice made. */
export interface ChosenIsoOptions {
  readonly edition: IsoEdition;
  readonly jsRounding: "exact" | "even";
}

export const DEFAULT_ISO_OPTIONS: ChosenIsoOptions = { edition: "2010", jsRounding: "exact" };

/** Reads the options; anything unknown is refused. */
export function isoOptions(options: IsoOptions | undefined): ChosenIsoOptions {
  if (options === undefined) return DEFAULT_ISO_OPTIONS;
  const edition: unknown = ownValue(options, "edition") ?? "2010";
  const jsRounding: unknown = ownValue(options, "jsRounding") ?? "exact";
  if (edition !== "2010" && edition !== "1988") {
    throw new LimitsError("OPTION_INVALID", "not an edition of ISO 286-1", { value: edition, allowed: "2010, 1988" });
  }
  if (jsRounding !== "exact" && jsRounding !== "even") {
    throw new LimitsError("OPTION_INVALID", "not a rule for js", { value: jsRounding, allowed: "exact, even" });
  }
  return edition === "2010" && jsRounding === "exact" ? DEFAULT_ISO_OPTIONS : { edition, jsRounding };
}
