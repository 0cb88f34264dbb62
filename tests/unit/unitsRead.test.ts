import { inch, microinch, mm, readDimension, readLength, thou, um } from "limitsmith";
import type { Length, LengthSource, LengthUnit, ReadOptions } from "limitsmith";
import { Decimal } from "decimal.js";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

// 1 in = 25.4 mm exactly (international yard and pound agreement of 1959); a tick is 0.1 nm.
const TICKS: Readonly<Record<LengthUnit, number>> = {
  mm: 10_000_000,
  um: 10_000,
  in: 254_000_000,
  thou: 254_000,
  uin: 254,
};
const MAKERS: readonly (readonly [LengthUnit, (value: LengthSource, options?: ReadOptions) => Length])[] = [
  ["mm", mm],
  ["um", um],
  ["in", inch],
  ["thou", thou],
  ["uin", microinch],
];

describe.each(MAKERS)("a length in %s", (unit, make) => {
  it.each([
    ["1", 1],
    ["+1", 1],
    ["-1", -1],
    ["\u22121", -1],
    ["25", 25],
    ["025", 25],
    ["25.", 25],
    ["0", 0],
    [" 3 ", 3],
    ["0.5", 0.5],
    [".5", 0.5],
    ["-.5", -0.5],
    ["\u2212.5", -0.5],
    ["12.50", 12.5],
  ])("reads the text %j", (text, value) => {
    const length = make(text);
    expect(length.ticks).toBe(value * TICKS[unit]);
    expect(length.unit).toBe(unit);
    expect(Object.isFrozen(length)).toBe(true);
  });

  it("takes numbers, texts and decimals alike", () => {
    for (const value of [0, 1, 2.5, -7, 1000]) {
      const ticks = value * TICKS[unit];
      expect(make(value).ticks).toBe(ticks);
      expect(make(String(value)).ticks).toBe(ticks);
      expect(make(new Decimal(value)).ticks).toBe(ticks);
    }
  });

  it("never holds a negative zero", () => {
    for (const zero of [0, -0, "0", "-0", "-0.000", new Decimal("-0")]) {
      expect(make(zero).ticks).toBe(0);
      expect(make(zero).toString()).not.toContain("-");
    }
  });

  it("rounds a number to the nearest tick", () => {
    const tick = 1 / TICKS[unit];
    expect(make(0.4 * tick).ticks).toBe(0);
    expect(make(0.6 * tick).ticks).toBe(1);
    expect(make(-0.6 * tick).ticks).toBe(-1);
    expect(make(7.4 * tick).ticks).toBe(7);
  });

  it("reads a comma when asked, and then no point", () => {
    expect(make("2,5", { decimalMark: "," }).ticks).toBe(2.5 * TICKS[unit]);
    expect(make(",5", { decimalMark: "," }).ticks).toBe(0.5 * TICKS[unit]);
    expect(codeOf(() => make("2.5", { decimalMark: "," }))).toBe("DECIMAL_MARK_MIXED");
    // a decimal object writes itself with a point, whatever the texts use
    expect(make(new Decimal("2.5"), { decimalMark: "," }).ticks).toBe(2.5 * TICKS[unit]);
  });

  it.each([
    ["TEXT_EMPTY", ""],
    ["TEXT_EMPTY", "   "],
    ["TEXT_TOO_LONG", "1".repeat(61)],
    ["TEXT_TOO_LONG", `1.${"0".repeat(200)}`],
    ["NUMBER_NOT_FINITE", NaN],
    ["NUMBER_NOT_FINITE", Infinity],
    ["NUMBER_NOT_FINITE", -Infinity],
    ["NUMBER_NOT_FINITE", new Decimal(NaN)],
    ["NUMBER_NOT_FINITE", new Decimal(Infinity)],
    ["NUMBER_NOT_FINITE", new Decimal(-Infinity)],
    ["DECIMAL_MARK_MIXED", "2,5"],
    ["DECIMAL_MARK_MIXED", "1,234.5"],
    ["NUMBER_MALFORMED", "."],
    ["NUMBER_MALFORMED", "+"],
    ["NUMBER_MALFORMED", "-"],
    ["NUMBER_MALFORMED", "--1"],
    ["NUMBER_MALFORMED", "1.2.3"],
    ["NUMBER_MALFORMED", "1e3"],
    ["NUMBER_MALFORMED", "0x10"],
    ["NUMBER_MALFORMED", "1 000"],
    ["NUMBER_MALFORMED", "1_000"],
    ["NUMBER_MALFORMED", "NaN"],
    ["NUMBER_MALFORMED", "Infinity"],
    ["NUMBER_MALFORMED", "٣"],
    ["NUMBER_MALFORMED", "１"],
    ["NUMBER_MALFORMED", "½"],
    ["NUMBER_MALFORMED", "1/"],
    ["NUMBER_MALFORMED", "/2"],
    ["NUMBER_MALFORMED", "1/2/3"],
    ["NUMBER_MALFORMED", "1/-2"],
    ["LENGTH_OUT_OF_RANGE", 1e300],
    ["LENGTH_OUT_OF_RANGE", -1e300],
    ["LENGTH_OUT_OF_RANGE", "9".repeat(40)],
    ["LENGTH_OUT_OF_RANGE", `-${"9".repeat(40)}`],
    ["LENGTH_TOO_FINE", `0.${"0".repeat(12)}1`],
  ] as const)("refuses with %s: %s", (code, value) => {
    expect(codeOf(() => make(value))).toBe(code);
  });

  it.each([
    undefined,
    null,
    true,
    {},
    [],
    [1],
    1n,
    Symbol("25"),
    () => 25,
    { toFixed: 25 },
    { toFixed: () => 25 },
    Object.create(null),
  ])("refuses what is neither number, text nor decimal (%#)", (value) => {
    expect(codeOf(() => make(value as never))).toBe("NUMBER_MALFORMED");
  });

  it("refuses a boxed number, whose toFixed() would drop its decimals", () => {
    expect(codeOf(() => make(Object(24.9) as never))).toBe("NUMBER_MALFORMED");
  });

  it("takes any object that writes itself as a decimal", () => {
    // some decimal libraries refuse valueOf(), some objects have none
    const strict = {
      toFixed: () => "2.5",
      valueOf: () => {
        throw new Error("valueOf disallowed");
      },
    };
    const bare = Object.assign(Object.create(null) as object, { toFixed: () => "2.5" });
    for (const value of [strict, bare]) expect(make(value as never).ticks).toBe(2.5 * TICKS[unit]);
  });

  it("refuses another decimal mark", () => {
    expect(codeOf(() => make("2'5", { decimalMark: "'" as never }))).toBe("OPTION_INVALID");
  });
});

