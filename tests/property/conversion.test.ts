import { asLimits, attempt, convertLimits, judgeMeasurement, lengthOfTicks, limits, readCallout } from "limitsmith";
import type { ConvertedLimits, DecisionRule, LengthUnit, Limits, LimitsLike, Verdict } from "limitsmith";
import { Decimal } from "decimal.js";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { Exact, TICKS } from "./arbitraries.js";

const RUNS = { numRuns: 3000 };

type System = "mm" | "in";

/** Total tolerances that the rule knows, spread over the decades, with the ends of its rows and their neighbours. */
function tolerance(to: System, step: number): fc.Arbitrary<number> {
  // to mm: .00001 in to just below 1 in; to inches: from 25 millionths of an inch on
  const [least, most] = to === "mm" ? [2540, 254_000_000 - 1] : [6350, 6_350_000_000];
  const ends = Array.from({ length: 7 }, (_, decade) => least * 10 ** decade).flatMap((end) => [
    end - step,
    end,
    end + step,
  ]);
  return fc
    .oneof(
      fc.integer({ min: least, max: most }),
      fc.integer({ min: least, max: 254_000 }),
      fc.integer({ min: least, max: 2_540_000 }),
      fc.constantFrom(...ends),
      // as drawings have them: whole micrometres, ten-thousandths of an inch
      fc.integer({ min: 1, max: 600 }).map((steps) => steps * (to === "mm" ? 25_400 : 10_000)),
    )
    .map((ticks) => ticks - (ticks % step))
    .filter((ticks) => ticks >= least && ticks <= most);
}

interface Asked {
  readonly original: Limits;
  readonly to: System;
}

/** Limits in the one system, whole multiples of a number of ticks, to be converted to the other one. */
function limitsOf(to: System, step: number): fc.Arbitrary<Asked> {
  const units: readonly LengthUnit[] = to === "mm" ? ["in", "thou", "uin"] : ["mm", "um"];
  const whole = (ticks: number): number => ticks - (ticks % step);
  return fc
    .record({
      nominal: fc.oneof(
        fc.integer({ min: -1_000_000_000, max: 31_500_000_000 }),
        fc.integer({ min: 0, max: 40_000 }).map((steps) => steps * (to === "mm" ? 254_000 : 100_000)),
      ),
      width: tolerance(to, step),
      offset: fc.oneof(fc.constant(0), fc.integer({ min: -5_000_000, max: 5_000_000 })),
      unit: fc.constantFrom(...units),
    })
    .map(({ nominal, width, offset, unit }) => ({
      to,
      original: limits({
        nominal: lengthOfTicks(whole(nominal), unit),
        upper: lengthOfTicks(whole(offset) + width, unit),
        lower: lengthOfTicks(whole(offset), unit),
      }),
    }));
}

const system = fc.constantFrom<System>("mm", "in");
/** As a drawing writes them: they end in decimals of their own unit (127 ticks are half a millionth of an inch). */
const drawn = system.chain((to) => limitsOf(to, to === "mm" ? 127 : 1));
/** Any whole ticks: an inch size with the deviations of an ISO class does not end in inches. */
const anyTicks = system.chain((to) => limitsOf(to, 1));

/** The answer where there is one: inside rounding may leave no size, which is checked on its own. */
function converted({ original, to }: Asked, method: "A" | "B", places?: number): ConvertedLimits | null {
  const answer = attempt(() => convertLimits(original, to, { method, ...(places === undefined ? {} : { places }) }));
  if (answer.ok) return answer.value;
  expect(answer.error.code).toBe("ROUNDING_COLLAPSES");
  return null;
}

/** A number of ticks in the other unit, rounded to places, back in ticks: by decimal.js alone. */
function roundedTicks(ticks: number, to: System, places: number, rounding: Decimal.Rounding): Decimal {
  return new Exact(ticks).div(TICKS[to]).toDecimalPlaces(places, rounding).mul(TICKS[to]);
}

/** True where both limits end in decimals of the system that they are converted from. */
function isWritten({ max, min }: Limits, to: System): boolean {
  return to === "in" || (max.ticks % 127 === 0 && min.ticks % 127 === 0);
}

/** Decimals by the published rule, worked out on its own: table to mm, bound of 2 per cent to inches. */
function ruledPlaces(tolerance: number, to: System): number {
  if (to === "mm") {
    // .00001 in: five decimals, and one fewer for each decade
    return 5 - Exact.floor(Exact.log10(new Exact(tolerance).div(2540))).toNumber();
  }
  let places = 0;
  while (new Exact(TICKS.in).div(new Exact(10).pow(places)).gt(new Exact(tolerance).div(25))) places++;
  return places;
}

