import { LimitsError } from "../errors.js";
import { markOf } from "../basis.js";
import type { Basis, BasisStep } from "../basis.js";
import { makeLimits } from "../limits/index.js";
import { asLength, multiply, thou } from "../units/index.js";
import type { Length, LengthLike, Ratio } from "../units/index.js";
import { chooseInchKey } from "./inchKeySize.js";
import type { ChosenInchKey, InchKeyChoice } from "./inchKeySize.js";
import { NOT_STANDARD } from "./keyCautions.js";
import { B17_1, deviationsText, keyStep } from "./keyStep.js";
import type { GibHead, InchKey, KeyLimits } from "./keyValue.js";
import { tableInch } from "./tableLength.js";
import { INCH_GIB_HEADS } from "./tables/inchGibHeads.js";
import { INCH_KEY_TOLERANCES } from "./tables/inchKeyTolerances.js";

/** 1/8 in per 12 in. */
const TAPER: Ratio = Object.freeze({ numerator: 1, denominator: 96 });

/**
 * The key of ANSI/ASME B17.1 for a shaft: nominal section, limits by stock, preferred shape.
 *
 * @param shaftDiameter - nominal diameter where the key sits, over 5/16 in up to and including 30 in, any unit
 * @param options - `shape`, `kind`, or a `key` of your own, see {@link InchKeyChoice}
 * @returns the frozen key: sizes in inches with `Limits` for bar stock (Class 1) and keystock (Class 2); a key that
 *   the standard does not list for this shaft has `standardForShaft` false and a caution
 * @throws `KEY_SHAFT_OUT_OF_RANGE`, `KEY_SIZE_NOT_DEFINED`, `KEY_WIDER_THAN_SHAFT`, `KEYED_JOINT_INVALID`,
 *   `OPTION_INVALID`, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { inchKey } from "limitsmith";
 *
 * const key = inchKey("1 1/2 in");
 * [key.shape, key.width, key.height]; // → ["square", "0.375 in", "0.375 in"]
 * key.barStock?.width.min.toString(); // → "0.373 in"
 * key.keystock.width.max.toString(); // → "0.376 in"
 * inchKey("16 in", { shape: "square" }); // throws KEY_SIZE_NOT_DEFINED
 * ```
 * @reference ANSI/ASME B17.1-1967, Table 1 (key size versus shaft diameter) and key tolerances; gib heads from memory
 */
export function inchKey(shaftDiameter: LengthLike, options?: InchKeyChoice): InchKey {
  const shaft = asLength(shaftDiameter, ["shaftDiameter"]);
  const chosen = chooseInchKey(shaft, options);
  if (chosen.width.ticks >= shaft.ticks) {
    throw new LimitsError("KEY_WIDER_THAN_SHAFT", "the key is as wide as the shaft, or wider", {
      value: chosen.width.toString(),
      allowed: `less than ${shaft.toString()}`,
      path: ["key", "width"],
    });
  }
  const size = sizeStep(chosen);
  const parallel = chosen.kind === "parallel";
  const square = chosen.shape === "square";
  return Object.freeze({
    standard: B17_1,
    shaftDiameter: shaft,
    shape: chosen.shape,
    kind: chosen.kind,
    width: chosen.width,
    height: chosen.height,
    standardForShaft: chosen.standardForShaft,
    preferredShape: chosen.preferredShape,
    barStock: parallel ? stockLimits(chosen, size, square ? "squareBarStock" : "rectangularBarStock") : null,
    keystock: stockLimits(chosen, size, parallel ? (square ? "squareKeystock" : "rectangularKeystock") : "taper"),
    gibHead: chosen.kind === "gib-head" ? gibHead(chosen.height) : null,
    basis: Object.freeze([
      size,
      ...(parallel ? [] : [TAPER_STEP]),
      ...(chosen.kind === "gib-head" ? [GIB_HEAD_STEP] : []),
    ]),
    cautions: Object.freeze(chosen.standardForShaft ? [] : [NOT_STANDARD]),
  });
}

/** The step that says where the section comes from. */
export function sizeStep(chosen: ChosenInchKey): BasisStep {
  const section = `${chosen.shape} key ${chosen.width.toString()} x ${chosen.height.toString()}`;
  if (chosen.mark === null) {
    const says = `${section}; the row lists ${chosen.listed}: not standard for this shaft`;
    return keyStep("the caller", `B17.1 Table 1, ${chosen.row}`, says, "caller");
  }
  const preferred = `${chosen.preferredShape} key preferred`;
  return keyStep(B17_1, `Table 1, ${chosen.row}`, `${section}; ${preferred}`, "tabulated", chosen.mark);
}

const TAPER_STEP = keyStep(
  B17_1,
  "taper keys",
  "taper 1/8 in per 12 in on the top face; H at the large end, of a gib-head key a width W ahead of the head",
  "tabulated",
  "two-sources",
);

const GIB_HEAD_STEP = keyStep(
  B17_1,
  "gib-head keys",
  "A and B by the height of the key; 1.8 H and 1.2 H beyond the table",
  "tabulated",
  "memory",
);

const STOCK_NAMES = {
  squareBarStock: "square bar stock",
  rectangularBarStock: "rectangular bar stock",
  squareKeystock: "square keystock",
  rectangularKeystock: "rectangular keystock",
  taper: "taper key",
} as const;

function stockLimits(chosen: ChosenInchKey, size: BasisStep, table: keyof typeof STOCK_NAMES): KeyLimits {
  const rows = INCH_KEY_TOLERANCES[table];
  const row = rows.find(([to]) => chosen.width.ticks <= tableInch(to).ticks);
  // taper keys of both shapes share one table, which the square ones leave at 3 1/2
  const last = chosen.shape === "square" ? "3 1/2" : (rows.at(-1)?.[0] ?? "");
  if (row === undefined || chosen.width.ticks > tableInch(last).ticks) {
    throw new LimitsError("KEY_SIZE_NOT_DEFINED", "ANSI/ASME B17.1 has no tolerances for a key so wide", {
      value: chosen.width.toString(),
      allowed: `${chosen.shape} keys up to and including ${last} in`,
      path: ["key", "width"],
    });
  }
  const [to, widthUpper, widthLower, heightUpper, heightLower, mark] = row;
  const name = STOCK_NAMES[table];
  const step = (what: string, upper: number, lower: number): Basis =>
    Object.freeze([
      size,
      keyStep(
        B17_1,
        `key tolerances, ${name}, width up to and including ${to} in`,
        `${what} ${deviationsText(upper, lower)}`,
        "tabulated",
        markOf(mark),
      ),
    ]);
  const widthBasis = step("width", widthUpper, widthLower);
  const heightBasis = step("height", heightUpper, heightLower);
  return Object.freeze({
    width: makeLimits(chosen.width, thou(widthUpper), thou(widthLower), widthBasis, null),
    height: makeLimits(chosen.height, thou(heightUpper), thou(heightLower), heightBasis, null),
    taper: chosen.kind === "parallel" ? null : TAPER,
  });
}

function gibHead(height: Length): GibHead {
  const row = INCH_GIB_HEADS.find(([listed]) => tableInch(listed).ticks === height.ticks);
  if (row !== undefined) return Object.freeze({ height: tableInch(row[1]), length: tableInch(row[2]) });
  return Object.freeze({
    height: multiply(height, { numerator: 9, denominator: 5 }),
    length: multiply(height, { numerator: 6, denominator: 5 }),
  });
}
