// ANSI B4.1-1967: the classes, their hole and shaft symbols by the American-British-Canadian (ABC) agreements, and
// what each class is for, in our words. null: the standard gives no symbol. The symbols of LC1 to LC5 are from memory.

/** What the standard says of a class besides its limits. */
export interface ClassFacts {
  readonly hole: string;
  readonly shaft: string | null;
  /** How sure the symbols are. */
  readonly symbolMark: "one-source" | "memory";
  readonly purpose: string;
}

/** All classes, in the order of the standard. */
export const CLASS_FACTS: Readonly<Record<string, ClassFacts>> = {
  RC1: {
    hole: "H5", shaft: "g4", symbolMark: "one-source",
    purpose: "Closest sliding fit: accurate location with no play that can be felt.",
  },
  RC2: {
    hole: "H6", shaft: "g5", symbolMark: "one-source",
    purpose: "Sliding fit: parts move and turn easily but are not meant to run; large sizes may bind on a small temperature change.",
  },
  RC3: {
    hole: "H7", shaft: "f6", symbolMark: "one-source",
    purpose: "Precision running fit: about the closest that still runs freely; slow speed, light load, steady temperature.",
  },
  RC4: {
    hole: "H8", shaft: "f7", symbolMark: "one-source",
    purpose: "Close running fit: accurate machinery at moderate speed and load where little play is wanted.",
  },
  RC5: {
    hole: "H8", shaft: "e7", symbolMark: "one-source",
    purpose: "Medium running fit: higher speeds or heavier journal loads, tighter of the two.",
  },
  RC6: {
    hole: "H9", shaft: "e8", symbolMark: "one-source",
    purpose: "Medium running fit: as RC5 with wider tolerances.",
  },
  RC7: {
    hole: "H9", shaft: "d8", symbolMark: "one-source",
    purpose: "Free running fit: accuracy unimportant or wide temperature swings.",
  },
  RC8: {
    hole: "H10", shaft: "c9", symbolMark: "one-source",
    purpose: "Loose running fit: commercial-tolerance parts with a clear allowance.",
  },
  RC9: {
    hole: "H11", shaft: null, symbolMark: "one-source",
    purpose: "Loosest running fit: widest tolerances and allowance of the running group.",
  },
  LC1: {
    hole: "H6", shaft: "h5", symbolMark: "memory",
    purpose: "Snug locating fit, finest grades, zero least clearance; parts free to assemble and take apart.",
  },
  LC2: {
    hole: "H7", shaft: "h6", symbolMark: "memory",
    purpose: "Snug locating fit, ordinary fine grades, zero least clearance.",
  },
  LC3: {
    hole: "H8", shaft: "h7", symbolMark: "memory",
    purpose: "Locating fit with zero least clearance, medium grades.",
  },
  LC4: {
    hole: "H10", shaft: "h9", symbolMark: "memory",
    purpose: "Locating fit with zero least clearance, coarse grades.",
  },
  LC5: {
    hole: "H7", shaft: "g6", symbolMark: "memory",
    purpose: "Locating fit with a small sure clearance, fine grades.",
  },
  LC6: {
    hole: "H9", shaft: "f8", symbolMark: "one-source",
    purpose: "Locating fit with moderate clearance, medium grades.",
  },
  LC7: {
    hole: "H10", shaft: "e9", symbolMark: "one-source",
    purpose: "Locating fit with wider clearance, easier assembly.",
  },
  LC8: {
    hole: "H10", shaft: "d9", symbolMark: "one-source",
    purpose: "Locating fit with wider clearance still.",
  },
  LC9: {
    hole: "H11", shaft: "c10", symbolMark: "one-source",
    purpose: "Loose locating fit, ease of assembly first.",
  },
  LC10: {
    hole: "H12", shaft: null, symbolMark: "one-source",
    purpose: "Very loose fit of the fastener kind.",
  },
  LC11: {
    hole: "H13", shaft: null, symbolMark: "one-source",
    purpose: "Loosest of the locating group, fastener clearances.",
  },
  LT1: {
    hole: "H7", shaft: "js6", symbolMark: "one-source",
    purpose: "Transition fit that nearly always clears, close location.",
  },
  LT2: {
    hole: "H8", shaft: "js7", symbolMark: "one-source",
    purpose: "As LT1 with one grade wider tolerances.",
  },
  LT3: {
    hole: "H7", shaft: "k6", symbolMark: "one-source",
    purpose: "Transition fit, clearance and interference about equally likely.",
  },
  LT4: {
    hole: "H8", shaft: "k7", symbolMark: "one-source",
    purpose: "As LT3 with wider tolerances.",
  },
  LT5: {
    hole: "H7", shaft: "n6", symbolMark: "one-source",
    purpose: "Transition fit that mostly interferes, light pressing.",
  },
  LT6: {
    hole: "H7", shaft: "n7", symbolMark: "one-source",
    purpose: "As LT5 with a wider shaft tolerance, more interference possible.",
  },
  LN1: {
    hole: "H6", shaft: "n5", symbolMark: "one-source",
    purpose: "Lightest locating interference, may just touch; rigidity and alignment, not load carrying.",
  },
  LN2: {
    hole: "H7", shaft: "p6", symbolMark: "one-source",
    purpose: "Ordinary locating interference (press) for location and rigidity.",
  },
  LN3: {
    hole: "H7", shaft: "r6", symbolMark: "one-source",
    purpose: "Heavier locating interference, always some pressure.",
  },
  FN1: {
    hole: "H6", shaft: null, symbolMark: "one-source",
    purpose: "Light drive: thin sections, long engagements, cast-iron hubs.",
  },
  FN2: {
    hole: "H7", shaft: "s6", symbolMark: "one-source",
    purpose: "Medium drive: ordinary steel parts or shrink on light sections; about the tightest for good cast iron.",
  },
  FN3: {
    hole: "H7", shaft: "t6", symbolMark: "one-source",
    purpose: "Heavy drive: heavier steel parts or shrink on medium sections.",
  },
  FN4: {
    hole: "H7", shaft: "u6", symbolMark: "one-source",
    purpose: "Force fit: parts able to take high stress, or shrink where pressing force is impractical.",
  },
  FN5: {
    hole: "H8", shaft: "x7", symbolMark: "one-source",
    purpose: "As FN4 with the greatest interference.",
  },
};