describe.each([
  { name: "limits as drawings have them", asked: drawn, step: 127 },
  { name: "limits of any whole ticks", asked: anyTicks, step: 1 },
])("convertLimits: $name", ({ asked, step }) => {
  it("method B is always inside the exact limits, by the rule and by any decimals", () => {
    let answered = 0;
    fc.assert(
      fc.property(asked, fc.option(fc.integer({ min: 0, max: 6 }), { nil: undefined }), (one, places) => {
        const answer = converted(one, "B", places);
        if (answer === null) return;
        answered++;
        const { limits: got, maxShift, minShift, oversteps, lost } = answer;
        expect(got.max.ticks).toBeLessThanOrEqual(one.original.max.ticks);
        expect(got.min.ticks).toBeGreaterThanOrEqual(one.original.min.ticks);
        expect(maxShift.ticks).toBeLessThanOrEqual(0);
        expect(minShift.ticks).toBeGreaterThanOrEqual(0);
        expect(lost.ticks).toBeGreaterThanOrEqual(0);
        expect(oversteps).toBe(false);
      }),
      RUNS,
    );
    expect(answered).toBeGreaterThan(RUNS.numRuns / 2);
  });

  it("method B by the rule never collapses: its steps are far finer than the tolerance", () => {
    fc.assert(
      fc.property(asked, (one) => {
        const { limits: got } = convertLimits(one.original, one.to, { method: "B" });
        // each limit moves by less than a step, which is 4 per cent of the tolerance at most
        expect(got.tolerance.ticks * 100).toBeGreaterThan(one.original.tolerance.ticks * 92);
      }),
      RUNS,
    );
  });

  it("method B collapses only where no multiple of the step lies between the limits", () => {
    let collapsed = 0;
    fc.assert(
      fc.property(asked, fc.integer({ min: 0, max: 3 }), (one, places) => {
        const up = roundedTicks(one.original.min.ticks, one.to, places, Decimal.ROUND_CEIL);
        const answer = converted(one, "B", places);
        if (answer === null) collapsed++;
        expect(answer === null).toBe(up.gt(one.original.max.ticks));
      }),
      RUNS,
    );
    expect(collapsed).toBeGreaterThan(50);
  });

  it("method A by the rule moves no limit by more than 2 per cent of the tolerance", () => {
    fc.assert(
      fc.property(asked, (one) => {
        const { maxShift, minShift } = convertLimits(one.original, one.to, { method: "A" });
        const tolerance = one.original.tolerance.ticks;
        expect(Math.abs(maxShift.ticks) * 50).toBeLessThanOrEqual(tolerance);
        expect(Math.abs(minShift.ticks) * 50).toBeLessThanOrEqual(tolerance);
      }),
      RUNS,
    );
  });

  it("keeps the decimals of the rule, which goes by the total tolerance alone", () => {
    fc.assert(
      fc.property(asked, fc.integer({ min: -10_000_000_000, max: 10_000_000_000 }), (one, shift) => {
        const { nominal, upperDeviation, lowerDeviation } = one.original;
        const moved = limits({
          nominal: lengthOfTicks(nominal.ticks + shift - (shift % step), nominal.unit),
          upper: upperDeviation,
          lower: lowerDeviation,
        });
        for (const original of [one.original, moved]) {
          for (const method of ["A", "B"] as const) {
            const { places, maxShift, minShift } = convertLimits(original, one.to, { method });
            if (isWritten(original, one.to)) expect(places).toBe(ruledPlaces(original.tolerance.ticks, one.to));
            // limits that no inch decimals end are metric ones: nothing to convert, nothing to round
            else expect([maxShift.ticks, minShift.ticks]).toEqual([0, 0]);
          }
        }
      }),
      { numRuns: 1000 },
    );
  });

  it("limits and shifts are exact to the tick", () => {
    fc.assert(
      fc.property(asked, fc.option(fc.integer({ min: 0, max: 6 }), { nil: undefined }), (one, asks) => {
        for (const [method, high, low] of [
          ["A", Decimal.ROUND_HALF_EVEN, Decimal.ROUND_HALF_EVEN],
          ["B", Decimal.ROUND_FLOOR, Decimal.ROUND_CEIL],
        ] as const) {
          const answer = converted(one, method, asks);
          if (answer === null) continue;
          const { original, to } = one;
          const max = roundedTicks(original.max.ticks, to, answer.places, high);
          const min = roundedTicks(original.min.ticks, to, answer.places, low);
          expect(max.eq(answer.limits.max.ticks)).toBe(true);
          expect(min.eq(answer.limits.min.ticks)).toBe(true);
          expect(max.sub(original.max.ticks).eq(answer.maxShift.ticks)).toBe(true);
          expect(min.sub(original.min.ticks).eq(answer.minShift.ticks)).toBe(true);
          expect(answer.lost.ticks).toBe(original.tolerance.ticks - answer.limits.tolerance.ticks);
          expect(answer.oversteps).toBe(max.gt(original.max.ticks) || min.lt(original.min.ticks));
          for (const shift of [answer.maxShift, answer.minShift, answer.lost])
            expect(Object.is(shift.ticks, -0)).toBe(false);
        }
      }),
      RUNS,
    );
  });

  it("the result travels through JSON and structuredClone", () => {
    fc.assert(
      fc.property(asked, fc.constantFrom<"A" | "B">("A", "B"), ({ original, to }, method) => {
        const direct = convertLimits(original, to, { method });
        const sent = JSON.parse(JSON.stringify(direct)) as ConvertedLimits;
        for (const back of [asLimits(sent.limits), asLimits(structuredClone(direct).limits)]) {
          for (const key of [
            "nominal",
            "upperDeviation",
            "lowerDeviation",
            "max",
            "min",
            "tolerance",
            "mean",
          ] as const) {
            expect(back[key].ticks).toBe(direct.limits[key].ticks);
          }
          expect(back.basis).toEqual(direct.limits.basis);
        }
        expect({ ...sent, limits: null }).toEqual({
          ...direct,
          limits: null,
          maxShift: direct.maxShift.toJSON(),
          minShift: direct.minShift.toJSON(),
          lost: direct.lost.toJSON(),
        });
        // what travelled converts alike; JSON keeps the unit of what ends in its own decimals
        expect(JSON.stringify(convertLimits(structuredClone(original), to, { method }))).toBe(JSON.stringify(direct));
        if (step === 127) {
          const again = JSON.parse(JSON.stringify(original)) as LimitsLike;
          expect(JSON.stringify(convertLimits(again, to, { method }))).toBe(JSON.stringify(direct));
        }
      }),
      { numRuns: 1500 },
    );
  });
});

