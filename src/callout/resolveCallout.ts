import type { Caution } from "../basis.js";
import { LimitsError } from "../errors.js";
import { inchFit } from "../inchFits/index.js";
import { isoFit, isoLimits, parseToleranceClass } from "../iso286/index.js";
import { angleLimits, limits, limitsFromMaxMin, singleLimit } from "../limits/index.js";
import type { AngleLimits, Fit, Limits, SingleLimit } from "../limits/index.js";
import { ownValue } from "../ownValue.js";
import { defaultLimits } from "../titleBlock/index.js";
import type { DefaultLimitsOptions, SizeFeature, TitleBlock, TitleBlockSpec } from "../titleBlock/index.js";
import type { Angle, WrittenDimension } from "../units/index.js";
import { asRequest } from "./asRequest.js";
import { FORTY_FIVE_DEGREES } from "./readChamfer.js";
import { readCallout } from "./readCallout.js";
import type { CalloutOptions } from "./readSize.js";
import type { AngleRequest, CalloutRequest, ChamferRequest, PlainRequest } from "./request.js";

/** What is known around a callout. */
export interface CalloutContext extends CalloutOptions {
  /** What the callout stands on; a class of the other kind is refused. */
  readonly feature?: "hole" | "shaft";
  /** Defaults for sizes that stand alone; its unit counts where `unit` is not given. */
  readonly titleBlock?: TitleBlock | TitleBlockSpec;
  /** What a default can hang on besides the text: feature, shorter leg of an angle, machined or cast or welded. */
  readonly defaults?: DefaultLimitsOptions;
}

/** What every outcome has. */
interface OutcomeBase {
  /** What the callout asks for. */
  readonly request: CalloutRequest;
  /** Limits of the depth, by the title block; `null` where the callout has no depth. */
  readonly depth: Limits | null;
  /** What to weigh before relying on a default tolerance; empty where none applied. A fit has cautions of its own. */
  readonly cautions: readonly Caution[];
}

/** Limits of one size, and the fit that they come from where the callout or its class is one. */
export interface LimitsOutcome extends OutcomeBase {
  /** Tells the outcomes apart. */
  readonly outcome: "limits";
  /** The limits found. */
  readonly limits: Limits;
  /** The fit that it comes from. */
  readonly fit: Fit | null;
}

/** A fit, where nothing says which of its members the callout stands on. */
export interface FitOutcome extends OutcomeBase {
  /** Tells the outcomes apart. */
  readonly outcome: "fit";
  /** The fit that it comes from. */
  readonly fit: Fit;
}

/** One limit of size. */
export interface SingleLimitOutcome extends OutcomeBase {
  /** Tells the outcomes apart. */
  readonly outcome: "single limit";
  /** The one limit. */
  readonly single: SingleLimit;
}

/** Limits of an angle. */
export interface AngleOutcome extends OutcomeBase {
  /** Tells the outcomes apart. */
  readonly outcome: "angle";
  /** The angle. */
  readonly angle: AngleLimits;
}

/** Limits of a chamfer's length and angle. */
export interface ChamferOutcome extends OutcomeBase {
  /** Tells the outcomes apart. */
  readonly outcome: "chamfer";
  /** The limits found. */
  readonly limits: Limits;
  /** The angle. */
  readonly angle: AngleLimits;
}

/** A size without limits of its own, and why: reference, basic, thread. */
export interface NoLimitsOutcome extends OutcomeBase {
  /** Tells the outcomes apart. */
  readonly outcome: "no limits";
  /** Why there are none. */
  readonly reason: string;
}

/** A callout turned into limits, told apart by `outcome`: plain frozen data. */
export type ResolvedCallout =
  LimitsOutcome | FitOutcome | SingleLimitOutcome | AngleOutcome | ChamferOutcome | NoLimitsOutcome;

type Block = TitleBlock | TitleBlockSpec | undefined;
type BareOutcome<Outcome = ResolvedCallout> = Outcome extends ResolvedCallout
  ? Omit<Outcome, keyof OutcomeBase>
  : never;

/**
 * Turns a callout into limits, by its class, its own tolerance, or the title block.
 *
 * @param callout - the text, or a request that {@link readCallout} gave
 * @param context - `unit` of the drawing (mm, in …), `decimalMark`, `feature` (hole or shaft), `titleBlock`,
 *   `defaults` (what a default can hang on besides the text)
 * @returns the frozen outcome: limits in the unit of the size; for a fit on a known feature, the limits of that
 *   member and the fit; reference and basic dimensions and threads have none, with the reason
 * @throws `CALLOUT_KIND_MISMATCH`, `TITLE_BLOCK_MISSING`, and what {@link readCallout}, {@link isoLimits},
 *   {@link isoFit}, {@link inchFit} and {@link defaultLimits} throw
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
 * @reference ISO 286-1:2010 and ANSI B4.1-1967 for classes; ASME Y14.5-2018, 5.1.1 for defaults, from memory
 */
export function resolveCallout(callout: string | CalloutRequest, context: CalloutContext = {}): ResolvedCallout {
  const block = ownValue(context, "titleBlock");
  const unit = ownValue(context, "unit") ?? ownValue(block, "unit");
  const decimalMark = ownValue(context, "decimalMark") ?? ownValue(block, "decimalMark");
  const request =
    typeof callout === "string"
      ? readCallout(callout, {
          ...(unit === undefined ? {} : { unit }),
          ...(decimalMark === undefined ? {} : { decimalMark }),
        })
      : asRequest(callout);
  const { depth } = request;
  const byBlock = new Defaults(block, ownValue(context, "defaults"), request.text);
  const outcome = resolve(request, ownValue(context, "feature"), byBlock);
  return Object.freeze({
    ...outcome,
    request,
    depth: depth === null ? null : byBlock.ofLength(depth, "length"),
    cautions: byBlock.cautions,
  });
}

