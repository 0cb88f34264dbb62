const TICKS_PER_THOU = 254_000;

/** Ticks of a table's thousandths of an inch. */
export function thouTicks(thou: number): number {
  // five decimals of an inch suffice for every cell; rounding removes what a double adds to 0.35 thou
  return Math.round(thou * TICKS_PER_THOU);
}

/** "+0.35", "-1.2", "0": a deviation in thou as the tables sign it. */
export function signedThou(thou: number): string {
  return thou > 0 ? `+${thou}` : plainThou(thou);
}

/** "0.35": without the minus that a zero may carry. */
export function plainThou(thou: number): string {
  return String(thou === 0 ? 0 : thou);
}

/** "+0.35" of ticks. */
export function signedThouOfTicks(ticks: number): string {
  return signedThou(ticks / TICKS_PER_THOU);
}
