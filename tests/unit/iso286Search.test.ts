import {
  fitOf,
  inch,
  isoClassesFor,
  isoFit,
  isoFitsFor,
  isoLimits,
  limitsFromMaxMin,
  LimitsError,
  lengthOfTicks,
  mm,
  preferredIsoClasses,
  preferredIsoFits,
  rankFits,
  roundLength,
  um,
} from "limitsmith";
import type { ClassesForOptions, FitCandidate, Length, Limits, LimitsMatch, Rounding } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

const LETTERS = "a b c cd d e ef f fg g h js j k m n p r s t u v x y z za zb zc".split(" ");
const GRADES = ["01", "0", ...Array.from({ length: 18 }, (_, index) => String(index + 1))];
const PREFERRED = new Set(preferredIsoClasses().map(({ text }) => text));

/** Every class that has limits at a size, one by one through the plain door. */
function everyClass(size: Length): Limits[] {
  const found: Limits[] = [];
  for (const letter of [...LETTERS.map((one) => one.toUpperCase()), ...LETTERS]) {
    for (const grade of GRADES) {
      try {
        found.push(isoLimits(size, letter + grade));
      } catch (error) {
        if (!(error instanceof LimitsError)) throw error;
      }
    }
  }
  return found;
}

function isHole(designation: string | null): boolean {
  return designation !== null && /^[A-Z]/.test(designation);
}

function isPrinted({ basis }: Limits): boolean {
  return basis[0]?.standard === "ISO 286-2:2010";
}

