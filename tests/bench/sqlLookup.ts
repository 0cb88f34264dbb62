// Baseline: one indexed look-up in an SQL database inside the process, which gives two numbers and nothing else.

import initSqlJs from "sql.js";
import { isoDeviations, mm } from "limitsmith";
import { STEP_ENDS_MM } from "./steps.js";

/** Looks up the two deviations of a class for a size in mm; gives their sum, so that nothing is left out. */
export type Lookup = (sizeMm: number, toleranceClass: string) => number;

const TABLE =
  "CREATE TABLE deviations (class TEXT, upto REAL, upper REAL, lower REAL, PRIMARY KEY (class, upto)) WITHOUT ROWID";
const INSERT = "INSERT INTO deviations VALUES (?, ?, ?, ?)";
const SELECT = "SELECT upper, lower FROM deviations WHERE class = ? AND upto >= ? ORDER BY upto LIMIT 1";

function rows(classes: readonly string[]): [string, number, number, number][] {
  return classes.flatMap((name) =>
    STEP_ENDS_MM.map((end): [string, number, number, number] => {
      const { upperDeviationUm, lowerDeviationUm } = isoDeviations(mm(end), name);
      return [name, end, upperDeviationUm, lowerDeviationUm];
    }),
  );
}

/** The look-up in sql.js: SQLite compiled to WebAssembly, in memory. */
export async function sqlJsLookup(classes: readonly string[]): Promise<Lookup> {
  const { Database } = await initSqlJs();
  const database = new Database();
  database.exec(TABLE);
  database.exec("BEGIN");
  const insert = database.prepare(INSERT);
  for (const row of rows(classes)) insert.run(row);
  database.exec("COMMIT");
  const select = database.prepare(SELECT);
  return (sizeMm, toleranceClass) => {
    const found = select.get([toleranceClass, sizeMm]);
    return Number(found[0]) + Number(found[1]);
  };
}

interface NativeStatement {
  raw(on: boolean): NativeStatement;
  get(...parameters: (string | number)[]): number[] | undefined;
  run(...parameters: (string | number)[]): void;
}

interface NativeDatabase {
  exec(sql: string): void;
  prepare(sql: string): NativeStatement;
}

/** The look-up in native SQLite, in memory, where the module better-sqlite3 happens to be installed; else `null`. */
export async function nativeLookup(classes: readonly string[]): Promise<Lookup | null> {
  const name = process.env["NATIVE_SQLITE"] ?? "better-sqlite3";
  const loaded = (await import(name).catch(() => null)) as { default: new (file: string) => NativeDatabase } | null;
  if (loaded === null) return null;
  const database = new loaded.default(":memory:");
  database.exec(TABLE);
  const insert = database.prepare(INSERT);
  for (const row of rows(classes)) insert.run(...row);
  const select = database.prepare(SELECT).raw(true);
  return (sizeMm, toleranceClass) => {
    const found = select.get(toleranceClass, sizeMm);
    return (found?.[0] ?? 0) + (found?.[1] ?? 0);
  };
}
