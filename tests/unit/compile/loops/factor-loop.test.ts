import { describe, expect, test } from 'vitest';
import { parseRational, rational, toFraction, ZERO } from '../../../../src/algebra/index.ts';
import { RowStore } from '../../../../src/compile/equations/index.ts';
import { factorLoop } from '../../../../src/compile/loops/factor-loop.ts';
import { solveFactored } from '../../../../src/compile/loops/solve-factored.ts';
import { type Arithmetic, doubleArithmetic, rationalArithmetic } from '../../../../src/compile/quantities/index.ts';

function storeOf<T>(arithmetic: Arithmetic<T>, rows: readonly (readonly T[])[]): RowStore<T> {
  const store = new RowStore(arithmetic);
  for (const row of rows) {
    row.forEach((value, column) => {
      if (!arithmetic.field.isZero(value)) store.push(column, value);
    });
    store.endRow();
  }
  return store;
}

function solve<T>(arithmetic: Arithmetic<T>, rows: readonly (readonly T[])[], right: readonly T[]): T[] | null {
  const factors = factorLoop(arithmetic, storeOf(arithmetic, rows));
  if (factors === null) return null;
  const sides = arithmetic.allocate(right.length);
  right.forEach((value, i) => {
    sides[i] = value;
  });
  const solution = solveFactored(arithmetic, factors, sides, 1);
  return right.map((_, i) => solution[i] ?? arithmetic.field.zero);
}

const fractions = (rows: readonly (readonly string[])[]) =>
  rows.map(row => row.map(text => parseRational(text) ?? ZERO));

/** Rows i of 1/(i + j − 1): the Hilbert matrix, whose inverse is of whole numbers. */
const hilbert = (n: number) =>
  Array.from({ length: n }, (_, i) => Array.from({ length: n }, (_, j) => rational(1n, BigInt(i + j + 1))));

describe('exactly', () => {
  /** Its inverse is [9 −36 30; −36 192 −180; 30 −180 180] (Choi 1983, Amer. Math. Monthly 90, from memory; checked by hand). */
  test('the Hilbert matrix of order three is solved for a right-hand side of ones', () => {
    const [x, y, z] = solve(rationalArithmetic, hilbert(3), [rational(1n), rational(1n), rational(1n)]) ?? [];
    expect([x, y, z].map(value => value && toFraction(value))).toEqual(['3', '-24', '30']);
  });

  test('a system that needs rows exchanged is solved', () => {
    const rows = fractions([
      ['0', '2', '0'],
      ['0', '0', '3'],
      ['5', '0', '0'],
    ]);
    const solution = solve(rationalArithmetic, rows, fractions([['2', '3', '10']])[0] ?? []);
    expect(solution?.map(toFraction)).toEqual(['2', '1', '1']);
  });

  test('a singular system is found out, also where rounding would hide it', () => {
    const rows = fractions([
      ['1', '-1/49'],
      ['-49', '1'],
    ]);
    expect(factorLoop(rationalArithmetic, storeOf(rationalArithmetic, rows))).toBeNull();
  });

  test('a row or a column of zeros is singular', () => {
    expect(
      factorLoop(
        rationalArithmetic,
        storeOf(
          rationalArithmetic,
          fractions([
            ['1', '2'],
            ['0', '0'],
          ]),
        ),
      ),
    ).toBeNull();
    expect(
      factorLoop(
        rationalArithmetic,
        storeOf(
          rationalArithmetic,
          fractions([
            ['1', '0'],
            ['2', '0'],
          ]),
        ),
      ),
    ).toBeNull();
  });
});

describe('in doubles', () => {
  test('a small pivot is passed over: no digit is lost where the first entry is 1e-20', () => {
    const solution =
      solve(
        doubleArithmetic,
        [
          [1e-20, 1],
          [1, 1],
        ],
        [1, 2],
      ) ?? [];
    expect(solution[0]).toBeCloseTo(1, 15);
    expect(solution[1]).toBeCloseTo(1, 15);
  });

  test('a dense system of 40 unknowns leaves a residual of rounding size', () => {
    const n = 40;
    const rows = Array.from({ length: n }, (_, i) =>
      Array.from({ length: n }, (_, j) => Math.sin(1 + 7 * i + 3 * j * j) + (i === j ? 3 : 0)),
    );
    const right = Array.from({ length: n }, (_, i) => Math.cos(i));
    const x = solve(doubleArithmetic, rows, right) ?? [];
    const size = Math.max(...x.map(Math.abs));
    const residuals = rows.map((row, i) =>
      Math.abs(row.reduce((sum, value, j) => sum + value * (x[j] ?? NaN), -(right[i] ?? NaN))),
    );
    expect(Math.max(...residuals)).toBeLessThan(8 * n * Number.EPSILON * 4 * n * size);
  });

  test('several right-hand sides are solved at once, row by row', () => {
    const factors = factorLoop(
      doubleArithmetic,
      storeOf(doubleArithmetic, [
        [2, 0],
        [1, 4],
      ]),
    );
    if (factors === null) throw new Error('the system is not singular');
    const solution = solveFactored(doubleArithmetic, factors, Float64Array.of(2, 4, 9, 2), 2);
    expect(Array.from({ length: 4 }, (_, i) => solution[i])).toEqual([1, 2, 2, 0]);
  });
});

test('a ring of 3,000 signals with a chord each is solved within the memory of its entries', () => {
  const n = 3000;
  const store = new RowStore(doubleArithmetic);
  for (let i = 0; i < n; i++) {
    store.push(i, 1);
    store.push((i + 1) % n, -0.5);
    store.push((i + 7) % n, -0.25);
    store.endRow();
  }
  const factors = factorLoop(doubleArithmetic, store);
  if (factors === null) throw new Error('the ring is not singular');
  const solution = solveFactored(doubleArithmetic, factors, new Float64Array(n).fill(1), 1);
  for (let i = 0; i < n; i += 500) expect(solution[i]).toBeCloseTo(4, 10); // each row: x − x/2 − x/4 = 1
});
