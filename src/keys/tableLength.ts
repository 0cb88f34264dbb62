import { inch, mm } from "../units/index.js";
import type { Length } from "../units/index.js";

const inches = new Map<string, Length>();
const millimetres = new Map<string, Length>();

/** A size of an inch table, as printed there; read once. */
export function tableInch(text: string): Length {
  let length = inches.get(text);
  if (length === undefined) {
    length = inch(text);
    inches.set(text, length);
  }
  return length;
}

/** A size of a metric table, as printed there; read once. */
export function tableMm(text: string): Length {
  let length = millimetres.get(text);
  if (length === undefined) {
    length = mm(text);
    millimetres.set(text, length);
  }
  return length;
}
