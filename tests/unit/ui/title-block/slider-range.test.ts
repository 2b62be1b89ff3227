import { describe, expect, test } from 'vitest';
import {
  PLACES,
  placeOf,
  plainNumber,
  rangeAround,
  rangeFault,
  textAt,
  typedRange,
} from '../../../../src/ui/title-block/slider-range.ts';

describe('a slider without a typed range', () => {
  test('covers a decade with a positive value in its middle', () => {
    const range = rangeAround(2);
    // 2 / √10 and 2 √10 to two digits
    expect(range).toEqual({ low: 0.63, high: 6.3 });
    expect(Math.abs(placeOf(2, range) - PLACES / 2)).toBeLessThanOrEqual(1);
  });

  test('lies symmetric about zero for zero and negative values', () => {
    expect(rangeAround(0)).toEqual({ low: -1, high: 1 });
    expect(rangeAround(-2)).toEqual({ low: -6.3, high: 6.3 });
    expect(placeOf(0, rangeAround(0))).toBe(PLACES / 2);
  });
});

const significantDigits = (text: string) => text.replace(/[-.]/g, '').replace(/^0+|0+$/g, '').length;

describe('the value at a place', () => {
  test('is a short decimal at every place, and no two places share one', () => {
    for (const range of [rangeAround(0.05), rangeAround(4.2e3), rangeAround(-3), { low: 0, high: 4 }]) {
      const texts = Array.from({ length: PLACES + 1 }, (_, place) => textAt(place, range));
      expect(new Set(texts).size).toBe(PLACES + 1);
      for (const text of texts) expect(significantDigits(text)).toBeLessThanOrEqual(4);
    }
  });

  test('is an end where the place is one', () => {
    expect(textAt(0, { low: 0.25, high: 4 })).toBe('0.25');
    expect(textAt(PLACES, { low: 0.25, high: 4 })).toBe('4');
  });

  test('leads back to its place', () => {
    for (const range of [rangeAround(0.05), rangeAround(-3), { low: 1e-12, high: 1e-3 }]) {
      for (let place = 0; place <= PLACES; place += 7) {
        expect(placeOf(Number(textAt(place, range)), range)).toBe(place);
      }
    }
  });

  test('is a plain zero in the middle of a range about zero', () => {
    expect(textAt(PLACES / 2, { low: -1, high: 1 })).toBe('0');
  });
});

test('a value outside the range stands at the end next to it', () => {
  expect(placeOf(9, { low: 0, high: 4 })).toBe(PLACES);
  expect(placeOf(-9, { low: 0, high: 4 })).toBe(0);
  expect(placeOf(-9, { low: 1, high: 100 })).toBe(0);
});

test('a typed range holds arithmetic of numbers; anything else is none', () => {
  expect(typedRange(['1/4', '2^3'])).toEqual({ low: 0.25, high: 8 });
  expect(typedRange(['4', '4'])).toBeNull();
  expect(typedRange(['K', '4'])).toBeNull();
  expect(typedRange(undefined)).toBeNull();
});

test('a range that is none is refused in words', () => {
  expect(rangeFault('x', '4')).toBe('"x" is no number. Write one, such as 0.2.');
  expect(rangeFault('1', '')).toBe('"" is no number. Write one, such as 0.2.');
  expect(rangeFault('5', '4')).toBe('The range ends before it begins. Write the smaller end first.');
  expect(rangeFault('0', '4')).toBeNull();
});

test('a decimal is a plain number, an expression is none', () => {
  expect(plainNumber(' 4.2e3 ')).toBe(4200);
  expect(plainNumber('-.5')).toBe(-0.5);
  for (const text of ['1/tau', '2*pi', '', '1e999', '0x10']) expect(plainNumber(text)).toBeNull();
});
