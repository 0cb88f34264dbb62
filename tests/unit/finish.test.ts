import {
  acceptRoughness,
  acceptanceRule,
  asRoughness,
  ballNoseCusp,
  bearingSeatFinish,
  checkFinish,
  faceMilledRoughness,
  feedForRoughness,
  finishForFunction,
  finishForTolerance,
  functionFindings,
  gradeFindings,
  gradeOfTolerance,
  largestNoseFeed,
  microinch,
  mm,
  preferredRoughness,
  processFindings,
  processFinish,
  processGrades,
  processNames,
  processReach,
  processesFor,
  processesForGrade,
  roughness,
  roughnessFactor,
  rzRange,
  samplingLength,
  sharpToolRoughness,
  sideMilledRoughness,
  sixteenPercentStages,
  surfaceFactor,
  toleranceFindings,
  triangleRoughness,
  turnedRoughness,
  turnedRoughnessWithEndEdge,
  um,
  writeLength,
} from "limitsmith";
import type { RoughnessLike } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

const codes = (list: readonly { readonly code: string }[]): string[] => list.map((one) => one.code);

describe("reading a roughness", () => {
  it.each([
    ["63 µin", "63 µin"],
    ["63uin", "63 µin"],
    ["63 \u03bcin", "63 µin"],
    ["1.6 µm", "1.6 µm"],
    ["Ra 1.6 um", "1.6 µm"],
    ["Ra1.6µm", "1.6 µm"],
    ["RA: 1.6 µm", "1.6 µm"],
    ["Ra = 1.6 µm", "1.6 µm"],
    ["1.6 µm Ra", "1.6 µm"],
    ["AA 32 µin", "32 µin"],
    ["CLA 32 µin", "32 µin"],
    ["N7", "1.6 µm"],
    ["n 7", "1.6 µm"],
    ["N0", "0.012 µm"],
    ["N01", "0.006 µm"],
    ["0.0016 mm", "1.6 µm"],
    ["0.000063 in", "63 µin"],
    [" Ra .8 µm ", "0.8 µm"],
  ])("%s", (text, expected) => {
    expect(roughness(text)).toMatchObject({ parameter: "Ra", max: false });
    expect(roughness(text).ra.toString()).toBe(expected);
  });

  it("takes the unit of a bare number from the drawing", () => {
    expect(roughness("63", { unit: "uin" }).grade).toBe("N7");
    expect(roughness("Ra 1.6", { unit: "um" }).grade).toBe("N7");
    expect(roughness("Ra 1,6", { unit: "um", decimalMark: "," }).grade).toBe("N7");
    expect(roughness("Ra 1,6 µm", { decimalMark: "," }).grade).toBe("N7");
    // what the text says goes before the drawing's unit
    expect(roughness("1.6 µm", { unit: "uin" }).ra.toString()).toBe("1.6 µm");
  });

  it.each(["Ra 0.8 µm max", "Ramax 0.8 µm", "Ra max 0.8 µm", "0.8 µm MAX.", "0.8 µm Ra max"])(
    "%s: the maximum rule",
    (text) => {
      expect(roughness(text).max).toBe(true);
      expect(roughness(text).ra.toString()).toBe("0.8 µm");
    },
  );

  it.each(["63 µin RMS", "RMS 63 µin", "Rq 63 µin", "63 uin rms"])("%s: an old note with its caution", (text) => {
    const read = roughness(text);
    expect(read.parameter).toBe("RMS");
    expect(read.value.toString()).toBe("63 µin");
    expect(writeLength(read.ra, { places: 1, style: "metric" })).toBe("56.8 µin");
    expect([read.grade, read.pair]).toEqual([null, null]);
    expect(read.coarser.firstChoice?.toString()).toBe("63 µin");
    expect(codes(read.cautions)).toEqual(["FINISH_RMS"]);
    // 63/1.3 and 63/1.1
    expect(read.cautions[0]?.says).toContain("48.5 µin and 57.3 µin");
    expect(read.basis.find((step) => step.says.includes("1.11"))).toMatchObject({ mark: "two-sources" });
  });

  it("an RMS note without a unit needs one", () => {
    expect(codeOf(() => roughness("63 RMS"))).toBe("UNIT_MISSING");
    expect(roughness("63 RMS", { unit: "uin" }).parameter).toBe("RMS");
  });

  it("a grade says that it is old", () => {
    expect(codes(roughness("N7").cautions)).toEqual(["FINISH_OLD_GRADE"]);
    expect(roughness("N7").basis.map((step) => step.how)).toEqual(["caller", "tabulated", "tabulated"]);
  });

  it.each(["63 µm", "125 µm", "32 µm", "1.6 µin", "0.8 µin", "12.5 µin"])("%s: the unit is doubtful", (text) => {
    // some of these are no whole number of 0.1 nm as text; as numbers they are rounded
    const read = text.endsWith("µin") ? roughness(microinch(Number.parseFloat(text))) : roughness(text);
    expect(codes(read.cautions)).toEqual(["FINISH_UNIT_DOUBTFUL"]);
  });

  it.each(["1 µm", "2 µm", "8 µm", "1.6 µm", "50 µm", "100 µm", "63 µin", "1 µin", "20 µin", "100 µin"])(
    "%s: nothing doubtful",
    (text) => {
      expect(roughness(text).cautions).toEqual([]);
    },
  );

  it.each<[string, string]>([
    ["", "TEXT_EMPTY"],
    ["   ", "TEXT_EMPTY"],
    ["63", "UNIT_MISSING"],
    ["Ra 63", "UNIT_MISSING"],
    ["63 mil", "UNIT_AMBIGUOUS"],
    ["63 furlong", "UNIT_UNKNOWN"],
    ["N15", "ROUGHNESS_GRADE_UNKNOWN"],
    ["N02", "ROUGHNESS_GRADE_UNKNOWN"],
    ["N7.5", "ROUGHNESS_GRADE_UNKNOWN"],
    ["Rz 6.3 µm", "ROUGHNESS_PARAMETER_UNKNOWN"],
    ["Rmax 6.3 µm", "ROUGHNESS_PARAMETER_UNKNOWN"],
    ["Rt6.3µm", "ROUGHNESS_PARAMETER_UNKNOWN"],
    ["RzJIS 6.3 µm", "ROUGHNESS_PARAMETER_UNKNOWN"],
    ["Ra 63 µin RMS", "ROUGHNESS_INVALID"],
    ["0 µm", "ROUGHNESS_INVALID"],
    ["Ra 63 mm", "ROUGHNESS_INVALID"],
    ["1.1 mm", "ROUGHNESS_INVALID"],
    ["-1.6 µm", "ROUGHNESS_INVALID"],
    ["Ra 1,6 µm", "DECIMAL_MARK_MIXED"],
    ["66.6 µin", "LENGTH_TOO_FINE"],
  ])("%s is refused: %s", (text, code) => {
    expect(codeOf(() => roughness(text))).toBe(code);
  });

  it("refuses a long text unread", () => {
    for (const text of [`Ra ${"1".repeat(200)} µm`, "Ra ".repeat(400_000), " ".repeat(1_000_000)]) {
      expect(codeOf(() => roughness(text))).toBe("TEXT_TOO_LONG");
    }
  });

  it("refuses data of the wrong kind, with the path", () => {
    expect(codeOf(() => roughness("63", { unit: "mm" as never }))).toBe("OPTION_INVALID");
    expect(codeOf(() => preferredRoughness("mm" as never))).toBe("OPTION_INVALID");
    for (const value of [63, null, undefined, [], {}, true, { ra: "1.6 µm" }] as unknown as RoughnessLike[]) {
      expect(codeOf(() => asRoughness(value))).toBe("ROUGHNESS_INVALID");
    }
    expect(thrown(() => asRoughness({ value: "63" }, ["finish"]))).toMatchObject({
      code: "UNIT_MISSING",
      path: ["finish", "value"],
    });
    expect(codeOf(() => asRoughness({ value: "63 µin", parameter: "Rz" as never }))).toBe(
      "ROUGHNESS_PARAMETER_UNKNOWN",
    );
    expect(codeOf(() => asRoughness({ value: "63 µin", max: "yes" as never }))).toBe("ROUGHNESS_INVALID");
    expect(codeOf(() => asRoughness({ value: "63 µin", unit: "in" as never }))).toBe("UNIT_UNKNOWN");
    // a stress is no roughness
    expect(codeOf(() => asRoughness({ value: 63, unit: "MPa" } as never))).toBe("LENGTH_INVALID");
  });

  it("a polluted prototype supplies nothing", () => {
    const prototype = Object.prototype as unknown as Record<string, unknown>;
    try {
      prototype["unit"] = "uin";
      prototype["max"] = true;
      prototype["parameter"] = "RMS";
      prototype["rule"] = "maximum";
      expect(codeOf(() => roughness("63", {}))).toBe("UNIT_MISSING");
      expect(asRoughness({ value: um(1.6) })).toMatchObject({ max: false, parameter: "Ra", unit: "um" });
      expect(codeOf(() => acceptRoughness({ upper: "1.6 µm", values: ["1 µm"] }))).toBe("OPTION_INVALID");
    } finally {
      for (const key of ["unit", "max", "parameter", "rule"]) Reflect.deleteProperty(prototype, key);
    }
  });

  it("keeps the exact value apart from the partner", () => {
    const read = roughness("100 µin");
    expect(read.converted.toString()).toBe("2.54 µm");
    expect([read.pair, read.secondChoicePair?.toString(), read.grade]).toEqual([null, "2.5 µm", null]);
    expect(read.basis.at(-1)).toMatchObject({ mark: "memory", how: "tabulated" });
    expect(read.finer.anyChoice?.toString()).toBe("80 µin");
    expect(read.coarser.anyChoice?.toString()).toBe("125 µin");
    expect(roughness("0.008 µm").finer).toEqual({ firstChoice: null, anyChoice: null });
    expect(roughness("1.6002 µm")).toMatchObject({ grade: null, pair: null });
    expect(Object.isFrozen(read) && Object.isFrozen(read.finer) && Object.isFrozen(read.basis)).toBe(true);
  });
});

