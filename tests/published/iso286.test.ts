import {
  fundamentalDeviation,
  isoDeviations,
  isoFit,
  isoLimits,
  LimitsError,
  lengthOfTicks,
  preferredIsoClasses,
  preferredIsoFits,
  standardTolerance,
} from "limitsmith";
import type { BasisStep, GradeName, IsoOptions, Length, Limits } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";
import { expectWhole } from "./expectWhole.js";
import { readCases } from "./readCases.js";

// The cases are copies of what published tables say; nothing in them was made by this library.

interface Range {
  readonly over: string;
  readonly to: string;
}
interface Cell extends Range {
  readonly letter: string;
  readonly grades: string;
}
interface Whole extends Partial<Range> {
  readonly class: string;
  readonly size?: string;
  readonly options?: IsoOptions;
}
interface Both {
  readonly upper_um: number;
  readonly lower_um: number;
}

const TICKS_PER_MM = 10_000_000;
const NOT_DEFINED = new Set(["ISO_GRADE_NOT_DEFINED", "ISO_DEVIATION_NOT_DEFINED", "ISO_CLASS_NOT_DEFINED"]);
const GRADE_NAMES = ["01", "0", ...Array.from({ length: 18 }, (_, index) => String(index + 1))];

const tolerances = readCases<{ grade: string } & Range, { um: number }>("iso286/standard-tolerances.json");
const shafts = readCases<Cell, { es_um?: number; ei_um?: number }>("iso286/shaft-deviations.json");
const holes = readCases<Cell, { EI_um?: number; ES_um?: number }>("iso286/hole-deviations.json");
const deltas = readCases<{ grade: string } & Range, { delta_um: number }>("iso286/deltas.json");
const steps = readCases<{ kind: string } & Range, { letters: string }>("iso286/size-steps.json");
const classes = readCases<Whole, Both>("iso286/classes.json");
const examples = readCases<Whole, Both>("iso286/worked-examples.json");
const corrections = readCases<Whole & Range, Partial<Both>>("iso286/corrections.json");
const fits = readCases<
  { fit: string; size: string },
  { kind: string; maxClearance_um: number; minClearance_um: number }
>("iso286/fits.json");
const bothUnits = readCases<{ class: string; size: string }, { max: string; min: string }>(
  "iso286/sizes-in-both-units.json",
);
const preferredClasses = readCases<{ class: string }, { preferred: true; firstChoice: boolean }>(
  "iso286/preferred-classes.json",
);
const preferredFits = readCases<{ fit: string }, { system: string }>("iso286/preferred-fits.json");
const namedFits = readCases<{ name: string }, { kind: string; holeBasis: string; shaftBasis: string }>(
  "iso286/preferred-fits-ansi.json",
);
const spans = readCases<{ letter: string }, { finest: number; coarsest: number } & Range>("iso286/printed-spans.json");

/** A range at its ends and in the middle: just above the lower end, half way, the upper end itself. */
function sizesOf({ over, to }: Range): Length[] {
  const low = Number(over) * TICKS_PER_MM;
  const high = Number(to) * TICKS_PER_MM;
  return [low + 1, (low + high) / 2, high].map((ticks) => lengthOfTicks(ticks, "mm"));
}

function sizesOfWhole({ over, to, size }: Whole): Length[] {
  if (size !== undefined) return [lengthOfTicks(Number(size) * TICKS_PER_MM, "mm")];
  if (over === undefined || to === undefined) throw new Error("a case needs a size or a range");
  return sizesOf({ over, to });
}

/** Grades as the files write them: `all`, `IT6`, `IT3-IT8`. */
function gradesOf(text: string): string[] {
  if (text === "all") return GRADE_NAMES;
  const [first = "", last = first] = text.split("-").map((grade) => grade.slice(2));
  const from = GRADE_NAMES.indexOf(first);
  const end = GRADE_NAMES.indexOf(last);
  if (from < 0 || end < from) throw new Error(`not a range of grades: ${text}`);
  return GRADE_NAMES.slice(from, end + 1);
}

