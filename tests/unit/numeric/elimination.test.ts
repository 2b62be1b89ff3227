import { describe, expect, test } from 'vitest';
import {
  type ComplexMatrix,
  denseFromRows,
  hessenbergSystem,
  luDeterminant,
  luFactors,
  luSolve,
  multiplyMatrices,
  oneNorm,
  quotient,
  responseOf,
  solveComplex,
} from '../../../src/numeric/index.ts';

describe('real elimination', () => {
  test('the inverse of the Hilbert matrix of order 4 has whole numbers for entries', () => {
    // Savage & Lukacs 1954, NBS Appl. Math. Ser. 39: the inverse of the order 4.
    const H = denseFromRows([0, 1, 2, 3].map(i => [0, 1, 2, 3].map(j => 1 / (i + j + 1))));
    const I = denseFromRows([0, 1, 2, 3].map(i => [0, 1, 2, 3].map(j => (i === j ? 1 : 0))));
    const inverse = luSolve(luFactors(H)!, I);
    const published = [16, -120, 240, -140, -120, 1200, -2700, 1680, 240, -2700, 6480, -4200, -140, 1680, -4200, 2800];
    published.forEach((entry, k) => {
      expect(Math.abs(inverse.data[k]! - entry)).toBeLessThan(6480 * 1.5e4 * 4 * Number.EPSILON); // condition 1.5·10⁴
    });
  });

  test('rows are exchanged for the larger pivot, and the determinant keeps its sign', () => {
    const factors = luFactors(
      denseFromRows([
        [0, 2, 1],
        [1e-20, 1, 1],
        [3, 0, 1],
      ]),
    )!;
    expect(luDeterminant(factors)).toBeCloseTo(3, 14);
  });

  test('a matrix with equal rows is singular', () => {
    expect(
      luFactors(
        denseFromRows([
          [1, 2],
          [1, 2],
        ]),
      ),
    ).toBeNull();
  });
});

describe('complex elimination', () => {
  const at = (re: number[], im: number[], rows: number, columns: number): ComplexMatrix => ({
    rows,
    columns,
    re: Float64Array.from(re),
    im: Float64Array.from(im),
  });

  test('a system with a known solution', () => {
    // (1 + j) x + 2 y = 3 + j, j x + (1 − j) y = 2 has x = 1, y = 1 … on the left: (1 + j) + 2 = 3 + j, j + 1 − j = 1.
    const x = solveComplex(at([1, 2, 0, 1], [1, 0, 1, -1], 2, 2), at([3, 1], [1, 0], 2, 1))!;
    [...x.re, ...x.im].forEach((part, k) => {
      expect(Math.abs(part - (k < 2 ? 1 : 0))).toBeLessThan(4 * Number.EPSILON);
    });
  });

  test('a zero pivot that no row replaces has no solution', () => {
    expect(solveComplex(at([0, 1, 0, 1], [0, 0, 0, 0], 2, 2), at([1, 1], [0, 0], 2, 1))).toBeNull();
  });

  test('a quotient of huge numbers does not overflow', () => {
    const [re, im] = quotient(1e300, 1e300, 1e300, -1e300);
    expect(re).toBeCloseTo(0, 15);
    expect(im).toBeCloseTo(1, 15);
  });
});

describe('Hessenberg form', () => {
  const A = denseFromRows([
    [4, 1, -2, 2],
    [1, 2, 0, 1],
    [-2, 0, 3, -2],
    [2, 1, -2, -1],
  ]);
  const B = denseFromRows([[1], [0], [2], [-1]]);
  const C = denseFromRows([[0, 1, 0, 3]]);

  test('is zero below the first subdiagonal and, for a symmetric matrix, tridiagonal', () => {
    // The example of Burden & Faires, Numerical Analysis, for Householder's method: diagonal 4, 10/3, −33/25, 149/75.
    const H = hessenbergSystem(A, B, C).A;
    expect(H.data[8]).toBe(0);
    expect(H.data[12]).toBe(0);
    expect(H.data[13]).toBe(0);
    [4, 10 / 3, -33 / 25, 149 / 75].forEach((entry, i) => {
      expect(Math.abs(H.data[i * 5]! - entry)).toBeLessThan(1e-14);
    });
    expect(Math.abs(H.data[2]!)).toBeLessThan(1e-14);
  });

  test('keeps what the outputs see of the inputs: C Aᵏ B', () => {
    const system = hessenbergSystem(A, B, C);
    let [left, right] = [B, system.B];
    for (let k = 0; k < 5; k++) {
      const [before, after] = [multiplyMatrices(C, left).data[0]!, multiplyMatrices(system.C, right).data[0]!];
      expect(Math.abs(after - before)).toBeLessThan(1e-14 * oneNorm(A) ** k * 10);
      left = multiplyMatrices(A, left);
      right = multiplyMatrices(system.A, right);
    }
  });

  test('answers at a complex frequency as the full system of equations does', () => {
    const system = { ...hessenbergSystem(A, B, C), D: denseFromRows([[0.5]]) };
    const [re, im] = [0.3, 1.7];
    const full: ComplexMatrix = { rows: 4, columns: 4, re: A.data.map(x => -x), im: new Float64Array(16) };
    for (let i = 0; i < 4; i++) {
      full.re[i * 5]! += re;
      full.im[i * 5] = im;
    }
    const x = solveComplex(full, { rows: 4, columns: 1, re: B.data, im: new Float64Array(4) })!;
    const answer = responseOf(system)(re, im)!;
    expect(Math.abs(answer.re[0]! - (x.re[1]! + 3 * x.re[3]! + 0.5))).toBeLessThan(1e-14);
    expect(Math.abs(answer.im[0]! - (x.im[1]! + 3 * x.im[3]!))).toBeLessThan(1e-14);
  });

  test('has no answer at a pole', () => {
    const integrator = {
      A: denseFromRows([[0]]),
      B: denseFromRows([[1]]),
      C: denseFromRows([[1]]),
      D: denseFromRows([[0]]),
    };
    expect(responseOf(integrator)(0, 0)).toBeNull();
  });
});
