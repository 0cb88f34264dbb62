import { describe, expect, it } from "vitest";
import {
  defaultLimits,
  generalAngleLimits,
  generalFormTolerance,
  generalLimits,
  generalTolerance,
  halfPlaceLimits,
  inch,
  mm,
  readAngle,
  readCallout,
  readDimension,
  readEdge,
  titleBlock,
  titleBlockPreset,
} from "limitsmith";
import type { DefaultLimitsOptions, FormQuestion, TitleBlockSpec } from "limitsmith";
import { codeOf, thrown } from "../support/thrown.js";

const machined: TitleBlockSpec = { unit: "mm", general: "ISO 2768-mK" };
const both: TitleBlockSpec = { unit: "mm", general: "ISO 2768-m", castings: "DCTG 8" };
const keyed: TitleBlockSpec = {
  unit: "in",
  decimals: { 3: "±.007" },
  diameters: { decimals: { any: "±.005", 4: "±.0005" }, fractions: "±.010" },
  lengths: { decimals: { 2: "±.015" } },
};

function lineOf(block: TitleBlockSpec, text: string, options?: DefaultLimitsOptions): string {
  return defaultLimits(block, text, options).line;
}

describe("generalTolerance", () => {
  it.each([
    ["ISO 2768-m", "m", null, false, false],
    ["ISO 2768-mK", "m", "K", false, false],
    ["ISO 2768-mK-E", "m", "K", false, true],
    ["ISO 2768-L", null, "L", false, false],
    ["  ISO 2768 - fH ", "f", "H", false, false],
    ["ISO 2768 \u2013 cL", "c", "L", false, false],
    ["ISO2768-v", "v", null, false, false],
    ["ISO 2768 mK", "m", "K", false, false],
    ["DIN ISO 2768-mK", "m", "K", false, false],
    ["EN 22768-mK", "m", "K", false, false],
    ["ISO 2768-1-m", "m", null, false, false],
    ["ISO 2768-1:1989-m", "m", null, false, false],
    ["ISO 2768-2:1989-K", null, "K", true, false],
    ["ISO 2768-1-m; ISO 2768-2:1989-K", "m", "K", true, false],
    ["ISO 2768-2:1989-K-E and ISO 2768-1-m", "m", "K", true, true],
  ])("%s", (text, linear, geometry, geometryDated, envelope) => {
    const called = generalTolerance(text);
    expect(called).toEqual({ standard: "ISO 2768", text, linear, geometry, geometryDated, envelope });
    expect(Object.isFrozen(called)).toBe(true);
    expect(generalTolerance(called)).toEqual(called);
    expect(generalTolerance(JSON.parse(JSON.stringify(called)) as typeof called)).toEqual(called);
  });

  it.each([
    ["DCTG 8", 8, "DCTG", false],
    ["DCTG8", 8, "DCTG", false],
    ["ISO 8062-3 - DCTG 12", 12, "DCTG", false],
    ["ISO 8062-3:2007 - DCTG 1", 1, "DCTG", true],
    ["ISO 8062-3 DCTG 16", 16, "DCTG", false],
    ["CT 9", 9, "CT", false],
    ["ISO 8062:1994 - CT 9", 9, "CT", true],
  ])("%s", (text, grade, series, dated) => {
    expect(generalTolerance(text)).toEqual({ standard: "ISO 8062-3", text, grade, series, dated });
  });

  it.each([
    ["ISO 13920-BF", "B", "F", null],
    ["ISO 13920-A", "A", null, null],
    ["EN ISO 13920-CG", "C", "G", null],
    ["ISO 13920:1996 - BE", "B", "E", "1996"],
    ["ISO 13920:2023-DH", "D", "H", "2023"],
  ])("%s", (text, linear, form, edition) => {
    expect(generalTolerance(text)).toEqual({ standard: "ISO 13920", text, linear, form, edition });
  });

  it.each([
    "",
    "ISO 2768",
    "ISO 2768-",
    "ISO 2768-k",
    "ISO 2768-mk",
    "ISO 2768-M",
    "ISO 2768-Km",
    "ISO 2768-mK-F",
    "ISO 2768-m-E",
    "ISO 2768-1-K",
    "ISO 2768-2-m",
    "ISO 2768-3-m",
    "ISO 2768-m; ISO 2768-c",
    "ISO 2768-mK; ISO 2768-K",
    "ISO 2768-K; ISO 2768-mK",
    "ISO 2768-m; ISO 2768-K; ISO 2768-L",
    "ISO 2768-m; DCTG 8",
    "ISO 2768-m more",
    "DCTG 0",
    "DCTG 17",
    "DCTG 8 - RMA 6",
    "CT",
    "ISO 13920-E",
    "ISO 13920-FB",
    "ISO 13920-bf",
    "ISO 13920:2009-BF",
    "m",
    "constructor",
  ])("does not know %j", (text) => {
    const error = thrown(() => generalTolerance(text));
    expect(error.code).toBe("GENERAL_TOLERANCE_UNKNOWN");
    expect(error.allowed).toContain("ISO 2768-mK");
  });

  it.each([null, undefined, 2768, {}, [], { text: 5 }])("does not know %j", (wrong) => {
    expect(codeOf(() => generalTolerance(wrong as unknown as string))).toBe("GENERAL_TOLERANCE_UNKNOWN");
  });

  it.each(["ISO 22081", "ISO 22081:2021", "ISO 8062-3:2023 - DCTG 8", "DIN 7168-m"])("has no table for %s", (text) => {
    expect(codeOf(() => generalTolerance(text))).toBe("GENERAL_TOLERANCE_NO_TABLE");
  });

  it("refuses what is too long", () => {
    expect(codeOf(() => generalTolerance(`ISO 2768-m${" ".repeat(80)}`))).toBe("TEXT_TOO_LONG");
  });
});

