// Captured at load, so that a page that patches Object afterwards changes nothing here.
const { hasOwn } = Object;

/**
 * Reads an option or a field by own key only, so that a polluted `Object.prototype` cannot supply one.
 */
export function ownValue<T extends object, K extends keyof T>(from: T | undefined, key: K): T[K] | undefined {
  return from !== undefined && hasOwn(from, key) ? from[key] : undefined;
}
