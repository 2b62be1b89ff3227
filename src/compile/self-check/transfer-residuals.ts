/**
 * The comparison for drawings that differentiate: their states may have been shifted or dropped on the way, so only the
 * transfer matrices are to agree.
 */

import type { SystemMatrices } from '../state-space.ts';
import { type Complex, modulus, real } from './complex.ts';
import type { Jitter } from './random.ts';
import { type Residual, residual, rowTimes } from './residuals.ts';
import type { Answer } from './solve-drawing.ts';
import { type ComplexRow, factorComplex, solveComplex } from './sparse-complex-lu.ts';

/**
 * Y of the drawing minus C (sI − A)⁻¹ B u + D u for each answer: p equations each; null where s is a pole of the model.
 *
 * @param jitter  Changes the entries of the model too, as what rounding does to them counts here.
 */
export function transferResiduals(
  model: SystemMatrices<number>,
  s: Complex,
  answers: readonly Answer[],
  jitter: Jitter | null,
): Residual[] | null {
  const { A, B, C, D } = jitter === null ? model : changed(model, jitter);
  const factors = factorComplex(resolventRows(A, s));
  if (factors === null) return null;
  return answers.flatMap(({ drive, outputs }) => {
    const u = drive.inputs.map(real);
    const drives = Float64Array.from({ length: A.rows }, (_, i) => rowTimes(B, i, u).sum.re);
    const { re, im } = solveComplex(factors, drives, new Float64Array(A.rows));
    const x = Array.from(re, (value, i) => ({ re: value, im: im[i]! }));
    return outputs.map((value, i) => residual(value, modulus(value), C, D, i, x, u));
  });
}

function changed({ A, B, C, D }: SystemMatrices<number>, jitter: Jitter): SystemMatrices<number> {
  const change = (matrix: SystemMatrices<number>['A']) => ({
    ...matrix,
    values: Float64Array.from(matrix.values, value => value * jitter()),
  });
  return { A: change(A), B: change(B), C: change(C), D: change(D) };
}

/** Rows of sI − A. */
function resolventRows(A: SystemMatrices<number>['A'], s: Complex): ComplexRow[] {
  return Array.from({ length: A.rows }, (_, i) => {
    const row: ComplexRow = { column: [i], re: [s.re], im: [s.im] };
    for (let k = A.rowStart[i]!; k < A.rowStart[i + 1]!; k++) {
      const j = A.column[k]!;
      if (j === i) row.re[0]! -= A.values[k]!;
      else {
        row.column.push(j);
        row.re.push(-A.values[k]!);
        row.im.push(0);
      }
    }
    return row;
  });
}
