import { describe, expect, test } from 'vitest';
import { Effort } from '../../../../src/algebra/symbolic/effort.ts';
import { commonDivisor } from '../../../../src/algebra/symbolic/gcd.ts';
import { polynomialOf } from '../../../arbitraries/symbolic.ts';

const divisor = (a: string, b: string) => commonDivisor(polynomialOf(a), polynomialOf(b), new Effort());

/** The prime of the modular probe. */
const PRIME = '67108859';

describe('greatest common divisors', () => {
  test('the pair of Knuth, TAOCP 2, 4.6.1, is coprime', () => {
    expect(divisor('x^8 + x^6 - 3*x^4 - 3*x^3 + 8*x^2 + 2*x - 5', '3*x^6 + 5*x^4 - 4*x^2 - 9*x + 21')).toEqual(
      polynomialOf('1'),
    );
  });

  test('gcd(xᵐ − 1, xⁿ − 1) is xᵏ − 1 for k = gcd(m, n), up to sign', () => {
    // The sign is positive where the term of lowest degree is.
    expect(divisor('x^12 - 1', 'x^18 - 1')).toEqual(polynomialOf('1 - x^6'));
    expect(divisor('1 - x^35', 'x^20 - 1')).toEqual(polynomialOf('1 - x^5'));
  });

  test('the same in two variables, homogeneous', () => {
    expect(divisor('a^12 - b^12', 'a^18 - b^18')).toEqual(polynomialOf('a^6 - b^6'));
    expect(divisor('a^2 - b^2', 'a^3 - b^3')).toEqual(polynomialOf('a - b'));
  });

  test.each([
    ['12', '18*x', '6'],
    ['0', '-4*x', '4*x'],
    ['0', '0', '0'],
    ['6*a^3*b', '-9*a^2*b^2*c', '3*a^2*b'],
    ['4*x + 6', '6*x + 9', '2*x + 3'],
    ['a*b + a*c', 'b + c', 'b + c'],
    ['a*b + a*c', 'a*d', 'a'],
    ['(1 + K1*K2)*(1 + K3)', '(1 + K1*K2)*(1 + K4)', '1 + K1*K2'],
    ['(1 + a)^3*(1 + b)', '(1 + a)^2*(1 + b)^4', '(1 + a)^2*(1 + b)'],
    ['(a + b)*x + (a + b)*y', '(a + b)*x^2 - (a + b)*y^2', '(a + b)*(x + y)'],
  ])('gcd(%s, %s) is %s', (a, b, expected) => {
    expect(divisor(a, b)).toEqual(polynomialOf(expected));
  });

  test('a divisor in four variables of cubic inputs is found', () => {
    const h = '(1 + w + x + y + z)';
    const f = '(2 - w*x + 3*y*z)';
    const g = '(w^2 + x^2 + y^2 + z^2 + 1)';
    expect(divisor(`${h}^2*${f}`, `${h}*${g}`)).toEqual(polynomialOf(h));
    expect(divisor(`${h}^2*${f}`, `${h}*${f}*${g}`)).toEqual(polynomialOf(`${h}*${f}`));
  });

  test('a remainder sequence whose degrees drop by more than one ends in the divisor', () => {
    const h = '(x + y)';
    // The first remainder of the cofactors is y²⁵ − x³ − x² y⁹ + x², of degree 3 where 5 would be the rule.
    expect(divisor(`${h}*(y*x^8 + x^2 + y^25)`, `${h}*(y*x^6 + x + y^9)`)).toEqual(polynomialOf(h));
    const cubic = '(x^3 + y*x + 2)';
    expect(divisor(`${cubic}*(x^5 + y)`, `${cubic}*(y*x^2 + 3)`)).toEqual(polynomialOf(cubic));
  });

  test('leading coefficients that vanish modulo the prime of the probe hide no divisor', () => {
    const h = `(${PRIME}*x + 1)`;
    expect(divisor(`${h}*(x + 2)`, `${h}*(x + 3)`)).toEqual(polynomialOf(h));
    expect(divisor(`${h}*(x*y + 2)`, `${h}*(x + 3*y)`)).toEqual(polynomialOf(h));
  });

  test('polynomials that are equal modulo the prime of the probe can be coprime', () => {
    expect(divisor('x*y + 1', `x*y + 1 + ${PRIME}*x`)).toEqual(polynomialOf('1'));
    expect(divisor('x^2 + y + 1', `x^2 + y + 1 + ${PRIME}*x`)).toEqual(polynomialOf('1'));
  });

  test('coprime quadratics in three variables have the divisor one', () => {
    expect(divisor('x^2 + y*x + z', 'z*x^2 + x + y')).toEqual(polynomialOf('1'));
  });
});
