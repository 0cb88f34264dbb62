import type { CalloutRequest, DualSize } from "../callout/index.js";
import { isoClassesFor } from "../iso286/index.js";
import { limitsFromMaxMin, matchLimits } from "../limits/index.js";
import type { Limits } from "../limits/index.js";
import { roundLength } from "../units/index.js";
import type { Length, LengthUnit, Rounding, WrittenDimension } from "../units/index.js";
import { limitsOfRow } from "./readRow.js";
import type { SheetFinding, SheetRow } from "./sheetValue.js";

const MOST_PLACES: Readonly<Record<LengthUnit, number>> = { mm: 7, um: 4, in: 6, thou: 3, uin: 0 };
const ROUNDINGS: readonly Rounding[] = ["nearest", "nearest-away", "up", "down"];

/** Findings of a callout: printed limits that are not those of its class, a second unit that says something else. */
export function findingsOfCallout(row: SheetRow): readonly SheetFinding[] {
  if (!row.ok || row.id === null || row.resolved.outcome === "keyseat") return [];
  const { request } = row.resolved;
  const limits = limitsOfRow(row);
  return [...printedFindings(row.id, request, limits), ...dualFindings(row.id, request, limits)];
}

function printedFindings(id: string, request: CalloutRequest, limits: Limits | null): readonly SheetFinding[] {
  if (request.kind !== "class" || request.printed === null || limits === null) return [];
  const { max, min } = request.printed;
  const given = limitsFromMaxMin({ max: max.length, min: min.length, nominal: request.nominal.length });
  const { unit } = max.length;
  const printed = { unit, places: placesIn(unit, Math.max(max.places, min.places)) };
  if (matchLimits(given, limits, printed) !== null) return [];
  const others = isoClassesFor(given, { printed }).map(({ toleranceClass }) => toleranceClass.text);
  const which = others.length === 0 ? "of no ISO class on this size" : `of ${others.join(", ")}`;
  return [
    Object.freeze({
      code: "PRINTED_LIMITS_NOT_OF_CLASS",
      severity: "error",
      features: Object.freeze([id]),
      says: `the limits printed behind ${request.toleranceClass} are ${which}`,
      found: `${max.text} / ${min.text}`,
      expected: `${limits.max.toString()} / ${limits.min.toString()}`,
      settle: "the limits of the class, or the class of the limits",
    }),
  ];
}

function dualFindings(id: string, request: CalloutRequest, limits: Limits | null): readonly SheetFinding[] {
  const { dual } = request;
  if (dual === null) return [];
  const [max, min] = standingBeside(request, dual, limits);
  if (max === null || min === null || (agrees(dual.max, max) && agrees(dual.min, min))) return [];
  const one = dual.max.length.ticks === dual.min.length.ticks;
  return [
    Object.freeze({
      code: "DUAL_DIMENSIONS_DISAGREE",
      severity: "error",
      features: Object.freeze([id]),
      says: "the size in brackets is not the one before it in the other unit",
      found: one ? dual.max.text : `${dual.max.text} / ${dual.min.text}`,
      expected: one ? max.toString() : `${max.toString()} / ${min.toString()}`,
      settle: "the one that was meant, and the other converted from it",
    }),
  ];
}

/** What the brackets repeat: two sizes repeat limits, one repeats the nominal size or the single limit. */
function standingBeside(
  request: CalloutRequest,
  dual: DualSize,
  limits: Limits | null,
): readonly [max: Length | null, min: Length | null] {
  if (dual.max.length.ticks !== dual.min.length.ticks) return [limits?.max ?? null, limits?.min ?? null];
  const size = sizeOf(request);
  return [size, size];
}

function sizeOf(request: CalloutRequest): Length | null {
  switch (request.kind) {
    case "limits":
    case "angle":
    case "thread":
      return null;
    case "single limit":
      return request.size.length;
    case "chamfer":
      return request.length.length;
    default:
      return request.nominal.length;
  }
}

/** True where the written size is the exact one, rounded in any way to its decimals. */
function agrees({ length, places, form }: WrittenDimension, exact: Length): boolean {
  if (form === "fraction") return length.ticks === exact.ticks;
  const { unit } = length;
  const kept = placesIn(unit, places);
  return ROUNDINGS.some((rounding) => roundLength(exact, { unit, places: kept, rounding }).ticks === length.ticks);
}

/** Decimals that whole ticks can hold; a seventh of an inch is written, if ever, for show. */
function placesIn(unit: LengthUnit, places: number): number {
  return Math.min(places, MOST_PLACES[unit]);
}
