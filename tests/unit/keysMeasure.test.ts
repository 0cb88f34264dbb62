import {
  equalLengths,
  inch,
  inchKey,
  inchKeyseat,
  keyseatControl,
  keyseatCrown,
  keyseatFindings,
  keyseatRows,
  keyseatSideDepth,
  lengthOfTicks,
  limits,
  limitsFromMaxMin,
  metricKey,
  metricKeyLength,
  metricKeyseat,
  metricWoodruffKey,
  metricWoodruffKeysFor,
  metricWoodruffKeyseat,
  overKey,
  overPin,
  woodruffKey,
  woodruffKeysFor,
  woodruffKeyseat,
  woodruffNumber,
  decodeWoodruffNumber,
} from "limitsmith";
import type { KeyseatRows, Limits } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

function between(max: string, min: string, unit: "in" | "mm" = "in"): Limits {
  return limitsFromMaxMin({ max: `${max} ${unit}`, min: `${min} ${unit}` });
}

describe("the 5/8 in shaft", () => {
  it("3/16 square key: S .517/.502, T .719/.709", () => {
    const { shaft, hub, key } = inchKeyseat("5/8 in", { class: 1 });
    expect(equalLengths(key.width, "3/16 in")).toBe(true);
    const sizes = [shaft.control.max, shaft.control.min, hub.control.max, hub.control.min];
    expect(sizes.map((size) => size.to("in"))).toEqual([0.517, 0.502, 0.719, 0.709]);
    expect(hub.control.nominal.to("in")).toBe(0.709);
  });

  it("a 1/4 key on it is computed by the formula and marked as not standard", () => {
    const key = { width: "1/4 in", height: "1/4 in" };
    const seat = inchKeyseat("5/8 in", { class: 2, key });
    // Y = (0.625 - sqrt(0.390625 - 0.0625)) / 2 = 0.0261, S = 0.625 - 0.0261 - 0.125, T = S + 0.255
    expect([seat.shaft.control.nominal.to("in"), seat.hub.control.nominal.to("in")]).toEqual([0.474, 0.729]);
    expect(seat.standardForShaft).toBe(false);
    expect(seat.cautions.map(({ code }) => code)).toEqual(["KEY_NOT_STANDARD"]);
    expect(seat.basis[0]).toMatchObject({ how: "caller" });
    expect(seat.basis[0]?.says).toContain("3/16 x 3/16 or 3/16 x 1/8");
    expect(seat.shaft.control.basis[0]?.how).toBe("derived");
    expect(seat.shaft.width?.max.to("in")).toBe(0.252);
    expect(inchKey("5/8 in", { key }).standardForShaft).toBe(false);
  });

  it("the unrounded formula on request", () => {
    const seat = inchKeyseat("5/8 in", { class: 1, depths: "formula" });
    // D - Y = (0.625 + sqrt(0.625² - 0.1875²)) / 2 = 0.610606
    expect(seat.shaft.control.nominal.to("in")).toBeCloseTo(0.610606 - 0.09375, 6);
    expect(seat.hub.control.nominal.to("in")).toBeCloseTo(0.610606 + 0.09375 + 0.005, 6);
    expect(seat.shaft.control.basis[0]?.says).toContain("not rounded");
  });

  it("a metric shaft is looked up by its exact size", () => {
    expect(inchKeyseat("15.875 mm", { class: 1 }).shaft.control.max.to("in")).toBe(0.517);
    expect(inchKey("22.2251 mm").width.to("in")).toBe(0.25);
    expect(metricKey("1 in").width.to("mm")).toBe(8);
  });
});

