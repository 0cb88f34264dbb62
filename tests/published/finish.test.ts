import {
  acceptRoughness,
  acceptanceRule,
  ballNoseCusp,
  bearingSeatFinish,
  feedForRoughness,
  finishForFunction,
  finishForTolerance,
  finishFunctions,
  idealProfiles,
  largestNoseFeed,
  lengthOfTicks,
  microinch,
  mm,
  preferredRoughness,
  processFinish,
  processGrades,
  processReach,
  processesForGrade,
  roughness,
  roughnessFactor,
  roughnessGrades,
  rzGuide,
  rzRange,
  samplingLength,
  sharpToolRoughness,
  surfaceFactor,
  textureSymbols,
  triangleRoughness,
  turnedRoughness,
  um,
} from "limitsmith";
import type {
  BandEnd,
  Length,
  RoughnessUnit,
  SamplingQuestion,
  SurfaceCondition,
  SurfaceFactorSet,
  ToleranceRuleName,
} from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";
import { expectWhole } from "./expectWhole.js";
import { readCases } from "./readCases.js";

// The cases are copies of what published tables say; nothing in them was made by this library.

type Pair = readonly [number | null, number | null];
type Texts = readonly [string | null, string | null];

const grades = readCases<
  { grade: string },
  {
    ra_um: number;
    ra_uin: string;
    firstChoice: boolean;
    exact_um_of_uin?: number;
    exact_uin_of_um?: number;
    tighter?: string;
  }
>("finish/roughness-grades.json");
const series = readCases<{ series: string }, { values_um: number[]; values_uin?: string[] }>(
  "finish/preferred-series.json",
);
const processes = readCases<
  { process: string },
  {
    group: string;
    average_um: Pair;
    average_uin: Texts;
    overall_um: Pair;
    overall_uin: Texts;
    averageMark: string;
    overallMark: string;
  }
>("finish/process-roughness.json");
const ansi = readCases<{ process: string }, { finest: number; coarsest: number; count: number }>(
  "finish/process-grades-ansi.json",
);
const iso = readCases<{ process: string }, { grade: number }>("finish/process-grades-iso.json");
const tolerances = readCases<{ process: string }, { least_mm: number | null; most_mm: number }>(
  "finish/process-tolerances.json",
);
const rz = readCases<
  { ra_um: number },
  {
    grade: string;
    rz_um: [number, number];
    rt_um: [number, number];
    rz_over_ra: [number, number];
    toolMaker_um: number[];
  }
>("finish/rz-ranges.json");
const sampling = readCases<
  {
    standard: SamplingQuestion["standard"];
    by: "ra" | "rz" | "rsm";
    unit: "um" | "uin" | "mm" | "in";
    over: number | string | null;
    to: number | string | null;
  },
  { sampling_mm?: number; evaluation_mm?: number; sampling_in?: string; evaluation_in?: string }
>("finish/sampling-lengths.json");
const seats = readCases<{ over_mm: string; to_mm: string; grade: string }, { ra_um: number }>(
  "finish/bearing-seats.json",
);
const functions = readCases<
  { function: string },
  { finest_um: number | null; coarsest_um: number; coarsest_uin?: string }
>("finish/function-finishes.json");
const factors = readCases<
  { set: SurfaceFactorSet; finish: string; Sut_kpsi?: number },
  { a_kpsi: number; a_mpa: number; b: number; cov: number | null; k_a?: number }
>("finish/surface-factors.json");
const roughnessFactors = readCases<
  { material?: string; surface?: string; Rm_MPa?: number; Rz_um?: number },
  { a_R?: number; Rm_N_min?: number; rz_um?: number; K_R?: number }
>("finish/roughness-factors.json");
const symbols = readCases<{ kind: string; sign: string }, { meaning: string; text?: string | null }>(
  "finish/texture-symbols.json",
);
const triangles = readCases<{ triangles: number; series: "R1" | "R2" | "R3" | "R4" }, { rz_um: number; ra_um: number }>(
  "finish/triangles.json",
);
const profiles = readCases<{ profile: string }, { Rq_Ra: number; Rt_Ra: number | null }>("finish/ideal-profiles.json");
const theoretical = readCases<
  { f_mm: number; r_mm: number },
  { Rt_um?: number; Ra_um?: number; Ra_32_um: number; Rt_circle_um?: number }
>("finish/theoretical.json");
const rules = readCases<
  { rule: ToleranceRuleName; form: number | null },
  { of: string; ra: number | null; rz: number | null; below: boolean }
>("finish/tolerance-rules.json");

function inUm(length: Length): number {
  return length.ticks / 10_000;
}

