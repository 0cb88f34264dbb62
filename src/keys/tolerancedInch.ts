import type { Mark } from "../basis.js";
import { makeLimits } from "../limits/index.js";
import type { Limits } from "../limits/index.js";
import { thou } from "../units/index.js";
import { B17_2, deviationsText, keyStep } from "./keyStep.js";
import { tableInch } from "./tableLength.js";

/** Limits of a size of ANSI/ASME B17.2 with its deviations in thou, and the place of the table they stand in. */
export function tolerancedInch(
  place: string,
  what: string,
  nominal: string,
  deviations: { readonly upper: number; readonly lower: number },
  mark: Mark,
): Limits {
  const { upper, lower } = deviations;
  const says = `${what} ${nominal} in ${deviationsText(upper, lower)}`;
  const basis = Object.freeze([keyStep(B17_2, place, says, "tabulated", mark)]);
  return makeLimits(tableInch(nominal), thou(upper), thou(lower), basis, null);
}
