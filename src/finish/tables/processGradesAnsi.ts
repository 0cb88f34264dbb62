// ANSI B4.1-1967 (R1987), Table 2, relation of machining processes to tolerance grades, grades 4 to 13. One source for
// the names and for the length of each bar; where a bar starts is memory of the chart, reviewed once without difference.

/** One bar of the chart: grades that the process is used for. */
export interface GradeBar {
  readonly row: string;
  readonly finest: number;
  readonly coarsest: number;
}

/** The chart, top to bottom. */
export const ANSI_PROCESS_GRADES: readonly GradeBar[] = [
  { row: "lapping and honing", finest: 4, coarsest: 5 },
  { row: "cylindrical grinding", finest: 5, coarsest: 7 },
  { row: "surface grinding", finest: 5, coarsest: 8 },
  { row: "diamond turning", finest: 5, coarsest: 7 },
  { row: "diamond boring", finest: 5, coarsest: 7 },
  { row: "broaching", finest: 5, coarsest: 8 },
  { row: "reaming", finest: 6, coarsest: 10 },
  { row: "turning", finest: 7, coarsest: 13 },
  { row: "boring", finest: 8, coarsest: 13 },
  { row: "milling", finest: 10, coarsest: 13 },
  { row: "planing and shaping", finest: 10, coarsest: 13 },
  { row: "drilling", finest: 10, coarsest: 13 },
];
