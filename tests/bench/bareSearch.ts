// Baseline: a bare binary search in typed arrays, with nothing around it: no text, no checks, no result object.

import { isoDeviations, mm } from "limitsmith";
import { STEP_ENDS_MM } from "./steps.js";

/** A search for one class: gives the sum of its two deviations in tenths of a µm, so that nothing is left out. */
export function bareSearch(toleranceClass: string): (sizeMm: number) => number {
  const ends = Float64Array.from(STEP_ENDS_MM);
  const upper = new Int32Array(ends.length);
  const lower = new Int32Array(ends.length);
  ends.forEach((end, index) => {
    const deviations = isoDeviations(mm(end), toleranceClass);
    upper[index] = Math.round(deviations.upperDeviationUm * 10);
    lower[index] = Math.round(deviations.lowerDeviationUm * 10);
  });
  return (sizeMm) => {
    let low = 0;
    let high = ends.length;
    while (low < high) {
      const middle = (low + high) >>> 1;
      if (sizeMm > (ends[middle] ?? 0)) low = middle + 1;
      else high = middle;
    }
    return (upper[low] ?? 0) + (lower[low] ?? 0);
  };
}
