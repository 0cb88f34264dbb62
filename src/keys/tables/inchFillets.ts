// ANSI/ASME B17.1-1967, suggested keyseat fillet radius and 45 degree key chamfer by keyseat depth H/2; memory.
// General practice is sharp corners with square-edged keys; the values are for where a fillet is used.

/** Up to and including this depth, fillet radius, key chamfer. */
export type InchFilletRow = readonly [to: string, radius: string, chamfer: string];

/** Nothing is suggested up to this depth. */
export const INCH_FILLETS_OVER = "1/8";

/** Each row starts where the one above ends. */
export const INCH_FILLETS: readonly InchFilletRow[] = [
  ["1/4", "1/32", "3/64"],
  ["1/2", "1/16", "5/64"],
  ["7/8", "1/8", "5/32"],
  ["1 1/4", "3/16", "7/32"],
  ["1 3/4", "1/4", "9/32"],
  ["2 1/2", "3/8", "13/32"],
];