describe("processes and roughness", () => {
  it("a trade name reads its line, whatever its case", () => {
    expect(processFinish(" Turning ").row).toBe("boring, turning");
    expect(processFinish("EDM").process).toBe("electro-discharge machining");
    expect(processFinish("cylindrical grinding").row).toBe("grinding");
    expect(processFinish("shaping").row).toBe("planing, shaping");
    for (const { name, hasFinish, also } of processNames()) {
      for (const one of [name, ...also]) {
        if (hasFinish) expect(processFinish(one).process).toBe(name);
        else expect(codeOf(() => processFinish(one))).toBe("PROCESS_UNKNOWN");
        expect(processGrades(one).process).toBe(name);
      }
    }
  });

  it("what is no process is refused, however long", () => {
    for (const name of ["", "knitting", "__proto__", "constructor", "x".repeat(1_000_000), 7, null]) {
      for (const ask of [processFinish, processGrades])
        expect(codeOf(() => ask(name as never))).toBe("PROCESS_UNKNOWN");
      expect(codeOf(() => processReach(name as never, "1.6 µm"))).toBe("PROCESS_UNKNOWN");
    }
  });

  it("compares in the drawing's own unit", () => {
    // 63 µin is 1.6002 µm: within the 1.6 µm of the chart on an inch drawing only
    expect(processReach("die casting", "63 µin").reach).toBe("average");
    expect(processReach("die casting", "1.6002 µm").reach).toBe("less frequent");
    // 125 µin is 3.175 µm and still the coarse end of reaming; 126 µin is not
    expect(processReach("reaming", "125 µin").reach).toBe("average");
    expect(processReach("reaming", microinch(126))).toMatchObject({ reach: "less frequent", side: "coarser" });
    // an end between two columns has no partner and is taken exactly: 4.75 µm is 187.0 µin
    expect(processReach("EDM", "187 µin").reach).toBe("average");
    expect(processReach("EDM", "188 µin").reach).toBe("less frequent");
  });

  it("an open end is not known, and says so", () => {
    for (const [process, finish, side] of [
      ["electrochemical", "0.1 µm", "finer"],
      ["electro-polish", "1.6 µm", "coarser"],
      ["superfinishing", "0.4 µm", "coarser"],
    ] as const) {
      const found = processReach(process, finish);
      expect(found).toMatchObject({ reach: "not known", side });
      expect(codes(found.cautions)).toContain("FINISH_BAND_OPEN");
    }
    expect(processReach("superfinishing", "0.1 µm").reach).toBe("average");
  });

  it("cautions: always that the chart is informative, and memory where memory was used", () => {
    expect(codes(processReach("drilling", "3.2 µm").cautions)).toEqual(["FINISH_CHART_INFORMATIVE"]);
    expect(codes(processReach("drilling", "0.8 µm").cautions)).toEqual([
      "FINISH_CHART_INFORMATIVE",
      "FINISH_BAND_FROM_MEMORY",
    ]);
    expect(codes(processReach("milling", "0.2 µm").cautions)).toEqual(["FINISH_CHART_INFORMATIVE"]);
    expect(codes(processFinish("superfinishing").cautions)).toEqual([
      "FINISH_CHART_INFORMATIVE",
      "FINISH_BAND_FROM_MEMORY",
      "FINISH_BAND_OPEN",
    ]);
  });

  it("no coarser band: electron beam ends where its average band ends", () => {
    expect(processReach("electron beam", "6.3 µm").reach).toBe("average");
    expect(processReach("electron beam", "8 µm").reach).toBe("outside");
  });

  it("sorts all 31 lines", () => {
    const { average, lessFrequent, notKnown, outside } = processesFor("0.1 µm");
    expect(average.map((one) => one.process)).toEqual([
      "grinding",
      "honing",
      "electro-polish",
      "polishing",
      "lapping",
      "superfinishing",
    ]);
    expect(notKnown.map((one) => one.process)).toEqual(["electrochemical"]);
    expect(average.length + lessFrequent.length + notKnown.length + outside.length).toBe(31);
  });
});

