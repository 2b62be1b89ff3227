/** Whether the four matrices of a state model belong together: A n × n, B n × m, C p × n, D p × m. */

import type { StateModelBlock } from '../types.ts';

type Matrix = readonly (readonly string[])[];

/** What does not fit, as a sentence; null where all does. */
export function matrixShapeFault(block: Pick<StateModelBlock, 'A' | 'B' | 'C' | 'D' | 'initial'>): string | null {
  const { A, B, C, D, initial } = block;
  const n = A.length;
  const m = B[0]?.length ?? D[0]?.length ?? 0;
  const p = D.length;
  return (
    sizeFault('A', A, n, n) ??
    sizeFault('B', B, n, m) ??
    sizeFault('C', C, p, n) ??
    sizeFault('D', D, p, m) ??
    (initial !== undefined && initial.length !== n
      ? `"initial" has ${counted(initial.length, 'value')}, the model has ${counted(n, 'state')}.`
      : null)
  );
}

function sizeFault(name: string, matrix: Matrix, rows: number, columns: number): string | null {
  const wanted = `The matrices of n states, m inputs and p outputs are A n × n, B n × m, C p × n and D p × m.`;
  if (matrix.length !== rows) {
    return `"${name}" has ${counted(matrix.length, 'row')} where the others ask for ${rows}. ${wanted}`;
  }
  const odd = matrix.findIndex(row => row.length !== columns);
  if (odd < 0) return null;
  return `"${name}" has ${counted(matrix[odd]?.length ?? 0, 'entry')} in row ${odd + 1} where the others ask for ${columns}. ${wanted}`;
}

const PLURALS = { row: 'rows', entry: 'entries', value: 'values', state: 'states' } as const;

function counted(count: number, word: keyof typeof PLURALS): string {
  return `${count} ${count === 1 ? word : PLURALS[word]}`;
}
