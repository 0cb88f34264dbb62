import { angleOfMicroarcseconds } from "../units/index.js";
import type { Angle } from "../units/index.js";
import { isAngle, readAngleTokens } from "./readAngleTokens.js";
import { readSize } from "./readSize.js";
import type { CalloutOptions } from "./readSize.js";
import { readDeviations } from "./readDeviations.js";
import type { BareRequest, ChamferRequest } from "./request.js";
import type { TokenReader } from "./tokenReader.js";

/** 45° in millionths of an arc second. */
export const FORTY_FIVE_DEGREES = 162_000_000_000;

/** True for `C0.5`, and for an angle before an X; a size before an X is seen only when it has been read. */
export function startsChamfer(reader: TokenReader): boolean {
  if (reader.peekText() === "C") return reader.peek(1)?.kind === "number";
  if (!isAngle(reader)) return false;
  for (let ahead = 2; ahead <= 7; ahead++) {
    const text = reader.peekText(ahead);
    if (text === "X" || text === "×") return true;
    if (text === undefined || text === "±") return false;
  }
  return false;
}

/** Reads `C0.5` (45° is meant) or `45° X .02`. */
export function readChamfer(reader: TokenReader, options: CalloutOptions): BareRequest<ChamferRequest> {
  if (reader.peekText() === "C") {
    reader.part("shape", () => reader.take());
    const length = reader.part("size", () => readSize(reader, options));
    return { kind: "chamfer", length, deviations: null, angle: angleOfMicroarcseconds(FORTY_FIVE_DEGREES, "decimal") };
  }
  const angle = reader.part("angle", () => readAngleTokens(reader, options));
  if (reader.takeIf("X", "×") === undefined) throw reader.refuse("an X is expected between angle and size");
  const length = reader.part("size", () => readSize(reader, options));
  return { kind: "chamfer", length, deviations: readDeviations(reader, length, options), angle };
}

/** The angle behind a size: `X 45°`; `null` where none follows. */
export function readChamferAngle(reader: TokenReader, options: CalloutOptions): Angle | null {
  const by = reader.peekText();
  if ((by !== "X" && by !== "×") || !isAngle(reader, 1)) return null;
  reader.take();
  return reader.part("angle", () => readAngleTokens(reader, options));
}
