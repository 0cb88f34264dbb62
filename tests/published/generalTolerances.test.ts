import {
  defaultLimits,
  generalAngleLimits,
  generalFormTolerance,
  generalLimits,
  generalTolerance,
  halfPlaceLimits,
  inch,
  lengthOfTicks,
  mm,
  readAngle,
  readDimension,
  readEdge,
  titleBlockPreset,
} from "limitsmith";
import type { BasisStep, FormQuestion, Length, SizeFeature } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";
import { readCases } from "./readCases.js";
import type { Case, CaseFile } from "./readCases.js";

// The cases are copies of what published tables say; nothing in them was made by this library.

interface Cell {
  readonly class: string;
  readonly over: string;
  /** `null` where the range is open. */
  readonly to: string | null;
  /** True where the range takes its lower end too. */
  readonly fromIncluded?: boolean;
}
interface Value {
  readonly plusMinus_um?: number;
  readonly plusMinus_min?: number;
  readonly total_um?: number;
}
type Cells = CaseFile<Cell, Value>;

const TICKS_PER_MM = 10_000_000;
const TICKS_PER_UM = 10_000;
const OUT_OF_RANGE = "GENERAL_TOLERANCE_OUT_OF_RANGE";
const NOT_DEFINED = "GENERAL_TOLERANCE_NOT_DEFINED";

const file = (name: string): Cells => readCases<Cell, Value>(`generalTolerances/${name}.json`);
const linear = file("iso2768-linear");
const brokenEdges = file("iso2768-broken-edges");
const angular = file("iso2768-angular");
const straightness = file("iso2768-straightness-flatness");
const perpendicularity = file("iso2768-perpendicularity");
const symmetry = file("iso2768-symmetry");
const runOut = file("iso2768-run-out");
const castings = file("iso8062-castings");
const weldLinear = file("iso13920-linear");
const weldAngular = file("iso13920-angular");
const weldForm = file("iso13920-form");
const edges = readCases<{ a_um: number }, { state: string; recommended: boolean }>(
  "generalTolerances/iso13715-edges.json",
);
const common = readCases<{ places: string }, { plusMinus_in: string }>("generalTolerances/inch-common-values.json");
const shop = readCases<{ what: string }, { plusMinus_in?: string; plusMinus_min?: number; text?: string }>(
  "generalTolerances/inch-shop-standard.json",
);
const saying = readCases<{ text: string }, { plusMinus_in: string }>("generalTolerances/half-place-saying.json");
const roundness = readCases<
  { diameter: string; indication: string },
  { size_um: number; runOut_um: number; roundness_um: number }
>("generalTolerances/iso2768-roundness.json");
const checks = readCases<Record<string, string>, Record<string, unknown>>("generalTolerances/check-cases.json");

/** A range at both ends and in the middle; an open one far out as well. */
function sizesOf({ over, to, fromIncluded }: Cell): Length[] {
  const low = Number(over) * TICKS_PER_MM;
  const high = to === null ? (low + TICKS_PER_MM) * 50 : Number(to) * TICKS_PER_MM;
  const ticks = [fromIncluded === true ? low : low + 1, (low + high) / 2, high];
  return ticks.map((one) => lengthOfTicks(one, "mm"));
}

/** Sizes just outside a whole table: at or below its lower end, and above its upper one where it has one. */
function sizesOutside({ cases }: Cells): Length[] {
  const first = cases[0]?.input;
  const last = cases.at(-1)?.input;
  if (first === undefined || last === undefined) throw new Error("an empty table");
  const low = Number(first.over) * TICKS_PER_MM;
  const below = first.fromIncluded === true ? low - 1 : low;
  const outside = [lengthOfTicks(below, "mm"), lengthOfTicks(-TICKS_PER_MM, "mm")];
  return last.to === null ? outside : [...outside, lengthOfTicks(Number(last.to) * TICKS_PER_MM + 1, "mm")];
}

function rangeText({ over, to, fromIncluded }: Cell): string {
  const from = fromIncluded === true ? over : `over ${over}`;
  return to === null ? `${from} mm` : `${from} up to ${to} mm`;
}

/** The step that a table gave, found by the standard and the table of the file. */
function tableStep(basis: readonly BasisStep[], { standard, edition, table }: Cells): BasisStep | undefined {
  return basis.find(
    (step) =>
      step.how === "tabulated" &&
      step.standard === `${standard}:${edition}` &&
      step.place.startsWith(`Table ${table}, `),
  );
}