describe("titleBlock by standard", () => {
  const whole: TitleBlockSpec = {
    ...keyed,
    general: "ISO 2768-1-m; ISO 2768-2:1989-K",
    castings: "ISO 8062-3 - DCTG 8",
    weldments: "ISO 13920-BF",
    finish: "125 all over",
    edges: { external: "-.01", internal: "+.01/+.005" },
    projection: "third angle",
    preset: "common inch",
    angles: "±1°",
  };

  it("takes its own result back, also through JSON and structuredClone", () => {
    const block = titleBlock(whole);
    expect(titleBlock(block)).toEqual(block);
    expect(titleBlock(structuredClone(block))).toEqual(block);
    expect(titleBlock(JSON.parse(JSON.stringify(block)) as TitleBlockSpec)).toEqual(block);
    for (const part of [block.diameters, block.diameters?.decimals, block.general, block.edges]) {
      expect(part).toBeTypeOf("object");
      expect(Object.isFrozen(part)).toBe(true);
    }
  });

  it("reads each part", () => {
    const block = titleBlock(whole);
    expect(block.diameters?.decimals["any"]?.toString()).toBe("0.005 in");
    expect(block.lengths?.fractions).toBeNull();
    expect(block.general?.geometryDated).toBe(true);
    expect(block.castings?.grade).toBe(8);
    expect(block.weldments?.form).toBe("F");
    expect(block).toMatchObject({ finish: "125 all over", projection: "third angle", preset: "common inch" });
    const { edges } = block;
    if (edges === null || typeof edges === "string") throw new Error("edges by value are expected");
    expect(`${edges.external?.upper?.toString() ?? ""} ${edges.external?.lower?.toString() ?? ""}`).toBe(
      "0 in -0.01 in",
    );
    expect(edges.internal?.state).toBe("passing");
    expect(titleBlock({ unit: "mm", edges: "break all edges" }).edges).toBe("break all edges");
  });

  it("an empty block has nothing", () => {
    const { unit, decimalMark, decimals, ...rest } = titleBlock({ unit: "mm" });
    expect({ unit, decimalMark, decimals }).toEqual({ unit: "mm", decimalMark: ".", decimals: {} });
    expect(new Set(Object.values(rest))).toEqual(new Set([null]));
  });

  it.each<[Record<string, unknown>, string, (string | number)[]]>([
    [{ unit: "in", diameters: "half" }, "TITLE_BLOCK_INVALID", ["diameters"]],
    [{ unit: "in", lengths: { decimals: { many: ".1" } } }, "TITLE_BLOCK_INVALID", ["lengths", "decimals", "many"]],
    [{ unit: "in", diameters: { fractions: "-1/64" } }, "TITLE_BLOCK_INVALID", ["diameters", "fractions"]],
    [{ unit: "mm", diameters: { fractions: "1/64" } }, "TITLE_BLOCK_INVALID", ["diameters", "fractions"]],
    [{ unit: "mm", general: "ISO 13920-B" }, "TITLE_BLOCK_INVALID", ["general"]],
    [{ unit: "mm", castings: "ISO 2768-m" }, "TITLE_BLOCK_INVALID", ["castings"]],
    [{ unit: "mm", weldments: "DCTG 8" }, "TITLE_BLOCK_INVALID", ["weldments"]],
    [{ unit: "mm", general: "ISO 2768" }, "GENERAL_TOLERANCE_UNKNOWN", ["general"]],
    [{ unit: "mm", general: 2768 }, "GENERAL_TOLERANCE_UNKNOWN", ["general"]],
    [{ unit: "mm", general: "ISO 22081" }, "GENERAL_TOLERANCE_NO_TABLE", ["general"]],
    [{ unit: "mm", finish: "" }, "TITLE_BLOCK_INVALID", ["finish"]],
    [{ unit: "mm", finish: 3.2 }, "TITLE_BLOCK_INVALID", ["finish"]],
    [{ unit: "mm", finish: "a\u0000b" }, "TITLE_BLOCK_INVALID", ["finish"]],
    [{ unit: "mm", finish: "x".repeat(501) }, "TITLE_BLOCK_INVALID", ["finish"]],
    [{ unit: "mm", edges: " " }, "TITLE_BLOCK_INVALID", ["edges"]],
    [{ unit: "mm", edges: {} }, "TITLE_BLOCK_INVALID", ["edges"]],
    [{ unit: "mm", edges: { external: "0.3" } }, "TITLE_BLOCK_EDGE_INVALID", ["edges", "external"]],
    [{ unit: "mm", projection: "second angle" }, "TITLE_BLOCK_INVALID", ["projection"]],
    [{ unit: "mm", preset: "common" }, "TITLE_BLOCK_INVALID", ["preset"]],
    [{ unit: "mm", preset: "toString" }, "TITLE_BLOCK_INVALID", ["preset"]],
  ])("refuses %j", (spec, code, path) => {
    const error = thrown(() => titleBlock(spec as unknown as TitleBlockSpec));
    expect(error.code).toBe(code);
    expect(error.path).toEqual(path);
  });
});

