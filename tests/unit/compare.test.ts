import { compareFits } from "limitsmith/compare";
import { inchFit } from "limitsmith/inchFits";
import { isoFit, isoFitsNear, preferredIsoFits } from "limitsmith/iso286";
import { inch, mm, thou, um } from "limitsmith/units";
import type { Length } from "limitsmith/units";
import type { Fit } from "limitsmith/limits";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

/** The larger of the two clearance differences, in ticks. */
function distance(left: Fit, right: Fit): number {
  return Math.max(
    Math.abs(left.minClearance.ticks - right.minClearance.ticks),
    Math.abs(left.maxClearance.ticks - right.maxClearance.ticks),
  );
}

/** Every preferred ISO fit of a system that is defined at a size. */
function preferredAt(size: Length, system: string): Fit[] {
  return preferredIsoFits().flatMap((one) => {
    try {
      const fit = isoFit(size, one.fit);
      return fit.system === system || fit.system === "hole and shaft basis" ? [fit] : [];
    } catch {
      expect(codeOf(() => isoFit(size, one.fit))).toMatch(/_NOT_DEFINED$/);
      return [];
    }
  });
}

describe("compareFits from an inch class", () => {
  // LN2 at 1.25 in (ANSI B4.1): hole +1.0/0, shaft +1.6/+1.0 thou = +25.4/0, +40.64/+25.4 µm.
  // H7/p6 at 31.75 mm (ISO 286-1, Tables 1 and 5): hole +25/0, shaft +42/+26 µm.
  it("LN2 at 1.25 in stands beside H7/p6, limit by limit", () => {
    const { system, given, nearest } = compareFits(inch("1.25"), "LN2");
    expect(system).toBe("inch");
    expect(given).toEqual(inchFit(inch("1.25"), "LN2"));
    expect(nearest).toHaveLength(3);
    const [first] = nearest;
    expect(first?.fit).toEqual(isoFit(inch("1.25"), "H7/p6"));
    expect(first?.preferred?.standard).toBe("ANSI B4.2");
    expect(first?.equal).toBe(false);
    const text = Object.fromEntries(
      Object.entries(first?.differences ?? {}).map(([name, length]) => [name, (length as Length).toString()]),
    );
    expect(text).toEqual({
      minClearance: "-1.36 µm",
      maxClearance: "-1 µm",
      holeMax: "-0.4 µm",
      holeMin: "0 µm",
      shaftMax: "1.36 µm",
      shaftMin: "0.6 µm",
    });
  });

  // each inch class with an ISO letter pair comes back to that pair in the middle of the ordinary sizes
  it.each([
    ["RC3", "H7/f6"],
    ["RC4", "H8/f7"],
    ["LC2", "H7/h6"],
    ["LC5", "H7/g6"],
    ["LT1", "H7/js6"],
    ["LT3", "H7/k6"],
    ["LT5", "H7/n6"],
    ["LN3", "H7/r6"],
    ["FN2", "H7/s6"],
    ["FN4", "H7/u6"],
  ])("%s at 1.25 in comes nearest to %s, its own symbols", (cls, fit) => {
    const [first] = compareFits(inch("1.25"), cls).nearest;
    expect(first?.fit.designation).toBe(fit);
    const { hole, shaft } = inchFit(inch("1.25"), cls).symbols;
    expect(`${hole ?? ""}/${shaft ?? ""}`).toBe(fit);
    expect(first?.equal).toBe(false);
  });

  it("nothing preferred comes nearer, on the same basis", () => {
    for (const [size, cls] of [
      ["1.25", "LN2"],
      ["0.3", "RC7"],
      ["12", "FN3"],
      ["5", "RC9S"],
      ["2", "LT3S"],
    ] as const) {
      const { given, nearest } = compareFits(inch(size), cls, { most: 200 });
      const all = preferredAt(inch(size), cls.endsWith("S") ? "shaft basis" : "hole basis");
      const least = Math.min(...all.map((fit) => distance(fit, given)));
      expect(nearest[0] === undefined ? null : distance(nearest[0].fit, given)).toBe(least);
      const distances = nearest.map(({ fit }) => distance(fit, given));
      expect(distances).toEqual([...distances].sort((left, right) => left - right));
      for (const { fit, preferred } of nearest) {
        expect(preferred).not.toBeNull();
        expect([cls.endsWith("S") ? "shaft basis" : "hole basis", "hole and shaft basis"]).toContain(fit.system);
      }
    }
  });

  it("a bilateral hole has no system, and looks among both", () => {
    const { given, nearest } = compareFits(inch(6), "LC4B", { most: 200 });
    expect(given.system).toBe("neither");
    expect(new Set(nearest.map(({ fit }) => fit.system)).size).toBe(3);
  });

  it("looks among more fits if asked, and never farther off for it", () => {
    const given = inchFit(inch("1.25"), "LC11");
    const [preferred, printed, all] = (["preferred", "printed", "all"] as const).map((among) => {
      const [first] = compareFits(inch("1.25"), "LC11", { among, most: 1 }).nearest;
      return first === undefined ? NaN : distance(first.fit, given);
    });
    expect(printed).toBeLessThanOrEqual(preferred ?? NaN);
    expect(all).toBeLessThanOrEqual(printed ?? NaN);
    expect(all).toBeLessThan(preferred ?? NaN);
  });

  it("passes basis and reading on", () => {
    expect(compareFits(inch(2), "RC5", { basis: "shaft" }).given.designation).toBe("RC5S");
    const other = compareFits(inch(12), "RC4", { reading: "textbook appendix" }).given;
    expect(other).toEqual(inchFit(inch(12), "RC4", { reading: "textbook appendix" }));
    expect(compareFits(inch(2), inchFit(inch(2), "RC5S").fitClass).given.designation).toBe("RC5S");
  });
});

