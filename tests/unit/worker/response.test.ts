/** Responses on demand: the linear answer beside the true one, and what limiters and integrators did. */

import { describe, expect, test } from 'vitest';
import { compile } from '../../../src/compile/index.ts';
import { type Block, type Diagram, readDiagram } from '../../../src/diagram/index.ts';
import { answer, type ResponseQuestion } from '../../../src/worker/topics/response.ts';
import { draw, gain, input, integrator, output, quotient, sum } from '../../arbitraries/draw.ts';
import lagging from '../../reference/cases/dead-time-loop-margins-and-steps.json';
import positioner from '../../reference/cases/rate-limited-positioner.json';
import { valueOf } from '../results.ts';

function asked(diagram: Diagram, question: Partial<ResponseQuestion> = {}) {
  const derivation = valueOf(compile(diagram));
  const whole: ResponseQuestion = {
    input: 0,
    outputs: [0],
    stimulus: { kind: 'step', size: 1 },
    horizon: null,
    fromInitial: false,
    ...question,
  };
  return valueOf(answer({ diagram, derivation }, whole));
}

const read = (drawing: object) => valueOf(readDiagram(JSON.stringify(drawing)));
const limiter = (id: string, lower: string, upper: string): Block => ({ id, kind: 'limiter', lower, upper });

/** The value of the first curve at a time that is one of the samples. */
function at(curves: ReturnType<typeof asked>['linear'] | null, t: Float64Array, time: number): number {
  if (curves === null || 'reason' in curves) throw new Error('no curve');
  return curves.values[0]?.[t.findIndex(each => Math.abs(each - time) < 1e-9)] ?? Number.NaN;
}

describe('a response on demand', () => {
  test('has the true dead time beside the approximation, and the figures of the true one', () => {
    const found = asked(read(lagging.diagram), { horizon: 8 });
    expect(found).toMatchObject({ hasDeadTime: true, hasLimiter: false });
    // On the second second y = (t − 1)/2 (method of steps); the approximation answers at once.
    expect(at(found.actual, found.t, 1.5)).toBeCloseTo(0.25, 12);
    expect(at(found.actual, found.t, 0.5)).toBe(0);
    expect(Math.abs(at(found.linear, found.t, 0.5))).toBeGreaterThan(0.01);
    // y = Σ (−1)^(k − 1) (t − k)^k / (2^k k!) over the whole seconds k that have passed; its largest value lies between 3 and 5 s.
    const piece = (t: number) => (t - 1) / 2 - (t - 2) ** 2 / 8 + (t - 3) ** 3 / 48 - (t > 4 ? (t - 4) ** 4 / 384 : 0);
    const times = Array.from({ length: 200_001 }, (_, k) => 3 + k / 100_000);
    const largest = times.reduce((most, t) => Math.max(most, piece(t)), 0);
    expect(found.figures?.overshootPercent).toBeCloseTo(100 * (largest - 1), 6);
    expect(piece(found.figures?.peakTime ?? 0)).toBeCloseTo(largest, 9);
  });

  test('of a drawing without them is the linear one alone', () => {
    const lag = draw([input('u'), quotient('g', '1', 's + 1'), output('y')], ['u -> g', 'g -> y']);
    expect(asked(lag)).toMatchObject({ actual: null, hasDeadTime: false, hasLimiter: false, clippings: [] });
  });

  test('says when a limiter clipped and that nothing wound up', () => {
    const found = asked(read(positioner.diagram), { horizon: 2 });
    expect(found.clippings).toHaveLength(1);
    expect(found.clippings[0]).toMatchObject({ limiter: 'clip', side: 'upper', from: 0, windUp: [] });
    expect(found.clippings[0]?.to).toBeCloseTo(0.75, 10);
    // The carriage is at 1 − e^(−4 (t − 0.75)) / 4: 90 % at 0.75 + ln(2.5) / 4
    expect(found.figures?.riseTime10to90).toBeCloseTo(0.75 + Math.log(2.5) / 4 - 0.1, 9);
    expect(found.figures?.settlingTime2percent).toBeCloseTo(0.75 + Math.log(12.5) / 4, 9);
  });

  test('names the integrator that winds up, and by how much', () => {
    // v = sat(q) at 0.5 with q′ = 1: clipped from 0.5 s on, and q goes on to 2
    const drawing = draw(
      [input('u'), integrator('q'), limiter('valve', '-1/2', '1/2'), output('y')],
      ['u -> q', 'q -> valve', 'valve -> y'],
    );
    const { clippings } = asked(drawing, { horizon: 2 });
    expect(clippings).toHaveLength(1);
    expect(clippings[0]?.from).toBeCloseTo(0.5, 12);
    expect(clippings[0]?.to).toBe(2);
    expect(clippings[0]?.windUp.map(({ state }) => state)).toEqual(['q']);
    expect(clippings[0]?.windUp[0]?.change).toBeCloseTo(1.5, 12);
  });

  test('a sine is shown for eight periods, a record to its end', () => {
    const lag = draw([input('u'), quotient('g', '1', 's + 1'), output('y')], ['u -> g', 'g -> y']);
    expect(asked(lag, { stimulus: { kind: 'sine', size: 1, omega: 0.1 } }).horizon.duration).toBeCloseTo(
      160 * Math.PI,
      9,
    );
    const stimulus = { kind: 'recorded', time: [0, 50], values: [0, 1] } as const;
    expect(asked(lag, { stimulus }).horizon.duration).toBe(50);
  });

  test('moves from the initial values with no input driven', () => {
    const free = draw(
      [{ id: 'x', kind: 'integrator', initial: '3' }, gain('g', '-2'), output('y')],
      ['x -> g', 'g -> x', 'x -> y'],
    );
    const found = asked(free, { input: null, stimulus: { kind: 'none' }, fromInitial: true, horizon: 4 });
    expect(at(found.linear, found.t, 1)).toBeCloseTo(3 * Math.exp(-2), 12);
  });

  test('what cannot be simulated is said beside the linear answer', () => {
    // A differentiator on a limiter's output has no motion of its own to follow.
    const drawing = draw(
      [
        input('u'),
        limiter('l', '-1', '1'),
        { id: 'd', kind: 'differentiator' },
        quotient('f', '1', 's^2 + s + 1'),
        sum('e', '++'),
        output('y'),
      ],
      ['u -> f', 'f -> l', 'l -> d', 'd -> e', 'f -> e:1', 'e -> y'],
    );
    const found = asked(drawing, { horizon: 3 });
    expect(found.hasLimiter).toBe(true);
    expect(found.actual).toHaveProperty('reason');
    expect(found.linear).toHaveProperty('values');
  });
});
