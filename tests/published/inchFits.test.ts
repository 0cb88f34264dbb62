import { inchClasses, inchFit, inchFitReadings, inchStandardTolerance } from "limitsmith/inchFits";
import { preferredInchSizes, preferredInchTolerances } from "limitsmith/inchFits";
import type { InchFit, InchGrade } from "limitsmith/inchFits";
import { inch, lengthOfTicks } from "limitsmith/units";
import type { Length } from "limitsmith/units";
import { describe, expect, it } from "vitest";
import { thrown } from "../support/thrown.js";
import { expectWhole } from "./expectWhole.js";
import { readCases } from "./readCases.js";

// The cases are copies of what published tables say; nothing in them was made by this library.

interface Step {
  readonly over: string;
  readonly to: string;
}
interface Row {
  readonly hole_upper: string;
  readonly hole_lower: string;
  readonly shaft_upper: string;
  readonly shaft_lower: string;
  readonly clearance_min?: string;
  readonly clearance_max?: string;
  readonly interference_min?: string;
  readonly interference_max?: string;
  readonly fit_pair?: readonly [string, string];
}
interface Whole {
  readonly hole_max: string;
  readonly hole_min: string;
  readonly shaft_max: string;
  readonly shaft_min: string;
  readonly fit: {
    readonly kind: string;
    readonly clearance_min?: string;
    readonly clearance_max?: string;
    readonly interference_min?: string;
    readonly interference_max?: string;
  };
  readonly deviations: { readonly hole: readonly [string, string]; readonly shaft: readonly [string, string] };
}
interface Special {
  readonly happens: string;
  readonly hole_max?: string;
  readonly hole_min?: string;
  readonly values?: readonly { readonly shaft_max: string; readonly shaft_min: string }[];
}

const rows = readCases<{ class: string } & Step, Row>("inchFits/rows.json");
const variants = readCases<{ class: string } & Step, Row>("inchFits/variants.json");
const symbols = readCases<{ class: string }, { hole_symbol: string; shaft_symbol: string | null }>(
  "inchFits/classes.json",
);
const tolerances = readCases<{ grade: string } & Step, { thou: string }>("inchFits/standard-tolerances.json");
const exceptions = readCases<
  { class: string; part: "hole" | "shaft"; grade: string } & Step,
  { printed: string; by_grade: string }
>("inchFits/width-exceptions.json");
const examples = readCases<{ class: string; size: string; basis: string }, Whole>("inchFits/worked-examples.json");
const specials = readCases<{ class: string; size: string }, Special>("inchFits/special-cases.json");
const sizes = readCases<{ series: "decimal" | "fractional"; size: string }, { inches: string }>(
  "inchFits/preferred-sizes.json",
);
const series = readCases<{ place: number }, { thou: string }>("inchFits/preferred-tolerances.json");

/** Ticks of 0.1 nm of a decimal text, digit by digit: no double in between. */
function ticks(text: string | undefined, unit: "in" | "thou"): number {
  const match = /^([+-]?)(\d+)(?:\.(\d+))?$/.exec(text ?? "");
  if (match === null) throw new Error(`not a decimal: ${text ?? "nothing"}`);
  const [, sign, whole = "", decimals = ""] = match;
  const scaled = BigInt(whole + decimals) * (unit === "in" ? 254_000_000n : 254_000n);
  const perStep = 10n ** BigInt(decimals.length);
  if (scaled % perStep !== 0n) throw new Error(`not a whole number of ticks: ${text ?? ""}`);
  return Number(sign === "-" ? -scaled / perStep : scaled / perStep);
}

/** A step just above its lower end, half way, and at its upper end, which belongs to it. */
function sizesOf({ over, to }: Step): Length[] {
  const low = ticks(over, "in");
  const high = ticks(to, "in");
  return [low + 1, Math.round((low + high) / 2), high].map((at) => lengthOfTicks(at, "in"));
}

/** Deviations of a fit, in ticks, named as the files name them. */
function deviationsOf({ hole, shaft }: InchFit): number[] {
  return [hole.upperDeviation, hole.lowerDeviation, shaft.upperDeviation, shaft.lowerDeviation].map((one) => one.ticks);
}

function rowTicks(row: Row): number[] {
  return [row.hole_upper, row.hole_lower, row.shaft_upper, row.shaft_lower].map((one) => ticks(one, "thou"));
}

/** What a row prints as limits of fit; a pair is minus the interference, plus the clearance. */
function printedTicks(row: Row): (number | null)[] {
  return [row.clearance_min, row.clearance_max, row.interference_min, row.interference_max].map((one) =>
    one === undefined ? null : ticks(one, "thou"),
  );
}

