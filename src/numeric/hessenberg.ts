/**
 * Orthogonal reduction to upper Hessenberg form by Householder reflections: after balancing, before eigenvalues and
 * frequency responses.
 *
 * Householder 1958, J. ACM 5; Golub & Van Loan, Matrix Computations, algorithm "Householder reduction to Hessenberg form".
 */

import { copyMatrix, type DenseMatrix, zeroMatrix } from './dense-matrix.ts';

export interface HessenbergSystem {
  /** Qᵀ A Q, exactly zero below the first subdiagonal. */
  readonly A: DenseMatrix;
  /** Qᵀ B. */
  readonly B: DenseMatrix;
  /** C Q. */
  readonly C: DenseMatrix;
}

/** Qᵀ A Q, upper Hessenberg, for a square A. O(n³). */
export function hessenbergForm(A: DenseMatrix): DenseMatrix {
  return hessenbergSystem(A, zeroMatrix(A.rows, 0), zeroMatrix(0, A.rows)).A;
}

/** A (n × n) in Hessenberg form with B (n × m) and C (p × n) taken to the same states. O(n³ + n²(m + p)). */
export function hessenbergSystem(A: DenseMatrix, B: DenseMatrix, C: DenseMatrix): HessenbergSystem {
  const n = A.rows;
  const result = { A: copyMatrix(A), B: copyMatrix(B), C: copyMatrix(C) };
  const reflection = new Float64Array(n);
  for (let k = 0; k < n - 2; k++) {
    const head = columnReflection(result.A, k, reflection);
    if (head === null) continue;
    reflectRows(result.A, reflection, k + 1, k + 1);
    reflectRows(result.B, reflection, k + 1, 0);
    reflectColumns(result.A, reflection, k + 1);
    reflectColumns(result.C, reflection, k + 1);
    result.A.data[(k + 1) * n + k] = head;
    for (let i = k + 2; i < n; i++) result.A.data[i * n + k] = 0;
  }
  return result;
}

/**
 * Fills v[k + 1 …] with the unit vector of I − 2 v vᵀ that clears column k below the subdiagonal; returns the subdiagonal
 * entry it leaves, null where the column is clear already.
 */
function columnReflection({ rows: n, data }: DenseMatrix, k: number, v: Float64Array): number | null {
  let largest = 0;
  for (let i = k + 2; i < n; i++) largest = Math.max(largest, Math.abs(data[i * n + k]!));
  if (largest === 0) return null;
  largest = Math.max(largest, Math.abs(data[(k + 1) * n + k]!));
  let sum = 0;
  for (let i = k + 1; i < n; i++) {
    v[i] = data[i * n + k]! / largest;
    sum += v[i]! ** 2;
  }
  const length = Math.sqrt(sum);
  const head = v[k + 1]! > 0 ? -length : length;
  v[k + 1]! -= head;
  const norm = Math.sqrt(2 * length * (length + Math.abs(v[k + 1]! + head)));
  for (let i = k + 1; i < n; i++) v[i]! /= norm;
  return head * largest;
}

/** M ← (I − 2 v vᵀ) M on columns `from` and up, v zero above `start`. */
function reflectRows({ rows, columns, data }: DenseMatrix, v: Float64Array, start: number, from: number): void {
  const width = columns - from;
  if (width <= 0) return;
  const sums = new Float64Array(width);
  for (let i = start; i < rows; i++) {
    const factor = v[i]!;
    const row = i * columns + from;
    for (let j = 0; j < width; j++) sums[j]! += factor * data[row + j]!;
  }
  for (let i = start; i < rows; i++) {
    const factor = 2 * v[i]!;
    const row = i * columns + from;
    for (let j = 0; j < width; j++) data[row + j]! -= factor * sums[j]!;
  }
}

/** M ← M (I − 2 v vᵀ), v zero above `start`. */
function reflectColumns({ rows, columns, data }: DenseMatrix, v: Float64Array, start: number): void {
  for (let i = 0; i < rows; i++) {
    const row = i * columns;
    let sum = 0;
    for (let j = start; j < columns; j++) sum += data[row + j]! * v[j]!;
    sum *= 2;
    for (let j = start; j < columns; j++) data[row + j]! -= sum * v[j]!;
  }
}
