import {
  decodeWoodruffNumber,
  inchKey,
  inchKeyseat,
  keyedAssembly,
  keyLoad,
  keyseatCrown,
  keywayStrengthFactor,
  lengthOfTicks,
  limits,
  torque,
  torqueFromPower,
  woodruffKey,
  woodruffKeysFor,
  woodruffKeyseat,
  woodruffNumber,
} from "limitsmith";
import type { InchKeyClass, InchKeyKind, KeyedAssembly, KeyLimits, KeyShape, Length, Limits } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";
import { readCases } from "./readCases.js";
import type { Case } from "./readCases.js";

// The cases are copies of what published tables say; nothing in them was made by this library.

type Cells = Readonly<Record<string, string | null>>;
interface Range {
  readonly over: string | null;
  readonly to_incl: string | null;
}

const sizes = readCases<Range, Cells>("keys/inch-key-sizes.json");
const tolerances = readCases<Range & { stock: string }, Cells>("keys/inch-key-tolerances.json");
const fits = readCases<
  Range & { fit: string },
  Record<
    "key_width_dev" | "keyseat_width_dev" | "key_height_dev" | "shaft_depth_dev_S" | "hub_depth_dev_T",
    [string, string]
  > &
    Record<"side_fit" | "top_bottom_fit", { max: string; min: string }>
>("keys/inch-fits.json");
const printed = readCases<Cells, Cells>("keys/inch-depths-printed.json");
const computed = readCases<Cells, Cells>("keys/inch-depths-computed.json");
const details = readCases<Cells & { table: string }, Cells>("keys/inch-details.json");
const woodruff = readCases<{ no: string }, Cells>("keys/woodruff-keys.json");
const woodruffSeats = readCases<{ no: string }, Cells>("keys/woodruff-keyseats.json");
const woodruffShafts = readCases<{ W: string }, Cells>("keys/woodruff-shafts.json");
const published = readCases<Record<string, unknown>, Record<string, unknown>>("keys/inch-cases.json");

const INCH = 254_000_000;

/** Ticks of a size as these tables print it: `1 3/16`, `0.517`, `+0.005`, `0.001 INT`. */
function ticksOf(text: unknown): number {
  const words = String(text).replace(/ CL$/, "").split(" ");
  const negative = words.at(-1) === "INT";
  const value = words
    .filter((word) => word !== "INT")
    .reduce((sum, word) => {
      const [over = "", under] = word.split("/");
      return sum + (under === undefined ? Number(over) : Number(over) / Number(under));
    }, 0);
  const ticks = value * INCH;
  if (!Number.isFinite(ticks) || Math.abs(ticks - Math.round(ticks)) > 1e-3)
    throw new Error(`not a size: ${String(text)}`);
  return Math.round(negative ? -ticks : ticks);
}

function lengthOf(text: unknown): Length {
  return lengthOfTicks(ticksOf(text), "in");
}

/** A range at its ends and at several places between. */
function within({ over, to_incl }: Range): Length[] {
  const low = over === null ? ticksOf("3/32") : ticksOf(over);
  const high = ticksOf(to_incl);
  const between = [1, 2, 4, 6, 7].map((eighth) => low + Math.round(((high - low) * eighth) / 16) * 2);
  return [low + 1, ...between, high].map((ticks) => lengthOfTicks(ticks, "in"));
}

/** Printed cells against limits, both as ticks. */
function expectLimits(given: Limits | null | undefined, max: unknown, min: unknown): void {
  expect([given?.max.ticks, given?.min.ticks]).toEqual([ticksOf(max), ticksOf(min)]);
}

function expectDeviations(given: Limits | null | undefined, printedAs: readonly unknown[] | undefined): void {
  const [upper, lower] = printedAs ?? [];
  expect([given?.upperDeviation.ticks, given?.lowerDeviation.ticks]).toEqual([ticksOf(upper), ticksOf(lower)]);
}

/** The mark of the step of a basis whose place matches. */
function markAt(basis: readonly { place: string; mark?: string }[], place: RegExp): string | undefined {
  return basis.find((step) => place.test(step.place))?.mark;
}

function single(size: Length): Limits {
  return limits({ nominal: size, upper: "0 in", lower: "0 in" });
}

/** The joint of standard parts on a shaft and bore of exactly the nominal size. */
function jointOf(
  diameter: Length,
  section: { width: Length; height: Length },
  kind: InchKeyKind,
  keyClass: InchKeyClass,
  depths: "printed" | "formula" = "formula",
): KeyedAssembly {
  const key = inchKey(diameter, { key: section, kind });
  const seat = inchKeyseat(diameter, { key: section, kind, class: keyClass, depths });
  const stock: KeyLimits | null = keyClass === 1 ? key.barStock : key.keystock;
  if (stock === null) throw new Error("no such stock");
  return keyedAssembly({
    shaft: single(diameter),
    bore: single(diameter),
    key: stock,
    shaftKeyseat: seat.shaft,
    hubKeyseat: seat.hub,
  });
}

describe("the files", () => {
  it.each([
    ["inch-key-sizes.json", sizes, 22],
    ["inch-key-tolerances.json", tolerances, 19],
    ["inch-fits.json", fits, 23],
    ["inch-depths-printed.json", printed, 33],
    ["inch-depths-computed.json", computed, 56],
    ["inch-details.json", details, 57],
    ["woodruff-keys.json", woodruff, 66],
    ["woodruff-keyseats.json", woodruffSeats, 66],
    ["woodruff-shafts.json", woodruffShafts, 8],
    ["inch-cases.json", published, 61],
  ] as const)("%s is whole", (_name, file, count) => {
    expect(file.version).toBe(1);
    expect(file.cases.length).toBe(count);
  });
});

