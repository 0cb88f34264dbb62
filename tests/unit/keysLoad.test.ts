import { keyLoad, keywayStrengthFactor, torque, torqueFromPower } from "limitsmith";
import type { KeyLoadParts } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

// 10 x 8 on 36 mm with 90 N·m: F = 2 × 90 000 / 36 = 5000 N
const JOINT = {
  torque: "90 N·m",
  shaftDiameter: "36 mm",
  key: { width: "10 mm", height: "8 mm" },
  length: "50 mm",
  ends: "square",
  pressure: "half height",
} as const satisfies KeyLoadParts;

/** The joint with one part missing. */
function without(name: keyof typeof JOINT): KeyLoadParts {
  const parts: Partial<Record<keyof typeof JOINT, unknown>> = { ...JOINT };
  Reflect.deleteProperty(parts, name);
  return parts as KeyLoadParts;
}

describe("keyLoad: the formulas by name", () => {
  it("force, shear and pressure on half the height", () => {
    const load = keyLoad(JOINT);
    expect(load.force?.toString()).toBe("5000 N");
    // 5000 / (10 × 50) and 5000 / (4 × 50)
    expect([load.shearStress?.toString(), load.pressure?.toString()]).toEqual(["10 MPa", "25 MPa"]);
    expect([load.bearingHeight.toString(), load.bearingLength?.toString()]).toEqual(["4 mm", "50 mm"]);
    expect([load.pressureForm, load.countsAs]).toEqual(["half height", 1]);
    expect([load.allowedShear, load.allowedPressure, load.shaftStrengthFactor]).toEqual([null, null, null]);
    expect(load.neededLength).toEqual({ shear: null, bearing: null, governing: null });
    expect(load.capacity).toEqual({ shear: null, bearing: null, governing: null });
  });

  it("the forms differ: with h - t1 the pressure of 10 x 8 is a third more than on half the height", () => {
    const half = keyLoad(JOINT).pressure?.value ?? NaN;
    const left = keyLoad({ ...JOINT, pressure: "h - t1", shaftDepth: "5 mm" });
    expect(left.bearingHeight.toString()).toBe("3 mm");
    expect((left.pressure?.value ?? NaN) / half).toBeCloseTo(4 / 3, 11);
    const part = keyLoad({ ...JOINT, pressure: "0.45 h" });
    expect(part.bearingHeight.toString()).toBe("3.6 mm");
    expect((part.pressure?.value ?? NaN) / half).toBeCloseTo(4 / 3.6, 11);
    const least = keyLoad({ ...JOINT, pressure: "t1 or t2", shaftDepth: "5 mm", hubDepth: "3.3 mm" });
    expect(least.bearingHeight.toString()).toBe("3.3 mm");
    const other = keyLoad({ ...JOINT, pressure: "t1 or t2", shaftDepth: "3 mm", hubDepth: "3.3 mm" });
    expect(other.bearingHeight.toString()).toBe("3 mm");
    for (const load of [left, part, least]) expect(load.basis.some(({ says }) => says.startsWith("p = "))).toBe(true);
    expect(new Set([left, part, least].map(({ basis }) => basis[1]?.standard)).size).toBe(3);
  });

  it("round ends do not bear", () => {
    const round = keyLoad({ ...JOINT, ends: "round" });
    const one = keyLoad({ ...JOINT, ends: "one round" });
    expect([round.bearingLength?.toString(), one.bearingLength?.toString()]).toEqual(["40 mm", "45 mm"]);
    expect([round.shearStress?.toString(), one.pressure?.value.toFixed(6)]).toEqual(["12.5 MPa", "27.777778"]);
  });

  it("two keys count as 1.5 by a rule that is asked for", () => {
    const two = keyLoad({ ...JOINT, keys: 2, severalKeys: "two count as 1.5" });
    expect(two.countsAs).toBe(1.5);
    expect(two.pressure?.value).toBeCloseTo(25 / 1.5, 9);
    expect(two.shearStress?.value).toBeCloseTo(10 / 1.5, 9);
    expect(codeOf(() => keyLoad({ ...JOINT, keys: 2 }))).toBe("OPTION_INVALID");
    expect(codeOf(() => keyLoad({ ...JOINT, keys: 3 as never }))).toBe("OPTION_INVALID");
  });

  it("needed length and capacity by the caller's allowables, the ends added", () => {
    const allowables = { shear: "20 MPa", bearing: "40 MPa" };
    const load = keyLoad({ ...JOINT, ends: "round", allowables });
    // 5000 / (20 × 10) and 5000 / (40 × 4), with 10 mm of ends
    expect(load.neededLength.shear?.toString()).toBe("35 mm");
    expect(load.neededLength.bearing?.toString()).toBe("41.25 mm");
    expect(load.neededLength.governing?.toString()).toBe("41.25 mm");
    // 20 × 10 × 40 × 36 / 2 and 40 × 4 × 40 × 36 / 2
    expect(load.capacity.shear?.toString()).toBe("144 N·m");
    expect(load.capacity.bearing?.toString()).toBe("115.2 N·m");
    expect(load.capacity.governing?.toString()).toBe("115.2 N·m");
    const safe = keyLoad({ ...JOINT, ends: "round", allowables, safetyFactor: 2 });
    expect([safe.allowedShear?.toString(), safe.allowedPressure?.toString()]).toEqual(["10 MPa", "20 MPa"]);
    expect(safe.capacity.governing?.toString()).toBe("57.6 N·m");
    // capacity needs no torque, length no length
    const noTorque = without("torque");
    const carried = keyLoad({ ...noTorque, allowables: { shear: "20 MPa" } });
    expect([carried.force, carried.shearStress, carried.neededLength.shear]).toEqual([null, null, null]);
    expect(carried.capacity.governing?.toString()).toBe("180 N·m");
    const noLength = without("length");
    expect(keyLoad({ ...noLength, allowables }).neededLength.governing?.toString()).toBe("31.25 mm");
    expect(keyLoad({ ...noLength, allowables }).capacity.governing).toBeNull();
  });

  it("bearing allowables for each part: the weakest counts, whatever its unit", () => {
    const bearing = { key: "12 ksi", shaft: "90 MPa", hub: "80 MPa" } as const;
    expect(keyLoad({ ...JOINT, allowables: { bearing } }).allowedPressure?.toString()).toBe("80 MPa");
    const inches = { ...bearing, key: { value: 11, unit: "ksi" } } as const;
    expect(keyLoad({ ...JOINT, allowables: { bearing: inches } }).allowedPressure?.toString()).toBe("11 ksi");
    const one = { value: 70, unit: "MPa" } as const;
    expect(keyLoad({ ...JOINT, allowables: { bearing: one } }).allowedPressure?.toString()).toBe("70 MPa");
  });

  it("yield strengths with a named rule for shear and a safety factor", () => {
    const yieldOf = { key: "300 MPa", shaft: "400 MPa", hub: "240 MPa" };
    const half = keyLoad({ ...JOINT, materials: { yield: yieldOf, shearRule: "0.5" }, safetyFactor: 3 });
    expect([half.allowedShear?.toString(), half.allowedPressure?.toString()]).toEqual(["50 MPa", "80 MPa"]);
    const energy = keyLoad({ ...JOINT, materials: { yield: yieldOf, shearRule: "0.577" }, safetyFactor: 3 });
    expect(energy.allowedShear?.toString()).toBe("57.7 MPa");
    expect(energy.basis.some(({ says }) => says.includes("0.577"))).toBe(true);
  });

  it("inch torque gives lbf, psi and inches; a metric shaft in it is the same shaft", () => {
    const load = keyLoad({
      torque: "100 lbf·ft",
      shaftDiameter: "25.4 mm",
      key: { width: "1/4 in", height: "1/4 in" },
      length: "2 in",
      ends: "square",
      pressure: "half height",
      allowables: { shear: "9600 psi", bearing: "9600 psi" },
    });
    // 2 × 1200 / 1 = 2400; 2400 / (0.25 × 2); 2400 / (0.125 × 2)
    expect([load.force?.toString(), load.shearStress?.toString(), load.pressure?.toString()]).toEqual([
      "2400 lbf",
      "4800 psi",
      "9600 psi",
    ]);
    expect([load.neededLength.shear?.toString(), load.neededLength.bearing?.toString()]).toEqual(["1 in", "2 in"]);
    expect(load.capacity.bearing?.toString()).toBe("1200 lbf·in");
    expect(load.bearingHeight.toString()).toBe("0.125 in");
  });

  it("the same joint in both systems", () => {
    const metric = keyLoad(JOINT);
    const inches = keyLoad({ ...JOINT, torque: torque(90 / 0.1129848290276167, "lbf-in") });
    expect(inches.pressure?.to("MPa")).toBeCloseTo(metric.pressure?.value ?? NaN, 6);
    expect(inches.force?.to("N")).toBeCloseTo(5000, 4);
  });

  it("strength of the shaft with the keyway, where its depth is given", () => {
    const load = keyLoad({ ...JOINT, shaftDepth: "5 mm" });
    // 1 - 0.2 × 10/36 - 1.1 × 5/36
    expect(load.shaftStrengthFactor).toBeCloseTo(1 - 2 / 36 - 5.5 / 36, 11);
    expect(load.basis.at(-1)?.says).toContain("no fatigue factor");
  });

  it("carries the caution, and another where the key is long", () => {
    expect(keyLoad(JOINT).cautions.map(({ code }) => code)).toEqual(["KEY_CARRIES_LOAD"]);
    expect(keyLoad({ ...JOINT, length: "54 mm" }).cautions.length).toBe(1);
    expect(keyLoad({ ...JOINT, length: "54.1 mm" }).cautions.map(({ code }) => code)).toEqual([
      "KEY_CARRIES_LOAD",
      "KEY_LENGTH_LONG",
    ]);
    expect(keyLoad(JOINT).cautions[0]?.says).toMatch(/codes .* licensed engineer/);
  });

  it("is plain frozen data that travels", () => {
    const load = keyLoad({ ...JOINT, allowables: { shear: "20 MPa" } });
    expect(Object.isFrozen(load)).toBe(true);
    expect(() => structuredClone(load)).not.toThrow();
    const parts = JSON.parse(JSON.stringify({ ...JOINT, allowables: { shear: load.allowedShear } })) as KeyLoadParts;
    expect(JSON.stringify(keyLoad(parts))).toBe(JSON.stringify(load));
  });
});

