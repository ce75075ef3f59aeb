/** The own member of a value that may be anything: never one that an object inherits. */
export function ownMember(value: unknown, key: string): unknown {
  const isObject = typeof value === "object" && value !== null && Object.hasOwn(value, key);
  return isObject ? (value as Record<string, unknown>)[key] : undefined;
}
