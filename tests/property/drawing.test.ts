import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { attempt, defaultLimits, readCallout, resolveCallout, titleBlock } from "limitsmith";
import type { TitleBlockSpec } from "limitsmith";
import { resolveSheet } from "limitsmith/sheet";

const block: TitleBlockSpec = {
  unit: "in",
  decimals: { 1: "±.03", 2: "±.01", 3: "±.005", 4: "±.0005" },
  fractions: "±1/64",
  angles: "±1°",
};
// what callouts are made of, so that mutations come near to sense
const pieces = fc.constantFrom(
  "⌀",
  "Ø",
  "1.375",
  ".875",
  "25",
  "7 3/8",
  "1-1/4",
  "H7",
  "m6",
  "js9",
  "zz9",
  "+",
  "-",
  "\u2212",
  "±",
  "+/-",
  "/",
  ".002",
  "0",
  "(",
  ")",
  "[",
  "]",
  "°",
  "'",
  '"',
  " ",
  "MAX",
  "MIN",
  "REF",
  "BASIC",
  "mm",
  "in",
  "µm",
  "\u03bcm",
  ",",
  "\u0000",
  "\u{1F600}",
  "\ud800",
);
const nearCallouts = fc.array(pieces, { maxLength: 12 }).map((parts) => parts.join(""));
const anyText = fc.oneof(
  nearCallouts,
  fc.string({ unit: "binary", maxLength: 300 }),
  fc.string({ unit: "grapheme", maxLength: 60 }),
);

describe("texts", () => {
  it("no text makes the readers throw anything but a LimitsError", () => {
    fc.assert(
      fc.property(anyText, (text) => {
        // attempt passes every other error on
        attempt(() => readCallout(text, { unit: "in" }));
        attempt(() => readCallout(text, { unit: "mm", decimalMark: "," }));
        attempt(() => resolveCallout(text, { titleBlock: block, feature: "hole" }));
        attempt(() => defaultLimits(block, text));
        attempt(() => titleBlock({ unit: "in", decimals: { 3: text }, fractions: text, angles: text }));
      }),
      { numRuns: 3000 },
    );
  });

  it("what is refused is refused within the text", () => {
    fc.assert(
      fc.property(nearCallouts, (text) => {
        const read = attempt(() => readCallout(text, { unit: "in" }));
        if (read.ok || read.error.position === null) return;
        const { start, end } = read.error.position;
        expect(start).toBeGreaterThanOrEqual(0);
        expect(end).toBeGreaterThanOrEqual(start);
        expect(end).toBeLessThanOrEqual(text.length);
      }),
      { numRuns: 2000 },
    );
  });

  it("a callout that is read is read whole: more text behind it changes the request or is refused", () => {
    fc.assert(
      fc.property(nearCallouts, pieces, (text, more) => {
        const read = attempt(() => readCallout(text, { unit: "in" }));
        const longer = attempt(() => readCallout(`${text} ${more}`, { unit: "in" }));
        if (!read.ok || !longer.ok || more === " ") return;
        expect({ ...longer.value, text: "" }).not.toEqual({ ...read.value, text: "" });
      }),
      { numRuns: 2000 },
    );
  });
});

describe("title block", () => {
  it("the default depends on the decimals written, and on nothing else", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 999_999 }), fc.integer({ min: 1, max: 4 }), (digits, places) => {
        const text = (digits / 10 ** places).toFixed(places);
        const tolerance = ["", "0.06 in", "0.02 in", "0.01 in", "0.001 in"][places];
        expect(defaultLimits(block, text).limits.tolerance.toString()).toBe(tolerance);
        expect(defaultLimits(block, text.replace(/^0\./, ".")).limits.tolerance.toString()).toBe(tolerance);
      }),
    );
  });
});

describe("sheets", () => {
  const feature = fc.oneof(
    fc.record(
      { id: fc.string({ maxLength: 3 }), callout: anyText, mate: fc.string({ maxLength: 3 }) },
      { requiredKeys: [] },
    ),
    fc.jsonValue({ maxDepth: 2 }),
  );

  it("any features: one row each, in order, and the counts add up", () => {
    fc.assert(
      fc.property(fc.array(feature, { maxLength: 8 }), (features) => {
        const sheet = resolveSheet({ drawing: "d", unit: "in", titleBlock: { decimals: { "3": "±.005" } }, features });
        const { counts } = sheet;
        expect(sheet.rows.map(({ index }) => index)).toEqual(features.map((_, index) => index));
        expect(
          counts.limits +
            counts.fitCallouts +
            counts.singleLimits +
            counts.angles +
            counts.chamfers +
            counts.withoutLimits +
            counts.failed,
        ).toBe(features.length);
        expect(counts.fits + counts.fitsFailed).toBe(sheet.fits.length);
        expect(JSON.stringify(sheet)).not.toMatch(/NaN|Infinity/);
      }),
      { numRuns: 500 },
    );
  });

  it("any JSON: a sheet, or a LimitsError", () => {
    fc.assert(
      fc.property(fc.jsonValue(), (json) => void attempt(() => resolveSheet(json))),
      { numRuns: 1000 },
    );
  });

  it("any value at all: a sheet, or a LimitsError", () => {
    fc.assert(
      fc.property(
        fc.anything({ withBigInt: true, withDate: true, withMap: true, withNullPrototype: true }),
        (value) => {
          attempt(() => resolveSheet({ drawing: "d", unit: "in", features: [value], note: value }));
          attempt(() => resolveSheet(value));
        },
      ),
      { numRuns: 1000 },
    );
  });
});
