import type { TextSpan } from "../errors.js";
import type { Angle, Length, WrittenDimension } from "../units/index.js";

/** The mark that says what shape a size belongs to. */
export type CalloutShape = "unmarked" | "diameter" | "radius" | "spherical diameter" | "spherical radius" | "square";

/** What a piece of a callout's text is. */
export type CalloutPartName =
  "count" | "shape" | "size" | "tolerance" | "class" | "member" | "angle" | "thread" | "word" | "depth" | "other unit";

/** Where in the text one part of the callout stood. */
export interface CalloutPart extends TextSpan {
  /** What this piece of the text is. */
  readonly part: CalloutPartName;
}

/** What every request has. */
export interface RequestBase {
  /** The callout as it was written. */
  readonly text: string;
  /** Mark that says what shape the size belongs to. */
  readonly shape: CalloutShape;
  /** How many times the feature is there (`2X`, `4 PLACES`); `null` where the text does not say. */
  readonly count: number | null;
  /** True where `TYP` stands behind it. */
  readonly typical: boolean;
  /** True where `THRU` stands behind it. */
  readonly through: boolean;
  /** Depth of a hole; `null` where none stands. */
  readonly depth: WrittenDimension | null;
  /** The same size in the other unit system, in brackets behind it; `null` where none stands. */
  readonly dual: DualSize | null;
  /** Where each part stood, in the order of the text. */
  readonly parts: readonly CalloutPart[];
}

/** One size, or two limits, repeated in the other unit system: `[9.525]`, `[.9843/.9847]`. */
export interface DualSize {
  /** The larger one. */
  readonly max: WrittenDimension;
  /** Equal to `max` where one size stands. */
  readonly min: WrittenDimension;
}

/** Limits printed in brackets behind a class: `(35.018/35.002)`. */
export interface PrintedLimits {
  /** The larger one. */
  readonly max: WrittenDimension;
  /** The smaller one. */
  readonly min: WrittenDimension;
}

/** A size with a tolerance class: `40 m6`. */
export interface ClassRequest extends RequestBase {
  /** Tells this request from the others. */
  readonly kind: "class";
  /** The size as it was written. */
  readonly nominal: WrittenDimension;
  /** Such as `"m6"` or `"H7"`. */
  readonly toleranceClass: string;
  /** Limits that the drawing prints beside the class; `null` where none stand. */
  readonly printed: PrintedLimits | null;
}

/** A size with a fit: `40 H7/m6`. */
export interface FitRequest extends RequestBase {
  /** Tells this request from the others. */
  readonly kind: "fit";
  /** The size as it was written. */
  readonly nominal: WrittenDimension;
  /** Hole class and shaft class, such as `"H7/m6"`. */
  readonly fit: string;
}

/** A size with an inch fit class: `1.125 LN2`, `.625 LT2S hole`. */
export interface InchClassRequest extends RequestBase {
  /** Tells the requests apart. */
  readonly kind: "inch class";
  /** Nominal size. */
  readonly nominal: WrittenDimension;
  /** Such as `"LN2"` or `"LT2S"`, in capitals. */
  readonly inchClass: string;
  /** The member that the text names; `null` where it names none. */
  readonly member: "hole" | "shaft" | null;
}

/** A size with two deviations: `.875 +.002/-.004`, or `12 ±0.02` where both are equal. */
export interface DeviationsRequest extends RequestBase {
  /** Tells this request from the others. */
  readonly kind: "deviations";
  /** The size as it was written. */
  readonly nominal: WrittenDimension;
  /** Upper deviation, signed. */
  readonly upper: Length;
  /** Lower deviation, signed. */
  readonly lower: Length;
  /** Whether one ± value or two deviations were written. */
  readonly form: "plus-minus" | "two";
}

/** Two limits of size: `1.5754/1.5751`, in either order. */
export interface LimitsRequest extends RequestBase {
  /** Tells this request from the others. */
  readonly kind: "limits";
  /** The larger size. */
  readonly max: WrittenDimension;
  /** The smaller size. */
  readonly min: WrittenDimension;
}

/** One limit of size: `.015 MAX`. */
export interface SingleLimitRequest extends RequestBase {
  /** Tells this request from the others. */
  readonly kind: "single limit";
  /** The size as it was written. */
  readonly size: WrittenDimension;
  /** Which limit it is. */
  readonly side: "max" | "min";
}

/** A size that stands alone and falls to the title block: `2.188`. */
export interface PlainRequest extends RequestBase {
  /** Tells this request from the others. */
  readonly kind: "plain";
  /** The size as it was written. */
  readonly nominal: WrittenDimension;
}

/** A size for information: `(3.75)`, `3.75 REF`; no tolerance applies. */
export interface ReferenceRequest extends RequestBase {
  /** Tells this request from the others. */
  readonly kind: "reference";
  /** The size as it was written. */
  readonly nominal: WrittenDimension;
}

/** A theoretically exact size: `[2.000]`, `2.000 BASIC`; no tolerance applies. */
export interface BasicRequest extends RequestBase {
  /** Tells this request from the others. */
  readonly kind: "basic";
  /** The size as it was written. */
  readonly nominal: WrittenDimension;
}

/** A chamfer: `.02 X 45°`, `45° X .02`, `C0.5`. */
export interface ChamferRequest extends RequestBase {
  /** Tells the requests apart. */
  readonly kind: "chamfer";
  /** Length of the chamfer. */
  readonly length: WrittenDimension;
  /** Deviations of the length; `null` where it falls to the title block. */
  readonly deviations: { readonly upper: Length; readonly lower: Length } | null;
  /** The angle. */
  readonly angle: Angle;
}

/** An angle: `45°` falls to the title block, `45° ±1°` has deviations of its own. */
export interface AngleRequest extends RequestBase {
  /** Tells this request from the others. */
  readonly kind: "angle";
  /** The angle as it was written. */
  readonly angle: Angle;
  /** Deviations of its own; `null` where it falls to the title block. */
  readonly deviations: { readonly upper: Angle; readonly lower: Angle } | null;
}

/** A thread: governed by its own standard, so that no default tolerance is put on it. */
export interface ThreadRequest extends RequestBase {
  /** Tells the requests apart. */
  readonly kind: "thread";
  /** As it was written: `"M8x1.25-6g"`. */
  readonly designation: string;
}

/** What a callout asks for, told apart by `kind`: plain frozen data. */
export type CalloutRequest =
  | ClassRequest
  | FitRequest
  | InchClassRequest
  | DeviationsRequest
  | LimitsRequest
  | SingleLimitRequest
  | PlainRequest
  | ReferenceRequest
  | BasicRequest
  | ChamferRequest
  | AngleRequest
  | ThreadRequest;

/** A request without what all requests have. */
export type BareRequest<Request = CalloutRequest> = Request extends CalloutRequest
  ? Omit<Request, keyof RequestBase>
  : never;