describe("measured depth", () => {
  const shaft = { diameter: "1.4985 in", width: "3/8 in", member: "shaft" } as const;

  it("S and the real diameter give the side depth, and back", () => {
    const side = keyseatSideDepth({ ...shaft, control: "1.285 in" });
    expect(keyseatControl({ ...shaft, sideDepth: side }).toString()).toBe("1.285 in");
    // a shaft that is smaller by d, cut to the same S, has a seat shallower by about d
    const nominal = keyseatSideDepth({ ...shaft, diameter: "1.5 in", control: "1.285 in" });
    expect((nominal.ticks - side.ticks) / 254_000).toBeCloseTo(1.5, 1);
  });

  it("the same in a hub", () => {
    const hub = { diameter: "1.5005 in", width: "3/8 in", member: "hub" } as const;
    const side = keyseatSideDepth({ ...hub, control: "1.672 in" });
    expect(keyseatControl({ ...hub, sideDepth: side }).toString()).toBe("1.672 in");
    expect(side.to("in")).toBeCloseTo(1.672 - (1.5005 - keyseatCrown("1.5005 in", "3/8 in").to("in")), 9);
  });

  it.each([
    ["KEYSEAT_DEPTH_IMPOSSIBLE", { ...shaft, control: "1.48 in" }],
    ["KEYSEAT_DEPTH_IMPOSSIBLE", { ...shaft, member: "hub", control: "1.3 in" }],
    ["KEY_WIDER_THAN_SHAFT", { ...shaft, width: "1.5 in", control: "1.3 in" }],
    ["KEYED_JOINT_INVALID", { ...shaft, control: "0 in" }],
    ["KEYED_JOINT_INVALID", { ...shaft, diameter: "-1 in", control: "1 in" }],
    ["KEYED_JOINT_INVALID", shaft],
    ["OPTION_INVALID", { ...shaft, member: "bore", control: "1.3 in" }],
    ["UNIT_MISSING", { ...shaft, control: "1.3" }],
    ["LENGTH_INVALID", { ...shaft, diameter: 1.5, control: "1.3 in" }],
  ])("%s", (code, seat) => {
    expect(codeOf(() => keyseatSideDepth(seat as never))).toBe(code);
  });

  it("a side depth as deep as the shaft is refused", () => {
    expect(codeOf(() => keyseatControl({ ...shaft, sideDepth: "1.48 in" }))).toBe("KEYSEAT_DEPTH_IMPOSSIBLE");
    expect(codeOf(() => keyseatCrown("1 in", "1 in"))).toBe("KEY_WIDER_THAN_SHAFT");
    expect(codeOf(() => keyseatCrown("0 in", "1 in"))).toBe("KEYED_JOINT_INVALID");
  });
});

describe("check values over a key or a pin", () => {
  const seat = inchKeyseat("1 1/2 in", { class: 2 });
  const width = seat.shaft.width ?? seat.shaft.control;
  const diameter = between("1.500", "1.499");

  it("over the key: S + H at each limit", () => {
    const check = overKey({ control: seat.shaft.control, keyHeight: inchKey("1 1/2 in").keystock.height });
    expect([check.max.to("in"), check.min.to("in")]).toEqual([1.665, 1.649]);
    expect(codeOf(() => overKey({ control: seat.shaft.control } as never))).toBe("KEYED_JOINT_INVALID");
    expect(codeOf(() => overKey({ control: between("1", "0"), keyHeight: width }))).toBe("KEYED_JOINT_INVALID");
  });

  it("over a pin in the shaft, from a pin in the hub", () => {
    const inShaft = overPin({ member: "shaft", control: seat.shaft.control, width, diameter, pin: "0.3 in" });
    expect([inShaft.max.to("in"), inShaft.min.to("in")]).toEqual([1.589, 1.574]);
    const bore = between("1.501", "1.500");
    const inHub = overPin({ member: "hub", control: seat.hub.control, width, diameter: bore, pin: "0.3 in" });
    expect([inHub.max.to("in"), inHub.min.to("in")]).toEqual([1.379, 1.369]);
  });

  it("a pin goes in at the least width and stands out at the greatest depth, or is refused", () => {
    const shaft = { member: "shaft", control: seat.shaft.control, width, diameter } as const;
    expect(overPin({ ...shaft, pin: "0.375 in" }).max.to("in")).toBe(1.664);
    expect(codeOf(() => overPin({ ...shaft, pin: lengthOfTicks(inch("0.375").ticks + 1, "in") }))).toBe(
      "GAUGE_PIN_INVALID",
    );
    // 1.500 - 1.274 deep at the most
    expect(codeOf(() => overPin({ ...shaft, pin: "0.226 in" }))).toBe("GAUGE_PIN_INVALID");
    expect(overPin({ ...shaft, pin: lengthOfTicks(inch("0.226").ticks + 1, "in") }).nominal.ticks).toBeGreaterThan(0);
    const hub = { member: "hub", control: seat.hub.control, width, diameter: between("1.501", "1.500") } as const;
    // 1.679 - 1.500 deep at the most
    expect(codeOf(() => overPin({ ...hub, pin: "0.179 in" }))).toBe("GAUGE_PIN_INVALID");
    expect(codeOf(() => overPin({ ...hub, pin: "-1 in" }))).toBe("KEYED_JOINT_INVALID");
    expect(codeOf(() => overPin({ ...hub, member: "x" as never, pin: "0.2 in" }))).toBe("OPTION_INVALID");
    expect(codeOf(() => overPin({ ...hub, width: undefined as never, pin: "0.2 in" }))).toBe("KEYED_JOINT_INVALID");
  });
});

