import { describe, expect, test } from 'vitest';
import { stepMetrics } from '../../../src/analysis/index.ts';
import type { StateSpace } from '../../../src/compile/index.ts';
import { companionModel, rationalModel } from './rational-model.ts';

const metrics = (model: StateSpace) => stepMetrics(model, { input: 0, output: 0 });

function expectNear(value: number | null, wanted: number, relative = 1e-12) {
  expect(Math.abs((value ?? NaN) - wanted)).toBeLessThanOrEqual(relative * Math.abs(wanted));
}

describe('second order against its formulas (Ogata, Modern Control Engineering, transient-response specifications)', () => {
  test.each([0.001, 0.05, 0.3, 0.5, 0.7, 0.9, 0.99])('damping %f', zeta => {
    const omega = 40;
    const found = metrics(companionModel([omega ** 2], [1, 2 * zeta * omega, omega ** 2]));
    const root = Math.sqrt(1 - zeta ** 2);
    expectNear(found.overshootPercent, 100 * Math.exp((-Math.PI * zeta) / root), zeta > 0.9 ? 1e-5 : 1e-11);
    expectNear(found.peakTime, Math.PI / (omega * root), zeta > 0.9 ? 1e-6 : 1e-11);
    expectNear(found.peak, 1 + Math.exp((-Math.PI * zeta) / root));
    expect(found).toMatchObject({ finalValue: 1, status: 'computed', route: 'certified' });
  });

  test('the 2 % settling time is where the last swing enters the band', () => {
    // At damping 0.5 and 1 rad/s: 1 − y = e^(−t/2) sin(√3/2 t + π/3) · 2/√3 = ±0.02.
    const found = metrics(companionModel([1], [1, 1, 1]));
    const t = found.settlingTime2percent ?? NaN;
    const rest = (Math.exp(-t / 2) * Math.sin((Math.sqrt(3) / 2) * t + Math.PI / 3) * 2) / Math.sqrt(3);
    expectNear(Math.abs(rest), 0.02, 1e-10);
    expect(t).toBeGreaterThan(8);
    expect(t).toBeLessThan(8.2);
  });
});

describe('first order', () => {
  test('rises in τ ln 9 and settles in τ ln 50, without overshoot', () => {
    const found = metrics(companionModel([6], [1, 2]));
    expectNear(found.riseTime10to90, 0.5 * Math.log(9));
    expectNear(found.settlingTime2percent, 0.5 * Math.log(50));
    expect(found).toMatchObject({ finalValue: 3, overshootPercent: 0, peak: null, peakTime: null });
  });

  test('of negative gain has the same figures, its final value negative', () => {
    const found = metrics(companionModel([-6], [1, 2]));
    expectNear(found.riseTime10to90, 0.5 * Math.log(9));
    expectNear(found.settlingTime2percent, 0.5 * Math.log(50));
    expect(found).toMatchObject({ finalValue: -3, overshootPercent: 0, peak: null });
  });

  test('a lead overshoots at once and never has to rise', () => {
    // (3 s + 1)/(s + 1): y = 1 + 2 e^(−t)
    const found = metrics(companionModel([3, 1], [1, 1]));
    expect(found).toMatchObject({ finalValue: 1, peak: 3, peakTime: 0, riseTime10to90: 0 });
    expectNear(found.overshootPercent, 200);
    expectNear(found.settlingTime2percent, Math.log(100));
  });

  test('a lag that starts half way rises from there: time at 10 % is 0', () => {
    // (0.5 s + 1)/(s + 1): y = 1 − 0.5 e^(−t)
    expectNear(metrics(companionModel([0.5, 1], [1, 1])).riseTime10to90, Math.log(5));
  });
});

