import { describe, expect, test } from 'vitest';
import { doubleField, parseRational, type Rational, rationalField, toFraction } from '../../../src/algebra/index.ts';
import { evaluateIn, evaluatePolynomialIn, parseExpression } from '../../../src/expression/index.ts';
import { valueOf } from '../results.ts';

const VALUES = new Map([
  ['a', '3/2'],
  ['b', '-2'],
  ['zero', '0'],
]);
const lookup = (name: string): Rational | null => parseRational(VALUES.get(name) ?? '');

function inRationals(text: string): string | null {
  const element = evaluateIn(valueOf(parseExpression(text)), rationalField, lookup);
  return element === null ? null : toFraction(element);
}

describe('an expression in a field', () => {
  test.each([
    ['a + b*2 - 1', '-7/2'],
    ['-a/b', '3/4'],
    ['b^-3', '-1/8'],
    ['a^(1 + 1)', '9/4'],
    ['2^-300*2^299', '1/2'],
    ['sqrt(4)*a', '3'],
    ['min(1, 2)*a', '3/2'],
    ['b^0', '1'],
    ['a^sqrt(4)', '9/4'],
  ])('%s is %s', (text, expected) => {
    expect(inRationals(text)).toBe(expected);
  });

  test.each([
    ['a function of a name', 'abs(a)'],
    ['an irrational function', 'sqrt(2)'],
    ['an exponent that is a name', '2^b'],
    ['an exponent that is not whole', 'a^0.5'],
    ['an exponent beyond 200', 'a^201'],
    ['a name that has no element', 'pi'],
    ['a division by zero', '1/(a - a)'],
    ['zero to a negative power', 'zero^-1'],
    ['the Laplace variable', 'a*s'],
  ])('has none where there is %s', (_, text) => {
    expect(inRationals(text)).toBeNull();
  });

  test('takes constants from the caller, also in a power', () => {
    const pi = (name: string) => (name === 'pi' ? Math.PI : null);
    expect(evaluateIn(valueOf(parseExpression('2*pi^2')), doubleField, pi)).toBe(2 * (Math.PI * Math.PI));
  });
});

describe('a polynomial in a field', () => {
  const coefficients = (text: string) =>
    evaluatePolynomialIn(valueOf(parseExpression(text)), rationalField, lookup)?.map(toFraction) ?? null;

  test('keeps its written degree', () => {
    expect(coefficients('(a*s + 1)*(zero*s + b)')).toEqual(['0', '-3', '-2']);
  });

  test('is none where s is not a polynomial', () => {
    expect(coefficients('1/s')).toBeNull();
    expect(coefficients('s^a')).toBeNull();
    expect(coefficients('abs(a)*s')).toBeNull();
  });
});
