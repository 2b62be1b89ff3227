/** A loop ready to be solved, by whichever way its numbers are solved best. */

import type { RowStore } from '../equations/index.ts';
import type { Arithmetic, Numbers } from '../quantities/index.ts';
import { factorLoop } from './factor-loop.ts';
import { solveFactored } from './solve-factored.ts';

/**
 * Solves (I − M) Y = R for the n signals of a loop.
 *
 * @param rightSides  n × width, row-major; may be overwritten.
 * @returns           Y, n × width; null where the loop turns out to be singular.
 */
export type LoopSolver<T> = (rightSides: Numbers<T>, width: number) => Numbers<T> | null;

/**
 * The solver of a loop by its matrix I − M; null where it is singular. Numbers are factored here; an arithmetic with a way
 * of its own learns of a singular loop only when it solves.
 */
export function loopSolver<T>(arithmetic: Arithmetic<T>, matrix: RowStore<T>): LoopSolver<T> | null {
  const { solveDense } = arithmetic;
  if (solveDense !== undefined) {
    return (rightSides, width) => solveDense(writtenOut(arithmetic, matrix), rightSides, matrix.rows, width);
  }
  const factors = factorLoop(arithmetic, matrix);
  return factors === null ? null : (rightSides, width) => solveFactored(arithmetic, factors, rightSides, width);
}

function writtenOut<T>(arithmetic: Arithmetic<T>, { rows, start, column, values }: RowStore<T>): Numbers<T> {
  const dense = arithmetic.allocate(rows * rows);
  for (let i = 0; i < rows; i++) {
    for (let k = start[i]!; k < start[i + 1]!; k++) dense[i * rows + column[k]!] = values[k]!;
  }
  return dense;
}
