import { readFileSync, readdirSync } from "node:fs";
import { join } from "node:path";

/** A code block of a document or of a doc comment. */
export interface CodeBlock {
  readonly file: string;
  readonly line: number;
  readonly language: string;
  readonly code: string;
}

const ROOT = new URL("../../", import.meta.url).pathname;

/** Every code block of the README, the contributors' guide and docs/. */
export function documentBlocks(): CodeBlock[] {
  const docs = readdirSync(join(ROOT, "docs")).filter((name) => name.endsWith(".md"));
  return ["README.md", "DEVELOPERS.md", ...docs.map((name) => `docs/${name}`)].flatMap((file) =>
    blocksIn(file, readFileSync(join(ROOT, file), "utf8").split("\n")),
  );
}

/** Every code block of the doc comments in src. */
export function commentBlocks(): CodeBlock[] {
  const sources = readdirSync(join(ROOT, "src"), { recursive: true, encoding: "utf8" });
  return sources
    .filter((name) => name.endsWith(".ts"))
    .sort()
    .flatMap((name) => {
      const lines = readFileSync(join(ROOT, "src", name), "utf8").split("\n");
      return blocksIn(
        `src/${name}`,
        lines.map((line) => line.replace(/^ *\* ?/, "")),
      );
    });
}

function blocksIn(file: string, lines: readonly string[]): CodeBlock[] {
  const blocks: CodeBlock[] = [];
  let open: { line: number; language: string; code: string[] } | undefined;
  lines.forEach((line, index) => {
    const fence = /^```(\w*)$/.exec(line);
    if (fence === null) open?.code.push(line);
    else if (open === undefined) open = { line: index + 1, language: fence[1] ?? "", code: [] };
    else {
      blocks.push({ file, line: open.line, language: open.language, code: open.code.join("\n") });
      open = undefined;
    }
  });
  if (open !== undefined) throw new Error(`${file}:${open.line}: the code block is not closed`);
  return blocks;
}