function printedOf({ printedLimits: printed }: InchFit): (number | null)[] {
  return [printed.minClearance, printed.maxClearance, printed.minInterference, printed.maxInterference].map(
    (one) => one?.ticks ?? null,
  );
}

function kindOf(cls: string): string {
  return { RC: "clearance", LC: "clearance", LT: "transition", LN: "interference", FN: "interference" }[
    cls.slice(0, 2)
  ] as string;
}

function definedRows() {
  return rows.cases.flatMap(({ input, expected, mark }) => (expected === null ? [] : [{ input, expected, mark }]));
}

describe("the files", () => {
  it.each([
    ["rows.json", rows, 502],
    ["variants.json", variants, 6],
    ["classes.json", symbols, 34],
    ["standard-tolerances.json", tolerances, 210],
    ["width-exceptions.json", exceptions, 16],
    ["worked-examples.json", examples, 50],
    ["special-cases.json", specials, 6],
    ["preferred-sizes.json", sizes, 140],
    ["preferred-tolerances.json", series, 51],
  ] as const)("%s is whole and says where it comes from", (_, file, count) => {
    expectWhole(file, count);
  });

  it("cover each class from 0 to 19.69 in, and each grade from 0 to 200 in, without gap or overlap", () => {
    const ends = new Map<string, string>();
    for (const { input } of rows.cases) {
      expect(input.over).toBe(ends.get(input.class) ?? "0");
      ends.set(input.class, input.to);
    }
    expect(ends.size).toBe(34);
    expect(new Set(ends.values())).toEqual(new Set(["19.69"]));
    const gradeEnds = new Map<string, string>();
    for (const { input } of tolerances.cases) {
      expect(input.over).toBe(gradeEnds.get(input.grade) ?? "0");
      gradeEnds.set(input.grade, input.to);
    }
    expect([...gradeEnds.keys()]).toEqual(["4", "5", "6", "7", "8", "9", "10", "11", "12", "13"]);
    expect(new Set(gradeEnds.values())).toEqual(new Set(["200"]));
  });

  it("agree within each row: limits of fit follow from the limits of hole and shaft", () => {
    let checked = 0;
    for (const { expected: row } of [...definedRows(), ...variants.cases]) {
      if (row === null) throw new Error("a variant is never null");
      const [holeUpper = NaN, holeLower = NaN, shaftUpper = NaN, shaftLower = NaN] = rowTicks(row);
      const [minClearance, maxClearance, minInterference, maxInterference] = printedTicks(row);
      const facts = [
        [minClearance, holeLower - shaftUpper],
        [maxClearance, holeUpper - shaftLower],
        [minInterference, shaftLower - holeUpper],
        [maxInterference, shaftUpper - holeLower],
      ] as const;
      for (const [printed, follows] of facts) {
        if (printed === null) continue;
        expect(printed).toBe(follows);
        checked++;
      }
      if (row.fit_pair !== undefined) {
        expect(row.fit_pair.map((one) => ticks(one, "thou"))).toEqual([-(maxInterference ?? NaN), maxClearance]);
      }
      expect(holeLower).toBe(0);
    }
    expect(checked).toBe(2 * (502 - 13 + 6));
  });
});