describe("B17.1: key size versus shaft diameter", () => {
  it.each(sizes.cases)("over $input.over to $input.to_incl", ({ input, expected, mark }) => {
    for (const diameter of within(input)) {
      const preferred = inchKey(diameter);
      expect(preferred.preferredShape).toBe(expected?.["preferred"]);
      expect(preferred.shape).toBe(expected?.["preferred"]);
      for (const shape of ["square", "rectangular"] as const) {
        const height = expected?.[`H_${shape}`] ?? null;
        if (height === null) {
          expect(codeOf(() => inchKey(diameter, { shape }))).toBe("KEY_SIZE_NOT_DEFINED");
          expect(expected?.[`keyseat_depth_${shape}`]).toBeNull();
          continue;
        }
        const key = inchKey(diameter, { shape });
        expect([key.width.ticks, key.height.ticks]).toEqual([ticksOf(expected?.["W"]), ticksOf(height)]);
        expect(key.standardForShaft).toBe(true);
        expect(key.cautions).toEqual([]);
        const seat = inchKeyseat(diameter, { shape, class: 2 });
        expect(seat.shaft.nominalSideDepth.ticks).toBe(ticksOf(expected?.[`keyseat_depth_${shape}`]));
        expect(seat.key).toEqual({ width: key.width, height: key.height });
        // a section given by hand is the same key
        const byHand = inchKey(diameter, { key: { width: lengthOf(expected?.["W"]), height: lengthOf(height) } });
        expect(byHand).toEqual(key);
      }
      // the preferred shape carries the mark of the row, unless the other shape alone is less sure
      expect(preferred.basis[0]?.mark).toBe(mark);
      expect(preferred.basis[0]?.place).toBe(
        `Table 1, shaft over ${input.over} up to and including ${input.to_incl} in`,
      );
    }
  });

  it("the shapes that only one handbook family has are marked so", () => {
    for (const { input, mark, ...rest } of sizes.cases) {
      const notes = ((rest as { note?: string[] }).note ?? []).join(" ");
      const shape = notes.includes("square height")
        ? "square"
        : notes.includes("rectangular height")
          ? "rectangular"
          : null;
      if (shape === null || mark === "memory") continue;
      const wanted = notes.includes("square height 3 is memory") ? "memory" : "one-source";
      const own = inchKey(lengthOf(input.to_incl), { shape });
      // the row says two-sources for the width and the other height
      expect(own.basis[0]?.mark).toBe(wanted);
    }
  });

  it("nothing below and above", () => {
    expect(codeOf(() => inchKey(lengthOf("5/16")))).toBe("KEY_SHAFT_OUT_OF_RANGE");
    expect(inchKey(lengthOf("30")).width.ticks).toBe(ticksOf("7"));
    expect(codeOf(() => inchKey(lengthOfTicks(ticksOf("30") + 1, "in")))).toBe("KEY_SHAFT_OUT_OF_RANGE");
  });
});

const STOCKS = {
  parallel_square_keystock: ["square", "parallel", "keystock"],
  parallel_square_bar_stock: ["square", "parallel", "barStock"],
  parallel_rectangular_keystock: ["rectangular", "parallel", "keystock"],
  parallel_rectangular_bar_stock: ["rectangular", "parallel", "barStock"],
  taper_plain_or_gib_square_or_rectangular: ["rectangular", "taper", "keystock"],
} as const;

function sectionOf(width: Length, shape: KeyShape): { width: Length; height: Length } {
  return { width, height: shape === "square" ? width : lengthOfTicks(Math.ceil(width.ticks * 0.7), "in") };
}

describe("B17.1: key tolerances", () => {
  it.each(tolerances.cases)("$input.stock, over $input.over to $input.to_incl", ({ input, expected }) => {
    const [shape, kind, stock] = STOCKS[input.stock as keyof typeof STOCKS];
    for (const width of within(input)) {
      const key = inchKey(lengthOf("30"), { key: sectionOf(width, shape), kind });
      expectDeviations(key[stock]?.width, [expected?.["W_upper"], expected?.["W_lower"]]);
      expectDeviations(key[stock]?.height, [expected?.["H_upper"], expected?.["H_lower"]]);
      expect(key.standardForShaft).toBe(width.ticks === ticksOf("7") && shape === "square");
      expect(key.cautions.map(({ code }) => code)).toEqual(["KEY_NOT_STANDARD"]);
      // square bar stock to 3/4 wide is in a second table
      const second = input.stock === "parallel_square_bar_stock" && width.ticks <= ticksOf("3/4");
      expect(markAt(key[stock]?.width.basis ?? [], /^key tolerances/)).toBe(second ? "two-sources" : "one-source");
    }
  });

  it.each([
    ["square", "3 1/2"],
    ["rectangular", "7"],
  ] as const)("%s keys end at %s wide, taper keys too", (shape, last) => {
    const over = lengthOfTicks(ticksOf(last) + 1, "in");
    for (const kind of ["parallel", "taper", "gib-head"] as const) {
      expect(inchKey(lengthOf("30"), { key: sectionOf(lengthOf(last), shape), kind }).shape).toBe(shape);
      expect(codeOf(() => inchKey(lengthOf("30"), { key: sectionOf(over, shape), kind }))).toBe("KEY_SIZE_NOT_DEFINED");
      expect(codeOf(() => inchKeyseat(lengthOf("30"), { key: sectionOf(over, shape), kind, class: 2 }))).toBe(
        "KEY_SIZE_NOT_DEFINED",
      );
    }
  });
});

