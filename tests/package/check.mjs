// Proves the package as packed: what the tarball holds, its types, its bundles, and that it works when installed in
// a project elsewhere. Needs a finished build, and the registry for decimal.js and zod.

import { copyFile, mkdir, mkdtemp, readFile, readdir, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { bundledChecks } from "./bundled.mjs";
import { pack, packedChecks } from "./packed.mjs";
import { run } from "./run.mjs";
import { runChecks } from "./runChecks.mjs";
import { typedChecks } from "./typed.mjs";
import { usedChecks } from "./used.mjs";

const root = fileURLToPath(new URL("../..", import.meta.url));
const consumer = fileURLToPath(new URL("consumer", import.meta.url));

/** A project elsewhere that has the tarball installed, and the small programs of `consumer`. */
async function installInto(project, tarball) {
  await mkdir(project);
  await writeFile(join(project, "package.json"), JSON.stringify({ name: "consumer", private: true }));
  await run("npm", ["install", "--prefer-offline", "--no-audit", "--no-fund", tarball], { cwd: project });
  for (const name of await readdir(consumer)) {
    if (/\.[cm]js$/.test(name)) await copyFile(join(consumer, name), join(project, name));
  }
}

const temporary = await mkdtemp(join(tmpdir(), "limitsmith-package-"));
try {
  const pkg = JSON.parse(await readFile(join(root, "package.json"), "utf8"));
  const entries = Object.keys(pkg.exports)
    .filter((path) => path !== "./package.json")
    .map((path) => path.replace(".", pkg.name));
  const packed = await pack(root, temporary);
  const project = join(temporary, "consumer");
  await installInto(project, packed.tarball);
  await writeFile(join(project, "entries.json"), JSON.stringify(entries));
  const { passed, failed } = await runChecks([
    ...packedChecks(root, packed, pkg),
    ...(await typedChecks(root, project, consumer)),
    ...bundledChecks(project, entries),
    ...usedChecks(project),
  ]);
  console.log(`  ${passed} passed, ${failed} failed`);
  const report = process.argv[2];
  if (report !== undefined) await writeFile(report, JSON.stringify({ passed, failed }));
  process.exitCode = failed === 0 ? 0 : 1;
} finally {
  await rm(temporary, { recursive: true, force: true });
}