describe("isoClassesFor", () => {
  // A print says k5 on 25 mm and .9848/.9843 in. Worked by hand from ISO 286-1:2010, Tables 1 and 5:
  // 25 k6 is 25.015/25.002 mm = .984842…/.984330… in, nearest .9848/.9843; 25 k5 is 25.011/25.002 mm =
  // .984685…/.984330… in, which no rounding to four decimals turns into .9848/.9843.
  describe("25 mm printed as .9848/.9843 in", () => {
    const print = limitsFromMaxMin({ max: inch(".9848"), min: inch(".9843"), nominal: mm(25) });
    // the print writes a small letter, so a shaft is meant; among holes 25 H6 (25.013/25.000 mm) reads alike
    const options = { printed: { unit: "in", places: 4 }, kind: "shaft" } as const;

    it("is k6, rounded to nearest", () => {
      const [first] = isoClassesFor(print, options);
      expect(first?.toleranceClass.text).toBe("k6");
      expect(first?.match).toBe("nearest");
      expect(first?.limits.max.toString()).toBe("25.015 mm");
      expect(first?.limits.min.toString()).toBe("25.002 mm");
      // given minus exact: 25.01392 - 25.015 and 25.00122 - 25.002 mm
      expect(first?.maxDifference.toString()).toBe("-0.00108 mm");
      expect(first?.minDifference.toString()).toBe("-0.00078 mm");
    });

    it("says why in words and figures", () => {
      const [first] = isoClassesFor(print, options);
      expect(first?.why).toBe(
        "k6 on 25 mm is 25.015 mm / 25.002 mm, that is .984843 / .984331 in; " +
          "rounded nearest to 4 decimals of in it reads .9848 / .9843",
      );
    });

    it("is not k5, and nothing exactly", () => {
      const texts = isoClassesFor(print, options).map(({ toleranceClass }) => toleranceClass.text);
      expect(texts).not.toContain("k5");
      expect(isoClassesFor(print)).toEqual([]);
    });

    it("stands among holes too where no kind is asked for", () => {
      const { printed } = options;
      const texts = isoClassesFor(print, { printed }).map(({ toleranceClass }) => toleranceClass.text);
      expect(texts).toContain("k6");
      expect(texts).toContain("H6");
    });
  });

  it("finds every class by its own limits, exactly", () => {
    for (const size of [mm("0.8"), mm(2), mm(25), mm("31.75"), mm(300), mm(700), mm(3150)]) {
      const all = everyClass(size);
      const byLimits = new Map<string, string[]>();
      for (const one of all) {
        const key = `${one.max.ticks} ${one.min.ticks}`;
        byLimits.set(key, [...(byLimits.get(key) ?? []), one.designation ?? ""]);
      }
      // one look-up for each different pair of limits at a few of the sizes; a sample of them keeps this quick
      for (const one of all.filter((_, index) => index % 23 === 0)) {
        const found = isoClassesFor(one);
        expect(found.map(({ toleranceClass }) => toleranceClass.text).sort()).toEqual(
          (byLimits.get(`${one.max.ticks} ${one.min.ticks}`) ?? []).sort(),
        );
        for (const match of found) {
          expect(match).toMatchObject({ match: "exact", maxDifference: { ticks: 0 }, minDifference: { ticks: 0 } });
          expect(match.why).toContain("exactly the limits given");
          expect(match.limits).toEqual(isoLimits(size, match.toleranceClass));
        }
      }
    }
  });

  it("finds exactly the classes that rounding turns into the printed limits, by brute force", () => {
    const ways: readonly (readonly [LimitsMatch, Rounding, Rounding])[] = [
      ["nearest", "nearest", "nearest"],
      ["inside", "down", "up"],
      ["outside", "up", "down"],
    ];
    const cases: readonly (readonly [Length, string, "mm" | "in", number])[] = [
      [mm(25), "k6", "in", 4],
      [mm(25), "H8", "in", 3],
      [mm(40), "m6", "mm", 2],
      [mm("31.75"), "js7", "in", 4],
      [mm(120), "H7", "in", 3],
      [inch("1.25"), "f7", "in", 4],
      [mm(8), "zc4", "in", 3],
    ];
    for (const [size, text, unit, places] of cases) {
      const exact = isoLimits(size, text);
      for (const [, forMax, forMin] of ways) {
        const max = roundLength(exact.max, { unit, places, rounding: forMax });
        const min = roundLength(exact.min, { unit, places, rounding: forMin });
        if (max.ticks < min.ticks) continue;
        const wanted = new Map<string, LimitsMatch>();
        for (const one of everyClass(size)) {
          const hit = ways.find(
            ([, high, low]) =>
              roundLength(one.max, { unit, places, rounding: high }).ticks === max.ticks &&
              roundLength(one.min, { unit, places, rounding: low }).ticks === min.ticks,
          );
          const same = one.max.ticks === max.ticks && one.min.ticks === min.ticks;
          if (same || hit !== undefined) wanted.set(one.designation ?? "", same ? "exact" : (hit?.[0] ?? "exact"));
        }
        const found = isoClassesFor(limitsFromMaxMin({ max, min, nominal: size }), { printed: { unit, places } });
        expect(new Map(found.map(({ toleranceClass, match }) => [toleranceClass.text, match]))).toEqual(wanted);
        expect(wanted.has(text)).toBe(true);
        for (const { limits, maxDifference, minDifference } of found) {
          expect(maxDifference.ticks).toBe(max.ticks - limits.max.ticks);
          expect(minDifference.ticks).toBe(min.ticks - limits.min.ticks);
        }
        // the order: match, then preferred, then printed by Part 2, then the rest
        const order = found.map(
          ({ toleranceClass, match, limits }) =>
            ["exact", "nearest", "inside", "outside"].indexOf(match) * 10 +
            (PREFERRED.has(toleranceClass.text) ? 0 : isPrinted(limits) ? 1 : 2),
        );
        expect(order).toEqual([...order].sort((left, right) => left - right));
      }
    }
  });

  it("looks among holes or shafts when asked", () => {
    const h7 = isoLimits(mm(25), "JS7");
    const texts = (options: ClassesForOptions): string[] =>
      isoClassesFor(h7, options).map(({ toleranceClass }) => toleranceClass.text);
    expect(texts({})).toEqual(["JS7", "js7"]);
    expect(texts({ kind: "hole" })).toEqual(["JS7"]);
    expect(texts({ kind: "shaft" })).toEqual(["js7"]);
  });

  it("looks the class up by another size when asked", () => {
    // limit dimensions have no nominal: the maximum stands in for it until the size is said
    const bare = limitsFromMaxMin({ max: mm("40.025"), min: mm("40.009") });
    expect(isoClassesFor(bare).map(({ toleranceClass }) => toleranceClass.text)).toEqual(["h6"]);
    // G6 and m6 are both +25/+9 there: g = -9 and m = +9, IT6 = 16
    expect(isoClassesFor(bare, { size: "40 mm" }).map(({ toleranceClass }) => toleranceClass.text)).toEqual([
      "G6",
      "m6",
    ]);
  });

  it("gives frozen answers", () => {
    const found = isoClassesFor(isoLimits(mm(25), "k6"));
    expect(Object.isFrozen(found)).toBe(true);
    for (const one of found) expect(Object.isFrozen(one)).toBe(true);
  });

  const K6 = isoLimits(mm(25), "k6");

  it.each<[string, unknown, unknown]>([
    ["LIMITS_INVALID", null, undefined],
    ["LIMITS_INVALID", "25 k6", undefined],
    ["ISO_SIZE_OUT_OF_RANGE", { nominal: "0 mm", upperDeviation: "1 mm", lowerDeviation: "0 mm" }, undefined],
    ["ISO_SIZE_OUT_OF_RANGE", K6, { size: mm(4000) }],
    ["LENGTH_INVALID", K6, { size: 25 }],
    ["OPTION_INVALID", K6, { kind: "bore" }],
    ["OPTION_INVALID", K6, { printed: { unit: "in", places: -1 } }],
    ["OPTION_INVALID", K6, { printed: { unit: "in", places: 1.5 } }],
    ["OPTION_INVALID", K6, { printed: { unit: "in", places: 9 } }],
    ["OPTION_INVALID", K6, { printed: { unit: "in" } }],
    ["OPTION_INVALID", K6, { printed: 4 }],
    ["OPTION_INVALID", K6, { printed: null }],
    ["UNIT_UNKNOWN", K6, { printed: { unit: "ft", places: 4 } }],
  ])("refuses with %s (%#)", (code, limits, options) => {
    expect(codeOf(() => isoClassesFor(limits as never, options as never))).toBe(code);
  });
});

