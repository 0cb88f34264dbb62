import {
  exactPlaces,
  inch,
  lengthOfTicks,
  microinch,
  mm,
  roundLength,
  thou,
  toDecimal,
  um,
  writeLength,
} from "limitsmith";
import type { LengthUnit, Rounding, WriteLengthOptions } from "limitsmith";
import { Decimal } from "decimal.js";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";

const UNITS: readonly LengthUnit[] = ["mm", "um", "in", "thou", "uin"];

describe("a length as text", () => {
  it.each([
    [mm("40.0250"), "40.025 mm"],
    [mm(25), "25 mm"],
    [mm("-0.5"), "-0.5 mm"],
    [mm("0.0000001"), "0.0000001 mm"],
    [um("0.8"), "0.8 µm"],
    [um("-18"), "-18 µm"],
    [inch(".5"), "0.5 in"],
    [inch("1/64"), "0.015625 in"],
    [inch("1/128"), "0.0078125 in"],
    [thou("1.4"), "1.4 thou"],
    [microinch("63"), "63 µin"],
    [microinch("0.5"), "0.5 µin"],
    [mm(0), "0 mm"],
  ])("%s", (length, text) => {
    expect(length.toString()).toBe(text);
    expect(length.toJSON()).toBe(text);
    expect(JSON.stringify({ length })).toBe(JSON.stringify({ length: text }));
  });

  it.each(["in", "thou", "uin"] as const)("falls back to mm where decimals of %s do not end", (unit) => {
    // 1 tick is 1/254 µin, and 127 does not divide it
    expect(lengthOfTicks(1, unit).toString()).toBe("0.0000001 mm");
    expect(lengthOfTicks(-250_000_001, unit).toString()).toBe("-25.0000001 mm");
    expect(lengthOfTicks(127, unit).toString()).toBe({ in: "0.0000005 in", thou: "0.0005 thou", uin: "0.5 µin" }[unit]);
  });

  it("gives the nearest double in any unit", () => {
    const length = inch("1.25");
    expect(UNITS.map((unit) => length.to(unit))).toEqual([31.75, 31_750, 1.25, 1250, 1_250_000]);
    expect(mm("0.1").to("mm")).toBe(0.1);
    expect(codeOf(() => length.to("m" as never))).toBe("UNIT_UNKNOWN");
  });
});

describe("toDecimal", () => {
  it("is exact where decimals end", () => {
    expect(toDecimal(inch("1.2516"), "mm").toString()).toBe("31.79064");
    expect(toDecimal(mm("-0.0000001"), "um").toString()).toBe("-0.0001");
    expect(toDecimal("25.4 mm", "in").toString()).toBe("1");
  });

  it("has 40 figures where they do not", () => {
    expect(toDecimal(mm(1), "in").toString()).toBe("0.03937007874015748031496062992125984251969");
  });

  it("heeds no setting of the caller's Decimal, and changes none", () => {
    const before = { ...Decimal };
    Decimal.set({ precision: 3 });
    try {
      expect(toDecimal(mm(1), "in").toFixed(8)).toBe("0.03937008");
      expect(toDecimal(mm("123.4567"), "mm").toString()).toBe("123.4567");
      expect(Decimal.precision).toBe(3);
    } finally {
      Decimal.set({ precision: before.precision });
    }
  });

  it("refuses an unknown unit", () => {
    expect(codeOf(() => toDecimal(mm(1), "furlong" as never))).toBe("UNIT_UNKNOWN");
  });
});

describe("exactPlaces", () => {
  it.each([
    [mm("40.025"), "mm", 3],
    [mm(40), "mm", 0],
    [mm(40), "um", 0],
    [mm("0.0000001"), "mm", 7],
    [mm("0.0000001"), "um", 4],
    [mm(40), "in", null],
    [mm("25.4"), "in", 0],
    [inch("1/64"), "in", 6],
    [inch("1/128"), "in", 7],
    [inch("1/128"), "thou", 4],
    [inch("1/128"), "uin", 1],
    [inch("1/64"), "mm", 6],
    [mm(0), "in", 0],
  ] as const)("%s in %s: %s", (length, unit, places) => {
    expect(exactPlaces(length, unit)).toBe(places);
  });

  it("refuses an unknown unit", () => {
    expect(codeOf(() => exactPlaces(mm(1), "m" as never))).toBe("UNIT_UNKNOWN");
  });
});

