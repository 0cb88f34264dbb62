// How long a fresh process takes to load a package: measured inside the process, around the import alone.

import { spawnSync } from "node:child_process";

const RUNS = 21;

/** Median of the times to import each package, in ms, the packages taken in turn so that all see the same machine. */
export function coldImports(names: readonly string[], kind: "import" | "require"): number[] {
  const times = names.map((): number[] => []);
  for (let run = 0; run < RUNS; run++) {
    names.forEach((name, index) => times[index]?.push(oneImport(name, kind)));
  }
  return times.map(median);
}

function oneImport(name: string, kind: "import" | "require"): number {
  const load = kind === "import" ? `await import("${name}")` : `require("${name}")`;
  const code = `const start = performance.now(); ${load}; console.log(performance.now() - start);`;
  const type = kind === "import" ? "module" : "commonjs";
  const child = spawnSync(process.execPath, [`--input-type=${type}`, "--eval", code], { encoding: "utf8" });
  if (child.status !== 0) throw new Error(child.stderr);
  return Number(child.stdout);
}

function median(values: readonly number[]): number {
  return [...values].sort((a, b) => a - b)[values.length >> 1] ?? Number.NaN;
}
