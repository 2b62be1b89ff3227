import { describe, expect, test } from 'vitest';
import { toFraction } from '../../../src/algebra/index.ts';
import { allTransferFunctions, transferFunction } from '../../../src/analysis/index.ts';
import { companionModel, rationalModel } from './rational-model.ts';

describe('transfer functions', () => {
  test('cancel what numerator and denominator have in common', () => {
    // (s + 2)(s + 3) / ((s + 2)(s + 1)) = (s + 3)/(s + 1)
    const found = transferFunction(companionModel([1, 5, 6], [1, 3, 2]), 0, 0);
    expect(found).toMatchObject({ route: 'certified', numerator: [1, 3], denominator: [1, 1], standsIn: false });
  });

  test('keep fractions exact beside their nearest doubles', () => {
    const found = transferFunction(rationalModel([['-1/3']], [['0.1']], [[1]]), 0, 0);
    if (found.route !== 'certified') throw new Error(found.reason);
    expect(found.exact.numerator.map(toFraction)).toEqual(['1/10']);
    expect(found.exact.denominator.map(toFraction)).toEqual(['1', '1/3']);
    expect(found.numerator).toEqual([0.1]);
    expect(found.denominator).toEqual([1, 1 / 3]);
  });

  test('of a channel that is not connected is 0 over 1', () => {
    const model = rationalModel(
      [
        [-1, 0],
        [0, -2],
      ],
      [[1], [0]],
      [[0, 1]],
    );
    expect(transferFunction(model, 0, 0)).toMatchObject({ numerator: [0], denominator: [1] });
  });

  test('of a gain alone is that gain', () => {
    expect(transferFunction(rationalModel([], [], [[]], [['2.5']]), 0, 0)).toMatchObject({
      numerator: [2.5],
      denominator: [1],
    });
  });

  test('come output by output, the inputs of each in order', () => {
    const model = rationalModel(
      [[-1]],
      [[1, 2]],
      [[1], [3]],
      [
        [0, 0],
        [0, 1],
      ],
    );
    expect(allTransferFunctions(model).map(({ output, input }) => [output, input])).toEqual([
      ['y1', 'u1'],
      ['y1', 'u2'],
      ['y2', 'u1'],
      ['y2', 'u2'],
    ]);
    expect(allTransferFunctions(model)[3]).toMatchObject({ numerator: [1, 7], denominator: [1, 1] });
  });

  test('of a large model are not computed, with the reason', () => {
    const n = 40;
    const diagonal = Array.from({ length: n }, (_, i) => Array.from({ length: n }, (_, j) => (i === j ? -1 : 0)));
    const model = rationalModel(
      diagonal,
      diagonal.map(() => [1]),
      [diagonal.map(() => 1)],
    );
    expect(transferFunction(model, 0, 0)).toEqual({
      route: 'not-computed',
      input: 'u1',
      output: 'y1',
      reason: 'Transfer functions are computed for up to 32 states; this model has 40.',
    });
    expect(transferFunction(model, 0, 0, 'high')).toMatchObject({ numerator: [40], denominator: [1, 1] });
  });
});
