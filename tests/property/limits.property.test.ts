import { asLimits, fitOf, lengthOfTicks, writeLimits } from "limitsmith";
import type { LengthUnit, Limits, LimitsForm, LimitsLike, LimitsRounding, WrittenLimits } from "limitsmith";
import { Decimal } from "decimal.js";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { thrown } from "../support/thrown.js";
import { evenLimits, Exact, someLimits, TICKS, unit } from "./arbitraries.js";

const RUNS = { numRuns: 1500 };

function exactIn(value: number, in_: LengthUnit): Decimal {
  return new Exact(value).div(TICKS[in_]);
}

describe("limits", () => {
  it("hold together: max - min is the tolerance, the mean lies half way, a half tick to the even one", () => {
    fc.assert(
      fc.property(someLimits, (one) => {
        expect(one.max.ticks - one.min.ticks).toBe(one.tolerance.ticks);
        expect(one.nominal.ticks + one.upperDeviation.ticks).toBe(one.max.ticks);
        expect(one.nominal.ticks + one.lowerDeviation.ticks).toBe(one.min.ticks);
        const mean = new Exact(one.max.ticks).add(one.min.ticks).div(2).toDecimalPlaces(0, Decimal.ROUND_HALF_EVEN);
        expect(mean.eq(one.mean.ticks)).toBe(true);
      }),
      RUNS,
    );
  });

  it("come back from JSON and structuredClone as they went", () => {
    fc.assert(
      fc.property(someLimits, (one) => {
        const back = asLimits(JSON.parse(JSON.stringify(one)) as LimitsLike);
        for (const key of ["nominal", "upperDeviation", "lowerDeviation", "max", "min", "tolerance", "mean"] as const) {
          expect(back[key].ticks).toBe(one[key].ticks);
        }
        expect(back.basis).toEqual(one.basis);
        expect(back.designation).toBe(one.designation);
        expect(asLimits(structuredClone(one))).toEqual(one);
      }),
      RUNS,
    );
  });
});

describe("fits", () => {
  it("clearances follow from the limits, and the kind from the clearances", () => {
    fc.assert(
      fc.property(someLimits, someLimits, (hole, shaft) => {
        const fit = fitOf(hole, shaft, { nominals: "any" });
        expect(fit.maxClearance.ticks).toBe(hole.max.ticks - shaft.min.ticks);
        expect(fit.minClearance.ticks).toBe(hole.min.ticks - shaft.max.ticks);
        expect(fit.maxInterference.ticks + fit.minClearance.ticks).toBe(0);
        expect(fit.minInterference.ticks + fit.maxClearance.ticks).toBe(0);
        expect(fit.variation.ticks).toBe(hole.tolerance.ticks + shaft.tolerance.ticks);
        expect(fit.maxClearance.ticks - fit.minClearance.ticks).toBe(fit.variation.ticks);
        for (const one of [fit.maxClearance, fit.minClearance, fit.maxInterference, fit.minInterference]) {
          expect(Object.is(one.ticks, -0)).toBe(false);
        }
        expect(fit.cautions.length > 0).toBe(fit.kind !== "clearance");
      }),
      RUNS,
    );
  });

  it("a pair of real parts has a gap between the extremes, of the sign that the kind says", () => {
    const part = fc.double({ min: 0, max: 1, noNaN: true });
    const at = (limits: Limits, share: number): number => limits.min.ticks + Math.round(limits.tolerance.ticks * share);
    fc.assert(
      fc.property(someLimits, someLimits, part, part, (hole, shaft, high, low) => {
        const fit = fitOf(hole, shaft, { nominals: "any" });
        const gap = at(hole, high) - at(shaft, low);
        expect(gap).toBeLessThanOrEqual(fit.maxClearance.ticks);
        expect(gap).toBeGreaterThanOrEqual(fit.minClearance.ticks);
        if (fit.kind === "clearance") expect(gap).toBeGreaterThanOrEqual(0);
        if (fit.kind === "interference") expect(gap).toBeLessThanOrEqual(0);
      }),
      RUNS,
    );
  });
});

/** Reads what a shop would read from the text: largest and smallest size, in the unit of the text. */
function readBack(text: string, form: LimitsForm, decimalMark: "." | ","): { max: Decimal; min: Decimal } {
  const plain = decimalMark === "," ? text.replaceAll(",", ".") : text;
  const number = String.raw`[+\-]?(?:\d+\.?\d*|\.\d+)`;
  const shapes: Record<LimitsForm, RegExp> = {
    limits: new RegExp(`^(${number})/(${number})$`),
    deviations: new RegExp(`^(${number}) (${number})/(${number})$`),
    "plus-minus": new RegExp(`^(${number}) ±(${number})$`),
    class: new RegExp(`^${number} \\w+ \\((${number})/(${number})\\)$`),
  };
  const match = shapes[form].exec(plain);
  if (match === null) throw new Error(`not a text of the form ${form}: ${text}`);
  const [first, second, third] = match.slice(1).map((one) => new Exact(one.startsWith("+") ? one.slice(1) : one));
  if (first === undefined || second === undefined) throw new Error(text);
  if (form === "deviations") return { max: first.add(second), min: first.add(third ?? NaN) };
  if (form === "plus-minus") return { max: first.add(second), min: first.sub(second) };
  return { max: first, min: second };
}

const MOST = { mm: 7, um: 4, in: 6, thou: 3, uin: 0 } as const;

