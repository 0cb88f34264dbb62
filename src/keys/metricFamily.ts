import { markOf } from "../basis.js";
import type { Mark } from "../basis.js";
import type { MetricHubDepth, MetricKeyStandard } from "./metricValue.js";
import { JIS_1959 } from "./tables/jis1959.js";
import { JIS_BRACKETED } from "./tables/jisBracketed.js";
import { METRIC_MACHINE_TOOL } from "./tables/metricMachineTool.js";
import { METRIC_OLDER } from "./tables/metricOlder.js";
import { METRIC_PARALLEL } from "./tables/metricParallel.js";
import { METRIC_TAPER } from "./tables/metricTaper.js";
import { METRIC_THIN_DIN } from "./tables/metricThinDin.js";
import { METRIC_THIN_ISO } from "./tables/metricThinIso.js";

/** A hub depth of a row. */
export interface HubDepth {
  readonly t2: string;
  /** Upper deviation in µm, the lower one being zero; `null` where it is not known here. */
  readonly upperUm: number | null;
  readonly mark: Mark;
}

/** One section of any of the tables, in mm as printed, deviations in µm. */
export interface MetricRow {
  readonly over: string;
  readonly to: string;
  readonly width: string;
  readonly height: string;
  /** Class of the key height; `null` where it is not known here. The width is h9 where the height has a class. */
  readonly heightClass: string | null;
  readonly heightMark: Mark;
  readonly t1: string;
  readonly t1UpperUm: number | null;
  readonly t1Mark: Mark;
  readonly hub: Partial<Record<MetricHubDepth, HubDepth>>;
  readonly radius: readonly [string, string] | null;
  readonly radiusMark: Mark;
  readonly chamfer: readonly [string, string] | null;
  readonly chamferMark: Mark;
  readonly lengths: readonly [string, string] | null;
  readonly lengthsMark: Mark;
  readonly gibHeadHeight: string | null;
  readonly gibHeadMark: Mark;
  readonly passOverAdd: string | null;
}

/** How the keyway widths of a standard are toleranced. */
export type MetricWidths = "named fits" | "taper" | "not known";

/** A standard with its table. */
export interface MetricFamily {
  readonly edition: string;
  /** What the table is of, in words. */
  readonly what: string;
  readonly widths: MetricWidths;
  /** True where the lower end of the first row belongs to it. */
  readonly firstIncluded: boolean;
  readonly taper: boolean;
  /** Least tensile strength of the key in MPa, one source. */
  readonly strengthMPa: number | null;
  readonly rows: () => readonly MetricRow[];
}

const NOTHING = {
  heightClass: null,
  heightMark: "memory",
  radius: null,
  radiusMark: "memory",
  chamfer: null,
  chamferMark: "memory",
  lengths: null,
  lengthsMark: "memory",
  gibHeadHeight: null,
  gibHeadMark: "memory",
  passOverAdd: null,
} as const;

function parallelRows(of: "ISO" | "DIN" | "JIS"): readonly MetricRow[] {
  return METRIC_PARALLEL.map((row): MetricRow => {
    const [
      over,
      to,
      width,
      height,
      heightClass,
      t1,
      t2,
      t1Um,
      t2Um,
      t2Back,
      r1,
      r2,
      c1,
      c2,
      i1,
      i2,
      d1,
      d2,
      add,
      marks,
    ] = row;
    const [section, radius, chamfer, heightMark, din, iso] = marks.split("").map((sign) => markOf(sign));
    return {
      over,
      to,
      width,
      height,
      heightClass,
      heightMark: heightMark ?? "memory",
      t1,
      t1UpperUm: t1Um,
      t1Mark: section ?? "memory",
      hub: {
        "back clearance": { t2, upperUm: t2Um, mark: section ?? "memory" },
        ...(of === "DIN" ? { "back interference": { t2: t2Back, upperUm: t2Um, mark: "two-sources" as const } } : {}),
      },
      radius: [r1, r2],
      radiusMark: radius ?? "memory",
      chamfer: [c1, c2],
      chamferMark: chamfer ?? "memory",
      lengths: of === "DIN" ? [d1, d2] : [i1, i2],
      lengthsMark: (of === "DIN" ? din : iso) ?? "memory",
      gibHeadHeight: null,
      gibHeadMark: "memory",
      passOverAdd: of === "DIN" ? add : null,
    };
  });
}

