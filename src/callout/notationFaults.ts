import { ownValue } from "../ownValue.js";
import type { WrittenDimension } from "../units/index.js";
import { asRequest } from "./asRequest.js";
import { readCallout } from "./readCallout.js";
import type { CalloutOptions } from "./readSize.js";
import type { CalloutRequest } from "./request.js";

/** A departure from the number rules of a drawing standard. */
export interface NotationFault {
  /** Stable code. */
  readonly code:
    | "ZERO_BEFORE_POINT_MISSING"
    | "ZERO_BEFORE_POINT_NEEDLESS"
    | "TRAILING_ZERO_NEEDLESS"
    | "PLACES_DIFFER";
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
  const decimalMark = ownValue(options, "decimalMark");
  const sizes = sizesOf(request).filter(({ form }) => form === "decimal");
  const faults = sizes.flatMap((size) => zeroFaults(size, request.kind, decimalMark));
  return Object.freeze([...faults, ...placesFaults(request)].map((fault) => Object.freeze(fault)));
}

function sizesOf(request: CalloutRequest): readonly WrittenDimension[] {
  switch (request.kind) {
    case "limits":
      return [request.max, request.min];
    case "single limit":
      return [request.size];
    case "chamfer":
      return [request.length];
    case "angle":
    case "thread":
      return [];
    default:
      return [request.nominal];
  }
}

function zeroFaults(size: WrittenDimension, kind: CalloutRequest["kind"], decimalMark: string | undefined): NotationFault[] {
  const { text, length } = size;
  const metric = length.unit === "mm" || length.unit === "um";
  const mark = decimalMark ?? ".";
  const faults: NotationFault[] = [];
  if (metric && text.startsWith(mark)) {
    faults.push({ code: "ZERO_BEFORE_POINT_MISSING", says: `metric: a zero before the point, 0${text}`, value: text });
  }
  if (!metric && text.startsWith(`0${mark}`)) {
    faults.push({ code: "ZERO_BEFORE_POINT_NEEDLESS", says: `inch: no zero before the point, ${text.slice(1)}`, value: text });
  }
  // limits are padded to the same places, and basic sizes are taught both ways
  if (metric && kind !== "limits" && kind !== "basic" && text.includes(mark) && text.endsWith("0")) {
    faults.push({ code: "TRAILING_ZERO_NEEDLESS", says: "metric: no zero after the last figure", value: text });
  }
  return faults;
}

/** Inch: size and tolerance have the same places; limits have them in both systems. */
function placesFaults(request: CalloutRequest): NotationFault[] {
  if (request.kind === "limits") {
    const { max, min } = request;
    return max.form === "decimal" && min.form === "decimal" && max.places !== min.places
      ? [{ code: "PLACES_DIFFER", says: "both limits have the same decimals", value: `${max.text}/${min.text}` }]
      : [];
  }
  if (request.kind !== "deviations") return [];
  const { nominal } = request;
  const inch = nominal.length.unit === "in" && nominal.form === "decimal";
  const places = tolerancePlaces(request);
  if (!inch || places.every((count) => count === nominal.places)) return [];
  return [{ code: "PLACES_DIFFER", says: "inch: size and tolerance have the same decimals", value: request.text }];
}

/** Decimals of the tolerance as they stand in the text; a plain 0 has none. */
function tolerancePlaces({ text, parts }: CalloutRequest): readonly number[] {
  return parts
    .filter(({ part }) => part === "tolerance")
    .flatMap(({ start, end }) => text.slice(start, end).match(/\d*[.,]?\d+/g) ?? [])
    .map((number) => /[.,](\d*)$/.exec(number)?.[1]?.length ?? 0);
}
