import type { Mark } from "../basis.js";

/** The mark behind its sign in a table. */
export function markOf(sign: string | undefined): Mark {
  switch (sign) {
    case "2":
      return "two-sources";
    case "+":
      return "one-source+formula";
    case "1":
      return "one-source";
    case "f":
      return "formula";
    default:
      return "memory";
  }
}
