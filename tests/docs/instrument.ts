/**
 * Turns an example into a module that checks what its comments claim: `expression; // → value` and
 * `expression; // throws CODE`. A claim behind a declaration is about the declared value.
 */
export function instrument(code: string): string {
  const out: string[] = [];
  for (const line of code.split("\n")) {
    const claim = /\/\/ (→|throws) /.exec(line);
    if (claim === null) {
      out.push(line);
      continue;
    }
    const kind = claim[1];
    const before = line.slice(0, claim.index).trimEnd();
    const expected = line.slice(claim.index + claim[0].length);
    // an expression over several lines is checked as a whole
    const statement = [...takeOpenLines(out), before].join("\n").replace(/;$/, "");
    const declared = /^\s*const (\w+)(?:: [^=]+)? =/.exec(statement)?.[1];
    if (kind === "throws") out.push(`__throws(() => { ${statement}; }, ${JSON.stringify(expected.trim())});`);
    else if (declared === undefined) out.push(`__is((${statement}), (${expected}));`);
    else out.push(`${statement};`, `__is(${declared}, (${expected}));`);
  }
  return `import { expect as __expect } from "vitest";
export let checked = 0;
const plain = (value: unknown): unknown => JSON.parse(JSON.stringify(value ?? null)) as unknown;
const __is = (given: unknown, expected: unknown): void => {
  checked++;
  __expect(plain(given)).toEqual(plain(expected));
};
const __throws = (task: () => unknown, code: string): void => {
  checked++;
  __expect(task).toThrowError(__expect.objectContaining({ code }));
};
${out.join("\n")}
`;
}

/** Takes back the lines of a statement that is still open: an import or declaration that ended is left. */
function takeOpenLines(out: string[]): string[] {
  const open: string[] = [];
  for (
    let line = out.at(-1);
    line !== undefined && line.trim() !== "" && !/[;{]$|\*\/$|^\/\//.test(line.trim());
    line = out.at(-1)
  ) {
    open.unshift(line);
    out.pop();
  }
  return open;
}
