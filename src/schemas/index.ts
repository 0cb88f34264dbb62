export { sheetJsonSchema, sheetSchema } from "../sheet/index.js";
export type { FeatureSpec, SheetSpec, TitleBlockFields } from "../sheet/index.js";