const FITS = {
  class_1_parallel_square: ["square", "parallel", 1],
  class_1_parallel_rectangular: ["rectangular", "parallel", 1],
  class_2_parallel_square: ["square", "parallel", 2],
  class_2_parallel_rectangular: ["rectangular", "parallel", 2],
  class_2_taper_square_and_rectangular: ["rectangular", "taper", 2],
} as const;

describe("B17.1: fits", () => {
  it.each(fits.cases)("$input.fit, over $input.over to $input.to_incl", ({ input, expected, mark }) => {
    const [shape, kind, keyClass] = FITS[input.fit as keyof typeof FITS];
    for (const width of within(input)) {
      const section = sectionOf(width, shape);
      const diameter = lengthOfTicks(Math.max(ticksOf("3/8"), Math.min(4 * width.ticks, ticksOf("30"))), "in");
      const key = inchKey(diameter, { key: section, kind });
      const stock = keyClass === 1 ? key.barStock : key.keystock;
      const seat = inchKeyseat(diameter, { key: section, kind, class: keyClass });
      expectDeviations(stock?.width, expected?.key_width_dev);
      expectDeviations(stock?.height, expected?.key_height_dev);
      for (const { width: seatWidth } of [seat.shaft, seat.hub]) {
        expectDeviations(seatWidth, expected?.keyseat_width_dev);
        expect(seatWidth?.designation).toBe(`Class ${keyClass}`);
      }
      // one width is remembered although its fit follows by identity
      const widthMark = mark === "formula" ? "memory" : mark;
      expect(markAt(seat.shaft.width?.basis ?? [], /^Table [23], .*width/)).toBe(widthMark);
      expectDeviations(seat.shaft.control, expected?.shaft_depth_dev_S);
      expectDeviations(seat.hub.control, expected?.hub_depth_dev_T);

      const joint = jointOf(diameter, section, kind, keyClass);
      const { side_fit: side, top_bottom_fit: top } = expected ?? {
        side_fit: { max: "", min: "" },
        top_bottom_fit: { max: "", min: "" },
      };
      for (const range of [joint.sideInShaft, joint.sideInHub]) {
        expect([range?.max.ticks, range?.min.ticks]).toEqual([ticksOf(side.max), ticksOf(side.min)]);
      }
      // without play the shaft has one place only; unrounded depths give the table to the tick
      for (const range of [joint.top.away, joint.top.centred, joint.top.toward]) {
        expect([range.max.ticks, range.min.ticks]).toEqual([ticksOf(top.max), ticksOf(top.min)]);
      }
    }
  });

  it("from printed S and T the top fit is off by the rounding only, at most 0.001 in", () => {
    const rule = new Map(
      fits.cases.map(({ input, expected }) => [`${input.fit} ${input.to_incl}`, expected?.top_bottom_fit]),
    );
    let worst = 0;
    for (const { input } of [...printed.cases, ...computed.cases]) {
      const diameter = lengthOf(input["D"]);
      for (const [name, [shape, kind, keyClass]] of Object.entries(FITS)) {
        const key = inchKey(diameter, { shape, kind });
        const joint = jointOf(diameter, key, kind, keyClass, "printed");
        const row = fits.cases.find(({ input: one }) => one.fit === name && key.width.ticks <= ticksOf(one.to_incl));
        const top = rule.get(`${name} ${row?.input.to_incl}`);
        expect(top).toBeDefined();
        for (const end of ["max", "min"] as const) {
          worst = Math.max(worst, Math.abs(joint.top.away[end].ticks - ticksOf(top?.[end])));
        }
      }
    }
    expect(worst).toBeGreaterThan(0);
    expect(worst).toBeLessThanOrEqual(ticksOf("0.001"));
  });

  it("Class 3 has no side limits, and only Class 2 has taper keys", () => {
    const seat = inchKeyseat(lengthOf("2"), { class: 3 });
    expect([seat.shaft.width, seat.hub.width]).toEqual([null, null]);
    expect(seat.basis.some(({ says }) => says.includes("no width limits are given"))).toBe(true);
    for (const keyClass of [1, 3] as const) {
      for (const kind of ["taper", "gib-head"] as const) {
        expect(codeOf(() => inchKeyseat(lengthOf("2"), { class: keyClass, kind }))).toBe("KEY_CLASS_NOT_DEFINED");
      }
    }
  });
});

const DEPTH_COLUMNS = [
  ["S_square", "shaft", "square", "parallel"],
  ["S_rectangular", "shaft", "rectangular", "parallel"],
  ["T_parallel_square", "hub", "square", "parallel"],
  ["T_parallel_rectangular", "hub", "rectangular", "parallel"],
  ["T_taper_square", "hub", "square", "taper"],
  ["T_taper_rectangular", "hub", "rectangular", "taper"],
] as const;

