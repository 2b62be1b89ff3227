import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  addRationals,
  certifiedRoots,
  evaluatePolynomialAt,
  multiplyRationals,
  negateRational,
  type Polynomial,
  productOfPolynomials,
  type Rational,
  rational,
  rationalFromDouble,
  subtractRationals,
  toDouble,
} from '../../../../src/algebra/index.ts';
import { nonzeroPolynomialOf } from '../../../arbitraries/polynomials.ts';
import { nonzeroRational, SEED, shortRational } from '../../../arbitraries/rationals.ts';

interface KnownRoot {
  readonly re: Rational;
  readonly im: Rational;
}

/** s − re, or s² − 2 re s + re² + im². */
function factorOf({ re, im }: KnownRoot): Polynomial {
  const one = rational(1n);
  if (im.n === 0n) return [one, negateRational(re)];
  const square = addRationals(multiplyRationals(re, re), multiplyRationals(im, im));
  return [one, multiplyRationals(rational(-2n), re), square];
}

const positive = nonzeroRational.map(({ n, d }): Rational => ({ n: n < 0n ? -n : n, d }));

const knownRoot: fc.Arbitrary<KnownRoot> = fc.oneof(
  fc.record({ re: shortRational, im: fc.constant(rational(0n)) }),
  fc.record({ re: shortRational, im: positive }),
);

describe('certified roots', () => {
  test('roots with rational parts come out as the nearest doubles of those, with their multiplicities', () => {
    const roots = fc.uniqueArray(fc.tuple(knownRoot, fc.integer({ min: 1, max: 3 })), {
      minLength: 1,
      maxLength: 6,
      selector: ([{ re, im }]) => `${re.n}/${re.d} ${im.n}/${im.d}`,
    });
    fc.assert(
      fc.property(roots, list => {
        const p = productOfPolynomials(list.flatMap(([root, k]) => Array.from({ length: k }, () => factorOf(root))));
        const expected = list.flatMap(([{ re, im }, multiplicity]) => {
          const [x, y] = [toDouble(re), toDouble(im)];
          return y === 0
            ? [[x, 0, multiplicity]]
            : [
                [x, y, multiplicity],
                [x, -y, multiplicity],
              ];
        });
        const found = certifiedRoots(p).map(({ re, im, multiplicity }) => [re, im, multiplicity]);
        const inOrder = (rows: (number | undefined)[][]): string[] => rows.map(row => row.join(' ')).sort();
        expect(inOrder(found)).toEqual(inOrder(expected));
      }),
      { seed: SEED, numRuns: 300 },
    );
  });

  test('multiplicities add up to the degree, conjugates are exact, and the order is that of the model file', () => {
    fc.assert(
      fc.property(nonzeroPolynomialOf(12), p => {
        const roots = certifiedRoots(p);
        expect(roots.reduce((sum, root) => sum + root.multiplicity, 0)).toBe(p.length - 1);
        const keys = new Set(roots.map(({ re, im, multiplicity }) => `${re} ${im} ${multiplicity}`));
        for (const { re, im, multiplicity } of roots)
          expect(keys.has(`${re} ${im === 0 ? 0 : -im} ${multiplicity}`)).toBe(true);
        const sorted = [...roots].sort((a, b) => b.re - a.re || b.im - a.im);
        expect(roots).toEqual(sorted);
      }),
      { seed: SEED, numRuns: 300 },
    );
  });

  test('between the middles to the neighbouring doubles an odd real root changes the sign, exactly', () => {
    fc.assert(
      fc.property(nonzeroPolynomialOf(9), p => {
        const roots = certifiedRoots(p);
        for (const { re, im, multiplicity, radius } of roots) {
          const isAlone = roots.filter(other => other.re === re && other.im === 0).length === 1;
          if (im !== 0 || multiplicity % 2 === 0 || re === 0 || !isAlone) continue;
          const [x, r] = [rationalFromDouble(re), rationalFromDouble(radius)];
          const below = evaluatePolynomialAt(p, subtractRationals(x, r));
          const above = evaluatePolynomialAt(p, addRationals(x, r));
          const at = evaluatePolynomialAt(p, x);
          expect(at.n === 0n || below.n * above.n < 0n).toBe(true);
        }
      }),
      { seed: SEED, numRuns: 300 },
    );
  });
});
