/**
 * Gaussian elimination with partial pivoting for real matrices: final values, exponentials, static solutions.
 *
 * Wilkinson 1961, J. ACM 8 (error analysis); growth is watched by the caller through residuals.
 */

import { copyMatrix, type DenseMatrix } from './dense-matrix.ts';

/** P A = L U, L unit lower and U upper in `factors`; row i of P A is row `order[i]` of A. */
export interface LuFactors {
  readonly factors: DenseMatrix;
  readonly order: Int32Array;
  /** Sign of the permutation, 1 or −1. */
  readonly sign: 1 | -1;
}

/** Factors of A (n × n), null where a pivot is exactly zero. O(n³). */
export function luFactors(A: DenseMatrix): LuFactors | null {
  const n = A.rows;
  const factors = copyMatrix(A);
  const { data } = factors;
  const order = Int32Array.from({ length: n }, (_, i) => i);
  let sign: 1 | -1 = 1;
  for (let k = 0; k < n; k++) {
    const pivot = largestInColumn(data, n, k);
    if (data[pivot * n + k] === 0) return null;
    if (pivot !== k) {
      swapRows(data, n, pivot, k);
      [order[pivot], order[k]] = [order[k]!, order[pivot]!];
      sign = sign === 1 ? -1 : 1;
    }
    for (let i = k + 1; i < n; i++) {
      const factor = data[i * n + k]! / data[k * n + k]!;
      if (factor === 0) continue;
      data[i * n + k] = factor;
      for (let j = k + 1; j < n; j++) data[i * n + j]! -= factor * data[k * n + j]!;
    }
  }
  return { factors, order, sign };
}

function largestInColumn(data: Float64Array, n: number, k: number): number {
  let best = k;
  for (let i = k + 1; i < n; i++) if (Math.abs(data[i * n + k]!) > Math.abs(data[best * n + k]!)) best = i;
  return best;
}

function swapRows(data: Float64Array, n: number, a: number, b: number): void {
  for (let j = 0; j < n; j++) {
    const kept = data[a * n + j]!;
    data[a * n + j] = data[b * n + j]!;
    data[b * n + j] = kept;
  }
}

/** A⁻¹ B for B n × m. O(n² m). */
export function luSolve({ factors, order }: LuFactors, B: DenseMatrix): DenseMatrix {
  const n = factors.rows;
  const m = B.columns;
  const x = new Float64Array(n * m);
  for (let i = 0; i < n; i++) x.set(B.data.subarray(order[i]! * m, (order[i]! + 1) * m), i * m);
  for (let i = 0; i < n; i++) {
    for (let k = 0; k < i; k++) subtractRow(x, m, i, k, factors.data[i * n + k]!);
  }
  for (let i = n - 1; i >= 0; i--) {
    for (let k = i + 1; k < n; k++) subtractRow(x, m, i, k, factors.data[i * n + k]!);
    const pivot = factors.data[i * n + i]!;
    for (let j = 0; j < m; j++) x[i * m + j]! /= pivot;
  }
  return { rows: n, columns: m, data: x };
}

/** Row i ← row i − factor · row k. */
function subtractRow(x: Float64Array, m: number, i: number, k: number, factor: number): void {
  if (factor === 0) return;
  for (let j = 0; j < m; j++) x[i * m + j]! -= factor * x[k * m + j]!;
}

/** det A from its factors. */
export function luDeterminant({ factors: { rows: n, data }, sign }: LuFactors): number {
  let product: number = sign;
  for (let i = 0; i < n; i++) product *= data[i * n + i]!;
  return product;
}
