import { isBuiltin } from "node:module";
import { posix } from "node:path";
import ts from "typescript";

/** What stands on which floor; a room that is not here has not been planned yet. */
export const FLOORS: ReadonlyMap<string, number> = new Map([
  ["errors", 0],
  ["basis", 0],
  ["ownValue", 0],
  ["located", 0],
  ["units", 1],
  ["limits", 2],
  ["iso286", 3],
  ["inchFits", 3],
  ["titleBlock", 3],
  ["finish", 3],
  ["keys", 4],
  ["compare", 4],
  ["callout", 5],
  ["sheet", 6],
  ["schemas", 6],
  ["picture", 6],
]);

const ROOF = "index";
const ROOF_FLOOR = 7;
const ROOMS_WITH_ZOD: ReadonlySet<string> = new Set(["sheet", "schemas"]);

/** Source texts by path below src, such as `"units/add.ts"`. */
export type Sources = ReadonlyMap<string, string>;

/** Every import that breaks the plan of the house, one line each. */
export function brokenImports(sources: Sources): string[] {
  const problems: string[] = [];
  const uses = new Map<string, Set<string>>();
  for (const [file, text] of sources) {
    const room = roomOf(file);
    if (floorOf(room) === undefined) {
      problems.push(`${file}: the room ${room} has no floor`);
      continue;
    }
    for (const { fileName: target } of ts.preProcessFile(text, true, true).importedFiles) {
      const why = target.startsWith(".") ? wrongPath(sources, file, target) : wrongPackage(room, target);
      if (why !== null) problems.push(`${file}: ${target}: ${why}`);
      if (target.startsWith(".")) addTo(uses, room, roomOf(resolve(file, target)));
    }
  }
  for (const circle of circles(uses)) problems.push(`rooms use each other in a circle: ${circle}`);
  if (reaches(uses, ROOF, ROOMS_WITH_ZOD)) problems.push("index.ts: reaches a room that loads zod");
  return problems;
}

function wrongPath(sources: Sources, from: string, target: string): string | null {
  const to = resolve(from, target);
  if (to.startsWith("../") || !sources.has(to)) return "is no file of src";
  const [here, there] = [roomOf(from), roomOf(to)];
  if (here === there) return null;
  const [floorHere, floorThere] = [floorOf(here), floorOf(there)];
  if (floorThere === undefined) return `the room ${there} has no floor`;
  if (floorThere > (floorHere ?? -1)) return `floor ${floorHere} imports floor ${floorThere}`;
  if (to.includes("/") && to !== `${there}/index.ts`) return "is the inside of another room; use its index.js";
  return null;
}

function wrongPackage(room: string, target: string): string | null {
  if (isBuiltin(target)) return "is built into Node";
  if (target === "decimal.js") return floorOf(room) === 0 ? "the ground stands on nothing" : null;
  if (target === "zod/mini") return ROOMS_WITH_ZOD.has(room) ? null : "zod is for sheet and schemas only";
  return target === "zod" || target.startsWith("zod/") ? "only zod/mini is light enough" : "is no dependency";
}

/** `units` for units/add.ts, `errors` for errors.ts. */
function roomOf(file: string): string {
  return (file.split("/")[0] ?? "").replace(/\.ts$/, "");
}

function floorOf(room: string): number | undefined {
  return room === ROOF ? ROOF_FLOOR : FLOORS.get(room);
}

function resolve(from: string, target: string): string {
  return posix.join(posix.dirname(from), target).replace(/\.js$/, ".ts");
}

function addTo(uses: Map<string, Set<string>>, from: string, to: string): void {
  if (from === to) return;
  const set = uses.get(from) ?? new Set();
  uses.set(from, set.add(to));
}

function circles(uses: ReadonlyMap<string, ReadonlySet<string>>): string[] {
  return [...uses.keys()].filter((room) => reaches(uses, room, new Set([room])));
}

/** True if a room uses one of the others, itself or through rooms that it uses. */
function reaches(uses: ReadonlyMap<string, ReadonlySet<string>>, from: string, aims: ReadonlySet<string>): boolean {
  const seen = new Set<string>();
  const open = [...(uses.get(from) ?? [])];
  for (let room = open.pop(); room !== undefined; room = open.pop()) {
    if (aims.has(room)) return true;
    if (seen.has(room)) continue;
    seen.add(room);
    open.push(...(uses.get(room) ?? []));
  }
  return false;
}
