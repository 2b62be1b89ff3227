import { describe, expect, test } from 'vitest';
import { curvePath, nearestSample } from '../../../../src/ui/plots/index.ts';

const same = (value: number) => value;

describe('the path of a curve', () => {
  test('goes through every sample to a tenth of a pixel', () => {
    expect(curvePath({ time: [0, 1, 2.04], values: [0, 0.25, 3] }, same, same, 100)).toBe('M0,0L1,0.3L2,3');
  });

  test('breaks where a value is not finite', () => {
    expect(curvePath({ time: [0, 1, 2, 3, 4], values: [0, 1, Number.NaN, 3, 4] }, same, same, 100)).toBe(
      'M0,0L1,1M3,3L4,4',
    );
  });

  test('of no samples is empty', () => {
    expect(curvePath({ time: [], values: [] }, same, same, 100)).toBe('');
  });

  test('with more than four samples a column keeps the first, least, greatest and last of each', () => {
    // Two columns of five samples: 0, 9, −9, 4, 5 and 1, 2, 3, 2, 2.
    const time = Array.from({ length: 10 }, (_, k) => k / 5);
    const values = [0, 9, -9, 4, 5, 1, 2, 3, 2, 2];
    expect(curvePath({ time, values }, same, same, 2)).toBe('M0,0L0.2,9L0.4,-9L0.8,5L1,1L1.4,3L1.8,2');
    expect(curvePath({ time, values }, same, same, 3)).toContain('L0.6,4');
  });

  test('of a long series reaches the same extremes', () => {
    const count = 100_000;
    const time = Float64Array.from({ length: count }, (_, k) => k / 250);
    const values = Float64Array.from({ length: count }, (_, k) => (k === 54_321 ? 7 : Math.sin(k)));
    const path = curvePath({ time, values }, same, same, 400);
    expect(path).toContain(',7');
    expect(path.split('L').length).toBeLessThan(4 * 401);
  });
});

describe('the nearest sample', () => {
  const time = [0, 1, 2, 4];

  test.each([
    [-5, 0],
    [0.4, 0],
    [0.6, 1],
    [2.9, 2],
    [3.1, 3],
    [99, 3],
  ])('to %d is %d', (moment, index) => {
    expect(nearestSample(time, moment)).toBe(index);
  });

  test('of none is −1, of one is that', () => {
    expect(nearestSample([], 1)).toBe(-1);
    expect(nearestSample([3], 1)).toBe(0);
  });
});
