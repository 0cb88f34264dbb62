import {
  isoLimits,
  keyedAssembly,
  keyLoad,
  keyseatCrown,
  keyseatSideDepth,
  lengthOfTicks,
  limits,
  metricKey,
  metricKeyLength,
  metricKeyseat,
  metricWoodruffKey,
  metricWoodruffKeysFor,
  metricWoodruffKeyseat,
  multiply,
  overKey,
  torque,
  torqueFromPower,
} from "limitsmith";
import type {
  Length,
  Limits,
  MetricKeyFit,
  MetricKeyStandard,
  MetricKeyseat,
  MetricWoodruffStandard,
} from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";
import { readCases } from "./readCases.js";
import type { Case } from "./readCases.js";

// The cases are copies of what published tables say; nothing in them was made by this library.

type Um = readonly [lower: number, upper: number];
type Cell = string | Um | null;
type Cells = Readonly<Record<string, Cell>>;
interface Row {
  readonly d_over: string;
  readonly d_to: string;
}
interface Marked {
  readonly mark?: unknown;
}

const parallel = readCases<Row, Cells>("keys/metric-parallel.json");
const bracketed = readCases<Row, Cells & { tol_um: number }>("keys/jis-bracketed.json");
const other = readCases<Row & { standard: MetricKeyStandard }, Cells>("keys/metric-other.json");
const widths = readCases<
  { b_over: string; b_to: string },
  {
    keys_b: string[];
    keyway_dev_um: Record<string, Um>;
    key_h9_dev_um: Um;
    clearance_um_key_h9: Record<string, { min: number; max: number }>;
  }
>("keys/metric-widths.json");
const lengths = readCases<
  { edition: string },
  { from: string; to: string; key_dev_um: Um; keyway_dev_um: Um; class_key: string; class_keyway: null }
>("keys/metric-lengths.json");
const iso = readCases<{ b: string; h: string; D: string }, Cells>("keys/woodruff-iso.json");
const din = readCases<{ b: string; h: string; d2: string }, Cells>("keys/woodruff-din.json");
const published = readCases<Record<string, unknown>, Record<string, unknown>>("keys/metric-cases.json");

const MM = 10_000_000;
const UM = 10_000;

function ticksOf(text: unknown): number {
  const ticks = Number(text) * MM;
  if (text === null || text === "" || Math.abs(ticks - Math.round(ticks)) > 1e-3 || !Number.isFinite(ticks)) {
    throw new Error(`not a size: ${String(text)}`);
  }
  return Math.round(ticks);
}

function lengthOf(text: unknown): Length {
  return lengthOfTicks(ticksOf(text), "mm");
}

/** A range at its ends and in the middle; its lower end too where that is included. */
function within({ d_over, d_to }: Row, included = false): Length[] {
  const low = ticksOf(d_over);
  const high = ticksOf(d_to);
  return [...(included ? [low] : []), low + 1, (low + high) / 2, high].map((ticks) => lengthOfTicks(ticks, "mm"));
}

function expectUm(given: Limits | null | undefined, wanted: unknown): void {
  const [lower, upper] = wanted as Um;
  expect([given?.lowerDeviation.ticks, given?.upperDeviation.ticks]).toEqual([lower * UM, upper * UM]);
}

function rangeOf(given: { min: Length; max: Length } | null): unknown {
  return given === null ? null : [given.min.ticks, given.max.ticks];
}

/** The mark of the step of a basis whose place matches. */
function markAt(basis: readonly { place: string; mark?: string }[], place: RegExp): string | undefined {
  return basis.find((step) => place.test(step.place))?.mark;
}

/** The mark behind the words of a file; what is only remembered for this very value counts as memory. */
function markOf(words: string | undefined): string {
  if (words === undefined || words.startsWith("memory") || words.includes("itself memory")) return "memory";
  if (words.startsWith("two-sources")) return "two-sources";
  return /formula|identity|\+ rule/.test(words) ? "one-source+formula" : "one-source";
}

/** t1, t2 and the control dimensions of one keyway row, at a diameter. */
function expectDepths(seat: MetricKeyseat, diameter: Length, t1: Cell, t1Um: Cell, t2: Cell, t2Um: Cell): void {
  const parts = [
    [seat.shaft, t1, t1Um, -1],
    [seat.hub, t2, t2Um, 1],
  ] as const;
  for (const [member, text, deviation, sign] of parts) {
    const depth = ticksOf(text);
    const control = diameter.ticks + sign * depth;
    expect([member.nominalDepth.ticks, member.nominalControl.ticks]).toEqual([depth, control]);
    if (deviation === null) {
      expect([member.depth, member.control]).toEqual([null, null]);
      continue;
    }
    const [lower, upper] = deviation as Um;
    expect(member.depth?.nominal.ticks).toBe(depth);
    expectUm(member.depth, deviation);
    expect(member.control?.nominal.ticks).toBe(control);
    // on the shaft the sign is reversed
    expectUm(member.control, sign === 1 ? deviation : [-upper, lower]);
  }
}

describe("the files", () => {
  it.each([
    ["metric-parallel.json", parallel, 26],
    ["jis-bracketed.json", bracketed, 6],
    ["metric-other.json", other, 14 + 14 + 7 + 22 + 11 + 26],
    ["metric-widths.json", widths, 8],
    ["metric-lengths.json", lengths, 6],
    ["woodruff-iso.json", iso, 16],
    ["woodruff-din.json", din, 24],
    ["metric-cases.json", published, 78],
  ] as const)("%s is whole", (_name, file, count) => {
    expect(file.version).toBe(1);
    expect(file.cases.length).toBe(count);
  });
});