describe("compareFits from an ISO fit", () => {
  // H8/f7 at 1.25 in: hole +39/0, shaft -25/-50 µm; RC4: hole +40.64/0, shaft -25.4/-50.8 µm
  it("H8/f7 at 1.25 in stands beside RC4", () => {
    const { system, given, nearest } = compareFits(inch("1.25"), "H8/f7");
    expect(system).toBe("ISO");
    expect(given).toEqual(isoFit(inch("1.25"), "H8/f7"));
    expect(nearest[0]?.fit).toEqual(inchFit(inch("1.25"), "RC4"));
    expect(nearest[0]?.preferred).toBeNull();
    expect(nearest[0]?.differences.holeMax.toString()).toBe("1.64 µm");
    expect(nearest[0]?.differences.shaftMin.toString()).toBe("-0.8 µm");
    expect(nearest[0]?.differences.maxClearance.toString()).toBe("2.44 µm");
  });

  it("keeps the basis: a shaft-basis fit stands beside shaft-basis classes", () => {
    const { given, nearest } = compareFits("35 mm", { hole: "N7", shaft: "h6" });
    expect(given.system).toBe("shaft basis");
    for (const { fit } of nearest) expect(fit.designation).toMatch(/S$/);
    for (const { fit } of compareFits("35 mm", "H7/h6").nearest) expect(fit.designation).not.toMatch(/S$/);
    for (const { fit } of compareFits("35 mm", "K7/m6").nearest) expect(fit.designation).not.toMatch(/S$/);
  });

  it("gives as many as asked for", () => {
    expect(compareFits("35 mm", "H7/g6", { most: 1 }).nearest).toHaveLength(1);
    expect(compareFits("35 mm", "H7/g6", { most: 0 }).nearest).toHaveLength(0);
    expect(compareFits("35 mm", "H7/g6", { most: 99 }).nearest).toHaveLength(34);
  });
});

