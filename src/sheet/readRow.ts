import type { FeatureSpec } from "./sheetSpec.js";
import type { SheetRow } from "./sheetValue.js";

/** A row with the feature behind it; `spec` is `null` where the feature could not be read. */
export interface ReadRow {
  readonly row: SheetRow;
  readonly spec: FeatureSpec | null;
}
