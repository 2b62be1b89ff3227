import { describe, expect, test } from 'vitest';
import {
  divideRationals,
  doubleField,
  ONE,
  parseRational,
  rational,
  rationalField,
  rationalFromDouble,
  toDouble,
  toFraction,
  ZERO,
} from '../../../src/algebra/index.ts';
import { bitLength, greatestCommonDivisor } from '../../../src/algebra/integer.ts';

describe('reading', () => {
  test.each([
    ['0.1', 1n, 10n],
    ['-12.50', -25n, 2n],
    ['.5', 1n, 2n],
    ['5.', 5n, 1n],
    ['+7', 7n, 1n],
    ['1e-3', 1n, 1000n],
    ['1E+3', 1000n, 1n],
    ['6.02214076e23', 602214076000000000000000n, 1n],
    ['-5/16', -5n, 16n],
    ['6/4', 3n, 2n],
    ['+6/3', 2n, 1n],
    ['0e400', 0n, 1n],
    ['-0.0', 0n, 1n],
    ['007', 7n, 1n],
  ])('%s is read exactly', (text, n, d) => {
    expect(parseRational(text)).toEqual({ n, d });
  });

  test.each([
    '',
    '.',
    '-',
    'e3',
    '.e3',
    '1e',
    '1e+',
    ' 1',
    '1 ',
    '1/0',
    '1/-2',
    '1/2/3',
    '1.5/2',
    '0x10',
    '1_000',
    'NaN',
    '−1',
    '١',
  ])('"%s" is not a number', text => {
    expect(parseRational(text)).toBeNull();
  });

  test('an exponent of 400 is read and one of 401 is not', () => {
    expect(parseRational('1e400')).toEqual({ n: 10n ** 400n, d: 1n });
    expect(parseRational('1e-400')).toEqual({ n: 1n, d: 10n ** 400n });
    expect(parseRational('1e401')).toBeNull();
    expect(parseRational('1e-401')).toBeNull();
    expect(parseRational('1e99999999999999999999')).toBeNull();
  });

  test('10,000 characters are read and one more is not', () => {
    expect(parseRational('1'.repeat(10_000))).not.toBeNull();
    expect(parseRational('1'.repeat(10_001))).toBeNull();
  });
});

describe('printing', () => {
  test('a whole number has no denominator', () => {
    expect(toFraction(rational(6n, -2n))).toBe('-3');
    expect(toFraction(rational(-10n, 32n))).toBe('-5/16');
    expect(toFraction(ZERO)).toBe('0');
  });
});

describe('division by zero is a fault of the caller', () => {
  test('it throws', () => {
    expect(() => rational(1n, 0n)).toThrow(RangeError);
    expect(() => divideRationals(ONE, ZERO)).toThrow(RangeError);
    expect(() => rationalFromDouble(Number.NaN)).toThrow(RangeError);
    expect(() => rationalFromDouble(Number.POSITIVE_INFINITY)).toThrow(RangeError);
  });
});

