import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  attempt,
  compareLengths,
  defaultLimits,
  generalAngleLimits,
  generalFormTolerance,
  generalLimits,
  generalTolerance,
  lengthOfTicks,
  mm,
  readDimension,
  readEdge,
  titleBlock,
} from "limitsmith";
import type { DefaultLimitsOptions, FormQuestion, SizeFeature, TitleBlockSpec } from "limitsmith";

const TICKS_PER_MM = 10_000_000;
const anyTicks = fc.oneof(
  fc.integer({ min: -TICKS_PER_MM, max: 25_000 * TICKS_PER_MM }),
  // around the ends of ranges
  fc
    .tuple(
      fc.constantFrom(0.5, 2, 3, 6, 10, 16, 25, 30, 40, 63, 100, 120, 400, 1000, 2000, 3000, 4000, 10_000),
      fc.integer({ min: -2, max: 2 }),
    )
    .map(([end, by]) => end * TICKS_PER_MM + by),
);
const anyLength = anyTicks.map((ticks) => lengthOfTicks(ticks, "mm"));
const features: readonly SizeFeature[] = [
  "size",
  "diameter",
  "length",
  "internal radius",
  "external radius or chamfer",
  "wall thickness",
];
const anyFeature = fc.constantFrom(...features);
/** Classes of one table, finest first. */
const orders = [
  ["ISO 2768-f", "ISO 2768-m", "ISO 2768-c", "ISO 2768-v"],
  Array.from({ length: 15 }, (_, index) => `DCTG ${index + 1}`),
  ["ISO 13920-A", "ISO 13920-B", "ISO 13920-C", "ISO 13920-D"],
];
const anyStandard = fc.constantFrom(...orders.flat(), "ISO 2768-K", "DCTG 16", "ISO 13920:1996-B");

describe("general tolerances", () => {
  it("a size has symmetric limits about itself, or is refused by a code of the tables", () => {
    fc.assert(
      fc.property(anyLength, anyStandard, anyFeature, (size, standard, feature) => {
        const found = attempt(() => generalLimits(size, standard, { feature }));
        if (!found.ok) {
          expect(found.error.code).toMatch(/^GENERAL_TOLERANCE_(?:NOT_CALLED|NOT_DEFINED|OUT_OF_RANGE)$/);
          expect(found.error.allowed).not.toBeNull();
          return;
        }
        const { limits, line } = found.value;
        expect(limits.max.ticks - size.ticks).toBe(size.ticks - limits.min.ticks);
        expect(limits.tolerance.ticks).toBeGreaterThan(0);
        expect(line).toBe(`${standard}: ±${limits.upperDeviation.toString()}`);
        expect(limits.basis.some(({ how, mark }) => how === "tabulated" && mark !== undefined)).toBe(true);
      }),
      { numRuns: 3000 },
    );
  });

  it("a coarser class is never tighter, and a larger size never has less", () => {
    fc.assert(
      fc.property(anyLength, anyLength, fc.constantFrom(...orders), anyFeature, (one, other, order, feature) => {
        const [small, large] = compareLengths(one, other) < 0 ? [one, other] : [other, one];
        const widths = order.flatMap((standard) => {
          const found = attempt(() => generalLimits(small, standard, { feature }).limits.tolerance.ticks);
          return found.ok ? [found.value] : [];
        });
        expect(widths).toEqual([...widths].sort((left, right) => left - right));
        for (const standard of order) {
          const pair = [small, large].map((size) => attempt(() => generalLimits(size, standard, { feature })));
          const [low, high] = pair;
          if (low?.ok !== true || high?.ok !== true) continue;
          expect(high.value.limits.tolerance.ticks).toBeGreaterThanOrEqual(low.value.limits.tolerance.ticks);
        }
      }),
      { numRuns: 500 },
    );
  });

  it("the angle itself does not matter, and a longer leg never has more", () => {
    const standards = fc.constantFrom("ISO 2768-f", "ISO 2768-m", "ISO 2768-c", "ISO 2768-v", ...(orders[2] ?? []));
    const leg = fc.integer({ min: 1, max: 3000 * TICKS_PER_MM });
    fc.assert(
      fc.property(standards, leg, leg, fc.integer({ min: 1, max: 359 }), (standard, one, other, angle) => {
        const at = (ticks: number, text: string): number =>
          generalAngleLimits(text, lengthOfTicks(ticks, "mm"), standard).limits.upperDeviation.microarcseconds;
        expect(at(one, `${angle}°`)).toBe(at(one, "90°"));
        expect(at(Math.max(one, other), "90°")).toBeLessThanOrEqual(at(Math.min(one, other), "90°"));
      }),
    );
  });

  it("roundness is never more than run-out, parallelism never less than flatness", () => {
    const width = fc.integer({ min: 1, max: 50_000_000 }).map((ticks) => lengthOfTicks(ticks, "mm"));
    const lengths = fc.integer({ min: 1, max: 3000 }).map((size) => mm(size));
    fc.assert(
      fc.property(fc.constantFrom("H", "K", "L"), width, lengths, (cls, sizeTolerance, length) => {
        const ask = (question: FormQuestion): number =>
          generalFormTolerance(`ISO 2768-${cls}`, question).tolerance.ticks;
        const round = ask({ characteristic: "roundness", sizeTolerance });
        expect(round).toBe(Math.min(sizeTolerance.ticks, ask({ characteristic: "circular run-out" })));
        const parallel = ask({ characteristic: "parallelism", sizeTolerance, length });
        expect(parallel).toBe(Math.max(sizeTolerance.ticks, ask({ characteristic: "flatness", length })));
      }),
    );
  });
});

