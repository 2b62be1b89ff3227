import { describe, expect, test } from 'vitest';
import { axisMeasure, axisOver, steadyDomain } from '../../../../src/ui/plots/index.ts';

const texts = (low: number, high: number, count: number) => axisOver(low, high, count).ticks.map(tick => tick.text);

describe('ticks', () => {
  test('have the decimals of their step and a plain zero', () => {
    expect(texts(0, 1.5, 3)).toEqual(['0', '0.5', '1.0', '1.5']);
    expect(texts(-20, 20, 4)).toEqual(['−20', '−10', '0', '10', '20']);
  });

  test('with a step of a tenth have one decimal, though tenths are not exact', () => {
    expect(texts(0, 0.3, 3)).toEqual(['0', '0.1', '0.2', '0.3']);
    expect(texts(0.7, 1, 3)).toEqual(['0.7', '0.8', '0.9', '1.0']);
  });

  test('below a thousandth and from a hundred thousand on share a power of ten', () => {
    expect(axisOver(0, 0.001, 2).exponent).toBeNull();
    expect(axisOver(0, 0.00099, 2).exponent).toBe(-6);
    expect(axisOver(0, 99_999, 2).exponent).toBeNull();
    expect(axisOver(0, 100_000, 2)).toEqual({
      ticks: [
        { value: 0, text: '0' },
        { value: 50_000, text: '50' },
        { value: 100_000, text: '100' },
      ],
      exponent: 3,
    });
  });
});

describe('the measure of an axis', () => {
  test('holds the unit and the power of ten that there are', () => {
    expect(axisMeasure('s', null)).toBe(' / s');
    expect(axisMeasure('m', -6)).toBe(' / 10⁻⁶ m');
    expect(axisMeasure(null, 3)).toBe(' / 10³');
    expect(axisMeasure(null, null)).toBe('');
  });
});

describe('a steady domain', () => {
  test('is the same for data that differ a little', () => {
    expect(steadyDomain(0, 1.21, 4)).toEqual(steadyDomain(0, 1.38, 4));
  });

  test('of a constant has room around it', () => {
    expect(steadyDomain(0, 0, 4)).toEqual([-1, 1]);
    const [low, high] = steadyDomain(6, 6, 4);
    expect(low).toBeLessThan(6);
    expect(high).toBeGreaterThan(6);
  });
});
