import {
  add,
  asLength,
  compareLengths,
  equalLengths,
  inch,
  lengthOfTicks,
  microinch,
  mm,
  multiply,
  subtract,
  thou,
  um,
} from "limitsmith";
import type { Length, LengthLike } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

describe("add and subtract", () => {
  it("are exact and keep the unit of the first", () => {
    expect(add(inch("1"), um(18)).ticks).toBe(254_180_000);
    expect(add(inch("1"), um(18)).unit).toBe("in");
    expect(add(mm("0.1"), mm("0.2")).toString()).toBe("0.3 mm");
    expect(subtract(mm(40), um(25)).toString()).toBe("39.975 mm");
    expect(subtract(um(25), mm(40)).toString()).toBe("-39975 µm");
    expect(subtract(mm("0.3"), mm("0.3")).ticks).toBe(0);
  });

  it("take texts and bare data", () => {
    expect(add("1 in", { ticks: 180_000, unit: "um" }).ticks).toBe(254_180_000);
  });

  it("refuse what leaves the safe range, on both sides", () => {
    const most = lengthOfTicks(Number.MAX_SAFE_INTEGER, "mm");
    const tick = lengthOfTicks(1, "mm");
    expect(codeOf(() => add(most, tick))).toBe("LENGTH_OUT_OF_RANGE");
    expect(codeOf(() => add(most, most))).toBe("LENGTH_OUT_OF_RANGE");
    expect(codeOf(() => subtract(multiply(most, -1), tick))).toBe("LENGTH_OUT_OF_RANGE");
    expect(subtract(most, most).ticks).toBe(0);
  });
});

describe("multiply", () => {
  it.each([
    [mm(7), 3, 210_000_000],
    [mm(7), -3, -210_000_000],
    [mm(7), 0, 0],
    [mm(-7), 0, 0],
    [mm("0.021"), { numerator: 1, denominator: 2 }, 105_000],
    [mm(1), { numerator: 1, denominator: 3 }, 3_333_333],
    [mm(1), { numerator: 2, denominator: 3 }, 6_666_667],
    [mm(-1), { numerator: 2, denominator: 3 }, -6_666_667],
    [inch(1), { numerator: -1, denominator: 8 }, -31_750_000],
  ])("%s times %j", (length, factor, ticks) => {
    const product = multiply(length, factor);
    expect(product.ticks).toBe(ticks);
    expect(product.unit).toBe(length.unit);
  });

  it("sends half a tick to the even one: ISO 80000-1:2009, B.3, rule A", () => {
    const half = { numerator: 1, denominator: 2 };
    expect([1, 3, 5, 7, -1, -3, -5].map((ticks) => multiply(lengthOfTicks(ticks, "mm"), half).ticks)).toEqual([
      0, 2, 2, 4, 0, -2, -2,
    ]);
  });

  it("stays exact where a double would not", () => {
    const third = { numerator: 900_000_000_000_001, denominator: 900_000_000_000_000 };
    expect(multiply(lengthOfTicks(9_000_000_000_000_000, "mm"), third).ticks).toBe(9_000_000_000_000_010);
  });

  it.each([1.5, NaN, Infinity, 2 ** 53, "2", null, undefined, {}, { numerator: 1 }, { denominator: 2 }])(
    "refuses the factor %j",
    (factor) => {
      expect(codeOf(() => multiply(mm(1), factor as never))).toBe("OPTION_INVALID");
    },
  );

  it.each([0, -2, 1.5, NaN])("refuses the denominator %d", (denominator) => {
    expect(codeOf(() => multiply(mm(1), { numerator: 1, denominator }))).toBe("OPTION_INVALID");
  });

  it("refuses what leaves the safe range", () => {
    expect(codeOf(() => multiply(lengthOfTicks(Number.MAX_SAFE_INTEGER, "mm"), 2))).toBe("LENGTH_OUT_OF_RANGE");
  });
});

