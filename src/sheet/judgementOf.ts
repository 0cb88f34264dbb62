import { LimitsError, attempt } from "../errors.js";
import type { LimitsProblem } from "../errors.js";
import { judgeMeasurement } from "../limits/index.js";
import type { Judgement, Limits } from "../limits/index.js";
import { atPath } from "../located.js";
import { readDimension } from "../units/index.js";
import type { DecimalMark, Length, LengthUnit } from "../units/index.js";
import type { InspectionFields, SizeFeatureSpec } from "./sheetSpec.js";

/** How the readings of one drawing are read and judged. */
export interface InspectionContext {
  readonly unit: LengthUnit;
  readonly decimalMark: DecimalMark;
  /** `null` where the drawing file has no rule. */
  readonly inspection: InspectionFields | null;
}

/** The reading of a feature judged against its limits; what cannot be judged is a problem of its own. */
export function judgementOf(
  spec: SizeFeatureSpec,
  index: number,
  limits: Limits | null,
  context: InspectionContext,
  problems: LimitsProblem[],
): Judgement | null {
  const { measured } = spec;
  if (measured === undefined) return null;
  const { unit, decimalMark, inspection } = context;
  const lengthOf = (text: string): Length => readDimension(text, { unit, decimalMark }).length;
  const judged = attempt(() =>
    atPath(["features", index, "measured"], () => {
      const reading = lengthOf(measured);
      if (limits === null || inspection === null) {
        throw new LimitsError("READING_NOT_JUDGED", "a reading needs limits and a decision rule", {
          value: measured,
          allowed: limits === null ? "a feature with one pair of limits" : "inspection: { rule, uncertainty? }",
        });
      }
      const { rule, uncertainty } = inspection;
      return judgeMeasurement(limits, reading, {
        rule,
        ...(uncertainty === undefined ? {} : { uncertainty: lengthOf(uncertainty) }),
      });
    }),
  );
  if (judged.ok) return judged.value;
  problems.push(judged.error);
  return null;
}
