import type { Angle, AngleLike, DecimalMark, Length, LengthLike, LengthUnit } from "../units/index.js";

/** Title-block defaults as a caller or a drawing file gives them. */
export interface TitleBlockSpec {
  /** Unit of the drawing: bare numbers in the block and on the drawing are in it. */
  readonly unit: LengthUnit;
  readonly decimalMark?: DecimalMark;
  /**
   * ± tolerance by the number of decimals written, such as `{ 2: "±.01", 3: "±.005" }`; a text may go without
   * ± and, in the block's unit, without a unit.
   */
  readonly decimals?: Readonly<Record<string, LengthLike>>;
  /** ± tolerance of inch fractions, such as `"±1/64"`. */
  readonly fractions?: LengthLike | null;
  /** ± tolerance of angles, such as `"±0.5°"`. */
  readonly angles?: AngleLike | null;
}

/** Title-block defaults, checked: plain frozen data, and a {@link TitleBlockSpec} too. */
export interface TitleBlock {
  readonly unit: LengthUnit;
  readonly decimalMark: DecimalMark;
  /** ± tolerance by number of decimals. */
  readonly decimals: Readonly<Record<string, Length>>;
  /** ± tolerance of fractions; `null` where the block has none. */
  readonly fractions: Length | null;
  /** ± tolerance of angles; `null` where the block has none. */
  readonly angles: Angle | null;
}
