import {
  asLength,
  asLimits,
  inch,
  isoDeviations,
  isoFit,
  isoLimits,
  mm,
  parseToleranceClass,
  readAngle,
  readDimension,
  readLength,
  standardTolerance,
} from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

/** Every door that takes a text, and the codes with which an over-long one is turned away. */
const READERS: readonly (readonly [string, (text: string) => unknown, RegExp])[] = [
  ["readLength", (text) => readLength(text), /^TEXT_TOO_LONG$/],
  ["readLength with a comma", (text) => readLength(text, { decimalMark: "," }), /^TEXT_TOO_LONG$/],
  ["asLength", (text) => asLength(text), /^TEXT_TOO_LONG$/],
  ["readDimension", (text) => readDimension(text), /^TEXT_TOO_LONG$/],
  ["readDimension in mm", (text) => readDimension(text, { unit: "mm" }), /^TEXT_TOO_LONG$/],
  ["readAngle", (text) => readAngle(text), /^TEXT_TOO_LONG$/],
  ["mm", (text) => mm(text), /^TEXT_TOO_LONG$/],
  ["inch", (text) => inch(text), /^TEXT_TOO_LONG$/],
  ["mm of a decimal", (text) => mm({ toFixed: () => text }), /^(?:TEXT_TOO_LONG|NUMBER_NOT_FINITE)$/],
  [
    "asLimits",
    (text) => asLimits({ nominal: text, upperDeviation: "0 mm", lowerDeviation: "0 mm" }),
    /^TEXT_TOO_LONG$/,
  ],
  ["parseToleranceClass", (text) => parseToleranceClass(text), /^CLASS_MALFORMED$/],
  ["isoLimits", (text) => isoLimits("40 mm", text), /^CLASS_MALFORMED$/],
  ["isoDeviations, the size", (text) => isoDeviations(text, "h7"), /^TEXT_TOO_LONG$/],
  ["isoFit", (text) => isoFit("40 mm", text), /^(?:FIT|CLASS)_MALFORMED$/],
  ["isoFit, apart", (text) => isoFit("40 mm", { hole: text, shaft: text }), /^CLASS_MALFORMED$/],
  ["standardTolerance", (text) => standardTolerance("40 mm", text as never), /^CLASS_GRADE_UNKNOWN$/],
];

/** Beginnings that lead a reader as far as it will go before the text turns out to be nothing. */
const PATTERNS: readonly (readonly [string, string])[] = [
  ["digits", "1"],
  ["zeros", "0"],
  ["letters", "x"],
  ["points", "."],
  ["signs", "-"],
  ["minus signs", "\u2212"],
  ["bars", "/"],
  ["mixed numbers", "1 1/"],
  ["fractions", "1/2 "],
  ["degrees", "1°1'1\""],
  ["units", "mm"],
  ["mu", "\u00b5"],
  ["classes", "H7"],
  ["fits", "H7/k6"],
  ["hyphens", "H7-k6"],
  ["lone surrogates", "\ud800"],
  ["nulls", "\u0000"],
  ["combining marks", "a\u0301"],
];

const MEGABYTE = 1_000_000;

function text(pattern: string, length: number): string {
  return pattern.repeat(Math.ceil(length / pattern.length)).slice(0, length);
}

describe.each(READERS)("%s", (_, read, code) => {
  it.each(PATTERNS)("refuses a megabyte of %s", (__, pattern) => {
    const error = thrown(() => read(text(pattern, MEGABYTE)));
    expect(error.code).toMatch(code);
    // the error does not carry the megabyte along
    expect((error.value ?? "").length).toBeLessThanOrEqual(81);
    expect(error.message.length + (error.allowed ?? "").length).toBeLessThan(1000);
  });

  it("refuses a number that hides behind a megabyte of blanks, or before one", () => {
    const blanks = " ".repeat(MEGABYTE);
    for (const hidden of [`${blanks}40 mm`, `40 mm${blanks}`, `40${blanks}mm`, blanks]) {
      expect(codeOf(() => read(hidden))).toMatch(
        /^(?:TEXT_TOO_LONG|TEXT_EMPTY|(?:CLASS|FIT|NUMBER)_MALFORMED|CLASS_GRADE_UNKNOWN|UNIT_[A-Z]+)$/,
      );
    }
  });
});

describe("a good value in a megabyte of blanks", () => {
  const blanks = " ".repeat(MEGABYTE);

  it.each<[string, (text: string) => unknown, string]>([
    ["readLength", readLength, "40 mm"],
    ["readDimension", readDimension, "40 mm"],
    ["readAngle", readAngle, "40°"],
    ["mm", mm, "40"],
    ["inch", inch, "1 1/4"],
    ["parseToleranceClass", parseToleranceClass, "m6"],
    ["isoFit", (fit) => isoFit("40 mm", fit), "H7/m6"],
  ])("is too long a text for %s", (_, read, good) => {
    for (const hidden of [blanks + good, good + blanks]) {
      expect(codeOf(() => read(hidden))).toMatch(/^(?:TEXT_TOO_LONG|CLASS_MALFORMED|FIT_MALFORMED)$/);
    }
    expect(read(good)).toBeDefined();
  });
});

describe("the work grows no faster than the text", () => {
  // Ten times the text may cost ten times the work; a quadratic reader would need a hundred times.
  // The best of several rounds, so that a busy machine does not decide; the floor is what a clock can tell.
  const FLOOR_MS = 0.2;
  const ROUNDS = 5;
  const MOST = 40;

  function bestTime(read: (text: string) => unknown, input: string): number {
    let best = Infinity;
    for (let round = 0; round < ROUNDS; round++) {
      const begin = performance.now();
      codeOf(() => read(input));
      best = Math.min(best, performance.now() - begin);
    }
    return Math.max(best, FLOOR_MS);
  }

  it.each(READERS)("%s", (_, read) => {
    for (const [name, pattern] of [...PATTERNS, ["blanks", " "] as const]) {
      const short = bestTime(read, `${text(pattern, MEGABYTE / 10)}!`);
      const long = bestTime(read, `${text(pattern, MEGABYTE)}!`);
      expect(`${name}: ${long / short < MOST ? "linear" : `${long / short} times`}`).toBe(`${name}: linear`);
    }
  });
});
