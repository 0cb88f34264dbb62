import assert from "node:assert/strict";
import { readFileSync } from "node:fs";
import { createRequire } from "node:module";

const require = createRequire(import.meta.url);
for (const entry of JSON.parse(readFileSync(new URL("entries.json", import.meta.url), "utf8"))) {
  const names = Object.keys(await import(entry)).filter((name) => name !== "default" && name !== "module.exports");
  assert.deepEqual(names.sort(), Object.keys(require(entry)).sort(), entry);
  assert.ok(names.length > 0, `${entry} exports nothing`);
}
