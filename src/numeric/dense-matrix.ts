/**
 * Dense real matrices by rows in one Float64Array, and the few operations every kernel shares. Plain data; a kernel that
 * changes its argument says so in its comment.
 */

/** Entry (i, j) is `data[i · columns + j]`. */
export interface DenseMatrix {
  readonly rows: number;
  readonly columns: number;
  readonly data: Float64Array;
}

/** The rows × columns matrix of zeros. */
export function zeroMatrix(rows: number, columns: number): DenseMatrix {
  return { rows, columns, data: new Float64Array(rows * columns) };
}

/** The matrix with the given rows; `columns` is needed where there is no row. */
export function denseFromRows(rows: readonly ArrayLike<number>[], columns = rows[0]?.length ?? 0): DenseMatrix {
  const matrix = zeroMatrix(rows.length, columns);
  rows.forEach((row, i) => {
    if (row.length !== columns) throw new RangeError('rows of different lengths');
    matrix.data.set(row, i * columns);
  });
  return matrix;
}

/** A copy that shares nothing. */
export function copyMatrix({ rows, columns, data }: DenseMatrix): DenseMatrix {
  return { rows, columns, data: data.slice() };
}

/** The transposed matrix, columns × rows. */
export function transposed({ rows, columns, data }: DenseMatrix): DenseMatrix {
  const result = zeroMatrix(columns, rows);
  for (let i = 0; i < rows; i++) {
    for (let j = 0; j < columns; j++) result.data[j * rows + i] = data[i * columns + j]!;
  }
  return result;
}

/** ‖A‖₁, the largest absolute column sum; 0 for an empty matrix. */
export function oneNorm({ rows, columns, data }: DenseMatrix): number {
  const sums = new Float64Array(columns);
  for (let i = 0; i < rows; i++) {
    for (let j = 0; j < columns; j++) sums[j]! += Math.abs(data[i * columns + j]!);
  }
  return sums.reduce((largest, sum) => (sum > largest || Number.isNaN(sum) ? sum : largest), 0);
}

/** A · B. Rows of B are read in order, zero entries of A are skipped, so sparse factors cost what they hold. */
export function multiplyMatrices(A: DenseMatrix, B: DenseMatrix): DenseMatrix {
  if (A.columns !== B.rows) throw new RangeError('a product of matrices that do not fit');
  const product = zeroMatrix(A.rows, B.columns);
  const [a, b, c, inner, n] = [A.data, B.data, product.data, A.columns, B.columns];
  for (let i = 0; i < A.rows; i++) {
    const target = i * n;
    for (let k = 0; k < inner; k++) {
      const factor = a[i * inner + k]!;
      if (factor === 0) continue;
      const source = k * n;
      for (let j = 0; j < n; j++) c[target + j]! += factor * b[source + j]!;
    }
  }
  return product;
}
