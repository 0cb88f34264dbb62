import {
  inchClasses,
  inchClassesFor,
  inchFit,
  inchFitReadings,
  inchFitsFor,
  inchFitsNear,
  inchStandardTolerance,
  isPreferredInchSize,
  isPreferredInchTolerance,
  nearestPreferredInchSize,
  nearestPreferredInchTolerance,
  parseInchClass,
  preferredInchSizes,
  preferredInchTolerances,
} from "limitsmith/inchFits";
import type { InchBasis, InchFitReading } from "limitsmith/inchFits";
import { fitOf, limits, limitsFromMaxMin, writeLimits } from "limitsmith/limits";
import { inch, lengthOfTicks, mm, thou } from "limitsmith/units";
import type { Length } from "limitsmith/units";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

const IN = 254_000_000;
const THOU = 254_000;
const GROUPS: Readonly<Record<string, number>> = { RC: 9, LC: 11, LT: 6, LN: 3, FN: 5 };
const NAMES = Object.entries(GROUPS).flatMap(([letters, count]) =>
  Array.from({ length: count }, (_, index) => `${letters}${index + 1}`),
);

/** Every class that has limits at a size, one by one through the plain door. */
function everyFit(size: Length, suffix = "") {
  return NAMES.flatMap((name) => {
    try {
      return [inchFit(size, name + suffix)];
    } catch {
      expect(codeOf(() => inchFit(size, name + suffix))).toMatch(/^INCH_ROW_(?:NOT_DEFINED|MISSING)$/);
      return [];
    }
  });
}

describe("parseInchClass", () => {
  it.each(["LN2", "LN 2", "ln2", "Ln2", " LN2 ", "LN\t2", "LN\u00a02", "ln  2"])("reads %j as LN2", (text) => {
    expect(parseInchClass(text)).toEqual({ text: "LN2", letters: "LN", number: 2, basis: "hole" });
  });

  it.each<[string, string, InchBasis]>([
    ["RC5S", "RC5S", "shaft"],
    ["rc 5 s", "RC5S", "shaft"],
    ["RC 5S", "RC5S", "shaft"],
    ["LC4B", "LC4B", "bilateral hole"],
    ["lc 11 b", "LC11B", "bilateral hole"],
    ["LC11", "LC11", "hole"],
    ["FN5S", "FN5S", "shaft"],
  ])("reads %j as %s", (text, plain, basis) => {
    expect(parseInchClass(text)).toMatchObject({ text: plain, basis });
  });

  it("knows every class, takes its own answer, and freezes it", () => {
    expect(NAMES).toHaveLength(34);
    for (const name of NAMES) {
      for (const suffix of ["", "S", "B"]) {
        const cls = parseInchClass(name + suffix);
        expect(cls.letters + String(cls.number) + suffix).toBe(name + suffix);
        expect(Object.isFrozen(cls)).toBe(true);
        expect(parseInchClass(cls)).toBe(cls);
        // what came through JSON or a worker is still the class
        expect(parseInchClass(structuredClone(cls))).toBe(cls);
      }
    }
  });

  it.each(["RC10", "RC0", "LC12", "LT7", "LN4", "FN6", "RC05", "LN00", "ln 9s", "LC99B"])(
    "refuses %j, saying what there is",
    (text) => {
      const error = thrown(() => parseInchClass(text));
      expect(error.code).toBe("INCH_CLASS_UNKNOWN");
      const letters = text.slice(0, 2).toUpperCase();
      expect(error.allowed).toBe(`${letters}1 to ${letters}${GROUPS[letters] ?? 0}`);
      expect(error.value).toBe(text);
    },
  );

  it.each([
    "",
    " ",
    "RC",
    "5",
    "RC4C",
    "RC-4",
    "RC4SB",
    "RC100",
    "AB3",
    "H7/m6",
    "m6",
    "js6",
    "RC4 hole",
    "RC 4.0",
    "RC４",
    "1.250 LN2",
    "LN2LN2",
    "constructor",
    "__proto__",
    `LN${" ".repeat(100_000)}2x`,
  ])("is no class: %j", (text) => {
    expect(thrown(() => parseInchClass(text))).toMatchObject({ code: "INCH_CLASS_MALFORMED" });
  });

  it.each([null, undefined, 4, {}, [], { text: 4 }, Object.create({ text: "LN2" })])(
    "is no class: %j (%#)",
    (value) => {
      expect(codeOf(() => parseInchClass(value as never))).toBe("INCH_CLASS_MALFORMED");
    },
  );
});

