// Baseline: the same fit worked out with decimal objects, as a program that is careful but has no ticks would do it.

import { Decimal } from "decimal.js";
import { isoDeviations, mm } from "limitsmith";
import { STEP_ENDS_MM } from "./steps.js";

interface Row {
  readonly end: Decimal;
  readonly upper: Decimal;
  readonly lower: Decimal;
  readonly place: string;
}

interface DecimalLimits {
  readonly nominal: Decimal;
  readonly upperDeviation: Decimal;
  readonly lowerDeviation: Decimal;
  readonly max: Decimal;
  readonly min: Decimal;
  readonly tolerance: Decimal;
  readonly mean: Decimal;
  readonly basis: readonly string[];
}

/** What the bench compares: the numbers of a fit. */
export interface DecimalFit {
  readonly hole: DecimalLimits;
  readonly shaft: DecimalLimits;
  readonly maxClearance: Decimal;
  readonly minClearance: Decimal;
  readonly variation: Decimal;
  readonly kind: string;
}

/** Reads a fit such as `"H7/m6"` and works it out for a size in mm. */
export function decimalFit(classes: readonly string[]): (sizeMm: Decimal, fit: string) => DecimalFit {
  const tables = new Map(classes.map((name) => [name, tableOf(name)]));
  return (sizeMm, fit) => {
    const [holeClass, shaftClass] = fit.split("/");
    const hole = limitsOf(sizeMm, rowFor(tables.get(holeClass ?? "") ?? [], sizeMm));
    const shaft = limitsOf(sizeMm, rowFor(tables.get(shaftClass ?? "") ?? [], sizeMm));
    const maxClearance = hole.max.minus(shaft.min);
    const minClearance = hole.min.minus(shaft.max);
    const kind = minClearance.gte(0) ? "clearance" : maxClearance.lte(0) ? "interference" : "transition";
    return { hole, shaft, maxClearance, minClearance, variation: maxClearance.minus(minClearance), kind };
  };
}

function tableOf(toleranceClass: string): Row[] {
  return STEP_ENDS_MM.map((end) => {
    const { upperDeviationUm, lowerDeviationUm } = isoDeviations(mm(end), toleranceClass);
    return {
      end: new Decimal(end),
      upper: new Decimal(upperDeviationUm).div(1000),
      lower: new Decimal(lowerDeviationUm).div(1000),
      place: `${toleranceClass} up to ${end} mm`,
    };
  });
}

function rowFor(rows: readonly Row[], sizeMm: Decimal): Row {
  let low = 0;
  let high = rows.length;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if (rows[middle]?.end.lt(sizeMm) === true) low = middle + 1;
    else high = middle;
  }
  const row = rows[low];
  if (row === undefined) throw new Error("no row for this size");
  return row;
}

function limitsOf(nominal: Decimal, { upper, lower, place }: Row): DecimalLimits {
  const max = nominal.plus(upper);
  const min = nominal.plus(lower);
  return {
    nominal,
    upperDeviation: upper,
    lowerDeviation: lower,
    max,
    min,
    tolerance: upper.minus(lower),
    mean: max.plus(min).div(2),
    basis: [place],
  };
}
