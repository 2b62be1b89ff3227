import { describe, expect, test } from 'vitest';
import { type DenseMatrix, denseFromRows, eigenvalues, zeroMatrix } from '../../../src/numeric/index.ts';

function sorted(A: DenseMatrix): readonly (readonly [number, number])[] {
  const values = eigenvalues(A);
  if (values === null) throw new Error('not converged');
  const pairs = Array.from(values.re, (re, i) => [re, values.im[i]!] as const);
  return pairs.sort((a, b) => b[0] - a[0] || b[1] - a[1]);
}

function frank(n: number): DenseMatrix {
  const entry = (i: number, j: number) => (j < i - 1 ? 0 : n - Math.max(i, j));
  return denseFromRows(Array.from({ length: n }, (_, i) => Array.from({ length: n }, (_, j) => entry(i, j))));
}

describe('eigenvalues', () => {
  test('the matrix of Frank of order 12 has the eigenvalues of its published table', () => {
    // Frank 1958, J. SIAM 6; Wilkinson 1965, The Algebraic Eigenvalue Problem, gives them to 8 figures.
    const published = [
      32.2288915, 20.1989886, 12.3110774, 6.9615331, 3.5118559, 1.5539887, 0.6435053, 0.2847497, 0.1436465, 0.0812277,
      0.0495074, 0.0310281,
    ];
    sorted(frank(12)).forEach(([re, im], i) => {
      expect(Math.abs(re - published[i]!)).toBeLessThan(2e-7);
      expect(im).toBe(0);
    });
  });

  test('second differences have the eigenvalues 2 − 2 cos(kπ / (n + 1))', () => {
    const n = 30;
    const rows = Array.from({ length: n }, (_, i) =>
      Array.from({ length: n }, (_, j) => (i === j ? 2 : Math.abs(i - j) === 1 ? -1 : 0)),
    );
    sorted(denseFromRows(rows)).forEach(([re], i) => {
      expect(Math.abs(re - (2 - 2 * Math.cos(((n - i) * Math.PI) / (n + 1))))).toBeLessThan(30 * 4 * Number.EPSILON);
    });
  });

  test('a cyclic shift has the roots of unity, which need exceptional shifts', () => {
    const n = 8;
    const rows = Array.from({ length: n }, (_, i) => Array.from({ length: n }, (_, j) => ((j + 1) % n === i ? 1 : 0)));
    for (const [re, im] of sorted(denseFromRows(rows))) {
      expect(Math.abs(Math.hypot(re, im) - 1)).toBeLessThan(8 * Number.EPSILON);
      const eighths = (Math.atan2(im, re) * 4) / Math.PI;
      expect(Math.abs(eighths - Math.round(eighths))).toBeLessThan(1e-14);
    }
  });

  test('complex pairs come out exactly conjugate', () => {
    const pairs = sorted(
      denseFromRows([
        [0, 1, 0, 0],
        [-4, -0.4, 1, 0],
        [0, 0, 0, 1],
        [1, 0, -9, -0.6],
      ]),
    );
    expect(pairs[0]![0]).toBe(pairs[1]![0]);
    expect(pairs[0]![1]).toBe(-pairs[1]![1]);
    expect(pairs[2]![1]).toBe(-pairs[3]![1]);
  });

  test('states that no loop joins keep their rates to the last bit', () => {
    const values = sorted(
      denseFromRows([
        [-1e-9, 0, 0],
        [1e12, -0.1, 0],
        [3, 7e8, -1e7],
      ]),
    );
    expect(values).toEqual([
      [-1e-9, 0],
      [-0.1, 0],
      [-1e7, 0],
    ]);
  });

  test('a companion matrix of scale 10³ is balanced before: second-order Butterworth poles at 10³ rad/s', () => {
    const values = sorted(
      denseFromRows([
        [0, 1],
        [-1e6, -1e3 * Math.SQRT2],
      ]),
    );
    for (const [re, im] of values) {
      expect(Math.abs(re + 1e3 * Math.SQRT1_2)).toBeLessThan(1e-12);
      expect(Math.abs(Math.abs(im) - 1e3 * Math.SQRT1_2)).toBeLessThan(1e-12);
    }
  });

  test('no states, no eigenvalues', () => {
    expect(eigenvalues(zeroMatrix(0, 0))?.re).toHaveLength(0);
  });

  test('the zero matrix has zeros', () => {
    expect(sorted(zeroMatrix(3, 3))).toEqual([
      [0, 0],
      [0, 0],
      [0, 0],
    ]);
  });
});
