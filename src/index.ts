export type { Basis, BasisHow, BasisStep, Caution, Mark } from "./basis.js";
export * from "./callout/index.js";
export { LimitsError, attempt } from "./errors.js";
export type { Attempt, ErrorCode, LimitsErrorDetails, LimitsProblem, TextSpan } from "./errors.js";
export * from "./iso286/index.js";
export * from "./limits/index.js";
export * from "./titleBlock/index.js";
export * from "./units/index.js";
