/** State-space models written down as matrices of decimals or fractions, for tests that need no drawing. */

import { fromRows, parseRational, type Rational, type SparseMatrix, toDouble } from '../../../src/algebra/index.ts';
import type { SignalName, StateSpace, SystemMatrices } from '../../../src/compile/index.ts';

export type Rows = readonly (readonly (string | number)[])[];

/** The sparse matrix with these rows; `columns` is needed where there is no row. */
function rationalMatrix(rows: Rows, columns: number): SparseMatrix<Rational> {
  const read = (entry: string | number): Rational => {
    const value = parseRational(String(entry));
    if (value === null) throw new Error(`${entry} is no number`);
    return value;
  };
  return fromRows(
    rows.map(row => row.map(read)),
    columns,
    ({ n }) => n === 0n,
  );
}

/** A model with states x1 …, inputs u1 …, outputs y1 …; blocks bear the same names. D is zero where it is left out. */
export function rationalModel(A: Rows, B: Rows, C: Rows, D?: Rows, initialState?: readonly number[]): StateSpace {
  const n = A.length;
  const m = B[0]?.length ?? D?.[0]?.length ?? 0;
  const rational: SystemMatrices<Rational> = {
    A: rationalMatrix(A, n),
    B: rationalMatrix(B, m),
    C: rationalMatrix(C, n),
    D: rationalMatrix(D ?? C.map(() => new Array<number>(m).fill(0)), m),
  };
  return {
    title: '',
    states: names('x', n),
    inputs: names('u', m),
    outputs: names('y', C.length),
    numeric: {
      A: rounded(rational.A),
      B: rounded(rational.B),
      C: rounded(rational.C),
      D: rounded(rational.D),
    },
    rational,
    irrational: [],
    initialState: initialState ?? new Array<number>(n).fill(0),
    shiftedStates: [],
  };
}

/** The same model as if it had been derived in doubles. */
export function inDoubles(model: StateSpace): StateSpace {
  return { ...model, rational: null };
}

/** Numerator and denominator (descending powers, the denominator's leading coefficient 1) in controller companion form. */
export function companionModel(numerator: readonly number[], denominator: readonly number[]): StateSpace {
  const n = denominator.length - 1;
  const padded = [...new Array<number>(n + 1 - numerator.length).fill(0), ...numerator];
  const through = padded[0] ?? 0;
  const A = Array.from({ length: n }, (_, i) =>
    Array.from({ length: n }, (_, j) => (i < n - 1 ? (j === i + 1 ? 1 : 0) : -(denominator[n - j] ?? 0))),
  );
  const B = Array.from({ length: n }, (_, i) => [i === n - 1 ? 1 : 0]);
  const C = [Array.from({ length: n }, (_, j) => (padded[n - j] ?? 0) - through * (denominator[n - j] ?? 0))];
  return rationalModel(A, B, C, [[through]]);
}

function names(letter: string, count: number): SignalName[] {
  return Array.from({ length: count }, (_, i) => ({ name: `${letter}${i + 1}`, block: `${letter}${i + 1}` }));
}

function rounded(matrix: SparseMatrix<Rational>): SparseMatrix<number> {
  return { ...matrix, values: Float64Array.from(matrix.values, toDouble) };
}
