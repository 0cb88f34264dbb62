import {
  compareMatches,
  limits,
  limitsFromMaxMin,
  matchLimits,
  memberKinds,
  nearestFits,
  takeFits,
} from "limitsmith/limits";
import type { FitCandidate, Limits, MatchedLimits } from "limitsmith/limits";
import { inch, mm, um } from "limitsmith/units";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";

function fit(designation: string, min: number, max: number, more: Partial<FitCandidate> = {}): FitCandidate {
  return { designation, minClearanceTicks: min * 10_000, maxClearanceTicks: max * 10_000, tier: 0, system: 0, ...more };
}

function order(candidates: readonly FitCandidate[], min: number, max: number): string[] {
  return nearestFits(candidates, { min: um(min), max: um(max) }).map(({ designation }) => designation);
}

describe("nearestFits", () => {
  it("the larger difference counts first, then the sum", () => {
    expect(order([fit("far", 0, 40), fit("near", 4, 34)], 0, 30)).toEqual(["near", "far"]);
    // larger difference 5 in both; sums 9 and 5
    expect(order([fit("nine", 4, 35), fit("five", 0, 35)], 0, 30)).toEqual(["five", "nine"]);
    // the end where it differs does not matter
    expect(order([fit("b", -5, 30), fit("a", 0, 35)], 0, 30)).toEqual(["a", "b"]);
  });

  it("then tier, hole basis, name", () => {
    const same = [
      fit("C", 0, 30, { tier: 1 }),
      fit("B", 0, 30, { system: 1 }),
      fit("D", 0, 30),
      fit("A", 0, 30, { system: 1 }),
    ];
    expect(order(same, 0, 30)).toEqual(["D", "A", "B", "C"]);
  });

  it("keeps all, freezes its answer and leaves what it was given", () => {
    const given = Object.freeze([fit("b", 0, 9), fit("a", 0, 5)]);
    const found = nearestFits(given, { min: um(0), max: um(5) });
    expect(found.map(({ designation }) => designation)).toEqual(["a", "b"]);
    expect(Object.isFrozen(found)).toBe(true);
    expect(given[0]?.designation).toBe("b");
    expect(nearestFits([], { min: um(0), max: um(5) })).toEqual([]);
  });

  it("refuses a range that is none", () => {
    expect(codeOf(() => nearestFits([], { min: um(1), max: um(0) }))).toBe("LIMITS_UPSIDE_DOWN");
    expect(codeOf(() => nearestFits([], { min: um(1) } as never))).toBe("LIMITS_INVALID");
    expect(codeOf(() => nearestFits([], null as never))).toBe("LIMITS_INVALID");
  });
});

describe("takeFits", () => {
  it("works out only the first, and counts them all", () => {
    const made: number[] = [];
    const found = takeFits([1, 2, 3], 2, (one) => {
      made.push(one);
      return one * 10;
    });
    expect(found).toEqual({ found: 3, fits: [10, 20] });
    expect(made).toEqual([1, 2]);
    expect(Object.isFrozen(found) && Object.isFrozen(found.fits)).toBe(true);
  });

  it("takes 20 unless told otherwise, and fewer where there are fewer", () => {
    const many = Array.from({ length: 25 }, (_, index) => index);
    expect(takeFits(many, undefined, (one) => one).fits).toHaveLength(20);
    expect(takeFits(many, 30, (one) => one).fits).toHaveLength(25);
    expect(takeFits(many, 0, (one) => one)).toEqual({ found: 25, fits: [] });
  });

  it.each([-1, 1.5, NaN, Infinity, "3"])("%j is no number of fits", (most) => {
    expect(codeOf(() => takeFits([], most as never, (one) => one))).toBe("OPTION_INVALID");
  });
});

describe("matchLimits", () => {
  const exact = limits({ nominal: mm(35), upper: um(18), lower: um(2), designation: "k6" });
  const printed = (max: string, min: string): Limits =>
    limitsFromMaxMin({ max: inch(max), min: inch(min), nominal: mm(35) });

  // 35.018 mm = 1.378661… in, 35.002 mm = 1.378031… in
  it.each([
    ["1.3787", "1.3780", "nearest"],
    ["1.3786", "1.3781", "inside"],
    ["1.3787", "1.3780", "nearest"],
    ["1.3788", "1.3780", null],
    ["1.3787", "1.3781", null],
  ])("%s/%s is %s", (max, min, match) => {
    expect(matchLimits(printed(max, min), exact, { unit: "in", places: 4 })?.match ?? null).toBe(match);
    expect(matchLimits(printed(max, min), exact)).toBeNull();
  });

  it("names the class, or speaks of the class where it has no name", () => {
    expect(matchLimits(exact, exact)?.why).toBe("k6 on 35 mm is 35.018 mm / 35.002 mm, exactly the limits given");
    const unnamed = limits({ nominal: mm(35), upper: um(18), lower: um(2) });
    expect(matchLimits(unnamed, unnamed)?.why).toContain("the class on 35 mm");
  });

  it("measures from the exact limits to those given", () => {
    const found = matchLimits(printed("1.3787", "1.3780"), exact, { unit: "in", places: 4 });
    // 1.3787 in = 35.01898 mm, 1.3780 in = 35.0012 mm
    expect(found?.maxDifference.toString()).toBe("0.00098 mm");
    expect(found?.minDifference.toString()).toBe("-0.0008 mm");
    expect(found?.limits).toBe(exact);
    expect(Object.isFrozen(found)).toBe(true);
  });

  it.each([4, null, "in", { unit: "in" }, { places: NaN, unit: "in" }, Object.create({ unit: "in", places: 4 })])(
    "%j is no way to print (%#)",
    (rounding) => {
      expect(codeOf(() => matchLimits(printed("1.3787", "1.3780"), exact, rounding as never))).toBe("OPTION_INVALID");
    },
  );
});

describe("compareMatches", () => {
  it("puts exact first, then nearest, inside, outside", () => {
    const of = (match: MatchedLimits["match"]) => ({ match }) as MatchedLimits;
    const mixed = (["outside", "exact", "inside", "nearest", "exact"] as const).map(of);
    expect(mixed.sort(compareMatches).map(({ match }) => match)).toEqual([
      "exact",
      "exact",
      "nearest",
      "inside",
      "outside",
    ]);
    expect(compareMatches(of("exact"), of("exact"))).toBe(0);
  });
});

describe("memberKinds", () => {
  it("is one or both", () => {
    expect(memberKinds(undefined)).toEqual(["hole", "shaft"]);
    expect(memberKinds("hole")).toEqual(["hole"]);
    expect(memberKinds("shaft")).toEqual(["shaft"]);
    for (const kind of ["bore", null, "", 1]) expect(codeOf(() => memberKinds(kind as never))).toBe("OPTION_INVALID");
  });
});
