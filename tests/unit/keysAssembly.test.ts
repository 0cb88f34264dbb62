import {
  add,
  inch,
  inchKey,
  inchKeyseat,
  keyedAssembly,
  lengthOfTicks,
  limits,
  limitsFromMaxMin,
  metricKey,
  metricKeyseat,
  mm,
  multiply,
} from "limitsmith";
import type { InchKeyseatOptions, KeyedAssembly, KeyedParts, KeyLimits, Limits, StackRange } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

function between(max: string, min: string, unit: "in" | "mm" = "in"): Limits {
  return limitsFromMaxMin({ max: `${max} ${unit}`, min: `${min} ${unit}` });
}

function texts(range: StackRange | null): unknown {
  return range === null ? null : [range.max.to("in"), range.min.to("in")].map((value) => Number(value.toFixed(6)));
}

function codesOf(joint: KeyedAssembly): unknown {
  return joint.findings.map(({ code, place }) => `${code} ${place}`);
}

// shaft and bore of 1 15/16 in: 1.9370/1.9375 and 1.9375/1.9385
const SHAFT = between("1.9375", "1.9370");
const BORE = between("1.9385", "1.9375");
const SIZE = inch("1 15/16");

function jointOf(keyClass: 1 | 2, more: Partial<InchKeyseatOptions> = {}): KeyedAssembly {
  const key = inchKey(SIZE, more);
  const seat = inchKeyseat(SIZE, { ...more, class: keyClass });
  return keyedAssembly({
    shaft: SHAFT,
    bore: BORE,
    key: (keyClass === 1 ? key.barStock : key.keystock) ?? key.keystock,
    shaftKeyseat: seat.shaft,
    hubKeyseat: seat.hub,
  });
}

describe("keyedAssembly: 1/2 in square key on 1 15/16 in, worked by hand", () => {
  it("Class 1: 0.032/0.005 over the key, less the play where the shaft is pushed toward it", () => {
    const joint = jointOf(1);
    expect(texts(joint.top.away)).toEqual([0.032, 0.005]);
    expect(texts(joint.top.toward)).toEqual([0.032, 0.0035]);
    expect(texts(joint.top.centred)).toEqual([0.032, 0.00425]);
    expect(texts(joint.sideInShaft)).toEqual([0.004, 0]);
    expect(texts(joint.sideInHub)).toEqual([0.004, 0]);
    // S + H over the key, and that less the shaft
    expect(texts(joint.overKey)).toEqual([2.155, 2.138]);
    expect(texts(joint.aboveShaft)).toEqual([0.218, 0.2005]);
    expect([joint.assembles, joint.canLift, joint.bears]).toEqual(["always assembles", true, "always bears"]);
    expect(codesOf(joint)).toEqual(["KEY_CAN_LIFT shaft"]);
    expect(joint.takeUp).toBeNull();
    expect(joint.fit.kind).toBe("clearance");
    expect(joint.cautions.map(({ code }) => code)).toEqual(["KEY_CARRIES_LOAD"]);
  });

  it("Class 2: 0.030/0.004 over the key, 0.002 clearance to 0.001 interference at its sides", () => {
    const joint = jointOf(2);
    expect(texts(joint.top.away)).toEqual([0.03, 0.004]);
    expect(texts(joint.sideInShaft)).toEqual([0.002, -0.001]);
    expect(joint.assembles).toBe("may need fitting");
    expect(codesOf(joint)).toEqual(["SIDE_INTERFERES shaft", "SIDE_INTERFERES hub", "KEY_CAN_LIFT shaft"]);
    expect(joint.findings[0]?.says).toContain(".0010 in");
  });

  it("taper: 0.005 clearance to 0.025 interference, taken up by driving: 0.010 is 0.96 in of travel", () => {
    const joint = jointOf(2, { kind: "taper" });
    expect(texts(joint.top.away)).toEqual([0.005, -0.025]);
    // 1/8 in per foot
    expect([joint.takeUp?.max.to("in"), joint.takeUp?.min.to("in")]).toEqual([2.4, -0.48]);
    expect(inchKey(SIZE, { kind: "taper" }).keystock.taper).toEqual({ numerator: 1, denominator: 96 });
    expect(multiply(inch(".010"), { numerator: 96, denominator: 1 }).to("in")).toBe(0.96);
    expect(joint.canLift).toBe(false);
    expect(codesOf(joint)).toEqual(["SIDE_INTERFERES shaft", "SIDE_INTERFERES hub", "TAPER_TAKES_UP top"]);
  });

  it("each limit has the chain that made it", () => {
    const { away, toward } = jointOf(1).top;
    expect(away.minChain.map(({ sign, value }) => `${sign}${value.to("in")}`)).toEqual(["+2.16", "-1.655", "-0.5"]);
    expect(away.maxChain.map(({ sign, value }) => `${sign}${value.to("in")}`)).toEqual(["+2.17", "-1.64", "-0.498"]);
    expect(toward.minChain.at(-1)).toMatchObject({ name: "play of the shaft in the bore", sign: "-" });
    expect(toward.minChain.at(-1)?.value.to("thou")).toBe(1.5);
    expect(away.minChain[0]?.name).toBe("T of the hub keyseat, min");
  });

  it("limits that were measured or printed go the same way", () => {
    const byHand = keyedAssembly({
      shaft: SHAFT,
      bore: BORE,
      key: { width: between("0.500", "0.498"), height: between("0.500", "0.498") },
      shaftKeyseat: { width: between("0.502", "0.500"), control: between("1.655", "1.640") },
      hubKeyseat: { width: between("0.502", "0.500"), control: between("2.170", "2.160") },
    });
    const standard = jointOf(1);
    for (const name of ["sideInShaft", "sideInHub", "overKey", "aboveShaft", "flankInShaft", "flankInHub"] as const) {
      expect(texts(byHand[name])).toEqual(texts(standard[name]));
    }
    expect(byHand.assembles).toBe(standard.assembles);
    expect(byHand.findings).toEqual(standard.findings);
  });
});

