export { compareFits } from "./compareFits.js";
export type { CompareOptions, FitComparison, FitDifferences, JointFit, NearFit } from "./fitComparison.js";
export { gradeOfTolerance } from "./gradeOfTolerance.js";
export type { GradeAtSize, GradeMatch, GradeOfTolerance, GradeQuestion } from "./gradeOfTolerance.js";