describe("ANSI B4.1: every row of every class", () => {
  it.each(symbols.cases.map(({ input }) => input.class))("%s", (cls) => {
    const ofClass = rows.cases.filter(({ input }) => input.class === cls);
    expect(ofClass.length).toBeGreaterThanOrEqual(13);
    for (const { input, expected, mark } of ofClass) {
      for (const size of sizesOf(input)) {
        if (expected === null) {
          const error = thrown(() => inchFit(size, cls));
          expect(error.code).toBe(mark === "missing" ? "INCH_ROW_MISSING" : "INCH_ROW_NOT_DEFINED");
          expect(error.allowed).toContain(cls);
          continue;
        }
        const fit = inchFit(size, cls);
        expect({ input, deviations: deviationsOf(fit), printed: printedOf(fit) }).toEqual({
          input,
          deviations: rowTicks(expected),
          printed: printedTicks(expected),
        });
        expect(fit.hole.max.ticks).toBe(size.ticks + ticks(expected.hole_upper, "thou"));
        expect(fit.shaft.min.ticks).toBe(size.ticks + ticks(expected.shaft_lower, "thou"));
        expect(fit.kind).toBe(kindOf(cls));
        const [row] = fit.basis;
        const from = input.over === "0" ? `up to ${input.to} in` : `over ${input.over} up to ${input.to} in`;
        expect(row).toMatchObject({ mark, how: mark === "formula" ? "derived" : "tabulated" });
        expect(row?.place).toContain(`, ${cls}, ${from}`);
        for (const member of [fit.hole, fit.shaft]) expect(member.basis[0]).toMatchObject({ mark });
        const codes = fit.cautions.map((one) => one.code).filter((code) => code.startsWith("INCH_"));
        expect(codes).toEqual(
          mark === "memory" ? ["INCH_ROW_FROM_MEMORY"] : mark === "conflict" ? ["INCH_ROW_CONFLICT"] : [],
        );
      }
    }
  });

  it("the basis repeats the figures of the row", () => {
    for (const { input, expected } of definedRows()) {
      const says = inchFit(sizesOf(input)[2] ?? inch(1), input.class).basis[0]?.says ?? "";
      const figures = (says.match(/[+-]?\d+(?:\.\d+)?/g) ?? []).map((one) => ticks(one, "thou"));
      const [minClearance, maxClearance, minInterference, maxInterference] = printedTicks(expected);
      const inOrder =
        expected.fit_pair === undefined
          ? [minClearance ?? minInterference, maxClearance ?? maxInterference]
          : [maxInterference, maxClearance];
      expect(figures).toEqual([...rowTicks(expected), ...inOrder]);
    }
  });

  it("each further row that a second table has, by its name", () => {
    expect(inchFitReadings().map(({ name }) => name)).toEqual(["handbook", "textbook appendix"]);
    for (const { input, expected } of variants.cases) {
      if (expected === null) throw new Error("a variant is never null");
      const first = rows.cases.find(
        (one) => one.input.class === input.class && one.input.over === input.over,
      )?.expected;
      for (const size of sizesOf(input)) {
        const fit = inchFit(size, input.class, { reading: "textbook appendix" });
        expect(deviationsOf(fit)).toEqual(rowTicks(expected));
        expect(printedOf(fit)).toEqual(printedTicks(expected));
        expect(fit.reading).toBe("textbook appendix");
        expect(inchFit(size, input.class).reading).toBe("handbook");
        const [caution] = fit.cautions;
        for (const row of [first, expected]) {
          for (const limit of [row?.shaft_upper, row?.shaft_lower]) expect(caution?.says).toContain(short(limit));
        }
      }
    }
    // everywhere else there is one reading, whatever is asked for
    for (const { input, mark, expected } of rows.cases) {
      if (expected === null || mark === "conflict") continue;
      const fit = inchFit(inch(input.to), input.class, { reading: "textbook appendix" });
      expect(fit.reading).toBeNull();
      expect(deviationsOf(fit)).toEqual(rowTicks(expected));
    }
  });
});

/** "-2.0" as this library writes it: "-2". */
function short(text: string | undefined): string {
  return (text ?? "nothing").replace(/\.0$/, "");
}

describe("ANSI B4.1: symbols", () => {
  it.each(symbols.cases)("$input.class", ({ input, expected, mark }) => {
    const facts = inchClasses().find(({ fitClass }) => fitClass.text === input.class);
    expect(facts?.symbols).toEqual({ hole: expected?.hole_symbol, shaft: expected?.shaft_symbol });
    const fit = inchFit(inch(2), input.class);
    expect(fit.symbols).toEqual(facts?.symbols);
    expect(fit.purpose).toBe(facts?.purpose);
    expect(fit.purpose.length).toBeGreaterThan(20);
    expect(fit.basis[1]).toMatchObject({ mark });
    expect(fit.basis[1]?.says).toContain(expected?.hole_symbol);
    expect(fit.basis[1]?.says).toContain(expected?.shaft_symbol ?? "no symbol");
  });

  it("are in the order of the standard", () => {
    expect(inchClasses().map(({ fitClass }) => fitClass.text)).toEqual(symbols.cases.map(({ input }) => input.class));
  });
});

describe("ANSI B4.1: standard tolerances, every cell", () => {
  it.each(["4", "5", "6", "7", "8", "9", "10", "11", "12", "13"])("grade %s", (grade) => {
    const cells = tolerances.cases.filter(({ input }) => input.grade === grade);
    expect(cells).toHaveLength(21);
    for (const { input, expected, mark } of cells) {
      for (const size of sizesOf(input)) {
        const found = inchStandardTolerance(size, Number(grade) as InchGrade);
        expect({ input, ticks: found.tolerance.ticks }).toEqual({ input, ticks: ticks(expected?.thou, "thou") });
        expect(found.tolerance.unit).toBe("thou");
        expect(found.grade).toBe(Number(grade));
        expect(found.basis[0]).toMatchObject({ how: "tabulated", mark });
        const outside = Number(input.over) >= 19.69;
        expect(found.basis[0]?.says.includes("outside the ABC agreements")).toBe(outside);
      }
    }
  });
});

