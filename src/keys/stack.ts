import type { Limits } from "../limits/index.js";
import { lengthOfTicks, multiply } from "../units/index.js";
import type { Length, LengthUnit } from "../units/index.js";
import type { StackRange, StackTerm } from "./assemblyValue.js";

/** Which limit of a size is meant. */
export type End = "max" | "min";

/** One corner of the tolerances that make up a stack, by the names of its sizes. */
export type Corner<Name extends string> = Readonly<Record<Name, End>>;

const ENDS: readonly End[] = ["max", "min"];

/**
 * The extremes of a sum over all corners of the sizes that it is made of. Trying every corner is plain and cannot
 * miss one: with a play that is never negative, a diameter may add on one side of zero and take away on the other.
 */
export function rangeOver<Name extends string>(
  names: readonly Name[],
  unit: LengthUnit,
  chainAt: (corner: Corner<Name>) => readonly StackTerm[],
): StackRange {
  let max: { readonly ticks: number; readonly chain: readonly StackTerm[] } | undefined;
  let min: typeof max;
  for (const corner of corners(names)) {
    const chain = chainAt(corner);
    const ticks = chain.reduce((sum, { sign, value }) => (sign === "+" ? sum + value.ticks : sum - value.ticks), 0);
    if (max === undefined || ticks > max.ticks) max = { ticks, chain };
    if (min === undefined || ticks < min.ticks) min = { ticks, chain };
  }
  return Object.freeze({
    max: lengthOfTicks(max?.ticks ?? 0, unit),
    min: lengthOfTicks(min?.ticks ?? 0, unit),
    maxChain: Object.freeze([...(max?.chain ?? [])]),
    minChain: Object.freeze([...(min?.chain ?? [])]),
  });
}

/** A term that adds. */
export function plus(name: string, value: Length): StackTerm {
  return Object.freeze({ name, sign: "+", value });
}

/** A term that takes away. */
export function minus(name: string, value: Length): StackTerm {
  return Object.freeze({ name, sign: "-", value });
}

/** A size at one of its limits, for a term. */
export function at(limits: Limits, end: End): Length {
  return end === "max" ? limits.max : limits.min;
}

/** Play of a shaft in its bore, which is never negative. */
export function playOf(bore: Length, shaft: Length): Length {
  return lengthOfTicks(Math.max(0, bore.ticks - shaft.ticks), bore.unit);
}

/** Half of a length; half a tick goes to the even one. */
export function half(length: Length): Length {
  return multiply(length, { numerator: 1, denominator: 2 });
}

function corners<Name extends string>(names: readonly Name[]): readonly Corner<Name>[] {
  return names.reduce<readonly Corner<Name>[]>(
    (all, name) => all.flatMap((corner) => ENDS.map((end) => ({ ...corner, [name]: end }))),
    [{} as Corner<Name>],
  );
}