describe("inchFit", () => {
  it("LN2 at 1.25 in: the fit and its parts", () => {
    const fit = inchFit(inch("1.250"), "LN 2");
    expect(fit.designation).toBe("LN2");
    expect(fit.hole.designation).toBe("LN2 hole");
    expect(fit.shaft.designation).toBe("LN2 shaft");
    expect(fit.nominal.toString()).toBe("1.25 in");
    expect(fit.shaft.max.toString()).toBe("1.2516 in");
    expect(fit.shaft.min.toString()).toBe("1.251 in");
    expect(fit.hole.max.toString()).toBe("1.251 in");
    expect(fit.hole.min.toString()).toBe("1.25 in");
    expect(fit.hole.upperDeviation.toString()).toBe("1 thou");
    expect(fit.minClearance.toString()).toBe("-1.6 thou");
    expect(fit.maxClearance.toString()).toBe("0 thou");
    expect(fit.variation.toString()).toBe("1.6 thou");
    expect(fit.kind).toBe("interference");
    expect(fit.system).toBe("hole basis");
    expect(fit.purpose).toContain("location");
    expect(fit.reading).toBeNull();
    expect(fit.cautions.map(({ code }) => code)).toEqual(["FIT_MAY_PRESS"]);
    expect(fit.basis[0]).toEqual({
      standard: "ANSI B4.1-1967",
      place: "locational interference fits, LN2, over 1.19 up to 1.97 in",
      says: "hole +1 / 0, shaft +1.6 / +1, interference 0 to 1.6, in thou",
      how: "tabulated",
      mark: "one-source",
    });
  });

  it("holds together with the fit that fitOf makes of its members", () => {
    for (const cls of ["RC4", "LT3S", "FN2", "LC4B"]) {
      const fit = inchFit(inch(2), cls);
      const again = fitOf(fit.hole, fit.shaft);
      for (const name of [
        "kind",
        "system",
        "maxClearance",
        "minClearance",
        "maxInterference",
        "minInterference",
        "variation",
      ] as const) {
        expect(fit[name]).toEqual(again[name]);
      }
      expect(Object.keys(again).filter((key) => !(key in fit))).toEqual([]);
      expect(JSON.parse(JSON.stringify(fit))).toMatchObject({ designation: cls });
    }
  });

  it("is frozen through and through", () => {
    const fit = inchFit(inch(12), "RC4");
    const parts = [fit, fit.hole, fit.shaft, fit.basis, fit.cautions, fit.symbols, fit.printedLimits, fit.fitClass];
    for (const part of [...parts, ...fit.basis, ...fit.cautions]) expect(Object.isFrozen(part)).toBe(true);
  });

  it("takes sizes in any unit, exactly", () => {
    expect(inchFit("5/8 in", "LT2").shaft.max.toString()).toBe("0.62535 in");
    expect(inchFit("5/8 in", "LT2").shaft.min.toString()).toBe("0.62465 in");
    const metric = inchFit(mm("31.75"), "LN2");
    expect(metric.shaft.max.toString()).toBe("31.79064 mm");
    expect(metric.shaft.max.ticks).toBe(inchFit(inch("1.25"), "LN2").shaft.max.ticks);
    expect(inchFit(thou(1250), "LN2").shaft.max.ticks).toBe(metric.shaft.max.ticks);
    expect(inchFit(structuredClone(inch("1.25")), "LN2").shaft.max.ticks).toBe(metric.shaft.max.ticks);
  });

  // 1 3/16 in is 30.1625 mm: over the metric step end of 30 mm, but in the inch step that ends at 1.19
  it("keeps a fraction exact: 1 3/16 is 1.1875 and belongs to 0.71 to 1.19", () => {
    const fit = inchFit(inch("1 3/16"), "LN2");
    expect(fit.nominal.ticks).toBe(1.1875 * IN);
    expect(fit.basis[0]?.place).toContain("over 0.71 up to 1.19 in");
    expect(fit.shaft.upperDeviation.toString()).toBe("1.3 thou");
  });

  it.each(["0.12", "0.24", "0.40", "0.71", "1.19", "1.97", "3.15", "4.73", "7.09", "9.85", "12.41", "15.75"])(
    "%s in belongs to the step below, one tick more to the next",
    (end) => {
      const size = inch(end);
      const more = lengthOfTicks(size.ticks + 1, "in");
      for (const cls of ["RC8", "FN5"]) {
        expect(inchFit(size, cls).basis[0]?.place).toContain(`up to ${end} in`);
        expect(inchFit(more, cls).basis[0]?.place).toContain(`over ${end} up to`);
      }
    },
  );

  it.each(["0.56", "0.95", "1.58", "2.56", "3.94"])("%s in ends a step of the force fits only", (end) => {
    const more = lengthOfTicks(inch(end).ticks + 1, "in");
    expect(inchFit(inch(end), "FN5").basis[0]?.place).toContain(`up to ${end} in`);
    expect(inchFit(more, "FN5").basis[0]?.place).toContain(`over ${end} up to`);
    expect(inchFit(more, "RC8").basis[0]?.place).toBe(inchFit(inch(end), "RC8").basis[0]?.place);
  });

  it("sizes named as traps go where they belong", () => {
    const place = (size: string, cls: string) => inchFit(inch(size), cls).basis[0]?.place ?? "";
    expect(place("2.000", "RC4")).toContain("over 1.97 up to 3.15 in");
    expect(place("2.000", "FN2")).toContain("over 1.97 up to 2.56 in");
    expect(place("4.750", "RC4")).toContain("over 4.73 up to 7.09 in");
    expect(place("23/32", "LN2")).toContain("over 0.71 up to 1.19 in");
    expect(place("0.125", "LN2")).toContain("over 0.12 up to 0.24 in");
    expect(place("0.250", "LN2")).toContain("over 0.24 up to 0.40 in");
  });

  it("ends at 19.69 in and starts above 0", () => {
    expect(inchFit(inch("19.69"), "LN2").designation).toBe("LN2");
    expect(inchFit(lengthOfTicks(1, "in"), "LN2").designation).toBe("LN2");
    for (const size of [lengthOfTicks(19.69 * IN + 1, "in"), inch("19.70"), inch(200), inch(0), inch(-1)]) {
      const error = thrown(() => inchFit(size, "LN2"));
      expect(error.code).toBe("INCH_SIZE_OUT_OF_RANGE");
      expect(error.allowed).toContain("over 0 up to 19.69 in");
    }
  });

  it.each([
    ["FN3", "0.95", "INCH_ROW_NOT_DEFINED", "FN3 over 0.95 up to 19.69 in"],
    ["FN3S", "0.5", "INCH_ROW_NOT_DEFINED", "FN3 over 0.95 up to 19.69 in"],
    ["LT3", "0.24", "INCH_ROW_NOT_DEFINED", "LT3 over 0.24 up to 19.69 in"],
    ["LT4", "0.1", "INCH_ROW_NOT_DEFINED", "LT4 over 0.24 up to 19.69 in"],
    ["LC9", "9.86", "INCH_ROW_MISSING", "LC9 up to 9.85 in"],
    ["RC1B", "0.1", "INCH_ROW_NOT_DEFINED", "RC1 without suffix"],
  ])("%s at %s in is refused with %s, saying what is defined", (cls, size, code, allowed) => {
    const error = thrown(() => inchFit(inch(size), cls));
    expect(error.code).toBe(code);
    expect(error.allowed).toContain(allowed);
  });

  describe("basis", () => {
    it("the option and the suffix say the same", () => {
      for (const [basis, suffix] of [
        ["shaft", "S"],
        ["bilateral hole", "B"],
        ["hole", ""],
      ] as const) {
        const byOption = inchFit(inch(2), "RC5", { basis });
        expect(byOption).toEqual(inchFit(inch(2), `RC5${suffix}`));
        expect(byOption.designation).toBe(`RC5${suffix}`);
        expect(inchFit(inch(2), `RC5${suffix}`, { basis })).toEqual(byOption);
      }
    });

    it("systems: hole, shaft, both where the shaft is h, neither for a bilateral hole", () => {
      expect(inchFit(inch(2), "RC5").system).toBe("hole basis");
      expect(inchFit(inch(2), "RC5S").system).toBe("shaft basis");
      expect(inchFit(inch(2), "LC2").system).toBe("hole and shaft basis");
      expect(inchFit(inch(2), "LC2S").system).toBe("hole and shaft basis");
      expect(inchFit(inch(2), "LC4B").system).toBe("neither");
    });

    it.each([
      ["RC5S", { basis: "hole" }],
      ["RC5S", { basis: "bilateral hole" }],
      ["LC4B", { basis: "shaft" }],
      ["RC5", { basis: "S" }],
      ["RC5", { basis: null }],
      ["RC5", { reading: "other" }],
      ["RC5", { reading: 1 }],
    ])("%s with %j is refused", (cls, options) => {
      expect(codeOf(() => inchFit(inch(2), cls, options as never))).toBe("OPTION_INVALID");
    });
  });

  it("a reading is chosen by name, and only own options count", () => {
    const [first, second] = inchFitReadings();
    expect(first?.name).toBe("handbook");
    expect(second?.says).toContain("9.85");
    const polluted = Object.create({ basis: "shaft", reading: "textbook appendix" }) as {
      basis: InchBasis;
      reading: InchFitReading;
    };
    expect(inchFit(inch(12), "RC4", polluted)).toEqual(inchFit(inch(12), "RC4"));
  });

  it("refuses what is no length", () => {
    for (const size of [1.25, null, undefined, {}, "1.25"]) {
      expect(codeOf(() => inchFit(size as never, "LN2"))).toMatch(/^(?:LENGTH_INVALID|UNIT_MISSING)$/);
    }
  });

  it("its members are written as a drawing shows them", () => {
    const { hole, shaft } = inchFit(inch("1.250"), "LN2");
    expect(writeLimits(hole, { form: "limits", places: 4 }).text).toBe("1.2510/1.2500");
    expect(writeLimits(shaft, { form: "class", places: 4 }).text).toBe("1.2500 LN2 shaft (1.2516/1.2510)");
  });
});