describe("B17.1: depth control S and T", () => {
  it("every cell that was read, in two printings or one: 189 cells, read 293 times", () => {
    let cells = 0;
    for (const { input, expected, mark } of printed.cases) {
      const diameter = lengthOf(input["D"]);
      expect(diameter.ticks).toBe(ticksOf(input["D_dec"]));
      for (const [column, member, shape, kind] of DEPTH_COLUMNS) {
        const cell = expected?.[column] ?? null;
        const seat = inchKeyseat(diameter, { shape, kind, class: 2 });
        expect(seat.key.width.ticks).toBe(ticksOf(input["W"]));
        expect(seat.key.height.ticks).toBe(ticksOf(input[`H_${shape}`]));
        const { control } = seat[member];
        expect(control.nominal.ticks, `${input["D"]} ${column}`).toBe(
          ticksOf(cell ?? expected?.[`${column}_computed`]),
        );
        expect(control.basis[0]?.how).toBe(cell === null ? "derived" : "tabulated");
        if (cell !== null) expect(control.basis[0]?.mark).toBe(markOfCell(column, mark ?? ""));
        const formula = inchKeyseat(diameter, { shape, kind, class: 2, depths: "formula" });
        expect(Math.abs(formula[member].control.nominal.ticks - control.nominal.ticks)).toBeLessThanOrEqual(
          INCH / 2000,
        );
        if (kind === "taper" || member === "hub") continue;
        // S is the same for taper keys
        expect(inchKeyseat(diameter, { shape, kind: "taper", class: 2 }).shaft.control.nominal).toEqual(
          control.nominal,
        );
      }
      cells += DEPTH_COLUMNS.filter(([column]) => (expected?.[column] ?? null) !== null).length;
    }
    expect(cells).toBe(189);
  });

  it("the formula alone, rounded half up, gives every printed cell", () => {
    for (const { input, expected } of printed.cases) {
      const diameter = lengthOf(input["D"]);
      for (const [column, member, shape, kind] of DEPTH_COLUMNS) {
        const cell = expected?.[column] ?? null;
        if (cell === null) continue;
        const { nominal } = inchKeyseat(diameter, { shape, kind, class: 2, depths: "formula" })[member].control;
        // no printed cell lies on a tie, so the nearest thousandth is the only one
        expect(Math.round(nominal.ticks / 254_000)).toBe(ticksOf(cell) / 254_000);
      }
    }
  });

  it("computed rows to 15 in, with the crown to four places", () => {
    for (const { input, expected } of computed.cases) {
      const diameter = lengthOf(input["D"]);
      for (const [column, member, shape, kind] of DEPTH_COLUMNS) {
        const cell = expected?.[column] ?? null;
        if (cell === null) continue;
        const seat = inchKeyseat(diameter, { shape, kind, class: 2 });
        expect(seat[member].control.nominal.ticks, `${input["D"]} ${column}`).toBe(ticksOf(cell));
        expect(seat[member].control.basis[0]).toMatchObject({ how: "derived", mark: "formula" });
        expect(Math.round(seat.crown.ticks / 25_400)).toBe(Math.round(ticksOf(expected?.["Y"]) / 25_400));
      }
    }
  });
});

/** Which columns of a row were read twice, in the words of its mark. */
function markOfCell(column: string, mark: string): string {
  const twice = mark.startsWith("S both and T parallel square")
    ? ["S_square", "S_rectangular", "T_parallel_square"]
    : mark.includes("S square 2 3/8 two-sources")
      ? ["S_square"]
      : [];
  if (mark.includes("T parallel square and T parallel rectangular read in two")) twice.push("T_parallel_rectangular");
  return twice.includes(column) ? "two-sources" : "one-source+formula";
}

describe("B17.1: details", () => {
  const of = (table: string): readonly Case<Cells & { table: string }, Cells>[] =>
    details.cases.filter(({ input }) => input.table === table);
  const rangeOf = (input: Cells): Length[] =>
    within({ over: input["over"] ?? null, to_incl: input["to_incl"] ?? null });

  it("gib heads", () => {
    for (const { input, expected } of of("gib head")) {
      const section = { width: lengthOf(input["W"]), height: lengthOf(input["H"]) };
      const { gibHead } = inchKey(lengthOf("30"), { key: section, kind: "gib-head" });
      expect([gibHead?.height.ticks, gibHead?.length.ticks]).toEqual([
        ticksOf(expected?.["A"]),
        ticksOf(expected?.["B"]),
      ]);
    }
    const large = inchKey(lengthOf("20"), { kind: "gib-head", key: { width: "6 in", height: "5 in" } }).gibHead;
    // 1.8 H and 1.2 H beyond the table
    expect([large?.height.ticks, large?.length.ticks]).toEqual([ticksOf("9"), ticksOf("6")]);
    expect(inchKey(lengthOf("2")).gibHead).toBeNull();
    expect(inchKey(lengthOf("2"), { kind: "taper" }).gibHead).toBeNull();
  });

  it("set screws", () => {
    for (const { input, expected } of of("set screw")) {
      for (const diameter of rangeOf(input)) {
        const seat = inchKeyseat(diameter, { class: 1 });
        expect(seat.setScrew).toBe(expected?.["set_screw"]);
        expect(seat.key.width.ticks).toBe(ticksOf(input["W"]));
      }
    }
    expect(inchKeyseat(lengthOf("7"), { class: 1 }).setScrew).toBeNull();
    expect(inchKeyseat(lengthOf("1"), { class: 1, key: { width: "1/8 in", height: "1/8 in" } }).setScrew).toBeNull();
  });

  it("fillets and chamfers by the depth of the seat", () => {
    const cornersAt = (depth: Length): unknown => {
      const height = lengthOfTicks(2 * depth.ticks, "in");
      const { corners } = inchKeyseat(lengthOf("30"), { class: 2, key: { width: lengthOf("7"), height } });
      return corners === null ? null : [corners.radius.ticks, corners.chamfer.ticks];
    };
    for (const { input, expected } of of("fillet")) {
      for (const depth of rangeOf(input)) {
        expect(cornersAt(depth)).toEqual([ticksOf(expected?.["radius"]), ticksOf(expected?.["chamfer"])]);
      }
    }
    expect(cornersAt(lengthOf("1/8"))).toBeNull();
    expect(cornersAt(lengthOfTicks(ticksOf("2 1/2") + 1, "in"))).toBeNull();
  });

  it("offset and lead", () => {
    const leadAt = (length: Length): number | undefined => inchKeyseat(lengthOf("2"), { class: 1, length }).lead?.ticks;
    for (const { input, expected } of of("lead")) {
      const range = { over: input["over"] ?? null, to_incl: input["to_incl"] ?? "40" };
      for (const length of within(range)) {
        const perInch = expected?.["max_per_inch"] ?? null;
        const wanted = perInch === null ? ticksOf(expected?.["max"]) : (length.ticks * ticksOf(perInch)) / INCH;
        expect(Math.abs((leadAt(length) ?? NaN) - wanted)).toBeLessThan(1);
      }
    }
    // close above the breaks, where the pieces join without a step
    expect([leadAt(lengthOf("4 1/2")), leadAt(lengthOf("10 1/2"))]).toEqual([ticksOf("0.00225"), ticksOf("0.005")]);
    const seat = inchKeyseat(lengthOf("2"), { class: 1 });
    expect(seat.offset.ticks).toBe(ticksOf(of("offset")[0]?.expected?.["max"]));
    expect(seat.lead).toBeNull();
  });
});