/** Every fit of a system at a size, one by one through the plain door. */
function everyFit(size: Length): { hole: Limits; shaft: Limits; system: number }[] {
  const all = everyClass(size);
  const holes = all.filter(({ designation }) => isHole(designation));
  const shafts = all.filter(({ designation }) => !isHole(designation));
  const basicHoles = holes.filter(({ designation }) => /^H\d/.test(designation ?? ""));
  const basicShafts = shafts.filter(({ designation }) => /^h\d/.test(designation ?? ""));
  return [
    ...basicHoles.flatMap((hole) => shafts.map((shaft) => ({ hole, shaft, system: 0 }))),
    ...basicShafts.flatMap((shaft) =>
      holes.filter((hole) => !basicHoles.includes(hole)).map((hole) => ({ hole, shaft, system: 1 })),
    ),
  ];
}

describe("isoFitsFor", () => {
  it("asks for play between 5 and 60 µm at 35 mm and gets the sliding fit first", () => {
    const answer = isoFitsFor({ size: mm(35), clearance: { min: um(5), max: um(60) } });
    expect(answer.fits[0]?.fit.designation).toBe("H7/g6");
    expect(answer.fits[0]?.preferred).toMatchObject({ standard: "ANSI B4.2", name: "sliding", system: "hole basis" });
    expect(answer.fits).toHaveLength(20);
  });

  it.each<[Length, number, number]>([
    [mm(25), 0, 60],
    [mm(25), -60, 0],
    [mm(25), -25, 25],
    [mm("0.9"), 5, 80],
    [mm(700), 20, 400],
    [inch("1.25"), 9, 50],
  ])("finds what brute force finds, in the documented order: %s, %d to %d µm", (size, least, most) => {
    const wanted = { min: um(least), max: um(most) };
    const preferred = new Map(preferredIsoFits().map((one) => [`${one.fit} ${one.system}`, one]));
    const list = everyFit(size)
      .map(({ hole, shaft, system }) => {
        const designation = `${hole.designation ?? ""}/${shaft.designation ?? ""}`;
        const standing = preferred.get(`${designation} ${system === 0 ? "hole basis" : "shaft basis"}`);
        const low = hole.min.ticks - shaft.max.ticks;
        const high = hole.max.ticks - shaft.min.ticks;
        const tier =
          standing === undefined
            ? isPrinted(hole) && isPrinted(shaft)
              ? 2
              : 3
            : standing.standard === "ANSI B4.2"
              ? 0
              : 1;
        return { designation, system, low, high, tier };
      })
      .filter(({ low, high }) => low >= wanted.min.ticks && high <= wanted.max.ticks);
    list.sort((left, right) => {
      const middle = wanted.min.ticks + wanted.max.ticks;
      const byRule =
        left.tier - right.tier ||
        right.high - right.low - (left.high - left.low) ||
        Math.abs(left.high + left.low - middle) - Math.abs(right.high + right.low - middle) ||
        left.system - right.system;
      return byRule !== 0 ? byRule : left.designation < right.designation ? -1 : 1;
    });
    const answer = isoFitsFor({ size, clearance: wanted, most: 5000 });
    expect(list.length).toBeGreaterThan(20);
    expect(answer.found).toBe(list.length);
    expect(answer.fits.map(({ fit }) => fit.designation)).toEqual(list.map(({ designation }) => designation));
    for (const { fit, preferred: standing } of answer.fits.slice(0, 50)) {
      expect(fit).toEqual(isoFit(size, fit.designation ?? ""));
      if (standing !== null) expect(standing.fit).toBe(fit.designation);
    }
  });

  it("works out as many as asked, and counts all", () => {
    const clearance = { min: um(0), max: um(60) };
    const all = isoFitsFor({ size: mm(25), clearance, most: 5000 });
    const few = isoFitsFor({ size: mm(25), clearance, most: 3 });
    expect(few.found).toBe(all.found);
    expect(few.fits).toEqual(all.fits.slice(0, 3));
    expect(isoFitsFor({ size: mm(25), clearance, most: 0 })).toEqual({ found: all.found, fits: [] });
    for (const part of [all, all.fits, all.fits[0]]) expect(Object.isFrozen(part)).toBe(true);
  });

  it("finds nothing where nothing can fit", () => {
    expect(isoFitsFor({ size: mm(25), clearance: { min: um(5), max: um(5) } })).toEqual({ found: 0, fits: [] });
  });

  it.each<[string, unknown]>([
    ["LENGTH_INVALID", undefined],
    ["LENGTH_INVALID", null],
    ["LENGTH_INVALID", {}],
    ["LENGTH_INVALID", { size: 25, clearance: { min: um(0), max: um(1) } }],
    ["LIMITS_INVALID", { size: mm(25) }],
    ["LIMITS_INVALID", { size: mm(25), clearance: null }],
    ["LIMITS_INVALID", { size: mm(25), clearance: { min: um(0) } }],
    ["LENGTH_INVALID", { size: mm(25), clearance: { min: 0, max: um(1) } }],
    ["LIMITS_UPSIDE_DOWN", { size: mm(25), clearance: { min: um(1), max: um(0) } }],
    ["ISO_SIZE_OUT_OF_RANGE", { size: mm(0), clearance: { min: um(0), max: um(1) } }],
    ["OPTION_INVALID", { size: mm(25), clearance: { min: um(0), max: um(1) }, most: -1 }],
    ["OPTION_INVALID", { size: mm(25), clearance: { min: um(0), max: um(1) }, most: 1.5 }],
    ["OPTION_INVALID", { size: mm(25), clearance: { min: um(0), max: um(1) }, most: "20" }],
  ])("refuses with %s (%#)", (code, question) => {
    expect(codeOf(() => isoFitsFor(question as never))).toBe(code);
  });

  it("says where in the question the value stood", () => {
    expect(thrown(() => isoFitsFor({ size: "25", clearance: { min: "0 mm", max: "1 mm" } })).path).toEqual(["size"]);
    expect(thrown(() => isoFitsFor({ size: mm(25), clearance: { min: "0", max: "1 mm" } })).path).toEqual([
      "clearance",
      "min",
    ]);
  });
});

