import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import type { FormCharacteristic, FormQuestion } from "./generalFormValue.js";

/** The lengths that questions of geometry go by. */
type FormLength = "length" | "shorterSide" | "diameter" | "distance" | "sizeTolerance";

const CHARACTERISTICS: readonly string[] = [
  "straightness",
  "flatness",
  "roundness",
  "cylindricity",
  "parallelism",
  "perpendicularity",
  "symmetry",
  "coaxiality",
  "circular run-out",
] satisfies readonly FormCharacteristic[];

/** The characteristic of a question; anything unknown is refused. */
export function characteristicOf(question: FormQuestion): FormCharacteristic {
  const characteristic: unknown = ownValue(question, "characteristic");
  if (typeof characteristic === "string" && CHARACTERISTICS.includes(characteristic)) {
    return characteristic as FormCharacteristic;
  }
  throw new LimitsError("OPTION_INVALID", "not a characteristic of geometry that is known here", {
    value: characteristic,
    allowed: CHARACTERISTICS.join(", "),
    path: ["characteristic"],
  });
}

/** A length that the question has to have. */
export function neededLength(question: FormQuestion, name: FormLength): Length {
  const length = givenLength(question, name);
  if (length !== null) return length;
  throw new LimitsError("OPTION_INVALID", `this characteristic goes by ${name}`, {
    allowed: `${name}: a length with its unit`,
    path: [name],
  });
}

/** A length of the question; `null` where it has none. */
export function givenLength(question: FormQuestion, name: FormLength): Length | null {
  const lengths: Readonly<Partial<Record<FormLength, LengthLike>>> = question as object;
  const length = ownValue(lengths, name) ?? null;
  return length === null ? null : asLength(length, [name]);
}

/** The error for what a standard does not limit. */
export function notLimited(characteristic: FormCharacteristic, allowed: string): LimitsError {
  const message = `the standard gives no general tolerance of ${characteristic}`;
  return new LimitsError("GENERAL_TOLERANCE_NOT_DEFINED", message, { value: characteristic, allowed });
}