describe("B17.2: Woodruff keys", () => {
  const allowed = (
    woodruff as unknown as { tolerances: Record<string, [string, string]> & { corner_break_max_radius: string } }
  ).tolerances;

  it.each(woodruff.cases)("$input.no", ({ input, expected, mark = "" }) => {
    const key = woodruffKey(input.no);
    expect(key.number).toBe(input.no);
    for (const [limits, cell, name] of [
      [key.width, "W", "W"],
      [key.diameter, "B", "B"],
      [key.length, "F_actual_length", "F"],
    ] as const) {
      expect(limits.nominal.ticks).toBe(ticksOf(expected?.[cell]));
      expectDeviations(limits, allowed[name]);
    }
    expectLimits(key.fullRadius, expected?.["C_max"], expected?.["C_min"]);
    expectLimits(key.flatBottom, expected?.["D_max"], expected?.["D_min"]);
    expect(key.limits.height).toEqual(key.fullRadius);
    expect(key.belowCentre.ticks).toBe(ticksOf(expected?.["E_below_centre"]));
    expect(key.cornerMax.ticks).toBe(ticksOf(allowed.corner_break_max_radius));
    // how sure it is, in the words of the mark
    expect(key.fullRadius.basis[0]?.mark).toBe(mark.startsWith("all memory") ? "memory" : "one-source");
    const lengthMark = mark.includes("F one-source (MEMD-L) and formula")
      ? "one-source+formula"
      : mark.includes("F one-source")
        ? "one-source"
        : mark.includes("F formula")
          ? "formula"
          : "memory";
    expect(key.length.basis[0]?.mark).toBe(lengthMark);
    const dMax = key.basis.find(({ says }) => says.startsWith("D max"));
    expect(dMax?.mark).toBe(
      mark.includes("D max one-source") ? "one-source" : mark.includes("D max formula") ? "formula" : "memory",
    );
    const e = key.basis.find(({ says }) => says.startsWith("E "));
    expect(e?.mark).toBe(
      mark.includes("E one-source (SMED) and formula")
        ? "one-source+formula"
        : mark.includes("E formula")
          ? "formula"
          : "memory",
    );
    // the number says the size
    const decoded = decodeWoodruffNumber(input.no);
    expect([decoded.width.ticks, decoded.diameter.ticks]).toEqual([ticksOf(expected?.["W"]), ticksOf(expected?.["B"])]);
    expect([decoded.low, decoded.listed]).toEqual([input.no.endsWith("-1"), true]);
    expect(woodruffNumber({ width: decoded.width, diameter: decoded.diameter, low: decoded.low })).toBe(input.no);
  });

  it("keyseats", () => {
    const deviations = (woodruffSeats as unknown as { tolerances: Record<string, [string, string]> }).tolerances;
    for (const { input, expected, mark = "" } of woodruffSeats.cases) {
      const seat = woodruffKeyseat(input.no);
      expectLimits(seat.shaft.width, expected?.["shaft_width_max"], expected?.["shaft_width_min"]);
      expectLimits(seat.shaft.cutterDiameter, expected?.["shaft_diameter_max"], expected?.["shaft_diameter_min"]);
      for (const [given, cell] of [
        [seat.shaft.sideDepth, "shaft_depth"],
        [seat.keyAboveShaft, "key_above_shaft"],
        [seat.hub.width, "hub_width"],
        [seat.hub.sideDepth, "hub_depth"],
      ] as const) {
        expect(given.nominal.ticks).toBe(ticksOf(expected?.[cell]));
        expectDeviations(given, deviations[cell]);
      }
      const [, shaftDepth = "", hubDepth = ""] = /^shaft depth (.*?); hub depth (.*?);/.exec(mark) ?? [];
      expect(seat.shaft.sideDepth.basis[0]?.mark).toBe(
        /^(?:two-sources|one-source|formula|memory)/.exec(shaftDepth)?.[0],
      );
      const hubMark = /^(?:two-sources|one-source|formula)/.exec(hubDepth)?.[0];
      expect(seat.hub.sideDepth.basis[0]?.mark).toBe(hubMark === "one-source" ? "one-source+formula" : hubMark);
      expect(seat.cautions.map(({ code }) => code)).toEqual(["KEY_VALUE_DOUBTFUL"]);
    }
  });

  it("numbers by shaft, as the textbook recommends them", () => {
    const listed = woodruff.cases.map(({ input, expected }) => ({ no: input.no, W: ticksOf(expected?.["W"]) }));
    const ends = woodruffShafts.cases.flatMap(({ expected }) => [
      ticksOf(expected?.["from"]),
      ticksOf(expected?.["to_incl"]),
    ]);
    for (const ticks of ends.flatMap((end) => [end - 1, end, end + 1])) {
      const widths = new Set(
        woodruffShafts.cases
          .filter(({ expected }) => ticks >= ticksOf(expected?.["from"]) && ticks <= ticksOf(expected?.["to_incl"]))
          .map(({ input }) => ticksOf(input.W)),
      );
      const wanted = listed.filter(({ W }) => widths.has(W)).map(({ no }) => no);
      const shaft = lengthOfTicks(ticks, "in");
      if (wanted.length === 0) expect(codeOf(() => woodruffKeysFor(shaft))).toBe("KEY_SHAFT_OUT_OF_RANGE");
      else expect(woodruffKeysFor(shaft).numbers).toEqual(wanted);
    }
  });

  it("the joint of key and keyseats is what the tables say: held in the shaft, free in the hub, 0.001 to 0.016 over it", () => {
    for (const { input, expected } of woodruff.cases) {
      const key = woodruffKey(input.no);
      const seat = woodruffKeyseat(input.no);
      const shaft = single(lengthOfTicks(6 * ticksOf(expected?.["W"]), "in"));
      const joint = keyedAssembly({
        shaft,
        bore: shaft,
        key: key.limits,
        shaftKeyseat: seat.shaft,
        hubKeyseat: seat.hub,
      });
      expect(Math.abs((joint.sideInHub?.max.ticks ?? NaN) - ticksOf("0.003"))).toBeLessThanOrEqual(ticksOf("0.0001"));
      expect(Math.abs(joint.sideInHub?.min.ticks ?? NaN)).toBeLessThanOrEqual(ticksOf("0.0001"));
      expect(Math.abs((joint.sideInShaft?.max.ticks ?? NaN) - ticksOf("0.0005"))).toBeLessThanOrEqual(
        ticksOf("0.0001"),
      );
      expect(joint.sideInShaft?.min.ticks).toBeLessThanOrEqual(ticksOf("0.002 INT") + ticksOf("0.0001"));
      // the two shaft depths that are 0.0001 over the formula, and the heights that are cut
      expect(Math.abs(joint.top.away.min.ticks - ticksOf("0.001"))).toBeLessThanOrEqual(ticksOf("0.0001"));
      expect(Math.abs(joint.top.away.max.ticks - ticksOf("0.016"))).toBeLessThanOrEqual(ticksOf("0.0001"));
    }
  });
});