describe("rankFits", () => {
  const one = (designation: string, min: number, max: number, tier = 0, system = 0): FitCandidate => ({
    designation,
    minClearanceTicks: min,
    maxClearanceTicks: max,
    tier,
    system,
  });
  const wanted = { min: lengthOfTicks(0, "um"), max: lengthOfTicks(100, "um") };
  const names = (...candidates: FitCandidate[]): string[] =>
    rankFits(candidates, wanted).map(({ designation }) => designation);

  it("keeps those that always lie in the range, its ends included", () => {
    expect(names(one("in", 0, 100), one("low", -1, 50), one("high", 50, 101))).toEqual(["in"]);
  });

  it("goes by tier, width, nearness to the middle, system and name, in this order", () => {
    expect(names(one("wide", 0, 100, 1), one("narrow", 40, 50, 0))).toEqual(["narrow", "wide"]);
    expect(names(one("narrow", 40, 60), one("wide", 0, 90))).toEqual(["wide", "narrow"]);
    expect(names(one("off", 0, 20), one("middle", 40, 60))).toEqual(["middle", "off"]);
    expect(names(one("above", 60, 80), one("nearer", 25, 45))).toEqual(["nearer", "above"]);
    expect(names(one("a", 40, 60, 0, 1), one("b", 40, 60, 0, 0))).toEqual(["b", "a"]);
    expect(names(one("b", 40, 60), one("a", 40, 60))).toEqual(["a", "b"]);
    expect(names(one("same", 40, 60), one("same", 40, 60))).toEqual(["same", "same"]);
  });

  it("leaves the caller's list alone and freezes its own", () => {
    const list = [one("narrow", 40, 60), one("wide", 0, 100)];
    const ranked = rankFits(list, wanted);
    expect(list.map(({ designation }) => designation)).toEqual(["narrow", "wide"]);
    expect(Object.isFrozen(ranked)).toBe(true);
  });

  it("ranks fits of any limits", () => {
    const fit = fitOf(isoLimits(mm(25), "H7"), isoLimits(mm(25), "g6"));
    const candidate = one("H7/g6", fit.minClearance.ticks, fit.maxClearance.ticks);
    expect(rankFits([candidate], { min: "7 µm", max: "41 µm" })).toEqual([candidate]);
    expect(rankFits([candidate], { min: "8 µm", max: "41 µm" })).toEqual([]);
    expect(rankFits([candidate], { min: "7 µm", max: "40 µm" })).toEqual([]);
  });
});
