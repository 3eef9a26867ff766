/**
 * The same value with every part of it that did not change being the very object it was before. A message arrives as a
 * copy; what the core keeps of a hull or a part it keeps by object, and would work out anew for each copy.
 */
export function reunited<T>(before: unknown, now: T): T {
  if (!isNode(now) || !isNode(before) || Array.isArray(now) !== Array.isArray(before)) return now;
  const keys = Object.keys(now);
  const old: Record<string, unknown> = before;
  const fresh: Record<string, unknown> = now;
  let same = keys.length === Object.keys(before).length;
  for (const key of keys) {
    const child = reunited(old[key], fresh[key]);
    fresh[key] = child;
    same &&= Object.is(child, old[key]) && Object.hasOwn(old, key);
  }
  return same ? (before as T) : now;
}

const isNode = (value: unknown): value is Record<string, unknown> =>
  value !== null && typeof value === 'object';
