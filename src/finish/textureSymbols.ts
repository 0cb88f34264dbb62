import type { Mark } from "../basis.js";
import { LAY_SYMBOLS, REMOVAL_SYMBOLS, SYMBOL_POSITIONS } from "./tables/surfaceSymbols.js";

/** A sign of a surface-texture symbol. */
export interface TextureSign {
  /** The sign. */
  readonly symbol: string;
  /** How a text writes it, where that differs; `null` elsewhere. */
  readonly text: string | null;
  /** What it means. */
  readonly meaning: string;
  /** How sure the value is. */
  readonly mark: Mark;
}

/** What stands at one letter of the symbol. */
export interface TexturePosition {
  /** The place in the symbol. */
  readonly position: string;
  /** What it means. */
  readonly meaning: string;
}

/** Signs and positions of surface-texture symbols. */
export interface TextureSymbols {
  /** Lay: direction of the machining marks. */
  readonly lay: readonly TextureSign[];
  /** Forms of the check mark: removal of material. */
  readonly removal: readonly TextureSign[];
  /** What stands where, by standard: the letters differ. */
  readonly positions: readonly {
    readonly standard: "ISO 1302:2002" | "ASME Y14.36M-1996";
    readonly mark: Mark;
    readonly positions: readonly TexturePosition[];
  }[];
}

/**
 * The signs of surface-texture symbols and what stands where around them.
 *
 * @returns frozen lists (no unit)
 * @throws nothing
 * @example
 * ```ts
 * import { textureSymbols } from "limitsmith";
 *
 * const { lay, positions } = textureSymbols();
 * lay.find((one) => one.symbol === "C")?.meaning; // → "lay roughly circular about the centre of the surface"
 * positions.map(({ positions: [first] }) => first?.meaning); // → ["first parameter with transmission band and limit", "Ra value(s)"]
 * ```
 * @reference Machine Drawing (textbook), Table 16.3; ASME Y14.36-2018, 4.2 to 4.6; ISO 1302:2002 and ASME Y14.36M-1996
 *   positions as training pages show them
 */
export function textureSymbols(): TextureSymbols {
  return Object.freeze({
    lay: Object.freeze(LAY_SYMBOLS.map((row) => Object.freeze({ ...row }))),
    removal: Object.freeze(REMOVAL_SYMBOLS.map((row) => Object.freeze({ ...row }))),
    positions: Object.freeze(
      SYMBOL_POSITIONS.map(({ standard, mark, positions }) =>
        Object.freeze({ standard, mark, positions: Object.freeze(positions.map((one) => Object.freeze({ ...one }))) }),
      ),
    ),
  });
}