const METRIC = metricKeyseat("40 mm", { fit: "close" });

function metricParts(over: Partial<KeyedParts> = {}): KeyedParts {
  return {
    shaft: limits({ nominal: "40 mm", upper: "18 µm", lower: "2 µm" }),
    bore: limits({ nominal: "40 mm", upper: "25 µm", lower: "0 µm" }),
    key: metricLimits(),
    shaftKeyseat: METRIC.shaft,
    hubKeyseat: METRIC.hub,
    ...over,
  };
}

function metricLimits(): KeyLimits {
  const key = metricKey("40 mm").limits;
  if (key === null) throw new Error("no limits");
  return key;
}

describe("keyedAssembly: metric 12 x 8 on 40 mm", () => {
  it("control dimensions: d + t2 less d - t1 less h", () => {
    const { away, toward } = keyedAssembly(metricParts()).top;
    // 43.5 - 34.8 - 7.91, 43.3 - 35 - 8; the play of up to 0.023 comes off
    expect([away.max.to("mm"), away.min.to("mm")]).toEqual([0.79, 0.3]);
    expect([toward.max.to("mm"), toward.min.to("mm")]).toEqual([0.79, 0.277]);
  });

  it("depths from the crown: t1 + t2 - h with the crowns together, whatever the diameters are", () => {
    const depths = {
      shaftKeyseat: { width: METRIC.shaft.width, depth: METRIC.shaft.depth },
      hubKeyseat: { width: METRIC.hub.width, depth: METRIC.hub.depth },
    };
    const { away, toward } = keyedAssembly(metricParts(depths)).top;
    // crowns together: 5.2 + 3.5 - 7.91 and 5 + 3.3 - 8, less what a larger shaft is pressed in by
    expect(toward.max.to("mm")).toBe(0.79);
    expect(toward.min.to("mm")).toBe(0.282);
    expect(away.max.to("mm")).toBe(0.813);
    expect(away.min.to("mm")).toBe(0.282);
    expect(away.minChain.map(({ name }) => name)).toEqual([
      "diameter of the bore, min",
      "t2 of the hub keyway, min",
      "diameter of the shaft, max",
      "t1 of the shaft keyway, min",
      "height of the key, max",
    ]);
  });

  it("the control dimension goes before the depth, the depth before the side depth", () => {
    const seat = {
      control: between("35", "34.8", "mm"),
      depth: between("9", "8", "mm"),
      sideDepth: between("3", "2", "mm"),
    };
    const first = keyedAssembly(metricParts({ shaftKeyseat: seat })).top.away.minChain;
    expect(first[1]?.name).toBe("S of the shaft keyseat, max");
    const second = keyedAssembly(metricParts({ shaftKeyseat: { ...seat, control: null } })).top.away.minChain;
    expect(second.map(({ name }) => name)).toContain("t1 of the shaft keyway, min");
    const third = keyedAssembly(metricParts({ shaftKeyseat: { sideDepth: seat.sideDepth } })).top.away.minChain;
    expect(third.map(({ name }) => name)).toContain("side depth of the shaft keyseat, min");
  });

  it("a shaft that can be larger than its bore has no play and is pressed", () => {
    const joint = keyedAssembly(metricParts());
    expect(codesOf(joint)).toContain("SHAFT_PRESSES bore");
    expect(joint.fit.kind).toBe("transition");
    const pressed = keyedAssembly(metricParts({ shaft: limits({ nominal: "40 mm", upper: "60 µm", lower: "50 µm" }) }));
    const sizesOf = (range: StackRange): unknown => [range.max.ticks, range.min.ticks];
    expect(sizesOf(pressed.top.toward)).toEqual(sizesOf(pressed.top.away));
    expect(sizesOf(pressed.top.centred)).toEqual(sizesOf(pressed.top.away));
  });

  it("results and parts travel as JSON and as clones", () => {
    const parts = metricParts();
    const joint = keyedAssembly(parts);
    for (const way of [structuredClone(parts), JSON.parse(JSON.stringify(parts)) as KeyedParts]) {
      expect(JSON.stringify(keyedAssembly(way))).toBe(JSON.stringify(joint));
    }
    expect(Object.isFrozen(joint)).toBe(true);
    expect(Object.isFrozen(joint.top.away.minChain)).toBe(true);
    expect(() => structuredClone(joint)).not.toThrow();
  });
});

