import { LimitsError } from "../errors.js";
import type { BasisStep } from "../basis.js";
import { parseToleranceClass } from "../iso286/index.js";
import { makeLimits } from "../limits/index.js";
import type { Limits } from "../limits/index.js";
import { atPath } from "../located.js";
import { ownValue } from "../ownValue.js";
import { asLength, lengthOfTicks, multiply, um } from "../units/index.js";
import type { Length, LengthLike } from "../units/index.js";
import { keyStep } from "./keyStep.js";
import type { KeyseatMember } from "./keyseatValue.js";
import type { HubDepth } from "./metricFamily.js";
import { classLimits, metricCautions, rangeOf, refuseWideKey } from "./metricKey.js";
import { chooseMetricKey } from "./metricKeySize.js";
import type { ChosenMetricKey, MetricKeyChoice } from "./metricKeySize.js";
import type { MetricHubDepth, MetricKeyseat, MetricKeywayMember } from "./metricValue.js";
import { oneOf } from "./oneOf.js";
import { tableMm } from "./tableLength.js";

/** Fits of a parallel key by the words of ISO/R 773 and BS 4235-1. */
export type MetricKeyFit = "free" | "normal" | "close";

/** ISO classes of the keyway widths. */
export interface KeywayClasses {
  /** Class of the shaft keyway, such as `"P9"`. */
  readonly shaft: string;
  /** Class of the hub keyway, such as `"JS9"`. */
  readonly hub: string;
}

/** Which metric keyways are meant. */
export interface MetricKeyseatOptions extends MetricKeyChoice {
  /** `"free"` H9 shaft and D10 hub, `"normal"` N9 and JS9, `"close"` P9 and P9. There is no default: makers' differ. */
  readonly fit?: MetricKeyFit;
  /** The ISO classes of the widths taken apart, such as P9 and JS9, in place of `fit`. */
  readonly widths?: KeywayClasses;
  /** Which hub depth, where the standard has two; `"back clearance"` for parallel keys unless said otherwise. */
  readonly hubDepth?: MetricHubDepth;
}

/** The classes behind the words. */
const FITS: Readonly<Record<MetricKeyFit, Readonly<Record<KeyseatMember, string>>>> = {
  free: { shaft: "H9", hub: "D10" },
  normal: { shaft: "N9", hub: "JS9" },
  close: { shaft: "P9", hub: "P9" },
};
const FIT_NAMES: readonly MetricKeyFit[] = ["free", "normal", "close"];
const HUB_DEPTHS: readonly MetricHubDepth[] = ["back clearance", "back interference"];

/**
 * The metric keyways in shaft and hub: widths by their ISO classes, depths t1 and t2, control dimensions d − t1 and
 * d + t2, radii.
 *
 * t1 and t2 count from the crown on the centre line, not along the wall. The control dimensions hold at the nominal
 * diameter: the deviation of the real shaft or bore is not in them.
 *
 * @param shaftDiameter - nominal diameter where the key sits, for ISO/R 773 from 6 mm up to and including 500 mm, any
 *   unit
 * @param options - `fit` or `widths` (neither leaves the widths `null`, unless the keys are taper keys), `standard`,
 *   `key`, `bracketed`, `hubDepth`, see {@link MetricKeyseatOptions}
 * @returns the frozen keyways, sizes in mm and deviations in µm; what is not known of a standard is `null`
 * @throws `KEY_SHAFT_OUT_OF_RANGE`, `KEY_SIZE_NOT_DEFINED`, `KEY_CLASS_NOT_DEFINED`, `KEY_WIDER_THAN_SHAFT`,
 *   `KEYSEAT_DEPTH_IMPOSSIBLE`, `KEYED_JOINT_INVALID`, `OPTION_INVALID`, `LENGTH_INVALID`, and what `isoLimits` throws
 * @example
 * ```ts
 * import { metricKeyseat, writeLimits } from "limitsmith";
 *
 * const seat = metricKeyseat("27 mm", { fit: "normal" });
 * seat.shaft.width === null ? "" : writeLimits(seat.shaft.width, { form: "deviations" }).text; // → "8 0/-0.036"
 * seat.hub.width?.upperDeviation.toString(); // → "18 µm"
 * [seat.shaft.control?.max, seat.shaft.control?.min]; // → ["23 mm", "22.8 mm"]
 * [seat.hub.control?.max, seat.hub.control?.min]; // → ["30.5 mm", "30.3 mm"]
 * ```
 * @reference ISO/R 773:1969, DIN 6885-1:1968, BS 4235-1:1972 and the others of `MetricKeyStandard`; widths: ISO 286
 */
