import {
  fundamentalDeviation,
  inch,
  isoDeviations,
  isoLimits,
  mm,
  parseToleranceClass,
  preferredIsoClasses,
  preferredIsoFits,
  standardTolerance,
} from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

describe("parseToleranceClass", () => {
  it.each([
    ["m6", "m", "IT6", "shaft"],
    ["H7", "H", "IT7", "hole"],
    ["js01", "js", "IT01", "shaft"],
    ["JS0", "JS", "IT0", "hole"],
    ["zc18", "zc", "IT18", "shaft"],
    ["CD10", "CD", "IT10", "hole"],
    ["k5", "k", "IT5", "shaft"],
    ["K5", "K", "IT5", "hole"],
  ])("%s", (text, letter, grade, kind) => {
    const cls = parseToleranceClass(text);
    expect(cls).toEqual({ text, letter, grade, kind });
    expect(Object.isFrozen(cls)).toBe(true);
    expect(parseToleranceClass(` ${text}\t`)).toEqual(cls);
    expect(parseToleranceClass(cls)).toEqual(cls);
    expect(parseToleranceClass(structuredClone(cls))).toEqual(cls);
  });

  it("goes by the text of a class alone", () => {
    const forged = { text: "h6", letter: "H", grade: "IT1", kind: "hole" } as const;
    expect(parseToleranceClass(forged)).toEqual({ text: "h6", letter: "h", grade: "IT6", kind: "shaft" });
  });

  it.each([
    ["CLASS_MALFORMED", ""],
    ["CLASS_MALFORMED", " "],
    ["CLASS_MALFORMED", "m"],
    ["CLASS_MALFORMED", "6"],
    ["CLASS_MALFORMED", "6m"],
    ["CLASS_MALFORMED", "m 6"],
    ["CLASS_MALFORMED", "m6.5"],
    ["CLASS_MALFORMED", "m-6"],
    ["CLASS_MALFORMED", "abc6"],
    ["CLASS_MALFORMED", "m100"],
    ["CLASS_MALFORMED", "H7/m6"],
    ["CLASS_MALFORMED", "m6m6"],
    ["CLASS_MALFORMED", "m\u0666"], // an Arabic digit
    ["CLASS_MALFORMED", "\u041c6"], // a Cyrillic letter that looks like M
    ["CLASS_MALFORMED", "\u212a6"], // the Kelvin sign
    ["CLASS_MALFORMED", "\u017f6"], // the long s
    ["CLASS_LETTER_UNKNOWN", "i6"],
    ["CLASS_LETTER_UNKNOWN", "l6"],
    ["CLASS_LETTER_UNKNOWN", "o6"],
    ["CLASS_LETTER_UNKNOWN", "q6"],
    ["CLASS_LETTER_UNKNOWN", "w6"],
    ["CLASS_LETTER_UNKNOWN", "I6"],
    ["CLASS_LETTER_UNKNOWN", "Js6"],
    ["CLASS_LETTER_UNKNOWN", "jS6"],
    ["CLASS_LETTER_UNKNOWN", "Zc6"],
    ["CLASS_LETTER_UNKNOWN", "ab6"],
    ["CLASS_LETTER_UNKNOWN", "IT6"],
    ["CLASS_GRADE_UNKNOWN", "m19"],
    ["CLASS_GRADE_UNKNOWN", "m06"],
    ["CLASS_GRADE_UNKNOWN", "m00"],
    ["CLASS_GRADE_UNKNOWN", "m99"],
  ])("refuses with %s: %j", (code, text) => {
    const error = thrown(() => parseToleranceClass(text));
    expect(error.code).toBe(code);
    expect(error.value).toBe(text.trim());
    expect(error.allowed).not.toBeNull();
  });

  it.each([undefined, null, 6, {}, [], ["m6"], { text: 6 }, Object.create({ text: "m6" })])(
    "refuses what is no class: %j",
    (value) => {
      expect(codeOf(() => parseToleranceClass(value as never))).toBe("CLASS_MALFORMED");
    },
  );

  it("gives the same answer however often it is asked, also after a refusal", () => {
    expect(codeOf(() => parseToleranceClass("constructor"))).toBe("CLASS_MALFORMED");
    expect(codeOf(() => parseToleranceClass("m19"))).toBe("CLASS_GRADE_UNKNOWN");
    expect(codeOf(() => parseToleranceClass("m19"))).toBe("CLASS_GRADE_UNKNOWN");
    expect(parseToleranceClass("m6")).toBe(parseToleranceClass("m6"));
  });
});

