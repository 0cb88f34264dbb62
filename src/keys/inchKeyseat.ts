import { LimitsError } from "../errors.js";
import { markOf } from "../basis.js";
import type { Basis, BasisStep, Mark } from "../basis.js";
import { makeLimits } from "../limits/index.js";
import type { Limits } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { asLength, inch, lengthOfTicks, multiply, thou } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { chordTicks } from "./crown.js";
import { inchDepth } from "./inchDepth.js";
import type { InchDepthRounding } from "./inchDepth.js";
import { sizeStep } from "./inchKey.js";
import { chooseInchKey } from "./inchKeySize.js";
import type { ChosenInchKey, InchKeyChoice } from "./inchKeySize.js";
import { NOT_STANDARD } from "./keyCautions.js";
import type { InchKeyClass, InchKeyseat } from "./keyseatValue.js";
import { B17_1, deviationsText, keyStep } from "./keyStep.js";
import { oneOf } from "./oneOf.js";
import { positiveLength } from "./positiveLength.js";
import { tableInch } from "./tableLength.js";
import { INCH_KEYSEAT_LEAD, INCH_KEYSEAT_OFFSET } from "./tables/inchAlignment.js";
import { INCH_FILLETS, INCH_FILLETS_OVER } from "./tables/inchFillets.js";
import { INCH_DEPTH_DEVIATIONS, INCH_KEYSEAT_WIDTHS } from "./tables/inchKeyseatWidths.js";
import { INCH_SET_SCREWS } from "./tables/inchSetScrews.js";

/** Which keyseats of ANSI/ASME B17.1 are meant. */
export interface InchKeyseatOptions extends InchKeyChoice {
  /** Class 1 is for bar stock, 2 for keystock and taper keys; 3 presses the key, by an amount that is yours to say. */
  readonly class: InchKeyClass;
  /** `"printed"` rounds S and T to three places as the table does; `"formula"` leaves them unrounded. `"printed"` unless said otherwise. */
  readonly depths?: InchDepthRounding;
  /** Length of the keyseat, which its lead tolerance goes by. */
  readonly length?: LengthLike;
}

/**
 * The keyseats of ANSI/ASME B17.1 in shaft and hub: widths, depth control S and T, alignment, suggestions.
 *
 * Both depth tolerances only deepen a seat. S and T go by the nominal diameter: neither the deviation of the real
 * shaft nor that of the real bore is in them.
 *
 * @param shaftDiameter - nominal diameter where the key sits, over 5/16 in up to and including 30 in, any unit
 * @param options - `class` (1, 2 or 3), `shape`, `kind`, a `key` of your own, `depths`, `length`,
 *   see {@link InchKeyseatOptions}
 * @returns the frozen keyseats, sizes in inches: width and S of the shaft, width and T of the hub as `Limits`;
 *   Class 3 has no width limits
 * @throws `KEY_SHAFT_OUT_OF_RANGE`, `KEY_SIZE_NOT_DEFINED`, `KEY_CLASS_NOT_DEFINED`, `KEY_WIDER_THAN_SHAFT`,
 *   `KEYSEAT_DEPTH_IMPOSSIBLE`, `KEYED_JOINT_INVALID`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { inchKeyseat, writeLimits } from "limitsmith";
 *
 * const seat = inchKeyseat("1 1/2 in", { class: 2 });
 * writeLimits(seat.shaft.control, { form: "limits" }).text; // → "1.289/1.274"
 * writeLimits(seat.hub.control, { form: "limits" }).text; // → "1.679/1.669"
 * seat.shaft.width?.max.toString(); // → "0.377 in"
 * inchKeyseat("1 1/2 in", { class: 3 }).shaft.width; // → null
 * ```
 * @reference ANSI/ASME B17.1-1967, Tables 1 to 3, depth control and alignment: S = D − Y − H/2, T = D − Y + H/2 + C,
 *   C = 0.005 in for parallel and −0.020 in for taper keys
 */
export function inchKeyseat(shaftDiameter: LengthLike, options: InchKeyseatOptions): InchKeyseat {
  const shaft = asLength(shaftDiameter, ["shaftDiameter"]);
  const keyClass = oneOf(ownValue(options, "class"), CLASSES, "a class of fit", ["class"]);
  const chosen = chooseInchKey(shaft, options);
  if (chosen.kind !== "parallel" && keyClass !== 2) {
    throw new LimitsError("KEY_CLASS_NOT_DEFINED", "taper keys have a Class 2 fit only", {
      value: `Class ${keyClass}`,
      allowed: "class: 2",
      path: ["class"],
    });
  }
  const depths = oneOf(ownValue(options, "depths") ?? "printed", DEPTHS, "a way to round depths", ["depths"]);
  const width = keyClass === 3 ? null : seatWidth(chosen, keyClass);
  const sideDepth = multiply(chosen.height, { numerator: 1, denominator: 2 });
  const crown = lengthOfTicks(shaft.ticks - chordTicks(shaft, chosen.width), shaft.unit);
  const { S, T } = INCH_DEPTH_DEVIATIONS;
  const shaftControl = control(inchDepth("S", shaft, chosen, depths), S, "S", "two-sources");
  // of taper keys the tolerance of T is remembered, and agrees with the fit range
  const markOfT = chosen.kind === "parallel" ? "two-sources" : "memory";
  const hubControl = control(inchDepth("T", shaft, chosen, depths), T, "T", markOfT);
  if (shaftControl.min.ticks <= 0) {
    throw new LimitsError("KEYSEAT_DEPTH_IMPOSSIBLE", "a keyseat so deep leaves no shaft under it", {
      value: `S ${shaftControl.min.toString()}`,
      allowed: "a key whose seat leaves part of the shaft",
      path: ["key"],
    });
  }
  // a taper key that is nearly as flat as its interference has no seat in the hub
  if (hubControl.min.ticks <= shaft.ticks - crown.ticks) {
    throw new LimitsError("KEYSEAT_DEPTH_IMPOSSIBLE", "a key so flat has no keyseat in the hub", {
      value: `T ${hubControl.min.toString()}`,
      allowed: "a higher key",
      path: ["key"],
    });
  }
  const length = ownValue(options, "length");
  return Object.freeze({
    standard: B17_1,
    shaftDiameter: shaft,
    class: keyClass,
    shape: chosen.shape,
    kind: chosen.kind,
    key: Object.freeze({ width: chosen.width, height: chosen.height }),
    standardForShaft: chosen.standardForShaft,
    shaft: Object.freeze({ width, control: shaftControl, nominalSideDepth: sideDepth }),
    hub: Object.freeze({ width, control: hubControl, nominalSideDepth: sideDepth }),
    crown,
    cutDepth: lengthOfTicks(crown.ticks + sideDepth.ticks, crown.unit),
    corners: cornersOf(sideDepth),
    offset: tableInch(INCH_KEYSEAT_OFFSET),
    lead: length === undefined ? null : leadOf(positiveLength(length, "the length of the keyseat", ["length"])),
    setScrew: chosen.standardForShaft ? setScrewOf(shaft) : null,
    basis: Object.freeze([sizeStep(chosen), classStep(keyClass), SUGGESTIONS]),
    cautions: Object.freeze(chosen.standardForShaft ? [] : [NOT_STANDARD]),
  });
}