/** Defaults of the title block for one callout, and the cautions that come with them. */
class Defaults {
  readonly #block: Block;
  readonly #options: DefaultLimitsOptions;
  readonly #text: string;
  readonly #cautions: Caution[] = [];

  constructor(block: Block, options: DefaultLimitsOptions | undefined, text: string) {
    this.#block = block;
    this.#options = options ?? {};
    this.#text = text;
  }

  get cautions(): readonly Caution[] {
    return Object.freeze([...this.#cautions]);
  }

  ofPlain(request: PlainRequest): Limits {
    return this.#note(defaultLimits(this.#need(), request, this.#options)).limits;
  }

  ofLength(size: WrittenDimension, feature: SizeFeature): Limits {
    return this.#note(defaultLimits(this.#need(), size, { ...this.#options, feature })).limits;
  }

  ofAngle(angle: Angle): AngleLimits {
    return this.#note(defaultLimits(this.#need(), angle, this.#options)).limits;
  }

  /** Both legs of a chamfer of 45° are its length; of other angles the shorter one must be said. */
  ofChamferAngle({ angle, length }: ChamferRequest): AngleLimits {
    const legs = angle.microarcseconds === FORTY_FIVE_DEGREES ? { shorterLeg: length.length } : {};
    return this.#note(defaultLimits(this.#need(), angle, { ...legs, ...this.#options })).limits;
  }

  #note<Found extends { readonly cautions: readonly Caution[] }>(found: Found): Found {
    this.#cautions.push(...found.cautions);
    return found;
  }

  #need(): TitleBlock | TitleBlockSpec {
    if (this.#block !== undefined) return this.#block;
    throw new LimitsError(
      "TITLE_BLOCK_MISSING",
      "a size without a tolerance falls to the title block, and there is none",
      { value: this.#text, allowed: "a title block in the context, or a tolerance in the callout" },
    );
  }
}

function resolve(request: CalloutRequest, feature: "hole" | "shaft" | undefined, byBlock: Defaults): BareOutcome {
  switch (request.kind) {
    case "class":
      refuseOtherKind(request.toleranceClass, feature);
      return found(isoLimits(request.nominal.length, request.toleranceClass));
    case "fit":
      return memberOf(isoFit(request.nominal.length, request.fit), feature);
    case "inch class":
      refuseOtherMember(request.member, feature);
      return memberOf(inchFit(request.nominal.length, request.inchClass), feature ?? request.member ?? undefined);
    case "deviations": {
      const { nominal, upper, lower } = request;
      return found(limits({ nominal: nominal.length, upper, lower, basis: drawingStep(request.text) }));
    }
    case "limits": {
      const { max, min } = request;
      return found(limitsFromMaxMin({ max: max.length, min: min.length, basis: drawingStep(request.text) }));
    }
    case "single limit": {
      const single = singleLimit(request.side, request.size.length, drawingStep(request.text));
      return { outcome: "single limit", single };
    }
    case "plain":
      return found(byBlock.ofPlain(request));
    case "angle":
      return { outcome: "angle", angle: angleOf(request, byBlock) };
    case "chamfer":
      return { outcome: "chamfer", limits: chamferLength(request, byBlock), angle: byBlock.ofChamferAngle(request) };
    case "reference":
      return { outcome: "no limits", reason: "a reference dimension is for information only" };
    case "basic":
      return {
        outcome: "no limits",
        reason: "a basic dimension is theoretically exact; its tolerance stands in a frame",
      };
    case "thread":
      return { outcome: "no limits", reason: "a thread is governed by its own standard; no default tolerance applies" };
  }
}

function found(limitsFound: Limits): BareOutcome<LimitsOutcome> {
  return { outcome: "limits", limits: limitsFound, fit: null };
}

function memberOf(fit: Fit, feature: "hole" | "shaft" | undefined): BareOutcome {
  return feature === undefined ? { outcome: "fit", fit } : { outcome: "limits", limits: fit[feature], fit };
}

function chamferLength({ length, deviations, text }: ChamferRequest, byBlock: Defaults): Limits {
  if (deviations === null) return byBlock.ofLength(length, "external radius or chamfer");
  return limits({ nominal: length.length, ...deviations, basis: drawingStep(text) });
}

function angleOf({ angle, deviations, text }: AngleRequest, byBlock: Defaults): AngleLimits {
  if (deviations === null) return byBlock.ofAngle(angle);
  return angleLimits({ nominal: angle, ...deviations, basis: drawingStep(text) });
}

function refuseOtherKind(toleranceClass: string, feature: "hole" | "shaft" | undefined): void {
  const { kind, text } = parseToleranceClass(toleranceClass);
  if (feature === undefined || feature === kind) return;
  throw new LimitsError("CALLOUT_KIND_MISMATCH", `${text} is a class of a ${kind}, the feature is a ${feature}`, {
    value: text,
    allowed: feature === "hole" ? "a capital letter for a hole" : "a small letter for a shaft",
  });
}

function refuseOtherMember(member: "hole" | "shaft" | null, feature: "hole" | "shaft" | undefined): void {
  if (member === null || feature === undefined || member === feature) return;
  throw new LimitsError("CALLOUT_KIND_MISMATCH", `the callout says ${member}, the feature is a ${feature}`, {
    value: member,
    allowed: feature,
  });
}

function drawingStep(text: string): readonly { standard: string; place: string; says: string; how: "caller" }[] {
  return [{ standard: "the drawing", place: "callout", says: text, how: "caller" }];
}
