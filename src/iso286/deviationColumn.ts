/** One letter of a table of fundamental deviations: a value for each size step, from its first one on. */
export interface DeviationColumn {
  /** Which size steps the letter goes by. */
  readonly steps: "main" | "intermediate";
  /** Index of the first step that has a value. */
  readonly first: number;
  readonly um: readonly number[];
  /** How sure each value is, one sign a value: 2 two sources, + one source and the formula, 1 one source, m memory. */
  readonly marks: string;
}
