import { PLACES } from "./places.js";
import type { BareRequest, ThreadRequest } from "./request.js";
import type { TokenReader } from "./tokenReader.js";

/** Words that only thread designations have. */
const THREAD_WORDS: ReadonlySet<string> = new Set([
  "UN",
  "UNC",
  "UNF",
  "UNEF",
  "UNS",
  "UNR",
  "UNRC",
  "UNRF",
  "UNJ",
  "UNJC",
  "UNJF",
  "NPT",
  "NPTF",
  "NPS",
  "NPSM",
  "NPSF",
  "NPSI",
  "ACME",
  "STUB",
  "BUTT",
  "BSW",
  "BSF",
  "BSP",
  "BSPP",
  "BSPT",
  "BA",
]);
/** Letters that start a thread designation when a number touches them or follows. */
const THREAD_LETTERS: ReadonlySet<string> = new Set(["M", "MJ", "Tr", "TR", "G", "Rc", "Rp"]);
/** What else stands in a designation: X between size and pitch, tolerance classes, hand. */
const OTHER_WORDS: ReadonlySet<string> = new Set([
  "X",
  "A",
  "B",
  "D",
  "E",
  "F",
  "G",
  "H",
  "P",
  "PH",
  "LH",
  "RH",
  "INT",
  "EXT",
  "M",
  "MJ",
  "TR",
  "RC",
  "RP",
]);
const MARKS: ReadonlySet<string> = new Set(["/", "-", "\u2013", "×", "#", ".", "(", ")"]);
const SUFFIX_WORDS: ReadonlySet<string> = new Set(["THRU", "THROUGH", "DEEP", "DEPTH", "TYP", "↧"]);

/**
 * Reads a thread: everything up to a word such as THRU is its designation, which its own standard governs.
 * Gives `null` where no thread starts here.
 */
export function readThread(reader: TokenReader): BareRequest<ThreadRequest> | null {
  if (!startsThread(reader)) return null;
  return reader.part("thread", () => {
    const { start } = reader.take();
    while (!endsThread(reader)) reader.take();
    return { kind: "thread", designation: reader.text.slice(start, reader.takenTo) };
  });
}

function startsThread(reader: TokenReader): boolean {
  const first = reader.peek()?.text ?? "";
  // as they are written: m6 is a class without its size, M6 is a thread
  if (THREAD_LETTERS.has(first)) return reader.peek(1)?.kind === "number";
  if (first !== "#" && reader.peek()?.kind !== "number") return false;
  for (let ahead = 1; ; ahead++) {
    const text = reader.peekText(ahead);
    if (text === undefined || SUFFIX_WORDS.has(text)) return false;
    if (THREAD_WORDS.has(text)) return true;
  }
}

/** A designation is numbers, its marks and its words; a number before DEEP or PLACES is no part of it. */
function endsThread(reader: TokenReader): boolean {
  const token = reader.peek();
  const text = reader.peekText() ?? "";
  if (token === undefined) return true;
  if (token.kind === "number") return ["DEEP", "DEPTH", ...PLACES].includes(reader.peekText(1) ?? "");
  if (token.kind === "mark") return !MARKS.has(text);
  if (token.kind !== "word") return true;
  const isDepth = text === "X" && reader.peek(1)?.kind === "number" && reader.peekText(2) === "DEEP";
  return isDepth || !(THREAD_WORDS.has(text) || OTHER_WORDS.has(text));
}
