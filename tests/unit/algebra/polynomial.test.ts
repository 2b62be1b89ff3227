import { describe, expect, test } from 'vitest';
import {
  addPolynomials,
  derivative,
  dividePolynomials,
  evaluatePolynomialAt,
  greatestCommonDivisorOfPolynomials,
  monic,
  multiplyPolynomials,
  type Polynomial,
  polynomial,
  rational,
  reflectPolynomial,
  squareFreeFactors,
  subtractPolynomials,
  toFraction,
} from '../../../src/algebra/index.ts';
import { exactQuotient } from '../../../src/algebra/integer-polynomial.ts';
import { primeAt } from '../../../src/algebra/modular/primes.ts';
import { poly, written } from './as-written.ts';

function power(p: Polynomial, exponent: number): Polynomial {
  return Array.from({ length: exponent }).reduce<Polynomial>(product => multiplyPolynomials(product, p), poly('1'));
}

describe('ring operations', () => {
  test('a sum drops the leading terms that cancel, down to zero', () => {
    expect(written(addPolynomials(poly('1 2 3'), poly('-1 -2 1/2')))).toBe('7/2');
    expect(subtractPolynomials(poly('1 2'), poly('1 2'))).toEqual([]);
    expect(written(subtractPolynomials(poly('1'), poly('1 0 0')))).toBe('-1 0 1');
  });

  test('a product with zero is zero', () => {
    expect(multiplyPolynomials([], poly('1 2'))).toEqual([]);
    expect(multiplyPolynomials(poly('1 2'), [])).toEqual([]);
  });

  test('(s/2 + 1/3)(s − 1/5) is s²/2 + 7s/30 − 1/15', () => {
    expect(written(multiplyPolynomials(poly('1/2 1/3'), poly('1 -1/5')))).toBe('1/2 7/30 -1/15');
  });

  test('leading zeros are dropped', () => {
    expect(written(polynomial(poly('0 0 2 0')))).toBe('2 0');
    expect(polynomial(poly('0 0'))).toEqual([]);
  });

  test('division of s³ − 2s² − 4 by s − 3 leaves s² + s + 3 and 5 (a school example)', () => {
    const { quotient, remainder } = dividePolynomials(poly('1 -2 0 -4'), poly('1 -3'));
    expect([written(quotient), written(remainder)]).toEqual(['1 1 3', '5']);
  });

  test('division by a polynomial of higher degree gives zero and the dividend, division by zero throws', () => {
    const { quotient, remainder } = dividePolynomials(poly('1 2'), poly('1 0 0'));
    expect([written(quotient), written(remainder)]).toEqual(['', '1 2']);
    expect(() => dividePolynomials(poly('1'), [])).toThrow(RangeError);
  });

  test('derivative, value, reflection and monic form of 2s³ − s + 1/2', () => {
    const p = poly('2 0 -1 1/2');
    expect(written(derivative(p))).toBe('6 0 -1');
    expect(toFraction(evaluatePolynomialAt(p, rational(1n, 2n)))).toBe('1/4');
    expect(written(reflectPolynomial(p))).toBe('-2 0 1 1/2');
    expect(written(monic(p))).toBe('1 0 -1/2 1/4');
    expect([derivative(poly('7')), derivative([]), monic([])]).toEqual([[], [], []]);
  });
});