/** The cells of one grade, so that a size is looked up in some twenty rows. */
function rowsByGrade<T extends { readonly input: { grade: string } & Range }>(rows: readonly T[]): Map<string, T[]> {
  const byGrade = new Map<string, T[]>();
  for (const row of rows) byGrade.set(row.input.grade, [...(byGrade.get(row.input.grade) ?? []), row]);
  return byGrade;
}

const tolerancesByGrade = rowsByGrade(tolerances.cases);
const deltasByGrade = rowsByGrade(deltas.cases);

function rowAt<T extends { readonly input: Range }>(rows: readonly T[] | undefined, size: Length): T {
  const row = rows?.find(
    ({ input }) => size.ticks > Number(input.over) * TICKS_PER_MM && size.ticks <= Number(input.to) * TICKS_PER_MM,
  );
  if (row === undefined) throw new Error(`no cell at ${size.toString()}`);
  return row;
}

/** What the table of standard tolerances says at a size, looked up in the file. */
function gradeAt(grade: string, size: Length): number | null {
  return rowAt(tolerancesByGrade.get(`IT${grade}`), size).expected?.um ?? null;
}

function deltaAt(grade: string, size: Length): number {
  return rowAt(deltasByGrade.get(`IT${grade}`), size).expected?.delta_um ?? NaN;
}

function umOf(length: Length): number {
  return length.ticks / 10_000;
}

/** Both ways to the same numbers: the fast one in µm and the exact one in lengths; they must agree. */
function deviationsBothWays(size: Length, cls: string, options?: IsoOptions): Both {
  const fast = isoDeviations(size, cls, options);
  const exact = isoLimits(size, cls, options);
  expect(umOf(exact.upperDeviation)).toBe(fast.upperDeviationUm);
  expect(umOf(exact.lowerDeviation)).toBe(fast.lowerDeviationUm);
  return { upper_um: fast.upperDeviationUm, lower_um: fast.lowerDeviationUm };
}

function tableStep(limits: Limits, table: string): BasisStep | undefined {
  return limits.basis.find((step) => step.standard === "ISO 286-1:2010" && step.place.startsWith(`Table ${table},`));
}

describe("the files", () => {
  it.each([
    ["standard-tolerances.json", tolerances, 425],
    ["shaft-deviations.json", shafts, 972],
    ["hole-deviations.json", holes, 1628],
    ["deltas.json", deltas, 72],
    ["size-steps.json", steps, 62],
    ["classes.json", classes, 153],
    ["worked-examples.json", examples, 21],
    ["corrections.json", corrections, 4],
    ["fits.json", fits, 19],
    ["sizes-in-both-units.json", bothUnits, 2],
    ["printed-spans.json", spans, 56],
    ["preferred-classes.json", preferredClasses, 92],
    ["preferred-fits.json", preferredFits, 83],
    ["preferred-fits-ansi.json", namedFits, 10],
  ] as const)("%s is whole and says where it comes from", (_, file, count) => {
    expectWhole(file, count);
  });

  it("cover each letter, grade and step", () => {
    expect(new Set(shafts.cases.map(({ input }) => input.letter)).size).toBe(27);
    expect(new Set(holes.cases.map(({ input }) => input.letter)).size).toBe(27);
    expect(new Set(tolerances.cases.map(({ input }) => input.grade)).size).toBe(20);
    // 27 letters and 20 grades, each with rows that add up to the whole range: nothing left out, nothing twice
    const rows = new Map<string, number>();
    for (const { input } of [...shafts.cases, ...holes.cases]) {
      for (const grade of gradesOf(input.grades)) {
        const key = `${input.letter}${grade}`;
        rows.set(key, (rows.get(key) ?? 0) + Number(input.to) - Number(input.over));
      }
    }
    expect(rows.size).toBe(2 * 27 * 20);
    for (const [key, covered] of rows) expect(`${key} ${covered}`).toBe(`${key} 3150`);
  });
});

