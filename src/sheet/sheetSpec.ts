/** One toleranced size of a drawing, as a drawing file holds it. */
export interface FeatureSpec {
  /** Name within the drawing, such as a balloon number; each one once. */
  readonly id: string;
  readonly name?: string;
  /** What stands on the drawing for this size, such as `"⌀35 mm k6"`. */
  readonly callout: string;
  /** Whether it is an internal or an external size; needed for a mate unless a class tells. */
  readonly kind?: "hole" | "shaft";
  /** Id of the feature that it goes together with; said at one of the two is enough. */
  readonly mate?: string;
  readonly note?: string;
}

/** Title-block defaults, as a drawing file holds them. */
export interface TitleBlockFields {
  /** Unit of the block; that of the drawing where it is not given. */
  readonly unit?: "mm" | "in";
  /** ± tolerance by number of decimals, such as `{ "2": "±.01" }`. */
  readonly decimals?: Readonly<Record<string, string>>;
  /** ± tolerance of inch fractions, such as `"±1/64"`. */
  readonly fractions?: string;
  /** ± tolerance of angles, such as `"±0.5°"`. */
  readonly angles?: string;
}

/** A drawing, as a drawing file holds it. */
export interface SheetSpec {
  /** Title of the drawing. */
  readonly drawing: string;
  /** Unit of all numbers that stand without one. */
  readonly unit: "mm" | "in";
  /** `"."` where it is not given. */
  readonly decimalMark?: "." | ",";
  readonly note?: string;
  readonly titleBlock?: TitleBlockFields;
  readonly features: readonly FeatureSpec[];
}