describe("published cases", () => {
  it.each(
    published.cases as (Case<Record<string, unknown>, Record<string, unknown>> & {
      id: string;
      topic: string;
      tolerance?: string;
    })[],
  )("$id $topic", ({ topic, input, expected, tolerance }) => {
    const run = RUN[topic];
    if (run === undefined) throw new Error(`no way to check ${topic}`);
    run(input, expected ?? {}, tolerance === undefined ? 0 : Number(tolerance));
  });
});

type Values = Readonly<Record<string, unknown>>;
type Run = (given: Values, wanted: Values, tolerance: number) => void;

function near(length: Length | null | undefined, text: unknown, tolerance: number): void {
  expect(Math.abs((length?.ticks ?? NaN) - ticksOf(text))).toBeLessThanOrEqual(tolerance * INCH + 1);
}

function seatOf(given: Values): { kind: InchKeyKind; shape: KeyShape; diameter: Length; keyClass: InchKeyClass } {
  const kind = given["key"] === "taper" || given["class"] === "2 taper" ? "taper" : "parallel";
  return {
    kind,
    shape: given["kind"] === "rectangular" ? "rectangular" : "square",
    diameter: lengthOf(given["D"]),
    keyClass: given["class"] === 1 ? 1 : 2,
  };
}

const depth: Run = (given, wanted, tolerance) => {
  const { kind, shape, diameter } = seatOf(given);
  const seat = inchKeyseat(diameter, { kind, shape, class: 2 });
  const taper = inchKeyseat(diameter, { kind: "taper", shape, class: 2 });
  const cells: Record<string, Length> = {
    T: seat.hub.control.nominal,
    T_min: seat.hub.control.min,
    T_max: seat.hub.control.max,
    S_max: seat.shaft.control.max,
    S_min: seat.shaft.control.min,
    T_taper: taper.hub.control.nominal,
    H: seat.key.height,
  };
  for (const [name, text] of Object.entries(wanted)) {
    if (name === "Y") near(seat.crown, text, 0.0001);
    else near(cells[name], text, tolerance);
  }
};