describe("the safe range", () => {
  const LAST = Number.MAX_SAFE_INTEGER;

  it("ends where whole ticks are no longer told apart", () => {
    expect(mm("900719925.4740991").ticks).toBe(LAST);
    expect(mm("-900719925.4740991").ticks).toBe(-LAST);
    expect(codeOf(() => mm("900719925.4740992"))).toBe("LENGTH_OUT_OF_RANGE");
    expect(codeOf(() => mm("-900719925.4740992"))).toBe("LENGTH_OUT_OF_RANGE");
  });
});

describe("what is too fine for a tick", () => {
  it.each([
    [mm, "0.0000001", 1],
    [um, "0.0001", 1],
    [inch, "0.0000005", 127],
    [inch, "1/128", 1_984_375],
    [thou, "0.0005", 127],
    [microinch, "0.5", 127],
  ] as const)("%o reads %s exactly", (make, text, ticks) => {
    expect(make(text).ticks).toBe(ticks);
  });

  it.each([
    [mm, "0.00000001"],
    [mm, "25.00000005"],
    [um, "0.00001"],
    [inch, "0.0000001"],
    [inch, "1/256"],
    [inch, "1/3"],
    [thou, "0.0001"],
    [microinch, "0.1"],
  ] as const)("%o refuses %s", (make, text) => {
    expect(codeOf(() => make(text))).toBe("LENGTH_TOO_FINE");
    expect(codeOf(() => make({ toFixed: () => text }))).toMatch(/LENGTH_TOO_FINE|FRACTION_NOT_INCH/);
  });
});

describe("numbers from a CAD kernel", () => {
  it("lose their noise", () => {
    expect(mm(24.999999999999996).toString()).toBe("25 mm");
    expect(mm(0.1 + 0.2).toString()).toBe("0.3 mm");
    expect(inch(0.1 + 0.2).toString()).toBe("0.3 in");
    expect(inch(1 / 3).ticks).toBe(84_666_667);
  });

  it("a half tick goes away from zero, alike on both sides", () => {
    // halves of powers of two, so that the numbers themselves are exact
    expect([1 / 256, -1 / 256, 3 / 256, -3 / 256].map((value) => mm(value).ticks)).toEqual([
      39_063, -39_063, 117_188, -117_188,
    ]);
    expect([1 / 32, -1 / 32].map((value) => um(value).ticks)).toEqual([313, -313]);
    expect([1 / 256, -1 / 256].map((value) => inch(value).ticks)).toEqual([992_188, -992_188]);
  });
});

