import assert from "node:assert/strict";
import { readFile, readdir } from "node:fs/promises";
import { join } from "node:path";
import { publint } from "publint";
import { formatMessage } from "publint/utils";
import { run } from "./run.mjs";

/** Packs the package into a folder; gives the path of the tarball and what it holds. */
export async function pack(root, folder) {
  const printed = await run("npm", ["pack", "--json", "--pack-destination", folder], { cwd: root });
  const [{ filename, files, size }] = JSON.parse(printed);
  return { tarball: join(folder, filename), files: files.map(({ path }) => path), size };
}

/** What the tarball holds, and that it is whole. */
export function packedChecks(root, { tarball, files, size }, pkg) {
  return [
    [
      "the tarball holds dist, README, LICENSE, CHANGELOG and package.json, and nothing else",
      () => {
        const allowed = new Set(["README.md", "LICENSE", "CHANGELOG.md", "package.json"]);
        const odd = files.filter((path) => !allowed.has(path) && !/^dist\/[\w-]+\.(?:js|cjs|d\.ts|d\.cts)$/.test(path));
        assert.deepEqual(odd, []);
        assert.deepEqual(
          [...allowed].filter((path) => !files.includes(path)),
          [],
        );
        return `${files.length} files, ${size} bytes packed`;
      },
    ],
    [
      "every file that package.json names is there",
      () => {
        const named = [...pathsIn(pkg.exports), pkg.main, pkg.module, pkg.types].map((path) => path.replace("./", ""));
        assert.deepEqual(
          named.filter((path) => !files.includes(path)),
          [],
        );
      },
    ],
    [
      "every room of src is an entry",
      async () => {
        const inside = await readdir(join(root, "src"), { recursive: true });
        const rooms = inside
          .map((path) => /^(\w+)[\\/]index\.ts$/.exec(path)?.[1])
          .filter((room) => room !== undefined);
        assert.ok(rooms.length > 0);
        assert.deepEqual(
          rooms.filter((room) => !(`./${room}` in pkg.exports)),
          [],
        );
      },
    ],
    [
      "at run time it needs decimal.js and zod, and nothing else",
      () => {
        assert.deepEqual(Object.keys(pkg.dependencies).sort(), ["decimal.js", "zod"]);
        for (const kind of ["peerDependencies", "optionalDependencies", "bundleDependencies"]) {
          assert.equal(pkg[kind], undefined, kind);
        }
      },
    ],
    [
      "publint has nothing to say",
      async () => {
        const data = await readFile(tarball);
        const { messages } = await publint({ strict: true, pack: { tarball: data.buffer.slice(data.byteOffset) } });
        assert.deepEqual(
          messages.map((message) => formatMessage(message, pkg, { color: false })),
          [],
        );
      },
    ],
    [
      "are-the-types-wrong has nothing to say",
      async () => {
        const attw = join(root, "node_modules/@arethetypeswrong/cli/dist/index.js");
        await run(process.execPath, [attw, tarball, "--profile", "node16", "--no-color", "--format", "ascii"]);
      },
    ],
  ];
}

function pathsIn(exports) {
  return typeof exports === "string" ? [exports] : Object.values(exports).flatMap(pathsIn);
}