describe("keyedAssembly: verdicts", () => {
  it("a key too wide at every corner cannot go in", () => {
    const joint = keyedAssembly(metricParts({ key: { ...metricLimits(), width: between("12.1", "12.05", "mm") } }));
    expect(joint.assembles).toBe("cannot assemble");
    expect(codesOf(joint)).toEqual(["SIDE_INTERFERES shaft", "SIDE_INTERFERES hub", "SHAFT_PRESSES bore"]);
    expect(joint.findings[0]?.says).toContain("at every corner");
    expect(joint.canLift).toBe(false);
  });

  it("a key too high is pinched, at some corners or at every one", () => {
    const some = keyedAssembly(metricParts({ key: { ...metricLimits(), height: between("8.5", "8.4", "mm") } }));
    expect([some.assembles, codesOf(some)]).toEqual([
      "may need fitting",
      ["SIDE_INTERFERES shaft", "SIDE_INTERFERES hub", "TOP_PINCHED top", "KEY_CAN_LIFT shaft", "SHAFT_PRESSES bore"],
    ]);
    const all = keyedAssembly(metricParts({ key: { ...metricLimits(), height: between("9.5", "9.4", "mm") } }));
    expect(all.assembles).toBe("cannot assemble");
    expect(all.findings.find(({ code }) => code === "TOP_PINCHED")?.says).toContain("at every corner");
  });

  it("a key that is reached before the bore takes the play", () => {
    const parts = {
      ...metricParts({ bore: limits({ nominal: "40 mm", upper: "0.62 mm", lower: "0.5 mm" }) }),
      hubKeyseat: { width: METRIC.hub.width, control: between("43.5", "43.3", "mm") },
    };
    const joint = keyedAssembly(parts);
    expect(joint.top.away.min.to("mm")).toBe(0.3);
    expect(joint.top.toward.min.ticks).toBeLessThan(0);
    // half of 0.618 is more than 0.3
    const finding = joint.findings.find(({ code }) => code === "KEY_TAKES_PLAY");
    expect(finding?.says).toContain("off centre");
    const less = keyedAssembly({ ...parts, bore: limits({ nominal: "40 mm", upper: "0.4 mm", lower: "0.3 mm" }) });
    expect(less.findings.find(({ code }) => code === "KEY_TAKES_PLAY")?.says).toContain("still be centred");
    expect(less.top.centred.min.ticks).toBeGreaterThan(0);
  });

  it("a key held at its sides cannot lift, whatever room it has", () => {
    const tight = keyedAssembly(metricParts({ key: { ...metricLimits(), width: between("12.02", "11.99", "mm") } }));
    expect(METRIC.shaft.width?.max.to("mm")).toBe(11.982);
    expect([tight.canLift, codesOf(tight)]).toEqual([
      false,
      ["SIDE_INTERFERES shaft", "SIDE_INTERFERES hub", "SHAFT_PRESSES bore"],
    ]);
  });

  it("a key that does not stand out of the shaft cannot bear in the hub", () => {
    // wide enough to be held, so that it does not lift
    const low = { width: between("12.02", "11.99", "mm"), height: between("4.2", "4", "mm") };
    const some = keyedAssembly(metricParts({ key: low }));
    expect([some.bears, some.flankInHub.max.ticks > 0, some.flankInHub.min.ticks > 0]).toEqual([
      "may not bear",
      true,
      false,
    ]);
    const none = keyedAssembly(metricParts({ key: { ...low, height: between("3.9", "3.8", "mm") } }));
    expect(none.bears).toBe("cannot bear");
    expect(codesOf(none)).toContain("KEY_CANNOT_BEAR hub");
  });

  it("a key can lift right out of a shallow shaft seat under a deep hub seat", () => {
    const parts = metricParts({
      key: { width: between("11.9", "11.8", "mm"), height: between("4", "3.9", "mm") },
      shaftKeyseat: { width: METRIC.shaft.width, control: between("37", "36.8", "mm") },
      hubKeyseat: { width: METRIC.hub.width, control: between("43.5", "43.4", "mm") },
    });
    const joint = keyedAssembly(parts);
    expect(joint.flankInShaft.min.ticks).toBeGreaterThan(0);
    expect(joint.flankLifted.max.ticks).toBeLessThan(0);
    expect([joint.canLift, joint.bears]).toEqual([true, "cannot bear"]);
    expect(joint.findings.find(({ code }) => code === "KEY_CANNOT_BEAR")?.says).toContain("once it has lifted");
  });

  it("seats without a width are not judged at their sides", () => {
    const seat = inchKeyseat(SIZE, { class: 3 });
    const joint = keyedAssembly({
      shaft: SHAFT,
      bore: BORE,
      key: inchKey(SIZE).keystock,
      shaftKeyseat: seat.shaft,
      hubKeyseat: seat.hub,
    });
    expect([joint.sideInShaft, joint.sideInHub]).toEqual([null, null]);
    expect(joint.assembles).toBe("may need fitting");
    expect(codesOf(joint)).toEqual(["SIDE_NOT_GIVEN shaft", "SIDE_NOT_GIVEN hub", "KEY_CAN_LIFT shaft"]);
  });
});

