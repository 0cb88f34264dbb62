import { describe, expect, it } from "vitest";
import { defaultLimits, readAngle, readDimension, titleBlock } from "limitsmith";
import type { TitleBlockSpec } from "limitsmith";
import { codeOf, thrown } from "../support/thrown.js";

// ± values that many shops print; common practice, no standard
const inchBlock: TitleBlockSpec = {
  unit: "in",
  decimals: { 1: "±.03", 2: "±.01", 3: "±.005", 4: "±.0005" },
  fractions: "±1/64",
  angles: "±0°30'",
};
const metricBlock: TitleBlockSpec = { unit: "mm", decimalMark: ",", decimals: { 0: "±0,5", 1: "±0,2", 2: "0,05 mm" } };

describe("titleBlock", () => {
  it("reads ± with or without its sign and unit", () => {
    const block = titleBlock({ unit: "in", decimals: { 2: "+/-.01", 3: ".005", 4: "±.0005 in" } });
    expect(Object.values(block.decimals).map(String)).toEqual(["0.01 in", "0.005 in", "0.0005 in"]);
    expect(block.fractions).toBeNull();
    expect(block.angles).toBeNull();
  });

  it("takes its own result back, also through JSON and structuredClone", () => {
    const block = titleBlock(inchBlock);
    expect(titleBlock(block)).toEqual(block);
    expect(titleBlock(structuredClone(block))).toEqual(block);
    const sent = JSON.parse(JSON.stringify(block)) as TitleBlockSpec;
    expect(titleBlock(sent)).toEqual(block);
    expect(Object.isFrozen(block)).toBe(true);
    expect(Object.isFrozen(block.decimals)).toBe(true);
  });

  it.each<[unknown, string, (string | number)[]]>([
    [null, "TITLE_BLOCK_INVALID", []],
    [{ decimals: {} }, "TITLE_BLOCK_INVALID", ["unit"]],
    [{ unit: "cm" }, "TITLE_BLOCK_INVALID", ["unit"]],
    [{ unit: "in", decimalMark: ";" }, "TITLE_BLOCK_INVALID", ["decimalMark"]],
    [{ unit: "in", decimals: "three" }, "TITLE_BLOCK_INVALID", ["decimals"]],
    [{ unit: "in", decimals: { three: "±.005" } }, "TITLE_BLOCK_INVALID", ["decimals", "three"]],
    [{ unit: "in", decimals: { 8: "±.005" } }, "TITLE_BLOCK_INVALID", ["decimals", "8"]],
    [{ unit: "in", decimals: { 3: "±0" } }, "TITLE_BLOCK_INVALID", ["decimals", "3"]],
    [{ unit: "in", decimals: { 3: "-.005" } }, "TITLE_BLOCK_INVALID", ["decimals", "3"]],
    [{ unit: "in", decimals: { 3: "five" } }, "UNIT_UNKNOWN", ["decimals", "3"]],
    [{ unit: "in", decimals: { 3: 0.005 } }, "LENGTH_INVALID", ["decimals", "3"]],
    [{ unit: "mm", fractions: "±1/64" }, "TITLE_BLOCK_INVALID", ["fractions"]],
    [{ unit: "in", angles: "±0°" }, "TITLE_BLOCK_INVALID", ["angles"]],
    [{ unit: "in", angles: "half" }, "ANGLE_INVALID", ["angles"]],
  ])("refuses %j", (spec, code, path) => {
    const error = thrown(() => titleBlock(spec as TitleBlockSpec));
    expect(error.code).toBe(code);
    expect(error.path).toEqual(path);
  });
});