describe("the files", () => {
  it.each([
    ["roughness-grades.json", grades, 16],
    ["preferred-series.json", series, 3],
    ["process-roughness.json", processes, 31],
    ["process-grades-ansi.json", ansi, 12],
    ["process-grades-iso.json", iso, 39],
    ["process-tolerances.json", tolerances, 20],
    ["rz-ranges.json", rz, 12],
    ["sampling-lengths.json", sampling, 35],
    ["bearing-seats.json", seats, 9],
    ["function-finishes.json", functions, 60],
    ["surface-factors.json", factors, 15],
    ["roughness-factors.json", roughnessFactors, 13],
    ["texture-symbols.json", symbols, 23],
    ["triangles.json", triangles, 16],
    ["ideal-profiles.json", profiles, 5],
    ["theoretical.json", theoretical, 4],
    ["tolerance-rules.json", rules, 6],
  ] as const)("%s is whole and says where it comes from", (_, file, count) => {
    expectWhole(file, count);
  });
});

describe("roughness grades and pairs: every row", () => {
  it.each(grades.cases)("$input.grade", ({ input, expected, mark }) => {
    if (expected === null) throw new Error("a grade has a value");
    const row = roughnessGrades().find((one) => one.grade === input.grade);
    expect(row?.um.to("um")).toBe(expected.ra_um);
    expect(row?.firstChoice).toBe(expected.firstChoice);
    expect(row?.mark).toBe(mark);
    const byName = roughness(input.grade);
    expect(byName.ra.toString()).toBe(`${expected.ra_um} µm`);
    expect(byName.grade).toBe(input.grade);
    expect(byName.basis.some((step) => step.mark === mark)).toBe(true);
    const metric = roughness(`Ra ${expected.ra_um} µm`);
    expect(metric.grade).toBe(input.grade);
    if (expected.ra_uin === "0.25") {
      // 0.25 µin is 6.35 nm, no whole number of 0.1 nm
      expect([row?.uin, metric.pair]).toEqual([null, null]);
      return;
    }
    expect(row?.uin?.toString()).toBe(`${expected.ra_uin} µin`);
    expect(metric.pair?.toString()).toBe(`${expected.ra_uin} µin`);
    const inches = roughness(`${expected.ra_uin} µin`);
    expect(inches.pair?.toString()).toBe(`${expected.ra_um} µm`);
    expect(inches.grade).toBe(input.grade);
    if (expected.exact_um_of_uin === undefined) return;
    expect(inches.converted.toString()).toBe(`${expected.exact_um_of_uin} µm`);
    expect(metric.converted.to("uin")).toBeCloseTo(expected.exact_uin_of_um ?? NaN, 4);
    expect(row?.tighter).toBe(expected.tighter);
  });

  it("no other value has a grade or a first-choice pair", () => {
    for (const unit of ["um", "uin"] as const) {
      const known = new Set(
        roughnessGrades()
          .map((one) => one[unit]?.ticks)
          .filter((one) => one !== undefined),
      );
      for (const value of preferredRoughness(unit).all) {
        const read = roughness(value);
        expect(read.grade !== null).toBe(known.has(value.ticks));
        if (!known.has(value.ticks)) expect(read.pair).toBeNull();
      }
    }
  });
});

describe("preferred series", () => {
  const [r10, asme, rzSeries] = series.cases;

  it("R10 in µm", () => {
    const published = r10?.expected?.values_um ?? [];
    expect(published).toHaveLength(42);
    expect(preferredRoughness("um").all.map((one) => one.to("um"))).toEqual(published);
  });

  it("the inch series and its partners", () => {
    const inches = asme?.expected?.values_uin?.map(Number) ?? [];
    const metric = asme?.expected?.values_um ?? [];
    expect(inches).toHaveLength(29);
    // 2000 µin is a first-choice value that the handbook's series does not reach
    expect(preferredRoughness("uin").all.map((one) => one.to("uin"))).toEqual([...inches, 2000]);
    inches.forEach((value, index) => {
      const read = roughness(microinch(value));
      expect((read.pair ?? read.secondChoicePair)?.to("um")).toBe(metric[index]);
      const back = roughness(um(metric[index] ?? NaN));
      expect((back.pair ?? back.secondChoicePair)?.to("uin")).toBe(value);
    });
  });

  it("no other value has a partner", () => {
    const metric = new Set([...(asme?.expected?.values_um ?? []), ...grades.cases.map((one) => one.expected?.ra_um)]);
    const steps = [
      ...Array.from({ length: 200 }, (_, index) => index + 1),
      ...Array.from({ length: 3000 }, (_, index) => (index + 1) * 10),
    ];
    for (const thousandths of steps) {
      const read = roughness(um(thousandths / 1000));
      const partner = read.pair ?? read.secondChoicePair;
      if (!metric.has(thousandths / 1000)) expect(partner).toBeNull();
    }
  });

  it("Rz, first choice", () => {
    expect(preferredRoughness("um").rz.map((one) => one.to("um"))).toEqual(rzSeries?.expected?.values_um);
  });
});