const CLASSES: readonly InchKeyClass[] = [1, 2, 3];
const DEPTHS: readonly InchDepthRounding[] = ["printed", "formula"];

const CLASS_SAYS: Readonly<Record<InchKeyClass, string>> = {
  1: "Class 1: clearance or line to line at the sides, with bar stock; parallel keys only",
  2: "Class 2: clearance or interference at the sides, with keystock; parallel and taper keys",
  3:
    "Class 3: interference at the sides; its amount is not standardised, so no width limits are given. " +
    "The top and bottom fit of Class 2 parallel keys is suggested",
};

const SUGGESTIONS: BasisStep = keyStep(
  B17_1,
  "fillets and chamfers, set screws, alignment",
  "offset 0.010 in and the lead are tolerances (one source); fillet, chamfer and set screw are suggestions (memory)",
  "tabulated",
  "memory",
);

function classStep(keyClass: InchKeyClass): BasisStep {
  return keyStep(B17_1, `fit classes, Class ${keyClass}`, CLASS_SAYS[keyClass], "tabulated", "two-sources");
}

function seatWidth(chosen: ChosenInchKey, keyClass: 1 | 2): Limits {
  const shape = chosen.shape === "square" ? "Square" : "Rectangular";
  const kind = chosen.kind === "parallel" ? (`class${keyClass}${shape}` as const) : "class2Taper";
  const rows = INCH_KEYSEAT_WIDTHS[kind];
  const row = rows.find(([to]) => chosen.width.ticks <= tableInch(to).ticks);
  const last = chosen.shape === "square" ? "3 1/2" : (rows.at(-1)?.[0] ?? "");
  if (row === undefined || chosen.width.ticks > tableInch(last).ticks) {
    throw new LimitsError("KEY_SIZE_NOT_DEFINED", "ANSI/ASME B17.1 has no keyseat for a key so wide", {
      value: chosen.width.toString(),
      allowed: `${chosen.shape} keys up to and including ${last} in`,
      path: ["key", "width"],
    });
  }
  const [to, upper, mark] = row;
  const place = `Table ${keyClass + 1}, ${chosen.kind === "parallel" ? chosen.shape : "taper"}, width up to and including ${to} in`;
  const says = `keyseat width ${deviationsText(upper, 0)}`;
  const basis: Basis = Object.freeze([sizeStep(chosen), keyStep(B17_1, place, says, "tabulated", markOf(mark))]);
  return makeLimits(chosen.width, thou(upper), thou(0), basis, `Class ${keyClass}`);
}

function control(
  nominal: { readonly depth: Length; readonly step: BasisStep },
  deviations: { readonly upper: number; readonly lower: number },
  name: "S" | "T",
  mark: Mark,
): Limits {
  const { upper, lower } = deviations;
  const says = `${name} ${deviationsText(upper, lower)}: the seat may only be deeper`;
  const tolerance = keyStep(B17_1, "depth control, tolerances", says, "tabulated", mark);
  return makeLimits(nominal.depth, thou(upper), thou(lower), Object.freeze([nominal.step, tolerance]), null);
}

function cornersOf(depth: Length): InchKeyseat["corners"] {
  if (depth.ticks <= tableInch(INCH_FILLETS_OVER).ticks) return null;
  const row = INCH_FILLETS.find(([to]) => depth.ticks <= tableInch(to).ticks);
  return row === undefined ? null : Object.freeze({ radius: tableInch(row[1]), chamfer: tableInch(row[2]) });
}

function setScrewOf(shaft: Length): string | null {
  return INCH_SET_SCREWS.find(([to]) => shaft.ticks <= tableInch(to).ticks)?.[1] ?? null;
}

function leadOf(length: Length): Length {
  const { shortTo, short, middleTo, perInch, long } = INCH_KEYSEAT_LEAD;
  if (length.ticks <= tableInch(shortTo).ticks) return tableInch(short);
  if (length.ticks > tableInch(middleTo).ticks) return tableInch(long);
  return multiply(tableInch(perInch), { numerator: length.ticks, denominator: inch(1).ticks });
}
