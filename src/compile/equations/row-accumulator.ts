/**
 * Adds sparse rows up: one dense row of sums with a list of the columns that were touched, so that a sum costs what its
 * terms cost and not the width of the row (the sparse accumulator of Gilbert, Moler & Schreiber 1992, SIAM J. Matrix Anal.
 * Appl. 13).
 */

import type { Field } from '../../algebra/index.ts';
import type { Arithmetic, Numbers } from '../quantities/index.ts';
import type { RowStore } from './row-store.ts';

export class RowAccumulator<T> {
  private readonly field: Field<T>;
  private readonly sumOf: (a: T, b: T) => T;
  private readonly sum: Numbers<T>;
  /** 1 where a column is listed in `touched`. */
  private readonly listed: Uint8Array;
  private readonly touched: Int32Array;
  private count = 0;

  constructor(arithmetic: Arithmetic<T>, columns: number) {
    this.field = arithmetic.field;
    this.sumOf = arithmetic.sum;
    this.sum = arithmetic.allocate(columns);
    this.listed = new Uint8Array(columns);
    this.touched = new Int32Array(columns);
  }

  /** Adds one term. */
  add(column: number, value: T): void {
    if (this.listed[column] === 1) {
      this.sum[column] = this.sumOf(this.sum[column]!, value);
      return;
    }
    this.listed[column] = 1;
    this.touched[this.count] = column;
    this.count += 1;
    this.sum[column] = value;
  }

  /** Adds factor × a finished row. */
  addRow({ start, column, values }: RowStore<T>, row: number, factor: T): void {
    const end = start[row + 1]!;
    if (this.field.equals(factor, this.field.one)) {
      for (let k = start[row]!; k < end; k++) this.add(column[k]!, values[k]!);
      return;
    }
    for (let k = start[row]!; k < end; k++) this.add(column[k]!, this.field.multiply(factor, values[k]!));
  }

  /** Writes the sum into a store as its next row, without zeros, and starts again at zero. Returns the row's number. */
  finishRow(store: RowStore<T>): number {
    for (let i = 0; i < this.count; i++) {
      const column = this.touched[i]!;
      this.listed[column] = 0;
      const value = this.sum[column]!;
      if (!this.field.isZero(value)) store.push(column, value);
    }
    this.count = 0;
    return store.endRow();
  }
}
