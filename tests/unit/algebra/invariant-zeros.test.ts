import { describe, expect, test } from 'vitest';
import { invariantZeroPolynomial, rankOf } from '../../../src/algebra/index.ts';
import { primeAt } from '../../../src/algebra/modular/primes.ts';
import { exactRows, matrix, type WrittenRows, written } from './as-written.ts';

function zeros(A: WrittenRows, B: WrittenRows, C: WrittenRows, D: WrittenRows, inputs: number): string {
  const n = A.length;
  const p = invariantZeroPolynomial(matrix(A, n), matrix(B, inputs), matrix(C, n), matrix(D, inputs));
  return written(p);
}

describe('invariant zeros', () => {
  test('without inputs they are the unobservable modes, without outputs the uncontrollable ones, without both all', () => {
    const A = [
      [-1, 0],
      [0, -2],
    ];
    expect(zeros(A, [[], []], [[1, 0]], [[]], 0)).toBe('1 2');
    expect(zeros(A, [[0], [1]], [], [], 1)).toBe('1 1');
    expect(zeros(A, [[], []], [], [], 0)).toBe('1 3 2');
    expect(zeros([], [], [[]], [[3]], 1)).toBe('1');
  });

  test('more outputs than inputs leave only what all of them miss', () => {
    // 1/(s + 1) and (s + 5)/((s + 1)(s + 2)) from one input have no zero in common; (s + 5) twice has.
    const A = [
      [0, 1],
      [-2, -3],
    ];
    const B = [[0], [1]];
    expect(
      zeros(
        A,
        B,
        [
          [2, 1],
          [5, 1],
        ],
        [[0], [0]],
        1,
      ),
    ).toBe('1');
    expect(
      zeros(
        A,
        B,
        [
          [5, 1],
          [10, 2],
        ],
        [[0], [0]],
        1,
      ),
    ).toBe('1 5');
  });

  test('a degenerate model, one of whose outputs is a copy, still has the zeros of its Smith form', () => {
    // Two inputs and two equal outputs of (s + 3)/((s + 1)(s + 2)) by the first input alone.
    const A = [
      [0, 1],
      [-2, -3],
    ];
    const B = [
      [0, 0],
      [1, 0],
    ];
    expect(
      zeros(
        A,
        B,
        [
          [3, 1],
          [3, 1],
        ],
        [
          [0, 0],
          [0, 0],
        ],
        2,
      ),
    ).toBe('1 3');
  });

  test('a model whose transfer function is zero keeps its decoupling zeros', () => {
    // The first state is driven and not seen, the second seen and not driven.
    expect(
      zeros(
        [
          [-1, 0],
          [0, -2],
        ],
        [[1], [0]],
        [[0, 1]],
        [[0]],
        1,
      ),
    ).toBe('1');
    expect(
      zeros(
        [
          [-1, 0, 0],
          [0, -2, 0],
          [0, 0, -3],
        ],
        [[1], [0], [0]],
        [[0, 1, 0]],
        [[0]],
        1,
      ),
    ).toBe('1 3');
  });

  test('an input-output decoupling zero counts once, beside the zero of the transfer function', () => {
    // (s + 4)/((s + 1)(s + 2)) and a mode at −9 that is neither driven nor seen.
    const A = [
      [0, 1, 0],
      [-2, -3, 0],
      [0, 0, -9],
    ];
    expect(zeros(A, [[0], [1], [0]], [[4, 1, 0]], [[0]], 1)).toBe('1 13 36');
  });

  test("Rosenbrock's plant has its transmission zero at 1 (State-Space and Multivariable Theory 1970, from memory)", () => {
    // [1/(s+1), 2/(s+3); 1/(s+1), 1/(s+1)]
    const A = [
      [-1, 0, 0],
      [0, -3, 0],
      [0, 0, -1],
    ];
    const B = [
      [1, 0],
      [0, 1],
      [0, 1],
    ];
    expect(
      zeros(
        A,
        B,
        [
          [1, 2, 0],
          [1, 0, 1],
        ],
        [
          [0, 0],
          [0, 0],
        ],
        2,
      ),
    ).toBe('1 -1');
  });

  test('an invertible feedthrough gives the poles of the inverse: A − B D⁻¹ C', () => {
    expect(zeros([[-2]], [[3]], [[1]], [[5]], 1)).toBe('1 13/5');
    const twice = zeros(
      [
        [-2, 1],
        [0, -1],
      ],
      [
        [1, 0],
        [0, 1],
      ],
      [
        [1, 0],
        [0, 1],
      ],
      [
        [1, '1/2'],
        [0, 1],
      ],
      2,
    );
    // A − D⁻¹ = [−3, 3/2; 0, −2], by hand.
    expect(twice).toBe('1 5 6');
  });
});

describe('rank', () => {
  test('no rows, no columns and zeros have rank 0', () => {
    expect([
      rankOf([]),
      rankOf([[], []]),
      rankOf(
        exactRows([
          [0, 0],
          [0, 0],
        ]),
      ),
    ]).toEqual([0, 0, 0]);
  });

  test('the square of numbers 1 to 9 has rank 2, with another corner 3', () => {
    expect(
      rankOf(
        exactRows([
          [1, 2, 3],
          [4, 5, 6],
          [7, 8, 9],
        ]),
      ),
    ).toBe(2);
    expect(
      rankOf(
        exactRows([
          [1, 2, 3],
          [4, 5, 6],
          [7, 8, 10],
        ]),
      ),
    ).toBe(3);
  });

  test("Hilbert's matrix of order 8 is regular though it looks singular in doubles", () => {
    const hilbert = Array.from({ length: 8 }, (_, i) => Array.from({ length: 8 }, (_, j) => `1/${i + j + 1}`));
    expect(rankOf(exactRows(hilbert))).toBe(8);
  });

  test('a determinant that the first primes divide does not lower it', () => {
    const product = BigInt(primeAt(0)) * BigInt(primeAt(1)) * BigInt(primeAt(2));
    expect(
      rankOf(
        exactRows([
          [`${product}`, 0],
          [0, 1],
        ]),
      ),
    ).toBe(2);
    expect(
      rankOf(
        exactRows([
          [`${product}`, 1],
          [`${product ** 2n}`, `${product}`],
        ]),
      ),
    ).toBe(1);
  });
});
