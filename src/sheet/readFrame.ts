import { hasOwn } from "../ownValue.js";
import { schemas } from "./buildSchemas.js";
import type { FeatureSpec, KeyseatFeatureSpec, SheetSpec, SizeFeatureSpec } from "./sheetSpec.js";

/** A place in the data, as keys. */
export type DataPath = readonly (string | number)[];

/** What reading one object gave: its data, or the first fault, and the keys that nobody knows. */
export type ReadResult<T> =
  | { readonly ok: true; readonly value: T; readonly unknownKeys: readonly DataPath[] }
  | {
      readonly ok: false;
      readonly fault: { readonly path: DataPath; readonly says: string };
      readonly unknownKeys: readonly DataPath[];
    };

/** A drawing with its features unread. */
export type SheetFrame = Omit<SheetSpec, "features"> & { readonly features: readonly unknown[] };

interface Issue {
  readonly code?: string;
  readonly path: readonly PropertyKey[];
  readonly keys?: readonly string[];
  readonly expected?: string;
  readonly values?: readonly unknown[];
  readonly minimum?: unknown;
  readonly maximum?: unknown;
}

interface Schema {
  readonly safeParse: (data: unknown) => { success: boolean; error?: { readonly issues: readonly unknown[] } };
}

/** Reads a drawing without its features; unknown keys are gathered, not refused. */
export function readFrame(data: unknown): ReadResult<SheetFrame> {
  return read<SheetFrame>(schemas().frame, data);
}

/** Reads one feature; unknown keys are gathered, not refused. */
export function readFeature(data: unknown): ReadResult<FeatureSpec> {
  const isKeyseat = typeof data === "object" && data !== null && hasOwn(data, "keyseat");
  return isKeyseat ? read<KeyseatFeatureSpec>(schemas().keyseat, data) : read<SizeFeatureSpec>(schemas().size, data);
}

function read<T>(schema: Schema, data: unknown): ReadResult<T> {
  const issues = (schema.safeParse(data).error?.issues ?? []) as readonly Issue[];
  const unknownKeys: DataPath[] = [];
  let fault: { path: DataPath; says: string } | undefined;
  for (const issue of issues) {
    const path = issue.path.map((key) => (typeof key === "number" ? key : String(key)));
    if (issue.code === "unrecognized_keys") unknownKeys.push(...(issue.keys ?? []).map((key) => [...path, key]));
    else fault ??= { path, says: sayIssue(issue) };
  }
  // the schemas change nothing in what they accept, so the data itself is the value
  return fault === undefined ? { ok: true, value: data as T, unknownKeys } : { ok: false, fault, unknownKeys };
}

function sayIssue(issue: Issue): string {
  switch (issue.code) {
    case "invalid_type":
      return `${issue.expected ?? "another type"} is needed here`;
    case "invalid_value":
      return `one of ${(issue.values ?? []).map(String).join(", ")} is needed here`;
    case "too_small":
      return "a text that is not empty is needed here";
    case "too_big":
      return `a text of up to ${String(issue.maximum)} characters is needed here`;
    default:
      return "this is not what a drawing file holds here";
  }
}
