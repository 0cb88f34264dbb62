import * as z from "zod/mini";
import { schemas } from "./buildSchemas.js";

/**
 * The JSON Schema of a drawing file, for editors and for programs in other languages.
 *
 * @returns a JSON Schema (draft 2020-12) as plain data, a new object at each call; lengths inside are texts with units
 * @throws nothing
 * @example
 * ```ts
 * import { sheetJsonSchema } from "limitsmith/schemas";
 *
 * sheetJsonSchema()["$schema"]; // → "https://json-schema.org/draft/2020-12/schema"
 * ```
 * @reference JSON Schema, draft 2020-12
 */
export function sheetJsonSchema(): Record<string, unknown> {
  const { sheet, descriptions } = schemas();
  return { ...z.toJSONSchema(sheet, { metadata: descriptions }) };
}