describe("ASME B46.1 appendix: every row", () => {
  const ends = (finest: BandEnd | null, coarsest: BandEnd | null): { um: Pair; uin: Texts } => ({
    um: [finest?.um.to("um") ?? null, coarsest?.um.to("um") ?? null],
    uin: [finest?.uin?.toString().replace(" µin", "") ?? null, coarsest?.uin?.toString().replace(" µin", "") ?? null],
  });

  it.each(processes.cases)("$input.process", ({ input, expected }) => {
    const { average, overall, group, row, basis } = processFinish(input.process);
    expect(row).toBe(input.process);
    const [averageEnds, overallEnds] = [ends(average.finest, average.coarsest), ends(overall.finest, overall.coarsest)];
    expect({
      group,
      average_um: averageEnds.um,
      average_uin: averageEnds.uin,
      overall_um: overallEnds.um,
      overall_uin: overallEnds.uin,
      averageMark: average.mark,
      overallMark: overall.mark,
    }).toEqual(expected);
    expect(basis.map((step) => step.mark)).toEqual([expected?.averageMark, expected?.overallMark]);
  });
});

describe("grades by process: every line", () => {
  it.each(ansi.cases)("ANSI B4.1, $input.process", ({ input, expected, mark }) => {
    const all = processGrades(input.process);
    const span = all.spans.find((one) => one.chart === "ANSI B4.1-1967 (R1987)" && one.row === input.process);
    expect(span).toMatchObject({ finest: expected?.finest, coarsest: expected?.coarsest });
    expect((span?.coarsest ?? 0) - (span?.finest ?? 0) + 1).toBe(expected?.count);
    expect(all.basis.find((step) => step.place === `Table 2, ${input.process}`)?.mark).toBe(mark);
  });

  it.each(iso.cases)("BS 4500 and ISO/R 286, $input.process", ({ input, expected, mark }) => {
    const { usual } = processesForGrade(expected?.grade ?? NaN);
    const lines = usual.filter((one) => one.chart === "BS 4500 and ISO/R 286 family" && one.row === input.process);
    expect(lines).toEqual([
      { chart: "BS 4500 and ISO/R 286 family", row: input.process, finest: expected?.grade, coarsest: expected?.grade },
    ]);
    const all = processGrades(input.process);
    expect(all.spans).toContainEqual(lines[0]);
    expect(all.basis.find((step) => step.place.endsWith(`, ${input.process}`) && step.mark === mark)).toBeDefined();
  });

  it("no line more", () => {
    const { usual, finerThanNeeded, notUsual } = processesForGrade("IT7");
    expect([...usual, ...finerThanNeeded, ...notUsual]).toHaveLength(ansi.cases.length + iso.cases.length);
  });

  it.each(tolerances.cases)("tolerance in mm, $input.process", ({ input, expected }) => {
    const row = processGrades(input.process).tolerances.find((one) => one.row === input.process);
    expect(row?.least?.to("mm") ?? null).toBe(expected?.least_mm);
    expect(row?.most.to("mm")).toBe(expected?.most_mm);
  });
});

describe("Rz and Rt beside Ra: every row", () => {
  it.each(rz.cases)("Ra $input.ra_um µm", ({ input, expected, mark }) => {
    if (expected === null) throw new Error("each row has values");
    const found = rzRange(um(input.ra_um));
    expect(roughness(found.ra).grade).toBe(expected.grade);
    expect([found.rz.least.to("um"), found.rz.most.to("um")]).toEqual(expected.rz_um);
    expect([found.rt.least.to("um"), found.rt.most.to("um")]).toEqual(expected.rt_um);
    expected.rz_over_ra.forEach((ratio, index) => {
      expect(Math.abs((expected.rz_um[index] ?? NaN) / input.ra_um - ratio)).toBeLessThanOrEqual(0.005001);
    });
    const toolMaker = found.estimates.find((one) => one.source.startsWith("a cutting-tool maker"));
    expect(toolMaker?.rz.least.to("um")).toBe(expected.toolMaker_um[0]);
    expect(toolMaker?.rz.most.to("um")).toBe(expected.toolMaker_um.at(-1));
    expect(toolMaker?.mark).toBe(mark);
    expect(found.cautions.map((one) => one.code)).toEqual(["FINISH_RATIO_ESTIMATE"]);
    for (const { rz: one } of found.estimates) {
      expect(one.least.ticks).toBeGreaterThanOrEqual(found.widest.least.ticks);
      expect(one.most.ticks).toBeLessThanOrEqual(found.widest.most.ticks);
    }
  });

  it("JIS sets 0.1 beside 0.4, 1.6 beside 6.3 and 25 beside 100", () => {
    const jis = (ra: string): number | undefined =>
      rzRange(ra)
        .estimates.find((one) => one.source.includes("JIS"))
        ?.rz.least.to("um");
    expect([jis("0.1 µm"), jis("1.6 µm"), jis("25 µm"), jis("0.05 µm"), jis("50 µm")]).toEqual([
      0.4,
      6.3,
      100,
      undefined,
      undefined,
    ]);
  });
});

