import { describe, expect, test } from 'vitest';
import { doubleField } from '../../../../src/algebra/index.ts';
import { gainBetween, type Walk } from '../../../../src/compile/trace/gain-formula.ts';

const walk = (product: number, ...nodes: number[]): Walk<number> => ({ product, nodes: new Set(nodes) });

describe('the gain formula', () => {
  test('of a single loop is forward gain over one plus loop gain, the loop negative (textbook feedback)', () => {
    const { value, determinant } = gainBetween(doubleField, [walk(6, 0, 1, 2)], [walk(-6 * 4, 1, 2)]);
    expect(determinant).toBe(25);
    expect(value).toBe(6 / 25);
  });

  // Mason 1956, Proc. IRE 44: Δ = 1 − ΣL + Σ of products of two loops that do not touch; Δk leaves out what touches path k.
  test('counts two loops that do not touch with their product', () => {
    const path = walk(30, 0, 1, 2, 3);
    const loops = [walk(-2, 1, 4), walk(-3, 2, 5)];
    const { value, determinant, cofactors } = gainBetween(doubleField, [path], loops);
    expect(determinant).toBe(1 + 2 + 3 + 6);
    expect(cofactors).toEqual([1]);
    expect(value).toBe(30 / 12);
  });

  test('gives a path the determinant of the loops it does not touch as its cofactor', () => {
    const { value, cofactors } = gainBetween(doubleField, [walk(5, 0, 1), walk(7, 0, 2, 1)], [walk(0.5, 2, 3)]);
    expect(cofactors).toEqual([0.5, 1]);
    expect(value).toBe((5 * 0.5 + 7) / 0.5);
  });

  test('has no value where the determinant is zero', () => {
    expect(gainBetween(doubleField, [walk(1, 0, 1)], [walk(1, 1)])).toEqual({
      value: null,
      determinant: 0,
      cofactors: [1],
    });
  });

  test('gives up where more than 4,096 sets of loops have to be summed', () => {
    const joining = walk(0.1, ...Array.from({ length: 13 }, (_, i) => i + 1));
    const loops = Array.from({ length: 13 }, (_, i) => walk(0.1, i + 1));
    expect(gainBetween(doubleField, [walk(1, 0, 1)], [...loops, joining]).value).toBeNull();
    const separate = gainBetween(doubleField, [walk(1, 0, 1)], loops).value;
    expect(separate).toBeCloseTo(1 / 0.9, 12);
  });
});