describe("parallel keys: ISO/R 773, DIN 6885-1, BS 4235-1, JIS B 1301", () => {
  const standards = ["ISO/R 773", "DIN 6885-1", "BS 4235-1", "JIS B 1301"] as const;

  it.each(parallel.cases)("over $input.d_over to $input.d_to", ({ input, expected, mark }) => {
    const cell = (name: string): Cell => expected?.[name] ?? null;
    const marks = mark as unknown as Record<string, string>;
    for (const diameter of within(input, "d_over_inclusive" in (expected ?? {}))) {
      for (const standard of standards) {
        const key = metricKey(diameter, { standard });
        const seat = metricKeyseat(diameter, { standard, fit: "normal" });
        expect(key.standardForShaft).toBe(true);
        expect(key.basis[0]?.place).toContain(`over ${input.d_over} to ${input.d_to} mm`);
        expect([key.width.ticks, key.height.ticks]).toEqual([ticksOf(cell("b")), ticksOf(cell("h"))]);
        expect(key.width.ticks === key.height.ticks).toBe(cell("section") === "square");
        expectUm(key.limits?.width, cell("key_b_dev_um"));
        expectUm(key.limits?.height, cell("key_h_dev_um"));
        expect(key.limits?.height.designation).toBe(cell("key_h_class"));
        expect(key.limits?.width.designation).toBe(cell("key_b_class"));
        expect(markAt(key.limits?.height.basis ?? [], /^key tolerances/)).toBe(markOf(marks["h_class"]));
        expectDepths(seat, diameter, cell("t1"), cell("t1_dev_um"), cell("t2"), cell("t2_dev_um"));
        expectUm(seat.shaft.control, cell("d_minus_t1_dev_um"));
        expectUm(seat.hub.control, cell("d_plus_t2_dev_um"));
        expect(rangeOf(seat.radius)).toEqual([ticksOf(cell("keyway_radius_min")), ticksOf(cell("keyway_radius_max"))]);
        expect(rangeOf(seat.chamfer)).toEqual([ticksOf(cell("key_chamfer_min")), ticksOf(cell("key_chamfer_max"))]);
        expect(key.chamfer).toEqual(seat.chamfer);
        const edition = standard === "DIN 6885-1" ? "DIN6885_1" : "ISO_R773";
        const range = [ticksOf(cell(`length_min_${edition}`)), ticksOf(cell(`length_max_${edition}`))];
        expect(rangeOf(key.lengths)).toEqual(range);
        expect(markAt(key.basis, /^key lengths/)).toBe(markOf(marks[`length_${edition}`]));
        expect(markAt(key.basis, /^key chamfer/)).toBe(markOf(marks["key_chamfer"]));
        expect(markAt(seat.basis, /^keyway radius/)).toBe(markOf(marks["keyway_radius"]));
        expect(markAt(seat.basis, /^depths/)).toBe(markOf(marks["range_b_h_t1_t2"]));
        expect(seat.passOverBore?.ticks ?? null).toBe(
          standard === "DIN 6885-1" ? diameter.ticks + ticksOf(cell("passover_bore_min_add_DIN")) : null,
        );
      }
      const back = metricKeyseat(diameter, { standard: "DIN 6885-1", hubDepth: "back interference" });
      expect(back.hub.nominalDepth.ticks).toBe(ticksOf(cell("t2_back_interference_DIN")));
      expectUm(back.hub.depth, cell("t2_back_interference_dev_um"));
      expect(codeOf(() => metricKeyseat(diameter, { hubDepth: "back interference" }))).toBe("KEY_CLASS_NOT_DEFINED");
      // t1 + t2 - h, as the file states it
      const { shaft, hub, key } = metricKeyseat(diameter);
      expect(shaft.nominalDepth.ticks + hub.nominalDepth.ticks - key.height.ticks).toBe(
        ticksOf(cell("top_clearance_nominal")),
      );
      expect(shaft.nominalDepth.ticks + back.hub.nominalDepth.ticks - key.height.ticks).toBe(
        ticksOf(cell("back_interference_nominal")),
      );
    }
  });

  it("a boundary belongs to the row below it", () => {
    const sections = ["22", "30", "38", "44", "50", "58", "65", "75", "85", "95", "110", "130"].map((d) => [
      metricKey(lengthOf(d)).width.to("mm"),
      metricKey(lengthOfTicks(ticksOf(d) + 1, "mm")).width.to("mm"),
    ]);
    // 22 takes 6 x 6, 22.01 takes 8 x 7, ...
    const [first, ...rest] = [6, 8, 10, 12, 14, 16, 18, 20, 22, 25, 28, 32, 36];
    expect(sections).toEqual(rest.map((to, index) => [index === 0 ? first : rest[index - 1], to]));
  });

  it("nothing below 6 mm and above 500 mm", () => {
    expect(codeOf(() => metricKey(lengthOfTicks(ticksOf("6") - 1, "mm")))).toBe("KEY_SHAFT_OUT_OF_RANGE");
    expect(codeOf(() => metricKey(lengthOfTicks(ticksOf("500") + 1, "mm")))).toBe("KEY_SHAFT_OUT_OF_RANGE");
    expect(metricKey("6 mm").width.toString()).toBe("2 mm");
  });

  it("the least strength of the key is that of the standard that names one", () => {
    // one source each: BS 4235-1 and JIS B 1301:1996 in published texts
    const strengths = standards.map((standard) => metricKey("40 mm", { standard }).leastStrength?.toString() ?? null);
    expect(strengths).toEqual([null, null, "550 MPa", "600 MPa"]);
  });
});

