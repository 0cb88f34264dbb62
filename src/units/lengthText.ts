import { LimitsError } from "../errors.js";

const LONGEST_LENGTH_TEXT = 100;

/** The text of a length without its outer blanks; what is no text, or too long to be one, is refused unread. */
export function lengthText(text: unknown): string {
  if (typeof text !== "string") {
    throw new LimitsError("LENGTH_INVALID", "a text is needed here", { value: text, allowed: 'such as "40 mm"' });
  }
  if (text.length > LONGEST_LENGTH_TEXT) {
    throw new LimitsError("TEXT_TOO_LONG", "the text is too long to be a length", {
      value: text,
      allowed: `up to ${LONGEST_LENGTH_TEXT} characters`,
    });
  }
  return text.trim();
}