describe("keyedAssembly: bad input", () => {
  const upsideDown = { nominal: "40 mm", upperDeviation: "-1 mm", lowerDeviation: "1 mm" };

  it.each([
    ["KEYED_JOINT_INVALID", {}, ["shaft"]],
    ["KEYED_JOINT_INVALID", { ...metricParts(), key: undefined }, ["key", "width"]],
    ["KEYED_JOINT_INVALID", { ...metricParts(), key: { width: between("12", "11", "mm") } }, ["key", "height"]],
    ["KEYED_JOINT_INVALID", { ...metricParts(), shaftKeyseat: {} }, ["shaftKeyseat"]],
    ["KEYED_JOINT_INVALID", { ...metricParts(), hubKeyseat: { control: null } }, ["hubKeyseat"]],
    ["KEYED_JOINT_INVALID", { ...metricParts(), bore: between("0", "-1", "mm") }, ["bore"]],
    [
      "KEYED_JOINT_INVALID",
      { ...metricParts(), key: { ...metricLimits(), height: between("1", "0", "mm") } },
      ["key", "height"],
    ],
    [
      "KEYED_JOINT_INVALID",
      { ...metricParts(), key: { ...metricLimits(), taper: { numerator: 0, denominator: 1 } } },
      ["key", "taper"],
    ],
    [
      "KEYED_JOINT_INVALID",
      { ...metricParts(), key: { ...metricLimits(), taper: { numerator: 0.5, denominator: 1 } } },
      ["key", "taper"],
    ],
    [
      "KEY_WIDER_THAN_SHAFT",
      { ...metricParts(), key: { ...metricLimits(), width: between("40.1", "40", "mm") } },
      ["key", "width"],
    ],
    [
      "KEY_WIDER_THAN_SHAFT",
      { ...metricParts(), shaftKeyseat: { ...METRIC.shaft, width: between("41", "40", "mm") } },
      ["shaftKeyseat", "width"],
    ],
    [
      "KEYSEAT_DEPTH_IMPOSSIBLE",
      { ...metricParts(), shaftKeyseat: { control: between("40.2", "40.1", "mm") } },
      ["shaftKeyseat", "control"],
    ],
    [
      "KEYSEAT_DEPTH_IMPOSSIBLE",
      { ...metricParts(), shaftKeyseat: { depth: between("41", "40", "mm") } },
      ["shaftKeyseat", "depth"],
    ],
    [
      "KEYSEAT_DEPTH_IMPOSSIBLE",
      { ...metricParts(), shaftKeyseat: { sideDepth: between("41", "40", "mm") } },
      ["shaftKeyseat", "sideDepth"],
    ],
    [
      "KEYSEAT_DEPTH_IMPOSSIBLE",
      { ...metricParts(), hubKeyseat: { control: between("39", "38", "mm") } },
      ["hubKeyseat", "control"],
    ],
    [
      "KEYED_JOINT_INVALID",
      { ...metricParts(), shaftKeyseat: { control: between("35", "-1", "mm") } },
      ["shaftKeyseat", "control"],
    ],
    ["LIMITS_UPSIDE_DOWN", { ...metricParts(), shaft: upsideDown }, []],
    ["UNIT_MISSING", { ...metricParts(), shaft: { ...upsideDown, nominal: "40" } }, ["shaft", "nominal"]],
    ["LENGTH_INVALID", { ...metricParts(), shaft: { ...upsideDown, nominal: 40 } }, ["shaft", "nominal"]],
    ["LIMITS_INVALID", { ...metricParts(), shaft: "40 mm" }, ["shaft"]],
  ])("%s", (code, parts, path) => {
    const error = thrown(() => keyedAssembly(parts as never));
    expect(error.code).toBe(code);
    if (path.length > 0) expect(error.path.slice(0, path.length)).toEqual(path);
  });

  it.each([undefined, null, 5, "joint", []])("%j is no joint", (parts) => {
    expect(codeOf(() => keyedAssembly(parts as never))).toBe("KEYED_JOINT_INVALID");
  });

  it("parts in both unit systems are lengths all the same", () => {
    const joint = keyedAssembly(metricParts({ shaft: between("1.5755", "1.5750") }));
    expect(joint.top.away.min.unit).toBe("in");
    expect(joint.top.away.min.to("mm")).toBeCloseTo(0.3, 9);
    expect(add(joint.top.away.min, mm(0)).ticks).toBe(lengthOfTicks(3_000_000, "mm").ticks);
  });
});