describe("ISO 286-1, Table 1: every cell", () => {
  it.each(GRADE_NAMES)("IT%s", (grade) => {
    const cells = tolerances.cases.filter(({ input }) => input.grade === `IT${grade}`);
    expect(cells.length).toBeGreaterThanOrEqual(21);
    for (const { input, expected, mark } of cells) {
      for (const size of sizesOf(input)) {
        const name = input.grade as GradeName;
        if (expected === null) {
          expect(codeOf(() => standardTolerance(size, name))).toBe("ISO_GRADE_NOT_DEFINED");
        } else {
          expect(umOf(standardTolerance(size, name).tolerance)).toBe(expected.um);
        }
        for (const letter of ["H", "h"]) {
          if (expected === null) {
            expect(codeOf(() => isoDeviations(size, letter + grade))).toBe("ISO_GRADE_NOT_DEFINED");
            continue;
          }
          const { upper_um, lower_um } = deviationsBothWays(size, letter + grade);
          expect({ input, upper_um, lower_um }).toEqual({
            input,
            upper_um: letter === "H" ? expected.um : 0,
            lower_um: letter === "H" ? 0 : -expected.um,
          });
          expect(tableStep(isoLimits(size, letter + grade), "1")).toMatchObject({ how: "tabulated", mark });
        }
      }
    }
  });
});

describe("ISO 286-1, Tables 4 and 5: every cell and blank of the shafts", () => {
  it.each([...new Set(shafts.cases.map(({ input }) => input.letter))])("%s", (letter) => {
    for (const { input, expected, table = "", mark, edition } of shafts.cases) {
      if (input.letter !== letter) continue;
      for (const grade of gradesOf(input.grades)) {
        const cls = letter + grade;
        for (const size of sizesOf(input)) {
          const width = gradeAt(grade, size);
          if (expected === null || width === null) {
            expect(NOT_DEFINED).toContain(codeOf(() => isoDeviations(size, cls)));
            continue;
          }
          const { es_um, ei_um } = expected;
          expect({ cls, input, ...deviationsBothWays(size, cls) }).toEqual({
            cls,
            input,
            upper_um: es_um ?? (ei_um ?? NaN) + width,
            lower_um: ei_um ?? (es_um ?? NaN) - width,
          });
          expect(tableStep(isoLimits(size, cls), table)).toMatchObject({ how: "tabulated", mark });
          if (edition === "2010") {
            expect(codeOf(() => isoDeviations(size, cls, { edition: "1988" }))).toBe("ISO_DEVIATION_NOT_DEFINED");
          } else {
            expect(isoDeviations(size, cls, { edition: "1988" })).toEqual(isoDeviations(size, cls));
          }
        }
      }
    }
  });
});

describe("ISO 286-1, Tables 2 and 3: every cell and blank of the holes", () => {
  it.each([...new Set(holes.cases.map(({ input }) => input.letter))])("%s", (letter) => {
    for (const { input, expected, table = "", mark, edition, plusDelta } of holes.cases) {
      if (input.letter !== letter) continue;
      for (const grade of gradesOf(input.grades)) {
        const cls = letter + grade;
        for (const size of sizesOf(input)) {
          const width = gradeAt(grade, size);
          if (expected === null || width === null) {
            expect(NOT_DEFINED).toContain(codeOf(() => isoDeviations(size, cls)));
            continue;
          }
          const { EI_um } = expected;
          const ES_um = (expected.ES_um ?? NaN) + (plusDelta === true ? deltaAt(grade, size) : 0);
          expect({ cls, input, ...deviationsBothWays(size, cls) }).toEqual({
            cls,
            input,
            upper_um: EI_um === undefined ? ES_um : EI_um + width,
            lower_um: EI_um ?? ES_um - width,
          });
          expect({ cls, input, step: tableStep(isoLimits(size, cls), table) }).toMatchObject({
            cls,
            input,
            step: { how: "tabulated", mark },
          });
          if (edition === "2010") {
            expect(codeOf(() => isoDeviations(size, cls, { edition: "1988" }))).toBe("ISO_DEVIATION_NOT_DEFINED");
          } else {
            expect(isoDeviations(size, cls, { edition: "1988" })).toEqual(isoDeviations(size, cls));
          }
        }
      }
    }
  });
});