describe("inchClasses", () => {
  it("lists each class once, with its group and purpose", () => {
    expect(inchClasses().map(({ fitClass }) => fitClass.text)).toEqual(NAMES);
    expect(new Set(inchClasses().map(({ group }) => group)).size).toBe(5);
    expect(inchClasses()[0]?.group).toBe("running and sliding fits");
    expect(new Set(inchClasses().map(({ purpose }) => purpose)).size).toBe(34);
    for (const one of inchClasses()) expect(Object.isFrozen(one)).toBe(true);
  });
});

describe("inchStandardTolerance", () => {
  it("goes to 200 in, and no further", () => {
    expect(inchStandardTolerance(inch(200), 13).tolerance.toString()).toBe("250 thou");
    expect(inchStandardTolerance(inch("0.12"), 4).tolerance.toString()).toBe("0.12 thou");
    expect(inchStandardTolerance(mm("31.75"), 6).tolerance.toString()).toBe("0.6 thou");
    for (const size of [inch("200.1"), inch(0), inch(-1)]) {
      const error = thrown(() => inchStandardTolerance(size, 7));
      expect(error.code).toBe("INCH_SIZE_OUT_OF_RANGE");
      expect(error.allowed).toBe("over 0 up to 200 in");
    }
  });

  it("says which step, and from where on the ABC agreements end", () => {
    expect(inchStandardTolerance(inch(150), 7).basis[0]).toMatchObject({
      place: "standard tolerances, over 131.9 up to 171.9 in",
      says: "grade 7 = 12 thou, outside the ABC agreements",
    });
    expect(inchStandardTolerance(inch("0.71"), 7).basis[0]?.place).toBe("standard tolerances, over 0.40 up to 0.71 in");
  });

  it.each([3, 14, 0, 7.5, NaN, "7", "IT7", null, undefined])("grade %j is refused", (grade) => {
    expect(thrown(() => inchStandardTolerance(inch(1), grade as never))).toMatchObject({
      code: "INCH_GRADE_UNKNOWN",
      allowed: "4 to 13",
    });
  });
});

