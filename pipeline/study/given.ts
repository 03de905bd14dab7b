/** Without the keys whose value is undefined, so that an absent key stays absent. */
export function given<T extends object>(parts: T): T {
  return Object.fromEntries(Object.entries(parts).filter(([, value]) => value !== undefined)) as T;
}