describe('the edges of the doubles (IEEE 754, binary64)', () => {
  const largest = (2n ** 53n - 1n) * 2n ** 971n;
  const half = 2n ** 970n;

  test('the largest double is met from just below the point where rounding overflows, and infinity from there on', () => {
    expect(toDouble(rational(largest + half - 1n))).toBe(Number.MAX_VALUE);
    expect(toDouble(rational(largest + half))).toBe(Number.POSITIVE_INFINITY);
    expect(toDouble(rational(3n * (largest + half) - 1n, 3n))).toBe(Number.MAX_VALUE);
    expect(toDouble(rational(-3n * (largest + half) - 1n, 3n))).toBe(Number.NEGATIVE_INFINITY);
  });

  test('half the least subnormal is zero and anything above it the least subnormal', () => {
    const halfLeast = rational(1n, 2n ** 1075n);
    expect(Object.is(toDouble(halfLeast), 0)).toBe(true);
    expect(Object.is(toDouble(rational(-1n, 2n ** 1075n)), 0)).toBe(true);
    expect(toDouble(rational(2n ** 100n + 1n, 2n ** 1175n))).toBe(Number.MIN_VALUE);
    expect(toDouble(rational(3n, 2n ** 1075n))).toBe(2 * Number.MIN_VALUE);
  });

  test('the border between subnormal and normal doubles is crossed without a second rounding', () => {
    const least = 2 ** -1022;
    expect(toDouble(rational(2n ** 60n - 1n, 2n ** 1082n))).toBe(least);
    expect(toDouble(rational(2n ** 53n - 3n, 2n ** 1075n))).toBe(least - 2 * Number.MIN_VALUE);
    expect(toDouble(rational(2n ** 53n - 1n, 2n ** 1075n))).toBe(least);
  });

  test('a double above 2⁵³ and one with 1,074 binary places are exact both ways', () => {
    expect(rationalFromDouble(2 ** 1023)).toEqual({ n: 2n ** 1023n, d: 1n });
    expect(rationalFromDouble(Number.MIN_VALUE)).toEqual({ n: 1n, d: 2n ** 1074n });
    expect(rationalFromDouble(-0.1)).toEqual({ n: -3602879701896397n, d: 36028797018963968n });
    expect(rationalFromDouble(-0)).toEqual(ZERO);
  });
});

describe('length in bits', () => {
  test('powers of two and their neighbours are told apart at every size', () => {
    for (const k of [1, 2, 31, 32, 52, 53, 54, 63, 64, 65, 200, 1023, 1024, 1025, 5000]) {
      const power = 2n ** BigInt(k);
      expect([bitLength(power - 1n), bitLength(power), bitLength(-power - 1n)]).toEqual([k, k + 1, k + 1]);
    }
    expect(bitLength(0n)).toBe(0);
  });
});

describe('fields', () => {
  test('of two exact pivots the shorter is better, of two doubles the larger', () => {
    expect(rationalField.isBetterPivot(rational(1n), rational(1n, 3n))).toBe(true);
    expect(rationalField.isBetterPivot(rational(1n, 3n), rational(1n))).toBe(false);
    expect(rationalField.isBetterPivot(rational(1n), rational(-1n))).toBe(false);
    expect(doubleField.isBetterPivot(-2, 1)).toBe(true);
    expect(doubleField.isBetterPivot(1, -2)).toBe(false);
  });

  test('a rational enters the doubles as its nearest one', () => {
    expect(doubleField.fromRational(rational(1n, 10n))).toBe(0.1);
    expect(rationalField.fromRational(rational(1n, 10n))).toEqual({ n: 1n, d: 10n });
  });
});

describe('greatest common divisor of long numbers', () => {
  test('neighbouring Fibonacci numbers are coprime, and gcd(F₃₀₀, F₄₅₀) is F₁₅₀ (Lucas 1876)', () => {
    const fibonacci = [0n, 1n];
    for (let k = 2; k <= 500; k++) fibonacci.push((fibonacci[k - 1] ?? 0n) + (fibonacci[k - 2] ?? 0n));
    const term = (k: number): bigint => fibonacci[k] ?? 0n;
    expect(greatestCommonDivisor(term(500), term(499))).toBe(1n);
    expect(greatestCommonDivisor(term(300), term(450))).toBe(term(150));
    expect(greatestCommonDivisor(term(450), term(300))).toBe(term(150));
    expect(greatestCommonDivisor(term(450), 0n)).toBe(term(450));
  });

  test('powers of two next to one another in length share the smaller', () => {
    expect(greatestCommonDivisor(2n ** 300n, 2n ** 299n)).toBe(2n ** 299n);
    expect(greatestCommonDivisor(2n ** 300n - 1n, 2n ** 299n)).toBe(1n);
    expect(greatestCommonDivisor(2n ** 300n, 2n ** 300n)).toBe(2n ** 300n);
  });
});
