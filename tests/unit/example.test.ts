import { execFileSync, spawnSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";

const ROOT = new URL("../../", import.meta.url).pathname;
const folder = mkdtempSync(join(tmpdir(), "limitsmith-example-"));

function run(...args: string[]) {
  return spawnSync(process.execPath, ["examples/grain-mill/resolve.mjs", ...args], { cwd: ROOT, encoding: "utf8" });
}

function fileWith(text: string): string {
  const path = join(folder, "drawing.json");
  writeFileSync(path, text);
  return path;
}

// `npm start` builds what the program imports
let started = "";
beforeAll(() => {
  started = execFileSync("npm", ["start", "--silent"], { cwd: ROOT, encoding: "utf8" });
}, 120_000);
afterAll(() => {
  rmSync(folder, { recursive: true });
});

describe("examples/grain-mill", () => {
  it("resolves its own drawing", () => {
    const { status, stdout, stderr } = run();
    expect(stderr).toBe("");
    expect(status).toBe(0);
    expect(started).toContain(stdout);
    expect(stdout).toContain("35.018/35.002");
    expect(stdout).toContain("21 features, 0 failed; 4 fits, 0 failed");
    expect(stdout).toContain("caution:");
  });

  it("ends with 1 where a row failed, and prints the others", () => {
    const path = fileWith(
      JSON.stringify({
        drawing: "d",
        unit: "mm",
        colour: 1,
        features: [{ id: "A", callout: "⌀17 h6" }, { id: "B", callout: "⌀17 t6" }, null],
      }),
    );
    const { status, stdout, stderr } = run(path);
    expect(status).toBe(1);
    expect(stderr).toBe("");
    expect(stdout).toContain("17.000/16.989");
    expect(stdout).toContain("ISO_DEVIATION_NOT_DEFINED");
    expect(stdout).toContain("not known, passed over: colour");
    expect(stdout).toContain("3 features, 2 failed");
  });

  it("prints sizes that the rule of conversion does not cover", () => {
    const features = [
      { id: "wide", callout: "20 ±2" },
      { id: "narrow", callout: "0.1 mm ±0.00001" },
    ];
    const { status, stdout, stderr } = run(fileWith(JSON.stringify({ drawing: "d", unit: "in", features })));
    expect(stderr).toBe("");
    expect(status).toBe(0);
    expect(stdout).toContain("22/18");
    expect(stdout).toContain("no rule of rounding");
  });

  it.each<[string, () => string, RegExp]>([
    ["a missing file", () => join(folder, "none.json"), /^cannot read .*: there is no such file$/],
    ["a folder", () => folder, /^cannot read .*/],
    ["no JSON", () => fileWith("{ drawing"), /^.* is not JSON: .*$/],
    ["no drawing", () => fileWith('{"drawing":"d","unit":"cm","features":[]}'), /^.* is not a drawing at unit: .*$/],
    ["an empty file", () => fileWith(""), /^.* is not JSON: .*$/],
  ])("%s gets one line and no stack", (_, path, line) => {
    const { status, stdout, stderr } = run(path());
    expect(status).toBe(2);
    expect(stdout).toBe("");
    expect(stderr.trimEnd().split("\n")).toHaveLength(1);
    expect(stderr.trimEnd()).toMatch(line);
  });
});
