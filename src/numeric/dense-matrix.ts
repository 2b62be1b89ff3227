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

/** ‖A‖₁, the largest absolute column sum; 0 for an empty matrix. */
export function oneNorm({ rows, columns, data }: DenseMatrix): number {
  const sums = new Float64Array(columns);
  for (let i = 0; i < rows; i++) {
    for (let j = 0; j < columns; j++) sums[j]! += Math.abs(data[i * columns + j]!);
  }
  return sums.reduce((largest, sum) => (sum > largest || Number.isNaN(sum) ? sum : largest), 0);
}

/** A · B, in register blocks of two rows and four columns. */
export function multiplyMatrices(A: DenseMatrix, B: DenseMatrix): DenseMatrix {
  if (A.columns !== B.rows) throw new RangeError('a product of matrices that do not fit');
  const product = zeroMatrix(A.rows, B.columns);
  const wholeRows = A.rows - (A.rows % 2);
  const wholeColumns = B.columns - (B.columns % 4);
  for (let j = 0; j < wholeColumns; j += 4) {
    for (let i = 0; i < wholeRows; i += 2) multiplyBlock(A, B, product, i, j);
  }
  for (let i = 0; i < A.rows; i++) {
    for (let j = i < wholeRows ? wholeColumns : 0; j < B.columns; j++) {
      let sum = 0;
      for (let k = 0; k < A.columns; k++) sum += A.data[i * A.columns + k]! * B.data[k * B.columns + j]!;
      product.data[i * B.columns + j] = sum;
    }
  }
  return product;
}

/** Rows i, i + 1 and columns j … j + 3 of the product: eight sums that stay in registers. */
function multiplyBlock(A: DenseMatrix, B: DenseMatrix, product: DenseMatrix, i: number, j: number): void {
  const [a, b, c, inner, n] = [A.data, B.data, product.data, A.columns, B.columns];
  let [c00, c01, c02, c03, c10, c11, c12, c13] = [0, 0, 0, 0, 0, 0, 0, 0];
  let at = i * inner;
  for (let k = 0, from = j; k < inner; k++, at++, from += n) {
    const [x, y] = [a[at]!, a[at + inner]!];
    const [b0, b1, b2, b3] = [b[from]!, b[from + 1]!, b[from + 2]!, b[from + 3]!];
    c00 += x * b0;
    c01 += x * b1;
    c02 += x * b2;
    c03 += x * b3;
    c10 += y * b0;
    c11 += y * b1;
    c12 += y * b2;
    c13 += y * b3;
  }
  const top = i * n + j;
  const below = top + n;
  c[top] = c00;
  c[top + 1] = c01;
  c[top + 2] = c02;
  c[top + 3] = c03;
  c[below] = c10;
  c[below + 1] = c11;
  c[below + 2] = c12;
  c[below + 3] = c13;
}

/** target ← A x, four rows at a time so that their sums do not wait for each other. */
export function multiplyVector({ rows, columns, data }: DenseMatrix, x: Float64Array, target: Float64Array): void {
  let i = 0;
  for (; i + 3 < rows; i += 4) {
    let [s0, s1, s2, s3] = [0, 0, 0, 0];
    let at = i * columns;
    for (let j = 0; j < columns; j++, at++) {
      const factor = x[j]!;
      s0 += data[at]! * factor;
      s1 += data[at + columns]! * factor;
      s2 += data[at + 2 * columns]! * factor;
      s3 += data[at + 3 * columns]! * factor;
    }
    target[i] = s0;
    target[i + 1] = s1;
    target[i + 2] = s2;
    target[i + 3] = s3;
  }
  for (; i < rows; i++) {
    let sum = 0;
    for (let j = 0; j < columns; j++) sum += data[i * columns + j]! * x[j]!;
    target[i] = sum;
  }
}
