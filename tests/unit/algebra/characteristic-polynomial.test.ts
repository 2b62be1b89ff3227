import { describe, expect, test } from 'vitest';
import {
  characteristicFactors,
  characteristicPolynomial,
  fromRows,
  multiplyPolynomials,
  type Polynomial,
  type Rational,
  rational,
  type SparseMatrix,
  subtractPolynomials,
  toFraction,
  ZERO,
} from '../../../src/algebra/index.ts';
import { integersFromResidues } from '../../../src/algebra/modular/chinese-remainder.ts';
import { shortestRecurrence } from '../../../src/algebra/modular/modular-characteristic.ts';
import { primeAt } from '../../../src/algebra/modular/primes.ts';
import { strongComponents } from '../../../src/algebra/strong-components.ts';
import { repeatedEigenvalues } from '../../../src/algebra/structural-rank.ts';
import { matrix, poly as polyOf, written } from './as-written.ts';

function poly(...coefficients: (number | string)[]): Polynomial {
  return polyOf(coefficients.join(' '));
}

/** Ones above the diagonal, minus the coefficients in the last row. */
function companion(...coefficients: (number | string)[]): SparseMatrix<Rational> {
  const n = coefficients.length;
  const rows = Array.from({ length: n }, (_, i) =>
    Array.from({ length: n }, (_, j) => (i === n - 1 ? `-${coefficients[n - 1 - j]}` : j === i + 1 ? 1 : 0)),
  );
  return matrix(rows.map(row => row.map(entry => String(entry).replace('--', ''))));
}

describe('characteristic polynomial', () => {
  test('no state gives 1, one state s − a, two states trace and determinant', () => {
    expect(written(characteristicPolynomial(matrix([])))).toBe('1');
    expect(written(characteristicPolynomial(matrix([['-1/3']])))).toBe('1 1/3');
    expect(
      written(
        characteristicPolynomial(
          matrix([
            ['1/2', 3],
            [5, '0.25'],
          ]),
        ),
      ),
    ).toBe('1 -3/4 -119/8');
  });

  test('a companion matrix gives its own coefficients back', () => {
    const coefficients = ['7/3', '0.001', 12, '1e9', '5/7', 3, '2.5', '1/11'];
    expect(written(characteristicPolynomial(companion(...coefficients)))).toBe(written(poly(1, ...coefficients)));
  });

  test("Rosser's 8 × 8 matrix has the eigenvalues 0, 1020, 1000 twice, ±10√10405 and 510 ± 100√26", () => {
    // Rosser, Lanczos, Hestenes & Karush 1951, J. Res. Natl. Bur. Stand. 47; matrix and eigenvalues from memory.
    const rosser = matrix([
      [611, 196, -192, 407, -8, -52, -49, 29],
      [196, 899, 113, -192, -71, -43, -8, -44],
      [-192, 113, 899, 196, 61, 49, 8, 52],
      [407, -192, 196, 611, 8, 44, 59, -23],
      [-8, -71, 61, 8, 411, -599, 208, 208],
      [-52, -43, 49, 44, -599, 411, 208, 208],
      [-49, -8, 8, 59, 208, 208, 99, -911],
      [29, -44, 52, -23, 208, 208, -911, 99],
    ]);
    const expected = [
      poly(1, 0),
      poly(1, -1020),
      poly(1, -1000),
      poly(1, -1000),
      poly(1, 0, -1040500),
      poly(1, -1020, 100),
    ].reduce(multiplyPolynomials);
    expect(written(characteristicPolynomial(rosser))).toBe(written(expected));
  });

  test("Wilkinson's polynomial of degree 20 is that of twenty lags in a chain", () => {
    // Leading coefficients: Wilkinson 1963, Rounding Errors in Algebraic Processes (roots −1 … −20), from memory.
    const chain = matrix(
      Array.from({ length: 20 }, (_, i) =>
        Array.from({ length: 20 }, (_, j) => (i === j ? -1 - i : j === i - 1 ? 1 : 0)),
      ),
    );
    const p = characteristicPolynomial(chain);
    expect(p.slice(0, 4).map(toFraction)).toEqual(['1', '210', '20615', '1256850']);
    expect(toFraction(p[20] ?? ZERO)).toBe('2432902008176640000');
  });

  test('nine equal lags in one loop give (s + 1)ⁿ + k', () => {
    const n = 9;
    const ring = matrix(
      Array.from({ length: n }, (_, i) =>
        Array.from({ length: n }, (_, j) => (i === j ? -1 : j === (i + n - 1) % n ? (i === 0 ? '-1/2' : 1) : 0)),
      ),
    );
    const binomial = [1, 9, 36, 84, 126, 126, 84, 36, 9];
    expect(written(characteristicPolynomial(ring))).toBe(written(poly(...binomial, '3/2')));
  });

  test('a derogatory matrix that is one component: ones everywhere have sⁿ⁻¹(s − n)', () => {
    const ones = matrix(Array.from({ length: 7 }, () => Array.from({ length: 7 }, () => 1)));
    expect(written(characteristicPolynomial(ones))).toBe(written(poly(1, -7, 0, 0, 0, 0, 0, 0)));
  });

  test('denominators that the first primes divide are no obstacle', () => {
    const n = 6;
    const d = BigInt(primeAt(0)) * BigInt(primeAt(1));
    const rows = Array.from({ length: n }, (_, i) =>
      Array.from({ length: n }, (_, j) => (j === (i + 1) % n ? rational(1n, d) : ZERO)),
    );
    const p = characteristicPolynomial(fromRows(rows, n, ({ n: numerator }) => numerator === 0n));
    expect(written(p)).toBe(`1 0 0 0 0 0 -1/${d ** 6n}`);
  });
});