describe("keyseatRows", () => {
  const summary = ({ rows }: KeyseatRows): unknown =>
    rows.map(({ symbol, limits: given }) => [symbol, given?.max.toString() ?? null, given?.min.toString() ?? null]);

  it.each([
    [
      "5/8 in",
      { standard: "B17.1", member: "shaft", class: 1 },
      [
        ["S", "0.517 in", "0.502 in"],
        ["W", "0.1895 in", "0.1875 in"],
      ],
    ],
    [
      "5/8 in",
      { standard: "B17.1", member: "hub", class: 3 },
      [
        ["T", "0.719 in", "0.709 in"],
        ["W", null, null],
      ],
    ],
    [
      "40 mm",
      { standard: "ISO/R 773", member: "hub", fit: "normal" },
      [
        ["d + t2", "43.5 mm", "43.3 mm"],
        ["b", "12.0215 mm", "11.9785 mm"],
      ],
    ],
    [
      "40 mm",
      { standard: "DIN 6885-1", member: "shaft" },
      [
        ["d - t1", "35 mm", "34.8 mm"],
        ["b", null, null],
      ],
    ],
    [
      "40 mm",
      { standard: "ISO/R 774", member: "shaft" },
      [
        ["d - t1", "35 mm", "34.8 mm"],
        ["b", "12.12 mm", "12.05 mm"],
      ],
    ],
    [
      "19 mm",
      { standard: "ISO 3912", member: "shaft", width: "5 mm", diameter: "19 mm", fit: "normal" },
      [
        ["d - t1", "13.5 mm", "13.3 mm"],
        ["b", "5 mm", "4.97 mm"],
      ],
    ],
    [
      "19 mm",
      { standard: "ISO 3912", member: "hub", width: "5 mm", diameter: "19 mm", fit: "normal" },
      [
        ["d + t2", "21.4 mm", "21.3 mm"],
        ["b", "5.015 mm", "4.985 mm"],
      ],
    ],
    [
      "30 mm",
      { standard: "DIN 6888", member: "hub", width: "8 mm", diameter: "28 mm" },
      [
        ["d + t2", null, null],
        ["b", null, null],
      ],
    ],
  ] as const)("%s, %j", (diameter, spec, wanted) => {
    const rows = keyseatRows(diameter, spec);
    expect(summary(rows)).toEqual(wanted);
    expect(rows.member).toBe(spec.member);
    expect(Object.isFrozen(rows.rows)).toBe(true);
  });

  it("a Woodruff seat of B17.2 is measured from the opposite side too", () => {
    const shaft = keyseatRows("3/4 in", { standard: "B17.2", member: "shaft", number: "606" });
    const hub = keyseatRows("3/4 in", { standard: "B17.2", member: "hub", number: "606" });
    // D - Y = (0.75 + sqrt(0.5625 - 0.03515625)) / 2 = 0.738092; shaft depth 0.2143, hub depth 0.0997
    expect(shaft.rows[0]?.limits?.max.to("in")).toBeCloseTo(0.738092 - 0.2143, 6);
    expect(shaft.rows[0]?.limits?.tolerance.to("thou")).toBe(5);
    expect(shaft.rows[0]?.limits?.upperDeviation.ticks).toBe(0);
    expect(hub.rows[0]?.limits?.min.to("in")).toBeCloseTo(0.738092 + 0.0997, 6);
    expect(hub.rows[1]?.limits?.nominal.to("in")).toBe(0.1885);
  });

  it("refuses what is no keyseat", () => {
    expect(codeOf(() => keyseatRows("1 in", {} as never))).toBe("OPTION_INVALID");
    expect(codeOf(() => keyseatRows("1 in", null as never))).toBe("OPTION_INVALID");
    expect(codeOf(() => keyseatRows("1 in", { member: "shaft" } as never))).toBe("OPTION_INVALID");
    expect(codeOf(() => keyseatRows("1 in", { standard: "toString", member: "shaft" } as never))).toBe(
      "OPTION_INVALID",
    );
    expect(codeOf(() => keyseatRows("1 in", { standard: "B17.1", member: "shaft" } as never))).toBe("OPTION_INVALID");
    expect(codeOf(() => keyseatRows("1 in", { standard: "B17.2", member: "shaft" } as never))).toBe(
      "WOODRUFF_NUMBER_UNKNOWN",
    );
    expect(
      codeOf(() => keyseatRows("4 mm", { standard: "ISO 3912", member: "shaft", width: "3 mm", diameter: "16 mm" })),
    ).toBe("KEYSEAT_DEPTH_IMPOSSIBLE");
    expect(codeOf(() => keyseatRows("1/4 in", { standard: "B17.2", member: "shaft", number: "1212" }))).toBe(
      "KEY_WIDER_THAN_SHAFT",
    );
    expect(codeOf(() => keyseatRows("0.4 in", { standard: "B17.2", member: "shaft", number: "1212" }))).toBe(
      "KEYSEAT_DEPTH_IMPOSSIBLE",
    );
  });
});

