import { LimitsError } from "../errors.js";
import { formByIso2768 } from "./formByIso2768.js";
import { formInTable } from "./formInTable.js";
import type { FoundForm } from "./formInTable.js";
import { characteristicOf, neededLength, notLimited } from "./formQuestion.js";
import { NOT_A_REJECT, PART_2_BY_DATE, PART_2_WITHDRAWN, cautionsFor } from "./generalCautions.js";
import type { FormQuestion, FormTolerance } from "./generalFormValue.js";
import { generalTolerance } from "./generalTolerance.js";
import type {
  GeneralTolerance,
  GeneralToleranceLike,
  Iso13920Form,
  WeldmentIndication,
} from "./generalToleranceValue.js";
import { ISO_13920_FORM } from "./tables/iso13920Form.js";

/**
 * The general tolerance of geometry by ISO 2768-2:1989 (H, K, L) or ISO 13920 (E to H).
 *
 * Roundness is the smaller of the diameter's tolerance and the run-out; parallelism is the larger of the size tolerance
 * between the features and the straightness or flatness; cylindricity and coaxiality have no value of their own.
 * ISO 2768-2 was withdrawn in 2021: its results say so in `cautions`.
 *
 * @param standard - the indication, see {@link generalTolerance}: ISO 2768 with H, K, L or ISO 13920 with E to H
 * @param question - the `characteristic`, with the lengths that it goes by (any unit), see {@link FormQuestion}
 * @returns the frozen total tolerance in mm (a size tolerance in its own unit), the datum, basis and cautions
 * @throws `GENERAL_TOLERANCE_NOT_CALLED` where the indication has no class for geometry (or, for a size tolerance to
 *   be looked up, none for sizes), `GENERAL_TOLERANCE_NOT_DEFINED` for what the standard does not limit,
 *   `GENERAL_TOLERANCE_OUT_OF_RANGE`, `OPTION_INVALID`, `LENGTH_INVALID`, and what {@link generalTolerance} throws
 * @example
 * ```ts
 * import { generalFormTolerance, mm } from "limitsmith";
 *
 * const flat = generalFormTolerance("ISO 2768-mK", { characteristic: "flatness", length: mm(100) });
 * flat.tolerance.toString(); // → "0.2 mm"
 * flat.cautions[0]?.code; // → "GENERAL_PART_2_WITHDRAWN"
 * const round = generalFormTolerance("ISO 2768-mK", { characteristic: "roundness", diameter: mm(25) });
 * round.tolerance.toString(); // → "0.2 mm"
 * generalFormTolerance("ISO 2768-mK", { characteristic: "cylindricity" }); // throws GENERAL_TOLERANCE_NOT_DEFINED
 * ```
 * @reference ISO 2768-2:1989, Tables 1 to 4 and clause 5 for roundness and parallelism; ISO 13920:2023, Table 3
 */
export function generalFormTolerance(standard: GeneralToleranceLike, question: FormQuestion): FormTolerance {
  const called = generalTolerance(standard);
  const characteristic = characteristicOf(question);
  const { tolerance, steps } = found(called, question);
  const basis = Object.freeze([
    Object.freeze({ standard: "the caller", place: "general tolerance", says: called.text, how: "caller" as const }),
    ...steps.map((step) => Object.freeze(step)),
  ]);
  const cautions =
    called.standard === "ISO 2768" ? [called.geometryDated ? PART_2_BY_DATE : PART_2_WITHDRAWN, NOT_A_REJECT] : [];
  return Object.freeze({
    characteristic,
    tolerance,
    datum: steps.find(({ place }) => place === "datum")?.says ?? null,
    basis,
    cautions: cautionsFor(basis, cautions),
  });
}

function found(called: GeneralTolerance, question: FormQuestion): FoundForm {
  if (called.standard === "ISO 13920" && called.form !== null) return ofWeldment(called, called.form, question);
  if (called.standard === "ISO 2768" && called.geometry !== null) {
    return formByIso2768(called, called.geometry, question);
  }
  throw new LimitsError("GENERAL_TOLERANCE_NOT_CALLED", "the indication has no class for geometry", {
    value: called.text,
    allowed: "ISO 2768 with H, K or L; ISO 13920 with E, F, G or H behind the first letter",
  });
}

/** ISO 13920 has one table for straightness, flatness and parallelism, by the longer side. */
function ofWeldment(called: WeldmentIndication, cls: Iso13920Form, question: FormQuestion): FoundForm {
  const characteristic = characteristicOf(question);
  if (characteristic !== "straightness" && characteristic !== "flatness" && characteristic !== "parallelism") {
    throw notLimited(characteristic, "straightness, flatness and parallelism");
  }
  const standard = called.edition === "1996" ? "ISO 13920:1996" : ISO_13920_FORM.standard;
  return formInTable({ ...ISO_13920_FORM, standard }, cls, neededLength(question, "length"));
}