export function metricKeyseat(shaftDiameter: LengthLike, options?: MetricKeyseatOptions): MetricKeyseat {
  const shaft = asLength(shaftDiameter, ["shaftDiameter"]);
  const chosen = chooseMetricKey(shaft, options);
  refuseWideKey(chosen.width, shaft);
  const { family, row } = chosen;
  const hub = hubDepthOf(chosen, ownValue(options, "hubDepth"));
  const steps: BasisStep[] = [chosen.step];
  const depthStep = (name: string, text: string, upperUm: number | null, mark: HubDepth["mark"]): BasisStep => {
    const deviation = upperUm === null ? "its deviations are not known here" : `+${upperUm} / 0 µm`;
    const step = keyStep(
      family.edition,
      `depths, ${row.width} x ${row.height}`,
      `${name} = ${text} mm, ${deviation}`,
      "tabulated",
      mark,
    );
    steps.push(step);
    return step;
  };
  const shaftStep = depthStep("t1", row.t1, row.t1UpperUm, row.t1Mark);
  const hubStep = depthStep(
    family.taper ? "t2 at the deep end" : `t2 (${hub.name})`,
    hub.depth.t2,
    hub.depth.upperUm,
    hub.depth.mark,
  );
  if (row.radius !== null) {
    steps.push(keyStep(family.edition, "keyway radius", `${row.radius.join(" to ")} mm`, "tabulated", row.radiusMark));
  }
  if (row.chamfer !== null) {
    steps.push(keyStep(family.edition, "key chamfer", `${row.chamfer.join(" to ")} mm`, "tabulated", row.chamferMark));
  }
  const widths = widthsOf(chosen, options);
  const depth = tableMm(row.t1);
  if (depth.ticks + um(row.t1UpperUm ?? 0).ticks >= shaft.ticks) {
    throw new LimitsError("KEYSEAT_DEPTH_IMPOSSIBLE", "a keyway so deep leaves no shaft under it", {
      value: `t1 ${depth.toString()}`,
      allowed: `less than ${shaft.toString()}`,
      path: ["key"],
    });
  }
  return Object.freeze({
    standard: family.edition,
    shaftDiameter: shaft,
    key: Object.freeze({ width: chosen.width, height: chosen.height }),
    standardForShaft: chosen.standardForShaft,
    shaft: member("shaft", shaft, depth, row.t1UpperUm, shaftStep, widths.shaft),
    hub: member("hub", shaft, tableMm(hub.depth.t2), hub.depth.upperUm, hubStep, widths.hub),
    radius: rangeOf(row.radius),
    chamfer: rangeOf(row.chamfer),
    passOverBore: row.passOverAdd === null ? null : lengthOfTicks(shaft.ticks + tableMm(row.passOverAdd).ticks, "mm"),
    basis: Object.freeze(steps),
    cautions: metricCautions(chosen, steps),
  });
}