const woodruffCase: Run = (given, wanted) => {
  const no = given["no"] as string;
  const key = woodruffKey(no);
  const seat = woodruffKeyseat(no);
  const cells: Record<string, Length> = {
    W: key.width.nominal,
    B: key.diameter.nominal,
    F: key.length.nominal,
    C_max: key.fullRadius.max,
    C_min: key.fullRadius.min,
    D_max: key.flatBottom.max,
    E: key.belowCentre,
    shaft_depth: seat.shaft.sideDepth.nominal,
    hub_depth: seat.hub.sideDepth.nominal,
  };
  for (const [name, text] of Object.entries(wanted)) expect(cells[name]?.ticks, name).toBe(ticksOf(text));
};

const RUN: Record<string, Run> = {
  "key-size": (given, wanted) => {
    const diameter = lengthOf(given["shaft_diameter"]);
    if (wanted["covered"] === false) {
      expect(codeOf(() => inchKey(diameter))).toBe("KEY_SHAFT_OUT_OF_RANGE");
      return;
    }
    expect(inchKey(diameter).preferredShape).toBe(wanted["preferred"]);
    expect(inchKey(diameter).width.ticks).toBe(ticksOf(wanted["W"]));
    for (const shape of ["square", "rectangular"] as const) {
      const height = wanted[`H_${shape}`];
      if (height === undefined) continue;
      if (height === null) expect(codeOf(() => inchKey(diameter, { shape }))).toBe("KEY_SIZE_NOT_DEFINED");
      else expect(inchKey(diameter, { shape }).height.ticks).toBe(ticksOf(height));
    }
  },
  "depth-T": depth,
  "depth-T-limits": depth,
  "depth-T-taper": depth,
  "depth-S-limits": depth,
  "depth-computed": depth,
  "depth-S": (given, wanted) => {
    const found = (given["D"] as string[]).map(
      (text) => inchKeyseat(lengthOf(text), { class: 2 }).shaft.control.nominal.ticks,
    );
    expect(found).toEqual((wanted["S"] as string[]).map(ticksOf));
  },
  "cut-depth-from-crown": (given, wanted, tolerance) => {
    const seat = inchKeyseat(lengthOf(given["D"]), { class: 2 });
    near(seat.crown, wanted["Y"], tolerance);
    near(seat.cutDepth, wanted["depth"], tolerance);
  },
  "width-limits": (given, wanted) => {
    const width = lengthOf(given["W"]);
    const height = lengthOf(given["H"] ?? given["W"]);
    const kind = given["key"] === "taper" ? "taper" : "parallel";
    const keyClass = given["class"] === 1 ? 1 : 2;
    const diameter = lengthOfTicks(Math.min(4 * width.ticks, ticksOf("30")), "in");
    const key = inchKey(diameter, { key: { width, height }, kind });
    const stock = keyClass === 1 ? key.barStock : key.keystock;
    const seat = inchKeyseat(diameter, { key: { width, height }, kind, class: keyClass });
    const joint = jointOf(diameter, { width, height }, kind, keyClass);
    const cells: Record<string, number | undefined> = {
      key_max: stock?.width.max.ticks,
      key_min: stock?.width.min.ticks,
      key_width_min: stock?.width.min.ticks,
      key_height_max: stock?.height.max.ticks,
      key_height_min: stock?.height.min.ticks,
      keyseat_max: seat.shaft.width?.max.ticks,
      keyseat_min: seat.shaft.width?.min.ticks,
      side_max: joint.sideInHub?.max.ticks,
      side_min: joint.sideInHub?.min.ticks,
      top_max: joint.top.away.max.ticks,
      top_min: joint.top.away.min.ticks,
    };
    for (const [name, text] of Object.entries(wanted)) expect(cells[name], name).toBe(ticksOf(text));
  },
  "class-rule": (given, wanted) => {
    const key = { width: lengthOf(given["W"]), height: lengthOf(given["W"]) };
    const third = inchKeyseat(lengthOf("2"), { class: 3, key });
    const second = inchKeyseat(lengthOf("2"), { class: 2, key });
    expect(wanted["side_limits"]).toBeNull();
    expect([third.shaft.width, third.hub.width]).toEqual([null, null]);
    expect(wanted["top_range_as"]).toBe("Class 2 parallel");
    expect([third.shaft.control, third.hub.control]).toEqual([second.shaft.control, second.hub.control]);
  },
  "top-clearance-stack": (given, wanted) => {
    const { kind, shape, diameter, keyClass } = seatOf(given);
    const key = inchKey(diameter, { kind, shape });
    const { away } = jointOf(diameter, key, kind, keyClass, "printed").top;
    expect([away.max.ticks, away.min.ticks]).toEqual([ticksOf(wanted["max"]), ticksOf(wanted["min"])]);
  },
  "alignment-lead": (given, wanted) => {
    const seat = inchKeyseat(lengthOf("2"), { class: 1, length: lengthOf(given["keyseat_length"]) });
    expect(seat.lead?.ticks).toBe(ticksOf(wanted["lead_max"]));
  },
  "alignment-offset": (_given, wanted) => {
    expect(inchKeyseat(lengthOf("2"), { class: 1 }).offset.ticks).toBe(ticksOf(wanted["offset_max"]));
  },
  woodruff: woodruffCase,
  "woodruff-limits": woodruffCase,
  "woodruff-number": (given, wanted) => {
    if (given["no"] === undefined) {
      const size = { width: lengthOf(given["W"]), diameter: lengthOf(given["B"]) };
      expect(woodruffNumber(size)).toBe(wanted["no"]);
      return;
    }
    const decoded = decodeWoodruffNumber(given["no"] as string);
    expect([decoded.width.ticks, decoded.diameter.ticks]).toEqual([ticksOf(wanted["W"]), ticksOf(wanted["B"])]);
  },
  "woodruff-shaft-range": (given, wanted) => {
    const width = ticksOf(given["W"]);
    const has = (ticks: number): boolean =>
      woodruffKeysFor(lengthOfTicks(ticks, "in")).numbers.some((no) => decodeWoodruffNumber(no).width.ticks === width);
    const [from, to] = [ticksOf(wanted["from"]), ticksOf(wanted["to_incl"])];
    expect([has(from - 1), has(from), has(to), has(to + 1)]).toEqual([false, true, true, false]);
  },
  strength: (given, wanted, tolerance) => {
    strengthCase(given, wanted, tolerance);
  },
  "keyway-strength": (given, wanted, tolerance) => {
    const share = (name: string): Length => lengthOfTicks(Number(given[name]) * INCH, "in");
    const e = keywayStrengthFactor({
      shaftDiameter: lengthOf("1"),
      width: share("w_over_d"),
      depth: share("h_over_d"),
    });
    expect(Math.abs(e - Number(wanted["e"]))).toBeLessThanOrEqual(tolerance);
  },
};

