import type { Limits } from "../limits/index.js";
import type { FeatureSpec } from "./sheetSpec.js";
import type { SheetRow } from "./sheetValue.js";

/** A row with the feature behind it; `spec` is `null` where the feature could not be read. */
export interface ReadRow {
  readonly row: SheetRow;
  readonly spec: FeatureSpec | null;
}

/** The limits of a row, where it has just one size. */
export function limitsOfRow(row: SheetRow): Limits | null {
  return row.ok && row.resolved.outcome === "limits" ? row.resolved.limits : null;
}