describe("inchFitsFor", () => {
  it("finds the classes in the range, more of it used first", () => {
    // at 1.25 in: RC3 1.0 to 2.6, RC4 1.0 to 3.6 thou; RC5 has 2.0 to 4.6, LC6 starts at 1.0 and goes to 5.1
    const answer = inchFitsFor({ size: inch("1.25"), clearance: { min: thou(1), max: thou(4) } });
    expect(answer.found).toBe(2);
    expect(answer.fits.map(({ fit }) => fit.designation)).toEqual(["RC4", "RC3"]);
    expect(answer.fits[0]).toEqual({ fit: inchFit(inch("1.25"), "RC4"), preferred: null });
    expect(Object.isFrozen(answer) && Object.isFrozen(answer.fits) && Object.isFrozen(answer.fits[0])).toBe(true);
  });

  it("finds press fits by a negative range, on shaft basis if asked", () => {
    const clearance = { min: thou(-2), max: thou(0) };
    const answer = inchFitsFor({ size: inch("1.25"), clearance });
    // LN1 0 to 1.1, LN2 0 to 1.6, LN3 0.4 to 2.0, FN1 0.3 to 1.3 thou of interference; LN2 and LN3 use as much of
    // the range and lie as far from its middle, so the name decides
    expect(answer.fits.map(({ fit }) => fit.designation)).toEqual(["LN2", "LN3", "LN1", "FN1"]);
    const onShaft = inchFitsFor({ size: inch("1.25"), clearance, basis: "shaft" });
    expect(onShaft.fits.map(({ fit }) => fit.designation)).toEqual(["LN2S", "LN3S", "LN1S", "FN1S"]);
  });

  it("puts rows that carry a caution behind all others", () => {
    // over 9.85 in RC4 is printed in two ways
    const answer = inchFitsFor({ size: inch(12), clearance: { min: thou(0), max: thou(10) } });
    const doubtful = answer.fits.map(({ fit }) => fit.cautions.some(({ code }) => code.startsWith("INCH_ROW_")));
    expect(doubtful).toContain(true);
    expect(doubtful).toEqual([...doubtful].sort((left, right) => Number(left) - Number(right)));
  });

  it("gives as many as asked for, and counts them all", () => {
    const question = { size: inch(2), clearance: { min: thou(-100), max: thou(100) } };
    expect(inchFitsFor(question).found).toBe(34);
    expect(inchFitsFor(question).fits).toHaveLength(20);
    expect(inchFitsFor({ ...question, most: 50 }).fits).toHaveLength(34);
    expect(inchFitsFor({ ...question, most: 0 })).toEqual({ found: 34, fits: [] });
    expect(inchFitsFor({ size: inch(2), clearance: { min: thou(1), max: thou(1) } }).found).toBe(0);
  });

  it.each<[string, unknown]>([
    ["INCH_SIZE_OUT_OF_RANGE", { size: inch(20), clearance: { min: thou(0), max: thou(1) } }],
    ["LIMITS_INVALID", { size: inch(1) }],
    ["LIMITS_INVALID", { size: inch(1), clearance: { min: thou(0) } }],
    ["LIMITS_UPSIDE_DOWN", { size: inch(1), clearance: { min: thou(1), max: thou(0) } }],
    ["OPTION_INVALID", { size: inch(1), clearance: { min: thou(0), max: thou(1) }, most: -1 }],
    ["OPTION_INVALID", { size: inch(1), clearance: { min: thou(0), max: thou(1) }, basis: "bilateral hole" }],
    ["LENGTH_INVALID", { clearance: { min: thou(0), max: thou(1) } }],
    ["LENGTH_INVALID", null],
  ])("refuses with %s (%#)", (code, question) => {
    expect(codeOf(() => inchFitsFor(question as never))).toBe(code);
    expect(codeOf(() => inchFitsNear(question as never))).toBe(code);
  });
});

