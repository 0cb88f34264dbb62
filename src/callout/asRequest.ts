import { LimitsError } from "../errors.js";
import { parseInchClass } from "../inchFits/index.js";
import { parseToleranceClass } from "../iso286/index.js";
import { hasOwn } from "../ownValue.js";
import { asLength, compareLengths, readAngle } from "../units/index.js";
import type { Length, WrittenDimension } from "../units/index.js";
import type { CalloutRequest, CalloutShape } from "./request.js";

const KNOWN_SHAPES: readonly CalloutShape[] = [
  "unmarked",
  "diameter",
  "radius",
  "spherical diameter",
  "spherical radius",
  "square",
];

/** Takes a request that may have travelled through JSON or `structuredClone` and makes its lengths lengths again. */
export function asRequest(request: CalloutRequest): CalloutRequest {
  const given: unknown = request;
  if (typeof given !== "object" || given === null || !hasOwn(given, "kind")) throw notARequest(given);
  const { depth, dual, count, shape } = request;
  if (count !== null && (!Number.isInteger(count) || count < 1)) throw notARequest(count);
  if (!KNOWN_SHAPES.includes(shape)) throw notARequest(shape);
  return Object.freeze({
    ...asBody(request),
    depth: depth === null ? null : asSize(depth),
    dual: dual === null ? null : asPair(dual),
  });
}

function asBody(request: CalloutRequest): CalloutRequest {
  switch (request.kind) {
    case "fit":
      checkFit(request.fit);
      return { ...request, nominal: asSize(request.nominal) };
    case "inch class":
      parseInchClass(request.inchClass);
      if (!["hole", "shaft", null].includes(request.member)) throw notARequest(request.member);
      return { ...request, nominal: asSize(request.nominal) };
    case "plain":
    case "reference":
    case "basic":
      return { ...request, nominal: asSize(request.nominal) };
    case "class": {
      const { nominal, printed, toleranceClass } = request;
      parseToleranceClass(toleranceClass);
      return { ...request, nominal: asSize(nominal), printed: printed === null ? null : asPair(printed) };
    }
    case "deviations": {
      const { nominal, upper, lower, form } = request;
      if (!["plus-minus", "two"].includes(form)) throw notARequest(form);
      return { ...request, nominal: asSize(nominal), ...asDeviations({ upper, lower }) };
    }
    case "limits":
      return { ...request, ...asPair(request) };
    case "single limit":
      if (!["max", "min"].includes(request.side)) throw notARequest(request.side);
      return { ...request, size: asSize(request.size) };
    case "chamfer": {
      const { length, angle, deviations } = request;
      return {
        ...request,
        length: asSize(length),
        angle: readAngle(angle),
        deviations: deviations === null ? null : asDeviations(deviations),
      };
    }
    case "angle": {
      const { angle, deviations } = request;
      return {
        ...request,
        angle: readAngle(angle),
        deviations:
          deviations === null ? null : { upper: readAngle(deviations.upper), lower: readAngle(deviations.lower) },
      };
    }
    case "thread":
      if (typeof (request.designation as unknown) !== "string") throw notARequest(request.designation);
      return request;
    default:
      throw notARequest((request as { readonly kind?: unknown }).kind);
  }
}

function checkFit(fit: string): void {
  const classes = typeof (fit as unknown) === "string" ? fit.split("/") : [];
  const [hole, shaft] = classes.length === 2 ? classes.map((one) => parseToleranceClass(one).kind) : [];
  if (hole !== "hole" || shaft !== "shaft") throw notARequest(fit);
}

function asDeviations(given: { readonly upper: Length; readonly lower: Length }): { upper: Length; lower: Length } {
  const upper = asLength(given.upper);
  const lower = asLength(given.lower);
  if (compareLengths(upper, lower) < 0) {
    throw new LimitsError("LIMITS_UPSIDE_DOWN", "the upper deviation is the larger one", {
      value: `${upper.toString()} / ${lower.toString()}`,
    });
  }
  return { upper, lower };
}

function asPair({ max, min }: { readonly max: WrittenDimension; readonly min: WrittenDimension }): {
  readonly max: WrittenDimension;
  readonly min: WrittenDimension;
} {
  return Object.freeze({ max: asSize(max), min: asSize(min) });
}

function asSize(size: WrittenDimension): WrittenDimension {
  const given: unknown = size;
  if (typeof given !== "object" || given === null || !hasOwn(given, "length")) throw notARequest(given);
  return Object.freeze({ ...size, length: asLength(size.length) });
}

function notARequest(value: unknown): LimitsError {
  return new LimitsError("CALLOUT_NOT_UNDERSTOOD", "not a request that is known here", {
    value,
    allowed: "a text, or a request that readCallout gave",
  });
}