describe("sampling lengths: every row, at its ends and just inside the next", () => {
  const TICKS = { um: 10_000, uin: 254, mm: 10_000_000, in: 254_000_000 };

  it.each(sampling.cases)("$input.standard, $input.by over $input.over to $input.to", ({ input, expected, mark }) => {
    const { standard, by, unit } = input;
    const ticksOf = (value: number | string): number => Math.round(Number(value) * TICKS[unit]);
    const over = input.over === null ? 0 : ticksOf(input.over);
    const to = input.to === null ? over * 4 : ticksOf(input.to);
    for (const ticks of [over + 1, Math.round((over + to) / 2), to]) {
      const found = samplingLength({ standard, [by]: lengthOfTicks(ticks, unit) });
      if (expected?.sampling_mm === undefined) {
        expect(found.samplingLength.to("in")).toBe(Number(expected?.sampling_in));
        expect(found.evaluationLength.to("in")).toBe(Number(expected?.evaluation_in));
      } else {
        expect(found.samplingLength.to("mm")).toBe(expected.sampling_mm);
        expect(found.evaluationLength.to("mm")).toBe(expected.evaluation_mm);
      }
      expect(found.basis[0]).toMatchObject({ standard, mark });
    }
    // a row without a neighbour ends there
    const isLast = !sampling.cases.some(
      (one) => one.input.standard === standard && one.input.by === by && one.input.over === input.to,
    );
    if (input.to !== null && isLast) {
      expect(codeOf(() => samplingLength({ standard, [by]: lengthOfTicks(to + 1, unit) }))).toBe(
        "FINISH_NOT_TABULATED",
      );
    }
  });
});

describe("bearing seats: every cell", () => {
  it.each(seats.cases)("$input.grade over $input.over_mm to $input.to_mm", ({ input, expected, mark }) => {
    const over = mm(input.over_mm).ticks;
    const to = mm(input.to_mm).ticks;
    for (const ticks of [over + 1, (over + to) / 2, to]) {
      const seat = bearingSeatFinish({ diameter: lengthOfTicks(ticks, "mm"), tolerance: input.grade });
      expect(seat.ra.to("um")).toBe(expected?.ra_um);
      expect(seat.basis[0]?.mark).toBe(mark);
      expect(seat.basis[0]?.place).toContain(`${input.grade}, over ${input.over_mm} up to ${input.to_mm} mm`);
    }
  });
});

describe("usual Ra by function: every line", () => {
  it.each(functions.cases)("$input.function", ({ input, expected, mark }) => {
    const found = finishForFunction(input.function);
    expect(found.function).toBe(input.function);
    expect(found.finest?.to("um") ?? null).toBe(expected?.finest_um);
    expect(found.coarsest.to("um")).toBe(expected?.coarsest_um);
    expect(found.mark).toBe(mark);
    expect(found.basis[0]?.how).toBe("common practice");
    if (expected?.coarsest_uin !== undefined) {
      const read = roughness(found.coarsest);
      expect((read.pair ?? read.secondChoicePair)?.to("uin")).toBe(Number(expected.coarsest_uin));
    }
  });

  it("no function more", () => {
    expect(new Set(finishFunctions())).toEqual(new Set(functions.cases.map(({ input }) => input.function)));
  });
});