describe("inchFitsNear", () => {
  it("puts every class in the order of its distance", () => {
    for (const [size, min, max] of [
      ["1.25", -1.6, 0],
      ["12", 2, 9],
      ["0.3", 0.3, 0.3],
      ["5", -20, 20],
    ] as const) {
      const answer = inchFitsNear({ size: inch(size), clearance: { min: thou(min), max: thou(max) }, most: 99 });
      const all = everyFit(inch(size));
      expect(answer.found).toBe(all.length);
      expect(answer.fits.map(({ fit }) => fit.designation).sort()).toEqual(all.map((fit) => fit.designation).sort());
      const distances = answer.fits.map(({ fit }) =>
        Math.max(
          Math.abs(fit.minClearance.ticks - thou(min).ticks),
          Math.abs(fit.maxClearance.ticks - thou(max).ticks),
        ),
      );
      expect(distances).toEqual([...distances].sort((left, right) => left - right));
    }
  });

  it("finds a class by its own clearances", () => {
    for (const fit of everyFit(inch("1.25"))) {
      const { fits } = inchFitsNear({
        size: inch("1.25"),
        clearance: { min: fit.minClearance, max: fit.maxClearance },
      });
      expect(fits[0]?.fit.minClearance.ticks).toBe(fit.minClearance.ticks);
      expect(fits[0]?.fit.maxClearance.ticks).toBe(fit.maxClearance.ticks);
    }
  });
});

