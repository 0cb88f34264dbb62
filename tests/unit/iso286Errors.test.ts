import { readdirSync, readFileSync } from "node:fs";
import {
  angleLimits,
  asForce,
  asLength,
  asLimits,
  attempt,
  degrees,
  fitOf,
  force,
  inch,
  isoFit,
  isoLimits,
  limits,
  LimitsError,
  mm,
  parseToleranceClass,
  readAngle,
  readLength,
  writeLength,
  writeLimits,
} from "limitsmith";
import type { LimitsProblem } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

const PLAIN = limits({ nominal: mm(5), upper: "0.2 µm", lower: "-0.1 µm" });

/** One call that is refused with each code of the rooms units, limits and iso286. */
const REFUSED: Readonly<Record<string, () => unknown>> = {
  TEXT_EMPTY: () => mm(""),
  TEXT_TOO_LONG: () => mm("1".repeat(99)),
  NUMBER_NOT_FINITE: () => mm(NaN),
  NUMBER_MALFORMED: () => mm("1e3"),
  DECIMAL_MARK_MIXED: () => mm("1,5"),
  FRACTION_NOT_INCH: () => mm("1/2"),
  FRACTION_ZERO_DENOMINATOR: () => inch("1/0"),
  OPTION_INVALID: () => mm("1", { decimalMark: ";" as never }),
  UNIT_MISSING: () => readLength("5"),
  UNIT_UNKNOWN: () => readLength("5 ell"),
  UNIT_AMBIGUOUS: () => readLength("5 mil"),
  LENGTH_INVALID: () => asLength(5 as never),
  LENGTH_TOO_FINE: () => inch("1/3"),
  LENGTH_OUT_OF_RANGE: () => mm(1e300),
  LENGTH_NOT_EXACT: () => writeLength(mm(1), { unit: "in" }),
  ANGLE_INVALID: () => readAngle("5"),
  ANGLE_TOO_FINE: () => readAngle("0.0000000001°"),
  ANGLE_OUT_OF_RANGE: () => degrees(1e9),
  QUANTITY_INVALID: () => asForce(5 as never),
  QUANTITY_OUT_OF_RANGE: () => force(1e16, "N"),
  LIMITS_INVALID: () => asLimits(null as never),
  LIMITS_UPSIDE_DOWN: () => limits({ nominal: mm(5), upper: mm(0), lower: mm(1) }),
  LIMITS_CONTRADICT: () => asLimits({ ...PLAIN, max: mm(6) }),
  LIMITS_NOT_SYMMETRIC: () => writeLimits(PLAIN, { form: "plus-minus" }),
  LIMITS_NO_DESIGNATION: () => writeLimits(PLAIN, { form: "class" }),
  ROUNDING_COLLAPSES: () =>
    writeLimits(
      { nominal: "5.0004 mm", upperDeviation: "0 mm", lowerDeviation: "0 mm" },
      { form: "limits", places: 3 },
    ),
  NOMINALS_DIFFER: () => fitOf(PLAIN, { ...limits({ nominal: mm(6), upper: mm(0), lower: mm(0) }) }),
  CLASS_MALFORMED: () => parseToleranceClass("x"),
  CLASS_LETTER_UNKNOWN: () => parseToleranceClass("i6"),
  CLASS_GRADE_UNKNOWN: () => parseToleranceClass("m19"),
  FIT_MALFORMED: () => isoFit(mm(5), "H7"),
  FIT_NOT_HOLE_AND_SHAFT: () => isoFit(mm(5), "H7/K6"),
  ISO_SIZE_OUT_OF_RANGE: () => isoLimits(mm(0), "m6"),
  ISO_GRADE_NOT_DEFINED: () => isoLimits(mm(600), "h0"),
  ISO_DEVIATION_NOT_DEFINED: () => isoLimits(mm(20), "t6"),
  ISO_CLASS_NOT_DEFINED: () => isoLimits(mm(20), "j9"),
};