describe("keyseatFindings", () => {
  const seat = keyseatRows("5/8 in", { standard: "B17.1", member: "hub", class: 2 });

  it("says nothing where the print is the standard's, however it is written", () => {
    const control = limits({ nominal: "0.714 in", upper: "5 thou", lower: "-5 thou" });
    expect(keyseatFindings(seat, { control, width: between("0.1895", "0.1875") })).toEqual([]);
    expect(keyseatFindings(seat, {})).toEqual([]);
  });

  it("holds both values where it is not", () => {
    const width = between("0.1885", "0.1875");
    const [found, ...more] = keyseatFindings(seat, { control: between("0.719", "0.709"), width });
    expect(more).toEqual([]);
    expect(found).toMatchObject({ code: "KEYSEAT_NOT_STANDARD", name: "width", symbol: "W", printed: width });
    expect(found?.standard).toEqual(seat.rows[1]?.limits);
    expect(found?.says).toContain("0.1885 in / 0.1875 in");
    const third = keyseatRows("5/8 in", { standard: "B17.1", member: "hub", class: 3 });
    expect(keyseatFindings(third, { width })[0]).toMatchObject({ standard: null });
    const other = keyseatFindings(seat, { control: between("0.72", "0.709"), width: between("0.1895", "0.187") });
    expect(other.map(({ name }) => name)).toEqual(["control", "width"]);
  });

  it("refuses limits that are none", () => {
    expect(codeOf(() => keyseatFindings(seat, { width: "0.5 in" as never }))).toBe("LIMITS_INVALID");
  });
});

