/**
 * Simulations against solutions by hand: dead time by the method of steps (Bellman & Cooke 1963, Differential-Difference Equations),
 * limiters piece by piece, and a general-purpose Runge-Kutta integration for what has no closed form.
 */

import { describe, expect, test } from 'vitest';
import { type Simulation, type Stimulus, sampled, simulate } from '../../../../src/analysis/index.ts';
import { openedModel } from '../../../../src/compile/index.ts';
import { type Block, type Diagram, readDiagram } from '../../../../src/diagram/index.ts';
import { draw, gain, group, input, integrator, output, quotient, sheet, sum } from '../../../arbitraries/draw.ts';
import lagging from '../../../reference/cases/dead-time-loop-margins-and-steps.json';
import positioner from '../../../reference/cases/rate-limited-positioner.json';
import { valueOf } from '../../results.ts';

const delay = (id: string, time: string): Block => ({ id, kind: 'delay', time });
const limiter = (id: string, lower: string, upper: string): Block => ({ id, kind: 'limiter', lower, upper });
const STEP: Stimulus = { kind: 'step', size: 1 };

interface Run {
  readonly stimulus?: Stimulus;
  readonly horizon?: number;
  readonly clips?: boolean;
  readonly fromInitial?: boolean;
}

function run(
  diagram: Diagram,
  { stimulus = STEP, horizon = 8, clips = true, fromInitial = false }: Run = {},
): Simulation {
  const opened = valueOf(openedModel(diagram));
  const outputs = opened.outputs.map((_, i) => i);
  return simulate({
    opened,
    input: opened.inputs.length > 0 ? 0 : null,
    stimulus,
    outputs,
    horizon,
    clips,
    fromInitial,
  });
}

/** The first output at the times. */
function at(diagram: Diagram, times: readonly number[], options: Run = {}): Float64Array {
  const found = run(diagram, { horizon: Math.max(...times), ...options });
  if (found.status !== 'computed') throw new Error(found.reason);
  return sampled(found, times)[0] ?? new Float64Array();
}

function expectClose(found: ArrayLike<number>, expected: readonly number[], tolerance = 1e-12): void {
  expect(found).toHaveLength(expected.length);
  expected.forEach((value, k) => {
    expect(Math.abs((found[k] ?? Number.NaN) - value), `sample ${k}`).toBeLessThan(
      tolerance * Math.max(1, Math.abs(value)),
    );
  });
}

const EVERY_TENTH = Array.from({ length: 81 }, (_, k) => k / 10);

