import { LimitsError } from "../errors.js";

/** One piece of a callout: a number, a word, or a single mark. */
export interface Token {
  readonly kind: "number" | "word" | "mark";
  readonly text: string;
  readonly start: number;
  readonly end: number;
}

const LONGEST_CALLOUT = 200;
// one alternative a token, told apart by their first characters: no text takes more than one pass
const TOKEN = /(\d+(?:[.,]\d*)?|[.,]\d+)|([A-Za-z\u00b5\u03bc]+)|(\+\/-|[⌀Ø±+\-\u2212()[\]/°'"′″])|(\s+)/uy;

/** Cuts a callout into tokens, blanks dropped; a sign that no callout has is refused where it stands. */
export function scan(text: string): readonly Token[] {
  if (text.length > LONGEST_CALLOUT) {
    throw new LimitsError("TEXT_TOO_LONG", "the text is too long to be a callout", {
      value: text,
      allowed: `up to ${LONGEST_CALLOUT} characters`,
    });
  }
  const tokens: Token[] = [];
  TOKEN.lastIndex = 0;
  while (TOKEN.lastIndex < text.length) {
    const start = TOKEN.lastIndex;
    const match = TOKEN.exec(text);
    if (match === null) {
      throw new LimitsError("CALLOUT_NOT_UNDERSTOOD", "this sign has no meaning in a callout here", {
        value: text,
        allowed: "sizes, signs, tolerance classes, ⌀ ± ° ( ) [ ] /, REF, BASIC, MAX, MIN",
        position: { start, end: start + 1 },
      });
    }
    const kind = match[1] !== undefined ? "number" : match[2] !== undefined ? "word" : "mark";
    if (match[4] === undefined) tokens.push({ kind, text: match[0], start, end: TOKEN.lastIndex });
  }
  if (tokens.length === 0) throw new LimitsError("TEXT_EMPTY", "there is no callout here", { value: text });
  return tokens;
}