describe("processes and grades", () => {
  it("keeps the charts apart", () => {
    const { spans } = processGrades("turning");
    expect(spans.map(({ row, finest, coarsest }) => [row, finest, coarsest])).toEqual([
      ["turning", 7, 13],
      ["rough turning", 11, 11],
      ["centre lathe turning", 8, 8],
      ["high-quality turning", 7, 7],
    ]);
    expect(codes(processGrades("turning").cautions)).toEqual(["FINISH_GRADE_CHART_OLD"]);
    expect(processGrades("forging").spans).toEqual([]);
    expect(processGrades("drilling").tolerances[0]).toMatchObject({ least: null });
  });

  // how many lines each chart has for a trade name: ANSI bars, ISO entries, tolerances in mm
  it.each([
    ["flame cutting", 0, 1, 1],
    ["sawing", 0, 0, 2],
    ["planing, shaping", 1, 1, 1],
    ["planing", 1, 1, 1],
    ["shaping", 1, 0, 1],
    ["drilling", 1, 1, 1],
    ["chemical milling", 0, 0, 1],
    ["EDM", 0, 0, 1],
    ["wire EDM", 0, 0, 1],
    ["milling", 1, 1, 1],
    ["broaching", 1, 1, 1],
    ["reaming", 1, 1, 1],
    ["electron beam", 0, 0, 1],
    ["laser", 0, 0, 1],
    ["electrochemical", 0, 0, 1],
    ["boring, turning", 2, 8, 1],
    ["turning", 1, 3, 1],
    ["boring", 1, 5, 1],
    ["rough turning", 1, 1, 1],
    ["fine turning", 1, 1, 1],
    ["rough boring", 1, 1, 1],
    ["fine boring", 1, 1, 1],
    ["grinding", 2, 2, 1],
    ["cylindrical grinding", 1, 2, 1],
    ["surface grinding", 1, 2, 1],
    ["fine grinding", 2, 1, 1],
    ["honing", 1, 2, 1],
    ["fine honing", 1, 1, 1],
    ["polishing", 0, 0, 1],
    ["lapping", 1, 2, 1],
    ["machine lapping", 1, 1, 1],
    ["lapping and honing", 1, 4, 0],
    ["sand casting", 0, 1, 0],
    ["extrusion", 0, 1, 0],
    ["die casting", 0, 1, 0],
    ["moulding", 0, 1, 0],
    ["stamping", 0, 1, 0],
    ["diamond turning", 1, 0, 0],
    ["diamond boring", 1, 1, 0],
    ["forging", 0, 0, 0],
    ["superfinishing", 0, 0, 0],
  ] as const)("%s: %i ANSI, %i ISO, %i in mm", (name, ansi, iso, tolerance) => {
    const { spans, tolerances } = processGrades(name);
    const of = (chart: string): number => spans.filter((one) => one.chart.startsWith(chart)).length;
    expect([of("ANSI"), of("BS"), tolerances.length]).toEqual([ansi, iso, tolerance]);
  });

  it("IT7: usual, finer than needed, not usual", () => {
    const { usual, finerThanNeeded, notUsual } = processesForGrade("IT7");
    expect(usual.filter((one) => one.chart.startsWith("ANSI")).map((one) => one.row)).toEqual([
      "cylindrical grinding",
      "surface grinding",
      "diamond turning",
      "diamond boring",
      "broaching",
      "reaming",
      "turning",
    ]);
    expect(finerThanNeeded.map((one) => one.row)).toContain("lapping and honing");
    expect(notUsual.map((one) => one.row)).toContain("milling");
    expect(processesForGrade(7).usual).toEqual(usual);
  });

  it.each(["IT19", "IT-1", "IT007", "7", "", "h7", 19, -2, 7.5, NaN, null])("%s is no grade", (grade) => {
    expect(codeOf(() => processesForGrade(grade as never))).toBe("CLASS_GRADE_UNKNOWN");
  });

  it("which grade, and who reaches it, for a whole size", () => {
    const { iso, inch } = gradeOfTolerance({ size: "30 mm", tolerance: "21 µm" });
    expect(iso).toMatchObject({ exact: true, nearest: { grade: "IT7" } });
    expect(iso?.processes.usual.map((one) => one.row)).toContain("reaming");
    expect(inch).toMatchObject({ exact: false, nearest: { grade: 7 } });
    expect(gradeOfTolerance({ size: "4000 mm", tolerance: "21 µm" }).iso).toBeNull();
    expect(gradeOfTolerance({ size: "300 in", tolerance: "21 µm" })).toEqual({ iso: null, inch: null });
    // finer than the finest, wider than the coarsest
    expect(gradeOfTolerance({ size: "30 mm", tolerance: "0.1 µm" }).iso).toMatchObject({
      within: null,
      nearest: { grade: "IT01" },
      exact: false,
    });
    expect(gradeOfTolerance({ size: "30 mm", tolerance: "9 mm" }).iso).toMatchObject({
      beyond: null,
      nearest: { grade: "IT18" },
    });
    expect(codeOf(() => gradeOfTolerance({ size: "30 mm", tolerance: "0 µm" }))).toBe("OPTION_INVALID");
    expect(codeOf(() => gradeOfTolerance({ size: "30 mm" } as never))).toBe("LENGTH_INVALID");
  });
});

