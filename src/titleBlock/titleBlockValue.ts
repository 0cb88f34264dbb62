import type { Angle, AngleLike, DecimalMark, Length, LengthLike, LengthUnit } from "../units/index.js";
import type { EdgeIndication } from "./edgeValue.js";
import type {
  CastingIndication,
  GeneralToleranceLike,
  Iso2768Indication,
  WeldmentIndication,
} from "./generalToleranceValue.js";

/** Names of the blocks of common practice, see `titleBlockPreset`. */
export type TitleBlockPresetName = "common inch" | "inch by diameter and length";

/** Angle of projection of the views. */
export type Projection = "first angle" | "third angle";

/** Lines of a block as a caller or a drawing file gives them. */
export interface TitleBlockLinesSpec {
  /**
   * ± tolerance by the number of decimals written, such as `{ 2: "±.01", 3: "±.005" }`; `any` stands for every number
   * that has no line of its own. A text may go without ± and, in the block's unit, without a unit.
   */
  readonly decimals?: Readonly<Record<string, LengthLike>>;
  /** ± tolerance of inch fractions, such as `"±1/64"`. */
  readonly fractions?: LengthLike | null;
}

/** Title-block defaults as a caller or a drawing file gives them. */
export interface TitleBlockSpec extends TitleBlockLinesSpec {
  /** Unit of the drawing: bare numbers in the block and on the drawing are in it. */
  readonly unit: LengthUnit;
  /** `"."` unless said otherwise. */
  readonly decimalMark?: DecimalMark;
  /** ± tolerance of angles, such as `"±0.5°"`. */
  readonly angles?: AngleLike | null;
  /** Lines for diameters only; they go before the lines for all sizes. */
  readonly diameters?: TitleBlockLinesSpec | null;
  /** Lines for sizes that are no diameters; they go before the lines for all sizes. */
  readonly lengths?: TitleBlockLinesSpec | null;
  /** General tolerance of machined and sheet-metal parts, such as `"ISO 2768-mK"`; for what has no line above. */
  readonly general?: GeneralToleranceLike | null;
  /** General tolerance of castings, such as `"ISO 8062-3 - DCTG 8"`. */
  readonly castings?: GeneralToleranceLike | null;
  /** General tolerance of welded constructions, such as `"ISO 13920-BF"`. */
  readonly weldments?: GeneralToleranceLike | null;
  /** Finish of all surfaces that have none of their own, as a text; nothing is worked out from it. */
  readonly finish?: string | null;
  /** Edges without an indication of their own: a note as a text, or values in the manner of ISO 13715. */
  readonly edges?: string | EdgeNoteSpec | null;
  /** Noted, not used. */
  readonly projection?: Projection | null;
  /** The preset that lines were taken from: those that still have its values are marked as common practice. */
  readonly preset?: TitleBlockPresetName | null;
}

/** Edges of a block as a caller or a drawing file gives them, see `readEdge`. */
export interface EdgeNoteSpec {
  /** External edges, such as `"-0.3"`. */
  readonly external?: string | { readonly text: string } | null;
  /** Internal edges, such as `"+0.3"`. */
  readonly internal?: string | { readonly text: string } | null;
}

/** Lines of a block, checked. */
export interface TitleBlockLines {
  /** ± tolerance by number of decimals, or by `any`. */
  readonly decimals: Readonly<Record<string, Length>>;
  /** ± tolerance of fractions; `null` where the block has none. */
  readonly fractions: Length | null;
}

/** Title-block defaults, checked: plain frozen data, and a {@link TitleBlockSpec} too. */
export interface TitleBlock extends TitleBlockLines {
  /** Unit of the drawing. */
  readonly unit: LengthUnit;
  /** The decimal mark of texts. */
  readonly decimalMark: DecimalMark;
  /** ± tolerance of angles; `null` where the block has none. */
  readonly angles: Angle | null;
  /** Lines for diameters only; `null` where the block has none. */
  readonly diameters: TitleBlockLines | null;
  /** Lines for sizes that are no diameters; `null` where the block has none. */
  readonly lengths: TitleBlockLines | null;
  /** General tolerance of machined and sheet-metal parts; `null` where the block has none. */
  readonly general: Iso2768Indication | null;
  /** General tolerance of castings; `null` where the block has none. */
  readonly castings: CastingIndication | null;
  /** General tolerance of welded constructions; `null` where the block has none. */
  readonly weldments: WeldmentIndication | null;
  /** Finish of all surfaces, as a text; `null` where the block has none. */
  readonly finish: string | null;
  /** Edges without an indication of their own; `null` where the block has none. */
  readonly edges: string | EdgeNote | null;
  /** Angle of projection; `null` where the block has none. */
  readonly projection: Projection | null;
  /** The preset that lines were taken from; `null` where there is none. */
  readonly preset: TitleBlockPresetName | null;
}

/** Edges of a block by values. */
export interface EdgeNote {
  /** External edges; `null` where the block says nothing of them. */
  readonly external: EdgeIndication | null;
  /** Internal edges; `null` where the block says nothing of them. */
  readonly internal: EdgeIndication | null;
}
