import {
  asLimits,
  inch,
  lengthOfTicks,
  limits,
  limitsFromMaxMin,
  makeLimits,
  mm,
  oneSidedLimits,
  singleLimit,
  symmetricLimits,
  thou,
  um,
} from "limitsmith";
import type { BasisStep, Limits, LimitsLike } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

const SEAT = { nominal: mm(40), upper: um(25), lower: um(9) };

/** Every object inside a value is frozen. */
function expectDeepFrozen(value: unknown): void {
  if (typeof value !== "object" || value === null) return;
  expect(Object.isFrozen(value)).toBe(true);
  for (const inner of Object.values(value)) expectDeepFrozen(inner);
}

describe("limits", () => {
  it("has the sizes of ISO 286-1:2010, 3.2, each in the right unit", () => {
    const seat = limits(SEAT);
    expect(seat.max.toString()).toBe("40.025 mm");
    expect(seat.min.toString()).toBe("40.009 mm");
    expect(seat.tolerance.toString()).toBe("16 µm");
    expect(seat.mean.toString()).toBe("40.017 mm");
    expect(seat.upperDeviation.toString()).toBe("25 µm");
    expect(seat.lowerDeviation.toString()).toBe("9 µm");
    expect(seat.designation).toBeNull();
    expect(seat.basis).toEqual([
      { standard: "the caller", place: "as given", says: "nominal size and deviations", how: "caller" },
    ]);
    expectDeepFrozen(seat);
  });

  it("takes texts and bare data, in mixed units", () => {
    const seat = limits({ nominal: "1.375 in", upper: { ticks: 508_000, unit: "thou" }, lower: "0 mm" });
    expect(seat.max.toString()).toBe("1.377 in");
    expect(seat.min.toString()).toBe("1.375 in");
  });

  it("keeps the caller's basis and designation, as frozen copies", () => {
    const basis: BasisStep[] = [
      { standard: "works standard 12", place: "table 3", says: "m6", how: "tabulated", mark: "one-source" },
      { standard: "works standard 12", place: "note", says: "as is", how: "common practice" },
    ];
    const seat = limits({ ...SEAT, basis, designation: "m6" });
    basis.pop();
    expect(seat.designation).toBe("m6");
    expect(seat.basis).toEqual([
      { standard: "works standard 12", place: "table 3", says: "m6", how: "tabulated", mark: "one-source" },
      { standard: "works standard 12", place: "note", says: "as is", how: "common practice" },
    ]);
    expectDeepFrozen(seat);
  });

  it("refuses limits that stand upside down; equal limits are limits", () => {
    expect(codeOf(() => limits({ nominal: mm(40), upper: um(9), lower: um(25) }))).toBe("LIMITS_UPSIDE_DOWN");
    expect(codeOf(() => limits({ nominal: mm(40), upper: um(-1), lower: um(0) }))).toBe("LIMITS_UPSIDE_DOWN");
    expect(limits({ nominal: mm(40), upper: um(5), lower: um(5) }).tolerance.ticks).toBe(0);
  });

  it("sends a half tick of the mean to the even tick: ISO 80000-1:2009, B.3, rule A", () => {
    const mean = (nominal: number, upper: number, lower: number): number =>
      limits({
        nominal: lengthOfTicks(nominal, "mm"),
        upper: lengthOfTicks(upper, "mm"),
        lower: lengthOfTicks(lower, "mm"),
      }).mean.ticks;
    expect(mean(10, 1, 0)).toBe(10);
    expect(mean(11, 1, 0)).toBe(12);
    expect(mean(10, 3, 0)).toBe(12);
    expect(mean(10, 0, -1)).toBe(10);
    expect(mean(11, 0, -1)).toBe(10);
    expect(mean(-10, 1, 0)).toBe(-10);
    expect(mean(-11, 1, 0)).toBe(-10);
    expect(mean(0, 0, -1)).toBe(0);
    expect(Object.is(mean(0, 0, -1), -0)).toBe(false);
    expect(mean(10, 4, 0)).toBe(12);
  });

  it.each<[string, (string | number)[], unknown]>([
    ["LIMITS_INVALID", [], undefined],
    ["LIMITS_INVALID", [], null],
    ["LIMITS_INVALID", [], 40],
    ["LIMITS_INVALID", ["nominal"], {}],
    ["LIMITS_INVALID", ["upper"], { nominal: mm(40), lower: um(0) }],
    ["LIMITS_INVALID", ["lower"], { nominal: mm(40), upper: um(0) }],
    ["LENGTH_INVALID", ["nominal"], { ...SEAT, nominal: 40 }],
    ["LENGTH_INVALID", ["upper"], { ...SEAT, upper: 25 }],
    ["LENGTH_INVALID", ["lower"], { ...SEAT, lower: null }],
    ["UNIT_MISSING", ["nominal"], { ...SEAT, nominal: "40" }],
    ["UNIT_AMBIGUOUS", ["upper"], { ...SEAT, upper: "5 mil" }],
    ["LIMITS_INVALID", ["basis"], { ...SEAT, basis: "ISO 286-1" }],
    ["LIMITS_INVALID", ["basis"], { ...SEAT, basis: null }],
    ["LIMITS_INVALID", ["basis"], { ...SEAT, basis: { length: 1 } }],
    ["LIMITS_INVALID", ["basis", 0], { ...SEAT, basis: [null] }],
    ["LIMITS_INVALID", ["basis", 0], { ...SEAT, basis: ["ISO 286-1"] }],
    ["LIMITS_INVALID", ["basis", 0], { ...SEAT, basis: [{ standard: "x", place: "y", says: "z" }] }],
    ["LIMITS_INVALID", ["basis", 0], { ...SEAT, basis: [{ standard: 1, place: "y", says: "z", how: "caller" }] }],
    ["LIMITS_INVALID", ["basis", 0], { ...SEAT, basis: [{ standard: "x", place: "y", says: "z", how: "guessed" }] }],
    [
      "LIMITS_INVALID",
      ["basis", 1],
      {
        ...SEAT,
        basis: [
          { standard: "x", place: "y", says: "z", how: "caller" },
          { standard: "x", place: "y", says: "z", how: "caller", mark: "sure" },
        ],
      },
    ],
    [
      "LIMITS_INVALID",
      ["basis", 0],
      { ...SEAT, basis: Object.freeze([Object.freeze({ standard: "x", how: "guessed" })]) },
    ],
    ["LIMITS_INVALID", ["designation"], { ...SEAT, designation: 6 }],
  ])("refuses with %s at %j", (code, path, parts) => {
    const error = thrown(() => limits(parts as never));
    expect({ code: error.code, path: error.path }).toEqual({ code, path });
  });
});