describe("writeLimits", () => {
  const question = fc.record({
    form: fc.constantFrom<LimitsForm[]>("deviations", "limits", "plus-minus", "class"),
    plain: someLimits,
    even: evenLimits,
    unit,
    places: fc.nat(6),
    numbers: fc.constantFrom("metric" as const, "inch" as const),
    decimalMark: fc.constantFrom("." as const, "," as const),
  });

  it.each<LimitsRounding>(["inside", "outside", "nearest"])("%s rounding keeps its word, in every form", (rounding) => {
    let collapsed = 0;
    fc.assert(
      fc.property(question, ({ form, plain, even, unit: in_, places: asked, numbers, decimalMark }) => {
        const places = Math.min(asked, MOST[in_]);
        const limits = form === "plus-minus" ? even : plain;
        if (form === "class" && limits.designation === null) return;
        let written: WrittenLimits;
        try {
          written = writeLimits(limits, { form, unit: in_, places, rounding, numbers, decimalMark });
        } catch {
          const error = thrown(() => writeLimits(limits, { form, unit: in_, places, rounding, numbers, decimalMark }));
          expect(error.code).toBe("ROUNDING_COLLAPSES");
          // only where no size with that many decimals lies within the limits, or none lies evenly about the nominal
          expect(rounding).toBe("inside");
          const low = exactIn(limits.min.ticks, in_).toDecimalPlaces(places, Decimal.ROUND_CEIL);
          const high = exactIn(limits.max.ticks, in_).toDecimalPlaces(places, Decimal.ROUND_FLOOR);
          const nominal = exactIn(limits.nominal.ticks, in_).toDecimalPlaces(places, Decimal.ROUND_HALF_EVEN);
          expect(form === "plus-minus" ? nominal.lt(low) || nominal.gt(high) : high.lt(low)).toBe(true);
          collapsed++;
          return;
        }
        const { max, min } = readBack(written.text, form, decimalMark);
        const exactMax = exactIn(limits.max.ticks, in_);
        const exactMin = exactIn(limits.min.ticks, in_);
        expect(max.gte(min)).toBe(true);
        if (rounding === "inside") {
          expect(max.lte(exactMax)).toBe(true);
          expect(min.gte(exactMin)).toBe(true);
        }
        if (rounding === "outside") {
          expect(max.gte(exactMax)).toBe(true);
          expect(min.lte(exactMin)).toBe(true);
        }
        // no limit moves further than rounding must: less than a step, half a step to the nearest
        if (form === "limits" || form === "class") {
          const step = new Exact(10).pow(-places);
          const most = rounding === "nearest" ? step.div(2) : step;
          expect(max.sub(exactMax).abs().lte(most)).toBe(true);
          expect(min.sub(exactMin).abs().lte(most)).toBe(true);
        }
        // what it says about itself is what stands there
        expect(max.mul(TICKS[in_]).sub(limits.max.ticks).eq(written.maxShift.ticks)).toBe(true);
        expect(min.mul(TICKS[in_]).sub(limits.min.ticks).eq(written.minShift.ticks)).toBe(true);
        expect(written.exact).toBe(written.maxShift.ticks === 0 && written.minShift.ticks === 0);
        expect(written.note === null).toBe(written.exact);
        expect(written.lines.length).toBe(form === "limits" || form === "deviations" ? 2 : 1);
        if (numbers === "metric") expect(written.text).not.toMatch(/-0(?![.,]\d*[1-9])/);
        if (decimalMark === ",") expect(written.text).not.toContain(".");
        if (decimalMark === ".") expect(written.text).not.toContain(",");
      }),
      { numRuns: 3000 },
    );
    if (rounding === "inside") expect(collapsed).toBeGreaterThan(0);
  });

  it("with no places asked for, it writes exactly or says that it cannot", () => {
    fc.assert(
      fc.property(question, ({ form, plain, even, unit: in_, numbers, decimalMark }) => {
        const limits = form === "plus-minus" ? even : plain;
        if (form === "class" && limits.designation === null) return;
        let written: WrittenLimits;
        try {
          written = writeLimits(limits, { form, unit: in_, numbers, decimalMark });
        } catch {
          const error = thrown(() => writeLimits(limits, { form, unit: in_, numbers, decimalMark }));
          expect(error.code).toBe("LENGTH_NOT_EXACT");
          const ends = [limits.nominal, limits.max, limits.min].every(
            ({ ticks }) => exactIn(ticks, in_).decimalPlaces() <= 12,
          );
          expect(ends).toBe(false);
          return;
        }
        expect(written.exact).toBe(true);
        const { max, min } = readBack(written.text, form, decimalMark);
        expect(max.mul(TICKS[in_]).eq(limits.max.ticks)).toBe(true);
        expect(min.mul(TICKS[in_]).eq(limits.min.ticks)).toBe(true);
      }),
      { numRuns: 2000 },
    );
  });

  it("metric deviations have the same number of decimals, or are a plain 0", () => {
    fc.assert(
      fc.property(someLimits, (limits) => {
        const given = {
          ...limits,
          nominal: lengthOfTicks(limits.nominal.ticks, "mm"),
          max: limits.max,
          min: limits.min,
        };
        const { text } = writeLimits(given, { form: "deviations", unit: "mm" });
        const [, upper = "", lower = ""] = /^\S+ (\S+)\/(\S+)$/.exec(text) ?? [];
        if (upper !== "0" && lower !== "0") {
          expect((upper.split(".")[1] ?? "").length).toBe((lower.split(".")[1] ?? "").length);
        }
      }),
      RUNS,
    );
  });
});