describe("isoLimits and isoDeviations", () => {
  it("look an inch size up by its exact millimetres", () => {
    // 50 mm and a hair: 1.9685039… in is just over, 1.9685 in is just under
    expect(isoDeviations("1.9685 in", "p6")).toEqual({ upperDeviationUm: 42, lowerDeviationUm: 26 });
    expect(isoDeviations("1.968504 in", "p6")).toEqual({ upperDeviationUm: 51, lowerDeviationUm: 32 });
  });

  it("keep the unit of the size and give deviations in µm", () => {
    const limits = isoLimits(inch("1.25"), "k6");
    expect([limits.nominal.unit, limits.max.unit, limits.upperDeviation.unit, limits.tolerance.unit]).toEqual([
      "in",
      "in",
      "um",
      "um",
    ]);
    expect(limits.designation).toBe("k6");
  });

  it("give frozen results that cannot be spoiled for the next caller", () => {
    const um = isoDeviations(mm(40), "m6");
    expect(Object.isFrozen(um)).toBe(true);
    const limits = isoLimits(mm(40), "m6");
    for (const part of [limits, limits.basis, ...limits.basis]) expect(Object.isFrozen(part)).toBe(true);
  });

  it("take a class once parsed, a text, and any length", () => {
    const m6 = parseToleranceClass("m6");
    const wanted = { upperDeviationUm: 25, lowerDeviationUm: 9 };
    for (const size of [mm(40), "40 mm", { ticks: 400_000_000, unit: "in" as const }]) {
      expect(isoDeviations(size, m6)).toEqual(wanted);
      expect(isoDeviations(size, " m6 ")).toEqual(wanted);
    }
  });

  it.each([
    ["UNIT_MISSING", "40", "m6", undefined],
    ["LENGTH_INVALID", 40, "m6", undefined],
    ["CLASS_MALFORMED", "40 mm", "", undefined],
    ["CLASS_LETTER_UNKNOWN", "40 mm", "i6", undefined],
    ["CLASS_GRADE_UNKNOWN", "40 mm", "m19", undefined],
    ["ISO_SIZE_OUT_OF_RANGE", "0 mm", "m6", undefined],
    ["ISO_SIZE_OUT_OF_RANGE", "-40 mm", "m6", undefined],
    ["ISO_SIZE_OUT_OF_RANGE", "3150.0000001 mm", "m6", undefined],
    ["ISO_GRADE_NOT_DEFINED", "501 mm", "h01", undefined],
    ["ISO_GRADE_NOT_DEFINED", "1 mm", "h14", undefined],
    ["ISO_DEVIATION_NOT_DEFINED", "20 mm", "t6", undefined],
    ["ISO_CLASS_NOT_DEFINED", "20 mm", "j9", undefined],
    ["OPTION_INVALID", "40 mm", "m6", { edition: "2025" }],
    ["OPTION_INVALID", "40 mm", "m6", { edition: 2010 }],
    ["OPTION_INVALID", "40 mm", "m6", { jsRounding: "odd" }],
  ])("refuse with %s: %j %s %j", (code, size, cls, options) => {
    expect(codeOf(() => isoLimits(size as never, cls, options as never))).toBe(code);
    expect(codeOf(() => isoDeviations(size as never, cls, options as never))).toBe(code);
  });

  it("options say no more than they say", () => {
    const plain = isoLimits(mm(40), "m6");
    expect(isoLimits(mm(40), "m6", {})).toEqual(plain);
    expect(isoLimits(mm(40), "m6", { edition: "2010", jsRounding: "exact" })).toEqual(plain);
    expect(isoLimits(mm(40), "m6", { edition: "1988", jsRounding: "even" })).toEqual(plain);
  });
});

