import { LimitsError } from "../errors.js";
import { isoFit, isoLimits, parseToleranceClass } from "../iso286/index.js";
import { limits, limitsFromMaxMin, singleLimit } from "../limits/index.js";
import type { AngleLimits, Fit, Limits, SingleLimit } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { defaultLimits } from "../titleBlock/index.js";
import type { TitleBlock, TitleBlockSpec } from "../titleBlock/index.js";
import { asRequest } from "./asRequest.js";
import { readCallout } from "./readCallout.js";
import type { CalloutOptions } from "./readSize.js";
import type { CalloutRequest } from "./request.js";

/** What is known around a callout. */
export interface CalloutContext extends CalloutOptions {
  /** What the callout stands on; a class of the other kind is refused. */
  readonly feature?: "hole" | "shaft";
  /** Defaults for sizes that stand alone; its unit counts where `unit` is not given. */
  readonly titleBlock?: TitleBlock | TitleBlockSpec;
}

/** A callout turned into limits, told apart by `outcome`: plain frozen data. */
export type ResolvedCallout =
  | { readonly outcome: "limits"; readonly request: CalloutRequest; readonly limits: Limits; readonly fit: Fit | null }
  | { readonly outcome: "fit"; readonly request: CalloutRequest; readonly fit: Fit }
  | { readonly outcome: "single limit"; readonly request: CalloutRequest; readonly single: SingleLimit }
  | { readonly outcome: "angle"; readonly request: CalloutRequest; readonly angle: AngleLimits }
  | { readonly outcome: "no limits"; readonly request: CalloutRequest; readonly reason: string };

/**
 * Turns a callout into limits, by its class, its own tolerance, or the title block.
 *
 * @param callout - the text, or a request that {@link readCallout} gave
 * @param context - `unit` of the drawing (mm, in …), `decimalMark`, `feature` (hole or shaft), `titleBlock`
 * @returns the frozen outcome: limits in the unit of the size; for a fit on a known feature, the limits of that
 *   member and the fit; reference and basic dimensions have none, with the reason
 * @throws `CALLOUT_KIND_MISMATCH`, `TITLE_BLOCK_MISSING`, and what {@link readCallout}, {@link isoLimits},
 *   {@link isoFit} and {@link defaultLimits} throw
 * @example
 * ```ts
 * import { resolveCallout } from "limitsmith";
 *
 * const titleBlock = { unit: "in", decimals: { 3: "±.005" } } as const;
 * const bare = resolveCallout("3.125", { titleBlock });
 * bare.outcome === "limits" ? bare.limits.min.toString() : ""; // → "3.12 in"
 * const seat = resolveCallout("⌀35 mm k6", { titleBlock, feature: "shaft" });
 * seat.outcome === "limits" ? seat.limits.max.toString() : ""; // → "35.018 mm"
 * resolveCallout("(3.125)", { titleBlock }).outcome; // → "no limits"
 * ```
 * @reference ISO 286-1:2010 for classes; ASME Y14.5-2018, 5.1.1 for defaults, from memory
 */
export function resolveCallout(callout: string | CalloutRequest, context: CalloutContext = {}): ResolvedCallout {
  const block = ownValue(context, "titleBlock");
  const unit = ownValue(context, "unit") ?? block?.unit;
  const decimalMark = ownValue(context, "decimalMark") ?? block?.decimalMark;
  const request =
    typeof callout === "string"
      ? readCallout(callout, {
          ...(unit === undefined ? {} : { unit }),
          ...(decimalMark === undefined ? {} : { decimalMark }),
        })
      : asRequest(callout);
  return Object.freeze(resolve(request, ownValue(context, "feature"), block));
}

function resolve(
  request: CalloutRequest,
  feature: "hole" | "shaft" | undefined,
  block: TitleBlock | TitleBlockSpec | undefined,
): ResolvedCallout {
  switch (request.kind) {
    case "class":
      refuseOtherKind(request.toleranceClass, feature);
      return asOutcome(request, isoLimits(request.nominal.length, request.toleranceClass));
    case "fit":
      return fitOutcome(request, isoFit(request.nominal.length, request.fit), feature);
    case "deviations": {
      const { nominal, upper, lower } = request;
      return asOutcome(request, limits({ nominal: nominal.length, upper, lower, basis: drawingStep(request.text) }));
    }
    case "limits": {
      const { max, min } = request;
      return asOutcome(request, limitsFromMaxMin({ max: max.length, min: min.length, basis: drawingStep(request.text) }));
    }
    case "single limit": {
      const single = singleLimit(request.side, request.size.length, drawingStep(request.text));
      return { outcome: "single limit", request, single };
    }
    case "plain":
      return asOutcome(request, defaultLimits(needBlock(block, request.text), request.nominal).limits);
    case "angle":
      return { outcome: "angle", request, angle: defaultLimits(needBlock(block, request.text), request.angle).limits };
    case "reference":
      return { outcome: "no limits", request, reason: "a reference dimension is for information only" };
    case "basic":
      return { outcome: "no limits", request, reason: "a basic dimension is theoretically exact; its tolerance stands in a frame" };
  }
}

function fitOutcome(request: CalloutRequest, fit: Fit, feature: "hole" | "shaft" | undefined): ResolvedCallout {
  if (feature === undefined) return { outcome: "fit", request, fit };
  return { outcome: "limits", request, limits: fit[feature], fit };
}

function asOutcome(request: CalloutRequest, found: Limits): ResolvedCallout {
  return { outcome: "limits", request, limits: found, fit: null };
}

function needBlock(block: TitleBlock | TitleBlockSpec | undefined, text: string): TitleBlock | TitleBlockSpec {
  if (block !== undefined) return block;
  throw new LimitsError("TITLE_BLOCK_MISSING", "a size without a tolerance falls to the title block, and there is none", {
    value: text,
    allowed: "a title block in the context, or a tolerance in the callout",
  });
}

function refuseOtherKind(toleranceClass: string, feature: "hole" | "shaft" | undefined): void {
  const { kind, text } = parseToleranceClass(toleranceClass);
  if (feature === undefined || feature === kind) return;
  throw new LimitsError("CALLOUT_KIND_MISMATCH", `${text} is a class of a ${kind}, the feature is a ${feature}`, {
    value: text,
    allowed: feature === "hole" ? "a capital letter for a hole" : "a small letter for a shaft",
  });
}

function drawingStep(text: string): readonly { standard: string; place: string; says: string; how: "caller" }[] {
  return [{ standard: "the drawing", place: "callout", says: text, how: "caller" }];
}
