import {
  asLimits,
  convertLimits,
  inch,
  isoLimits,
  lengthOfTicks,
  limits,
  limitsFromMaxMin,
  readCallout,
  symmetricLimits,
} from "limitsmith";
import type { ConvertedLimits, ConvertOptions, Limits, LimitsLike } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

const PLATE = symmetricLimits("1.850 in", "0.012 in");

function sizes({ limits: { min, max } }: ConvertedLimits): string {
  return `${min.toString()} ${max.toString()}`;
}

function expectDeepFrozen(value: unknown): void {
  if (typeof value !== "object" || value === null) return;
  expect(Object.isFrozen(value)).toBe(true);
  for (const inner of Object.values(value)) expectDeepFrozen(inner);
}

describe("convertLimits", () => {
  it("converts the limits by 25.4 and rounds each once", () => {
    // 1.838 in = 46.6852 mm, 1.862 in = 47.2948 mm; T = .024 in: hundredths of a millimetre
    const nearest = convertLimits(PLATE, "mm", { method: "A" });
    expect(sizes(nearest)).toBe("46.69 mm 47.29 mm");
    expect(nearest.places).toBe(2);
    expect(nearest.method).toBe("A");
    const inside = convertLimits(PLATE, "mm", { method: "B" });
    expect(sizes(inside)).toBe("46.69 mm 47.29 mm");
  });

  it("says exactly by how much each limit moved", () => {
    // exact 49.1236 and 49.9364: down .0036 and up .0036 with A, up .0064 and down .0064 with B
    const size = symmetricLimits("1.950 in", "0.016 in");
    const nearest = convertLimits(size, "mm", { method: "A" });
    expect([nearest.minShift.ticks, nearest.maxShift.ticks]).toEqual([-36_000, 36_000]);
    expect(nearest.lost.ticks).toBe(-72_000);
    expect(nearest.oversteps).toBe(true);
    const inside = convertLimits(size, "mm", { method: "B" });
    expect([inside.minShift.ticks, inside.maxShift.ticks]).toEqual([64_000, -64_000]);
    expect(inside.lost.ticks).toBe(128_000);
    expect(inside.oversteps).toBe(false);
  });

  it("oversteps where one limit alone lies outside, though more is lost than gained", () => {
    // 25.002 mm = .984330… in, 25.011 mm = .984685… in
    const size = limitsFromMaxMin({ max: "25.011 mm", min: "25.002 mm" });
    const four = convertLimits(size, "in", { method: "A", places: 4 });
    expect(sizes(four)).toBe("0.9843 in 0.9847 in");
    expect(four.oversteps).toBe(true);
    // 10.7 mm = .42126 in rounds outside, 11.3 mm = .444882 in inside
    const two = convertLimits(limitsFromMaxMin({ max: "11.3 mm", min: "10.7 mm" }), "in", { method: "A", places: 2 });
    expect(sizes(two)).toBe("0.42 in 0.44 in");
    expect(two.minShift.ticks).toBe(-320_000); // .42 in = 10.668 mm
    expect(two.maxShift.ticks).toBe(-1_240_000); // .44 in = 11.176 mm
    expect(two.lost.ticks).toBe(920_000);
    expect(two.oversteps).toBe(true);
  });

  it("an exact half goes to the even figure with A", () => {
    // .0025 in = 0.0635 mm, .0075 in = 0.1905 mm
    const size = limitsFromMaxMin({ max: ".0075 in", min: ".0025 in" });
    const three = convertLimits(size, "mm", { method: "A", places: 3 });
    expect(sizes(three)).toBe("0.064 mm 0.19 mm");
  });

  it("nothing moves where the new unit writes the limits exactly", () => {
    const size = limitsFromMaxMin({ max: "1.250 in", min: "1.245 in" });
    for (const method of ["A", "B"] as const) {
      const converted = convertLimits(size, "mm", { method });
      expect(sizes(converted)).toBe("31.623 mm 31.75 mm");
      expect([converted.maxShift.ticks, converted.minShift.ticks, converted.lost.ticks]).toEqual([0, 0, 0]);
      expect(converted.oversteps).toBe(false);
    }
  });

  it("keeps the decimals that are asked for", () => {
    expect(sizes(convertLimits(PLATE, "mm", { method: "A", places: 1 }))).toBe("46.7 mm 47.3 mm");
    expect(sizes(convertLimits(PLATE, "mm", { method: "B", places: 0 }))).toBe("47 mm 47 mm");
    expect(sizes(convertLimits(PLATE, "mm", { method: "B", places: 4 }))).toBe("46.6852 mm 47.2948 mm");
  });

  it("negative sizes too: inside is down for the upper limit and up for the lower one", () => {
    const size = limits({ nominal: "0 in", upper: "-.016 in", lower: "-.048 in" });
    // -.4064 mm and -1.2192 mm
    expect(sizes(convertLimits(size, "mm", { method: "B" }))).toBe("-1.21 mm -0.41 mm");
    expect(sizes(convertLimits(size, "mm", { method: "A" }))).toBe("-1.22 mm -0.41 mm");
  });

  it("the nominal goes with the limits, and the class stays", () => {
    const seat = isoLimits("35 mm", "k6");
    const converted = convertLimits(seat, "in", { method: "B", places: 4 });
    expect(converted.limits.designation).toBe("k6");
    // 35 mm = 1.37795… in
    expect(converted.limits.nominal.toString()).toBe("1.378 in");
    expect(converted.limits.basis.slice(0, seat.basis.length)).toEqual(seat.basis);
  });

  it("the basis says whose fineness it was and which method", () => {
    const steps = (options: ConvertOptions, unit: "mm" | "in", size: Limits): string[] =>
      convertLimits(size, unit, options)
        .limits.basis.slice(size.basis.length)
        .map(({ standard, mark }) => `${standard} ${mark ?? "-"}`);
    expect(steps({ method: "A" }, "mm", PLATE)).toEqual(["ISO 370:1975 memory", "ISO 370:1975 memory"]);
    expect(steps({ method: "B", places: 2 }, "mm", PLATE)).toEqual(["the caller -", "ISO 370:1975 memory"]);
    const [fineness] = convertLimits(symmetricLimits("16 mm", "0.02 mm"), "in", { method: "A" }).limits.basis.slice(1);
    // no table could be confirmed: the bound itself is the rule, and the basis must not call it a table
    expect(fineness?.how).toBe("derived");
    expect(fineness?.place).toContain("2 per cent");
    const [table] = convertLimits(PLATE, "mm", { method: "A" }).limits.basis.slice(1);
    expect(table?.how).toBe("tabulated");
  });

  it("limits that are in that system already are not rounded", () => {
    const seat = limits({ nominal: "35 mm", upper: "18 µm", lower: "2 µm" });
    for (const method of ["A", "B"] as const) {
      const same = convertLimits(seat, "mm", { method });
      expect(sizes(same)).toBe("35.002 mm 35.018 mm");
      expect(same.oversteps).toBe(false);
      expect(same.lost.ticks).toBe(0);
    }
    const thou = limits({ nominal: "500 thou", upper: "1 thou", lower: "-250 µin" });
    expect(sizes(convertLimits(thou, "in", { method: "A" }))).toBe("0.49975 in 0.501 in");
  });

  it("limits of an inch size by an ISO class, which do not end in inches", () => {
    // ISO 286-2:2010, k6 over 30 to 50: +18/+2; 1.25 in = 31.75 mm
    const seat = isoLimits("1.25 in", "k6");
    const converted = convertLimits(seat, "mm", { method: "B" });
    expect(sizes(converted)).toBe("31.752 mm 31.768 mm");
    expect(converted.lost.ticks).toBe(0);
    // IT1 over 30 to 50: 1.5 µm, narrower than .0001 in
    expect(sizes(convertLimits(isoLimits("1.25 in", "h1"), "mm", { method: "B" }))).toBe("31.7485 mm 31.75 mm");
    const between = limits({ nominal: "1.25 in", upper: "27.5 µm", lower: "26 µm" });
    // whole ten-thousandths of a millimetre: nothing is rounded, so nothing can collapse
    expect(sizes(convertLimits(between, "mm", { method: "B" }))).toBe("31.776 mm 31.7775 mm");
  });
});