describe("compareFits", () => {
  it("says equal where all four limits are, and only there", () => {
    // no class and no ISO fit have the same limits anywhere: thousandths of an inch and whole µm meet at 127 µm only
    for (const size of [mm(25), inch("1.25"), inch(12)]) {
      for (const cls of ["LC1", "LC2", "RC4", "LT1", "LN1", "FN1"]) {
        for (const { equal, differences } of compareFits(size, cls, { most: 99, among: "printed" }).nearest) {
          const { holeMax, holeMin, shaftMax, shaftMin } = differences;
          expect(equal).toBe([holeMax, holeMin, shaftMax, shaftMin].every(({ ticks }) => ticks === 0));
          expect(equal).toBe(false);
        }
      }
    }
  });

  it("is frozen", () => {
    const made = compareFits(inch("1.25"), "LN2");
    const [first] = made.nearest;
    for (const part of [made, made.nearest, first, first?.differences]) expect(Object.isFrozen(part)).toBe(true);
  });

  it.each<[string, unknown, unknown]>([
    ["FIT_MALFORMED", "LN", undefined],
    ["FIT_MALFORMED", "", undefined],
    ["FIT_MALFORMED", null, undefined],
    ["FIT_MALFORMED", { text: "H7" }, undefined],
    ["INCH_CLASS_UNKNOWN", "LN9", undefined],
    ["FIT_NOT_HOLE_AND_SHAFT", "m6/H7", undefined],
    ["CLASS_LETTER_UNKNOWN", "Q7/m6", undefined],
    ["OPTION_INVALID", "LN2", { among: "some" }],
    ["OPTION_INVALID", "LN2", { most: 1.5 }],
    ["OPTION_INVALID", "LN2", { basis: "none" }],
    ["OPTION_INVALID", "LN2", { reading: "none" }],
  ])("refuses with %s: %j %j", (code, fit, options) => {
    expect(codeOf(() => compareFits(inch("1.25"), fit as never, options as never))).toBe(code);
  });

  it("says what a fit is where it is of neither system", () => {
    expect(thrown(() => compareFits(inch(1), "press")).allowed).toContain("LN2");
    expect(codeOf(() => compareFits(inch(20), "LN2"))).toBe("INCH_SIZE_OUT_OF_RANGE");
    expect(codeOf(() => compareFits(inch(20), "H7/p6"))).toBe("INCH_SIZE_OUT_OF_RANGE");
    expect(codeOf(() => compareFits(inch(200), "H7/p6"))).toBe("ISO_SIZE_OUT_OF_RANGE");
    expect(codeOf(() => compareFits(inch(12), "LC9"))).toBe("INCH_ROW_MISSING");
  });
});

describe("isoFitsNear", () => {
  const question = { size: mm(35), clearance: { min: um(5), max: um(60) } };

  it("finds a preferred fit by its own clearances, in either system", () => {
    for (const { fit, system } of preferredIsoFits()) {
      const own = isoFit(mm(35), fit);
      const clearance = { min: own.minClearance, max: own.maxClearance };
      const [first] = isoFitsNear({ size: mm(35), clearance, system, most: 1 }).fits;
      expect(first === undefined ? null : distance(first.fit, own)).toBe(0);
    }
  });

  it("groups hold one another", () => {
    const counts = (["preferred", "printed", "all"] as const).map(
      (among) => isoFitsNear({ ...question, among, most: 0 }).found,
    );
    expect(counts).toEqual([...counts].sort((left, right) => left - right));
    expect(new Set(counts).size).toBe(3);
    expect(isoFitsNear({ ...question, most: 0 }).found).toBe(counts[0]);
    const holes = isoFitsNear({ ...question, system: "hole basis", most: 999 }).fits;
    const shafts = isoFitsNear({ ...question, system: "shaft basis", most: 999 }).fits;
    const both = holes.filter(({ fit }) => fit.system === "hole and shaft basis");
    expect(both.length).toBeGreaterThan(0);
    expect(holes.length + shafts.length - both.length).toBe(counts[0]);
  });

  it("every preferred fit of the wider group is in the narrower one, and no other", () => {
    const names = (among: "preferred" | "all") =>
      isoFitsNear({ ...question, among, most: 99_999 })
        .fits.filter(({ preferred }) => preferred !== null)
        .map(({ fit, preferred }) => `${fit.designation ?? ""} ${preferred?.system ?? ""}`);
    expect(names("all").sort()).toEqual(names("preferred").sort());
  });

  it.each<[string, unknown]>([
    ["OPTION_INVALID", { ...question, among: "named" }],
    ["OPTION_INVALID", { ...question, among: null }],
    ["OPTION_INVALID", { ...question, system: "hole" }],
    ["OPTION_INVALID", { ...question, most: -1 }],
    ["LIMITS_INVALID", { size: mm(35) }],
    ["LIMITS_UPSIDE_DOWN", { size: mm(35), clearance: { min: um(2), max: um(1) } }],
    ["ISO_SIZE_OUT_OF_RANGE", { ...question, size: mm(4000) }],
    ["LENGTH_INVALID", { clearance: { min: thou(0), max: thou(1) } }],
  ])("refuses with %s (%#)", (code, asked) => {
    expect(codeOf(() => isoFitsNear(asked as never))).toBe(code);
  });
});