describe("rules between tolerance and roughness: every line", () => {
  it.each(rules.cases)("$input.rule", ({ input, expected, mark }) => {
    if (expected === null) throw new Error("each rule says something");
    const width = 80;
    const form = input.form === null ? undefined : um(width * input.form);
    const base = expected.of === "T" ? width : width * (input.form ?? NaN);
    const share = (value: number | null): number | null =>
      value === null ? null : Math.round(value * base * 1e4) / 1e4;
    const [named] = finishForTolerance(um(width), { rule: input.rule, ...(form === undefined ? {} : { form }) });
    expect(named).toMatchObject({ rule: input.rule, below: expected.below });
    expect(named?.ra === null ? null : inUm(named?.ra ?? um(0))).toBe(share(expected.ra));
    expect(named?.rz === null ? null : inUm(named?.rz ?? um(0))).toBe(share(expected.rz));
    expect(named?.basis[0]).toMatchObject({ how: "common practice", mark });
    // found by the form tolerance, too
    const all = finishForTolerance(um(width), form === undefined ? undefined : { form });
    expect(all.map((one) => one.rule)).toContain(input.rule);
    expect(all).toHaveLength(form === undefined ? 2 : 3);
  });
});

const conditionOf = (finish: string): SurfaceCondition =>
  finish.startsWith("machined") ? "machined or cold-drawn" : (finish as SurfaceCondition);

describe("surface factors: every coefficient and printed example", () => {
  it.each(factors.cases)("$input.set, $input.finish $input.Sut_kpsi", ({ input, expected, mark }) => {
    const question = { finish: conditionOf(input.finish), set: input.set };
    if (input.Sut_kpsi !== undefined) {
      const strength = { value: input.Sut_kpsi, unit: "ksi" } as const;
      const { factor } = surfaceFactor({ ...question, minimumUltimateStrength: strength });
      // printed to two or three figures
      expect(Math.abs(factor - (expected?.k_a ?? NaN))).toBeLessThanOrEqual(expected?.k_a === 0.963 ? 0.0005 : 0.005);
      return;
    }
    const metric = surfaceFactor({ ...question, minimumUltimateStrength: "800 MPa" });
    const inches = surfaceFactor({ ...question, minimumUltimateStrength: "120 ksi" });
    expect(metric).toMatchObject({ a: expected?.a_mpa, aUnit: "MPa", b: expected?.b, variation: expected?.cov });
    expect(inches).toMatchObject({ a: expected?.a_kpsi, aUnit: "ksi", b: expected?.b });
    expect(metric.factor).toBeCloseTo(Math.min(1, (expected?.a_mpa ?? NaN) * 800 ** (expected?.b ?? NaN)), 4);
    expect(inches.factor).toBeCloseTo(Math.min(1, (expected?.a_kpsi ?? NaN) * 120 ** (expected?.b ?? NaN)), 4);
    expect(metric.basis[0]?.mark).toBe(mark);
    // a = a of the other unit times 6.8948^-b, within the rounding of the printed figures
    const ratio = (expected?.a_mpa ?? NaN) / ((expected?.a_kpsi ?? NaN) * 6.894757 ** -(expected?.b ?? NaN));
    expect(Math.abs(ratio - 1)).toBeLessThan(0.004);
  });
});

describe("roughness factors: every constant, guide value and printed example", () => {
  const nameOf = (material: string): string => material.replace(/ \(.*\)$/, "");

  it.each(roughnessFactors.cases)("$input.material $input.surface $input.Rm_MPa", ({ input, expected, mark }) => {
    if (input.surface !== undefined) {
      expect(
        rzGuide()
          .find((one) => one.surface === input.surface)
          ?.rz.to("um"),
      ).toBe(expected?.rz_um);
      return;
    }
    const material = nameOf(input.material ?? "");
    if (input.Rm_MPa !== undefined) {
      const strength = { value: input.Rm_MPa, unit: "MPa" } as const;
      const { factor } = roughnessFactor({ material, minimumUltimateStrength: strength, rz: um(input.Rz_um ?? NaN) });
      expect(Math.abs(factor - (expected?.K_R ?? NaN))).toBeLessThanOrEqual(0.005);
      return;
    }
    const aR = expected?.a_R ?? NaN;
    const least = expected?.Rm_N_min ?? NaN;
    // ten times half the least strength and Rz of 10 µm leave 1 - a_R
    const strength = { value: least * 5, unit: "MPa" } as const;
    const found = roughnessFactor({ material, minimumUltimateStrength: strength, rz: "10 µm" });
    expect(found.factor).toBe(1 - aR);
    expect(found.basis[0]?.mark).toBe(mark);
    // at half the least strength the logarithm is zero
    const none = roughnessFactor({ material, minimumUltimateStrength: { value: least / 2, unit: "MPa" }, rz: "10 µm" });
    expect(none.factor).toBe(1);
  });
});

