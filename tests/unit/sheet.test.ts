import { describe, expect, it } from "vitest";
import { asLimits, fitOf } from "limitsmith";
import { resolveSheet } from "limitsmith/sheet";
import type { ResolvedSheet, SheetRow } from "limitsmith/sheet";
import { thrown } from "../support/thrown.js";

const drawing = {
  drawing: "Hopper shaft (invented)",
  unit: "in",
  titleBlock: { decimals: { "2": "±.015", "3": "±.004" }, fractions: "±1/32", angles: "±1°" },
};

function sheetOf(features: readonly unknown[], more: object = {}): ResolvedSheet {
  return resolveSheet({ ...drawing, ...more, features });
}

function errorOf(row: SheetRow | undefined): string {
  return row === undefined || row.ok ? "none" : `${row.error.code} ${row.error.path.join(".")}`;
}

describe("resolveSheet", () => {
  it("one row a feature, in order, and counts that add up", () => {
    const sheet = sheetOf([
      { id: "1", name: "seat", callout: "⌀28 mm k6" },
      { id: "2", callout: "28 mm H7/k6" },
      { id: "3", callout: ".031 MAX" },
      { id: "4", callout: "30°" },
      { id: "5", callout: "(5.44)" },
      { id: "6", callout: "[3.125]" },
      { id: "7", callout: "nothing" },
      { id: "8", callout: "2.063" },
      { id: "9", callout: ".06 X 45°" },
    ]);
    expect(sheet.rows.map(({ id }) => id)).toEqual(["1", "2", "3", "4", "5", "6", "7", "8", "9"]);
    expect(sheet.counts).toEqual({
      features: 9,
      limits: 2,
      fitCallouts: 1,
      singleLimits: 1,
      angles: 1,
      chamfers: 1,
      keyseats: 0,
      withoutLimits: 2,
      failed: 1,
      fits: 0,
      fitsFailed: 0,
    });
    expect(sheet.rows[0]).toMatchObject({ index: 0, name: "seat", kind: "shaft", ok: true });
    expect(errorOf(sheet.rows[6])).toBe("CALLOUT_NOT_UNDERSTOOD features.6.callout");
  });

  it("one bad row does not stop the rest", () => {
    const good = { id: "G", callout: "2.063" };
    const sheet = sheetOf([
      null,
      "2.063",
      [],
      { callout: "2.063" },
      { id: "", callout: "2.063" },
      { id: "x".repeat(65), callout: "2.063" },
      { id: 7, callout: "2.063" },
      { id: "A" },
      { id: "B", callout: 2.063 },
      { id: "C", callout: "2.063", kind: "bore" },
      { id: "D", callout: "2.063", mate: 4 },
      good,
      { id: "G", callout: "2.063" },
    ]);
    expect(sheet.rows.map(errorOf)).toEqual([
      "FEATURE_INVALID features.0",
      "FEATURE_INVALID features.1",
      "FEATURE_INVALID features.2",
      "FEATURE_INVALID features.3.id",
      "FEATURE_INVALID features.4.id",
      "FEATURE_INVALID features.5.id",
      "FEATURE_INVALID features.6.id",
      "FEATURE_INVALID features.7.callout",
      "FEATURE_INVALID features.8.callout",
      "FEATURE_INVALID features.9.kind",
      "FEATURE_INVALID features.10.mate",
      "none",
      "FEATURE_ID_REPEATED features.12.id",
    ]);
    expect(sheet.counts.failed + sheet.counts.limits).toBe(13);
    const wrongKind = sheet.rows[9];
    expect(wrongKind?.ok === false && wrongKind.error).toMatchObject({
      value: "bore",
      message: "one of hole, shaft is needed here",
    });
  });

  it("reports unknown keys and reads on", () => {
    const sheet = sheetOf([{ id: "1", callout: "2.063", colour: "blue" }], {
      scale: "1:1",
      titleBlock: { ...drawing.titleBlock, weights: "kg" },
    });
    expect(sheet.unknownKeys).toEqual(
      expect.arrayContaining([["scale"], ["titleBlock", "weights"], ["features", 0, "colour"]]),
    );
    expect(sheet.unknownKeys).toHaveLength(3);
    expect(sheet.counts.failed).toBe(0);
  });

  it("a bad title block costs the rows that need it", () => {
    const sheet = sheetOf(
      [
        { id: "1", callout: "2.063" },
        { id: "2", callout: "⌀28 mm k6" },
      ],
      { titleBlock: { decimals: { three: "±.005" } } },
    );
    expect(sheet.problems.map(({ code, path }) => `${code} ${path.join(".")}`)).toEqual([
      "TITLE_BLOCK_INVALID titleBlock.decimals.three",
    ]);
    expect(sheet.rows.map(errorOf)).toEqual(["TITLE_BLOCK_INVALID titleBlock.decimals.three", "none"]);
  });

  it("without a title block bare sizes are refused", () => {
    const sheet = resolveSheet({ drawing: "d", unit: "mm", features: [{ id: "1", callout: "12" }] });
    expect(sheet.rows.map(errorOf)).toEqual(["TITLE_BLOCK_MISSING features.0.callout"]);
    expect(sheet.problems).toEqual([]);
  });

  it("the title block by standard, and lines of its own before it", () => {
    const sheet = resolveSheet({
      drawing: "d",
      unit: "mm",
      titleBlock: { general: "ISO 2768-mK", decimals: { "2": "±0.05" } },
      features: [
        { id: "1", callout: "28" },
        { id: "2", callout: "28.00" },
        { id: "3", callout: "M8" },
        { id: "4", callout: "(28)" },
      ],
    });
    const limits = sheet.rows.map((row) =>
      row.ok && row.resolved.outcome === "limits" ? row.resolved.limits.max.toString() : "-",
    );
    // ISO 2768-1:1989, Table 1, class m, over 6 to 30 mm: ±0.2
    expect(limits).toEqual(["28.2 mm", "28.05 mm", "-", "-"]);
    expect(sheet.counts).toMatchObject({ limits: 2, withoutLimits: 2, failed: 0 });
    expect(
      errorOf(sheetOf([{ id: "1", callout: "2.063" }], { titleBlock: { general: "ISO 2768-x" } }).rows[0]),
    ).toMatch(/^GENERAL_TOLERANCE_UNKNOWN titleBlock/);
  });

  it("decimal comma", () => {
    const sheet = resolveSheet({
      drawing: "d",
      unit: "mm",
      decimalMark: ",",
      titleBlock: { decimals: { "1": "±0,2" } },
      features: [{ id: "1", callout: "12,5" }],
    });
    const [row] = sheet.rows;
    expect(row?.ok === true && row.resolved.outcome === "limits" && row.resolved.limits.max.toString()).toBe("12.7 mm");
  });

  it.each<[unknown, (string | number)[]]>([
    [null, []],
    ["{}", []],
    [[], []],
    [{ ...drawing, unit: "cm", features: [] }, ["unit"]],
    [{ ...drawing, unit: undefined, features: [] }, ["unit"]],
    [{ ...drawing, drawing: "", features: [] }, ["drawing"]],
    [{ ...drawing, features: {} }, ["features"]],
    [drawing, ["features"]],
    [{ ...drawing, titleBlock: "none", features: [] }, ["titleBlock"]],
    [{ ...drawing, features: [], note: () => 1 }, ["note"]],
    [{ ...drawing, features: [{ id: NaN }] }, ["features", 0, "id"]],
  ])("refuses what is no drawing: %j", (json, path) => {
    const error = thrown(() => resolveSheet(json));
    expect(error.code).toBe("SHEET_INVALID");
    expect(error.path).toEqual(path);
  });

  it("refuses a ring and a bottomless pit", () => {
    const ring: Record<string, unknown> = { ...drawing, features: [] };
    ring["note"] = ring;
    expect(thrown(() => resolveSheet(ring)).code).toBe("SHEET_INVALID");
  });

  it("a thousand rows", () => {
    const features = Array.from({ length: 1000 }, (_, index) => ({
      id: `f${index}`,
      callout: index % 10 === 0 ? "?" : "2.063",
    }));
    expect(sheetOf(features).counts).toMatchObject({ features: 1000, limits: 900, failed: 100 });
  });
});