function expectStep(basis: readonly BasisStep[], from: Cells, { input, mark }: Case<Cell, Value>): void {
  const step = tableStep(basis, from);
  expect({ input, mark: step?.mark }).toEqual({ input, mark });
  expect(step?.place.endsWith(rangeText(input)), `${step?.place ?? "none"} for ${rangeText(input)}`).toBe(true);
}

describe("the files", () => {
  it.each([
    ["iso2768-linear", linear, 8 * 4],
    ["iso2768-broken-edges", brokenEdges, 3 * 4],
    ["iso2768-angular", angular, 5 * 4],
    ["iso2768-straightness-flatness", straightness, 6 * 3],
    ["iso2768-perpendicularity", perpendicularity, 4 * 3],
    ["iso2768-symmetry", symmetry, 4 * 3],
    ["iso2768-run-out", runOut, 3],
    ["iso8062-castings", castings, 16 * 16],
    ["iso13920-linear", weldLinear, 11 * 4],
    ["iso13920-angular", weldAngular, 3 * 4],
    ["iso13920-form", weldForm, 10 * 4],
    ["iso13715-edges", edges, 14],
    ["inch-common-values", common, 5],
    ["inch-shop-standard", shop, 7],
    ["half-place-saying", saying, 6],
    ["iso2768-roundness", roundness, 1],
    ["check-cases", checks, 28],
  ] as const)("%s is whole and says where it comes from", (_, { cases, ...head }, count) => {
    expect(cases).toHaveLength(count);
    expect(head.version).toBe(1);
    for (const name of ["title", "standard", "edition", "table"] as const) expect(head[name]).not.toBe("");
    for (const { source } of cases) {
      expect(source).toBeTruthy();
      if (Array.isArray(source)) for (const id of source as string[]) expect(head.sources).toHaveProperty(id);
    }
  });
});

interface LinearTable {
  readonly name: string;
  readonly from: Cells;
  readonly indication: (cls: string) => string;
  readonly features: readonly SizeFeature[];
}

const LINEAR_TABLES: readonly LinearTable[] = [
  {
    name: "ISO 2768-1, Table 1: linear sizes",
    from: linear,
    indication: (cls) => `ISO 2768-${cls}`,
    // internal radii and walls are ordinary linear sizes there
    features: ["size", "diameter", "length", "internal radius", "wall thickness"],
  },
  {
    name: "ISO 2768-1, Table 2: external radii and chamfer heights",
    from: brokenEdges,
    indication: (cls) => `ISO 2768-${cls}`,
    features: ["external radius or chamfer"],
  },
  {
    name: "ISO 13920: linear sizes",
    from: weldLinear,
    indication: (cls) => `ISO 13920:2023-${cls}`,
    features: ["size", "external radius or chamfer"],
  },
];

describe.each(LINEAR_TABLES)("$name", ({ from, indication, features }) => {
  it.each(from.cases.map((one) => [`${one.input.class}, ${rangeText(one.input)}`, one] as const))("%s", (_, one) => {
    for (const size of sizesOf(one.input)) {
      for (const feature of features) {
        const ask = () => generalLimits(size, indication(one.input.class), { feature });
        if (one.expected === null) {
          expect(codeOf(ask)).toBe(NOT_DEFINED);
          continue;
        }
        const { limits } = ask();
        expect(limits.upperDeviation.ticks).toBe((one.expected.plusMinus_um ?? NaN) * TICKS_PER_UM);
        expect(limits.lowerDeviation.ticks).toBe(-limits.upperDeviation.ticks);
        expect(limits.nominal).toEqual(size);
        expectStep(limits.basis, from, one);
      }
    }
  });

  it("has nothing outside", () => {
    for (const size of sizesOutside(from)) {
      for (const feature of features) {
        for (const cls of new Set(from.cases.map(({ input }) => input.class))) {
          expect(codeOf(() => generalLimits(size, indication(cls), { feature }))).toBe(OUT_OF_RANGE);
        }
      }
    }
  });
});

