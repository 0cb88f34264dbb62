export { readCallout } from "./readCallout.js";
export type { CalloutOptions } from "./readSize.js";
export type {
  AngleRequest,
  BasicRequest,
  CalloutRequest,
  ClassRequest,
  DeviationsRequest,
  FitRequest,
  LimitsRequest,
  PlainRequest,
  ReferenceRequest,
  SingleLimitRequest,
} from "./request.js";
export { resolveCallout } from "./resolveCallout.js";
export type { CalloutContext, ResolvedCallout } from "./resolveCallout.js";
