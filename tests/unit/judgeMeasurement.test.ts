import { isoLimits, judgeMeasurement, lengthOfTicks, limits, limitsFromMaxMin } from "limitsmith";
import type { JudgeOptions, Judgement, LengthLike, LimitsLike, Verdict } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

const BORE = limitsFromMaxMin({ max: "10.010 mm", min: "9.990 mm" });
const SIMPLE: JudgeOptions = { rule: "simple acceptance" };
const GUARDED: JudgeOptions = { rule: "ISO 14253-1:2013", uncertainty: "2 µm" };
const PROBABLE: JudgeOptions = { rule: "ISO 14253-1:2017", uncertainty: "2 µm" };

function expectDeepFrozen(value: unknown): void {
  if (typeof value !== "object" || value === null) return;
  expect(Object.isFrozen(value)).toBe(true);
  for (const inner of Object.values(value)) expectDeepFrozen(inner);
}

describe("judgeMeasurement", () => {
  it.each<[JudgeOptions, string, Verdict]>([
    // without a guard band a limit belongs to the good parts, and a tick beyond it does not
    [SIMPLE, "10.0100000", "pass"],
    [SIMPLE, "10.0100001", "fail"],
    [SIMPLE, "9.9900000", "pass"],
    [SIMPLE, "9.9899999", "fail"],
    [SIMPLE, "10", "pass"],
    [SIMPLE, "0", "fail"],
    [SIMPLE, "-10", "fail"],
    // ISO 14253-1:2013 (memory): inside by at least U, outside by at least U, else neither
    [GUARDED, "10.0080000", "pass"],
    [GUARDED, "10.0080001", "not proven"],
    [GUARDED, "10.0100000", "not proven"],
    [GUARDED, "10.0119999", "not proven"],
    [GUARDED, "10.0120000", "fail"],
    [GUARDED, "10.0120001", "fail"],
    [GUARDED, "9.9920000", "pass"],
    [GUARDED, "9.9919999", "not proven"],
    [GUARDED, "9.9880001", "not proven"],
    [GUARDED, "9.9880000", "fail"],
    [GUARDED, "9.9879999", "fail"],
    // ISO 14253-1:2017 (memory): 0.83 U, 1.66 µm here
    [PROBABLE, "10.0083400", "pass"],
    [PROBABLE, "10.0083401", "not proven"],
    [PROBABLE, "10.0116599", "not proven"],
    [PROBABLE, "10.0116600", "fail"],
    [PROBABLE, "9.9916600", "pass"],
    [PROBABLE, "9.9916599", "not proven"],
    [PROBABLE, "9.9883401", "not proven"],
    [PROBABLE, "9.9883400", "fail"],
  ])("%o: %s mm", (options, reading, verdict) => {
    expect(judgeMeasurement(BORE, `${reading} mm`, options).verdict).toBe(verdict);
  });

  it("the reading is never rounded to the limits' decimals", () => {
    const coarse = limitsFromMaxMin({ max: "12.2 mm", min: "12 mm" });
    expect(judgeMeasurement(coarse, "12.2000001 mm", SIMPLE).verdict).toBe("fail");
    expect(judgeMeasurement(coarse, "12.21 mm", SIMPLE).verdict).toBe("fail");
    expect(judgeMeasurement(coarse, lengthOfTicks(122_000_000, "mm"), SIMPLE).verdict).toBe("pass");
  });

  it("limits, reading and uncertainty each in its own unit", () => {
    const pin = limitsFromMaxMin({ max: ".5000 in", min: ".4995 in" });
    expect(judgeMeasurement(pin, "12.7 mm", SIMPLE).verdict).toBe("pass");
    expect(judgeMeasurement(pin, "12.7000001 mm", SIMPLE).verdict).toBe("fail");
    expect(judgeMeasurement(pin, ".49995 in", { rule: "ISO 14253-1:2013", uncertainty: "1.27 µm" }).verdict).toBe(
      "pass",
    );
    expect(judgeMeasurement(pin, ".49996 in", { rule: "ISO 14253-1:2013", uncertainty: "1.27 µm" }).verdict).toBe(
      "not proven",
    );
    const { guardBand, acceptance, margin } = judgeMeasurement(pin, ".4998 in", {
      rule: "ISO 14253-1:2013",
      uncertainty: "1.27 µm",
    });
    // 1.27 µm is 50 µin
    expect(guardBand.toString()).toBe("0.00005 in");
    expect(acceptance?.max.toString()).toBe("0.49995 in");
    expect(margin.toString()).toBe("0.0002 in");
  });

  it("says the zones and the room to the nearer limit", () => {
    const judged = judgeMeasurement(BORE, "10.009 mm", GUARDED);
    expect(judged.acceptance?.max.toString()).toBe("10.008 mm");
    expect(judged.acceptance?.min.toString()).toBe("9.992 mm");
    expect(judged.rejection.max.toString()).toBe("10.012 mm");
    expect(judged.rejection.min.toString()).toBe("9.988 mm");
    expect(judged.guardBand.ticks).toBe(20_000);
    expect(judged.reading.toString()).toBe("10.009 mm");
    expect(judged.rule).toBe("ISO 14253-1:2013");
    for (const [reading, ticks] of [
      ["10.009 mm", 10_000],
      ["9.991 mm", 10_000],
      ["10 mm", 100_000],
      ["10.010 mm", 0],
      ["10.011 mm", -10_000],
      ["9.980 mm", -100_000],
    ] as const) {
      expect(judgeMeasurement(BORE, reading, SIMPLE).margin.ticks).toBe(ticks);
    }
  });

  it("simple acceptance has no guard band, whatever the uncertainty", () => {
    const judged = judgeMeasurement(BORE, "10.010 mm", { ...SIMPLE, uncertainty: "5 µm" });
    expect(judged.verdict).toBe("pass");
    expect(judged.guardBand.ticks).toBe(0);
    expect(judged.acceptance?.max.ticks).toBe(BORE.max.ticks);
    expect(judged.rejection.min.ticks).toBe(BORE.min.ticks);
  });

  it("an uncertainty of nothing is simple acceptance", () => {
    for (const rule of ["ISO 14253-1:2013", "ISO 14253-1:2017"] as const) {
      const verdict = (reading: LengthLike): Verdict =>
        judgeMeasurement(BORE, reading, { rule, uncertainty: "0 mm" }).verdict;
      expect(verdict("10.010 mm")).toBe("pass");
      expect(verdict("9.990 mm")).toBe("pass");
      expect(verdict("10.0100001 mm")).toBe("fail");
      expect(verdict("9.9899999 mm")).toBe("fail");
    }
  });

  it("guard bands that meet leave one size, and wider ones none", () => {
    const meeting = judgeMeasurement(BORE, "10 mm", { rule: "ISO 14253-1:2013", uncertainty: "10 µm" });
    expect(meeting.acceptance?.max.toString()).toBe("10 mm");
    expect(meeting.acceptance?.min.toString()).toBe("10 mm");
    expect(meeting.verdict).toBe("pass");
    const crossing = judgeMeasurement(BORE, "10 mm", { rule: "ISO 14253-1:2013", uncertainty: "10.0001 µm" });
    expect(crossing.acceptance).toBeNull();
    expect(crossing.verdict).toBe("not proven");
    expect(
      judgeMeasurement(BORE, "10.0200001 mm", { rule: "ISO 14253-1:2013", uncertainty: "10.0001 µm" }).verdict,
    ).toBe("fail");
  });

  it("a tolerance of nothing takes its one size", () => {
    const exact = limits({ nominal: "10 mm", upper: "0 mm", lower: "0 mm" });
    expect(judgeMeasurement(exact, "10 mm", SIMPLE).verdict).toBe("pass");
    expect(judgeMeasurement(exact, "10.0000001 mm", SIMPLE).verdict).toBe("fail");
  });

  it("names the rule, and whence it is known", () => {
    const steps = [SIMPLE, GUARDED, PROBABLE].map((options) => judgeMeasurement(BORE, "10 mm", options).basis[0]);
    expect(steps.map((step) => step?.mark)).toEqual(["two-sources", "memory", "memory"]);
    expect(steps.slice(1).map((step) => step?.standard)).toEqual(["ISO 14253-1:2013", "ISO 14253-1:2017"]);
    expect(steps[2]?.place).toContain("0.83 U");
  });

  it("takes limits and readings that travelled, and its answer travels", () => {
    const seat = isoLimits("35 mm", "k6");
    const direct = judgeMeasurement(seat, "35.0181 mm", GUARDED);
    const sent = JSON.parse(JSON.stringify(seat)) as LimitsLike;
    expect(judgeMeasurement(sent, structuredClone(lengthOfTicks(350_181_000, "mm")), GUARDED)).toEqual(direct);
    const back = JSON.parse(JSON.stringify(direct)) as Judgement;
    expect(back.verdict).toBe(direct.verdict);
    expect(back.rejection.max).toBe("35.02 mm");
    expectDeepFrozen(direct);
  });
});

