import assert from "node:assert/strict";
import { createContext, runInContext } from "node:vm";
import { gzipSync } from "node:zlib";
import { build } from "esbuild";

// what a page ships that turns classes and fits into limits; the searches of the room come on top of it
const ISO286_BUDGET = 12_000;
const ISO286_LIMITS = "isoLimits, isoFit, isoDeviations, standardTolerance, fundamentalDeviation, parseToleranceClass";
const WITH_ZOD = new Set(["limitsmith/sheet", "limitsmith/schemas"]);
const WITHOUT_DECIMAL = new Set([
  "limitsmith/iso286",
  "limitsmith/limits",
  "limitsmith/errors",
  "limitsmith/titleBlock",
  "limitsmith/callout",
  "limitsmith/inchFits",
  "limitsmith/compare",
]);

/** Each entry through a bundler, as a page would ship it. */
export function bundledChecks(project, entries) {
  return [
    ...entries.map((entry) => [`${entry}: bundled for a page`, () => checkEntry(project, entry)]),
    [
      "limits and fits of limitsmith/iso286, without its searches",
      async () => {
        const { packages, bytes, gzip } = await bundle(
          project,
          `export { ${ISO286_LIMITS} } from "limitsmith/iso286";`,
        );
        assert.deepEqual(packages, ["limitsmith"]);
        assert.ok(gzip <= ISO286_BUDGET, `${gzip} bytes gzipped, more than the ${ISO286_BUDGET} it may have`);
        return sizes(bytes, gzip);
      },
    ],
    [
      "what a page does not use is dropped: mm alone",
      async () => {
        const { packages, bytes, gzip } = await bundle(project, 'export { mm } from "limitsmith";');
        assert.deepEqual(packages, ["limitsmith"]);
        return sizes(bytes, gzip);
      },
    ],
  ];
}

async function checkEntry(project, entry) {
  const { code, packages, bytes, gzip } = await bundle(project, `export * from "${entry}";`);
  assert.equal(packages.includes("zod"), WITH_ZOD.has(entry), `zod in it: ${packages.includes("zod")}`);
  if (WITHOUT_DECIMAL.has(entry)) assert.ok(!packages.includes("decimal.js"), "it holds decimal.js");
  assert.deepEqual(
    packages.filter((name) => !["limitsmith", "decimal.js", "zod"].includes(name)),
    [],
  );
  runOnStrictPage(code);
  return `${sizes(bytes, gzip)}  ${packages.filter((name) => name !== "limitsmith").join(", ")}`.trimEnd();
}

/** The bundle as a script, its size, and the packages of which anything is in it. */
async function bundle(project, contents) {
  const { outputFiles, metafile } = await build({
    stdin: { contents, resolveDir: project },
    absWorkingDir: project,
    bundle: true,
    minify: true,
    platform: "browser",
    format: "iife",
    globalName: "room",
    metafile: true,
    write: false,
    logLevel: "silent",
  });
  const [{ text, contents: data }] = outputFiles;
  const used = Object.values(metafile.outputs).flatMap(({ inputs }) =>
    Object.entries(inputs).filter(([, { bytesInOutput }]) => bytesInOutput > 0),
  );
  const packages = [...new Set(used.flatMap(([path]) => /node_modules\/([^/]+)\//.exec(path)?.[1] ?? []))].sort();
  return { code: text, packages, bytes: data.length, gzip: gzipSync(data, { level: 9 }).length };
}

/** Runs it where there is nothing but the language, and no code may be made from text. */
function runOnStrictPage(code) {
  const page = createContext({}, { codeGeneration: { strings: false, wasm: false } });
  runInContext(code, page);
  assert.ok(runInContext("Object.keys(room).length", page) > 0, "it exports nothing");
}

function sizes(bytes, gzip) {
  return `${String(bytes).padStart(6)} bytes minified, ${String(gzip).padStart(5)} gzipped`;
}
