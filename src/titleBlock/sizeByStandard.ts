import type { BasisStep, Caution } from "../basis.js";
import { LimitsError } from "../errors.js";
import { symmetricLimits } from "../limits/index.js";
import { lengthOfTicks } from "../units/index.js";
import type { Length } from "../units/index.js";
import type { DefaultLengthLimits } from "./defaultValue.js";
import { CASTING_EDITION, ENVELOPE, NOT_A_REJECT, cautionsFor } from "./generalCautions.js";
import type {
  CastingGrade,
  CastingIndication,
  GeneralTolerance,
  Iso2768Indication,
  WeldmentIndication,
} from "./generalToleranceValue.js";
import { cellAt, cellStep } from "./rangeTable.js";
import type { KnownFeature } from "./sizeFeature.js";
import { ISO_13920_LINEAR } from "./tables/iso13920Linear.js";
import { ISO_2768_BROKEN_EDGES } from "./tables/iso2768BrokenEdges.js";
import { ISO_2768_LINEAR } from "./tables/iso2768Linear.js";
import { ISO_8062_CASTINGS } from "./tables/iso8062Castings.js";

/** A deviation that a standard gives to a size, to both sides, and why. */
interface Found {
  readonly deviation: Length;
  readonly steps: readonly BasisStep[];
  readonly cautions: readonly Caution[];
}

const TICKS_PER_UM = 10_000;
// the one size where the headings of the two editions of ISO 13920 differ
const TWO_MM = 20_000_000;

/** Gives a linear size the general tolerance of a standard; `first` is the step that says who called it. */
export function sizeByStandard(
  nominal: Length,
  called: GeneralTolerance,
  feature: KnownFeature,
  first: BasisStep,
): DefaultLengthLimits {
  const { deviation, steps, cautions } = found(nominal, called, feature);
  const basis = [first, ...steps];
  return Object.freeze({
    kind: "length" as const,
    limits: symmetricLimits(nominal, deviation, { basis }),
    line: `${called.text}: ±${deviation.toString()}`,
    cautions: cautionsFor(basis, cautions),
  });
}

function found(nominal: Length, called: GeneralTolerance, feature: KnownFeature): Found {
  switch (called.standard) {
    case "ISO 2768":
      return ofIso2768(nominal, called, feature);
    case "ISO 8062-3":
      return ofCasting(nominal, called, feature);
    case "ISO 13920":
      return ofWeldment(nominal, called);
  }
}

function ofIso2768(nominal: Length, called: Iso2768Indication, feature: KnownFeature): Found {
  const { linear } = called;
  if (linear === null) {
    throw new LimitsError(
      "GENERAL_TOLERANCE_NOT_CALLED",
      "without a small letter part 1 is not called, so sizes have no value",
      {
        value: called.text,
        allowed: "f, m, c or v in the indication, such as ISO 2768-mK",
      },
    );
  }
  if (feature === "radius") {
    throw new LimitsError("TITLE_BLOCK_OPTION_NEEDED", "ISO 2768-1 treats external and internal radii apart", {
      value: nominal.toString(),
      allowed: 'the option feature: "external radius or chamfer" or "internal radius"',
    });
  }
  const table = feature === "external radius or chamfer" ? ISO_2768_BROKEN_EDGES : ISO_2768_LINEAR;
  const cell = cellAt(table, linear, `class ${linear}`, nominal);
  const deviation = lengthOfUm(cell.value);
  return {
    deviation,
    steps: [cellStep(table.standard, cell, `class ${linear}: ±${deviation.toString()}`)],
    cautions: called.envelope ? [NOT_A_REJECT, ENVELOPE] : [NOT_A_REJECT],
  };
}

function ofCasting(nominal: Length, called: CastingIndication, feature: KnownFeature): Found {
  const { standard } = ISO_8062_CASTINGS;
  const wall = feature === "wall thickness";
  if (called.grade === 16 && !wall) {
    throw new LimitsError(
      "GENERAL_TOLERANCE_NOT_DEFINED",
      "grade 16 is for walls of castings called to grade 15 only",
      {
        value: called.text,
        allowed: "DCTG 1 to DCTG 15, or a wall thickness",
      },
    );
  }
  const coarser = wall && called.grade < 16;
  const grade = coarser ? ((called.grade + 1) as CastingGrade) : called.grade;
  const name = `${called.series} ${grade}`;
  const cell = cellAt(ISO_8062_CASTINGS, grade, name, nominal);
  const total = lengthOfUm(cell.value);
  const deviation = lengthOfUm(cell.value / 2);
  const steps = [
    cellStep(standard, cell, `${name}: ${total.toString()} in all`),
    derived(standard, "position of the tolerance", `symmetrical about the size: ±${deviation.toString()}`),
  ];
  if (coarser) {
    const says = `${name}: one grade coarser than ${called.series} ${called.grade}`;
    steps.unshift({ ...derived(standard, "wall thickness", says), mark: "memory" });
  }
  return { deviation, steps, cautions: called.dated ? [] : [CASTING_EDITION] };
}

function ofWeldment(nominal: Length, called: WeldmentIndication): Found {
  const old = called.edition === "1996";
  const atTwo = nominal.ticks === TWO_MM;
  if (atTwo && called.edition === null) {
    throw new LimitsError("GENERAL_TOLERANCE_OUT_OF_RANGE", "at exactly 2 mm the editions of ISO 13920 differ", {
      value: nominal.toString(),
      allowed: "over 2 mm; or ISO 13920:1996 in the indication, which includes 2 mm",
    });
  }
  const table = old ? { ...ISO_13920_LINEAR, standard: "ISO 13920:1996", overIncluded: true } : ISO_13920_LINEAR;
  const cell = cellAt(table, called.linear, `class ${called.linear}`, nominal);
  const deviation = lengthOfUm(cell.value);
  const says = `class ${called.linear}: ±${deviation.toString()}${old ? ", read in the layout of 2023" : ""}`;
  const steps = [cellStep(table.standard, cell, says)];
  if (atTwo) {
    const heading = "the first range is headed 2 to 30 mm, so it includes 2 mm";
    steps.push({ ...derived(table.standard, table.table, heading), mark: "memory" });
  }
  return { deviation, steps, cautions: [] };
}

function derived(standard: string, place: string, says: string): BasisStep {
  return { standard, place, says, how: "derived" };
}

function lengthOfUm(um: number): Length {
  return lengthOfTicks(um * TICKS_PER_UM, "mm");
}