describe("JIS B 1301: bracketed sizes", () => {
  it.each(bracketed.cases)("$expected.b x $expected.h, on request only", ({ input, expected, mark }) => {
    const marks = mark as unknown as Record<string, string>;
    for (const diameter of within(input)) {
      const asked = { standard: "JIS B 1301", bracketed: true } as const;
      const key = metricKey(diameter, asked);
      expect(key.basis[0]?.place).toContain(`over ${input.d_over} to ${input.d_to} mm`);
      const seat = metricKeyseat(diameter, { ...asked, fit: "close" });
      expect([key.width.ticks, key.height.ticks]).toEqual([ticksOf(expected?.["b"]), ticksOf(expected?.["h"])]);
      const um = [0, expected?.tol_um ?? NaN] as const;
      expectDepths(seat, diameter, expected?.["t1"] ?? null, um, expected?.["t2"] ?? null, um);
      expect(key.limits?.width.designation).toBe("h9");
      expect(key.limits?.height.designation).toBe(expected?.["b"] === expected?.["h"] ? "h9" : "h11");
      const depths = seat.basis.filter(({ place }) => place.startsWith("depths"));
      expect(depths.map((step) => step.mark)).toEqual([markOf(marks["t1"]), markOf(marks["t2"])]);
      // never by default
      const plain = metricKey(diameter, { standard: "JIS B 1301" });
      expect(bracketed.cases.map((one) => ticksOf(one.expected?.["b"]))).not.toContain(plain.width.ticks);
    }
  });

  it("of JIS B 1301 only, and only where there is one", () => {
    expect(codeOf(() => metricKey("24 mm", { bracketed: true }))).toBe("OPTION_INVALID");
    expect(codeOf(() => metricKey("20 mm", { standard: "JIS B 1301", bracketed: true }))).toBe(
      "KEY_SHAFT_OUT_OF_RANGE",
    );
    expect(codeOf(() => metricKey("30 mm", { standard: "JIS B 1301", bracketed: true }))).toBe(
      "KEY_SHAFT_OUT_OF_RANGE",
    );
  });
});

describe("the other tables, each by its own name", () => {
  it.each(other.cases)("$input.standard, over $input.d_over to $input.d_to", ({ input, expected, ...rest }) => {
    const cell = (...names: string[]): Cell => {
      for (const name of names) if (expected !== null && name in expected) return expected[name] ?? null;
      return null;
    };
    const { standard } = input;
    const included = cell("d_over_inclusive") !== null || cell("lower_bound") === "inclusive";
    const mark = (rest as Marked).mark;
    for (const diameter of within(input, included)) {
      const key = metricKey(diameter, { standard });
      const seat = metricKeyseat(diameter, { standard });
      expect(key.basis[0]?.place).toContain(`over ${input.d_over} to ${input.d_to} mm`);
      expect([key.width.ticks, key.height.ticks]).toEqual([ticksOf(cell("b")), ticksOf(cell("h", "h_thick_end"))]);
      const t2 = cell("t2", "t2_back_clearance", "t2_deep_end");
      const t2Um = cell("t2_dev_um", "t2_back_clearance_dev_um");
      expectDepths(seat, diameter, cell("t1"), cell("t1_dev_um"), t2, t2Um);
      expectOthers(standard, diameter, cell, mark);
    }
  });

  function expectOthers(
    standard: MetricKeyStandard,
    diameter: Length,
    cell: (...names: string[]) => Cell,
    mark: unknown,
  ): void {
    const key = metricKey(diameter, { standard });
    const seat = metricKeyseat(diameter, { standard });
    const [t1Step, t2Step] = seat.basis.filter(({ place }) => place.startsWith("depths"));
    const words = String(mark);
    switch (standard) {
      case "ISO 2491": {
        expect(rangeOf(seat.radius)).toEqual([ticksOf(cell("keyway_radius_min")), ticksOf(cell("keyway_radius_max"))]);
        expect(rangeOf(seat.chamfer)).toEqual([ticksOf(cell("key_chamfer_min")), ticksOf(cell("key_chamfer_max"))]);
        expect(rangeOf(key.lengths)).toEqual([ticksOf(cell("length_min")), ticksOf(cell("length_max"))]);
        expect(t1Step?.mark).toBe(words.startsWith("t1: one-source") ? "one-source" : "memory");
        expect(t2Step?.mark).toBe("memory");
        // the class of the height is known from 5 mm up
        expect(key.limits?.height.designation ?? null).toBe(Number(cell("h")) >= 5 ? "h11" : null);
        break;
      }
      case "DIN 6885-3": {
        expect([key.limits, seat.radius]).toEqual([null, null]);
        expect(t1Step?.mark).toBe("memory");
        expect(t2Step?.mark).toBe(words.includes("t2 one-source") ? "one-source" : "memory");
        const heightMark = /^section heights (two-sources|one-source)/.exec(words)?.[1] ?? "memory";
        expect(markAt(key.basis, /^key tolerances/)).toBe(heightMark);
        break;
      }
      case "older depth series": {
        const back = metricKeyseat(diameter, { standard, hubDepth: "back interference" });
        expect(back.hub.nominalDepth.ticks).toBe(ticksOf(cell("t2_back_interference")));
        expectUm(back.hub.depth, cell("t2_back_interference_dev_um"));
        // "nominal depths two-sources for 6x6 to 56x32, one-source for 2x2 to 5x5 and 63x32"
        const b = Number(cell("b"));
        expect(t1Step?.mark).toBe(b >= 6 && b <= 56 ? "two-sources" : "one-source");
        break;
      }
      case "ISO/R 774":
        expectTaper(diameter, cell, mark as Record<string, string>);
        break;
      default:
        expect([t1Step?.mark, t2Step?.mark, key.limits]).toEqual(["one-source", "one-source", null]);
    }
  }

  function expectTaper(diameter: Length, cell: (...names: string[]) => Cell, marks: Record<string, string>): void {
    const key = metricKey(diameter, { standard: "ISO/R 774" });
    const seat = metricKeyseat(diameter, { standard: "ISO/R 774" });
    expect(key.taper).toEqual({ numerator: 1, denominator: 100 });
    expect(key.limits?.taper).toEqual(key.taper);
    expect(key.limits?.width.designation).toBe(cell("key_b_class"));
    expect(key.limits?.height.designation).toBe(cell("key_h_class"));
    for (const { width } of [seat.shaft, seat.hub]) {
      expect(width?.designation).toBe(cell("keyway_width_class_shaft_and_hub"));
      expectUm(width, cell("keyway_width_dev_um"));
    }
    expect(rangeOf(seat.radius)).toEqual([ticksOf(cell("keyway_radius_min")), ticksOf(cell("keyway_radius_max"))]);
    expect(markAt(seat.basis, /^depths/)).toBe(markOf(marks["t1_t2"]));
    expect(markAt(seat.basis, /^keyway radius/)).toBe(markOf(marks["tolerances_radii"]));
    const head = cell("gib_head_height_h1");
    expect(key.gibHeadHeight?.ticks ?? null).toBe(head === null ? null : ticksOf(head));
    if (head !== null) expect(markAt(key.basis, /^gib head/)).toBe(markOf(marks["gib_head"]));
    expect(metricKey(diameter, { standard: "DIN 6887" }).gibHeadHeight).toEqual(key.gibHeadHeight);
    const plain = metricKey(diameter, { standard: "DIN 6886" });
    expect(plain.gibHeadHeight).toBeNull();
    const [from, to] = [cell("length_min_DIN6886"), cell("length_max_DIN6886")];
    expect(rangeOf(plain.lengths)).toEqual(from === null ? null : [ticksOf(from), ticksOf(to)]);
    if (from !== null) expect(markAt(plain.basis, /^key lengths/)).toBe(markOf(marks["length_DIN6886"]));
    // ISO/R 774 has the lengths of the parallel keys of equal width
    expect(key.lengths).toEqual(metricKey(diameter).lengths);
    expect(metricKey(diameter, { standard: "DIN 6887" }).lengths).toBeNull();
  }

  it("nothing outside their ranges", () => {
    const standards = [...new Set(other.cases.map(({ input }) => input.standard))];
    for (const standard of standards) {
      const rows = other.cases.filter(({ input }) => input.standard === standard);
      const first = ticksOf(rows[0]?.input.d_over);
      const last = ticksOf(rows.at(-1)?.input.d_to);
      const included = ["d_over_inclusive", "lower_bound"].some((name) => name in (rows[0]?.expected ?? {}));
      const outside = [included ? first - 1 : first, last + 1].map((ticks) => lengthOfTicks(ticks, "mm"));
      for (const diameter of outside) {
        expect(
          codeOf(() => metricKey(diameter, { standard })),
          `${standard} ${diameter.toString()}`,
        ).toBe("KEY_SHAFT_OUT_OF_RANGE");
      }
    }
  });
});