describe("tolerance and roughness", () => {
  it("the line of the form tolerance goes by its share, ends as printed", () => {
    const lines = [70, 60, 41, 40, 26, 25, 24].map(
      (form) => finishForTolerance("100 µm", { form: um(form) }).at(-1)?.rule,
    );
    expect(lines).toEqual([
      "form within 60 % of T",
      "form within 60 % of T",
      "form within 60 % of T",
      "form within 40 % of T",
      "form within 40 % of T",
      "form within 25 % of T",
      "form under 25 % of T",
    ]);
  });

  it("gives limits in the unit of the tolerance, and no preferred value where none is small enough", () => {
    const [, byRa] = finishForTolerance("1 thou");
    expect(byRa?.ra?.toString()).toBe("125 µin");
    // below, not at: 125 µin itself fills the tolerance
    expect(byRa?.preferredRa?.toString()).toBe("63 µin");
    expect(finishForTolerance("0.2 µm")[1]?.preferredRa).toBeNull();
  });

  it("refuses", () => {
    expect(codeOf(() => finishForTolerance("0 µm"))).toBe("ROUGHNESS_INVALID");
    expect(codeOf(() => finishForTolerance("21 µm", { form: "0 µm" }))).toBe("ROUGHNESS_INVALID");
    expect(codeOf(() => finishForTolerance("21 µm", { rule: "Ra < T/9" as never }))).toBe("OPTION_INVALID");
    expect(codeOf(() => finishForTolerance("21 µm", { rule: "form under 25 % of T" }))).toBe("OPTION_INVALID");
    expect(codeOf(() => finishForTolerance(21 as never))).toBe("LENGTH_INVALID");
  });

  it("finds a roughness too coarse for the tolerance, by each rule that it breaks", () => {
    expect(toleranceFindings("1.6 µm", "12.8 µm")).toHaveLength(1);
    expect(toleranceFindings("1.5999 µm", "12.8 µm")).toEqual([]);
    const both = toleranceFindings("3.2 µm", "20 µm", { form: "12 µm" });
    expect(codes(both)).toEqual(["FINISH_TOO_COARSE_FOR_TOLERANCE", "FINISH_TOO_COARSE_FOR_TOLERANCE"]);
    expect(both[1]?.says).toContain("at most 1 µm, preferred 0.8 µm");
    expect(toleranceFindings("1 µm", "20 µm", { rule: "form within 60 % of T" })).toEqual([]);
    // a rule of Rz says nothing about Ra
    expect(toleranceFindings("50 µm", "20 µm", { rule: "Rz < T/2" })).toEqual([]);
  });
});

describe("function and roughness", () => {
  it.each([
    ["bearing seat", "rolling bearing fit, shaft and housing"],
    ["press fit", "press-fit parts"],
    ["seal lip", "radial lip seal counterface"],
    ["keyway side", "keyway sides"],
    ["Keyseat  bottom", "keyway bottom"],
    ["O-RING GROOVE", "O-ring groove, static"],
    ["journal bearing", "bronze journal bearings"],
    ["gasket face", "surfaces for soft gaskets"],
    ["thread", "chased and cut threads"],
    ["slideway", "slideways and gibs"],
    ["gear tooth", "gear teeth"],
    ["spline shaft", "spline shafts"],
    ["clearance surface", "clearance surfaces"],
    ["lip seal", "radial lip seal counterface"],
    ["rolling bearing seat", "rolling bearing fit, shaft and housing"],
    ["keyseat side", "keyway sides"],
    ["keyseat sides", "keyway sides"],
  ])("%s", (short, name) => {
    expect(finishForFunction(short).function).toBe(name);
  });

  it("what is no function is refused, however long", () => {
    for (const name of ["", "decoration", "__proto__", "y".repeat(1_000_000), 3]) {
      expect(codeOf(() => finishForFunction(name as never))).toBe("FINISH_FUNCTION_UNKNOWN");
    }
  });

  it("a lip seal needs its lower limit", () => {
    expect(codes(functionFindings("0.8 µm", "seal lip"))).toEqual(["FINISH_NEEDS_LOWER_LIMIT"]);
    expect(functionFindings("0.8 µm", "seal lip", { lower: "0.2 µm" })).toEqual([]);
    expect(functionFindings("32 µin", "seal lip", { lower: "8 µin" })).toEqual([]);
    expect(codes(functionFindings("0.8 µm", "seal lip", { lower: "0.1 µm" }))).toEqual([
      "FINISH_TOO_FINE_FOR_FUNCTION",
    ]);
    expect(codes(functionFindings("0.1 µm", "seal lip", { lower: "0.05 µm" }))).toEqual([
      "FINISH_TOO_FINE_FOR_FUNCTION",
      "FINISH_TOO_FINE_FOR_FUNCTION",
    ]);
    expect(codes(functionFindings("1.6 µm", "seal lip", { lower: "0.2 µm" }))).toEqual([
      "FINISH_TOO_COARSE_FOR_FUNCTION",
    ]);
  });

  it("bearing seats by grade, class and surface", () => {
    const ra = (diameter: string, tolerance: string, surface?: "ground" | "turned housing"): string =>
      bearingSeatFinish({ diameter, tolerance, ...(surface === undefined ? {} : { surface }) }).ra.toString();
    expect(ra("80 mm", "h6")).toBe("0.8 µm");
    expect(ra("80.0001 mm", "h6")).toBe("1.6 µm");
    expect(ra("2 in", "k5")).toBe("0.4 µm");
    expect(ra("62 mm", "H7", "turned housing")).toBe("3.2 µm");
    for (const [diameter, tolerance] of [
      ["3 mm", "IT6"],
      ["1251 mm", "IT6"],
      ["60 mm", "IT8"],
      ["60 mm", "h4"],
    ] as const) {
      expect(codeOf(() => bearingSeatFinish({ diameter, tolerance }))).toBe("FINISH_NOT_TABULATED");
    }
    expect(codeOf(() => bearingSeatFinish({ diameter: "60 mm", tolerance: "IT20" }))).toBe("CLASS_GRADE_UNKNOWN");
    expect(codeOf(() => bearingSeatFinish({ diameter: "60 mm", tolerance: "six" }))).toBe("CLASS_MALFORMED");
    expect(codeOf(() => bearingSeatFinish({ diameter: "60 mm", tolerance: "q6" }))).toBe("CLASS_LETTER_UNKNOWN");
    expect(codeOf(() => bearingSeatFinish({ diameter: "60 mm", tolerance: "h6", surface: "painted" as never }))).toBe(
      "OPTION_INVALID",
    );
    expect(codeOf(() => bearingSeatFinish({ tolerance: "h6" } as never))).toBe("LENGTH_INVALID");
  });
});

