/** Writes `value / 10^places` without needless zeros: `scaledText(40025n, 3)` is `"40.025"`. */
export function scaledText(value: bigint, places: number): string {
  const text = paddedText(value, places);
  if (places === 0) return text;
  let end = text.length;
  while (text[end - 1] === "0") end--;
  if (text[end - 1] === ".") end--;
  return text.slice(0, end);
}

/** Writes `value / 10^places` with all its places: `paddedText(5n, 3)` is `"0.005"`. */
export function paddedText(value: bigint, places: number): string {
  const sign = value < 0n ? "-" : "";
  const digits = `${value < 0n ? -value : value}`.padStart(places + 1, "0");
  if (places === 0) return sign + digits;
  const point = digits.length - places;
  return `${sign}${digits.slice(0, point)}.${digits.slice(point)}`;
}
