import { markOf } from "../basis.js";
import type { BasisStep } from "../basis.js";
import { lengthOfTicks, toDecimal } from "../units/index.js";
import type { Length } from "../units/index.js";
import { chordTicks } from "./crown.js";
import type { ChosenInchKey } from "./inchKeySize.js";
import { B17_1, keyStep } from "./keyStep.js";
import { tableInch } from "./tableLength.js";
import { INCH_DEPTHS } from "./tables/inchDepths.js";
import type { InchDepthRow } from "./tables/inchDepths.js";
import { INCH_DEPTH_ALLOWANCES } from "./tables/inchKeyseatWidths.js";

/** How S and T are rounded. */
export type InchDepthRounding = "printed" | "formula";

const TICKS_PER_THOU = 254_000;

/** Nominal S of the shaft or T of the hub, and where it comes from. */
export function inchDepth(
  which: "S" | "T",
  shaft: Length,
  chosen: ChosenInchKey,
  rounding: InchDepthRounding,
): { readonly depth: Length; readonly step: BasisStep } {
  const kind = chosen.kind === "parallel" ? "parallel" : "taper";
  const place = `depth control, ${which}, ${chosen.shape}, ${kind}`;
  const printed = rounding === "printed" && chosen.standardForShaft ? printedCell(which, shaft, chosen, kind) : null;
  if (printed !== null) {
    const says = `${which} ${printed.text} in, as the formula gives rounded half up to 0.001 in`;
    return { depth: tableInch(printed.text), step: keyStep(B17_1, place, says, "tabulated", markOf(printed.mark)) };
  }
  const allowance = INCH_DEPTH_ALLOWANCES[kind];
  const formula =
    which === "S"
      ? "S = D - Y - H/2"
      : `T = D - Y + H/2 + C, C = ${allowance > 0 ? "+0.005 clearance" : "-0.020 interference"}`;
  const rounded = rounding === "printed" ? "rounded half up to 0.001 in" : "not rounded";
  return {
    depth:
      rounding === "printed"
        ? roundedDepth(which, shaft, chosen, allowance)
        : exactDepth(which, shaft, chosen, allowance),
    step: keyStep(B17_1, place, `${formula}, ${rounded}`, "derived", "formula"),
  };
}

function exactDepth(which: "S" | "T", shaft: Length, { width, height }: ChosenInchKey, allowance: number): Length {
  // T counts from S, so that T - S is H + C to the tick even where H is odd
  const s = chordTicks(shaft, width) - Math.floor(height.ticks / 2);
  return lengthOfTicks(which === "S" ? s : s + height.ticks + allowance * TICKS_PER_THOU, "in");
}

/** Rounded once, from the unrounded value: half up, as the printed table is. */
function roundedDepth(which: "S" | "T", shaft: Length, { width, height }: ChosenInchKey, allowance: number): Length {
  const d = toDecimal(shaft, "um");
  const w = toDecimal(width, "um");
  const h = toDecimal(height, "um");
  const chord = d.plus(d.times(d).minus(w.times(w)).sqrt());
  // twice the depth in µm; a thousandth of an inch is 25.4 µm
  const twice = which === "S" ? chord.minus(h) : chord.plus(h).plus(allowance * 50.8);
  const thousandths = twice.div("50.8").toDecimalPlaces(0, HALF_UP).toNumber();
  return lengthOfTicks(thousandths * TICKS_PER_THOU, "in");
}

/** Decimal.ROUND_HALF_UP; depths are never negative here. */
const HALF_UP = 4;

const COLUMNS = {
  S: { parallel: { square: 1, rectangular: 2 }, taper: { square: 1, rectangular: 2 } },
  T: { parallel: { square: 3, rectangular: 4 }, taper: { square: 5, rectangular: 6 } },
} as const;

function printedCell(
  which: "S" | "T",
  shaft: Length,
  { shape }: ChosenInchKey,
  kind: "parallel" | "taper",
): { readonly text: string; readonly mark: string } | null {
  const row: InchDepthRow | undefined = INCH_DEPTHS.find(([diameter]) => tableInch(diameter).ticks === shaft.ticks);
  const column = COLUMNS[which][kind][shape];
  const text = row?.[column] ?? null;
  return row === undefined || text === null ? null : { text, mark: row[7][column - 1] ?? "" };
}
