import type * as z from "zod/mini";
import { schemas } from "./buildSchemas.js";
import type { SheetSpec } from "./sheetSpec.js";

/**
 * The zod schema of a drawing file.
 *
 * It is strict, for forms and editors; `resolveSheet` is milder: it reports an unknown key and reads on.
 *
 * @returns a `zod/mini` schema of {@link SheetSpec} (no unit of its own), built on first use
 * @throws nothing; its `parse` throws zod's own error
 * @example
 * ```ts
 * import { sheetSchema } from "limitsmith/schemas";
 *
 * const drawing = { drawing: "Hopper shaft", unit: "mm", features: [{ id: "A", callout: "⌀17 h6" }] };
 * sheetSchema().safeParse(drawing).success; // → true
 * sheetSchema().safeParse({ ...drawing, unit: "cm" }).success; // → false
 * ```
 * @reference none: the drawing file is a format of this library
 */
export function sheetSchema(): z.ZodMiniType<SheetSpec> {
  return schemas().sheet;
}
