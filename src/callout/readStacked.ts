import type { BareRequest, DeviationsRequest } from "./request.js";
import { isSign, readSigned, refuseBad, refuseOtherUnit } from "./readDeviations.js";
import { readShape } from "./readPrefix.js";
import { readSize } from "./readSize.js";
import type { CalloutOptions } from "./readSize.js";
import type { TokenReader } from "./tokenReader.js";

/**
 * Reads deviations stacked as a drawing shows them, the upper one on a line of its own above the size:
 * `+.002` over `1.375 -.001`. Gives `null` where the text does not start so.
 */
export function readStackedDeviations(
  reader: TokenReader,
  options: CalloutOptions,
): BareRequest<DeviationsRequest> | null {
  const first = reader.peek();
  const startsSigned = first !== undefined && isSign(first.text);
  if (
    !startsSigned &&
    !(first?.kind === "number" && reader.peek(1)?.kind === "line end" && reader.peek(3) !== undefined)
  ) {
    return null;
  }
  return reader.try(() => {
    const start = reader.from;
    const upperRead = startsSigned || Number(first.text.replace(",", ".")) === 0;
    if (!upperRead) return null;
    const upper = reader.part("tolerance", () => readSigned(reader, options.unit, options));
    if (reader.peek()?.kind !== "line end") {
      if (startsSigned)
        throw reader.refuse("a size cannot start with a sign", "the upper deviation alone on the first line");
      return null;
    }
    reader.skipLineEnd();
    readShape(reader);
    const nominal = reader.part("size", () => readSize(reader, options));
    const lower = reader.part("tolerance", () => readSigned(reader, nominal.length.unit, options));
    refuseOtherUnit(reader, nominal.length, upper);
    refuseOtherUnit(reader, nominal.length, lower);
    refuseBad(reader, { upper, lower }, start);
    return { kind: "deviations", nominal, upper, lower, form: "two" };
  });
}
