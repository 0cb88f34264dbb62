import { LimitsError } from "../errors.js";
import { rankFits } from "../limits/index.js";
import type { Fit, FitCandidate, WantedClearance } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { allClasses } from "./allClasses.js";
import { classIfDefined } from "./classIfDefined.js";
import { isoFit } from "./isoFit.js";
import { preferredIsoFits } from "./preferredIsoFits.js";
import type { PreferredFit } from "./preferredIsoFits.js";
import { isInPrintedSpan } from "./printedSpan.js";
import { stepAt, stepIndexOf } from "./sizeStep.js";
import type { ToleranceClass } from "./toleranceClass.js";

/** What {@link isoFitsFor} is asked. */
export interface FitQuestion {
  /** Nominal size. */
  readonly size: LengthLike;
  /** Range that the clearance must always lie in; negative is interference. */
  readonly clearance: WantedClearance;
  /** How many fits to work out; 20 unless said otherwise. */
  readonly most?: number;
}

/** A fit that serves, with its standing. */
export interface FoundFit {
  readonly fit: Fit;
  /** The standard that prefers it; `null` where none does. */
  readonly preferred: PreferredFit | null;
}

/** Answer of {@link isoFitsFor}. */
export interface FoundFits {
  /** How many fits serve in all. */
  readonly found: number;
  /** The best of them, best first. */
  readonly fits: readonly FoundFit[];
}

interface Candidate extends FitCandidate {
  readonly preferred: PreferredFit | null;
}

interface Member {
  readonly cls: ToleranceClass;
  readonly upper: number;
  readonly lower: number;
  readonly printed: boolean;
}

const USUAL_MOST = 20;

/**
 * Finds the hole-basis and shaft-basis fits whose clearance always lies in a wanted range, best first.
 *
 * Order: the named pairs of ANSI B4.2, then the other preferred fits of ISO 286-1, then fits of classes that
 * ISO 286-2 prints, then all others; within each group as {@link rankFits} says: more of the range used, nearer
 * its middle, hole basis first, name.
 *
 * @param question - `size` (over 0 up to 3150 mm, any unit), `clearance` `{ min, max }` (signed, any unit), and
 *   `most`: how many to work out (20 unless said otherwise)
 * @returns frozen `{ found, fits }`: the number that serve, and the best of them with limits in the unit of
 *   `size` and clearances in µm
 * @throws `ISO_SIZE_OUT_OF_RANGE`, `LIMITS_INVALID`, `LIMITS_UPSIDE_DOWN`, `OPTION_INVALID`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { isoFitsFor, mm, um } from "limitsmith";
 *
 * const answer = isoFitsFor({ size: mm(35), clearance: { min: um(5), max: um(60) } });
 * answer.fits[0]?.fit.designation; // → "H7/g6"
 * answer.fits[0]?.preferred?.name; // → "sliding"
 * ```
 * @reference ISO 286-1:2010, 3.4 (fit systems) and Tables 1 to 5; ANSI B4.2-1978 for the named pairs; the order is
 *   a rule of this library
 */
export function isoFitsFor(question: FitQuestion): FoundFits {
  const size = asLength(ownValue(question, "size") as LengthLike, ["size"]);
  const most = ownValue(question, "most") ?? USUAL_MOST;
  if (!Number.isInteger(most) || most < 0) {
    throw new LimitsError("OPTION_INVALID", "not a number of fits", { value: most, allowed: "a whole number from 0" });
  }
  const ranked = rankFits(candidatesAt(stepIndexOf(size.ticks)), ownValue(question, "clearance") as WantedClearance);
  return Object.freeze({
    found: ranked.length,
    fits: Object.freeze(
      ranked.slice(0, most).map(({ designation, preferred }) =>
        Object.freeze({ fit: isoFit(size, designation), preferred }),
      ),
    ),
  });
}

/** Every hole-basis and shaft-basis fit that the standard defines at a size step. */
function candidatesAt(stepIndex: number): Candidate[] {
  const holes = membersAt("hole", stepIndex);
  const shafts = membersAt("shaft", stepIndex);
  const preferred = new Map(preferredIsoFits().map((one) => [`${one.fit} ${one.system}`, one]));
  const list: Candidate[] = [];
  const add = (hole: Member, shaft: Member, system: "hole basis" | "shaft basis"): void => {
    const designation = `${hole.cls.text}/${shaft.cls.text}`;
    const standing = preferred.get(`${designation} ${system}`) ?? null;
    list.push({
      designation,
      minClearanceTicks: hole.lower - shaft.upper,
      maxClearanceTicks: hole.upper - shaft.lower,
      tier: tierOf(standing, hole, shaft),
      system: system === "hole basis" ? 0 : 1,
      preferred: standing,
    });
  };
  const basicHoles = holes.filter((one) => one.cls.letter === "H");
  const basicShafts = shafts.filter((one) => one.cls.letter === "h");
  for (const hole of basicHoles) for (const shaft of shafts) add(hole, shaft, "hole basis");
  // H/h is both; it stands among the hole-basis fits already
  for (const shaft of basicShafts) for (const hole of holes) if (hole.cls.letter !== "H") add(hole, shaft, "shaft basis");
  return list;
}

function membersAt(kind: "hole" | "shaft", stepIndex: number): readonly Member[] {
  const step = stepAt(stepIndex);
  return allClasses(kind).flatMap((cls) => {
    const found = classIfDefined(cls, stepIndex);
    if (found === null) return [];
    return [{ cls, upper: found.upper.ticks, lower: found.lower.ticks, printed: isInPrintedSpan(cls, step) }];
  });
}

function tierOf(preferred: PreferredFit | null, hole: Member, shaft: Member): number {
  if (preferred !== null) return preferred.standard === "ANSI B4.2" ? 0 : 1;
  return hole.printed && shaft.printed ? 2 : 3;
}
