import type { Angle, Length, WrittenDimension } from "../units/index.js";

/** What every request has. */
interface RequestBase {
  /** The callout as it was written. */
  readonly text: string;
  /** `"diameter"` where a diameter mark stood before the size. */
  readonly shape: "diameter" | "unmarked";
}

/** A size with a tolerance class: `40 m6`. */
export interface ClassRequest extends RequestBase {
  readonly kind: "class";
  readonly nominal: WrittenDimension;
  readonly toleranceClass: string;
}

/** A size with a fit: `40 H7/m6`. */
export interface FitRequest extends RequestBase {
  readonly kind: "fit";
  readonly nominal: WrittenDimension;
  /** Hole class and shaft class, such as `"H7/m6"`. */
  readonly fit: string;
}

/** A size with two deviations: `.875 +.002/-.004`, or `12 ±0.02` where both are equal. */
export interface DeviationsRequest extends RequestBase {
  readonly kind: "deviations";
  readonly nominal: WrittenDimension;
  readonly upper: Length;
  readonly lower: Length;
  readonly form: "plus-minus" | "two";
}

/** Two limits of size: `1.5754/1.5751`, in either order. */
export interface LimitsRequest extends RequestBase {
  readonly kind: "limits";
  readonly max: WrittenDimension;
  readonly min: WrittenDimension;
}

/** One limit of size: `.015 MAX`. */
export interface SingleLimitRequest extends RequestBase {
  readonly kind: "single limit";
  readonly size: WrittenDimension;
  readonly side: "max" | "min";
}

/** A size that stands alone and falls to the title block: `2.188`. */
export interface PlainRequest extends RequestBase {
  readonly kind: "plain";
  readonly nominal: WrittenDimension;
}

/** A size for information: `(3.75)`, `3.75 REF`; no tolerance applies. */
export interface ReferenceRequest extends RequestBase {
  readonly kind: "reference";
  readonly nominal: WrittenDimension;
}

/** A theoretically exact size: `[2.000]`, `2.000 BASIC`; no tolerance applies. */
export interface BasicRequest extends RequestBase {
  readonly kind: "basic";
  readonly nominal: WrittenDimension;
}

/** An angle that falls to the title block: `45°`. */
export interface AngleRequest extends RequestBase {
  readonly kind: "angle";
  readonly angle: Angle;
}

/** What a callout asks for, told apart by `kind`: plain frozen data. */
export type CalloutRequest =
  | ClassRequest
  | FitRequest
  | DeviationsRequest
  | LimitsRequest
  | SingleLimitRequest
  | PlainRequest
  | ReferenceRequest
  | BasicRequest
  | AngleRequest;