describe("mates", () => {
  const bore = { id: "B", callout: "⌀28 mm H7" };
  const seat = { id: "S", callout: "⌀28 mm k6" };

  it.each([
    ["named at the shaft", [{ ...seat, mate: "B" }, bore]],
    ["named at the hole", [seat, { ...bore, mate: "S" }]],
    [
      "named at both",
      [
        { ...seat, mate: "B" },
        { ...bore, mate: "S" },
      ],
    ],
  ])("one fit a pair: %s", (_, features) => {
    const { fits, counts } = sheetOf(features);
    // ISO 286-2:2010, 28 H7 +21/0, k6 +15/+2
    expect(fits).toMatchObject([
      { ok: true, hole: "B", shaft: "S", fit: { kind: "transition", designation: "H7/k6" } },
    ]);
    const [one] = fits;
    expect(one?.ok === true && [one.fit.maxClearance.toString(), one.fit.minClearance.toString()]).toEqual([
      "19 µm",
      "-15 µm",
    ]);
    expect(counts).toMatchObject({ fits: 1, fitsFailed: 0 });
  });

  it("a fit class that both callouts name is the fit, with all that it says", () => {
    const sheet = sheetOf([
      { id: "S", callout: "⌀1.6875 LN3", kind: "shaft", mate: "B" },
      { id: "B", callout: "⌀1.6875 LN3", kind: "hole" },
    ]);
    expect(sheet.fits).toMatchObject([{ ok: true, fit: { designation: "LN3", kind: "interference" } }]);
  });

  it("limit dimensions have no nominal to differ", () => {
    const features = [
      { id: "S", callout: "1.6272/1.6266", kind: "shaft", mate: "B" },
      { id: "B", callout: "1.625 +.001/0", kind: "hole" },
    ];
    expect(sheetOf(features).fits).toMatchObject([{ ok: true, fit: { kind: "interference" } }]);
  });

  it.each<[string, unknown[], string]>([
    ["no such feature", [{ ...seat, mate: "X" }], "MATE_UNKNOWN"],
    ["itself", [{ ...seat, mate: "S" }], "MATE_UNKNOWN"],
    [
      "two shafts",
      [
        { ...seat, mate: "T" },
        { id: "T", callout: "⌀28 mm h6" },
      ],
      "MATE_KIND_INVALID",
    ],
    [
      "kind not said",
      [
        { id: "S", callout: "2.063", mate: "T" },
        { id: "T", callout: "2.063", kind: "hole" },
      ],
      "MATE_KIND_INVALID",
    ],
    [
      "one failed",
      [
        { ...seat, mate: "T" },
        { id: "T", callout: "⌀28 mm t99" },
      ],
      "MATE_UNRESOLVED",
    ],
    [
      "one is a reference",
      [
        { ...seat, mate: "T" },
        { id: "T", callout: "(1.1)", kind: "hole" },
      ],
      "MATE_UNRESOLVED",
    ],
    [
      "other nominal",
      [
        { ...seat, mate: "T" },
        { id: "T", callout: "⌀30 mm H7" },
      ],
      "NOMINALS_DIFFER",
    ],
  ])("%s", (_, features, code) => {
    const { fits, counts } = sheetOf(features);
    expect(fits).toMatchObject([{ ok: false, error: { code } }]);
    expect(counts).toMatchObject({ fits: 0, fitsFailed: 1 });
  });

  it("a second feature of the same id does not take the first one's place", () => {
    const { fits } = sheetOf([{ ...seat, mate: "B" }, bore, { id: "B", callout: "⌀30 mm H7" }]);
    expect(fits).toMatchObject([{ ok: true }]);
  });
});

