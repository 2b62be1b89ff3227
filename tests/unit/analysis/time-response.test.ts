import { describe, expect, test } from 'vitest';
import {
  initialStateResponse,
  type StepResponse,
  stepResponse,
  stepValuesAt,
  timeResponse,
} from '../../../src/analysis/index.ts';
import { companionModel, rationalModel } from './rational-model.ts';

function computed(response: StepResponse) {
  if (response.status !== 'computed') throw new Error(response.reason);
  return response;
}

/** Largest distance between the first output and a function of time, relative to the function's largest value. */
function worst(response: StepResponse, wanted: (t: number) => number, output = 0): number {
  const { t, y } = computed(response);
  const values = Array.from(t, wanted);
  const size = Math.max(...values.map(Math.abs));
  return Math.max(...values.map((value, k) => Math.abs((y[output]?.[k] ?? NaN) - value))) / size;
}

const SISO = { input: 0, outputs: [0], points: 201 } as const;

/** ω²/(s² + 2 ζ ω s + ω²). */
const secondOrder = (zeta: number, omega: number) => companionModel([omega ** 2], [1, 2 * zeta * omega, omega ** 2]);

describe('step responses against their closed forms', () => {
  test.each([0.001, 0.1, 0.5, 0.9])(
    'second order with damping %f (Ogata, Modern Control Engineering, transient response)',
    zeta => {
      const omega = 3;
      const damped = omega * Math.sqrt(1 - zeta ** 2);
      const wanted = (t: number) =>
        1 - Math.exp(-zeta * omega * t) * (Math.cos(damped * t) + (zeta * omega * Math.sin(damped * t)) / damped);
      expect(worst(stepResponse(secondOrder(zeta, omega), { ...SISO, horizon: 20 }), wanted)).toBeLessThan(1e-13);
    },
  );

  test('critical damping', () => {
    const wanted = (t: number) => 1 - (1 + 3 * t) * Math.exp(-3 * t);
    expect(worst(stepResponse(secondOrder(1, 3), { ...SISO, horizon: 5 }), wanted)).toBeLessThan(1e-14);
  });

  test('an integrator makes a ramp, two a parabola', () => {
    expect(worst(stepResponse(companionModel([1], [1, 0]), { ...SISO, horizon: 8 }), t => t)).toBeLessThan(1e-15);
    expect(worst(stepResponse(companionModel([1], [1, 0, 0]), { ...SISO, horizon: 8 }), t => t ** 2 / 2)).toBeLessThan(
      1e-14,
    );
  });

  test('a gain alone answers at once', () => {
    const response = computed(stepResponse(rationalModel([], [], [[]], [['-2.5']]), SISO));
    expect(new Set(response.y[0])).toEqual(new Set([-2.5]));
    expect(response.horizon).toEqual({ duration: 1, reason: 'settled' });
  });

  test('a channel that is not connected stays at rest', () => {
    const model = rationalModel([[-1]], [[1]], [[0]]);
    expect(new Set(computed(stepResponse(model, SISO)).y[0])).toEqual(new Set([0]));
  });

  test('lags of a microsecond and of a minute in one response', () => {
    const [fast, slow] = [1e6, 1 / 60];
    const model = rationalModel(
      [
        ['-1e6', 0],
        ['1', '-1/60'],
      ],
      [['1e6'], [0]],
      [[0, '1/60']],
    );
    const wanted = (t: number) => -(fast * Math.expm1(-slow * t) - slow * Math.expm1(-fast * t)) / (fast - slow);
    for (const horizon of [1e-5, 1e-2, 300]) {
      expect(worst(stepResponse(model, { ...SISO, horizon }), wanted)).toBeLessThan(1e-13);
    }
  });

  test('several outputs are answered together, each in its place', () => {
    const model = rationalModel(
      [
        [-1, 0],
        [0, -2],
      ],
      [[1], [2]],
      [
        [1, 0],
        [0, 1],
        [1, 1],
      ],
    );
    const response = stepResponse(model, { ...SISO, outputs: [2, 0], horizon: 4 });
    expect(worst(response, t => 2 - Math.exp(-t) - Math.exp(-2 * t), 0)).toBeLessThan(1e-15);
    expect(worst(response, t => 1 - Math.exp(-t), 1)).toBeLessThan(1e-15);
  });

  test('times at one point each are the same as on the curve', () => {
    const model = secondOrder(0.2, 5);
    const { t, y } = computed(stepResponse(model, { ...SISO, horizon: 3 }));
    const single = stepValuesAt(model, { input: 0, output: 0 }, Array.from(t));
    const distance = Math.max(...Array.from(t, (_, k) => Math.abs((single?.[k] ?? NaN) - (y[0]?.[k] ?? NaN))));
    expect(distance).toBeLessThan(1e-14);
  });
});

