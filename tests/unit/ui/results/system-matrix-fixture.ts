/** Models written out by hand for the tests of the system matrix. */

import { fromRows, parseRational, toDouble, ZERO } from '../../../../src/algebra/index.ts';
import type { StateSpace } from '../../../../src/compile/index.ts';

type Rows = readonly (readonly string[])[];

interface WrittenModel {
  readonly states: readonly string[];
  readonly inputs: readonly string[];
  readonly outputs: readonly string[];
  readonly A: Rows;
  readonly B: Rows;
  readonly C: Rows;
  readonly D: Rows;
}

/** The model of rows of fractions. */
export function writtenModel({ states, inputs, outputs, ...rows }: WrittenModel): StateSpace {
  const named = (names: readonly string[]) => names.map(name => ({ name, block: name }));
  const exact = (text: string) => parseRational(text) ?? ZERO;
  const rational = (of: Rows, columns: number) =>
    fromRows(
      of.map(row => row.map(exact)),
      columns,
      value => value.n === 0n,
    );
  const numeric = (of: Rows, columns: number) =>
    fromRows(
      of.map(row => row.map(text => toDouble(exact(text)))),
      columns,
      value => value === 0,
    );
  const [n, m] = [states.length, inputs.length];
  const { A, B, C, D } = rows;
  return {
    title: '',
    states: named(states),
    inputs: named(inputs),
    outputs: named(outputs),
    numeric: { A: numeric(A, n), B: numeric(B, m), C: numeric(C, n), D: numeric(D, m) },
    rational: { A: rational(A, n), B: rational(B, m), C: rational(C, n), D: rational(D, m) },
    irrational: [],
    initialState: states.map(() => 0),
    shiftedStates: [],
  };
}

/** A tension loop of four states: every kind of entry, and a row and a column of zeros. */
export const winch = writtenModel({
  states: ['omega', 'F', 'q', 'T'],
  inputs: ['r', 'v'],
  outputs: ['F'],
  A: [
    ['-4', '-5/16', '0', '5/4'],
    ['3', '0', '0', '0'],
    ['0', '-1', '0', '0'],
    ['0', '-10', '8', '-20'],
  ],
  B: [
    ['0', '0'],
    ['0', '12'],
    ['1', '0'],
    ['10', '0'],
  ],
  C: [['0', '1', '0', '0']],
  D: [['0', '1/3']],
});

/** A chain of `n` lags. */
export function chain(n: number): StateSpace {
  const row = (filled: (column: number) => string) => Array.from({ length: n }, (_, column) => filled(column));
  return writtenModel({
    states: Array.from({ length: n }, (_, k) => `x_${k + 1}`),
    inputs: ['u'],
    outputs: ['y'],
    A: Array.from({ length: n }, (_, k) => row(j => (j === k ? '-1' : j === k - 1 ? '1' : '0'))),
    B: Array.from({ length: n }, (_, k) => [k === 0 ? '1' : '0']),
    C: [row(j => (j === n - 1 ? '1' : '0'))],
    D: [['0']],
  });
}
