/** The matrices as doubles, and what to say where an entry fits none. */

import type { SparseMatrix } from '../algebra/index.ts';
import { type Problem, problem } from '../problem/index.ts';
import type { SignalName, SystemMatrices } from './state-space.ts';

/** Every entry rounded to the nearest double; one that rounds to zero is not kept. */
export function numericMatrices<T>(
  { A, B, C, D }: SystemMatrices<T>,
  toDouble: (value: T) => number,
): SystemMatrices<number> {
  return {
    A: rounded(A, toDouble),
    B: rounded(B, toDouble),
    C: rounded(C, toDouble),
    D: rounded(D, toDouble),
  };
}

function rounded<T>(matrix: SparseMatrix<T>, toDouble: (value: T) => number): SparseMatrix<number> {
  const { rows, columns, rowStart } = matrix;
  const kept = new Int32Array(rows + 1);
  const column = new Int32Array(matrix.values.length);
  const values = new Float64Array(matrix.values.length);
  let count = 0;
  for (let i = 0; i < rows; i++) {
    for (let k = rowStart[i]!; k < rowStart[i + 1]!; k++) {
      const value = toDouble(matrix.values[k]!);
      if (value === 0) continue;
      column[count] = matrix.column[k]!;
      values[count] = value;
      count += 1;
    }
    kept[i + 1] = count;
  }
  return { rows, columns, rowStart: kept, column: column.slice(0, count), values: values.slice(0, count) };
}

/** One `bad-value` for each state or output whose equation holds a coefficient beyond the largest double. */
export function overflowProblems(
  { A, B, C, D }: SystemMatrices<number>,
  { states, outputs }: { readonly states: readonly SignalName[]; readonly outputs: readonly SignalName[] },
): Problem[] {
  const ofRows = (signals: readonly SignalName[], what: string, matrices: readonly SparseMatrix<number>[]) =>
    signals
      .filter((_, i) => matrices.some(matrix => overflowsInRow(matrix, i)))
      .map(({ name, block }) => {
        const message = `The equation of ${what} ${name} has a coefficient that fits no double. Choose other units.`;
        return problem('bad-value', message, { blocks: [block] });
      });
  return [...ofRows(states, 'state', [A, B]), ...ofRows(outputs, 'output', [C, D])];
}

function overflowsInRow({ rowStart, values }: SparseMatrix<number>, row: number): boolean {
  for (let k = rowStart[row]!; k < rowStart[row + 1]!; k++) {
    if (!Number.isFinite(values[k]!)) return true;
  }
  return false;
}
