import { describe, expect, test } from 'vitest';
import { balance, balanceSystem, denseFromRows, zeroMatrix } from '../../../src/numeric/index.ts';

const isPowerOfTwo = (x: number) => Number.isInteger(Math.log2(x));

describe('balancing', () => {
  test('the example of its use: a badly scaled matrix gets rows and columns of like size', () => {
    // A similarity diag(1, 100, 10000) of a matrix of ones: balanced it is nearly that again.
    const A = denseFromRows([
      [1, 100, 10000],
      [0.01, 1, 100],
      [0.0001, 0.01, 1],
    ]);
    const { A: balanced } = balance(A);
    const sizes = Array.from(balanced.data, Math.abs);
    expect(Math.max(...sizes) / Math.min(...sizes)).toBeLessThan(4);
  });

  test('scales are powers of two and undo to the very same matrix', () => {
    const A = denseFromRows([
      [0, 1, 0],
      [0, 0, 1],
      [-6e9, -1.1e6, -600.7],
    ]);
    const { A: balanced, scale } = balance(A);
    expect([...scale].every(isPowerOfTwo)).toBe(true);
    const undone = balanced.data.map((x, k) => (x * scale[Math.floor(k / 3)]!) / scale[k % 3]!);
    expect([...undone]).toEqual([...A.data]);
  });

  test('a state without a way in or out keeps its scale', () => {
    const { scale } = balance(
      denseFromRows([
        [-1, 0],
        [1e9, -2],
      ]),
    );
    expect([...scale]).toEqual([1, 1]);
  });

  test('inputs and outputs count: a cascade that A alone would leave is scaled by them', () => {
    const A = denseFromRows([
      [-1, 0],
      [1e8, -2],
    ]);
    const B = denseFromRows([[1], [0]]);
    const C = denseFromRows([[0, 1e-8]]);
    const { A: balanced, scale } = balanceSystem(A, B, C);
    expect(balanced.data[2]).toBeLessThan(1e5);
    expect([...scale].every(isPowerOfTwo)).toBe(true);
  });

  test('a Hessenberg matrix whose large entries balancing would spread stays as it is', () => {
    // Watkins 2006, Electron. Trans. Numer. Anal. 23: rescaling tiny subdiagonal entries to the size of the others is harmful;
    // the guard of James, Langou & Lowery lets the norm only fall.
    const A = denseFromRows([
      [1, 1, 1],
      [1e-14, 1, 1],
      [0, 1e-14, 1],
    ]);
    const norm = (data: Float64Array) => Math.hypot(...data);
    expect(norm(balance(A).A.data)).toBeLessThanOrEqual(norm(A.data));
  });

  test('an empty matrix is balanced', () => {
    expect(balance(zeroMatrix(0, 0)).scale).toHaveLength(0);
  });
});
