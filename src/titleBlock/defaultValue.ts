import type { Caution } from "../basis.js";
import type { AngleLimits, Limits } from "../limits/index.js";
import type { AngleData, LengthLike, WrittenDimensionLike } from "../units/index.js";

/** A default tolerance applied to a length, and the line of the block that gave it. */
export interface DefaultLengthLimits {
  /** Tells a length from an angle. */
  readonly kind: "length";
  /** The limits, with their basis. */
  readonly limits: Limits;
  /** Which line or standard applied, and its value, in words. */
  readonly line: string;
  /** What to weigh before relying on it; empty where there is nothing. */
  readonly cautions: readonly Caution[];
}

/** A default tolerance applied to an angle, and the line of the block that gave it. */
export interface DefaultAngleLimits {
  /** Tells an angle from a length. */
  readonly kind: "angle";
  /** The limits of the angle, with their basis. */
  readonly limits: AngleLimits;
  /** Which line or standard applied, and its value, in words. */
  readonly line: string;
  /** What to weigh before relying on it; empty where there is nothing. */
  readonly cautions: readonly Caution[];
}

/** A default tolerance applied: limits of a length or of an angle. */
export type DefaultLimits = DefaultLengthLimits | DefaultAngleLimits;

/**
 * What a size belongs to, where its text does not say: `"size"` is any linear size, as if nothing were said. External
 * radii and chamfer heights have a table of their own in ISO 2768-1, internal radii are ordinary sizes there, and
 * walls of castings take one grade coarser.
 */
export type SizeFeature =
  "size" | "diameter" | "length" | "internal radius" | "external radius or chamfer" | "wall thickness";

/**
 * How the surfaces of a size came about, where a block has lines or standards for more than one way. Between a raw
 * surface and a machined one the larger of the two general tolerances applies.
 */
export type DefaultProcess = "machined" | "cast" | "welded" | "cast to machined" | "welded to machined";

/** What a default can hang on besides the text. */
export interface DefaultLimitsOptions {
  /** `"size"` unless said otherwise. */
  readonly feature?: SizeFeature;
  /** Length of the shorter leg of an angle: the standards go by it, not by the angle. */
  readonly shorterLeg?: LengthLike;
  /** Needed where the block has more than one that could apply. */
  readonly process?: DefaultProcess;
}

/** A size that stands alone, as a reader of callouts gives it. */
export interface PlainSizeLike {
  /** Tells a size from an angle and from what takes no default. */
  readonly kind: "plain";
  /** The size as it was written. */
  readonly nominal: WrittenDimensionLike;
  /** The mark before it: a word with `diameter` or `radius` in it, or any other. */
  readonly shape?: string;
}

/** An angle that stands alone, as a reader of callouts gives it. */
export interface PlainAngleLike {
  /** Tells an angle from a size and from what takes no default. */
  readonly kind: "angle";
  /** The angle. */
  readonly angle: AngleData;
}

/** Any other request of a callout: it takes no default, and `kind` says why. */
export interface OtherRequestLike {
  /** Such as `"reference"`, `"basic"` or `"thread"`. */
  readonly kind: string;
}
