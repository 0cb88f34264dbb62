import { mkdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import ts from "typescript";
import { describe, expect, it } from "vitest";
import { resolveSheet } from "limitsmith/sheet";
import { commentBlocks, documentBlocks } from "./collect.js";
import type { CodeBlock } from "./collect.js";
import { instrument } from "./instrument.js";

const ROOT = new URL("../../", import.meta.url).pathname;
const GENERATED = join(ROOT, "tests/.generated");
const inComments = commentBlocks();
const inDocuments = documentBlocks();
const examples = [...inComments, ...inDocuments]
  .filter(({ language }) => language === "ts")
  .map((block, index) => ({
    ...block,
    name: `${block.file}:${block.line}`,
    path: join(GENERATED, `example${index}.ts`),
  }));

rmSync(GENERATED, { recursive: true, force: true });
mkdirSync(GENERATED, { recursive: true });
for (const { code, path } of examples) writeFileSync(path, instrument(code));

describe("examples", () => {
  it("there are examples at all", () => {
    expect(examples.length).toBeGreaterThan(40);
  });

  it("compile under strict types, as written", { timeout: 60_000 }, () => {
    const sources = new Map(examples.map(({ code, path }) => [path, `${code}\nexport {};\n`]));
    expect(typeErrors(sources)).toEqual([]);
  });

  it.each(examples)("$name runs and says what is true", async ({ path, code }) => {
    const checks = (await import(path)) as { readonly checked: number };
    expect(checks.checked).toBe(code.match(/\/\/ (?:→|throws) /g)?.length ?? 0);
  });

  it("every example says at least one result", () => {
    expect(examples.filter(({ code }) => !/\/\/ (?:→|throws) /.test(code)).map(({ name }) => name)).toEqual([]);
  });

  it("the checker of examples finds a wrong one", async () => {
    const path = join(GENERATED, "wrong.ts");
    writeFileSync(path, instrument('import { mm } from "limitsmith";\nmm(1).toString(); // → "2 mm"\n'));
    await expect(import(path)).rejects.toThrow("1 mm");
  });
});

describe("other code blocks", () => {
  const others = inDocuments.filter(({ language }) => language !== "ts");

  it("are of a kind that is run here, or a plan", () => {
    const unknown = others.filter(({ language }) => !["sh", "json", "txt"].includes(language));
    expect(unknown.map(({ file, line, language }) => `${file}:${line} ${language}`)).toEqual([]);
    expect(inComments.filter(({ language }) => language !== "ts")).toEqual([]);
  });

  it.each(others.filter(isJson))("$file:$line is a drawing that resolves", ({ code }) => {
    const sheet = resolveSheet(JSON.parse(code));
    expect(sheet.counts.failed).toBe(0);
    expect(sheet.unknownKeys).toEqual([]);
  });

  const scripts = Object.keys(
    (JSON.parse(readFileSync(join(ROOT, "package.json"), "utf8")) as { scripts: Record<string, string> }).scripts,
  );
  const commands = others
    .filter(({ language }) => language === "sh")
    .flatMap(({ code, file }) => code.split("\n").map((command) => ({ command, file })));

  it.each(commands)("$file: $command calls what exists", ({ command }) => {
    for (const part of command.split("&&")) {
      const words = part.trim().split(" ");
      const script = words[1] === "run" ? words[2] : words[1];
      if (words[0] === "npm" && ["ci", "install", "pack", "publish", "version"].includes(script ?? "")) continue;
      expect(words[0]).toMatch(/^(?:npm|git)$/);
      if (words[0] === "npm") expect(scripts).toContain(script);
    }
  });
});

function isJson({ language }: CodeBlock): boolean {
  return language === "json";
}

function typeErrors(sources: ReadonlyMap<string, string>): string[] {
  const options: ts.CompilerOptions = {
    strict: true,
    noUncheckedIndexedAccess: true,
    exactOptionalPropertyTypes: true,
    noEmit: true,
    skipLibCheck: true,
    target: ts.ScriptTarget.ES2022,
    module: ts.ModuleKind.ESNext,
    moduleResolution: ts.ModuleResolutionKind.Bundler,
    allowImportingTsExtensions: true,
    types: ["node"],
    paths: {
      limitsmith: [join(ROOT, "src/index.ts")],
      "limitsmith/errors": [join(ROOT, "src/errors.ts")],
      "limitsmith/*": [join(ROOT, "src/*/index.ts")],
    },
  };
  const host = ts.createCompilerHost(options);
  const fromDisk = host.getSourceFile.bind(host);
  const existsOnDisk = host.fileExists.bind(host);
  host.fileExists = (name) => sources.has(name) || existsOnDisk(name);
  host.getSourceFile = (name, language, ...rest) => {
    const text = sources.get(name);
    return text === undefined ? fromDisk(name, language, ...rest) : ts.createSourceFile(name, text, language);
  };
  const program = ts.createProgram([...sources.keys()], options, host);
  return ts.getPreEmitDiagnostics(program).map((diagnostic) => {
    const place = diagnostic.file?.fileName ?? "";
    const name = examples.find(({ path }) => path === place)?.name ?? place;
    return `${name}: ${ts.flattenDiagnosticMessageText(diagnostic.messageText, "\n")}`;
  });
}
