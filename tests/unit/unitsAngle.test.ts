import { degrees, readAngle, writeAngle } from "limitsmith";
import type { Angle } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";

const DEGREE = 3_600_000_000;
const MINUTE = 60_000_000;
const SECOND = 1_000_000;

describe("readAngle", () => {
  it.each([
    ["45°", 45 * DEGREE, "decimal"],
    ["0.5°", DEGREE / 2, "decimal"],
    ["45 °", 45 * DEGREE, "decimal"],
    ["45 deg", 45 * DEGREE, "decimal"],
    ["45DEG", 45 * DEGREE, "decimal"],
    [" 45° ", 45 * DEGREE, "decimal"],
    ["-45°", -45 * DEGREE, "decimal"],
    ["\u221245°", -45 * DEGREE, "decimal"],
    ["+45°", 45 * DEGREE, "decimal"],
    ["-0°", 0, "decimal"],
    ["0°30'", 30 * MINUTE, "dms"],
    ["0°30′", 30 * MINUTE, "dms"],
    ["0° 30'", 30 * MINUTE, "dms"],
    ["-0°30'", -30 * MINUTE, "dms"],
    ["12°15'30\"", 12 * DEGREE + 15 * MINUTE + 30 * SECOND, "dms"],
    ["12°15'30″", 12 * DEGREE + 15 * MINUTE + 30 * SECOND, "dms"],
    ["12°15'30.25\"", 12 * DEGREE + 15 * MINUTE + 30_250_000, "dms"],
    ["12°0'0.000001\"", 12 * DEGREE + 1, "dms"],
    ['12°30"', 12 * DEGREE + 30 * SECOND, "dms"],
    ["7.125°", 7 * DEGREE + DEGREE / 8, "decimal"],
    ["0.00000001°", 36, "decimal"],
    ["360°", 360 * DEGREE, "decimal"],
  ] as const)("reads %j", (text, microarcseconds, style) => {
    const angle = readAngle(text);
    expect(angle.microarcseconds).toBe(microarcseconds);
    expect(angle.style).toBe(style);
    expect(Object.isFrozen(angle)).toBe(true);
  });

  it("reads a decimal comma when asked", () => {
    expect(readAngle("0,5°", { decimalMark: "," }).microarcseconds).toBe(DEGREE / 2);
    expect(codeOf(() => readAngle("0.5°", { decimalMark: "," }))).toBe("ANGLE_INVALID");
    expect(codeOf(() => readAngle("0,5°"))).toBe("ANGLE_INVALID");
    expect(codeOf(() => readAngle("0.5°", { decimalMark: "x" as never }))).toBe("OPTION_INVALID");
  });

  it("takes angles and their data back", () => {
    const angle = readAngle("12°15'30\"");
    const ways = [angle, structuredClone(angle), JSON.parse(JSON.stringify(angle)) as string, { ...angle }];
    for (const way of ways) expect(readAngle(way)).toEqual(angle);
  });

  it.each([
    ["ANGLE_INVALID", ""],
    ["ANGLE_INVALID", "45"],
    ["ANGLE_INVALID", "°"],
    ["ANGLE_INVALID", "45 rad"],
    ["ANGLE_INVALID", "45'"],
    ["ANGLE_INVALID", "0°60'"],
    ["ANGLE_INVALID", "0°0'60\""],
    ["ANGLE_INVALID", "0.5°30'"],
    ["ANGLE_INVALID", "0°30'15'"],
    ["ANGLE_INVALID", "0°-30'"],
    ["ANGLE_INVALID", "1e2°"],
    ["ANGLE_INVALID", "45°°"],
    ["ANGLE_INVALID", "٤٥°"],
    ["ANGLE_TOO_FINE", "0.0000000001°"],
    ["ANGLE_TOO_FINE", "0.333333333333°"],
    ["ANGLE_OUT_OF_RANGE", "9999999°"],
    ["TEXT_TOO_LONG", `${" ".repeat(60)}45°`],
  ])("refuses with %s: %j", (code, text) => {
    expect(codeOf(() => readAngle(text))).toBe(code);
  });

  it.each([
    undefined,
    null,
    45,
    true,
    {},
    [],
    { microarcseconds: 5 },
    { style: "dms" },
    { microarcseconds: "5", style: "dms" },
    { microarcseconds: 5, style: "grad" },
  ])("refuses what is no angle: %j", (value) => {
    expect(codeOf(() => readAngle(value as never))).toBe("ANGLE_INVALID");
  });

  it("refuses data that are not whole or not safe", () => {
    expect(codeOf(() => readAngle({ microarcseconds: 2 ** 53, style: "dms" }))).toBe("ANGLE_OUT_OF_RANGE");
    expect(codeOf(() => readAngle({ microarcseconds: NaN, style: "dms" }))).toMatch(/^ANGLE_/);
    expect(codeOf(() => readAngle({ microarcseconds: 0.5, style: "dms" }))).toMatch(/^ANGLE_/);
  });
});

describe("degrees", () => {
  it("rounds to the nearest millionth of a second, a half away from zero", () => {
    expect(degrees(0.5).microarcseconds).toBe(DEGREE / 2);
    expect(degrees(-0.5).microarcseconds).toBe(-DEGREE / 2);
    expect(degrees(1 / 3).microarcseconds).toBe(DEGREE / 3);
    expect(degrees(-0).microarcseconds).toBe(0);
  });

  it.each([
    ["NUMBER_NOT_FINITE", NaN],
    ["NUMBER_NOT_FINITE", Infinity],
    ["ANGLE_OUT_OF_RANGE", 1e9],
    ["ANGLE_OUT_OF_RANGE", -1e9],
    ["ANGLE_INVALID", "45"],
    ["ANGLE_INVALID", undefined],
  ])("refuses with %s: %s", (code, value) => {
    expect(codeOf(() => degrees(value as never))).toBe(code);
  });
});

describe("an angle as text", () => {
  it.each<[Angle, string, string, number]>([
    [degrees(45), "45°", "45°0'", 45],
    [degrees(0.5), "0.5°", "0°30'", 0.5],
    [degrees(-0.5), "-0.5°", "-0°30'", -0.5],
    [degrees(7.125), "7.125°", "7°7'30\"", 7.125],
    [degrees(0), "0°", "0°0'", 0],
    [readAngle("12°0'0.000001\""), "12°0'0.000001\"", "12°0'0.000001\"", 12 + 1 / DEGREE],
  ])("%s", (angle, decimal, dms, value) => {
    expect(writeAngle(angle, { style: "decimal" })).toBe(decimal);
    expect(writeAngle(angle, { style: "dms" })).toBe(dms);
    expect(angle.toDegrees()).toBe(value);
    expect(readAngle(angle.toString()).microarcseconds).toBe(angle.microarcseconds);
    expect(JSON.stringify(angle)).toBe(JSON.stringify(angle.toString()));
  });

  it("writes a third of a degree in minutes, because its decimals do not end", () => {
    expect(degrees(1 / 3).toString()).toBe("0°20'");
    expect(writeAngle("0°20'", { style: "decimal" })).toBe("0°20'");
  });

  it("keeps the style it was written in", () => {
    expect(writeAngle("0.5°")).toBe("0.5°");
    expect(writeAngle("0°30'")).toBe("0°30'");
  });

  it("refuses another style", () => {
    expect(codeOf(() => writeAngle("45°", { style: "grad" as never }))).toBe("OPTION_INVALID");
  });
});
