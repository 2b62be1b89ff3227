/**
 * The comparison for drawings that differentiate: their states may have been shifted or dropped on the way, so only the
 * transfer matrices are to agree.
 */

import type { SystemMatrices } from '../state-space.ts';
import { type Complex, modulus, real } from './complex.ts';
import { type ComplexSystem, SystemWriter } from './complex-system.ts';
import { factorComplex } from './factor-complex.ts';
import type { Jitter } from './random.ts';
import { type Residual, residual, rowTimes } from './residuals.ts';
import { solveRefined } from './solve-complex.ts';
import type { Answer } from './solve-drawing.ts';

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
  const system = resolventOf(A, s);
  const factors = factorComplex(system);
  if (factors === null) return null;
  return answers.flatMap(({ drive, outputs }) => {
    const u = drive.inputs.map(real);
    const drives = Float64Array.from({ length: A.rows }, (_, i) => rowTimes(B, i, u).sum.re);
    const { re, im } = solveRefined(system, factors, { re: drives, im: new Float64Array(A.rows) });
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

/** sI − A. */
function resolventOf({ rows, rowStart, column, values }: SystemMatrices<number>['A'], s: Complex): ComplexSystem {
  const writer = new SystemWriter();
  for (let i = 0; i < rows; i++) {
    writer.add(i, s.re, s.im);
    for (let k = rowStart[i]!; k < rowStart[i + 1]!; k++) writer.add(column[k]!, -values[k]!, 0);
    writer.endRow();
  }
  return writer.finish();
}
