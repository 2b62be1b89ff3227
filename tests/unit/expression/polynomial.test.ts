import { describe, expect, test } from 'vitest';
import { toFraction } from '../../../src/algebra/index.ts';
import { evaluatePolynomial, polynomialAsWritten, type Value } from '../../../src/expression/index.ts';
import { problemsOf, valueOf } from '../results.ts';

const SCOPE = new Map<string, Value>([
  ['J', { exact: { n: 4n, d: 5n }, double: 0.8 }],
  ['m', { exact: { n: 0n, d: 1n }, double: 0 }],
  ['n', { exact: { n: 3n, d: 1n }, double: 3 }],
  ['w', { exact: null, double: 0.5 }],
]);
const fractions = (values: readonly Value[]) =>
  values.map(({ exact, double }) => (exact === null ? double : toFraction(exact)));
const coefficients = (text: string) => fractions(valueOf(evaluatePolynomial(text, SCOPE)));

describe('a polynomial in s', () => {
  test.each([
    ['J*s^2 + 3*s + 1', ['4/5', '3', '1']],
    ['(s + 2)*(s + 5)', ['1', '7', '10']],
    ['(s + 1)^4', ['1', '4', '6', '4', '1']], // Pascal's triangle
    ['-(s - 1)', ['-1', '1']],
    ['(s + 1)/J', ['5/4', '5/4']],
    ['2', ['2']],
    ['s', ['1', '0']],
    ['s^0', ['1']],
    ['s^n', ['1', '0', '0', '0']],
    ['1 - s^2', ['-1', '0', '1']],
    ['s*s*s/2', ['1/2', '0', '0', '0']],
    ['w*s + pi', [0.5, Math.PI]],
    ['sqrt(4)*s + abs(-1)', ['2', '1']],
    ['0', []],
    ['s - s', []],
    ['w*s + 1', [0.5, '1']],
    ['s*w + 1', [0.5, '1']],
    ['(w*s + 1)^2 - 1', [0.25, 1, '0']], // what is exact among irrational parts stays exact
    ['s/3 + s/7 - 1/2', ['10/21', '-1/2']],
    ['(s - 2/3)/(-5/7)', ['-7/5', '14/15']],
  ])('%s has the coefficients %j', (text, expected) => {
    expect(coefficients(text)).toEqual(expected);
  });

  test('of degree 200 is read: the middle of (s + 1)^200 is 200 over 100', () => {
    const factorial = (k: number): bigint => (k === 0 ? 1n : BigInt(k) * factorial(k - 1));
    const all = coefficients('(s + 1)^200');
    expect(all).toHaveLength(201);
    expect(all[100]).toBe(String(factorial(200) / factorial(100) ** 2n));
  });

  test('keeps its written degree where its leading coefficient is zero', () => {
    expect(coefficients('m*s^2 + s')).toEqual(['1', '0']);
    expect(fractions(valueOf(polynomialAsWritten('m*s^2 + s', SCOPE)))).toEqual(['0', '1', '0']);
    expect(fractions(valueOf(polynomialAsWritten('(m*s + 1)*(m*s + 2)', SCOPE)))).toEqual(['0', '0', '2']);
    expect(fractions(valueOf(polynomialAsWritten('s - s', SCOPE)))).toEqual(['0', '0']);
    expect(fractions(valueOf(polynomialAsWritten('0', SCOPE)))).toEqual(['0']);
  });
});

describe('a polynomial is refused', () => {
  test.each([
    ['1/s', 'bad-expression: "1/s" is not a polynomial in s. s stands in a denominator there.'],
    ['(s + 1)/(s - s)', 'bad-expression: "(s + 1)/(s - s)" is not a polynomial in s. s stands in a denominator there.'],
    ['2 + s^-1', 'bad-expression: "s^-1" is not a polynomial in s. s has a negative power there.'],
    ['s^J', 'bad-expression: "s^J" is not a polynomial in s. An exponent of s is a whole number from 0 to 200.'],
    ['s^w', 'bad-expression: "s^w" is not a polynomial in s. An exponent of s is a whole number from 0 to 200.'],
    ['2^s', 'bad-expression: "2^s" is not a polynomial in s. An exponent of s is a whole number from 0 to 200.'],
    ['s^201', 'bad-expression: "s^201" is not a polynomial in s. An exponent of s is a whole number from 0 to 200.'],
    ['sin(s)', 'bad-expression: "sin(s)" is not a polynomial in s. s stands inside a function there.'],
    ['exp(-s*J)', 'bad-expression: "exp(-s*J)" is not a polynomial in s. s stands inside a function there.'],
    ['s^100*s^101', 'bad-expression: "s^100*s^101" has a degree above 200 in s. Split it over several blocks.'],
    ['(s^2)^101', 'bad-expression: "(s^2)^101" has a degree above 200 in s. Split it over several blocks.'],
    ['(s + 1)/m', 'division-by-zero: "(s + 1)/m" divides by zero: m is 0. Change a value in it.'],
    ['q*s', 'unknown-parameter: "q*s" uses q, which is not a parameter. Add q to the parameters.'],
    [
      '(0.1234567890123*s + 0.9876543210123)^200',
      'bad-expression: A coefficient of "(0.1234567890123*s + 0.9876543210123)^200" has more than 8192 binary digits. Round the numbers in it.',
    ],
    [
      '(2^8000*s)^5',
      'bad-expression: The exact value of "(2^8000*s)^5" has more than 8192 binary digits. Use a smaller exponent.',
    ],
    ['1e400*s', 'bad-expression: "1e400*s" is too large: it fits no finite double. Choose other units.'],
    ['2 s', 'bad-expression: "2 s" is not an expression. Write 2*s.'],
  ])('%s', (text, expected) => {
    expect(problemsOf(evaluatePolynomial(text, SCOPE))).toEqual([expected]);
  });
});