describe("ISO 286-1, Tables 2 and 3: every delta", () => {
  it.each(deltas.cases)("$input.grade over $input.over to $input.to", ({ input, expected }) => {
    const grade = input.grade.slice(2);
    for (const size of sizesOf(input)) {
      // the mirrored value of m, alike in all grades, is what remains when delta is taken away
      const m = isoDeviations(size, "m7").lowerDeviationUm;
      const special = grade === "6" && input.over === "250";
      const letter = special ? "N" : "M";
      const value = special ? isoDeviations(size, "n7").lowerDeviationUm : m;
      expect(isoDeviations(size, letter + grade).upperDeviationUm + value).toBe(expected?.delta_um);
      expect(umOf(fundamentalDeviation(size, letter + grade).delta)).toBe(expected?.delta_um);
    }
  });
});

describe("ISO 286-1, size steps", () => {
  it.each(steps.cases)("$input.kind over $input.over to $input.to", ({ input }) => {
    // a letter of that kind gives one answer in all of the step and, in the basis, names the step
    const cls = input.kind === "main" ? "p8" : "s8";
    const text = input.over === "0" ? `up to ${input.to} mm` : `over ${input.over} up to ${input.to} mm`;
    for (const size of sizesOf(input)) expect(tableStep(isoLimits(size, cls), "5")?.place).toBe(`Table 5, ${text}`);
  });
});

describe.each([
  ["whole classes as published", classes],
  ["worked examples", examples],
] as const)("%s", (_, file) => {
  it.each(file.cases.map((one) => [`${one.input.class} ${JSON.stringify(one.input)}`, one] as const))(
    "%s",
    (__, { input, expected }) => {
      for (const size of sizesOfWhole(input)) {
        if (expected === null) {
          expect(NOT_DEFINED).toContain(codeOf(() => isoLimits(size, input.class, input.options)));
          expect(NOT_DEFINED).toContain(codeOf(() => isoDeviations(size, input.class, input.options)));
        } else {
          expect(deviationsBothWays(size, input.class, input.options)).toEqual(expected);
        }
      }
    },
  );
});

describe("ISO 286-2:1988/Cor.1:2006", () => {
  it.each(corrections.cases)("$input.class over $input.over to $input.to", ({ input, expected }) => {
    expect(expected).not.toBeNull();
    for (const size of sizesOf(input)) expect(deviationsBothWays(size, input.class)).toMatchObject(expected ?? {});
  });
});

describe("whole fits as published", () => {
  it.each(fits.cases)("$input.size $input.fit", ({ input, expected }) => {
    const fit = isoFit(`${input.size} mm`, input.fit);
    expect({
      kind: fit.kind,
      maxClearance_um: umOf(fit.maxClearance),
      minClearance_um: umOf(fit.minClearance),
    }).toEqual(expected);
  });
});

describe("limits of size in metric and inch", () => {
  it.each(bothUnits.cases)("$input.size $input.class", ({ input, expected }) => {
    const { max, min } = isoLimits(input.size, input.class);
    // exact to the tick: the mm text of the file reads back to the very same length
    expect({ max: lengthOfTicks(max.ticks, "mm").toString(), min: lengthOfTicks(min.ticks, "mm").toString() }).toEqual(
      expected,
    );
  });
});

