import { LimitsError } from "../errors.js";

/** One piece of a callout: a number, a word, a single mark, or the end of a line. */
export interface Token {
  readonly kind: "number" | "word" | "mark" | "line end";
  readonly text: string;
  readonly start: number;
  readonly end: number;
}

const LONGEST_CALLOUT = 200;
// one alternative a token, told apart by their first characters: no text takes more than one pass
const TOKEN =
  /(\d+(?:[.,]\d*)?|[.,]\d+)|([A-Za-z\u00b5\u03bc]+(?:\.(?!\d))?)|(\+\/-|[⌀Ø□↧±×+\-\u2212\u2013()[\]/°'"′″#])|(\s+)/uy;
// tab, line feed and carriage return are blanks, not control characters here
const BLANKS = "\t\n\r";

/** Cuts a callout into tokens, blanks dropped; a sign that no callout has is refused where it stands. */
export function scan(text: string): readonly Token[] {
  if (text.length > LONGEST_CALLOUT) {
    throw new LimitsError("TEXT_TOO_LONG", "the text is too long to be a callout", {
      value: text,
      allowed: `up to ${LONGEST_CALLOUT} characters`,
    });
  }
  const control = findControl(text);
  if (control >= 0) {
    throw new LimitsError("CONTROL_CHARACTER", "a control character stands in the callout", {
      value: `U+${text.charCodeAt(control).toString(16).padStart(4, "0").toUpperCase()}`,
      allowed: "printable text in one or more lines",
      position: { start: control, end: control + 1 },
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
        allowed: "sizes, signs, classes, ⌀ R ± ° ( ) [ ] / X, REF, BASIC, MAX, MIN, TYP, THRU, DEEP",
        position: { start, end: start + 1 },
      });
    }
    const kind = kindOf(match);
    if (kind !== null) tokens.push({ kind, text: match[0], start, end: TOKEN.lastIndex });
  }
  while (tokens.at(-1)?.kind === "line end") tokens.pop();
  while (tokens[0]?.kind === "line end") tokens.shift();
  if (tokens.length === 0) throw new LimitsError("TEXT_EMPTY", "there is no callout here", { value: text });
  return tokens;
}

/** Place of the first control character of either range, C0 or C1; -1 where there is none. */
function findControl(text: string): number {
  for (let place = 0; place < text.length; place++) {
    const code = text.charCodeAt(place);
    if ((code < 0x20 || (code >= 0x7f && code < 0xa0)) && !BLANKS.includes(text.charAt(place))) return place;
  }
  return -1;
}

function kindOf(match: RegExpExecArray): Token["kind"] | null {
  if (match[1] !== undefined) return "number";
  if (match[2] !== undefined) return "word";
  if (match[3] !== undefined) return "mark";
  return match[0].includes("\n") ? "line end" : null;
}
