import type { Basis } from "../basis.js";
import { LimitsError } from "../errors.js";
import { lengthOfTicks } from "../units/index.js";
import type { Length } from "../units/index.js";

/** The nearest number of a preferred series, and its neighbours. */
export interface NearestPreferred {
  /** The nearest of the series; half way between two, the smaller one. */
  readonly nearest: Length;
  /** `nearest` minus the length given. */
  readonly difference: Length;
  /** The largest of the series that is not over the length given. */
  readonly below: Length;
  /** The smallest of the series that is not under the length given. */
  readonly above: Length;
  /** Where the series stands. */
  readonly basis: Basis;
}

/** Looks a length up in a series, smallest first; beyond its ends nothing is preferred. */
export function nearestInSeries(series: readonly Length[], given: Length, place: string): NearestPreferred {
  const below = series.filter((one) => one.ticks <= given.ticks).at(-1);
  const above = series.find((one) => one.ticks >= given.ticks);
  if (below === undefined || above === undefined) {
    throw new LimitsError("INCH_SERIES_OUT_OF_RANGE", "the preferred series does not reach this length", {
      value: given.toString(),
      allowed: `${series[0]?.toString() ?? ""} to ${series.at(-1)?.toString() ?? ""}`,
    });
  }
  const nearest = above.ticks - given.ticks < given.ticks - below.ticks ? above : below;
  return Object.freeze({
    nearest,
    difference: lengthOfTicks(nearest.ticks - given.ticks, nearest.unit),
    below,
    above,
    basis: Object.freeze([
      Object.freeze({
        standard: "ANSI B4.1-1967",
        place,
        says: `${nearest.toString()} is the nearest to ${given.toString()}`,
        how: "tabulated" as const,
        mark: "memory" as const,
      }),
    ]),
  });
}
