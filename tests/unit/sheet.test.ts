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
    ]);
    expect(sheet.rows.map(({ id }) => id)).toEqual(["1", "2", "3", "4", "5", "6", "7", "8"]);
    expect(sheet.counts).toEqual({
      features: 8,
      limits: 2,
      fitCallouts: 1,
      singleLimits: 1,
      angles: 1,
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
    expect(wrongKind?.ok === false && wrongKind.error).toMatchObject({ value: "bore", message: "one of hole, shaft is needed here" });
  });

  it("reports unknown keys and reads on", () => {
    const sheet = sheetOf([{ id: "1", callout: "2.063", colour: "blue" }], {
      scale: "1:1",
      titleBlock: { ...drawing.titleBlock, weights: "kg" },
    });
    expect(sheet.unknownKeys).toEqual(expect.arrayContaining([["scale"], ["titleBlock", "weights"], ["features", 0, "colour"]]));
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
    const features = Array.from({ length: 1000 }, (_, index) => ({ id: `f${index}`, callout: index % 10 === 0 ? "?" : "2.063" }));
    expect(sheetOf(features).counts).toMatchObject({ features: 1000, limits: 900, failed: 100 });
  });
});

describe("mates", () => {
  const bore = { id: "B", callout: "⌀28 mm H7" };
  const seat = { id: "S", callout: "⌀28 mm k6" };

  it.each([
    ["named at the shaft", [{ ...seat, mate: "B" }, bore]],
    ["named at the hole", [seat, { ...bore, mate: "S" }]],
    ["named at both", [{ ...seat, mate: "B" }, { ...bore, mate: "S" }]],
  ])("one fit a pair: %s", (_, features) => {
    const { fits, counts } = sheetOf(features);
    // ISO 286-2:2010, 28 H7 +21/0, k6 +15/+2
    expect(fits).toMatchObject([{ ok: true, hole: "B", shaft: "S", fit: { kind: "transition", designation: "H7/k6" } }]);
    const [one] = fits;
    expect(one?.ok === true && [one.fit.maxClearance.toString(), one.fit.minClearance.toString()]).toEqual(["19 µm", "-15 µm"]);
    expect(counts).toMatchObject({ fits: 1, fitsFailed: 0 });
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
    ["two shafts", [{ ...seat, mate: "T" }, { id: "T", callout: "⌀28 mm h6" }], "MATE_KIND_INVALID"],
    ["kind not said", [{ id: "S", callout: "2.063", mate: "T" }, { id: "T", callout: "2.063", kind: "hole" }], "MATE_KIND_INVALID"],
    ["one failed", [{ ...seat, mate: "T" }, { id: "T", callout: "⌀28 mm t99" }], "MATE_UNRESOLVED"],
    ["one is a reference", [{ ...seat, mate: "T" }, { id: "T", callout: "(1.1)", kind: "hole" }], "MATE_UNRESOLVED"],
    ["other nominal", [{ ...seat, mate: "T" }, { id: "T", callout: "⌀30 mm H7" }], "NOMINALS_DIFFER"],
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
      if (seatRow.resolved.outcome !== "limits" || boreRow.resolved.outcome !== "limits") throw new Error("both have limits");
      expect(asLimits(seatRow.resolved.limits).max.toString()).toBe("28.015 mm");
      expect(fitOf(boreRow.resolved.limits, seatRow.resolved.limits).kind).toBe("transition");
    }
    expect(JSON.stringify(resolveSheet({ ...drawing, features: [{ id: "S", callout: "⌀28 mm k6" }] }))).not.toContain("NaN");
  });
});
