import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { exactQuotient } from '../../../../src/algebra/symbolic/divide.ts';
import { Effort } from '../../../../src/algebra/symbolic/effort.ts';
import { factorsOf } from '../../../../src/algebra/symbolic/factors.ts';
import { commonDivisor } from '../../../../src/algebra/symbolic/gcd.ts';
import { multiplyPolynomials, powerOfPolynomial } from '../../../../src/algebra/symbolic/multiply.ts';
import {
  constantPolynomial,
  isOnePolynomial,
  negatePolynomial,
  type SymbolicPolynomial,
  signOf,
  variablePolynomial,
} from '../../../../src/algebra/symbolic/polynomial.ts';
import { SEED } from '../../../arbitraries/rationals.ts';
import { nonzeroPolynomial } from '../../../arbitraries/symbolic.ts';

const runs = { seed: SEED, numRuns: 100 };
const effort = new Effort({ maximumOperations: Number.POSITIVE_INFINITY });
const times = (a: SymbolicPolynomial, b: SymbolicPolynomial) => multiplyPolynomials(a, b, effort);

describe('greatest common divisors of generated polynomials', () => {
  test('a common factor divides the divisor, which divides both and leaves them coprime', () => {
    fc.assert(
      fc.property(nonzeroPolynomial, nonzeroPolynomial, nonzeroPolynomial, (f, g, h) => {
        const [a, b] = [times(f, h), times(g, h)];
        const divisor = commonDivisor(a, b, effort);
        expect(exactQuotient(divisor, h, effort)).not.toBeNull();
        const [left, right] = [exactQuotient(a, divisor, effort), exactQuotient(b, divisor, effort)];
        expect(left).not.toBeNull();
        expect(right).not.toBeNull();
        if (left !== null && right !== null) expect(isOnePolynomial(commonDivisor(left, right, effort))).toBe(true);
      }),
      runs,
    );
  });

  test('the divisor is the same either way round, of positive sign', () => {
    fc.assert(
      fc.property(nonzeroPolynomial, nonzeroPolynomial, nonzeroPolynomial, (f, g, h) => {
        const divisor = commonDivisor(times(f, h), times(g, h), effort);
        expect(commonDivisor(negatePolynomial(times(g, h)), times(f, h), effort)).toEqual(divisor);
        expect(signOf(divisor)).toBe(1);
      }),
      runs,
    );
  });

  test('the sign of a product is the product of the signs', () => {
    fc.assert(
      fc.property(nonzeroPolynomial, nonzeroPolynomial, (f, g) => {
        expect(signOf(times(f, g))).toBe(signOf(f) * signOf(g));
      }),
      runs,
    );
  });

  test('a quotient times its divisor is the dividend', () => {
    fc.assert(
      fc.property(nonzeroPolynomial, nonzeroPolynomial, (f, g) => {
        expect(exactQuotient(times(f, g), g, effort)).toEqual(f);
        const quotient = exactQuotient(f, g, effort);
        if (quotient !== null) expect(times(quotient, g)).toEqual(f);
      }),
      runs,
    );
  });

  test('the factors for print multiply to the whole', () => {
    fc.assert(
      fc.property(nonzeroPolynomial, nonzeroPolynomial, (f, g) => {
        const whole = times(times(f, f), g);
        const { sign, integer, monomial, polynomials } = factorsOf(whole, [f], effort);
        let product = constantPolynomial(integer * BigInt(sign));
        for (const { name, exponent } of monomial) {
          product = times(product, powerOfPolynomial(variablePolynomial(name), exponent, effort));
        }
        for (const { polynomial, multiplicity } of polynomials) {
          product = times(product, powerOfPolynomial(polynomial, multiplicity, effort));
        }
        expect(product).toEqual(whole);
      }),
      runs,
    );
  });
});