describe("signs", () => {
  const { lay, removal, positions } = textureSymbols();

  it.each(symbols.cases)("$input.kind $input.sign", ({ input, expected, mark }) => {
    if (input.kind === "lay" || input.kind === "removal") {
      const found = (input.kind === "lay" ? lay : removal).find((one) => one.symbol === input.sign);
      expect(found).toMatchObject({ meaning: expected?.meaning, mark });
      if (input.kind === "removal") expect(found?.text).toBe(expected?.text);
      return;
    }
    const table = positions.find((one) => one.standard === input.kind);
    expect(table?.positions.find((one) => one.position === input.sign)?.meaning).toBe(expected?.meaning);
    expect(table?.mark).toBe(mark);
  });

  it("are no more than those", () => {
    const count = lay.length + removal.length + positions.flatMap((one) => one.positions).length;
    expect(count).toBe(symbols.cases.length);
    // ASME Y14.36-2018 writes M out
    expect(lay.find((one) => one.symbol === "M")?.text).toBe("MULTD");
  });
});

describe("triangles: every cell", () => {
  it.each(triangles.cases)("$input.triangles, $input.series", ({ input, expected }) => {
    if (expected === null) {
      expect(codeOf(() => triangleRoughness(input))).toBe("FINISH_NOT_TABULATED");
      return;
    }
    const { ra, rz: height } = triangleRoughness(input);
    expect({ ra_um: ra.to("um"), rz_um: height.to("um") }).toEqual(expected);
  });
});

describe("ideal profiles", () => {
  it.each(profiles.cases)("$input.profile", ({ input, expected }) => {
    const found = idealProfiles().find((one) => one.profile === input.profile);
    expect(found?.rqOverRa).toBe(expected?.Rq_Ra);
    expect(found?.rtOverRa).toBe(expected?.Rt_Ra);
  });
});

describe("theoretical roughness, worked examples", () => {
  it.each(theoretical.cases)("f $input.f_mm, r $input.r_mm", ({ input, expected }) => {
    const found = turnedRoughness({ feed: mm(input.f_mm), noseRadius: mm(input.r_mm) });
    expect(found.raShortForm.to("um")).toBeCloseTo(expected?.Ra_32_um ?? NaN, 4);
    if (expected?.Rt_um === undefined) return;
    expect(found.rt.to("um")).toBe(expected.Rt_um);
    expect(found.ra.to("um")).toBeCloseTo(expected.Ra_um ?? NaN, 4);
    expect(found.rtOfCircle.to("um")).toBeCloseTo(expected.Rt_circle_um ?? NaN, 4);
  });
});

describe("ASME B46.1 and the inch series, common practice", () => {
  it("0.8 to 1.6 µm reads 32 to 63 µin", () => {
    expect(["0.8 µm", "1.6 µm"].map((one) => roughness(one).pair?.toString())).toEqual(["32 µin", "63 µin"]);
    expect(["32 µin", "63 µin"].map((one) => roughness(one).pair?.toString())).toEqual(["0.8 µm", "1.6 µm"]);
  });

  it("turning reaches Ra 63 µin in a machinable steel", () => {
    expect(processReach("turning", "63 µin")).toMatchObject({ reach: "average", side: null });
  });
});

// the published check cases, topic by topic

interface CheckCase {
  readonly id: string;
  readonly topic: string;
  readonly given: Readonly<Record<string, unknown>>;
  readonly expect: unknown;
  readonly source: string;
  readonly status: string;
  readonly tolerance?: string;
}

const checks = readCases<never, never>("finish/cases.json").cases as unknown as readonly CheckCase[];

const reaches = (process: string, raUm: number): boolean =>
  ["average", "less frequent"].includes(processReach(process, um(raUm)).reach);

