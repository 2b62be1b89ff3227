import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  balance,
  type DenseMatrix,
  denseFromRows,
  eigenvalues,
  exponentialMinusIdentity,
  hessenbergForm,
  luDeterminant,
  luFactors,
  luSolve,
  multiplyMatrices,
  oneNorm,
} from '../../../src/numeric/index.ts';
import { SEED } from '../../arbitraries/rationals.ts';

const RUNS = { seed: SEED, numRuns: 100 };

/** Square matrices of 1 to 12 rows, entries over eight decades or zero. */
const square: fc.Arbitrary<DenseMatrix> = fc.integer({ min: 1, max: 12 }).chain(n => {
  const size = fc.integer({ min: -4, max: 4 }).map(exponent => 10 ** exponent);
  const entry = fc.oneof(
    fc.constant(0),
    fc.tuple(fc.integer({ min: -1000, max: 1000 }), size).map(([x, unit]) => (x / 1000) * unit),
  );
  return fc
    .array(fc.array(entry, { minLength: n, maxLength: n }), { minLength: n, maxLength: n })
    .map(rows => denseFromRows(rows, n));
});

/** Square matrices of 1 to 5 rows, entries from −1 to 1. */
const small: fc.Arbitrary<DenseMatrix> = fc.integer({ min: 1, max: 5 }).chain(n => {
  const entry = fc.integer({ min: -1000, max: 1000 }).map(x => x / 1000);
  const row = fc.array(entry, { minLength: n, maxLength: n });
  return fc.array(row, { minLength: n, maxLength: n }).map(rows => denseFromRows(rows, n));
});

const trace = ({ rows, data }: DenseMatrix) => data.reduce((sum, x, k) => (k % (rows + 1) === 0 ? sum + x : sum), 0);

describe('kernels on random matrices', () => {
  test('eigenvalues are conjugate, and add up to the trace', () => {
    fc.assert(
      fc.property(square, A => {
        const values = eigenvalues(A)!;
        const sum = values.re.reduce((total, re) => total + re, 0);
        const scale = A.rows ** 2 * Number.EPSILON * (oneNorm(balance(A).A) + Math.abs(trace(A)));
        expect(Math.abs(sum - trace(A))).toBeLessThanOrEqual(16 * scale);
        const imaginary = [...values.im].filter(im => im !== 0).sort((a, b) => a - b);
        imaginary.forEach((im, k) => {
          expect(im).toBe(-imaginary[imaginary.length - 1 - k]!);
        });
      }),
      RUNS,
    );
  });

  test('the product of eigenvalues is the determinant', () => {
    fc.assert(
      fc.property(small, A => {
        const values = eigenvalues(A)!;
        // det of complex pairs multiplied out side by side: (a + jb)(a − jb) = a² + b².
        let [re, im] = [1, 0];
        values.re.forEach((a, k) => {
          [re, im] = [re * a - im * values.im[k]!, re * values.im[k]! + im * a];
        });
        const factors = luFactors(A);
        const determinant = factors === null ? 0 : luDeterminant(factors);
        // Entries up to 1, five rows: |det| ≤ 5^2.5 = 56 (Hadamard), and a change of 8 n ε in each row moves it by n times that.
        expect(Math.hypot(re - determinant, im)).toBeLessThanOrEqual(5 * 56 * 5 * 8 * Number.EPSILON);
      }),
      RUNS,
    );
  });

  test('Hessenberg form keeps the sum of squares and the trace', () => {
    fc.assert(
      fc.property(square, A => {
        const H = hessenbergForm(A);
        const norm = Math.hypot(...A.data);
        expect(Math.abs(Math.hypot(...H.data) - norm)).toBeLessThanOrEqual(64 * A.rows * Number.EPSILON * norm);
        expect(Math.abs(trace(H) - trace(A))).toBeLessThanOrEqual(64 * A.rows * Number.EPSILON * norm);
      }),
      RUNS,
    );
  });

  test('elimination leaves a small residual', () => {
    fc.assert(
      fc.property(square, A => {
        const factors = luFactors(A);
        if (factors === null) return;
        const b: DenseMatrix = {
          rows: A.rows,
          columns: 1,
          data: Float64Array.from({ length: A.rows }, (_, i) => 1 + i),
        };
        const x = luSolve(factors, b);
        if (!Number.isFinite(oneNorm(x))) return;
        const product = multiplyMatrices(A, x);
        const residual = Math.max(...product.data.map((entry, i) => Math.abs(entry - b.data[i]!)));
        // Growth of at most 2ⁿ⁻¹ is possible, 8 n is generous for these (Wilkinson 1961).
        const limit = 8 * A.rows ** 2 * Number.EPSILON * (oneNorm(A) * oneNorm(x) + oneNorm(b));
        expect(residual).toBeLessThanOrEqual(limit);
      }),
      RUNS,
    );
  });

  test('the determinant of the exponential is the exponential of the trace', () => {
    fc.assert(
      fc.property(square, A => {
        const M = { ...A, data: A.data.map(x => x / Math.max(1, oneNorm(A))) };
        const F = exponentialMinusIdentity(M);
        const E = { ...F, data: F.data.map((x, k) => x + (k % (F.rows + 1) === 0 ? 1 : 0)) };
        expect(Math.abs(luDeterminant(luFactors(E)!) / Math.exp(trace(M)) - 1)).toBeLessThan(1e-12);
      }),
      RUNS,
    );
  });

  test('the exponential of the opposite undoes it: F + G + F G = 0', () => {
    fc.assert(
      fc.property(square, A => {
        const M = { ...A, data: A.data.map(x => (3 * x) / Math.max(1, oneNorm(A))) };
        const F = exponentialMinusIdentity(M);
        const G = exponentialMinusIdentity({ ...M, data: M.data.map(x => -x) });
        const product = multiplyMatrices(F, G);
        const rest = Math.max(...product.data.map((x, k) => Math.abs(x + F.data[k]! + G.data[k]!)));
        expect(rest).toBeLessThanOrEqual(64 * A.rows * Number.EPSILON * (1 + oneNorm(F)) * (1 + oneNorm(G)));
      }),
      RUNS,
    );
  });
});