describe("defaultLimits by lines for diameters and lengths", () => {
  it.each([
    ["⌀2.50", "diameters, any decimals: ±0.005 in"],
    ["2.50 DIA", "diameters, any decimals: ±0.005 in"],
    ["S⌀2.50", "diameters, any decimals: ±0.005 in"],
    ["⌀2.5000", "diameters, 4 decimals: ±0.0005 in"],
    ["⌀2 1/2", "diameters, fractions: ±0.01 in"],
    ["2.50", "lengths, 2 decimals: ±0.015 in"],
    ["R2.50", "lengths, 2 decimals: ±0.015 in"],
    // no line for three decimals of lengths: the line for all sizes
    ["2.500", "3 decimals: ±0.007 in"],
    // the line for diameters goes before the one for all sizes
    ["⌀2.500", "diameters, any decimals: ±0.005 in"],
  ])("%s", (text, line) => {
    expect(lineOf(keyed, text)).toBe(line);
  });

  it("asks where the size does not say what it is", () => {
    const written = readDimension("2.50", { unit: "in" });
    expect(codeOf(() => defaultLimits(keyed, written))).toBe("TITLE_BLOCK_OPTION_NEEDED");
    expect(defaultLimits(keyed, written, { feature: "diameter" }).line).toBe("diameters, any decimals: ±0.005 in");
    expect(defaultLimits(keyed, written, { feature: "length" }).line).toBe("lengths, 2 decimals: ±0.015 in");
    expect(lineOf(keyed, "2.50", { feature: "diameter" })).toBe("diameters, any decimals: ±0.005 in");
  });

  it("takes a request of a callout with its mark", () => {
    const diameter = readCallout("⌀2.50", { unit: "in" });
    expect(defaultLimits(keyed, diameter).line).toBe("diameters, any decimals: ±0.005 in");
    const length = readCallout("2.50", { unit: "in" });
    expect(defaultLimits(keyed, JSON.parse(JSON.stringify(length)) as typeof length).line).toBe(
      "lengths, 2 decimals: ±0.015 in",
    );
  });

  it("says what the block has", () => {
    const error = thrown(() => defaultLimits({ ...keyed, weldments: "ISO 13920-B" }, "3/4", { process: "machined" }));
    expect(error.code).toBe("TITLE_BLOCK_NO_LINE");
    expect(error.message).toContain("fractions");
    expect(error.allowed).toBe(
      "the block has: 3 decimals, diameters, 4 decimals, diameters, any decimals, diameters, fractions, " +
        "lengths, 2 decimals, ISO 13920-B",
    );
  });

  it.each<[string, DefaultLimitsOptions["feature"]]>([
    ["⌀2.50", "length"],
    ["⌀2.50", "internal radius"],
    ["⌀2.50", "wall thickness"],
    ["R2.50", "diameter"],
    ["R2.50", "length"],
  ])("refuses %s as a %s", (text, feature) => {
    const error = thrown(() => defaultLimits(keyed, text, { feature: feature ?? "size" }));
    expect(error.code).toBe("OPTION_INVALID");
    expect(error.path).toEqual(["feature"]);
  });
});

