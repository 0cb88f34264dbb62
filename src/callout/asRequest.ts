import { LimitsError } from "../errors.js";
import { asLength, readAngle } from "../units/index.js";
import type { WrittenDimension } from "../units/index.js";
import type { CalloutRequest } from "./request.js";

/** Takes a request that may have travelled through JSON or `structuredClone` and makes its lengths lengths again. */
export function asRequest(request: CalloutRequest): CalloutRequest {
  const given: unknown = request;
  if (typeof given !== "object" || given === null || !Object.hasOwn(given, "kind")) throw notARequest(given);
  switch (request.kind) {
    case "class":
    case "fit":
    case "plain":
    case "reference":
    case "basic":
      return Object.freeze({ ...request, nominal: asSize(request.nominal) });
    case "deviations": {
      const { nominal, upper, lower } = request;
      return Object.freeze({ ...request, nominal: asSize(nominal), upper: asLength(upper), lower: asLength(lower) });
    }
    case "limits":
      return Object.freeze({ ...request, max: asSize(request.max), min: asSize(request.min) });
    case "single limit":
      return Object.freeze({ ...request, size: asSize(request.size) });
    case "angle":
      return Object.freeze({ ...request, angle: readAngle(request.angle) });
    default:
      throw notARequest((given as { readonly kind?: unknown }).kind);
  }
}

function asSize(size: WrittenDimension): WrittenDimension {
  const given: unknown = size;
  if (typeof given !== "object" || given === null || !Object.hasOwn(given, "length")) throw notARequest(given);
  return Object.freeze({ ...size, length: asLength(size.length) });
}

function notARequest(value: unknown): LimitsError {
  return new LimitsError("CALLOUT_NOT_UNDERSTOOD", "not a request that is known here", {
    value,
    allowed: "a text, or a request that readCallout gave",
  });
}
