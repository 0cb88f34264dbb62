import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { attempt, readCallout, writeCallout } from "limitsmith";
import type { CalloutRequest, CalloutStyle } from "limitsmith";

// texts of every form, built from the forms and not from the reader
const inchNumber = fc
  .tuple(fc.integer({ min: 0, max: 20 }), fc.integer({ min: 1, max: 9999 }))
  .map(([whole, decimals]) => {
    const text = String(decimals).padStart(4, "0");
    return whole === 0 ? `.${text}` : `${whole}.${text}`;
  });
const metricNumber = fc.oneof(
  fc.integer({ min: 4, max: 400 }).map(String),
  fc
    .tuple(fc.integer({ min: 0, max: 400 }), fc.integer({ min: 1, max: 999 }))
    .map(([whole, decimals]) => `${whole}.${String(decimals).padStart(3, "0")}`),
);
const fraction = fc
  .tuple(fc.integer({ min: 0, max: 30 }), fc.constantFrom(2, 4, 8, 16, 32, 64), fc.nat())
  .map(
    ([whole, denominator, seed]) => `${whole === 0 ? "" : `${whole} `}${1 + (seed % (denominator - 1))}/${denominator}`,
  );
const size = fc
  .record({ unit: fc.constantFrom("mm" as const, "in" as const) })
  .chain(({ unit }) => (unit === "mm" ? metricNumber : fc.oneof(inchNumber, fraction)).map((text) => ({ unit, text })));
const small = fc.integer({ min: 1, max: 99 });
const tolerance = fc.oneof(
  small.map((value) => `±.${String(value).padStart(3, "0")}`),
  fc.tuple(small, small).map(([up, down]) => `+.${String(up).padStart(3, "0")}/-.${String(down).padStart(4, "0")}`),
  small.map((value) => `+.000/-.${String(value).padStart(3, "0")}`),
  small.map((value) => `+0.${String(value).padStart(2, "0")} 0`),
  fc.constantFrom("H7", "m6", "JS9", "H7/k6", "K5/h6", "MAX", "MIN", "", "LN2", "RC5S shaft", "LT2 HOLE"),
);
const shape = fc.constantFrom("", "⌀", "Ø ", "R", "SR ", "S⌀", "SQ ", "□", "DIA ");
const count = fc.constantFrom("", "2X ", "12X ", "4× ");
const tail = fc.constantFrom("", " THRU", " TYP", " ↧.50", " .75 DEEP", " DEPTH 12", " 3 PLACES");
const sized = fc.tuple(count, shape, size, tolerance, tail).map(([before, mark, { unit, text }, behind, rest]) => ({
  unit,
  text: `${before}${mark}${text} ${behind}${before !== "" && rest === " 3 PLACES" ? "" : rest}`,
}));
const others = fc.oneof(
  size.map(({ unit, text }) => ({ unit, text: `(${text})` })),
  size.map(({ unit, text }) => ({ unit, text: `[⌀${text}]` })),
  size.map(({ unit, text }) => ({ unit, text: `${text} X 45°` })),
  size.map(({ unit, text }) => ({ unit, text: `30° X ${text}` })),
  fc.tuple(inchNumber, inchNumber).map(([left, right]) => ({ unit: "in" as const, text: `⌀${left}/${right}` })),
  fc.tuple(small, small).map(([angle, by]) => ({ unit: "mm" as const, text: `${angle}° ±${by}°` })),
  fc
    .constantFrom("M8x1.25-6g", "1/2-13 UNC-2A THRU", "#10-32 UNF ↧.50", "C0.5", "0°30'", "45° +1°/-0°30'")
    .map((text) => ({ unit: "in" as const, text })),
);
const callouts = fc.oneof({ weight: 4, arbitrary: sized }, { weight: 1, arbitrary: others });
const styles: readonly CalloutStyle[] = [
  { numbers: "inch" },
  { numbers: "metric" },
  { numbers: "inch", decimalMark: "," },
  { numbers: "metric", decimalMark: "," },
];

/** What a request says, without how and where it was written. */
function meaning(request: CalloutRequest): unknown {
  return JSON.parse(
    JSON.stringify(request, (key, value: unknown) => (key === "text" || key === "parts" ? undefined : value)),
  );
}