describe("defaultLimits by ISO 2768-1", () => {
  // ISO 2768-1:1989, Tables 1 to 3, as in tests/published
  it.each<[string, DefaultLimitsOptions | undefined, string]>([
    ["25", undefined, "±0.2 mm"],
    ["25.000", undefined, "±0.2 mm"],
    ["⌀25", undefined, "±0.2 mm"],
    ["30", undefined, "±0.2 mm"],
    ["30.1", undefined, "±0.3 mm"],
    ["R5", { feature: "internal radius" }, "±0.1 mm"],
    ["R5", { feature: "external radius or chamfer" }, "±0.5 mm"],
    ["45°", { shorterLeg: mm(10) }, "±1°0'"],
    ["45°", { shorterLeg: "10.1 mm" }, "±0°30'"],
  ])("%s %j", (text, options, deviation) => {
    const found = defaultLimits(machined, text, options);
    expect(found.line).toBe(`ISO 2768-mK: ${deviation}`);
    expect(found.limits.basis[0]).toEqual({
      standard: "title block of the drawing",
      place: "general",
      says: "ISO 2768-mK",
      how: "caller",
    });
    expect(found.limits.basis[1]).toMatchObject({ standard: "ISO 2768-1:1989", how: "tabulated", mark: "two-sources" });
    expect(found.cautions.map(({ code }) => code)).toEqual(["GENERAL_NOT_A_REJECT"]);
  });

  it("an inch size goes by its exact millimetres", () => {
    const block: TitleBlockSpec = { unit: "in", general: "ISO 2768-m" };
    // 1.1811 in is 29.99994 mm, 1.1812 in is 30.00248 mm
    expect(lineOf(block, "1.1811")).toBe("ISO 2768-m: ±0.2 mm");
    expect(lineOf(block, "1.1812")).toBe("ISO 2768-m: ±0.3 mm");
    expect(defaultLimits(block, readDimension("2", { unit: "in" })).limits.max.unit).toBe("in");
    expect(lineOf(block, "3/4")).toBe("ISO 2768-m: ±0.2 mm");
  });

  it("a size in the other unit falls to the standard, never to a line", () => {
    const block: TitleBlockSpec = { unit: "in", decimals: { 0: "±.5" }, general: "ISO 2768-m" };
    expect(lineOf(block, "25 mm")).toBe("ISO 2768-m: ±0.2 mm");
    expect(codeOf(() => defaultLimits({ unit: "in", decimals: { 0: "±.5" } }, "25 mm"))).toBe(
      "TITLE_BLOCK_NOT_APPLICABLE",
    );
  });

  it("a line of the block goes before the standard", () => {
    const block: TitleBlockSpec = { ...machined, decimals: { 2: "±0.05" }, angles: "±0.5°" };
    expect(lineOf(block, "25.00")).toBe("2 decimals: ±0.05 mm");
    expect(lineOf(block, "25.0")).toBe("ISO 2768-mK: ±0.2 mm");
    expect(lineOf(block, "45°", { shorterLeg: mm(5) })).toBe("angles: ±0.5°");
    expect(lineOf({ ...machined, decimals: { any: "±0.05" } }, "25.0")).toBe("any decimals: ±0.05 mm");
  });

  it("-E is said", () => {
    const found = defaultLimits({ unit: "mm", general: "ISO 2768-mK-E" }, "25");
    expect(found.cautions.map(({ code }) => code)).toEqual(["GENERAL_NOT_A_REJECT", "GENERAL_ENVELOPE_REQUIRED"]);
  });

  it.each<[TitleBlockSpec, string, DefaultLimitsOptions | undefined, string]>([
    [machined, "R5", undefined, "TITLE_BLOCK_OPTION_NEEDED"],
    [machined, "R5", { feature: "size" }, "TITLE_BLOCK_OPTION_NEEDED"],
    [machined, "45°", undefined, "TITLE_BLOCK_OPTION_NEEDED"],
    [machined, "0.4", undefined, "GENERAL_TOLERANCE_OUT_OF_RANGE"],
    [machined, "0", undefined, "GENERAL_TOLERANCE_OUT_OF_RANGE"],
    [machined, "-25", undefined, "GENERAL_TOLERANCE_OUT_OF_RANGE"],
    [machined, "4000.1", undefined, "GENERAL_TOLERANCE_OUT_OF_RANGE"],
    [machined, "45°", { shorterLeg: mm(0) }, "GENERAL_TOLERANCE_OUT_OF_RANGE"],
    [{ unit: "mm", general: "ISO 2768-v" }, "3", undefined, "GENERAL_TOLERANCE_NOT_DEFINED"],
    [{ unit: "mm", general: "ISO 2768-f" }, "2000.1", undefined, "GENERAL_TOLERANCE_NOT_DEFINED"],
    [{ unit: "mm", general: "ISO 2768-K" }, "25", undefined, "TITLE_BLOCK_NO_LINE"],
    [{ unit: "mm", general: "ISO 2768-K" }, "45°", { shorterLeg: mm(5) }, "TITLE_BLOCK_NO_LINE"],
    [machined, "25", { process: "cast" }, "TITLE_BLOCK_NO_LINE"],
    [machined, "25", { process: "cast to machined" }, "TITLE_BLOCK_NO_LINE"],
    [machined, "25", { process: "forged" as "cast" }, "OPTION_INVALID"],
    [machined, "25", { feature: "hole" as "size" }, "OPTION_INVALID"],
    [machined, "45°", { shorterLeg: 5 as unknown as string }, "LENGTH_INVALID"],
  ])("refuses %j %s %j", (block, text, options, code) => {
    expect(codeOf(() => defaultLimits(block, text, options))).toBe(code);
  });

  it("says what the table has", () => {
    const v = thrown(() => generalLimits(mm("2.5"), "ISO 2768-v"));
    expect(v.allowed).toBe("class v: over 3 up to 4000 mm");
    expect(v.value).toBe("2.5 mm, 0.5 up to 3 mm");
    expect(thrown(() => generalLimits(mm(3000), "ISO 2768-f")).allowed).toBe("class f: 0.5 up to 2000 mm");
    expect(thrown(() => generalLimits(mm("0.4"), "ISO 2768-m")).allowed).toBe(
      "0.5 up to 4000 mm; else a tolerance at the dimension",
    );
    const chamfer = { feature: "external radius or chamfer" } as const;
    expect(thrown(() => generalLimits(mm("0.4"), "ISO 2768-m", chamfer)).allowed).toContain("0.5 mm");
    expect(thrown(() => generalAngleLimits("45°", mm(0), "ISO 2768-m")).allowed).toContain("shorter leg over 0 mm");
  });

  it("an indication without a small letter has no sizes and no angles", () => {
    expect(codeOf(() => generalLimits(mm(25), "ISO 2768-K"))).toBe("GENERAL_TOLERANCE_NOT_CALLED");
    expect(codeOf(() => generalAngleLimits("45°", mm(25), "ISO 2768-K"))).toBe("GENERAL_TOLERANCE_NOT_CALLED");
  });
});

