import { LimitsError } from "../errors.js";
import { angleLimits } from "../limits/index.js";
import { angleOfMicroarcseconds, asLength, readAngle } from "../units/index.js";
import type { Angle, AngleLike, LengthLike } from "../units/index.js";
import { angleByStandard, callsAngles } from "./angleByStandard.js";
import { lineStep } from "./blockLine.js";
import type { DefaultAngleLimits } from "./defaultValue.js";
import { largerRule, machinedStandard, noLine, onlyWay, standardOfWay, standardStep } from "./defaultWays.js";
import type { Way } from "./defaultWays.js";
import { lineCautions } from "./generalCautions.js";
import type { TitleBlock } from "./titleBlockValue.js";

/** Gives an angle its default, by the ways that were asked for or by the only one that the block can mean. */
export function defaultAngle(
  block: TitleBlock,
  nominal: AngleLike,
  asked: readonly Way[] | null,
  shorterLeg: LengthLike | undefined,
): DefaultAngleLimits {
  const angle = readAngle(nominal);
  const possible: Way[] = [];
  if (block.angles !== null || machinedStandard(block) !== null) possible.push("machined");
  if (block.weldments !== null) possible.push("welded");
  const ways = asked ?? onlyWay(block, angle.toString(), possible);
  const [first, second] = ways.map((way) => byWay(block, angle, way, shorterLeg)) as [
    DefaultAngleLimits,
    DefaultAngleLimits?,
  ];
  return second === undefined ? first : larger(first, second);
}

function byWay(block: TitleBlock, angle: Angle, way: Way, shorterLeg: LengthLike | undefined): DefaultAngleLimits {
  if (way === "machined" && block.angles !== null) return byLine(block, angle, block.angles);
  const called = standardOfWay(block, way);
  // castings have no general tolerance of angles
  if (called === null || !callsAngles(called)) {
    throw noLine(block, angle.toString(), way === "machined" ? "angles" : `angles of ${way} surfaces`);
  }
  if (shorterLeg === undefined) {
    throw new LimitsError("TITLE_BLOCK_OPTION_NEEDED", `${called.standard} goes by the shorter leg of the angle`, {
      value: angle.toString(),
      allowed: "the option shorterLeg: its length, with a unit",
    });
  }
  return angleByStandard(angle, called, asLength(shorterLeg, ["shorterLeg"]), standardStep(called));
}

function byLine(block: TitleBlock, nominal: Angle, tolerance: Angle): DefaultAngleLimits {
  const says = `angles: ±${tolerance.toString()}`;
  const basis = [lineStep(block, "", "angles", says)];
  return Object.freeze({
    kind: "angle" as const,
    limits: angleLimits({
      nominal,
      upper: tolerance,
      lower: angleOfMicroarcseconds(-tolerance.microarcseconds, tolerance.style),
      basis,
    }),
    line: says,
    cautions: lineCautions(basis),
  });
}

function larger(raw: DefaultAngleLimits, machined: DefaultAngleLimits): DefaultAngleLimits {
  const chosen = raw.limits.tolerance.microarcseconds < machined.limits.tolerance.microarcseconds ? machined : raw;
  const { basis, cautions } = largerRule(chosen, [raw, machined]);
  const { nominal, upperDeviation, lowerDeviation } = chosen.limits;
  const limits = angleLimits({ nominal, upper: upperDeviation, lower: lowerDeviation, basis });
  return Object.freeze({ ...chosen, limits, cautions });
}
