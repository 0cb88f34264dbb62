import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import type {
  CastingGrade,
  CastingIndication,
  GeneralTolerance,
  GeneralToleranceLike,
  Iso13920Form,
  Iso13920Linear,
  Iso2768Geometry,
  Iso2768Indication,
  Iso2768Linear,
  WeldmentIndication,
} from "./generalToleranceValue.js";

const LONGEST_INDICATION = 80;
const ISO_2768 =
  /^(?:DIN )?(?:(?:EN )?ISO 2768|EN 22768)(?:-([12]))?(:1989)?(?: - | -|- |-| )([cfmv]?)([HKL]?)(?: ?- ?(E))?$/;
const DCTG = /^(?:(?:DIN )?(?:EN )?ISO 8062-3(:2007)?(?: - | -|- |-| ))?DCTG ?(\d{1,2})$/;
const CT = /^(?:ISO 8062(:1994)?(?: - | -|- |-| ))?CT ?(\d{1,2})$/;
const ISO_13920 = /^(?:DIN )?(?:EN )?ISO 13920(?::(1996|2023))?(?: - | -|- |-| )([A-D])([E-H]?)$/;

/** Standards that people write here, but of which there are no values. */
const WITHOUT_VALUES: readonly (readonly [sign: RegExp, message: string, allowed: string])[] = [
  [
    /\bISO 22081\b/,
    "ISO 22081:2021 has rules and no tables: the values stand on the drawing itself",
    'lines of the block, such as decimals: { any: "±0.1" } and angles: "±1°"',
  ],
  [/\bISO 8062-3:2023\b/, "the table of ISO 8062-3:2023 was not read", "ISO 8062-3:2007, or DCTG without an edition"],
  [/\bDIN 7168\b/, "the values of DIN 7168 are not here: its coarse classes are not those of ISO 2768", "ISO 2768-1"],
];

/**
 * Takes apart the indication of a general tolerance by standard.
 *
 * The case of the letter decides: a small one calls ISO 2768-1 (sizes and angles), a capital ISO 2768-2 (geometry).
 *
 * @param text - such as `ISO 2768-mK`, `ISO 2768-1-m; ISO 2768-2:1989-K`, `ISO 8062-3 - DCTG 8`, `ISO 13920-BF`; up
 *   to 80 characters (no unit); an indication that was read before is taken again
 * @returns the frozen indication, told apart by `standard` (no unit)
 * @throws `GENERAL_TOLERANCE_UNKNOWN`, `GENERAL_TOLERANCE_NO_TABLE`, `TEXT_TOO_LONG`
 * @example
 * ```ts
 * import { generalTolerance } from "limitsmith";
 *
 * const called = generalTolerance("ISO 2768-mK");
 * called.standard === "ISO 2768" ? [called.linear, called.geometry] : []; // → ["m", "K"]
 * generalTolerance("ISO 2768-mk"); // throws GENERAL_TOLERANCE_UNKNOWN
 * generalTolerance("ISO 22081"); // throws GENERAL_TOLERANCE_NO_TABLE
 * ```
 * @reference ISO 2768-1:1989, clause 5, and ISO 2768-2:1989, clause 6 (indications on drawings; -E from memory);
 *   ISO 8062-3:2007; ISO 13920, indication by a pair of letters
 */
export function generalTolerance(text: GeneralToleranceLike): GeneralTolerance {
  const given = textOf(text);
  if (given.length > LONGEST_INDICATION) {
    throw new LimitsError("TEXT_TOO_LONG", "the text is too long to be a general tolerance", {
      value: given,
      allowed: `up to ${LONGEST_INDICATION} characters`,
    });
  }
  const plain = plainText(given);
  const found = readIso2768(plain, given) ?? readCasting(plain, given) ?? readWeldment(plain, given);
  if (found !== null) return Object.freeze(found);
  for (const [sign, message, allowed] of WITHOUT_VALUES) {
    if (sign.test(plain)) throw new LimitsError("GENERAL_TOLERANCE_NO_TABLE", message, { value: given, allowed });
  }
  throw unknown(given);
}

function textOf(given: GeneralToleranceLike): string {
  if (typeof given === "string") return given;
  const text: unknown = ownValue(given, "text");
  if (typeof text !== "string") throw unknown(given);
  return text;
}

/** One kind of dash, one blank at a time, a blank behind ISO: what the patterns count on. */
function plainText(text: string): string {
  return text
    .trim()
    .replace(/[\u2010-\u2015\u2212]/g, "-")
    .replace(/\s+/g, " ")
    .replace(/\b(ISO|EN|DIN)(?=\d)/g, "$1 ");
}

function readIso2768(plain: string, text: string): Iso2768Indication | null {
  const [first = "", second, ...more] = plain.split(/;| and /);
  const one = readIso2768Part(first.trim(), text);
  if (one === null || second === undefined) return one;
  const other = readIso2768Part(second.trim(), text);
  if (other === null || more.length > 0) return null;
  // two indications are the two parts, each one called once
  if (one.linear === null) return one.geometry !== null && other.geometry === null ? joined(other, one) : null;
  return one.geometry === null && other.linear === null ? joined(one, other) : null;
}

function joined(sizes: Iso2768Indication, geometry: Iso2768Indication): Iso2768Indication {
  return { ...geometry, linear: sizes.linear };
}

function readIso2768Part(plain: string, text: string): Iso2768Indication | null {
  const match = ISO_2768.exec(plain);
  if (match === null) return null;
  const [, part, date, small = "", capital = "", envelope] = match;
  const linear = small === "" ? null : (small as Iso2768Linear);
  const geometry = capital === "" ? null : (capital as Iso2768Geometry);
  if (linear === null && geometry === null) return null;
  if ((part === "1" && geometry !== null) || (part === "2" && linear !== null)) return null;
  // the envelope requirement is an addition to part 2
  if (envelope !== undefined && geometry === null) return null;
  return {
    standard: "ISO 2768",
    text,
    linear,
    geometry,
    geometryDated: geometry !== null && date !== undefined,
    envelope: envelope !== undefined,
  };
}

function readCasting(plain: string, text: string): CastingIndication | null {
  const dctg = DCTG.exec(plain);
  const match = dctg ?? CT.exec(plain);
  const grade = Number(match?.[2] ?? 0);
  if (match === null || grade < 1 || grade > 16) return null;
  return {
    standard: "ISO 8062-3",
    text,
    grade: grade as CastingGrade,
    series: dctg === null ? "CT" : "DCTG",
    dated: match[1] !== undefined,
  };
}

function readWeldment(plain: string, text: string): WeldmentIndication | null {
  const match = ISO_13920.exec(plain);
  if (match === null) return null;
  const [, edition, linear, form = ""] = match;
  return {
    standard: "ISO 13920",
    text,
    linear: linear as Iso13920Linear,
    form: form === "" ? null : (form as Iso13920Form),
    edition: edition === "1996" || edition === "2023" ? edition : null,
  };
}

function unknown(value: unknown): LimitsError {
  return new LimitsError("GENERAL_TOLERANCE_UNKNOWN", "this is not a general tolerance that is known here", {
    value,
    allowed:
      "ISO 2768 with f m c v (part 1), H K L (part 2) or both, such as ISO 2768-mK or ISO 2768-mK-E; " +
      "DCTG 1 to DCTG 16; ISO 13920 with A to D and, if called, E to H, such as ISO 13920-BF",
  });
}
