import type { FitCandidate } from "../limits/index.js";
import { allClasses } from "./allClasses.js";
import { classIfDefined } from "./classIfDefined.js";
import { parseFit } from "./parseFit.js";
import { preferredIsoFits } from "./preferredIsoFits.js";
import type { PreferredFit } from "./preferredIsoFits.js";
import { isInPrintedSpan } from "./printedSpan.js";
import { stepAt } from "./sizeStep.js";
import type { ParsedClass } from "./parsedClass.js";

/** A fit of two classes at a size step, with its standing. */
export interface IsoFitCandidate extends FitCandidate {
  /** The standard that prefers it; `null` where none does. */
  readonly preferred: PreferredFit | null;
  /** True for H/h, which is of both systems; it stands among the hole-basis fits. */
  readonly both: boolean;
}

type FitBasis = PreferredFit["system"];

interface Member {
  readonly cls: ParsedClass;
  readonly upper: number;
  readonly lower: number;
  readonly printed: boolean;
}

/** Every hole-basis and shaft-basis fit that the standard defines at a size step. */
export function isoFitCandidates(stepIndex: number): readonly IsoFitCandidate[] {
  const holes = membersAt("hole", stepIndex);
  const shafts = membersAt("shaft", stepIndex);
  const preferred = new Map(preferredIsoFits().map((one) => [`${one.fit} ${one.system}`, one]));
  const list: IsoFitCandidate[] = [];
  const add = (hole: Member, shaft: Member, system: FitBasis): void => {
    const name = `${hole.cls.text}/${shaft.cls.text}`;
    // H/h is of both systems, and may be preferred in one of them only
    const standing =
      preferred.get(`${name} ${system}`) ?? (isBoth(hole, shaft) ? preferred.get(`${name} shaft basis`) : null);
    list.push(candidate(hole, shaft, system, standing ?? null));
  };
  const basicHoles = holes.filter((one) => one.cls.letter === "H");
  const basicShafts = shafts.filter((one) => one.cls.letter === "h");
  for (const hole of basicHoles) for (const shaft of shafts) add(hole, shaft, "hole basis");
  // H/h is both; it stands among the hole-basis fits already
  for (const shaft of basicShafts)
    for (const hole of holes) if (hole.cls.letter !== "H") add(hole, shaft, "shaft basis");
  return list;
}

/** The preferred ones among them, without a look at all the others. */
export function preferredFitCandidates(stepIndex: number): readonly IsoFitCandidate[] {
  const holeBasis = new Set(preferredIsoFits().flatMap((one) => (one.system === "hole basis" ? [one.fit] : [])));
  return preferredIsoFits().flatMap((one) => {
    const classes = parseFit(one.fit);
    const hole = memberAt(classes.hole, stepIndex);
    const shaft = memberAt(classes.shaft, stepIndex);
    if (hole === null || shaft === null) return [];
    if (!isBoth(hole, shaft)) return [candidate(hole, shaft, one.system, one)];
    const again = one.system === "shaft basis" && holeBasis.has(one.fit);
    return again ? [] : [candidate(hole, shaft, "hole basis", one)];
  });
}

function candidate(hole: Member, shaft: Member, system: FitBasis, preferred: PreferredFit | null): IsoFitCandidate {
  return {
    designation: `${hole.cls.text}/${shaft.cls.text}`,
    minClearanceTicks: hole.lower - shaft.upper,
    maxClearanceTicks: hole.upper - shaft.lower,
    tier: tierOf(preferred, hole, shaft),
    system: system === "hole basis" ? 0 : 1,
    preferred,
    both: isBoth(hole, shaft),
  };
}

function isBoth(hole: Member, shaft: Member): boolean {
  return hole.cls.letter === "H" && shaft.cls.letter === "h";
}

function membersAt(kind: "hole" | "shaft", stepIndex: number): readonly Member[] {
  return allClasses(kind).flatMap((cls) => {
    const member = memberAt(cls, stepIndex);
    return member === null ? [] : [member];
  });
}

function memberAt(cls: ParsedClass, stepIndex: number): Member | null {
  const found = classIfDefined(cls, stepIndex);
  if (found === null) return null;
  return {
    cls,
    upper: found.set.upper.ticks,
    lower: found.set.lower.ticks,
    printed: isInPrintedSpan(cls, stepAt(stepIndex)),
  };
}

function tierOf(preferred: PreferredFit | null, hole: Member, shaft: Member): number {
  if (preferred !== null) return preferred.standard === "ANSI B4.2" ? 0 : 1;
  return hole.printed && shaft.printed ? 2 : 3;
}
