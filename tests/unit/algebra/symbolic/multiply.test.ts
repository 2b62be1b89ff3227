import { describe, expect, test } from 'vitest';
import { Effort, EffortSpent } from '../../../../src/algebra/symbolic/effort.ts';
import {
  differenceOfProducts,
  multiplyPolynomials,
  powerOfPolynomial,
} from '../../../../src/algebra/symbolic/multiply.ts';
import { polynomialOf } from '../../../arbitraries/symbolic.ts';

const effort = () => new Effort();
const sumOfNames = (letter: string, count: number) =>
  polynomialOf(Array.from({ length: count }, (_, k) => `${letter}${k}`).join(' + '));

describe('products of polynomials', () => {
  test('the difference of squares comes from sum and difference', () => {
    expect(multiplyPolynomials(polynomialOf('a + b'), polynomialOf('a - b'), effort())).toEqual(
      polynomialOf('a^2 - b^2'),
    );
  });

  test('the sixth power of a binomial has the sixth row of Pascal for coefficients', () => {
    const { coefficients } = powerOfPolynomial(polynomialOf('a + b'), 6, effort());
    expect(coefficients).toEqual([1n, 6n, 15n, 20n, 15n, 6n, 1n]);
  });

  test('the fourth power of a trinomial has a²bc 4!/2! times', () => {
    const power = powerOfPolynomial(polynomialOf('a + b + c'), 4, effort());
    const at = power.coefficients.findIndex((_, t) => power.exponents.slice(3 * t, 3 * t + 3).join() === '2,1,1');
    expect(power.coefficients[at]).toBe(12n);
    // Monomials of degree 4 in 3 variables: C(6, 2).
    expect(power.coefficients).toHaveLength(15);
  });

  test('terms of sixty variables pass through several words a key and stay apart', () => {
    const product = multiplyPolynomials(sumOfNames('x', 30), sumOfNames('y', 30), effort());
    expect(product.coefficients).toHaveLength(900);
    expect(product.coefficients.every(coefficient => coefficient === 1n)).toBe(true);
    const square = powerOfPolynomial(sumOfNames('x', 60), 2, effort());
    expect(square.coefficients).toHaveLength(60 + (60 * 59) / 2);
  });

  test('a product whose terms all cancel but two leaves no trace of the others', () => {
    const factors = [polynomialOf('x - y'), polynomialOf('x^4 + x^3*y + x^2*y^2 + x*y^3 + y^4')] as const;
    expect(multiplyPolynomials(...factors, effort())).toEqual(polynomialOf('x^5 - y^5'));
  });

  test('a difference of products that cancels is zero, without variables', () => {
    const [a, b] = [polynomialOf('1 + p*q'), polynomialOf('p - q')];
    expect(differenceOfProducts(a, b, b, a, effort())).toEqual(polynomialOf('0'));
  });

  test('coefficients grow without bound', () => {
    const cube = powerOfPolynomial(polynomialOf('123456789012345678901234567890*x'), 3, effort());
    expect(cube.coefficients).toEqual([123456789012345678901234567890n ** 3n]);
  });

  test('an exponent of 10,000 is kept and one more is refused by the signal', () => {
    const half = { variables: ['K'], exponents: [5000], coefficients: [1n] };
    const whole = multiplyPolynomials(half, half, effort());
    expect(whole.exponents).toEqual([10_000]);
    expect(() => multiplyPolynomials(whole, polynomialOf('K'), effort())).toThrow(EffortSpent);
    expect(() => multiplyPolynomials({ ...whole, coefficients: [3n] }, polynomialOf('K + 1'), effort())).toThrow(
      EffortSpent,
    );
  });
});
