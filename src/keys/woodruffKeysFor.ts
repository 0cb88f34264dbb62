import { LimitsError } from "../errors.js";
import type { BasisStep } from "../basis.js";
import { asLength } from "../units/index.js";
import type { LengthLike } from "../units/index.js";
import { keyStep } from "./keyStep.js";
import { tableInch } from "./tableLength.js";
import { WOODRUFF_KEYS } from "./tables/woodruffKeys.js";
import { WOODRUFF_SHAFT_RANGES } from "./tables/woodruffShaftRanges.js";

/** Woodruff keys that go with a shaft, by common practice. */
export interface SuggestedWoodruffKeys {
  /** Numbers of ANSI/ASME B17.2, in the order of its table. */
  readonly numbers: readonly string[];
  /** Where it comes from. */
  readonly basis: readonly BasisStep[];
}

/**
 * Woodruff keys for a shaft, as a textbook recommends them by key width: common practice, no rule of B17.2.
 *
 * @param shaftDiameter - diameter where the key sits, from 5/16 in to 2 5/8 in, any unit
 * @returns the frozen list of numbers (no unit), and whose rule it is
 * @throws `KEY_SHAFT_OUT_OF_RANGE`, `LENGTH_INVALID`, and what `readLength` throws for a text
 * @example
 * ```ts
 * import { woodruffKeysFor } from "limitsmith";
 *
 * woodruffKeysFor("5/16 in").numbers; // → ["202", "202.5", "203", "204"]
 * woodruffKeysFor("5/16 in").basis[0]?.how; // → "common practice"
 * ```
 * @reference Shigley's Mechanical Engineering Design, 9th edition, Table 7-8 (one source)
 */
export function woodruffKeysFor(shaftDiameter: LengthLike): SuggestedWoodruffKeys {
  const shaft = asLength(shaftDiameter, ["shaftDiameter"]);
  const widths = WOODRUFF_SHAFT_RANGES.filter(
    ([, from, to]) => shaft.ticks >= tableInch(from).ticks && shaft.ticks <= tableInch(to).ticks,
  );
  if (widths.length === 0) {
    throw new LimitsError("KEY_SHAFT_OUT_OF_RANGE", "no Woodruff key is recommended for this shaft diameter", {
      value: shaft.toString(),
      allowed: "from 5/16 in to 2 5/8 in",
    });
  }
  const suited = new Set(widths.map(([width]) => width));
  return Object.freeze({
    numbers: Object.freeze(WOODRUFF_KEYS.filter(([, width]) => suited.has(width)).map(([number]) => number)),
    basis: Object.freeze(
      widths.map(([width, from, to]) =>
        keyStep(
          "Shigley's Mechanical Engineering Design, 9th edition",
          "Table 7-8",
          `width ${width} for shafts ${from} to ${to} in`,
          "common practice",
          "one-source",
        ),
      ),
    ),
  });
}
