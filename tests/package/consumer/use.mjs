import { readFileSync } from "node:fs";
import { exercise } from "./exercise.cjs";

const entries = JSON.parse(readFileSync(new URL("entries.json", import.meta.url), "utf8"));
const loaded = new Map();
for (const entry of entries) loaded.set(entry, await import(entry));
exercise((entry) => loaded.get(entry));
