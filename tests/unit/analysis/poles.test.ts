import { describe, expect, test } from 'vitest';
import { dampingRatio, naturalFrequency, poles, timeConstant } from '../../../src/analysis/index.ts';
import { inDoubles, rationalModel } from './rational-model.ts';

/** n lags with time constants 1, 1/2, 1/3, … in a row. */
function lags(n: number) {
  const A = Array.from({ length: n }, (_, i) =>
    Array.from({ length: n }, (_, j) => (i === j ? -(i + 1) : j === i - 1 ? i + 1 : 0)),
  );
  const B = Array.from({ length: n }, (_, i) => [i === 0 ? 1 : 0]);
  const C = [Array.from({ length: n }, (_, j) => (j === n - 1 ? 1 : 0))];
  return rationalModel(A, B, C);
}

describe('poles', () => {
  test('come by real part, then imaginary part, both descending, pairs as two entries', () => {
    const model = rationalModel(
      [
        [0, 1, 0, 0],
        [-25, -6, 0, 0],
        [0, 0, -3, 0],
        [0, 0, 0, -3],
      ],
      [[0], [1], [1], [1]],
      [[1, 0, 0, 0]],
    );
    expect(poles(model)).toEqual({
      route: 'certified',
      standsIn: false,
      poles: [
        { re: -3, im: 4, multiplicity: 1 },
        { re: -3, im: 0, multiplicity: 2 },
        { re: -3, im: -4, multiplicity: 1 },
      ],
    });
  });

  test('of a model derived in doubles are certified for those doubles', () => {
    expect(poles(inDoubles(rationalModel([['-0.1']], [[1]], [[1]])))).toEqual({
      route: 'certified',
      standsIn: true,
      poles: [{ re: -0.1, im: 0, multiplicity: 1 }],
    });
  });

  test('of a model with an irrational quantity say that a double stands in', () => {
    const model = { ...rationalModel([[-2]], [[1]], [[1]]), irrational: ['k = sqrt(2)'] };
    expect(poles(model)).toMatchObject({ route: 'certified', standsIn: true });
  });

  test('are certified up to 32 states, in doubles beyond, certified again where more time is allowed', () => {
    expect(poles(lags(32)).route).toBe('certified');
    const floating = poles(lags(33));
    expect(floating.route).toBe('floating');
    expect(floating.poles).toHaveLength(33);
    expect(floating.poles[0]).toEqual({ re: -1, im: 0, multiplicity: 1 });
    expect(poles(lags(33), 'high').route).toBe('certified');
  });

  test('of an empty model are none', () => {
    expect(poles(rationalModel([], [], []))).toEqual({ route: 'certified', poles: [], standsIn: false });
  });
});

describe('figures of a pole', () => {
  test('3 + 4j to the left: 5 rad/s, damping 0.6, a third of a second', () => {
    expect(naturalFrequency({ re: -3, im: 4 })).toBe(5);
    expect(dampingRatio({ re: -3, im: 4 })).toBe(0.6);
    expect(timeConstant({ re: -3, im: 4 })).toBe(1 / 3);
  });

  test('a real pole is fully damped, one to the right grows with damping −1 and has no time constant', () => {
    expect(dampingRatio({ re: -0.5, im: 0 })).toBe(1);
    expect(dampingRatio({ re: 0.5, im: 0 })).toBe(-1);
    expect(timeConstant({ re: 0.5, im: 0 })).toBeNull();
  });

  test('a pole on the axis is undamped, one at the origin has no damping to speak of', () => {
    expect(dampingRatio({ re: 0, im: 7 })).toBe(0);
    expect(timeConstant({ re: 0, im: 7 })).toBeNull();
    expect(dampingRatio({ re: 0, im: 0 })).toBeNull();
    expect(naturalFrequency({ re: 0, im: 0 })).toBe(0);
  });
});
