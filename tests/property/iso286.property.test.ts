import {
  asLimits,
  fitOf,
  isoClassesFor,
  isoDeviations,
  isoFit,
  isoFitsFor,
  isoLimits,
  lengthOfTicks,
  parseToleranceClass,
} from "limitsmith";
import type { LimitsLike } from "limitsmith";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";
import { anyText, unit } from "./arbitraries.js";

const RUNS = { numRuns: 1000 };
const LETTERS = "a b c cd d e ef f fg g h js j k m n p r s t u v x y z za zb zc".split(" ");

const letter = fc
  .tuple(fc.constantFrom(...LETTERS), fc.boolean())
  .map(([one, hole]) => (hole ? one.toUpperCase() : one));
const classText = fc
  .tuple(letter, fc.constantFrom("01", "0", ...Array.from({ length: 18 }, (_, index) => String(index + 1))))
  .map((parts) => parts.join(""));
const size = fc
  .tuple(fc.integer({ min: 1, max: 31_500_000_000 }), unit)
  .map(([ticks, written]) => lengthOfTicks(ticks, written));

/** Gives the value, or `null` for what the standard does not define; any other error fails. */
function orNull<T>(task: () => T): T | null {
  try {
    return task();
  } catch {
    expect(codeOf(task)).toMatch(/^ISO_(?:GRADE|DEVIATION|CLASS)_NOT_DEFINED$/);
    return null;
  }
}

describe("any class at any size", () => {
  it("has limits that hold together, or a reason why not", () => {
    fc.assert(
      fc.property(size, classText, (nominal, cls) => {
        const um = orNull(() => isoDeviations(nominal, cls));
        const limits = orNull(() => isoLimits(nominal, cls));
        expect(limits === null).toBe(um === null);
        if (um === null || limits === null) return;
        expect(limits.upperDeviation.to("um")).toBe(um.upperDeviationUm);
        expect(limits.lowerDeviation.to("um")).toBe(um.lowerDeviationUm);
        expect(limits.max.ticks - nominal.ticks).toBe(limits.upperDeviation.ticks);
        expect(limits.max.ticks).toBeGreaterThan(limits.min.ticks);
        expect(limits.designation).toBe(cls);
        expect(asLimits(JSON.parse(JSON.stringify(limits)) as LimitsLike).max.ticks).toBe(limits.max.ticks);
      }),
      { numRuns: 2000 },
    );
  });

  it("depends on the size alone, not on the unit it is written in", () => {
    fc.assert(
      fc.property(size, unit, classText, (nominal, other, cls) => {
        const same = lengthOfTicks(nominal.ticks, other);
        expect(orNull(() => isoDeviations(same, cls))).toEqual(orNull(() => isoDeviations(nominal, cls)));
        expect(orNull(() => isoDeviations(nominal.toString(), cls))).toEqual(orNull(() => isoDeviations(nominal, cls)));
      }),
      RUNS,
    );
  });

  it("does not depend on what was asked before", () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(size, classText), { minLength: 2, maxLength: 8 }), (questions) => {
        const ask = ([nominal, cls]: (typeof questions)[number]): unknown => orNull(() => isoLimits(nominal, cls));
        const forth = questions.map(ask);
        const back = [...questions].reverse().map(ask).reverse();
        expect(back).toEqual(forth);
      }),
      { numRuns: 200 },
    );
  });
});

describe("fits", () => {
  it("isoFit is fitOf of both limits", () => {
    fc.assert(
      fc.property(size, classText, classText, (nominal, one, other) => {
        const hole = one.charAt(0).toUpperCase() + one.slice(1).toUpperCase();
        const shaft = other.toLowerCase();
        const fit = orNull(() => isoFit(nominal, `${hole}/${shaft}`));
        const apart = orNull(() => fitOf(isoLimits(nominal, hole), isoLimits(nominal, shaft)));
        expect(fit).toEqual(apart);
        expect(orNull(() => isoFit(nominal, { hole, shaft }))).toEqual(fit);
      }),
      RUNS,
    );
  });

  it("isoFitsFor finds only fits that lie in the range, and the range of a defined fit finds that fit", () => {
    fc.assert(
      fc.property(size, fc.constantFrom("H7/g6", "H8/f7", "H7/p6", "K7/h6", "H11/c11", "G7/h6"), (nominal, name) => {
        const known = orNull(() => isoFit(nominal, name));
        if (known === null) return;
        const clearance = { min: known.minClearance, max: known.maxClearance };
        const { fits, found } = isoFitsFor({ size: nominal, clearance, most: 5000 });
        expect(fits.length).toBe(found);
        for (const { fit } of fits) {
          expect(fit.minClearance.ticks).toBeGreaterThanOrEqual(known.minClearance.ticks);
          expect(fit.maxClearance.ticks).toBeLessThanOrEqual(known.maxClearance.ticks);
        }
        expect(fits.map(({ fit }) => fit.designation)).toContain(name);
      }),
      { numRuns: 40 },
    );
  });

  it("isoClassesFor finds every class by its own limits", () => {
    fc.assert(
      fc.property(size, classText, (nominal, cls) => {
        const limits = orNull(() => isoLimits(nominal, cls));
        if (limits === null) return;
        const found = isoClassesFor(limits);
        expect(found.map(({ toleranceClass }) => toleranceClass.text)).toContain(cls);
        expect(found.every(({ match }) => match === "exact")).toBe(true);
      }),
      { numRuns: 60 },
    );
  });
});

describe("reading any text", () => {
  it.each<[string, (text: string) => unknown]>([
    ["parseToleranceClass", parseToleranceClass],
    ["isoFit", (text) => isoFit("40 mm", text)],
    ["isoFit, classes apart", (text) => isoFit("40 mm", { hole: text, shaft: text })],
    ["isoLimits, the size", (text) => isoLimits(text, "h7")],
    ["isoLimits, the class", (text) => isoLimits("40 mm", text)],
  ])("%s gives a value or a LimitsError, nothing else", (_, read) => {
    fc.assert(
      fc.property(
        fc.oneof(
          anyText,
          fc.tuple(anyText, fc.constantFrom("/", "-", ""), classText).map((parts) => parts.join("")),
        ),
        (text) => {
          try {
            read(text);
          } catch {
            expect(codeOf(() => read(text))).toMatch(/^[A-Z]+(?:_[A-Z]+)+$/);
          }
        },
      ),
      { numRuns: 2000 },
    );
  });
});
