import { LimitsError } from "../errors.js";

/** The error for a title block that cannot be read. */
export function invalidBlock(message: string, value: unknown, path: readonly string[], allowed?: string): LimitsError {
  return new LimitsError("TITLE_BLOCK_INVALID", message, {
    value,
    path,
    ...(allowed === undefined ? {} : { allowed }),
  });
}
