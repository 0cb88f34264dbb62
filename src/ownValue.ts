/** Captured at load, so that a page that patches Object afterwards changes nothing here. */
export const hasOwn: (object: object, key: PropertyKey) => boolean = Object.hasOwn;

/**
 * Reads an option or a field by own key only, so that a polluted `Object.prototype` cannot supply one.
 * What is no object has no options: callers without types may hand over anything.
 */
export function ownValue<T extends object, K extends keyof T>(from: T | undefined, key: K): T[K] | undefined {
  const given: unknown = from;
  return typeof given === "object" && given !== null && hasOwn(given, key) ? from?.[key] : undefined;
}