/** Codes that the sources of a room name. */
function codesIn(room: string): Set<string> {
  const folder = new URL(`../../src/${room}/`, import.meta.url);
  const found = new Set<string>();
  for (const name of readdirSync(folder)) {
    if (!name.endsWith(".ts")) continue;
    const text = readFileSync(new URL(name, folder), "utf8");
    for (const match of text.matchAll(/LimitsError\(\s*"([A-Z_]+)"/g)) found.add(match[1] ?? "");
  }
  return found;
}

describe("error codes", () => {
  it.each(Object.entries(REFUSED))("%s", (code, task) => {
    const error = thrown(task);
    expect(error.code).toBe(code);
    expect(error.message.length).toBeGreaterThan(10);
    expect(error.message).not.toMatch(/undefined|NaN|\[object/);
    expect(error.allowed ?? "").not.toMatch(/undefined|NaN|\[object/);
  });

  it("every code that units, limits and iso286 can throw is thrown above, or in a test of its own function", () => {
    const named = new Set([...codesIn("units"), ...codesIn("limits"), ...codesIn("iso286")]);
    const folder = new URL("./", import.meta.url);
    const others = readdirSync(folder)
      .filter((name) => name.endsWith(".test.ts") && !import.meta.url.endsWith(name))
      .map((name) => readFileSync(new URL(name, folder), "utf8"))
      .join("\n");
    const unthrown = [...named].filter((code) => !Object.hasOwn(REFUSED, code) && !others.includes(`"${code}"`));
    expect(unthrown).toEqual([]);
    expect(Object.keys(REFUSED).filter((code) => !named.has(code))).toEqual([]);
  });
});

describe("LimitsError", () => {
  it("is an Error that is known by name and code", () => {
    const error = thrown(() => mm(""));
    expect(error).toBeInstanceOf(Error);
    expect(error).toBeInstanceOf(LimitsError);
    expect(error.name).toBe("LimitsError");
    expect(error.stack).toContain("LimitsError");
  });

  it("has nothing but null where there is nothing to say", () => {
    expect(new LimitsError("TEXT_EMPTY", "nothing here").toJSON()).toEqual({
      code: "TEXT_EMPTY",
      message: "nothing here",
      value: null,
      allowed: null,
      path: [],
      position: null,
    });
  });

  it("carries value, allowed, path and position as frozen copies", () => {
    const path = ["rows", 2];
    const position = { start: 3, end: 5 };
    const error = new LimitsError("UNIT_UNKNOWN", "no unit", { value: "ell", allowed: "mm", path, position });
    path.push("x");
    position.end = 99;
    const plain: LimitsProblem = error.toJSON();
    expect(plain).toEqual({
      code: "UNIT_UNKNOWN",
      message: "no unit",
      value: "ell",
      allowed: "mm",
      path: ["rows", 2],
      position: { start: 3, end: 5 },
    });
    for (const part of [plain, plain.path, plain.position]) expect(Object.isFrozen(part)).toBe(true);
    expect(structuredClone(plain)).toEqual(plain);
    expect(JSON.parse(JSON.stringify(error))).toEqual(plain);
  });

  it.each([
    ["text", "5 ell", "5 ell"],
    ["an empty text", "", ""],
    ["a number", 2.5, "2.5"],
    ["NaN", NaN, "NaN"],
    ["a bigint", 5n, "5"],
    ["a boolean", false, "false"],
    ["null", null, "null"],
    ["nothing", undefined, null],
    ["an array", [1], "an array"],
    ["an object", { secret: 1 }, "an object"],
    ["a function", () => 1, "a function"],
    ["a symbol", Symbol("x"), "a symbol"],
  ])("shows %s", (_, value, shown) => {
    expect(new LimitsError("LENGTH_INVALID", "no length", { value }).value).toBe(shown);
  });

  it("shortens a long value to 80 characters and a sign that it goes on", () => {
    expect(new LimitsError("TEXT_TOO_LONG", "too long", { value: "x".repeat(80) }).value).toBe("x".repeat(80));
    expect(new LimitsError("TEXT_TOO_LONG", "too long", { value: "x".repeat(81) }).value).toBe(`${"x".repeat(80)}…`);
    const million = thrown(() => readLength("y".repeat(1_000_000)));
    expect(million.value).toBe(`${"y".repeat(80)}…`);
    // still one sign when a path is put before it
    expect(thrown(() => asLength("y".repeat(1_000_000), ["nominal"])).value).toBe(`${"y".repeat(80)}…`);
  });

  it("asks an object nothing", () => {
    const trap = new Proxy(
      {},
      {
        get: () => {
          throw new Error("looked inside");
        },
      },
    );
    expect(new LimitsError("LENGTH_INVALID", "no length", { value: trap }).value).toBe("an object");
  });
});

describe("attempt", () => {
  it("gives the value", () => {
    const read = attempt(() => readLength("5 mm"));
    expect(read).toEqual({ ok: true, value: mm(5) });
    expect(Object.isFrozen(read)).toBe(true);
  });

  it("gives the error as plain data that can travel", () => {
    const read = attempt(() => readLength("5 mil"));
    expect(read.ok).toBe(false);
    expect(structuredClone(read)).toEqual(read);
    expect(JSON.parse(JSON.stringify(read))).toEqual(read);
    if (!read.ok) expect(read.error).toMatchObject({ code: "UNIT_AMBIGUOUS", value: "5 mil" });
  });

  it("knows the error of another copy of the package", () => {
    const foreign = Object.assign(new Error("elsewhere"), {
      name: "LimitsError",
      toJSON: () => ({ code: "TEXT_EMPTY" }),
    });
    const got = attempt(() => {
      throw foreign;
    });
    expect(got).toEqual({ ok: false, error: { code: "TEXT_EMPTY" } });
  });

  it.each([new TypeError("a bug"), new Error("another"), "a text", null, { name: "LimitsError" }])(
    "throws on what is no LimitsError: %s",
    (error) => {
      let got: unknown = "nothing";
      try {
        attempt(() => {
          throw error;
        });
      } catch (passed) {
        got = passed;
      }
      expect(got).toBe(error);
    },
  );
});

describe("options and parts given as null", () => {
  // null reaches a library from JSON and from callers without types: a typed answer, never a TypeError
  it.each<[string, () => unknown]>([
    ["mm", () => mm("1", null as never)],
    ["readLength", () => readLength("1 mm", null as never)],
    ["writeLength", () => writeLength(mm(1), null as never)],
    ["readAngle", () => readAngle("1°", null as never)],
    ["isoLimits", () => isoLimits(mm(5), "m6", null as never)],
    ["isoFit", () => isoFit(mm(5), "H7/m6", null as never)],
    ["fitOf", () => fitOf(PLAIN, PLAIN, null as never)],
    ["writeLimits", () => writeLimits(PLAIN, null as never)],
    ["angleLimits", () => angleLimits(null as never)],
  ])("%s", (_, task) => {
    let code = "accepted";
    try {
      task();
    } catch {
      code = codeOf(task);
    }
    expect(code).toMatch(/^(?:accepted|[A-Z]+(?:_[A-Z]+)+)$/);
  });
});

describe("angleLimits", () => {
  it("adds the deviations to the nominal", () => {
    const angle = angleLimits({ nominal: "45°", upper: "0°30'", lower: "-0°15'" });
    expect([angle.max, angle.min, angle.tolerance].map(String)).toEqual(["45.5°", "44.75°", "0.75°"]);
    expect(angle.basis[0]).toMatchObject({ how: "caller" });
    for (const part of [angle, angle.max, angle.basis, angle.basis[0]]) expect(Object.isFrozen(part)).toBe(true);
    const basis = [{ standard: "works standard", place: "2", says: "±", how: "common practice" as const }];
    expect(angleLimits({ nominal: "45°", upper: "1°", lower: "0°", basis }).basis).toEqual(basis);
  });

  it.each([
    ["LIMITS_UPSIDE_DOWN", { nominal: "45°", upper: "-1°", lower: "1°" }],
    ["ANGLE_INVALID", { nominal: "45", upper: "1°", lower: "-1°" }],
    ["ANGLE_INVALID", { nominal: "45°", upper: "1°" }],
    ["ANGLE_INVALID", undefined],
    ["ANGLE_OUT_OF_RANGE", { nominal: "2500000°", upper: "2500000°", lower: "0°" }],
    ["LIMITS_INVALID", { nominal: "45°", upper: "1°", lower: "-1°", basis: [{}] }],
  ])("refuses with %s (%#)", (code, parts) => {
    expect(codeOf(() => angleLimits(parts as never))).toBe(code);
  });
});
