export { sheetJsonSchema, sheetSchema } from "../sheet/index.js";
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
} from "../sheet/index.js";