describe('responses with something of their own', () => {
  test('one that starts the wrong way is timed from its first crossings', () => {
    // (1 − s)/(s + 1)²: y = 1 − (1 + 2 t) e^(−t)
    const found = metrics(companionModel([-1, 1], [1, 2, 1]));
    const y = (t: number) => 1 - (1 + 2 * t) * Math.exp(-t);
    expectNear(0.98, y(found.settlingTime2percent ?? NaN), 1e-12);
    expect(found.settlingTime2percent).toBeGreaterThan(5);
    expect(found.overshootPercent).toBe(0);
  });

  test('a microsecond ring on a response of minutes is found', () => {
    // 0.9 · 10¹²/(s² + 2·10⁵ s + 10¹²) + 0.1/(60 s + 1), side by side: the ring's peak is over long before the minute starts.
    const model = rationalModel(
      [
        [0, 1, 0],
        ['-1e12', '-2e5', 0],
        [0, 0, '-1/60'],
      ],
      [[0], ['9e11'], ['1/600']],
      [[1, 0, 1]],
    );
    const found = metrics(model);
    const root = Math.sqrt(1 - 0.1 ** 2);
    const peak = 0.9 * (1 + Math.exp((-Math.PI * 0.1) / root));
    expectNear(found.peak, peak, 1e-7); // the slow lag adds 0.1 · 5·10⁻⁸ by then
    expectNear(found.peakTime, Math.PI / (1e6 * root), 1e-6);
    expectNear(found.settlingTime2percent, 60 * Math.log(5), 1e-9);
  });

  test('a turn soon after a start without slope is found between two points of rising slope', () => {
    // With P(k) the step response of k lags of 1/1.3 s: y = −0.1 + (−0.001 P(2) + 0.006 P(3)) / 1.69, lowest at 1.3 t = 1/3.
    const model = rationalModel(
      [
        ['-1.3', 0, 0, 0],
        ['0.1', '-1.3', '-0.2', 0],
        [0, 0, '-1.3', '0.3'],
        [0, 0, 0, '-1.3'],
      ],
      [['-0.1'], [0], [0], ['-1.3']],
      [[0, '0.1', 0, 0]],
      [['-0.1']],
    );
    const found = metrics(model);
    expectNear(found.peakTime, 1 / 3.9);
    expectNear(found.finalValue, -0.1 + 0.005 / 1.69);
  });

  test('eight equal lags settle without overshoot', () => {
    let denominator = [1];
    for (let k = 0; k < 8; k++) denominator = [...denominator, 0].map((x, i) => x + (denominator[i - 1] ?? 0));
    const found = metrics(companionModel([1], denominator));
    const rest = (t: number) => {
      let [sum, term] = [0, 1];
      for (let k = 0; k < 8; k++) {
        sum += term;
        term *= t / (k + 1);
      }
      return sum * Math.exp(-t);
    };
    expectNear(rest(found.settlingTime2percent ?? NaN), 0.02, 1e-11);
    expect(found.overshootPercent).toBe(0);
  });

  test('a response within 2 % from the start has settled at 0', () => {
    // (0.99 s + 1)/(s + 1)
    expect(metrics(companionModel([0.99, 1], [1, 1]))).toMatchObject({ settlingTime2percent: 0, riseTime10to90: 0 });
  });

  test('a gain alone has risen and settled at once', () => {
    expect(metrics(rationalModel([], [], [[]], [[4]]))).toMatchObject({
      finalValue: 4,
      overshootPercent: 0,
      riseTime10to90: 0,
      settlingTime2percent: 0,
    });
  });
});

describe('figures that do not exist are null', () => {
  const NONE = { overshootPercent: null, peak: null, peakTime: null, riseTime10to90: null, settlingTime2percent: null };

  test('an unstable and a marginal response settle nowhere', () => {
    expect(metrics(companionModel([1], [1, -1]))).toMatchObject({ finalValue: null, ...NONE, status: 'computed' });
    expect(metrics(companionModel([1], [1, 0, 1]))).toMatchObject({ finalValue: null, ...NONE, status: 'computed' });
  });

  test('a washout comes back to zero, of which nothing is a share', () => {
    expect(metrics(companionModel([1, 0], [1, 1]))).toMatchObject({ finalValue: 0, ...NONE, status: 'computed' });
  });

  test('an unstable mode that the channel hides leaves its response with all figures', () => {
    const model = rationalModel(
      [
        [-2, 0],
        [-22, 20],
      ],
      [[1], [1]],
      [[0, 1]],
    );
    const found = metrics(model);
    expect(found.finalValue).toBe(0.5);
    expectNear(found.settlingTime2percent, 0.5 * Math.log(50));
  });
});

test('of a model too large for exact answers the figures rest on doubles', () => {
  const n = 40;
  const A = Array.from({ length: n }, (_, i) => Array.from({ length: n }, (_, j) => (i === j ? -2 : 0)));
  const model = rationalModel(
    A,
    A.map(() => [2]),
    [A.map(() => '1/40')],
  );
  const found = metrics(model);
  expect(found.route).toBe('floating');
  expectNear(found.finalValue, 1);
  expectNear(found.settlingTime2percent, 0.5 * Math.log(50));
});

test('a response that swings a million times before it settles is not followed, and says so', () => {
  const found = metrics(companionModel([1], [1, 2e-7, 1]));
  expect(found).toMatchObject({ finalValue: 1, settlingTime2percent: null, peak: null, status: 'not-computed' });
});
