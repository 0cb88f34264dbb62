import { once } from "node:events";
import { writeFileSync } from "node:fs";
import { join } from "node:path";
import { Worker } from "node:worker_threads";
import {
  add,
  angleLimits,
  asLength,
  asLimits,
  attempt,
  compareLengths,
  degrees,
  equalLengths,
  exactPlaces,
  fitOf,
  fundamentalDeviation,
  inch,
  isoClassesFor,
  isoDeviations,
  isoFit,
  isoFitsFor,
  isoLimits,
  lengthOfTicks,
  limits,
  limitsFromMaxMin,
  mm,
  multiply,
  oneSidedLimits,
  parseToleranceClass,
  rankFits,
  readAngle,
  readLength,
  roundLength,
  singleLimit,
  standardTolerance,
  subtract,
  symmetricLimits,
  toDecimal,
  um,
  writeAngle,
  writeLength,
  writeLimits,
} from "limitsmith";
import type * as Library from "limitsmith";
import type { Angle, Length, Limits, ToleranceClass } from "limitsmith";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";
import { bundle } from "./bundle.js";
import type { Bundle } from "./bundle.js";

let made: Bundle;
let worker: Worker;

beforeAll(async () => {
  made = await bundle();
  const file = join(made.folder, "worker.mjs");
  // the worker loads its own copy of the library, takes what it is sent, and sends back what it makes of it
  writeFileSync(
    file,
    `import { parentPort } from "node:worker_threads";
     import * as lib from "./lib.mjs";
     parentPort.on("message", ({ task, data }) => {
       const tasks = {
         echo: () => data,
         make: () => ({
           length: lib.inch("1 3/16"),
           limits: lib.isoLimits(lib.mm(40), "m6"),
           angle: lib.readAngle("12°15'30\\""),
           toleranceClass: lib.parseToleranceClass("H7"),
           fit: lib.isoFit(lib.mm(40), "H7/m6"),
           error: lib.attempt(() => lib.readLength("5 mil")),
         }),
         use: () => ({
           sum: lib.add(data.length, data.length),
           text: lib.writeLimits(data.limits, { form: "class" }).text,
           fit: lib.fitOf(lib.isoLimits(data.limits.nominal, "H7"), data.limits),
         }),
       };
       parentPort.postMessage(tasks[task]());
     });`,
  );
  worker = new Worker(file);
}, 60_000);

afterAll(async () => {
  await worker.terminate();
  made.remove();
});

async function ask(task: "echo" | "make" | "use", data?: unknown): Promise<unknown> {
  const answer = once(worker, "message");
  worker.postMessage({ task, data });
  return ((await answer) as unknown[])[0];
}

/** Ways in which a value comes back as bare data. */
const WAYS: readonly (readonly [string, <T>(value: T) => Promise<T>])[] = [
  ["structuredClone", (value) => Promise.resolve(structuredClone(value))],
  ["JSON", (value) => Promise.resolve(JSON.parse(JSON.stringify(value)) as typeof value)],
  ["a worker", async (value) => (await ask("echo", value)) as typeof value],
  ["a copy of its own keys", (value) => Promise.resolve(typeof value === "object" ? { ...value } : value)],
];

function expectDeepFrozen(value: unknown, seen = new Set<unknown>()): void {
  if (typeof value !== "object" || value === null || seen.has(value)) return;
  seen.add(value);
  expect(Object.isFrozen(value)).toBe(true);
  for (const key of Reflect.ownKeys(value)) expectDeepFrozen((value as Record<PropertyKey, unknown>)[key], seen);
}