describe("defaultLimits for castings and welded constructions", () => {
  it("asks for the process where more than one could apply", () => {
    const error = thrown(() => defaultLimits(both, "130"));
    expect(error.code).toBe("TITLE_BLOCK_OPTION_NEEDED");
    expect(error.allowed).toBe("the option process: machined, cast; the block has: ISO 2768-m, DCTG 8");
    expect(lineOf(both, "130", { process: "machined" })).toBe("ISO 2768-m: ±0.5 mm");
    // DCTG 8 at 130 mm: 1.8 mm in all
    expect(lineOf(both, "130", { process: "cast" })).toBe("DCTG 8: ±0.9 mm");
  });

  it("lines of the block are for machined sizes", () => {
    const block: TitleBlockSpec = { unit: "mm", decimals: { 0: "±0.1" }, weldments: "ISO 13920-B" };
    expect(codeOf(() => defaultLimits(block, "130"))).toBe("TITLE_BLOCK_OPTION_NEEDED");
    expect(lineOf(block, "130", { process: "machined" })).toBe("0 decimals: ±0.1 mm");
    expect(lineOf(block, "130", { process: "welded" })).toBe("ISO 13920-B: ±2 mm");
  });

  it("the only standard of a block applies without asking", () => {
    expect(lineOf({ unit: "mm", castings: "DCTG 8" }, "130")).toBe("DCTG 8: ±0.9 mm");
    expect(lineOf({ unit: "mm", weldments: "ISO 13920-B" }, "130")).toBe("ISO 13920-B: ±2 mm");
    // ISO 2768-K has no sizes, so only the castings can be meant
    expect(lineOf({ unit: "mm", general: "ISO 2768-K", castings: "DCTG 8" }, "130")).toBe("DCTG 8: ±0.9 mm");
    // castings have no angles, so only the machined ones can be meant
    expect(lineOf(both, "45°", { shorterLeg: mm(50) })).toBe("ISO 2768-m: ±0°30'");
    expect(codeOf(() => defaultLimits(both, "45°", { process: "cast", shorterLeg: mm(50) }))).toBe(
      "TITLE_BLOCK_NO_LINE",
    );
    expect(codeOf(() => defaultLimits({ unit: "mm", castings: "DCTG 8" }, "45°"))).toBe("TITLE_BLOCK_NO_LINE");
  });

  it("between raw and machined the larger one applies, from memory", () => {
    const found = defaultLimits(both, "130", { process: "cast to machined" });
    expect(found.line).toBe("DCTG 8: ±0.9 mm");
    expect(found.limits.basis.at(-1)).toMatchObject({
      says: "the larger of DCTG 8: ±0.9 mm and ISO 2768-m: ±0.5 mm",
      how: "derived",
      mark: "memory",
    });
    expect(found.cautions.map(({ code }) => code)).toEqual(["GENERAL_EDITION_NOT_READ", "GENERAL_VALUE_FROM_MEMORY"]);
    const fine: TitleBlockSpec = { unit: "mm", general: "ISO 2768-v", castings: "DCTG 2" };
    expect(lineOf(fine, "130", { process: "cast to machined" })).toBe("ISO 2768-v: ±2.5 mm");
    const welded: TitleBlockSpec = { unit: "mm", general: "ISO 2768-m", weldments: "ISO 13920-B" };
    const angle = defaultLimits(welded, "45°", { process: "welded to machined", shorterLeg: mm(50) });
    // ISO 13920-B to 400 mm: 45 minutes; ISO 2768-m over 10 to 50 mm: 30 minutes
    expect(angle.line).toBe("ISO 13920-B: ±0°45'");
    expect(angle.limits.basis.at(-1)).toMatchObject({ mark: "memory" });
    expect(lineOf({ ...welded, angles: "±1°" }, "45°", { process: "welded to machined", shorterLeg: mm(50) })).toBe(
      "angles: ±1°",
    );
  });

  it("walls of castings take one grade coarser", () => {
    const wall = generalLimits(mm(8), "DCTG 6", { feature: "wall thickness" });
    // DCTG 7 up to 10 mm: 0.74 mm in all
    expect(wall.limits.tolerance.toString()).toBe("0.74 mm");
    expect(wall.limits.basis[1]).toMatchObject({ place: "wall thickness", mark: "memory" });
    expect(wall.cautions.map(({ code }) => code)).toContain("GENERAL_VALUE_FROM_MEMORY");
    expect(codeOf(() => generalLimits(mm(50), "DCTG 16"))).toBe("GENERAL_TOLERANCE_NOT_DEFINED");
  });

  it("an edition that was read needs no caution, a remembered value does", () => {
    const codes = (size: number, standard: string): string[] =>
      generalLimits(mm(size), standard).cautions.map(({ code }) => code);
    expect(codes(50, "ISO 8062-3:2007 - DCTG 8")).toEqual([]);
    expect(codes(50, "DCTG 8")).toEqual(["GENERAL_EDITION_NOT_READ"]);
    expect(codes(1500, "ISO 8062-3:2007 - DCTG 8")).toEqual(["GENERAL_VALUE_FROM_MEMORY"]);
    expect(codes(1500, "ISO 8062-3:2007 - DCTG 9")).toEqual([]);
  });

  it("at exactly 2 mm the edition of ISO 13920 decides", () => {
    expect(codeOf(() => generalLimits(mm(2), "ISO 13920-B"))).toBe("GENERAL_TOLERANCE_OUT_OF_RANGE");
    expect(codeOf(() => generalLimits(mm(2), "ISO 13920:2023-B"))).toBe("GENERAL_TOLERANCE_OUT_OF_RANGE");
    const old = generalLimits(mm(2), "ISO 13920:1996-B");
    expect(old.limits.max.toString()).toBe("3 mm");
    expect(old.limits.basis.at(-1)).toMatchObject({ standard: "ISO 13920:1996", mark: "memory" });
    expect(old.cautions.map(({ code }) => code)).toEqual(["GENERAL_VALUE_FROM_MEMORY"]);
    expect(codeOf(() => generalLimits(mm("1.9999"), "ISO 13920:1996-B"))).toBe("GENERAL_TOLERANCE_OUT_OF_RANGE");
    expect(generalLimits(mm(3), "ISO 13920:1996-B").limits.basis[1]?.standard).toBe("ISO 13920:1996");
    expect(generalAngleLimits("45°", mm(3), "ISO 13920:1996-B").limits.basis[1]?.standard).toBe("ISO 13920:1996");
  });
});