describe("the result as data", () => {
  const sheet = sheetOf([
    { id: "S", callout: "⌀28 mm k6", mate: "B" },
    { id: "B", callout: "⌀28 mm H7" },
    { id: "X", callout: "?" },
  ]);

  it("is frozen all through", () => {
    const open: string[] = [];
    const look = (value: unknown, path: string): void => {
      if (typeof value !== "object" || value === null) return;
      if (!Object.isFrozen(value)) open.push(path);
      for (const [key, item] of Object.entries(value)) look(item, `${path}.${key}`);
    };
    look(sheet, "sheet");
    expect(open).toEqual([]);
  });

  it("survives JSON and structuredClone, and its limits are taken back", () => {
    const sent = JSON.parse(JSON.stringify(sheet)) as ResolvedSheet;
    const cloned = structuredClone(sheet);
    for (const one of [sent, cloned]) {
      const [seatRow, boreRow] = one.rows;
      if (seatRow?.ok !== true || boreRow?.ok !== true) throw new Error("both resolve");
      if (seatRow.resolved.outcome !== "limits" || boreRow.resolved.outcome !== "limits")
        throw new Error("both have limits");
      expect(asLimits(seatRow.resolved.limits).max.toString()).toBe("28.015 mm");
      expect(fitOf(boreRow.resolved.limits, seatRow.resolved.limits).kind).toBe("transition");
    }
    expect(JSON.stringify(resolveSheet({ ...drawing, features: [{ id: "S", callout: "⌀28 mm k6" }] }))).not.toContain(
      "NaN",
    );
  });
});