describe("keyway widths", () => {
  const fitsByName = (
    widths as unknown as { classes: { name_ISO_BS: MetricKeyFit; shaft: string; hub: string; key: string }[] }
  ).classes;

  it.each(widths.cases)("over $input.b_over to $input.b_to, from ISO 286 and as printed", ({ input, expected }) => {
    // N above IT8 is not defined up to 1 mm
    for (const ticks of [Math.max(ticksOf(input.b_over), ticksOf("1")) + 1, ticksOf(input.b_to)]) {
      for (const [cls, um] of Object.entries(expected?.keyway_dev_um ?? {})) {
        expectUm(isoLimits(lengthOfTicks(ticks, "mm"), cls), um);
      }
      expectUm(isoLimits(lengthOfTicks(ticks, "mm"), "h9"), expected?.key_h9_dev_um);
    }
  });

  it("every section, every fit: classes, limits and clearances", () => {
    for (const { expected: row } of parallel.cases) {
      const diameter = lengthOf(parallel.cases.find((one) => one.expected === row)?.input.d_to);
      const table = widths.cases.find(({ expected }) => expected?.keys_b.includes(String(row?.["b"])))?.expected;
      for (const { name_ISO_BS: fit, shaft, hub, key: keyClass } of fitsByName) {
        const seat = metricKeyseat(diameter, { fit });
        const key = metricKey(diameter);
        expect(keyClass).toBe(key.limits?.width.designation);
        for (const [width, cls] of [
          [seat.shaft.width, shaft],
          [seat.hub.width, hub],
        ] as const) {
          expect(width?.designation).toBe(cls);
          expectUm(width, table?.keyway_dev_um[cls]);
          const clearance = table?.clearance_um_key_h9[cls];
          expect((width?.max.ticks ?? NaN) - (key.limits?.width.min.ticks ?? NaN)).toBe((clearance?.max ?? NaN) * UM);
          expect((width?.min.ticks ?? NaN) - (key.limits?.width.max.ticks ?? NaN)).toBe((clearance?.min ?? NaN) * UM);
        }
      }
    }
  });
});

