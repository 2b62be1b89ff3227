import { expect, test } from 'vitest';
import { RowStore } from '../../../../src/compile/equations/index.ts';
import { type LoopSystem, relativeDistanceToSingular } from '../../../../src/compile/loops/index.ts';
import { doubleArithmetic } from '../../../../src/compile/quantities/index.ts';

/** A ring of n signals, y_i = g_i y_{i−1}. */
function ring(gains: readonly number[]): LoopSystem<number> {
  const n = gains.length;
  const system = { gains: new RowStore(doubleArithmetic), matrix: new RowStore(doubleArithmetic) };
  gains.forEach((gain, i) => {
    const before = (i + n - 1) % n;
    system.gains.push(before, gain);
    system.gains.endRow();
    if (n === 1) system.matrix.push(0, 1 - gain);
    else {
      system.matrix.push(i, 1);
      system.matrix.push(before, -gain);
    }
    system.matrix.endRow();
  });
  return system;
}

test('of a ring the distance is |1 − g| / (n |g|), whatever the single gains', () => {
  expect(relativeDistanceToSingular(ring([0.5]))).toBeCloseTo(1, 12);
  expect(relativeDistanceToSingular(ring([2, 0.25]))).toBeCloseTo(0.5 / (2 * 0.5), 12);
  expect(relativeDistanceToSingular(ring([1e9, -1e-9, 3]))).toBeCloseTo(4 / (3 * 3), 12);
});

test('a scale of the signals that differs by 1e12 changes nothing', () => {
  const distance = relativeDistanceToSingular(ring([1e12, 0.999e-12]));
  expect(distance).toBeCloseTo(0.001 / (2 * 0.999), 10);
});

test('it is zero where elimination meets no pivot', () => {
  expect(relativeDistanceToSingular(ring([4, 0.25]))).toBe(0);
});

test('a ring of more than 256 signals gets the order of magnitude', () => {
  const n = 300;
  const gains = Array.from({ length: n }, (_, i) => (i === 0 ? 1 - 1e-6 : 1));
  const distance = relativeDistanceToSingular(ring(gains));
  expect(distance).toBeGreaterThan(1e-6 / n);
  expect(distance).toBeLessThan(1e-6 * 10);
});
