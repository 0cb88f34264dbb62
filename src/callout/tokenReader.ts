import { LimitsError } from "../errors.js";
import type { TextSpan } from "../errors.js";
import type { CalloutPart, CalloutPartName } from "./request.js";
import type { Token } from "./scan.js";

/** Walks over the tokens of one callout and notes where each part stood. */
export class TokenReader {
  readonly text: string;
  readonly #tokens: readonly Token[];
  readonly #parts: CalloutPart[] = [];
  #next = 0;

  constructor(text: string, tokens: readonly Token[]) {
    this.text = text;
    this.#tokens = tokens;
  }

  /** The token `ahead` places on, not taken. */
  peek(ahead = 0): Token | undefined {
    return this.#tokens[this.#next + ahead];
  }

  /** The token `ahead` places on as text for comparison: words in capitals, without the point behind `REF.` */
  peekText(ahead = 0): string | undefined {
    const token = this.peek(ahead);
    return token?.kind === "word" ? token.text.toUpperCase().replace(".", "") : token?.text;
  }

  /** Takes the next token. */
  take(): Token {
    const token = this.peek();
    if (token === undefined) throw this.refuse("something is missing at the end");
    this.#next++;
    return token;
  }

  /** Takes the next token if it is one of these marks, or one of these words in capitals or small letters. */
  takeIf(...texts: readonly string[]): Token | undefined {
    const text = this.peekText();
    return text !== undefined && texts.includes(text) ? this.take() : undefined;
  }

  /** Passes over the end of a line. */
  skipLineEnd(): void {
    if (this.peek()?.kind === "line end") this.#next++;
  }

  /** True where no blank stands between the token `ahead` places on and the one before it. */
  touches(ahead: number): boolean {
    const token = this.peek(ahead);
    return token !== undefined && this.peek(ahead - 1)?.end === token.start;
  }

  get done(): boolean {
    return this.#next >= this.#tokens.length;
  }

  /** Where the next token starts; the end of the text where there is none. */
  get from(): number {
    return this.peek()?.start ?? this.text.length;
  }

  /** Where the last token that was taken ends. */
  get takenTo(): number {
    return this.peek(-1)?.end ?? 0;
  }

  /** Runs a task and notes what it took as a part of the callout. */
  part<T>(part: CalloutPartName, task: () => T): T {
    const start = this.from;
    const result = task();
    if (this.takenTo > start) this.#parts.push(Object.freeze({ part, start, end: this.takenTo }));
    return result;
  }

  /** The parts that were noted, in the order of the text. */
  get parts(): readonly CalloutPart[] {
    return Object.freeze([...this.#parts].sort((left, right) => left.start - right.start));
  }

  /** Tries a task: where it gives `null`, everything that it took is given back. */
  try<T>(task: () => T | null): T | null {
    const next = this.#next;
    const parts = this.#parts.length;
    const result = task();
    if (result === null) {
      this.#next = next;
      this.#parts.length = parts;
    }
    return result;
  }

  /** The error for what cannot be read, with the place of the next token. */
  refuse(message: string, allowed?: string): LimitsError {
    const token = this.peek();
    return new LimitsError("CALLOUT_NOT_UNDERSTOOD", message, {
      value: this.text,
      allowed:
        allowed ??
        "such as ⌀40 m6, 40 H7/m6, .875 +.002/-.004, 12 ±0.02, 1.5754/1.5751, .015 MAX, 2.188, (3.75), [2.000], 45°, .02 X 45°, M8x1",
      position: token === undefined ? { start: this.text.length, end: this.text.length } : spanOf(token),
    });
  }
}

function spanOf({ start, end }: Token): TextSpan {
  return { start, end };
}
