import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  addRationals,
  characteristicPolynomial,
  divideRationals,
  evaluatePolynomialAt,
  multiplyRationals,
  type Rational,
  subtractRationals,
  transferNumerators,
  ZERO,
} from '../../../src/algebra/index.ts';
import { rowsOf, sparse } from '../../arbitraries/matrices.ts';
import { SEED, shortRational } from '../../arbitraries/rationals.ts';

/** X with M X = R by elimination, M square and regular: the textbook's way, as the oracle. */
function solved(M: readonly (readonly Rational[])[], R: readonly (readonly Rational[])[]): Rational[][] {
  const rows = M.map((row, i) => [...row, ...(R[i] ?? [])]);
  rows.forEach((_, k) => {
    const pivot = rows.findIndex((row, i) => i >= k && row[k]?.n !== 0n);
    [rows[k], rows[pivot]] = [rows[pivot] ?? [], rows[k] ?? []];
    const head = rows[k]?.[k] ?? ZERO;
    rows[k] = (rows[k] ?? []).map(x => divideRationals(x, head));
    rows.forEach((row, i) => {
      if (i === k) return;
      const factor = row[k] ?? ZERO;
      rows[i] = row.map((x, j) => subtractRationals(x, multiplyRationals(factor, rows[k]?.[j] ?? ZERO)));
    });
  });
  return rows.map(row => row.slice(M.length));
}

const model = fc.integer({ min: 0, max: 7 }).chain(n =>
  fc.record({
    A: rowsOf(n, n, 3),
    B: rowsOf(n, 2, 2),
    C: rowsOf(2, n, 2),
    D: rowsOf(2, 2, 2),
    s: shortRational,
  }),
);

test('at any rational point that is no pole the quotient is C(sI − A)⁻¹B + D', () => {
  fc.assert(
    fc.property(model, ({ A, B, C, D, s }) => {
      const [a, b, c, d] = [sparse(A, A.length), sparse(B, 2), sparse(C, A.length), sparse(D, 2)];
      const characteristic = characteristicPolynomial(a);
      const denominator = evaluatePolynomialAt(characteristic, s);
      fc.pre(denominator.n !== 0n);
      const shifted = A.map((row, i) => row.map((x, j) => subtractRationals(i === j ? s : ZERO, x)));
      const X = solved(shifted, B);
      const expected = C.map((row, i) =>
        [0, 1].map(j =>
          row.reduce((sum, x, k) => addRationals(sum, multiplyRationals(x, X[k]?.[j] ?? ZERO)), D[i]?.[j] ?? ZERO),
        ),
      );
      const found = transferNumerators(a, b, c, d, characteristic).map(row =>
        row.map(p => divideRationals(evaluatePolynomialAt(p, s), denominator)),
      );
      expect(found).toEqual(expected);
    }),
    { seed: SEED, numRuns: 300 },
  );
});