describe("findings", () => {
  it("a process that does not reach the finish, seldom reaches it, or is finer than needed", () => {
    expect(codes(processFindings("0.1 µm", "milling"))).toEqual(["PROCESS_DOES_NOT_REACH_FINISH"]);
    expect(codes(processFindings("0.4 µm", "milling"))).toEqual(["PROCESS_SELDOM_REACHES_FINISH"]);
    expect(processFindings("0.1 µm", "electrochemical")[0]?.says).toContain("the sources differ");
    expect(codes(processFindings("12.5 µm", "grinding"))).toEqual(["PROCESS_FINER_THAN_FINISH_NEEDS"]);
    // rougher than the average band, within the less frequent one: an upper limit that the process keeps
    expect(processFindings("3.2 µm", "grinding")).toEqual([]);
    // no end is known on that side
    expect(processFindings("3.2 µm", "superfinishing")).toEqual([]);
  });

  it("a process and a grade", () => {
    expect(codes(gradeFindings("IT6", "turning"))).toEqual(["PROCESS_DOES_NOT_REACH_GRADE"]);
    expect(gradeFindings("IT7", "turning")).toEqual([]);
    expect(codes(gradeFindings("IT7", "boring"))).toEqual(["PROCESS_GRADE_DISPUTED"]);
    expect(codes(gradeFindings("IT9", "grinding"))).toEqual(["PROCESS_FINER_THAN_GRADE_NEEDS"]);
    expect(gradeFindings("IT3", "forging")).toEqual([]);
    expect(gradeFindings("IT7", "boring")[0]?.basis.map((step) => step.mark)).toContain("memory");
  });

  it("all together, in order", () => {
    const found = checkFinish({
      roughness: "3.2 µm",
      tolerance: "16 µm",
      function: "seal lip",
      process: "lapping",
      grade: "IT3",
    });
    expect(codes(found)).toEqual([
      "FINISH_TOO_COARSE_FOR_TOLERANCE",
      "FINISH_TOO_COARSE_FOR_FUNCTION",
      "FINISH_NEEDS_LOWER_LIMIT",
      "PROCESS_FINER_THAN_FINISH_NEEDS",
      "PROCESS_DOES_NOT_REACH_GRADE",
    ]);
    for (const one of found) expect(one.basis.length).toBeGreaterThan(0);
    expect(checkFinish({ roughness: "3.2 µm" })).toEqual([]);
    // only a grade chart has it: nothing to say about the finish
    expect(checkFinish({ roughness: "0.1 µm", process: "diamond turning", grade: "IT6" })).toEqual([]);
    expect(codes(checkFinish({ roughness: "0.8 µm", lower: "0.1 µm", function: "seal lip" }))).toEqual([
      "FINISH_TOO_FINE_FOR_FUNCTION",
    ]);
    expect(checkFinish({ roughness: "1.6 µm", tolerance: "20 µm" })).toEqual([]);
    expect(
      checkFinish({ roughness: "1.6 µm", tolerance: "20 µm", toleranceRule: { rule: "form within 60 % of T" } }),
    ).toHaveLength(1);
    expect(codeOf(() => checkFinish({} as never))).toBe("ROUGHNESS_INVALID");
    expect(codeOf(() => checkFinish({ roughness: "1.6 µm", process: "knitting" }))).toBe("PROCESS_UNKNOWN");
  });
});

