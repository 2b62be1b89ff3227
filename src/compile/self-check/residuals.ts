/**
 * What the model says about an answer of the drawing. A drawing's states X and outputs Y satisfy the model's equations for
 * every drive exactly where the two have the same transfer matrix, so the differences left are the measure.
 */

import type { SparseMatrix } from '../../algebra/index.ts';
import type { SystemMatrices } from '../state-space.ts';
import { add, type Complex, modulus, real, subtract, ZERO } from './complex.ts';
import type { Answer } from './solve-drawing.ts';

/** One equation's difference and the size of the terms in it. */
export interface Residual {
  readonly difference: Complex;
  readonly scale: number;
}

/** Ẋ − A X − B u and Y − C X − D u: n + p equations. */
export function residuals({ A, B, C, D }: SystemMatrices<number>, answer: Answer): Residual[] {
  const u = answer.drive.inputs.map(real);
  return [
    ...answer.derivatives.map((value, i) => residual(value, answer.sizes[i]!, A, B, i, answer.states, u)),
    ...answer.outputs.map((value, i) => residual(value, modulus(value), C, D, i, answer.states, u)),
  ];
}

/** value − row of one matrix times x − the same row of another times u; `size` is that of the terms of `value`. */
export function residual(
  value: Complex,
  size: number,
  ofStates: SparseMatrix<number>,
  ofInputs: SparseMatrix<number>,
  row: number,
  x: readonly Complex[],
  u: readonly Complex[],
): Residual {
  const first = rowTimes(ofStates, row, x);
  const second = rowTimes(ofInputs, row, u);
  return {
    difference: subtract(value, add(first.sum, second.sum)),
    scale: size + first.size + second.size,
  };
}

/** A row times a vector, and the sum of the terms' magnitudes. */
export function rowTimes(
  { rowStart, column, values }: SparseMatrix<number>,
  row: number,
  vector: readonly Complex[],
): { readonly sum: Complex; readonly size: number } {
  let [re, im, size] = [0, 0, 0];
  for (let k = rowStart[row]!; k < rowStart[row + 1]!; k++) {
    const entry = vector[column[k]!] ?? ZERO;
    re += values[k]! * entry.re;
    im += values[k]! * entry.im;
    size += Math.abs(values[k]!) * modulus(entry);
  }
  return { sum: { re, im }, size };
}