function hubDepthOf(
  { family, row }: ChosenMetricKey,
  asked: unknown,
): { readonly name: MetricHubDepth; readonly depth: HubDepth } {
  const name = oneOf(asked ?? (family.taper ? "back interference" : "back clearance"), HUB_DEPTHS, "a hub depth", [
    "hubDepth",
  ]);
  const depth = row.hub[name];
  if (depth === undefined) {
    throw new LimitsError("KEY_CLASS_NOT_DEFINED", `${family.edition} has no hub depth with ${name}`, {
      value: name,
      allowed: HUB_DEPTHS.filter((one) => row.hub[one] !== undefined).join(", "),
      path: ["hubDepth"],
    });
  }
  return { name, depth };
}

function widthsOf(
  chosen: ChosenMetricKey,
  options: MetricKeyseatOptions | undefined,
): Readonly<Record<KeyseatMember, Limits | null>> {
  const { family, width } = chosen;
  const fit = ownValue(options, "fit");
  const widths = ownValue(options, "widths");
  if (fit !== undefined && widths !== undefined) {
    throw new LimitsError("OPTION_INVALID", "widths go by a fit or by two classes, not by both", {
      allowed: "fit, or widths",
      path: ["widths"],
    });
  }
  const made = (cls: string, step: BasisStep): Limits => classLimits(width, cls, step);
  if (widths !== undefined) {
    const own = (name: KeyseatMember): Limits =>
      atPath(["widths", name], () => {
        const cls = parseToleranceClass(ownValue(widths, name) ?? "");
        if (cls.kind !== "hole") {
          throw new LimitsError("KEY_CLASS_NOT_DEFINED", "a keyway has the class of a hole", {
            value: cls.text,
            allowed: "a capital letter, such as P9 or JS9",
          });
        }
        return made(cls.text, keyStep("the caller", `width of the ${name} keyway`, cls.text, "caller"));
      });
    return { shaft: own("shaft"), hub: own("hub") };
  }
  if (family.widths === "taper" && fit === undefined) {
    const step = keyStep(
      family.edition,
      "keyway width",
      "D10 in shaft and hub, with a key h9",
      "tabulated",
      "two-sources",
    );
    return { shaft: made("D10", step), hub: made("D10", step) };
  }
  if (fit === undefined) return { shaft: null, hub: null };
  const name = oneOf(fit, FIT_NAMES, "a fit of a metric key", ["fit"]);
  if (family.widths !== "named fits") {
    throw new LimitsError("KEY_CLASS_NOT_DEFINED", `free, normal and close are no fits of ${family.edition} here`, {
      value: name,
      allowed: family.taper
        ? "no fit: the width is D10 in shaft and hub"
        : 'widths: two ISO classes, such as { shaft: "P9", hub: "P9" }',
      path: ["fit"],
    });
  }
  const { shaft, hub } = FITS[name];
  const says = `${name} fit: shaft ${shaft}, hub ${hub}, with a key h9`;
  const step = keyStep(family.edition, "keyway width", says, "tabulated", "two-sources");
  return { shaft: made(shaft, step), hub: made(hub, step) };
}

function member(
  name: KeyseatMember,
  shaft: Length,
  depth: Length,
  upperUm: number | null,
  step: BasisStep,
  width: Limits | null,
): MetricKeywayMember {
  const inShaft = name === "shaft";
  const nominalControl = lengthOfTicks(inShaft ? shaft.ticks - depth.ticks : shaft.ticks + depth.ticks, "mm");
  if (upperUm === null) {
    return Object.freeze({ width, nominalDepth: depth, depth: null, nominalControl, control: null });
  }
  const upper = um(upperUm);
  const zero = um(0);
  const rule = inShaft ? "d - t1 has the deviation of t1 with its sign reversed" : "d + t2 has the deviation of t2";
  const basis = Object.freeze([step, keyStep(step.standard, "control dimensions", rule, "derived", "two-sources")]);
  return Object.freeze({
    width,
    nominalDepth: depth,
    depth: makeLimits(depth, upper, zero, Object.freeze([step]), null),
    nominalControl,
    control: inShaft
      ? makeLimits(nominalControl, zero, multiply(upper, -1), basis, null)
      : makeLimits(nominalControl, upper, zero, basis, null),
  });
}
