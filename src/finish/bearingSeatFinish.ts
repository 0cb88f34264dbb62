import type { Basis, Caution, Mark } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { parseToleranceClass } from "../iso286/index.js";
import { asLength } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { gradeNumberOf } from "./gradeRows.js";
import { firstChoiceValues, umLength } from "./preferredValues.js";
import { BEARING_SEATS } from "./tables/bearingSeats.js";
import type { SeatRow } from "./tables/bearingSeats.js";

/** What is known of a seat. */
export interface BearingSeatQuestion {
  /** Diameter of the seat, over 3 up to 1250 mm. */
  readonly diameter: LengthLike;
  /** Grade of the diameter tolerance, IT5, IT6 or IT7, or a tolerance class such as `"h6"` or `"J7"`. */
  readonly tolerance: string;
  /** `"turned housing"` allows one class more; `"ground"` unless said otherwise. */
  readonly surface?: "ground" | "turned housing";
}

/** The roughness of a bearing seat. */
export interface BearingSeatFinish {
  /** Upper limit of Ra, in µm. */
  readonly ra: Length;
  /** Grade that was looked up. */
  readonly grade: "IT5" | "IT6" | "IT7";
  /** Where it comes from. */
  readonly basis: Basis;
  /** What to weigh before relying on it. */
  readonly cautions: readonly Caution[];
}

const TICKS_PER_MM = 10_000_000;

/**
 * The roughness that bearing makers ask of a rolling-bearing seat.
 *
 * @param question - `diameter` in any unit, over 3 up to 1250 mm; `tolerance`: a grade or a class; `surface`
 * @returns the frozen upper limit of Ra, in µm
 * @throws `FINISH_NOT_TABULATED` for another grade or diameter, `OPTION_INVALID`, `CLASS_GRADE_UNKNOWN`, `CLASS_MALFORMED`,
 *   `CLASS_LETTER_UNKNOWN`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { bearingSeatFinish } from "limitsmith";
 *
 * bearingSeatFinish({ diameter: "45 mm", tolerance: "m6" }).ra.toString(); // → "0.8 µm"
 * bearingSeatFinish({ diameter: "120 mm", tolerance: "J7", surface: "turned housing" }).ra.toString(); // → "3.2 µm"
 * ```
 * @reference two bearing makers' published tables of Ra for seats; over 500 mm from memory; turned housing bores one
 *   class rougher: a third bearing maker's page
 */
export function bearingSeatFinish(question: BearingSeatQuestion): BearingSeatFinish {
  const diameter = asLength(ownValue(question, "diameter") as LengthLike, ["diameter"]);
  const grade = gradeOf(ownValue(question, "tolerance"));
  const surface: unknown = ownValue(question, "surface") ?? "ground";
  if (surface !== "ground" && surface !== "turned housing") {
    throw new LimitsError("OPTION_INVALID", "not a surface of a seat", {
      value: surface,
      allowed: "ground, turned housing",
    });
  }
  const row = BEARING_SEATS.find(
    ({ over, to }) => diameter.ticks > over * TICKS_PER_MM && diameter.ticks <= to * TICKS_PER_MM,
  );
  if (row === undefined || grade === null) {
    throw new LimitsError("FINISH_NOT_TABULATED", "the table of bearing seats has no value here", {
      value: `${diameter.toString()}, ${String(ownValue(question, "tolerance"))}`,
      allowed: "IT5, IT6, IT7, over 3 up to 1250 mm",
    });
  }
  const ground = umLength(row[grade]);
  const coarser = firstChoiceValues("um").find((one) => one.ticks > ground.ticks) ?? ground;
  return Object.freeze({
    ra: surface === "ground" ? ground : coarser,
    grade,
    basis: Object.freeze(steps(row, grade, surface === "ground" ? null : coarser)),
    cautions: Object.freeze([MAKER]),
  });
}

function gradeOf(tolerance: unknown): "IT5" | "IT6" | "IT7" | null {
  const text = typeof tolerance === "string" ? tolerance.trim() : "";
  const number = gradeNumberOf(text.startsWith("IT") ? text : parseToleranceClass(text).grade);
  return number === 5 ? "IT5" : number === 6 ? "IT6" : number === 7 ? "IT7" : null;
}

function steps(row: SeatRow, grade: "IT5" | "IT6" | "IT7", turned: Length | null): Basis {
  const mark: Mark = grade === "IT6" ? row.markIT6 : row.mark;
  const step = (place: string, says: string, sure: Mark): Basis[number] =>
    Object.freeze({ standard: "bearing makers' published tables", place, says, how: "common practice", mark: sure });
  const table = step(`Ra for ground seats, ${grade}, over ${row.over} up to ${row.to} mm`, `Ra ${row[grade]} µm`, mark);
  if (turned === null) return [table];
  return [table, step("fine-turned housing seats", `one class rougher: Ra ${turned.toString()}`, "one-source")];
}

const MAKER: Caution = Object.freeze({
  code: "FINISH_COMMON_PRACTICE",
  says: "common practice, no standard: the maker of the bearing has the last word",
});
