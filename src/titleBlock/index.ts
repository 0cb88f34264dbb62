export { defaultLimits } from "./defaultLimits.js";
export type {
  DefaultAngleLimits,
  DefaultLengthLimits,
  DefaultLimits,
  DefaultLimitsOptions,
  DefaultProcess,
  OtherRequestLike,
  PlainAngleLike,
  PlainSizeLike,
  SizeFeature,
} from "./defaultValue.js";
export type { EdgeIndication, EdgeSide, EdgeState } from "./edgeValue.js";
export { generalAngleLimits } from "./generalAngleLimits.js";
export { generalFormTolerance } from "./generalFormTolerance.js";
export type { FormCharacteristic, FormQuestion, FormTolerance } from "./generalFormValue.js";
export { generalLimits } from "./generalLimits.js";
export type { GeneralLimitsOptions } from "./generalLimits.js";
export { generalTolerance } from "./generalTolerance.js";
export type {
  CastingGrade,
  CastingIndication,
  GeneralTolerance,
  GeneralToleranceLike,
  Iso13920Form,
  Iso13920Linear,
  Iso2768Geometry,
  Iso2768Indication,
  Iso2768Linear,
  WeldmentIndication,
} from "./generalToleranceValue.js";
export { halfPlaceLimits } from "./halfPlaceLimits.js";
export { readEdge } from "./readEdge.js";
export type { EdgeOptions } from "./readEdge.js";
export { titleBlock } from "./titleBlock.js";
export { titleBlockPreset } from "./titleBlockPreset.js";
export type {
  EdgeNote,
  EdgeNoteSpec,
  Projection,
  TitleBlock,
  TitleBlockLines,
  TitleBlockLinesSpec,
  TitleBlockPresetName,
  TitleBlockSpec,
} from "./titleBlockValue.js";