describe("the dual text", () => {
  it.each<[string, LimitsLike, "mm" | "in", ConvertOptions, string]>([
    [
      "millimetres first",
      limitsFromMaxMin({ max: "25.011 mm", min: "25.002 mm" }),
      "in",
      { method: "A", places: 4 },
      "25.002/25.011 [.9843/.9847]",
    ],
    ["inches first", PLATE, "mm", { method: "B" }, "1.838/1.862 [46.69/47.29]"],
    [
      "decimals alike on both sides",
      symmetricLimits("1 in", ".005 in"),
      "mm",
      { method: "A" },
      ".995/1.005 [25.27/25.53]",
    ],
    [
      "decimal comma",
      limitsFromMaxMin({ max: "25.011 mm", min: "25.002 mm" }),
      "in",
      { method: "A", places: 4, decimalMark: "," },
      "25,002/25,011 [,9843/,9847]",
    ],
  ])("%s", (_name, size, unit, options, text) => {
    expect(convertLimits(size, unit, options).dualText).toBe(text);
  });

  it("stands in mm or in inches, as bare numbers on a drawing do", () => {
    const fine = limits({ nominal: "35000 µm", upper: "18 µm", lower: "2 µm" });
    expect(convertLimits(fine, "in", { method: "B", places: 4 }).dualText).toBe("35.002/35.018 [1.3781/1.3786]");
    const thou = limits({ nominal: "1250 thou", upper: "1 thou", lower: "0 thou" });
    expect(convertLimits(thou, "mm", { method: "B" }).dualText).toBe("1.250/1.251 [31.750/31.775]");
  });

  it.each([
    ["with decimals", PLATE],
    // 7020.9156 and 7024.0144 mm: inside, in tenths, 7021 and 7024
    ["whole millimetres in the brackets", limitsFromMaxMin({ max: "276.536 in", min: "276.414 in" })],
  ])("reads back to both pairs of limits: %s", (_name, size) => {
    const { dualText, limits: converted } = convertLimits(size, "mm", { method: "B" });
    const request = readCallout(dualText, { unit: "in" });
    if (request.kind !== "limits") throw new Error(request.kind);
    expect([request.max.length.ticks, request.min.length.ticks]).toEqual([size.max.ticks, size.min.ticks]);
    expect([request.dual?.max.length.ticks, request.dual?.min.length.ticks]).toEqual([
      converted.max.ticks,
      converted.min.ticks,
    ]);
  });
});

