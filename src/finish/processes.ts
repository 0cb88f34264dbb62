import { LimitsError } from "../errors.js";
import { ANSI_PROCESS_GRADES } from "./tables/processGradesAnsi.js";
import { ISO_PROCESS_GRADES } from "./tables/processGradesIso.js";
import { PROCESS_NAMES } from "./tables/processNames.js";
import type { ProcessName } from "./tables/processNames.js";
import { PROCESS_TOLERANCES_MM } from "./tables/processTolerances.js";

const LONGEST_NAME = 80;

let known: ReadonlyMap<string, ProcessName> | undefined;

/** Every trade name, and every line of a grade chart or table that has no trade name of its own. */
function names(): ReadonlyMap<string, ProcessName> {
  if (known !== undefined) return known;
  const map = new Map<string, ProcessName>();
  for (const entry of PROCESS_NAMES) for (const name of [entry.name, ...entry.also]) map.set(key(name), entry);
  const add = (name: string, lines: Partial<ProcessName>): void => {
    if (map.has(key(name))) return;
    map.set(key(name), { name, also: [], roughness: null, ansi: [], iso: [], tolerance: [], ...lines });
  };
  for (const { row } of ANSI_PROCESS_GRADES) add(row, { ansi: [row] });
  for (const row of ISO_PROCESS_GRADES.flatMap((line) => line.rows)) add(row, { iso: [row] });
  for (const { row } of PROCESS_TOLERANCES_MM) add(row, { tolerance: [row] });
  return (known = map);
}

/** All entries, once each, in their order. */
export function allProcesses(): readonly ProcessName[] {
  return [...new Set(names().values())];
}

/** The entry behind a trade name; blanks and the case of letters do not matter. */
export function processOf(process: string): ProcessName {
  const given: unknown = process;
  const text = typeof given === "string" && given.length <= LONGEST_NAME ? given : "";
  const entry = names().get(key(text));
  if (entry === undefined) {
    throw new LimitsError("PROCESS_UNKNOWN", "no chart has a process of this name", {
      value: given,
      allowed: "a name of processNames(), such as turning, milling, cylindrical grinding",
    });
  }
  return entry;
}

function key(name: string): string {
  return name.trim().toLowerCase().split(/\s+/).join(" ");
}