describe("bad input", () => {
  it.each([
    ["KEY_SHAFT_OUT_OF_RANGE", () => inchKey("1/4 in")],
    ["KEY_SHAFT_OUT_OF_RANGE", () => inchKey("-1 in")],
    ["KEY_SHAFT_OUT_OF_RANGE", () => inchKeyseat("31 in", { class: 1 })],
    ["KEY_SHAFT_OUT_OF_RANGE", () => metricKey("0 mm")],
    ["KEY_SHAFT_OUT_OF_RANGE", () => metricKeyseat("501 mm")],
    ["KEY_SHAFT_OUT_OF_RANGE", () => metricKey("160 mm", { standard: "ISO 2491" })],
    ["KEY_SHAFT_OUT_OF_RANGE", () => woodruffKeysFor("3 in")],
    ["KEY_SHAFT_OUT_OF_RANGE", () => metricWoodruffKeysFor("39 mm", { standard: "ISO 3912", duty: "torque" })],
    ["KEY_SIZE_NOT_DEFINED", () => inchKey("3/8 in", { shape: "rectangular" })],
    ["KEY_SIZE_NOT_DEFINED", () => inchKey("20 in", { shape: "square" })],
    ["KEY_SIZE_NOT_DEFINED", () => inchKey("1 in", { key: { width: "1/4 in", height: "3/8 in" } })],
    ["KEY_SIZE_NOT_DEFINED", () => inchKey("1 in", { shape: "square", key: { width: "1/4 in", height: "1/8 in" } })],
    ["KEY_SIZE_NOT_DEFINED", () => metricKey("40 mm", { key: { width: "12 mm", height: "9 mm" } })],
    ["KEY_SIZE_NOT_DEFINED", () => metricKey("40 mm", { key: { width: "7 mm", height: "7 mm" } })],
    [
      "KEY_SIZE_NOT_DEFINED",
      () => metricKey("40 mm", { standard: "JIS B 1301", key: { width: "7 mm", height: "7 mm" } }),
    ],
    ["KEY_SIZE_NOT_DEFINED", () => metricWoodruffKey({ standard: "ISO 3912", width: "6 mm", diameter: "28 mm" })],
    [
      "KEY_SIZE_NOT_DEFINED",
      () => metricWoodruffKey({ standard: "ISO 3912", width: "6 mm", diameter: "22 mm", height: "8 mm" }),
    ],
    ["KEY_SIZE_NOT_DEFINED", () => metricKeyLength("40 mm", { key: { width: "1 mm", height: "1 mm" } })],
    ["KEY_WIDER_THAN_SHAFT", () => inchKey("1 in", { key: { width: "1 in", height: "1 in" } })],
    ["KEY_WIDER_THAN_SHAFT", () => inchKeyseat("1 in", { class: 1, key: { width: "2 in", height: "1/4 in" } })],
    ["KEY_WIDER_THAN_SHAFT", () => metricKey("8 mm", { key: { width: "8 mm", height: "7 mm" } })],
    ["KEY_WIDER_THAN_SHAFT", () => metricKeyseat("8 mm", { key: { width: "8 mm", height: "7 mm" } })],
    [
      "KEYSEAT_DEPTH_IMPOSSIBLE",
      () => inchKeyseat("1 in", { class: 1, key: { width: "0.9999 in", height: "0.9999 in" } }),
    ],
    [
      "KEYSEAT_DEPTH_IMPOSSIBLE",
      () => inchKeyseat("1 in", { class: 2, kind: "taper", key: { width: "1/4 in", height: "0.02 in" } }),
    ],
    ["KEYED_JOINT_INVALID", () => inchKey("1 in", { key: { width: "0 in", height: "1/4 in" } })],
    ["KEYED_JOINT_INVALID", () => inchKey("1 in", { key: {} as never })],
    ["KEYED_JOINT_INVALID", () => inchKeyseat("1 in", { class: 1, length: "0 in" })],
    ["KEYED_JOINT_INVALID", () => metricKeyLength("0 mm")],
    ["KEYED_JOINT_INVALID", () => woodruffKeyseat("404", { shaftDiameter: "0 in" })],
    ["KEYED_JOINT_INVALID", () => woodruffNumber({ width: "1/4 in" } as never)],
    ["KEY_CLASS_NOT_DEFINED", () => inchKeyseat("1 in", { class: 1, kind: "taper" })],
    ["KEY_CLASS_NOT_DEFINED", () => metricKeyseat("40 mm", { standard: "ISO/R 774", fit: "normal" })],
    ["KEY_CLASS_NOT_DEFINED", () => metricKeyseat("40 mm", { standard: "DIN 6885-3", fit: "normal" })],
    ["KEY_CLASS_NOT_DEFINED", () => metricKeyseat("40 mm", { widths: { shaft: "p9", hub: "P9" } })],
    ["KEY_CLASS_NOT_DEFINED", () => metricKeyseat("40 mm", { standard: "ISO/R 774", hubDepth: "back clearance" })],
    [
      "KEY_CLASS_NOT_DEFINED",
      () => metricWoodruffKeyseat({ standard: "ISO 3912", width: "6 mm", diameter: "22 mm", series: "B" }),
    ],
    ["CLASS_MALFORMED", () => metricKeyseat("40 mm", { widths: { shaft: "P9" } as never })],
    ["OPTION_INVALID", () => inchKeyseat("1 in", {} as never)],
    ["OPTION_INVALID", () => inchKeyseat("1 in", { class: "1" as never })],
    ["OPTION_INVALID", () => inchKeyseat("1 in", { class: 1, depths: "exact" as never })],
    ["OPTION_INVALID", () => inchKey("1 in", { shape: "round" as never })],
    ["OPTION_INVALID", () => inchKey("1 in", { kind: "woodruff" as never })],
    ["OPTION_INVALID", () => metricKey("40 mm", { standard: "ISO 773" as never })],
    ["OPTION_INVALID", () => metricKey("40 mm", { standard: "constructor" as never })],
    ["OPTION_INVALID", () => metricKeyseat("40 mm", { fit: "tight" as never })],
    ["OPTION_INVALID", () => metricKeyseat("40 mm", { fit: "free", widths: { shaft: "P9", hub: "P9" } })],
    ["OPTION_INVALID", () => metricKeyseat("40 mm", { hubDepth: "deep" as never })],
    ["OPTION_INVALID", () => metricWoodruffKey({ width: "6 mm", diameter: "22 mm" } as never)],
    ["OPTION_INVALID", () => metricWoodruffKeysFor("20 mm", { standard: "ISO 3912" } as never)],
    ["WOODRUFF_NUMBER_UNKNOWN", () => woodruffKey("1111")],
    ["WOODRUFF_NUMBER_UNKNOWN", () => woodruffKeyseat("404-1")],
    ["WOODRUFF_NUMBER_UNKNOWN", () => woodruffNumber({ width: "1/4 in", diameter: "2 in" })],
    ["WOODRUFF_NUMBER_UNKNOWN", () => woodruffNumber({ width: "1/4 in", diameter: "1 in", low: true })],
    ["UNIT_MISSING", () => inchKey("1")],
    ["LENGTH_INVALID", () => inchKey(1 as never)],
    ["LENGTH_INVALID", () => metricKey(undefined as never)],
    ["UNIT_AMBIGUOUS", () => metricKey("40 mil")],
  ] as const)("%s: %s", (code, task) => {
    const error = thrown(task);
    expect(error.code).toBe(code);
    if (code.startsWith("KEY_")) expect(error.allowed).not.toBeNull();
  });

  it.each([
    "9",
    "15",
    "34",
    "A",
    "",
    "404.5.5",
    "-404",
    "0404",
    "00404",
    "400",
    "12345",
    "404-2",
    "4 04",
    "x".repeat(1_000_000),
    null,
    404,
  ])("%j is no Woodruff number of this code", (number) => {
    expect(codeOf(() => decodeWoodruffNumber(number as never))).toBe("WOODRUFF_NUMBER_UNKNOWN");
  });

  it("a number of the code that is not listed is decoded and said to be so", () => {
    expect(decodeWoodruffNumber("1111")).toMatchObject({ number: "1111", low: false, listed: false });
    expect(thrown(() => woodruffKey("1311")).allowed).toBe("of this diameter: 811, 1011, 1211");
  });

  it("names the rows that are allowed", () => {
    expect(thrown(() => inchKey("1/4 in")).allowed).toBe("over 5/16 in up to and including 30 in");
    expect(thrown(() => metricKey("5.9 mm")).allowed).toBe("from 6 mm up to and including 500 mm");
    expect(thrown(() => metricKey("12 mm", { standard: "ISO 2491" })).allowed).toBe(
      "over 12 mm up to and including 150 mm",
    );
  });
});

