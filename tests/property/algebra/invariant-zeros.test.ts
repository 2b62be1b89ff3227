import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  addPolynomials,
  greatestCommonDivisorOfPolynomials,
  invariantZeroPolynomial,
  multiplyPolynomials,
  negateRational,
  type Polynomial,
  polynomial,
  type Rational,
  rankOf,
  rational,
  scalePolynomial,
  ZERO,
} from '../../../src/algebra/index.ts';
import { reducedZeroPolynomial } from '../../../src/algebra/invariant-zeros.ts';
import { rowsOf, sparse } from '../../arbitraries/matrices.ts';
import { SEED } from '../../arbitraries/rationals.ts';

type PolynomialMatrix = readonly (readonly Polynomial[])[];

/** Laplace's expansion along the first row. */
function determinant(M: PolynomialMatrix): Polynomial {
  const [first, ...rest] = M;
  if (first === undefined) return [rational(1n)];
  return first.reduce<Polynomial>((sum, entry, j) => {
    if (entry.length === 0) return sum;
    const minor = determinant(rest.map(row => row.filter((_, k) => k !== j)));
    return addPolynomials(sum, scalePolynomial(rational(j % 2 === 0 ? 1n : -1n), multiplyPolynomials(entry, minor)));
  }, []);
}

function subsets(count: number, size: number): number[][] {
  if (size === 0) return [[]];
  return Array.from({ length: count }, (_, last) => last).flatMap(last =>
    subsets(last, size - 1).map(start => [...start, last]),
  );
}

/**
 * The greatest common divisor of all minors of the largest order at which one is not zero: the product of the invariant
 * polynomials by definition (Smith 1861).
 */
function determinantalDivisor(M: PolynomialMatrix, columns: number): Polynomial {
  for (let order = Math.min(M.length, columns); order > 0; order--) {
    let divisor: Polynomial = [];
    for (const rows of subsets(M.length, order)) {
      for (const chosen of subsets(columns, order)) {
        const minor = determinant(rows.map(i => chosen.map(j => M[i]?.[j] ?? [])));
        divisor = greatestCommonDivisorOfPolynomials(divisor, minor);
      }
    }
    if (divisor.length > 0) return divisor;
  }
  return [rational(1n)];
}

/** [sI − A, −B; C, D]. */
function systemMatrix(A: Rational[][], B: Rational[][], C: Rational[][], D: Rational[][]): PolynomialMatrix {
  const constant = (x: Rational): Polynomial => polynomial([x]);
  return [
    ...A.map((row, i) => [
      ...row.map((x, j) => polynomial([i === j ? rational(1n) : ZERO, negateRational(x)])),
      ...(B[i] ?? []).map(x => constant(negateRational(x))),
    ]),
    ...C.map((row, i) => [...row.map(constant), ...(D[i] ?? []).map(constant)]),
  ];
}

const model = fc
  .tuple(
    fc.integer({ min: 0, max: 3 }),
    fc.integer({ min: 0, max: 2 }),
    fc.integer({ min: 0, max: 2 }),
    fc.constantFrom(2, 3),
  )
  .chain(([n, m, p, spread]) =>
    fc.record({
      m: fc.constant(m),
      A: rowsOf(n, n, spread),
      B: rowsOf(n, m, spread),
      C: rowsOf(p, n, spread),
      D: rowsOf(p, m, 4),
    }),
  );

test('the invariant zeros are those of the Smith form, whatever the shape and the normal rank', () => {
  fc.assert(
    fc.property(model, ({ m, A, B, C, D }) => {
      const expected = determinantalDivisor(systemMatrix(A, B, C, D), A.length + m);
      const n = A.length;
      const model = [sparse(A, n), sparse(B, m), sparse(C, n), sparse(D, m)] as const;
      expect(invariantZeroPolynomial(...model)).toEqual(expected);
      expect(reducedZeroPolynomial(...model)).toEqual(expected);
    }),
    { seed: SEED, numRuns: 600 },
  );
});

test('for square models of ordinary size both ways lead to the same polynomial', () => {
  const square = fc
    .tuple(fc.integer({ min: 4, max: 9 }), fc.integer({ min: 1, max: 3 }))
    .chain(([n, m]) =>
      fc.record({ m: fc.constant(m), A: rowsOf(n, n, 3), B: rowsOf(n, m, 3), C: rowsOf(m, n, 3), D: rowsOf(m, m, 4) }),
    );
  fc.assert(
    fc.property(square, ({ m, A, B, C, D }) => {
      const n = A.length;
      const model = [sparse(A, n), sparse(B, m), sparse(C, n), sparse(D, m)] as const;
      expect(invariantZeroPolynomial(...model)).toEqual(reducedZeroPolynomial(...model));
    }),
    { seed: SEED, numRuns: 200 },
  );
});

test('the rank of a product of an r-column and an r-row matrix of full rank is r', () => {
  const factors = fc
    .integer({ min: 0, max: 4 })
    .chain(r => fc.record({ r: fc.constant(r), left: rowsOf(6, r, 1), right: rowsOf(r, 5, 1) }));
  fc.assert(
    fc.property(factors, ({ r, left, right }) => {
      const inner = rankOf(left);
      const outer = rankOf(right);
      fc.pre(inner === r && outer === r);
      const product = left.map(row =>
        Array.from({ length: 5 }, (_, j) =>
          row.reduce<Polynomial>(
            (sum, x, k) => addPolynomials(sum, scalePolynomial(x, polynomial([right[k]?.[j] ?? ZERO]))),
            [],
          ),
        ).map(([value = ZERO]) => value),
      );
      expect(rankOf(product)).toBe(r);
    }),
    { seed: SEED, numRuns: 300 },
  );
});