describe('true dead time', () => {
  test('an integrator behind a transport lag in a loop has its polynomial pieces', () => {
    const { t, yExact } = lagging.expect.step;
    const expected = yExact.map(text => text.split('/').map(Number)).map(([n = 0, d = 1]) => n / d);
    expectClose(at(valueOf(readDiagram(JSON.stringify(lagging.diagram))), t), expected);
  });

  test('by itself it hands its input on later, jumps and all', () => {
    const chain = draw([input('u'), delay('d', '0.3'), output('y')], ['u -> d', 'd -> y']);
    expectClose(at(chain, [0, 0.1, 0.2999, 0.3001, 0.5, 1]), [0, 0, 0, 1, 1, 1]);
    const pulse: Stimulus = { kind: 'pulse', size: 2, width: 0.25 };
    expectClose(at(chain, [0.2, 0.4, 0.54, 0.56, 1], { stimulus: pulse }), [0, 2, 2, 0, 0]);
  });

  test('in a loop without a state the answer climbs by stairs', () => {
    // y = u − y(t − 1)/2: Σ (−1/2)ᵏ over the whole seconds that have passed
    const stairs = draw(
      [input('u'), sum('e', '+-'), delay('d', '1'), gain('g', '1/2'), output('y')],
      ['u -> e', 'e -> y', 'e -> d', 'd -> g', 'g -> e:1'],
    );
    const times = [0.5, 1.5, 2.5, 3.5, 10.5];
    const expected = times.map(t =>
      Array.from({ length: Math.floor(t) + 1 }, (_, k) => (-0.5) ** k).reduce((a, b) => a + b),
    );
    expectClose(at(stairs, times), expected);
  });

  test('two dead times that have no common measure', () => {
    // y′ = −y(t − 1) … as y = Σ (−1)ᵏ (t − k)^(k + 1) / (k + 1)!, seen through a second lag of √2 s
    const series = (t: number) => {
      let [value, factorial] = [0, 1];
      for (let k = 0; k <= t; k++) {
        factorial *= k + 1;
        value += ((-1) ** k * (t - k) ** (k + 1)) / factorial;
      }
      return value;
    };
    const drawing = draw(
      [input('u'), sum('e', '+-'), integrator('x'), delay('d', '1'), delay('late', 'sqrt(2)'), output('y')],
      ['u -> e', 'e -> x', 'x -> d', 'd -> e:1', 'x -> late', 'late -> y'],
    );
    const expected = EVERY_TENTH.map(t => (t < Math.SQRT2 ? 0 : series(t - Math.SQRT2)));
    expectClose(at(drawing, EVERY_TENTH), expected, 2e-12);
  });

  test('inside a group it is the same', () => {
    const inner = sheet([input('a'), delay('d', '1'), output('b')], ['a -> d', 'd -> b']);
    const drawing = draw(
      [input('u'), group('lag', inner), integrator('x'), output('y')],
      ['u -> lag', 'lag -> x', 'x -> y'],
    );
    expectClose(at(drawing, [0.5, 1, 2.5, 4]), [0, 0, 1.5, 3]);
  });

  test('one that is too short beside the time that is shown is said, not approximated', () => {
    const drawing = draw([input('u'), delay('d', '1e-5'), output('y')], ['u -> d', 'd -> y']);
    expect(run(drawing, { horizon: 10 })).toEqual({
      status: 'not-computed',
      reason: 'A dead time of 0.00001 s is too short beside 10 s to be followed step by step. Show a shorter time.',
    });
  });

  test('an impulse that reaches it at once is refused', () => {
    const drawing = draw([input('u'), delay('d', '1'), output('y')], ['u -> d', 'd -> y']);
    expect(run(drawing, { stimulus: { kind: 'impulse', size: 1 } })).toEqual({
      status: 'not-computed',
      reason: 'An impulse reaches a dead time or a limiter at once, where it is no function of time.',
    });
  });
});