describe("lengths", () => {
  const { series, extension } = lengths as unknown as { series: string[]; extension: { values: string[] } };

  it("the series, whole, and nothing between", () => {
    for (const [standard, list] of [
      ["ISO/R 773", [...series, ...extension.values]],
      ["DIN 6885-1", series],
      ["JIS B 1301", series],
      ["ISO 2491", series],
    ] as const) {
      const found: number[] = [];
      let next = metricKeyLength("1 mm", { standard }).longer;
      while (next !== null) {
        found.push(next.to("mm"));
        expect(metricKeyLength(next, { standard }).inSeries).toBe(true);
        expect(metricKeyLength(lengthOfTicks(next.ticks + 1, "mm"), { standard }).inSeries).toBe(false);
        next = metricKeyLength(next, { standard }).longer;
      }
      expect(found).toEqual(list.map(Number));
    }
  });

  it("DIN 6885-1: length tolerances, and where they are in doubt", () => {
    for (const { input, expected, mark } of lengths.cases) {
      if (input.edition !== "DIN 6885-1" || expected === null) continue;
      const group = series.filter((one) => Number(one) >= Number(expected.from) && Number(one) <= Number(expected.to));
      expect(group.length).toBeGreaterThan(5);
      const doubtful = String(mark).startsWith("memory only");
      for (const text of group) {
        const found = metricKeyLength(lengthOf(text), { standard: "DIN 6885-1" });
        expectUm(found.keyLimits, expected.key_dev_um);
        expectUm(found.keywayLimits, expected.keyway_dev_um);
        expect(found.keyLimits?.basis[0]?.mark).toBe(doubtful ? "conflict" : "one-source");
        expect(found.cautions.map(({ code }) => code)).toEqual(doubtful ? ["KEY_VALUE_DOUBTFUL"] : []);
      }
    }
  });

  it("JIS B 1301: h12; the others fix none that is known here", () => {
    const jis = lengths.cases.find(({ input }) => input.edition === "JIS B 1301:1996")?.expected;
    for (const text of series) {
      const found = metricKeyLength(lengthOf(text), { standard: "JIS B 1301" });
      expect(found.keyLimits?.designation).toBe(jis?.class_key);
      expect(found.keywayLimits).toBe(jis?.class_keyway);
      expect(metricKeyLength(lengthOf(text)).keyLimits).toBeNull();
    }
  });
});

describe("Woodruff keys: ISO 3912", () => {
  it.each(iso.cases)("$input.b x $input.h x $input.D", ({ input, expected, ...rest }) => {
    const cell = (name: string): Cell => expected?.[name] ?? null;
    const marks = (rest as Marked).mark as Record<string, string>;
    const size = { standard: "ISO 3912", width: lengthOf(input.b), diameter: lengthOf(input.D) } as const;
    const key = metricWoodruffKey(size);
    expect(key.designation).toBe(`${input.b}x${input.h}x${input.D}`);
    expect([key.width.nominal.ticks, key.height.nominal.ticks, key.diameter?.nominal.ticks]).toEqual([
      ticksOf(input.b),
      ticksOf(input.h),
      ticksOf(input.D),
    ]);
    expectUm(key.width, cell("key_b_dev_um"));
    expectUm(key.height, cell("key_h_dev_um"));
    expectUm(key.diameter, cell("key_D_dev_um"));
    expect([key.width.designation, key.height.designation, key.diameter?.designation]).toEqual([
      cell("key_b_class"),
      cell("key_h_class"),
      cell("key_D_class"),
    ]);
    expect(key.flatBottomHeight?.ticks).toBe(ticksOf(cell("h1_flat_bottom")));
    expect(rangeOf(key.chamfer)).toEqual([ticksOf(cell("key_chamfer_min")), ticksOf(cell("key_chamfer_max"))]);
    expect(key.basis.find(({ says }) => says.startsWith("flat"))?.mark).toBe(markOf(marks["h1"]));
    expect(key.basis.find(({ says }) => says.startsWith("chamfer"))?.mark).toBe(markOf(marks["key_chamfer"]));
    const classes = expected?.["keyway_width"] as unknown as Record<"normal" | "close", { shaft: string; hub: string }>;
    for (const fit of ["normal", "close"] as const) {
      const seat = metricWoodruffKeyseat({ ...size, fit });
      // N9 is printed for 1 mm too, where ISO 286-1 does not define it: no limits, and the basis says why
      const missing = input.b === "1" && classes[fit].shaft === "N9";
      expect(seat.shaft.width?.designation).toBe(missing ? undefined : classes[fit].shaft);
      expect(seat.hub.width?.designation).toBe(classes[fit].hub);
      expect(seat.basis.some(({ says }) => says.includes("does not define"))).toBe(missing);
      for (const [member, name] of [
        [seat.shaft, "t1"],
        [seat.hub, "t2"],
      ] as const) {
        expect(member.nominalDepth.ticks).toBe(ticksOf(cell(name)));
        expect(member.depth?.nominal.ticks).toBe(ticksOf(cell(name)));
        expectUm(member.depth, cell(`${name}_dev_um`));
      }
      expect(rangeOf(seat.radius)).toEqual([ticksOf(cell("keyway_radius_min")), ticksOf(cell("keyway_radius_max"))]);
    }
    for (const [duty, name] of [
      ["torque", "shaft_series_1_torque"],
      ["locating", "shaft_series_2_locating"],
    ] as const) {
      const range = expected?.[name] as unknown as { over: string; to: string } | null;
      const has = (ticks: number): boolean =>
        metricWoodruffKeysFor(lengthOfTicks(ticks, "mm"), { standard: "ISO 3912", duty }).designations.includes(
          key.designation,
        );
      if (range === null) {
        expect(has(ticksOf("38"))).toBe(false);
        continue;
      }
      const [over, to] = [ticksOf(range.over), ticksOf(range.to)];
      // the first row starts at 3 mm, included
      expect([has(over + 1), has(to)]).toEqual([true, true]);
      if (range.over === "3") expect(has(over)).toBe(true);
      else expect(has(over)).toBe(false);
    }
  });
});

