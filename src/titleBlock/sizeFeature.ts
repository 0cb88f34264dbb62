import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import type { SizeFeature } from "./defaultValue.js";

/** A feature as far as it is known: a bare radius may be internal or external. */
export type KnownFeature = SizeFeature | "radius";

const FEATURES: readonly string[] = [
  "size",
  "diameter",
  "length",
  "internal radius",
  "external radius or chamfer",
  "wall thickness",
] satisfies readonly SizeFeature[];

/** The feature of the options, `"size"` where there is none; anything unknown is refused. */
export function featureOf(options: { readonly feature?: SizeFeature } | undefined): SizeFeature {
  const feature: unknown = ownValue(options, "feature") ?? "size";
  if (typeof feature === "string" && FEATURES.includes(feature)) return feature as SizeFeature;
  throw new LimitsError("OPTION_INVALID", "not a feature that is told apart here", {
    value: feature,
    allowed: FEATURES.join(", "),
  });
}
