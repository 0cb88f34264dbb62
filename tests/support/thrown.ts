import { inspect } from "node:util";
import type { LimitsError } from "limitsmith";

/**
 * Runs a task that must be refused and gives its error; anything but a `LimitsError` fails the test.
 */
export function thrown(task: () => unknown): LimitsError {
  let given: unknown;
  try {
    given = task();
  } catch (error) {
    if (error instanceof Error && error.name === "LimitsError") return error as LimitsError;
    throw new Error(`not a LimitsError: ${inspect(error)}`, { cause: error });
  }
  throw new Error(`nothing was thrown; the result was ${inspect(given)}`);
}

/** The code of the error that a task is refused with. */
export function codeOf(task: () => unknown): string {
  return thrown(task).code;
}