describe("ISO 8062-3, Table 2: castings, every cell and every dash", () => {
  it.each(castings.cases.map((one) => [`${one.input.class}, ${rangeText(one.input)}`, one] as const))(
    "%s",
    (_, one) => {
      const grade = Number(one.input.class.slice("DCTG".length));
      // a wall takes one grade coarser, and grade 16 is for walls only (both from memory)
      const asks: ((size: Length) => ReturnType<typeof generalLimits>)[] = [];
      if (grade < 16) asks.push((size) => generalLimits(size, `ISO 8062-3:2007 - DCTG ${grade}`));
      if (grade > 1) asks.push((size) => generalLimits(size, `DCTG ${grade - 1}`, { feature: "wall thickness" }));
      if (grade === 16) asks.push((size) => generalLimits(size, "CT 16", { feature: "wall thickness" }));
      for (const size of sizesOf(one.input)) {
        for (const ask of asks) {
          if (one.expected === null) {
            expect(codeOf(() => ask(size))).toBe(NOT_DEFINED);
            continue;
          }
          const { limits } = ask(size);
          const total = (one.expected.total_um ?? NaN) * TICKS_PER_UM;
          expect(limits.tolerance.ticks).toBe(total);
          expect(limits.upperDeviation.ticks).toBe(total / 2);
          expectStep(limits.basis, castings, one);
        }
      }
    },
  );

  it("has nothing outside", () => {
    for (const size of sizesOutside(castings)) {
      expect(codeOf(() => generalLimits(size, "DCTG 12"))).toBe(OUT_OF_RANGE);
    }
  });
});

describe.each([
  ["ISO 2768-1, Table 3", angular, (cls: string) => `ISO 2768-${cls}`],
  ["ISO 13920, Table 2", weldAngular, (cls: string) => `ISO 13920-${cls}`],
] as const)("%s: angles by the shorter leg", (_, from, indication) => {
  it.each(from.cases.map((one) => [`${one.input.class}, ${rangeText(one.input)}`, one] as const))("%s", (__, one) => {
    for (const leg of sizesOf(one.input)) {
      for (const angle of ["0°30'", "45°", "120°"]) {
        const { limits } = generalAngleLimits(angle, leg, indication(one.input.class));
        const minutes = one.expected?.plusMinus_min ?? NaN;
        expect(limits.upperDeviation.microarcseconds).toBe(minutes * 60_000_000);
        expect(limits.lowerDeviation.microarcseconds).toBe(-minutes * 60_000_000);
        expect(limits.nominal).toEqual(readAngle(angle));
        expectStep(limits.basis, from, one);
      }
    }
  });

  it("has nothing outside", () => {
    for (const leg of sizesOutside(from)) {
      expect(codeOf(() => generalAngleLimits("45°", leg, indication(from.cases[0]?.input.class ?? "")))).toBe(
        OUT_OF_RANGE,
      );
    }
  });
});

interface FormTable {
  readonly name: string;
  readonly from: Cells;
  readonly indication: (cls: string) => string;
  readonly questions: readonly ((length: Length) => FormQuestion)[];
}

const FORM_TABLES: readonly FormTable[] = [
  {
    name: "ISO 2768-2, Table 1: straightness and flatness",
    from: straightness,
    indication: (cls) => `ISO 2768-${cls}`,
    questions: [
      (length) => ({ characteristic: "straightness", length }),
      (length) => ({ characteristic: "flatness", length }),
    ],
  },
  {
    name: "ISO 2768-2, Table 2: perpendicularity",
    from: perpendicularity,
    indication: (cls) => `ISO 2768-m${cls}`,
    questions: [(shorterSide) => ({ characteristic: "perpendicularity", shorterSide })],
  },
  {
    name: "ISO 2768-2, Table 3: symmetry",
    from: symmetry,
    indication: (cls) => `ISO 2768-m${cls}-E`,
    questions: [(length) => ({ characteristic: "symmetry", length })],
  },
  {
    name: "ISO 13920, Table 3: straightness, flatness, parallelism",
    from: weldForm,
    indication: (cls) => `ISO 13920-B${cls}`,
    questions: [
      (length) => ({ characteristic: "straightness", length }),
      (length) => ({ characteristic: "flatness", length }),
      (length) => ({ characteristic: "parallelism", length }),
    ],
  },
];

