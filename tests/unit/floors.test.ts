import { readFileSync, readdirSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { describe, expect, test } from "vitest";
import { FLOORS, brokenImports } from "./floors.js";

const src = fileURLToPath(new URL("../../src", import.meta.url));

function readSources(): Map<string, string> {
  const names = readdirSync(src, { recursive: true, encoding: "utf8" }).filter((name) => name.endsWith(".ts"));
  return new Map(names.map((name) => [name.replaceAll("\\", "/"), readFileSync(join(src, name), "utf8")]));
}

/** A small house with one more file in it, or one file in another state. */
function houseWith(file: string, text: string): Map<string, string> {
  return new Map([
    ["errors.ts", ""],
    ["index.ts", 'export * from "./units/index.js";'],
    ["units/index.ts", 'export { add } from "./add.js";'],
    ["units/add.ts", 'import { LimitsError } from "../errors.js";'],
    ["limits/index.ts", 'import { add } from "../units/index.js";'],
    ["iso286/index.ts", 'import "../limits/index.js"; export * from "./size.js";'],
    ["iso286/size.ts", 'import type { Limits } from "../limits/index.js";'],
    ["titleBlock/index.ts", ""],
    ["sheet/index.ts", 'import * as z from "zod/mini";'],
    [file, text],
  ]);
}

describe("the floors of src", () => {
  test("are kept by every import", () => {
    const sources = readSources();
    expect(sources.size).toBeGreaterThan(FLOORS.size);
    expect(brokenImports(sources)).toEqual([]);
  });

  test("a sound house has nothing to report", () => {
    expect(brokenImports(houseWith("errors.ts", ""))).toEqual([]);
  });

  test.each([
    ["an import upward", "units/add.ts", 'import { l } from "../limits/index.js";', "floor 1 imports floor 2"],
    ["a type import upward", "units/add.ts", 'import type { L } from "../limits/index.js";', "floor 1 imports floor 2"],
    ["an export from above", "limits/index.ts", 'export * from "../iso286/index.js";', "floor 2 imports floor 3"],
    ["the roof from below", "units/add.ts", 'import { x } from "../index.js";', "floor 1 imports floor 7"],
    [
      "the ground from itself upward",
      "errors.ts",
      'import { add } from "./units/index.js";',
      "floor 0 imports floor 1",
    ],
    ["another room's inside", "limits/index.ts", 'import { add } from "../units/add.js";', "inside of another room"],
    ["a sideways inside", "titleBlock/index.ts", 'import { s } from "../iso286/size.js";', "inside of another room"],
    ["a dynamic import", "units/add.ts", 'await import("../limits/index.js");', "floor 1 imports floor 2"],
    ["the type of an import", "units/add.ts", 'type L = import("../limits/index.js").L;', "floor 1 imports floor 2"],
    ["require", "units/add.ts", 'require("../limits/index.js");', "floor 1 imports floor 2"],
    ["a built-in", "units/add.ts", 'import { readFileSync } from "node:fs";', "built into Node"],
    ["a built-in by its old name", "units/add.ts", 'import { readFileSync } from "fs";', "built into Node"],
    ["zod below the sheet", "units/add.ts", 'import * as z from "zod/mini";', "zod is for sheet and schemas only"],
    ["the whole of zod", "sheet/index.ts", 'import { z } from "zod";', "only zod/mini is light enough"],
    ["an old zod", "sheet/index.ts", 'import { z } from "zod/v3";', "only zod/mini is light enough"],
    ["another package", "sheet/index.ts", 'import x from "left";', "is no dependency"],
    ["decimal.js on the ground", "errors.ts", 'import { Decimal } from "decimal.js";', "the ground stands on nothing"],
    ["a file outside src", "units/add.ts", 'import p from "../../package.json";', "is no file of src"],
    ["a missing file", "units/add.ts", 'import { x } from "./missing.js";', "is no file of src"],
    ["an unplanned room", "attic/index.ts", "", "the room attic has no floor"],
    ["an unplanned file", "helpers.ts", "", "the room helpers has no floor"],
    ["a root that loads zod", "index.ts", 'export * from "./sheet/index.js";', "reaches a room that loads zod"],
  ])("%s is reported", (_name, file, text, expected) => {
    expect(brokenImports(houseWith(file, text)).join("\n")).toContain(expected);
  });

  test("rooms of one floor may not use each other in a circle", () => {
    const house = houseWith("titleBlock/index.ts", 'import "../iso286/index.js";');
    expect(brokenImports(house)).toEqual([]);
    house.set("iso286/size.ts", 'import "../titleBlock/index.js";');
    expect(brokenImports(house).join("\n")).toContain("circle");
  });
});
