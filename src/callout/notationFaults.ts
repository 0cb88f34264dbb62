import type { LengthUnit, WrittenDimension } from "../units/index.js";
import { asRequest } from "./asRequest.js";
import { readCallout } from "./readCallout.js";
import type { CalloutOptions } from "./readSize.js";
import type { CalloutRequest, DeviationsRequest } from "./request.js";

/** A departure from the number rules of a drawing standard. */
export interface NotationFault {
  /** Stable code. */
  readonly code:
    "ZERO_BEFORE_POINT_MISSING" | "ZERO_BEFORE_POINT_NEEDLESS" | "TRAILING_ZERO_NEEDLESS" | "PLACES_DIFFER";
  /** The rule, and what would follow it. */
  readonly says: string;
  /** The number that departs, as it was written. */
  readonly value: string;
}

/**
 * Lists where the numbers of a callout depart from the number rules of ASME Y14.5: zeros before the point, trailing
 * zeros, and decimals that do not agree with the tolerance. Limits do not change by it; a checker may still object.
 *
 * @param callout - the text, or a request that {@link readCallout} gave
 * @param options - `unit` of the drawing (mm, in …) and `decimalMark`, for a text
 * @returns a frozen list, empty where the notation follows the rules of its unit
 * @throws what {@link readCallout} throws
 * @example
 * ```ts
 * import { notationFaults } from "limitsmith";
 *
 * notationFaults("12.50", { unit: "mm" }).map(({ code }) => code); // → ["TRAILING_ZERO_NEEDLESS"]
 * notationFaults(".875 ±.005", { unit: "in" }); // → []
 * notationFaults(".87 ±.005", { unit: "in" }).map(({ code }) => code); // → ["PLACES_DIFFER"]
 * ```
 * @reference ASME Y14.5M-1994, 1.6.1 and 2.3 (kept in the 2018 edition with other numbers), by reprints
 */
export function notationFaults(callout: string | CalloutRequest, options?: CalloutOptions): readonly NotationFault[] {
  const request = typeof callout === "string" ? readCallout(callout, options) : asRequest(callout);
  const mark = request.text.includes(",") ? "," : ".";
  const sizes = sizesOf(request).flatMap(({ size, padded }) => sizeFaults(size, padded, mark));
  return Object.freeze([...sizes, ...toleranceFaults(request, mark)].map((fault) => Object.freeze(fault)));
}

interface WrittenNumber {
  readonly size: WrittenDimension;
  /** True where zeros may stand at the end: limits are padded to the same places, basic sizes are taught both ways. */
  readonly padded: boolean;
}

function sizesOf(request: CalloutRequest): readonly WrittenNumber[] {
  const depth = request.depth === null ? [] : [{ size: request.depth, padded: false }];
  return [...mainSizes(request), ...depth].filter(({ size }) => size.form === "decimal");
}

function mainSizes(request: CalloutRequest): readonly WrittenNumber[] {
  const padded = (...sizes: readonly WrittenDimension[]): WrittenNumber[] =>
    sizes.map((size) => ({ size, padded: true }));
  switch (request.kind) {
    case "limits":
      return padded(request.max, request.min);
    case "class": {
      const { nominal, printed } = request;
      return [{ size: nominal, padded: false }, ...(printed === null ? [] : padded(printed.max, printed.min))];
    }
    case "basic":
      return padded(request.nominal);
    case "single limit":
      return [{ size: request.size, padded: false }];
    case "chamfer":
      return [{ size: request.length, padded: false }];
    case "angle":
    case "thread":
      return [];
    default:
      return [{ size: request.nominal, padded: false }];
  }
}

function sizeFaults({ text, length }: WrittenDimension, padded: boolean, mark: string): NotationFault[] {
  const metric = isMetric(length.unit);
  const faults = pointFaults(text, metric, mark);
  if (metric && !padded && text.includes(mark) && text.endsWith("0")) {
    faults.push({ code: "TRAILING_ZERO_NEEDLESS", says: "metric: no zero after the last figure", value: text });
  }
  return faults;
}

/** Metric numbers below one have a zero before the point, inch numbers have none. */
function pointFaults(text: string, metric: boolean, mark: string): NotationFault[] {
  if (metric && text.startsWith(mark)) {
    return [{ code: "ZERO_BEFORE_POINT_MISSING", says: `metric: a zero before the point, 0${text}`, value: text }];
  }
  if (!metric && text.startsWith(`0${mark}`)) {
    return [
      { code: "ZERO_BEFORE_POINT_NEEDLESS", says: `inch: no zero before the point, ${text.slice(1)}`, value: text },
    ];
  }
  return [];
}

function toleranceFaults(request: CalloutRequest, mark: string): NotationFault[] {
  switch (request.kind) {
    case "limits":
      return pairFaults(request);
    case "class":
      return request.printed === null ? [] : pairFaults(request.printed);
    case "deviations":
      return deviationFaults(request, mark);
    default:
      return [];
  }
}

/** Limits have the same decimals, in both systems. */
function pairFaults({ max, min }: { readonly max: WrittenDimension; readonly min: WrittenDimension }): NotationFault[] {
  if (max.form !== "decimal" || min.form !== "decimal" || max.places === min.places) return [];
  return [{ code: "PLACES_DIFFER", says: "both limits have the same decimals", value: `${max.text}/${min.text}` }];
}

/** Inch: size and both deviations have the same decimals; metric: both deviations have, and a nil one is a plain 0. */
function deviationFaults(request: DeviationsRequest, mark: string): NotationFault[] {
  const { nominal, text } = request;
  if (nominal.form !== "decimal") return [];
  const metric = isMetric(nominal.length.unit);
  const numbers = toleranceNumbers(request);
  const faults = numbers.flatMap((number) => pointFaults(number, metric, mark));
  const nil = metric ? numbers.filter((number) => number.length > 1 && Number(number.replace(",", ".")) === 0) : [];
  for (const value of nil)
    faults.push({ code: "TRAILING_ZERO_NEEDLESS", says: "metric: a nil deviation is a plain 0", value });
  const places = numbers.filter((number) => !metric || number !== "0").map((number) => placesOf(number, mark));
  const wanted = metric ? places[0] : nominal.places;
  if (nil.length === 0 && places.some((count) => count !== wanted)) {
    const says = metric
      ? "metric: both deviations have the same decimals"
      : "inch: size and deviations have the same decimals";
    faults.push({ code: "PLACES_DIFFER", says, value: text });
  }
  return faults;
}

/** The numbers of the tolerance as they stand in the text. */
function toleranceNumbers({ text, parts }: DeviationsRequest): readonly string[] {
  return parts
    .filter(({ part }) => part === "tolerance")
    .flatMap(({ start, end }) => text.slice(start, end).match(/[\d.,]+/g) ?? []);
}

function placesOf(number: string, mark: string): number {
  return number.includes(mark) ? number.length - number.indexOf(mark) - 1 : 0;
}

function isMetric(unit: LengthUnit): boolean {
  return unit === "mm" || unit === "um";
}
