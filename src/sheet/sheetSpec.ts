import type { DecisionRule } from "../limits/index.js";
import type { DefaultProcess, SizeFeature } from "../titleBlock/index.js";

/** What every feature of a drawing file has. */
export interface FeatureBase {
  /** Name within the drawing, such as a balloon number; each one once. */
  readonly id: string;
  /** What the feature is, in words. */
  readonly name?: string;
  /** Anything to remember; not read. */
  readonly note?: string;
}

/** One toleranced size of a drawing, as a drawing file holds it. */
export interface SizeFeatureSpec extends FeatureBase {
  /** What stands on the drawing for this size, such as `"⌀35 mm k6"`. */
  readonly callout: string;
  /** Whether it is an internal or an external size; needed for a mate unless a class tells. */
  readonly kind?: "hole" | "shaft";
  /** Id of the feature that it goes together with; said at one of the two is enough. */
  readonly mate?: string;
  /** Roughness of its surface, such as `"Ra 32"` in the unit of the drawing (µin or µm), `"0.8 µm"` or `"N6"`. */
  readonly finish?: string;
  /** Trade name of the last process, such as `"grinding"`. */
  readonly process?: string;
  /** What the surface is for, such as `"bearing seat"`. */
  readonly function?: string;
  /** What a default tolerance can hang on besides the text. */
  readonly defaults?: DefaultFields;
  /** What was measured, in the unit of the drawing unless it says its own; judged by the rule of `inspection`. */
  readonly measured?: string;
}

/** What a default tolerance can hang on besides the text, as a drawing file holds it. */
export interface DefaultFields {
  /** What the size belongs to, such as `"external radius or chamfer"` or `"wall thickness"`. */
  readonly feature?: SizeFeature;
  /** Length of the shorter leg of an angle, with its unit: standards go by it. */
  readonly shorterLeg?: string;
  /** How its surfaces came about: needed where the block has standards for more than one way. */
  readonly process?: DefaultProcess;
}

/** A keyseat of a drawing, as a drawing file holds it. */
export interface KeyseatFeatureSpec extends FeatureBase {
  /** What the drawing says of the keyseat. */
  readonly keyseat: KeyseatFields;
}

/** What a drawing file says of a keyseat; which fields count is up to the standard. */
export interface KeyseatFields {
  /** `"B17.1"`, `"B17.2"`, or a metric standard such as `"ISO/R 773"` or `"ISO 3912"`. */
  readonly standard: string;
  /** Id of the shaft or bore that it is cut into. */
  readonly on: string;
  /** `"shaft"` or `"hub"`; by the kind of that feature where it is not given. */
  readonly member?: "shaft" | "hub";
  /** Class of fit of B17.1. */
  readonly class?: number;
  /** Shape of the key: square or rectangular. */
  readonly shape?: string;
  /** Kind of key: parallel, taper or gib-head. */
  readonly kind?: string;
  /** A key of one's own, its sizes with units. */
  readonly key?: { readonly width: string; readonly height: string };
  /** Number of a Woodruff key of B17.2. */
  readonly number?: string;
  /** Fit of metric standards by its word: free, normal, close. */
  readonly fit?: string;
  /** Width of a metric Woodruff key, with its unit. */
  readonly width?: string;
  /** Diameter of a metric Woodruff key, with its unit. */
  readonly diameter?: string;
  /** Callouts that the drawing prints for the control dimension and the width; they are held against the standard. */
  readonly printed?: { readonly control?: string; readonly width?: string };
}

/** One feature of a drawing file. */
export type FeatureSpec = SizeFeatureSpec | KeyseatFeatureSpec;

/** Lines of a title block, as a drawing file holds them. */
export interface TitleBlockLineFields {
  /** ± tolerance by number of decimals, such as `{ "2": "±.01" }`. */
  readonly decimals?: Readonly<Record<string, string>>;
  /** ± tolerance of inch fractions, such as `"±1/64"`. */
  readonly fractions?: string;
}

/** Title-block defaults, as a drawing file holds them. */
export interface TitleBlockFields extends TitleBlockLineFields {
  /** Unit of the block; that of the drawing where it is not given. */
  readonly unit?: "mm" | "in";
  /** ± tolerance of angles, such as `"±0.5°"`. */
  readonly angles?: string;
  /** Lines for diameters only. */
  readonly diameters?: TitleBlockLineFields;
  /** Lines for sizes that are no diameters. */
  readonly lengths?: TitleBlockLineFields;
  /** General tolerance of machined parts, such as `"ISO 2768-mK"`. */
  readonly general?: string;
  /** General tolerance of castings, such as `"ISO 8062-3 - DCTG 8"`. */
  readonly castings?: string;
  /** General tolerance of weldments, such as `"ISO 13920-BF"`. */
  readonly weldments?: string;
  /** Finish all over except as noted, such as `"Ra 125"` in the unit of the drawing. */
  readonly finish?: string;
  /** Note on edges without an indication of their own. */
  readonly edges?: string;
  /** Angle of projection; noted, not used. */
  readonly projection?: "first angle" | "third angle";
}

/** How readings are judged, as a drawing file holds it. */
export interface InspectionFields {
  /** The decision rule, by its name. */
  readonly rule: DecisionRule;
  /** Expanded uncertainty U (k = 2), in the unit of the drawing unless it says its own; for rules with a guard band. */
  readonly uncertainty?: string;
}

/** A drawing, as a drawing file holds it. */
export interface SheetSpec {
  /** Title of the drawing. */
  readonly drawing: string;
  /** Unit of all numbers that stand without one. */
  readonly unit: "mm" | "in";
  /** `"."` where it is not given. */
  readonly decimalMark?: "." | ",";
  /** Anything to remember; not read. */
  readonly note?: string;
  /** Default tolerances of the drawing. */
  readonly titleBlock?: TitleBlockFields;
  /** How readings are judged; needed where a feature says what was measured. */
  readonly inspection?: InspectionFields;
  /** The features, in the order of the drawing. */
  readonly features: readonly FeatureSpec[];
}
