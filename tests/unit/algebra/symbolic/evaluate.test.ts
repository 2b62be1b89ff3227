import { describe, expect, test } from 'vitest';
import { doubleField, rationalField } from '../../../../src/algebra/fields.ts';
import { rational } from '../../../../src/algebra/rational.ts';
import { createSymbolicField, evaluateAt, substitute } from '../../../../src/algebra/symbolic/index.ts';
import { functionOf } from '../../../arbitraries/symbolic.ts';

describe('values of rational functions', () => {
  test("Black's amplifier of gain 1e5 and feedback 1/10 has the exact gain 100000/10001", () => {
    const closed = functionOf('G/(1 + G*beta)');
    const value = (name: string) => (name === 'G' ? rational(100_000n) : rational(1n, 10n));
    expect(evaluateAt(closed, rationalField, value)).toEqual(rational(100_000n, 10_001n));
    expect(evaluateAt(closed, doubleField, name => (name === 'G' ? 1e5 : 0.1))).toBeCloseTo(100_000 / 10_001, 12);
  });

  test('there is none where the denominator vanishes', () => {
    expect(evaluateAt(functionOf('1/(1 - K)'), rationalField, () => rational(1n))).toBeNull();
    const field = createSymbolicField();
    expect(substitute(functionOf('1/(a - b)', field), new Map([['a', functionOf('b')]]), field)).toBeNull();
  });

  test('powers are exact', () => {
    expect(evaluateAt(functionOf('x^13/y^7'), rationalField, name => rational(name === 'x' ? 3n : 2n))).toEqual(
      rational(3n ** 13n, 2n ** 7n),
    );
  });

  test('a loop put in for the plant of another is the nested loop', () => {
    const field = createSymbolicField();
    const inner = functionOf('P/(1 + P*h)', field);
    const nested = substitute(functionOf('C*P/(1 + C*P)', field), new Map([['P', inner]]), field);
    expect(nested).toEqual(functionOf('C*P/(1 + P*h + C*P)'));
  });
});