describe('components', () => {
  test('two loops in series are two factors, the driving one first, a single lag a third', () => {
    const A = matrix([
      [0, 1, 0, 5, 0],
      [-2, -3, 0, 0, 0],
      [1, 0, -7, 0, 0],
      [0, 0, 0, -1, 4],
      [0, 0, 0, -4, -1],
    ]);
    expect(strongComponents(A)).toEqual([[3, 4], [0, 1], [2]]);
    expect(characteristicFactors(A).map(written)).toEqual(['1 2 17', '1 3 2', '1 7']);
  });

  test('a ring of 100,000 states does not exhaust the stack', () => {
    const n = 100_000;
    const chain: SparseMatrix<number> = {
      rows: n,
      columns: n,
      rowStart: Int32Array.from({ length: n + 1 }, (_, i) => i),
      column: Int32Array.from({ length: n }, (_, i) => (i + 1) % n),
      values: new Float64Array(n).fill(1),
    };
    expect(strongComponents(chain)).toHaveLength(1);
  });
});

describe('steps modulo a prime', () => {
  test('the Fibonacci sequence obeys s² − s − 1', () => {
    const p = primeAt(0);
    const recurrence = shortestRecurrence(Float64Array.of(1, 1, 2, 3, 5, 8, 13, 21), p);
    expect([...recurrence]).toEqual([1, p - 1, p - 1]);
  });

  test('whole numbers come back from residues up to half the product of the primes, with their signs', () => {
    const primes = [primeAt(0), primeAt(1), primeAt(2)];
    const half = (primes.reduce((product, p) => product * BigInt(p), 1n) - 1n) / 2n;
    const numbers = [0n, 1n, -1n, half, -half, 123456789012345n, -98765432109876543n];
    const images = primes.map(p => Float64Array.from(numbers, x => Number(((x % BigInt(p)) + BigInt(p)) % BigInt(p))));
    expect(integersFromResidues(images, primes)).toEqual(numbers);
  });
});

describe('repeated eigenvalues by pattern', () => {
  /** n lags at −1 fed from one summing point that their weighted sum and a further lag feed back to. */
  function parallelLags(n: number): SparseMatrix<Rational> {
    return matrix(
      Array.from({ length: n + 1 }, (_, i) =>
        Array.from({ length: n + 1 }, (_, j) => {
          if (i === n) return j === n ? -3 : j + 1;
          return j === n ? 1 : i === j ? -1 : 0;
        }),
      ),
    );
  }

  test('n equal lags fed from one point have n − 1 independent eigenvectors at their pole', () => {
    expect(repeatedEigenvalues(parallelLags(7))).toEqual([{ value: rational(-1n), nullity: 6 }]);
    expect(
      repeatedEigenvalues(
        matrix([
          [0, 1],
          [2, 0],
        ]),
      ),
    ).toEqual([]);
  });

  test('their characteristic polynomial is (s + 1)ⁿ⁻¹ ((s + 1)(s + 3) − Σ gains)', () => {
    const expected = [...Array.from({ length: 6 }, () => poly(1, 1)), poly(1, 4, 3 - 28)].reduce(multiplyPolynomials);
    expect(written(characteristicPolynomial(parallelLags(7)))).toBe(written(expected));
  });

  test('two equal oscillators in parallel, whose pole the pattern does not show, take the longer way to the same end', () => {
    const A = matrix([
      [0, 1, 0, 0, 0, 0],
      [-2, -1, 0, 0, 1, 0],
      [0, 0, 0, 1, 0, 0],
      [0, 0, -2, -1, 1, 0],
      [1, 0, 1, 0, -5, 1],
      [0, 0, 0, 0, 1, -7],
    ]);
    // (s² + s + 2) ((s² + s + 2)((s + 5)(s + 7) − 1) − 2 (s + 7)), by hand from the block diagram.
    const oscillator = poly(1, 1, 2);
    const inner = subtractPolynomials(multiplyPolynomials(oscillator, poly(1, 12, 34)), poly(2, 14));
    expect(written(characteristicPolynomial(A))).toBe(written(multiplyPolynomials(oscillator, inner)));
  });
});
