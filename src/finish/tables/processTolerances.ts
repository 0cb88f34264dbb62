// Total tolerance in mm that material-removal processes reach, least and most. One source: an engineering article that
// collates several publications. null: the figure lost its decimal point in print.

/** One line of the table. */
export interface ToleranceRow {
  readonly row: string;
  readonly least: number | null;
  readonly most: number;
}

/** The table, top to bottom. */
export const PROCESS_TOLERANCES_MM: readonly ToleranceRow[] = [
  { row: "electro-discharge machining", least: 0.05, most: 0.1 },
  { row: "electro-discharge wire cutting", least: 0.01, most: 0.125 },
  { row: "electrochemical machining", least: 0.013, most: 0.5 },
  { row: "chemical machining", least: 0.004, most: 0.3 },
  { row: "electron beam machining", least: 0.005, most: 0.05 },
  { row: "laser beam machining", least: 0.013, most: 0.13 },
  { row: "abrasive grinding, polishing", least: 0.0006, most: 0.1 },
  { row: "broaching", least: 0.0015, most: 0.02 },
  { row: "drilling", least: null, most: 0.5 },
  { row: "honing", least: 0.00055, most: 0.04 },
  { row: "lapping", least: 0.00055, most: 0.04 },
  { row: "milling", least: 0.01, most: 1 },
  { row: "planing, shaping", least: 0.02, most: 1 },
  { row: "reaming", least: 0.002, most: 0.07 },
  { row: "turning, boring", least: 0.003, most: 0.2 },
  { row: "band sawing", least: 0.8, most: 3 },
  { row: "circular sawing", least: 0.2, most: 3 },
  { row: "oxy-fuel gas cutting", least: 0.8, most: 2 },
  { row: "plasma arc cutting", least: 0.5, most: 2.54 },
  { row: "water jet cutting", least: 0.1, most: 0.25 },
];
