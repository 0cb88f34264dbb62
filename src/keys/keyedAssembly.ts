import type { Basis, Caution } from "../basis.js";
import { makeFit } from "../limits/index.js";
import { lengthOfTicks, multiply } from "../units/index.js";
import type { Length, LengthUnit } from "../units/index.js";
import { assemblyVerdict, bearingVerdict, findingsOf } from "./assemblyFindings.js";
import { readParts } from "./assemblyParts.js";
import type { KeyedParts, ReadParts } from "./assemblyParts.js";
import type { KeyedAssembly, StackRange, StackTerm } from "./assemblyValue.js";
import { chordTicks } from "./crown.js";
import { CARRIES_LOAD } from "./keyCautions.js";
import { keyStep } from "./keyStep.js";
import type { KeyseatMember } from "./keyseatValue.js";
import { at, half, minus, playOf, plus, rangeOver } from "./stack.js";
import type { Corner, End } from "./stack.js";

/**
 * Judges whether a key, its shaft and its hub go together at every corner of their tolerances, and how.
 *
 * The key lies on the floor of the shaft keyseat. Over it there is room T − S − H where the shaft touches the bore on
 * the opposite side; pushing the shaft toward the key takes all its play from that, centring it takes half. A shaft
 * that is larger than its bore has no play; what pressing does to the sizes is left out.
 *
 * @param parts - limits of `shaft`, `bore`, `key` (width and height; `taper` where it has one), `shaftKeyseat` and
 *   `hubKeyseat` (width and one statement of depth), any unit, from the standard functions or as measured or printed
 * @returns the frozen stacks in the unit of the shaft, each with its chain of terms, and the verdicts with reasons
 * @throws `KEYED_JOINT_INVALID`, `KEY_WIDER_THAN_SHAFT`, `KEYSEAT_DEPTH_IMPOSSIBLE`, `LIMITS_UPSIDE_DOWN`,
 *   `LIMITS_INVALID`, `LIMITS_CONTRADICT`, `LENGTH_INVALID`
 * @example
 * ```ts
 * import { inchKey, inchKeyseat, keyedAssembly, limits } from "limitsmith";
 *
 * const seat = inchKeyseat("1 1/2 in", { class: 2 });
 * const joint = keyedAssembly({
 *   shaft: limits({ nominal: "1.5 in", upper: "0 thou", lower: "-0.6 thou" }),
 *   bore: limits({ nominal: "1.5 in", upper: "1 thou", lower: "0 thou" }),
 *   key: inchKey("1 1/2 in").keystock,
 *   shaftKeyseat: seat.shaft,
 *   hubKeyseat: seat.hub,
 * });
 * joint.assembles; // → "may need fitting"
 * [joint.top.away.max, joint.top.away.min]; // → ["0.03 in", "0.004 in"]
 * joint.top.toward.min.toString(); // → "0.0024 in"
 * joint.top.toward.minChain.length; // → 4
 * ```
 * @reference none of its own: geometry. For B17.1 parts it gives the fits of its Tables 2 and 3 (S and T being rounded
 *   apart, to 0.001 in)
 */
export function keyedAssembly(parts: KeyedParts): KeyedAssembly {
  const given = readParts(parts);
  const read: JointSizes = { ...given, edges: edgesOf(given) };
  const unit = read.shaft.nominal.unit;
  const sides = { shaft: sideRange(read, "shaft", unit), hub: sideRange(read, "hub", unit) };
  const top = topRanges(read, unit);
  const flankInShaft = flankRange(read, "shaft", unit);
  const flankInHub = flankRange(read, "hub", unit);
  const flankLifted = flankRange(read, "lifted", unit);
  const fit = makeFit(read.bore, read.shaft);
  const takeUp = read.taper === null ? null : takeUpOf(top.away, read.taper);
  // without a width nothing says that the key is held
  const loose = sides.shaft === null || sides.shaft.max.ticks > 0;
  const canLift = read.taper === null && loose && top.away.max.ticks > 0;
  const bears = bearingVerdict([flankInShaft, flankInHub, ...(canLift ? [flankLifted] : [])]);
  return Object.freeze({
    fit,
    sideInShaft: sides.shaft,
    sideInHub: sides.hub,
    top,
    overKey: rangeOver(["shaft", "shaftDepth", "height"] as const, unit, (corner) => [
      ...floorTerms(read, "shaft", corner.shaft, corner.shaftDepth, 1),
      plus(`height of the key, ${corner.height}`, at(read.keyHeight, corner.height)),
    ]),
    aboveShaft: rangeOver(["shaft", "shaftDepth", "height"] as const, unit, (corner) => [
      ...floorTerms(read, "shaft", corner.shaft, corner.shaftDepth, 1),
      plus(`height of the key, ${corner.height}`, at(read.keyHeight, corner.height)),
      minus(`diameter of the shaft, ${corner.shaft}`, at(read.shaft, corner.shaft)),
    ]),
    flankInShaft,
    flankInHub,
    flankLifted,
    takeUp,
    assembles: assemblyVerdict(read.taper !== null, sides, top.away),
    canLift,
    bears,
    findings: Object.freeze(findingsOf(sides, top, { flankInShaft, flankInHub, flankLifted }, canLift, takeUp, fit)),
    basis: BASIS,
    cautions: CAUTIONS,
  });
}

