import { describe, expect, test } from 'vitest';
import { exactQuotient, knownQuotient, knownQuotientOfSum } from '../../../../src/algebra/symbolic/divide.ts';
import { Effort } from '../../../../src/algebra/symbolic/effort.ts';
import { multiplyPolynomials } from '../../../../src/algebra/symbolic/multiply.ts';
import { polynomialOf } from '../../../arbitraries/symbolic.ts';

const quotient = (a: string, b: string) => exactQuotient(polynomialOf(a), polynomialOf(b), new Effort());

describe('exact quotients', () => {
  test.each([
    ['x^6 - 1', 'x^2 - 1', 'x^4 + x^2 + 1'],
    ['a^3 + b^3', 'a + b', 'a^2 - a*b + b^2'],
    ['6*K*T + 4*K', '2*K', '3*T + 2'],
    ['12*a*b - 8', '4', '3*a*b - 2'],
    ['0', 'a + b', '0'],
    ['a + b', '1', 'a + b'],
    ['a - b', 'b - a', '-1'],
    ['(1 + K1*K2)*(1 - K3*K4)*K5', '1 - K3*K4', 'K5 + K1*K2*K5'],
  ])('(%s) / (%s) is %s', (a, b, expected) => {
    expect(quotient(a, b)).toEqual(polynomialOf(expected));
  });

  test.each([
    ['x^2 + 1', 'x + 1'],
    ['2*x + 2', '4*x + 4'],
    ['3*x', '2'],
    ['a + b', 'a*c'],
    ['a + b', 'c + 1'],
    ['a^2*b + 1', 'a*b + 1'],
    // First and last term divide, a middle one does not.
    ['x^2 + x + 1', 'x + 1'],
    // With x = t³ and y = t it is (1 + t)(1 + t² + t³): packed exponents must not carry from y into x.
    ['x*y + 2*x + y^2 + y + 1', 'y + 1'],
  ])('(%s) / (%s) does not exist', (a, b) => {
    expect(quotient(a, b)).toBeNull();
  });

  test('a product of fifty variables divides by each of its factors', () => {
    const sum = (letter: string) =>
      polynomialOf(`1 + ${Array.from({ length: 25 }, (_, k) => `${letter}${k}`).join(' + ')}`);
    const product = multiplyPolynomials(sum('x'), sum('y'), new Effort());
    expect(exactQuotient(product, sum('y'), new Effort())).toEqual(sum('x'));
  });

  test('a sum of products is divided without being written out', () => {
    const [a, b, c] = [polynomialOf('a + b'), polynomialOf('a^2 + c'), polynomialOf('1 - a*c')];
    const products = [
      { left: multiplyPolynomials(a, b, new Effort()), right: c, isNegative: false },
      { left: a, right: polynomialOf('c'), isNegative: true },
    ];
    expect(knownQuotientOfSum(products, a, new Effort())).toEqual(polynomialOf('(a^2 + c)*(1 - a*c) - c'));
  });

  test('division by zero and a broken promise of divisibility are bugs that throw', () => {
    expect(() => quotient('a', '0')).toThrow('a polynomial divided by zero');
    expect(() => knownQuotient(polynomialOf('a'), polynomialOf('b'), new Effort())).toThrow('leaves a remainder');
  });
});
