import { resolveCallout } from "../callout/index.js";
import type { CalloutContext, ResolvedCallout } from "../callout/index.js";
import { LimitsError, attempt } from "../errors.js";
import type { LimitsProblem } from "../errors.js";
import { parseToleranceClass } from "../iso286/index.js";
import { atPath } from "../located.js";
import { titleBlock } from "../titleBlock/index.js";
import { countSheet } from "./countSheet.js";
import { ownCopy } from "./ownCopy.js";
import { findingsOfCallout } from "./findingsOfCallout.js";
import { findingsOfSurface } from "./findingsOfSurface.js";
import { judgementOf } from "./judgementOf.js";
import type { InspectionContext } from "./judgementOf.js";
import { readFeature, readFrame } from "./readFrame.js";
import type { DataPath, SheetFrame } from "./readFrame.js";
import type { ReadRow } from "./readRow.js";
import { resolveMates } from "./resolveMates.js";
import { findingsOfKeyseat, resolveKeyseat } from "./resolveKeyseat.js";
import type { FeatureSpec } from "./sheetSpec.js";
import type { ResolvedSheet, SheetFinding, SheetRow, SheetRowBase } from "./sheetValue.js";
import { readFinish, surfaceOf } from "./surfaceOf.js";
import type { FinishContext } from "./surfaceOf.js";

/**
 * Resolves a whole drawing: limits for each feature, fits for the mates.
 *
 * A bad row costs that row only: every other row is resolved, and the counts add up.
 *
 * @param json - the drawing as `JSON.parse` gives it, see `SheetSpec`: `drawing`, `unit` (mm or in),
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
  const problems: LimitsProblem[] = [];
  const sheet = sheetContext(frame.value, problems);
  const unknownKeys: DataPath[] = [...frame.unknownKeys];
  const seen = new Set<string>();
  const read = frame.value.features.map((feature, index): ReadRow => {
    const result = readFeature(feature);
    unknownKeys.push(...result.unknownKeys.map((path) => ["features", index, ...path]));
    if (!result.ok) return faultyRow(feature, index, result.fault);
    return { spec: result.value, row: rowOf(result.value, index, seen, sheet, problems) };
  });
  const rows = withKeyseats(read, sheet.callouts);
  const fits = resolveMates(read);
  return Object.freeze({
    drawing: frame.value.drawing,
    unit: frame.value.unit,
    rows: Object.freeze(rows),
    fits,
    findings: Object.freeze(rows.flatMap(findingsOfRow)),
    problems: Object.freeze(problems),
    unknownKeys: Object.freeze(unknownKeys.map((path) => Object.freeze([...path]))),
    counts: countSheet(rows, fits),
  });
}

/** What all rows of one drawing share. */
interface SheetContext {
  readonly callouts: CalloutContext;
  readonly finishes: FinishContext;
  readonly inspection: InspectionContext;
  /** Why the title block cannot be used; `null` where it can, or there is none. */
  readonly blockError: LimitsProblem | null;
}

function sheetContext(frame: SheetFrame, problems: LimitsProblem[]): SheetContext {
  const { unit, decimalMark = ".", titleBlock: fields } = frame;
  const block = attempt(() =>
    fields === undefined ? null : atPath(["titleBlock"], () => titleBlock({ unit, decimalMark, ...fields })),
  );
  if (!block.ok) problems.push(block.error);
  const text = fields?.finish;
  const allOver = attempt(() =>
    text === undefined ? null : atPath(["titleBlock", "finish"], () => readFinish(text, { unit, decimalMark })),
  );
  if (!allOver.ok) problems.push(allOver.error);
  const used = block.ok ? block.value : null;
  return {
    callouts: { unit, decimalMark, ...(used === null ? {} : { titleBlock: used }) },
    inspection: { unit, decimalMark, inspection: frame.inspection ?? null },
    finishes: { unit, decimalMark, allOver: allOver.ok ? allOver.value : null },
    blockError: block.ok ? null : block.error,
  };
}

