export { resolveSheet } from "./resolveSheet.js";
export { sheetJsonSchema } from "./sheetJsonSchema.js";
export { sheetSchema } from "./sheetSchema.js";
export type { FeatureSpec, SheetSpec, TitleBlockFields } from "./sheetSpec.js";
export type { ResolvedSheet, SheetCounts, SheetFit, SheetRow } from "./sheetValue.js";