describe("inch fractions", () => {
  it.each([
    ["1/2", 127_000_000],
    ["5/8", 158_750_000],
    ["1/64", 3_968_750],
    ["5/4", 317_500_000],
    ["1 1/4", 317_500_000],
    ["1-1/4", 317_500_000],
    ["1 - 1/4", 317_500_000],
    ["1  1/4", 317_500_000],
    ["-1 1/4", -317_500_000],
    ["-1-1/4", -317_500_000],
    ["\u22121 1/4", -317_500_000],
    ["+1/2", 127_000_000],
    ["1 / 2", 127_000_000],
    ["0/8", 0],
    ["12 63/64", 12 * 254_000_000 + 63 * 3_968_750],
  ])("reads %j", (text, ticks) => {
    expect(inch(text).ticks).toBe(ticks);
    expect(inch(text, { decimalMark: "," }).ticks).toBe(ticks);
  });

  it.each([
    ["FRACTION_ZERO_DENOMINATOR", "1/0"],
    ["FRACTION_ZERO_DENOMINATOR", "1 1/0"],
    ["FRACTION_ZERO_DENOMINATOR", "0/0"],
    ["NUMBER_MALFORMED", "1 5/4"],
    ["NUMBER_MALFORMED", "1 4/4"],
    ["NUMBER_MALFORMED", "1.5/2"],
    ["NUMBER_MALFORMED", "1 1 1/4"],
    ["NUMBER_MALFORMED", "1/4-1/2"],
    ["NUMBER_MALFORMED", "1\u20441"],
  ])("refuses with %s: %j", (code, text) => {
    expect(codeOf(() => inch(text))).toBe(code);
  });

  it.each([
    ["mm", mm],
    ["um", um],
    ["thou", thou],
    ["uin", microinch],
  ] as const)("are not read in %s", (_, make) => {
    expect(codeOf(() => make("1/2"))).toBe("FRACTION_NOT_INCH");
    expect(codeOf(() => make("1 1/2"))).toBe("FRACTION_NOT_INCH");
  });
});

describe("readLength", () => {
  it.each([
    ["25 mm", "mm", 250_000_000],
    ["25mm", "mm", 250_000_000],
    ["25 MM", "mm", 250_000_000],
    ["25\u00a0mm", "mm", 250_000_000],
    ["  25 mm  ", "mm", 250_000_000],
    ["-0.02 mm", "mm", -200_000],
    ["\u22120.02 mm", "mm", -200_000],
    ["1.25 in", "in", 317_500_000],
    ["1.25 in.", "in", 317_500_000],
    ["1.25 inch", "in", 317_500_000],
    ["1.25 inches", "in", 317_500_000],
    ['1.25"', "in", 317_500_000],
    ["1.25\u2033", "in", 317_500_000],
    ['1 1/4"', "in", 317_500_000],
    ["1-1/4 in", "in", 317_500_000],
    ["5/8 in", "in", 158_750_000],
    [".015625 in", "in", 3_968_750],
    ["2 thou", "thou", 508_000],
    ["63 \u00b5in", "uin", 16_002],
    ["63 \u03bcin", "uin", 16_002],
    ["63 uin", "uin", 16_002],
    ["0.8 \u00b5m", "um", 8000],
    ["0.8 \u03bcm", "um", 8000],
    ["0.8 um", "um", 8000],
    ["0.8\u00b5m", "um", 8000],
  ] as const)("reads %j", (text, unit, ticks) => {
    const length = readLength(text);
    expect(length.unit).toBe(unit);
    expect(length.ticks).toBe(ticks);
  });

  it("reads a decimal comma when asked", () => {
    expect(readLength("40,025 mm", { decimalMark: "," }).ticks).toBe(400_250_000);
    expect(codeOf(() => readLength("40,025 mm"))).toBe("DECIMAL_MARK_MIXED");
    expect(codeOf(() => readLength("40.025 mm", { decimalMark: "," }))).toBe("DECIMAL_MARK_MIXED");
    expect(codeOf(() => readLength("40 mm", { decimalMark: ";" as never }))).toBe("OPTION_INVALID");
  });

  it.each([
    ["TEXT_EMPTY", ""],
    ["TEXT_EMPTY", "   "],
    ["TEXT_EMPTY", "mm"],
    ["TEXT_EMPTY", '"'],
    ["UNIT_MISSING", "25"],
    ["UNIT_MISSING", "1 1/4"],
    ["UNIT_MISSING", "-.5"],
    ["UNIT_AMBIGUOUS", "5 mil"],
    ["UNIT_AMBIGUOUS", "5 mils"],
    ["UNIT_AMBIGUOUS", "5 MIL"],
    ["UNIT_UNKNOWN", "5 m"],
    ["UNIT_UNKNOWN", "5 cm"],
    ["UNIT_UNKNOWN", "5 ft"],
    ["UNIT_UNKNOWN", "5'"],
    ["UNIT_UNKNOWN", "5 nm"],
    ["UNIT_UNKNOWN", "5 \u00b5"],
    ["UNIT_UNKNOWN", "5 mm mm"],
    ["UNIT_UNKNOWN", "mm 5"],
    ["UNIT_UNKNOWN", "5 __proto__"],
    ["UNIT_UNKNOWN", "5 constructor"],
    ["UNIT_UNKNOWN", "1e3 mm"],
    ["UNIT_UNKNOWN", "NaN"],
    ["NUMBER_MALFORMED", "- mm"],
    ["NUMBER_MALFORMED", "1 2 mm"],
    ["FRACTION_NOT_INCH", "1/2 mm"],
    ["FRACTION_ZERO_DENOMINATOR", "1/0 in"],
    ["LENGTH_TOO_FINE", "0.00000001 mm"],
    ["LENGTH_TOO_FINE", "1/3 in"],
    ["LENGTH_OUT_OF_RANGE", "1000000000 mm"],
    ["TEXT_TOO_LONG", `${" ".repeat(100)}5 mm`],
    ["TEXT_TOO_LONG", `${"1".repeat(61)} mm`],
    ["TEXT_TOO_LONG", "x".repeat(101)],
  ])("refuses with %s: %j", (code, text) => {
    expect(codeOf(() => readLength(text))).toBe(code);
  });

  it("says what mil could mean", () => {
    const error = thrown(() => readLength("5 mil"));
    expect(error.allowed).toContain("thou");
    expect(error.allowed).toContain("mm");
    expect(error.value).toBe("5 mil");
  });

  it.each([undefined, null, 25, {}, ["25 mm"]])("refuses what is no text: %j", (value) => {
    expect(codeOf(() => readLength(value as never))).toBe("LENGTH_INVALID");
  });
});

