/**
 * The rank that a matrix can have by its pattern alone, and what it says about repeated eigenvalues: equal lags or
 * integrators fed from one point have fewer independent equations than states, whatever the gains are.
 */

import { compareRationals, type Rational, ZERO } from './rational.ts';
import type { SparseMatrix } from './sparse-matrix.ts';

/** An eigenvalue with at least `nullity` independent eigenvectors, nullity ≥ 2. */
export interface RepeatedEigenvalue {
  readonly value: Rational;
  readonly nullity: number;
}

/**
 * The eigenvalues that the pattern of the square A alone shows to have several independent eigenvectors: values λ that stand
 * twice or more on the diagonal and leave A − λI structurally short of rank. Each `nullity` is a lower bound.
 */
export function repeatedEigenvalues(A: SparseMatrix<Rational>): RepeatedEigenvalue[] {
  const diagonal = diagonalOf(A);
  const sorted = [...diagonal].sort(compareRationals);
  const values = sorted.filter((value, i) => isSame(value, sorted[i + 1]) && !isSame(value, sorted[i - 1]));
  return values
    .map(value => ({ value, nullity: A.rows - matchedRows(A, i => !isSame(diagonal[i], value)) }))
    .filter(({ nullity }) => nullity > 1);
}

function isSame(a: Rational | undefined, b: Rational | undefined): boolean {
  return a !== undefined && b !== undefined && a.n === b.n && a.d === b.d;
}

function diagonalOf(A: SparseMatrix<Rational>): Rational[] {
  return Array.from({ length: A.rows }, (_, i) => {
    for (let k = A.rowStart[i]!; k < A.rowStart[i + 1]!; k++) if (A.column[k] === i) return A.values[k]!;
    return ZERO;
  });
}

/**
 * Rows that can be matched with columns of their own, the diagonal entry of row i counting where `hasDiagonal(i)`: the
 * structural rank (augmenting paths, Kuhn 1955). O(n · entries).
 */
function matchedRows(A: SparseMatrix<Rational>, hasDiagonal: (i: number) => boolean): number {
  const n = A.rows;
  const columnOf = new Int32Array(n).fill(-1);
  const rowOf = new Int32Array(n).fill(-1);
  let matched = 0;
  for (let root = 0; root < n; root++) {
    const reachedFrom = new Int32Array(n).fill(-1);
    let free = -1;
    const queue = [root];
    for (let head = 0; head < queue.length && free < 0; head++) {
      const i = queue[head]!;
      for (let k = A.rowStart[i]!; k < A.rowStart[i + 1]! && free < 0; k++) {
        const j = A.column[k]!;
        if (reachedFrom[j]! >= 0 || (j === i && !hasDiagonal(i))) continue;
        reachedFrom[j] = i;
        if (rowOf[j]! < 0) free = j;
        else queue.push(rowOf[j]!);
      }
    }
    if (free < 0) continue;
    matched++;
    for (let j = free; j >= 0; ) {
      const i = reachedFrom[j]!;
      const before = columnOf[i]!;
      columnOf[i] = j;
      rowOf[j] = i;
      j = before;
    }
  }
  return matched;
}