describe.each(FORM_TABLES)("$name", ({ from, indication, questions }) => {
  it.each(from.cases.map((one) => [`${one.input.class}, ${rangeText(one.input)}`, one] as const))("%s", (_, one) => {
    for (const length of sizesOf(one.input)) {
      for (const question of questions) {
        const found = generalFormTolerance(indication(one.input.class), question(length));
        expect(found.tolerance.ticks).toBe((one.expected?.total_um ?? NaN) * TICKS_PER_UM);
        expectStep(found.basis, from, one);
      }
    }
  });

  it("has nothing outside", () => {
    for (const length of sizesOutside(from)) {
      for (const question of questions) {
        const cls = from.cases[0]?.input.class ?? "";
        expect(codeOf(() => generalFormTolerance(indication(cls), question(length)))).toBe(OUT_OF_RANGE);
      }
    }
  });
});

describe("ISO 2768-2, Table 4: circular run-out, one value for all lengths", () => {
  it.each(runOut.cases.map((one) => [one.input.class, one] as const))("%s", (cls, one) => {
    const found = generalFormTolerance(`ISO 2768-${cls}`, { characteristic: "circular run-out" });
    expect(found.tolerance.ticks).toBe((one.expected?.total_um ?? NaN) * TICKS_PER_UM);
    expectStep(found.basis, runOut, one);
  });
});

describe("ISO 2768-2, roundness", () => {
  it.each(roundness.cases)("$input.diameter, $input.indication", ({ input, expected }) => {
    const size = generalLimits(mm(input.diameter), input.indication).limits.tolerance;
    const round = generalFormTolerance(input.indication, { characteristic: "roundness", diameter: mm(input.diameter) });
    const run = generalFormTolerance(input.indication, { characteristic: "circular run-out" });
    expect([size, run.tolerance, round.tolerance].map(({ ticks }) => ticks / TICKS_PER_UM)).toEqual([
      expected?.size_um,
      expected?.runOut_um,
      expected?.roundness_um,
    ]);
  });
});

describe("ISO 13715, recommended sizes of edges", () => {
  it.each(edges.cases)("$input.a_um", ({ input, expected }) => {
    const text = `${input.a_um > 0 ? "+" : "-"}${Math.abs(input.a_um) / 1000}`;
    const states = expected?.state === "burr or passing" ? ["burr", "passing"] : [expected?.state, expected?.state];
    expect(readEdge(text, { side: "external" })).toMatchObject({
      state: states[0],
      recommended: expected?.recommended,
    });
    expect(readEdge(text, { side: "internal" })).toMatchObject({
      state: states[1],
      recommended: expected?.recommended,
    });
  });
});

describe("inch blocks of common practice", () => {
  it.each(common.cases)("common value, $input.places", ({ input, expected, mark }) => {
    const text = input.places === "fraction" ? "2 3/4" : (2.5).toFixed(Number(input.places));
    const { limits } = defaultLimits(titleBlockPreset("common inch"), readDimension(text, { unit: "in" }));
    expect(limits.upperDeviation.ticks).toBe(inch(expected?.plusMinus_in ?? "").ticks);
    expect(limits.basis[0]).toMatchObject({ how: "common practice", mark });
  });

  it.each(shop.cases)("shop standard, $input.what", ({ input, expected, mark }) => {
    const block = titleBlockPreset("inch by diameter and length");
    if (input.what === "edges" || input.what === "finish") {
      expect(block[input.what]).toBe(expected?.text);
      return;
    }
    const texts: Record<string, string> = {
      "decimal diameters": "⌀2.50",
      "decimal lengths": "2.5000",
      "fractional diameters": "⌀2 1/2",
      "fractional lengths": "2 1/2",
      angles: "45°",
    };
    const found = defaultLimits(block, texts[input.what] ?? "");
    const given =
      found.kind === "angle" ? found.limits.upperDeviation.toDegrees() * 60 : found.limits.upperDeviation.ticks;
    expect(given).toBe(expected?.plusMinus_min ?? inch(expected?.plusMinus_in ?? "").ticks);
    expect(found.limits.basis[0]).toMatchObject({ how: "common practice", mark });
  });

  it.each(saying.cases)("half of the last place, $input.text", ({ input, expected, mark }) => {
    const { limits } = halfPlaceLimits(input.text, { unit: "in" });
    expect(limits.upperDeviation.ticks).toBe(inch(expected?.plusMinus_in ?? "").ticks);
    expect(limits.lowerDeviation.ticks).toBe(-limits.upperDeviation.ticks);
    expect(limits.basis[0]).toMatchObject({ how: "common practice", mark });
  });
});

