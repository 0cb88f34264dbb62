import { LimitsError } from "../errors.js";
import type { Token } from "./scan.js";

/** Walks over the tokens of one callout. */
export class TokenReader {
  readonly text: string;
  readonly #tokens: readonly Token[];
  #next = 0;

  constructor(text: string, tokens: readonly Token[]) {
    this.text = text;
    this.#tokens = tokens;
  }

  /** The token `ahead` places on, not taken. */
  peek(ahead = 0): Token | undefined {
    return this.#tokens[this.#next + ahead];
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
    const token = this.peek();
    if (token === undefined || !texts.includes(token.kind === "word" ? token.text.toUpperCase() : token.text)) {
      return undefined;
    }
    this.#next++;
    return token;
  }

  /** Where the last token that was taken ends. */
  get takenTo(): number {
    return this.peek(-1)?.end ?? 0;
  }

  get done(): boolean {
    return this.#next >= this.#tokens.length;
  }

  /** The error for what cannot be read, with the place of the next token. */
  refuse(message: string, allowed?: string): LimitsError {
    const token = this.peek();
    return new LimitsError("CALLOUT_NOT_UNDERSTOOD", message, {
      value: this.text,
      allowed: allowed ?? "such as ⌀40 m6, 40 H7/m6, .875 +.002/-.004, 12 ±0.02, 1.5754/1.5751, .015 MAX, 2.188, (3.75), [2.000], 45°",
      position:
        token === undefined
          ? { start: this.text.length, end: this.text.length }
          : { start: token.start, end: token.end },
    });
  }
}
