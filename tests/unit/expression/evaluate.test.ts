import { describe, expect, test } from 'vitest';
import { toFraction } from '../../../src/algebra/index.ts';
import { evaluateExpression, evaluateQuantity, parseExpression, type Value } from '../../../src/expression/index.ts';
import { problemsOf, valueOf } from '../results.ts';

const exactly = (n: bigint, d = 1n): Value => ({ exact: { n, d }, double: Number(n) / Number(d) });
const SCOPE = new Map<string, Value>([
  ['k', exactly(12n)],
  ['J', exactly(4n, 5n)],
  ['K_p', exactly(1n, 2n)],
  ['none', exactly(0n)],
  ['w', { exact: null, double: 0.5 }],
]);

const fractionOf = (text: string): string | null => {
  const { exact } = valueOf(evaluateQuantity(text, SCOPE));
  return exact === null ? null : toFraction(exact);
};
const doubleOf = (text: string): number => valueOf(evaluateQuantity(text, SCOPE)).double;

describe('a quantity is exact', () => {
  test.each([
    ['0.1 + 0.2', '3/10'],
    ['1/3*3', '1'],
    ['1/J', '5/4'],
    ['-k/(J*2)', '-15/2'],
    ['-2^2', '-4'],
    ['2^-23', '1/8388608'],
    ['2^3^2', '512'],
    ['0^0', '1'],
    ['(-1)^1000000000001', '-1'],
    ['1^(10^300)', '1'],
    ['0^(10^300)', '0'],
    ['(-2/3)^-3', '-27/8'],
    ['abs(-3/4)', '3/4'],
    ['min(1, 0.5, 3)', '1/2'],
    ['max(-1, -1/2)', '-1/2'],
    ['sqrt(9/4)', '3/2'],
    ['sqrt(0)', '0'],
    ['sqrt(1e-300)', `1/1${'0'.repeat(150)}`],
    ['1e400/1e399', '10'],
    ['none*k', '0'],
  ])('%s is %s', (text, expected) => {
    expect(fractionOf(text)).toBe(expected);
  });

  test('its double is the nearest', () => {
    expect(doubleOf('0.1 + 0.2')).toBe(0.3);
    expect(doubleOf('1e-400')).toBe(0);
    expect(doubleOf('2^-1074')).toBe(Number.MIN_VALUE);
    expect(Object.is(doubleOf('-none'), 0)).toBe(true);
  });
});

describe('a quantity is irrational and a double', () => {
  test.each([
    ['pi', Math.PI],
    ['e', Math.E],
    ['sqrt(2)', Math.SQRT2],
    ['exp(0)', 1],
    ['ln(e)', 1],
    ['log10(1000)', 3],
    ['sin(pi/6)', 0.5],
    ['cos(pi/3)', 0.5],
    ['tan(pi/4)', 1],
    ['asin(1)', Math.PI / 2],
    ['acos(-1)', Math.PI],
    ['atan(1)', Math.PI / 4],
    ['atan2(1, -1)', (3 * Math.PI) / 4],
    ['sinh(0)', 0],
    ['cosh(0)', 1],
    ['tanh(0)', 0],
    ['4^0.5', 2],
    ['w^2', 0.25],
    ['2*w + 1', 2],
    ['max(1, pi)', Math.PI],
    ['pi - pi', 0],
  ])('%s', (text, expected) => {
    expect(fractionOf(text)).toBeNull();
    expect(doubleOf(text)).toBeCloseTo(expected, 14);
  });

  test('its zero has no sign', () => {
    expect(Object.is(doubleOf('-(w - w)'), 0)).toBe(true);
  });
});

describe('a quantity is refused', () => {
  test.each([
    ['1/0', 'division-by-zero: "1/0" divides by zero. Change a value in it.'],
    ['1/(J - 0.8)', 'division-by-zero: "1/(J - 0.8)" divides by zero: J - 0.8 is 0. Change a value in it.'],
    ['2 + 1/none', 'division-by-zero: "1/none" divides by zero: none is 0. Change a value in it.'],
    ['none^-2', 'division-by-zero: "none^-2" divides by zero: none is 0. Change a value in it.'],
    ['1/sin(0)', 'division-by-zero: "1/sin(0)" divides by zero: sin(0) is 0. Change a value in it.'],
    ['1e400', 'bad-expression: "1e400" is too large: it fits no finite double. Choose other units.'],
    ['-exp(1000)', 'bad-expression: "-exp(1000)" is too large: it fits no finite double. Choose other units.'],
    ['sqrt(-4)', 'bad-expression: "sqrt(-4)" has no real value. Change a value in it.'],
    ['ln(0)', 'bad-expression: "ln(0)" has no real value. Change a value in it.'],
    ['1/ln(0)', 'bad-expression: "1/ln(0)" has no real value. Change a value in it.'],
    ['sqrt(-1)^0', 'bad-expression: "sqrt(-1)^0" has no real value. Change a value in it.'],
    ['asin(2)', 'bad-expression: "asin(2)" has no real value. Change a value in it.'],
    ['9^9^9', 'bad-expression: The exact value of "9^9^9" has more than 8192 binary digits. Use a smaller exponent.'],
    ['2^8192', 'bad-expression: The exact value of "2^8192" has more than 8192 binary digits. Use a smaller exponent.'],
    [
      '2^-8192',
      'bad-expression: The exact value of "2^-8192" has more than 8192 binary digits. Use a smaller exponent.',
    ],
    [
      '2^8000*2^8000',
      'bad-expression: The exact value of "2^8000*2^8000" has more than 8192 binary digits. Round the numbers in it.',
    ],
    ['K', 'unknown-parameter: K is not a parameter. Did you mean k?'],
    ['2*Kp', 'unknown-parameter: "2*Kp" uses Kp, which is not a parameter. Did you mean K_p?'],
    ['2*nine', 'unknown-parameter: "2*nine" uses nine, which is not a parameter. Did you mean none?'],
    ['x', 'unknown-parameter: x is not a parameter. Add x to the parameters.'],
    [
      '2*s',
      'bad-expression: "2*s" contains the Laplace variable s. Use a transfer function block for what depends on s.',
    ],
    ['2 k', 'bad-expression: "2 k" is not an expression. Write 2*k.'],
  ])('%s', (text, expected) => {
    expect(problemsOf(evaluateQuantity(text, SCOPE))).toEqual([expected]);
  });

  test('each unknown name is one problem, told once', () => {
    expect(problemsOf(evaluateQuantity('x*y + x', SCOPE))).toEqual([
      'unknown-parameter: "x*y + x" uses x, which is not a parameter. Add x to the parameters.',
      'unknown-parameter: "x*y + x" uses y, which is not a parameter. Add y to the parameters.',
    ]);
  });

  test('2^8191 is kept, as is its reciprocal', () => {
    // Compared as fractions; their doubles leave the range.
    const value = (text: string) => valueOf(evaluateExpression(valueOf(parseExpression(text)), SCOPE));
    expect(value('2^8191').exact).toEqual({ n: 2n ** 8191n, d: 1n });
    expect(value('2^8191').double).toBe(Number.POSITIVE_INFINITY);
    expect(value('2^-8191').exact).toEqual({ n: 1n, d: 2n ** 8191n });
  });
});

test('a sum of 5,000 terms is evaluated without recursion', () => {
  expect(fractionOf(Array(5000).fill('k').slice(0, 5000).join('+'))).toBe('60000');
});
