import { describe, expect, test } from 'vitest';
import {
  hiddenModes,
  hiddenModeWarnings,
  isControllable,
  isObservable,
  kalmanRanks,
} from '../../../src/analysis/index.ts';
import { companionModel, rationalModel } from './rational-model.ts';

describe('controllability and observability', () => {
  test('a companion form is controllable; it is observable where nothing cancels', () => {
    expect(isControllable(companionModel([1], [1, 3, 2])).holds).toBe(true);
    expect(isObservable(companionModel([1], [1, 3, 2])).holds).toBe(true);
    expect(isObservable(companionModel([1, 1], [1, 3, 2])).holds).toBe(false);
    expect(kalmanRanks(companionModel([1, 1], [1, 3, 2]))).toEqual({ controllable: 2, observable: 1 });
  });

  test('a cancellation missed by 10⁻³⁰ is none', () => {
    const model = rationalModel(
      [
        [-1, 0],
        [1, -2],
      ],
      [[1], [0]],
      [['1.000000000000000000000000000001', -1]],
    );
    const exact = rationalModel(
      [
        [-1, 0],
        [1, -2],
      ],
      [[1], [0]],
      [[1, -1]],
    );
    expect(isObservable(exact).holds).toBe(false);
    expect(isObservable(model).holds).toBe(true);
  });

  test('without inputs a model is not controllable, without outputs not observable, without states both', () => {
    const alone = rationalModel([[-1]], [[]], []);
    expect(isControllable(alone).holds).toBe(false);
    expect(isObservable(alone).holds).toBe(false);
    expect(isControllable(rationalModel([], [], [])).holds).toBe(true);
    expect(isObservable(rationalModel([], [], [])).holds).toBe(true);
  });

  test('a large model is left open', () => {
    const n = 33;
    const A = Array.from({ length: n }, (_, i) => Array.from({ length: n }, (_, j) => (i === j ? -1 - i : 0)));
    const model = rationalModel(
      A,
      A.map(() => [1]),
      [A.map(() => 1)],
    );
    expect(isControllable(model).holds).toBeNull();
    expect(hiddenModes(model)).toBeNull();
    expect(isControllable(model, 'high').holds).toBe(true);
    expect(hiddenModes(model, 'high')).toEqual([]);
  });
});

describe('hidden modes', () => {
  test('a zero that cancels a pole hides it from the output', () => {
    expect(hiddenModes(companionModel([1, 1], [1, 3, 2]))).toEqual([
      { re: -1, im: 0, multiplicity: 1, isUncontrollable: false, isUnobservable: true },
    ]);
  });

  test('two equal lags behind one input share one way in: one of the two poles is hidden', () => {
    const model = rationalModel(
      [
        [-2, 0],
        [0, -2],
      ],
      [[1], [3]],
      [
        [1, 0],
        [0, 1],
      ],
    );
    expect(hiddenModes(model)).toEqual([
      { re: -2, im: 0, multiplicity: 1, isUncontrollable: true, isUnobservable: false },
    ]);
  });

  test('the same two with inputs of their own show both poles: McMillan counts minors too', () => {
    const model = rationalModel(
      [
        [-2, 0],
        [0, -2],
      ],
      [
        [1, 0],
        [0, 1],
      ],
      [
        [1, 0],
        [0, 1],
      ],
    );
    expect(hiddenModes(model)).toEqual([]);
  });

  test('the four parts of Kalman: reached and seen, reached only, seen only, neither', () => {
    const model = rationalModel(
      [
        [-1, 0, 0, 0],
        [0, -2, 0, 0],
        [0, 0, -3, 0],
        [0, 0, 0, -4],
      ],
      [[1], [1], [0], [0]],
      [[1, 0, 1, 0]],
    );
    expect(hiddenModes(model)).toEqual([
      { re: -2, im: 0, multiplicity: 1, isUncontrollable: false, isUnobservable: true },
      { re: -3, im: 0, multiplicity: 1, isUncontrollable: true, isUnobservable: false },
      { re: -4, im: 0, multiplicity: 1, isUncontrollable: true, isUnobservable: true },
    ]);
  });

  test('a model without outputs has no transfer function, so none is said to hide anything', () => {
    expect(hiddenModes(rationalModel([[-1]], [[1]], []))).toEqual([]);
  });
});

describe('warnings of hidden modes', () => {
  test('name the pole, the reason and the blocks', () => {
    const model = rationalModel(
      [
        [-1, 0, 0],
        [0, -7, 0],
        [0, 0, -3],
      ],
      [[1], [0], [1]],
      [[1, 1, 1]],
    );
    expect(hiddenModeWarnings(model)).toEqual([
      {
        code: 'hidden-mode',
        blocks: ['x2'],
        message: 'The pole −7 appears in no transfer function: no input reaches it.',
      },
    ]);
  });

  test('a pair is one warning; one that does not decay is pressed', () => {
    const model = rationalModel(
      [
        [0, 1, 0],
        [-4, 0, 0],
        [0, 0, -1],
      ],
      [[0], [1], [1]],
      [[0, 0, 1]],
    );
    expect(hiddenModeWarnings(model)).toEqual([
      {
        code: 'hidden-mode',
        blocks: ['x1', 'x2'],
        message:
          'The pole pair ± 2 j appears in no transfer function: no output shows it. It does not decay: check it before relying on any transfer function.',
      },
    ]);
  });

  test('an unstable pole that a zero cancels names the states that mix it', () => {
    // 1/(s − 1) behind (s − 1)/(s + 2)
    const model = rationalModel(
      [
        [-2, 0],
        [-3, 1],
      ],
      [[1], [1]],
      [[0, 1]],
    );
    expect(hiddenModeWarnings(model)).toEqual([
      {
        code: 'hidden-mode',
        blocks: ['x1', 'x2'],
        message:
          'The pole 1 appears in no transfer function: no input reaches it. It does not decay: check it before relying on any transfer function.',
      },
    ]);
  });

  test('a minimal model has none', () => {
    expect(hiddenModeWarnings(companionModel([1], [1, 3, 2]))).toEqual([]);
  });
});
