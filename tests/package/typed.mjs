import { copyFile, mkdir, writeFile } from "node:fs/promises";
import { join } from "node:path";
import { run } from "./run.mjs";

const COMPILERS = ["typescript-oldest", "typescript", "typescript-newest"];
const KINDS = [
  { name: "nodenext, ESM", module: "NodeNext", moduleResolution: "NodeNext", file: "types.mts" },
  { name: "nodenext, CJS", module: "NodeNext", moduleResolution: "NodeNext", file: "types.cts" },
  { name: "bundler", module: "ESNext", moduleResolution: "Bundler", file: "types.ts" },
];

/** A caller's TypeScript, checked against the installed package by each compiler under each resolution. */
export async function typedChecks(root, project, consumer) {
  const checks = [];
  for (const { name, file, module, moduleResolution } of KINDS) {
    const folder = join(project, `types-${file.replace(".", "-")}`);
    await mkdir(folder);
    await copyFile(join(consumer, "types.ts"), join(folder, file));
    await writeFile(join(folder, "tsconfig.json"), JSON.stringify(settings(file, module, moduleResolution), null, 2));
    for (const compiler of COMPILERS) {
      const tsc = join(root, "node_modules", compiler, "bin/tsc");
      const version = (await run(process.execPath, [tsc, "--version"])).trim();
      checks.push([
        `types hold under ${name}, TypeScript ${version.replace("Version ", "")}`,
        async () => void (await run(process.execPath, [tsc, "-p", folder])),
      ]);
    }
  }
  return checks;
}

function settings(file, module, moduleResolution) {
  return {
    compilerOptions: {
      target: "ES2022",
      lib: ["ES2022", "DOM"],
      module,
      moduleResolution,
      strict: true,
      exactOptionalPropertyTypes: true,
      noUncheckedIndexedAccess: true,
      // our declarations and those that they lead to are checked too
      skipLibCheck: false,
      types: [],
      noEmit: true,
    },
    files: [file],
  };
}