const BASIS: Basis = Object.freeze([
  keyStep(
    "geometry",
    "stack of a keyed joint",
    "clearance over the key = T - S - H with the shaft pushed away, less half or all of the play otherwise; " +
      "side clearance = keyseat width - key width",
    "derived",
  ),
]);

const CAUTIONS: readonly Caution[] = Object.freeze([CARRIES_LOAD]);

/** The parts with what follows from them. */
interface JointSizes extends ReadParts {
  readonly edges: Edges;
}

type Name = "shaft" | "bore" | "shaftDepth" | "hubDepth" | "height";
const NAMES: readonly Name[] = ["shaft", "bore", "shaftDepth", "hubDepth", "height"];

function sideRange(read: JointSizes, member: KeyseatMember, unit: LengthUnit): StackRange | null {
  const { width } = member === "shaft" ? read.shaftKeyseat : read.hubKeyseat;
  if (width === null) return null;
  return rangeOver(["seat", "key"] as const, unit, (corner) => [
    plus(`width of the ${member} keyseat, ${corner.seat}`, at(width, corner.seat)),
    minus(`width of the key, ${corner.key}`, at(read.keyWidth, corner.key)),
  ]);
}

function topRanges(read: JointSizes, unit: LengthUnit): KeyedAssembly["top"] {
  const away = (corner: Corner<Name>): readonly StackTerm[] => [
    ...floorTerms(read, "hub", corner.bore, corner.hubDepth, 1),
    ...floorTerms(read, "shaft", corner.shaft, corner.shaftDepth, -1),
    minus(`height of the key, ${corner.height}`, at(read.keyHeight, corner.height)),
  ];
  const play = (corner: Corner<Name>): Length => playOf(at(read.bore, corner.bore), at(read.shaft, corner.shaft));
  return Object.freeze({
    away: rangeOver(NAMES, unit, away),
    centred: rangeOver(NAMES, unit, (corner) => [
      ...away(corner),
      minus("half the play of the shaft in the bore", half(play(corner))),
    ]),
    toward: rangeOver(NAMES, unit, (corner) => [...away(corner), minus("play of the shaft in the bore", play(corner))]),
  });
}

/** Terms from the opposite side of shaft or bore to the floor of its keyseat, added or taken away. */
function floorTerms(
  read: JointSizes,
  member: KeyseatMember,
  diameterEnd: End,
  depthEnd: End,
  sign: 1 | -1,
): readonly StackTerm[] {
  const inShaft = member === "shaft";
  const seat = inShaft ? read.shaftKeyseat : read.hubKeyseat;
  const add = sign === 1 ? plus : minus;
  const take = sign === 1 ? minus : plus;
  const depth = at(seat.depth, depthEnd);
  if (seat.form === "control") {
    return [add(`${inShaft ? "S of the shaft keyseat" : "T of the hub keyseat"}, ${depthEnd}`, depth)];
  }
  const deepen = inShaft ? take : add;
  const diameter = at(inShaft ? read.shaft : read.bore, diameterEnd);
  const circle = inShaft ? "diameter of the shaft" : "diameter of the bore";
  if (seat.form === "depth") {
    return [
      add(`${circle}, ${diameterEnd}`, diameter),
      deepen(`${inShaft ? "t1 of the shaft keyway" : "t2 of the hub keyway"}, ${depthEnd}`, depth),
    ];
  }
  return [
    add(`${circle} less the crown, ${diameterEnd}`, read.edges[member][diameterEnd]),
    deepen(`side depth of the ${member} keyseat, ${depthEnd}`, depth),
  ];
}

/**
 * From the opposite side to the edges of the seats, D − Y, at both limits of the diameters. Y goes by the nominal width
 * of the key, as in the standard: a seat is wider by its tolerance only.
 */
type Edges = Readonly<Record<KeyseatMember, Readonly<Record<End, Length>>>>;

function edgesOf({ shaft, bore, keyWidth }: ReadParts): Edges {
  const of = (diameter: Length): Length => lengthOfTicks(chordTicks(diameter, keyWidth.nominal), diameter.unit);
  return {
    shaft: { max: of(shaft.max), min: of(shaft.min) },
    hub: { max: of(bore.max), min: of(bore.min) },
  };
}

function flankRange(read: JointSizes, where: "shaft" | "hub" | "lifted", unit: LengthUnit): StackRange {
  return rangeOver(NAMES, unit, (corner) => {
    const height = plus(`height of the key, ${corner.height}`, at(read.keyHeight, corner.height));
    const shaftEdge = plus(`diameter of the shaft less the crown, ${corner.shaft}`, read.edges.shaft[corner.shaft]);
    if (where === "shaft") return [shaftEdge, ...floorTerms(read, "shaft", corner.shaft, corner.shaftDepth, -1)];
    if (where === "lifted") return [shaftEdge, height, ...floorTerms(read, "hub", corner.bore, corner.hubDepth, -1)];
    return [
      ...floorTerms(read, "shaft", corner.shaft, corner.shaftDepth, 1),
      height,
      minus(`diameter of the bore less the crown, ${corner.bore}`, read.edges.hub[corner.bore]),
    ];
  });
}

function takeUpOf(away: StackRange, taper: NonNullable<ReadParts["taper"]>): NonNullable<KeyedAssembly["takeUp"]> {
  // interference over the key, times run over rise
  const factor = { numerator: -taper.denominator, denominator: taper.numerator };
  return Object.freeze({ max: multiply(away.min, factor), min: multiply(away.max, factor) });
}
