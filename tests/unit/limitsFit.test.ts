import { fitOf, limits, makeFit, mm, um } from "limitsmith";
import type { Limits } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

function member(upper: number, lower: number, designation: string | null = null): Limits {
  return limits({ nominal: mm(40), upper: um(upper), lower: um(lower), designation });
}

describe("fitOf", () => {
  it("has the clearances of ISO 286-1:2010, 3.3, in the unit of the hole's tolerance", () => {
    const fit = fitOf(member(25, 0, "H7"), member(25, 9, "m6"));
    expect(fit.maxClearance.toString()).toBe("16 µm");
    expect(fit.minClearance.toString()).toBe("-25 µm");
    expect(fit.maxInterference.toString()).toBe("25 µm");
    expect(fit.minInterference.toString()).toBe("-16 µm");
    expect(fit.variation.toString()).toBe("41 µm");
    expect(fit.nominal.toString()).toBe("40 mm");
    expect(fit.designation).toBe("H7/m6");
    expect(fit.kind).toBe("transition");
    expect(fit.system).toBe("hole basis");
    expect(fit.basis[0]).toMatchObject({ standard: "ISO 286-1:2010", how: "derived" });
    for (const part of [fit, fit.basis, fit.basis[0], fit.cautions, fit.cautions[0]]) {
      expect(Object.isFrozen(part)).toBe(true);
    }
  });

  it.each([
    // a gap of nothing on one side belongs to clearance, on the other to interference
    [member(25, 0), member(0, -16), "clearance", 41, 0],
    [member(25, 0), member(1, -16), "transition", 41, -1],
    [member(25, 0), member(41, 26), "interference", -1, -41],
    [member(25, 0), member(41, 25), "interference", 0, -41],
    [member(25, 0), member(41, 24), "transition", 1, -41],
    // both extremes at once: no play and no press
    [member(0, 0), member(0, 0), "clearance", 0, 0],
  ] as const)("kind at the boundary (%#): %s", (hole, shaft, kind, most, least) => {
    const fit = fitOf(hole, shaft);
    expect(fit.kind).toBe(kind);
    expect(fit.maxClearance.ticks).toBe(most * 10_000);
    expect(fit.minClearance.ticks).toBe(least * 10_000);
    expect(Object.is(fit.minInterference.ticks, -0) || Object.is(fit.maxInterference.ticks, -0)).toBe(false);
  });

  it.each([
    [member(25, 0), member(-9, -25), "hole basis"],
    [member(34, 9), member(0, -16), "shaft basis"],
    [member(25, 0), member(0, -16), "hole and shaft basis"],
    [member(34, 9), member(-9, -25), "neither"],
  ] as const)("system (%#): %s", (hole, shaft, system) => {
    expect(fitOf(hole, shaft).system).toBe(system);
  });

  it("warns wherever parts can interfere, and only there", () => {
    expect(fitOf(member(25, 0), member(0, -16)).cautions).toEqual([]);
    for (const shaft of [member(1, -16), member(41, 26)]) {
      const [caution, ...more] = fitOf(member(25, 0), shaft).cautions;
      expect(caution?.code).toBe("FIT_MAY_PRESS");
      expect(caution?.says).toContain("qualified engineer");
      expect(more).toEqual([]);
    }
  });

  it("makeFit adds cautions to its own", () => {
    const own = { code: "SEAT", says: "check the seat" };
    expect(makeFit(member(25, 0), member(0, -16), [own]).cautions).toEqual([own]);
    expect(makeFit(member(25, 0), member(41, 26), [own]).cautions.map(({ code }) => code)).toEqual([
      "FIT_MAY_PRESS",
      "SEAT",
    ]);
  });

  it("has no designation where a member has none", () => {
    expect(fitOf(member(25, 0, "H7"), member(0, -16)).designation).toBeNull();
    expect(fitOf(member(25, 0), member(0, -16, "h6")).designation).toBeNull();
  });

  it("refuses different nominals unless told otherwise", () => {
    const other = limits({ nominal: mm("40.001"), upper: um(0), lower: um(-16) });
    const error = thrown(() => fitOf(member(25, 0), other));
    expect(error.code).toBe("NOMINALS_DIFFER");
    expect(error.value).toContain("40.001 mm");
    expect(codeOf(() => fitOf(member(25, 0), other, { nominals: "same" }))).toBe("NOMINALS_DIFFER");
    expect(fitOf(member(25, 0), other, { nominals: "any" }).minClearance.toString()).toBe("-1 µm");
    expect(codeOf(() => fitOf(member(25, 0), other, { nominals: "both" as never }))).toBe("OPTION_INVALID");
    // the same size in another unit is the same nominal
    expect(
      fitOf(
        limits({ nominal: "1 in", upper: um(25), lower: um(0) }),
        limits({ nominal: "25.4 mm", upper: um(0), lower: um(-13) }),
      ).kind,
    ).toBe("clearance");
  });

  it("says which member is wrong", () => {
    expect(thrown(() => fitOf(null as never, member(0, 0))).path).toEqual(["hole"]);
    expect(thrown(() => fitOf(member(0, 0), {} as never)).path).toEqual(["shaft"]);
    expect(thrown(() => fitOf(member(0, 0), { ...member(0, 0), upperDeviation: "9" })).path).toEqual([
      "shaft",
      "upperDeviation",
    ]);
  });
});