describe("keyseats", () => {
  // ANSI/ASME B17.1-1967: 1 1/8 in shaft, 1/4 in square key: S .986 (+.000/-.015), T 1.241 (+.010/-.000);
  // Class 2 width 1/4: +.002/-.000 in both members
  const shaft = { id: "S", callout: "1.125 LC2", kind: "shaft" };
  const bore = { id: "B", callout: "1.125 LC2", kind: "hole" };
  const seat = (more: object): object => ({ standard: "B17.1", on: "S", class: 2, ...more });

  function limitsText(row: SheetRow | undefined): string[] {
    if (row?.ok !== true || row.resolved.outcome !== "keyseat") return [errorOf(row)];
    return row.resolved.seat.rows.map(
      ({ symbol, limits }) => `${symbol} ${limits?.max.toString() ?? "-"} ${limits?.min.toString() ?? "-"}`,
    );
  }

  it("S and width in the shaft, T and width in the hub, wherever they stand", () => {
    const sheet = sheetOf([{ id: "K1", keyseat: seat({}) }, shaft, bore, { id: "K2", keyseat: seat({ on: "B" }) }]);
    expect(limitsText(sheet.rows[0])).toEqual(["S 0.986 in 0.971 in", "W 0.252 in 0.25 in"]);
    expect(limitsText(sheet.rows[3])).toEqual(["T 1.251 in 1.241 in", "W 0.252 in 0.25 in"]);
    expect(sheet.counts).toMatchObject({ features: 4, limits: 2, keyseats: 2, failed: 0 });
    expect(sheet.findings).toEqual([]);
  });

  it("metric keyways by their own standard", () => {
    const sheet = sheetOf([
      { id: "S", callout: "⌀27 mm h6" },
      { id: "K", keyseat: { standard: "ISO/R 773", on: "S", fit: "normal" } },
    ]);
    // ISO/R 773: over 22 to 30: 8 x 7, t1 4 +0.2/0; N9 of 8: 0/-36
    expect(limitsText(sheet.rows[1])).toEqual(["d - t1 23 mm 22.8 mm", "b 8 mm 7.964 mm"]);
  });

  it("printed limits that are not the standard's are a finding with both values", () => {
    const printed = { control: ".986/.976", width: ".252/.250" };
    const sheet = sheetOf([shaft, { id: "K", keyseat: seat({ printed }) }]);
    expect(sheet.findings).toMatchObject([
      {
        code: "KEYSEAT_NOT_STANDARD",
        severity: "error",
        features: ["K", "S"],
        found: "0.986 in / 0.976 in",
        expected: "0.986 in / 0.971 in",
      },
    ]);
    expect(sheetOf([shaft, { id: "K", keyseat: seat({ printed: { control: ".986/.971" } }) }]).findings).toEqual([]);
  });

  it.each<[string, object, string]>([
    ["on nothing", seat({ on: "X" }), "KEYSEAT_ON_UNKNOWN features.1.keyseat.on"],
    ["on itself", seat({ on: "K" }), "KEYSEAT_ON_UNKNOWN features.1.keyseat.on"],
    ["a class that is none", seat({ class: 7 }), "OPTION_INVALID features.1.keyseat.class"],
    ["no standard known", seat({ standard: "B99" }), "OPTION_INVALID features.1.keyseat.standard"],
    [
      "printed nonsense",
      seat({ printed: { width: "wide" } }),
      "CALLOUT_NOT_UNDERSTOOD features.1.keyseat.printed.width",
    ],
    [
      "printed without limits",
      seat({ printed: { width: "(.25)" } }),
      "CALLOUT_NOT_UNDERSTOOD features.1.keyseat.printed.width",
    ],
  ])("%s costs this row only", (_, keyseat, error) => {
    const sheet = sheetOf([shaft, { id: "K", keyseat }]);
    expect(errorOf(sheet.rows[1])).toBe(error);
    expect(sheet.counts).toMatchObject({ limits: 1, failed: 1 });
  });

  it("the member must be known", () => {
    const plain = { id: "S", callout: "1.125 +.000/-.001" };
    expect(errorOf(sheetOf([plain, { id: "K", keyseat: seat({}) }]).rows[1])).toBe(
      "KEYSEAT_ON_UNKNOWN features.1.keyseat.member",
    );
    expect(limitsText(sheetOf([plain, { id: "K", keyseat: seat({ member: "hub" }) }]).rows[1])[0]).toBe(
      "T 1.251 in 1.241 in",
    );
  });
});