describe('limiters that act', () => {
  test('a positioner runs at top speed, then settles exponentially', () => {
    const diagram = valueOf(readDiagram(JSON.stringify(positioner.diagram)));
    const exact = (t: number) => (t <= 0.75 ? t : 1 - 0.25 * Math.exp(-4 * (t - 0.75)));
    expectClose(at(diagram, EVERY_TENTH), EVERY_TENTH.map(exact));
    expectClose(at(diagram, positioner.expect.step.t), positioner.expect.step.y, 1e-6);
  });

  test('where they do not act, the answer is the linear one', () => {
    const diagram = valueOf(readDiagram(JSON.stringify(positioner.diagram)));
    expectClose(
      at(diagram, EVERY_TENTH, { clips: false }),
      EVERY_TENTH.map(t => 1 - Math.exp(-4 * t)),
    );
  });

  test('in an algebraic loop the loop is solved anew for each state of the limiter', () => {
    // w = u − 3 sat(w): inside u / 4, beyond u − 3
    const drawing = draw(
      [input('u'), sum('e', '+-'), limiter('l', '-1', '1'), gain('g', '3'), output('y')],
      ['u -> e', 'e -> l', 'l -> g', 'g -> e:1', 'e -> y'],
    );
    const ramp: Stimulus = { kind: 'ramp', size: 1 };
    expectClose(
      at(drawing, EVERY_TENTH, { stimulus: ramp }),
      EVERY_TENTH.map(t => (t <= 4 ? t / 4 : t - 3)),
      1e-11,
    );
  });

  test('a controller that winds up, against Runge-Kutta', () => {
    // PI on two lags through a valve of ±0.6: x₁′ = −2 x₁ + 2 v, x₂′ = x₁ − x₂, q′ = 1 − x₂, v = sat(1 − x₂ + q)
    const drawing = draw(
      [
        input('r'),
        sum('e', '+-'),
        integrator('q'),
        sum('c', '++'),
        limiter('valve', '-0.6', '0.6'),
        quotient('first', '2', 's + 2'),
        gain('double', '2'),
        quotient('second', '1', 's + 1'),
        output('y'),
      ],
      [
        'r -> e',
        'e -> q',
        'e -> c',
        'q -> c:1',
        'c -> valve',
        'valve -> first',
        'first -> double',
        'double -> second',
        'second -> y',
        'second -> e:1',
      ],
    );
    const rate = ([a = 0, b = 0, q = 0]: readonly number[]) => {
      const v = Math.max(-0.6, Math.min(0.6, 1 - b + q));
      return [-2 * a + 2 * v, 2 * a - b, 1 - b];
    };
    const times = [1, 2, 4, 6, 8];
    expectClose(
      at(drawing, times),
      rungeKutta(rate, [0, 0, 0], times).map(([, b = 0]) => b),
      1e-8,
    );
  });

  test('several limiters and a dead time in one loop, against Runge-Kutta with a history', () => {
    // x′ = sat₁(2 (sat₂(r) − x(t − 0.5))), r a sine
    const drawing = draw(
      [
        input('r'),
        limiter('ref', '-0.7', '0.7'),
        sum('e', '+-'),
        gain('g', '2'),
        limiter('rate', '-1', '0.8'),
        integrator('x'),
        delay('d', '0.5'),
        output('y'),
      ],
      ['r -> ref', 'ref -> e', 'e -> g', 'g -> rate', 'rate -> x', 'x -> d', 'd -> e:1', 'x -> y'],
    );
    const sine: Stimulus = { kind: 'sine', size: 1, omega: 1.3 };
    const step = 1e-4;
    const history = [0];
    const clip = (v: number, low: number, high: number) => Math.max(low, Math.min(high, v));
    const rateAt = (t: number) => {
      const place = (t - 0.5) / step;
      const k = Math.floor(place + 1e-9);
      const past = k < 0 ? 0 : history[k]! + (place - k) * ((history[k + 1] ?? history[k]!) - history[k]!);
      return clip(2 * (clip(Math.sin(1.3 * t), -0.7, 0.7) - past), -1, 0.8);
    };
    for (let k = 0; k < 80_000; k++) {
      const t = k * step;
      // The rate does not depend on the present value, so Simpson's rule is the Runge-Kutta step.
      history.push(history[k]! + (step / 6) * (rateAt(t) + 4 * rateAt(t + step / 2) + rateAt(t + step)));
    }
    const times = [1, 2, 3.5, 5, 8];
    expectClose(
      at(drawing, times, { stimulus: sine }),
      times.map(t => history[Math.round(t / step)]!),
      2e-7,
    );
  });
});

/** The classical fourth-order method (Kutta 1901) with a step of 1e-4. */
function rungeKutta(
  rate: (x: readonly number[]) => number[],
  start: readonly number[],
  times: readonly number[],
): number[][] {
  const h = 1e-4;
  let [x, k] = [[...start], 0];
  return times.map(t => {
    for (; k * h < t - h / 2; k++) {
      const moved = (slope: readonly number[], part: number) => x.map((value, i) => value + part * h * slope[i]!);
      const a = rate(x);
      const b = rate(moved(a, 0.5));
      const c = rate(moved(b, 0.5));
      const d = rate(moved(c, 1));
      x = x.map((value, i) => value + (h / 6) * (a[i]! + 2 * b[i]! + 2 * c[i]! + d[i]!));
    }
    return [...x];
  });
}

