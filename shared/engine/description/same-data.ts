/** A copy of plain data (objects, lists, values), as deep as it goes. */
export function copyOfData(value: unknown): unknown {
  if (typeof value !== 'object' || value === null) return value;
  if (Array.isArray(value)) return value.map(copyOfData);
  const copy: Record<string, unknown> = {};
  for (const key of Object.keys(value)) copy[key] = copyOfData((value as Record<string, unknown>)[key]);
  return copy;
}

/**
 * Whether two pieces of plain data hold the same, key for key. NaN equals nothing. Cost: some nanoseconds per value.
 */
export function isSameData(a: unknown, b: unknown): boolean {
  if (a === b) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  if (Array.isArray(a)) {
    if (!Array.isArray(b) || a.length !== b.length) return false;
    for (let i = 0; i < a.length; i++) if (a[i] !== b[i] && !isSameData(a[i], b[i])) return false;
    return true;
  }
  if (Array.isArray(b)) return false;
  const one = a as Record<string, unknown>;
  const other = b as Record<string, unknown>;
  let surplus = 0;
  for (const key in one) {
    const value = one[key];
    const its = other[key];
    if (value === undefined && !(key in other)) return false;
    if (value !== its && !isSameData(value, its)) return false;
    surplus += 1;
  }
  for (const _key in other) surplus -= 1;
  return surplus === 0;
}