describe("ANSI B4.1: widths against the standard tolerances", () => {
  const exceptionOf = (cls: string, over: string, part: string) =>
    exceptions.cases.find(({ input }) => input.class === cls && input.over === over && input.part === part);
  const gradeOf = (symbol: string | null | undefined) =>
    symbol == null ? null : (Number(/\d+$/.exec(symbol)?.[0]) as InchGrade);

  it("agree wherever a symbol applies, except in the rows listed", () => {
    let compared = 0;
    for (const { input } of definedRows()) {
      const size = sizesOf(input)[1] ?? inch(1);
      const fit = inchFit(size, input.class);
      const of = symbols.cases.find((one) => one.input.class === input.class)?.expected;
      for (const [part, symbol] of [
        ["hole", of?.hole_symbol],
        ["shaft", of?.shaft_symbol],
      ] as const) {
        const grade = gradeOf(symbol);
        if (grade === null || exceptionOf(input.class, input.over, part) !== undefined) continue;
        const width = inchStandardTolerance(size, grade).tolerance.ticks;
        expect({ input, part, ticks: fit[part].tolerance.ticks }).toEqual({ input, part, ticks: width });
        compared++;
      }
    }
    // two parts a row, less the shafts without symbol (13 each of RC9, LC10, LC11; 25 of FN1) and 13 exceptions with one
    expect(compared).toBe(2 * (502 - 13) - 3 * 13 - 25 - 13);
  });

  it.each(exceptions.cases)("$input.class over $input.over, $input.part: printed otherwise", ({ input, expected }) => {
    for (const size of sizesOf(input)) {
      const width = inchFit(size, input.class)[input.part].tolerance.ticks;
      expect(width).toBe(ticks(expected?.printed, "thou"));
      const byGrade = inchStandardTolerance(size, Number(input.grade) as InchGrade).tolerance.ticks;
      expect(byGrade).toBe(ticks(expected?.by_grade, "thou"));
      expect(width).not.toBe(byGrade);
    }
  });
});

describe("ANSI B4.1: modified fits of every row", () => {
  it("suffix S: the largest shaft is basic, all four limits move by minus the shaft's upper limit", () => {
    for (const { input, expected } of definedRows()) {
      for (const size of sizesOf(input)) {
        const fit = inchFit(size, `${input.class}S`);
        const [holeUpper = NaN, holeLower = NaN, shaftUpper = NaN, shaftLower = NaN] = rowTicks(expected);
        expect(deviationsOf(fit)).toEqual([holeUpper - shaftUpper, holeLower - shaftUpper, 0, shaftLower - shaftUpper]);
        expect(printedOf(fit)).toEqual(printedTicks(expected));
        expect(fit.kind).toBe(kindOf(input.class));
        // h shafts do not move, and their symbols still hold
        expect(fit.symbols.hole === null).toBe(shaftUpper !== 0);
        expect(fit.basis.at(-1)?.place).toContain("suffix S");
        expect(fit.basis.at(-1)).toMatchObject({ how: "derived", mark: "one-source" });
      }
    }
  });

  it("suffix B: the plus limit one grade finer, clearance and tolerances kept", () => {
    let built = 0;
    for (const { input, expected } of definedRows()) {
      const size = sizesOf(input)[1] ?? inch(1);
      const hole = symbols.cases.find((one) => one.input.class === input.class)?.expected?.hole_symbol ?? "";
      if (input.class === "RC1" && input.over === "0") {
        // its hole is of no grade there, see the exceptions
        expect(thrown(() => inchFit(size, "RC1B")).code).toBe("INCH_ROW_NOT_DEFINED");
        continue;
      }
      const fit = inchFit(size, `${input.class}B`);
      const finer = tolerances.cases.find(
        (one) =>
          one.input.grade === String(Number(hole.slice(1)) - 1) &&
          size.ticks > ticks(one.input.over, "in") &&
          size.ticks <= ticks(one.input.to, "in"),
      )?.expected?.thou;
      const parent = rowTicks(expected);
      const drop = (parent[0] ?? NaN) - ticks(finer, "thou");
      expect(deviationsOf(fit)).toEqual(parent.map((one) => one - drop));
      expect(fit.hole.upperDeviation.ticks).toBe(ticks(finer, "thou"));
      expect(fit.cautions.map(({ code }) => code)).toContain("INCH_RULE_FROM_MEMORY");
      expect(fit.basis.at(-1)).toMatchObject({ how: "derived", mark: "memory" });
      built++;
    }
    expect(built).toBe(502 - 13 - 1);
  });
});