describe("title block by standard", () => {
  const tolerance = fc.integer({ min: 1, max: 999 }).map((thousandths) => `±${(thousandths / 1000).toFixed(3)}`);
  const decimals = fc.dictionary(fc.constantFrom("0", "1", "2", "3", "any"), tolerance);
  const anyBlock = fc.record(
    {
      unit: fc.constantFrom("mm" as const, "in" as const),
      decimals,
      diameters: fc.record({ decimals }),
      lengths: fc.record({ decimals }),
      angles: fc.constantFrom("±1°", "±0°30'"),
      general: fc.constantFrom("ISO 2768-f", "ISO 2768-mK", "ISO 2768-L"),
      castings: fc.constantFrom("DCTG 4", "ISO 8062-3:2007 - DCTG 9"),
      weldments: fc.constantFrom("ISO 13920-BF", "ISO 13920-D"),
    },
    { requiredKeys: ["unit"] },
  );
  const anyOptions = fc.record(
    {
      feature: anyFeature,
      shorterLeg: anyLength,
      process: fc.constantFrom(
        "machined" as const,
        "cast" as const,
        "welded" as const,
        "cast to machined" as const,
        "welded to machined" as const,
      ),
    },
    { requiredKeys: [] },
  );
  const anySize = fc.oneof(
    fc
      .tuple(fc.constantFrom("", "⌀", "R"), fc.integer({ min: 1, max: 9_999_999 }), fc.integer({ min: 0, max: 3 }))
      .map(([mark, digits, places]) => `${mark}${(digits / 10 ** places).toFixed(places)}`),
    fc.integer({ min: 1, max: 179 }).map((angle) => `${angle}°`),
  );

  it("a block is taken back unchanged", () => {
    fc.assert(
      fc.property(anyBlock, (spec) => {
        const block = titleBlock(spec);
        expect(titleBlock(block)).toEqual(block);
        expect(titleBlock(JSON.parse(JSON.stringify(block)) as TitleBlockSpec)).toEqual(block);
      }),
      { numRuns: 300 },
    );
  });

  it("a default is right about its size, or refused by a code of this room", () => {
    fc.assert(
      fc.property(anyBlock, anySize, anyOptions, (spec, text, options) => {
        const found = attempt(() => defaultLimits(spec, text, options));
        if (!found.ok) {
          expect(found.error.code).toMatch(/^(?:TITLE_BLOCK_|GENERAL_TOLERANCE_|OPTION_INVALID$)/);
          return;
        }
        expect(found.value.line).toContain("±");
        expect(found.value.limits.basis.length).toBeGreaterThan(0);
        expect(found.value.cautions.every(({ code, says }) => code !== "" && says !== "")).toBe(true);
      }),
      { numRuns: 3000 },
    );
  });

  it("a line of the block goes before its standard, and more lines change no other size", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 99_999 }), tolerance, (digits, line) => {
        const text = (digits / 100).toFixed(2);
        const standard: TitleBlockSpec = { unit: "mm", general: "ISO 2768-m" };
        const block: TitleBlockSpec = { ...standard, decimals: { 2: line } };
        expect(defaultLimits(block, text).line).toMatch(/^2 decimals/);
        const other = (digits / 10).toFixed(1);
        const answers = [standard, block].map((one) => attempt(() => defaultLimits(one, other).line));
        const [without, with2] = answers;
        expect(with2?.ok === true ? with2.value : null).toBe(without?.ok === true ? without.value : null);
      }),
    );
  });

  it("between two processes the larger tolerance applies", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 4000 }), fc.integer({ min: 1, max: 12 }), (size, grade) => {
        const block: TitleBlockSpec = { unit: "mm", general: "ISO 2768-m", castings: `DCTG ${grade}` };
        const width = (process: NonNullable<DefaultLimitsOptions["process"]>) =>
          attempt(
            () => defaultLimits(block, readDimension(`${size}`, { unit: "mm" }), { process }).limits.tolerance.ticks,
          );
        const [cast, machined, both] = [width("cast"), width("machined"), width("cast to machined")];
        if (!cast.ok || !machined.ok) {
          expect(both.ok).toBe(false);
          return;
        }
        expect(both.ok ? both.value : NaN).toBe(Math.max(cast.value, machined.value));
      }),
    );
  });
});

