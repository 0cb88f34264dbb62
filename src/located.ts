import { LimitsError } from "./errors.js";
import type { TextSpan } from "./errors.js";

/** Runs a task; a {@link LimitsError} that it throws gets the keys that lead to the value put before its own. */
export function atPath<T>(path: readonly (string | number)[], task: () => T): T {
  return located(task, (error) => ({ path: [...path, ...error.path], position: error.position }));
}

/** Runs a task; a {@link LimitsError} that it throws gets the place in the text where its value stood. */
export function atPosition<T>(position: TextSpan, task: () => T): T {
  return located(task, (error) => ({ path: error.path, position }));
}

function located<T>(
  task: () => T,
  place: (error: LimitsError) => { path: readonly (string | number)[]; position: TextSpan | null },
): T {
  try {
    return task();
  } catch (error) {
    if (!(error instanceof LimitsError)) throw error;
    const { path, position } = place(error);
    throw new LimitsError(error.code, error.message, {
      path,
      ...(position === null ? {} : { position }),
      ...(error.value === null ? {} : { value: error.value }),
      ...(error.allowed === null ? {} : { allowed: error.allowed }),
    });
  }
}
