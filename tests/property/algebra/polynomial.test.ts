import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  addPolynomials,
  addRationals,
  derivative,
  dividePolynomials,
  evaluatePolynomialAt,
  greatestCommonDivisorOfPolynomials,
  monic,
  multiplyPolynomials,
  multiplyRationals,
  type Polynomial,
  rational,
  scalePolynomial,
  squareFreeFactors,
} from '../../../src/algebra/index.ts';
import { nonzeroPolynomialOf, polynomialOf } from '../../arbitraries/polynomials.ts';
import { SEED, shortRational } from '../../arbitraries/rationals.ts';

const options = { seed: SEED, numRuns: 300 };

/** Euclid's algorithm over the rationals, as the textbook has it: the oracle for the modular one. */
function euclid(p: Polynomial, q: Polynomial): Polynomial {
  return q.length === 0 ? monic(p) : euclid(q, dividePolynomials(p, q).remainder);
}

describe('polynomials', () => {
  test('value at a point is a ring homomorphism', () => {
    fc.assert(
      fc.property(polynomialOf(8), polynomialOf(8), shortRational, (p, q, x) => {
        const [u, v] = [evaluatePolynomialAt(p, x), evaluatePolynomialAt(q, x)];
        expect(evaluatePolynomialAt(addPolynomials(p, q), x)).toEqual(addRationals(u, v));
        expect(evaluatePolynomialAt(multiplyPolynomials(p, q), x)).toEqual(multiplyRationals(u, v));
      }),
      options,
    );
  });

  test('dividend = quotient · divisor + remainder, of lower degree than the divisor', () => {
    fc.assert(
      fc.property(polynomialOf(10), nonzeroPolynomialOf(5), (p, q) => {
        const { quotient, remainder } = dividePolynomials(p, q);
        expect(addPolynomials(multiplyPolynomials(quotient, q), remainder)).toEqual(p);
        expect(remainder.length).toBeLessThan(q.length);
      }),
      options,
    );
  });

  test('the product rule holds for derivatives', () => {
    fc.assert(
      fc.property(polynomialOf(6), polynomialOf(6), (p, q) => {
        expect(derivative(multiplyPolynomials(p, q))).toEqual(
          addPolynomials(multiplyPolynomials(derivative(p), q), multiplyPolynomials(p, derivative(q))),
        );
      }),
      options,
    );
  });
});

describe('greatest common divisor', () => {
  test("it is the one that Euclid's algorithm over the rationals gives", () => {
    fc.assert(
      fc.property(polynomialOf(5), polynomialOf(5), polynomialOf(4), (p, q, common) => {
        const [left, right] = [multiplyPolynomials(p, common), multiplyPolynomials(q, common)];
        expect(greatestCommonDivisorOfPolynomials(left, right)).toEqual(euclid(left, right));
      }),
      options,
    );
  });
});

describe('square-free factors', () => {
  test('they multiply back to the polynomial, are coprime to one another and to their own derivatives', () => {
    const parts = fc.array(fc.tuple(nonzeroPolynomialOf(3), fc.integer({ min: 1, max: 4 })), {
      minLength: 1,
      maxLength: 3,
    });
    fc.assert(
      fc.property(parts, list => {
        const powers = list.flatMap(([p, k]) => Array.from({ length: k }, () => p));
        const whole = powers.reduce(multiplyPolynomials, [rational(1n)]);
        const factors = squareFreeFactors(whole);
        const product = factors
          .flatMap(({ factor, multiplicity }) => Array.from({ length: multiplicity }, () => factor))
          .reduce(multiplyPolynomials, [rational(1n)]);
        expect(scalePolynomial(whole[0] ?? rational(0n), product)).toEqual(whole);
        const all = factors.map(({ factor }) => factor).reduce(multiplyPolynomials, [rational(1n)]);
        expect(euclid(all, derivative(all))).toHaveLength(1);
        const multiplicities = factors.map(({ multiplicity }) => multiplicity);
        expect(multiplicities).toEqual([...new Set(multiplicities)].sort((a, b) => a - b));
      }),
      { ...options, numRuns: 150 },
    );
  });
});