describe("Woodruff keys: DIN 6888", () => {
  const { allocation } = din as unknown as { allocation: Record<string, Record<string, { over: string; to: string }>> };

  it.each(din.cases)("$input.b x $input.h x $input.d2", ({ input, expected, ...rest }) => {
    const words = String((rest as Marked).mark);
    const size = { standard: "DIN 6888", width: lengthOf(input.b), diameter: lengthOf(input.d2) } as const;
    const key = metricWoodruffKey(size);
    expect(key.designation).toBe(`${input.b}x${input.h}x${input.d2}`);
    expect([key.width.designation, key.height.designation]).toEqual(["h9", "h12"]);
    if (Number(input.b) <= 4) expectUm(key.diameter, [-100, 0]);
    else expect(key.diameter).toBeNull();
    expect(key.leastStrength?.to("MPa")).toBe(588);
    for (const series of ["A", "B"] as const) {
      const depths = expected?.[`series_${series}`] as unknown as { t1: string; t2: string } | null;
      if (depths === null) {
        expect(codeOf(() => metricWoodruffKeyseat({ ...size, series }))).toBe("KEY_CLASS_NOT_DEFINED");
        continue;
      }
      const seat = metricWoodruffKeyseat({ ...size, series, fit: "close" });
      expect([seat.shaft.width?.designation, seat.hub.width?.designation]).toEqual(["P9", "P9"]);
      expect(seat.cutterDiameter.nominal.ticks).toBe(ticksOf(input.d2));
      expectUm(seat.cutterDiameter, [0, 500]);
      for (const [member, name] of [
        [seat.shaft, "t1"],
        [seat.hub, "t2"],
      ] as const) {
        expect(member.nominalDepth.ticks).toBe(ticksOf(depths[name]));
        const deviation = expected?.[`${name}_dev_um`] ?? null;
        if (deviation === null) expect(member.depth).toBeNull();
        else expectUm(member.depth, deviation);
      }
      // "t1 + t2 - h = 0.2 in every row"
      expect(ticksOf(depths.t1) + ticksOf(depths.t2) - ticksOf(input.h)).toBe(ticksOf("0.2"));
      const wanted = words.startsWith("one-source (standard text)") ? "one-source+formula" : "memory";
      expect(seat.basis[0]?.mark).toBe(wanted);
    }
    expect(codeOf(() => metricWoodruffKeyseat({ ...size, fit: "normal" }))).toBe("KEY_CLASS_NOT_DEFINED");
  });

  it.each([
    ["torque", "I_full_torque"],
    ["locating", "II_location_only"],
  ] as const)("shafts, %s", (duty, name) => {
    for (const [b, { over, to }] of Object.entries(allocation[name] ?? {})) {
      const sizes = din.cases
        .filter(({ input }) => input.b === b)
        .map(({ input }) => `${input.b}x${input.h}x${input.d2}`);
      const at = (ticks: number): readonly string[] => {
        const found = metricWoodruffKeysFor(lengthOfTicks(ticks, "mm"), { standard: "DIN 6888", duty });
        return found.designations.filter((one) => one.startsWith(`${b}x`));
      };
      expect(at(ticksOf(over) + 1)).toEqual(sizes);
      expect(at(ticksOf(to))).toEqual(sizes);
      const above = lengthOfTicks(ticksOf(to) + 1, "mm");
      if (to !== "38") {
        const found = metricWoodruffKeysFor(above, { standard: "DIN 6888", duty }).designations;
        expect(found.some((one) => one.startsWith(`${b}x`))).toBe(false);
      } else {
        expect(codeOf(() => metricWoodruffKeysFor(above, { standard: "DIN 6888", duty }))).toBe(
          "KEY_SHAFT_OUT_OF_RANGE",
        );
      }
    }
  });
});

type Values = Readonly<Record<string, unknown>>;
type Run = (given: Values, wanted: Values, standard: string) => void;

/** The standard that a case means; cases of equal tables name several. */
function standardOf(text: string): MetricKeyStandard {
  if (text.startsWith("DIN 6885-1:1968 / ISO/R 773")) return "ISO/R 773";
  if (text.startsWith("DIN 6886 / ISO/R 774")) return "ISO/R 774";
  const found = (
    [
      "JIS B 1301-1959",
      "JIS B 1301",
      "DIN 6885-3",
      "DIN 6885-2",
      "DIN 6885-1",
      "DIN 6886",
      "older depth series",
    ] as const
  ).find((one) => text.startsWith(one));
  if (found === undefined) throw new Error(`which standard: ${text}`);
  return found;
}

const keyway: Run = (given, wanted, text) => {
  const standard = standardOf(text);
  const diameter = lengthOf(given["d"]);
  const key = metricKey(diameter, { standard });
  const seat = metricKeyseat(diameter, { standard });
  const cells: Record<string, Length | undefined> = {
    b: key.width,
    h: key.height,
    t1: seat.shaft.nominalDepth,
    t2: seat.hub.nominalDepth,
    d_plus_t2_min: seat.hub.control?.min ?? seat.hub.nominalControl,
    d_plus_t2_max: seat.hub.control?.max,
    d_minus_t1_max: seat.shaft.control?.max ?? seat.shaft.nominalControl,
    d_minus_t1_min: seat.shaft.control?.min,
  };
  for (const [name, value] of Object.entries(wanted)) {
    if (name === "t2_dev_um") expectUm(seat.hub.depth, value);
    else if (name === "width_class")
      expect([seat.shaft.width?.designation, seat.hub.width?.designation]).toEqual([value, value]);
    else expect(cells[name]?.ticks, name).toBe(ticksOf(value));
  }
};

