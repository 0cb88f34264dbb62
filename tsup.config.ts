import { existsSync, readFileSync, readdirSync, rmSync } from "node:fs";
import { defineConfig } from "tsup";
import type { Options } from "tsup";

type EsbuildPlugin = NonNullable<Options["esbuildPlugins"]>[number];

/** The root, the errors, and every room: a folder of src with an index.ts. */
function publicEntries(): Record<string, string> {
  const entries: Record<string, string> = { index: "src/index.ts", errors: "src/errors.ts" };
  for (const room of readdirSync("src")) {
    const index = `src/${room}/index.ts`;
    if (existsSync(index)) entries[room] = index;
  }
  return entries;
}

/** Files of units that do without decimal.js; not its index.ts, which leads to all of them. */
function lightUnits(): string[] {
  return readdirSync("src/units")
    .filter((name) => name.endsWith(".ts") && name !== "index.ts")
    .map((name) => `src/units/${name}`)
    .filter((file) => !readFileSync(file, "utf8").includes('from "decimal.js"'));
}

/**
 * Steers how esbuild splits the code. It puts files into one chunk when the same entries reach them. Left alone
 * it would put a file that imports decimal.js together with the rest of units: every room would load decimal.js,
 * and no bundler could drop it. Two made-up entries mend that: one reaches the rest of units and nothing else,
 * and `errors` reaches it too, which saves the root a file to load.
 */
const steerSplitting: EsbuildPlugin = {
  name: "steer-splitting",
  setup(build) {
    const units = lightUnits().map((file) => `import "./${file}";`);
    build.onResolve({ filter: /^made-up:/ }, ({ path }) => ({ path, namespace: "made-up" }));
    build.onLoad({ filter: /:units$/, namespace: "made-up" }, () => ({
      contents: units.join("\n"),
      resolveDir: process.cwd(),
    }));
    build.onLoad({ filter: /:errors$/, namespace: "made-up" }, () => ({
      contents: ['export * from "./src/errors.ts";', ...units].join("\n"),
      resolveDir: process.cwd(),
    }));
  },
};

const entries = publicEntries();

export default defineConfig({
  entry: entries,
  format: ["esm", "cjs"],
  // `--no-dts` leaves the declarations out
  dts: { entry: entries },
  target: "es2022",
  platform: "neutral",
  // rooms share their floors, so that a program that uses two rooms holds one copy of each
  splitting: true,
  esbuildPlugins: [steerSplitting],
  esbuildOptions: (options) => {
    options.entryPoints = { ...entries, errors: "made-up:errors", "made-up/units": "made-up:units" };
  },
  // through rollup, because the other way of splitting CJS rewrites `?.` and `??` into slow helpers;
  // nothing is imported for its side effects alone, so a room does not load a chunk that it does not use
  treeshake: { moduleSideEffects: false },
  clean: true,
  silent: true,
  onSuccess: () => {
    rmSync("dist/made-up", { recursive: true });
    return Promise.resolve();
  },
});