describe("what takes no default", () => {
  it.each([
    ["(25)", "reference"],
    ["25 REF", "reference"],
    ["[25]", "basic"],
    ["25 BSC", "basic"],
    ["R2 MAX", "single limit"],
    [".015 MIN.", "single limit"],
    ["25 STOCK", "stock"],
    ["M8", "thread"],
    ["M8x1.25-6g", "thread"],
    ["1/4-20 UNC", "thread"],
    ["25 ±0.1", "tolerance of its own"],
    ["25 +0.1/-0.2", "tolerance of its own"],
    ["25 +/-0.1", "tolerance of its own"],
    ["⌀25 H7", "tolerance of its own"],
    ["⌀25H7/g6", "tolerance of its own"],
    ["45° ±1°", "tolerance of its own"],
  ])("%s", (text, why) => {
    const error = thrown(() => defaultLimits(machined, text));
    expect(error.code).toBe("TITLE_BLOCK_NOT_APPLICABLE");
    expect(error.message).toContain(why);
  });

  it.each([
    ["(25)", "reference"],
    ["25 BASIC", "basic"],
    ["25 MAX", "single limit"],
    ["M8x1.25", "thread"],
    ["25 H7", "tolerance of its own"],
    ["25 ±0.1", "tolerance of its own"],
    ["45° ±1°", "tolerance of its own"],
    ["2 X 45°", "a length and an angle"],
  ])("the request of %s", (text, why) => {
    const error = thrown(() => defaultLimits(machined, readCallout(text, { unit: "mm" })));
    expect(error.code).toBe("TITLE_BLOCK_NOT_APPLICABLE");
    expect(error.message).toContain(why);
  });

  it.each([{ kind: "plain" }, { kind: "angle" }, { kind: 5 }, { kind: "plain", nominal: "25" }])(
    "the half request %j",
    (request) => {
      expect(codeOf(() => defaultLimits(machined, request as { readonly kind: string }))).toBe(
        "TITLE_BLOCK_NOT_APPLICABLE",
      );
    },
  );

  it("a request that stands alone takes one", () => {
    expect(defaultLimits(machined, readCallout("⌀25", { unit: "mm" })).line).toBe("ISO 2768-mK: ±0.2 mm");
    const angle = readCallout("45°", { unit: "mm" });
    expect(defaultLimits(machined, angle, { shorterLeg: mm(5) }).line).toBe("ISO 2768-mK: ±1°0'");
    expect(codeOf(() => defaultLimits(machined, readCallout("R5", { unit: "mm" })))).toBe("TITLE_BLOCK_OPTION_NEEDED");
    expect(defaultLimits(machined, readAngle("45°"), { shorterLeg: mm(5) }).limits.max.toString()).toBe("46°");
  });
});

