import type { ResolvedCallout } from "../callout/index.js";
import type { LimitsProblem } from "../errors.js";
import type { Roughness } from "../finish/index.js";
import type { KeyseatRows } from "../keys/index.js";
import type { Fit, Judgement, Limits } from "../limits/index.js";
import type { LengthUnit } from "../units/index.js";

/** A keyseat worked out: its control dimension and width by the standard, and what the drawing prints. */
export interface ResolvedKeyseat {
  /** Tells the outcomes apart. */
  readonly outcome: "keyseat";
  /** Id of the shaft or bore that it is cut into. */
  readonly on: string;
  /** S or T (d - t1, d + t2) and the width, by the standard. */
  readonly seat: KeyseatRows;
  /** What the drawing prints for them; `null` where it prints none. */
  readonly printed: { readonly control: Limits | null; readonly width: Limits | null };
}

/** The surface of a feature, as far as the drawing says. */
export interface SheetSurface {
  /** `null` where neither feature nor title block says one that can be read. */
  readonly finish: Roughness | null;
  /** Where the finish stands; `null` where there is none. */
  readonly from: "feature" | "title block" | null;
  /** Trade name of the process; `null` where none is said. */
  readonly process: string | null;
  /** Function of the surface; `null` where none is said. */
  readonly function: string | null;
}

/** What every row has, whether it was resolved or not; `null` where the feature did not say. */
export interface SheetRowBase {
  /** Place in the drawing file, from 0. */
  readonly index: number;
  /** Id of the feature. */
  readonly id: string | null;
  /** Name of the feature. */
  readonly name: string | null;
  /** What stands on the drawing. */
  readonly callout: string | null;
  /** Internal or external size. */
  readonly kind: "hole" | "shaft" | null;
}

/** One feature of the drawing: its limits, or why there are none. */
export type SheetRow =
  | (SheetRowBase & {
      readonly ok: true;
      readonly resolved: ResolvedCallout | ResolvedKeyseat;
      /** `null` where nothing is said of it. */
      readonly surface: SheetSurface | null;
      /** The reading judged against the limits; `null` where nothing was measured. */
      readonly judgement: Judgement | null;
    })
  | (SheetRowBase & { readonly ok: false; readonly error: LimitsProblem });

/** Two features that go together, told by their ids. */
export type SheetFit =
  | { readonly ok: true; readonly hole: string; readonly shaft: string; readonly fit: Fit }
  | { readonly ok: false; readonly features: readonly [string, string]; readonly error: LimitsProblem };

/** Something that the drawing says against itself or against good practice, and a checker would mark. */
export interface SheetFinding {
  /** Stable code; never changes its meaning. */
  readonly code: string;
  /** `"error"`: the drawing contradicts itself or a standard it names; `"warning"`: it may not work; `"note"`: look. */
  readonly severity: "error" | "warning" | "note";
  /** Ids of the features that it rests on. */
  readonly features: readonly string[];
  /** The finding in words and figures. */
  readonly says: string;
  /** What the drawing has, where two values disagree. */
  readonly found: string | null;
  /** What it is held against. */
  readonly expected: string | null;
  /** What would settle it. */
  readonly settle: string;
}

/** How many of what; `features` is the sum of the next eight. */
export interface SheetCounts {
  /** How many features the file has. */
  readonly features: number;
  /** Rows with limits. */
  readonly limits: number;
  /** Rows with a fit but no member to choose. */
  readonly fitCallouts: number;
  /** Rows with a single limit. */
  readonly singleLimits: number;
  /** Rows with limits of an angle. */
  readonly angles: number;
  /** Rows with limits of a chamfer's length and angle. */
  readonly chamfers: number;
  /** Rows with the dimensions of a keyseat. */
  readonly keyseats: number;
  /** Reference and basic dimensions, and threads. */
  readonly withoutLimits: number;
  /** Rows with an error. */
  readonly failed: number;
  /** Pairs of mates with a fit. */
  readonly fits: number;
  /** Pairs of mates with an error. */
  readonly fitsFailed: number;
}

/** A whole drawing, resolved: plain frozen data. */
export interface ResolvedSheet {
  /** Title of the drawing. */
  readonly drawing: string;
  /** The unit of numbers without one. */
  readonly unit: LengthUnit;
  /** One row a feature, in the order of the drawing file. */
  readonly rows: readonly SheetRow[];
  /** The fits of the mates. */
  readonly fits: readonly SheetFit[];
  /** What a checker would mark, in the order of the rows. */
  readonly findings: readonly SheetFinding[];
  /** Errors that cost no row its limits: in the title block, in what is said of a finish, in a reading. */
  readonly problems: readonly LimitsProblem[];
  /** Keys of the file that mean nothing here, as paths; they were passed over. */
  readonly unknownKeys: readonly (readonly (string | number)[])[];
  /** How many of what. */
  readonly counts: SheetCounts;
}