function strengthCase(given: Values, wanted: Values, tolerance: number): void {
  const close = (value: number | undefined, text: unknown, allowed = tolerance): void => {
    expect(Math.abs((value ?? NaN) - Number(text))).toBeLessThanOrEqual(allowed);
  };
  const psi = (value: unknown): string => `${Number(value)} psi`;
  const n = Number(given["N"] ?? 1);
  if (given["D_mm"] !== undefined) {
    // the key carries what the shaft carries: pi D^3 tau / 16 with half the yield strength in shear
    const diameter = Number(given["D_mm"]) / 25.4;
    const tau = (Number(given["shear_factor"]) * Number(given["shaft_s_y_ksi"])) / n;
    const load = keyLoad({
      torque: torque((Math.PI * diameter ** 3 * tau * 1000) / 16, "lbf-in"),
      shaftDiameter: `${Number(given["D_mm"])} mm`,
      key: { width: "3/4 in", height: "3/4 in" },
      length: "5 in",
      ends: "square",
      pressure: "half height",
    });
    expect(given["key"]).toBe("3/4 x 3/4 x 5");
    close((load.pressure?.to("ksi") ?? NaN) * n, wanted["key_s_y_ksi"]);
    return;
  }
  const width = lengthOf(given["W"]);
  const key = { width, height: given["H"] === undefined ? width : lengthOf(given["H"]) };
  const joint = { shaftDiameter: lengthOf(given["D"]), key, ends: "square", pressure: "half height" } as const;
  const power =
    given["power_hp"] === undefined
      ? undefined
      : torqueFromPower({ power: `${Number(given["power_hp"])} hp`, revolutionsPerMinute: Number(given["rpm"]) });
  if (given["L"] !== undefined) {
    const bearing = given["bearing_allowable_psi"] as Record<"key" | "hub" | "shaft", number>;
    const load = keyLoad({
      ...joint,
      length: lengthOf(given["L"]),
      allowables: {
        shear: psi(given["shear_allowable_psi"]),
        bearing: { key: psi(bearing.key), hub: psi(bearing.hub), shaft: psi(bearing.shaft) },
      },
    });
    close(load.capacity.shear?.to("lbf-in"), wanted["T_shear_lbf_in"]);
    close(load.capacity.bearing?.to("lbf-in"), wanted["T_bearing_lbf_in"]);
    expect(load.capacity.governing?.value).toBe(load.capacity.bearing?.value);
    return;
  }
  if (given["s_y_psi"] !== undefined) {
    const yieldOf = psi(given["s_y_psi"]);
    const { neededLength: needed } = keyLoad({
      ...joint,
      torque: power ?? torque(Number(given["T_lbf_in"]), "lbf-in"),
      materials: {
        yield: { key: yieldOf, shaft: yieldOf, hub: yieldOf },
        shearRule: given["shear_factor"] === 0.577 ? "0.577" : "0.5",
      },
      safetyFactor: n,
    });
    // the text rounds the torque to 4200 before it goes on
    if (wanted["T_lbf_in"] !== undefined) close(power?.to("lbf-in"), wanted["T_lbf_in"], 5);
    if (wanted["L_in"] !== undefined) close(needed.governing?.to("in"), wanted["L_in"]);
    if (wanted["L_shear_in"] !== undefined) close(needed.shear?.to("in"), wanted["L_shear_in"]);
    if (wanted["L_bearing_in"] !== undefined) close(needed.bearing?.to("in"), wanted["L_bearing_in"]);
    return;
  }
  if (power === undefined) throw new Error("a strength case without a load");
  const { neededLength: needed } = keyLoad({
    ...joint,
    torque: power,
    allowables: { shear: psi(given["shear_allowable_psi"]), bearing: psi(given["bearing_allowable_psi"]) },
  });
  close(needed.shear?.to("in"), wanted["L_shear_in"]);
  close(needed.bearing?.to("in"), wanted["L_bearing_in"]);
  expect(needed.governing?.ticks).toBe(needed.bearing?.ticks);
}

describe("B17.1: crown", () => {
  it.each(computed.cases)("$input.D: Y to four places", ({ input, expected }) => {
    const crown = keyseatCrown(lengthOf(input["D"]), lengthOf(input["W"]));
    expect(Math.round(crown.ticks / 25_400)).toBe(Math.round(ticksOf(expected?.["Y"]) / 25_400));
  });
});