/** What the library says to a case; a number is compared within the case's tolerance. */
const ANSWERS: Readonly<Record<string, (given: Given) => unknown>> = {
  "conversion-exact": (given) =>
    given.has("ra_uin")
      ? roughness(`${given.text("ra_uin")} µin`).converted.to("um")
      : roughness(um(given.number("ra_um"))).converted.to("uin"),
  "conversion-paired": (given) => {
    if (given.has("ra_um"))
      return roughness(um(given.number("ra_um")))
        .pair?.toString()
        .replace(" µin", "");
    const read = roughness(`${given.text("ra_uin")} µin`);
    return {
      pair: read.pair !== null,
      exact_um: read.converted.to("um"),
      second_choice_um: read.secondChoicePair?.to("um"),
    };
  },
  "n-grade": (given) => {
    const { ra, pair } = roughness(given.text("n_grade"));
    return { ra_um: ra.to("um"), ra_uin: pair?.toString().replace(" µin", "") };
  },
  "limit-unit": (given) => {
    const upper = roughness(given.text("drawing"));
    expect(upper.max).toBe(true);
    return acceptRoughness({ upper, values: [um(given.number("measured_um"))], rule: "maximum" }).accepted;
  },
  "rms-aa": (given) => {
    const unit: RoughnessUnit = "uin";
    if (given.has("drawing")) {
      expect(given.text("drawing")).toBe("63 RMS uin (old drawing)");
      return roughness("63 RMS", { unit }).ra.to("uin");
    }
    return roughness({ value: microinch(given.number("rms_uin")), parameter: "RMS" }).ra.to("uin");
  },
  "process-reaches-ra": (given) => reaches(given.text("process"), given.number("ra_um")),
  "process-band": (given) => processReach(given.text("process"), um(given.number("ra_um"))).reach,
  "process-default": (given) => {
    expect(given.text("surface")).toBe("cast, nothing agreed");
    const { coarsest } = finishForFunction("cast surface without other agreement");
    return { n_grade: roughness(coarsest).grade, ra_um: coarsest.to("um") };
  },
  "process-reaches-grade": (given) =>
    processesForGrade(given.number("grade")).usual.some(
      ({ chart, row }) => chart === "ANSI B4.1-1967 (R1987)" && row === given.text("process"),
    ),
  "process-grade-bs-chart": (given) =>
    processGrades(given.text("process")).spans.find((one) => one.chart === "BS 4500 and ISO/R 286 family")?.finest,
  "process-sources-differ": (given) => {
    const { spans } = processGrades(given.text("process"));
    const [first] = spans.filter((one) => one.chart === "ANSI B4.1-1967 (R1987)");
    const second = spans.filter((one) => one.chart === "BS 4500 and ISO/R 286 family").map((one) => one.finest);
    return { ansi: [first?.finest, first?.coarsest], bs_iso: second.sort((left, right) => left - right) };
  },
  "turned-finish-sharp": (given) =>
    sharpToolRoughness({
      feed: mm(given.number("f_mm")),
      sideCuttingEdgeAngle: `${given.number("Cs_deg")}°`,
      endCuttingEdgeAngle: `${given.number("Ce_deg")}°`,
    }).rt.to("um"),
  "turned-finish-inch": (given) =>
    turnedRoughness({ feed: `${given.text("f_in")} in`, noseRadius: `${given.text("r_in")} in` }).ra.to("uin"),
  "turned-finish": (given) =>
    turnedRoughness({ feed: mm(given.number("f_mm")), noseRadius: mm(given.number("r_mm")) }).rt.to("um"),
  "turned-finish-inverse": (given) => {
    expect(given.text("form")).toBe("exact parabola");
    return feedForRoughness({ ra: um(given.number("ra_um")), noseRadius: mm(given.number("r_mm")) }).feed.to("mm");
  },
  "turned-finish-validity": (given) =>
    largestNoseFeed({
      noseRadius: mm(given.number("r_mm")),
      endCuttingEdgeAngle: `${given.number("Ce_deg")}°`,
    }).to("mm"),
  "ball-nose-cusp": (given) => {
    const found = ballNoseCusp({ ballRadius: mm(given.number("R_mm")), lineSpacing: mm(given.number("ae_mm")) });
    return { exact: found.cusp.to("um"), approx: found.cuspShortForm.to("um") };
  },
  "fatigue-ka": (given) => factorOf(given, given.has("Sut_kpsi") ? "ksi" : "MPa"),
  "fatigue-ka-unit-trap": (given) => ({ kpsi: factorOf(given, "ksi"), MPa: factorOf(given, "MPa") }),
  "fkm-KR": (given) =>
    roughnessFactor({
      material: given.text("material"),
      minimumUltimateStrength: { value: given.number("Rm_MPa"), unit: "MPa" },
      rz: um(given.number("Rz_um")),
    }).factor,
  "cutoff-ra": (given) => {
    const ra = um(given.number("ra_um"));
    const byAsme = samplingLength({ standard: "ASME B46.1", ra });
    const byIso = samplingLength({ standard: "ISO 4288:1996", ra });
    expect(byIso.samplingLength).toEqual(byAsme.samplingLength);
    expect(byIso.evaluationLength).toEqual(byAsme.evaluationLength);
    return { cutoff_mm: byAsme.samplingLength.to("mm"), evaluation_mm: byAsme.evaluationLength.to("mm") };
  },
  "cutoff-ra-inch": (given) => {
    const found = samplingLength({ standard: "ASME B46.1", ra: `${given.text("ra_uin")} µin` });
    return { cutoff_in: `${found.samplingLength.to("in")}`, evaluation_in: `${found.evaluationLength.to("in")}` };
  },
  "cutoff-rsm": (given) =>
    samplingLength({ standard: "ISO 4288:1996", rsm: mm(given.number("rsm_mm")) }).samplingLength.to("mm"),
  "cutoff-edition": (given) => {
    const by = (standard: SamplingQuestion["standard"]): number =>
      samplingLength({ standard, rz: um(given.number("rz_um")) }).samplingLength.to("mm");
    return { iso4288: by("ISO 4288:1996"), iso21920_3: by("ISO 21920-3:2021") };
  },
  "acceptance-default": (given) => {
    expect(given.text("drawing_standard")).toBe("ISO 21920-1:2021, nothing marked");
    const { rule, basis } = acceptanceRule("ISO 21920-1:2021");
    expect(basis[0]?.mark).toBe("memory");
    return `${rule} rule`;
  },
  "acceptance-16": (given) => {
    const values = (given.value("values_um") as number[]).map((one) => um(one));
    const by = (rule: "16 %" | "maximum"): boolean =>
      acceptRoughness({ upper: um(given.number("limit_um")), values, rule }).accepted;
    return { rule16: by("16 %"), max: by("maximum") };
  },
  "bearing-seat": (given) =>
    bearingSeatFinish({ diameter: mm(given.text("d_mm")), tolerance: given.text("tolerance") }).ra.to("um"),
  function: (given) => {
    expect(given.text("surface")).toBe("hydraulic rod, elastomer seal");
    return finishForFunction("hydraulic rod or bore against elastomer seal").coarsest.to("um");
  },
  "tolerance-rule": (given) => finishForTolerance(um(given.number("T_um")), { rule: "Rz < T/2" })[0]?.rz?.to("um"),
  "rz-range": (given) => {
    const found = rzRange(um(given.number("ra_um")));
    return [found.rz.least.to("um"), found.rz.most.to("um")];
  },
};