describe.each(WAYS)("after %s", (_, send) => {
  it("a length is taken by every function that takes one", async () => {
    for (const length of [mm("40.025"), inch("1 3/16"), um(-18), lengthOfTicks(1, "in")]) {
      const sent: Length = await send(length);
      expect(asLength(sent).ticks).toBe(length.ticks);
      expectDeepFrozen(asLength(sent));
      expect(add(sent, sent).ticks).toBe(2 * length.ticks);
      expect(subtract(sent, sent).ticks).toBe(0);
      expect(multiply(sent, 2).ticks).toBe(2 * length.ticks);
      expect(compareLengths(sent, length)).toBe(0);
      expect(equalLengths(length, sent)).toBe(true);
      expect(exactPlaces(sent, "mm")).toBe(exactPlaces(length, "mm"));
      expect(roundLength(sent, { places: 0, unit: "mm" })).toEqual(roundLength(length, { places: 0, unit: "mm" }));
      expect(toDecimal(sent, "mm").toString()).toBe(toDecimal(length, "mm").toString());
      expect(writeLength(sent, { unit: "mm" })).toBe(writeLength(length, { unit: "mm" }));
      expect(singleLimit("max", sent).limit.ticks).toBe(length.ticks);
      expect(limits({ nominal: sent, upper: sent, lower: sent }).max.ticks).toBe(2 * length.ticks);
      expect(limitsFromMaxMin({ max: sent, min: sent, nominal: sent }).mean.ticks).toBe(length.ticks);
      expect(oneSidedLimits(sent, sent).nominal.ticks).toBe(length.ticks);
    }
    const size = await send(mm(40));
    expect(symmetricLimits(size, size).max.ticks).toBe(800_000_000);
    expect(isoDeviations(size, "m6")).toEqual({ upperDeviationUm: 25, lowerDeviationUm: 9 });
    expect(isoLimits(size, "m6").max.toString()).toBe("40.025 mm");
    expect(isoFit(size, "H7/m6").kind).toBe("transition");
    expect(standardTolerance(size, "IT7").tolerance.toString()).toBe("25 µm");
    expect(fundamentalDeviation(size, "m6").deviation.toString()).toBe("9 µm");
    const wanted = await send({ min: um(5), max: um(60) });
    expect(isoFitsFor({ size, clearance: wanted, most: 1 }).fits[0]?.fit.designation).toBe("H7/g6");
    expect(rankFits([], wanted)).toEqual([]);
  });

  it("limits are taken by every function that takes them, and come out frozen to the bottom", async () => {
    for (const one of [isoLimits(mm(40), "m6"), isoLimits(inch("1.25"), "k6"), symmetricLimits("2.188 in", "5 thou")]) {
      const sent: Limits = await send(one);
      expect(JSON.stringify(asLimits(sent))).toBe(JSON.stringify(one));
      expectDeepFrozen(asLimits(sent));
      expect(JSON.stringify(fitOf(sent, sent))).toBe(JSON.stringify(fitOf(one, one)));
      expectDeepFrozen(fitOf(sent, sent));
      const style = { form: "limits", unit: "in", places: 5 } as const;
      expect(writeLimits(sent, style).text).toBe(writeLimits(one, style).text);
      expectDeepFrozen(writeLimits(sent, style));
      const found = isoClassesFor(sent).map(({ toleranceClass }) => toleranceClass.text);
      expect(found).toEqual(isoClassesFor(one).map(({ toleranceClass }) => toleranceClass.text));
      // a basis that travelled is taken as one
      expect(
        limits({ nominal: sent.nominal, upper: sent.upperDeviation, lower: sent.lowerDeviation, basis: sent.basis })
          .basis,
      ).toEqual(one.basis);
    }
  });

  it("the members of a fit make the same fit", async () => {
    const fit = isoFit(mm(40), "H7/m6");
    const sent = await send(fit);
    const again = fitOf(sent.hole, sent.shaft);
    expect(again.kind).toBe(fit.kind);
    expect(again.designation).toBe("H7/m6");
    expect(again.minClearance.ticks).toBe(fit.minClearance.ticks);
    expect(asLength(sent.maxClearance).ticks).toBe(fit.maxClearance.ticks);
  });

  it("classes and angles are taken too", async () => {
    const h7: ToleranceClass = await send(parseToleranceClass("H7"));
    expect(parseToleranceClass(h7)).toBe(parseToleranceClass("H7"));
    expect(isoDeviations(mm(40), h7)).toEqual({ upperDeviationUm: 25, lowerDeviationUm: 0 });
    expect(isoFit(mm(40), { hole: h7, shaft: "m6" }).designation).toBe("H7/m6");
    for (const angle of [readAngle("12°15'30\""), degrees(0.5)]) {
      const sent: Angle = await send(angle);
      expect(readAngle(sent)).toEqual(angle);
      expectDeepFrozen(readAngle(sent));
      expect(writeAngle(sent, { style: "dms" })).toBe(writeAngle(angle, { style: "dms" }));
      expect(angleLimits({ nominal: sent, upper: sent, lower: sent }).max.microarcseconds).toBe(
        2 * angle.microarcseconds,
      );
    }
  });
});

