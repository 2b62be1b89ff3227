import { describe, expect, test } from 'vitest';
import { rational } from '../../../../src/algebra/index.ts';
import { formatFraction, formatUnit, raisedRuns } from '../../../../src/ui/figures/index.ts';

describe('fractions', () => {
  test('a negative fraction has the real minus sign', () => {
    expect(formatFraction(rational(-5n, 16n))).toBe('−5/16');
  });

  test('a whole number has no denominator', () => {
    expect(formatFraction(rational(12n))).toBe('12');
  });
});

describe('units', () => {
  test.each([
    ['kg*m^2', 'kg·m²'],
    ['s^-1', 's⁻¹'],
    ['rad/s', 'rad/s'],
    ['N*m/(rad/s)^(-2)', 'N·m/(rad/s)⁻²'],
  ])('%s is printed %s', (unit, printed) => {
    expect(formatUnit(unit)).toBe(printed);
  });
});

describe('raised characters', () => {
  test('a raised exponent is cut off and brought to plain characters', () => {
    expect(raisedRuns('1.2×10⁻⁶ m²')).toEqual([
      { text: '1.2×10', isRaised: false },
      { text: '−6', isRaised: true },
      { text: ' m', isRaised: false },
      { text: '2', isRaised: true },
    ]);
  });

  test('text without them is one run', () => {
    expect(raisedRuns('final 1.000')).toEqual([{ text: 'final 1.000', isRaised: false }]);
  });
});