describe("writeLength", () => {
  it.each<[string, WriteLengthOptions | undefined, string]>([
    // metric: a zero before the point, none behind that is not needed
    ["0.5 mm", undefined, "0.5 mm"],
    ["40.0250 mm", undefined, "40.025 mm"],
    ["40 mm", { places: 3 }, "40 mm"],
    ["40.5 mm", { places: 3 }, "40.5 mm"],
    ["-0.5 mm", { symbol: false }, "-0.5"],
    ["18 µm", undefined, "18 µm"],
    // inch: no zero before the point, all places kept
    ["1/2 in", undefined, ".5 in"],
    ["1/2 in", { places: 3 }, ".500 in"],
    ["-1/2 in", { places: 3 }, "-.500 in"],
    ["1.5 in", { places: 4 }, "1.5000 in"],
    ["2 in", { places: 0 }, "2 in"],
    ["0 in", { places: 3 }, ".000 in"],
    ["0 in", undefined, "0 in"],
    ["2 thou", { places: 1 }, "2.0 thou"],
    ["63 uin", undefined, "63 µin"],
    // either style on either unit
    ["0.5 mm", { style: "inch", places: 2 }, ".50 mm"],
    ["1/2 in", { style: "metric", places: 3 }, "0.5 in"],
    // another unit
    ["40 mm", { unit: "in", places: 4, symbol: false }, "1.5748"],
    ["1 in", { unit: "mm" }, "25.4 mm"],
    ["1 in", { unit: "um" }, "25400 µm"],
    ["25.4 mm", { unit: "uin" }, "1000000 µin"],
    // signs
    ["0.018 mm", { sign: "always" }, "+0.018 mm"],
    ["-0.018 mm", { sign: "always" }, "-0.018 mm"],
    ["0 mm", { sign: "always" }, "0 mm"],
    [".002 in", { sign: "always", places: 4, symbol: false }, "+.0020"],
    ["0.018 mm", { sign: "negative" }, "0.018 mm"],
    // decimal mark
    ["40.025 mm", { decimalMark: "," }, "40,025 mm"],
    ["1/2 in", { decimalMark: ",", places: 3, symbol: false }, ",500"],
    ["40 mm", { decimalMark: "," }, "40 mm"],
  ])("%s with %j is %j", (length, options, text) => {
    expect(writeLength(length, options)).toBe(text);
  });

  // ISO 80000-1:2009, B.3: rule A (even) and rule B (away from zero) for an exact half
  it.each<[string, Record<Rounding, string>]>([
    ["0.0014 mm", { nearest: "0.001", "nearest-away": "0.001", "toward-zero": "0.001", up: "0.002", down: "0.001" }],
    ["0.0015 mm", { nearest: "0.002", "nearest-away": "0.002", "toward-zero": "0.001", up: "0.002", down: "0.001" }],
    ["0.0025 mm", { nearest: "0.002", "nearest-away": "0.003", "toward-zero": "0.002", up: "0.003", down: "0.002" }],
    ["0.0026 mm", { nearest: "0.003", "nearest-away": "0.003", "toward-zero": "0.002", up: "0.003", down: "0.002" }],
    [
      "-0.0014 mm",
      { nearest: "-0.001", "nearest-away": "-0.001", "toward-zero": "-0.001", up: "-0.001", down: "-0.002" },
    ],
    [
      "-0.0025 mm",
      { nearest: "-0.002", "nearest-away": "-0.003", "toward-zero": "-0.002", up: "-0.002", down: "-0.003" },
    ],
    [
      "-0.0035 mm",
      { nearest: "-0.004", "nearest-away": "-0.004", "toward-zero": "-0.003", up: "-0.003", down: "-0.004" },
    ],
    ["0.002 mm", { nearest: "0.002", "nearest-away": "0.002", "toward-zero": "0.002", up: "0.002", down: "0.002" }],
    [
      "-0.002 mm",
      { nearest: "-0.002", "nearest-away": "-0.002", "toward-zero": "-0.002", up: "-0.002", down: "-0.002" },
    ],
    // what rounds to nothing shows no sign
    ["-0.0004 mm", { nearest: "0", "nearest-away": "0", "toward-zero": "0", up: "0", down: "-0.001" }],
    ["-0.0005 mm", { nearest: "0", "nearest-away": "-0.001", "toward-zero": "0", up: "0", down: "-0.001" }],
    ["0.0005 mm", { nearest: "0", "nearest-away": "0.001", "toward-zero": "0", up: "0.001", down: "0" }],
    // ties in inches too, and no tie where the exact value only looks like one
    [".00025 in", { nearest: "0", "nearest-away": "0", "toward-zero": "0", up: "0.001", down: "0" }],
    [".0025 in", { nearest: "0.002", "nearest-away": "0.003", "toward-zero": "0.002", up: "0.003", down: "0.002" }],
    ["0.0635001 mm", { nearest: "0.064", "nearest-away": "0.064", "toward-zero": "0.063", up: "0.064", down: "0.063" }],
  ])("rounds %s in all five ways", (length, wanted) => {
    for (const [rounding, text] of Object.entries(wanted)) {
      const options = { places: 3, rounding: rounding as Rounding, symbol: false, style: "metric" } as const;
      expect(`${rounding} ${writeLength(length, options)}`).toBe(`${rounding} ${text}`);
    }
  });

  it("rounds nearest, half to even, where nothing is said", () => {
    expect(writeLength("0.0025 mm", { places: 3 })).toBe("0.002 mm");
    expect(writeLength("0.0035 mm", { places: 3 })).toBe("0.004 mm");
  });

  it("writes up to 12 places", () => {
    expect(writeLength(mm(1), { unit: "in", places: 12, symbol: false })).toBe(".039370078740");
    expect(codeOf(() => writeLength(mm(1), { places: 13 }))).toBe("OPTION_INVALID");
  });

  it.each<[string, unknown]>([
    ["OPTION_INVALID", { places: -1 }],
    ["OPTION_INVALID", { places: 1.5 }],
    ["OPTION_INVALID", { places: NaN }],
    ["OPTION_INVALID", { places: "3" }],
    ["OPTION_INVALID", { places: 3, rounding: "half-up" }],
    ["OPTION_INVALID", { style: "plain" }],
    ["OPTION_INVALID", { decimalMark: "'" }],
    ["OPTION_INVALID", { sign: "never" }],
    ["OPTION_INVALID", { symbol: "no" }],
    ["UNIT_UNKNOWN", { unit: "m" }],
    ["LENGTH_NOT_EXACT", { unit: "in" }],
  ])("refuses with %s: %j", (code, options) => {
    expect(codeOf(() => writeLength(mm(1), options as WriteLengthOptions))).toBe(code);
  });
});

