/**
 * C (sI − H)⁻¹ B + D at many complex s for one Hessenberg H: the reduction is done once, each point costs O(n²).
 *
 * Laub 1981, IEEE Trans. Autom. Control 26(2), "Efficient multivariable frequency response computations"; elimination with
 * exchange of neighbouring rows.
 */

import { type ComplexMatrix, quotient, zeroComplexMatrix } from './complex-lu.ts';
import type { DenseMatrix } from './dense-matrix.ts';

export interface ResponseSystem {
  /** n × n, upper Hessenberg. */
  readonly A: DenseMatrix;
  readonly B: DenseMatrix;
  readonly C: DenseMatrix;
  readonly D: DenseMatrix;
}

/**
 * The response at s = re + j·im, p × m; null where s is an eigenvalue of H to the last bit of the elimination.
 */
export function responseAt(system: ResponseSystem, re: number, im: number): ComplexMatrix | null {
  const { A, B, C, D } = system;
  const shifted = shiftedNegative(A, re, im);
  const x: ComplexMatrix = {
    rows: B.rows,
    columns: B.columns,
    re: B.data.slice(),
    im: new Float64Array(B.data.length),
  };
  if (!eliminate(shifted, x)) return null;
  substituteBack(shifted, x);
  const result = zeroComplexMatrix(D.rows, D.columns);
  for (let i = 0; i < C.rows; i++) {
    for (let j = 0; j < x.columns; j++) {
      let [sumRe, sumIm] = [0, 0];
      for (let k = 0; k < C.columns; k++) {
        const c = C.data[i * C.columns + k]!;
        sumRe += c * x.re[k * x.columns + j]!;
        sumIm += c * x.im[k * x.columns + j]!;
      }
      result.re[i * D.columns + j] = D.data[i * D.columns + j]! + sumRe;
      result.im[i * D.columns + j] = sumIm;
    }
  }
  return result;
}

function shiftedNegative({ rows: n, data }: DenseMatrix, re: number, im: number): ComplexMatrix {
  const M = { rows: n, columns: n, re: data.map(entry => -entry), im: new Float64Array(n * n) };
  for (let i = 0; i < n; i++) {
    M.re[i * n + i]! += re;
    M.im[i * n + i] = im;
  }
  return M;
}

/** Brings M to triangular form and x along; false where a pivot vanishes. */
function eliminate(M: ComplexMatrix, x: ComplexMatrix): boolean {
  const n = M.rows;
  for (let k = 0; k < n; k++) {
    const [top, below] = [k * n + k, (k + 1) * n + k];
    if (k + 1 < n) {
      const sizeBelow = Math.abs(M.re[below]!) + Math.abs(M.im[below]!);
      if (sizeBelow > Math.abs(M.re[top]!) + Math.abs(M.im[top]!)) {
        swapWithNext(M, k, k);
        swapWithNext(x, k, 0);
      }
    }
    if (M.re[top] === 0 && M.im[top] === 0) return false;
    if (k + 1 === n) break;
    const [re, im] = quotient(M.re[below]!, M.im[below]!, M.re[top]!, M.im[top]!);
    if (re === 0 && im === 0) continue;
    subtractFromNext(M, k, re, im, k + 1);
    subtractFromNext(x, k, re, im, 0);
  }
  return true;
}

function substituteBack(M: ComplexMatrix, x: ComplexMatrix): void {
  const n = M.rows;
  const m = x.columns;
  for (let j = 0; j < m; j++) {
    for (let i = n - 1; i >= 0; i--) {
      let [re, im] = [x.re[i * m + j]!, x.im[i * m + j]!];
      for (let k = i + 1; k < n; k++) {
        const [a, b, c, d] = [M.re[i * n + k]!, M.im[i * n + k]!, x.re[k * m + j]!, x.im[k * m + j]!];
        re -= a * c - b * d;
        im -= a * d + b * c;
      }
      [x.re[i * m + j], x.im[i * m + j]] = quotient(re, im, M.re[i * n + i]!, M.im[i * n + i]!);
    }
  }
}

function swapWithNext({ columns, re, im }: ComplexMatrix, row: number, from: number): void {
  for (let j = from; j < columns; j++) {
    const [p, q] = [row * columns + j, (row + 1) * columns + j];
    const [keptRe, keptIm] = [re[p]!, im[p]!];
    re[p] = re[q]!;
    im[p] = im[q]!;
    re[q] = keptRe;
    im[q] = keptIm;
  }
}

/** Row k + 1 ← row k + 1 − (re + j·im) · row k from column `from` on. */
function subtractFromNext(M: ComplexMatrix, k: number, re: number, im: number, from: number): void {
  const n = M.columns;
  for (let j = from; j < n; j++) {
    const [x, y] = [M.re[k * n + j]!, M.im[k * n + j]!];
    M.re[(k + 1) * n + j]! -= re * x - im * y;
    M.im[(k + 1) * n + j]! -= re * y + im * x;
  }
}