describe("finish and process", () => {
  const seat = { id: "S", callout: "⌀28 mm k6" };
  const codes = (sheet: ResolvedSheet): string[] => sheet.findings.map(({ code }) => code);
  const withFinish = (feature: object, finish?: string): ResolvedSheet =>
    sheetOf([{ ...seat, ...feature }], finish === undefined ? {} : { titleBlock: { ...drawing.titleBlock, finish } });

  it("of the feature, or all over except as noted", () => {
    const rows = sheetOf(
      [
        { ...seat, finish: "Ra 16" },
        { id: "T", callout: "2.063" },
        { id: "R", callout: "(2.1)" },
      ],
      {
        titleBlock: { ...drawing.titleBlock, finish: "Ra 125" },
      },
    ).rows;
    const text = rows.map((row) =>
      row.ok ? `${row.surface?.finish?.value.toString() ?? "-"} ${row.surface?.from ?? "-"}` : "",
    );
    expect(text).toEqual(["16 µin feature", "125 µin title block", "- -"]);
  });

  it("a bare number is in µin on an inch drawing, in µm on a metric one", () => {
    const metric = resolveSheet({
      drawing: "d",
      unit: "mm",
      features: [{ ...seat, finish: "Ra 0,8" }],
      decimalMark: ",",
    });
    const [row] = metric.rows;
    expect(row?.ok === true && row.surface?.finish?.value.toString()).toBe("0.8 µm");
  });

  it("clean where finish, tolerance, process and function agree", () => {
    const ground = { finish: "Ra 32", process: "grinding", function: "bearing seat" };
    expect(codes(withFinish(ground))).toEqual([]);
    expect(codes(withFinish({}, "Ra 32"))).toEqual([]);
    expect(codes(withFinish({ process: "grinding" }))).toEqual([]);
  });

  it("finish too coarse for the tolerance, for the function; process that does not reach", () => {
    // k6 on 28 is 13 µm wide; Ra 125 µin is 3.2 µm
    expect(codes(withFinish({}, "Ra 125"))).toEqual(["FINISH_TOO_COARSE_FOR_TOLERANCE"]);
    expect(codes(withFinish({ finish: "Ra 125", function: "bearing seat" }))).toContain(
      "FINISH_TOO_COARSE_FOR_FUNCTION",
    );
    expect(codes(withFinish({ finish: "Ra 16", process: "drilling" }))).toEqual(
      expect.arrayContaining(["PROCESS_DOES_NOT_REACH_FINISH", "PROCESS_DOES_NOT_REACH_GRADE"]),
    );
    expect(codes(withFinish({ process: "drilling" }))).toEqual(["PROCESS_DOES_NOT_REACH_GRADE"]);
    const [finding] = withFinish({}, "Ra 125").findings;
    expect(finding).toMatchObject({ severity: "warning", features: ["S"] });
    expect(finding?.settle).not.toBe("");
  });

  it("a process goes by any of its trade names", () => {
    const sheet = withFinish({ finish: "Ra 63", process: "EDM" });
    expect(sheet.problems).toEqual([]);
    const [row] = sheet.rows;
    expect(row?.ok === true && row.surface?.process).toBe("electro-discharge machining");
  });

  it("what cannot be read is a problem with its path, and costs no limits", () => {
    const sheet = withFinish({ finish: "shiny", process: "whittling", function: "ornament" }, "Ra");
    expect(sheet.problems.map(({ code, path }) => `${code} ${path.join(".")}`)).toEqual([
      expect.stringMatching(/ titleBlock\.finish$/),
      expect.stringMatching(/ features\.0\.finish$/),
      "PROCESS_UNKNOWN features.0.process",
      "FINISH_FUNCTION_UNKNOWN features.0.function",
    ]);
    expect(sheet.counts).toMatchObject({ limits: 1, failed: 0 });
  });
});

