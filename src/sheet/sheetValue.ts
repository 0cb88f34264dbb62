import type { ResolvedCallout } from "../callout/index.js";
import type { LimitsProblem } from "../errors.js";
import type { Fit } from "../limits/index.js";
import type { LengthUnit } from "../units/index.js";

/** What every row has, whether it was resolved or not; `null` where the feature did not say. */
interface RowBase {
  /** Place in the drawing file, from 0. */
  readonly index: number;
  readonly id: string | null;
  readonly name: string | null;
  readonly callout: string | null;
  readonly kind: "hole" | "shaft" | null;
}

/** One feature of the drawing: its limits, or why there are none. */
export type SheetRow =
  | (RowBase & { readonly ok: true; readonly resolved: ResolvedCallout })
  | (RowBase & { readonly ok: false; readonly error: LimitsProblem });

/** Two features that go together, told by their ids. */
export type SheetFit =
  | { readonly ok: true; readonly hole: string; readonly shaft: string; readonly fit: Fit }
  | { readonly ok: false; readonly features: readonly [string, string]; readonly error: LimitsProblem };

/** How many of what; `features` is the sum of the next five. */
export interface SheetCounts {
  readonly features: number;
  /** Rows with limits. */
  readonly limits: number;
  /** Rows with a fit but no member to choose. */
  readonly fitCallouts: number;
  /** Rows with a single limit. */
  readonly singleLimits: number;
  /** Rows with limits of an angle. */
  readonly angles: number;
  /** Reference and basic dimensions. */
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
  readonly drawing: string;
  readonly unit: LengthUnit;
  /** One row a feature, in the order of the drawing file. */
  readonly rows: readonly SheetRow[];
  readonly fits: readonly SheetFit[];
  /** Errors that belong to the drawing and not to one row: its title block. */
  readonly problems: readonly LimitsProblem[];
  /** Keys of the file that mean nothing here, as paths; they were passed over. */
  readonly unknownKeys: readonly (readonly (string | number)[])[];
  readonly counts: SheetCounts;
}