describe("convertLimits refuses", () => {
  it("method B that leaves no size, and says what would help", () => {
    // 0.01 mm between two whole hundredths of an inch
    const narrow = limits({ nominal: "10 mm", upper: "10 µm", lower: "0 mm" });
    const error = thrown(() => convertLimits(narrow, "in", { method: "B", places: 2 }));
    expect(error.code).toBe("ROUNDING_COLLAPSES");
    expect(error.allowed).toContain("more decimals");
    // A keeps both limits, on one size
    expect(sizes(convertLimits(narrow, "in", { method: "A", places: 2 }))).toBe("0.39 in 0.39 in");
    // one size that both limits meet is no collapse
    expect(
      sizes(convertLimits(limits({ nominal: "1 in", upper: "0 in", lower: "0 in" }), "mm", { method: "B", places: 1 })),
    ).toBe("25.4 mm 25.4 mm");
  });

  it.each<[string, string, "mm" | "in"]>([
    ["no tolerance", "0 in", "mm"],
    ["a tolerance below the table", ".000009 in", "mm"],
    ["a tolerance of 1 in and more", "1 in", "mm"],
    ["no tolerance", "0 mm", "in"],
    ["a tolerance that a millionth of an inch is too coarse for", "0.0006 mm", "in"],
  ])("%s: the rule has no fineness", (_name, upper, unit) => {
    const size = limits({ nominal: unit === "mm" ? "5 in" : "127 mm", upper, lower: unit === "mm" ? "0 in" : "0 mm" });
    const error = thrown(() => convertLimits(size, unit, { method: "A" }));
    expect(error.code).toBe("CONVERSION_NO_FINENESS");
    expect(error.allowed).not.toBeNull();
    // the caller's own decimals need no rule
    expect(convertLimits(size, unit, { method: "A", places: 3 }).places).toBe(3);
  });

  it.each<[string, unknown, unknown]>([
    ["no options", "mm", undefined],
    ["null options", "mm", null],
    ["no method", "mm", {}],
    ["another method", "mm", { method: "C" }],
    ["a small letter", "mm", { method: "a" }],
    ["another unit", "µm", { method: "A" }],
    ["a unit with no table", "thou", { method: "A" }],
    ["no unit", undefined, { method: "A" }],
    ["half a decimal", "mm", { method: "A", places: 1.5 }],
    ["fewer than no decimals", "mm", { method: "A", places: -1 }],
    ["decimals below a tick", "mm", { method: "A", places: 8 }],
    ["decimals as a text", "mm", { method: "A", places: "2" }],
    ["decimals that are no number", "mm", { method: "A", places: NaN }],
    ["another decimal mark", "mm", { method: "A", decimalMark: ";" }],
  ])("%s", (_name, unit, options) => {
    expect(codeOf(() => convertLimits(PLATE, unit as "mm", options as ConvertOptions))).toBe("OPTION_INVALID");
  });

  it("what is no limits", () => {
    for (const wrong of [null, undefined, 5, "1.25 in", {}, []]) {
      expect(codeOf(() => convertLimits(wrong as LimitsLike, "mm", { method: "A" }))).toBe("LIMITS_INVALID");
    }
    const torn = { ...limits({ nominal: "1 in", upper: "1 thou", lower: "0 in" }), max: inch(2) };
    expect(codeOf(() => convertLimits(torn, "mm", { method: "A" }))).toBe("LIMITS_CONTRADICT");
  });
});

describe("what comes out", () => {
  it("is frozen throughout", () => {
    expectDeepFrozen(convertLimits(PLATE, "mm", { method: "B" }));
  });

  it("travels: through JSON and structuredClone, in and out", () => {
    const direct = convertLimits(PLATE, "mm", { method: "B" });
    const sent = JSON.parse(JSON.stringify(direct)) as ConvertedLimits;
    expect(asLimits(sent.limits)).toEqual(direct.limits);
    expect(asLimits(structuredClone(direct).limits)).toEqual(direct.limits);
    expect(sent.dualText).toBe(direct.dualText);
    const again = JSON.parse(JSON.stringify(PLATE)) as LimitsLike;
    expect(JSON.stringify(convertLimits(again, "mm", { method: "B" }))).toBe(JSON.stringify(direct));
    expect(JSON.stringify(convertLimits(structuredClone(PLATE), "mm", { method: "B" }))).toBe(JSON.stringify(direct));
  });

  it("the unit of the nominal decides which system is the original one", () => {
    const mixed = limits({ nominal: "1.850 in", upper: lengthOfTicks(254_000, "um"), lower: "0 mm" });
    expect(convertLimits(mixed, "mm", { method: "A" }).places).toBe(3);
  });
});