describe("published and worked checks", () => {
  it.each(
    examples.cases.map(
      (one) => [`${(one as { id?: string }).id ?? ""} ${one.input.class} ${one.input.size}`, one] as const,
    ),
  )("%s", (_, { input, expected }) => {
    if (expected === null) throw new Error("an example is never null");
    const fit = inchFit(inch(input.size), input.class);
    expect(fit.designation).toBe(input.class);
    expect(fit.fitClass.basis).toBe(input.basis);
    expect([fit.hole.max, fit.hole.min, fit.shaft.max, fit.shaft.min].map((one) => one.ticks)).toEqual(
      [expected.hole_max, expected.hole_min, expected.shaft_max, expected.shaft_min].map((one) => ticks(one, "in")),
    );
    const { hole, shaft } = expected.deviations;
    expect(deviationsOf(fit)).toEqual([...hole, ...shaft].map((one) => ticks(one, "thou")));
    const { kind, clearance_min, clearance_max, interference_min, interference_max } = expected.fit;
    expect(fit.kind).toBe(kind);
    const facts = [
      [clearance_min, fit.minClearance, fit.printedLimits.minClearance],
      [clearance_max, fit.maxClearance, fit.printedLimits.maxClearance],
      [interference_min, fit.minInterference, fit.printedLimits.minInterference],
      [interference_max, fit.maxInterference, fit.printedLimits.maxInterference],
    ] as const;
    for (const [wanted, worked, printed] of facts) {
      if (wanted === undefined) expect(printed).toBeNull();
      else expect([worked.ticks, printed?.ticks]).toEqual([ticks(wanted, "in"), ticks(wanted, "in")]);
    }
  });
});

describe("where there are no values, or two", () => {
  const CODES: Readonly<Record<string, string>> = {
    "no values for this class at this size": "INCH_ROW_NOT_DEFINED",
    "size above the table": "INCH_SIZE_OUT_OF_RANGE",
    "no such class": "INCH_CLASS_UNKNOWN",
    "value missing, no guess from RC8": "INCH_ROW_MISSING",
  };

  it.each(specials.cases)("$input.class at $input.size", ({ input, expected }) => {
    const size = inch(input.size);
    if (expected?.values === undefined) {
      expect(thrown(() => inchFit(size, input.class)).code).toBe(CODES[expected?.happens ?? ""]);
      return;
    }
    // an answer with a warning, each table's by its name
    const fits = inchFitReadings().map(({ name }) => inchFit(size, input.class, { reading: name }));
    expect(fits.map(({ shaft }) => ({ shaft_max: shaft.max.ticks, shaft_min: shaft.min.ticks }))).toEqual(
      expected.values.map(({ shaft_max, shaft_min }) => ({
        shaft_max: ticks(shaft_max, "in"),
        shaft_min: ticks(shaft_min, "in"),
      })),
    );
    for (const fit of fits) {
      expect([fit.hole.max.ticks, fit.hole.min.ticks]).toEqual(
        [expected.hole_max, expected.hole_min].map((one) => ticks(one, "in")),
      );
      expect(fit.cautions.map(({ code }) => code)).toContain("INCH_ROW_CONFLICT");
    }
  });
});

describe("ANSI B4.1: preferred sizes and tolerances", () => {
  it.each(["decimal", "fractional"] as const)("%s basic sizes", (name) => {
    const wanted = sizes.cases.filter(({ input }) => input.series === name);
    expect(preferredInchSizes(name).map((one) => one.ticks)).toEqual(
      wanted.map(({ expected }) => ticks(expected?.inches, "in")),
    );
    // fractions as written are the decimals beside them
    for (const { input, expected } of wanted) expect(inch(input.size).ticks).toBe(ticks(expected?.inches, "in"));
  });

  it("series of tolerances and allowances", () => {
    expect(preferredInchTolerances().map((one) => one.ticks)).toEqual(
      series.cases.map(({ expected }) => ticks(expected?.thou, "thou")),
    );
  });

  it("every standard tolerance but 0.12 is of the series", () => {
    const preferred = new Set(series.cases.map(({ expected }) => ticks(expected?.thou, "thou")));
    const others = tolerances.cases.filter(({ expected }) => !preferred.has(ticks(expected?.thou, "thou")));
    expect(others.map(({ input, expected }) => [input.grade, input.to, expected?.thou])).toEqual([
      ["4", "0.12", "0.12"],
    ]);
  });
});
