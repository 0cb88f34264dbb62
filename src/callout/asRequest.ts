import { LimitsError } from "../errors.js";
import { hasOwn } from "../ownValue.js";
import { asLength, readAngle } from "../units/index.js";
import type { WrittenDimension } from "../units/index.js";
import type { CalloutRequest } from "./request.js";

/** Takes a request that may have travelled through JSON or `structuredClone` and makes its lengths lengths again. */
export function asRequest(request: CalloutRequest): CalloutRequest {
  const given: unknown = request;
  if (typeof given !== "object" || given === null || !hasOwn(given, "kind")) throw notARequest(given);
  const { depth, dual } = request;
  return Object.freeze({
    ...asBody(request),
    depth: depth === null ? null : asSize(depth),
    dual: dual === null ? null : asPair(dual),
  });
}

function asBody(request: CalloutRequest): CalloutRequest {
  switch (request.kind) {
    case "fit":
    case "inch class":
    case "plain":
    case "reference":
    case "basic":
      return { ...request, nominal: asSize(request.nominal) };
    case "class": {
      const { nominal, printed } = request;
      return { ...request, nominal: asSize(nominal), printed: printed === null ? null : asPair(printed) };
    }
    case "deviations": {
      const { nominal, upper, lower } = request;
      return { ...request, nominal: asSize(nominal), upper: asLength(upper), lower: asLength(lower) };
    }
    case "limits":
      return { ...request, ...asPair(request) };
    case "single limit":
      return { ...request, size: asSize(request.size) };
    case "chamfer": {
      const { length, angle, deviations } = request;
      return {
        ...request,
        length: asSize(length),
        angle: readAngle(angle),
        deviations:
          deviations === null ? null : { upper: asLength(deviations.upper), lower: asLength(deviations.lower) },
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
      return request;
    default:
      throw notARequest((request as { readonly kind?: unknown }).kind);
  }
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
