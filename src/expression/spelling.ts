/** Near misses: whether one slip of the finger lies between two names. */

/**
 * Whether one letter changed, added, left out or swapped with its neighbour makes `b` of `a`; equal names are not one edit
 * away. The restricted edit distance of Damerau (1964), asked only whether it is one. Linear.
 */
export function isOneEditAway(a: string, b: string): boolean {
  if (a === b || Math.abs(a.length - b.length) > 1) return false;
  let start = 0;
  while (start < a.length && start < b.length && a[start] === b[start]) start++;
  if (a.length !== b.length) {
    const [long, short] = a.length > b.length ? [a, b] : [b, a];
    return long.slice(start + 1) === short.slice(start);
  }
  if (a.slice(start + 1) === b.slice(start + 1)) return true;
  return a[start] === b[start + 1] && a[start + 1] === b[start] && a.slice(start + 2) === b.slice(start + 2);
}

/** Names shorter than this are one edit from each other too often for that to mean anything. */
const SHORTEST_MISSPELT = 3;

/** The first of `names` that differs from `name` in capitals and underscores only, or else by one slip; null where none does. */
export function nearestName(name: string, names: Iterable<string>): string | null {
  const others = [...names].filter(candidate => candidate !== name);
  const plain = (text: string) => text.toLowerCase().replaceAll('_', '');
  const same = others.find(candidate => plain(candidate) === plain(name));
  if (same !== undefined || name.length < SHORTEST_MISSPELT) return same ?? null;
  return others.find(candidate => isOneEditAway(name, candidate)) ?? null;
}