describe("roundLength", () => {
  it.each<[string, LengthUnit, number, Rounding | undefined, string]>([
    ["25.015 mm", "in", 4, undefined, "0.9848 in"],
    ["25.015 mm", "in", 4, "up", "0.9849 in"],
    ["25.002 mm", "in", 4, undefined, "0.9843 in"],
    ["0.0025 mm", "mm", 3, "nearest", "0.002 mm"],
    ["0.0025 mm", "mm", 3, "nearest-away", "0.003 mm"],
    ["-0.0025 mm", "mm", 3, "nearest", "-0.002 mm"],
    ["-0.0025 mm", "mm", 3, "nearest-away", "-0.003 mm"],
    ["-0.0025 mm", "mm", 3, "up", "-0.002 mm"],
    ["-0.0025 mm", "mm", 3, "down", "-0.003 mm"],
    ["-0.0025 mm", "mm", 3, "toward-zero", "-0.002 mm"],
    ["-0.4 µm", "um", 0, "nearest", "0 µm"],
    ["1 in", "mm", 0, "nearest", "25 mm"],
    ["0.0000001 mm", "mm", 7, "nearest", "0.0000001 mm"],
    ["1.23456789 um", "um", 4, undefined, ""],
  ])("%s to %s with %d places, %s: %s", (length, unit, places, rounding, text) => {
    if (text === "") {
      expect(codeOf(() => roundLength(length, { unit, places }))).toBe("LENGTH_TOO_FINE");
      return;
    }
    const rounded = roundLength(length, rounding === undefined ? { unit, places } : { unit, places, rounding });
    expect(rounded.toString()).toBe(text);
    expect(rounded.ticks).not.toBe(-0);
  });

  it("stays in the length's own unit where none is named", () => {
    expect(roundLength("1.23456 in", { places: 3 }).toString()).toBe("1.235 in");
  });

  it.each([
    ["mm", 7],
    ["um", 4],
    ["in", 6],
    ["thou", 3],
    ["uin", 0],
  ] as const)("keeps decimals of %s that whole ticks fit: %d, not one more", (unit, most) => {
    expect(roundLength(mm(1), { unit, places: most }).unit).toBe(unit);
    expect(codeOf(() => roundLength(mm(1), { unit, places: most + 1 }))).toBe("OPTION_INVALID");
  });

  it.each([
    [inch("1/128"), 7],
    [thou("7.8125"), 4],
    [microinch("0.5"), 1],
  ] as const)("takes one more in inch units where it ends there: %s to %d places", (length, places) => {
    expect(roundLength(length, { places })).toEqual(length);
    expect(codeOf(() => roundLength(length, { places: places + 1 }))).toBe("OPTION_INVALID");
  });

  it.each<[string, unknown]>([
    ["OPTION_INVALID", undefined],
    ["OPTION_INVALID", {}],
    ["OPTION_INVALID", { places: -1 }],
    ["OPTION_INVALID", { places: 0.5 }],
    ["OPTION_INVALID", { places: 3, rounding: "even" }],
    ["UNIT_UNKNOWN", { places: 3, unit: "m" }],
  ])("refuses with %s: %j", (code, options) => {
    expect(codeOf(() => roundLength(mm(1), options as never))).toBe(code);
  });
});