describe("compareLengths and equalLengths", () => {
  it("go by size, not by unit", () => {
    expect(compareLengths(inch(1), mm(25))).toBe(1);
    expect(compareLengths(mm(25), inch(1))).toBe(-1);
    expect(compareLengths(inch(1), mm("25.4"))).toBe(0);
    expect(equalLengths(inch(1), thou(1000))).toBe(true);
    expect(equalLengths(inch(1), microinch(1_000_000))).toBe(true);
    expect(equalLengths(inch(1), mm(25))).toBe(false);
    expect(equalLengths("25.4 mm", "1 in")).toBe(true);
  });

  it("sort a list", () => {
    expect(["1/8 in", "3 mm", "1 mm", "-2 mm"].sort(compareLengths)).toEqual(["-2 mm", "1 mm", "3 mm", "1/8 in"]);
  });
});

describe("lengthOfTicks", () => {
  it("makes frozen lengths without a negative zero", () => {
    expect(Object.isFrozen(lengthOfTicks(5, "mm"))).toBe(true);
    expect(lengthOfTicks(-0, "mm").ticks).toBe(0);
    expect(() => {
      "use strict";
      (lengthOfTicks(5, "mm") as { ticks: number }).ticks = 6;
    }).toThrow(TypeError);
  });

  it.each([1.5, NaN, Infinity, 2 ** 53, "5", null, undefined, 5n])("refuses %s ticks", (ticks) => {
    expect(codeOf(() => lengthOfTicks(ticks as never, "mm"))).toBe("LENGTH_OUT_OF_RANGE");
  });

  it("refuses a unit that is none", () => {
    expect(codeOf(() => lengthOfTicks(5, "furlong" as never))).toBe("UNIT_UNKNOWN");
    expect(codeOf(() => lengthOfTicks(5, undefined as never))).toBe("UNIT_UNKNOWN");
  });
});

describe("asLength", () => {
  it("gives a made length back as it is", () => {
    const length = mm(40);
    expect(asLength(length)).toBe(length);
  });

  it("takes text, bare data, and what JSON and structuredClone give back", () => {
    const length = inch("1 3/16");
    const ways: LengthLike[] = [
      "1 3/16 in",
      { ticks: length.ticks, unit: "in" },
      structuredClone(length),
      JSON.parse(JSON.stringify(length)) as string,
      { ...length },
      Object.assign(Object.create(null) as Length, { ticks: length.ticks, unit: "in" as const }),
    ];
    for (const way of ways) {
      const taken = asLength(way);
      expect(taken.toString()).toBe("1.1875 in");
      expect(taken.ticks).toBe(length.ticks);
      expect(Object.isFrozen(taken)).toBe(true);
    }
  });

  it.each([
    ["LENGTH_INVALID", 40],
    ["LENGTH_INVALID", null],
    ["LENGTH_INVALID", undefined],
    ["LENGTH_INVALID", true],
    ["LENGTH_INVALID", 40n],
    ["LENGTH_INVALID", []],
    ["LENGTH_INVALID", {}],
    ["LENGTH_INVALID", { ticks: 5 }],
    ["LENGTH_INVALID", { unit: "mm" }],
    ["LENGTH_INVALID", { ticks: 1.5, unit: "mm" }],
    ["LENGTH_INVALID", { ticks: "5", unit: "mm" }],
    ["LENGTH_INVALID", { ticks: NaN, unit: "mm" }],
    ["LENGTH_INVALID", { ticks: 2 ** 53, unit: "mm" }],
    ["UNIT_UNKNOWN", { ticks: 5, unit: "m" }],
    ["UNIT_UNKNOWN", { ticks: 5, unit: "toString" }],
    ["UNIT_MISSING", "40"],
  ])("refuses with %s: %s", (code, value) => {
    expect(codeOf(() => asLength(value as never))).toBe(code);
  });

  it("takes no ticks or unit from a prototype", () => {
    expect(codeOf(() => asLength(Object.create({ ticks: 5, unit: "mm" }) as never))).toBe("LENGTH_INVALID");
  });

  it.each([
    ["no length", 40],
    ["ticks that are not whole", { ticks: 1.5, unit: "mm" }],
    ["an unknown unit", { ticks: 5, unit: "m" }],
    ["a text without a unit", "40"],
    ["a text that is too fine", "1/3 in"],
  ])("says where the value stood: %s", (_, value) => {
    expect(thrown(() => asLength(value as never, ["rows", 3, "nominal"])).path).toEqual(["rows", 3, "nominal"]);
  });
});