function rowOf(
  spec: FeatureSpec,
  index: number,
  seen: Set<string>,
  sheet: SheetContext,
  problems: LimitsProblem[],
): SheetRow {
  const base = baseOf(spec, index);
  if (seen.has(spec.id)) {
    const error = new LimitsError("FEATURE_ID_REPEATED", "another feature before has this id", {
      value: spec.id,
      allowed: "each id once in a drawing",
      path: ["features", index, "id"],
    });
    return Object.freeze({ ...base, ok: false as const, error: error.toJSON() });
  }
  seen.add(spec.id);
  // worked out when all features that it may stand on are
  if ("keyseat" in spec) return Object.freeze({ ...base, ok: false as const, error: WAITING });
  const { kind: feature, defaults } = spec;
  const context: CalloutContext = {
    ...sheet.callouts,
    ...(feature === undefined ? {} : { feature }),
    ...(defaults === undefined ? {} : { defaults }),
  };
  const resolved = attempt(() => atPath(["features", index, "callout"], () => resolveCallout(spec.callout, context)));
  // the finish all over is for sizes; an angle or a reference dimension has no surface of its own
  const sized = resolved.ok && (resolved.value.outcome === "limits" || resolved.value.outcome === "fit");
  const finishes = sized ? sheet.finishes : { ...sheet.finishes, allOver: null };
  const surface = surfaceOf(spec, index, finishes, problems);
  if (resolved.ok) {
    const { value } = resolved;
    const limits = value.outcome === "limits" ? value.limits : null;
    const judgement = judgementOf(spec, index, limits, sheet.inspection, problems);
    const kind = base.kind ?? kindOf(value);
    return Object.freeze({ ...base, kind, ok: true as const, resolved: value, surface, judgement });
  }
  // the size would have fallen to the block: its fault is the row's fault
  const missing = resolved.error.code === "TITLE_BLOCK_MISSING" && sheet.blockError !== null;
  return Object.freeze({ ...base, ok: false as const, error: missing ? sheet.blockError : resolved.error });
}

const WAITING: LimitsProblem = new LimitsError("KEYSEAT_ON_UNKNOWN", "the keyseat was not worked out").toJSON();

/** The rows again, with the keyseats worked out from the features that they are cut into. */
function withKeyseats(read: readonly ReadRow[], callouts: CalloutContext): readonly SheetRow[] {
  const byId = new Map<string, SheetRow>();
  for (const { row } of read) if (row.id !== null && !byId.has(row.id)) byId.set(row.id, row);
  return read.map(({ row, spec }) => {
    if (spec === null || !("keyseat" in spec) || row.ok || row.error !== WAITING) return row;
    const { keyseat } = spec;
    const done = attempt(() =>
      atPath(["features", row.index, "keyseat"], () => resolveKeyseat(keyseat, byId, callouts)),
    );
    const base = baseOf(spec, row.index);
    return done.ok
      ? Object.freeze({ ...base, ok: true as const, resolved: done.value, surface: null, judgement: null })
      : Object.freeze({ ...base, ok: false as const, error: done.error });
  });
}

function findingsOfRow(row: SheetRow): readonly SheetFinding[] {
  if (!row.ok || row.id === null) return [];
  if (row.resolved.outcome === "keyseat") return findingsOfKeyseat(row.id, row.resolved);
  return [...findingsOfCallout(row), ...findingsOfSurface(row)];
}

function baseOf(spec: FeatureSpec, index: number): SheetRowBase {
  const sized = "callout" in spec ? spec : null;
  return {
    index,
    id: spec.id,
    name: spec.name ?? null,
    callout: sized?.callout ?? null,
    kind: sized?.kind ?? null,
  };
}

function kindOf({ request }: ResolvedCallout): "hole" | "shaft" | null {
  switch (request.kind) {
    case "class":
      return parseToleranceClass(request.toleranceClass).kind;
    case "inch class":
      return request.member;
    default:
      return null;
  }
}

function faultyRow(
  feature: unknown,
  index: number,
  fault: { readonly path: DataPath; readonly says: string },
): ReadRow {
  const text = (key: string): string | null => {
    const value = valueAt(feature, [key]);
    return typeof value === "string" ? value : null;
  };
  const error = new LimitsError("FEATURE_INVALID", fault.says, {
    value: valueAt(feature, fault.path),
    allowed: "a feature: { id, callout, … } or { id, keyseat, … }",
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