function thinIsoRows(): readonly MetricRow[] {
  return METRIC_THIN_ISO.map((row): MetricRow => {
    const [over, to, width, height, t1, t2, t1UpperUm, t2Um, r1, r2, c1, c2, l1, l2, marks] = row;
    return {
      ...NOTHING,
      over,
      to,
      width,
      height,
      // h 3 and 4 could be h9 or h11: not known here
      heightClass: Number(height) >= 5 ? "h11" : null,
      heightMark: "one-source",
      t1,
      t1UpperUm,
      t1Mark: markOf(marks[0]),
      hub: { "back clearance": { t2, upperUm: t2Um, mark: markOf(marks[1]) } },
      radius: [r1, r2],
      chamfer: [c1, c2],
      lengths: [l1, l2],
    };
  });
}

function thinDinRows(): readonly MetricRow[] {
  return METRIC_THIN_DIN.map(([over, to, width, height, t1, t2, marks]): MetricRow => ({
    ...NOTHING,
    over,
    to,
    width,
    height,
    heightMark: markOf(marks[0]),
    t1,
    t1UpperUm: null,
    t1Mark: markOf(marks[1]),
    hub: { "back clearance": { t2, upperUm: null, mark: markOf(marks[2]) } },
  }));
}

function machineToolRows(): readonly MetricRow[] {
  return METRIC_MACHINE_TOOL.map(([over, to, width, height, t1, t2, t1UpperUm, t2Um]): MetricRow => ({
    ...NOTHING,
    over,
    to,
    width,
    height,
    t1,
    t1UpperUm,
    t1Mark: "one-source",
    hub: { "back clearance": { t2, upperUm: t2Um, mark: "one-source" } },
  }));
}

function olderRows(): readonly MetricRow[] {
  return METRIC_OLDER.map(([over, to, width, height, t1, t2, t2Back, t1UpperUm, t2Um, t2BackUm, sign]): MetricRow => {
    const mark = markOf(sign);
    return {
      ...NOTHING,
      over,
      to,
      width,
      height,
      t1,
      t1UpperUm,
      t1Mark: mark,
      hub: {
        "back clearance": { t2, upperUm: t2Um, mark },
        "back interference": { t2: t2Back, upperUm: t2BackUm, mark },
      },
    };
  });
}

function jis1959Rows(): readonly MetricRow[] {
  return JIS_1959.map(([over, to, width, height, t1, t2]): MetricRow => ({
    ...NOTHING,
    over,
    to,
    width,
    height,
    t1,
    t1UpperUm: null,
    t1Mark: "one-source",
    hub: { "back clearance": { t2, upperUm: null, mark: "one-source" } },
  }));
}

/** The bracketed sizes of JIS B 1301, which are taken on request only. */
export function bracketedRows(): readonly MetricRow[] {
  return JIS_BRACKETED.map(([over, to, width, height, t1, t2, upperUm, marks]): MetricRow => ({
    ...NOTHING,
    over,
    to,
    width,
    height,
    heightClass: width === height ? "h9" : "h11",
    heightMark: "two-sources",
    t1,
    t1UpperUm: upperUm,
    t1Mark: markOf(marks[0]),
    hub: { "back clearance": { t2, upperUm, mark: markOf(marks[1]) } },
  }));
}

