import { readFileSync } from "node:fs";

/** One published case: what goes in, what must come out, and who says so. */
export interface Case<Input, Expected> {
  readonly input: Input;
  /** `null` where the standard does not define the input. */
  readonly expected: Expected | null;
  readonly source?: string | readonly string[];
  readonly mark?: string;
  readonly table?: string;
  readonly edition?: string;
  readonly why?: string;
  readonly plusDelta?: boolean;
}

/** A file of published cases. */
export interface CaseFile<Input, Expected> {
  readonly version: number;
  readonly title: string;
  readonly standard: string;
  readonly edition: string;
  readonly table: string;
  readonly sources?: Readonly<Record<string, string>>;
  readonly cases: readonly Case<Input, Expected>[];
}

/** Reads a file of cases; the path is relative to this folder. */
export function readCases<Input, Expected>(path: string): CaseFile<Input, Expected> {
  return JSON.parse(readFileSync(new URL(path, import.meta.url), "utf8")) as CaseFile<Input, Expected>;
}
