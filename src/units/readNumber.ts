import { LimitsError } from "../errors.js";

/** The sign that stands for the decimal point. */
export type DecimalMark = "." | ",";

/** An exact number as it was written: `numerator / denominator`. */
export interface WrittenNumber {
  readonly numerator: bigint;
  readonly denominator: bigint;
  readonly form: "decimal" | "fraction";
  /** Number of decimals written; 0 for a fraction. */
  readonly places: number;
}

const LONGEST_NUMBER = 60;
const SIGN = "([+\\-\\u2212]?)";
const DECIMAL = {
  ".": new RegExp(`^${SIGN}(\\d*)(?:\\.(\\d*))?$`),
  ",": new RegExp(`^${SIGN}(\\d*)(?:,(\\d*))?$`),
};
const FRACTION = new RegExp(`^${SIGN}(?:(\\d+)(?: {1,3}| ?- ?))?(\\d+) ?/ ?(\\d+)$`);

/** Reads a decimal, a fraction or a mixed number, exactly and without a unit. */
export function readNumber(text: string, decimalMark: DecimalMark): WrittenNumber {
  if (text === "") throw new LimitsError("TEXT_EMPTY", "there is no number here", { value: text });
  if (text.length > LONGEST_NUMBER) {
    throw new LimitsError("TEXT_TOO_LONG", "the number is too long to be a size", {
      value: text,
      allowed: `up to ${LONGEST_NUMBER} characters`,
    });
  }
  const decimal = DECIMAL[decimalMark].exec(text);
  const whole = decimal?.[2] ?? "";
  const decimals = decimal?.[3] ?? "";
  if (decimal !== null && whole + decimals !== "") {
    return {
      numerator: signed(decimal[1], BigInt(whole + decimals)),
      denominator: 10n ** BigInt(decimals.length),
      form: "decimal",
      places: decimals.length,
    };
  }
  const fraction = FRACTION.exec(text);
  if (fraction !== null) return readFraction(text, fraction);
  if (text.includes(decimalMark === "." ? "," : ".")) {
    throw new LimitsError("DECIMAL_MARK_MIXED", `the decimal mark here is "${decimalMark}"`, {
      value: text,
      allowed: `decimals with "${decimalMark}", no digit grouping; say decimalMark to change it`,
    });
  }
  throw new LimitsError("NUMBER_MALFORMED", "this is not a number as drawings write it", {
    value: text,
    allowed: "decimals such as 40.025 or .5, inch fractions such as 5/8, 1 1/4, 1-1/4",
  });
}

function readFraction(text: string, match: RegExpExecArray): WrittenNumber {
  const denominator = BigInt(match[4] ?? "");
  if (denominator === 0n) {
    throw new LimitsError("FRACTION_ZERO_DENOMINATOR", "a fraction needs a denominator over zero", { value: text });
  }
  const numerator = BigInt(match[3] ?? "");
  if (match[2] !== undefined && numerator >= denominator) {
    throw new LimitsError("NUMBER_MALFORMED", "the fraction of a mixed number is less than one", {
      value: text,
      allowed: "such as 1 1/4",
    });
  }
  const magnitude = BigInt(match[2] ?? "0") * denominator + numerator;
  return { numerator: signed(match[1], magnitude), denominator, form: "fraction", places: 0 };
}

function signed(sign: string | undefined, magnitude: bigint): bigint {
  return sign === "-" || sign === "\u2212" ? -magnitude : magnitude;
}
