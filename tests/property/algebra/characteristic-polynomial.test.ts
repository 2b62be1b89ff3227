import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  addRationals,
  characteristicPolynomial,
  multiplyRationals,
  negateRational,
  ONE,
  type Polynomial,
  type Rational,
  rational,
  ZERO,
} from '../../../src/algebra/index.ts';
import { rowsOf, sparse, squareRows } from '../../arbitraries/matrices.ts';
import { SEED } from '../../arbitraries/rationals.ts';

type Rows = readonly (readonly Rational[])[];

function product(X: Rows, Y: Rows): Rational[][] {
  return X.map(row =>
    (Y[0] ?? []).map((_, j) =>
      row.reduce((sum, x, k) => addRationals(sum, multiplyRationals(x, Y[k]?.[j] ?? ZERO)), ZERO),
    ),
  );
}

/** Faddeev & Faddeeva 1963 (Leverrier's method), in rationals: the simple oracle for the modular route. */
function leverrier(A: Rows): Polynomial {
  const n = A.length;
  const coefficients: Rational[] = [ONE];
  let M: Rational[][] = A.map(row => row.map(() => ZERO));
  for (let k = 1; k <= n; k++) {
    const last = coefficients[k - 1] ?? ZERO;
    M = product(A, M).map((row, i) => row.map((x, j) => (i === j ? addRationals(x, last) : x)));
    const trace = product(A, M).reduce((sum, row, i) => addRationals(sum, row[i] ?? ZERO), ZERO);
    coefficients.push(multiplyRationals(negateRational(trace), rational(1n, BigInt(k))));
  }
  return coefficients;
}

describe('characteristic polynomial', () => {
  test("it is the one that Leverrier's method gives", () => {
    fc.assert(
      fc.property(squareRows(9), A => {
        expect(characteristicPolynomial(sparse(A, A.length))).toEqual(leverrier(A));
      }),
      { seed: SEED, numRuns: 200 },
    );
  });

  test('X Y and Y X have the same one, padded with zeros, however rank-deficient they are', () => {
    fc.assert(
      fc.property(rowsOf(8, 3, 2), rowsOf(3, 8, 2), (X, Y) => {
        const long = characteristicPolynomial(sparse(product(X, Y), 8));
        const short = characteristicPolynomial(sparse(product(Y, X), 3));
        expect(long).toEqual([...short, ZERO, ZERO, ZERO, ZERO, ZERO]);
      }),
      { seed: SEED, numRuns: 100 },
    );
  });
});