describe("keyLoad: bad input", () => {
  const noEnds = without("ends");
  const noForm = without("pressure");

  it.each([
    ["KEYED_JOINT_INVALID", {}, ["shaftDiameter"]],
    ["KEYED_JOINT_INVALID", { ...JOINT, key: {} }, ["key", "width"]],
    ["KEYED_JOINT_INVALID", { ...JOINT, key: { width: "0 mm", height: "8 mm" } }, ["key", "width"]],
    ["KEY_WIDER_THAN_SHAFT", { ...JOINT, key: { width: "36 mm", height: "8 mm" } }, ["key", "width"]],
    ["UNIT_UNKNOWN", { ...JOINT, torque: "90 MPa" }, ["torque"]],
    ["UNIT_UNKNOWN", { ...JOINT, torque: { value: 90, unit: "MPa" } }, ["torque"]],
    ["UNIT_MISSING", { ...JOINT, torque: "90" }, ["torque"]],
    ["QUANTITY_INVALID", { ...JOINT, torque: 90 }, ["torque"]],
    ["KEY_LOAD_INVALID", { ...JOINT, torque: "0 N·m" }, ["torque"]],
    ["KEY_LOAD_INVALID", { ...JOINT, torque: "-5 N·m" }, ["torque"]],
    ["OPTION_INVALID", noEnds, ["ends"]],
    ["OPTION_INVALID", { ...JOINT, ends: "A" }, ["ends"]],
    ["OPTION_INVALID", noForm, ["pressure"]],
    ["OPTION_INVALID", { ...JOINT, pressure: "toString" }, ["pressure"]],
    ["KEY_LOAD_INVALID", { ...JOINT, pressure: "h - t1" }, ["shaftDepth"]],
    ["KEY_LOAD_INVALID", { ...JOINT, pressure: "t1 or t2", shaftDepth: "5 mm" }, ["hubDepth"]],
    ["KEYSEAT_DEPTH_IMPOSSIBLE", { ...JOINT, pressure: "h - t1", shaftDepth: "8 mm" }, ["shaftDepth"]],
    ["KEYSEAT_DEPTH_IMPOSSIBLE", { ...JOINT, shaftDepth: "35 mm" }, ["shaftDepth"]],
    ["KEY_LENGTH_INVALID", { ...JOINT, ends: "round", length: "10 mm" }, ["length"]],
    ["KEY_LENGTH_INVALID", { ...JOINT, ends: "one round", length: "5 mm" }, ["length"]],
    ["KEY_LENGTH_INVALID", { ...JOINT, length: "-1 mm" }, ["length"]],
    ["LENGTH_INVALID", { ...JOINT, length: 50 }, ["length"]],
    ["UNIT_UNKNOWN", { ...JOINT, allowables: { shear: "20 N·m" } }, ["allowables", "shear"]],
    ["UNIT_UNKNOWN", { ...JOINT, allowables: { shear: "20 mm" } }, ["allowables", "shear"]],
    ["KEY_LOAD_INVALID", { ...JOINT, allowables: { shear: "0 MPa" } }, ["allowables", "shear"]],
    ["KEY_LOAD_INVALID", { ...JOINT, allowables: { bearing: { key: "5 MPa" } } }, ["allowables", "bearing", "shaft"]],
    ["KEY_LOAD_INVALID", { ...JOINT, allowables: { bearing: {} } }, ["allowables", "bearing", "key"]],
    ["KEY_LOAD_INVALID", { ...JOINT, allowables: { shear: "5 MPa" }, safetyFactor: 0.9 }, ["safetyFactor"]],
    ["KEY_LOAD_INVALID", { ...JOINT, allowables: { shear: "5 MPa" }, safetyFactor: NaN }, ["safetyFactor"]],
    ["KEY_LOAD_INVALID", { ...JOINT, allowables: { shear: "5 MPa" }, safetyFactor: "3" }, ["safetyFactor"]],
    [
      "KEY_LOAD_INVALID",
      { ...JOINT, materials: { yield: { key: "1 MPa", shaft: "1 MPa", hub: "1 MPa" }, shearRule: "0.5" } },
      ["safetyFactor"],
    ],
    ["KEY_LOAD_INVALID", { ...JOINT, allowables: {}, materials: {}, safetyFactor: 2 }, ["materials"]],
    ["OPTION_INVALID", { ...JOINT, materials: { yield: {} }, safetyFactor: 2 }, ["materials", "shearRule"]],
    [
      "KEY_LOAD_INVALID",
      { ...JOINT, materials: { yield: { key: "1 MPa" }, shearRule: "0.5" }, safetyFactor: 2 },
      ["materials", "yield", "shaft"],
    ],
    ["QUANTITY_OUT_OF_RANGE", { ...JOINT, torque: "1e15 N·m", length: "0.0001 mm", allowables: {} }, []],
  ])("%s", (code, parts, path) => {
    const error = thrown(() => keyLoad(parts as never));
    expect(error.code).toBe(code);
    expect(error.path).toEqual(path);
  });

  it.each([undefined, null, 5, "joint"])("%j is no joint", (parts) => {
    expect(codeOf(() => keyLoad(parts as never))).toBe("KEYED_JOINT_INVALID");
  });
});