describe("readDimension", () => {
  it.each([
    ["2.5", "decimal", 1, "2.5"],
    ["2.50", "decimal", 2, "2.50"],
    ["2.500", "decimal", 3, "2.500"],
    ["2", "decimal", 0, "2"],
    ["2.", "decimal", 0, "2."],
    [".750", "decimal", 3, ".750"],
    ["1 3/4", "fraction", 0, "1 3/4"],
    ["-.010", "decimal", 3, "-.010"],
  ] as const)("keeps how %j was written", (text, form, places, number) => {
    const read = readDimension(text, { unit: "in" });
    expect(read).toMatchObject({ form, places, text: number, unitWritten: false });
    expect(read.length.ticks).toBe(inch(text).ticks);
    expect(read.length.unit).toBe("in");
    expect(Object.isFrozen(read)).toBe(true);
  });

  it("a unit in the text wins over the drawing's", () => {
    const read = readDimension("12.70 mm", { unit: "in" });
    expect(read).toMatchObject({ text: "12.70", places: 2, unitWritten: true });
    expect(read.length.toString()).toBe("12.7 mm");
  });

  it("counts decimals behind a comma when asked", () => {
    expect(readDimension("2,50", { unit: "mm", decimalMark: "," }).places).toBe(2);
  });

  it.each([
    ["UNIT_MISSING", "2.5", {}],
    ["UNIT_MISSING", "2.5", undefined],
    ["UNIT_UNKNOWN", "2.5", { unit: "ell" as never }],
    ["UNIT_UNKNOWN", "2.5 ell", { unit: "mm" as const }],
    ["UNIT_AMBIGUOUS", "2.5 mil", { unit: "mm" as const }],
    ["TEXT_EMPTY", "", { unit: "mm" as const }],
    ["TEXT_EMPTY", "mm", {}],
    ["FRACTION_NOT_INCH", "1/2", { unit: "mm" as const }],
    ["NUMBER_MALFORMED", "1..2", { unit: "mm" as const }],
    ["DECIMAL_MARK_MIXED", "2,5", { unit: "mm" as const }],
    ["LENGTH_TOO_FINE", "1/3", { unit: "in" as const }],
    ["LENGTH_OUT_OF_RANGE", "1000000000", { unit: "mm" as const }],
    ["TEXT_TOO_LONG", "1".repeat(61), { unit: "mm" as const }],
    ["OPTION_INVALID", "2.5", { unit: "mm" as const, decimalMark: "" as never }],
  ] as const)("refuses with %s: %j %j", (code, text, options) => {
    expect(codeOf(() => readDimension(text, options))).toBe(code);
  });

  it.each([undefined, null, 2.5, {}])("refuses what is no text with a typed error: %j", (value) => {
    expect(codeOf(() => readDimension(value as never, { unit: "mm" }))).toMatch(/^[A-Z_]+$/);
  });

  it("refuses over-long text by its length, before it looks at a character", () => {
    expect(codeOf(() => readDimension("x".repeat(1_000_000), { unit: "mm" }))).toBe("TEXT_TOO_LONG");
  });
});
