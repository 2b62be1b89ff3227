import { describe, expect, test } from 'vitest';
import { frequencyResponse } from '../../../src/analysis/index.ts';
import { companionModel, rationalModel } from './rational-model.ts';

const CHANNEL = { input: 0, output: 0 };

describe('frequency responses', () => {
  test('a lag at its corner frequency: half, 45° behind', () => {
    const { re, im, route } = frequencyResponse(companionModel([2], [1, 2]), CHANNEL, [2]);
    expect(route).toBe('certified');
    expect(re[0]).toBeCloseTo(0.5, 15);
    expect(im[0]).toBeCloseTo(-0.5, 15);
  });

  test('do not exist at an undamped pole', () => {
    const { re, im } = frequencyResponse(companionModel([1], [1, 0]), CHANNEL, [0, 2]);
    expect(re[0]).toBeNaN();
    expect(im[0]).toBeNaN();
    expect([re[1], im[1]]).toEqual([0, -0.5]);
  });

  test('are zero at an undamped zero, and keep their digits beside it', () => {
    // (s² + 9)/(s + 1)²
    const { re, im } = frequencyResponse(companionModel([1, 0, 9], [1, 2, 1]), CHANNEL, [3, 3 + 2 ** -40]);
    expect(Math.hypot(re[0]!, im[0]!)).toBe(0);
    // |9 − w²| = 6·2⁻⁴⁰ + 2⁻⁸⁰, |1 + jw|² = 10 + …
    expect(Math.abs(Math.hypot(re[1]!, im[1]!) / ((6 * 2 ** -40) / (10 + 6 * 2 ** -40)) - 1)).toBeLessThan(1e-12);
  });

  test('of high order do not overflow on the way', () => {
    const pairs = 14;
    const A = Array.from({ length: 2 * pairs }, (_, i) =>
      Array.from({ length: 2 * pairs }, (_, j) => (i === j ? '-1e30' : j === i - 1 ? '1e30' : 0)),
    );
    const B = A.map((_, i) => [i === 0 ? '1e30' : 0]);
    const C = [A.map((_, i) => (i === A.length - 1 ? 1 : 0))];
    // (1/(1 + j))²⁸ = (1/(2j))¹⁴ = −2⁻¹⁴
    const { re, im } = frequencyResponse(rationalModel(A, B, C), CHANNEL, [1e30]);
    expect(Math.abs(re[0]! * 2 ** 14 + 1)).toBeLessThan(1e-13);
    expect(Math.abs(im[0]! * 2 ** 14)).toBeLessThan(1e-13);
  });

  test('of a large model come from its matrices in doubles', () => {
    const n = 40;
    const A = Array.from({ length: n }, (_, i) =>
      Array.from({ length: n }, (_, j) => (i === j ? -1 : j === i - 1 ? 1 : 0)),
    );
    const model = rationalModel(
      A,
      A.map((_, i) => [i === 0 ? 1 : 0]),
      [A.map((_, i) => (i === n - 1 ? 1 : 0))],
    );
    const { re, im, route } = frequencyResponse(model, CHANNEL, [1]);
    expect(route).toBe('floating');
    // (1/(1 + j))⁴⁰ = (1/(2j))²⁰ = 2⁻²⁰
    expect(Math.abs(re[0]! * 2 ** 20 - 1)).toBeLessThan(1e-12);
    expect(Math.abs(im[0]! * 2 ** 20)).toBeLessThan(1e-12);
  });
});