describe("defaultLimits", () => {
  it.each([
    // three decimals in inch, ±.005: common practice of inch title blocks
    ["2.188", "2.193 in", "2.183 in", "3 decimals: ±0.005 in"],
    ["2.5", "2.53 in", "2.47 in", "1 decimal: ±0.03 in"],
    ["2.50", "2.51 in", "2.49 in", "2 decimals: ±0.01 in"],
    ["2.500", "2.505 in", "2.495 in", "3 decimals: ±0.005 in"],
    ["2.5000", "2.5005 in", "2.4995 in", "4 decimals: ±0.0005 in"],
    [".500", "0.505 in", "0.495 in", "3 decimals: ±0.005 in"],
    ["⌀ 2.188", "2.193 in", "2.183 in", "3 decimals: ±0.005 in"],
    ["2.188 in", "2.193 in", "2.183 in", "3 decimals: ±0.005 in"],
    ["7 3/8", "7.390625 in", "7.359375 in", "fractions: ±0.015625 in"],
    ["3/8", "0.390625 in", "0.359375 in", "fractions: ±0.015625 in"],
  ])("inch block: %s", (text, max, min, line) => {
    const found = defaultLimits(inchBlock, text);
    expect(found.kind).toBe("length");
    expect(`${found.limits.max.toString()} ${found.limits.min.toString()}`).toBe(`${max} ${min}`);
    expect(found.line).toBe(line);
    expect(found.limits.basis[0]).toMatchObject({ standard: "title block of the drawing", how: "caller" });
  });

  it("metric block with a decimal comma", () => {
    expect(defaultLimits(metricBlock, "12").limits.max.toString()).toBe("12.5 mm");
    expect(defaultLimits(metricBlock, "12,5").limits.max.toString()).toBe("12.7 mm");
    expect(defaultLimits(metricBlock, "12,50").limits.max.toString()).toBe("12.55 mm");
    expect(codeOf(() => defaultLimits(metricBlock, "12.5"))).toBe("DECIMAL_MARK_MIXED");
  });

  it("angles", () => {
    const found = defaultLimits(inchBlock, "45°");
    expect(found.kind).toBe("angle");
    expect(`${found.limits.max.toString()} ${found.limits.min.toString()}`).toBe("45.5° 44.5°");
    expect(defaultLimits(inchBlock, readAngle("0°15'")).limits.min.toString()).toBe("-0°15'");
    expect(codeOf(() => defaultLimits(metricBlock, "45°"))).toBe("TITLE_BLOCK_NO_LINE");
  });

  it("takes what readDimension made, also through JSON", () => {
    const written = readDimension("2.188", { unit: "in" });
    expect(defaultLimits(inchBlock, written).limits.max.toString()).toBe("2.193 in");
    const sent = JSON.parse(JSON.stringify(written)) as typeof written;
    expect(defaultLimits(inchBlock, sent).limits.max.toString()).toBe("2.193 in");
  });

  it("says what the block has where a line is missing", () => {
    const error = thrown(() => defaultLimits(inchBlock, "2.18800"));
    expect(error.code).toBe("TITLE_BLOCK_NO_LINE");
    expect(error.message).toContain("5 decimals");
    expect(error.allowed).toBe("the block has: 1 decimal, 2 decimals, 3 decimals, 4 decimals, fractions, angles");
    expect(thrown(() => defaultLimits({ unit: "in" }, "2")).allowed).toBe("the block has no lines");
    expect(codeOf(() => defaultLimits({ unit: "in" }, "1/2"))).toBe("TITLE_BLOCK_NO_LINE");
  });

  it.each(["(2.188)", "2.188 REF", "2.188 ref.", "[2.188]", "2.188 BASIC", "2.188 bsc", "⌀[2.188]", "25 mm"])(
    "puts no default on %s",
    (text) => {
      expect(codeOf(() => defaultLimits(inchBlock, text))).toBe("TITLE_BLOCK_NOT_APPLICABLE");
    },
  );

  it("refuses what is no size", () => {
    for (const wrong of [null, 2.188, {}, []]) {
      expect(codeOf(() => defaultLimits(inchBlock, wrong as unknown as string))).toBe("TITLE_BLOCK_NOT_APPLICABLE");
    }
    expect(codeOf(() => defaultLimits(inchBlock, "two"))).toBe("UNIT_UNKNOWN");
    expect(codeOf(() => defaultLimits(inchBlock, ""))).toBe("TEXT_EMPTY");
  });
});
