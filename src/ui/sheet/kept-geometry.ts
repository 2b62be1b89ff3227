/** Geometry that came out as it was before stays the same object, so that its block is not drawn again. */

import type { BlockGeometry, SheetGeometry } from '../../diagram/geometry/index.ts';

/** `next` with the former object wherever nothing in it differs. */
export function keptGeometry(former: SheetGeometry | undefined, next: SheetGeometry): SheetGeometry {
  if (former === undefined) return next;
  const kept = new Map<string, BlockGeometry>();
  for (const [id, geometry] of next) {
    const before = former.get(id);
    kept.set(id, before !== undefined && isSame(before, geometry) ? before : geometry);
  }
  return kept;
}

/** Whether two plain values hold the same; geometry is shallow, so recursion is a few levels deep. */
function isSame(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  const keys = Object.keys(a);
  if (keys.length !== Object.keys(b).length) return false;
  return keys.every(key => isSame(Reflect.get(a, key), Reflect.get(b, key)));
}
