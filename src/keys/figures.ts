/** A computed number to 12 figures: what a double holds beyond them is noise. */
export function figures(value: number): number {
  return Number(value.toPrecision(12));
}
