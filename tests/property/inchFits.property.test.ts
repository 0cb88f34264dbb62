import { compareFits } from "limitsmith/compare";
import { inchClassesFor, inchFit, inchFitsFor, inchFitsNear, parseInchClass } from "limitsmith/inchFits";
import { asLimits } from "limitsmith/limits";
import type { LimitsLike } from "limitsmith/limits";
import { lengthOfTicks } from "limitsmith/units";
import type { LengthUnit } from "limitsmith/units";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readCases } from "../published/readCases.js";
import { codeOf } from "../support/thrown.js";

interface Row {
  readonly hole_upper: string;
  readonly shaft_upper: string;
  readonly shaft_lower: string;
}

const THOU = 254_000;
const IN = 254_000_000;
const RUNS = { numRuns: 1000 };
// the published rows, not the tables of src
const rows = readCases<{ class: string; over: string; to: string }, Row>("inchFits/rows.json").cases;
const NAMES = [...new Set(rows.map(({ input }) => input.class))];

const unit = fc.constantFrom<LengthUnit>("mm", "um", "in", "thou", "uin");
const ticks = fc.oneof(
  fc.integer({ min: 1, max: Math.round(19.69 * IN) }),
  // at a boundary, one tick below it and one above
  fc
    .tuple(fc.constantFrom(...rows.map(({ input }) => Math.round(Number(input.to) * IN))), fc.constantFrom(-1, 0, 1))
    .map(([end, off]) => Math.min(end + off, Math.round(19.69 * IN))),
);
const size = fc.tuple(ticks, unit).map(([at, written]) => lengthOfTicks(at, written));
const name = fc.constantFrom(...NAMES);

/** What the published rows say of a class at a size: its extreme clearances, in ticks. */
function publishedAt(cls: string, at: number): { min: number; max: number } | null {
  const row = rows.find(
    ({ input }) =>
      input.class === cls && at > Math.round(Number(input.over) * IN) && at <= Math.round(Number(input.to) * IN),
  );
  if (row === undefined) throw new Error(`no row for ${cls} at ${at}`);
  if (row.expected === null) return null;
  const inTicks = (thou: string): number => Math.round(Number(thou) * THOU);
  return {
    min: 0 - inTicks(row.expected.shaft_upper),
    max: inTicks(row.expected.hole_upper) - inTicks(row.expected.shaft_lower),
  };
}

describe("any class at any size", () => {
  it("has the clearances of its row, and keeps them and both tolerances with every suffix", () => {
    fc.assert(
      fc.property(size, name, (nominal, cls) => {
        const published = publishedAt(cls, nominal.ticks);
        if (published === null) {
          for (const suffix of ["", "S", "B"]) {
            expect(codeOf(() => inchFit(nominal, cls + suffix))).toMatch(/^INCH_ROW_(?:NOT_DEFINED|MISSING)$/);
          }
          return;
        }
        const plain = inchFit(nominal, cls);
        expect([plain.minClearance.ticks, plain.maxClearance.ticks]).toEqual([published.min, published.max]);
        const modified = [inchFit(nominal, `${cls}S`)];
        if (cls !== "RC1" || nominal.ticks > Math.round(0.12 * IN)) modified.push(inchFit(nominal, `${cls}B`));
        for (const fit of modified) {
          expect([fit.minClearance.ticks, fit.maxClearance.ticks]).toEqual([published.min, published.max]);
          expect(fit.hole.tolerance.ticks).toBe(plain.hole.tolerance.ticks);
          expect(fit.shaft.tolerance.ticks).toBe(plain.shaft.tolerance.ticks);
          expect(fit.kind).toBe(plain.kind);
          expect(fit.printedLimits).toEqual(plain.printedLimits);
        }
        expect(modified[0]?.shaft.max.ticks).toBe(nominal.ticks);
        expect(plain.hole.min.ticks).toBe(nominal.ticks);
      }),
      { numRuns: 3000 },
    );
  });

  it("depends on the size alone, not on the unit it is written in, and survives JSON", () => {
    fc.assert(
      fc.property(ticks, unit, unit, name, (at, one, other, cls) => {
        if (publishedAt(cls, at) === null) return;
        const left = inchFit(lengthOfTicks(at, one), cls);
        const right = inchFit(lengthOfTicks(at, other), cls);
        for (const member of ["hole", "shaft"] as const) {
          expect(right[member].max.ticks).toBe(left[member].max.ticks);
          expect(right[member].min.ticks).toBe(left[member].min.ticks);
          const sent = asLimits(JSON.parse(JSON.stringify(left[member])) as LimitsLike);
          expect([sent.max.ticks, sent.min.ticks]).toEqual([left[member].max.ticks, left[member].min.ticks]);
        }
      }),
      RUNS,
    );
  });

  it("is found again by the limits of its members", () => {
    fc.assert(
      fc.property(
        size,
        name,
        fc.constantFrom("", "S"),
        fc.constantFrom("hole", "shaft"),
        (nominal, cls, suffix, kind) => {
          if (publishedAt(cls, nominal.ticks) === null) return;
          const fit = inchFit(nominal, cls + suffix);
          const texts = inchClassesFor(fit[kind], { kind }).map(({ fitClass }) => fitClass.text);
          // an h shaft stands where it is in both bases, and is named once
          const wanted = fit.system === "hole and shaft basis" ? cls : cls + suffix;
          expect(texts).toContain(wanted);
          expect(new Set(texts).size).toBe(texts.length);
        },
      ),
      { numRuns: 500 },
    );
  });
});