describe("readings", () => {
  // ISO 286-2:2010, 17 h6: 0/-11 µm
  const measured = (reading: string, inspection?: object): ResolvedSheet =>
    resolveSheet({
      drawing: "d",
      unit: "mm",
      ...(inspection === undefined ? {} : { inspection }),
      features: [{ id: "A", callout: "⌀17 h6", measured: reading }],
    });
  const verdict = (sheet: ResolvedSheet): string | null => {
    const [row] = sheet.rows;
    return row?.ok === true ? (row.judgement?.verdict ?? null) : null;
  };

  it("are judged by the rule of the file, unrounded", () => {
    const simple = { rule: "simple acceptance" };
    expect(verdict(measured("16.989", simple))).toBe("pass");
    expect(verdict(measured("16.9889", simple))).toBe("fail");
    expect(verdict(measured("0.669 in", simple))).toBe("pass");
    const guarded = { rule: "ISO 14253-1:2013", uncertainty: "2 µm" };
    expect(["16.990", "16.995", "16.980"].map((one) => verdict(measured(one, guarded)))).toEqual([
      "not proven",
      "pass",
      "fail",
    ]);
  });

  it("what cannot be judged is a problem with its path, and costs no limits", () => {
    const cases: [ResolvedSheet, string][] = [
      [measured("16.99"), "READING_NOT_JUDGED"],
      [measured("about 17", { rule: "simple acceptance" }), "UNIT_UNKNOWN"],
      [measured("16.99", { rule: "ISO 14253-1:2013" }), "OPTION_INVALID"],
    ];
    for (const [sheet, code] of cases) {
      expect(sheet.problems.map((one) => [one.code, one.path.slice(0, 3)])).toEqual([
        [code, ["features", 0, "measured"]],
      ]);
      expect(sheet.counts).toMatchObject({ limits: 1, failed: 0 });
      expect(verdict(sheet)).toBeNull();
    }
  });
});

