export { defaultLimits } from "./defaultLimits.js";
export type { DefaultAngleLimits, DefaultLengthLimits, DefaultLimits } from "./defaultLimits.js";
export { titleBlock } from "./titleBlock.js";
export type { TitleBlock, TitleBlockSpec } from "./titleBlockValue.js";