describe("ISO 286-2: the printed span of each letter", () => {
  it.each(spans.cases)("$input.letter, Table $table", ({ input, expected, table = "", mark }) => {
    if (expected === null) throw new Error("a span is never null");
    let inside = 0;
    const { finest, coarsest, over, to } = expected;
    const span = `${input.letter}${finest} to ${input.letter}${coarsest}, ${over === "0" ? "" : `over ${over} `}up to ${to} mm`;
    for (const { input: step } of steps.cases) {
      if (step.kind !== "intermediate") continue;
      for (const size of sizesOf(step)) {
        for (const grade of GRADE_NAMES) {
          const cls = input.letter + grade;
          let limits: Limits;
          try {
            limits = isoLimits(size, cls);
          } catch (error) {
            if (error instanceof LimitsError && NOT_DEFINED.has(error.code)) continue;
            throw error;
          }
          const number = grade === "01" ? -1 : Number(grade);
          const printed =
            number >= expected.finest &&
            number <= expected.coarsest &&
            Number(step.over) >= Number(expected.over) &&
            Number(step.to) <= Number(expected.to);
          if (printed) inside++;
          expect({ cls, size: size.toString(), ...limits.basis[0] }).toMatchObject(
            printed
              ? {
                  cls,
                  standard: "ISO 286-2:2010",
                  place: `Table ${table}`,
                  how: "tabulated",
                  mark,
                  says: expect.stringContaining(span) as string,
                }
              : { cls, standard: "ISO 286-1:2010", how: "derived" },
          );
        }
      }
    }
    expect(inside).toBeGreaterThan(0);
  });
});

describe("preferred classes and fits", () => {
  it("ISO 286-1: these classes, with their first choice, and no others", () => {
    const wanted = preferredClasses.cases.map(({ input, expected }) => `${input.class} ${expected?.firstChoice}`);
    expect(
      preferredIsoClasses()
        .map(({ text, firstChoice }) => `${text} ${firstChoice}`)
        .sort(),
    ).toEqual(wanted.sort());
  });

  it("ISO 286-1 and ANSI B4.2: these fits in each system, and no others", () => {
    const wanted = new Set([
      ...preferredFits.cases.map(({ input, expected }) => `${input.fit} ${expected?.system}`),
      ...namedFits.cases.map(({ expected }) => `${expected?.holeBasis} hole basis`),
      ...namedFits.cases.map(({ expected }) => `${expected?.shaftBasis} shaft basis`),
    ]);
    const given = preferredIsoFits().map(({ fit, system }) => `${fit} ${system}`);
    expect([...given].sort()).toEqual([...wanted].sort());
    expect(new Set(given).size).toBe(given.length);
  });

  it("ANSI B4.2: ten pairs by name, loosest first, each with a use", () => {
    const pairs = preferredIsoFits().filter(({ standard }) => standard === "ANSI B4.2");
    for (const [system, key] of [
      ["hole basis", "holeBasis"],
      ["shaft basis", "shaftBasis"],
    ] as const) {
      const own = pairs.filter((one) => one.system === system);
      expect(own.map(({ fit }) => fit)).toEqual(namedFits.cases.map(({ expected }) => expected?.[key]));
      for (const [index, { name, use }] of own.entries()) {
        // the standard gives two pairs one name; the tighter one is marked as such in either list
        const [plain = ""] = (namedFits.cases[index]?.input.name ?? "").split(" (");
        expect(name).toContain(plain);
        expect(use).not.toBeNull();
      }
    }
  });

  it.each(namedFits.cases)("ANSI B4.2, $input.name: the kind it should be, over 3 up to 500 mm", ({ expected }) => {
    for (const { input: step } of steps.cases) {
      if (step.kind !== "intermediate" || Number(step.over) < 3 || Number(step.to) > 500) continue;
      for (const size of sizesOf(step)) {
        const holeBasis = isoFit(size, expected?.holeBasis ?? "");
        const shaftBasis = isoFit(size, expected?.shaftBasis ?? "");
        expect([holeBasis.kind, shaftBasis.kind]).toEqual([expected?.kind, expected?.kind]);
        // the same clearances on either basis
        expect(shaftBasis.maxClearance.ticks).toBe(holeBasis.maxClearance.ticks);
        expect(shaftBasis.minClearance.ticks).toBe(holeBasis.minClearance.ticks);
      }
    }
  });
});
