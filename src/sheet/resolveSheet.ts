import { resolveCallout } from "../callout/index.js";
import type { CalloutContext, ResolvedCallout } from "../callout/index.js";
import { LimitsError, attempt } from "../errors.js";
import type { LimitsProblem } from "../errors.js";
import { parseToleranceClass } from "../iso286/index.js";
import { atPath } from "../located.js";
import { titleBlock } from "../titleBlock/index.js";
import type { TitleBlock } from "../titleBlock/index.js";
import { countSheet } from "./countSheet.js";
import { ownCopy } from "./ownCopy.js";
import { readFeature, readFrame } from "./readFrame.js";
import type { DataPath, SheetFrame } from "./readFrame.js";
import type { ReadRow } from "./readRow.js";
import { resolveMates } from "./resolveMates.js";
import type { FeatureSpec } from "./sheetSpec.js";
import type { ResolvedSheet, SheetRow } from "./sheetValue.js";

/**
 * Resolves a whole drawing: limits for each feature, fits for the mates.
 *
 * A bad row costs that row only: every other row is resolved, and the counts add up.
 *
 * @param json - the drawing as `JSON.parse` gives it, see {@link SheetSpec}: `drawing`, `unit` (mm or in),
 *   `titleBlock`, `features`
 * @returns the frozen sheet: one row a feature in order (limits with units, or the error with its path), fits of
 *   the mates, unknown keys, counts
 * @throws `SHEET_INVALID` where the data is no drawing at all; a bad title block, feature or mate is an error in the
 *   result: `TITLE_BLOCK_INVALID`, `FEATURE_INVALID`, `FEATURE_ID_REPEATED`, `MATE_UNKNOWN`, `MATE_KIND_INVALID`,
 *   `MATE_UNRESOLVED`, `NOMINALS_DIFFER`, and what {@link resolveCallout} throws
 * @example
 * ```ts
 * import { resolveSheet } from "limitsmith/sheet";
 *
 * const sheet = resolveSheet({
 *   drawing: "Hopper shaft and bush (invented)",
 *   unit: "mm",
 *   features: [
 *     { id: "S1", callout: "⌀17 h6", mate: "B1" },
 *     { id: "B1", callout: "⌀17 F7" },
 *     { id: "S2", callout: "⌀17 zz9" },
 *   ],
 * });
 * sheet.counts.limits; // → 2
 * sheet.counts.failed; // → 1
 * const [first] = sheet.fits;
 * first?.ok ? first.fit.minClearance.toString() : ""; // → "16 µm"
 * ```
 * @reference none of its own: each row names its standard in its basis
 */
export function resolveSheet(json: unknown): ResolvedSheet {
  const data = ownCopy(json);
  const frame = readFrame(data);
  if (!frame.ok) {
    throw new LimitsError("SHEET_INVALID", frame.fault.says, {
      value: valueAt(data, frame.fault.path),
      allowed: "a drawing: { drawing, unit, titleBlock?, features }",
      path: frame.fault.path,
    });
  }
  const unknownKeys: DataPath[] = [...frame.unknownKeys];
  const block = attempt(() => blockOf(frame.value));
  const context = contextOf(frame.value, block.ok ? block.value : null);
  const seen = new Set<string>();
  const read = frame.value.features.map((feature, index): ReadRow => {
    const result = readFeature(feature);
    unknownKeys.push(...result.unknownKeys.map((path) => ["features", index, ...path]));
    if (!result.ok) return faultyRow(feature, index, result.fault);
    return { spec: result.value, row: rowOf(result.value, index, seen, context, block.ok ? null : block.error) };
  });
  const rows = read.map(({ row }) => row);
  const fits = resolveMates(read);
  return Object.freeze({
    drawing: frame.value.drawing,
    unit: frame.value.unit,
    rows: Object.freeze(rows),
    fits,
    problems: Object.freeze(block.ok ? [] : [block.error]),
    unknownKeys: Object.freeze(unknownKeys.map((path) => Object.freeze([...path]))),
    counts: countSheet(rows, fits),
  });
}

function blockOf(frame: SheetFrame): TitleBlock | null {
  const { unit, decimalMark = ".", titleBlock: fields } = frame;
  if (fields === undefined) return null;
  return atPath(["titleBlock"], () => titleBlock({ unit, decimalMark, ...fields }));
}

function contextOf(frame: SheetFrame, block: TitleBlock | null): CalloutContext {
  const { unit, decimalMark = "." } = frame;
  return { unit, decimalMark, ...(block === null ? {} : { titleBlock: block }) };
}

function rowOf(
  spec: FeatureSpec,
  index: number,
  seen: Set<string>,
  context: CalloutContext,
  blockError: LimitsProblem | null,
): SheetRow {
  const base = {
    index,
    id: spec.id,
    name: spec.name ?? null,
    callout: spec.callout,
    kind: spec.kind ?? null,
  };
  if (seen.has(spec.id)) {
    const error = new LimitsError("FEATURE_ID_REPEATED", "another feature before has this id", {
      value: spec.id,
      allowed: "each id once in a drawing",
      path: ["features", index, "id"],
    });
    return Object.freeze({ ...base, ok: false as const, error: error.toJSON() });
  }
  seen.add(spec.id);
  const resolved = attempt(() =>
    atPath(["features", index, "callout"], () =>
      resolveCallout(spec.callout, spec.kind === undefined ? context : { ...context, feature: spec.kind }),
    ),
  );
  if (resolved.ok) {
    return Object.freeze({ ...base, kind: base.kind ?? kindOf(resolved.value), ok: true as const, resolved: resolved.value });
  }
  // the size would have fallen to the block: its fault is the row's fault
  const error = resolved.error.code === "TITLE_BLOCK_MISSING" && blockError !== null ? blockError : resolved.error;
  return Object.freeze({ ...base, ok: false as const, error });
}

function kindOf({ request }: ResolvedCallout): "hole" | "shaft" | null {
  return request.kind === "class" ? parseToleranceClass(request.toleranceClass).kind : null;
}

function faultyRow(feature: unknown, index: number, fault: { readonly path: DataPath; readonly says: string }): ReadRow {
  const text = (key: string): string | null => {
    const value = valueAt(feature, [key]);
    return typeof value === "string" ? value : null;
  };
  const error = new LimitsError("FEATURE_INVALID", fault.says, {
    value: valueAt(feature, fault.path),
    allowed: "a feature: { id, callout, name?, kind?, mate?, note? }",
    path: ["features", index, ...fault.path],
  });
  return {
    spec: null,
    row: Object.freeze({
      index,
      id: text("id"),
      name: text("name"),
      callout: text("callout"),
      kind: null,
      ok: false as const,
      error: error.toJSON(),
    }),
  };
}

/** What stands at a path; `undefined` where the path ends early. The data has no prototypes, see {@link ownCopy}. */
function valueAt(data: unknown, path: DataPath): unknown {
  return path.reduce<unknown>(
    (value, key) => (typeof value === "object" && value !== null ? (value as Record<string, unknown>)[key] : undefined),
    data,
  );
}