describe("geometry is refused where it does not hold", () => {
  const r = "0.8 mm";

  it("turning", () => {
    expect(codeOf(() => turnedRoughness({ feed: "1.7 mm", noseRadius: r }))).toBe("FINISH_GEOMETRY_INVALID");
    expect(turnedRoughness({ feed: "1.6 mm", noseRadius: r }).rtOfCircle.toString()).toBe("800 µm");
    expect(codeOf(() => turnedRoughness({ feed: "0 mm", noseRadius: r }))).toBe("FINISH_GEOMETRY_INVALID");
    expect(codeOf(() => turnedRoughness({ feed: "0.2 mm", noseRadius: "-1 mm" }))).toBe("FINISH_GEOMETRY_INVALID");
    expect(codeOf(() => turnedRoughness({ feed: "0.2 mm", noseRadius: "1001 mm" }))).toBe("FINISH_GEOMETRY_INVALID");
    expect(codeOf(() => turnedRoughness({ feed: 0.2 as never, noseRadius: r }))).toBe("LENGTH_INVALID");
    expect(codeOf(() => turnedRoughness({ noseRadius: r } as never))).toBe("LENGTH_INVALID");
    for (const angle of ["0°", "90°", "-5°"]) {
      expect(codeOf(() => largestNoseFeed({ noseRadius: r, endCuttingEdgeAngle: angle }))).toBe(
        "FINISH_GEOMETRY_INVALID",
      );
    }
    expect(codeOf(() => largestNoseFeed({ noseRadius: r, endCuttingEdgeAngle: "5" }))).toBe("ANGLE_INVALID");
    const { largestFeed } = turnedRoughness({ feed: "0.1 mm", noseRadius: r, endCuttingEdgeAngle: "5°" });
    // 2 * 0.8 * sin 5° = 0.13945
    expect(largestFeed?.to("mm")).toBeCloseTo(0.13945, 5);
    expect(codes(turnedRoughness({ feed: "0.1 mm", noseRadius: r }).cautions)).toEqual(["FINISH_THEORETICAL"]);
  });

  it("the end edge: until the peak leaves the nose on the leading side", () => {
    const cut = { noseRadius: "0.4 mm", endCuttingEdgeAngle: "30°" };
    expect(turnedRoughnessWithEndEdge({ ...cut, feed: "0.3 mm" }).form).toBe("circle");
    expect(turnedRoughnessWithEndEdge({ ...cut, feed: "0.6 mm" }).form).toBe("circle and end cutting edge");
    expect(codeOf(() => turnedRoughnessWithEndEdge({ ...cut, feed: "1.5 mm" }))).toBe("FINISH_GEOMETRY_INVALID");
    expect(codeOf(() => turnedRoughnessWithEndEdge({ ...cut, feed: "3 mm" }))).toBe("FINISH_GEOMETRY_INVALID");
    expect(codeOf(() => turnedRoughnessWithEndEdge({ ...cut, feed: "0.6 mm", sideCuttingEdgeAngle: "60°" }))).toBe(
      "FINISH_GEOMETRY_INVALID",
    );
  });

  it("the feed for a wanted Ra", () => {
    const wanted = { ra: "1.6 µm", noseRadius: r };
    expect(feedForRoughness({ ...wanted, endCuttingEdgeAngle: "5°" })).toMatchObject({ formHolds: false });
    expect(feedForRoughness({ ...wanted, endCuttingEdgeAngle: "10°" })).toMatchObject({ formHolds: true });
    expect(feedForRoughness(wanted)).toMatchObject({ formHolds: null, largestFeed: null, form: "parabola" });
    // by f²/(32 r): √(32 * 0.8 * 0.0016) = 0.20239
    expect(feedForRoughness({ ...wanted, form: "short form" }).feed.to("mm")).toBeCloseTo(0.20239, 5);
    expect(feedForRoughness({ ra: "63 µin", noseRadius: "1/32 in" }).feed.unit).toBe("in");
    expect(codeOf(() => feedForRoughness({ ...wanted, form: "other" as never }))).toBe("OPTION_INVALID");
    expect(codeOf(() => feedForRoughness({ ra: "1 mm", noseRadius: "1 µm" }))).toBe("FINISH_GEOMETRY_INVALID");
  });

  it("a sharp nose", () => {
    const cut = { feed: "0.2 mm", sideCuttingEdgeAngle: "0°", endCuttingEdgeAngle: "45°" };
    expect(sharpToolRoughness(cut).rt.toString()).toBe("200 µm");
    expect(sharpToolRoughness(cut).ra.toString()).toBe("50 µm");
    expect(codeOf(() => sharpToolRoughness({ ...cut, endCuttingEdgeAngle: "0°" }))).toBe("FINISH_GEOMETRY_INVALID");
    expect(codeOf(() => sharpToolRoughness({ ...cut, sideCuttingEdgeAngle: "90°" }))).toBe("FINISH_GEOMETRY_INVALID");
  });

  it("milling", () => {
    const face = { feedPerTooth: "0.1 mm", teeth: 4, cornerRadius: r, teethLevel: true };
    expect(codeOf(() => faceMilledRoughness({ ...face, teeth: 0 }))).toBe("OPTION_INVALID");
    expect(codeOf(() => faceMilledRoughness({ ...face, teeth: 2.5 }))).toBe("OPTION_INVALID");
    expect(codeOf(() => faceMilledRoughness({ ...face, teethLevel: undefined as never }))).toBe("OPTION_INVALID");
    const side = { feedPerTooth: "0.2 mm", cutterDiameter: "16 mm" };
    expect(sideMilledRoughness(side).form).toBe("arc");
    expect(sideMilledRoughness({ ...side, direction: "up", teeth: 4 }).form).toBe("tooth path, up milling");
    // f²/(8 (8 - 0.2 * 4/π)) = 0.645548 µm
    expect(sideMilledRoughness({ ...side, direction: "down", teeth: 4 }).rt.to("um")).toBeCloseTo(0.6455, 4);
    expect(codeOf(() => sideMilledRoughness({ ...side, direction: "down" }))).toBe("OPTION_INVALID");
    expect(codeOf(() => sideMilledRoughness({ ...side, direction: "left" as never }))).toBe("OPTION_INVALID");
    expect(codeOf(() => sideMilledRoughness({ ...side, feedPerTooth: "17 mm" }))).toBe("FINISH_GEOMETRY_INVALID");
    expect(codeOf(() => sideMilledRoughness({ ...side, direction: "down", teeth: 125 }))).toBe(
      "FINISH_GEOMETRY_INVALID",
    );
    expect(codeOf(() => ballNoseCusp({ ballRadius: "4 mm", lineSpacing: "8.1 mm" }))).toBe("FINISH_GEOMETRY_INVALID");
  });
});

