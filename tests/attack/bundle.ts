import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { build } from "esbuild";

/** The root entry as one plain module in a folder of its own, for processes and workers outside the test runner. */
export interface Bundle {
  readonly folder: string;
  /** Path of the module. */
  readonly lib: string;
  /** Takes the folder away again. */
  remove(): void;
}

/** Bundles src as it stands, decimal.js included. */
export async function bundle(): Promise<Bundle> {
  const folder = mkdtempSync(join(tmpdir(), "limits-attack-"));
  const lib = join(folder, "lib.mjs");
  await build({
    entryPoints: [fileURLToPath(new URL("../../src/index.ts", import.meta.url))],
    outfile: lib,
    bundle: true,
    format: "esm",
    target: "es2022",
    platform: "neutral",
    mainFields: ["module", "main"],
    logLevel: "warning",
  });
  return {
    folder,
    lib,
    remove: () => {
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