describe("generalFormTolerance", () => {
  it.each<[string, FormQuestion, string, string | null]>([
    // ISO 2768-2:1989, Tables 1 to 4, as in tests/published
    ["ISO 2768-K", { characteristic: "straightness", length: mm(10) }, "0.05 mm", null],
    ["ISO 2768-mK", { characteristic: "flatness", length: mm(101) }, "0.4 mm", null],
    ["ISO 2768-H", { characteristic: "perpendicularity", shorterSide: mm(100) }, "0.2 mm", "the longer side"],
    ["ISO 2768-L", { characteristic: "symmetry", length: mm(101) }, "1 mm", "the longer feature"],
    ["ISO 2768-L", { characteristic: "circular run-out" }, "0.5 mm", "the bearing surfaces"],
    // the smaller of size tolerance and run-out
    ["ISO 2768-K", { characteristic: "roundness", sizeTolerance: mm("0.021") }, "0.021 mm", null],
    ["ISO 2768-K", { characteristic: "roundness", sizeTolerance: mm("0.2") }, "0.2 mm", null],
    ["ISO 2768-fL", { characteristic: "roundness", diameter: mm(5) }, "0.1 mm", null],
    // the larger of size tolerance and straightness or flatness
    ["ISO 2768-K", { characteristic: "parallelism", length: mm(50), sizeTolerance: mm("0.1") }, "0.2 mm", "the longer"],
    ["ISO 2768-K", { characteristic: "parallelism", length: mm(50), sizeTolerance: mm("0.3") }, "0.3 mm", "the longer"],
    ["ISO 2768-mK", { characteristic: "parallelism", length: mm(50), distance: mm(20) }, "0.4 mm", "the longer"],
    ["ISO 13920-BF", { characteristic: "parallelism", length: mm(100) }, "1 mm", null],
  ])("%s %j", (standard, question, tolerance, datum) => {
    const found = generalFormTolerance(standard, question);
    expect(found.tolerance.toString()).toBe(tolerance);
    expect(found.characteristic).toBe(question.characteristic);
    if (datum === null) expect(found.datum).toBeNull();
    else expect(found.datum).toContain(datum);
    expect(Object.isFrozen(found.basis)).toBe(true);
  });

  it("says that part 2 was withdrawn, and whether the drawing calls it by date", () => {
    const question: FormQuestion = { characteristic: "circular run-out" };
    const undated = generalFormTolerance("ISO 2768-mK", question).cautions[0];
    const dated = generalFormTolerance("ISO 2768-2:1989-K", question).cautions[0];
    expect([undated?.code, dated?.code]).toEqual(["GENERAL_PART_2_WITHDRAWN", "GENERAL_PART_2_WITHDRAWN"]);
    expect(undated?.says).toContain("this one does not");
    expect(dated?.says).toContain("by its date");
  });

  it("marks what is remembered", () => {
    const codes = (standard: string): string[] =>
      generalFormTolerance(standard, { characteristic: "flatness", length: mm(200) }).cautions.map(({ code }) => code);
    expect(codes("ISO 13920-BF")).toEqual([]);
    expect(codes("ISO 13920-BG")).toEqual(["GENERAL_VALUE_FROM_MEMORY"]);
  });

  it.each<[string, unknown, string]>([
    ["ISO 2768-mK", { characteristic: "cylindricity" }, "GENERAL_TOLERANCE_NOT_DEFINED"],
    ["ISO 2768-mK", { characteristic: "coaxiality" }, "GENERAL_TOLERANCE_NOT_DEFINED"],
    ["ISO 13920-BF", { characteristic: "perpendicularity", shorterSide: mm(50) }, "GENERAL_TOLERANCE_NOT_DEFINED"],
    ["ISO 13920-BF", { characteristic: "cylindricity" }, "GENERAL_TOLERANCE_NOT_DEFINED"],
    ["ISO 2768-m", { characteristic: "flatness", length: mm(50) }, "GENERAL_TOLERANCE_NOT_CALLED"],
    ["ISO 13920-B", { characteristic: "flatness", length: mm(50) }, "GENERAL_TOLERANCE_NOT_CALLED"],
    ["DCTG 8", { characteristic: "flatness", length: mm(50) }, "GENERAL_TOLERANCE_NOT_CALLED"],
    ["ISO 2768-K", { characteristic: "roundness", diameter: mm(50) }, "GENERAL_TOLERANCE_NOT_CALLED"],
    ["ISO 2768-mK", { characteristic: "roundness" }, "OPTION_INVALID"],
    ["ISO 2768-mK", { characteristic: "roundness", diameter: mm(5), sizeTolerance: mm(1) }, "OPTION_INVALID"],
    ["ISO 2768-mK", { characteristic: "roundness", sizeTolerance: mm(0) }, "OPTION_INVALID"],
    ["ISO 2768-mK", { characteristic: "parallelism", distance: mm(5) }, "OPTION_INVALID"],
    ["ISO 2768-mK", { characteristic: "flatness" }, "OPTION_INVALID"],
    ["ISO 2768-mK", { characteristic: "perpendicularity", length: mm(5) }, "OPTION_INVALID"],
    ["ISO 2768-mK", { characteristic: "profile" }, "OPTION_INVALID"],
    ["ISO 2768-mK", {}, "OPTION_INVALID"],
    ["ISO 2768-mK", null, "OPTION_INVALID"],
    ["ISO 2768-mK", { characteristic: "flatness", length: 50 }, "LENGTH_INVALID"],
    ["ISO 2768-mK", { characteristic: "roundness", diameter: mm("0.4") }, "GENERAL_TOLERANCE_OUT_OF_RANGE"],
    ["ISO 2768-mK", { characteristic: "flatness", length: mm("3000.1") }, "GENERAL_TOLERANCE_OUT_OF_RANGE"],
    ["ISO 13920-BF", { characteristic: "flatness", length: mm(30) }, "GENERAL_TOLERANCE_OUT_OF_RANGE"],
  ])("%s refuses %j", (standard, question, code) => {
    expect(codeOf(() => generalFormTolerance(standard, question as FormQuestion))).toBe(code);
  });
});