describe('greatest common divisor', () => {
  test('the two polynomials of degree 8 and 6 on which Knuth compares algorithms are coprime (TAOCP 2, section 4.6.1)', () => {
    const u = poly('1 0 1 0 -3 -3 8 2 -5');
    const v = poly('3 0 5 0 -4 -9 21');
    expect(written(greatestCommonDivisorOfPolynomials(u, v))).toBe('1');
  });

  test('a factor with long coefficients is found and made monic', () => {
    const common = poly('123456789123456789 0 -98765432198765432198765432/7 1');
    const p = multiplyPolynomials(common, poly('3 1 4 1 5 9'));
    const q = multiplyPolynomials(common, poly('2 7 1 8'));
    expect(written(greatestCommonDivisorOfPolynomials(p, q))).toBe(written(monic(common)));
  });

  test('with zero it is the other one made monic, and zero for two zeros', () => {
    expect(written(greatestCommonDivisorOfPolynomials([], poly('2 4')))).toBe('1 2');
    expect(written(greatestCommonDivisorOfPolynomials(poly('2 4'), []))).toBe('1 2');
    expect(greatestCommonDivisorOfPolynomials([], [])).toEqual([]);
    expect(written(greatestCommonDivisorOfPolynomials(poly('5'), poly('3 1')))).toBe('1');
  });

  test('primes that divide leading coefficients, or make coprime polynomials meet, do not mislead it', () => {
    const p0 = BigInt(primeAt(0));
    const p1 = BigInt(primeAt(1));
    // Modulo the first prime (s + 1) and (s + 1 + p₀) agree; modulo the second the leading coefficient vanishes.
    const p = multiplyPolynomials([rational(p1), rational(1n)], poly('1 1'));
    const q = multiplyPolynomials([rational(p1), rational(1n)], [rational(1n), rational(1n + p0)]);
    expect(written(greatestCommonDivisorOfPolynomials(p, q))).toBe(`1 1/${p1}`);
  });
});

describe('a candidate from images alone', () => {
  test('coprime polynomials that agree modulo the first two primes are still found coprime', () => {
    const product = BigInt(primeAt(0)) * BigInt(primeAt(1));
    const p = multiplyPolynomials(poly('1 1'), poly('1 2'));
    const q = multiplyPolynomials([rational(1n), rational(1n + product)], poly('1 3'));
    expect(written(greatestCommonDivisorOfPolynomials(p, q))).toBe('1');
  });
});

describe('exact quotient', () => {
  test('it is there only where every coefficient is whole and nothing is left', () => {
    expect(exactQuotient([2n, 3n, 1n], [1n, 1n])).toEqual([2n, 1n]);
    expect(exactQuotient([1n, 1n, 0n], [2n, 0n])).toBeNull();
    expect(exactQuotient([1n, 0n, 1n], [1n, 1n])).toBeNull();
    expect(exactQuotient([1n], [1n, 1n])).toBeNull();
    expect(exactQuotient([], [1n, 1n])).toEqual([]);
    expect(() => exactQuotient([1n], [])).toThrow(RangeError);
  });
});

describe('square-free factors', () => {
  test('(s + 1)(s² + 2)³(s − 1/2)⁵ is taken apart by multiplicity', () => {
    const p = [poly('3 3'), power(poly('1 0 2'), 3), power(poly('1 -1/2'), 5)].reduce(multiplyPolynomials);
    const factors = squareFreeFactors(p).map(({ factor, multiplicity }) => `(${written(factor)})^${multiplicity}`);
    expect(factors).toEqual(['(1 1)^1', '(1 0 2)^3', '(1 -1/2)^5']);
  });

  test('a constant and zero have none, s⁴ has s four times', () => {
    expect(squareFreeFactors(poly('5'))).toEqual([]);
    expect(squareFreeFactors([])).toEqual([]);
    expect(squareFreeFactors(poly('7 0 0 0 0')).map(f => [written(f.factor), f.multiplicity])).toEqual([['1 0', 4]]);
  });
});

describe('primes', () => {
  test('the largest primes below 2²⁵ are 2²⁵ − 39, − 49, − 61, − 85, − 91 (Knuth, TAOCP 2, section 4.5.4, table 1, from memory)', () => {
    expect([0, 1, 2, 3, 4].map(i => 2 ** 25 - primeAt(i))).toEqual([39, 49, 61, 85, 91]);
  });

  test('five thousand of them are prime by trial division and none is left out', () => {
    const isPrime = (x: number): boolean => {
      for (let d = 3; d * d <= x; d += 2) if (x % d === 0) return false;
      return x % 2 === 1;
    };
    const last = primeAt(4999);
    let count = 0;
    for (let x = 2 ** 25 - 1; x >= last; x -= 2) if (isPrime(x)) expect(primeAt(count++)).toBe(x);
    expect(count).toBe(5000);
  });
});