describe("texts", () => {
  const pieces = fc.constantFrom(
    "ISO ",
    "2768",
    "-",
    "m",
    "K",
    "-E",
    "-1",
    "-2",
    ":1989",
    "; ",
    " and ",
    "DCTG ",
    "8",
    "16",
    "13920",
    "B",
    "F",
    "8062-3",
    " ",
    "\u2013",
    "±",
    "+",
    "0.3",
    "/",
    ",",
    ".",
    "in",
    "\u0000",
    "\u{1F600}",
    "constructor",
    "__proto__",
    "⌀",
    "R",
    "°",
    "(",
    "REF",
    "M8",
  );
  const anyText = fc.oneof(
    fc.array(pieces, { maxLength: 10 }).map((parts) => parts.join("")),
    fc.string({ unit: "binary", maxLength: 200 }),
  );

  it("no text makes the readers throw anything but a LimitsError", () => {
    fc.assert(
      fc.property(anyText, (text) => {
        // attempt passes every other error on
        const called = attempt(() => generalTolerance(text));
        if (called.ok) expect(generalTolerance(called.value)).toEqual(called.value);
        attempt(() => readEdge(text, { side: "external" }));
        attempt(() => defaultLimits({ unit: "mm", general: "ISO 2768-m" }, text));
        attempt(() => titleBlock({ unit: "mm", general: text, edges: text, finish: text }));
        attempt(() => titleBlock({ unit: "in", castings: text, edges: { external: text, internal: text } }));
        attempt(() => titleBlock({ unit: "in", diameters: { decimals: { [text]: text }, fractions: text } }));
      }),
      { numRuns: 5000 },
    );
  });

  it("any value at all: a result or a LimitsError", () => {
    fc.assert(
      fc.property(fc.anything({ withBigInt: true, withNullPrototype: true }), (value) => {
        const wrong = value as never;
        attempt(() => generalTolerance(wrong));
        attempt(() => generalFormTolerance("ISO 2768-mK", wrong));
        attempt(() => generalFormTolerance("ISO 2768-mK", { characteristic: "roundness", diameter: wrong }));
        attempt(() => defaultLimits({ unit: "mm", general: "ISO 2768-m" }, wrong));
        attempt(() => defaultLimits({ unit: "mm", general: "ISO 2768-m" }, "25", wrong));
        attempt(() => defaultLimits({ unit: "mm", general: "ISO 2768-m" }, { kind: "plain", nominal: wrong }));
        attempt(() =>
          titleBlock({ unit: "mm", diameters: wrong, general: wrong, edges: wrong, finish: wrong, preset: wrong }),
        );
        attempt(() => readEdge(wrong, wrong));
      }),
      { numRuns: 2000 },
    );
  });
});