describe("common practice", () => {
  it("is marked line by line: a line of one's own is not", () => {
    const block = { ...titleBlockPreset("common inch"), decimals: { 2: "±.01", 3: "±.002" }, angles: "±1°" };
    const common = defaultLimits(block, "2.50");
    expect(common.limits.basis[0]).toMatchObject({ standard: 'preset "common inch"', how: "common practice" });
    expect(common.cautions.map(({ code }) => code)).toEqual(["TITLE_BLOCK_COMMON_PRACTICE"]);
    for (const text of ["2.500", "45°"]) {
      const own = defaultLimits(block, text);
      expect(own.limits.basis[0]).toMatchObject({ standard: "title block of the drawing", how: "caller" });
      expect(own.cautions).toEqual([]);
    }
  });

  it("says where it is remembered only", () => {
    const found = defaultLimits(titleBlockPreset("common inch"), "2.5000");
    expect(found.limits.basis[0]).toMatchObject({ how: "common practice", mark: "memory" });
    expect(found.cautions.map(({ code }) => code)).toEqual([
      "TITLE_BLOCK_COMMON_PRACTICE",
      "GENERAL_VALUE_FROM_MEMORY",
    ]);
  });

  it("the same values without the preset are the drawing's own", () => {
    const { limits } = defaultLimits({ unit: "in", decimals: { 3: "±.005" } }, "2.500");
    expect(limits.basis[0]).toMatchObject({ how: "caller" });
  });

  it("refuses a preset that is not there", () => {
    for (const wrong of ["common", "toString", "", null, 5]) {
      expect(codeOf(() => titleBlockPreset(wrong as "common inch"))).toBe("OPTION_INVALID");
    }
  });

  it("half of the last place", () => {
    expect(halfPlaceLimits("12,5", { unit: "mm", decimalMark: "," }).limits.max.toString()).toBe("12.55 mm");
    expect(halfPlaceLimits("12", { unit: "mm" }).line).toBe("half of the last place: ±0.5 mm");
    expect(halfPlaceLimits("1 3/4 in").line).toBe("half of the fraction's division: ±0.125 in");
    expect(codeOf(() => halfPlaceLimits("1.2"))).toBe("UNIT_MISSING");
    expect(codeOf(() => halfPlaceLimits("1/128", { unit: "in" }))).toBe("LENGTH_TOO_FINE");
  });
});

describe("readEdge", () => {
  it.each([
    // ISO 13715: plus is material that may stand proud, minus is material that must be missing
    ["+0.3", "burr", "passing", "0.3 mm", "0 mm", true],
    ["-0.3", "undercut", "undercut", "0 mm", "-0.3 mm", true],
    ["\u22120.3", "undercut", "undercut", "0 mm", "-0.3 mm", true],
    ["±0.05", "sharp", "sharp", "0.05 mm", "-0.05 mm", true],
    ["+/-0.05", "sharp", "sharp", "0.05 mm", "-0.05 mm", true],
    ["+0.05", "sharp", "sharp", "0.05 mm", "0 mm", true],
    ["+0.051", "burr", "passing", "0.051 mm", "0 mm", false],
    ["-0.051", "undercut", "undercut", "0 mm", "-0.051 mm", false],
    ["±0.3", "burr or undercut", "passing or undercut", "0.3 mm", "-0.3 mm", true],
    // an undercut between 0.13 and 0.5 mm and no burr: a published explanation
    ["-0.13/-0.5", "undercut", "undercut", "-0.13 mm", "-0.5 mm", false],
    ["+0.3/0", "burr", "passing", "0.3 mm", "0 mm", true],
    ["+", "burr", "passing", "", "0 mm", true],
    ["-", "undercut", "undercut", "0 mm", "", true],
    ["-.01 in", "undercut", "undercut", "0 mm", "-0.01 in", false],
  ])("%s", (text, external, internal, upper, lower, recommended) => {
    const edge = readEdge(text, { side: "external" });
    expect(edge).toMatchObject({ side: "external", text, state: external, recommended });
    expect([edge.upper?.toString() ?? "", edge.lower?.toString() ?? ""]).toEqual([upper, lower]);
    expect(readEdge(text, { side: "internal" }).state).toBe(internal);
  });

  it("reads in the unit and with the mark of the drawing", () => {
    expect(readEdge("-.015", { side: "external", unit: "in" }).lower?.ticks).toBe(inch("-.015").ticks);
    expect(readEdge("-0,3", { side: "external", decimalMark: "," }).lower?.toString()).toBe("-0.3 mm");
  });

  it.each([
    ["0.3", "TITLE_BLOCK_EDGE_INVALID"],
    ["", "TITLE_BLOCK_EDGE_INVALID"],
    ["±", "TITLE_BLOCK_EDGE_INVALID"],
    ["0", "TITLE_BLOCK_EDGE_INVALID"],
    ["+0", "TITLE_BLOCK_EDGE_INVALID"],
    ["±0", "TITLE_BLOCK_EDGE_INVALID"],
    ["+-0.3", "TITLE_BLOCK_EDGE_INVALID"],
    ["-0.1/-0.3/-0.5", "TITLE_BLOCK_EDGE_INVALID"],
    ["-0.1/0.5", "TITLE_BLOCK_EDGE_INVALID"],
    ["-0.5/-0.1", "LIMITS_UPSIDE_DOWN"],
    ["-0.5/-0.5", "LIMITS_UPSIDE_DOWN"],
    ["-0,5", "DECIMAL_MARK_MIXED"],
    [`-0.${"1".repeat(50)}`, "TITLE_BLOCK_EDGE_INVALID"],
    ["-0.5 mil", "UNIT_AMBIGUOUS"],
  ])("refuses %s", (text, code) => {
    expect(codeOf(() => readEdge(text, { side: "external" }))).toBe(code);
  });

  it("refuses an edge without a side", () => {
    for (const wrong of [undefined, null, {}, { side: "outer" }]) {
      expect(codeOf(() => readEdge("-0.3", wrong as { readonly side: "external" }))).toBe("OPTION_INVALID");
    }
    expect(codeOf(() => readEdge(5 as unknown as string, { side: "external" }))).toBe("TITLE_BLOCK_EDGE_INVALID");
  });
});