describe('stimuli', () => {
  const lag = draw([input('u'), quotient('g', '2', 's + 2'), output('y')], ['u -> g', 'g -> y']);

  test.each<[Stimulus, (t: number) => number]>([
    [{ kind: 'step', size: 3 }, t => 3 * (1 - Math.exp(-2 * t))],
    [{ kind: 'impulse', size: 3 }, t => 6 * Math.exp(-2 * t)],
    [{ kind: 'ramp', size: 3 }, t => 3 * (t - (1 - Math.exp(-2 * t)) / 2)],
    // 2/(s + 2) of sin ωt: (2 (2 sin ωt − ω cos ωt) + 2 ω e^(−2t)) / (4 + ω²)
    [
      { kind: 'sine', size: 1, omega: 5 },
      t => (2 * (2 * Math.sin(5 * t) - 5 * Math.cos(5 * t)) + 10 * Math.exp(-2 * t)) / 29,
    ],
    [{ kind: 'pulse', size: 1, width: 1 }, t => 1 - Math.exp(-2 * t) - (t > 1 ? 1 - Math.exp(-2 * (t - 1)) : 0)],
    // a ramp of 1 s and a held value: the ramp's answer less the same a second later
    [
      { kind: 'recorded', time: [0, 1, 3], values: [0, 1, 1] },
      t => {
        const ramp = (s: number) => (s <= 0 ? 0 : s - (1 - Math.exp(-2 * s)) / 2);
        return ramp(t) - ramp(t - 1);
      },
    ],
    [{ kind: 'none' }, () => 0],
  ])('%j on a lag', (stimulus, exact) => {
    expectClose(at(lag, EVERY_TENTH, { stimulus }), EVERY_TENTH.map(exact), 4e-13);
  });

  test('a recorded jump is two samples at one time', () => {
    const wire = draw([input('u'), output('y')], ['u -> y']);
    const stimulus: Stimulus = { kind: 'recorded', time: [0, 1, 1, 2], values: [0, 0, 5, 5] };
    expectClose(at(wire, [0.5, 0.999, 1, 1.5, 3], { stimulus }), [0, 0, 5, 5, 5]);
  });

  test('from the integrators’ initial values, with nothing driven', () => {
    const free = draw(
      [{ id: 'x', kind: 'integrator', initial: '3' }, gain('g', '-2'), output('y')],
      ['x -> g', 'g -> x', 'x -> y'],
    );
    const opened = valueOf(openedModel(free));
    const found = simulate({
      opened,
      input: null,
      stimulus: { kind: 'none' },
      outputs: [0],
      horizon: 4,
      clips: true,
      fromInitial: true,
    });
    if (found.status !== 'computed') throw new Error(found.reason);
    expectClose(sampled(found, [0, 1, 4])[0]!, [3, 3 * Math.exp(-2), 3 * Math.exp(-8)]);
  });
});

describe('stiff and lightly damped motions', () => {
  test('time constants from a microsecond to a second', () => {
    const drawing = draw(
      [input('u'), quotient('a', '1', '1e-6*s + 1'), quotient('b', '1', 's + 1'), output('y')],
      ['u -> a', 'a -> b', 'b -> y'],
    );
    const [a, b] = [1e6, 1];
    const exact = (t: number) => 1 - (a * Math.exp(-b * t) - b * Math.exp(-a * t)) / (a - b);
    expectClose(at(drawing, [1e-6, 5e-6, 0.1, 1, 5], { horizon: 5 }), [1e-6, 5e-6, 0.1, 1, 5].map(exact));
  });

  test('an oscillation with damping 0.001 over a hundred periods', () => {
    const drawing = draw([input('u'), quotient('g', '1', 's^2 + 0.002*s + 1'), output('y')], ['u -> g', 'g -> y']);
    const w = Math.sqrt(1 - 1e-6);
    const exact = (t: number) => 1 - Math.exp(-0.001 * t) * (Math.cos(w * t) + (0.001 / w) * Math.sin(w * t));
    const times = [1, 10, 100, 600];
    expectClose(at(drawing, times), times.map(exact), 2e-11);
  });
});
