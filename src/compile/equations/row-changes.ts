/** Rows of one store against those of another: what a derivation has to do again after a change, and what it may keep. */

import type { Arithmetic } from '../quantities/index.ts';
import type { RowStore } from './row-store.ts';

/** Whether both hold entries in the same places, in the same order. */
export function hasSamePlaces<T>(a: RowStore<T>, b: RowStore<T>): boolean {
  if (a.rows !== b.rows || a.length !== b.length) return false;
  for (let row = 0; row <= a.rows; row++) if (a.start[row] !== b.start[row]) return false;
  for (let k = 0; k < a.length; k++) if (a.column[k] !== b.column[k]) return false;
  return true;
}

/** For each row 1 where a value differs; the stores have the same places. */
export function changedRows<T>({ field }: Arithmetic<T>, a: RowStore<T>, b: RowStore<T>): Uint8Array {
  const changed = new Uint8Array(a.rows);
  for (let row = 0; row < a.rows; row++) {
    for (let k = a.start[row]!; k < a.start[row + 1]! && changed[row] === 0; k++) {
      if (!isSame(field, a.values[k]!, b.values[k]!)) changed[row] = 1;
    }
  }
  return changed;
}

/** Whether two rows of one store hold the same values in the same order of columns. */
export function isSameRow<T>({ field }: Arithmetic<T>, store: RowStore<T>, a: number, b: number): boolean {
  const [first, second] = [store.start[a]!, store.start[b]!];
  const count = store.start[a + 1]! - first;
  if (store.start[b + 1]! - second !== count) return false;
  for (let k = 0; k < count; k++) {
    if (store.column[first + k] !== store.column[second + k]) return false;
    if (!isSame(field, store.values[first + k]!, store.values[second + k]!)) return false;
  }
  return true;
}

/** Writes a finished row of another store as the next one. */
export function copyRow<T>(from: RowStore<T>, row: number, to: RowStore<T>): void {
  for (let k = from.start[row]!; k < from.start[row + 1]!; k++) to.push(from.column[k]!, from.values[k]!);
  to.endRow();
}

function isSame<T>(field: Arithmetic<T>['field'], a: T, b: T): boolean {
  return Object.is(a, b) || field.equals(a, b);
}
