import { describe, expect, test } from 'vitest';
import { denseFromRows, irreducibleBlocks, submatrix, zeroMatrix } from '../../../src/numeric/index.ts';

describe('irreducible blocks', () => {
  test('a loop of three with a tail', () => {
    const A = denseFromRows([
      [0, 0, 1, 0],
      [1, 0, 0, 0],
      [0, 1, 0, 0],
      [0, 0, 1, 5],
    ]);
    expect(irreducibleBlocks(A)).toEqual([[0, 1, 2], [3]]);
  });

  test('two loops that share a state are one block', () => {
    const A = denseFromRows([
      [0, 1, 0],
      [1, 0, 1],
      [0, 1, 0],
    ]);
    expect(irreducibleBlocks(A)).toEqual([[0, 1, 2]]);
  });

  test('a triangular matrix falls into single states, whichever way it leans', () => {
    const upper = denseFromRows([
      [1, 2, 3],
      [0, 4, 5],
      [0, 0, 6],
    ]);
    const lower = denseFromRows([
      [1, 0, 0],
      [2, 4, 0],
      [3, 5, 6],
    ]);
    expect(irreducibleBlocks(upper)).toEqual([[0], [1], [2]]);
    expect(irreducibleBlocks(lower)).toEqual([[0], [1], [2]]);
  });

  test('a loop of 1,200 states is walked without recursion', () => {
    const n = 1200;
    const A = zeroMatrix(n, n);
    for (let i = 0; i + 1 < n; i++) A.data[i * n + i + 1] = 1;
    A.data[(n - 1) * n] = 1;
    expect(irreducibleBlocks(A)).toHaveLength(1);
  });

  test('a submatrix takes rows and columns in the order given', () => {
    const A = denseFromRows([
      [1, 2],
      [3, 4],
    ]);
    expect([...submatrix(A, [1, 0], [0]).data]).toEqual([3, 1]);
  });
});
