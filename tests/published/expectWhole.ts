import { expect } from "vitest";
import type { CaseFile } from "./readCases.js";

/** A file of cases has all that it should have, its head is filled in, and every source it names is explained. */
export function expectWhole(file: CaseFile<unknown, unknown>, count: number): void {
  expect(file.cases).toHaveLength(count);
  expect(file.version).toBe(1);
  for (const name of ["title", "standard", "edition", "table"] as const) expect(file[name]).not.toBe("");
  for (const { source } of file.cases) {
    if (Array.isArray(source)) for (const id of source as string[]) expect(file.sources).toHaveProperty(id);
  }
}
