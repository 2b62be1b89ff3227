/** Matrices by compressed rows, over any field: what derivation produces and every analysis reads. */

/**
 * Row i holds `values[k]` in column `column[k]` for rowStart[i] ≤ k < rowStart[i + 1], columns ascending, no zeros kept.
 */
export interface SparseMatrix<T> {
  readonly rows: number;
  readonly columns: number;
  /** rows + 1 long. */
  readonly rowStart: Int32Array;
  readonly column: Int32Array;
  readonly values: ArrayLike<T>;
}

/** Entry (i, j), `zero` where none is kept. O(log of the row's length). */
export function entryAt<T>(matrix: SparseMatrix<T>, i: number, j: number, zero: T): T {
  let low = matrix.rowStart[i] ?? 0;
  let high = (matrix.rowStart[i + 1] ?? 0) - 1;
  while (low <= high) {
    const middle = (low + high) >> 1;
    const column = matrix.column[middle] ?? 0;
    if (column === j) return matrix.values[middle] ?? zero;
    if (column < j) low = middle + 1;
    else high = middle - 1;
  }
  return zero;
}

/** All rows written out, rows × columns. */
export function toRows<T>(matrix: SparseMatrix<T>, zero: T): T[][] {
  const rows = Array.from({ length: matrix.rows }, () => new Array<T>(matrix.columns).fill(zero));
  rows.forEach((row, i) => {
    for (let k = matrix.rowStart[i] ?? 0; k < (matrix.rowStart[i + 1] ?? 0); k++) {
      row[matrix.column[k] ?? 0] = matrix.values[k] ?? zero;
    }
  });
  return rows;
}

/** The sparse form of written-out rows; `columns` is needed where there is no row. */
export function fromRows<T>(
  rows: readonly (readonly T[])[],
  columns: number,
  isZero: (value: T) => boolean,
): SparseMatrix<T> {
  const rowStart = new Int32Array(rows.length + 1);
  const column: number[] = [];
  const values: T[] = [];
  rows.forEach((row, i) => {
    row.forEach((value, j) => {
      if (isZero(value)) return;
      column.push(j);
      values.push(value);
    });
    rowStart[i + 1] = values.length;
  });
  return { rows: rows.length, columns, rowStart, column: Int32Array.from(column), values };
}
