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

/** The response at s = re + j·im, p × m; null where s is an eigenvalue of H to the last bit of the elimination. */
export type ResponseFunction = (re: number, im: number) => ComplexMatrix | null;

/** The system's response as a function of s, with room for its elimination set aside once. */
export function responseOf(system: ResponseSystem): ResponseFunction {
  const { A, B } = system;
  const M = zeroComplexMatrix(A.rows, A.rows);
  const x = zeroComplexMatrix(B.rows, B.columns);
  return (re, im) => {
    fillShifted(M, A, re, im);
    x.re.set(B.data);
    x.im.fill(0);
    for (let k = 0; k < M.rows; k++) if (!eliminateBelow(M, x, k)) return null;
    substituteBack(M, x);
    return outputs(system, x);
  };
}

/** M ← sI − H. */
function fillShifted(M: ComplexMatrix, { rows: n, data }: DenseMatrix, re: number, im: number): void {
  for (let k = 0; k < n * n; k++) M.re[k] = -data[k]!;
  M.im.fill(0);
  for (let i = 0; i < n; i++) {
    M.re[i * n + i]! += re;
    M.im[i * n + i] = im;
  }
}

/** Clears the entry below the diagonal of column k, after exchanging its two rows for the larger pivot; false where that is zero. */
function eliminateBelow(M: ComplexMatrix, x: ComplexMatrix, k: number): boolean {
  const n = M.rows;
  const top = k * n + k;
  const below = top + n;
  const hasNext = k + 1 < n;
  if (hasNext && sizeAt(M, below) > sizeAt(M, top)) {
    swapWithNext(M, k, k);
    swapWithNext(x, k, 0);
  }
  if (sizeAt(M, top) === 0) return false;
  if (!hasNext || sizeAt(M, below) === 0) return true;
  const [re, im] = quotient(M.re[below]!, M.im[below]!, M.re[top]!, M.im[top]!);
  subtractFromNext(M, k, re, im, k + 1);
  subtractFromNext(x, k, re, im, 0);
  return true;
}

function sizeAt({ re, im }: ComplexMatrix, k: number): number {
  return Math.abs(re[k]!) + Math.abs(im[k]!);
}

function swapWithNext({ columns, re, im }: ComplexMatrix, row: number, from: number): void {
  const end = (row + 1) * columns;
  for (let p = row * columns + from; p < end; p++) {
    const keptRe = re[p]!;
    const keptIm = im[p]!;
    re[p] = re[p + columns]!;
    im[p] = im[p + columns]!;
    re[p + columns] = keptRe;
    im[p + columns] = keptIm;
  }
}

/** Row k + 1 ← row k + 1 − (a + j·b) · row k from column `from` on. */
function subtractFromNext({ columns, re, im }: ComplexMatrix, k: number, a: number, b: number, from: number): void {
  const end = (k + 1) * columns;
  for (let p = k * columns + from; p < end; p++) {
    const x = re[p]!;
    const y = im[p]!;
    re[p + columns]! -= a * x - b * y;
    im[p + columns]! -= a * y + b * x;
  }
}

function substituteBack(M: ComplexMatrix, x: ComplexMatrix): void {
  const n = M.rows;
  const m = x.columns;
  for (let j = 0; j < m; j++) {
    for (let i = n - 1; i >= 0; i--) {
      let re = x.re[i * m + j]!;
      let im = x.im[i * m + j]!;
      for (let k = i + 1, p = i * n + k, q = k * m + j; k < n; k++, p++, q += m) {
        const a = M.re[p]!;
        const b = M.im[p]!;
        const c = x.re[q]!;
        const d = x.im[q]!;
        re -= a * c - b * d;
        im -= a * d + b * c;
      }
      [x.re[i * m + j], x.im[i * m + j]] = quotient(re, im, M.re[i * n + i]!, M.im[i * n + i]!);
    }
  }
}

/** C x + D. */
function outputs({ C, D }: ResponseSystem, x: ComplexMatrix): ComplexMatrix {
  const result = zeroComplexMatrix(D.rows, D.columns);
  for (let i = 0; i < C.rows; i++) {
    for (let j = 0; j < x.columns; j++) {
      let re = 0;
      let im = 0;
      for (let k = 0; k < C.columns; k++) {
        const c = C.data[i * C.columns + k]!;
        re += c * x.re[k * x.columns + j]!;
        im += c * x.im[k * x.columns + j]!;
      }
      result.re[i * D.columns + j] = D.data[i * D.columns + j]! + re;
      result.im[i * D.columns + j] = im;
    }
  }
  return result;
}
