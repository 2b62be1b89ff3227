import { describe, expect, test } from 'vitest';
import { placeAfter } from '../../../../src/ui/results/matrix-keys.ts';
import { columnsByRow, matrixLabel, rowsOf } from '../../../../src/ui/results/matrix-layout.ts';
import { offsetShowing, spanInView } from '../../../../src/ui/results/matrix-window.ts';
import { chain, winch } from './system-matrix-fixture.ts';

describe('the part of a long list in view', () => {
  test('has a margin of four to either side and the room of the rest', () => {
    expect(spanInView(100, 26, 260, 104)).toEqual({ first: 6, end: 18, before: 6 * 26, after: 82 * 26 });
  });

  test('never goes beyond the ends, however far the scroll', () => {
    expect(spanInView(100, 26, 0, 104)).toMatchObject({ first: 0, before: 0 });
    expect(spanInView(100, 26, 1e6, 104)).toEqual({ first: 100, end: 100, before: 2600, after: 0 });
    expect(spanInView(0, 26, 0, 104)).toEqual({ first: 0, end: 0, before: 0, after: 0 });
  });

  test('together with the room around it is always the whole list', () => {
    for (let offset = 0; offset < 3000; offset += 37) {
      const { first, end, before, after } = spanInView(100, 26, offset, 104);
      expect(before + (end - first) * 26 + after).toBe(2600);
    }
  });
});

describe('scrolling to an item', () => {
  test('does not move where it is in view', () => {
    expect(offsetShowing(5, 26, 100, 200, 30)).toBe(100);
  });

  test('goes up to its start and down to its end under the sticky head', () => {
    expect(offsetShowing(2, 26, 100, 200, 30)).toBe(52);
    expect(offsetShowing(20, 26, 100, 200, 30)).toBe(21 * 26 + 30 - 200);
  });
});

describe('keys over the matrix', () => {
  test('enter at the first entry', () => {
    expect(placeAfter('ArrowDown', null, 5, 6)).toEqual({ row: 0, column: 0 });
  });

  test.each([
    ['ArrowUp', { row: 1, column: 3 }],
    ['ArrowDown', { row: 3, column: 3 }],
    ['ArrowLeft', { row: 2, column: 2 }],
    ['ArrowRight', { row: 2, column: 4 }],
    ['Home', { row: 2, column: 0 }],
    ['End', { row: 2, column: 5 }],
    ['PageUp', { row: 0, column: 3 }],
    ['PageDown', { row: 4, column: 3 }],
    ['Enter', null],
  ])('%s leads to %o', (key, place) => {
    expect(placeAfter(key, { row: 2, column: 3 }, 5, 6)).toEqual(place);
  });

  test('stay inside the table, and lead nowhere in an empty one', () => {
    expect(placeAfter('ArrowUp', { row: 0, column: 0 }, 5, 6)).toEqual({ row: 0, column: 0 });
    expect(placeAfter('ArrowRight', { row: 4, column: 5 }, 5, 6)).toEqual({ row: 4, column: 5 });
    expect(placeAfter('ArrowDown', null, 0, 6)).toBeNull();
  });
});

describe('the rows', () => {
  test('are the derivatives of the states, then the outputs under the dashed line', () => {
    expect(rowsOf(winch).map(row => [row.name, row.isDerivative, row.isFirstOutput])).toEqual([
      ['omega', true, false],
      ['F', true, false],
      ['q', true, false],
      ['T', true, false],
      ['F', false, true],
    ]);
  });

  test('without states have no dashed line', () => {
    expect(rowsOf({ ...winch, states: [] }).map(row => row.isFirstOutput)).toEqual([false]);
  });
});

describe('the caption', () => {
  test('says what the table holds', () => {
    expect(matrixLabel(winch)).toBe('System matrix: A and B over C and D. 4 states, 2 inputs, 1 output.');
    expect(matrixLabel(chain(1))).toBe('System matrix: A and B over C and D. 1 state, 1 input, 1 output.');
  });

  test('says that there is nothing yet', () => {
    expect(matrixLabel({ ...winch, states: [], inputs: [], outputs: [] })).toBe(
      'No entries yet: no states, no inputs, no outputs.',
    );
  });
});

test('lit entries are told by their rows', () => {
  const lit = columnsByRow([
    { row: 1, column: 2 },
    { row: 0, column: 0 },
    { row: 1, column: 4 },
  ]);
  expect([...(lit.get(1) ?? [])]).toEqual([2, 4]);
  expect(lit.get(2)).toBeUndefined();
});