describe("sampling lengths", () => {
  it("upper bounds belong to the finer class, exactly", () => {
    const by = (ra: string): string => samplingLength({ standard: "ISO 4288:1996", ra }).samplingLength.toString();
    expect([by("2 µm"), by("2.0001 µm"), by("3.2 µm")]).toEqual(["0.8 mm", "2.5 mm", "2.5 mm"]);
    // 80 µin is 2.032 µm: the inch table has it in its own class, the metric one in the next
    expect(by("80 µin")).toBe("2.5 mm");
    expect(samplingLength({ standard: "ASME B46.1", ra: "80 µin" }).samplingLength.toString()).toBe("0.03 in");
    expect(samplingLength({ standard: "ASME B46.1", ra: "100 µm" }).samplingLength.toString()).toBe("8 mm");
    expect(samplingLength({ standard: "ASME B46.1", rsm: "0.2 mm" }).samplingLength.toString()).toBe("0.8 mm");
  });

  it("refuses what a table does not have", () => {
    const ask = (question: unknown) => () => samplingLength(question as never);
    expect(codeOf(ask({ standard: "ISO 4288:1996", ra: "0.006 µm" }))).toBe("FINISH_NOT_TABULATED");
    expect(codeOf(ask({ standard: "ISO 4288:1996", rsm: "5 mm" }))).toBe("FINISH_NOT_TABULATED");
    expect(codeOf(ask({ standard: "ISO 21920-3:2021", rsm: "0.1 mm" }))).toBe("FINISH_NOT_TABULATED");
    expect(codeOf(ask({ standard: "ISO 21920-3:2021", rz: "0 µm" }))).toBe("FINISH_NOT_TABULATED");
    expect(codeOf(ask({ standard: "ASME B46.1", rz: "6 µm" }))).toBe("FINISH_NOT_TABULATED");
    expect(codeOf(ask({ standard: "ISO 9999", ra: "1.6 µm" }))).toBe("OPTION_INVALID");
    expect(codeOf(ask({ standard: "ISO 4288:1996" }))).toBe("OPTION_INVALID");
    expect(codeOf(ask({ standard: "ISO 4288:1996", ra: "1.6 µm", rz: "6 µm" }))).toBe("OPTION_INVALID");
  });
});

describe("acceptance", () => {
  const one = (count: number, over: number): string[] => [
    ...Array.from({ length: over }, () => "0.81 µm"),
    ...Array.from({ length: count - over }, () => "0.7 µm"),
  ];
  const by16 = (count: number, over: number): boolean =>
    acceptRoughness({ upper: "0.8 µm", values: one(count, over), rule: "16 %" }).accepted;

  it("16 % is a share of the values, not an excess", () => {
    expect([by16(6, 1), by16(7, 1), by16(12, 1), by16(12, 2), by16(25, 4), by16(25, 5)]).toEqual([
      false,
      true,
      true,
      false,
      true,
      false,
    ]);
    // 10 % over the limit in each value: all of them are outside
    expect(acceptRoughness({ upper: "0.8 µm", values: ["0.88 µm"], rule: "16 %" }).accepted).toBe(false);
  });

  it("goes by the drawing's standard, and by max on the note", () => {
    const values = one(12, 1);
    const ask = (upper: string, standard: "ISO 1302:2002" | "ISO 21920-1:2021"): [string, boolean] => {
      const { rule, accepted } = acceptRoughness({ upper, values, standard });
      return [rule, accepted];
    };
    expect(ask("0.8 µm", "ISO 1302:2002")).toEqual(["16 %", true]);
    expect(ask("0.8 µm max", "ISO 1302:2002")).toEqual(["maximum", false]);
    expect(ask("0.8 µm", "ISO 21920-1:2021")).toEqual(["maximum", false]);
    expect(acceptanceRule("ISO 1302:2002").basis[0]?.mark).toBe("one-source");
  });

  it("two limits, each judged alone; a value on a limit passes", () => {
    const ask = (values: string[]) => acceptRoughness({ upper: "0.8 µm", lower: "0.2 µm", values, rule: "maximum" });
    expect(ask(["0.2 µm", "0.8 µm"])).toMatchObject({ accepted: true, over: 0, under: 0, measured: 2 });
    expect(ask(["0.1999 µm", "0.8001 µm"])).toMatchObject({ accepted: false, over: 1, under: 1 });
    expect(acceptRoughness({ lower: "0.2 µm", values: ["0.1 µm"], rule: "maximum" }).accepted).toBe(false);
  });

  it("refuses", () => {
    const ask = (question: unknown) => () => acceptRoughness(question as never);
    expect(codeOf(ask({ values: ["1 µm"], rule: "maximum" }))).toBe("OPTION_INVALID");
    expect(codeOf(ask({ upper: "1 µm", values: ["1 µm"] }))).toBe("OPTION_INVALID");
    expect(codeOf(ask({ upper: "1 µm", values: ["1 µm"], rule: "20 %" }))).toBe("OPTION_INVALID");
    expect(codeOf(ask({ upper: "1 µm", values: [], rule: "maximum" }))).toBe("OPTION_INVALID");
    expect(codeOf(ask({ upper: "1 µm", values: "1 µm", rule: "maximum" }))).toBe("OPTION_INVALID");
    expect(codeOf(ask({ upper: "1 µm", lower: "2 µm", values: ["1 µm"], rule: "maximum" }))).toBe("LIMITS_UPSIDE_DOWN");
    expect(thrown(ask({ upper: "1 µm", values: ["1 µm", "2"], rule: "maximum" }))).toMatchObject({
      code: "UNIT_MISSING",
      path: ["values", 1],
    });
    expect(codeOf(() => acceptanceRule("ASME B46.1" as never))).toBe("OPTION_INVALID");
  });

  it("the short procedure stops at the first stage that is kept", () => {
    const stage = (...values: number[]): [string, number] => {
      const { decision, after } = sixteenPercentStages(
        "1 µm",
        values.map((value) => um(value)),
      );
      return [decision, after];
    };
    expect(stage(0.7)).toEqual(["accepted", 1]);
    expect(stage(0.701)).toEqual(["measure more", 1]);
    expect(stage(0.9, 1, 0.9)).toEqual(["accepted", 3]);
    expect(stage(0.9, 1.1, 0.9)).toEqual(["measure more", 3]);
    expect(stage(0.9, 1.1, 0.9, 0.9, 0.9, 0.9)).toEqual(["accepted", 6]);
    expect(stage(0.9, 1.1, 0.9, 1.1, 0.9, 0.9)).toEqual(["measure more", 6]);
    expect(stage(0.9, 1.1, 0.9, 1.1, 0.9, 0.9, 0.9, 0.9, 0.9, 0.9, 0.9, 0.9)).toEqual(["accepted", 12]);
    expect(stage(0.9, 1.1, 1.1, 1.1)).toEqual(["rejected", 4]);
    expect(sixteenPercentStages("1 µm", ["0.5 µm"]).basis[0]?.mark).toBe("memory");
    expect(codeOf(() => sixteenPercentStages("1 µm", []))).toBe("OPTION_INVALID");
  });
});

