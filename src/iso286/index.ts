export type { DeviationsUm } from "./classAtStep.js";
export { isoDeviations } from "./isoDeviations.js";
export { isoFit } from "./isoFit.js";
export { isoLimits } from "./isoLimits.js";
export type { IsoEdition, IsoOptions } from "./isoOptions.js";
export type { FitClasses, FitClassesLike } from "./parseFit.js";
export { parseToleranceClass } from "./parseToleranceClass.js";
export type { ToleranceClassLike } from "./parseToleranceClass.js";
export type { GradeName, ToleranceClass } from "./toleranceClass.js";