describe("inchFitsFor", () => {
  const range = fc
    .tuple(fc.integer({ min: -200, max: 400 }), fc.integer({ min: 0, max: 300 }))
    .map(([low, width]) => ({ min: low * (THOU / 10), max: (low + width) * (THOU / 10) }));

  it("finds every class whose range lies within the one asked for, and only those", () => {
    fc.assert(
      fc.property(size, range, fc.constantFrom("hole", "shaft"), (nominal, { min, max }, basis) => {
        const wanted = NAMES.filter((cls) => {
          const published = publishedAt(cls, nominal.ticks);
          return published !== null && published.min >= min && published.max <= max;
        });
        const clearance = { min: lengthOfTicks(min, "thou"), max: lengthOfTicks(max, "um") };
        const answer = inchFitsFor({ size: nominal, clearance, basis, most: 99 });
        const suffix = basis === "shaft" ? "S" : "";
        expect(answer.found).toBe(wanted.length);
        expect(answer.fits.map(({ fit }) => fit.designation).sort()).toEqual(wanted.map((cls) => cls + suffix).sort());
        // sure rows first, then wider use of the range
        const ranks = answer.fits.map(({ fit }) => ({
          doubtful: fit.cautions.some(({ code }) => code.startsWith("INCH_ROW_")),
          width: fit.variation.ticks,
        }));
        for (const [index, one] of ranks.entries()) {
          const before = ranks[index - 1];
          if (before === undefined) continue;
          expect(Number(before.doubtful)).toBeLessThanOrEqual(Number(one.doubtful));
          if (before.doubtful === one.doubtful) expect(before.width).toBeGreaterThanOrEqual(one.width);
        }
      }),
      { numRuns: 500 },
    );
  });

  it("inchFitsNear looks at every class, the one with the same range first", () => {
    fc.assert(
      fc.property(size, name, (nominal, cls) => {
        const published = publishedAt(cls, nominal.ticks);
        if (published === null) return;
        const clearance = {
          min: lengthOfTicks(published.min, "thou"),
          max: lengthOfTicks(published.max, "thou"),
        };
        const { found, fits } = inchFitsNear({ size: nominal, clearance, most: 1 });
        expect(found).toBe(NAMES.filter((one) => publishedAt(one, nominal.ticks) !== null).length);
        expect(fits[0]?.fit.minClearance.ticks).toBe(published.min);
        expect(fits[0]?.fit.maxClearance.ticks).toBe(published.max);
      }),
      { numRuns: 500 },
    );
  });
});

describe("compareFits", () => {
  it("differences are other minus given, and equal means equal", () => {
    fc.assert(
      fc.property(size, name, (nominal, cls) => {
        if (publishedAt(cls, nominal.ticks) === null) return;
        const { given, nearest } = compareFits(nominal, cls, { most: 5 });
        expect(nearest.length).toBeGreaterThan(0);
        for (const { fit, differences, equal } of nearest) {
          expect(differences.holeMax.ticks).toBe(fit.hole.max.ticks - given.hole.max.ticks);
          expect(differences.holeMin.ticks).toBe(fit.hole.min.ticks - given.hole.min.ticks);
          expect(differences.shaftMax.ticks).toBe(fit.shaft.max.ticks - given.shaft.max.ticks);
          expect(differences.shaftMin.ticks).toBe(fit.shaft.min.ticks - given.shaft.min.ticks);
          expect(differences.minClearance.ticks).toBe(fit.minClearance.ticks - given.minClearance.ticks);
          expect(differences.maxClearance.ticks).toBe(fit.maxClearance.ticks - given.maxClearance.ticks);
          expect(equal).toBe(
            fit.hole.max.ticks === given.hole.max.ticks &&
              fit.hole.min.ticks === given.hole.min.ticks &&
              fit.shaft.max.ticks === given.shaft.max.ticks &&
              fit.shaft.min.ticks === given.shaft.min.ticks,
          );
        }
      }),
      { numRuns: 300 },
    );
  });
});

describe("parseInchClass", () => {
  const blank = fc.constantFrom("", " ", "  ", "\t", "\u00a0");

  it("reads a class however it is spaced and cased", () => {
    fc.assert(
      fc.property(
        name,
        fc.constantFrom("", "S", "B"),
        fc.tuple(blank, blank, blank, blank),
        fc.array(fc.boolean(), { minLength: 6, maxLength: 6 }),
        (cls, suffix, [before, between, inner, after], cases) => {
          const text = `${before}${cls.slice(0, 2)}${between}${cls.slice(2)}${inner}${suffix}${after}`;
          const mixed = [...text].map((one, index) => (cases[index % 6] === true ? one.toLowerCase() : one)).join("");
          expect(parseInchClass(mixed).text).toBe(cls + suffix);
        },
      ),
      RUNS,
    );
  });

  it("throws nothing but LimitsError on any text", () => {
    const text = fc.oneof(
      fc.string({ unit: "binary" }),
      fc.tuple(fc.constantFrom("RC", "lc", "LT", "ln", "FN"), fc.string()).map((parts) => parts.join("")),
    );
    fc.assert(
      fc.property(text, (given) => {
        try {
          expect(NAMES).toContain(parseInchClass(given).text.replace(/[SB]$/, ""));
        } catch {
          expect(codeOf(() => parseInchClass(given))).toMatch(/^INCH_CLASS_(?:MALFORMED|UNKNOWN)$/);
        }
      }),
      RUNS,
    );
  });
});