describe("the basis", () => {
  it("tells span, grade, fundamental deviation and the other limit", () => {
    const { basis } = isoLimits(mm(40), "m6");
    expect(basis.map(({ standard, place, how }) => `${standard} | ${place} | ${how}`)).toEqual([
      "ISO 286-2:2010 | Table 25 | tabulated",
      "ISO 286-1:2010 | Table 1, over 30 up to 50 mm | tabulated",
      "ISO 286-1:2010 | Table 5, over 30 up to 50 mm | tabulated",
      "ISO 286-1:2010 | 4.3 (limit deviations) | derived",
    ]);
    expect(basis.map(({ says }) => says).join("; ")).toContain("IT6 = 16 µm; m6: ei = +9 µm; es = ei + IT6 = 25 µm");
  });

  it("says so where Part 2 does not print the class", () => {
    const { basis } = isoLimits(mm(40), "m12");
    expect(basis[0]).toMatchObject({ standard: "ISO 286-1:2010", how: "derived" });
    expect(basis[0]?.says).toContain("m12 lies outside the span that ISO 286-2:2010 prints");
  });

  it("names the intermediate step of the letters that go by it", () => {
    expect(isoLimits(mm(40), "s6").basis[2]?.place).toBe("Table 5, over 30 up to 40 mm");
    expect(isoLimits(mm(40), "a11").basis[2]?.place).toBe("Table 4, over 30 up to 40 mm");
    expect(isoLimits(mm(40), "S6").basis[2]?.place).toContain("Table 3, over 30 up to 40 mm");
    expect(isoLimits(mm(2), "s6").basis[2]?.place).toBe("Table 5, up to 3 mm");
  });

  it("shows delta where it is used, and only there", () => {
    expect(isoLimits(mm(20), "P7").basis[2]?.says).toBe("P7: ES = -22 + delta 8 = -14 µm");
    expect(isoLimits(mm(20), "P8").basis[2]?.says).toBe("P8: ES = -22 µm");
  });

  it("carries how sure the copy is", () => {
    const marks = (size: string, cls: string): (string | undefined)[] =>
      isoLimits(size, cls)
        .basis.slice(1, 3)
        .map(({ mark }) => mark);
    expect(marks("40 mm", "m6")).toEqual(["two-sources", "two-sources"]);
    // the rows of cd, ef, fg over 10 mm were never seen in print
    expect(marks("12 mm", "cd8")).toEqual(["two-sources", "memory"]);
    expect(marks("9 mm", "cd8")).toEqual(["two-sources", "two-sources"]);
    expect(marks("2800 mm", "h4")).toEqual(["memory", "two-sources"]);
    expect(marks("2000 mm", "h4")).toEqual(["formula", "two-sources"]);
  });

  it("tells of an even grade when one was asked for and used", () => {
    const even = isoLimits(mm(8), "js7", { jsRounding: "even" });
    expect(even.basis.map(({ standard }) => standard)).toContain("ISO 286-1:1988");
    expect(even.tolerance.toString()).toBe("14 µm");
    expect(isoLimits(mm(8), "js6", { jsRounding: "even" }).basis).toEqual(isoLimits(mm(8), "js6").basis);
  });
});

describe("what to take instead", () => {
  it.each([
    ["t6", "20 mm", "practice takes u here"],
    ["T6", "20 mm", "practice takes U here"],
    ["v6", "12 mm", "practice takes x here"],
    ["V6", "12 mm", "practice takes X here"],
    ["y6", "18 mm", "practice takes z here"],
    ["Y6", "18 mm", "practice takes Z here"],
  ])("%s at %s: %s", (cls, size, words) => {
    const error = thrown(() => isoLimits(size, cls));
    expect(error.code).toBe("ISO_DEVIATION_NOT_DEFINED");
    expect(error.allowed).toContain(words);
    expect(error.allowed).toContain("common practice");
  });

  it("gives no such advice where a letter has ended", () => {
    expect(thrown(() => isoLimits("600 mm", "v6")).allowed).not.toContain("practice");
    expect(thrown(() => isoLimits("600 mm", "za6")).allowed).toBe("za up to 500 mm");
  });

  it.each([
    ["t6", "20 mm", "t over 24 up to 3150 mm"],
    ["cd8", "60 mm", "cd up to 50 mm"],
    ["a11", "1 mm", "a over 1 up to 500 mm"],
    ["K9", "20 mm", "K3 to K8"],
    ["N9", "0.5 mm", "N to IT8"],
    ["P2", "20 mm", "P in IT3 and coarser"],
    ["j9", "20 mm", "js in any grade"],
    ["J9", "20 mm", "JS in any grade"],
    ["h0", "600 mm", "IT1 to IT18"],
    ["h14", "1 mm", "IT01 to IT13"],
  ])("%s at %s: says what is defined", (cls, size, words) => {
    expect(thrown(() => isoLimits(size, cls)).allowed).toContain(words);
  });

  it("edition 1988 says how far cd, ef and fg go in each edition", () => {
    const error = thrown(() => isoLimits("12 mm", "fg6", { edition: "1988" }));
    expect(error.allowed).toBe("fg up to 10 mm; to 50 mm in edition 2010");
  });
});

