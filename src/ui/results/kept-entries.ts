/**
 * The entries of the system matrix row by row, each row's the same function for as long as its numbers are the same: a
 * changed parameter draws the rows again that it changes.
 */

import type { Rational, SparseMatrix } from '../../algebra/index.ts';
import type { StateSpace } from '../../compile/index.ts';
import type { Notation } from '../figures/index.ts';
import { type EntryAt, entriesOf, whyNoFractions } from './matrix-entries.ts';

/** Entries with what they were made from. */
export interface RowEntries {
  readonly model: StateSpace;
  readonly notation: Notation;
  /** For each row of the table what stands in it. */
  readonly rows: readonly EntryAt[];
}

/** @param former  the entries shown before; null where there are none of numbers. */
export function rowEntries(former: RowEntries | null, model: StateSpace, notation: Notation): RowEntries {
  const entryAt = remembered(entriesOf(model, notation));
  const isAlike = former !== null && former.notation === notation && isOfSameMake(former.model, model);
  const rows = Array.from({ length: model.states.length + model.outputs.length }, (_, row) => {
    const before = isAlike && hasSameNumbers(former.model, model, row) ? former.rows[row] : undefined;
    return before ?? entryAt;
  });
  return { model, notation, rows };
}

/** Each entry is written once: the table, its note and the next table ask for the same ones. */
function remembered(write: EntryAt): EntryAt {
  const known = new Map<string, ReturnType<EntryAt>>();
  return (row, column) => {
    const place = `${row} ${column}`;
    const entry = known.get(place) ?? write(row, column);
    known.set(place, entry);
    return entry;
  };
}

/** Whether the same numbers are shown the same way. */
function isOfSameMake(a: StateSpace, b: StateSpace): boolean {
  const isSameSize = a.states.length === b.states.length && a.inputs.length === b.inputs.length;
  return isSameSize && (whyNoFractions(a) === null) === (whyNoFractions(b) === null);
}

function hasSameNumbers(a: StateSpace, b: StateSpace, row: number): boolean {
  const n = a.states.length;
  const [place, left, right] = row < n ? ([row, 'A', 'B'] as const) : ([row - n, 'C', 'D'] as const);
  return [left, right].every(name => {
    if (!isSameRow(a.numeric[name], b.numeric[name], place, Object.is)) return false;
    if (a.rational === null || b.rational === null) return a.rational === b.rational;
    return isSameRow(a.rational[name], b.rational[name], place, isSameFraction);
  });
}

const isSameFraction = (a: Rational, b: Rational): boolean => a.n === b.n && a.d === b.d;

function isSameRow<T>(a: SparseMatrix<T>, b: SparseMatrix<T>, row: number, same: (a: T, b: T) => boolean): boolean {
  const [first, second] = [a.rowStart[row] ?? 0, b.rowStart[row] ?? 0];
  const count = (a.rowStart[row + 1] ?? 0) - first;
  if ((b.rowStart[row + 1] ?? 0) - second !== count) return false;
  for (let k = 0; k < count; k++) {
    const [x, y] = [a.values[first + k], b.values[second + k]];
    if (x === undefined || y === undefined || a.column[first + k] !== b.column[second + k] || !same(x, y)) return false;
  }
  return true;
}