describe("what a callout says twice", () => {
  const findings = (callout: string, unit: "mm" | "in" = "mm"): string[] =>
    resolveSheet({
      drawing: "d",
      unit,
      titleBlock: { decimals: { "1": "±.5", "2": "±.5", "3": "±.005" } },
      features: [{ id: "A", callout }],
    }).findings.map(({ code, says, found, expected }) => [code, says, found, expected].join(" | "));

  it.each([
    // ISO 286-2:2010: 35 k6 is +18/+2, 28 H7 is +21/0
    "35 k6 (35.018/35.002)",
    "35 k6 (+0.018/+0.002)",
    "35 k6 (35.02/35.00)",
    "28.5 [1.122]",
    "28.50 [1.1220]",
    "35 k6 [1.3787/1.3780]",
    "35 k6 [1.3786/1.3781]",
    "35.018/35.002 [1.3786/1.3781]",
    "R0.5 MAX [.0196]",
    "25.4 [1.0000000]",
    "25.4 h6 (25.4000000/25.3870000)",
  ])("clean: %s", (callout) => {
    expect(findings(callout)).toEqual([]);
  });

  it("clean in inches too", () => {
    expect([".500 [12.7]", ".500 [12.70]", "1.838/1.862 [46.69/47.29]"].flatMap((one) => findings(one, "in"))).toEqual(
      [],
    );
  });

  it("printed limits of another class, with the class that they are of", () => {
    // 35 k5 is +13/+2
    expect(findings("35 k5 (35.018/35.002)")).toEqual([
      "PRINTED_LIMITS_NOT_OF_CLASS | the limits printed behind k5 are of k6 | 35.018 / 35.002 | 35.013 mm / 35.002 mm",
    ]);
    expect(findings("35 k6 (35.118/35.002)")[0]).toContain("of no ISO class");
  });

  it("a second unit that says something else", () => {
    expect(findings(".500 [25.4]", "in")).toEqual([
      "DUAL_DIMENSIONS_DISAGREE | the size in brackets is not the one before it in the other unit | 25.4 | 0.5 in",
    ]);
    expect(findings("35.018/35.002 [1.3790/1.3781]")[0]).toMatch(/^DUAL_DIMENSIONS_DISAGREE /);
    expect(findings("28.5 [1 1/8]")[0]).toMatch(/^DUAL_DIMENSIONS_DISAGREE /);
  });
});

describe("defaults that hang on more than the text", () => {
  const rows = (titleBlock: object, features: readonly object[]): string[] =>
    resolveSheet({
      drawing: "d",
      unit: "mm",
      titleBlock,
      features: features.map((feature, index) => ({ id: `${index}`, ...feature })),
    }).rows.map((row) => {
      if (!row.ok) return errorOf(row);
      if (row.resolved.outcome === "limits") return row.resolved.limits.tolerance.toString();
      if (row.resolved.outcome !== "chamfer") return row.resolved.outcome;
      return `${row.resolved.limits.tolerance.toString()}, ${row.resolved.angle.max.toString()}`;
    });

  it("radii, chamfers and angles by ISO 2768-1", () => {
    // class m: Table 1, over 6 to 30: ±0.2; Table 2, broken edges, over 0.5 to 3: ±0.2; Table 3, shorter leg up to 10:
    // ±1°, over 10 to 50: ±0°30'
    expect(
      rows({ general: "ISO 2768-m" }, [
        { callout: "28.5" },
        { callout: "R2", defaults: { feature: "external radius or chamfer" } },
        { callout: "R2", defaults: { feature: "internal radius" } },
        { callout: "R2" },
        { callout: "C1" },
        { callout: "1 X 45°", defaults: { shorterLeg: "20 mm" } },
        { callout: "1 X 30°" },
      ]),
    ).toEqual([
      "0.4 mm",
      "0.4 mm",
      "0.2 mm",
      "TITLE_BLOCK_OPTION_NEEDED features.3.callout",
      "0.4 mm, 46°",
      "0.4 mm, 45.5°",
      "TITLE_BLOCK_OPTION_NEEDED features.6.callout",
    ]);
  });

  it("lines for diameters and lengths, by the mark before the size", () => {
    const block = { diameters: { decimals: { any: "±0.07" } }, lengths: { decimals: { any: "±0.3" } } };
    expect(rows(block, [{ callout: "⌀28.5" }, { callout: "28.5" }, { callout: "28.5 DIA" }])).toEqual([
      "0.14 mm",
      "0.6 mm",
      "0.14 mm",
    ]);
  });

  it("castings, where the feature says so", () => {
    // ISO 8062-3:2007, DCTG 8, over 25 to 40: 1.3 in all
    const block = { general: "ISO 2768-m", castings: "DCTG 8" };
    expect(
      rows(block, [
        { callout: "28.5", defaults: { process: "cast" } },
        { callout: "28.5", defaults: { process: "machined" } },
      ]),
    ).toEqual(["1.3 mm", "0.4 mm"]);
  });
});
