import { readFileSync, readdirSync, existsSync } from "node:fs";
import { join } from "node:path";
import ts from "typescript";
import { describe, expect, it } from "vitest";

const ROOT = new URL("../../", import.meta.url).pathname;
const rooms = readdirSync(join(ROOT, "src")).filter((name) => existsSync(join(ROOT, "src", name, "index.ts")));
const entries = [join(ROOT, "src/errors.ts"), ...rooms.map((room) => join(ROOT, "src", room, "index.ts"))];
const program = ts.createProgram(entries, {
  target: ts.ScriptTarget.ES2022,
  module: ts.ModuleKind.NodeNext,
  moduleResolution: ts.ModuleResolutionKind.NodeNext,
  skipLibCheck: true,
  types: [],
});
const checker = program.getTypeChecker();
const codes = new Set(errorCodes());
const functions = publicFunctions();

describe("doc comments of public functions", () => {
  it("the functions are found", () => {
    expect(functions.length).toBeGreaterThan(45);
  });

  it.each(functions)("$name has all its parts", ({ symbol, declaration }) => {
    const tags = symbol.getJsDocTags(checker);
    const textsOf = (name: string): string[] =>
      tags.filter((tag) => tag.name === name).map((tag) => ts.displayPartsToString(tag.text).trim());

    expect(ts.displayPartsToString(symbol.getDocumentationComment(checker)), "summary").toMatch(/\S\./);
    expect(
      textsOf("param").map((text) => /^\w+/.exec(text)?.[0]),
      "a @param for each parameter",
    ).toEqual(declaration.parameters.map((parameter) => parameter.name.getText()));
    for (const text of textsOf("param")) expect(text, "a @param says what it is").toMatch(/^\w+\s+(?:- )?\S+ \S+/);
    const [returns = "", ...moreReturns] = textsOf("returns");
    expect(returns, "@returns").not.toBe("");
    expect(moreReturns).toEqual([]);
    expect([...textsOf("param"), returns].join(" "), "units are named").toMatch(
      /\bunits?\b|\bmm\b|µm|\binch|degree|\bticks?\b|\bMPa\b|\bpsi\b|N·m|arc second/,
    );
    const throws = textsOf("throws").join(" ");
    expect(throws, "@throws names codes, or says nothing").toMatch(/^nothing|`[A-Z]+_[A-Z_]+`|what \S/);
    for (const [, code = ""] of throws.matchAll(/`([A-Z_]+)`/g)) expect(codes).toContain(code);
    const example = textsOf("example").join("\n");
    expect(example, "a runnable @example").toContain("```ts\n");
    expect(example, "an @example says a result").toMatch(/\/\/ (?:→|throws) /);
    expect(textsOf("reference").join(" "), "@reference").not.toBe("");
  });
});

describe("docs/errors.md", () => {
  it("lists each code once, and no other", () => {
    const table = readFileSync(join(ROOT, "docs/errors.md"), "utf8").matchAll(/^\| `([A-Z_]+)` *\| ([^|]+)\|$/gm);
    const rows = [...table].map(([, code = "", meaning = ""]) => ({ code, meaning: meaning.trim() }));
    expect(rows.map(({ code }) => code).sort()).toEqual([...codes].sort());
    for (const { meaning } of rows) expect(meaning.length).toBeGreaterThan(10);
  });

  it("every code is used in src", () => {
    const sources = readdirSync(join(ROOT, "src"), { recursive: true, encoding: "utf8" })
      .filter((name) => name.endsWith(".ts") && name !== "errors.ts")
      .map((name) => readFileSync(join(ROOT, "src", name), "utf8").replace(/^ *(?:\/\*\*| \*).*$/gm, ""))
      .join("\n");
    expect([...codes].filter((code) => !sources.includes(`"${code}"`))).toEqual([]);
  });
});

function publicFunctions() {
  const found = new Map<string, { name: string; symbol: ts.Symbol; declaration: ts.SignatureDeclaration }>();
  for (const entry of entries) {
    const file = program.getSourceFile(entry);
    const module = file === undefined ? undefined : checker.getSymbolAtLocation(file);
    if (module === undefined) continue;
    for (const exported of checker.getExportsOfModule(module)) {
      const symbol = (exported.flags & ts.SymbolFlags.Alias) === 0 ? exported : checker.getAliasedSymbol(exported);
      const declaration = symbol.declarations?.find(ts.isFunctionDeclaration);
      if (declaration !== undefined) found.set(symbol.name, { name: symbol.name, symbol, declaration });
    }
  }
  return [...found.values()];
}

function errorCodes(): string[] {
  const file = program.getSourceFile(entries[0] ?? "");
  const union = file?.statements.find(
    (statement): statement is ts.TypeAliasDeclaration =>
      ts.isTypeAliasDeclaration(statement) && statement.name.text === "ErrorCode",
  );
  if (union === undefined || !ts.isUnionTypeNode(union.type)) throw new Error("ErrorCode is not a union");
  return union.type.types.map((member) => member.getText().replaceAll('"', ""));
}
