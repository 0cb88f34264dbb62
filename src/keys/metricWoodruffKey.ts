import type { Basis, BasisStep } from "../basis.js";
import { makeLimits } from "../limits/index.js";
import type { Limits } from "../limits/index.js";
import { stress, um } from "../units/index.js";
import type { Length, Stress } from "../units/index.js";
import { classLimits, rangeOf } from "./metricKey.js";
import { keyStep } from "./keyStep.js";
import type { KeyLimits } from "./keyValue.js";
import { chooseWoodruff } from "./metricWoodruff.js";
import type { MetricWoodruffChoice } from "./metricWoodruff.js";
import type { SizeRange } from "./metricValue.js";
import { tableMm } from "./tableLength.js";

/** Metric Woodruff key: plain frozen data. */
export interface MetricWoodruffKey {
  /** Standard with its edition. */
  readonly standard: string;
  /** Such as `"4x6.5x16"`: b x h x D. */
  readonly designation: string;
  /** Width b, h9. */
  readonly width: Limits;
  /** Height h, h11 in ISO 3912 and h12 in DIN 6888. */
  readonly height: Limits;
  /** Diameter of the circle; `null` where its deviation is not known here. */
  readonly diameter: Limits | null;
  /** Nominal height of the form with a flat bottom, in ISO 3912; `null` in DIN 6888. */
  readonly flatBottomHeight: Length | null;
  /** Edge chamfer; `null` where it is not known here. */
  readonly chamfer: SizeRange | null;
  /** Limits of the section, as `keyedAssembly` takes them. */
  readonly limits: KeyLimits;
  /** Least tensile strength of the finished key that the standard asks; `null` where it is not known here. */
  readonly leastStrength: Stress | null;
  /** Where it comes from. */
  readonly basis: Basis;
}

/**
 * The metric Woodruff key of a size, by the standard that is named.
 *
 * @param choice - `standard` (`"ISO 3912"` or `"DIN 6888"`), `width` and `diameter`, any unit
 * @returns the frozen key, sizes in mm and deviations in µm
 * @throws `KEY_SIZE_NOT_DEFINED`, `KEYED_JOINT_INVALID`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { metricWoodruffKey } from "limitsmith";
 *
 * const key = metricWoodruffKey({ standard: "ISO 3912", width: "5 mm", diameter: "19 mm" });
 * key.designation; // → "5x7.5x19"
 * key.height.min.toString(); // → "7.41 mm"
 * ```
 * @reference ISO 3912:1977 (b h9, h h11, D h12); DIN 6888:1956 (b h9, h h12, d2 −0.1 for b to 4)
 */
export function metricWoodruffKey(choice: MetricWoodruffChoice): MetricWoodruffKey {
  const row = chooseWoodruff(choice);
  const { edition } = row;
  const iso = row.standard === "ISO 3912";
  const size = `${row.width}x${row.height}x${row.diameter}`;
  const section = keyStep(
    edition,
    `Woodruff keys, ${size}`,
    "b x h x D in mm",
    "tabulated",
    iso ? "two-sources" : "one-source",
  );
  const step = (says: string): BasisStep =>
    keyStep(edition, `Woodruff keys, ${size}`, says, "tabulated", "two-sources");
  const heightClass = iso ? "h11" : "h12";
  const width = classLimits(tableMm(row.width), "h9", step("width h9"));
  const height = classLimits(tableMm(row.height), heightClass, step(`height ${heightClass}`));
  const steps = [section];
  if (row.flatBottom !== null) {
    steps.push(
      keyStep(
        edition,
        `Woodruff keys, ${size}`,
        `flat bottom: h1 = ${row.flatBottom} mm`,
        "tabulated",
        row.flatBottomMark,
      ),
    );
  }
  if (row.chamfer !== null) {
    steps.push(
      keyStep(
        edition,
        `Woodruff keys, ${size}`,
        `chamfer ${row.chamfer.join(" to ")} mm`,
        "tabulated",
        row.chamferMark,
      ),
    );
  }
  if (!iso) {
    steps.push(
      keyStep(
        edition,
        "key material",
        "tensile strength at least 588 MPa, printed 60 kgf/mm2",
        "tabulated",
        "one-source",
      ),
    );
  }
  return Object.freeze({
    standard: edition,
    designation: size,
    width,
    height,
    diameter: iso
      ? classLimits(tableMm(row.diameter), "h12", step("diameter h12"))
      : dinDiameter(tableMm(row.diameter), Number(row.width), edition),
    flatBottomHeight: row.flatBottom === null ? null : tableMm(row.flatBottom),
    chamfer: rangeOf(row.chamfer),
    limits: Object.freeze({ width, height, taper: null }),
    leastStrength: iso ? null : stress(588, "MPa"),
    basis: Object.freeze(steps),
  });
}

/** DIN 6888 as read gives the deviation of d2 for widths to 4 mm only. */
function dinDiameter(diameter: Length, width: number, edition: string): Limits | null {
  if (width > 4) return null;
  const step = keyStep(edition, "Woodruff keys, b to 4 mm", "d2 0 / -0.1 mm", "tabulated", "one-source");
  return makeLimits(diameter, um(0), um(-100), Object.freeze([step]), null);
}
