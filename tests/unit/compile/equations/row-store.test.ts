import { expect, test } from 'vitest';
import { toRows } from '../../../../src/algebra/index.ts';
import { cutMatrix, RowAccumulator, RowStore } from '../../../../src/compile/equations/index.ts';
import { doubleArithmetic } from '../../../../src/compile/quantities/index.ts';

test('a sum of rows has each column once and no zeros', () => {
  const store = new RowStore(doubleArithmetic);
  store.push(4, 1);
  store.push(0, 2);
  store.endRow();
  const sum = new RowAccumulator(doubleArithmetic, 5);
  sum.addRow(store, 0, 3);
  sum.add(0, -6);
  sum.add(2, 5);
  expect(sum.finishRow(store)).toBe(1);
  expect(toRows(cutMatrix(store, [1], 0, 5), 0)).toEqual([[0, 0, 5, 0, 3]]);
  expect(store.length).toBe(4);
});

test('the next sum begins at zero', () => {
  const store = new RowStore(doubleArithmetic);
  const sum = new RowAccumulator(doubleArithmetic, 3);
  sum.add(1, 7);
  sum.finishRow(store);
  sum.add(1, 1);
  sum.finishRow(store);
  expect(toRows(cutMatrix(store, [0, 1], 0, 3), 0)).toEqual([
    [0, 7, 0],
    [0, 1, 0],
  ]);
});

test('what rounding leaves of two terms counts as zero, what is larger does not', () => {
  const store = new RowStore(doubleArithmetic);
  const sum = new RowAccumulator(doubleArithmetic, 2);
  sum.add(0, 0.1 * 3);
  sum.add(0, -0.3);
  sum.add(1, 1);
  sum.add(1, -(1 - 64 * Number.EPSILON));
  sum.finishRow(store);
  expect(toRows(cutMatrix(store, [0], 0, 2), 0)).toEqual([[0, 64 * Number.EPSILON]]);
});

test('buffers grow with what is written', () => {
  const store = new RowStore(doubleArithmetic, 1, 1);
  for (let row = 0; row < 100; row++) {
    for (let column = 0; column < 10; column++) store.push(column, row);
    store.endRow();
  }
  expect([store.rows, store.length]).toEqual([100, 1000]);
  expect(toRows(cutMatrix(store, [99], 0, 3), 0)).toEqual([[99, 99, 99]]);
});

test('a cut keeps the rows asked for, in that order, and its columns ascending from zero', () => {
  const store = new RowStore(doubleArithmetic);
  store.push(3, 30);
  store.push(1, 10);
  store.endRow();
  store.push(2, 20);
  store.endRow();
  const cut = cutMatrix(store, [1, 0], 1, 4);
  expect([...cut.column]).toEqual([1, 0, 2]);
  expect(toRows(cut, 0)).toEqual([
    [0, 20, 0],
    [10, 0, 30],
  ]);
});
