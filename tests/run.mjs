// `npm test`: everything that must hold, the quick things first; stops at the first step that fails.

import { spawnSync } from "node:child_process";
import { mkdirSync, readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("..", import.meta.url));
const reports = join(root, "reports");
const suitesReport = join(reports, "suites.json");
const packageReport = join(reports, "packed.json");

const STEPS = [
  { name: "types", script: "typecheck" },
  { name: "lint and format", script: "lint" },
  {
    name: "suites",
    script: "test:suites",
    extra: ["--reporter=dot", "--reporter=json", `--outputFile.json=${suitesReport}`],
    count: countSuites,
  },
  { name: "API site", script: "docs:api" },
  { name: "build", script: "build" },
  { name: "package as packed", script: "check:package", extra: [packageReport], count: countPackage },
];

/** Vitest's tests; a file that cannot be loaded has none, and counts as one that failed. */
function countSuites() {
  const report = JSON.parse(readFileSync(suitesReport, "utf8"));
  const broken = report.testResults.filter(
    ({ status, assertionResults }) => status === "failed" && assertionResults.length === 0,
  );
  return { passed: report.numPassedTests, failed: report.numFailedTests + broken.length };
}

function countPackage() {
  return JSON.parse(readFileSync(packageReport, "utf8"));
}

/** Runs one step; one that does not count its own checks is one check. */
function runStep({ name, script, extra = [], count }) {
  console.log(`\n— ${name}`);
  const started = performance.now();
  const { status } = spawnSync("npm", ["run", "--silent", script, "--", ...extra], {
    cwd: root,
    stdio: "inherit",
    shell: process.platform === "win32",
  });
  const seconds = ((performance.now() - started) / 1000).toFixed(1);
  const well = status === 0;
  console.log(`— ${name}: ${well ? "passed" : "FAILED"} in ${seconds} s`);
  const counted = countOf(count, well);
  // a step that ends badly without a failed check of its own has failed as a whole
  return well || counted.failed > 0 ? { well, ...counted } : { well, passed: counted.passed, failed: 1 };
}

function countOf(count, well) {
  if (count === undefined) return { passed: well ? 1 : 0, failed: well ? 0 : 1 };
  try {
    return count();
  } catch {
    return { passed: 0, failed: 1 };
  }
}

rmSync(suitesReport, { force: true });
rmSync(packageReport, { force: true });
mkdirSync(reports, { recursive: true });

let passed = 0;
let failed = 0;
for (const step of STEPS) {
  const result = runStep(step);
  passed += result.passed;
  failed += result.failed;
  if (!result.well) break;
}
console.log(`\n${passed} passed, ${failed} failed`);
process.exitCode = failed === 0 ? 0 : 1;
