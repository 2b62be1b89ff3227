import { describe, expect, test } from 'vitest';
import { zeros } from '../../../src/analysis/index.ts';
import { companionModel, rationalModel } from './rational-model.ts';

describe('invariant zeros', () => {
  test('of one channel are the roots of its numerator, a cancelled one included', () => {
    // (s + 2)² (s + 5) / ((s + 2)(s + 1)(s + 3)(s + 4))
    const model = companionModel([1, 9, 24, 20], [1, 10, 35, 50, 24]);
    expect(zeros(model)).toEqual({
      route: 'certified',
      standsIn: false,
      zeros: [
        { re: -2, im: 0, multiplicity: 2 },
        { re: -5, im: 0, multiplicity: 1 },
      ],
    });
  });

  test('of two channels in one: the value at which the transfer matrix loses rank', () => {
    // [1/(s+1), 2/(s+3); 1/(s+1), 1/(s+1)] has the zero +1 (Rosenbrock 1970): states one an entry that is not shared.
    const model = rationalModel(
      [
        [-1, 0, 0],
        [0, -3, 0],
        [0, 0, -1],
      ],
      [
        [1, 0],
        [0, 1],
        [0, 1],
      ],
      [
        [1, 2, 0],
        [1, 0, 1],
      ],
    );
    expect(zeros(model).zeros).toEqual([{ re: 1, im: 0, multiplicity: 1 }]);
  });

  test('of a state that nothing feeds include its pole, a decoupling zero', () => {
    const model = rationalModel(
      [
        [-1, 0],
        [0, -7],
      ],
      [[1], [0]],
      [[1, 1]],
    );
    expect(zeros(model).zeros).toEqual([{ re: -7, im: 0, multiplicity: 1 }]);
  });

  test('of a lag are none', () => {
    expect(zeros(rationalModel([[-1]], [[1]], [[1]])).zeros).toEqual([]);
  });

  test('of a large model are not computed, with the reason', () => {
    const n = 33;
    const diagonal = Array.from({ length: n }, (_, i) => Array.from({ length: n }, (_, j) => (i === j ? -1 : 0)));
    const model = rationalModel(
      diagonal,
      diagonal.map(() => [1]),
      [diagonal.map(() => 1)],
    );
    expect(zeros(model)).toEqual({
      route: 'not-computed',
      zeros: [],
      reason: 'Zeros are computed for up to 32 states; this model has 33.',
    });
  });
});