/** What a case of the collection asks, by its topic, in the words of the case's own `expected`. */
const ANSWERS: Readonly<Record<string, (given: Record<string, string>, expected: Record<string, unknown>) => unknown>> =
  {
    "iso2768-1 linear": ({ nominal_mm = "", class: cls = "" }) =>
      plusMinusUm(() => generalLimits(mm(nominal_mm), `ISO 2768-${cls}`)),
    "iso2768-1 broken edge": ({ radius_or_chamfer_mm: size = "", class: cls = "" }) =>
      plusMinusUm(() => generalLimits(mm(size), `ISO 2768-${cls}`, { feature: "external radius or chamfer" })),
    "iso2768-1 angle": ({ shorter_leg_mm = "", class: cls = "" }) => {
      const { limits } = generalAngleLimits("90°", mm(shorter_leg_mm), `ISO 2768-${cls}`);
      return { deviation_min: limits.upperDeviation.microarcseconds / 60_000_000 };
    },
    "iso2768-2 straightness_flatness": ({ length_mm = "", class: cls = "" }) =>
      totalUm(cls, { characteristic: "flatness", length: mm(length_mm) }),
    "iso2768-2 perpendicularity": ({ length_mm = "", class: cls = "" }) =>
      totalUm(cls, { characteristic: "perpendicularity", shorterSide: mm(length_mm) }),
    "iso2768 indication": ({ note = "" }) => {
      const called = generalTolerance(note);
      return called.standard === "ISO 2768" ? { part1: called.linear, part2: called.geometry } : called;
    },
    "iso8062-3": ({ nominal_mm = "", grade = "" }, { plus_minus_printed_mm: printed }) => {
      const { limits } = generalLimits(mm(nominal_mm), `DCTG ${grade}`);
      // as printed means in size: 1.40 and 1.4 are one value
      const same = limits.upperDeviation.ticks === mm(String(printed)).ticks;
      return {
        total_um: limits.tolerance.ticks / TICKS_PER_UM,
        plus_minus_printed_mm: same ? printed : limits.upperDeviation.toString(),
      };
    },
    "iso13920 linear": ({ nominal_mm = "", class: cls = "" }) =>
      plusMinusUm(() => generalLimits(mm(nominal_mm), `ISO 13920-${cls}`)),
    "inch block": ({ dimension = "", block, rule }, { low_in: low, high_in: high }) => {
      if (rule !== undefined) {
        const { upperDeviation } = halfPlaceLimits(dimension, { unit: "in" }).limits;
        return { deviation_in: upperDeviation.ticks === inch("1/64").ticks ? "1/64" : upperDeviation.toString() };
      }
      const places = dimension.length - dimension.indexOf(".") - 1;
      const tolerance = /\.\d+$/.exec(block ?? "")?.[0] ?? "";
      const made = { unit: "in", decimals: { [places]: tolerance } } as const;
      const { limits } = defaultLimits(made, readDimension(dimension, { unit: "in" }));
      return {
        low_in: limits.min.ticks === inch(String(low)).ticks ? low : limits.min.toString(),
        high_in: limits.max.ticks === inch(String(high)).ticks ? high : limits.max.toString(),
      };
    },
  };

function plusMinusUm(ask: () => ReturnType<typeof generalLimits>): unknown {
  try {
    return { deviation_um: ask().limits.upperDeviation.ticks / TICKS_PER_UM };
  } catch (error) {
    const { code } = error as { readonly code?: string };
    return code === OUT_OF_RANGE || code === NOT_DEFINED ? { none: true } : { error };
  }
}

function totalUm(cls: string, question: FormQuestion): unknown {
  return { total_um: generalFormTolerance(`ISO 2768-${cls}`, question).tolerance.ticks / TICKS_PER_UM };
}

describe("check cases of the collection", () => {
  it.each(checks.cases.map((one) => [`${one.input["id"] ?? ""} ${one.input["topic"] ?? ""}`, one] as const))(
    "%s",
    (_, { input, expected }) => {
      const answer = ANSWERS[input["topic"] ?? ""];
      expect(answer, "a topic that is answered here").toBeDefined();
      expect(answer?.(input, expected ?? {})).toEqual(expected);
    },
  );
});