describe("the dual text", () => {
  it("reads back to both pairs of limits", () => {
    const written = fc
      .record({
        to: fc.constantFrom<System>("mm", "in"),
        size: fc.integer({ min: 1000, max: 400_000 }),
        width: fc.integer({ min: 7, max: 900 }),
        places: fc.integer({ min: 3, max: 4 }),
      })
      .map(({ to, size, width, places }) => {
        const unit: System = to === "mm" ? "in" : "mm";
        const step = TICKS[unit] / 10 ** places;
        const nominal = lengthOfTicks(size * step, unit);
        return { to, unit, original: limits({ nominal, upper: lengthOfTicks(width * step, unit), lower: "0 mm" }) };
      });
    fc.assert(
      fc.property(written, fc.constantFrom<"A" | "B">("A", "B"), ({ to, unit, original }, method) => {
        const { dualText, limits: got } = convertLimits(original, to, { method });
        const request = readCallout(dualText, { unit });
        if (request.kind !== "limits" || request.dual === null) throw new Error(`${dualText}: ${request.kind}`);
        expect([request.min.length.ticks, request.max.length.ticks]).toEqual([original.min.ticks, original.max.ticks]);
        expect([request.dual.min.length.ticks, request.dual.max.length.ticks]).toEqual([got.min.ticks, got.max.ticks]);
        expect(request.dual.max.length.unit).toBe(to);
      }),
      { numRuns: 1000 },
    );
  });
});

