export * from "./errors.js";
export type { Basis, BasisHow, BasisStep, Caution, Mark } from "./basis.js";
export * from "./iso286/index.js";
export * from "./limits/index.js";
export * from "./units/index.js";