describe("a worker with its own copy of the library", () => {
  it("gives what this side takes", async () => {
    const given = (await ask("make")) as {
      length: Length;
      limits: Limits;
      angle: Angle;
      toleranceClass: ToleranceClass;
      fit: { hole: Limits; shaft: Limits };
      error: unknown;
    };
    expect(asLength(given.length)).toEqual(inch("1 3/16"));
    expect(asLimits(given.limits)).toEqual(isoLimits(mm(40), "m6"));
    expect(readAngle(given.angle)).toEqual(readAngle("12°15'30\""));
    expect(isoLimits(mm(40), given.toleranceClass)).toEqual(isoLimits(mm(40), "H7"));
    expect(fitOf(given.fit.hole, given.fit.shaft)).toEqual(isoFit(mm(40), "H7/m6"));
    expect(given.error).toEqual(attempt(() => readLength("5 mil")));
  });

  it("takes what this side gives", async () => {
    const sent = { length: inch("1 3/16"), limits: isoLimits(mm(40), "m6") };
    const given = (await ask("use", sent)) as { sum: Length; text: string; fit: { hole: Limits; shaft: Limits } };
    expect(asLength(given.sum)).toEqual(add(sent.length, sent.length));
    expect(given.text).toBe("40 m6 (40.025/40.009)");
    expect(fitOf(given.fit.hole, given.fit.shaft)).toEqual(isoFit(mm(40), "H7/m6"));
  });
});

describe("another copy of the library in the same program", () => {
  it("its values are taken, and its errors are known", async () => {
    const other = (await import(/* @vite-ignore */ join(made.folder, "lib.mjs"))) as typeof Library;
    expect(other.mm).not.toBe(mm);
    expect(add(other.mm(1), mm(1)).toString()).toBe("2 mm");
    expect(asLength(other.mm(1))).toEqual(mm(1));
    expect(fitOf(other.isoLimits("40 mm", "H7"), isoLimits("40 mm", "m6"))).toEqual(isoFit(mm(40), "H7/m6"));
    const got = attempt(() => other.readLength("5 mil"));
    expect(got).toEqual(attempt(() => readLength("5 mil")));
  });
});

describe("results are frozen to the bottom", () => {
  it.each([
    ["a length", mm(40)],
    ["an angle", degrees(45)],
    ["limits", isoLimits(mm(40), "m6")],
    [
      "limits of the caller",
      limits({
        nominal: "40 mm",
        upper: "25 µm",
        lower: "9 µm",
        basis: [{ standard: "a", place: "b", says: "c", how: "caller" }],
      }),
    ],
    ["a single limit", singleLimit("max", mm(1))],
    ["limits of an angle", angleLimits({ nominal: "45°", upper: "1°", lower: "0°" })],
    ["a fit", isoFit(mm(40), "H7/m6")],
    ["deviations", isoDeviations(mm(40), "m6")],
    ["a class", parseToleranceClass("m6")],
    ["a standard tolerance", standardTolerance(mm(40), "IT7")],
    ["a fundamental deviation", fundamentalDeviation(mm(40), "P7")],
    ["written limits", writeLimits(isoLimits(mm(40), "m6"), { form: "limits" })],
    ["classes found", isoClassesFor(isoLimits(mm(40), "m6"))],
    ["fits found", isoFitsFor({ size: mm(40), clearance: { min: um(5), max: um(60) } })],
    ["an error", attempt(() => readLength("5 mil"))],
  ])("%s", (_, value) => {
    expectDeepFrozen(value);
  });

  it("a caller's own list or step, changed later, changes no result", () => {
    const step = { standard: "a", place: "b", says: "c", how: "caller" as const };
    const basis = [step];
    const one = limits({ nominal: mm(1), upper: mm(0), lower: mm(0), basis });
    step.says = "changed";
    basis.push(step);
    expect(one.basis).toEqual([{ standard: "a", place: "b", says: "c", how: "caller" }]);
  });
});

describe("forged values", () => {
  it("the prototype of a length is no licence: its data count", () => {
    const prototype = Object.getPrototypeOf(mm(1)) as object;
    const forge = (data: object): Length => Object.assign(Object.create(prototype) as object, data) as Length;
    expect(codeOf(() => asLength(forge({ ticks: 1.5, unit: "mm" })))).toBe("LENGTH_INVALID");
    expect(codeOf(() => add(forge({ ticks: NaN, unit: "mm" }), mm(1)))).toMatch(/^LENGTH_/);
    expect(codeOf(() => asLength(forge({ ticks: 5, unit: "ell" })))).toBe("UNIT_UNKNOWN");
    // a deep copy that keeps prototypes but not the frost: what goes into limits must be frozen all the same
    expectDeepFrozen(limits({ nominal: forge({ ticks: 5, unit: "mm" }), upper: mm(0), lower: mm(0) }));
  });

  it("own keys with accessors are read, never trusted twice", () => {
    let reads = 0;
    const shifty = {
      unit: "mm" as const,
      get ticks() {
        reads++;
        return reads === 1 ? 5 : NaN;
      },
    };
    let ticks: unknown = "refused";
    try {
      ticks = asLength(shifty).ticks;
    } catch {
      reads = 0;
      expect(codeOf(() => asLength(shifty))).toMatch(/^LENGTH_/);
    }
    expect(ticks === "refused" || Number.isSafeInteger(ticks)).toBe(true);
  });
});