describe("other ways to limits", () => {
  it("symmetricLimits", () => {
    const plate = symmetricLimits("2.188 in", thou(5), { designation: "title block" });
    expect([plate.max.toString(), plate.min.toString()]).toEqual(["2.193 in", "2.183 in"]);
    expect(plate.designation).toBe("title block");
    expect(symmetricLimits(mm(5), mm(0)).tolerance.ticks).toBe(0);
    expect(symmetricLimits(mm(5), mm(0)).lowerDeviation.ticks).toBe(0);
    expect(codeOf(() => symmetricLimits(mm(5), mm("-0.1")))).toBe("LIMITS_UPSIDE_DOWN");
    expect(thrown(() => symmetricLimits(mm(5), 0.1 as never)).path).toEqual(["deviation"]);
    expect(thrown(() => symmetricLimits(5 as never, mm(1))).path).toEqual(["nominal"]);
    expectDeepFrozen(plate);
  });

  it("oneSidedLimits", () => {
    const above = oneSidedLimits(mm(32), um(20));
    const below = oneSidedLimits(mm(32), um(-20));
    expect([above.max.toString(), above.min.toString()]).toEqual(["32.02 mm", "32 mm"]);
    expect([below.max.toString(), below.min.toString()]).toEqual(["32 mm", "31.98 mm"]);
    expect(oneSidedLimits(mm(32), um(0)).tolerance.ticks).toBe(0);
    expect(thrown(() => oneSidedLimits(mm(32), "20")).path).toEqual(["deviation"]);
    expectDeepFrozen(below);
  });

  it("limitsFromMaxMin", () => {
    const bore = limitsFromMaxMin({ max: ".7530 in", min: ".7500 in", nominal: inch(".75") });
    expect(bore.upperDeviation.toString()).toBe("0.003 in");
    expect(bore.lowerDeviation.ticks).toBe(0);
    const bare = limitsFromMaxMin({ max: mm("40.025"), min: mm("40.009") });
    expect(bare.nominal.toString()).toBe("40.025 mm");
    expect([bare.upperDeviation.toString(), bare.lowerDeviation.toString()]).toEqual(["0 mm", "-0.016 mm"]);
    expect(bare.basis[0]?.says).toContain("the maximum stands in for the nominal");
    // a metric nominal with inch limits: both systems, exactly
    const mixed = limitsFromMaxMin({ max: inch(".9848"), min: inch(".9843"), nominal: mm(25) });
    expect([mixed.max.toString(), mixed.min.toString()]).toEqual(["25.01392 mm", "25.00122 mm"]);
    expectDeepFrozen(mixed);
  });

  it.each<[string, (string | number)[], unknown]>([
    ["LIMITS_INVALID", [], undefined],
    ["LIMITS_INVALID", [], "40.025/40.009"],
    ["LIMITS_INVALID", ["max"], { min: mm(1) }],
    ["LIMITS_INVALID", ["min"], { max: mm(1) }],
    ["LENGTH_INVALID", ["max"], { max: 2, min: mm(1) }],
    ["LENGTH_INVALID", ["nominal"], { max: mm(2), min: mm(1), nominal: 1 }],
    ["LIMITS_UPSIDE_DOWN", [], { max: mm(1), min: mm(2) }],
  ])("limitsFromMaxMin refuses with %s at %j", (code, path, sizes) => {
    const error = thrown(() => limitsFromMaxMin(sizes as never));
    expect({ code: error.code, path: error.path }).toEqual({ code, path });
  });

  it("singleLimit", () => {
    const radius = singleLimit("max", ".015 in");
    expect(radius.kind).toBe("max");
    expect(radius.limit.toString()).toBe("0.015 in");
    expect(radius.basis[0]).toMatchObject({ how: "caller", says: "a single limit, max" });
    const basis = [{ standard: "works standard", place: "3", says: "R", how: "common practice" as const }];
    expect(singleLimit("min", mm(1), basis)).toMatchObject({ kind: "min", basis });
    expect(codeOf(() => singleLimit("least" as never, mm(1)))).toBe("LIMITS_INVALID");
    expect(thrown(() => singleLimit("max", 1 as never))).toMatchObject({ code: "LENGTH_INVALID", path: ["limit"] });
    expectDeepFrozen(radius);
  });

  it("makeLimits builds from lengths and refuses the same", () => {
    expect(makeLimits(mm(40), um(25), um(9), [], "m6").min.toString()).toBe("40.009 mm");
    expect(codeOf(() => makeLimits(mm(40), um(9), um(25), [], null))).toBe("LIMITS_UPSIDE_DOWN");
    const most = lengthOfTicks(Number.MAX_SAFE_INTEGER, "mm");
    expect(codeOf(() => makeLimits(most, um(1), um(0), [], null))).toBe("LENGTH_OUT_OF_RANGE");
  });
});

