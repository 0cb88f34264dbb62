import type { BasisHow, BasisStep, Mark } from "../basis.js";

/** One frozen step of a basis. */
export function keyStep(standard: string, place: string, says: string, how: BasisHow, mark?: Mark): BasisStep {
  return Object.freeze(mark === undefined ? { standard, place, says, how } : { standard, place, says, how, mark });
}

/** The two standards of inch keys. */
export const B17_1 = "ANSI/ASME B17.1-1967";
export const B17_2 = "ANSI/ASME B17.2-1967";

/** Deviations in thousandths of an inch as the tables print them: `+0.002 / -0.000 in`. */
export function deviationsText(upper: number, lower: number): string {
  const text = (value: number): string => (Math.abs(value) / 1000).toFixed(3);
  return `${upper < 0 ? "-" : "+"}${text(upper)} / ${lower > 0 ? "+" : "-"}${text(lower)} in`;
}
