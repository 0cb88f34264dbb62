import * as z from "zod/mini";
import type { FeatureSpec, SheetSpec } from "./sheetSpec.js";

/** The schemas of one drawing, and the descriptions that the JSON Schema shows. */
export interface Schemas {
  readonly sheet: z.ZodMiniType<SheetSpec>;
  /** The sheet with its features unread, so that one bad feature does not hide the others. */
  readonly frame: z.ZodMiniType<Omit<SheetSpec, "features"> & { readonly features: readonly unknown[] }>;
  readonly feature: z.ZodMiniType<FeatureSpec>;
  readonly descriptions: z.core.$ZodRegistry<{ description: string }>;
}

const LONGEST_ID = 64;
const LONGEST_TEXT = 500;
const LONGEST_CALLOUT = 200;
let built: Schemas | undefined;

/** Builds the schemas on first use: an import alone must cost nothing and run nothing. */
export function schemas(): Schemas {
  return (built ??= build());
}

function build(): Schemas {
  // a registry of our own: zod's global one belongs to the caller
  const descriptions = z.registry<{ description: string }>();
  const described = <T extends z.ZodMiniType>(schema: T, description: string): T => {
    descriptions.add(schema, { description });
    return schema;
  };
  const text = (longest: number, description: string): z.ZodMiniString =>
    described(z.string().check(z.minLength(1), z.maxLength(longest)), description);
  const unit = (description: string) => described(z.enum(["mm", "in"]), description);

  const feature = z.strictObject({
    id: text(LONGEST_ID, "Name within the drawing, each one once"),
    name: z.exactOptional(text(LONGEST_TEXT, "What the feature is")),
    callout: text(LONGEST_CALLOUT, "What stands on the drawing for this size, such as ⌀35 mm k6"),
    kind: z.exactOptional(described(z.enum(["hole", "shaft"]), "Internal or external size")),
    mate: z.exactOptional(text(LONGEST_ID, "Id of the feature that it goes together with")),
    note: z.exactOptional(text(LONGEST_TEXT, "Anything to remember; not read")),
  });
  const titleBlock = z.strictObject({
    unit: z.exactOptional(unit("Unit of the block; that of the drawing where it is not given")),
    decimals: z.exactOptional(
      described(z.record(z.string(), z.string()), "± tolerance by number of decimals written"),
    ),
    fractions: z.exactOptional(text(LONGEST_ID, "± tolerance of inch fractions")),
    angles: z.exactOptional(text(LONGEST_ID, "± tolerance of angles")),
  });
  const frameFields = {
    drawing: text(LONGEST_TEXT, "Title of the drawing"),
    unit: unit("Unit of all numbers that stand without one"),
    decimalMark: z.exactOptional(described(z.enum([".", ","]), "The decimal mark; a point where it is not given")),
    note: z.exactOptional(text(LONGEST_TEXT, "Anything to remember; not read")),
    titleBlock: z.exactOptional(described(titleBlock, "Default tolerances of the drawing")),
  };
  return {
    feature,
    frame: z.strictObject({ ...frameFields, features: z.array(z.unknown()) }),
    sheet: z.strictObject({ ...frameFields, features: described(z.array(feature), "Sizes of the drawing, in order") }),
    descriptions,
  };
}
