import { describe, expect, test } from 'vitest';
import {
  characteristicPolynomial,
  type Rational,
  type SparseMatrix,
  transferNumerators,
} from '../../../src/algebra/index.ts';
import { matrix, written } from './as-written.ts';

function numerators(
  A: SparseMatrix<Rational>,
  B: SparseMatrix<Rational>,
  C: SparseMatrix<Rational>,
  D: SparseMatrix<Rational>,
): string[][] {
  const all = transferNumerators(A, B, C, D, characteristicPolynomial(A));
  return all.map(row => row.map(written));
}

describe('transfer numerators', () => {
  test('a model without states is its direct feedthrough', () => {
    const D = matrix(
      [
        ['1/2', 0],
        [3, -4],
      ],
      2,
    );
    expect(numerators(matrix([], 0), matrix([], 2), matrix([[], []], 0), D)).toEqual([
      ['1/2', ''],
      ['3', '-4'],
    ]);
  });

  test('a lag with feedthrough: 3/(s + 2) + 5 has the numerator 5s + 13', () => {
    const found = numerators(matrix([[-2]], 1), matrix([[3]], 1), matrix([[1]], 1), matrix([[5]], 1));
    expect(found).toEqual([['5 13']]);
  });

  test('factors that cancel are kept: a mode that the input does not reach stays on both sides', () => {
    // The mode at 7 is seen at the output but not driven: (s − 7) beside 1/(s + 1).
    const A = matrix(
      [
        [-1, 0],
        [0, 7],
      ],
      2,
    );
    expect(numerators(A, matrix([[1], [0]], 1), matrix([[1, 1]], 2), matrix([[0]], 1))).toEqual([['1 -7']]);
  });

  test('a channel without a path is zero, one by feedthrough alone is the characteristic polynomial times it', () => {
    const A = matrix(
      [
        [0, 1],
        [-2, -3],
      ],
      2,
    );
    const B = matrix(
      [
        [0, 0],
        [1, 0],
      ],
      2,
    );
    const C = matrix(
      [
        [1, 0],
        [0, 0],
      ],
      2,
    );
    const D = matrix(
      [
        [0, 0],
        [0, '1/3'],
      ],
      2,
    );
    expect(numerators(A, B, C, D)).toEqual([
      ['1', ''],
      ['', '1/3 1 2/3'],
    ]);
  });

  test('the companion form carries its numerator in C', () => {
    const A = matrix(
      [
        [0, 1, 0, 0],
        [0, 0, 1, 0],
        [0, 0, 0, 1],
        [-24, -50, -35, -10],
      ],
      4,
    );
    const B = matrix([[0], [0], [0], [1]], 1);
    const C = matrix([[8, '-14/3', 7, '0.125']], 4);
    expect(numerators(A, B, C, matrix([[0]], 1))).toEqual([['1/8 7 -14/3 8']]);
  });
});
