/**
 * Sparse rows in three flat buffers (compressed rows), written one after another. A drawing of 100,000 blocks has as many
 * rows: an object for each would cost more than the arithmetic.
 */

import type { SparseMatrix } from '../../algebra/index.ts';
import type { Arithmetic, Numbers } from '../quantities/index.ts';

/** Row i holds values[k] in column[k] for start[i] ≤ k < start[i + 1]. Finished rows are not changed any more. */
export class RowStore<T> {
  column: Int32Array;
  values: Numbers<T>;
  start: Int32Array;
  /** Finished rows. */
  rows = 0;
  /** Entries in use. */
  length = 0;
  private readonly arithmetic: Arithmetic<T>;

  /** @param rows, entries  What to make room for; the buffers double when they are full. */
  constructor(arithmetic: Arithmetic<T>, rows = 16, entries = 64) {
    this.arithmetic = arithmetic;
    this.start = new Int32Array(rows + 1);
    this.column = new Int32Array(entries);
    this.values = arithmetic.allocate(entries);
  }

  /** Writes one entry of the row in hand. */
  push(column: number, value: T): void {
    if (this.length === this.column.length) this.growEntries();
    this.column[this.length] = column;
    this.values[this.length] = value;
    this.length += 1;
  }

  /** Finishes the row in hand and returns its number. */
  endRow(): number {
    if (this.rows + 1 === this.start.length) this.start = doubled(this.start);
    this.rows += 1;
    this.start[this.rows] = this.length;
    return this.rows - 1;
  }

  private growEntries(): void {
    this.column = doubled(this.column);
    const larger = this.arithmetic.allocate(2 * this.values.length);
    for (let k = 0; k < this.length; k++) larger[k] = this.values[k]!;
    this.values = larger;
  }
}

function doubled(buffer: Int32Array): Int32Array {
  const larger = new Int32Array(2 * buffer.length);
  larger.set(buffer);
  return larger;
}

/**
 * Columns from ≤ c < to of the given rows as a matrix of its own, columns ascending.
 *
 * @param rows  Row numbers of the store, one for each row of the matrix.
 */
export function cutMatrix<T>(store: RowStore<T>, rows: ArrayLike<number>, from: number, to: number): SparseMatrix<T> {
  const rowStart = new Int32Array(rows.length + 1);
  const column: number[] = [];
  const values: T[] = [];
  for (let i = 0; i < rows.length; i++) {
    const row = rows[i]!;
    const kept: number[] = [];
    for (let k = store.start[row]!; k < store.start[row + 1]!; k++) {
      if (store.column[k]! >= from && store.column[k]! < to) kept.push(k);
    }
    kept.sort((a, b) => store.column[a]! - store.column[b]!);
    for (const k of kept) {
      column.push(store.column[k]! - from);
      values.push(store.values[k]!);
    }
    rowStart[i + 1] = values.length;
  }
  return { rows: rows.length, columns: to - from, rowStart, column: Int32Array.from(column), values };
}