function taperRows(of: "ISO" | "DIN" | "gib head"): readonly MetricRow[] {
  return METRIC_TAPER.map((row, index): MetricRow => {
    const [over, to, width, height, heightClass, t1, t2, t1UpperUm, t2Um, r1, r2, gib, l1, l2, marks] = row;
    const [depths, rest, gibMark, lengthMark] = marks.split("").map((sign) => markOf(sign));
    // taper keys of ISO/R 774 have the lengths of the parallel keys of equal width; DIN 6886 starts later
    const parallel = METRIC_PARALLEL[index];
    const iso = parallel === undefined ? null : ([parallel[14], parallel[15]] as const);
    const isoMark = Number(width) <= 25 ? "two-sources" : Number(width) <= 32 ? "one-source" : "memory";
    const din = l1 === null || l2 === null ? null : ([l1, l2] as const);
    return {
      ...NOTHING,
      over,
      to,
      width,
      height,
      heightClass,
      heightMark: rest ?? "memory",
      t1,
      t1UpperUm,
      t1Mark: depths ?? "memory",
      hub: { "back interference": { t2, upperUm: t2Um, mark: depths ?? "memory" } },
      radius: [r1, r2],
      radiusMark: rest ?? "memory",
      lengths: of === "DIN" ? din : of === "ISO" ? iso : null,
      lengthsMark: of === "DIN" ? (lengthMark ?? "memory") : isoMark,
      gibHeadHeight: of === "DIN" ? null : gib,
      gibHeadMark: gibMark ?? "memory",
    };
  });
}

const PARALLEL = { what: "parallel keys", widths: "named fits", firstIncluded: true, taper: false } as const;
const TAPER = { what: "taper keys", widths: "taper", firstIncluded: true, taper: true } as const;

/** Every standard with its edition and table. */
export const METRIC_FAMILIES: Readonly<Record<MetricKeyStandard, MetricFamily>> = {
  "ISO/R 773": { ...PARALLEL, edition: "ISO/R 773:1969", strengthMPa: null, rows: () => parallelRows("ISO") },
  "DIN 6885-1": { ...PARALLEL, edition: "DIN 6885-1:1968", strengthMPa: null, rows: () => parallelRows("DIN") },
  "BS 4235-1": { ...PARALLEL, edition: "BS 4235-1:1972", strengthMPa: 550, rows: () => parallelRows("ISO") },
  "JIS B 1301": { ...PARALLEL, edition: "JIS B 1301:1996", strengthMPa: 600, rows: () => parallelRows("JIS") },
  "ISO 2491": {
    edition: "ISO 2491:1974",
    what: "thin parallel keys",
    widths: "named fits",
    firstIncluded: false,
    taper: false,
    strengthMPa: null,
    rows: thinIsoRows,
  },
  "DIN 6885-3": {
    edition: "DIN 6885-3:1956",
    what: "thin (low) parallel keys",
    widths: "not known",
    firstIncluded: false,
    taper: false,
    strengthMPa: null,
    rows: thinDinRows,
  },
  "DIN 6885-2": {
    edition: "DIN 6885-2 (withdrawn in 2008)",
    what: "parallel keys for machine tools",
    widths: "not known",
    firstIncluded: false,
    taper: false,
    strengthMPa: null,
    rows: machineToolRows,
  },
  "ISO/R 774": { ...TAPER, edition: "ISO/R 774:1969", strengthMPa: null, rows: () => taperRows("ISO") },
  "DIN 6886": { ...TAPER, edition: "DIN 6886", strengthMPa: null, rows: () => taperRows("DIN") },
  "DIN 6887": { ...TAPER, edition: "DIN 6887", strengthMPa: null, rows: () => taperRows("gib head") },
  "older depth series": {
    edition: "older depth series (before 1968)",
    what: "parallel keys",
    widths: "not known",
    firstIncluded: false,
    taper: false,
    strengthMPa: null,
    rows: olderRows,
  },
  "JIS B 1301-1959": {
    edition: "JIS B 1301-1959",
    what: "parallel keys",
    widths: "not known",
    firstIncluded: true,
    taper: false,
    strengthMPa: null,
    rows: jis1959Rows,
  },
};
