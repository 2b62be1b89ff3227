/**
 * Diagonal similarity by powers of two, so that nothing is rounded: first step before eigenvalues, exponentials and
 * frequency responses.
 *
 * Parlett & Reinsch 1969, Numer. Math. 13, with the Euclidean norms and the guard of James, Langou & Lowery 2014, "On
 * matrix balancing and eigenvector computation".
 */

import { copyMatrix, type DenseMatrix, zeroMatrix } from './dense-matrix.ts';

/** A state is rescaled where that lowers the sum of its row and column norm to below this share (Parlett & Reinsch). */
const WORTHWHILE = 0.95;

/** One sweep can at most halve the defect; a matrix of doubles is balanced within this many sweeps or it never will be. */
const MOST_SWEEPS = 100;

export interface Balanced {
  /** T⁻¹ A T. */
  readonly A: DenseMatrix;
  /** T⁻¹ B. */
  readonly B: DenseMatrix;
  /** C T. */
  readonly C: DenseMatrix;
  /** The diagonal of T, powers of two. */
  readonly scale: Float64Array;
}

/** T⁻¹ A T and the diagonal of T for a square A, its rows and columns nearly equal in norm. */
export function balance(A: DenseMatrix): { readonly A: DenseMatrix; readonly scale: Float64Array } {
  const none = zeroMatrix(A.rows, 0);
  return balanceSystem(A, none, zeroMatrix(0, A.rows));
}

/**
 * A (n × n), B (n × m) and C (p × n) in states scaled so that row i of [A, B] and column i of [A; C] have nearly equal
 * norms, diagonal of A left out. A state with a zero row or a zero column keeps its scale.
 */
export function balanceSystem(A: DenseMatrix, B: DenseMatrix, C: DenseMatrix): Balanced {
  const result = { A: copyMatrix(A), B: copyMatrix(B), C: copyMatrix(C), scale: new Float64Array(A.rows).fill(1) };
  for (let sweep = 0, moved = true; moved && sweep < MOST_SWEEPS; sweep++) {
    moved = false;
    for (let i = 0; i < A.rows; i++) {
      const factor = stateFactor(result, i);
      if (factor === 1) continue;
      rescaleState(result, i, factor);
      moved = true;
    }
  }
  return result;
}

/** The power of two by which state i's unit is worth changing; 1 where it is not. */
function stateFactor(system: Balanced, i: number): number {
  const row = Math.hypot(rowNorm(system.A, i, i), rowNorm(system.B, i, -1));
  const column = Math.hypot(columnNorm(system.A, i, i), columnNorm(system.C, i, -1));
  if (row === 0 || column === 0 || !Number.isFinite(row) || !Number.isFinite(column)) return 1;
  const factor = 2 ** Math.round(Math.log2(row / column) / 2);
  // The guard of James, Langou & Lowery: compare Euclidean norms, so that a large entry is not made larger.
  const isWorthwhile = Math.hypot(column * factor, row / factor) < WORTHWHILE * Math.hypot(column, row);
  const scale = system.scale[i]! * factor;
  return isWorthwhile && Number.isFinite(scale) && scale > 0 ? factor : 1;
}

function rowNorm({ columns, data }: DenseMatrix, i: number, without: number): number {
  let largest = 0;
  for (let j = 0; j < columns; j++) if (j !== without) largest = Math.max(largest, Math.abs(data[i * columns + j]!));
  if (largest === 0) return 0;
  let sum = 0;
  for (let j = 0; j < columns; j++) if (j !== without) sum += (data[i * columns + j]! / largest) ** 2;
  return largest * Math.sqrt(sum);
}

function columnNorm({ rows, columns, data }: DenseMatrix, j: number, without: number): number {
  let largest = 0;
  for (let i = 0; i < rows; i++) if (i !== without) largest = Math.max(largest, Math.abs(data[i * columns + j]!));
  if (largest === 0) return 0;
  let sum = 0;
  for (let i = 0; i < rows; i++) if (i !== without) sum += (data[i * columns + j]! / largest) ** 2;
  return largest * Math.sqrt(sum);
}

/** Multiplies column i of A and C by `factor` and divides row i of A and B by it. */
function rescaleState({ A, B, C, scale }: Balanced, i: number, factor: number): void {
  for (let j = 0; j < A.columns; j++) if (j !== i) A.data[i * A.columns + j]! /= factor;
  for (let j = 0; j < B.columns; j++) B.data[i * B.columns + j]! /= factor;
  for (let k = 0; k < A.rows; k++) if (k !== i) A.data[k * A.columns + i]! *= factor;
  for (let k = 0; k < C.rows; k++) C.data[k * C.columns + i]! *= factor;
  scale[i]! *= factor;
}
