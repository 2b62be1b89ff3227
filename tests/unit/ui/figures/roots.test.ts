import { describe, expect, test } from 'vitest';
import { motionOf, rootRows, rootText, singleRootText } from '../../../../src/ui/figures/index.ts';

const root = (re: number, im: number, multiplicity = 1) => ({ re, im, multiplicity });
const [pair] = rootRows([root(-0.354272, 0.586117), root(-0.354272, -0.586117)]);

describe('roots as text', () => {
  test('a conjugate pair is one row with four digits a part', () => {
    expect(pair?.isPair).toBe(true);
    expect(pair && rootText(pair)).toBe('−0.3543 ± 0.5861j');
  });

  test('a real root has six digits, one that is exact fewer', () => {
    expect(rootRows([root(-3.180561, 0), root(-2, 0)]).map(rootText)).toEqual(['−3.18056', '−2']);
  });

  test('a pair on the imaginary axis has no real part', () => {
    expect(rootRows([root(0, 2), root(0, -2)]).map(rootText)).toEqual(['± 2j']);
    expect(singleRootText(root(0, -2))).toBe('−2j');
  });

  test('one of a pair by itself keeps its sign', () => {
    expect(singleRootText(root(-1, -3))).toBe('−1 − 3j');
    expect(singleRootText(root(-1, 3))).toBe('−1 + 3j');
  });

  test('digits that the error leaves open are not shown', () => {
    expect(rootRows([{ ...root(-1.234567, 0), error: 0.5e-2 }]).map(rootText)).toEqual(['−1.23']);
    expect(rootRows([{ ...root(-1e-9, 0), error: 1e-8 }]).map(rootText)).toEqual(['≈0']);
    expect(rootRows([{ ...root(1e-9, 2), error: 1e-8 }]).map(rootText)).toEqual(['≈0 ± 2j']);
  });

  test('rows keep the order of the roots and their multiplicity', () => {
    const rows = rootRows([root(0, 0, 2), root(-1, 1), root(-1, -1), root(-4, 0)]);
    expect(rows.map(({ re, im, multiplicity }) => [re, im, multiplicity])).toEqual([
      [0, 0, 2],
      [-1, 1, 1],
      [-4, 0, 1],
    ]);
  });
});

describe('the motion of a pole', () => {
  test('of a pair has damping ratio, natural frequency and time constant', () => {
    // By hand: |p|² = 0.354272² + 0.586117² = 0.469042, |p| = 0.684866, ζ = 0.354272/0.684866, τ = 1/0.354272.
    expect(motionOf(root(-0.354272, 0.586117))).toEqual({ damping: '0.517', frequency: '0.685', timeConstant: '2.82' });
  });

  test('of a real pole has a time constant only', () => {
    expect(motionOf(root(-20, 0))).toEqual({ damping: null, frequency: null, timeConstant: '0.05' });
  });

  test('to the right of the axis grows, on it neither grows nor decays', () => {
    expect(motionOf(root(3, 4))).toEqual({ damping: '−0.6', frequency: '5', timeConstant: 'grows' });
    expect(motionOf(root(0, 4)).timeConstant).toBe('∞');
    expect(motionOf(root(0, 0)).timeConstant).toBe('∞');
  });
});
