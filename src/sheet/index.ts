export { resolveSheet } from "./resolveSheet.js";
export { sheetJsonSchema } from "./sheetJsonSchema.js";
export { sheetSchema } from "./sheetSchema.js";
export type {
  DefaultFields,
  FeatureBase,
  FeatureSpec,
  InspectionFields,
  KeyseatFeatureSpec,
  KeyseatFields,
  SheetSpec,
  SizeFeatureSpec,
  TitleBlockFields,
  TitleBlockLineFields,
} from "./sheetSpec.js";
export type {
  ResolvedKeyseat,
  ResolvedSheet,
  SheetCounts,
  SheetFinding,
  SheetFit,
  SheetRow,
  SheetRowBase,
  SheetSurface,
} from "./sheetValue.js";
