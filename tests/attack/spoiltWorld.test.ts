import { execFileSync } from "node:child_process";
import { copyFileSync, readdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { bundle } from "./bundle.js";
import type { Bundle } from "./bundle.js";

interface Answer {
  readonly name: string;
  readonly text: string;
}

let made: Bundle;
let clean: readonly Answer[];

beforeAll(async () => {
  made = await bundle();
  copyFileSync(fileURLToPath(new URL("battery.mjs", import.meta.url)), join(made.folder, "battery.mjs"));
  clean = answersAfter("clean", "export function undo() {}");
}, 60_000);

afterAll(() => {
  made.remove();
});

/** Runs the battery in a new process whose world was spoilt before the library was loaded. */
function answersAfter(name: string, spoil: string): readonly Answer[] {
  const run = join(made.folder, `run-${name}.mjs`);
  writeFileSync(join(made.folder, `spoil-${name}.mjs`), spoil);
  // modules run in the order of their imports: the battery first, then the spoiling, then the library
  writeFileSync(
    run,
    `import { answers } from "./battery.mjs";
     import { undo } from "./spoil-${name}.mjs";
     import * as lib from "./lib.mjs";
     const given = answers(lib);
     undo();
     console.log(JSON.stringify(given));`,
  );
  const output = execFileSync(process.execPath, [run], { encoding: "utf8", maxBuffer: 64 * 1024 * 1024, env: {} });
  return JSON.parse(output) as Answer[];
}

function expectAsClean(name: string, spoil: string): void {
  const given = answersAfter(name, spoil);
  expect(given.map((answer) => answer.name)).toEqual(clean.map((answer) => answer.name));
  const different = given.filter(({ text }, index) => text !== clean[index]?.text);
  expect(different).toEqual([]);
}

/** Every field and option name that src declares or reads. */
function namesInSource(): string[] {
  const names = new Set<string>();
  const source = fileURLToPath(new URL("../../src/", import.meta.url));
  for (const file of readdirSync(source, { recursive: true, encoding: "utf8" })) {
    if (!file.endsWith(".ts")) continue;
    const text = readFileSync(join(source, file), "utf8");
    for (const match of text.matchAll(/readonly (\w+)\??:/g)) names.add(match[1] ?? "");
    for (const match of text.matchAll(/ownValue\([^()]*, "(\w+)"\)/g)) names.add(match[1] ?? "");
  }
  return [...names].sort();
}

const NAMES = namesInSource();

/** Values that would be good ones if they were the caller's own, and would change a result. */
const PLAUSIBLE = {
  edition: "1988",
  jsRounding: "even",
  unit: "in",
  places: 1,
  rounding: "up",
  style: "inch",
  symbol: false,
  sign: "always",
  decimalMark: ",",
  form: "limits",
  numbers: "inch",
  nominals: "any",
  ticks: 5,
  microarcseconds: 5,
  numerator: 3,
  denominator: 7,
  nominal: "7 mm",
  upper: "1 mm",
  lower: "0 mm",
  upperDeviation: "1 mm",
  lowerDeviation: "0 mm",
  max: "9 mm",
  min: "8 mm",
  tolerance: "1 mm",
  mean: "8 mm",
  limit: "8 mm",
  size: "7 mm",
  clearance: "1 mm",
  designation: "h6",
  text: "h6",
  letter: "h",
  grade: "IT6",
  kind: "shaft",
  hole: "H7",
  shaft: "h6",
  feature: "hole",
  most: 1,
  standard: "works standard",
  place: "page 1",
  says: "so",
  how: "caller",
  mark: "memory",
  path: ["elsewhere"],
  position: { start: 1, end: 2 },
  value: "value",
  allowed: "anything",
  fractions: "±1/64 in",
  angles: "±1°",
  decimals: { 3: "±1 mm" },
};

describe("a polluted Object.prototype", () => {
  it("is tried with every name that the library uses", () => {
    expect(NAMES.length).toBeGreaterThan(60);
    for (const name of [
      "edition",
      "jsRounding",
      "ticks",
      "unit",
      "nominal",
      "designation",
      "path",
      "decimalMark",
      "printed",
      "most",
    ]) {
      expect(NAMES).toContain(name);
    }
    expect(Object.keys(PLAUSIBLE).filter((name) => !NAMES.includes(name))).toEqual([]);
  });

  it("with values that could be meant", () => {
    expectAsClean(
      "plausible",
      `const values = ${JSON.stringify(PLAUSIBLE)};
       for (const name of Object.keys(values)) Object.prototype[name] = values[name];
       export function undo() { for (const name of Object.keys(values)) delete Object.prototype[name]; }`,
    );
  });

  it.each([
    ["texts", `"polluted"`],
    ["numbers", "0"],
    ["true", "true"],
    ["objects", "{ ticks: 5, unit: 'in', places: 0 }"],
    ["functions", "() => 'polluted'"],
  ])("with %s under every name, and toJSON, get, set, then", (name, value) => {
    expectAsClean(
      `junk-${name}`,
      `const names = ${JSON.stringify([...NAMES, "toJSON", "then", "get", "set", "writable", "defaults", "precision", "rounding", "toExpPos", "modulo", "crypto"])};
       for (const name of names) if (!(name in Object.prototype)) {
         Object.defineProperty(Object.prototype, name, { __proto__: null, value: ${value}, writable: true, enumerable: true, configurable: true });
       }
       export function undo() { for (const name of names) delete Object.prototype[name]; }`,
    );
  });

  it("with accessors that answer every read and swallow every write", () => {
    expectAsClean(
      "accessors",
      `const names = ${JSON.stringify(NAMES)};
       for (const name of names) if (!(name in Object.prototype)) {
         Object.defineProperty(Object.prototype, name, { __proto__: null, get() { return "polluted"; }, set() {}, enumerable: true, configurable: true });
       }
       export function undo() { for (const name of names) delete Object.prototype[name]; }`,
    );
  });
});

describe("tampered globals", () => {
  it("extras on the prototypes that for-in would meet", () => {
    expectAsClean(
      "extras",
      `const added = [];
       for (const proto of [Array.prototype, Number.prototype, String.prototype, Boolean.prototype, Function.prototype, RegExp.prototype, Map.prototype, Error.prototype]) {
         for (const name of ["contains", "first", "last", "each", "clone", "extra", "ticks", "unit", "value", "places"]) {
           if (!(name in proto)) { proto[name] = function () { return "extra"; }; added.push([proto, name]); }
         }
       }
       export function undo() { for (const [proto, name] of added) delete proto[name]; }`,
    );
  });

  // what old libraries are known to have left behind: toJSON on everything, and array methods of their own meaning
  it.each([
    [
      "toJSON",
      `[[Array.prototype, "toJSON", () => "tampered"], [Number.prototype, "toJSON", () => "tampered"], [String.prototype, "toJSON", () => "tampered"]]`,
    ],
    [
      "toFixed",
      `[[Number.prototype, "toFixed", () => "9"], [Number.prototype, "toPrecision", () => "9"], [Number.prototype, "toLocaleString", () => "9"]]`,
    ],
    [
      // loose equality, no index for the callback, a list where others give an iterator
      "array look-ups",
      `[
        [Array.prototype, "includes", function (one) { for (let i = 0; i < this.length; i++) if (this[i] == one) return true; return false; }],
        [Array.prototype, "find", function (test) { for (let i = 0; i < this.length; i++) if (test(this[i])) return this[i]; }],
        [Array.prototype, "entries", function () { return this.slice(); }],
        [Array.prototype, "first", function () { return this[0]; }],
        [Array.prototype, "last", function () { return this[this.length - 1]; }],
      ]`,
    ],
    [
      "array flattening",
      `[[Array.prototype, "flat", () => []], [Array.prototype, "flatten", () => []], [Array.prototype, "toSorted", () => []]]`,
    ],
    [
      "text helpers",
      `[[String.prototype, "contains", () => true], [String.prototype, "at", () => "x"], [String.prototype, "replaceAll", () => "x"], [String.prototype, "localeCompare", () => 0], [String.prototype, "toLocaleUpperCase", () => "x"]]`,
    ],
  ])("%s", (name, changes) => {
    expectAsClean(
      `tampered-${name.replaceAll(" ", "-")}`,
      `const changes = ${changes};
       const before = changes.map(([proto, name]) => [proto, name, Object.getOwnPropertyDescriptor(proto, name)]);
       for (const [proto, name, value] of changes) Object.defineProperty(proto, name, { value, writable: true, configurable: true });
       export function undo() {
         for (const [proto, name, descriptor] of before) {
           if (descriptor === undefined) delete proto[name]; else Object.defineProperty(proto, name, descriptor);
         }
       }`,
    );
  });

  it("no clock, no chance, no locale, no code from text: the results need none of them", () => {
    expectAsClean(
      "impure",
      `const broken = () => { throw new Error("must not be used"); };
       const before = { Date, Function, eval: globalThis.eval, Intl, random: Math.random, locale: Number.prototype.toLocaleString };
       globalThis.Date = broken; globalThis.Intl = undefined; globalThis.Function = broken; globalThis.eval = broken;
       Math.random = broken; Number.prototype.toLocaleString = broken;
       export function undo() {
         globalThis.Date = before.Date; globalThis.Intl = before.Intl; globalThis.Function = before.Function;
         globalThis.eval = before.eval; Math.random = before.random; Number.prototype.toLocaleString = before.locale;
       }`,
    );
  });

  it("built-ins replaced after the library was loaded", () => {
    // Object.hasOwn is what keeps a polluted prototype out: it is taken when the library loads
    const run = join(made.folder, "run-later.mjs");
    writeFileSync(
      run,
      `import { answers } from "./battery.mjs";
       import * as lib from "./lib.mjs";
       const hasOwn = Object.hasOwn;
       Object.hasOwn = () => true;
       const given = answers(lib);
       Object.hasOwn = hasOwn;
       console.log(JSON.stringify(given));`,
    );
    const output = execFileSync(process.execPath, [run], { encoding: "utf8", maxBuffer: 64 * 1024 * 1024, env: {} });
    expect(JSON.parse(output)).toEqual(clean);
  });
});

describe("the battery itself", () => {
  it("asks and gets answers, good ones and refusals, and no crash", () => {
    expect(clean.length).toBeGreaterThan(80);
    expect(clean.filter(({ text }) => text.startsWith("broke"))).toEqual([]);
    expect(clean.filter(({ text }) => text.startsWith("refused")).length).toBeGreaterThan(25);
    const seat = clean.find(({ name }) => name === "isoLimits")?.text ?? "";
    for (const words of ["40.025 mm", "40.009 mm", "IT6 = 16 µm", "frozen"]) expect(seat).toContain(words);
  });

  it("notices when the world is spoilt in a way that nobody can withstand", () => {
    const given = answersAfter(
      "hopeless",
      `const before = Object.freeze; Object.freeze = (value) => value;
       export function undo() { Object.freeze = before; }`,
    );
    expect(given).not.toEqual(clean);
  });
});