describe("keywayStrengthFactor", () => {
  it.each([
    ["KEY_WIDER_THAN_SHAFT", { shaftDiameter: "10 mm", width: "10 mm", depth: "1 mm" }],
    ["KEYSEAT_DEPTH_IMPOSSIBLE", { shaftDiameter: "10 mm", width: "5 mm", depth: "9 mm" }],
    ["KEYED_JOINT_INVALID", { shaftDiameter: "10 mm", width: "5 mm", depth: "0 mm" }],
    ["KEYED_JOINT_INVALID", { shaftDiameter: "10 mm", width: "5 mm" }],
    ["UNIT_MISSING", { shaftDiameter: "10", width: "5 mm", depth: "1 mm" }],
  ])("%s", (code, shaft) => {
    expect(codeOf(() => keywayStrengthFactor(shaft as never))).toBe(code);
  });
});

describe("torqueFromPower", () => {
  it("hp gives lbf·in, watts give N·m: the same torque", () => {
    // 63 025 hp / (1/min), the round number of the trade
    expect(torqueFromPower({ power: "40 hp", revolutionsPerMinute: 600 }).to("lbf-in")).toBeCloseTo(
      (63_025 * 40) / 600,
      0,
    );
    const watts = torqueFromPower({ power: "0.745699871582270 kW", revolutionsPerMinute: 600 });
    expect(watts.unit).toBe("Nm");
    expect(watts.to("lbf-in")).toBeCloseTo(torqueFromPower({ power: "1 hp", revolutionsPerMinute: 600 }).value, 8);
    expect(torqueFromPower({ power: "1000 W", revolutionsPerMinute: 3000 / Math.PI }).value).toBe(10);
  });

  it.each([
    ["KEY_LOAD_INVALID", {}],
    ["KEY_LOAD_INVALID", { power: "0 W", revolutionsPerMinute: 5 }],
    ["KEY_LOAD_INVALID", { power: "5 W", revolutionsPerMinute: -5 }],
    ["KEY_LOAD_INVALID", { power: "5 W", revolutionsPerMinute: Infinity }],
    ["KEY_LOAD_INVALID", { power: "5 W", revolutionsPerMinute: "5" }],
    ["UNIT_UNKNOWN", { power: "5 MPa", revolutionsPerMinute: 5 }],
    ["QUANTITY_INVALID", { power: 5, revolutionsPerMinute: 5 }],
  ])("%s", (code, drive) => {
    expect(codeOf(() => torqueFromPower(drive as never))).toBe(code);
  });
});
