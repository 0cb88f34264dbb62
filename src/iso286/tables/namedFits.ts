// ANSI B4.2-1978 (R2004), preferred fits: names and pairs as reprinted in several handbooks; uses in our words.

/** One preferred fit with its name. */
export interface NamedFit {
  readonly name: string;
  readonly holeBasis: string;
  readonly shaftBasis: string;
  readonly use: string;
}

/** The ten preferred fits, loosest first. */
export const NAMED_FITS: readonly NamedFit[] = [
  {
    name: "loose running",
    holeBasis: "H11/c11",
    shaftBasis: "C11/h11",
    use: "wide commercial tolerances and outside members, where play does no harm",
  },
  {
    name: "free running",
    holeBasis: "H9/d9",
    shaftBasis: "D9/h9",
    use: "fast or hot running shafts and heavy journal loads, where accuracy is secondary",
  },
  {
    name: "close running",
    holeBasis: "H8/f7",
    shaftBasis: "F8/h7",
    use: "running with good location at moderate speed and load",
  },
  {
    name: "sliding",
    holeBasis: "H7/g6",
    shaftBasis: "G7/h6",
    use: "parts that slide, turn by hand and locate well, but do not run",
  },
  {
    name: "locational clearance",
    holeBasis: "H7/h6",
    shaftBasis: "H7/h6",
    use: "snug location of parts at rest that come apart by hand",
  },
  {
    name: "locational transition",
    holeBasis: "H7/k6",
    shaftBasis: "K7/h6",
    use: "accurate location, a little play or a little interference",
  },
  {
    name: "tight locational transition",
    holeBasis: "H7/n6",
    shaftBasis: "N7/h6",
    use: "more accurate location where more interference may occur",
  },
  {
    name: "locational interference",
    holeBasis: "H7/p6",
    shaftBasis: "P7/h6",
    use: "rigid and exact alignment without counting on the pressure in the bore",
  },
  {
    name: "medium drive",
    holeBasis: "H7/s6",
    shaftBasis: "S7/h6",
    use: "pressed steel parts and shrink fits on light sections; the tightest for cast iron",
  },
  {
    name: "force",
    holeBasis: "H7/u6",
    shaftBasis: "U7/h6",
    use: "highly stressed joints, or shrinking where the pressing force would be too great",
  },
];
