import { describe, expect, test } from 'vitest';
import { rational } from '../../../../src/algebra/index.ts';
import { figureOf, formatNumber, formatPadded, rightDigits } from '../../../../src/ui/figures/index.ts';

describe('a number as text', () => {
  test.each([
    [0, '0'],
    [-5, '−5'],
    [0.25, '0.25'],
    [999_999, '999999'],
    [120_000, '120000'],
    [1_000_000, '1×10⁶'],
    [0.0001, '0.0001'],
    [0.00001, '10×10⁻⁶'],
    [-1.2e-6, '−1.2×10⁻⁶'],
    [4.5e-7, '450×10⁻⁹'],
    [6.02214e23, '602.214×10²¹'],
    [Number.POSITIVE_INFINITY, '∞'],
    [Number.NEGATIVE_INFINITY, '−∞'],
  ])('%d is written %s', (value, text) => {
    expect(formatNumber(value)).toBe(text);
  });

  test('trailing zeros stay where digits were lost and go where none were', () => {
    expect(formatNumber(2.0000000001)).toBe('2.00000');
    expect(formatNumber(2)).toBe('2');
    expect(formatPadded(2, 4)).toBe('2.000');
  });

  test('a rounded number shows no digit that was not asked for', () => {
    expect(formatNumber(123_456, 6)).toBe('123456');
    expect(formatNumber(123_456, 4)).toBe('123.5×10³');
    expect(formatNumber(123_456, 2)).toBe('0.12×10⁶');
  });

  test('a third is rounded and a quarter is not', () => {
    expect(figureOf(rational(1n, 3n))).toEqual({
      isNegative: false,
      mantissa: '0.333333',
      exponent: null,
      isRounded: true,
    });
    expect(figureOf(rational(1n, 4n)).isRounded).toBe(false);
  });

  test('rationals are rounded exactly where their doubles would tie', () => {
    // 1.0000005 lies halfway; one part in 10³⁰ below it rounds down, which no double can tell.
    const half = rational(10_000_005n, 10_000_000n);
    const below = rational(10_000_005n * 10n ** 23n - 1n, 10_000_000n * 10n ** 23n);
    expect(formatNumber(half, 7)).toBe('1.000001');
    expect(formatNumber(below, 7)).toBe('1.000000');
  });

  test('nines that round up move the point', () => {
    expect(formatNumber(rational(9_999_999n, 10_000n), 4)).toBe('1000');
    expect(formatNumber(rational(99_999_996n, 100n), 6)).toBe('1.00000×10⁶');
    expect(formatNumber(0.99999999, 3)).toBe('1.00');
  });

  test('rationals far beyond doubles keep their digits', () => {
    expect(formatNumber(rational(123_456n * 10n ** 600n))).toBe('123.456×10⁶⁰³');
    expect(formatNumber(rational(-7n, 10n ** 500n))).toBe('−70×10⁻⁵⁰¹');
  });

  test('not a number has no figure', () => {
    expect(() => figureOf(Number.NaN)).toThrow(RangeError);
  });
});

describe('how many digits are right', () => {
  test.each([
    [1.234567, 0, 17],
    [1.234567, 0.5e-3, 4],
    [1.234567, 0.6e-3, 3],
    [123.4567, 0.5e-3, 6],
    [0.001, 0.002, 0],
    [0, 1e-9, 0],
  ])('%d off by at most %d has %d', (value, error, digits) => {
    expect(rightDigits(value, error)).toBe(digits);
  });
});
