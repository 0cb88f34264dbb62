import * as z from "zod/mini";
import type { KeyseatFeatureSpec, SheetSpec, SizeFeatureSpec } from "./sheetSpec.js";

/** The schemas of one drawing, and the descriptions that the JSON Schema shows. */
export interface Schemas {
  readonly sheet: z.ZodMiniType<SheetSpec>;
  /** The sheet with its features unread, so that one bad feature does not hide the others. */
  readonly frame: z.ZodMiniType<Omit<SheetSpec, "features"> & { readonly features: readonly unknown[] }>;
  readonly size: z.ZodMiniType<SizeFeatureSpec>;
  readonly keyseat: z.ZodMiniType<KeyseatFeatureSpec>;
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

  const optional = (longest: number, description: string) => z.exactOptional(text(longest, description));
  const base = {
    id: text(LONGEST_ID, "Name within the drawing, each one once"),
    name: optional(LONGEST_TEXT, "What the feature is"),
    note: optional(LONGEST_TEXT, "Anything to remember; not read"),
  };
  const size = z.strictObject({
    ...base,
    callout: text(LONGEST_CALLOUT, "What stands on the drawing for this size, such as ⌀35 mm k6"),
    kind: z.exactOptional(described(z.enum(["hole", "shaft"]), "Internal or external size")),
    mate: optional(LONGEST_ID, "Id of the feature that it goes together with"),
    finish: optional(LONGEST_ID, "Roughness of its surface, such as Ra 32 in µin or µm by the drawing's unit"),
    process: optional(LONGEST_ID, "Trade name of the last process"),
    function: optional(LONGEST_ID, "What the surface is for, such as bearing seat"),
    defaults: z.exactOptional(
      described(
        z.strictObject({
          feature: z.exactOptional(
            described(
              z.enum(["size", "diameter", "length", "internal radius", "external radius or chamfer", "wall thickness"]),
              "What the size belongs to",
            ),
          ),
          shorterLeg: optional(LONGEST_ID, "Length of the shorter leg of an angle, with its unit"),
          process: z.exactOptional(
            described(
              z.enum(["machined", "cast", "welded", "cast to machined", "welded to machined"]),
              "How its surfaces came about",
            ),
          ),
        }),
        "What a default tolerance can hang on besides the text",
      ),
    ),
    measured: optional(LONGEST_ID, "What was measured; judged by the rule of inspection"),
  });
  const keyseat = z.strictObject({
    ...base,
    keyseat: described(
      z.strictObject({
        standard: text(LONGEST_ID, "B17.1, B17.2, ISO/R 773, ISO 3912 and others"),
        on: text(LONGEST_ID, "Id of the shaft or bore that it is cut into"),
        member: z.exactOptional(described(z.enum(["shaft", "hub"]), "By the kind of that feature unless given")),
        class: z.exactOptional(described(z.number(), "Class of fit of B17.1")),
        shape: optional(LONGEST_ID, "square or rectangular"),
        kind: optional(LONGEST_ID, "parallel, taper or gib-head"),
        key: z.exactOptional(
          described(
            z.strictObject({ width: text(LONGEST_ID, "With its unit"), height: text(LONGEST_ID, "With its unit") }),
            "A key of one's own",
          ),
        ),
        number: optional(LONGEST_ID, "Number of a Woodruff key of B17.2"),
        fit: optional(LONGEST_ID, "free, normal or close, in metric standards"),
        width: optional(LONGEST_ID, "Width of a metric Woodruff key, with its unit"),
        diameter: optional(LONGEST_ID, "Diameter of a metric Woodruff key, with its unit"),
        printed: z.exactOptional(
          described(
            z.strictObject({
              control: optional(LONGEST_CALLOUT, "Callout of S, T, d - t1 or d + t2"),
              width: optional(LONGEST_CALLOUT, "Callout of the width"),
            }),
            "What the drawing prints; held against the standard",
          ),
        ),
      }),
      "A keyseat, in place of a callout",
    ),
  });
  const lines = {
    decimals: z.exactOptional(described(z.record(z.string(), z.string()), "± tolerance by number of decimals written")),
    fractions: optional(LONGEST_ID, "± tolerance of inch fractions"),
  };
  const titleBlock = z.strictObject({
    ...lines,
    unit: z.exactOptional(unit("Unit of the block; that of the drawing where it is not given")),
    angles: optional(LONGEST_ID, "± tolerance of angles"),
    diameters: z.exactOptional(described(z.strictObject(lines), "Lines for diameters only")),
    lengths: z.exactOptional(described(z.strictObject(lines), "Lines for sizes that are no diameters")),
    general: optional(LONGEST_ID, "General tolerance of machined parts, such as ISO 2768-mK"),
    castings: optional(LONGEST_ID, "General tolerance of castings, such as ISO 8062-3 - DCTG 8"),
    weldments: optional(LONGEST_ID, "General tolerance of weldments, such as ISO 13920-BF"),
    finish: optional(LONGEST_ID, "Finish all over except as noted"),
    edges: optional(LONGEST_TEXT, "Edges without an indication of their own"),
    projection: z.exactOptional(described(z.enum(["first angle", "third angle"]), "Noted, not used")),
  });
  const inspection = z.strictObject({
    rule: described(
      z.enum(["simple acceptance", "ISO 14253-1:2013", "ISO 14253-1:2017"]),
      "The decision rule, by its name",
    ),
    uncertainty: optional(LONGEST_ID, "Expanded uncertainty U (k = 2), for rules with a guard band"),
  });
  const frameFields = {
    drawing: text(LONGEST_TEXT, "Title of the drawing"),
    unit: unit("Unit of all numbers that stand without one"),
    decimalMark: z.exactOptional(described(z.enum([".", ","]), "The decimal mark; a point where it is not given")),
    note: z.exactOptional(text(LONGEST_TEXT, "Anything to remember; not read")),
    titleBlock: z.exactOptional(described(titleBlock, "Default tolerances of the drawing")),
    inspection: z.exactOptional(described(inspection, "How readings are judged")),
  };
  return {
    size,
    keyseat,
    frame: z.strictObject({ ...frameFields, features: z.array(z.unknown()) }),
    sheet: z.strictObject({
      ...frameFields,
      features: described(z.array(z.union([size, keyseat])), "Features of the drawing, in order"),
    }),
    descriptions,
  };
}