describe("metric keys: details", () => {
  it("a section off its row is computed and marked", () => {
    const key = { width: "10 mm", height: "8 mm" };
    const seat = metricKeyseat("50 mm", { key, fit: "close" });
    expect(seat.standardForShaft).toBe(false);
    expect(seat.cautions.map(({ code }) => code)).toContain("KEY_NOT_STANDARD");
    expect(seat.shaft.control?.max.to("mm")).toBe(45);
    expect(seat.basis[0]?.says).toContain("the row lists 14 x 9");
  });

  it("classes apart: shaft P9 with hub JS9, or grade 8 for a broach", () => {
    const mixed = metricKeyseat("40 mm", { widths: { shaft: "P9", hub: "JS8" } });
    expect([mixed.shaft.width?.designation, mixed.hub.width?.designation]).toEqual(["P9", "JS8"]);
    expect(mixed.shaft.width?.basis[0]).toMatchObject({ how: "caller" });
    expect(mixed.hub.width?.basis.some(({ standard }) => standard.startsWith("ISO 286"))).toBe(true);
  });

  it("without a fit there is no width, for no maker's default is taken", () => {
    const seat = metricKeyseat("40 mm");
    expect([seat.shaft.width, seat.hub.width]).toEqual([null, null]);
  });

  it("tables with values from memory say so", () => {
    expect(metricKey("40 mm").cautions).toEqual([]);
    expect(metricKeyseat("40 mm").cautions).toEqual([]);
    expect(metricKeyseat("40 mm", { standard: "DIN 6885-3" }).cautions.map(({ code }) => code)).toEqual([
      "KEY_VALUE_DOUBTFUL",
    ]);
    expect(metricKeyseat("270 mm").cautions.map(({ code }) => code)).toEqual(["KEY_VALUE_DOUBTFUL"]);
  });

  it("nearest length: of two as near the shorter, within the range of the section", () => {
    const key = { width: "10 mm", height: "8 mm" };
    expect(metricKeyLength("30 mm", { key }).nearest.to("mm")).toBe(28);
    expect(metricKeyLength("30.0001 mm", { key }).nearest.to("mm")).toBe(32);
    expect(metricKeyLength("6 mm", { key })).toMatchObject({ inSeries: true, valid: false });
    expect(metricKeyLength("6 mm", { key }).nearest.to("mm")).toBe(22);
    expect(metricKeyLength("900 mm", { key }).nearest.to("mm")).toBe(110);
    expect(metricKeyLength("900 mm").longer).toBeNull();
    expect(metricKeyLength("5 mm").shorter).toBeNull();
    expect(metricKeyLength("450 mm").inSeries).toBe(true);
    expect(metricKeyLength("450 mm", { standard: "DIN 6885-1" }).inSeries).toBe(false);
    expect(metricKeyLength("30 mm", { standard: "DIN 6885-1" }).keyLimits).toBeNull();
  });
});

describe("a polluted prototype", () => {
  it("supplies no option", () => {
    const spoilt = {
      class: 1,
      standard: "JIS B 1301",
      bracketed: true,
      fit: "close",
      shape: "rectangular",
      key: { width: "1 in", height: "1 in" },
    };
    const before = [JSON.stringify(inchKey("1 in")), JSON.stringify(metricKeyseat("24 mm"))];
    for (const [name, value] of Object.entries(spoilt)) {
      Object.defineProperty(Object.prototype, name, { value, configurable: true, writable: true });
    }
    try {
      expect(JSON.stringify(inchKey("1 in", {}))).toBe(before[0]);
      expect(JSON.stringify(metricKeyseat("24 mm", {}))).toBe(before[1]);
      expect(codeOf(() => inchKeyseat("1 in", {} as never))).toBe("OPTION_INVALID");
    } finally {
      for (const name of Object.keys(spoilt)) Reflect.deleteProperty(Object.prototype, name);
    }
  });
});
