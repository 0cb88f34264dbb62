import assert from "node:assert/strict";
import { join } from "node:path";
import { run } from "./run.mjs";

/** The installed package at work: both module kinds, a worker, and where no code may be made from text. */
export function usedChecks(project) {
  const node = (...parameters) => run(process.execPath, parameters, { cwd: project });
  const ways = [
    ["as it is", []],
    ["with the Function constructor and eval stubbed", ["--require", "./noCodeFromText.cjs"]],
    ["with code from text forbidden by the engine", ["--disallow-code-generation-from-strings"]],
  ];
  return [
    ...ways.flatMap(([how, flags]) => [
      [`ESM ${how}`, () => quiet(node(...flags, "use.mjs"))],
      [`CJS ${how}`, () => quiet(node(...flags, "use.cjs"))],
    ]),
    [
      "the stub notices a call",
      () =>
        assert.rejects(
          node("--require", "./noCodeFromText.cjs", "--eval", "try { new Function() } catch {}"),
          /made from text/,
        ),
    ],
    ["ESM and CJS export the same names", () => quiet(node("sameNames.mjs"))],
    ["in a worker, and what a worker sends is accepted", () => quiet(node("worker.mjs"))],
    [
      "nothing of the inside can be imported",
      () => assert.rejects(node("--eval", 'require("limitsmith/dist/index.cjs")'), /ERR_PACKAGE_PATH_NOT_EXPORTED/),
    ],
    [
      "package.json can be read",
      async () => {
        const code = 'console.log(require("limitsmith/package.json").name)';
        assert.equal((await node("--eval", code)).trim(), "limitsmith");
      },
    ],
    ["every file of dist parses as what its name says", () => parseAll(project, node)],
  ];
}

/** A program that is content says nothing. */
async function quiet(printing) {
  assert.equal(await printing, "");
}

async function parseAll(project, node) {
  const { readdir } = await import("node:fs/promises");
  const dist = join(project, "node_modules/limitsmith/dist");
  const files = (await readdir(dist)).filter((name) => /\.c?js$/.test(name));
  for (const name of files) await node("--check", join(dist, name));
  return `${files.length} files`;
}
