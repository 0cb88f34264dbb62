import type { Basis } from "../basis.js";
import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import type { Length } from "../units/index.js";
import { umLength } from "./preferredValues.js";
import { TRIANGLES } from "./tables/triangles.js";

/** What an old drawing shows: triangles, and its series. */
export interface TriangleNote {
  /** 1 to 4. */
  readonly triangles: number;
  /** The drawing names one of four series. */
  readonly series: "R1" | "R2" | "R3" | "R4";
}

/** What the triangles meant. */
export interface TriangleRoughness {
  /** In µm. */
  readonly ra: Length;
  /** In µm: the old ten-point height. */
  readonly rz: Length;
  /** Where it comes from. */
  readonly basis: Basis;
}

const SERIES = ["R1", "R2", "R3", "R4"] as const;

/**
 * The roughness behind the triangles of an old drawing.
 *
 * @param note - `triangles`, 1 to 4, and `series`, R1 to R4
 * @returns the frozen Ra and Rz, in µm
 * @throws `OPTION_INVALID`, `FINISH_NOT_TABULATED` for four triangles of series R1, which has no value
 * @example
 * ```ts
 * import { triangleRoughness } from "limitsmith";
 *
 * const { ra, rz } = triangleRoughness({ triangles: 3, series: "R2" });
 * [ra.toString(), rz.toString()]; // → ["0.8 µm", "6.3 µm"]
 * ```
 * @reference DIN 3141 (withdrawn), one published summary
 */
export function triangleRoughness(note: TriangleNote): TriangleRoughness {
  const triangles: unknown = ownValue(note, "triangles");
  const series: unknown = ownValue(note, "series");
  const row = TRIANGLES.find((one) => one.triangles === triangles);
  const column = SERIES.findIndex((one) => one === series);
  if (row === undefined || column < 0) {
    throw new LimitsError("OPTION_INVALID", "not a note of triangles", {
      value: `${String(triangles)}, ${String(series)}`,
      allowed: "triangles 1 to 4, series R1 to R4",
    });
  }
  const ra = row.ra[column] ?? null;
  const rz = row.rz[column] ?? null;
  if (ra === null || rz === null) {
    throw new LimitsError("FINISH_NOT_TABULATED", "the series has no value for so many triangles", {
      value: `${row.triangles}, ${SERIES[column] ?? ""}`,
      allowed: "one to three triangles of series R1",
    });
  }
  return Object.freeze({
    ra: umLength(ra),
    rz: umLength(rz),
    basis: Object.freeze([
      Object.freeze({
        standard: "DIN 3141 (withdrawn)",
        place: `${row.triangles} triangles, series ${SERIES[column] ?? ""}`,
        says: `Rz ${rz} µm, Ra ${ra} µm`,
        how: "tabulated" as const,
        mark: "one-source" as const,
      }),
    ]),
  });
}