describe("inchClassesFor", () => {
  it("1.2516/1.2510 on 1.25 in is the shaft of LN2", () => {
    const given = limitsFromMaxMin({ max: inch("1.2516"), min: inch("1.2510"), nominal: inch("1.25") });
    const found = inchClassesFor(given);
    expect(found.map(({ fitClass, kind, match }) => [fitClass.text, kind, match])).toEqual([["LN2", "shaft", "exact"]]);
    expect(found[0]?.limits).toEqual(inchFit(inch("1.25"), "LN2").shaft);
    expect(found[0]?.why).toBe("LN2 shaft on 1.25 in is 1.2516 in / 1.251 in, exactly the limits given");
    expect(found[0]?.maxDifference.ticks).toBe(0);
    expect(Object.isFrozen(found) && Object.isFrozen(found[0])).toBe(true);
  });

  it("says which rounding makes a printed size of a class", () => {
    // LT2 at 5/8 in has a fifth decimal: .62535/.62465
    const printed = limitsFromMaxMin({ max: inch(".6253"), min: inch(".6247"), nominal: inch("5/8") });
    expect(inchClassesFor(printed)).toEqual([]);
    const found = inchClassesFor(printed, { printed: { unit: "in", places: 4 }, kind: "shaft" });
    expect(found.map(({ fitClass, match }) => [fitClass.text, match])).toEqual([["LT2", "inside"]]);
    expect(found[0]?.maxDifference.toString()).toBe("-0.00005 in");
    expect(found[0]?.why).toContain("rounded inside to 4 decimals of in it reads .6253 / .6247");
  });

  it("finds every class by its own members, both bases, by brute force", () => {
    for (const size of [inch("0.1"), inch("0.5"), inch("1.25"), inch(12)]) {
      const holeBasis = everyFit(size);
      const shaftBasis = everyFit(size, "S").filter(({ hole }) => hole.lowerDeviation.ticks !== 0);
      for (const fit of [...holeBasis, ...shaftBasis]) {
        for (const kind of ["hole", "shaft"] as const) {
          const same = (one: { hole: typeof fit.hole; shaft: typeof fit.shaft }) =>
            one[kind].max.ticks === fit[kind].max.ticks && one[kind].min.ticks === fit[kind].min.ticks;
          const wanted = [...holeBasis.filter(same), ...shaftBasis.filter(same)].map(({ designation }) => designation);
          const found = inchClassesFor(fit[kind], { kind });
          expect(found.map(({ fitClass }) => fitClass.text).sort()).toEqual(wanted.sort());
          for (const one of found) expect(one.limits.designation).toBe(`${one.fitClass.text} ${kind}`);
        }
      }
    }
  });

  it("puts exact before rounded, hole basis before shaft basis, sure rows first", () => {
    // at 12 in the hole +3.0/0 thou is that of RC4, which carries a caution, and of others which do not
    const found = inchClassesFor(inchFit(inch(12), "RC4").hole, { kind: "hole" });
    expect(found.at(-1)?.fitClass.text).toBe("RC4");
    const zeroShaft = limits({ nominal: inch("1.25"), upper: thou(0), lower: thou("-0.6") });
    const texts = inchClassesFor(zeroShaft).map(({ fitClass }) => fitClass.text);
    expect(texts[0]).toBe("LC2");
    expect(texts.slice(1).every((text) => text.endsWith("S"))).toBe(true);
    expect(texts).toContain("LN2S");
    const rounded = limitsFromMaxMin({ max: inch("1.251"), min: inch("1.250"), nominal: inch("1.25") });
    const matches = inchClassesFor(rounded, { printed: { unit: "in", places: 3 } }).map(({ match }) => match);
    expect(matches[0]).toBe("exact");
    expect(new Set(matches).size).toBeGreaterThan(1);
    expect(matches.lastIndexOf("exact")).toBeLessThan(matches.indexOf("nearest"));
  });

  it("looks a size up apart from the nominal where one is given", () => {
    const bore = limitsFromMaxMin({ max: inch("1.2516"), min: inch("1.2510") });
    // the larger limit stands in for the nominal: an h shaft of grade 6, and the shafts of shaft basis
    expect(inchClassesFor(bore).map(({ fitClass }) => fitClass.text)).not.toContain("LN2");
    expect(inchClassesFor(bore)[0]?.fitClass.text).toBe("LC2");
    expect(inchClassesFor(bore, { size: inch("1.25") })[0]?.fitClass.text).toBe("LN2");
  });

  it.each<[string, unknown, unknown]>([
    ["LIMITS_INVALID", null, undefined],
    ["INCH_SIZE_OUT_OF_RANGE", inchFit(inch(1), "RC1").hole, { size: inch(20) }],
    ["OPTION_INVALID", inchFit(inch(1), "RC1").hole, { kind: "bore" }],
    ["OPTION_INVALID", inchFit(inch(1), "RC1").hole, { printed: 4 }],
    ["OPTION_INVALID", inchFit(inch(1), "RC1").hole, { printed: null }],
    ["OPTION_INVALID", inchFit(inch("5/8"), "LT2").shaft, { printed: { unit: "in", places: 9 } }],
    ["UNIT_UNKNOWN", inchFit(inch("5/8"), "LT2").shaft, { printed: { unit: "ft", places: 4 } }],
    ["LENGTH_INVALID", inchFit(inch(1), "RC1").hole, { size: 1 }],
  ])("refuses with %s (%#)", (code, given, options) => {
    expect(codeOf(() => inchClassesFor(given as never, options as never))).toBe(code);
  });
});