describe("asLimits", () => {
  const seat = limits({ ...SEAT, designation: "m6" });

  it("takes what JSON, structuredClone and a spread give back", () => {
    for (const way of [seat, structuredClone(seat), JSON.parse(JSON.stringify(seat)) as LimitsLike, { ...seat }]) {
      const taken: Limits = asLimits(way);
      expect(taken).toEqual(seat);
      expectDeepFrozen(taken);
    }
  });

  it("needs the nominal and its deviations only", () => {
    expect(asLimits({ nominal: "40 mm", upperDeviation: "25 µm", lowerDeviation: "9 µm" }).max.toString()).toBe(
      "40.025 mm",
    );
  });

  it.each(["max", "min", "tolerance", "mean"] as const)("refuses a %s that contradicts", (name) => {
    const error = thrown(() => asLimits({ ...seat, [name]: mm("40.001") }));
    expect(error).toMatchObject({ code: "LIMITS_CONTRADICT", path: [name], value: "40.001 mm" });
    expect(error.allowed).toBe(seat[name].toString());
    expect(asLimits({ ...seat, [name]: lengthOfTicks(seat[name].ticks, "in") })).toEqual(seat);
  });

  it.each<[string, (string | number)[], unknown]>([
    ["LIMITS_INVALID", ["rows", 2], undefined],
    ["LIMITS_INVALID", ["rows", 2], null],
    ["LIMITS_INVALID", ["rows", 2], "40 m6"],
    ["LIMITS_INVALID", ["rows", 2], {}],
    ["LIMITS_INVALID", ["rows", 2], { nominal: mm(1), upperDeviation: mm(0) }],
    ["LIMITS_INVALID", ["rows", 2], Object.create(seat)],
    ["LENGTH_INVALID", ["rows", 2, "nominal"], { ...seat, nominal: 40 }],
    ["LENGTH_INVALID", ["rows", 2, "upperDeviation"], { ...seat, upperDeviation: 25 }],
    ["UNIT_MISSING", ["rows", 2, "lowerDeviation"], { ...seat, lowerDeviation: "9" }],
    ["LENGTH_INVALID", ["rows", 2, "max"], { ...seat, max: 40.025 }],
    ["LIMITS_CONTRADICT", ["rows", 2, "min"], { ...seat, min: "40 mm" }],
    ["LIMITS_UPSIDE_DOWN", ["rows", 2], { nominal: mm(1), upperDeviation: mm(0), lowerDeviation: mm(1) }],
    ["LIMITS_INVALID", ["rows", 2, "basis"], { ...seat, basis: "as given" }],
    ["LIMITS_INVALID", ["rows", 2, "basis", 0], { ...seat, basis: [{}] }],
    ["LIMITS_INVALID", ["rows", 2, "designation"], { ...seat, designation: {} }],
  ])("refuses with %s at %j", (code, path, value) => {
    const error = thrown(() => asLimits(value as never, ["rows", 2]));
    expect({ code: error.code, path: error.path }).toEqual({ code, path });
  });
});