const RUN: Record<string, Run> = {
  parallel_keyway: keyway,
  thin_keyway: keyway,
  machine_tool_keyway: keyway,
  old_depth_series: keyway,
  jis_1959: keyway,
  taper_keyway: keyway,
  select: (given, wanted, text) => {
    const standard = standardOf(text);
    const diameter = lengthOf(given["d"]);
    if (wanted["result"] === "none") {
      expect(codeOf(() => metricKey(diameter, { standard }))).toBe("KEY_SHAFT_OUT_OF_RANGE");
      return;
    }
    const key = metricKey(diameter, { standard });
    expect([key.width.ticks, key.height.ticks]).toEqual([ticksOf(wanted["b"]), ticksOf(wanted["h"])]);
    if (wanted["row"] !== undefined) expect(key.basis[0]?.place).toContain(wanted["row"]);
  },
  length_tolerance: (given, wanted, text) => {
    const found = metricKeyLength(lengthOf(given["l"]), { standard: standardOf(text) });
    expectUm(found.keyLimits, wanted["key_dev_um"]);
    expectUm(found.keywayLimits, wanted["keyway_dev_um"]);
  },
  width_limits: (given, wanted) => {
    const row = parallel.cases.find(({ expected }) => expected?.["b"] === given["b"]);
    const cls = String(given["class"]);
    const seat = metricKeyseat(lengthOf(row?.input.d_to), { widths: { shaft: cls, hub: cls } });
    expectUm(seat.shaft.width, wanted["dev_um"]);
    expectUm(seat.hub.width, wanted["dev_um"]);
  },
  key_limits: (given, wanted) => {
    const key = metricKey("100 mm", { key: { width: lengthOf(given["b"]), height: lengthOf(given["h"]) } });
    expectUm(key.limits?.width, wanted["b_dev_um"]);
    expectUm(key.limits?.height, wanted["h_dev_um"]);
    expect(key.standardForShaft).toBe(false);
  },
  jis_bracketed: (given, wanted) => {
    const key = { width: lengthOf(given["b"]), height: lengthOf(given["h"]) };
    const seat = metricKeyseat("54 mm", { standard: "JIS B 1301", bracketed: true, key });
    const um = [0, Number(wanted["tol_um"])] as const;
    expectDepths(seat, lengthOf("54"), String(wanted["t1"]), um, String(wanted["t2"]), um);
  },
  fit_clearance: (given, wanted) => {
    const row = parallel.cases.find(({ expected }) => expected?.["b"] === given["b"]);
    const diameter = lengthOf(row?.input.d_to);
    const seat = metricKeyseat(diameter, { fit: given["fit"] as MetricKeyFit });
    const key = metricKey(diameter).limits;
    if (key === null) throw new Error("no limits");
    const single = limits({ nominal: diameter, upper: "0 mm", lower: "0 mm" });
    const joint = keyedAssembly({ shaft: single, bore: single, key, shaftKeyseat: seat.shaft, hubKeyseat: seat.hub });
    const side = given["side"] === "shaft" ? joint.sideInShaft : joint.sideInHub;
    expect([side?.min.ticks, side?.max.ticks]).toEqual([Number(wanted["min_um"]) * UM, Number(wanted["max_um"]) * UM]);
  },
  over_key_height: (given, wanted) => {
    const diameter = lengthOf(given["d"]);
    const { control } = metricKeyseat(diameter).shaft;
    const key = metricKey(diameter);
    if (control === null || key.limits === null) throw new Error("no limits");
    expect(key.width.ticks).toBe(ticksOf(wanted["b"]));
    expect(overKey({ control, keyHeight: key.limits.height }).nominal.ticks).toBe(ticksOf(wanted["GA_nominal"]));
  },
  wall_depth: (given, wanted) => {
    const [diameter, width] = [lengthOf(given["d"]), lengthOf(given["b"])];
    expect(keyseatCrown(diameter, width).ticks).toBe(ticksOf(wanted["sagitta"]));
    const { nominalControl: control } = metricKeyseat(diameter).shaft;
    const wall = keyseatSideDepth({ diameter, width, member: "shaft", control });
    expect(wall.ticks).toBe(ticksOf(wanted["wall_depth_shaft"]));
  },
  taper_drop: (given, wanted) => {
    const { taper } = metricKey("40 mm", { standard: "DIN 6886" });
    if (taper === null) throw new Error("no taper");
    expect(multiply(lengthOf(given["l"]), taper).ticks).toBe(ticksOf(wanted["height_drop"]));
  },
  length_range: (given, wanted, text) => {
    const key = { width: lengthOf(given["b"]), height: lengthOf(given["h"]) };
    const { range } = metricKeyLength("100 mm", { standard: standardOf(text), key });
    expect(rangeOf(range)).toEqual([ticksOf(wanted["l_min"]), ticksOf(wanted["l_max"])]);
  },
  length_valid: (given, wanted) => {
    const key = { width: lengthOf(given["b"]), height: lengthOf(given["h"]) };
    const found = metricKeyLength(lengthOf(given["l"]), { key });
    expect(found.valid).toBe(wanted["valid"]);
    // "30 is not in the series (28, 32)"
    expect([found.shorter?.to("mm"), found.longer?.to("mm")]).toEqual([28, 32]);
  },
  woodruff_key: (given, wanted) => {
    const key = metricWoodruffKey({
      standard: "ISO 3912",
      width: lengthOf(given["b"]),
      diameter: lengthOf(given["D"]),
    });
    expect(key.height.nominal.ticks).toBe(ticksOf(wanted["h"]));
    expect(key.flatBottomHeight?.ticks).toBe(ticksOf(wanted["h1"]));
    const [from, to] = wanted["chamfer"] as [string, string];
    expect(rangeOf(key.chamfer)).toEqual([ticksOf(from), ticksOf(to)]);
    if (wanted["b_dev_um"] !== undefined) expectUm(key.width, wanted["b_dev_um"]);
    if (wanted["h_dev_um"] !== undefined) expectUm(key.height, wanted["h_dev_um"]);
    if (wanted["D_dev_um"] !== undefined) expectUm(key.diameter, wanted["D_dev_um"]);
  },
  woodruff_keyway: (given, wanted, text) => {
    const standard: MetricWoodruffStandard = "DIN 6888";
    const series = text.endsWith("B") ? "B" : "A";
    const row = din.cases.find(({ input }) => input.b === given["b"] && input.h === given["h"]);
    const size = {
      standard,
      width: lengthOf(given["b"]),
      diameter: lengthOf(row?.input.d2),
      height: lengthOf(given["h"]),
    };
    const seat = metricWoodruffKeyseat({ ...size, series });
    expect([seat.shaft.nominalDepth.ticks, seat.hub.nominalDepth.ticks]).toEqual([
      ticksOf(wanted["t1"]),
      ticksOf(wanted["t2"]),
    ]);
  },
  torque_from_power: (given, wanted) => {
    const found = torqueFromPower({
      power: `${String(given["P_kW"])} kW`,
      revolutionsPerMinute: Number(given["n_rpm"]),
    });
    expect(Math.abs(found.to("Nm") * 1000 - Number(wanted["T_Nmm"]))).toBeLessThanOrEqual(Number(wanted["tol"]));
  },
  length_from_pressure: (given, wanted) => {
    const load = keyLoad({
      torque: torque(Number(given["T_Nmm"]) / 1000, "Nm"),
      shaftDiameter: lengthOf(given["d"]),
      key: { width: lengthOf(given["h"]), height: lengthOf(given["h"]) },
      ends: "square",
      pressure: "half height",
      allowables: { bearing: `${Number(given["p"])} MPa` },
    });
    expect(Math.abs((load.neededLength.bearing?.to("mm") ?? NaN) - Number(wanted["l_mm"]))).toBeLessThanOrEqual(
      Number(wanted["tol"]),
    );
  },
  length_from_shear: (given, wanted) => {
    // the force is given: on a shaft of 38 mm, which the text has, it is this torque; kgf to N by 9.80665
    const newtons = Number(given["F_kgf"]) * 9.80665;
    const load = keyLoad({
      torque: torque((newtons * 38) / 2000, "Nm"),
      shaftDiameter: "38 mm",
      key: { width: lengthOf(given["b"]), height: "8 mm" },
      ends: "square",
      pressure: "half height",
      allowables: { shear: `${Number(given["tau_kgf_mm2"]) * 9.80665} MPa` },
    });
    expect(load.force?.to("N")).toBeCloseTo(newtons, 6);
    expect(Math.abs((load.neededLength.shear?.to("mm") ?? NaN) - Number(wanted["l_mm"]))).toBeLessThanOrEqual(
      Number(wanted["tol"]),
    );
  },
  pressure_half_height: (given, wanted) => {
    pressure("half height", given, wanted);
  },
  pressure_h_prime_045: (given, wanted) => {
    pressure("0.45 h", { ...given, h: "9" }, wanted);
  },
  effective_length: (given, wanted) => {
    expect(given["form"]).toBe("B");
    const load = keyLoad({
      shaftDiameter: "50 mm",
      key: { width: lengthOf(given["b"]), height: "9 mm" },
      length: lengthOf(given["l"]),
      ends: "square",
      pressure: "half height",
    });
    expect(load.bearingLength?.ticks).toBe(ticksOf(wanted["l_eff"]));
  },
  two_keys: (given, wanted) => {
    const joint = {
      torque: "300 N·m",
      shaftDiameter: "50 mm",
      key: { width: "14 mm", height: "9 mm" },
      length: "56 mm",
      ends: "square",
      pressure: "half height",
    } as const;
    const one = keyLoad(joint).pressure?.value ?? NaN;
    const two = keyLoad({ ...joint, keys: 2, severalKeys: "two count as 1.5" }).pressure?.value ?? NaN;
    expect(given["keys"]).toBe(2);
    expect(two / one).toBeCloseTo(Number(wanted["p"]) / Number(given["p_one_key"]), 10);
  },
  control_sign: (given, wanted) => {
    expect(given["quantity"]).toBe("d + t2");
    expectUm(metricKeyseat(lengthOf(given["d"])).hub.control, wanted["dev_um"]);
  },
};

function pressure(form: "half height" | "0.45 h", given: Values, wanted: Values): void {
  const load = keyLoad({
    torque: torque(Number(given["T_Nmm"]) / 1000, "Nm"),
    shaftDiameter: lengthOf(given["d"]),
    key: { width: "14 mm", height: lengthOf(given["h"]) },
    length: lengthOf(given["l_eff"]),
    ends: "square",
    pressure: form,
  });
  expect(load.pressureForm).toBe(form);
  expect(Math.abs((load.pressure?.to("MPa") ?? NaN) - Number(wanted["p"]))).toBeLessThanOrEqual(Number(wanted["tol"]));
}

describe("published cases", () => {
  it.each(published.cases as (Case<Values, Values> & { id: string; kind: string; standard: string })[])(
    "$id $kind",
    ({ kind, standard, input, expected }) => {
      const run = RUN[kind];
      if (run === undefined) throw new Error(`no way to check ${kind}`);
      run(input, expected ?? {}, standard);
    },
  );
});
