export { notationFaults } from "./notationFaults.js";
export type { NotationFault } from "./notationFaults.js";
export { readCallout } from "./readCallout.js";
export type { CalloutOptions } from "./readSize.js";
export type {
  AngleRequest,
  BasicRequest,
  CalloutPart,
  CalloutPartName,
  CalloutRequest,
  CalloutShape,
  ChamferRequest,
  ClassRequest,
  DeviationsRequest,
  DualSize,
  FitRequest,
  InchClassRequest,
  LimitsRequest,
  PlainRequest,
  PrintedLimits,
  ReferenceRequest,
  RequestBase,
  SingleLimitRequest,
  ThreadRequest,
} from "./request.js";
export { resolveCallout } from "./resolveCallout.js";
export type {
  AngleOutcome,
  CalloutContext,
  ChamferOutcome,
  FitOutcome,
  LimitsOutcome,
  NoLimitsOutcome,
  ResolvedCallout,
  SingleLimitOutcome,
} from "./resolveCallout.js";
export { writeCallout } from "./writeCallout.js";
export type { CalloutStyle } from "./writeCallout.js";
