import { describe, expect, test } from 'vitest';
import {
  fromRows,
  invariantSubspace,
  multiplyByMatrix,
  parseRational,
  type Rational,
  type SparseMatrix,
  toFraction,
} from '../../../src/algebra/index.ts';

function matrix(rows: readonly (readonly string[])[], columns = rows[0]?.length ?? 0): SparseMatrix<Rational> {
  const values = rows.map(row => row.map(text => parseRational(text)!));
  return fromRows(values, columns, ({ n }) => n === 0n);
}

function printed(A: SparseMatrix<Rational>, B: SparseMatrix<Rational>) {
  const { pivots, rows } = invariantSubspace(A, B);
  return { pivots, rows: rows.map(row => row.map(toFraction)) };
}

describe('the smallest invariant subspace around given vectors', () => {
  test('a chain of integrators is reached from its head', () => {
    const A = matrix([
      ['0', '0', '0'],
      ['1', '0', '0'],
      ['0', '1', '0'],
    ]);
    expect(invariantSubspace(A, matrix([['1'], ['0'], ['0']])).pivots).toEqual([0, 1, 2]);
  });

  test('from its tail only the tail is reached', () => {
    const A = matrix([
      ['0', '0', '0'],
      ['1', '0', '0'],
      ['0', '1', '0'],
    ]);
    expect(printed(A, matrix([['0'], ['0'], ['5']]))).toEqual({ pivots: [2], rows: [['0', '0', '1']] });
  });

  test('two equal lags fed alike move on the line of equal states', () => {
    const A = matrix([
      ['-1/3', '0'],
      ['0', '-1/3'],
    ]);
    expect(printed(A, matrix([['2'], ['7']]))).toEqual({ pivots: [0], rows: [['1', '7/2']] });
  });

  test('a basis with long fractions is found by more than one prime', () => {
    const A = matrix([
      ['-1', '0'],
      ['0', '-1'],
    ]);
    const b = matrix([['123456789123456789'], ['987654321987654321/1000000000000000003']]);
    expect(printed(A, b).rows).toEqual([['1', ratio()]]);
  });

  test('without vectors it is the origin', () => {
    const A = matrix([['-1']]);
    expect(invariantSubspace(A, matrix([[]], 0))).toEqual({ pivots: [], rows: [] });
  });

  test('without states it is empty', () => {
    expect(invariantSubspace(matrix([], 0), matrix([], 1))).toEqual({ pivots: [], rows: [] });
  });

  test('a mode that a zero cancels leaves a subspace that the matrix maps into itself', () => {
    // ẋ = A x + b u in a basis where the state of the eigenvalue −3 is not driven: P diag(−1, −2, −3) P⁻¹ by hand.
    const A = matrix([
      ['-1', '0', '-2'],
      ['0', '-2', '-1'],
      ['0', '0', '-3'],
    ]);
    const b = matrix([['1'], ['1'], ['0']]);
    const { pivots, rows } = invariantSubspace(A, b);
    expect(pivots).toEqual([0, 1]);
    for (const row of rows) expect(toFraction(multiplyByMatrix(A, row)[2]!)).toBe('0');
  });
});

/** 987654321987654321 / 1000000000000000003 / 123456789123456789 in lowest terms, by whole-number arithmetic. */
function ratio(): string {
  let [n, d] = [987654321987654321n, 1000000000000000003n * 123456789123456789n];
  let [x, y] = [n, d];
  while (y !== 0n) [x, y] = [y, x % y];
  [n, d] = [n / x, d / x];
  return `${n}/${d}`;
}
