import { describe, expect, test } from 'vitest';
import {
  type DenseMatrix,
  denseFromRows,
  exponentialChain,
  exponentialMinusIdentity,
  oneNorm,
  zeroMatrix,
} from '../../../src/numeric/index.ts';

function plusIdentity({ rows, data }: DenseMatrix): number[] {
  return Array.from(data, (x, k) => x + (k % (rows + 1) === 0 ? 1 : 0));
}

function expectNear(found: readonly number[], wanted: readonly number[], relative: number) {
  const size = Math.max(...wanted.map(Math.abs));
  wanted.forEach((value, k) => {
    expect(Math.abs(found[k]! - value)).toBeLessThanOrEqual(relative * size);
  });
}

describe('e^M − I', () => {
  test('the first test matrix of Ward', () => {
    // Ward 1977, SIAM J. Numer. Anal. 14(4), test 1; e^M to 16 figures by mpmath 1.3.
    const F = exponentialMinusIdentity(
      denseFromRows([
        [4, 2, 0],
        [1, 4, 1],
        [1, 1, 4],
      ]),
    );
    const wanted = [
      147.8666224463702, 183.7651386463684, 71.79703239999654, 127.7810855231825, 183.7651386463684, 91.88256932318421,
      127.7810855231825, 163.6796017231808, 111.9681062463719,
    ];
    expectNear(plusIdentity(F), wanted, 2 * 7 * Number.EPSILON); // ‖M‖₁ = 7
  });

  test('the example of Moler and Van Loan, whose series in doubles has no digit right', () => {
    // Moler & Van Loan 1978, SIAM Rev. 20, example 2: e^M to six figures; further ones by mpmath 1.3.
    const F = exponentialMinusIdentity(
      denseFromRows([
        [-49, 24],
        [-64, 31],
      ]),
    );
    expectNear(plusIdentity(F), [-0.735758758144753, 0.551819099658098, -1.47151759908826, 1.10363824071557], 3e-14);
  });

  test.each([1e-3, 0.05, 0.2, 0.5, 0.9, 1.5, 2.05, 2.15, 4, 6, 30, 1000])('a rotation by %f rad', angle => {
    const F = exponentialMinusIdentity(
      denseFromRows([
        [0, angle],
        [-angle, 0],
      ]),
    );
    // cos φ − 1 = −2 sin²(φ/2)
    const wanted = [-2 * Math.sin(angle / 2) ** 2, Math.sin(angle), -Math.sin(angle), -2 * Math.sin(angle / 2) ** 2];
    expectNear([...F.data], wanted, 4 * Number.EPSILON * Math.max(1, angle));
  });

  test('a nilpotent matrix ends its series', () => {
    const F = exponentialMinusIdentity(
      denseFromRows([
        [0, 6, 1],
        [0, 0, 4],
        [0, 0, 0],
      ]),
    );
    expectNear([...F.data], [0, 6, 13, 0, 0, 4, 0, 0, 0], 1e-15);
  });

  test('a slow mode beside a fast one keeps its relative accuracy through thirty squarings', () => {
    const F = exponentialMinusIdentity(
      denseFromRows([
        [-1e-9, 0],
        [0, -1e9],
      ]),
    );
    expect(Math.abs(F.data[0]! / Math.expm1(-1e-9) - 1)).toBeLessThan(1e-13);
    expect(F.data[3]).toBeCloseTo(-1, 14);
  });

  test('a triangular matrix of large norm is not overscaled: norms of powers decide', () => {
    // e^[[-1, a], [0, -2]] has the entry a (e^-1 − e^-2).
    const a = 1e8;
    const F = exponentialMinusIdentity(
      denseFromRows([
        [-1, a],
        [0, -2],
      ]),
    );
    expect(Math.abs(F.data[1]! / (a * (Math.exp(-1) - Math.exp(-2))) - 1)).toBeLessThan(1e-14);
    expect(Math.abs(F.data[0]! - Math.expm1(-1))).toBeLessThan(1e-15);
  });

  test('every level of a chain is the exponential of its part', () => {
    const M = denseFromRows([
      [-1, 3],
      [-2, -0.5],
    ]);
    const { levels } = exponentialChain(M, 5);
    expect(levels.length).toBeGreaterThanOrEqual(6);
    levels.forEach((level, k) => {
      const part = 2 ** -(levels.length - 1 - k);
      const direct = exponentialMinusIdentity({ ...M, data: M.data.map(x => x * part) });
      expectNear([...level.data], [...direct.data], 1e-14);
    });
  });

  test('the zero matrix gives zero, the empty one nothing', () => {
    expect(oneNorm(exponentialMinusIdentity(zeroMatrix(3, 3)))).toBe(0);
    expect(exponentialMinusIdentity(zeroMatrix(0, 0)).data).toHaveLength(0);
  });

  test('a matrix with an infinite entry is a bug and throws', () => {
    expect(() => exponentialMinusIdentity(denseFromRows([[Number.POSITIVE_INFINITY]]))).toThrow(RangeError);
  });
});
