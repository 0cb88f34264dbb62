import type { Fit } from "../limits/index.js";
import { multiply, writeLength } from "../units/index.js";
import type { Length } from "../units/index.js";
import type { AssemblyFinding, AssemblyVerdict, BearingVerdict, KeyedAssembly, StackRange } from "./assemblyValue.js";

/** The side fits of a joint. */
export interface Sides {
  readonly shaft: StackRange | null;
  readonly hub: StackRange | null;
}

/** Whether the key goes in. */
export function assemblyVerdict(isTaper: boolean, sides: Sides, away: StackRange): AssemblyVerdict {
  // a taper key is driven until it is tight: what it meets over its top is no obstacle
  const gaps = [sides.shaft, sides.hub, ...(isTaper ? [] : [away])];
  if (gaps.some((gap) => gap !== null && gap.max.ticks < 0)) return "cannot assemble";
  return gaps.every((gap) => gap !== null && gap.min.ticks >= 0) ? "always assembles" : "may need fitting";
}

/** Whether the flanks of the key find their walls. */
export function bearingVerdict(flanks: readonly StackRange[]): BearingVerdict {
  if (flanks.some(({ max }) => max.ticks <= 0)) return "cannot bear";
  return flanks.every(({ min }) => min.ticks > 0) ? "always bears" : "may not bear";
}

/** What was found, with sizes, in words. */
export function findingsOf(
  sides: Sides,
  top: KeyedAssembly["top"],
  flanks: Pick<KeyedAssembly, "flankInShaft" | "flankInHub" | "flankLifted">,
  canLift: boolean,
  takeUp: KeyedAssembly["takeUp"],
  fit: Fit,
): readonly AssemblyFinding[] {
  const found: AssemblyFinding[] = [];
  const find = (code: AssemblyFinding["code"], place: AssemblyFinding["place"], says: string): void => {
    found.push(Object.freeze({ code, place, says }));
  };
  for (const place of ["shaft", "hub"] as const) {
    const side = sides[place];
    if (side === null) {
      find("SIDE_NOT_GIVEN", place, `the width of the ${place} keyseat is not given: its side fit is not judged`);
    } else if (side.min.ticks < 0) {
      const always = side.max.ticks < 0 ? "at every corner: the key must be pressed or fitted" : "at some corners";
      find(
        "SIDE_INTERFERES",
        place,
        `the key interferes by up to ${size(negative(side.min))} at its sides in the ${place}, ${always}`,
      );
    }
  }
  const { away, centred, toward } = top;
  if (takeUp !== null) {
    find(
      "TAPER_TAKES_UP",
      "top",
      `the taper takes up ${size(away.max)} clearance to ${size(away.min)}: driven home, the key stops between ` +
        `${size(takeUp.max)} short of its full depth and ${size(negative(takeUp.min))} past it`,
    );
  } else if (away.min.ticks < 0) {
    const always = away.max.ticks < 0 ? "at every corner" : "at some corners";
    find("TOP_PINCHED", "top", `the key is up to ${size(negative(away.min))} too high between the floors, ${always}`);
  } else if (toward.min.ticks < 0) {
    const eccentric = centred.min.ticks < 0 ? "the hub can be held off centre" : "the shaft can still be centred";
    find("KEY_TAKES_PLAY", "top", `pushed toward the key, the shaft meets it before the bore: ${eccentric}`);
  }
  if (canLift) {
    find(
      "KEY_CAN_LIFT",
      "shaft",
      `the key can be loose in the shaft and rise up to ${size(away.max)}; ` +
        `${size(flanks.flankLifted.min)} of the wall is left then at the least`,
    );
  }
  const walls = [
    ["shaft", flanks.flankInShaft],
    ["hub", flanks.flankInHub],
    ...(canLift ? [["shaft", flanks.flankLifted] as const] : []),
  ] as const;
  for (const [place, wall] of walls) {
    if (wall.min.ticks > 0) continue;
    const always = wall.max.ticks <= 0 ? "at every corner" : "at some corners";
    const how = wall === flanks.flankLifted ? " once it has lifted" : "";
    find("KEY_CANNOT_BEAR", place, `the key finds no wall in the ${place}${how}, ${always}`);
  }
  if (fit.minClearance.ticks < 0) {
    find(
      "SHAFT_PRESSES",
      "bore",
      `the shaft is up to ${size(fit.maxInterference)} larger than the bore: what pressing does to the keyseats is left out`,
    );
  }
  return found;
}

function negative(length: Length): Length {
  return multiply(length, -1);
}

/** A size for a sentence: to 0.0001 in or 0.001 mm. */
function size(length: Length): string {
  const metric = length.unit === "mm" || length.unit === "um";
  return writeLength(length, metric ? { unit: "mm", places: 3 } : { unit: "in", places: 4 });
}
