import type { Mark } from "../basis.js";
import type { Length } from "../units/index.js";
import { uinLength, umLength } from "./preferredValues.js";
import { ROUGHNESS_GRADES } from "./tables/roughnessGrades.js";

/** A roughness grade number and its two values. */
export interface RoughnessGrade {
  /** `"N01"`, `"N0"`, `"N1"` to `"N14"`. */
  readonly grade: string;
  /** Ra in µm. */
  readonly um: Length;
  /** The paired Ra in µin; `null` for N01, whose 0.25 µin is no whole number of 0.1 nm. */
  readonly uin: Length | null;
  /** True for N1 to N12, the first-choice values. */
  readonly firstChoice: boolean;
  /** Which of the two is the narrower limit, taken exactly; `null` where one is missing. */
  readonly tighter: "um" | "uin" | null;
  /** How sure the value is. */
  readonly mark: Mark;
}

/**
 * All roughness grade numbers with their paired values.
 *
 * @returns a frozen list, finest first, Ra in µm and in µin
 * @throws nothing
 * @example
 * ```ts
 * import { roughnessGrades } from "limitsmith";
 *
 * roughnessGrades().filter((one) => one.firstChoice && one.tighter === "uin").map((one) => one.grade); // → ["N8"]
 * ```
 * @reference roughness grade numbers as in use before ISO 1302:2002: published µm and µin tables
 */
export function roughnessGrades(): readonly RoughnessGrade[] {
  return Object.freeze(
    ROUGHNESS_GRADES.map((row) => {
      const um = umLength(row.um);
      const uin = row.uin === null ? null : uinLength(row.uin);
      const tighter = uin === null ? null : uin.ticks < um.ticks ? ("uin" as const) : ("um" as const);
      return Object.freeze({ grade: row.grade, um, uin, firstChoice: row.firstChoice, tighter, mark: row.mark });
    }),
  );
}
