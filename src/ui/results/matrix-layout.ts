/** Rows of the system matrix in order, what the table is called, and which of its entries light up. */

import type { StateSpace } from '../../compile/index.ts';
import type { MatrixPlace } from './matrix-keys.ts';

/** One row: the derivative of a state or an output. */
export interface MatrixRowHead {
  readonly row: number;
  readonly name: string;
  readonly isDerivative: boolean;
  /** The row under the dashed line. */
  readonly isFirstOutput: boolean;
}

/** The rows: a derivative for each state, then the outputs. */
export function rowsOf({ states, outputs }: StateSpace): readonly MatrixRowHead[] {
  return [...states, ...outputs].map(({ name }, row) => ({
    row,
    name,
    isDerivative: row < states.length,
    isFirstOutput: row === states.length && row > 0,
  }));
}

/** `System matrix: A and B over C and D. 4 states, 2 inputs, 1 output.` */
export function matrixLabel({ states, inputs, outputs }: StateSpace): string {
  const sizes = `${count(states.length, 'state')}, ${count(inputs.length, 'input')}, ${count(outputs.length, 'output')}`;
  const isEmpty = states.length + outputs.length === 0 || states.length + inputs.length === 0;
  return isEmpty ? `No entries yet: ${sizes}.` : `System matrix: A and B over C and D. ${sizes}.`;
}

/** `1 state`, `no states`, `4 states`. */
function count(number: number, thing: string): string {
  if (number === 1) return `1 ${thing}`;
  return `${number === 0 ? 'no' : number} ${thing}s`;
}

/** The columns of `places`, row by row. */
export function columnsByRow(places: readonly MatrixPlace[]): ReadonlyMap<number, ReadonlySet<number>> {
  const columns = new Map<number, Set<number>>();
  for (const { row, column } of places) {
    const found = columns.get(row);
    if (found === undefined) columns.set(row, new Set([column]));
    else found.add(column);
  }
  return columns;
}