describe("writeCallout", () => {
  it("reading back what was written gives the same request, in every style", () => {
    let read = 0;
    fc.assert(
      fc.property(callouts, fc.constantFrom(...styles), ({ unit, text }, style) => {
        const first = attempt(() => readCallout(text, { unit }));
        if (!first.ok) {
          // the only texts built here that are refused contradict themselves
          expect(first.error.code).toMatch(/^CALLOUT_(?:ZERO_TOLERANCE|NOT_UNDERSTOOD)$|^LENGTH_TOO_FINE$/);
          return;
        }
        read++;
        const written = writeCallout(first.value, style);
        const again = readCallout(written, { unit, decimalMark: style.decimalMark ?? "." });
        expect(meaning(again)).toEqual(meaning(first.value));
        expect(writeCallout(again, style)).toBe(written);
      }),
      { numRuns: 3000 },
    );
    expect(read).toBeGreaterThan(2500);
  });
});

describe("parts", () => {
  it("lie in the text, in order, and hold what they say", () => {
    fc.assert(
      fc.property(callouts, ({ unit, text }) => {
        const read = attempt(() => readCallout(text, { unit }));
        if (!read.ok) return;
        let before = 0;
        for (const { part, start, end } of read.value.parts) {
          expect(start).toBeGreaterThanOrEqual(before);
          expect(end).toBeGreaterThan(start);
          expect(end).toBeLessThanOrEqual(text.length);
          if (part === "angle") expect(text.slice(start, end)).toMatch(/°/);
          if (part === "count") expect(text.slice(start, end)).toMatch(/^\d+/);
          before = end;
        }
      }),
      { numRuns: 1000 },
    );
  });
});

describe("mutated texts", () => {
  // 100 000 texts: whole callouts with one place changed, and noise
  it("only a LimitsError, never half-read", () => {
    const noise = fc.string({ unit: "binary", maxLength: 40 });
    const changed = fc.tuple(
      callouts,
      fc.nat(),
      fc.oneof(
        fc.string({ unit: "binary", maxLength: 2 }),
        fc.constantFrom("°", "X", "/", "-", "(", "]", "7", " ", "\n"),
      ),
    );
    let tried = 0;
    fc.assert(
      fc.property(fc.array(changed, { minLength: 20, maxLength: 20 }), noise, (many, raw) => {
        for (const [{ unit, text }, place, piece] of many) {
          const at = place % (text.length + 1);
          for (const mutated of [text.slice(0, at) + piece + text.slice(at), text.slice(0, at) + text.slice(at + 1)]) {
            tried++;
            attempt(() => readCallout(mutated, { unit }));
          }
        }
        tried++;
        attempt(() => readCallout(raw, { unit: "in" }));
      }),
      { numRuns: 2500 },
    );
    expect(tried).toBeGreaterThan(100_000);
  });
});

describe("time", () => {
  // as a ratio in one run: a reader that is worse than linear would need ten times as long a character, and more
  const MOST = 8;
  const ROUNDS = 7;
  const pieces = [
    "1 1/",
    "1-1/4",
    "+.1",
    "±",
    "(",
    "[1/",
    "45°",
    "X",
    "A",
    "M8x",
    "1/2-13 UN",
    " ",
    "\n",
    "0/",
    "µ",
    "1.",
  ];

  function nsPerCharacter(texts: readonly string[]): number {
    const characters = texts.reduce((sum, text) => sum + text.length, 0);
    let best = Infinity;
    for (let round = 0; round < ROUNDS; round++) {
      const begin = performance.now();
      for (let repeat = 0; repeat < 20; repeat++)
        for (const text of texts) attempt(() => readCallout(text, { unit: "in" }));
      best = Math.min(best, performance.now() - begin);
    }
    return (best * 1e6) / 20 / characters;
  }

  it("a character of a long text costs no more than a few times one of a short text", () => {
    const ofLength = (length: number): string[] =>
      pieces.map((piece) => piece.repeat(Math.ceil(length / piece.length)).slice(0, length));
    expect(nsPerCharacter(ofLength(200)) / nsPerCharacter(ofLength(20))).toBeLessThan(MOST);
  });
});
