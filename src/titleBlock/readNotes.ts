import { atPath } from "../located.js";
import { ownValue } from "../ownValue.js";
import type { EdgeIndication, EdgeSide } from "./edgeValue.js";
import { invalidBlock } from "./invalidBlock.js";
import { readEdge } from "./readEdge.js";
import type { BlockReading } from "./readLines.js";
import type { EdgeNote, TitleBlockSpec } from "./titleBlockValue.js";

const LONGEST_NOTE = 500;

/** Reads a note of a block: a text that nothing is worked out from. */
export function readNote(value: unknown, name: string): string | null {
  if (value === undefined || value === null) return null;
  if (typeof value === "string" && value.trim() !== "" && value.length <= LONGEST_NOTE && !/\p{Cc}/u.test(value)) {
    return value;
  }
  throw invalidBlock(`${name} is a note`, value, [name], `a text of up to ${LONGEST_NOTE} characters in one line`);
}

/** Reads what a block says of edges without an indication: a note, or values for external and internal edges. */
export function readEdges(value: TitleBlockSpec["edges"], reading: BlockReading): string | EdgeNote | null {
  if (typeof value !== "object" || value === null) return readNote(value, "edges");
  const external = readSide(ownValue(value, "external"), "external", reading);
  const internal = readSide(ownValue(value, "internal"), "internal", reading);
  if (external === null && internal === null) {
    throw invalidBlock("edges have a value for one side at least", value, ["edges"], "external, internal");
  }
  return Object.freeze({ external, internal });
}

function readSide(
  value: string | { readonly text: string } | null | undefined,
  side: EdgeSide,
  reading: BlockReading,
): EdgeIndication | null {
  if (value === undefined || value === null) return null;
  const text = typeof value === "string" ? value : ownValue(value, "text");
  return atPath(["edges", side], () => readEdge(text as string, { side, ...reading }));
}
