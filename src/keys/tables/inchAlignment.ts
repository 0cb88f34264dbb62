// ANSI/ASME B17.1-1967, keyseat alignment tolerances, in inches; one source.

/** Parallel displacement of the keyseat centreline from that of shaft or bore, at most. */
export const INCH_KEYSEAT_OFFSET = "0.010";

/** Lead at right angles to the centreline, at most: `max` up to `to`, `perInch` of length over 4 to 10 in. */
export const INCH_KEYSEAT_LEAD = { shortTo: "4", short: "0.002", middleTo: "10", perInch: "0.0005", long: "0.005" } as const;
