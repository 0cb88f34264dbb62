import { isoFit, mm, parseToleranceClass } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

describe("isoFit", () => {
  const WANTED = isoFit(mm(35), "H7/k6");

  it("has limits, clearances, kind and system", () => {
    // IT7 = 25, IT6 = 16, k = +2: worked by hand from ISO 286-1:2010, Tables 1 and 5
    expect(WANTED.hole.max.toString()).toBe("35.025 mm");
    expect(WANTED.shaft.min.toString()).toBe("35.002 mm");
    expect(WANTED.maxClearance.toString()).toBe("23 µm");
    expect(WANTED.minClearance.toString()).toBe("-18 µm");
    expect(WANTED.variation.toString()).toBe("41 µm");
    expect(WANTED).toMatchObject({ kind: "transition", system: "hole basis", designation: "H7/k6" });
    expect(WANTED.cautions.map(({ code }) => code)).toEqual(["FIT_MAY_PRESS"]);
    expect(WANTED.hole.basis.length).toBeGreaterThan(2);
  });

  it.each([
    ["H7-k6"],
    [" H7 / k6 "],
    [{ hole: "H7", shaft: "k6" }],
    [{ hole: parseToleranceClass("H7"), shaft: parseToleranceClass("k6") }],
    [{ hole: " H7", shaft: parseToleranceClass("k6") }],
  ])("reads %j as the same fit", (fit) => {
    expect(isoFit(mm(35), fit)).toEqual(WANTED);
  });

  it.each([
    ["K5/h6", "shaft basis"],
    ["H6/h5", "hole and shaft basis"],
    ["F7/g6", "neither"],
    ["JS7/js6", "neither"],
  ])("%s is of the system: %s", (fit, system) => {
    expect(isoFit(mm(35), fit)).toMatchObject({ designation: fit, system });
  });

  it("takes an inch size", () => {
    const fit = isoFit("1.25 in", "H7/g6");
    expect(fit.nominal.toString()).toBe("1.25 in");
    expect(fit.minClearance.toString()).toBe("9 µm");
  });

  it("hands its options on", () => {
    expect(isoFit(mm(8), "H7/js7").variation.toString()).toBe("30 µm");
    expect(isoFit(mm(8), "H7/js7", { jsRounding: "even" }).variation.toString()).toBe("29 µm");
    expect(isoFit(mm(12), "H8/cd8").minClearance.toString()).toBe("70 µm");
    expect(codeOf(() => isoFit(mm(12), "H8/cd8", { edition: "1988" }))).toBe("ISO_DEVIATION_NOT_DEFINED");
    expect(codeOf(() => isoFit(mm(12), "H8/cd8", { edition: "now" as never }))).toBe("OPTION_INVALID");
  });

  it.each([
    ["FIT_MALFORMED", ""],
    ["FIT_MALFORMED", "H7"],
    ["FIT_MALFORMED", "H7 k6"],
    ["FIT_MALFORMED", "H7\u2013k6"],
    ["FIT_MALFORMED", undefined],
    ["FIT_MALFORMED", null],
    ["FIT_MALFORMED", 7],
    ["FIT_MALFORMED", {}],
    ["FIT_MALFORMED", { hole: "H7" }],
    ["FIT_MALFORMED", { shaft: "k6" }],
    ["FIT_MALFORMED", Object.create({ hole: "H7", shaft: "k6" })],
    ["CLASS_MALFORMED", "/"],
    ["CLASS_MALFORMED", "H7/"],
    ["CLASS_MALFORMED", "/k6"],
    ["CLASS_MALFORMED", "H7//k6"],
    ["CLASS_MALFORMED", "H7/k6/h5"],
    ["CLASS_MALFORMED", "H7--k6"],
    ["CLASS_MALFORMED", { hole: 7, shaft: "k6" }],
    ["CLASS_LETTER_UNKNOWN", "H7/i6"],
    ["CLASS_GRADE_UNKNOWN", "H19/k6"],
    ["FIT_NOT_HOLE_AND_SHAFT", "H7/K6"],
    ["FIT_NOT_HOLE_AND_SHAFT", "h7/k6"],
    ["FIT_NOT_HOLE_AND_SHAFT", "k6/H7"],
    ["FIT_NOT_HOLE_AND_SHAFT", { hole: "k6", shaft: "H7" }],
    ["FIT_NOT_HOLE_AND_SHAFT", { hole: "H7", shaft: "K6" }],
    ["ISO_DEVIATION_NOT_DEFINED", "H7/a6"],
    ["ISO_GRADE_NOT_DEFINED", "H14/h6"],
    ["ISO_CLASS_NOT_DEFINED", "H7/j9"],
  ])("refuses with %s: %j", (code, fit) => {
    const size = fit === "H7/a6" || fit === "H14/h6" ? mm(1) : mm(35);
    expect(codeOf(() => isoFit(size, fit as never))).toBe(code);
  });

  it("says which two classes it was given", () => {
    expect(thrown(() => isoFit(mm(35), "k6/H7")).value).toBe("k6/H7");
  });

  it("refuses a size outside the system", () => {
    expect(codeOf(() => isoFit(mm(0), "H7/k6"))).toBe("ISO_SIZE_OUT_OF_RANGE");
    expect(codeOf(() => isoFit("4000 mm", "H7/k6"))).toBe("ISO_SIZE_OUT_OF_RANGE");
  });
});