describe("standardTolerance", () => {
  it.each([
    ["35 mm", "IT7", "25 µm"],
    ["1.25 in", "IT6", "16 µm"],
    ["2 mm", "IT01", "0.3 µm"],
    ["3150 mm", "IT18", "33000 µm"],
  ] as const)("%s %s: %s", (size, grade, text) => {
    const found = standardTolerance(size, grade);
    expect(found.grade).toBe(grade);
    expect(found.tolerance.toString()).toBe(text);
    expect(found.basis).toHaveLength(1);
    for (const part of [found, found.basis, found.basis[0]]) expect(Object.isFrozen(part)).toBe(true);
  });

  it.each([
    ["CLASS_GRADE_UNKNOWN", "40 mm", "IT19"],
    ["CLASS_GRADE_UNKNOWN", "40 mm", "7"],
    ["CLASS_GRADE_UNKNOWN", "40 mm", "it7"],
    ["CLASS_GRADE_UNKNOWN", "40 mm", "toString"],
    ["CLASS_GRADE_UNKNOWN", "40 mm", undefined],
    ["ISO_GRADE_NOT_DEFINED", "600 mm", "IT0"],
    ["ISO_GRADE_NOT_DEFINED", "1 mm", "IT14"],
    ["ISO_SIZE_OUT_OF_RANGE", "0 mm", "IT7"],
    ["LENGTH_INVALID", 40, "IT7"],
  ])("refuses with %s: %j %s", (code, size, grade) => {
    expect(codeOf(() => standardTolerance(size as never, grade as never))).toBe(code);
  });
});

describe("fundamentalDeviation", () => {
  it.each([
    ["35 mm", "m6", "lower", "9 µm", "0 µm"],
    ["35 mm", "P7", "upper", "-17 µm", "9 µm"],
    ["35 mm", "P8", "upper", "-26 µm", "0 µm"],
    ["35 mm", "g6", "upper", "-9 µm", "0 µm"],
    ["35 mm", "G7", "lower", "9 µm", "0 µm"],
    ["35 mm", "js7", "both", "12.5 µm", "0 µm"],
    ["35 mm", "H7", "lower", "0 µm", "0 µm"],
    ["20 mm", "K3", "upper", "-0.5 µm", "1.5 µm"],
  ])("%s %s", (size, cls, limit, deviation, delta) => {
    const found = fundamentalDeviation(size, cls);
    expect(found.limit).toBe(limit);
    expect(found.deviation.toString()).toBe(deviation);
    expect(found.delta.toString()).toBe(delta);
    expect(found.basis[0]?.standard).toBe("ISO 286-1:2010");
    for (const part of [found, found.basis, found.basis[0]]) expect(Object.isFrozen(part)).toBe(true);
  });

  it("M6 over 250 to 315 mm stands as printed", () => {
    expect(fundamentalDeviation("300 mm", "M6").deviation.toString()).toBe("-9 µm");
  });

  it.each([
    ["ISO_DEVIATION_NOT_DEFINED", "12 mm", "cd8", { edition: "1988" }],
    ["ISO_CLASS_NOT_DEFINED", "12 mm", "j9", undefined],
    ["ISO_GRADE_NOT_DEFINED", "600 mm", "h0", undefined],
    ["CLASS_MALFORMED", "12 mm", "H7/m6", undefined],
    ["OPTION_INVALID", "12 mm", "m6", { edition: "1999" }],
  ])("refuses with %s: %s %s", (code, size, cls, options) => {
    expect(codeOf(() => fundamentalDeviation(size, cls, options as never))).toBe(code);
  });
});

describe("the preferred lists", () => {
  it("are frozen and always the same", () => {
    for (const list of [preferredIsoClasses, preferredIsoFits]) {
      expect(list()).toBe(list());
      expect(Object.isFrozen(list())).toBe(true);
      for (const one of list()) expect(Object.isFrozen(one)).toBe(true);
    }
  });

  it("hold classes and fits that the system knows", () => {
    for (const { text, kind } of preferredIsoClasses()) expect(parseToleranceClass(text).kind).toBe(kind);
    for (const { fit, system } of preferredIsoFits()) {
      const [hole = "", shaft = ""] = fit.split("/");
      expect(parseToleranceClass(hole).kind).toBe("hole");
      expect(parseToleranceClass(shaft).kind).toBe("shaft");
      expect(system === "hole basis" ? hole.startsWith("H") : shaft.startsWith("h")).toBe(true);
    }
  });
});