describe("judgeMeasurement refuses", () => {
  it.each<[string, unknown]>([
    ["no options", undefined],
    ["null", null],
    ["no rule", {}],
    ["another rule", { rule: "ISO 14253-1" }],
    ["the name of an own key of every object", { rule: "constructor" }],
    ["capitals", { rule: "SIMPLE ACCEPTANCE" }],
    ["no uncertainty, 2013", { rule: "ISO 14253-1:2013" }],
    ["no uncertainty, 2017", { rule: "ISO 14253-1:2017" }],
    ["a negative uncertainty", { rule: "ISO 14253-1:2013", uncertainty: "-1 µm" }],
  ])("%s", (_name, options) => {
    const error = thrown(() => judgeMeasurement(BORE, "10 mm", options as JudgeOptions));
    expect(error.code).toBe("OPTION_INVALID");
  });

  it("an unknown rule with what there is, an uncertainty with its path", () => {
    expect(thrown(() => judgeMeasurement(BORE, "10 mm", { rule: "guess" } as unknown as JudgeOptions)).allowed).toBe(
      "simple acceptance, ISO 14253-1:2013, ISO 14253-1:2017",
    );
    for (const uncertainty of [undefined, "-1 µm", "2"]) {
      const options = { rule: "ISO 14253-1:2013", uncertainty } as JudgeOptions;
      expect(thrown(() => judgeMeasurement(BORE, "10 mm", options)).path).toEqual(["uncertainty"]);
    }
  });

  it("a reading without a unit, and what is no reading", () => {
    const error = thrown(() => judgeMeasurement(BORE, "10.005", SIMPLE));
    expect([error.code, error.path]).toEqual(["UNIT_MISSING", ["reading"]]);
    for (const wrong of [10.005, null, undefined, {}, { ticks: 1.5, unit: "mm" }]) {
      const refused = thrown(() => judgeMeasurement(BORE, wrong as unknown as LengthLike, SIMPLE));
      expect(refused.code).toMatch(/^LENGTH_/);
      expect(refused.path).toEqual(["reading"]);
    }
  });

  it("what is no limits", () => {
    for (const wrong of [null, undefined, "10 mm", {}]) {
      expect(codeOf(() => judgeMeasurement(wrong as LimitsLike, "10 mm", SIMPLE))).toBe("LIMITS_INVALID");
    }
  });
});
