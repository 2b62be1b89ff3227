import { describe, expect, test } from 'vitest';
import { toFraction } from '../../../../src/algebra/index.ts';
import { channelStates, minimalModel, structureReport } from '../../../../src/analysis/minimal/index.ts';
import type { StateSpace } from '../../../../src/compile/index.ts';
import { companionModel, inDoubles, rationalModel } from '../rational-model.ts';

function minimalOf(model: StateSpace) {
  const found = minimalModel(model);
  if (found === null) throw new Error('too large');
  return { ...found, rows: found.change.map(row => row.map(toFraction)), names: found.model.states.map(s => s.name) };
}

const entries = (values: ArrayLike<number>) => Array.from(values);

describe('the minimal model', () => {
  // (s + 1)/((s + 1)(s + 2)) = 1/(s + 2), by cancelling.
  test('of a companion form with a common factor has the cancelled pole left out', () => {
    const { model, rows, names } = minimalOf(companionModel([1, 1], [1, 3, 2]));
    expect(rows).toEqual([['1', '1']]);
    expect(names).toEqual(['z_1']);
    expect(entries(model.numeric.A.values)).toEqual([-2]);
    expect(entries(model.numeric.B.values)).toEqual([1]);
    expect(entries(model.numeric.C.values)).toEqual([1]);
  });

  test('of a minimal model is the model itself', () => {
    const whole = companionModel([1], [1, 3, 2]);
    const { model, rows } = minimalOf(whole);
    expect(model).toBe(whole);
    expect(rows).toEqual([
      ['1', '0'],
      ['0', '1'],
    ]);
  });

  test('keeps a state of the drawing under its name where it can', () => {
    // x1 is driven and shown; x2 is driven and not shown; x3 is not driven and shown.
    const whole = rationalModel(
      [
        [-1, 0, 2],
        [1, -2, 0],
        [0, 0, -3],
      ],
      [[1], [0], [0]],
      [[1, 0, 1]],
    );
    const { names, rows } = minimalOf(whole);
    expect(names).toEqual(['x1']);
    expect(rows).toEqual([['1', '0', '0']]);
  });

  test('says where the initial state holds something that no input reaches', () => {
    const at = (initial: readonly number[]) =>
      minimalOf(
        rationalModel(
          [
            [-1, 0],
            [0, -2],
          ],
          [[1], [0]],
          [[1, 1]],
          undefined,
          initial,
        ),
      );
    expect(at([5, 0]).losesInitialState).toBe(false);
    expect(at([5, 0]).model.initialState).toEqual([5]);
    expect(at([5, 1]).losesInitialState).toBe(true);
  });

  test('has no state where nothing is reached or shown', () => {
    expect(minimalOf(rationalModel([[-1]], [[0]], [[1]])).model.states).toEqual([]);
    expect(minimalOf(rationalModel([[-1]], [[1]], [[0]])).model.states).toEqual([]);
  });

  test('is not computed for more states than exact answers allow, and stays in doubles where the model is', () => {
    const n = 33;
    const A = Array.from({ length: n }, (_, i) => Array.from({ length: n }, (_, j) => (i === j ? -1 - i : 0)));
    const large = rationalModel(
      A,
      A.map(() => [1]),
      [A.map(() => 1)],
    );
    expect(minimalModel(large)).toBeNull();
    expect(minimalOf(inDoubles(companionModel([1, 1], [1, 3, 2]))).model.rational).toBeNull();
  });
});

describe('the structure report', () => {
  // Two identical lags side by side: 1/(s+1) + 1/(s+1). Their difference is never moved and not shown (Kalman 1963, parallel connection).
  test('of two equal lags in parallel binds the second to the first and shows both in the hidden mode', () => {
    const report = structureReport(
      rationalModel(
        [
          [-1, 0],
          [0, -1],
        ],
        [[1], [1]],
        [[1, 1]],
      ),
    );
    expect(report).toMatchObject({ states: 2, reached: 1, seen: 1, minimal: 1 });
    expect(report?.modes).toMatchObject([
      { re: -1, im: 0, multiplicity: 1, isUncontrollable: true, isUnobservable: true, states: [0, 1], isOwn: true },
    ]);
    expect(report?.contributions.map(({ role }) => role)).toEqual(['kept', 'bound']);
    expect(report?.contributions[1]?.boundTo).toEqual([{ state: 0, factor: { n: 1n, d: 1n } }]);
  });

  test('tells two hidden modes and their states apart', () => {
    // x2 (pole −2) is not driven, x3 (pole −5) is not shown.
    const report = structureReport(
      rationalModel(
        [
          [-1, 0, 0],
          [0, -2, 0],
          [0, 0, -5],
        ],
        [[1], [0], [1]],
        [[1, 1, 0]],
      ),
    );
    expect(report?.modes).toMatchObject([
      { re: -2, isUncontrollable: true, isUnobservable: false, states: [1] },
      { re: -5, isUncontrollable: false, isUnobservable: true, states: [2] },
    ]);
    expect(report?.contributions).toMatchObject([
      { role: 'kept', movedBy: [0], seenIn: [0] },
      { role: 'unreached', movedBy: [], seenIn: [0] },
      { role: 'unseen', movedBy: [0], seenIn: [] },
    ]);
  });

  test('finds the states of a hidden pair', () => {
    // x2, x3 swing with s² + 2 s + 5 and nothing drives them.
    const report = structureReport(
      rationalModel(
        [
          [-1, 1, 0],
          [0, 0, 1],
          [0, -5, -2],
        ],
        [[1], [0], [0]],
        [[1, 0, 0]],
      ),
    );
    // The left eigenvectors of the pair have no part in x1, which is driven.
    expect(report?.modes).toMatchObject([{ re: -1, im: 2, isUncontrollable: true, states: [1, 2], isOwn: true }]);
  });

  test('takes modes without short factors together, and says so', () => {
    // Neither 1 + √2 nor its partner is a fraction: s² − 2 s − 1.
    const report = structureReport(
      rationalModel(
        [
          [-1, 0, 0],
          [0, 0, 1],
          [0, 1, 2],
        ],
        [[1], [0], [0]],
        [[1, 0, 0]],
      ),
    );
    expect(report?.modes?.map(({ states, isOwn }) => [states, isOwn])).toEqual([
      [[1, 2], false],
      [[1, 2], false],
    ]);
  });
});

test('a channel’s states are those its input reaches and its output shows', () => {
  const model = rationalModel(
    [
      [-1, 0],
      [0, -2],
    ],
    [
      [1, 0],
      [0, 1],
    ],
    [
      [1, 0],
      [1, 1],
    ],
  );
  expect(channelStates(model)).toEqual([
    [[0], []],
    [[0], [1]],
  ]);
});