describe("Rz and triangles", () => {
  it("only beside first-choice values, in either unit", () => {
    expect(rzRange("63 µin").rz).toEqual(rzRange("1.6 µm").rz);
    for (const other of ["1 µm", "1.6002 µm", "N13", "100 µin"]) {
      expect(codeOf(() => rzRange(other))).toBe("FINISH_NOT_TABULATED");
    }
  });

  it("refuses notes that DIN 3141 did not have", () => {
    expect(codeOf(() => triangleRoughness({ triangles: 5, series: "R1" }))).toBe("OPTION_INVALID");
    expect(codeOf(() => triangleRoughness({ triangles: 2, series: "R5" as never }))).toBe("OPTION_INVALID");
    expect(codeOf(() => triangleRoughness({ triangles: 4, series: "R1" }))).toBe("FINISH_NOT_TABULATED");
  });
});

describe("fatigue factors", () => {
  const strength = "700 MPa";

  it("never over 1, and named by set", () => {
    // ground steel below about 217 MPa gives more than 1
    expect(surfaceFactor({ finish: "ground", minimumUltimateStrength: "216 MPa" })).toMatchObject({
      factor: 1,
      capped: true,
    });
    expect(surfaceFactor({ finish: "ground", minimumUltimateStrength: "220 MPa" }).capped).toBe(false);
    const question = { finish: "as-forged", minimumUltimateStrength: strength } as const;
    expect(surfaceFactor(question).set).toBe("8th to 10th edition");
    const sets = (["8th to 10th edition", "11th edition", "9th edition, stochastic"] as const).map(
      (set) => surfaceFactor({ ...question, set }).factor,
    );
    // 272 * 700^-0.995, 54.9 * 700^-0.758, 271 * 700^-0.995
    expect(sets).toEqual([0.4015, 0.3828, 0.4]);
    expect(codes(surfaceFactor(question).cautions)).toEqual(["FATIGUE_ESTIMATE", "FATIGUE_MINIMUM_STRENGTH"]);
  });

  it("psi and ksi are the same strength", () => {
    const finish = "hot-rolled";
    const inKsi = surfaceFactor({ finish, minimumUltimateStrength: "100 ksi" });
    const inPsi = surfaceFactor({ finish, minimumUltimateStrength: "100000 psi" });
    expect([inPsi.factor, inPsi.aUnit]).toEqual([inKsi.factor, "ksi"]);
  });

  it("refuses", () => {
    const ask = (question: unknown) => () => surfaceFactor(question as never);
    expect(codeOf(ask({ finish: "painted", minimumUltimateStrength: strength }))).toBe("OPTION_INVALID");
    expect(codeOf(ask({ finish: "ground", minimumUltimateStrength: strength, set: "12th" }))).toBe("OPTION_INVALID");
    expect(codeOf(ask({ finish: "ground", minimumUltimateStrength: 700 }))).toBe("QUANTITY_INVALID");
    expect(codeOf(ask({ finish: "ground" }))).toBe("QUANTITY_INVALID");
    expect(codeOf(ask({ finish: "ground", minimumUltimateStrength: "700" }))).toBe("UNIT_MISSING");
    for (const bad of ["0 MPa", "-5 MPa", "4001 MPa", "90000 ksi"]) {
      expect(thrown(ask({ finish: "ground", minimumUltimateStrength: bad }))).toMatchObject({
        code: "OPTION_INVALID",
        path: ["minimumUltimateStrength"],
      });
    }
  });

  it("by the roughness: 1 up to Rz 1 µm, shear for steel only", () => {
    const steel = { material: "steel", minimumUltimateStrength: "1000 MPa" };
    expect(roughnessFactor({ ...steel, rz: "0.5 µm" })).toMatchObject({ factor: 1, capped: true });
    expect(roughnessFactor({ ...steel, rz: "1 µm" })).toMatchObject({ factor: 1, capped: true });
    const found = roughnessFactor({ ...steel, rz: "10 µm" });
    // 1 - 0.22 lg 10 lg 5 = 0.84623; shear 1 - 0.577 * 0.15377 and 0.575 * 0.84623 + 0.425
    expect(found.factor).toBe(0.8462);
    expect(found.shear).toEqual({ fkm: 0.9113, din743: 0.9116 });
    expect(found.basis.map((step) => step.mark)).toEqual(["one-source", "memory"]);
    const iron = roughnessFactor({ material: "grey cast iron", minimumUltimateStrength: "250 MPa", rz: "100 µm" });
    expect([iron.factor, iron.shear]).toEqual([0.9161, null]);
  });

  it("says where the strength is below what the constants are meant for, and stays at 1", () => {
    const weak = roughnessFactor({ material: "steel", minimumUltimateStrength: "150 MPa", rz: "50 µm" });
    expect([weak.factor, weak.capped]).toEqual([1, true]);
    expect(codes(weak.cautions)).toContain("FATIGUE_STRENGTH_BELOW_RANGE");
    const strong = roughnessFactor({ material: "steel", minimumUltimateStrength: "400 MPa", rz: "50 µm" });
    expect(codes(strong.cautions)).not.toContain("FATIGUE_STRENGTH_BELOW_RANGE");
  });

  it("refuses materials and heights that it does not know", () => {
    const ask = (question: unknown) => () => roughnessFactor(question as never);
    expect(codeOf(ask({ material: "cheese", minimumUltimateStrength: strength, rz: "10 µm" }))).toBe("OPTION_INVALID");
    expect(codeOf(ask({ material: "steel", minimumUltimateStrength: strength, rz: "0 µm" }))).toBe("ROUGHNESS_INVALID");
    expect(codeOf(ask({ material: "steel", minimumUltimateStrength: strength, rz: mm(2) }))).toBe("ROUGHNESS_INVALID");
    expect(codeOf(ask({ material: "steel", minimumUltimateStrength: strength }))).toBe("LENGTH_INVALID");
  });
});
