import { describe, expect, test } from 'vitest';
import { toFraction } from '../../../src/algebra/index.ts';
import { evaluateTolerance, type Value } from '../../../src/expression/index.ts';
import { problemsOf, valueOf } from '../results.ts';

const NOMINAL: Value = { exact: { n: -4n, d: 5n }, double: -0.8 };
const SCOPE = new Map<string, Value>([['k', { exact: { n: 1n, d: 2n }, double: 0.5 }]]);
const amount = (text: string) => toFraction(valueOf(evaluateTolerance(text, NOMINAL, SCOPE)).exact ?? { n: 0n, d: 1n });

describe('a tolerance', () => {
  test.each([
    ['10 %', '2/25'],
    ['2.5%', '1/50'],
    ['k/10', '1/20'],
    ['k %', '1/250'],
    ['0', '0'],
  ])('of %s is %s for the value -4/5', (text, expected) => {
    expect(amount(text)).toBe(expected);
  });

  test('of an irrational value is a double', () => {
    expect(valueOf(evaluateTolerance('10 %', { exact: null, double: -3 }, SCOPE)).exact).toBeNull();
    expect(valueOf(evaluateTolerance('10 %', { exact: null, double: -3 }, SCOPE)).double).toBeCloseTo(0.3, 15);
    expect(valueOf(evaluateTolerance('pi %', NOMINAL, SCOPE)).double).toBeCloseTo(0.008 * Math.PI, 15);
  });

  test.each([
    ['-1 %', 'bad-expression: "-1 %" is a negative tolerance. Leave out its sign.'],
    ['-sin(1)', 'bad-expression: "-sin(1)" is a negative tolerance. Leave out its sign.'],
    ['%', 'bad-expression: Nothing is written here. Write a number or a formula.'],
    ['x', 'unknown-parameter: x is not a parameter. Add x to the parameters.'],
  ])('of %s is refused', (text, message) => {
    expect(problemsOf(evaluateTolerance(text, NOMINAL, SCOPE))).toEqual([message]);
  });
});
