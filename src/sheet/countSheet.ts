import type { ResolvedCallout } from "../callout/index.js";
import type { ResolvedKeyseat, SheetCounts, SheetFit, SheetRow } from "./sheetValue.js";

/** Counts rows and fits by what came of them. */
export function countSheet(rows: readonly SheetRow[], fits: readonly SheetFit[]): SheetCounts {
  const outcomes = (outcome: ResolvedCallout["outcome"] | ResolvedKeyseat["outcome"]): number =>
    rows.filter((row) => row.ok && row.resolved.outcome === outcome).length;
  return Object.freeze({
    features: rows.length,
    limits: outcomes("limits"),
    fitCallouts: outcomes("fit"),
    singleLimits: outcomes("single limit"),
    angles: outcomes("angle"),
    chamfers: outcomes("chamfer"),
    keyseats: outcomes("keyseat"),
    withoutLimits: outcomes("no limits"),
    failed: rows.filter((row) => !row.ok).length,
    fits: fits.filter((fit) => fit.ok).length,
    fitsFailed: fits.filter((fit) => !fit.ok).length,
  });
}
