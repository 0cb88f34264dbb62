import type { BasisStep, Mark } from "../basis.js";
import { LimitsError } from "../errors.js";
import { compareLengths, lengthOfTicks } from "../units/index.js";
import type { Length } from "../units/index.js";
import { formInTable } from "./formInTable.js";
import type { FoundForm } from "./formInTable.js";
import { characteristicOf, givenLength, neededLength, notLimited } from "./formQuestion.js";
import type { FormQuestion } from "./generalFormValue.js";
import type { Iso2768Geometry, Iso2768Indication } from "./generalToleranceValue.js";
import { sizeByStandard } from "./sizeByStandard.js";
import { ISO_2768_PERPENDICULARITY } from "./tables/iso2768Perpendicularity.js";
import { ISO_2768_RUN_OUT } from "./tables/iso2768RunOut.js";
import { ISO_2768_STRAIGHTNESS } from "./tables/iso2768Straightness.js";
import { ISO_2768_SYMMETRY } from "./tables/iso2768Symmetry.js";

const PART_2 = "ISO 2768-2:1989";
// the run-out table has one value for all lengths
const ANY_LENGTH: Length = lengthOfTicks(1, "mm");
const LONGER_SIDE = "the longer side; with equal lengths either";
const LONGER_FEATURE = "the longer feature; with equal lengths either";
const BEARING_SURFACES = "the bearing surfaces where they are marked so, else the longer feature";

/** Looks a characteristic up by ISO 2768-2:1989. */
export function formByIso2768(called: Iso2768Indication, cls: Iso2768Geometry, question: FormQuestion): FoundForm {
  const characteristic = characteristicOf(question);
  switch (characteristic) {
    case "straightness":
    case "flatness":
      return formInTable(ISO_2768_STRAIGHTNESS, cls, neededLength(question, "length"));
    case "perpendicularity": {
      const found = formInTable(ISO_2768_PERPENDICULARITY, cls, neededLength(question, "shorterSide"));
      return withDatum(found, LONGER_SIDE, "one-source");
    }
    case "symmetry": {
      const found = formInTable(ISO_2768_SYMMETRY, cls, neededLength(question, "length"));
      return withDatum(found, LONGER_FEATURE, "one-source");
    }
    case "circular run-out":
      return withDatum(formInTable(ISO_2768_RUN_OUT, cls, ANY_LENGTH), BEARING_SURFACES, "memory");
    case "roundness":
      return roundness(called, cls, question);
    case "parallelism":
      return parallelism(called, cls, question);
    case "cylindricity":
    case "coaxiality":
      throw notLimited(characteristic, "limited only as far as roundness, straightness, parallelism and run-out are");
  }
}

/** The size tolerance of the diameter, but never more than the run-out. */
function roundness(called: Iso2768Indication, cls: Iso2768Geometry, question: FormQuestion): FoundForm {
  const size = sizeTolerance(called, question, "diameter");
  const runOut = formInTable(ISO_2768_RUN_OUT, cls, ANY_LENGTH);
  const tolerance = compareLengths(size.tolerance, runOut.tolerance) < 0 ? size.tolerance : runOut.tolerance;
  const says = `the smaller of size tolerance ${size.tolerance.toString()} and run-out ${runOut.tolerance.toString()}`;
  return { tolerance, steps: [...size.steps, ...runOut.steps, rule("roundness", says, "two-sources")] };
}

/** The larger of the size tolerance between the features and the straightness or flatness. */
function parallelism(called: Iso2768Indication, cls: Iso2768Geometry, question: FormQuestion): FoundForm {
  const size = sizeTolerance(called, question, "distance");
  const form = formInTable(ISO_2768_STRAIGHTNESS, cls, neededLength(question, "length"));
  const tolerance = compareLengths(size.tolerance, form.tolerance) < 0 ? form.tolerance : size.tolerance;
  const says = `the larger of size tolerance ${size.tolerance.toString()} and flatness ${form.tolerance.toString()}`;
  const found = { tolerance, steps: [...size.steps, ...form.steps, rule("parallelism", says, "one-source")] };
  return withDatum(found, LONGER_FEATURE, "one-source");
}

/** The tolerance of a size in all: the question's own, or that of part 1 for the size in it. */
function sizeTolerance(called: Iso2768Indication, question: FormQuestion, name: "diameter" | "distance"): FoundForm {
  const own = givenLength(question, "sizeTolerance");
  const size = givenLength(question, name);
  if (size !== null && own === null) {
    const { limits } = sizeByStandard(size, called, "size", rule(name, "looked up in part 1"));
    return { tolerance: limits.tolerance, steps: limits.basis.slice(1) };
  }
  if (own === null || size !== null || own.ticks <= 0) {
    throw new LimitsError("OPTION_INVALID", "this characteristic goes by one size tolerance over zero", {
      value: own === null ? "none" : size === null ? own.toString() : "two",
      allowed: `either sizeTolerance, or ${name} for a size with the general tolerance`,
      path: ["sizeTolerance"],
    });
  }
  const says = `${own.toString()} in all`;
  return { tolerance: own, steps: [{ standard: "the caller", place: "size tolerance", says, how: "caller" }] };
}

function withDatum({ tolerance, steps }: FoundForm, datum: string, mark: Mark): FoundForm {
  return { tolerance, steps: [...steps, rule("datum", datum, mark)] };
}

function rule(place: string, says: string, mark?: Mark): BasisStep {
  const step = { standard: PART_2, place, says, how: "derived" as const };
  return mark === undefined ? step : { ...step, mark };
}