describe("judgeMeasurement", () => {
  /** Guard band in ticks: nothing, U, or 0.83 U to the nearest tick, a half to the even one. */
  const GUARDS: Readonly<Record<DecisionRule, (uncertainty: number) => number>> = {
    "simple acceptance": () => 0,
    "ISO 14253-1:2013": (uncertainty) => uncertainty,
    "ISO 14253-1:2017": (uncertainty) =>
      new Exact(uncertainty).mul("0.83").toDecimalPlaces(0, Decimal.ROUND_HALF_EVEN).toNumber(),
  };
  const RULES = Object.keys(GUARDS) as DecisionRule[];

  function expectedVerdict(reading: number, min: number, max: number, guard: number): Verdict {
    if (reading >= min + guard && reading <= max - guard) return "pass";
    const outside = Math.max(reading - max, min - reading);
    // outside by U at least; without a band, outside at all
    return outside > 0 && outside >= guard ? "fail" : "not proven";
  }

  const judged = fc
    .record({
      min: fc.integer({ min: -1_000_000_000, max: 31_500_000_000 }),
      width: fc.oneof(fc.integer({ min: 0, max: 10 }), fc.integer({ min: 0, max: 5_000_000 })),
      uncertainty: fc.oneof(fc.integer({ min: 0, max: 12 }), fc.integer({ min: 0, max: 3_000_000 })),
      rule: fc.constantFrom(...RULES),
      unit: fc.constantFrom<LengthUnit>("mm", "um", "in", "thou", "uin"),
      other: fc.constantFrom<LengthUnit>("mm", "um", "in", "thou", "uin"),
      near: fc.integer({ min: -3, max: 3 }),
      where: fc.integer({ min: 0, max: 6 }),
      far: fc.integer({ min: -6_000_000, max: 6_000_000 }),
    })
    .map(({ min, width, uncertainty, rule, unit, other, near, where, far }) => {
      const max = min + width;
      const guard = GUARDS[rule](uncertainty);
      // at and about each of the six borders, or anywhere
      const border = [min - guard, min, min + guard, max - guard, max, max + guard][where];
      return {
        min,
        max,
        guard,
        uncertainty,
        rule,
        unit,
        other,
        reading: border === undefined ? min + far : border + near,
      };
    });

  it("agrees with a plain comparison of whole numbers, for all three rules", () => {
    const seen = new Map<string, number>();
    fc.assert(
      fc.property(judged, ({ min, max, guard, uncertainty, rule, unit, other, reading }) => {
        const size = limits({
          nominal: lengthOfTicks(min, unit),
          upper: lengthOfTicks(max - min, unit),
          lower: lengthOfTicks(0, unit),
        });
        const answer = judgeMeasurement(size, lengthOfTicks(reading, other), {
          rule,
          uncertainty: lengthOfTicks(uncertainty, other),
        });
        const verdict = expectedVerdict(reading, min, max, guard);
        expect(answer.verdict).toBe(verdict);
        seen.set(`${rule}: ${verdict}`, (seen.get(`${rule}: ${verdict}`) ?? 0) + 1);
        expect(answer.guardBand.ticks).toBe(guard);
        expect([answer.rejection.min.ticks, answer.rejection.max.ticks]).toEqual([min - guard, max + guard]);
        const zone = min + guard <= max - guard ? [min + guard, max - guard] : null;
        expect(answer.acceptance === null ? null : [answer.acceptance.min.ticks, answer.acceptance.max.ticks]).toEqual(
          zone,
        );
        expect(answer.margin.ticks).toBe(Math.min(max - reading, reading - min));
        expect(answer.margin.unit).toBe(unit);
        expect(answer.reading.ticks).toBe(reading);
      }),
      { numRuns: 6000 },
    );
    // two verdicts without a guard band, three with one
    expect([...seen.keys()].sort()).toEqual([
      "ISO 14253-1:2013: fail",
      "ISO 14253-1:2013: not proven",
      "ISO 14253-1:2013: pass",
      "ISO 14253-1:2017: fail",
      "ISO 14253-1:2017: not proven",
      "ISO 14253-1:2017: pass",
      "simple acceptance: fail",
      "simple acceptance: pass",
    ]);
  });

  it("a wider guard band never turns a verdict from one side to the other", () => {
    fc.assert(
      fc.property(judged, fc.integer({ min: 0, max: 3_000_000 }), ({ min, max, uncertainty, reading }, more) => {
        const size = limits({
          nominal: lengthOfTicks(min, "mm"),
          upper: lengthOfTicks(max - min, "mm"),
          lower: "0 mm",
        });
        const verdict = (u: number): Verdict =>
          judgeMeasurement(size, lengthOfTicks(reading, "mm"), {
            rule: "ISO 14253-1:2013",
            uncertainty: lengthOfTicks(u, "um"),
          }).verdict;
        const before = verdict(uncertainty);
        expect([before, "not proven"]).toContain(verdict(uncertainty + more));
      }),
      { numRuns: 1500 },
    );
  });
});
