import { readFileSync } from "node:fs";
import { Ajv2020 } from "ajv/dist/2020.js";
import { describe, expect, expectTypeOf, it } from "vitest";
import type * as z from "zod/mini";
import { sheetJsonSchema, sheetSchema } from "limitsmith/schemas";
import type { FeatureSpec, SheetSpec } from "limitsmith/schemas";
import { resolveSheet } from "limitsmith/sheet";

const example: unknown = JSON.parse(
  readFileSync(new URL("../../examples/grain-mill/drawing.json", import.meta.url), "utf8"),
);
const validate = new Ajv2020({ strict: true, allErrors: true }).compile(sheetJsonSchema());

const feature: FeatureSpec = { id: "A", callout: "⌀17 h6" };
const drawing: SheetSpec = { drawing: "Hopper shaft (invented)", unit: "mm", features: [feature] };

const drawings: [string, boolean, unknown][] = [
  ["the example drawing", true, example],
  ["the smallest drawing", true, { ...drawing, features: [] }],
  [
    "every key",
    true,
    {
      ...drawing,
      decimalMark: ",",
      inspection: { rule: "ISO 14253-1:2017", uncertainty: "0,002" },
      note: "n",
      titleBlock: { unit: "mm", decimals: { "1": "±0,2" }, angles: "±1°" },
      features: [
        {
          ...feature,
          name: "n",
          kind: "shaft",
          mate: "B",
          note: "n",
          finish: "Ra 0,8",
          process: "grinding",
          function: "bearing seat",
        },
        {
          id: "K",
          name: "n",
          note: "n",
          keyseat: { standard: "ISO/R 773", on: "A", member: "shaft", fit: "normal", printed: { width: "5" } },
        },
      ],
    },
  ],
  [
    "a keyseat and a callout",
    false,
    { ...drawing, features: [{ ...feature, keyseat: { standard: "B17.1", on: "A" } }] },
  ],
  ["a keyseat on nothing", false, { ...drawing, features: [{ id: "K", keyseat: { standard: "B17.1" } }] }],
  ["no unit", false, { ...drawing, unit: undefined }],
  ["an unknown unit", false, { ...drawing, unit: "cm" }],
  ["an unknown key", false, { ...drawing, scale: 1 }],
  ["an unknown key of a feature", false, { ...drawing, features: [{ ...feature, colour: "blue" }] }],
  ["an empty id", false, { ...drawing, features: [{ ...feature, id: "" }] }],
  ["a callout too long", false, { ...drawing, features: [{ ...feature, callout: "x".repeat(201) }] }],
  ["a kind of its own", false, { ...drawing, features: [{ ...feature, kind: "bore" }] }],
  ["features that are no list", false, { ...drawing, features: {} }],
  ["nothing", false, null],
];

describe("schemas of a drawing file", () => {
  it.each(drawings)("%s: valid is %s, in zod and in JSON Schema alike", (_, valid, data) => {
    const plain: unknown = JSON.parse(JSON.stringify(data));
    expect(sheetSchema().safeParse(plain).success).toBe(valid);
    expect(validate(plain)).toBe(valid);
  });

  it("what validates resolves without unknown keys", () => {
    for (const [, valid, data] of drawings) if (valid) expect(resolveSheet(data).unknownKeys).toEqual([]);
  });

  it("every property of the JSON Schema is described", () => {
    const undescribed: string[] = [];
    const look = (schema: unknown, path: string): void => {
      const { properties = {}, items } = schema as { properties?: Record<string, unknown>; items?: unknown };
      for (const [name, property] of Object.entries(properties)) {
        if (typeof (property as { description?: unknown }).description !== "string")
          undescribed.push(`${path}.${name}`);
        look(property, `${path}.${name}`);
      }
      if (items !== undefined) look(items, `${path}[]`);
    };
    look(sheetJsonSchema(), "sheet");
    expect(undescribed).toEqual([]);
  });

  it("gives a JSON Schema of one's own at each call", () => {
    sheetJsonSchema()["title"] = "changed";
    expect(sheetJsonSchema()["title"]).toBeUndefined();
    expect(sheetSchema()).toBe(sheetSchema());
  });

  it("the hand-written types are those of the schema", () => {
    expectTypeOf<z.infer<ReturnType<typeof sheetSchema>>>().toEqualTypeOf<SheetSpec>();
  });
});