describe('modes that the channel hides', () => {
  test('an unstable one does not get into the response by rounding', () => {
    // 1/(s − 20) behind (s − 20)/(s + 2): e²⁰·⁴⁰ would be 10³⁴⁷.
    const model = rationalModel(
      [
        [-2, 0],
        [-22, 20],
      ],
      [[1], [1]],
      [[0, 1]],
    );
    expect(worst(stepResponse(model, { ...SISO, horizon: 40 }), t => (1 - Math.exp(-2 * t)) / 2)).toBeLessThan(1e-14);
  });

  test('beside another output that shows it, both are right', () => {
    const model = rationalModel(
      [
        [-1, 0],
        [0, 1],
      ],
      [[1], [1]],
      [
        [1, 0],
        [1, 1],
      ],
    );
    const response = stepResponse(model, { ...SISO, outputs: [0, 1], horizon: 6 });
    expect(worst(response, t => -Math.expm1(-t), 0)).toBeLessThan(1e-15);
    expect(worst(response, t => -Math.expm1(-t) + Math.expm1(t), 1)).toBeLessThan(1e-14);
  });
});

describe('other excitations', () => {
  test('the impulse response of a lag', () => {
    const response = timeResponse(companionModel([3], [1, 2]), 'impulse', { ...SISO, horizon: 3 });
    expect(worst(response, t => 3 * Math.exp(-2 * t))).toBeLessThan(1e-14);
  });

  test('the ramp response of a lag trails by its time constant', () => {
    const response = timeResponse(companionModel([2], [1, 2]), 'ramp', { ...SISO, horizon: 10 });
    expect(worst(response, t => t - 0.5 + 0.5 * Math.exp(-2 * t))).toBeLessThan(1e-14);
  });

  test('the motion from the initial state reaches states that the input does not', () => {
    const model = rationalModel(
      [
        [-1, 0],
        [0, -3],
      ],
      [[1], [0]],
      [[1, 1]],
      undefined,
      [2, 5],
    );
    const response = initialStateResponse(model, { outputs: [0], points: 101, horizon: 4 });
    expect(worst(response, t => 2 * Math.exp(-t) + 5 * Math.exp(-3 * t))).toBeLessThan(1e-15);
  });
});

describe('the horizon that is chosen', () => {
  const horizonOf = (...of: Parameters<typeof companionModel>) =>
    computed(stepResponse(companionModel(...of), SISO)).horizon;

  test('a lag of 1 s is at rest, within 1 %, after 4.6 s: 6 s are shown', () => {
    expect(horizonOf([1], [1, 1])).toEqual({ duration: 6, reason: 'settled' });
  });

  test('a mode of no weight does not stretch it', () => {
    // (s + 0.001000001)/(s + 0.001) · 1/(s + 1): the slow pole's share is 10⁻⁶.
    expect(horizonOf([1, 0.001000001], [1, 1.001, 0.001]).duration).toBe(6);
  });

  test('a mode of weight does', () => {
    // 1 − 0.9 e^(−t) − 0.1 e^(−t/100): a tenth is left to the slow pole.
    expect(horizonOf([0.901, 0.01], [1, 1.01, 0.01]).duration).toBeGreaterThan(200);
  });

  test('a lightly damped oscillation is cut after 40 periods', () => {
    const { duration, reason } = computed(stepResponse(secondOrder(0.001, 2 * Math.PI), SISO)).horizon;
    expect(reason).toBe('oscillation');
    expect(duration).toBe(40);
  });

  test('an unstable response is shown while it grows by e⁵', () => {
    expect(horizonOf([1], [1, -2])).toEqual({ duration: 2.5, reason: 'growth' });
  });

  test('an undamped oscillation is shown for 8 periods, an integrator for 10 s, beside a lag for 8 of its time constants', () => {
    expect(
      horizonOf(
        [1],
        [1, 0, (2 * Math.PI) ** 2].map(x => Number(x.toFixed(9))),
      ),
    ).toEqual({ duration: 8, reason: 'drift' });
    expect(horizonOf([1], [1, 0])).toEqual({ duration: 10, reason: 'drift' });
    expect(horizonOf([1], [1, 10, 0])).toEqual({ duration: 0.8, reason: 'drift' });
  });

  test('a given one is taken', () => {
    const response = computed(stepResponse(companionModel([1], [1, 1]), { ...SISO, horizon: 0.7 }));
    expect(response.horizon).toEqual({ duration: 0.7, reason: 'asked' });
    expect(response.t[200]).toBe(0.7);
  });

  test('of several outputs is the longest', () => {
    const model = rationalModel(
      [
        [-1, 0],
        [0, -100],
      ],
      [[1], [100]],
      [
        [0, 1],
        [1, 0],
      ],
    );
    expect(computed(stepResponse(model, { ...SISO, outputs: [0] })).horizon.duration).toBe(0.06);
    expect(computed(stepResponse(model, { ...SISO, outputs: [0, 1] })).horizon.duration).toBe(6);
  });
});

test('dead time, where the drawing has it, is said to be approximated', () => {
  const model = companionModel([1], [1, 1]);
  expect(computed(stepResponse(model, SISO)).approximatesDeadTime).toBe(false);
  expect(computed(stepResponse(model, { ...SISO, hasDeadTime: true })).approximatesDeadTime).toBe(true);
});