describe("preferred sizes and tolerances", () => {
  it("both series together are sorted, each size once", () => {
    const all = preferredInchSizes().map((one) => one.ticks);
    expect(all).toEqual([...all].sort((left, right) => left - right));
    expect(new Set(all).size).toBe(all.length);
    const parts = new Set(
      [...preferredInchSizes("decimal"), ...preferredInchSizes("fractional")].map((one) => one.ticks),
    );
    expect(new Set(all)).toEqual(parts);
    expect(Object.isFrozen(preferredInchSizes())).toBe(true);
    expect(
      preferredInchTolerances()
        .map((one) => one.ticks / THOU)
        .at(-1),
    ).toBe(250);
    for (const series of ["both", "metric", null, 1]) {
      expect(codeOf(() => preferredInchSizes(series as never))).toBe("OPTION_INVALID");
    }
  });

  it("answers whether a size is preferred, exactly, in any unit", () => {
    expect(isPreferredInchSize(inch("1/64"))).toBe(true);
    expect(isPreferredInchSize(mm("31.75"))).toBe(true);
    expect(isPreferredInchSize(inch("1.25"), "fractional")).toBe(true);
    expect(isPreferredInchSize(inch("1.25"), "decimal")).toBe(false);
    expect(isPreferredInchSize(inch("1.20"), "decimal")).toBe(true);
    expect(isPreferredInchSize(inch("1.20"), "fractional")).toBe(false);
    expect(isPreferredInchSize(lengthOfTicks(inch("1.25").ticks + 1, "in"))).toBe(false);
    expect(isPreferredInchSize(inch(-1))).toBe(false);
    expect(isPreferredInchTolerance(thou("0.15"))).toBe(true);
    expect(isPreferredInchTolerance(mm("0.00381"))).toBe(true);
    expect(isPreferredInchTolerance(thou("0.12"))).toBe(false);
    expect(isPreferredInchTolerance(thou(0))).toBe(false);
  });

  it("finds the nearest, and its neighbours", () => {
    const found = nearestPreferredInchSize(inch("1.31"), "fractional");
    expect([found.nearest, found.below, found.above].map((one) => one.to("in"))).toEqual([1.25, 1.25, 1.5]);
    expect(found.difference.toString()).toBe("-0.06 in");
    expect(found.basis[0]).toMatchObject({ mark: "memory", place: "preferred basic sizes, fractional" });
    // itself, where it is preferred
    const own = nearestPreferredInchSize(inch(3));
    expect([own.nearest, own.below, own.above].map((one) => one.to("in"))).toEqual([3, 3, 3]);
    expect(own.difference.ticks).toBe(0);
    // half way between 6.00 and 6.50
    expect(nearestPreferredInchSize(inch("6.25"), "decimal").nearest.to("in")).toBe(6);
    expect(nearestPreferredInchSize(lengthOfTicks(inch("6.25").ticks + 1, "in"), "decimal").nearest.to("in")).toBe(6.5);
    expect(nearestPreferredInchTolerance(thou("1.5")).nearest.to("thou")).toBe(1.4);
    expect(nearestPreferredInchTolerance(thou("1.51")).nearest.to("thou")).toBe(1.6);
    expect(nearestPreferredInchTolerance(mm("0.1")).nearest.to("thou")).toBe(4);
    expect(nearestPreferredInchTolerance(thou("0.12")).basis[0]?.mark).toBe("memory");
  });

  it("does not reach beyond the ends of the series", () => {
    expect(nearestPreferredInchSize(inch(20)).nearest.to("in")).toBe(20);
    expect(nearestPreferredInchSize(inch("0.010")).nearest.to("in")).toBe(0.01);
    for (const task of [
      () => nearestPreferredInchSize(inch("20.01")),
      () => nearestPreferredInchSize(inch("0.009")),
      () => nearestPreferredInchSize(inch("0.012"), "fractional"),
      () => nearestPreferredInchTolerance(thou("0.09")),
      () => nearestPreferredInchTolerance(thou(251)),
      () => nearestPreferredInchTolerance(thou(-1)),
    ]) {
      expect(codeOf(task)).toBe("INCH_SERIES_OUT_OF_RANGE");
    }
    expect(thrown(() => nearestPreferredInchSize(inch(21))).allowed).toBe("0.01 in to 20 in");
  });
});