function factorOf(given: Given, unit: "ksi" | "MPa"): number {
  const value = given.number(unit === "ksi" ? "Sut_kpsi" : "Sut_MPa");
  const finish = conditionOf(given.text("finish"));
  return surfaceFactor({ finish, minimumUltimateStrength: { value, unit } }).factor;
}

/** The input of a case, read key by key. */
class Given {
  constructor(private readonly data: Readonly<Record<string, unknown>>) {}

  has(key: string): boolean {
    return Object.hasOwn(this.data, key);
  }

  value(key: string): unknown {
    if (!this.has(key)) throw new Error(`the case gives no ${key}`);
    return this.data[key];
  }

  text(key: string): string {
    const value = this.value(key);
    if (typeof value !== "string") throw new Error(`${key} is no text`);
    return value;
  }

  number(key: string): number {
    const value = this.value(key);
    if (typeof value !== "number") throw new Error(`${key} is no number`);
    return value;
  }
}

/** Numbers within the tolerance, everything else exactly. */
function compare(found: unknown, expected: unknown, tolerance: string | undefined): void {
  if (typeof expected === "number" && tolerance !== undefined) {
    const width = tolerance.endsWith("%") ? (expected * Number(tolerance.replace("%", ""))) / 100 : Number(tolerance);
    expect(typeof found).toBe("number");
    // a little room for the double itself, far below any figure printed
    expect(Math.abs((found as number) - expected)).toBeLessThanOrEqual(width * (1 + 1e-9));
  } else if (typeof expected === "object" && expected !== null && !Array.isArray(expected)) {
    expect(Object.keys(found as object).sort()).toEqual(Object.keys(expected).sort());
    for (const [key, value] of Object.entries(expected)) {
      compare((found as Record<string, unknown>)[key], value, tolerance);
    }
  } else {
    expect(found).toEqual(expected);
  }
}

describe("published check cases", () => {
  it("are all there", () => {
    expect(checks).toHaveLength(71);
    expect(new Set(checks.map((one) => one.id)).size).toBe(71);
    for (const { source } of checks) expect(source.length).toBeGreaterThan(5);
  });

  it.each(checks)("$id $topic", ({ topic, given, expect: expected, tolerance }) => {
    if (topic === "lay") {
      const { lay } = textureSymbols();
      const meaning = lay.find((one) => one.symbol === new Given(given).text("symbol"))?.meaning;
      const words = (expected as string).replace("directions", "").trim().split(" ");
      for (const word of words) expect(meaning).toContain(word);
      return;
    }
    const answer = ANSWERS[topic];
    if (answer === undefined) throw new Error(`no answer to ${topic}`);
    compare(answer(new Given(given)), expected, tolerance);
  });
});
